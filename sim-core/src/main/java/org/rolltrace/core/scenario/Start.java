package org.rolltrace.core.scenario;

import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.propeller.PropellerMoments;

/**
 * How a manoeuvre starts: trimmed wings level with some propeller moment, then displaced.
 *
 * @param trimmedWith the propeller moments at which the aeroplane was trimmed
 * @param disturbance what displaces it from that trim
 */
public record Start(PropellerMoments trimmedWith, Disturbance disturbance) {}
