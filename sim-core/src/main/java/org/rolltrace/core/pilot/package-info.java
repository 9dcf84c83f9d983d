/**
 * What the pilot does with stick, pedals and power, against time.
 *
 * <p>Positions are fractions of travel: stick +1 is full right, pedal +1 is full right pedal
 * forward. The power levers move together, by parts of the rated power, more power positive. An
 * {@link org.rolltrace.core.pilot.InputShape} is added to the trimmed position, or to the power at
 * the start. The hand moves linearly and takes a stated time; 0 s is a jump, at whose instant the
 * new position holds already. Times are kept to the nanosecond, so that instants which are the same
 * on paper are the same here.
 *
 * <p>The shapes: {@link org.rolltrace.core.pilot.StepInput step}, {@link
 * org.rolltrace.core.pilot.HoldInput hold}, {@link org.rolltrace.core.pilot.DoubletInput doublet},
 * {@link org.rolltrace.core.pilot.MultistepInput multistep} (3-2-1-1 and its like), {@link
 * org.rolltrace.core.pilot.RampInput ramp}, {@link org.rolltrace.core.pilot.SweepInput sweep} (of
 * frequency), {@link org.rolltrace.core.pilot.TraceInput trace} (as recorded). Beside them the
 * pilot may hold a {@linkplain org.rolltrace.core.pilot.HeldSideslip sideslip against time}.
 *
 * <p>A further shape is one class: it implements {@code InputShape} and draws its movement, smooth
 * between its breakpoints, as a {@link org.rolltrace.core.pilot.Movement}.
 */
package org.rolltrace.core.pilot;
