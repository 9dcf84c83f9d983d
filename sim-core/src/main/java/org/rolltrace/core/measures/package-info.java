/**
 * What is read off a time history. {@link org.rolltrace.core.measures.MeasureDefinition} holds the
 * definitions; a measure that cannot be had says why.
 *
 * <p>Values are SI, radians, positive to the right. Times count from the first movement of the
 * stick unless the definition says otherwise; the commanded direction is the side to which the
 * stick, or with a still stick the pedal, first moves. Between samples the roll rate is the cubic
 * that has the sampled rates and accelerations at both ends.
 *
 * <p>The definitions are those of flight-test practice (common practice); roll-mode time constant,
 * time to bank and the names of the modes are used as in MIL-F-8785C, 1980.
 */
package org.rolltrace.core.measures;
