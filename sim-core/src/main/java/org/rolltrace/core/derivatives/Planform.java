package org.rolltrace.core.derivatives;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import org.rolltrace.core.aeroplane.Wing;

/**
 * What the wing theories see of a wing: the right half of it as functions of the distance y from
 * the plane of symmetry.
 */
final class Planform {
  private final double halfSpan;
  private final double area;
  private final double[] stations;
  private final DoubleUnaryOperator chord;
  private final DoubleUnaryOperator liftSlope;
  private final DoubleUnaryOperator quarterChord;

  /**
   * A planform.
   *
   * @param halfSpan b/2, m
   * @param area S of both sides, m²
   * @param stations from 0 to the tip, m, rising; between two of them all functions are smooth,
   *     also the incidences that a theory is asked about
   * @param chord c, m, above 0 inside the tip
   * @param liftSlope a0 of the sections in incompressible flow, 1/rad
   * @param quarterChord how far the quarter-chord line lies behind that of the root, m
   */
  Planform(
      double halfSpan,
      double area,
      double[] stations,
      DoubleUnaryOperator chord,
      DoubleUnaryOperator liftSlope,
      DoubleUnaryOperator quarterChord) {
    this.halfSpan = halfSpan;
    this.area = area;
    this.stations = stations;
    this.chord = chord;
    this.liftSlope = liftSlope;
    this.quarterChord = quarterChord;
  }

  /** The planform of a wing, with further stations where an incidence jumps. */
  static Planform of(Wing wing, double... jumps) {
    return new Planform(
        wing.halfSpan(),
        wing.area(),
        rising(wing, jumps),
        wing::chordAt,
        station -> wing.panelAt(station).section().liftSlope(),
        wing::quarterChordAt);
  }

  private static double[] rising(Wing wing, double[] jumps) {
    double[] all =
        DoubleStream.concat(DoubleStream.of(wing.stations()), DoubleStream.of(jumps))
            .filter(station -> station <= wing.halfSpan())
            .sorted()
            .toArray();
    int kept = 1;
    for (int i = 1; i < all.length; i++) {
      if (all[i] - all[kept - 1] > Wing.JOINT) {
        all[kept++] = all[i];
      }
    }
    double[] stations = Arrays.copyOf(all, kept);
    stations[kept - 1] = wing.halfSpan();
    return stations;
  }

  double halfSpan() {
    return halfSpan;
  }

  double span() {
    return 2 * halfSpan;
  }

  /** Not to be changed. */
  double[] stations() {
    return stations;
  }

  DoubleUnaryOperator chord() {
    return chord;
  }

  DoubleUnaryOperator liftSlope() {
    return liftSlope;
  }

  DoubleUnaryOperator quarterChord() {
    return quarterChord;
  }

  double aspectRatio() {
    return span() * span() / area;
  }

  /** θ of a station, from 0 at the tip to π/2 at the root. */
  double theta(double station) {
    return Math.acos(Math.min(1, station / halfSpan));
  }
}
