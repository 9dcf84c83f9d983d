/**
 * From stick and pedals to the surfaces: the stops of the control, the surface angle it asks for,
 * the surface's rate limit and its lag.
 *
 * <p>Aileron angle δa = ½(left down − right down), rad, positive when it rolls right: stick +1
 * gives +½(up + down). Rudder angle δr, rad, positive with the trailing edge left: pedal +1 gives
 * −right.
 *
 * <p>With demand d, lag τ and largest rate R the surface δ obeys δ̇ = (d − δ)/τ while |d − δ| ≤ Rτ,
 * and δ̇ = ±R beyond; without a lag it is at d until d runs away faster than R.
 */
package org.rolltrace.core.controls;
