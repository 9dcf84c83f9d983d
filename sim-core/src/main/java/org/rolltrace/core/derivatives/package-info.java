/**
 * Non-dimensional lateral-directional derivatives, each with its origin.
 *
 * <p>A derivative C{Y,l,n}_{β,p,r,δa,δr} gives the change of side force q̄ S C_Y, rolling moment q̄
 * S b C_l or yawing moment q̄ S b C_n with sideslip, with p̂ = pb/2V or r̂ = rb/2V, or with the
 * aileron or rudder angle, all per radian, in stability axes. Signs: sideslip positive with the
 * wind from the right; δa = ½(left down − right down) positive when it rolls right; δr positive
 * with the trailing edge left. So Cl_δa &gt; 0, Cl_p &lt; 0, Cn_β &gt; 0 and Cn_δr &lt; 0 for an
 * ordinary aeroplane, and Cl_β &lt; 0 for a stable dihedral effect.
 *
 * <p>Printed sets differ in the sign of the aileron, in its angle, and in the unit of the angles;
 * {@link org.rolltrace.core.derivatives.PrintedConvention} turns them into the one used here. Some
 * are dimensional, some are about body axes; both are converted, in this order: sign and angles,
 * primes, size, axes.
 *
 * <h2>Dimensional sets</h2>
 *
 * <p>A dimensional derivative is a force by mass or a moment by inertia, for one radian of an angle
 * or one radian per second of a rate. It holds for one speed and density only, those of the
 * condition that the set states; mass and inertias are those of the aeroplane beside it, without a
 * lateral imbalance.
 *
 * <table>
 *   <caption>Dimensional derivatives; L/Ixx, N/Izz, Y/m</caption>
 *   <tr><th>name</th><th>is</th><th>unit</th></tr>
 *   <tr><td>L_beta, L_da, L_dr</td><td>q̄ S b Cl_x / Ixx</td><td>1/s²: rad/s² per rad</td></tr>
 *   <tr><td>L_p, L_r</td><td>q̄ S b (b/2V) Cl_x / Ixx</td><td>1/s: rad/s² per rad/s</td></tr>
 *   <tr><td>N_beta, N_da, N_dr</td><td>q̄ S b Cn_x / Izz</td><td>1/s²</td></tr>
 *   <tr><td>N_p, N_r</td><td>q̄ S b (b/2V) Cn_x / Izz</td><td>1/s</td></tr>
 *   <tr><td>Y_beta, Y_da, Y_dr</td><td>q̄ S CY_x / m</td><td>m/s²: per rad. Books that print
 *       Y_δ/V in 1/s divide it by the speed: multiply it again</td></tr>
 *   <tr><td>Y_p, Y_r</td><td>q̄ S (b/2V) CY_x / m</td><td>m/s: m/s² per rad/s</td></tr>
 *   <tr><td>Y_v, L_v, N_v</td><td>Y_beta, L_beta, N_beta by V, as v = V β</td><td>1/s and 1/(m s);
 *       instead of the one by beta. {@code per} degree does not touch them</td></tr>
 * </table>
 *
 * <p>A primed set has the product of inertia worked in, so that ṗ = L' and ṙ = N':
 *
 * <pre>
 * L'_x = (L_x + (Ixz/Ixx) N_x) / (1 − Ixz²/(Ixx Izz))      L_x = L'_x − (Ixz/Ixx) N'_x
 * N'_x = (N_x + (Ixz/Izz) L_x) / (1 − Ixz²/(Ixx Izz))      N_x = N'_x − (Ixz/Izz) L'_x
 * </pre>
 *
 * <p>An unprimed set must not have it worked in. With Ixz = 0 the two are the same. Where Ixz is
 * not 0, L' and N' of a motion turn into each other, and a primed set has to give both.
 *
 * <h2>Body axes</h2>
 *
 * <p>At the angle of attack α the stability axes are the body axes turned about y so that x lies
 * along the flight path: with c = cos α, s = sin α and T = [c s; −s c]
 *
 * <pre>
 * [p; r] = T [p; r]body,   [L; N] = T [L; N]body,   β and Y are the same
 * [Cl; Cn]_β,δa,δr = T [Cl; Cn]_β,δa,δr body
 * [Cl_p Cl_r; Cn_p Cn_r] = T [Cl_p Cl_r; Cn_p Cn_r]body Tᵀ,   [CY_p CY_r] = [CY_p CY_r]body Tᵀ
 * [Ixx −Ixz; −Ixz Izz] = T [Ixx −Ixz; −Ixz Izz]body Tᵀ
 * </pre>
 *
 * <p>Speed, span and area are the same in both, so p̂ and r̂ turn as p and r do. Inertias and
 * derivatives are about the same axes and turn together. What turns into each other has to be given
 * together, 0 where a source says that it is nothing. The relations are those of any turned axes
 * (B. Etkin and L.D. Reid, Dynamics of Flight, 3rd ed. 1996, app. B.12, from memory).
 */
package org.rolltrace.core.derivatives;
