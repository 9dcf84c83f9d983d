package org.rolltrace.core.quantity;

import java.util.HashMap;
import java.util.Map;

/** The symbols, each as a whole quotient of units above it; the package page names the sources. */
final class UnitSymbols {
  static final Map<String, Unit> TABLE = table();

  private final Map<String, Unit> known = new HashMap<>(128);

  private UnitSymbols() {}

  private static Map<String, Unit> table() {
    UnitSymbols symbols = new UnitSymbols();
    symbols.base();
    symbols.metric();
    symbols.customary();
    return Map.copyOf(symbols.known);
  }

  private void base() {
    base("m", Dimension.LENGTH);
    base("kg", Dimension.MASS);
    base("s", Dimension.TIME);
    base("K", Dimension.TEMPERATURE_DIFFERENCE);
    base("rad", Dimension.ANGLE);
  }

  private void metric() {
    define("km", 1000, 1, "m");
    define("cm", 1, 100, "m");
    define("mm", 1, 1000, "m");
    define("g", 1, 1000, "kg");
    define("t", 1000, 1, "kg");
    define("ms", 1, 1000, "s");
    define("min", 60, 1, "s");
    define("h", 3600, 1, "s");
    define("Hz", 1, 1, "1/s");
    define("mrad", 1, 1000, "rad");
    define("deg", Math.PI, 180, "rad");
    define("rev", 2 * Math.PI, 1, "rad");
    define("rpm", 1, 1, "rev/min");
    define("degC", 1, 1, "K");
    define("N", 1, 1, "kg m/s2");
    define("kN", 1000, 1, "N");
    define("J", 1, 1, "N m");
    define("W", 1, 1, "J/s");
    define("kW", 1000, 1, "W");
    define("Pa", 1, 1, "N/m2");
    define("hPa", 100, 1, "Pa");
    define("kPa", 1000, 1, "Pa");
    define("bar", 100_000, 1, "Pa");
    define("mbar", 100, 1, "Pa");
  }

  private void customary() {
    define("in", 254, 10_000, "m");
    define("ft", 12, 1, "in");
    define("mi", 5280, 1, "ft");
    define("NM", 1852, 1, "m");
    define("lb", 45_359_237, 1e8, "kg");
    define("oz", 1, 16, "lb");
    define("lbf", 980_665, 1e5, "lb m/s2");
    define("slug", 1, 1, "lbf s2/ft");
    define("kt", 1, 1, "NM/h");
    define("mph", 1, 1, "mi/h");
    define("fpm", 1, 1, "ft/min");
    define("hp", 550, 1, "ft lbf/s");
    define("psf", 1, 1, "lbf/ft2");
    define("psi", 1, 1, "lbf/in2");
    // A column of mercury of 13595.1 kg/m3 under standard gravity, one inch high.
    define("inHg", 135_951.0 * 980_665, 1e6, "kg in/m2 s2");
    define("degF", 5, 9, "K");
    define("degR", 5, 9, "K");
  }

  private void base(String symbol, Dimension dimension) {
    known.put(symbol, new Unit(symbol, 1, 1, dimension));
  }

  /** One symbol is so many parts of so many of a unit spelt with earlier symbols. */
  private void define(String symbol, double parts, double of, String unit) {
    Unit whole = UnitReader.read(unit, known);
    known.put(
        symbol,
        new Unit(symbol, parts * whole.numerator(), of * whole.denominator(), whole.dimension()));
  }
}
