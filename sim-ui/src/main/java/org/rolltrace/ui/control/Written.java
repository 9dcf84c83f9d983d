package org.rolltrace.ui.control;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/** Numbers as they are written into files by the mouse, and on the screen. */
public final class Written {
  private Written() {}

  /**
   * A number to some decimals, without zeros behind, as it would be typed.
   *
   * @param value the number
   * @param decimals at most so many
   * @return the text
   */
  public static String plain(double value, int decimals) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
    return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
  }

  /**
   * A time as it would be typed.
   *
   * @param value s
   * @return the text, to the millisecond
   */
  public static String seconds(double value) {
    return plain(value, 3) + " s";
  }

  /**
   * Four figures with a proper minus sign, for reading.
   *
   * @param value the number
   * @return the text
   */
  public static String reading(double value) {
    if (value == 0) {
      return "0";
    }
    double size = Math.abs(value);
    if (size < 1e-4 || size >= 1e6) {
      return String.format(Locale.ROOT, "%.2e", value).replace('-', '\u2212');
    }
    BigDecimal figures = new BigDecimal(value).round(new MathContext(4));
    int decimals = Math.max(0, Math.min(7, 4 - figures.precision() + figures.scale()));
    return String.format(Locale.ROOT, "%." + decimals + "f", figures).replace('-', '\u2212');
  }

  /**
   * A number to so many decimals with a proper minus sign, for columns.
   *
   * @param value the number
   * @param decimals exactly so many; a number that is 0 has none
   * @return the text
   */
  public static String fixed(double value, int decimals) {
    if (value == 0) {
      return "0";
    }
    String digits = String.format(Locale.ROOT, "%." + decimals + "f", value);
    boolean zero = digits.chars().noneMatch(digit -> digit >= '1' && digit <= '9');
    return zero ? digits.replace("-", "") : digits.replace('-', '\u2212');
  }
}
