package org.rolltrace.core.derivatives;

/**
 * What a hinged flap does to the lift of its section.
 *
 * <p>τ is the incidence that would lift as much as a unit of flap angle: for a thin section τ = 1 −
 * (θ − sin θ)/π with cos θ = 2E − 1, E the chord share of the flap (H. Glauert, The Elements of
 * Aerofoil and Airscrew Theory, 1926, from memory). Real flaps do less, and less at large angles,
 * where the flow leaves them.
 */
final class FlapFactor {
  /** Up to here the table below is known, rad. */
  static final double LARGEST = Math.toRadians(40);

  private static final double[] ANGLES = {0, 10, 20, 30, 40};

  /**
   * What is left of the thin-section value for a plain flap at these angles, deg. From memory,
   * after charts such as B.W. McCormick's (Aerodynamics, Aeronautics, and Flight Mechanics, 2nd ed.
   * 1995, ch. 3); about 10 % either way, by gap and section.
   */
  private static final double[] LEFT = {0.85, 0.85, 0.70, 0.58, 0.50};

  private FlapFactor() {}

  /**
   * The factor of thin-aerofoil theory.
   *
   * @param chordShare E, above 0 and up to 1
   * @return τ
   */
  static double thin(double chordShare) {
    double theta = Math.acos(2 * chordShare - 1);
    return 1 - (theta - Math.sin(theta)) / Math.PI;
  }

  /**
   * What of the thin-aerofoil factor is left.
   *
   * @param deflection of the flap, rad, either way; beyond {@link #LARGEST} the last value holds
   * @return a share, at most 1
   */
  static double left(double deflection) {
    double degrees = Math.abs(Math.toDegrees(deflection));
    for (int i = 1; i < ANGLES.length; i++) {
      if (degrees <= ANGLES[i]) {
        double share = (degrees - ANGLES[i - 1]) / (ANGLES[i] - ANGLES[i - 1]);
        return LEFT[i - 1] + share * (LEFT[i] - LEFT[i - 1]);
      }
    }
    return LEFT[LEFT.length - 1];
  }
}
