package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** Draws one strip. */
final class StripDrawing {
  private static final Stroke GRID = Stroke.of(Ink.GRID, 1);
  private static final Stroke ZERO = Stroke.of(Ink.AXIS, 1);
  private static final Stroke EVENT = new Stroke(Ink.MARKER, 1, Dash.DOTTED, 0.9);
  private static final Stroke LEADER = new Stroke(Ink.MARKER, 0.8, Dash.SOLID, 0.7);

  /** From the end of a curve to its name. */
  private static final double NAME_GAP = 8;

  private static final double NAME_HEIGHT = 13;

  /** From one word of a marker to the next. */
  private static final double WORD_GAP = 8;

  /** From the base line of the words to the strip. */
  private static final double WORD_LIFT = 7;

  /** Beyond this a thing that had to move is tied to its place by a line. */
  private static final double TIED = 4;

  /** The least distance of figures at the axis, px. */
  private static final double TICKS = 16;

  /** The same where there would be one figure only. */
  private static final double CLOSE_TICKS = 12;

  /** The space that a figure at the axis takes. */
  private static final double FIGURES = 40;

  /** From the middle of small type to its base line. */
  private static final double HALF_SMALL = 4;

  private final Strip strip;
  private final PlotArea area;
  private final double sheetWidth;
  private final List<Mark> marks;

  StripDrawing(Strip strip, PlotArea area, double sheetWidth, List<Mark> marks) {
    this.strip = strip;
    this.area = area;
    this.sheetWidth = sheetWidth;
    this.marks = marks;
  }

  void draw() {
    addGrid();
    addTitle();
    addMarkers();
    addCurves();
    addNames();
  }

  private double bottom() {
    return area.y() + area.height();
  }

  private double end() {
    return area.x() + area.width();
  }

  /** On whole px a line of one px is sharp. */
  private static double sharp(double px) {
    return Math.floor(px) + 0.5;
  }

  private void addGrid() {
    Ticks times = Ticks.ofTime(area.time(), area.width());
    for (int i = 0; i < times.size(); i++) {
      double x = sharp(area.xOf(times.value(i)));
      marks.add(new Mark.Line(x, area.y(), x, bottom(), GRID));
    }
    Ticks values = values(TICKS);
    if (values.size() < 2) {
      values = values(CLOSE_TICKS);
    }
    for (int i = 0; i < values.size(); i++) {
      double y = area.yOf(values.value(i));
      if (values.value(i) != 0) {
        marks.add(new Mark.Line(area.x(), sharp(y), end(), sharp(y), GRID));
      }
      marks.add(
          new Mark.Label(
              area.x() - 7,
              y + HALF_SMALL,
              values.figure(i),
              Anchor.END,
              TypeSize.SMALL,
              Ink.QUIET));
    }
    if (area.low() <= 0 && area.high() >= 0) {
      double y = sharp(area.yOf(0));
      marks.add(new Mark.Line(area.x(), y, end(), y, ZERO));
    }
  }

  private Ticks values(double distance) {
    return Ticks.of(
        area.low(),
        area.high(),
        Math.max(1, area.height() / distance),
        ValueRange.isAngle(strip.unit()));
  }

  /**
   * The title beside the figures, broken into lines after its commas, and the unit below; in a low
   * strip the unit stands behind the title where it fits.
   */
  private void addTitle() {
    double room = area.x() - FIGURES;
    double y = area.y() + 0.5 * TypeSize.NORMAL.pixels();
    double behind = 0;
    for (String line : TextLines.brokenAtCommas(strip.title(), TypeSize.NORMAL, room)) {
      marks.add(new Mark.Label(0, y, line, Anchor.START, TypeSize.NORMAL, Ink.TEXT));
      behind = TypeWidths.of(line + " ", TypeSize.NORMAL);
      y += 16;
    }
    if (y > bottom() && behind + TypeWidths.of(strip.unit(), TypeSize.SMALL) <= room) {
      marks.add(
          new Mark.Label(behind, y - 16, strip.unit(), Anchor.START, TypeSize.SMALL, Ink.QUIET));
      return;
    }
    for (String line : TextLines.brokenAtCommas(strip.unit(), TypeSize.SMALL, room)) {
      if (y > bottom() + HALF_SMALL) {
        return; // the next strip begins here
      }
      marks.add(new Mark.Label(0, y, line, Anchor.START, TypeSize.SMALL, Ink.QUIET));
      y += 14;
    }
  }

  private void addMarkers() {
    List<Marker> seen =
        new ArrayList<>(
            strip.markers().stream()
                .filter(
                    marker ->
                        marker.time() >= area.time().from() && marker.time() <= area.time().to())
                .sorted(Comparator.comparingDouble(Marker::time))
                .toList());
    for (Marker marker : seen) {
      double x = area.xOf(marker.time());
      marks.add(new Mark.Line(x, area.y(), x, bottom(), EVENT));
    }
    while (!seen.isEmpty() && sum(lengths(seen)) > sheetWidth - area.x() + WORD_GAP) {
      seen.remove(seen.size() - 1);
    }
    double[] wanted = seen.stream().mapToDouble(marker -> area.xOf(marker.time())).toArray();
    double[] placed = Spread.apart(wanted, lengths(seen), area.x() - WORD_GAP, sheetWidth);
    double base = area.y() - WORD_LIFT;
    for (int i = 0; i < placed.length; i++) {
      marks.add(
          new Mark.Label(
              placed[i], base, seen.get(i).word(), Anchor.MIDDLE, TypeSize.SMALL, Ink.MARKER));
      marks.add(
          Math.abs(placed[i] - wanted[i]) > TIED
              ? new Mark.Line(placed[i], base + 2, wanted[i], area.y(), LEADER)
              : new Mark.Line(wanted[i], base + 3, wanted[i], area.y(), LEADER));
    }
  }

  private static double[] lengths(List<Marker> markers) {
    return markers.stream()
        .mapToDouble(marker -> TypeWidths.of(marker.word(), TypeSize.SMALL) + WORD_GAP)
        .toArray();
  }

  private static double sum(double[] lengths) {
    double sum = 0;
    for (double length : lengths) {
      sum += length;
    }
    return sum;
  }

  private void addCurves() {
    List<Mark> lines = new ArrayList<>();
    for (int i = strip.curves().size() - 1; i >= 0; i--) {
      Mark.Polyline line = Decimation.polyline(strip.curves().get(i), area);
      if (line.x().length > 0) {
        lines.add(line);
      }
    }
    // A curve along an edge keeps its full width.
    marks.add(new Mark.Clip(area.x(), area.y() - 2, area.width(), area.height() + 4, lines));
  }

  private void addNames() {
    List<Curve> named =
        strip.curves().stream()
            .filter(curve -> curve.time().length > 0 && curve.time()[0] <= area.time().to())
            .sorted(Comparator.comparingDouble(this::endY))
            .toList();
    double[] wanted = named.stream().mapToDouble(this::endY).toArray();
    double[] heights = new double[wanted.length];
    Arrays.fill(heights, NAME_HEIGHT);
    double[] placed = Spread.apart(wanted, heights, area.y() - 3, bottom() + 3);
    for (int i = 0; i < placed.length; i++) {
      Curve curve = named.get(i);
      marks.add(
          new Mark.Label(
              end() + NAME_GAP,
              placed[i] + HALF_SMALL,
              curve.name(),
              Anchor.START,
              TypeSize.SMALL,
              curve.stroke().ink()));
      if (Math.abs(placed[i] - wanted[i]) > TIED) {
        Stroke tie = new Stroke(curve.stroke().ink(), 0.8, Dash.SOLID, 0.6);
        marks.add(new Mark.Line(end() + 1, wanted[i], end() + NAME_GAP - 2, placed[i], tie));
      }
    }
  }

  private double endY(Curve curve) {
    double last = Math.min(area.time().to(), curve.time()[curve.time().length - 1]);
    double y = area.yOf(Decimation.valueAt(curve, last));
    return Math.max(area.y(), Math.min(bottom(), y));
  }
}
