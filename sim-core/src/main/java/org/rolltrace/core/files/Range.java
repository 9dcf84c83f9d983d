package org.rolltrace.core.files;

/** The values that a key accepts, in SI units; {@code words} says so in units people write. */
record Range(double low, boolean lowIncluded, double high, String words) {
  static final Range ANY = new Range(-Double.MAX_VALUE, true, Double.MAX_VALUE, "any value");
  static final Range ABOVE_ZERO = new Range(0, false, Double.MAX_VALUE, "a value above 0");
  static final Range ZERO_OR_MORE = new Range(0, true, Double.MAX_VALUE, "0 or more");

  static Range fromTo(double low, double high, String words) {
    return new Range(low, true, high, words);
  }

  static Range aboveZeroTo(double high, String words) {
    return new Range(0, false, high, words);
  }

  boolean admits(double value) {
    return (lowIncluded ? value >= low : value > low) && value <= high;
  }
}
