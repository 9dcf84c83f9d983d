package org.rolltrace.core.aeroplane;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * Moments of inertia about the stability axes.
 *
 * @param roll Ixx, kg m², above 0
 * @param yaw Izz, kg m², above 0; empty when not known, which leaves only held slip
 * @param product Ixz = ∫ x z dm, kg m², with Ixz² below Ixx Izz
 */
public record Inertia(double roll, OptionalDouble yaw, double product) {

  public Inertia {
    Check.positive("roll inertia, kg m2,", roll);
    Check.finite("product of inertia, kg m2,", product);
    if (yaw.isPresent()) {
      double izz = Check.positive("yaw inertia, kg m2,", yaw.getAsDouble());
      if (!(product * product < roll * izz)) {
        throw new IllegalArgumentException(
            "product of inertia is "
                + product
                + " kg m2; expected less than the root of roll times yaw inertia, "
                + Math.sqrt(roll * izz)
                + " kg m2, in size: no body has more");
      }
    } else if (product != 0) {
      throw new IllegalArgumentException(
          "product of inertia is "
              + product
              + " kg m2 without a yaw inertia; give the yaw inertia too");
    }
  }

  /**
   * Inertia about the roll axis alone, enough for held slip.
   *
   * @param roll Ixx, kg m²
   * @return the inertia
   */
  public static Inertia ofRoll(double roll) {
    return new Inertia(roll, OptionalDouble.empty(), 0);
  }

  /**
   * Inertia about the roll and yaw axes.
   *
   * @param roll Ixx, kg m²
   * @param yaw Izz, kg m²
   * @param product Ixz, kg m²
   * @return the inertia
   */
  public static Inertia of(double roll, double yaw, double product) {
    return new Inertia(roll, OptionalDouble.of(yaw), product);
  }

  /**
   * The same body about axes turned about the y axis: x' = x cos a + z sin a, so that a positive
   * angle lowers the nose of the axes. By the angle of attack, body axes become stability axes.
   *
   * <pre>
   * Ixx' = Ixx cos² a − 2 Ixz sin a cos a + Izz sin² a
   * Izz' = Ixx sin² a + 2 Ixz sin a cos a + Izz cos² a
   * Ixz' = Ixz (cos² a − sin² a) + (Ixx − Izz) sin a cos a
   * </pre>
   *
   * @param angle a, rad
   * @return the inertia; this one for an angle of 0
   * @throws IllegalArgumentException when the yaw inertia is not known
   */
  public Inertia turned(double angle) {
    if (angle == 0) {
      return this;
    }
    double izz =
        yaw.orElseThrow(
            () ->
                new IllegalArgumentException(
                    "inertias about turned axes need the yaw inertia; give it too"));
    double c = Math.cos(angle);
    double s = Math.sin(angle);
    return of(
        roll * c * c - 2 * product * s * c + izz * s * s,
        roll * s * s + 2 * product * s * c + izz * c * c,
        product * (c * c - s * s) + (roll - izz) * s * c);
  }
}
