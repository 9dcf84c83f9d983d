package org.rolltrace.ui.chart;

import java.util.Locale;

/**
 * Round values along an axis.
 *
 * @param first the first one as a multiple of the step
 * @param last the last one as a multiple of the step
 * @param step from one to the next
 */
record Ticks(long first, long last, double step) {
  /** Parts of a turn, which read better than decimal steps; below 10 deg those are used. */
  private static final double[] ANGLES = {10, 15, 30, 45, 90, 180};

  private static final double TURN = 360;

  /** As far inside the end of an axis as rounding may have pushed a tick that belongs on it. */
  private static final double ROUNDING = 1e-9;

  /**
   * The ticks of an axis.
   *
   * @param low its beginning
   * @param high its end
   * @param count at most about how many steps
   * @param angle whether the values are degrees
   * @return the ticks inside
   */
  static Ticks of(double low, double high, double count, boolean angle) {
    double step = step((high - low) / count, angle);
    return new Ticks(
        (long) Math.ceil(low / step - ROUNDING), (long) Math.floor(high / step + ROUNDING), step);
  }

  /** The ticks of a time axis, so far apart that their figures do not touch. */
  static Ticks ofTime(TimeWindow window, double width) {
    return of(window.from(), window.to(), Math.max(1, width / 64), false);
  }

  /**
   * The smallest round step that is not below a value.
   *
   * @param least above 0
   * @param angle whether the values are degrees
   * @return the step
   */
  static double step(double least, boolean angle) {
    double wanted = least * (1 - ROUNDING);
    if (angle && wanted > ANGLES[0] / 2) {
      for (double step : ANGLES) {
        if (step >= wanted) {
          return step;
        }
      }
      return TURN * decimal(wanted / TURN);
    }
    return decimal(wanted);
  }

  private static double decimal(double wanted) {
    double decade = Math.pow(10, Math.floor(Math.log10(wanted)));
    for (int factor : new int[] {1, 2, 5}) {
      if (factor * decade >= wanted) {
        return factor * decade;
      }
    }
    return 10 * decade;
  }

  int size() {
    return (int) Math.max(0, last - first + 1);
  }

  double value(int index) {
    return (first + index) * step;
  }

  /** The figure at a tick, with the digits that tell it from its neighbours. */
  String figure(int index) {
    double value = value(index);
    int decimals = (int) Math.max(0, Math.ceil(-Math.log10(step) - ROUNDING));
    return figure(value, decimals);
  }

  static String figure(double value, int decimals) {
    String digits = String.format(Locale.ROOT, "%." + decimals + "f", Math.abs(value));
    boolean zero = digits.chars().noneMatch(digit -> digit >= '1' && digit <= '9');
    return value < 0 && !zero ? "\u2212" + digits : digits;
  }
}
