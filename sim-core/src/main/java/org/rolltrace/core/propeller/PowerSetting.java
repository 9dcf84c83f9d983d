package org.rolltrace.core.propeller;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * The power that the propellers get, all at the same part of their rated power.
 *
 * @param power of all together, W, 0 or more
 * @param speed Ω at which each turns with that power, rad/s, above 0; empty when each has its own
 */
public record PowerSetting(double power, OptionalDouble speed) implements PropellerSetting {

  public PowerSetting {
    Check.notNegative("power, W,", power);
    speed.ifPresent(value -> Check.positive("propeller speed, rad/s,", value));
  }

  /**
   * A power at which each propeller turns with the speed that it has of itself.
   *
   * @param power of all together, W, 0 or more
   * @return the setting
   */
  public static PowerSetting of(double power) {
    return new PowerSetting(power, OptionalDouble.empty());
  }
}
