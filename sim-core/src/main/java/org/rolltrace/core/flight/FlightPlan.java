package org.rolltrace.core.flight;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.StalledRoll;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.quantity.Check;

/**
 * All that a manoeuvre is computed from.
 *
 * @param motion the equations
 * @param stickRun from the stick to the ailerons; empty when the stick is not used
 * @param pedalRun from the pedals to the rudder; empty when the pedals are not used
 * @param propulsion the propellers at the power it is flown with; the equations have the moments
 *     that they make then
 * @param stalled what sections that stall add in roll; empty when no stall is known
 * @param trim the steady state and the controls before the manoeuvre
 * @param disturbance what displaces the aeroplane at the start
 * @param programme what the pilot does
 * @param captures bank changes, from the first movement of the controls and in its direction, whose
 *     instants are wanted, rad, each above 0
 * @param duration s, above 0
 */
public record FlightPlan(
    LateralMotion motion,
    Optional<ControlRun> stickRun,
    Optional<ControlRun> pedalRun,
    Propulsion propulsion,
    Optional<StalledRoll> stalled,
    Trim trim,
    Disturbance disturbance,
    PilotProgramme programme,
    List<Double> captures,
    double duration) {

  public FlightPlan {
    Check.positive("duration, s,", duration);
    captures = List.copyOf(captures);
    captures.forEach(angle -> Check.positive("bank change, rad,", angle));
  }

  /**
   * The same with another programme.
   *
   * @param other what the pilot does
   * @return the plan
   */
  public FlightPlan withProgramme(PilotProgramme other) {
    return new FlightPlan(
        motion,
        stickRun,
        pedalRun,
        propulsion,
        stalled,
        trim,
        disturbance,
        other,
        captures,
        duration);
  }
}
