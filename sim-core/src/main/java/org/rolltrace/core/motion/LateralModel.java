package org.rolltrace.core.motion;

import static org.rolltrace.core.derivatives.Coefficient.*;

import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.LateralImbalance;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.propeller.PropellerMoments;

/**
 * The dimensional constants of one aeroplane in one condition.
 *
 * @param speed V, true airspeed, m/s
 * @param loadFactor n
 * @param flightPathAngle γ, rad
 * @param mass m, kg; empty when not known
 * @param inertia kg m², with a lateral imbalance
 * @param sideForce Y, N
 * @param rollMoment L, N m, with the propeller's and that of a lateral imbalance
 * @param yawMoment N, N m, with the propeller's
 */
public record LateralModel(
    double speed,
    double loadFactor,
    double flightPathAngle,
    OptionalDouble mass,
    Inertia inertia,
    LinearLoad sideForce,
    LinearLoad rollMoment,
    LinearLoad yawMoment) {

  /**
   * Works out the constants.
   *
   * @param aeroplane span, area, mass and inertia
   * @param derivatives non-dimensional derivatives
   * @param condition speed and density
   * @param propeller the moments that its propellers make all the time; a lateral imbalance of the
   *     aeroplane adds n g m_f y_f in roll
   * @return the constants
   */
  public static LateralModel of(
      Aeroplane aeroplane,
      LateralDerivatives derivatives,
      FlightCondition condition,
      PropellerMoments propeller) {
    double force = condition.dynamicPressure() * aeroplane.wingArea();
    double moment = force * aeroplane.span();
    double perRate = aeroplane.span() / (2 * condition.trueAirspeed());
    double weightOnOneSide =
        condition.loadFactor()
            * FlightCondition.STANDARD_GRAVITY
            * aeroplane.imbalance().map(LateralImbalance::massMoment).orElse(0.0);
    double constantRoll = propeller.roll() + weightOnOneSide;
    double constantYaw = propeller.yaw();
    return new LateralModel(
        condition.trueAirspeed(),
        condition.loadFactor(),
        condition.flightPathAngle(),
        aeroplane.mass(),
        aeroplane.loadedInertia(),
        load(derivatives, force, perRate, 0, CY_BETA, CY_P, CY_R, CY_DA, CY_DR),
        load(derivatives, moment, perRate, constantRoll, CL_BETA, CL_P, CL_R, CL_DA, CL_DR),
        load(derivatives, moment, perRate, constantYaw, CN_BETA, CN_P, CN_R, CN_DA, CN_DR));
  }

  private static LinearLoad load(
      LateralDerivatives derivatives,
      double scale,
      double perRate,
      double constant,
      Coefficient beta,
      Coefficient p,
      Coefficient r,
      Coefficient da,
      Coefficient dr) {
    return new LinearLoad(
        scale * derivatives.value(beta),
        scale * perRate * derivatives.value(p),
        scale * perRate * derivatives.value(r),
        scale * derivatives.value(da),
        scale * derivatives.value(dr),
        constant);
  }

  /**
   * What is missing for sideslip and yaw to be worked out.
   *
   * @return words such as "mass, yaw inertia"; empty when nothing is missing
   */
  public String missingForSlip() {
    if (mass.isEmpty()) {
      return inertia.yaw().isEmpty() ? "mass and yaw inertia" : "mass";
    }
    return inertia.yaw().isEmpty() ? "yaw inertia" : "";
  }

  /**
   * The root of the one-degree-of-freedom roll equation, L_p = q̄ S b² Cl_p/(2 V Ixx).
   *
   * @return 1/s, negative for a damped roll
   */
  public double rollDampingRoot() {
    return rollMoment.perRollRate() / inertia.roll();
  }

  double massForSlip() {
    return mass.orElseThrow(
        () -> new IllegalArgumentException("a sideslip needs the mass" + stillMissing()));
  }

  double yawInertiaForSlip() {
    return inertia
        .yaw()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "settled and free slip need mass and yaw inertia" + stillMissing()));
  }

  private String stillMissing() {
    return "; missing: " + missingForSlip();
  }

  /** g/V, 1/s. */
  double gravityOverSpeed() {
    return FlightCondition.STANDARD_GRAVITY / speed;
  }
}
