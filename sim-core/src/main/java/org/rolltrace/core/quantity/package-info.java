/**
 * Units at the edge, and the checks of arguments.
 *
 * <p>Inside, every value is SI with angles in radians. {@link
 * org.rolltrace.core.quantity.Quantity#parse} turns what a person wrote into such a value, {@link
 * org.rolltrace.core.quantity.Unit#fromSi} turns one back for output, and nothing between the two
 * knows another unit. A {@link org.rolltrace.core.quantity.Check} names the role, the value and the
 * bound it broke.
 *
 * <h2>Grammar</h2>
 *
 * <pre>
 *   quantity = number " " { " " } unit ;               "33.4 ft"   "-1.5e3  slug ft2"
 *   number   = [ "+" | "-" ] ( digits [ "." [ digits ] ] | "." digits ) [ ("e" | "E") [ "+" | "-" ] digits ] ;
 *   unit     = ( "1" "/" product ) | ( product [ "/" product ] ) ;
 *   product  = factor { ( " " | "*" ) factor } ;       "kg m2"     "lbf*ft"
 *   factor   = symbol [ [ "-" ] exponent ] ;           "ft2"       "s-1"
 *   exponent = "1" ... "9" ;
 * </pre>
 *
 * <p>All that follows the one {@code /} divides: {@code kg/m s2} is kg/(m s2). Symbols are
 * case-sensitive: {@code NM} is the nautical mile, {@code N m} the newton metre. A quantity has at
 * most 100 characters. Digits are 0 to 9 and the decimal mark is a point, whatever the locale. A
 * value beyond the range of double, and a number other than 0 too small for it, are refused. Where
 * a plain number is expected, it stands alone.
 *
 * <h2>Symbols</h2>
 *
 * <table>
 *   <caption>Symbols and their exact definitions</caption>
 *   <tr><th>quantity</th><th>symbol</th><th>definition</th></tr>
 *   <tr><td>length</td><td>m</td><td>SI</td></tr>
 *   <tr><td></td><td>km, cm, mm</td><td>1000 m, m/100, m/1000</td></tr>
 *   <tr><td></td><td>in</td><td>0.0254 m [1]</td></tr>
 *   <tr><td></td><td>ft</td><td>12 in = 0.3048 m [1]</td></tr>
 *   <tr><td></td><td>mi</td><td>5280 ft = 1609.344 m, the statute mile [1]</td></tr>
 *   <tr><td></td><td>NM</td><td>1852 m, the international nautical mile [2]</td></tr>
 *   <tr><td>mass</td><td>kg</td><td>SI</td></tr>
 *   <tr><td></td><td>g, t</td><td>kg/1000, 1000 kg</td></tr>
 *   <tr><td></td><td>lb</td><td>0.45359237 kg, the avoirdupois pound [1]</td></tr>
 *   <tr><td></td><td>oz</td><td>lb/16</td></tr>
 *   <tr><td></td><td>slug</td><td>lbf s2/ft</td></tr>
 *   <tr><td>time</td><td>s</td><td>SI</td></tr>
 *   <tr><td></td><td>ms, min, h</td><td>s/1000, 60 s, 3600 s</td></tr>
 *   <tr><td>angle</td><td>rad</td><td>SI</td></tr>
 *   <tr><td></td><td>mrad, deg, rev</td><td>rad/1000, π/180 rad, 2π rad</td></tr>
 *   <tr><td>angular rate</td><td>rpm</td><td>rev/min = π/30 rad/s</td></tr>
 *   <tr><td>frequency</td><td>Hz</td><td>1/s: cycles, not radians, so not an angular rate</td></tr>
 *   <tr><td>speed</td><td>kt</td><td>NM/h = 1852/3600 m/s [2]</td></tr>
 *   <tr><td></td><td>mph</td><td>mi/h = 0.44704 m/s</td></tr>
 *   <tr><td></td><td>fpm</td><td>ft/min = 0.00508 m/s</td></tr>
 *   <tr><td>force</td><td>N, kN</td><td>kg m/s2, 1000 N</td></tr>
 *   <tr><td></td><td>lbf</td><td>lb × 9.80665 m/s2 = 4.4482216152605 N [1, 3]</td></tr>
 *   <tr><td>moment, energy</td><td>J</td><td>N m</td></tr>
 *   <tr><td>power</td><td>W, kW</td><td>J/s, 1000 W</td></tr>
 *   <tr><td></td><td>hp</td><td>550 ft lbf/s, the mechanical horsepower</td></tr>
 *   <tr><td>pressure</td><td>Pa, hPa, kPa</td><td>N/m2, 100 Pa, 1000 Pa</td></tr>
 *   <tr><td></td><td>mbar, bar</td><td>100 Pa, 100 000 Pa</td></tr>
 *   <tr><td></td><td>psf, psi</td><td>lbf/ft2, lbf/in2</td></tr>
 *   <tr><td></td><td>inHg</td><td>13595.1 kg/m3 × 9.80665 m/s2 × 0.0254 m = 3386.389 Pa, the
 *       conventional inch of mercury [4]</td></tr>
 *   <tr><td>temperature difference</td><td>K, degC</td><td>K</td></tr>
 *   <tr><td></td><td>degF, degR</td><td>5/9 K</td></tr>
 * </table>
 *
 * <p>Temperatures are <em>differences</em>: {@code 10 degC} is 10 K and {@code 18 degF} is 10 K. No
 * symbol here has a zero point of its own. The moment of a force and energy share a dimension; so
 * do a rate of decay and a frequency. Mass and force do not: {@code lb} is a mass and {@code lbf} a
 * force.
 *
 * <p>Sources (from memory): [1] international yard and pound agreement, 1959. [2] First
 * International Extraordinary Hydrographic Conference, Monaco 1929. [3] Standard gravity, 3rd
 * General Conference on Weights and Measures, 1901. [4] NIST SP 811, Guide for the Use of the SI,
 * 2008, appendix B The rest follows from these.
 */
package org.rolltrace.core.quantity;
