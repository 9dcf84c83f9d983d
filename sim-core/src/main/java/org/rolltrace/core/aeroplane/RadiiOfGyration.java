package org.rolltrace.core.aeroplane;

/**
 * Moments of inertia when nothing better is known: radii of gyration as propeller aeroplanes with
 * one engine in the nose usually have them, k_x = 0.25 b/2 and k_z = 0.39 (b + l)/4 (J. Roskam,
 * Airplane Design, part V, 1985, app. B, from memory). Real aeroplanes lie within a fifth of these
 * moments either way, those with engines or fuel far out further.
 */
public final class RadiiOfGyration {
  private static final double ROLL = 0.25;
  private static final double YAW = 0.39;

  private RadiiOfGyration() {}

  /**
   * The moments of an ordinary aeroplane.
   *
   * @param mass m, kg, above 0
   * @param span b, m, above 0
   * @param length l, m, above 0
   * @return the inertia, without a product
   */
  public static Inertia inertia(double mass, double span, double length) {
    double roll = ROLL * span / 2;
    double yaw = YAW * (span + length) / 4;
    return Inertia.of(mass * roll * roll, mass * yaw * yaw, 0);
  }
}
