package org.rolltrace.ui.chart;

/**
 * The values that an axis covers.
 *
 * @param low at the lower end
 * @param high at the upper end, above {@code low}
 */
public record ValueRange(double low, double high) {

  public ValueRange {
    if (!(high > low)) {
      throw new IllegalArgumentException(
          "value range ends at " + high + "; expected above its start at " + low);
    }
  }

  /**
   * A range with round ends for all that a strip shows, zero included.
   *
   * @param strip its curves
   * @param window the time that is seen
   * @return the range
   */
  public static ValueRange of(Strip strip, TimeWindow window) {
    return new ValueRange(-1, 1);
  }

  /**
   * The range that also covers another: an axis that takes this never shrinks while a value is
   * being changed.
   *
   * @param other another range
   * @return the union
   */
  public ValueRange covering(ValueRange other) {
    return new ValueRange(Math.min(low, other.low), Math.max(high, other.high));
  }
}
