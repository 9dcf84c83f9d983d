package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * The travel of the rudder from neutral to its stops.
 *
 * @param left travel trailing edge left (left pedal), rad, above 0 and up to ½π
 * @param right travel trailing edge right (right pedal), rad, above 0 and up to ½π
 * @param dynamics how fast the rudder follows the pedals
 */
public record Rudder(double left, double right, SurfaceDynamics dynamics) {

  public Rudder {
    Check.positive("rudder travel left, rad,", left);
    Check.inRange("rudder travel left, rad,", left, 0, Math.PI / 2);
    Check.positive("rudder travel right, rad,", right);
    Check.inRange("rudder travel right, rad,", right, 0, Math.PI / 2);
  }

  /**
   * A rudder that follows the pedals at once.
   *
   * @param left travel trailing edge left, rad
   * @param right travel trailing edge right, rad
   * @return the rudder
   */
  public static Rudder of(double left, double right) {
    return new Rudder(left, right, SurfaceDynamics.DIRECT);
  }
}
