package org.rolltrace.core.quantity;

import static org.rolltrace.core.quantity.Dimension.ANGLE;
import static org.rolltrace.core.quantity.Dimension.DIMENSIONLESS;
import static org.rolltrace.core.quantity.Dimension.LENGTH;

import java.util.List;
import java.util.Map;

/**
 * What messages call a dimension, and the units they offer. Apart from {@link Dimension}, so that
 * it is loaded only when something is to be said.
 */
record DimensionNames(String name, String typicalUnit, List<String> units) {
  private static final Map<Dimension, DimensionNames> NAMED =
      Map.ofEntries(
          Map.entry(DIMENSIONLESS, new DimensionNames("plain number", "", List.of())),
          named(LENGTH, "length", "ft", "m", "ft", "in", "km", "cm", "mm", "NM", "mi"),
          named(Dimension.AREA, "area", "ft2", "m2", "ft2", "in2", "cm2"),
          named(Dimension.MASS, "mass", "lb", "kg", "lb", "slug", "t", "g", "oz"),
          named(Dimension.TIME, "time", "s", "s", "ms", "min", "h"),
          named(
              Dimension.TEMPERATURE_DIFFERENCE,
              "temperature difference",
              "K",
              "K",
              "degC",
              "degF",
              "degR"),
          named(ANGLE, "angle", "deg", "deg", "rad", "mrad", "rev"),
          named(Dimension.SPEED, "speed", "kt", "m/s", "kt", "ft/s", "km/h", "mph", "fpm"),
          named(Dimension.ACCELERATION, "acceleration", "ft/s2", "m/s2", "ft/s2"),
          named(Dimension.ANGULAR_RATE, "angular rate", "deg/s", "deg/s", "rad/s", "rpm", "rev/s"),
          named(
              Dimension.ANGULAR_ACCELERATION, "angular acceleration", "deg/s2", "deg/s2", "rad/s2"),
          named(Dimension.FREQUENCY, "frequency", "Hz", "Hz", "1/s"),
          named(Dimension.FREQUENCY.power(2), "frequency squared", "1/s2", "1/s2"),
          named(
              Dimension.INERTIA,
              "moment of inertia",
              "slug ft2",
              "kg m2",
              "slug ft2",
              "lb ft2",
              "lbf ft s2"),
          named(
              Dimension.MOMENT,
              "moment",
              "lbf ft",
              "N m",
              "lbf ft",
              "ft lbf",
              "kN m",
              "lbf in",
              "J"),
          named(Dimension.FORCE, "force", "lbf", "N", "lbf", "kN"),
          named(
              Dimension.PRESSURE,
              "pressure",
              "psf",
              "Pa",
              "psf",
              "hPa",
              "kPa",
              "psi",
              "inHg",
              "mbar",
              "bar"),
          named(Dimension.DENSITY, "density", "kg/m3", "kg/m3", "slug/ft3", "lb/ft3"),
          named(Dimension.POWER, "power", "hp", "W", "kW", "hp", "ft lbf/s"),
          named(ANGLE.power(-1), "slope per angle", "1/rad", "1/rad", "1/deg"),
          named(
              ANGLE.per(LENGTH),
              "control gearing",
              "deg/in",
              "rad/m",
              "deg/m",
              "deg/in",
              "rad/ft"));

  static DimensionNames of(Dimension dimension) {
    DimensionNames names = NAMED.get(dimension);
    if (names == null) {
      String si = dimension.siUnit();
      names = new DimensionNames("quantity in " + si, si, List.of(si));
    }
    return names;
  }

  /** The name with its article. */
  String withArticle() {
    return ("aeiou".indexOf(name.charAt(0)) >= 0 ? "an " : "a ") + name;
  }

  /** The name with its article, and the first few units in brackets. */
  String withUnits() {
    return withArticle() + firstUnits();
  }

  /** What to write instead: the name, an example with the given number, and the first few units. */
  String suchAs(String number) {
    String example = units.isEmpty() ? number : number + " " + typicalUnit;
    return withArticle() + " such as \"" + example + "\"" + firstUnits();
  }

  private String firstUnits() {
    int few = 5;
    if (units.isEmpty()) {
      return "";
    }
    if (units.size() <= few) {
      return " (" + String.join(", ", units) + ")";
    }
    return " (" + String.join(", ", units.subList(0, few)) + ", ...)";
  }

  private static Map.Entry<Dimension, DimensionNames> named(
      Dimension dimension, String name, String typicalUnit, String... units) {
    return Map.entry(dimension, new DimensionNames(name, typicalUnit, List.of(units)));
  }
}
