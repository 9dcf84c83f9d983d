/**
 * Runs the equations of motion through time; the only user of the ODE integrator.
 *
 * <p>The method is the embedded Runge-Kutta pair of order 8(5,3) of Dormand and Prince with dense
 * output, as Hipparchus has it. Every breakpoint of the inputs starts the integration anew, so that
 * no step reaches over a corner. Stops of the controls and changes of a surface's mode inside a
 * stretch are found as events, and so are the instants at which the bank has changed by stated
 * angles.
 *
 * <p>{@link org.rolltrace.core.flight.LiveFlight} does the same for a hand that flies while time
 * passes: 50 ticks a second, the controls straight from tick to tick, each tick a stretch of the
 * same integrator. What the hand did, flown again as a trace, gives the same history to 5e-3 deg
 * and deg/s.
 */
package org.rolltrace.core.flight;
