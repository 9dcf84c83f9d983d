package org.rolltrace.core.motion;

import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.propeller.AddedMoments;

/**
 * The sideslip is what the pilot holds: none, that of the straight sideslip it starts from, or one
 * against time. One degree of freedom, with the yaw rate of the turn that goes with bank and slip,
 *
 * <p>r = (g/V) sin φ cos γ + q̄ S CY_β β/(m V) − β̇.
 *
 * <p>Nothing in it brings a wing up again but a slip that the pilot holds for it.
 */
public final class HeldSlip extends LateralMotion {
  private final LinearLoad roll;
  private final LinearLoad yaw;
  private final double rollInertia;

  /** kg m²; NaN when not known. */
  private final double yawInertia;

  private final HeldSideslip held;

  /** Whether the ball stays in the middle, and nothing has to be looked up. */
  private final boolean centred;

  /** q̄ S CY_β/(m V), 1/s; 0 where no slip is held and the mass need not be known. */
  private final double turnPerSlip;

  HeldSlip(LateralModel model, HeldSideslip held) {
    super(model);
    this.roll = model.rollMoment();
    this.yaw = model.yawMoment();
    this.rollInertia = model.inertia().roll();
    this.yawInertia = model.inertia().yaw().orElse(Double.NaN);
    this.held = held;
    this.centred = held.isNone();
    if (!held.isNone() && model.mass().isEmpty()) {
      throw new IllegalArgumentException("a slip held against time needs the mass");
    }
    this.turnPerSlip =
        held.isNone()
            ? 0
            : model.sideForce().perSideslip() / (model.mass().getAsDouble() * model.speed());
  }

  @Override
  public int dimension() {
    return 2;
  }

  @Override
  public void rates(
      double time,
      double[] state,
      double aileron,
      double rudder,
      AddedMoments added,
      double[] rates) {
    double yawRate = yawRate(time, state, aileron, rudder, added);
    rates[BANK] = bankRate(state[BANK], state[ROLL_RATE], yawRate);
    rates[ROLL_RATE] =
        rollAcceleration(
            state, sideslip(time, state, aileron, rudder, added), yawRate, aileron, rudder, added);
  }

  @Override
  public double rollAcceleration(
      double[] state,
      double sideslip,
      double yawRate,
      double aileron,
      double rudder,
      AddedMoments added) {
    return (roll.at(sideslip, state[ROLL_RATE], yawRate, aileron, rudder) + added.roll())
        / rollInertia;
  }

  @Override
  public double sideslip(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return centred ? 0 : held.at(time);
  }

  @Override
  public double yawRate(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    double turn = weightTurn(state[BANK]);
    return centred ? turn : turn + turnPerSlip * held.at(time) - held.rateAt(time);
  }

  @Override
  public double[][] linearised() {
    return new double[][] {
      bankRow(weightTurnPerBank(), 0),
      {roll.perYawRate() * weightTurnPerBank() / rollInertia, roll.perRollRate() / rollInertia}
    };
  }

  /**
   * The rudder angle that the yawing moments need for the slip to stay what it is held at; where
   * its slope breaks, without the blow that would take.
   *
   * @param state bank and roll rate
   * @param sideslip β, rad
   * @param yawRate r that goes with it, rad/s
   * @param rollAcceleration ṗ that goes with it, rad/s²
   * @param aileron δa, rad
   * @param added moments beside those of the model
   * @return δr, rad; NaN when yaw inertia or rudder power is not known
   */
  public double rudderToHold(
      double[] state,
      double sideslip,
      double yawRate,
      double rollAcceleration,
      double aileron,
      AddedMoments added) {
    if (Double.isNaN(yawInertia) || yaw.perRudder() == 0) {
      return Double.NaN;
    }
    double bank = state[BANK];
    double sideslipRate = centred ? 0 : weightTurn(bank) + turnPerSlip * sideslip - yawRate;
    double yawAcceleration =
        weightTurnPerBank() * Math.cos(bank) * bankRate(bank, state[ROLL_RATE], yawRate)
            + turnPerSlip * sideslipRate;
    double needed = yawInertia * yawAcceleration - model().inertia().product() * rollAcceleration;
    double others = yaw.at(sideslip, state[ROLL_RATE], yawRate, aileron, 0) + added.yaw();
    return (needed - others) / yaw.perRudder();
  }
}
