package org.rolltrace.core.scenario;

import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.derivatives.LateralDerivatives;

/**
 * An aeroplane beside its derivatives, as one aeroplane file holds them.
 *
 * @param aeroplane what it is
 * @param derivatives how it answers
 */
public record AeroplaneData(Aeroplane aeroplane, LateralDerivatives derivatives) {}
