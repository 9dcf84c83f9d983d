package org.rolltrace.core.propeller;

import org.rolltrace.core.quantity.Check;

/**
 * Steady moments of the propellers on the airframe.
 *
 * @param roll L_prop, N m, positive right wing down
 * @param yaw N_prop, N m, positive nose right
 */
public record PropellerMoments(double roll, double yaw) implements PropellerSetting {

  /** No propeller moment. */
  public static final PropellerMoments NONE = new PropellerMoments(0);

  public PropellerMoments {
    Check.finite("propeller roll moment, N m,", roll);
    Check.finite("propeller yaw moment, N m,", yaw);
  }

  /**
   * A moment in roll alone.
   *
   * @param roll L_prop, N m, positive right wing down
   */
  public PropellerMoments(double roll) {
    this(roll, 0);
  }
}
