package org.rolltrace.core.aeroplane;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * The aeroplane's own limits, as its flight manual gives them; each may be missing.
 *
 * @param manoeuvringSpeed V_A, calibrated airspeed, m/s
 * @param neverExceedSpeed V_NE, calibrated airspeed, m/s
 * @param rollingLoadFactor the largest load factor in a rolling pull-out
 * @param rollRate the largest roll rate either way, rad/s
 * @param bank the largest bank either way, rad
 */
public record Limits(
    OptionalDouble manoeuvringSpeed,
    OptionalDouble neverExceedSpeed,
    OptionalDouble rollingLoadFactor,
    OptionalDouble rollRate,
    OptionalDouble bank) {

  /** No limits known. */
  public static final Limits NONE =
      new Limits(
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty());

  public Limits {
    checkPositive("manoeuvring speed, m/s,", manoeuvringSpeed);
    checkPositive("never-exceed speed, m/s,", neverExceedSpeed);
    checkPositive("rolling load factor", rollingLoadFactor);
    checkPositive("roll rate limit, rad/s,", rollRate);
    checkPositive("bank limit, rad,", bank);
  }

  private static void checkPositive(String role, OptionalDouble value) {
    if (value.isPresent()) {
      Check.positive(role, value.getAsDouble());
    }
  }
}
