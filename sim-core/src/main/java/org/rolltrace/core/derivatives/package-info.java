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
 * {@link org.rolltrace.core.derivatives.PrintedConvention} turns them into the one used here.
 */
package org.rolltrace.core.derivatives;
