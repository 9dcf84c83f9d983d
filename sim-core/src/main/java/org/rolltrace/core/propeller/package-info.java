/**
 * Moments of the propellers on the airframe.
 *
 * <p>Stability axes; the shafts lie along the flight path. Either the moments are given, or they
 * are worked out from power and speed. All propellers get the same part x of their rated power P_r;
 * s is 1 for a propeller that turns clockwise seen from behind, −1 for one that turns the other way
 * and 0 for two halves that turn against each other.
 *
 * <pre>
 * P = x P_r          Q = P/Ω
 * L = −s (1 − κ) Q − Σ s_i J_i dω_i/dt,      over propeller (ω = Ω) and engine (ω = gear ratio · Ω)
 * N = −T y,          T = η P/V
 * </pre>
 *
 * <p>A propeller that turns clockwise rolls the aeroplane to the left, and more so while it turns
 * up. κ is the part of the slipstream's rotation that wing and fuselage straighten again; it is 0
 * unless given, because no figure for it has a source, and 0 leaves all of the torque.
 *
 * <p>A governor keeps Ω constant. With fixed pitch it follows the power at constant airspeed, by a
 * law of our own that is the cube law of a propeller above the speed Ω₀ with which the air turns
 * it:
 *
 * <pre>
 * (Ω³ − Ω₀³)/(Ω_r³ − Ω₀³) = P/P_r;      Ω ∝ P^(1/3) where Ω₀ is small
 * </pre>
 *
 * <p>The power follows its lever with a first-order lag, dx/dt = (lever − x)/τ; the lever goes from
 * 0 to 1. Left out so far: the swirl at the fin, the uneven load of the blades at incidence and
 * gyroscopic moments.
 *
 * <p>Sources: action and reaction, conservation of angular momentum; the definitions of torque and
 * efficiency (Society of Flight Test Engineers, Reference Handbook 2013, ch. 11).
 */
package org.rolltrace.core.propeller;
