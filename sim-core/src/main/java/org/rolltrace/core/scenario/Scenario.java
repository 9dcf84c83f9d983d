package org.rolltrace.core.scenario;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.PropellerMoments;

/**
 * Which aeroplane, in which condition, flown how.
 *
 * @param title what it is called
 * @param data the aeroplane and its derivatives
 * @param condition height, speed, load factor and flight-path angle; a load factor that was not
 *     given becomes that of the turn it starts from
 * @param propeller the propeller moments it flies with
 * @param slip the treatment of the slip
 * @param start how it starts
 * @param programme what the pilot does
 * @param duration s, above 0 and up to {@value #LONGEST}
 * @param measures what may be chosen about the measures
 */
public record Scenario(
    String title,
    AeroplaneData data,
    FlightCondition condition,
    PropellerMoments propeller,
    SlipTreatment slip,
    Start start,
    PilotProgramme programme,
    double duration,
    MeasureOptions measures) {

  /** The longest manoeuvre, s. */
  public static final double LONGEST = 3600;

  public Scenario {
    if (!(duration > 0 && duration <= LONGEST)) {
      throw new IllegalArgumentException(
          "duration is " + duration + " s; expected above 0 and at most " + LONGEST + " s");
    }
    List<ScenarioFault> faults = faults(data, slip, start, programme);
    if (!faults.isEmpty()) {
      throw new IllegalArgumentException(
          faults.stream()
              .map(fault -> fault.path() + ": " + fault.message())
              .collect(Collectors.joining("; ")));
    }
    condition = condition.inTurn(start.state().bankOfTurn());
  }

  /**
   * What does not fit together.
   *
   * @param data the aeroplane and its derivatives
   * @param slip the treatment of the slip
   * @param start how it starts
   * @param programme what the pilot does
   * @return all faults, or none
   */
  public static List<ScenarioFault> faults(
      AeroplaneData data, SlipTreatment slip, Start start, PilotProgramme programme) {
    List<ScenarioFault> faults = new ArrayList<>();
    Aeroplane aeroplane = data.aeroplane();
    for (Coefficient needed :
        data.derivatives().absentAmong(List.of(Coefficient.CL_P, Coefficient.CL_DA))) {
      faults.add(
          new ScenarioFault("$.aeroplane", needed.symbol() + " is missing; every roll needs it"));
    }
    if (slip != SlipTreatment.HELD) {
      List<String> missing = new ArrayList<>();
      if (aeroplane.mass().isEmpty()) {
        missing.add("mass");
      }
      if (aeroplane.inertia().yaw().isEmpty()) {
        missing.add("inertia.yaw");
      }
      if (!missing.isEmpty()) {
        faults.add(
            new ScenarioFault(
                "$.slip",
                slip.word()
                    + " slip needs "
                    + String.join(" and ", missing)
                    + ", which the aeroplane does not give; give it, or choose held slip"));
      }
    }
    if (slip != SlipTreatment.FREE && start.disturbance().sideslip() != 0) {
      faults.add(
          new ScenarioFault(
              "$.start.sideslip",
              "a sideslip at the start needs free slip, where it is a state of its own; the slip is "
                  + slip.word()));
    }
    if (!programme.heldSideslip().isNone()) {
      if (slip != SlipTreatment.HELD) {
        faults.add(
            new ScenarioFault(
                "$.heldSlip",
                "a sideslip is held against time, but the slip is "
                    + slip.word()
                    + "; choose held slip, or take heldSlip out"));
      } else if (aeroplane.mass().isEmpty()) {
        faults.add(
            new ScenarioFault(
                "$.heldSlip",
                "a sideslip held against time needs mass, which the aeroplane does not give; give"
                    + " it, or take heldSlip out"));
      }
    }
    if (slip == SlipTreatment.HELD && start.state().kind() == SteadyState.Kind.STRAIGHT_SIDESLIP) {
      if (!programme.heldSideslip().isNone()) {
        faults.add(
            new ScenarioFault(
                "$.heldSlip",
                "the straight sideslip it starts from is held already; take heldSlip out, or start"
                    + " from another state"));
      } else if (aeroplane.mass().isEmpty()) {
        faults.add(
            new ScenarioFault(
                "$.start.trim.state",
                "a straight sideslip needs mass, which the aeroplane does not give; give it, or"
                    + " choose another state"));
      }
    }
    for (int i = 0; i < programme.inputs().size(); i++) {
      PilotInput input = programme.inputs().get(i);
      boolean stick = input.control() == Control.STICK;
      if (stick && aeroplane.ailerons().isEmpty()) {
        faults.add(
            new ScenarioFault(
                "$.inputs[" + i + "].control",
                "the stick moves, but the aeroplane does not give the travel of its ailerons; add"
                    + " \"ailerons\""));
      }
      if (!stick && aeroplane.rudder().isEmpty()) {
        faults.add(
            new ScenarioFault(
                "$.inputs[" + i + "].control",
                "the pedals move, but the aeroplane does not give the travel of its rudder; add"
                    + " \"rudder\""));
      }
    }
    return faults;
  }
}
