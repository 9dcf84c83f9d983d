package org.rolltrace.core.propeller;

import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.quantity.Check;

/**
 * One propeller in flight: how fast it turns and what it does to the airframe, for any part of the
 * rated power. The package page has the equations.
 */
public final class TurningPropeller {
  private final Propeller propeller;
  private final double airspeed;

  /** Ω at rated power, rad/s. */
  private final double ratedSpeed;

  /** (Ω/Ω_rated)³ without power; 1 where the speed is constant. */
  private final double cubeWithoutPower;

  private final double torqueReaction;
  private final double momentum;
  private final double yawPerPower;

  private TurningPropeller(Propeller propeller, double airspeed, double speed, double atShare) {
    this.propeller = propeller;
    this.airspeed = airspeed;
    double without = propeller.speedWithoutPower().orElse(1);
    this.cubeWithoutPower = without * without * without;
    this.ratedSpeed = speed / Math.cbrt(cube(atShare));
    this.torqueReaction = -propeller.rotation().sense() * (1 - propeller.straightened());
    this.momentum = propeller.momentumPerSpeed();
    this.yawPerPower = -propeller.efficiency().orElse(0) * propeller.position().y() / airspeed;
  }

  /**
   * A propeller that turns with the speed that it has of itself.
   *
   * @param propeller what it is; its speed must be given
   * @param airspeed V, true, m/s, above 0
   * @return the propeller in flight
   * @throws IllegalArgumentException when the propeller has no speed
   */
  public static TurningPropeller of(Propeller propeller, double airspeed) {
    double speed =
        propeller
            .speed()
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        "the propeller "
                            + propeller.name()
                            + " has no speed; expected one of its own, or one at the power"));
    return of(propeller, airspeed, speed, 1);
  }

  /**
   * A propeller whose speed is known at some power.
   *
   * @param propeller what it is
   * @param airspeed V, true, m/s, above 0
   * @param speed Ω, rad/s, above 0
   * @param atShare the part of the rated power at which it is known, 0 or more
   * @return the propeller in flight
   */
  public static TurningPropeller of(
      Propeller propeller, double airspeed, double speed, double atShare) {
    Check.positive("true airspeed, m/s,", airspeed);
    Check.positive("propeller speed, rad/s,", speed);
    Check.notNegative("part of the rated power", atShare);
    return new TurningPropeller(propeller, airspeed, speed, atShare);
  }

  /** (Ω/Ω_rated)³. */
  private double cube(double share) {
    return cubeWithoutPower + (1 - cubeWithoutPower) * share;
  }

  /**
   * What it is.
   *
   * @return the propeller
   */
  public Propeller propeller() {
    return propeller;
  }

  /**
   * How fast it turns.
   *
   * @param share part of the rated power
   * @return Ω, rad/s
   */
  public double speed(double share) {
    return propeller.isFixedPitch() ? ratedSpeed * Math.cbrt(cube(share)) : ratedSpeed;
  }

  /**
   * How fast it turns up.
   *
   * @param share part of the rated power
   * @param shareRate its rate, 1/s
   * @return dΩ/dt, rad/s²; 0 where the speed is constant
   */
  public double speedRate(double share, double shareRate) {
    if (shareRate == 0 || !propeller.isFixedPitch()) {
      return 0;
    }
    double cube = cube(share);
    return speed(share) * (1 - cubeWithoutPower) * shareRate / (3 * cube);
  }

  /**
   * The power it takes.
   *
   * @param share part of the rated power
   * @return P, W
   */
  public double power(double share) {
    return share * propeller.engine().ratedPower();
  }

  /**
   * The torque it takes.
   *
   * @param share part of the rated power
   * @return Q = P/Ω, N m
   */
  public double torque(double share) {
    return power(share) / speed(share);
  }

  /**
   * Its thrust along the flight path.
   *
   * @param share part of the rated power
   * @return T = η P/V, N; empty when the efficiency is not known
   */
  public OptionalDouble thrust(double share) {
    OptionalDouble efficiency = propeller.efficiency();
    return efficiency.isPresent()
        ? OptionalDouble.of(efficiency.getAsDouble() * power(share) / airspeed)
        : OptionalDouble.empty();
  }

  /**
   * Its moment on the airframe in roll.
   *
   * @param share part of the rated power
   * @param shareRate its rate, 1/s
   * @return −s (1 − κ) Q − Σ s J dω/dt, N m, positive right wing down
   */
  public double rollMoment(double share, double shareRate) {
    return torqueReaction * torque(share) - momentum * speedRate(share, shareRate);
  }

  /**
   * Its moment on the airframe in yaw.
   *
   * @param share part of the rated power
   * @return −T y, N m, positive nose right; 0 when the efficiency is not known
   */
  public double yawMoment(double share) {
    return yawPerPower * power(share);
  }
}
