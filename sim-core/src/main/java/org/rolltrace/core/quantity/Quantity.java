package org.rolltrace.core.quantity;

/**
 * Quantities as people write them: a decimal number, one or more spaces, a unit. The package page
 * gives the grammar.
 */
public final class Quantity {
  private static final int LONGEST = 100;

  private Quantity() {}

  /**
   * Reads a quantity.
   *
   * @param text a number and a unit, such as {@code 33.4 ft}; at most 100 characters. Where a plain
   *     number is expected, a number alone
   * @param expected the dimension the quantity must have
   * @return the value in SI units and radians, finite; 0 only when 0 was written
   * @throws QuantityException if the text is no number with a unit, has another dimension, or a
   *     value beyond the range of double
   */
  public static double parse(String text, Dimension expected) {
    if (text.length() > LONGEST) {
      throw new QuantityException(
          given(text)
              + " has "
              + text.length()
              + " characters; expected at most "
              + LONGEST
              + " for "
              + DimensionNames.of(expected).suchAs("12"));
    }
    int end = endOfNumber(text);
    if (end == 0) {
      throw refused(text, "does not begin with a decimal number", expected, "12");
    }
    String number = text.substring(0, end);
    if (end == text.length()) {
      if (!expected.equals(Dimension.DIMENSIONLESS)) {
        throw refused(text, "has no unit", expected, number);
      }
      return inRange(text, number, Double.parseDouble(number), expected);
    }
    int start = end;
    while (start < text.length() && text.charAt(start) == ' ') {
      start++;
    }
    if (start == end) {
      throw unparted(text, end, expected);
    }
    if (start == text.length()) {
      throw refused(text, "has nothing after the space", expected, number);
    }
    Unit unit = unit(text, start, expected);
    return inRange(text, number, unit.toSi(Double.parseDouble(number)), expected);
  }

  /**
   * Reads a frequency, given as cycles per time ({@code 0.2 Hz}) or as an angular rate ({@code 1.5
   * rad/s}).
   *
   * @param text a number and a unit
   * @return rad/s
   * @throws QuantityException if the text is neither
   */
  public static double parseFrequency(String text) {
    QuantityException asCycles;
    try {
      double si = 2 * Math.PI * parse(text, Dimension.FREQUENCY);
      return inRange(text, text, si, Dimension.FREQUENCY);
    } catch (QuantityException e) {
      asCycles = e;
    }
    try {
      return parse(text, Dimension.ANGULAR_RATE);
    } catch (QuantityException neither) {
      throw new QuantityException(
          asCycles.getMessage() + " or " + DimensionNames.of(Dimension.ANGULAR_RATE).withUnits());
    }
  }

  /**
   * Converts a value for output.
   *
   * @param si the value in SI units and radians
   * @param unit the unit to convert to, such as {@code deg/s}
   * @return the value in that unit; not finite when the given one is not, or the result is out of
   *     range
   * @throws QuantityException if the text is no unit
   */
  public static double toUnit(double si, String unit) {
    return Unit.of(unit).fromSi(si);
  }

  private static Unit unit(String text, int start, Dimension expected) {
    Unit unit;
    try {
      unit = Unit.of(text.substring(start));
    } catch (QuantityException e) {
      throw new QuantityException(
          given(text)
              + " is not "
              + DimensionNames.of(expected).withUnits()
              + ": "
              + e.getMessage());
    }
    if (!unit.dimension().equals(expected)) {
      throw new QuantityException(
          given(text)
              + " is "
              + DimensionNames.of(unit.dimension()).withArticle()
              + "; expected "
              + DimensionNames.of(expected).withUnits());
    }
    return unit;
  }

  /** The index after the longest decimal number that the text begins with, 0 when there is none. */
  private static int endOfNumber(String text) {
    int i = sign(text, 0);
    int whole = digits(text, i);
    int end = whole;
    boolean any = whole > i;
    if (end < text.length() && text.charAt(end) == '.') {
      end = digits(text, whole + 1);
      any |= end > whole + 1;
    }
    if (!any) {
      return 0;
    }
    if (end < text.length() && (text.charAt(end) == 'e' || text.charAt(end) == 'E')) {
      int exponent = sign(text, end + 1);
      int after = digits(text, exponent);
      if (after > exponent) {
        return after;
      }
    }
    return end;
  }

  private static int sign(String text, int i) {
    return i < text.length() && (text.charAt(i) == '-' || text.charAt(i) == '+') ? i + 1 : i;
  }

  private static int digits(String text, int from) {
    int i = from;
    while (i < text.length() && text.charAt(i) >= '0' && text.charAt(i) <= '9') {
      i++;
    }
    return i;
  }

  private static double inRange(String text, String number, double si, Dimension expected) {
    if (Double.isInfinite(si)) {
      throw refused(text, "is too large to be computed with", expected, "12");
    }
    if (si == 0) {
      if (!isZero(number)) {
        throw refused(text, "is too small to be told from 0", expected, "0");
      }
      return 0; // also for -0, which nobody means
    }
    return si;
  }

  private static boolean isZero(String number) {
    for (int i = 0; i < number.length(); i++) {
      char c = number.charAt(i);
      if (c == 'e' || c == 'E') {
        return true;
      }
      if (c >= '1' && c <= '9') {
        return false;
      }
    }
    return true;
  }

  private static QuantityException unparted(String text, int end, Dimension expected) {
    String number = text.substring(0, end);
    if (text.charAt(end) == ',') {
      return refused(text, "has a comma; the decimal mark is a point", expected, "12");
    }
    String fault =
        expected.equals(Dimension.DIMENSIONLESS)
            ? "has something after the number "
            : "has no space after the number ";
    return refused(text, fault + number, expected, number);
  }

  private static QuantityException refused(
      String text, String fault, Dimension expected, String number) {
    return new QuantityException(
        given(text) + " " + fault + "; expected " + DimensionNames.of(expected).suchAs(number));
  }

  private static String given(String text) {
    return QuantityException.echo(text, '"');
  }
}
