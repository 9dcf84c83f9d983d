package org.rolltrace.core.motion;

import org.rolltrace.core.propeller.AddedMoments;

/**
 * Sideslip and yaw rate in balance with bank, roll rate and controls at every instant: the
 * side-force equation with β̇ = 0 and the yawing moment N = 0, solved together.
 */
public final class SettledSlip extends LateralMotion {
  /** A determinant this small against its own terms is rounding: β and r are not determined. */
  private static final double SINGULAR = 1e-9;

  private final LinearLoad side;
  private final LinearLoad yaw;
  private final double rollInertia;
  private final double momentum;
  private final double slipPerSide;
  private final double slipPerYaw;
  private final double yawRatePerSide;
  private final double yawRatePerYaw;

  /** The rolling moment once slip and yaw rate have followed; the slope 0 is the weight's turn. */
  private final double momentPerTurn;

  /** The same for one unit of yawing moment. */
  private final double momentPerYaw;

  private final LinearLoad moment;

  SettledSlip(LateralModel model) {
    super(model);
    side = model.sideForce();
    yaw = model.yawMoment();
    rollInertia = model.inertia().roll();
    momentum = model.massForSlip() * model.speed();
    model.yawInertiaForSlip();
    double sidePerYawRate = side.perYawRate() - momentum;
    double one = side.perSideslip() * yaw.perYawRate();
    double two = sidePerYawRate * yaw.perSideslip();
    double determinant = one - two;
    if (!(Math.abs(determinant) > SINGULAR * (Math.abs(one) + Math.abs(two)))) {
      throw new IllegalArgumentException(
          "settled slip is not determined: CY_beta Cn_r and Cn_beta leave no single balance of side"
              + " force and yawing moment; give Cn_beta, or CY_beta with Cn_r, or use free slip");
    }
    slipPerSide = -yaw.perYawRate() / determinant;
    slipPerYaw = sidePerYawRate / determinant;
    yawRatePerSide = yaw.perSideslip() / determinant;
    yawRatePerYaw = -side.perSideslip() / determinant;

    LinearLoad roll = model.rollMoment();
    double perSide = roll.perSideslip() * slipPerSide + roll.perYawRate() * yawRatePerSide;
    momentPerYaw = roll.perSideslip() * slipPerYaw + roll.perYawRate() * yawRatePerYaw;
    momentPerTurn = perSide * momentum;
    moment =
        new LinearLoad(
            0,
            roll.perRollRate() + perSide * side.perRollRate() + momentPerYaw * yaw.perRollRate(),
            0,
            roll.perAileron() + perSide * side.perAileron() + momentPerYaw * yaw.perAileron(),
            roll.perRudder() + perSide * side.perRudder() + momentPerYaw * yaw.perRudder(),
            roll.constant() + perSide * side.constant() + momentPerYaw * yaw.constant());
  }

  @Override
  public int dimension() {
    return 2;
  }

  /** The side force and the yawing moment as they would be without sideslip and yaw rate. */
  private double sideRest(double[] state, double aileron, double rudder) {
    return side.at(0, state[ROLL_RATE], 0, aileron, rudder) + momentum * weightTurn(state[BANK]);
  }

  private double yawRest(double[] state, double aileron, double rudder) {
    return yaw.at(0, state[ROLL_RATE], 0, aileron, rudder);
  }

  @Override
  public double sideslip(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return slipPerSide * sideRest(state, aileron, rudder)
        + slipPerYaw * (yawRest(state, aileron, rudder) + added.yaw());
  }

  @Override
  public double yawRate(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return yawRatePerSide * sideRest(state, aileron, rudder)
        + yawRatePerYaw * (yawRest(state, aileron, rudder) + added.yaw());
  }

  @Override
  public void rates(
      double time,
      double[] state,
      double aileron,
      double rudder,
      AddedMoments added,
      double[] rates) {
    double bank = state[BANK];
    double rollRate = state[ROLL_RATE];
    double yawRate = isLevel() ? 0 : yawRate(time, state, aileron, rudder, added);
    rates[BANK] = bankRate(bank, rollRate, yawRate);
    rates[ROLL_RATE] =
        (momentPerTurn * weightTurn(bank)
                + moment.at(0, rollRate, 0, aileron, rudder)
                + added.roll()
                + momentPerYaw * added.yaw())
            / rollInertia;
  }

  @Override
  public double rollAcceleration(
      double[] state,
      double sideslip,
      double yawRate,
      double aileron,
      double rudder,
      AddedMoments added) {
    return (model().rollMoment().at(sideslip, state[ROLL_RATE], yawRate, aileron, rudder)
            + added.roll())
        / rollInertia;
  }

  @Override
  public double[][] linearised() {
    double perBank = momentum * weightTurnPerBank();
    return new double[][] {
      bankRow(
          yawRatePerSide * perBank,
          yawRatePerSide * side.perRollRate() + yawRatePerYaw * yaw.perRollRate()),
      {momentPerTurn * weightTurnPerBank() / rollInertia, moment.perRollRate() / rollInertia}
    };
  }
}
