package org.rolltrace.core.motion;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.controls.ControlRun;

/**
 * Controls and motion in steady flight, ṗ = ṙ = β̇ = φ̇ = 0, before the manoeuvre. The package page
 * has the equations.
 *
 * @param state what was trimmed for
 * @param aileron δa, rad
 * @param rudder δr, rad
 * @param bank φ, rad
 * @param rollRate p, rad/s: 0 in level flight; in a climb or descent what keeps the bank
 * @param sideslip β, rad
 * @param yawRate r, rad/s
 * @param stick fraction of travel, beyond ±1 when the travel is not enough; empty when the
 *     aeroplane has no aileron travel given
 * @param pedal fraction of travel, beyond ±1 when the travel is not enough; empty when the
 *     aeroplane has no rudder travel given
 */
public record Trim(
    SteadyState state,
    double aileron,
    double rudder,
    double bank,
    double rollRate,
    double sideslip,
    double yawRate,
    OptionalDouble stick,
    OptionalDouble pedal) {

  /**
   * The trim in a steady state. With held slip the pedals are left alone, the ailerons balance the
   * rolling moment, and in a straight sideslip the bank balances the side force of the slip;
   * otherwise side force, rolling and yawing moment are balanced together.
   *
   * @param state what is trimmed for; a straight sideslip needs the mass
   * @param slip treatment of the slip
   * @param model the dimensional constants
   * @param stickRun from the stick to the ailerons, where the travel is known
   * @param pedalRun from the pedals to the rudder, where the travel is known
   * @return the trim, which may lie beyond the stops
   * @throws CalculationException when nothing balances the moments; its message says why
   * @throws IllegalArgumentException when the aeroplane lacks what the slip needs
   */
  public static Trim of(
      SteadyState state,
      SlipTreatment slip,
      LateralModel model,
      Optional<ControlRun> stickRun,
      Optional<ControlRun> pedalRun) {
    Balance balance = new Balance(state, model);
    Balance.Found found = slip == SlipTreatment.HELD ? balance.ofRoll() : balance.ofAll();
    return new Trim(
        state,
        found.aileron(),
        found.rudder(),
        found.bank(),
        found.rollRate(),
        found.sideslip(),
        found.yawRate(),
        position(stickRun, found.aileron()),
        position(pedalRun, found.rudder()));
  }

  /**
   * Wings level, straight: φ = r = 0.
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
    return of(SteadyState.WINGS_LEVEL, slip, model, stickRun, pedalRun);
  }

  private static OptionalDouble position(Optional<ControlRun> run, double angle) {
    return run.map(r -> OptionalDouble.of(r.positionFor(angle))).orElse(OptionalDouble.empty());
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
