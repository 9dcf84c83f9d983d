/**
 * Runs the equations of motion through time; the only user of the ODE integrator.
 *
 * <p>The method is the embedded Runge-Kutta pair of order 8(5,3) of Dormand and Prince with dense
 * output, as Hipparchus has it. Every breakpoint of the inputs starts the integration anew, so that
 * no step reaches over a corner. Stops of the controls and changes of a surface's mode inside a
 * stretch are found as events, and so are the instants at which the bank has changed by stated
 * angles.
 */
package org.rolltrace.core.flight;
