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
  private final double rollInertia;
  private final HeldSideslip held;

  /** q̄ S CY_β/(m V), 1/s; 0 where no slip is held and the mass need not be known. */
  private final double turnPerSlip;

  HeldSlip(LateralModel model, HeldSideslip held) {
    super(model);
    this.roll = model.rollMoment();
    this.rollInertia = model.inertia().roll();
    this.held = held;
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
        (roll.at(held.at(time), state[ROLL_RATE], yawRate, aileron, rudder) + added.roll())
            / rollInertia;
  }

  @Override
  public double sideslip(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return held.at(time);
  }

  @Override
  public double yawRate(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return weightTurn(state[BANK]) + turnPerSlip * held.at(time) - held.rateAt(time);
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
   * @param time s
   * @param state bank and roll rate
   * @param aileron δa, rad
   * @param rudder the rudder angle flown, which enters the roll, rad
   * @param added moments beside those of the model
   * @return δr, rad; NaN when yaw inertia or rudder power is not known
   */
  public double rudderToHold(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    LinearLoad yaw = model().yawMoment();
    if (model().inertia().yaw().isEmpty() || yaw.perRudder() == 0) {
      return Double.NaN;
    }
    double[] rates = new double[2];
    rates(time, state, aileron, rudder, added, rates);
    double yawAcceleration =
        weightTurnPerBank() * Math.cos(state[BANK]) * rates[BANK] + turnPerSlip * held.rateAt(time);
    double needed =
        model().inertia().yaw().getAsDouble() * yawAcceleration
            - model().inertia().product() * rates[ROLL_RATE];
    double yawRate = yawRate(time, state, aileron, rudder, added);
    double others = yaw.at(held.at(time), state[ROLL_RATE], yawRate, aileron, 0) + added.yaw();
    return (needed - others) / yaw.perRudder();
  }
}
