package org.rolltrace.core.measures;

import java.util.OptionalDouble;
import org.rolltrace.core.flight.Flown;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.PilotProgramme;

/**
 * A manoeuvre to be measured.
 *
 * @param flown its history and events
 * @param programme what the pilot did
 * @param slip the treatment of the slip
 * @param modes of the equations that were flown
 * @param dutchRollPeriod of the free equations, s; empty when they have no dutch roll or the data for
 *     them are missing
 * @param halfSpanOverSpeed b/2V, s
 * @param duration s
 */
public record Manoeuvre(
    Flown flown,
    PilotProgramme programme,
    SlipTreatment slip,
    LateralModes modes,
    OptionalDouble dutchRollPeriod,
    double halfSpanOverSpeed,
    double duration) {}
