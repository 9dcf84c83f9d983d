package org.rolltrace.core.scenario;

import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.propeller.PropellerSetting;

/**
 * How a manoeuvre starts: trimmed in a steady state with some power or propeller moment, then
 * displaced.
 *
 * @param state the trimmed state
 * @param trimmedWith the propeller moments, or the power, at which the aeroplane was trimmed; of a
 *     power the speed is not looked at, which follows from that of the condition
 * @param disturbance what displaces it from that trim
 */
public record Start(SteadyState state, PropellerSetting trimmedWith, Disturbance disturbance) {

  /**
   * A start from wings-level flight.
   *
   * @param trimmedWith the propeller moments, or the power, at which the aeroplane was trimmed
   * @param disturbance what displaces it from that trim
   */
  public Start(PropellerSetting trimmedWith, Disturbance disturbance) {
    this(SteadyState.WINGS_LEVEL, trimmedWith, disturbance);
  }
}
