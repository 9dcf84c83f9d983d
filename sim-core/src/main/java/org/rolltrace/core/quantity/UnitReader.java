package org.rolltrace.core.quantity;

import java.util.Map;

/** Reads a unit by the grammar of the package page. */
final class UnitReader {
  private static final int LONGEST = 100;

  /** Keeps their quotient in the range of double. */
  private static final double LARGEST = 1e300;

  private final String text;
  private final Map<String, Unit> known;
  private double numerator = 1;
  private double denominator = 1;
  private Dimension dimension = Dimension.DIMENSIONLESS;

  private UnitReader(String text, Map<String, Unit> known) {
    this.text = text;
    this.known = known;
  }

  static Unit read(String text, Map<String, Unit> known) {
    Unit symbol = known.get(text);
    return symbol != null ? symbol : new UnitReader(text, known).read();
  }

  private Unit read() {
    if (text.isEmpty()) {
      throw new QuantityException("empty unit; expected one such as 'ft' or 'deg/s'");
    }
    if (text.length() > LONGEST) {
      throw faulty("has " + text.length() + " characters; expected at most " + LONGEST);
    }
    int slash = text.indexOf('/');
    if (slash != text.lastIndexOf('/')) {
      throw faulty("has more than one '/'; expected all that divides after one '/', as in 'm/s2'");
    }
    if (slash < 0) {
      factors(text, 1);
    } else {
      if (!text.startsWith("1/")) {
        factors(text.substring(0, slash), 1);
      }
      factors(text.substring(slash + 1), -1);
    }
    if (numerator > LARGEST || denominator > LARGEST) {
      throw faulty("has a size out of range; expected fewer factors or lower exponents");
    }
    return new Unit(text, numerator, denominator, dimension);
  }

  private void factors(String product, int sign) {
    int start = 0;
    for (int i = 0; i <= product.length(); i++) {
      if (i == product.length() || product.charAt(i) == ' ' || product.charAt(i) == '*') {
        factor(product.substring(start, i), sign);
        start = i + 1;
      }
    }
  }

  private void factor(String factor, int sign) {
    if (factor.isEmpty()) {
      throw faulty(
          "has a space, '*' or '/' too many; expected one space or '*' between factors and none around '/', as in"
              + " 'slug ft2' or 'deg/s'");
    }
    int digits = factor.length();
    while (digits > 0 && isDigit(factor.charAt(digits - 1))) {
      digits--;
    }
    boolean plain = digits == factor.length();
    boolean minus = !plain && digits > 0 && factor.charAt(digits - 1) == '-';
    String symbol = factor.substring(0, minus ? digits - 1 : digits);
    if (symbol.isEmpty()) {
      throw faulty("has the number " + factor + " in it; expected a number only as the 1 of '1/s'");
    }
    Unit unit = known.get(symbol);
    if (unit == null) {
      throw new QuantityException(
          "unknown unit "
              + QuantityException.echo(factor, '\'')
              + UnitSuggestions.after(symbol, factor.substring(symbol.length())));
    }
    if (plain) {
      multiply(unit, sign);
    } else if (factor.length() - digits == 1 && factor.charAt(digits) != '0') {
      int exponent = factor.charAt(digits) - '0';
      multiply(unit, minus ? -sign * exponent : sign * exponent);
    } else {
      throw faulty(
          "has the exponent "
              + factor.substring(symbol.length())
              + "; expected one from 1 to 9, or -1 to -9");
    }
  }

  private void multiply(Unit unit, int exponent) {
    dimension = dimension.times(unit.dimension().power(exponent));
    for (int i = Math.abs(exponent); i > 0; i--) {
      numerator *= exponent > 0 ? unit.numerator() : unit.denominator();
      denominator *= exponent > 0 ? unit.denominator() : unit.numerator();
    }
  }

  private QuantityException faulty(String fault) {
    return new QuantityException("unit " + QuantityException.echo(text, '\'') + " " + fault);
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }
}
