package org.rolltrace.core.quantity;

/**
 * Checks of arguments. Each returns the value it was given, or throws an {@link
 * IllegalArgumentException} that names role, value and bound; NaN passes none of them.
 */
public final class Check {
  private Check() {}

  /**
   * Requires a finite value.
   *
   * @param role what the value is, with its unit where it has one, such as {@code "span, m"}
   * @param value the value
   * @return the value
   */
  public static double finite(String role, double value) {
    if (!(Math.abs(value) <= Double.MAX_VALUE)) {
      throw refused(role, value, "a finite number");
    }
    return value;
  }

  /**
   * Requires a finite value above zero.
   *
   * @param role what the value is, with its unit
   * @param value the value
   * @return the value
   */
  public static double positive(String role, double value) {
    if (!(value > 0 && value <= Double.MAX_VALUE)) {
      throw refused(role, value, "a finite number above 0");
    }
    return value;
  }

  /**
   * Requires a finite value that is not below zero.
   *
   * @param role what the value is, with its unit
   * @param value the value
   * @return the value
   */
  public static double notNegative(String role, double value) {
    if (!(value >= 0 && value <= Double.MAX_VALUE)) {
      throw refused(role, value, "a finite number of 0 or more");
    }
    return value;
  }

  /**
   * Requires a value inside a closed range.
   *
   * @param role what the value is, with its unit
   * @param value the value
   * @param low the lowest accepted value
   * @param high the highest accepted value
   * @return the value
   */
  public static double inRange(String role, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw refused(role, value, "a number from " + low + " to " + high);
    }
    return value;
  }

  private static IllegalArgumentException refused(String role, double value, String expected) {
    return new IllegalArgumentException(role + " is " + value + "; expected " + expected);
  }
}
