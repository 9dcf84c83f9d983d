package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * The travel of each aileron from neutral to its stops. With up and down unequal the ailerons are
 * differential; the aileron angle δa = ½(left down − right down) then reaches the mean of the two.
 *
 * @param up travel trailing edge up, rad, above 0 and up to ½π
 * @param down travel trailing edge down, rad, from 0 to ½π
 * @param dynamics how fast the ailerons follow the stick
 */
public record Ailerons(double up, double down, SurfaceDynamics dynamics) {

  public Ailerons {
    Check.positive("aileron travel up, rad,", up);
    Check.inRange("aileron travel up, rad,", up, 0, Math.PI / 2);
    Check.inRange("aileron travel down, rad,", down, 0, Math.PI / 2);
  }

  /**
   * Ailerons that follow the stick at once.
   *
   * @param up travel trailing edge up, rad
   * @param down travel trailing edge down, rad
   * @return the ailerons
   */
  public static Ailerons of(double up, double down) {
    return new Ailerons(up, down, SurfaceDynamics.DIRECT);
  }

  /**
   * The aileron angle at full stick.
   *
   * @return ½(up + down), rad
   */
  public double fullAngle() {
    return 0.5 * (up + down);
  }
}
