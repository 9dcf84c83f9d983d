package org.rolltrace.core.quantity;

import java.util.List;

/**
 * A unit of measurement: how it is spelt, its dimension, and its size in SI units (radians for
 * angles). The package page gives the grammar and the symbols.
 *
 * <p>The size is kept as a quotient of two numbers, both whole where the definition allows, because
 * most sizes are exact as a quotient and few as a decimal fraction in binary: 36 km/h is 10 m/s to
 * the last bit.
 */
public final class Unit {
  private final String text;
  private final double numerator;
  private final double denominator;
  private final Dimension dimension;

  Unit(String text, double numerator, double denominator, Dimension dimension) {
    this.text = text;
    this.numerator = numerator;
    this.denominator = denominator;
    this.dimension = dimension;
  }

  /**
   * Reads a unit.
   *
   * @param text a unit such as {@code ft}, {@code deg/s} or {@code slug ft2}; case matters
   * @return the unit
   * @throws QuantityException if the text is no unit; the message suggests near spellings
   */
  public static Unit of(String text) {
    return UnitReader.read(text, UnitSymbols.TABLE);
  }

  /**
   * The usual spellings of units of a dimension, for messages and menus. Other spellings that
   * follow the grammar are read as well.
   *
   * @param dimension the dimension
   * @return spellings that {@link #of} reads, none for a plain number
   */
  public static List<String> symbolsOf(Dimension dimension) {
    return dimension.units();
  }

  /**
   * The size of the unit.
   *
   * @return SI units in one of this unit, above 0
   */
  public double factor() {
    return numerator / denominator;
  }

  /**
   * The dimension of the unit.
   *
   * @return the dimension
   */
  public Dimension dimension() {
    return dimension;
  }

  /**
   * Converts to SI units.
   *
   * @param value a value in this unit
   * @return the same in SI units and radians; not finite when the value is not, or the result is
   *     about to leave the range of double
   */
  public double toSi(double value) {
    return value * numerator / denominator;
  }

  /**
   * Converts from SI units.
   *
   * @param value a value in SI units and radians
   * @return the same in this unit; not finite when the value is not, or the result is about to
   *     leave the range of double
   */
  public double fromSi(double value) {
    return value * denominator / numerator;
  }

  double numerator() {
    return numerator;
  }

  double denominator() {
    return denominator;
  }

  /** The unit as it was spelt. */
  @Override
  public String toString() {
    return text;
  }

  /** Units are equal when they are spelt alike. */
  @Override
  public boolean equals(Object other) {
    return other instanceof Unit that && text.equals(that.text);
  }

  @Override
  public int hashCode() {
    return text.hashCode();
  }
}
