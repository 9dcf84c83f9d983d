package org.rolltrace.core.run;

import java.util.OptionalDouble;

/**
 * What a variant changes in one number.
 *
 * @param name of the derivative or figure in files
 * @param title in print
 * @param unit an SI unit, or "1"
 * @param base the value of the base; empty when it has none
 * @param variant the value of the variant; empty when it has none
 */
public record FigureChange(
    String name, String title, String unit, OptionalDouble base, OptionalDouble variant) {

  /**
   * By how much.
   *
   * @return the value of the variant less that of the base; empty unless both have one
   */
  public OptionalDouble difference() {
    return base.isPresent() && variant.isPresent()
        ? OptionalDouble.of(variant.getAsDouble() - base.getAsDouble())
        : OptionalDouble.empty();
  }

  /**
   * By how much of the base.
   *
   * @return the difference by the size of the value of the base, so that its sign is that of the
   *     difference; empty when there is none, or the base has 0
   */
  public OptionalDouble relative() {
    OptionalDouble difference = difference();
    if (difference.isEmpty()) {
      return difference;
    }
    double relative = difference.getAsDouble() / Math.abs(base.getAsDouble());
    return Math.abs(relative) <= Double.MAX_VALUE
        ? OptionalDouble.of(relative)
        : OptionalDouble.empty();
  }
}
