package org.rolltrace.core.quantity;

import java.util.List;

/**
 * The dimension of a physical quantity, as exponents of length, mass, time, temperature difference
 * and angle. Angle counts as a dimension of its own, so that degrees are not taken for a plain
 * number, nor cycles for radians.
 *
 * <p>Two dimensions are equal when their exponents are. A dimension without a constant here is
 * built from those that have one, such as {@code ANGLE.per(LENGTH)}.
 *
 * @param length exponent of length
 * @param mass exponent of mass
 * @param time exponent of time
 * @param temperature exponent of temperature difference
 * @param angle exponent of angle
 */
public record Dimension(int length, int mass, int time, int temperature, int angle) {
  /** A plain number. */
  public static final Dimension DIMENSIONLESS = new Dimension(0, 0, 0, 0, 0);

  /** Length, m. */
  public static final Dimension LENGTH = new Dimension(1, 0, 0, 0, 0);

  /** Mass, kg. */
  public static final Dimension MASS = new Dimension(0, 1, 0, 0, 0);

  /** Time, s. */
  public static final Dimension TIME = new Dimension(0, 0, 1, 0, 0);

  /** Difference of two temperatures, K; no zero point, so 10 degC is 10 K. */
  public static final Dimension TEMPERATURE_DIFFERENCE = new Dimension(0, 0, 0, 1, 0);

  /** Angle, rad. */
  public static final Dimension ANGLE = new Dimension(0, 0, 0, 0, 1);

  /** Area, m2. */
  public static final Dimension AREA = LENGTH.power(2);

  /** Speed, m/s. */
  public static final Dimension SPEED = LENGTH.per(TIME);

  /** Acceleration, m/s2. */
  public static final Dimension ACCELERATION = SPEED.per(TIME);

  /** Angular rate, rad/s; also the speed of rotation of a propeller. */
  public static final Dimension ANGULAR_RATE = ANGLE.per(TIME);

  /** Angular acceleration, rad/s2. */
  public static final Dimension ANGULAR_ACCELERATION = ANGULAR_RATE.per(TIME);

  /** Cycles per time or a rate of decay, 1/s. */
  public static final Dimension FREQUENCY = DIMENSIONLESS.per(TIME);

  /** Moment of inertia, kg m2. */
  public static final Dimension INERTIA = MASS.times(AREA);

  /** Force, N. */
  public static final Dimension FORCE = MASS.times(ACCELERATION);

  /** Moment of a force, N m; energy has the same dimension. */
  public static final Dimension MOMENT = FORCE.times(LENGTH);

  /** Pressure, Pa. */
  public static final Dimension PRESSURE = FORCE.per(AREA);

  /** Density, kg/m3. */
  public static final Dimension DENSITY = MASS.per(LENGTH.power(3));

  /** Power, W. */
  public static final Dimension POWER = MOMENT.per(TIME);

  /**
   * The dimension of a product.
   *
   * @param other the dimension of the other factor
   * @return the sum of the exponents
   * @throws ArithmeticException if an exponent leaves the range of int
   */
  public Dimension times(Dimension other) {
    return new Dimension(
        Math.addExact(length, other.length),
        Math.addExact(mass, other.mass),
        Math.addExact(time, other.time),
        Math.addExact(temperature, other.temperature),
        Math.addExact(angle, other.angle));
  }

  /**
   * The dimension of a quotient.
   *
   * @param other the dimension of the divisor
   * @return the difference of the exponents
   * @throws ArithmeticException if an exponent leaves the range of int
   */
  public Dimension per(Dimension other) {
    return times(other.power(-1));
  }

  /**
   * The dimension of a power.
   *
   * @param exponent any whole number
   * @return the exponents, each multiplied by the given one
   * @throws ArithmeticException if an exponent leaves the range of int
   */
  public Dimension power(int exponent) {
    return new Dimension(
        Math.multiplyExact(length, exponent),
        Math.multiplyExact(mass, exponent),
        Math.multiplyExact(time, exponent),
        Math.multiplyExact(temperature, exponent),
        Math.multiplyExact(angle, exponent));
  }

  /**
   * The name used in messages.
   *
   * @return a singular noun without article, such as {@code length}, or {@code quantity in kg m}
   *     for a dimension without a name
   */
  public String name() {
    return DimensionNames.of(this).name();
  }

  /**
   * The SI unit, spelt as {@link Unit#of} reads it.
   *
   * @return base units, such as {@code kg m2/s2}; {@code 1} for a plain number
   */
  public String siUnit() {
    StringBuilder above = new StringBuilder();
    StringBuilder below = new StringBuilder();
    append("kg", mass, above, below);
    append("m", length, above, below);
    append("rad", angle, above, below);
    append("s", time, above, below);
    append("K", temperature, above, below);
    if (above.length() == 0) {
      above.append('1');
    }
    if (below.length() > 0) {
      above.append('/').append(below);
    }
    return above.toString();
  }

  private static void append(String unit, int exponent, StringBuilder above, StringBuilder below) {
    if (exponent == 0) {
      return;
    }
    StringBuilder side = exponent > 0 ? above : below;
    if (side.length() > 0) {
      side.append(' ');
    }
    side.append(unit);
    if (Math.abs(exponent) > 1) {
      side.append(Math.abs(exponent));
    }
  }

  /** Spellings of units to offer, most usual first; empty for a plain number. */
  List<String> units() {
    return DimensionNames.of(this).units();
  }

  // equals and hashCode are written out because every quantity read compares dimensions, and a cold
  // start would wait for the generated ones to be linked.
  @Override
  public boolean equals(Object other) {
    return other instanceof Dimension that
        && length == that.length
        && mass == that.mass
        && time == that.time
        && temperature == that.temperature
        && angle == that.angle;
  }

  @Override
  public int hashCode() {
    return (((length * 31 + mass) * 31 + time) * 31 + temperature) * 31 + angle;
  }

  /** The name, as {@link #name()} gives it. */
  @Override
  public String toString() {
    return name();
  }
}
