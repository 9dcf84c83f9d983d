package org.rolltrace.core.scenario;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.propeller.Propulsion;

/**
 * Which aeroplane, in which condition, flown how.
 *
 * @param title what it is called
 * @param data the aeroplane and its derivatives
 * @param condition height, speed, load factor and flight-path angle; a load factor that was not
 *     given becomes that of the turn it starts from
 * @param propeller the propeller moments, or the power, it flies with
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
    PropellerSetting propeller,
    SlipTreatment slip,
    Start start,
    PilotProgramme programme,
    double duration,
    MeasureOptions measures) {

  /** The longest manoeuvre, s. */
  public static final double LONGEST = 3600;

  private static final String CONDITION_POWER = "$.condition.power";
  private static final String TRIM_POWER = "$.start.trim.power";

  public Scenario {
    if (!(duration > 0 && duration <= LONGEST)) {
      throw new IllegalArgumentException(
          "duration is " + duration + " s; expected above 0 and at most " + LONGEST + " s");
    }
    List<ScenarioFault> faults = faults(data, propeller, slip, start, programme);
    if (!faults.isEmpty()) {
      throw new IllegalArgumentException(
          faults.stream()
              .map(fault -> fault.path() + ": " + fault.message())
              .collect(Collectors.joining("; ")));
    }
    condition = condition.inTurn(start.state().bankOfTurn());
    data = data.in(condition);
  }

  /**
   * What does not fit together.
   *
   * @param data the aeroplane and its derivatives
   * @param propeller the propeller moments, or the power, it flies with
   * @param slip the treatment of the slip
   * @param start how it starts
   * @param programme what the pilot does
   * @return all faults, or none
   */
  public static List<ScenarioFault> faults(
      AeroplaneData data,
      PropellerSetting propeller,
      SlipTreatment slip,
      Start start,
      PilotProgramme programme) {
    List<ScenarioFault> faults = new ArrayList<>();
    Aeroplane aeroplane = data.aeroplane();
    for (Coefficient needed :
        data.derivatives().absentAmong(List.of(Coefficient.CL_P, Coefficient.CL_DA))) {
      if (followsFromShape(needed, aeroplane)) {
        continue;
      }
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
    addPower(faults, aeroplane, propeller, start);
    for (int i = 0; i < programme.inputs().size(); i++) {
      PilotInput input = programme.inputs().get(i);
      String missing =
          switch (input.control()) {
            case STICK ->
                aeroplane.ailerons().isEmpty()
                    ? "the stick moves, but the aeroplane does not give the travel of its ailerons;"
                        + " add \"ailerons\""
                    : "";
            case PEDAL ->
                aeroplane.rudder().isEmpty()
                    ? "the pedals move, but the aeroplane does not give the travel of its rudder;"
                        + " add \"rudder\""
                    : "";
            case POWER ->
                aeroplane.propellers().isEmpty()
                    ? "the power moves, but the aeroplane has no propellers; add \"propellers\""
                    : propeller instanceof PowerSetting
                        ? ""
                        : "the power moves, but the condition gives none to start from; add"
                            + " \"power\" to it, such as \"0 W\"";
          };
      if (!missing.isEmpty()) {
        faults.add(new ScenarioFault("$.inputs[" + i + "].control", missing));
      }
    }
    return faults;
  }

  private static void addPower(
      List<ScenarioFault> faults, Aeroplane aeroplane, PropellerSetting propeller, Start start) {
    if (propeller instanceof PowerSetting power) {
      if (aeroplane.propellers().isEmpty()) {
        faults.add(
            new ScenarioFault(
                CONDITION_POWER,
                "a power is given, but the aeroplane has no propellers; add \"propellers\" to it, or"
                    + " give propellerRollMoment instead"));
      } else {
        addBeyondRating(faults, CONDITION_POWER, power, aeroplane);
        if (power.speed().isEmpty()
            && aeroplane.propellers().stream().anyMatch(one -> one.speed().isEmpty())) {
          faults.add(
              new ScenarioFault(
                  CONDITION_POWER,
                  "a power is given, but not how fast the propeller turns; give propellerSpeed"
                      + " beside it, or each propeller its speed"));
        }
      }
    }
    boolean trimmedByPower = start.trimmedWith() instanceof PowerSetting;
    if (trimmedByPower && propeller instanceof PowerSetting) {
      if (!start.trimmedWith().equals(propeller) && !aeroplane.propellers().isEmpty()) {
        addBeyondRating(faults, TRIM_POWER, (PowerSetting) start.trimmedWith(), aeroplane);
      }
    } else if (trimmedByPower) {
      faults.add(
          new ScenarioFault(
              TRIM_POWER,
              "it is trimmed at a power, but the condition gives none; give both as power, or both"
                  + " as propellerRollMoment"));
    } else if (propeller instanceof PowerSetting) {
      faults.add(
          new ScenarioFault(
              "$.start.trim.propellerRollMoment",
              "it is trimmed with a propeller moment, but flown with a power; give both as power, or"
                  + " both as propellerRollMoment"));
    }
  }

  private static void addBeyondRating(
      List<ScenarioFault> faults, String path, PowerSetting power, Aeroplane aeroplane) {
    double rated = aeroplane.ratedPower();
    if (power.power() > rated) {
      faults.add(
          new ScenarioFault(
              path,
              kilowatts(power.power())
                  + " is beyond the rated power of the propellers, "
                  + kilowatts(rated)
                  + " in all; expected at most that"));
    }
  }

  private static String kilowatts(double power) {
    return new BigDecimal(power / 1000)
            .round(new MathContext(6))
            .stripTrailingZeros()
            .toPlainString()
        + " kW";
  }

  /**
   * The propellers in the condition, at the power it is flown with.
   *
   * @return what is worked out of them
   */
  public Propulsion propulsion() {
    return Propulsion.of(data.aeroplane(), condition, propeller);
  }

  private static boolean followsFromShape(Coefficient coefficient, Aeroplane aeroplane) {
    return aeroplane.geometry().isPresent()
        && aeroplane.mass().isPresent()
        && (coefficient == Coefficient.CL_P
            || (aeroplane.geometry().get().ailerons().isPresent()
                && aeroplane.ailerons().isPresent()));
  }
}
