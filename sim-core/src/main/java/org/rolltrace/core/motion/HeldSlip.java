package org.rolltrace.core.motion;

/**
 * No sideslip: one degree of freedom, with the yaw rate of the co-ordinated turn that goes with the
 * bank. Nothing in it brings a wing up again.
 */
public final class HeldSlip extends LateralMotion {
  private final LinearLoad roll;
  private final double rollInertia;

  HeldSlip(LateralModel model) {
    super(model);
    this.roll = model.rollMoment();
    this.rollInertia = model.inertia().roll();
  }

  @Override
  public int dimension() {
    return 2;
  }

  @Override
  public void rates(double[] state, double aileron, double rudder, double[] rates) {
    double yawRate = weightTurn(state[BANK]);
    rates[BANK] = bankRate(state[BANK], state[ROLL_RATE], yawRate);
    rates[ROLL_RATE] = roll.at(0, state[ROLL_RATE], yawRate, aileron, rudder) / rollInertia;
  }

  @Override
  public double sideslip(double[] state, double aileron, double rudder) {
    return 0;
  }

  @Override
  public double yawRate(double[] state, double aileron, double rudder) {
    return weightTurn(state[BANK]);
  }

  @Override
  public double[][] linearised() {
    return new double[][] {
      bankRow(weightTurnPerBank(), 0),
      {roll.perYawRate() * weightTurnPerBank() / rollInertia, roll.perRollRate() / rollInertia}
    };
  }

  /**
   * The rudder angle that the yawing moments need for the slip to stay at zero.
   *
   * @param state bank and roll rate
   * @param aileron δa, rad
   * @param rudder the rudder angle flown, which enters the roll, rad
   * @return δr, rad; NaN when yaw inertia or rudder power is not known
   */
  public double rudderToHold(double[] state, double aileron, double rudder) {
    LinearLoad yaw = model().yawMoment();
    if (model().inertia().yaw().isEmpty() || yaw.perRudder() == 0) {
      return Double.NaN;
    }
    double[] rates = new double[2];
    rates(state, aileron, rudder, rates);
    double yawAcceleration = weightTurnPerBank() * Math.cos(state[BANK]) * rates[BANK];
    double needed =
        model().inertia().yaw().getAsDouble() * yawAcceleration
            - model().inertia().product() * rates[ROLL_RATE];
    double others = yaw.at(0, state[ROLL_RATE], yawRate(state, aileron, rudder), aileron, 0);
    return (needed - others) / yaw.perRudder();
  }
}
