package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.run.DerivativeReport;

/**
 * An aeroplane from above and from behind, both to the same scale, with what its variants change as
 * dashed outlines.
 */
public final class ShapePicture {
  private static final double LEFT = 160;
  private static final double RIGHT = 150;
  private static final double TALLEST = 620;
  private static final double TOP = 14;
  private static final double FOOT = 26;
  private static final double NAME_HEIGHT = 13;
  private static final double NAME_GAP = 26;
  private static final double HALF_SMALL = 4;

  /** Names of what ends nearer to the middle than this part of the width stand level with it. */
  private static final double NEAR = 0.5;

  /** Around the aeroplane, as a part of its span. */
  private static final double AIR = 0.03;

  /** The least distance of grid lines, px. */
  private static final double GRID = 44;

  private final List<VariantStroke> drawn;
  private final double scale;
  private final double reach;

  private record View(List<List<Outline>> aeroplanes, AxisTitle axis) {
    /** The outlines of one, without those that lie on the ones of the base. */
    List<Outline> ownOf(int place) {
      return aeroplanes.get(place).stream()
          .filter(
              outline ->
                  place == 0 || aeroplanes.get(0).stream().noneMatch(base -> base.covers(outline)))
          .toList();
    }

    double low() {
      return extreme(-1);
    }

    double high() {
      return extreme(1);
    }

    private double extreme(int sign) {
      return sign
          * aeroplanes.stream()
              .flatMap(List::stream)
              .flatMapToDouble(outline -> Arrays.stream(outline.up()))
              .map(value -> sign * value)
              .max()
              .orElseThrow();
    }
  }

  /** Draws the outlines of one view. */
  @FunctionalInterface
  private interface Drafter {
    List<Outline> draft(Geometry geometry, Optional<Ailerons> travel, ShapeOutlines.Datum datum);
  }

  private ShapePicture(List<VariantStroke> drawn, double scale, double reach) {
    this.drawn = drawn;
    this.scale = scale;
    this.reach = reach;
  }

  /**
   * Draws the page.
   *
   * @param report at least one shape of it is known
   * @return the drawing
   */
  public static Sheet draw(DerivativeReport report) {
    List<VariantStroke> drawn = VariantStroke.of(report);
    View above = view(drawn, ShapeOutlines::planform, new AxisTitle("Ahead of the root", "m"));
    View behind = view(drawn, ShapeOutlines::fromBehind, new AxisTitle("Above the body", "m"));
    double widest =
        above.aeroplanes().stream()
            .flatMap(List::stream)
            .flatMapToDouble(outline -> Arrays.stream(outline.across()))
            .max()
            .orElseThrow();
    double reach = widest * (1 + 2 * AIR);
    double room = Page.INSIDE - LEFT - RIGHT;
    double tall = above.high() - above.low() + behind.high() - behind.low() + 8 * AIR * widest;
    double scale = Math.min(room / (2 * reach), TALLEST / tall);
    ShapePicture picture = new ShapePicture(drawn, scale, 0.5 * room / scale);
    Page page = new Page();
    page.addHead(report, "Shape, to scale: from above, and from behind with full right stick");
    page.add(picture.draw(above));
    page.add(picture.draw(behind));
    page.addFoot(
        "Tail surfaces are drawn as rectangles of their span and area, the body by its length and"
            + " largest section, the centre of gravity at a quarter of the mean chord: the aeroplane"
            + " file says no more. "
            + VariantStroke.remark(report));
    return page.sheet();
  }

  private static View view(List<VariantStroke> drawn, Drafter drafter, AxisTitle axis) {
    ShapeOutlines.Datum datum =
        ShapeOutlines.Datum.of(drawn.get(0).derived().data().aeroplane().geometry().orElseThrow());
    List<List<Outline>> all = new ArrayList<>();
    for (VariantStroke each : drawn) {
      Aeroplane aeroplane = each.derived().data().aeroplane();
      List<Outline> some =
          drafter.draft(aeroplane.geometry().orElseThrow(), aeroplane.ailerons(), datum);
      all.add(some);
    }
    return new View(all, axis);
  }

  /** The middle of what reaches furthest to the right. */
  private static double[] tip(List<Outline> outlines) {
    double furthest =
        outlines.stream()
            .flatMapToDouble(outline -> Arrays.stream(outline.across()))
            .max()
            .orElse(0);
    double sum = 0;
    int count = 0;
    for (Outline outline : outlines) {
      for (int i = 0; i < outline.across().length; i++) {
        if (outline.across()[i] >= furthest * (1 - 1e-9)) {
          sum += outline.up()[i];
          count++;
        }
      }
    }
    return new double[] {furthest, count == 0 ? 0 : sum / count};
  }

  private Sheet draw(View view) {
    double air = 2 * AIR * reach;
    double low = view.low() - air;
    double high = view.high() + air;
    double height = (high - low) * scale;
    List<Mark> marks = new ArrayList<>();
    addGrid(view, low, high, marks);
    for (int i = drawn.size() - 1; i >= 0; i--) {
      for (Outline outline : view.ownOf(i)) {
        add(outline, drawn.get(i), i == 0, high, marks);
      }
    }
    addNames(view, high, height, marks);
    return new Sheet(Page.INSIDE, TOP + height + FOOT, marks);
  }

  private double xOf(double across) {
    return LEFT + (across + reach) * scale;
  }

  private double yOf(double up, double high) {
    return TOP + (high - up) * scale;
  }

  private static double sharp(double px) {
    return Math.floor(px) + 0.5;
  }

  private void addGrid(View view, double low, double high, List<Mark> marks) {
    double bottom = yOf(low, high);
    double step = Ticks.step(GRID / scale, false);
    Ticks across = Ticks.of(-reach, reach, 2 * reach / step, false);
    for (int i = 0; i < across.size(); i++) {
      double x = sharp(xOf(across.value(i)));
      marks.add(new Mark.Line(x, TOP, x, bottom, Stroke.of(line(across.value(i)), 1)));
      marks.add(
          new Mark.Label(
              x, bottom + 16, across.figure(i), Anchor.MIDDLE, TypeSize.SMALL, Ink.QUIET));
    }
    Ticks up = Ticks.of(low, high, Math.max(1, (high - low) / step), false);
    for (int i = 0; i < up.size(); i++) {
      double y = sharp(yOf(up.value(i), high));
      marks.add(
          new Mark.Line(LEFT, y, LEFT + 2 * reach * scale, y, Stroke.of(line(up.value(i)), 1)));
      marks.add(
          new Mark.Label(
              LEFT - 7, y + HALF_SMALL, up.figure(i), Anchor.END, TypeSize.SMALL, Ink.QUIET));
    }
    view.axis().draw(0, TOP + 9, marks);
    new AxisTitle("Station, right", "m").draw(0, bottom + 16, marks);
  }

  private static Ink line(double value) {
    return value == 0 ? Ink.AXIS : Ink.GRID;
  }

  private void add(
      Outline outline, VariantStroke each, boolean filled, double high, List<Mark> marks) {
    int count = outline.across().length;
    double[] x = new double[count];
    double[] y = new double[count];
    for (int i = 0; i < count; i++) {
      x[i] = xOf(outline.across()[i]);
      y[i] = yOf(outline.up()[i], high);
    }
    if (filled) {
      double opacity =
          switch (outline.part()) {
            case BODY -> 0.12;
            case SURFACE -> 0.18;
            case AILERON -> 0.55;
          };
      marks.add(new Mark.Area(x, y, Ink.WING, opacity));
    }
    double[] closedX = Arrays.copyOf(x, count + 1);
    double[] closedY = Arrays.copyOf(y, count + 1);
    closedX[count] = x[0];
    closedY[count] = y[0];
    Stroke stroke = each.stroke();
    marks.add(
        new Mark.Polyline(
            closedX, closedY, filled ? new Stroke(stroke.ink(), 1.2, stroke.dash(), 1) : stroke));
  }

  /** Names beside the right tips, each with a piece of its line. */
  private void addNames(View view, double high, double height, List<Mark> marks) {
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < drawn.size(); i++) {
      if (!view.ownOf(i).isEmpty()) {
        order.add(i);
      }
    }
    List<double[]> tips = new ArrayList<>();
    for (int i = 0; i < drawn.size(); i++) {
      tips.add(tip(view.ownOf(i)));
    }
    order.sort(Comparator.comparingDouble(i -> yOf(tips.get(i)[1], high)));
    double[] wanted = order.stream().mapToDouble(i -> yOf(tips.get(i)[1], high)).toArray();
    double[] heights = new double[wanted.length];
    Arrays.fill(heights, NAME_HEIGHT);
    double[] placed = Spread.apart(wanted, heights, TOP, TOP + height);
    double end = LEFT + 2 * reach * scale;
    for (int k = 0; k < placed.length; k++) {
      VariantStroke each = drawn.get(order.get(k));
      Ink ink = each.stroke().ink();
      double[] tip = tips.get(order.get(k));
      if (tip[0] > NEAR * reach) {
        marks.add(
            new Mark.Line(
                xOf(tip[0]) + 3, wanted[k], end, placed[k], new Stroke(ink, 0.8, Dash.SOLID, 0.6)));
      }
      marks.add(new Mark.Line(end, placed[k], end + NAME_GAP - 4, placed[k], each.stroke()));
      marks.add(
          new Mark.Label(
              end + NAME_GAP,
              placed[k] + HALF_SMALL,
              VariantStroke.shortened(each.derived().label(), RIGHT - NAME_GAP - 4),
              Anchor.START,
              TypeSize.SMALL,
              ink));
    }
  }
}
