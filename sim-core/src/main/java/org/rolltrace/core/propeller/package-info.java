/**
 * Moments of the propeller on the airframe.
 *
 * <p>Stability axes; a propeller that turns clockwise seen from behind makes a negative (left)
 * rolling moment. So far the moment is given, not worked out from power and speed.
 */
package org.rolltrace.core.propeller;
