package org.rolltrace.core.measures;

import java.util.Map;
import java.util.OptionalDouble;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.PilotProgramme;

/**
 * A manoeuvre to be measured.
 *
 * @param history all channels against time
 * @param captures the instants, s, at which the bank had first changed by an angle, rad, in the
 *     commanded direction
 * @param programme what the pilot did
 * @param start the steady state it started from
 * @param slip the treatment of the slip
 * @param modes of the equations that were flown
 * @param dutchRollPeriod of the free equations, s; empty when they have no dutch roll or the data
 *     for them are missing
 * @param halfSpanOverSpeed b/2V, s
 * @param duration s
 */
public record Manoeuvre(
    TimeHistory history,
    Map<Double, Double> captures,
    PilotProgramme programme,
    SteadyState start,
    SlipTreatment slip,
    LateralModes modes,
    OptionalDouble dutchRollPeriod,
    double halfSpanOverSpeed,
    double duration) {}
