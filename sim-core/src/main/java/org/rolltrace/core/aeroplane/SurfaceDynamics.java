package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * How fast a surface follows its control: a largest rate, then a first-order lag.
 *
 * @param rateLimit the largest rate of the surface, rad/s, above 0; positive infinity for none
 * @param lag the time constant of the first-order lag, s; 0 for none, else at least {@value
 *     #SHORTEST_LAG}
 */
public record SurfaceDynamics(double rateLimit, double lag) {

  /** A lag below this is none that anyone could see, and makes the equations stiff, s. */
  public static final double SHORTEST_LAG = 1e-4;

  /** A surface that moves with its control, as cables and rods make it. */
  public static final SurfaceDynamics DIRECT = new SurfaceDynamics(Double.POSITIVE_INFINITY, 0);

  public SurfaceDynamics {
    if (!(rateLimit > 0)) {
      throw new IllegalArgumentException(
          "rate limit, rad/s, is " + rateLimit + "; expected a number above 0, or none at all");
    }
    Check.notNegative("lag, s,", lag);
    if (lag > 0 && lag < SHORTEST_LAG) {
      throw new IllegalArgumentException(
          "lag is " + lag + " s; expected 0 for none, or at least " + SHORTEST_LAG + " s");
    }
  }

  /**
   * Whether the surface is always exactly where its control puts it.
   *
   * @return true without rate limit and lag
   */
  public boolean isDirect() {
    return rateLimit == Double.POSITIVE_INFINITY && lag == 0;
  }
}
