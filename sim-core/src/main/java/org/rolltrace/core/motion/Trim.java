package org.rolltrace.core.motion;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.rolltrace.core.controls.ControlRun;

/**
 * Controls and slip in steady flight, p = r = 0, before the manoeuvre.
 *
 * @param aileron δa, rad
 * @param rudder δr, rad
 * @param sideslip β, rad
 * @param stick fraction of travel, beyond ±1 when the travel is not enough; empty when the
 *     aeroplane has no aileron travel given
 * @param pedal fraction of travel, beyond ±1 when the travel is not enough; empty when the
 *     aeroplane has no rudder travel given
 */
public record Trim(
    double aileron, double rudder, double sideslip, OptionalDouble stick, OptionalDouble pedal) {

  /** A column of the balance this small against the others makes it singular. */
  private static final double SINGULAR = 1e-12;

  /**
   * Wings level, straight: φ = r = 0. With held slip the pedals are left alone and the ailerons
   * balance the rolling moment; otherwise ailerons, rudder and sideslip balance side force, rolling
   * and yawing moment together.
   *
   * @param slip treatment of the slip
   * @param model the dimensional constants
   * @param stickRun from the stick to the ailerons, where the travel is known
   * @param pedalRun from the pedals to the rudder, where the travel is known
   * @return the trim, which may lie beyond the stops
   * @throws CalculationException when no aileron, rudder and sideslip balance the moments
   */
  public static Trim wingsLevel(
      SlipTreatment slip,
      LateralModel model,
      Optional<ControlRun> stickRun,
      Optional<ControlRun> pedalRun) {
    double[] balance = slip == SlipTreatment.HELD ? balanceOfRoll(model) : balanceOfAllThree(model);
    return new Trim(
        balance[0],
        balance[1],
        balance[2],
        position(stickRun, balance[0]),
        position(pedalRun, balance[1]));
  }

  private static OptionalDouble position(Optional<ControlRun> run, double angle) {
    return run.map(r -> OptionalDouble.of(r.positionFor(angle))).orElse(OptionalDouble.empty());
  }

  private static double[] balanceOfRoll(LateralModel model) {
    double moment = model.rollMoment().constant();
    if (moment == 0) {
      return new double[3];
    }
    if (model.rollMoment().perAileron() == 0) {
      throw new CalculationException(
          "wings-level trim has no answer: a rolling moment of "
              + moment
              + " N m has to be balanced and Cl_da is 0; give Cl_da");
    }
    return new double[] {-moment / model.rollMoment().perAileron(), 0, 0};
  }

  private static double[] balanceOfAllThree(LateralModel model) {
    LinearLoad side = model.sideForce();
    LinearLoad roll = model.rollMoment();
    LinearLoad yaw = model.yawMoment();
    if (side.constant() == 0 && roll.constant() == 0 && yaw.constant() == 0) {
      return new double[3];
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
          "wings-level trim has no single answer: aileron, rudder and sideslip do not act"
              + " independently on side force, roll and yaw (a derivative among CY_beta, Cl_da,"
              + " Cn_dr, Cn_beta is 0 or absent); give the missing ones, or use held slip");
    }
    return lu.getSolver()
        .solve(
            MatrixUtils.createRealVector(
                new double[] {-side.constant(), -roll.constant(), -yaw.constant()}))
        .toArray();
  }

  private static double[] row(LinearLoad load) {
    return new double[] {load.perAileron(), load.perRudder(), load.perSideslip()};
  }

  /**
   * What is not enough for this trim.
   *
   * @return sentences such as "not enough aileron: 112 % needed"; empty when all is within the
   *     stops
   */
  public List<String> shortfalls() {
    List<String> sentences = new ArrayList<>();
    addShortfall(sentences, "aileron", stick);
    addShortfall(sentences, "rudder", pedal);
    return sentences;
  }

  private static void addShortfall(
      List<String> sentences, String surface, OptionalDouble position) {
    if (position.isPresent() && Math.abs(position.getAsDouble()) > 1) {
      long percent = (long) Math.ceil(100 * Math.abs(position.getAsDouble()));
      sentences.add("not enough " + surface + ": " + percent + " % needed");
    }
  }
}
