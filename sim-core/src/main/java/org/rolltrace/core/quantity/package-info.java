/**
 * Units at the edge, and the checks of arguments.
 *
 * <p>Inside, every value is SI with angles in radians. A {@link org.rolltrace.core.quantity.Check}
 * names the role, the value and the bound it broke.
 */
package org.rolltrace.core.quantity;
