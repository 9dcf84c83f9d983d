package org.rolltrace.core.run;

import static org.rolltrace.core.measures.MeasureDefinition.FREE_SLIP_BANK_DIFFERENCE;
import static org.rolltrace.core.measures.MeasureDefinition.FREE_SLIP_ROLL_RATE_DIFFERENCE;
import static org.rolltrace.core.measures.MeasureDefinition.PEDAL_TO_HOLD_SLIP;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.flight.Flight;
import org.rolltrace.core.flight.FlightPlan;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.motion.HeldSlip;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.propeller.AddedMoments;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.Scenario;

/** What held or settled slip assumes, and how far that is from free slip. */
final class SlipAssumption {
  private SlipAssumption() {}

  static Measure pedalToHold(Scenario scenario, HeldSlip held, TimeHistory history) {
    Optional<ControlRun> run = scenario.data().aeroplane().rudder().map(ControlRun::of);
    if (run.isEmpty()) {
      return Measure.missing(PEDAL_TO_HOLD_SLIP, "the aeroplane gives no rudder travel");
    }
    double largest = 0;
    double[] state = new double[2];
    PropellerMoments steady = scenario.propulsion().moments();
    AddedMoments added = new AddedMoments();
    for (int i = 0; i < history.size(); i++) {
      state[LateralMotion.BANK] = history.value(Channel.BANK, i);
      state[LateralMotion.ROLL_RATE] = history.value(Channel.ROLL_RATE, i);
      added.set(
          history.value(Channel.PROPELLER_ROLL_MOMENT, i) - steady.roll(),
          history.value(Channel.PROPELLER_YAW_MOMENT, i) - steady.yaw());
      double rudder =
          held.rudderToHold(
              state,
              history.value(Channel.SIDESLIP, i),
              history.value(Channel.YAW_RATE, i),
              history.value(Channel.ROLL_ACCELERATION, i),
              history.value(Channel.AILERON, i),
              added);
      if (Double.isNaN(rudder)) {
        return Measure.missing(
            PEDAL_TO_HOLD_SLIP, "the aeroplane gives no yaw inertia or no Cn_dr");
      }
      double pedal = run.get().positionFor(rudder);
      largest = Math.abs(pedal) > Math.abs(largest) ? pedal : largest;
    }
    return Measure.of(
        PEDAL_TO_HOLD_SLIP,
        largest,
        Math.abs(largest) > 1 ? "more than the travel: the slip cannot be held" : "");
  }

  static List<Measure> distanceFromFree(RunResult result) {
    Scenario scenario = result.scenario();
    if (result.modes().isEmpty()) {
      return unknown(result.modesRemark());
    }
    if (!scenario.programme().heldSideslip().isNone()) {
      return unknown("a slip held against time has no counterpart in free slip");
    }
    TimeHistory history = result.history();
    TimeHistory other;
    try {
      FlightPlan plan =
          ScenarioRun.plan(
              scenario,
              LateralMotion.of(
                  SlipTreatment.FREE, ScenarioRun.model(scenario, scenario.propeller())),
              ScenarioRun.trim(scenario, SlipTreatment.FREE));
      other = Flight.fly(plan, result.settings()).history();
    } catch (CalculationException noAnswer) {
      return unknown("with free slip there is no answer: " + noAnswer.getMessage());
    }
    return List.of(
        Measure.of(FREE_SLIP_BANK_DIFFERENCE, largestDifference(Channel.BANK, history, other)),
        Measure.of(
            FREE_SLIP_ROLL_RATE_DIFFERENCE, largestDifference(Channel.ROLL_RATE, history, other)));
  }

  private static List<Measure> unknown(String reason) {
    return List.of(
        Measure.missing(FREE_SLIP_BANK_DIFFERENCE, reason),
        Measure.missing(FREE_SLIP_ROLL_RATE_DIFFERENCE, reason));
  }

  private static double largestDifference(Channel channel, TimeHistory one, TimeHistory two) {
    int[] ones = one.evenSamples();
    int[] twos = two.evenSamples();
    double largest = 0;
    for (int i = 0; i < Math.min(ones.length, twos.length); i++) {
      largest =
          Math.max(largest, Math.abs(one.value(channel, ones[i]) - two.value(channel, twos[i])));
    }
    return largest;
  }
}
