package org.rolltrace.core.derivatives;

import java.util.function.DoubleUnaryOperator;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.DecompositionSolver;
import org.hipparchus.linear.LUDecomposition;

/**
 * The lifting surface in its simplest form: strips of constant circulation bound at their quarter
 * chord, each with its two trailing vortices, and the flow made to follow the section at three
 * quarters of the chord in the middle of each strip (J. Weissinger, NACA TM 1120, 1947, from
 * memory). Unlike the lifting line it knows the chordwise extent of the wing and its sweep.
 *
 * <p>A section whose slope differs from 2π adds (1/a0 − 1/2π) c_l to the incidence that it needs.
 * Compressible flow by Prandtl and Glauert: lengths along the flight by √(1 − M²). Incidences that
 * jump inside a strip are averaged over it, so that the error falls with the square of the width.
 */
final class LiftingSurface implements WingTheory {
  /** Strips of the half wing. */
  static final int STRIPS = 60;

  private final Planform planform;
  private final int strips;
  private final double[] edges;
  private final double[] middles;
  private final GaussRule[] means;
  private final DecompositionSolver symmetric;
  private final DecompositionSolver antisymmetric;

  /**
   * The theory of one wing at one Mach number.
   *
   * @param planform the wing
   * @param mach of the flight, 0 or more and below 1
   * @param strips of the half wing
   */
  LiftingSurface(Planform planform, double mach, int strips) {
    this.planform = planform;
    this.strips = strips;
    this.edges = new double[strips + 1];
    this.middles = new double[strips];
    for (int j = 0; j <= strips; j++) {
      edges[j] = planform.halfSpan() * Math.cos(angle(j));
    }
    for (int j = 0; j < strips; j++) {
      middles[j] = planform.halfSpan() * Math.cos(angle(j + 0.5));
    }
    edges[strips] = 0;
    this.means = means();
    double compression = Math.sqrt(1 - mach * mach);
    double[][] even = new double[strips][strips];
    double[][] odd = new double[strips][strips];
    fill(compression, even, odd);
    this.symmetric = new LUDecomposition(new Array2DRowRealMatrix(even, false)).getSolver();
    this.antisymmetric = new LUDecomposition(new Array2DRowRealMatrix(odd, false)).getSolver();
  }

  static LiftingSurface of(Planform planform, double mach) {
    return new LiftingSurface(planform, mach, STRIPS);
  }

  private double angle(double strip) {
    return 0.5 * Math.PI * strip / strips;
  }

  /** The rule by which an incidence is averaged over each strip. */
  private GaussRule[] means() {
    GaussRule[] rules = new GaussRule[strips];
    for (int j = 0; j < strips; j++) {
      double outer = edges[j];
      double inner = edges[j + 1];
      double[] inside =
          java.util.Arrays.stream(planform.stations())
              .filter(station -> station > inner && station < outer)
              .toArray();
      double[] ends = new double[inside.length + 2];
      ends[0] = inner;
      System.arraycopy(inside, 0, ends, 1, inside.length);
      ends[ends.length - 1] = outer;
      rules[j] = inside.length == 0 ? null : GaussRule.over(ends, planform.halfSpan());
    }
    return rules;
  }

  /** The upwash of each strip's vortex, and of its image on the left, at each control point. */
  private void fill(double compression, double[][] even, double[][] odd) {
    double[] bound = new double[strips + 1];
    for (int j = 0; j <= strips; j++) {
      bound[j] = planform.quarterChord().applyAsDouble(edges[j]) / compression;
    }
    for (int i = 0; i < strips; i++) {
      double y = middles[i];
      double chord = planform.chord().applyAsDouble(y);
      double x = (planform.quarterChord().applyAsDouble(y) + 0.5 * chord) / compression;
      for (int j = 0; j < strips; j++) {
        double here = -upwash(x, y, bound[j + 1], edges[j + 1], bound[j], edges[j]);
        double there = -upwash(x, y, bound[j], -edges[j], bound[j + 1], -edges[j + 1]);
        even[i][j] = here + there;
        odd[i][j] = here - there;
      }
      double slope = planform.liftSlope().applyAsDouble(y);
      double more = compression * (1 / slope - 0.5 / Math.PI) * 2 / chord;
      even[i][i] += more;
      odd[i][i] += more;
    }
  }

  /**
   * The upward velocity at a point by a vortex of unit strength that comes from far behind to the
   * left end, goes to the right end and back (Biot and Savart).
   */
  private static double upwash(
      double x, double y, double xLeft, double yLeft, double xRight, double yRight) {
    double ax = x - xLeft;
    double ay = y - yLeft;
    double bx = x - xRight;
    double by = y - yRight;
    double ra = Math.sqrt(ax * ax + ay * ay);
    double rb = Math.sqrt(bx * bx + by * by);
    double trailing = (1 + bx / rb) / by - (1 + ax / ra) / ay;
    double across = ax * by - bx * ay;
    double sx = xRight - xLeft;
    double sy = yRight - yLeft;
    // In line with the bound vortex there is nothing of it.
    double ofBound =
        Math.abs(across) < 1e-12 * (ra * rb)
            ? 0
            : ((sx * ax + sy * ay) / ra - (sx * bx + sy * by) / rb) / across;
    return (trailing + ofBound) / (4 * Math.PI);
  }

  @Override
  public SpanLoading symmetric(DoubleUnaryOperator incidence) {
    return solve(incidence, symmetric, 1);
  }

  @Override
  public SpanLoading antisymmetric(DoubleUnaryOperator incidence) {
    return solve(incidence, antisymmetric, 2);
  }

  private SpanLoading solve(DoubleUnaryOperator incidence, DecompositionSolver solver, int first) {
    double[] right = new double[strips];
    for (int j = 0; j < strips; j++) {
      right[j] = mean(incidence, j);
    }
    double[] circulation = solver.solve(new ArrayRealVector(right, false)).toArray();
    // Strips of even width in θ: the sine series through their middles is exact.
    double[] series = new double[2 * strips];
    for (int n = first; n < series.length; n += 2) {
      double sum = 0;
      for (int j = 0; j < strips; j++) {
        sum += circulation[j] * Math.sin(n * angle(j + 0.5));
      }
      series[n] = sum / (planform.span() * strips);
    }
    return SpanLoading.of(planform.aspectRatio(), series);
  }

  private double mean(DoubleUnaryOperator incidence, int strip) {
    GaussRule rule = means[strip];
    if (rule == null) {
      return incidence.applyAsDouble(middles[strip]);
    }
    double sum = 0;
    double width = 0;
    for (int i = 0; i < rule.size(); i++) {
      sum += rule.weight(i) * incidence.applyAsDouble(rule.point(i));
      width += rule.weight(i);
    }
    return sum / width;
  }
}
