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
 *
 * <h2>Estimates from the shape</h2>
 *
 * <p>{@link org.rolltrace.core.derivatives.GeometryEstimate} works out what a shape gives, in one
 * condition (M, C_L), part by part; {@link org.rolltrace.core.derivatives.EstimateMethod} has the
 * source and the known error of each part. A given derivative wins, and the estimate stands beside
 * it.
 *
 * <p><b>Wing.</b> One of two theories answers with the circulation by an incidence α(y):
 *
 * <pre>
 * Γ = 2 b V Σ Aₙ sin nθ,   y = (b/2) cos θ;   C_L = π A A₁,   C_l = −(π/4) A A₂,   w = V Σ n Aₙ sin nθ / sin θ
 * lifting line:     α sin θ = Σ Aₙ (n + f) sin nθ,   f = 4 b sin θ / (a c),   a = a0/√(1 − M²)
 * lifting surface:  Σ upwash of strips (Biot and Savart) at ¾ c = V (α − (1/a0 − 1/2π) c_l)
 * </pre>
 *
 * <p>The line is solved with weights sin mθ over the half span (Galerkin), in which an incidence
 * that jumps is integrated exactly; C_l of an aileron with 120 terms is the same as with more to
 * 1e-5 of itself. The surface has 60 strips a side, even in θ, and averages an incidence that jumps
 * inside a strip. Prandtl-Glauert holds up to Mach 0.7, beyond which the estimates count as
 * extrapolated. The causes are
 *
 * <pre>
 * roll           α = 2y/b per p̂                 Cl_p
 * sideslip       α = Γ_dihedral sign y per β     Cl_β of dihedral
 * aileron        α = −τ on the right, +τ on the left, between its ends, per δa
 * steady         α of the root so that C_L is that of the flight, with twist and zero lift
 * yaw            α = −2y/b α_steady per r̂, as the speed is V − r y; and the steady Γ at that speed
 * </pre>
 *
 * <p>where Cl_r is the sum of both parts of the last. With g = Σ Aₙ sin nθ, index 0 for steady, 1
 * for the change, u the change of incidence by p and β, which tilts the lift:
 *
 * <pre>
 * C_n = −A ∫ [g0 (u − w1/V) − g1 w0/V] sin θ cos θ dθ      Cn_p, Cn_β, Cn_δa; Cn_r with u = 0
 * Cn_r of profile drag = −4 ∫ c_d c y² dy / (S b²), both sides
 * </pre>
 *
 * <p>Elliptic wing by lifting line, for checks: C_Lα = a0 A/(A + a0/π), Cl_p = −(a0/8) A/(A +
 * 2a0/π), Cn_p = −(C_L/8)(1 − 3a0/(πA + 2a0)).
 *
 * <p><b>Ailerons and rudder.</b> τ = η (1 − (θ − sin θ)/π), cos θ = 2E − 1, E the chord share; η
 * what a plain flap keeps of it: 0.85 up to 10°, 0.70 at 20°, 0.58 at 30°, 0.50 at 40°, taken at
 * half the mean travel, so that the derivative is right on the way and a little large at the stop.
 *
 * <p><b>Sweep.</b> Λ is the mean over the area. With the lifting line Cl_p, Cl_δa and the
 * dihedral's Cl_β are multiplied by (A + 4) cos Λ/(A + 4 cos Λ); the surface has the sweep in it.
 * With both, Cl_β = −C_L tan Λ · 4/(3π) · A/(A + 4 cos Λ).
 *
 * <p><b>Body.</b> d = √(width · height), z_w the height of the wing on it:
 *
 * <pre>
 * Cl_β = −1.2 √A (z_w/b)(2 d/b)
 * Cn_β = −2 (k2 − k1) · 0.6 length width height / (S b)
 * CY_β = −2 K (π/4) width height / S,   K = 1 + 0.85 h with the wing above the centre line,
 *        1 − 0.49 h below it, h = 2 z_w/d
 * </pre>
 *
 * <p>k2 − k1 of the ellipsoid of the same fineness.
 *
 * <p><b>Fin.</b> Slope a_v = 2πA_v/(2 + √(A_v² (1 − M² + tan² Λ_v) + 4)), A_v = b_v²/S_v, 1.55
 * times that on a body. l and z are arm and height turned by the angle of attack α of the body, l =
 * l' cos α + z' sin α, z = z' cos α − l' sin α. With Y = a_v S_v/S and the sidewash of wing and
 * body σ = 0.724 + 3.06 (S_v/S)/(1 + cos Λ) − 0.4 z_w/d + 0.009 A:
 *
 * <pre>
 * by β     CY = −σ Y           Cl = −σ Y z/b         Cn = σ Y l/b
 * by p̂     CY = −2 Y z/b       Cl = −2 Y (z/b)²      Cn = 2 Y z l/b²
 * by r̂     CY = 2 Y l/b        Cl = 2 Y l z/b²       Cn = −2 Y (l/b)²
 * by δr    CY = τ Y            Cl = τ Y z/b          Cn = −τ Y l/b
 * </pre>
 *
 * <p>z_w is upwards positive here, so that a low wing turns more of the flow onto the fin.
 *
 * <p><b>Tailplane.</b> Cl_p = ½ · (−(π/4) A_h/(A_h + 4)) (S_h/S)(b_h/b)².
 *
 * <p>Not estimated: CY_δa, and the side force of the wing.
 */
package org.rolltrace.core.derivatives;
