package org.rolltrace.core.propeller;

import org.rolltrace.core.quantity.Check;

/**
 * Steady moments of the propeller on the airframe.
 *
 * @param roll L_prop, N m, positive right wing down
 */
public record PropellerMoments(double roll) {

  /** No propeller moment. */
  public static final PropellerMoments NONE = new PropellerMoments(0);

  public PropellerMoments {
    Check.finite("propeller roll moment, N m,", roll);
  }
}
