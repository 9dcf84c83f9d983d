package org.rolltrace.core.motion;

import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.StallingWing;

/** The rolling moment that a wing makes when sections of it stall, beside the linear one. */
public final class StalledRoll {
  private final StallingWing wing;
  private final double scale;
  private final double perRate;
  private final double damping;

  private StalledRoll(StallingWing wing, double scale, double perRate, double damping) {
    this.wing = wing;
    this.scale = scale;
    this.perRate = perRate;
    this.damping = damping;
  }

  /**
   * The moment of an aeroplane in a condition.
   *
   * @param wing its wing
   * @param aeroplane span and area
   * @param derivatives the linear damping
   * @param condition speed and density
   * @return the moment
   */
  public static StalledRoll of(
      StallingWing wing,
      Aeroplane aeroplane,
      LateralDerivatives derivatives,
      FlightCondition condition) {
    return new StalledRoll(
        wing,
        condition.dynamicPressure() * aeroplane.wingArea() * aeroplane.span(),
        aeroplane.span() / (2 * condition.trueAirspeed()),
        derivatives.value(Coefficient.CL_P));
  }

  /**
   * The moment, q̄ S b ΔCl.
   *
   * @param rollRate p, rad/s
   * @param yawRate r, rad/s
   * @param sideslip β, rad
   * @param aileron δa, rad
   * @return N m, positive right wing down; 0 while no section is beyond its stall
   */
  public double moment(double rollRate, double yawRate, double sideslip, double aileron) {
    return scale * wing.lost(perRate * rollRate, perRate * yawRate, sideslip, aileron);
  }

  /**
   * Whether rolling takes more from the stalled sections than the rest of the wing damps, ΔCl(p) −
   * ΔCl(0) ≥ −Cl_p pb/2V in the direction of the roll: the wing goes on by itself.
   *
   * @param rollRate p, rad/s
   * @param yawRate r, rad/s
   * @param sideslip β, rad
   * @param aileron δa, rad
   * @return true when it does; false at rest in roll
   */
  public boolean isDampingLost(double rollRate, double yawRate, double sideslip, double aileron) {
    double rolling = perRate * rollRate;
    double byRolling =
        wing.lost(rolling, perRate * yawRate, sideslip, aileron)
            - wing.lost(0, perRate * yawRate, sideslip, aileron);
    return rolling != 0 && (byRolling + damping * rolling) * rolling >= 0;
  }
}
