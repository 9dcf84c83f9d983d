package org.rolltrace.core.motion;

import java.util.Locale;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;

/** The balance of forces and moments in a steady state. */
final class Balance {
  /** A determinant this small against its terms is rounding. */
  private static final double SINGULAR = 1e-12;

  /** Rounds after which bank and roll rate of a sideslip in a climb agree, or never will. */
  private static final int MOST_ROUNDS = 60;

  private static final double AGREED = 1e-15;

  private final SteadyState state;
  private final LateralModel model;
  private final LinearLoad side;
  private final LinearLoad roll;
  private final LinearLoad yaw;

  /** Controls and motion in balance. */
  record Found(
      double aileron,
      double rudder,
      double bank,
      double rollRate,
      double sideslip,
      double yawRate) {}

  Balance(SteadyState state, LateralModel model) {
    this.state = state;
    this.model = model;
    this.side = model.sideForce();
    this.roll = model.rollMoment();
    this.yaw = model.yawMoment();
  }

  /** The sideslip is held, pedals alone: the ailerons balance the rolling moment. */
  Found ofRoll() {
    if (state.kind() != SteadyState.Kind.STRAIGHT_SIDESLIP) {
      double bank = state.bankOfTurn();
      return balancedByAilerons(bank, turn(bank), 0);
    }
    // The turn of held slip is that of the weight and of the slip: the two cancel.
    if (state.sideslip().isPresent()) {
      double sideslip = state.sideslip().getAsDouble();
      return balancedByAilerons(bankAgainst(side.perSideslip() * sideslip, sideslip), 0, sideslip);
    }
    double bank = state.bank().getAsDouble();
    return balancedByAilerons(bank, 0, slipAgainst(bank));
  }

  private double slipAgainst(double bank) {
    double force = weightSideways(bank);
    double sideslip = force == 0 ? 0 : -force / side.perSideslip();
    if (!(Math.abs(sideslip) < Math.PI / 2)) {
      throw new CalculationException(
          String.format(
              Locale.ROOT,
              "%s trim has no answer: at %.4g deg of bank no sideslip below 90 deg has the side force"
                  + " that balances the weight; give CY_beta, or ask for less bank",
              word(),
              Math.toDegrees(bank)));
    }
    return sideslip;
  }

  private Found balancedByAilerons(double bank, double yawRate, double sideslip) {
    double rollRate = rollRate(bank, yawRate);
    double moment = roll.at(sideslip, rollRate, yawRate, 0, 0);
    if (moment != 0 && roll.perAileron() == 0) {
      throw new CalculationException(
          word()
              + " trim has no answer: a rolling moment of "
              + moment
              + " N m has to be balanced and Cl_da is 0; give Cl_da");
    }
    double aileron = moment == 0 ? 0 : -moment / roll.perAileron();
    return new Found(aileron, 0, bank, rollRate, sideslip, yawRate);
  }

  /** Side force, rolling and yawing moment together. */
  Found ofAll() {
    if (state.kind() == SteadyState.Kind.STRAIGHT_SIDESLIP) {
      return state.sideslip().isPresent()
          ? straightAtSideslip(state.sideslip().getAsDouble())
          : straightAtBank(state.bank().getAsDouble());
    }
    double bank = state.bankOfTurn();
    return balanced(bank, turn(bank), 0); // what the weight does, the turn does
  }

  private Found straightAtBank(double bank) {
    return balanced(bank, 0, weightSideways(bank));
  }

  /** Ailerons, rudder and sideslip that balance what is left, besides a given side force. */
  private Found balanced(double bank, double yawRate, double sideways) {
    double rollRate = rollRate(bank, yawRate);
    double[] rest = {
      -side.at(0, rollRate, yawRate, 0, 0) - sideways,
      -roll.at(0, rollRate, yawRate, 0, 0),
      -yaw.at(0, rollRate, yawRate, 0, 0)
    };
    if (rest[0] == 0 && rest[1] == 0 && rest[2] == 0) {
      return new Found(0, 0, bank, rollRate, 0, yawRate);
    }
    RealMatrix balance =
        MatrixUtils.createRealMatrix(new double[][] {row(side), row(roll), row(yaw)});
    double size = 1;
    for (int i = 0; i < 3; i++) {
      size *= balance.getRowVector(i).getNorm();
    }
    LUDecomposition lu = new LUDecomposition(balance);
    if (!(Math.abs(lu.getDeterminant()) > SINGULAR * size)) {
      throw new CalculationException(
          word()
              + " trim has no single answer: aileron, rudder and sideslip do not act"
              + " independently on side force, roll and yaw (a derivative among CY_beta, Cl_da,"
              + " Cn_dr, Cn_beta is 0 or absent); give the missing ones, or use held slip");
    }
    double[] x = lu.getSolver().solve(MatrixUtils.createRealVector(rest)).toArray();
    return new Found(x[0], x[1], bank, rollRate, x[2], yawRate);
  }

  private static double[] row(LinearLoad load) {
    return new double[] {load.perAileron(), load.perRudder(), load.perSideslip()};
  }

  /** Ailerons and rudder balance the moments of the slip, the bank its side force. */
  private Found straightAtSideslip(double sideslip) {
    double one = roll.perAileron() * yaw.perRudder();
    double two = roll.perRudder() * yaw.perAileron();
    double determinant = one - two;
    if (!(Math.abs(determinant) > SINGULAR * (Math.abs(one) + Math.abs(two)))) {
      throw new CalculationException(
          word()
              + " trim has no single answer: aileron and rudder do not act independently on roll"
              + " and yaw (Cl_da or Cn_dr is 0 or absent); give the missing ones");
    }
    double rollRate = 0;
    double bank = 0;
    for (int round = 0; round < MOST_ROUNDS; round++) {
      double moment = roll.at(sideslip, rollRate, 0, 0, 0);
      double yawing = yaw.at(sideslip, rollRate, 0, 0, 0);
      double aileron = (roll.perRudder() * yawing - yaw.perRudder() * moment) / determinant;
      double rudder = (yaw.perAileron() * moment - roll.perAileron() * yawing) / determinant;
      bank = bankAgainst(side.at(sideslip, rollRate, 0, aileron, rudder), sideslip);
      double next = rollRate(bank, 0);
      if (Math.abs(next - rollRate) <= AGREED) {
        return new Found(aileron, rudder, bank, next, sideslip, 0);
      }
      rollRate = next;
    }
    throw new CalculationException(
        word() + " trim has no answer: bank and roll rate do not settle; fly it level");
  }

  private double bankAgainst(double force, double sideslip) {
    double sine = -force / weightSideways(Math.PI / 2);
    if (!(Math.abs(sine) <= 1)) {
      throw new CalculationException(
          String.format(
              Locale.ROOT,
              "%s trim has no answer: at %.4g deg of sideslip the side force is %.3g times the most"
                  + " that the weight can balance, at any bank; ask for less sideslip",
              word(),
              Math.toDegrees(sideslip),
              Math.abs(sine)));
    }
    return Math.asin(sine);
  }

  /** m g cos γ sin φ, N. */
  private double weightSideways(double bank) {
    return model.massForSlip() * model.speed() * turn(bank);
  }

  /** (g/V) cos γ sin φ, rad/s. */
  private double turn(double bank) {
    return model.gravityOverSpeed() * Math.cos(model.flightPathAngle()) * Math.sin(bank);
  }

  /** The roll rate that keeps the bank: −(q sin φ + r cos φ) tan γ. */
  private double rollRate(double bank, double yawRate) {
    double gamma = model.flightPathAngle();
    if (gamma == 0) {
      return 0;
    }
    double pitchRate =
        model.gravityOverSpeed() * (model.loadFactor() - Math.cos(gamma) * Math.cos(bank));
    return 0.0 - (pitchRate * Math.sin(bank) + yawRate * Math.cos(bank)) * Math.tan(gamma);
  }

  private String word() {
    return state.kind().word();
  }
}
