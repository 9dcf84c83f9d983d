package org.rolltrace.core.scenario;

import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.propeller.PropellerMoments;

/**
 * How a manoeuvre starts: trimmed in a steady state with some propeller moment, then displaced.
 *
 * @param state the trimmed state
 * @param trimmedWith the propeller moments at which the aeroplane was trimmed
 * @param disturbance what displaces it from that trim
 */
public record Start(SteadyState state, PropellerMoments trimmedWith, Disturbance disturbance) {

  /**
   * A start from wings-level flight.
   *
   * @param trimmedWith the propeller moments at which the aeroplane was trimmed
   * @param disturbance what displaces it from that trim
   */
  public Start(PropellerMoments trimmedWith, Disturbance disturbance) {
    this(SteadyState.WINGS_LEVEL, trimmedWith, disturbance);
  }
}
