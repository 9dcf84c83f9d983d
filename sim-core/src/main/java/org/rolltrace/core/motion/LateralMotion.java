package org.rolltrace.core.motion;

import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.propeller.AddedMoments;

/**
 * The equations of motion for one treatment of the slip. The state is an array that begins with
 * bank φ [rad] and roll rate p [rad/s]; free slip adds sideslip β [rad] and yaw rate r [rad/s].
 */
public abstract sealed class LateralMotion permits HeldSlip, SettledSlip, FreeSlip {
  /** Index of the bank in the state. */
  public static final int BANK = 0;

  /** Index of the roll rate in the state. */
  public static final int ROLL_RATE = 1;

  /** Index of the sideslip in the state of free slip. */
  public static final int SIDESLIP = 2;

  /** Index of the yaw rate in the state of free slip. */
  public static final int YAW_RATE = 3;

  private static final AddedMoments NOTHING = new AddedMoments();

  private final LateralModel model;
  private final double tanClimb;
  private final double cosClimb;
  private final double gravityOverSpeed;

  LateralMotion(LateralModel model) {
    this.model = model;
    this.tanClimb = Math.tan(model.flightPathAngle());
    this.cosClimb = Math.cos(model.flightPathAngle());
    this.gravityOverSpeed = model.gravityOverSpeed();
  }

  /**
   * The equations for a treatment of the slip.
   *
   * @param slip the treatment
   * @param model the dimensional constants
   * @return the equations
   * @throws IllegalArgumentException when the aeroplane lacks mass or yaw inertia for it, or when
   *     settled slip is not determined
   */
  public static LateralMotion of(SlipTreatment slip, LateralModel model) {
    return switch (slip) {
      case HELD -> new HeldSlip(model, HeldSideslip.NONE);
      case SETTLED -> new SettledSlip(model);
      case FREE -> new FreeSlip(model);
    };
  }

  /**
   * The equations of a slip that is held, constant or against time.
   *
   * @param model the dimensional constants
   * @param sideslip what the pilot holds
   * @return the equations
   * @throws IllegalArgumentException when a sideslip is given and the mass is not
   */
  public static HeldSlip holding(LateralModel model, HeldSideslip sideslip) {
    return new HeldSlip(model, sideslip);
  }

  /**
   * The number of states.
   *
   * @return 2, or 4 for free slip
   */
  public abstract int dimension();

  /**
   * The rates of the state under the moments of the model alone.
   *
   * @param time s; only a slip that is held against time depends on it
   * @param state bank, roll rate and, for free slip, sideslip and yaw rate
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @param rates receives the time derivatives of the states
   */
  public final void rates(
      double time, double[] state, double aileron, double rudder, double[] rates) {
    rates(time, state, aileron, rudder, NOTHING, rates);
  }

  /**
   * The rates of the state.
   *
   * @param time s; only a slip that is held against time depends on it
   * @param state bank, roll rate and, for free slip, sideslip and yaw rate
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @param added moments beside those of the model
   * @param rates receives the time derivatives of the states
   */
  public abstract void rates(
      double time,
      double[] state,
      double aileron,
      double rudder,
      AddedMoments added,
      double[] rates);

  /**
   * The sideslip that goes with a state under the moments of the model alone.
   *
   * @param time as for {@code rates}
   * @param state as for {@code rates}
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @return β, rad
   */
  public final double sideslip(double time, double[] state, double aileron, double rudder) {
    return sideslip(time, state, aileron, rudder, NOTHING);
  }

  /**
   * The sideslip that goes with a state.
   *
   * @param time as for {@code rates}
   * @param state as for {@code rates}
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @param added moments beside those of the model
   * @return β, rad
   */
  public abstract double sideslip(
      double time, double[] state, double aileron, double rudder, AddedMoments added);

  /**
   * The yaw rate that goes with a state under the moments of the model alone.
   *
   * @param time as for {@code rates}
   * @param state as for {@code rates}
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @return r, rad/s
   */
  public final double yawRate(double time, double[] state, double aileron, double rudder) {
    return yawRate(time, state, aileron, rudder, NOTHING);
  }

  /**
   * The yaw rate that goes with a state.
   *
   * @param time as for {@code rates}
   * @param state as for {@code rates}
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @param added moments beside those of the model
   * @return r, rad/s
   */
  public abstract double yawRate(
      double time, double[] state, double aileron, double rudder, AddedMoments added);

  /**
   * The roll acceleration that goes with a state.
   *
   * @param state as for {@link #rates}
   * @param sideslip β that goes with it, rad
   * @param yawRate r that goes with it, rad/s
   * @param aileron δa, rad
   * @param rudder δr, rad
   * @param added moments beside those of the model
   * @return ṗ, rad/s²
   */
  public abstract double rollAcceleration(
      double[] state,
      double sideslip,
      double yawRate,
      double aileron,
      double rudder,
      AddedMoments added);

  /**
   * The dimensional constants.
   *
   * @return the constants
   */
  public LateralModel model() {
    return model;
  }

  /**
   * The linearised equations about wings-level flight, free of all constants.
   *
   * @return the matrix A of ẋ = A x, with x the states in their order
   */
  public abstract double[][] linearised();

  /** Whether the flight path is level, so that the bank rate is the roll rate. */
  final boolean isLevel() {
    return tanClimb == 0;
  }

  /** φ̇ = p + (q sin φ + r cos φ) tan γ, rad/s. */
  final double bankRate(double bank, double rollRate, double yawRate) {
    if (tanClimb == 0) {
      return rollRate;
    }
    double cosBank = Math.cos(bank);
    double pitchRate = gravityOverSpeed * (model.loadFactor() - cosClimb * cosBank);
    return rollRate + (pitchRate * Math.sin(bank) + yawRate * cosBank) * tanClimb;
  }

  /** The rate at which the weight turns the flight path sideways: (g/V) cos γ sin φ, rad/s. */
  final double weightTurn(double bank) {
    return gravityOverSpeed * cosClimb * Math.sin(bank);
  }

  /** The slope of {@link #weightTurn} at wings level: (g/V) cos γ, 1/s. */
  final double weightTurnPerBank() {
    return gravityOverSpeed * cosClimb;
  }

  /** The row of φ̇ in {bank, roll rate}, given how the yaw rate follows these two. */
  final double[] bankRow(double yawRatePerBank, double yawRatePerRollRate) {
    double pitchRate = gravityOverSpeed * (model.loadFactor() - cosClimb);
    return new double[] {
      (pitchRate + yawRatePerBank) * tanClimb, 1 + yawRatePerRollRate * tanClimb
    };
  }
}
