package org.rolltrace.core.derivatives;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;

/** Points and weights on pieces of an interval, the Gauss rule of sixteen points on each. */
final class GaussRule {
  private static final int POINTS = 16;
  private static final GaussIntegrator UNIT = new GaussIntegratorFactory().legendre(POINTS);

  private final double[] points;
  private final double[] weights;

  private GaussRule(double[] points, double[] weights) {
    this.points = points;
    this.weights = weights;
  }

  /**
   * A rule for what oscillates.
   *
   * @param ends where pieces begin and end, falling or rising
   * @param longest no piece is longer; sixteen points follow cos kx to rounding over 16/k
   */
  static GaussRule over(double[] ends, double longest) {
    int pieces = 0;
    int[] split = new int[ends.length - 1];
    for (int i = 0; i < split.length; i++) {
      split[i] = Math.max(1, (int) Math.ceil(Math.abs(ends[i + 1] - ends[i]) / longest));
      pieces += split[i];
    }
    double[] points = new double[pieces * POINTS];
    double[] weights = new double[points.length];
    int next = 0;
    for (int i = 0; i < split.length; i++) {
      double length = (ends[i + 1] - ends[i]) / split[i];
      for (int k = 0; k < split[i]; k++) {
        double middle = ends[i] + (k + 0.5) * length;
        for (int g = 0; g < POINTS; g++) {
          points[next] = middle + 0.5 * length * UNIT.getPoint(g);
          weights[next++] = 0.5 * Math.abs(length) * UNIT.getWeight(g);
        }
      }
    }
    return new GaussRule(points, weights);
  }

  int size() {
    return points.length;
  }

  double point(int i) {
    return points[i];
  }

  double weight(int i) {
    return weights[i];
  }
}
