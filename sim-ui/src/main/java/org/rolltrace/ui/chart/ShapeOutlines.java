package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;

/**
 * The outlines of an aeroplane in m, as far as its shape is known. The wing is drawn as it is; tail
 * surfaces are rectangles of their span and area; the body has its length and largest section. The
 * centre of gravity, from which the tail is measured, stands at a quarter of the mean chord, on the
 * centre line of the body. Origin: in planform the quarter-chord point of the root, from behind the
 * centre line of the body.
 */
final class ShapeOutlines {
  private static final double QUARTER = 0.25;

  /** Half the thickness of wing and tail, in chords; only to be seen. */
  private static final double HALF_THICKNESS = 0.06;

  private static final int ROUND = 24;

  private final Wing wing;
  private final Optional<Ailerons> travel;
  private final Datum datum;
  private final List<Outline> outlines = new ArrayList<>();

  /**
   * Where things that the file does not place are drawn, m behind the quarter-chord point of the
   * root: the same for the base and its variants, so that only what they change stands apart.
   *
   * @param centreOfGravity from which the tail is measured
   * @param end of the body
   */
  record Datum(double centreOfGravity, double end) {

    /** That of one shape: the body ends with the tail, or reaches back by two thirds of itself. */
    static Datum of(Geometry geometry) {
      double centre = quarterChord(geometry.wing());
      double end = Double.NEGATIVE_INFINITY;
      if (geometry.tailplane().isPresent()) {
        Tailplane tail = geometry.tailplane().get();
        end = centre + tail.arm() + 0.75 * tail.area() / tail.span();
      }
      if (geometry.fin().isPresent()) {
        Fin fin = geometry.fin().get();
        end = Math.max(end, centre + fin.arm() + 0.75 * fin.area() / fin.span());
      }
      if (!Double.isFinite(end)) {
        end = centre + 2 * geometry.body().map(Body::length).orElse(0.0) / 3;
      }
      return new Datum(centre, end);
    }

    private static double quarterChord(Wing wing) {
      double sum = 0;
      for (WingPanel panel : wing.panels()) {
        double middle = 0.5 * (panel.from() + panel.to());
        sum += 2 * panel.area() * wing.quarterChordAt(middle);
      }
      return sum / wing.area();
    }
  }

  private ShapeOutlines(Geometry geometry, Optional<Ailerons> travel, Datum datum) {
    this.datum = datum;
    this.wing = geometry.wing();
    this.travel = travel;
  }

  /** From above, nose up. */
  static List<Outline> planform(Geometry geometry, Optional<Ailerons> travel, Datum datum) {
    ShapeOutlines shape = new ShapeOutlines(geometry, travel, datum);
    geometry.body().ifPresent(shape::addBodyFromAbove);
    geometry.tailplane().ifPresent(shape::addTailplaneFromAbove);
    shape.addWingFromAbove();
    geometry.ailerons().ifPresent(shape::addAileronsFromAbove);
    geometry.fin().ifPresent(shape::addFinFromAbove);
    return shape.outlines;
  }

  /** From behind, with full right stick. */
  static List<Outline> fromBehind(Geometry geometry, Optional<Ailerons> travel, Datum datum) {
    ShapeOutlines shape = new ShapeOutlines(geometry, travel, datum);
    geometry.body().ifPresent(shape::addBodyFromBehind);
    geometry.tailplane().ifPresent(shape::addTailplaneFromBehind);
    geometry.fin().ifPresent(shape::addFinFromBehind);
    shape.addWingFromBehind();
    geometry.ailerons().ifPresent(shape::addAileronsFromBehind);
    return shape.outlines;
  }

  private void addBothSides(Outline right) {
    outlines.add(right);
    outlines.add(right.mirrored());
  }

  /** The stations between two, with those where panels meet. */
  private double[] stations(double from, double to) {
    List<Double> stations = new ArrayList<>();
    stations.add(from);
    for (double joint : wing.stations()) {
      if (joint > from && joint < to) {
        stations.add(Math.nextDown(joint)); // chords may jump
        stations.add(joint);
      }
    }
    stations.add(to);
    return stations.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** A band along the right wing between two places on the chord. */
  private Outline band(Outline.Part part, double from, double to, double fore, double aft) {
    double[] y = stations(from, Math.min(to, wing.halfSpan()));
    double[] across = new double[2 * y.length];
    double[] up = new double[2 * y.length];
    for (int i = 0; i < y.length; i++) {
      double back = wing.quarterChordAt(y[i]);
      double chord = chord(y[i]);
      across[i] = y[i];
      up[i] = -(back + (fore - QUARTER) * chord);
      across[across.length - 1 - i] = y[i];
      up[up.length - 1 - i] = -(back + (aft - QUARTER) * chord);
    }
    return new Outline(part, across, up);
  }

  private double chord(double station) {
    return wing.chordAt(station);
  }

  private void addWingFromAbove() {
    Outline right = band(Outline.Part.SURFACE, 0, wing.halfSpan(), 0, 1);
    Outline left = right.mirrored();
    // One outline, without a line along the middle.
    int count = right.across().length;
    double[] across = new double[2 * count];
    double[] up = new double[2 * count];
    for (int i = 0; i < count; i++) {
      across[i] = right.across()[i];
      up[i] = right.up()[i];
      across[count + i] = left.across()[count - 1 - i];
      up[count + i] = left.up()[count - 1 - i];
    }
    outlines.add(new Outline(Outline.Part.SURFACE, across, up));
  }

  private void addAileronsFromAbove(AileronPlace place) {
    addBothSides(band(Outline.Part.AILERON, place.from(), place.to(), 1 - place.chordShare(), 1));
  }

  private void addTailplaneFromAbove(Tailplane tail) {
    double chord = tail.area() / tail.span();
    double quarter = datum.centreOfGravity() + tail.arm();
    outlines.add(
        box(
            Outline.Part.SURFACE,
            0.5 * tail.span(),
            -(quarter + 0.75 * chord),
            -(quarter - QUARTER * chord)));
  }

  private void addFinFromAbove(Fin fin) {
    double chord = fin.area() / fin.span();
    double quarter = datum.centreOfGravity() + fin.arm();
    outlines.add(
        box(
            Outline.Part.SURFACE,
            HALF_THICKNESS * chord,
            -(quarter + 0.75 * chord),
            -(quarter - QUARTER * chord)));
  }

  private static Outline box(Outline.Part part, double half, double low, double high) {
    return new Outline(
        part, new double[] {-half, half, half, -half}, new double[] {low, low, high, high});
  }

  private void addBodyFromAbove(Body body) {
    double nose = datum.end() - body.length();
    // Half widths at parts of the length: a round nose, a long tail.
    double[][] frames = {
      {0, 0.12},
      {0.03, 0.45},
      {0.08, 0.7},
      {0.16, 0.9},
      {0.26, 1},
      {0.42, 1},
      {0.6, 0.75},
      {0.8, 0.42},
      {1, 0.14},
    };
    int count = frames.length;
    double[] across = new double[2 * count];
    double[] up = new double[2 * count];
    for (int i = 0; i < count; i++) {
      double half = 0.5 * body.width() * frames[i][1];
      double place = -(nose + body.length() * frames[i][0]);
      across[i] = half;
      up[i] = place;
      across[2 * count - 1 - i] = -half;
      up[2 * count - 1 - i] = place;
    }
    outlines.add(new Outline(Outline.Part.BODY, across, up));
  }

  private void addBodyFromBehind(Body body) {
    double[] across = new double[ROUND];
    double[] up = new double[ROUND];
    for (int i = 0; i < ROUND; i++) {
      double angle = 2 * Math.PI * i / ROUND;
      across[i] = 0.5 * body.width() * Math.sin(angle);
      up[i] = 0.5 * body.height() * Math.cos(angle);
    }
    outlines.add(new Outline(Outline.Part.BODY, across, up));
  }

  private void addTailplaneFromBehind(Tailplane tail) {
    double half = HALF_THICKNESS * tail.area() / tail.span();
    outlines.add(
        box(Outline.Part.SURFACE, 0.5 * tail.span(), tail.height() - half, tail.height() + half));
  }

  private void addFinFromBehind(Fin fin) {
    outlines.add(
        box(
            Outline.Part.SURFACE,
            HALF_THICKNESS * fin.area() / fin.span(),
            fin.height() - 0.5 * fin.span(),
            fin.height() + 0.5 * fin.span()));
  }

  /** The middle of the wing above the centre line of the body. */
  private double heightAt(double station) {
    double height = wing.height();
    for (WingPanel panel : wing.panels()) {
      double to = Math.min(station, panel.to());
      if (to > panel.from()) {
        height += (to - panel.from()) * Math.tan(panel.dihedral());
      }
    }
    return height;
  }

  private void addWingFromBehind() {
    double[] y = stations(0, wing.halfSpan());
    int count = y.length;
    double[] across = new double[4 * count];
    double[] up = new double[4 * count];
    for (int i = 0; i < count; i++) {
      double height = heightAt(y[i]);
      double half = HALF_THICKNESS * chord(y[i]);
      int[] places = {count + i, 3 * count - 1 - i, count - 1 - i, 3 * count + i};
      across[places[0]] = y[i];
      up[places[0]] = height + half;
      across[places[1]] = y[i];
      up[places[1]] = height - half;
      across[places[2]] = -y[i];
      up[places[2]] = height + half;
      across[places[3]] = -y[i];
      up[places[3]] = height - half;
    }
    outlines.add(new Outline(Outline.Part.SURFACE, across, up));
  }

  private void addAileronsFromBehind(AileronPlace place) {
    double upwards = travel.map(Ailerons::up).orElse(0.0);
    double downwards = travel.map(Ailerons::down).orElse(0.0);
    outlines.add(deflected(place, upwards));
    outlines.add(deflected(place, -downwards).mirrored());
  }

  /** From the hinge to the trailing edge, turned up. */
  private Outline deflected(AileronPlace place, double angle) {
    double[] y = stations(place.from(), Math.min(place.to(), wing.halfSpan()));
    double[] across = new double[2 * y.length];
    double[] up = new double[2 * y.length];
    for (int i = 0; i < y.length; i++) {
      double height = heightAt(y[i]);
      across[i] = y[i];
      up[i] = height;
      across[across.length - 1 - i] = y[i];
      up[up.length - 1 - i] = height + place.chordShare() * chord(y[i]) * Math.sin(angle);
    }
    return new Outline(Outline.Part.AILERON, across, up);
  }
}
