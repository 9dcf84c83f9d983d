package org.rolltrace.core.run;

import java.util.Optional;
import org.rolltrace.core.atmosphere.FlightCondition;

/**
 * The condition in which an aeroplane is looked at.
 *
 * @param condition empty when none is known
 * @param basis why this one, or what is missing for one
 */
public record ChosenCondition(Optional<FlightCondition> condition, String basis) {}
