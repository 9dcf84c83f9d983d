package org.rolltrace.core.motion;

import org.rolltrace.core.propeller.AddedMoments;

/** Bank, roll rate, sideslip and yaw rate as four states. */
public final class FreeSlip extends LateralMotion {
  private final LinearLoad side;
  private final LinearLoad roll;
  private final LinearLoad yaw;
  private final double momentum;
  private final double ixx;
  private final double izz;
  private final double ixz;
  private final double determinant;

  FreeSlip(LateralModel model) {
    super(model);
    this.side = model.sideForce();
    this.roll = model.rollMoment();
    this.yaw = model.yawMoment();
    this.momentum = model.massForSlip() * model.speed();
    this.ixx = model.inertia().roll();
    this.izz = model.yawInertiaForSlip();
    this.ixz = model.inertia().product();
    this.determinant = ixx * izz - ixz * ixz;
  }

  @Override
  public int dimension() {
    return 4;
  }

  @Override
  public void rates(
      double time,
      double[] state,
      double aileron,
      double rudder,
      AddedMoments added,
      double[] rates) {
    double p = state[ROLL_RATE];
    double slip = state[SIDESLIP];
    double r = state[YAW_RATE];
    double moment = roll.at(slip, p, r, aileron, rudder) + added.roll();
    double yawing = yaw.at(slip, p, r, aileron, rudder) + added.yaw();
    rates[BANK] = bankRate(state[BANK], p, r);
    rates[ROLL_RATE] = (izz * moment + ixz * yawing) / determinant;
    rates[SIDESLIP] = side.at(slip, p, r, aileron, rudder) / momentum + weightTurn(state[BANK]) - r;
    rates[YAW_RATE] = (ixz * moment + ixx * yawing) / determinant;
  }

  @Override
  public double rollAcceleration(
      double[] state,
      double sideslip,
      double yawRate,
      double aileron,
      double rudder,
      AddedMoments added) {
    double p = state[ROLL_RATE];
    double moment = roll.at(sideslip, p, yawRate, aileron, rudder) + added.roll();
    double yawing = yaw.at(sideslip, p, yawRate, aileron, rudder) + added.yaw();
    return (izz * moment + ixz * yawing) / determinant;
  }

  @Override
  public double sideslip(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return state[SIDESLIP];
  }

  @Override
  public double yawRate(
      double time, double[] state, double aileron, double rudder, AddedMoments added) {
    return state[YAW_RATE];
  }

  @Override
  public double[][] linearised() {
    double[][] a = new double[4][4];
    double[] bankRow = bankRow(0, 0);
    a[BANK] = new double[] {bankRow[0], bankRow[1], 0, Math.tan(model().flightPathAngle())};
    a[ROLL_RATE] =
        new double[] {
          0,
          coupled(izz, roll.perRollRate(), yaw.perRollRate()),
          coupled(izz, roll.perSideslip(), yaw.perSideslip()),
          coupled(izz, roll.perYawRate(), yaw.perYawRate())
        };
    a[SIDESLIP] =
        new double[] {
          weightTurnPerBank(),
          side.perRollRate() / momentum,
          side.perSideslip() / momentum,
          side.perYawRate() / momentum - 1
        };
    a[YAW_RATE] =
        new double[] {
          0,
          coupled(ixx, yaw.perRollRate(), roll.perRollRate()),
          coupled(ixx, yaw.perSideslip(), roll.perSideslip()),
          coupled(ixx, yaw.perYawRate(), roll.perYawRate())
        };
    return a;
  }

  /** The acceleration about one axis from a moment about it and one about the other. */
  private double coupled(double otherInertia, double own, double other) {
    return (otherInertia * own + ixz * other) / determinant;
  }
}
