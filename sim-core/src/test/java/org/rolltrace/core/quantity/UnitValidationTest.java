package org.rolltrace.core.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;
import javax.measure.IncommensurableException;
import javax.measure.MetricPrefix;
import javax.measure.Unit;
import javax.measure.quantity.Length;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import systems.uom.common.Imperial;
import systems.uom.common.USCustomary;
import tech.units.indriya.unit.Units;

/** Sizes of units against an independent library, and where it has none against definitions. */
class UnitValidationTest {
  /**
   * A size is a quotient of two products of at most five rounded numbers, each rounding at most
   * 1.1e-16 of the value; 1e-15 is above that and far below any wrong digit.
   */
  private static final double ROUNDING = 1e-15;

  private static final Unit<?> M = Units.METRE;
  private static final Unit<?> KG = Units.KILOGRAM;
  private static final Unit<?> S = Units.SECOND;
  private static final Unit<Length> FT = USCustomary.FOOT;
  private static final Unit<?> LBF = Imperial.POUND_FORCE;
  private static final Unit<?> SLUG = LBF.multiply(S.pow(2)).divide(FT);

  /** Our spelling, the unit of tech.units:indriya and systems.uom:systems-common, its SI unit. */
  static Map<String, Unit<?>> library() {
    Map<String, Unit<?>> units = new TreeMap<>();
    units.put("m", M);
    units.put("km", MetricPrefix.KILO(Units.METRE));
    units.put("cm", MetricPrefix.CENTI(Units.METRE));
    units.put("mm", MetricPrefix.MILLI(Units.METRE));
    units.put("ft", FT);
    units.put("in", USCustomary.INCH);
    units.put("NM", USCustomary.NAUTICAL_MILE);
    units.put("mi", USCustomary.MILE);
    units.put("s", S);
    units.put("ms", MetricPrefix.MILLI(Units.SECOND));
    units.put("min", Units.MINUTE);
    units.put("h", Units.HOUR);
    units.put("kg", KG);
    units.put("g", Units.GRAM);
    units.put("t", Imperial.METRIC_TON);
    units.put("lb", USCustomary.POUND);
    units.put("oz", USCustomary.OUNCE);
    units.put("slug", SLUG);
    units.put("N", Units.NEWTON);
    units.put("kN", MetricPrefix.KILO(Units.NEWTON));
    units.put("lbf", LBF);
    units.put("kt", USCustomary.KNOT);
    units.put("mph", USCustomary.MILE_PER_HOUR);
    units.put("fpm", FT.divide(Units.MINUTE));
    units.put("rad", Units.RADIAN);
    units.put("mrad", MetricPrefix.MILLI(Units.RADIAN));
    units.put("deg", USCustomary.DEGREE_ANGLE);
    units.put("rev", USCustomary.REVOLUTION);
    units.put("rpm", USCustomary.REVOLUTION_PER_MINUTE);
    units.put("Hz", Units.HERTZ);
    units.put("W", Units.WATT);
    units.put("kW", MetricPrefix.KILO(Units.WATT));
    units.put("hp", LBF.multiply(FT).divide(S).multiply(550));
    units.put("J", Units.JOULE);
    units.put("Pa", Units.PASCAL);
    units.put("hPa", MetricPrefix.HECTO(Units.PASCAL));
    units.put("kPa", MetricPrefix.KILO(Units.PASCAL));
    units.put("psf", LBF.divide(FT.pow(2)));
    units.put("psi", LBF.divide(USCustomary.INCH.pow(2)));
    units.put("K", Units.KELVIN);
    units.put("degR", USCustomary.RANKINE);
    units.put("km/h", Units.KILOMETRE_PER_HOUR);
    units.put("ft/s", USCustomary.FOOT_PER_SECOND);
    units.put("deg/s", USCustomary.DEGREE_ANGLE.divide(S));
    units.put("deg/s2", USCustomary.DEGREE_ANGLE.divide(S.pow(2)));
    units.put("ft2", USCustomary.SQUARE_FOOT);
    units.put("slug ft2", SLUG.multiply(FT.pow(2)));
    units.put("lb ft2", USCustomary.POUND.multiply(FT.pow(2)));
    units.put("lbf ft s2", LBF.multiply(FT).multiply(S.pow(2)));
    units.put("kg m2", KG.multiply(M.pow(2)));
    units.put("lbf ft", LBF.multiply(FT));
    units.put("ft*lbf", LBF.multiply(FT));
    units.put("lbf in", LBF.multiply(USCustomary.INCH));
    units.put("N m", Units.NEWTON.multiply(M));
    units.put("slug/ft3", SLUG.divide(FT.pow(3)));
    units.put("lb/ft3", USCustomary.POUND.divide(FT.pow(3)));
    units.put("lb ft-3", USCustomary.POUND.divide(FT.pow(3)));
    units.put("kg m2/s2", Units.JOULE);
    units.put("1/min", Units.MINUTE.inverse());
    return units;
  }

  static Stream<Arguments> libraryUnits() {
    return library().entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
  }

  @ParameterizedTest
  @MethodSource("libraryUnits")
  void sizeAgreesWithTheLibrary(String text, Unit<?> theirs) throws IncommensurableException {
    // Exact inside the library: it converts a whole 1 with rational numbers or 34 digits.
    Number size = theirs.getConverterToAny(theirs.getSystemUnit()).convert((Number) 1);
    assertSize(text, size.doubleValue());
  }

  @ParameterizedTest
  @MethodSource("libraryUnits")
  void dimensionAgreesWithTheLibrary(String text, Unit<?> theirs) {
    Dimension ours = org.rolltrace.core.quantity.Unit.of(text).dimension();
    // The library's angle has no dimension, so the exponent of ours takes no part.
    Unit<?> same =
        M.pow(ours.length())
            .multiply(KG.pow(ours.mass()))
            .multiply(S.pow(ours.time()))
            .multiply(Units.KELVIN.pow(ours.temperature()));
    assertThat(theirs.getDimension()).isEqualTo(same.getDimension());
  }

  @ParameterizedTest
  @CsvSource({
    "bar, 100000", // SI brochure, 9th edition, table 8: 1 bar = 0.1 MPa
    "mbar, 100", // from it
    "degC, 1", // SI brochure, 2.3.1: a difference in degrees Celsius is the same in kelvins
  })
  void sizeAgreesWithTheDefinition(String text, double size) {
    assertSize(text, size);
  }

  @Test
  void fahrenheitDifferenceAgreesWithTheLibrary() throws IncommensurableException {
    var toKelvin = USCustomary.FAHRENHEIT.getConverterToAny(Units.KELVIN);
    double difference = toKelvin.convert(212.0) - toKelvin.convert(32.0);
    // Two temperatures of some 300 K are subtracted: a few 6e-14 K in 100 K.
    assertThat(180 * org.rolltrace.core.quantity.Unit.of("degF").factor())
        .isCloseTo(difference, within(1e-12));
  }

  @Test
  void inchOfMercuryFollowsFromItsDefinition() {
    // Conventional mercury 13595.1 kg/m3, standard gravity 9.80665 m/s2, inch 0.0254 m. The library
    // has a value of seven digits only.
    BigDecimal pascals =
        new BigDecimal("13595.1")
            .multiply(new BigDecimal("9.80665"))
            .multiply(new BigDecimal("0.0254"));
    assertSize("inHg", pascals.doubleValue());
  }

  @Test
  void slugFollowsFromItsDefinition() {
    // A pound-force gives it 1 ft/s2; pound and foot by the agreement of 1959, standard gravity.
    BigDecimal kilograms =
        new BigDecimal("0.45359237")
            .multiply(new BigDecimal("9.80665"))
            .divide(new BigDecimal("0.3048"), MathContext.DECIMAL128);
    assertSize("slug", kilograms.doubleValue());
  }

  // NIST Special Publication 811 (2008), appendix B.8, seven digits as printed (from memory).
  @ParameterizedTest
  @CsvSource({
    "lbf, 4.448222E+00",
    "slug, 1.459390E+01",
    "ft lbf, 1.355818E+00",
    "lbf in, 1.129848E-01",
    "psf, 4.788026E+01",
    "psi, 6.894757E+03",
    "inHg, 3.386389E+03",
    "slug/ft3, 5.153788E+02",
    "lb/ft3, 1.601846E+01",
    "hp, 7.456999E+02",
    "kt, 5.144444E-01",
    "mph, 4.470400E-01",
    "rpm, 1.047198E-01",
    "oz, 2.834952E-02",
    "lb ft2, 4.214011E-02",
  })
  void sizeAgreesWithThePrintedTable(String text, double printed) {
    // Half a unit of the seventh digit, at most 5e-7 of a number that begins with 1.
    assertThat(org.rolltrace.core.quantity.Unit.of(text).factor() / printed)
        .isCloseTo(1, within(5e-7));
  }

  @Test
  void everySymbolIsCheckedAgainstSomethingOutside() {
    Set<String> checked = new TreeSet<>(library().keySet());
    checked.addAll(Set.of("bar", "mbar", "degC", "degF", "inHg"));
    assertThat(checked).containsAll(UnitSymbols.TABLE.keySet());
  }

  private static void assertSize(String text, double expected) {
    double size = org.rolltrace.core.quantity.Unit.of(text).factor();
    assertThat(size / expected).isCloseTo(1, within(ROUNDING));
  }
}
