/**
 * What the pilot does with stick and pedals, against time.
 *
 * <p>Positions are fractions of travel: stick +1 is full right, pedal +1 is full right pedal
 * forward. An {@link org.rolltrace.core.pilot.InputShape} is added to the trimmed position. The
 * hand moves linearly and takes a stated time; 0 s is a jump, at whose instant the new position
 * holds already. Times are kept to the nanosecond, so that instants which are the same on paper are
 * the same here.
 *
 * <p>A further shape is one class: it implements {@code InputShape} and draws its movement, smooth
 * between its breakpoints, as a {@link org.rolltrace.core.pilot.Movement}.
 */
package org.rolltrace.core.pilot;
