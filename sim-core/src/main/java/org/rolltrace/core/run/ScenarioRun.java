package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.flight.Flight;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.flight.FlightPlan;
import org.rolltrace.core.flight.FlightSettings;
import org.rolltrace.core.flight.Flown;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.measures.Manoeuvre;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.measures.Measures;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.motion.HeldSlip;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.StalledRoll;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.scenario.Scenario;

/** Flies a scenario. */
public final class ScenarioRun {
  private ScenarioRun() {}

  /**
   * Flies a scenario with the usual tolerances and 100 samples a second.
   *
   * @param scenario which aeroplane, in which condition, flown how
   * @return all that came of it
   * @throws CalculationException when trim or integration has no answer
   */
  public static RunResult execute(Scenario scenario) {
    return execute(scenario, FlightSettings.DEFAULT);
  }

  /**
   * Flies a scenario.
   *
   * @param scenario which aeroplane, in which condition, flown how
   * @param settings how finely
   * @return all that came of it
   * @throws CalculationException when trim or integration has no answer
   */
  public static RunResult execute(Scenario scenario, FlightSettings settings) {
    LateralModel model = model(scenario, scenario.propeller());
    FreeModes free = FreeModes.of(model, scenario.data().derivatives());
    Trim trim = trim(scenario, scenario.slip());
    LateralMotion motion = motion(scenario, model, trim);
    Flown flown = Flight.fly(plan(scenario, motion, trim), settings);
    StallMeasure stall = StallMeasure.of(stalled(scenario), flown.history());
    List<Measure> measures = measures(scenario, motion, free, flown, stall);
    return new RunResult(
        scenario,
        settings,
        trim,
        free.modes(),
        free.remark(),
        flown.history(),
        flown.events(),
        measures,
        Cautions.of(scenario, model, trim, flown, measures, stall));
  }

  /**
   * Begins to fly a scenario by hand: its aeroplane, condition, slip and start, without its inputs
   * on stick and pedals. Its duration says nothing.
   *
   * @param scenario what is flown
   * @return the flight at 0 s
   * @throws CalculationException when trim has no answer
   */
  public static LiveFlight byHand(Scenario scenario) {
    Trim trim = trim(scenario, scenario.slip());
    LateralMotion motion = motion(scenario, model(scenario, scenario.propeller()), trim);
    FlightPlan plan = plan(scenario, motion, trim);
    return LiveFlight.begin(plan.withProgramme(plan.programme().handsOff()));
  }

  /**
   * Only the measures of a scenario, for studies of many: those of {@link #execute(Scenario)}, to
   * four figures (peak acceleration and pedal to three), in half the time, without a history to
   * keep. May be called from several threads.
   *
   * @param scenario which aeroplane, in which condition, flown how
   * @return the measures in the order in which they are shown
   * @throws CalculationException when trim or integration has no answer
   */
  public static List<Measure> measure(Scenario scenario) {
    LateralModel model = model(scenario, scenario.propeller());
    FreeModes free = FreeModes.of(model, scenario.data().derivatives());
    Trim trim = trim(scenario, scenario.slip());
    LateralMotion motion = motion(scenario, model, trim);
    Flown flown = Flight.outline(plan(scenario, motion, trim), FlightSettings.OUTLINE);
    return measures(
        scenario, motion, free, flown, StallMeasure.of(stalled(scenario), flown.history()));
  }

  /**
   * Says beside a result with held or settled slip how far it is from free slip, which flies the
   * scenario once more.
   *
   * @param result of {@link #execute(Scenario)}
   * @return the same with these measures, or with the reason why they cannot be had; with free slip
   *     the result itself
   */
  public static RunResult compareWithFreeSlip(RunResult result) {
    if (result.scenario().slip() == SlipTreatment.FREE) {
      return result;
    }
    List<Measure> measures = new ArrayList<>(result.measures());
    measures.addAll(SlipAssumption.distanceFromFree(result));
    return result.withMeasures(measures);
  }

  private static List<Measure> measures(
      Scenario scenario, LateralMotion motion, FreeModes free, Flown flown, StallMeasure stall) {
    boolean flownFree = scenario.slip() == SlipTreatment.FREE && free.modes().isPresent();
    Manoeuvre manoeuvre =
        new Manoeuvre(
            flown.history(),
            captures(flown),
            scenario.programme(),
            scenario.start().state(),
            scenario.slip(),
            flownFree ? free.modes().get() : LateralModes.of(motion),
            dutchRollPeriod(free),
            scenario.data().aeroplane().span() / (2 * scenario.condition().trueAirspeed()),
            scenario.duration());
    List<Measure> measures = new ArrayList<>(Measures.of(manoeuvre, scenario.measures()));
    measures.addAll(stall.measures());
    if (motion instanceof HeldSlip held) {
      measures.add(SlipAssumption.pedalToHold(scenario, held, flown.history()));
    }
    return measures;
  }

  static LateralModel model(Scenario scenario, PropellerSetting propeller) {
    return LateralModel.of(
        scenario.data().aeroplane(),
        scenario.data().derivatives(),
        scenario.condition(),
        scenario.propulsion().moments(propeller));
  }

  private static LateralMotion motion(Scenario scenario, LateralModel model, Trim trim) {
    try {
      return scenario.slip() == SlipTreatment.HELD
          ? LateralMotion.holding(model, held(scenario, trim))
          : LateralMotion.of(scenario.slip(), model);
    } catch (IllegalArgumentException undetermined) {
      throw new CalculationException(undetermined.getMessage(), undetermined);
    }
  }

  /** A straight sideslip is held at what it was trimmed at. */
  private static HeldSideslip held(Scenario scenario, Trim trim) {
    return scenario.start().state().kind() == SteadyState.Kind.STRAIGHT_SIDESLIP
        ? HeldSideslip.constant(trim.sideslip())
        : scenario.programme().heldSideslip();
  }

  static Trim trim(Scenario scenario, SlipTreatment slip) {
    return Trim.of(
        scenario.start().state(),
        slip,
        model(scenario, scenario.start().trimmedWith()),
        stickRun(scenario.data().aeroplane()),
        pedalRun(scenario.data().aeroplane()));
  }

  private static Optional<StalledRoll> stalled(Scenario scenario) {
    return scenario
        .data()
        .derivatives()
        .shape()
        .flatMap(GeometryEstimate::stallingWing)
        .map(
            wing ->
                StalledRoll.of(
                    wing,
                    scenario.data().aeroplane(),
                    scenario.data().derivatives(),
                    scenario.condition()));
  }

  static FlightPlan plan(Scenario scenario, LateralMotion motion, Trim trim) {
    return new FlightPlan(
        motion,
        stickRun(scenario.data().aeroplane()),
        pedalRun(scenario.data().aeroplane()),
        scenario.propulsion(),
        stalled(scenario),
        trim,
        scenario.start().disturbance(),
        scenario.programme(),
        scenario.measures().bankChanges().stream().map(Math::toRadians).toList(),
        scenario.duration());
  }

  private static Optional<ControlRun> stickRun(Aeroplane aeroplane) {
    return aeroplane.ailerons().map(ControlRun::of);
  }

  private static Optional<ControlRun> pedalRun(Aeroplane aeroplane) {
    return aeroplane.rudder().map(ControlRun::of);
  }

  private static Map<Double, Double> captures(Flown flown) {
    Map<Double, Double> times = new HashMap<>();
    for (FlightEvent event : flown.events()) {
      if (event instanceof FlightEvent.BankCapture capture) {
        times.put(capture.change(), capture.time());
      }
    }
    return times;
  }

  private static OptionalDouble dutchRollPeriod(FreeModes free) {
    return free.modes()
        .flatMap(LateralModes::dutchRoll)
        .map(Mode.Oscillatory::period)
        .map(OptionalDouble::of)
        .orElse(OptionalDouble.empty());
  }
}
