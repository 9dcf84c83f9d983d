package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.quantity.Quantity;

/**
 * An aeroplane to scale from its shape: from above with the nose up, and below it from behind, both
 * at one scale. The right aileron has the ink and the plain outline of the right side, the left one
 * those of the left.
 *
 * <p>A shape says where tail and fin are from the centre of gravity, not where that is on the wing,
 * nor where the body begins: drawn are a centre of gravity on the quarter-chord line of the mean
 * chord, and a body that ends with the tail, or a boom behind one that is too short for that.
 */
public final class ShapeDrawing {
  /** A smaller drawing could not be read, px. */
  public static final double LEAST = 120;

  private static final Stroke OUTLINE = Stroke.of(Ink.WING, 1.6);
  private static final Stroke THIN = Stroke.of(Ink.WING, 1);
  private static final Stroke GHOST = new Stroke(Ink.SECOND, 1.4, Dash.DASHED, 1);
  private static final Stroke MEASURE = Stroke.of(Ink.QUIET, 1);
  private static final Stroke AXIS = new Stroke(Ink.AXIS, 1, Dash.DASH_DOT, 1);

  private static final double SIDE = 30;
  private static final double ABOVE = 20;

  /** Room for the dimension lines below the view from above, px. */
  private static final double DIMENSIONS = 58;

  private static final double REAR_ABOVE = 26;
  private static final double REAR_BELOW = 26;

  /** Thickness of the wing by its chord, as it is drawn. */
  private static final double THICKNESS = 0.12;

  /** Where the body is widest, by its length, and how wide it ends, by that width. */
  private static final double WIDEST = 0.3;

  private static final double TAIL = 0.16;

  /** How much of its length a body reaches ahead of the wing at least. */
  private static final double AHEAD = 0.2;

  /** Where the aerodynamic centre of a fin is, from its root, by its span. */
  private static final double FIN_CENTRE = 0.42;

  private final Outline outline;
  private final Optional<Outline> ghost;
  private final double scale;
  private final double width;
  private final String unit;
  private final int panel;
  private final List<Mark> marks = new ArrayList<>();

  /** Where x = 0 (root quarter-chord point) is in the view from above, px. */
  private double originAbove;

  /** Where the centre line of the body is in the view from behind, px. */
  private double originBehind;

  private ShapeDrawing(
      Outline outline,
      Optional<Outline> ghost,
      double scale,
      double width,
      String unit,
      int panel) {
    this.outline = outline;
    this.ghost = ghost;
    this.scale = scale;
    this.width = width;
    this.unit = unit;
    this.panel = panel;
  }

  /**
   * What was drawn.
   *
   * @param sheet the drawing
   * @param scale px for a metre
   */
  public record Drawing(Sheet sheet, double scale) {}

  /**
   * Draws a shape.
   *
   * @param shape the shape
   * @param other one that stands behind it in dashes; empty for none
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param unit of the dimensions, such as {@code ft}
   * @param panel the panel of the wing that is marked, from 0; none when there is no such panel
   * @param held a scale that is kept as long as all fits, px for a metre; empty for the largest
   * @return the drawing
   */
  public static Drawing draw(
      Geometry shape,
      Optional<Geometry> other,
      double width,
      double height,
      String unit,
      int panel,
      OptionalDouble held) {
    if (!(width >= LEAST && height >= LEAST)) {
      throw new IllegalArgumentException(
          "the drawing is "
              + width
              + " by "
              + height
              + " px; expected at least "
              + LEAST
              + " either way");
    }
    Outline outline = new Outline(shape);
    Optional<Outline> ghost = other.map(Outline::new);
    double half = Math.max(outline.halfSpan(), ghost.map(Outline::halfSpan).orElse(0.0));
    double front = Math.min(outline.front, ghost.map(g -> g.front).orElse(0.0));
    double back = Math.max(outline.back, ghost.map(g -> g.back).orElse(0.0));
    double top = Math.max(outline.top, ghost.map(g -> g.top).orElse(0.0));
    double bottom = Math.min(outline.bottom, ghost.map(g -> g.bottom).orElse(0.0));
    double free = height - ABOVE - DIMENSIONS - REAR_ABOVE - REAR_BELOW;
    double fit = Math.min((width - 2 * SIDE) / (2 * half), free / (back - front + top - bottom));
    double scale = Math.min(fit, held.orElse(fit));
    ShapeDrawing drawing = new ShapeDrawing(outline, ghost, scale, width, unit, panel);
    double spare = free - scale * (back - front + top - bottom);
    drawing.originAbove = ABOVE + 0.3 * spare - scale * front;
    drawing.originBehind = height - REAR_BELOW - 0.3 * spare + scale * bottom;
    drawing.draw(drawing.originAbove + scale * back);
    return new Drawing(new Sheet(width, height, drawing.marks), scale);
  }

  /** The corners of an aeroplane, m: x back from the root quarter chord, y right, z up. */
  private static final class Outline {
    private final Geometry shape;
    private final Wing wing;

    /** From the root quarter chord back to the centre of gravity. */
    private final double centre;

    private final double front;

    /** The nose of the body, where there is one. */
    private final double bodyFront;

    private final double back;
    private final double top;
    private final double bottom;

    Outline(Geometry shape) {
      this.shape = shape;
      this.wing = shape.wing();
      double sum = 0;
      for (WingPanel one : wing.panels()) {
        double middle = 0.5 * (one.from() + one.to());
        sum += 2 * one.area() * wing.quarterChordAt(middle);
      }
      centre = sum / wing.area();
      double least = 0;
      double most = 0;
      double high = 0;
      double low = 0;
      for (double[] corner : wingAbove()) {
        least = Math.min(least, corner[1]);
        most = Math.max(most, corner[1]);
      }
      for (double[] corner : wingBehind()) {
        high = Math.max(high, corner[1]);
        low = Math.min(low, corner[1]);
      }
      double tail = Math.max(tailEnd(), most);
      double nose = 0;
      if (shape.body().isPresent()) {
        Body body = shape.body().get();
        // A pod is too short to end with the tail: it carries the wing, and a boom the tail.
        double root = leadingEdge(0, wing.panels().get(0).innerChord());
        nose = Math.min(tail - body.length(), root - AHEAD * body.length());
        least = Math.min(least, nose);
        high = Math.max(high, 0.5 * body.height());
        low = Math.min(low, -0.5 * body.height());
      }
      if (shape.fin().isPresent()) {
        Fin fin = shape.fin().get();
        high = Math.max(high, fin.height() + (1 - FIN_CENTRE) * fin.span());
        low = Math.min(low, fin.height() - FIN_CENTRE * fin.span());
      }
      if (shape.tailplane().isPresent()) {
        high = Math.max(high, shape.tailplane().get().height());
      }
      front = least;
      bodyFront = nose;
      back = tail;
      top = high;
      bottom = low;
    }

    double halfSpan() {
      double tail = shape.tailplane().map(Tailplane::span).orElse(0.0);
      return Math.max(wing.halfSpan(), 0.5 * tail);
    }

    /** The rearmost point of tailplane and fin. */
    double tailEnd() {
      double end = 0;
      if (shape.tailplane().isPresent()) {
        Tailplane tail = shape.tailplane().get();
        end = Math.max(end, centre + tail.arm() + 0.75 * tail.area() / tail.span());
      }
      if (shape.fin().isPresent()) {
        Fin fin = shape.fin().get();
        end = Math.max(end, centre + fin.arm() + 0.75 * fin.area() / fin.span());
      }
      return end;
    }

    double leadingEdge(double station, double chord) {
      return wing.quarterChordAt(station) - 0.25 * chord;
    }

    /** The right half from above: along the leading edge outwards, back along the trailing edge. */
    List<double[]> wingAbove() {
      List<double[]> corners = new ArrayList<>();
      for (WingPanel one : wing.panels()) {
        corners.add(new double[] {one.from(), leadingEdge(one.from(), one.innerChord())});
        corners.add(new double[] {one.to(), leadingEdge(one.to(), one.outerChord())});
      }
      for (int i = wing.panels().size() - 1; i >= 0; i--) {
        WingPanel one = wing.panels().get(i);
        corners.add(
            new double[] {one.to(), leadingEdge(one.to(), one.outerChord()) + one.outerChord()});
        corners.add(
            new double[] {
              one.from(), leadingEdge(one.from(), one.innerChord()) + one.innerChord()
            });
      }
      return corners;
    }

    /** The right half from behind: along the upper side outwards, back along the lower side. */
    List<double[]> wingBehind() {
      List<double[]> upper = new ArrayList<>();
      List<double[]> lower = new ArrayList<>();
      for (WingPanel one : wing.panels()) {
        for (boolean outer : new boolean[] {false, true}) {
          double y = outer ? one.to() : one.from();
          double half = 0.5 * THICKNESS * (outer ? one.outerChord() : one.innerChord());
          upper.add(new double[] {y, heightAt(y) + half});
          lower.add(0, new double[] {y, heightAt(y) - half});
        }
      }
      upper.addAll(lower);
      return upper;
    }

    double heightAt(double station) {
      double height = wing.height();
      for (WingPanel one : wing.panels()) {
        double to = Math.min(station, one.to());
        if (to > one.from()) {
          height += (to - one.from()) * Math.tan(one.dihedral());
        }
      }
      return height;
    }

    double chordBehind(double station) {
      return leadingEdge(station, chordAt(station)) + chordAt(station);
    }

    /** At the tip the chord of the last panel. */
    double chordAt(double station) {
      return wing.chordAt(Math.min(station, wing.halfSpan()));
    }
  }

  private double x(double station) {
    return 0.5 * width + scale * station;
  }

  private double above(double back) {
    return originAbove + scale * back;
  }

  private double behind(double up) {
    return originBehind - scale * up;
  }

  private void draw(double lowest) {
    marks.add(new Mark.Line(0.5 * width, above(outline.front) - 6, 0.5 * width, lowest + 4, AXIS));
    marks.add(label(0, 13, "From above", Anchor.START, Ink.QUIET));
    addBody();
    addTail();
    addWingAbove();
    ghost.ifPresent(this::addGhostAbove);
    addDimensionsAbove(lowest);
    addBehind();
    ghost.ifPresent(this::addGhostBehind);
    addDimensionsBehind();
  }

  private void addWingAbove() {
    List<double[]> right = outline.wingAbove();
    for (double side : new double[] {-1, 1}) {
      double[][] half = placedAbove(right, side);
      marks.add(new Mark.Area(half[0], half[1], Ink.WING, 0.1));
      addChosenPanel(side);
      outline.shape.ailerons().ifPresent(place -> addAileron(place, side));
    }
    outlineOf(right, OUTLINE);
  }

  /** Both halves as one line around. */
  private void outlineOf(List<double[]> right, Stroke stroke) {
    int half = right.size() / 2;
    List<double[]> around = new ArrayList<>();
    for (int i = half - 1; i >= 0; i--) {
      around.add(mirrored(right.get(i)));
    }
    around.addAll(right);
    for (int i = right.size() - 1; i >= half; i--) {
      around.add(mirrored(right.get(i)));
    }
    around.add(mirrored(right.get(half - 1)));
    double[][] placed = placedAbove(around, 1);
    marks.add(new Mark.Polyline(placed[0], placed[1], stroke));
  }

  private static double[] mirrored(double[] corner) {
    return new double[] {-corner[0], corner[1]};
  }

  private double[][] placedAbove(List<double[]> corners, double side) {
    double[] xs = corners.stream().mapToDouble(corner -> x(side * corner[0])).toArray();
    double[] ys = corners.stream().mapToDouble(corner -> above(corner[1])).toArray();
    return new double[][] {xs, ys};
  }

  private void addChosenPanel(double side) {
    List<WingPanel> panels = outline.wing.panels();
    if (panel < 0 || panel >= panels.size() || panels.size() < 2) {
      return;
    }
    WingPanel one = panels.get(panel);
    double inner = outline.leadingEdge(one.from(), one.innerChord());
    double outer = outline.leadingEdge(one.to(), one.outerChord());
    double[][] corners =
        placedAbove(
            List.of(
                new double[] {one.from(), inner},
                new double[] {one.to(), outer},
                new double[] {one.to(), outer + one.outerChord()},
                new double[] {one.from(), inner + one.innerChord()}),
            side);
    marks.add(new Mark.Area(corners[0], corners[1], Ink.WING, 0.14));
  }

  private void addAileron(AileronPlace place, double side) {
    List<double[]> stations = new ArrayList<>();
    for (double y : aileronStations(place)) {
      stations.add(new double[] {y, outline.chordBehind(y) - place.chordShare() * chord(y)});
    }
    List<double[]> corners = new ArrayList<>(stations);
    for (int i = stations.size() - 1; i >= 0; i--) {
      double y = stations.get(i)[0];
      corners.add(new double[] {y, outline.chordBehind(y)});
    }
    corners.add(corners.get(0));
    double[][] placed = placedAbove(corners, side);
    Ink ink = side > 0 ? Ink.RIGHT : Ink.LEFT;
    marks.add(new Mark.Area(placed[0], placed[1], ink, 0.45));
    marks.add(
        new Mark.Polyline(
            placed[0], placed[1], new Stroke(ink, 1.2, side > 0 ? Dash.SOLID : Dash.DOTTED, 1)));
  }

  private double chord(double station) {
    return outline.chordAt(station);
  }

  /** The ends of the aileron, and the joints of panels between them. */
  private List<Double> aileronStations(AileronPlace place) {
    List<Double> stations = new ArrayList<>();
    stations.add(place.from());
    for (WingPanel one : outline.wing.panels()) {
      if (one.to() > place.from() && one.to() < place.to()) {
        stations.add(one.to());
      }
    }
    stations.add(place.to());
    return stations;
  }

  private void addBody() {
    if (outline.shape.body().isEmpty()) {
      return;
    }
    Body body = outline.shape.body().get();
    int count = 48;
    double[] xs = new double[count + 1];
    double[] ys = new double[count + 1];
    for (int i = 0; i <= count; i++) {
      double angle = 2 * Math.PI * i / count;
      double half = 0.5 * body.width() * breadth(0.5 * (1 - Math.cos(angle)));
      xs[i] = x(Math.sin(angle) < 0 ? -half : half);
      ys[i] = above(outline.bodyFront + body.length() * 0.5 * (1 - Math.cos(angle)));
    }
    double end = outline.bodyFront + body.length();
    if (end < outline.back) {
      marks.add(
          new Mark.Line(
              0.5 * width, above(end), 0.5 * width, above(outline.back), Stroke.of(Ink.WING, 3)));
    }
    marks.add(new Mark.Area(xs, ys, Ink.GROUND, 1));
    marks.add(new Mark.Area(xs, ys, Ink.WING, 0.06));
    marks.add(new Mark.Polyline(xs, ys, THIN));
  }

  /** Of the body by its largest, from nose to tail: an elliptic nose, then straight to the tail. */
  private static double breadth(double along) {
    if (along < WIDEST) {
      double ahead = 1 - along / WIDEST;
      return Math.sqrt(Math.max(0, 1 - ahead * ahead));
    }
    double behind = (along - WIDEST) / (1 - WIDEST);
    return 1 - (1 - TAIL) * Math.pow(behind, 1.4);
  }

  private void addTail() {
    outline
        .shape
        .tailplane()
        .ifPresent(
            tail -> {
              double chord = tail.area() / tail.span();
              double from = outline.centre + tail.arm() - 0.25 * chord;
              rectangle(
                  x(-0.5 * tail.span()), above(from), x(0.5 * tail.span()), above(from + chord));
            });
    outline
        .shape
        .fin()
        .ifPresent(
            fin -> {
              double chord = fin.area() / fin.span();
              double from = above(outline.centre + fin.arm() - 0.25 * chord);
              double to = above(outline.centre + fin.arm() + 0.75 * chord);
              marks.add(
                  new Mark.Line(0.5 * width, from, 0.5 * width, to, Stroke.of(Ink.FOURTH, 4)));
            });
  }

  private void rectangle(double left, double top, double right, double bottom) {
    double[] xs = {left, right, right, left, left};
    double[] ys = {top, top, bottom, bottom, top};
    marks.add(new Mark.Area(xs, ys, Ink.GROUND, 1));
    marks.add(new Mark.Area(xs, ys, Ink.WING, 0.08));
    marks.add(new Mark.Polyline(xs, ys, THIN));
  }

  private void addGhostAbove(Outline other) {
    outlineOf(other.wingAbove(), GHOST);
    other
        .shape
        .ailerons()
        .ifPresent(
            place -> {
              for (double side : new double[] {-1, 1}) {
                double from = other.chordBehind(place.from());
                double to = other.chordBehind(place.to());
                double deep = place.chordShare() * other.chordAt(place.from());
                double shallow = place.chordShare() * other.chordAt(place.to());
                double[][] placed =
                    placedAbove(
                        List.of(
                            new double[] {place.from(), from},
                            new double[] {place.from(), from - deep},
                            new double[] {place.to(), to - shallow},
                            new double[] {place.to(), to}),
                        side);
                marks.add(new Mark.Polyline(placed[0], placed[1], GHOST));
              }
            });
  }

  private void addDimensionsAbove(double lowest) {
    Wing wing = outline.wing;
    double spanLine = lowest + 46;
    across(-wing.halfSpan(), wing.halfSpan(), spanLine, "span " + length(wing.span()));
    double tipBack = outline.chordBehind(wing.halfSpan());
    tick(x(-wing.halfSpan()), above(tipBack) + 4, spanLine + 3);
    tick(x(wing.halfSpan()), above(tipBack) + 4, spanLine + 3);
    outline
        .shape
        .ailerons()
        .ifPresent(
            place -> {
              double line = lowest + 24;
              across(
                  place.from(), place.to(), line, "aileron " + length(place.to() - place.from()));
              tick(x(place.from()), above(outline.chordBehind(place.from())) + 3, line + 3);
              tick(x(place.to()), above(outline.chordBehind(place.to())) + 3, line + 3);
            });
    WingPanel last = wing.panels().get(wing.panels().size() - 1);
    along(
        x(-wing.halfSpan()) - 9,
        outline.leadingEdge(wing.halfSpan(), last.outerChord()),
        last.outerChord(),
        Anchor.START);
    WingPanel first = wing.panels().get(0);
    double body = outline.shape.body().map(Body::width).orElse(0.0);
    along(
        x(-Math.max(0.5 * body, 0.02 * wing.span())) - 8,
        outline.leadingEdge(0, first.innerChord()),
        first.innerChord(),
        Anchor.END);
    outline
        .shape
        .fin()
        .ifPresent(
            fin -> {
              double place = x(Math.max(0.5 * body, 0.02 * wing.span())) + 12;
              double from = above(outline.centre);
              double to = above(outline.centre + fin.arm());
              marks.add(new Mark.Line(place, from, place, to, MEASURE));
              marks.add(new Mark.Line(place - 3, from, place + 3, from, MEASURE));
              marks.add(new Mark.Line(place - 3, to, place + 3, to, MEASURE));
              double below = above(outline.chordBehind(0)) + 14;
              marks.add(
                  label(
                      place + 6,
                      Math.max(below, 0.5 * (from + to)),
                      "fin arm " + length(fin.arm()),
                      Anchor.START,
                      Ink.TEXT));
            });
  }

  private void tick(double x, double from, double to) {
    if (to > from) {
      marks.add(new Mark.Line(x, from, x, to, new Stroke(Ink.QUIET, 1, Dash.DOTTED, 0.8)));
    }
  }

  /** A dimension from side to side, its words in a gap of the line, or behind it. */
  private void across(double from, double to, double y, String words) {
    double left = x(from);
    double right = x(to);
    double room = TypeWidths.of(words, TypeSize.SMALL) + 10;
    double middle = 0.5 * (left + right);
    for (double end : new double[] {left, right}) {
      marks.add(new Mark.Line(end, y - 3, end, y + 3, MEASURE));
    }
    if (room < right - left) {
      marks.add(new Mark.Line(left, y, middle - 0.5 * room, y, MEASURE));
      marks.add(new Mark.Line(middle + 0.5 * room, y, right, y, MEASURE));
      marks.add(label(middle, y + 4, words, Anchor.MIDDLE, Ink.TEXT));
    } else {
      marks.add(new Mark.Line(left, y, right, y, MEASURE));
      marks.add(label(left - 6, y + 4, words, Anchor.END, Ink.TEXT));
    }
  }

  /** A chord beside its line. */
  private void along(double x, double from, double chord, Anchor anchor) {
    double top = above(from);
    double bottom = above(from + chord);
    marks.add(new Mark.Line(x, top, x, bottom, MEASURE));
    marks.add(new Mark.Line(x - 3, top, x + 3, top, MEASURE));
    marks.add(new Mark.Line(x - 3, bottom, x + 3, bottom, MEASURE));
    if (anchor == Anchor.END) {
      marks.add(label(x - 5, 0.5 * (top + bottom) + 4, length(chord), anchor, Ink.TEXT));
    } else {
      marks.add(label(Math.max(0, x - 18), top - 5, length(chord), anchor, Ink.TEXT));
    }
  }

  private void addBehind() {
    double title = behind(Math.max(outline.top, ghost.map(g -> g.top).orElse(0.0))) - 12;
    marks.add(label(0, Math.max(title, 13), "From behind", Anchor.START, Ink.QUIET));
    outline
        .shape
        .fin()
        .ifPresent(
            fin -> {
              double foot = behind(fin.height() - FIN_CENTRE * fin.span());
              double head = behind(fin.height() + (1 - FIN_CENTRE) * fin.span());
              marks.add(
                  new Mark.Line(0.5 * width, foot, 0.5 * width, head, Stroke.of(Ink.FOURTH, 4)));
            });
    outline
        .shape
        .tailplane()
        .ifPresent(
            tail -> {
              double y = behind(tail.height());
              double half = 0.5 * tail.span();
              marks.add(new Mark.Line(x(-half), y, x(half), y, Stroke.of(Ink.WING, 2.2)));
            });
    outline.shape.body().ifPresent(this::addBodyBehind);
    for (double side : new double[] {-1, 1}) {
      double[][] placed = placedBehind(outline, side);
      marks.add(new Mark.Area(placed[0], placed[1], Ink.WING, 1));
      outline
          .shape
          .ailerons()
          .ifPresent(
              place -> {
                Ink ink = side > 0 ? Ink.RIGHT : Ink.LEFT;
                List<Double> stations = aileronStations(place);
                double[] xs = stations.stream().mapToDouble(y -> x(side * y)).toArray();
                double[] ys =
                    stations.stream().mapToDouble(y -> behind(outline.heightAt(y))).toArray();
                marks.add(new Mark.Polyline(xs, ys, Stroke.of(ink, 4)));
              });
    }
  }

  private void addBodyBehind(Body body) {
    int count = 40;
    double[] xs = new double[count + 1];
    double[] ys = new double[count + 1];
    for (int i = 0; i <= count; i++) {
      double angle = 2 * Math.PI * i / count;
      xs[i] = x(0.5 * body.width() * Math.sin(angle));
      ys[i] = behind(0.5 * body.height() * Math.cos(angle));
    }
    marks.add(new Mark.Area(xs, ys, Ink.GROUND, 1));
    marks.add(new Mark.Area(xs, ys, Ink.WING, 0.16));
    marks.add(new Mark.Polyline(xs, ys, THIN));
  }

  private double[][] placedBehind(Outline which, double side) {
    List<double[]> corners = which.wingBehind();
    double[] xs = corners.stream().mapToDouble(corner -> x(side * corner[0])).toArray();
    double[] ys = corners.stream().mapToDouble(corner -> behind(corner[1])).toArray();
    return new double[][] {xs, ys};
  }

  private void addGhostBehind(Outline other) {
    for (double side : new double[] {-1, 1}) {
      List<WingPanel> panels = other.wing.panels();
      double[] xs = new double[panels.size() + 1];
      double[] ys = new double[panels.size() + 1];
      for (int i = 0; i < xs.length; i++) {
        double y = i == 0 ? 0 : panels.get(i - 1).to();
        xs[i] = x(side * y);
        ys[i] = behind(other.heightAt(y));
      }
      marks.add(new Mark.Polyline(xs, ys, GHOST));
    }
    other
        .shape
        .fin()
        .ifPresent(
            fin ->
                marks.add(
                    new Mark.Line(
                        0.5 * width + 4,
                        behind(fin.height() - FIN_CENTRE * fin.span()),
                        0.5 * width + 4,
                        behind(fin.height() + (1 - FIN_CENTRE) * fin.span()),
                        GHOST)));
  }

  private void addDimensionsBehind() {
    List<WingPanel> panels = outline.wing.panels();
    int chosen = panel >= 0 && panel < panels.size() ? panel : panels.size() - 1;
    WingPanel one = panels.get(chosen);
    double level = behind(outline.heightAt(one.from()));
    double end = x(one.to());
    if (one.dihedral() != 0) {
      marks.add(new Mark.Line(x(one.from()), level, end + 6, level, AXIS));
    }
    double lift = behind(outline.heightAt(one.to()));
    String words = "dihedral " + Ticks.figure(Math.toDegrees(one.dihedral()), 1) + "°";
    double middle = x(0.5 * (one.from() + one.to()));
    double room = 0.5 * TypeWidths.of(words, TypeSize.SMALL);
    marks.add(
        label(
            Math.min(middle, width - room),
            Math.max(level, lift) + 19,
            words,
            Anchor.MIDDLE,
            Ink.TEXT));
    outline
        .shape
        .fin()
        .ifPresent(
            fin ->
                marks.add(
                    label(
                        0.5 * width + 12,
                        behind(fin.height() + (1 - FIN_CENTRE) * fin.span()) - 3,
                        "fin " + area(fin.area()) + ", " + length(fin.height()) + " up",
                        Anchor.START,
                        Ink.TEXT)));
  }

  private String length(double metres) {
    return Ticks.figure(Quantity.toUnit(metres, unit), 2) + " " + unit;
  }

  private String area(double squareMetres) {
    String square = unit + "2";
    return Ticks.figure(Quantity.toUnit(squareMetres, square), 2) + " " + unit + "²";
  }

  private static Mark label(double x, double y, String words, Anchor anchor, Ink ink) {
    return new Mark.Label(x, y, words, anchor, TypeSize.SMALL, ink);
  }
}
