/**
 * The lateral equations of motion as pure functions; nothing here steps through time.
 *
 * <p>States: bank φ [rad], roll rate p [rad/s], sideslip β [rad], yaw rate r [rad/s], in stability
 * axes (x forward along the flight path, y right, z down), all positive to the right; β positive
 * with the wind from the right. Inputs: aileron angle δa and rudder angle δr [rad]. True airspeed
 * V, load factor n and flight-path angle γ stay constant; p̂ = pb/2V, r̂ = rb/2V, q̄ = ½ρV².
 *
 * <pre>
 * L = q̄ S b (Cl_β β + Cl_p p̂ + Cl_r r̂ + Cl_δa δa + Cl_δr δr) + L_prop + n g m_f y_f
 * N = q̄ S b (Cn_β β + Cn_p p̂ + Cn_r r̂ + Cn_δa δa + Cn_δr δr) + N_prop
 * Y = q̄ S   (CY_β β + CY_p p̂ + CY_r r̂ + CY_δa δa + CY_δr δr)
 *
 * φ̇ = p + (q sin φ + r cos φ) tan γ,   q = (g/V)(n − cos γ cos φ)
 *
 * free:    mV β̇ = Y + m g cos γ sin φ − mV r;   [Ixx −Ixz; −Ixz Izz][ṗ; ṙ] = [L; N]
 * settled: β̇ = 0 and N = 0, solved for β and r at every instant;   Ixx ṗ = L
 * held:    β and β̇ as the pilot holds them, 0 unless said;           Ixx ṗ = L
 *          r = (g/V) sin φ cos γ + q̄ S CY_β β/(mV) − β̇
 * </pre>
 *
 * <p>What the propellers make all the time is in the constants of the {@link
 * org.rolltrace.core.motion.LateralModel}; what changes with the power is added at every instant.
 *
 * <h2>Trim</h2>
 *
 * <p>Before the manoeuvre nothing changes: ṗ = ṙ = β̇ = φ̇ = 0, with the propeller's moments and a
 * lateral imbalance in place. So L = N = 0, and p = −(q sin φ + r cos φ) tan γ, 0 in level flight.
 *
 * <pre>
 * wings level:        φ = r = 0, Y = 0                       for δa, δr, β
 * straight sideslip:  r = 0, Y + m g cos γ sin φ = 0         for δa, δr and φ of a β, or β of a φ
 * steady turn of φ:   r = (g/V) sin φ cos γ, Y = 0           for δa, δr, β: the ball is centred
 * </pre>
 *
 * <p>The load factor is that of the condition. A turn whose condition gives none has n = cos γ /
 * cos φ, which keeps speed, path angle and bank together; straight flight has n = cos γ. With
 * another one that is given the path curves up or down while the manoeuvre starts. A straight
 * sideslip would need n = cos γ cos φ strictly; the difference is left out. With held slip the
 * pedals stay where they are, β is 0, and L = 0 gives δa. In a straight sideslip β is held at that
 * of the trim, also while it is flown: m g cos γ sin φ + q̄ S CY_β β = 0, the turn of held slip
 * being 0, gives φ of a β, or β of a φ.
 *
 * <p>A lateral imbalance of mass m_f at y_f to the right adds n g m_f y_f to L and m_f y_f² to Ixx
 * and Izz; what it does in pitch is left out.
 *
 * <p>The relations are the usual small-perturbation ones of flight dynamics (B. Etkin and L.D.
 * Reid, Dynamics of Flight, 3rd ed. 1996, ch. 4 to 6; R.C. Nelson, Flight Stability and Automatic
 * Control, 2nd ed. 1998, ch. 5), with the weight term kept at any bank.
 */
package org.rolltrace.core.motion;
