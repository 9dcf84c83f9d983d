package org.rolltrace.core.motion;

import org.rolltrace.core.quantity.Check;

/**
 * What displaces the trimmed aeroplane at the start.
 *
 * @param bank rad
 * @param rollRate rad/s
 * @param sideslip rad; only free slip can take one
 */
public record Disturbance(double bank, double rollRate, double sideslip) {

  /** The trimmed state itself. */
  public static final Disturbance NONE = new Disturbance(0, 0, 0);

  public Disturbance {
    Check.finite("start bank, rad,", bank);
    Check.finite("start roll rate, rad/s,", rollRate);
    Check.finite("start sideslip, rad,", sideslip);
  }

  /**
   * Whether nothing is displaced.
   *
   * @return true when all three are 0
   */
  public boolean isNone() {
    return bank == 0 && rollRate == 0 && sideslip == 0;
  }
}
