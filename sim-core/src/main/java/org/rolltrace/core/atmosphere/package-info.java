/**
 * The air and the aeroplane's speed through it: standard atmosphere, kinds of airspeed, {@link
 * org.rolltrace.core.atmosphere.FlightCondition}.
 *
 * <h2>Symbols</h2>
 *
 * <table>
 * <caption>Symbols, units and accepted ranges</caption>
 * <tr><th>symbol</th><th>quantity</th><th>unit</th><th>accepted</th></tr>
 * <tr><td>H</td><td>geopotential altitude; pressure altitude</td><td>m</td><td>−5000 to 20 000</td></tr>
 * <tr><td>z</td><td>geometric altitude</td><td>m</td><td>what H allows: −4996.07 to 20 063.12</td></tr>
 * <tr><td>T</td><td>temperature</td><td>K</td><td>150 to 400 in a flight condition</td></tr>
 * <tr><td>p</td><td>static pressure</td><td>Pa</td><td>as H; above 0 in airspeed relations</td></tr>
 * <tr><td>ρ</td><td>density</td><td>kg/m³</td><td>above 0, and such that T is accepted</td></tr>
 * <tr><td>a</td><td>speed of sound</td><td>m/s</td><td></td></tr>
 * <tr><td>V, Ve, Vc</td><td>true, equivalent, calibrated airspeed</td><td>m/s</td>
 *     <td>0 or more (above 0 in a flight condition), M below 1, Vc at most a₀</td></tr>
 * <tr><td>M</td><td>flight Mach number V/a</td><td>–</td><td>0 to below 1</td></tr>
 * <tr><td>qc</td><td>impact pressure, total less static</td><td>Pa</td><td>0 to below 0.8929 p</td></tr>
 * <tr><td>q̄</td><td>dynamic pressure ½ρV²</td><td>Pa</td><td></td></tr>
 * <tr><td>n</td><td>load factor, lift over weight</td><td>–</td><td>finite</td></tr>
 * <tr><td>γ</td><td>flight-path angle, positive climbing (in gas relations: ratio of specific heats)</td>
 *     <td>rad</td><td>inside ±π/2</td></tr>
 * </table>
 *
 * <p>Index 0 is the standard day at sea level. Values outside a range are refused with an {@link
 * IllegalArgumentException} that names value and range; so are NaN and infinities.
 *
 * <h2>Standard atmosphere</h2>
 *
 * <p>U.S. Standard Atmosphere 1976, its two lowest layers:
 *
 * <pre>
 *   H ≤ 11 000 m:  T = T₀ − L H             p = p₀ (T/T₀)^(g₀/(R L))
 *   above:         T = T₁₁ = 216.65 K       p = p₁₁ exp(−g₀ (H − 11 000 m)/(R T₁₁))
 *   everywhere:    ρ = p/(R T)              a = √(γ R T)           R = R* / M₀
 * </pre>
 *
 * <p>T₀ = 288.15 K, p₀ = 101 325 Pa, L = 0.0065 K/m, g₀ = 9.80665 m/s², R* = 8314.32 J/(kmol K), M₀
 * = 28.9644 kg/kmol, γ = 1.4. From these R = 287.053 J/(kg K), ρ₀ = 1.2250 kg/m³, a₀ = 340.294 m/s
 * (661.479 kt), p₁₁ = 22 632.06 Pa and the exponent 5.25588. Below sea level the lowest layer goes
 * on with the same lapse, as in the standard's own tables. Air is dry.
 *
 * <p><b>Pressure altitude</b> is the H at which the standard atmosphere has the pressure that
 * surrounds the aeroplane: what an altimeter set to 1013.25 hPa shows. It fixes p on any day; T
 * does not follow from it, except on a standard day.
 *
 * <p><b>Geometric against geopotential.</b> Published tables come with either altitude in their
 * first column, and they differ. Geopotential altitude counts height as if gravity were g₀ all the
 * way:
 *
 * <pre>
 *   H = r₀ z/(r₀ + z)        z = r₀ H/(r₀ − H)        r₀ = 6 356 766 m
 * </pre>
 *
 * <p>At 11 000 m <i>geometric</i> it is 216.774 K and 22 700 Pa; at 11 000 m <i>geopotential</i>
 * 216.650 K and 22 632 Pa. Every altitude in this package is geopotential, except the geometric one
 * that {@link org.rolltrace.core.atmosphere.StandardAtmosphere#geopotentialAltitude} takes and
 * {@link org.rolltrace.core.atmosphere.StandardAtmosphere#geometricAltitude} returns. Pressure
 * altitude is geopotential by definition.
 *
 * <h2>Airspeeds</h2>
 *
 * <p>The compressible pitot relation for subsonic flow (isentropic to the stagnation point, γ =
 * 1.4):
 *
 * <pre>
 *   qc/p  = (1 + 0.2 M²)^3.5 − 1                    true flight
 *   qc/p₀ = (1 + 0.2 (Vc/a₀)²)^3.5 − 1              what Vc means
 *   V = M a        Ve = V √(ρ/ρ₀) = M a₀ √(p/p₀)    q̄ = ½ρV² = ½ρ₀Ve² = 0.7 p M²
 * </pre>
 *
 * <p>So Vc and Ve convert with the pressure alone, Ve and V with the density alone. Each relation
 * has a closed form both ways. Beyond M = 1 a shock stands ahead of the pitot and the relation does
 * not hold: such speeds are refused. At low speed qc/p is a small difference of numbers near one,
 * so it is computed as {@code expm1(3.5 log1p(0.2 M²))} and its inverse likewise; there and back
 * returns the speed within a few units in the last place.
 *
 * <p><b>Indicated airspeed is not here.</b> From indicated to calibrated takes the aeroplane's own
 * position-error and instrument-error table, from its flight manual; there is no standard value.
 * Correct the indicated speed with that table first and give the result as calibrated.
 *
 * <h2>Load factor and flight path</h2>
 *
 * <p>A flight condition starts level, γ = 0 and n = 1. In straight flight along an inclined path
 * lift carries W cos γ only, so a new flight-path angle brings n = cos γ with it, unless the caller
 * has set n.
 *
 * <h2>Sources</h2>
 *
 * <ul>
 *   <li>Atmosphere and constants: U.S. Standard Atmosphere 1976, NOAA-S/T 76-1562; the constants as
 *       given in Society of Flight Test Engineers, Reference Handbook, 2013, chapter 3.
 *   <li>Airspeed relations: the same handbook, chapter 4.
 *   <li>n = cos γ in straight flight: equilibrium normal to the path; common practice.
 * </ul>
 */
package org.rolltrace.core.atmosphere;
