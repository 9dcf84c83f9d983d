package org.rolltrace.core.controls;

import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.quantity.Check;

/**
 * One cockpit control and the surface it moves.
 *
 * @param angleAtPlus surface angle with the control at +1, rad
 * @param angleAtMinus surface angle with the control at −1, rad, of the other sign
 * @param dynamics how fast the surface follows
 */
public record ControlRun(double angleAtPlus, double angleAtMinus, SurfaceDynamics dynamics) {

  public ControlRun {
    Check.finite("surface angle at +1, rad,", angleAtPlus);
    Check.finite("surface angle at -1, rad,", angleAtMinus);
    if (!(angleAtPlus * angleAtMinus < 0)) {
      throw new IllegalArgumentException(
          "surface angles at the ends are "
              + angleAtPlus
              + " and "
              + angleAtMinus
              + " rad; expected opposite signs");
    }
  }

  /**
   * The stick and the ailerons.
   *
   * @param ailerons their travel
   * @return the run
   */
  public static ControlRun of(Ailerons ailerons) {
    return new ControlRun(ailerons.fullAngle(), -ailerons.fullAngle(), ailerons.dynamics());
  }

  /**
   * The pedals and the rudder.
   *
   * @param rudder its travel
   * @return the run
   */
  public static ControlRun of(Rudder rudder) {
    return new ControlRun(-rudder.right(), rudder.left(), rudder.dynamics());
  }

  /**
   * The control against its stops.
   *
   * @param position where the hand wants it, fraction of travel
   * @return the position, not beyond −1 or 1
   */
  public static double atStops(double position) {
    return position > 1 ? 1 : position < -1 ? -1 : position;
  }

  /**
   * The angle that a position of the control asks for.
   *
   * @param position fraction of travel; beyond a stop it counts as the stop
   * @return surface angle, rad
   */
  public double angleAt(double position) {
    double held = atStops(position);
    return 0.0 + (held >= 0 ? angleAtPlus : -angleAtMinus) * held; // no -0
  }

  /**
   * The rate of the angle that a moving control asks for.
   *
   * @param position fraction of travel
   * @param rate fraction of travel per second
   * @return rad/s; 0 beyond a stop
   */
  public double angleRateAt(double position, double rate) {
    if (Math.abs(position) > 1 || (Math.abs(position) == 1 && position * rate > 0)) {
      return 0;
    }
    boolean plusSide = position > 0 || (position == 0 && rate >= 0);
    return (plusSide ? angleAtPlus : -angleAtMinus) * rate;
  }

  /**
   * The position that gives an angle, as if there were no stops.
   *
   * @param angle surface angle, rad
   * @return fraction of travel; beyond ±1 when the travel is not enough
   */
  public double positionFor(double angle) {
    double position = angle / angleAtPlus;
    return position > 0 ? position : 0.0 - angle / angleAtMinus;
  }
}
