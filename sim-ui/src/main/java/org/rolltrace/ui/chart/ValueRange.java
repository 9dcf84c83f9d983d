package org.rolltrace.ui.chart;

/**
 * The values that an axis covers.
 *
 * @param low at the lower end
 * @param high at the upper end, above {@code low}
 */
public record ValueRange(double low, double high) {

  /** What an axis covers at least to either side: with some air, one degree or per cent. */
  private static final double SMALL = 0.9;

  /** Into how many steps a range is cut to find its round ends. */
  private static final double STEPS = 7;

  /** What is left free beyond a peak. */
  private static final double AIR = 0.04;

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
    double least = 0;
    double most = 0;
    for (Curve curve : strip.curves()) {
      double[] value = curve.value();
      int end = Decimation.end(curve.time(), window);
      for (int i = Decimation.start(curve.time(), window); i < end; i++) {
        double one = value[i];
        if (one < least) {
          least = one;
        } else if (one > most) {
          most = one;
        }
      }
    }
    if (most - least < 2 * SMALL) {
      least = Math.min(least, -SMALL);
      most = Math.max(most, SMALL);
    }
    double step = Ticks.step((most - least) / STEPS, isAngle(strip.unit()));
    return new ValueRange(roundedDown(least, step), -roundedDown(-most, step));
  }

  private static double roundedDown(double value, double step) {
    return value < 0 ? Math.floor(value * (1 + AIR) / step) * step : 0;
  }

  static boolean isAngle(String unit) {
    return unit.equals("deg");
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
