package org.rolltrace.core.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityTest {
  private static final String LENGTHS = " (m, ft, in, km, cm, ...)";

  // Arithmetic on the definitions: foot 0.3048 m, pound 0.45359237 kg, standard gravity 9.80665
  // m/s2, nautical mile 1852 m, horsepower 550 ft lbf/s.
  @ParameterizedTest
  @CsvSource({
    "33.4 ft, LENGTH, 10.18032",
    "184 ft2, AREA, 17.09415936",
    "2750 lb, MASS, 1247.3790175",
    "1048 slug ft2, INERTIA, 1420.8972098513",
    "120 kt, SPEED, 61.733333333333333",
    "90 deg, ANGLE, 1.5707963267948966",
    "2400 rpm, ANGULAR_RATE, 251.32741228718346",
    "30 lbf, FORCE, 133.446648457815",
    "180 hp, POWER, 134225.97688480864",
    "18 degF, TEMPERATURE_DIFFERENCE, 10",
    "0.15 s, TIME, 0.15",
    "0.0023769 slug/ft3, DENSITY, 1.2250039134",
    "-8.4 1/s, FREQUENCY, -8.4",
  })
  void quantitiesBecomeSi(String text, String dimension, double si)
      throws ReflectiveOperationException {
    Dimension expected = (Dimension) Dimension.class.getField(dimension).get(null);
    // The expected values are written with eight digits or more.
    assertThat(Quantity.parse(text, expected)).isCloseTo(si, within(Math.abs(si) * 1e-8));
  }

  @ParameterizedTest
  @CsvSource({
    "1 m, 1",
    "+1 m, 1",
    "-1 m, -1",
    "1. m, 1",
    ".5 m, 0.5",
    "-.5 m, -0.5",
    "0012 m, 12",
    "1e3 m, 1000",
    "1E3 m, 1000",
    "1e+3 m, 1000",
    "1.5e-3 m, 0.0015",
    "1.e2 m, 100",
    "1    m, 1",
    "3.14159265358979323846264338327950288419716939937510 m, 3.141592653589793",
    "0 m, 0",
    "0.000e400 m, 0",
    "1e308 m, 1e308",
    "4.9e-324 m, 4.9e-324",
  })
  void numbersAreDecimal(String text, double value) {
    assertThat(Quantity.parse(text, Dimension.LENGTH)).isEqualTo(value);
  }

  @Test
  void minusZeroIsZero() {
    assertThat(Double.doubleToRawLongBits(Quantity.parse("-0 deg", Dimension.ANGLE))).isZero();
  }

  @Test
  void plainNumberStandsAlone() {
    assertThat(Quantity.parse("-0.25", Dimension.DIMENSIONLESS)).isEqualTo(-0.25);
    assertThat(Quantity.parse("0.5 ft/ft", Dimension.DIMENSIONLESS)).isEqualTo(0.5);
  }

  static Stream<Arguments> randomQuantities() {
    Random random = new Random(76);
    List<String> symbols = UnitSymbols.TABLE.keySet().stream().sorted().toList();
    return IntStream.range(0, 200)
        .mapToObj(
            i -> {
              double value = random.nextGaussian() * Math.pow(10, random.nextInt(13) - 6);
              return Arguments.of(value, symbols.get(random.nextInt(symbols.size())));
            });
  }

  @ParameterizedTest
  @MethodSource("randomQuantities")
  void writtenAndReadAgainTheValueIsTheSame(double value, String unit) {
    Dimension dimension = Unit.of(unit).dimension();
    for (String number : List.of(Double.toString(value), new BigDecimal(value).toPlainString())) {
      String text = number + " " + unit;
      if (text.length() <= 100) {
        double si = Quantity.parse(text, dimension);
        assertThat(si).isEqualTo(Unit.of(unit).toSi(value));
        // Four roundings of at most 1.1e-16.
        assertThat(Quantity.toUnit(si, unit) / value).isCloseTo(1, within(5e-16));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("randomQuantities")
  void everyOtherDimensionIsRefused(double value, String unit) {
    Dimension own = Unit.of(unit).dimension();
    String text = value + " " + unit;
    assertThat(DimensionTest.constants())
        .filteredOn(dimension -> !dimension.equals(own))
        .allSatisfy(
            other ->
                assertThatExceptionOfType(QuantityException.class)
                    .isThrownBy(() -> Quantity.parse(text, other))
                    .withMessageContaining(own.name())
                    .withMessageContaining("; expected ")
                    .withMessageContaining(other.name()));
  }

  @Test
  void missingUnitIsNamed() {
    assertRefused("33.4", "\"33.4\" has no unit; expected a length such as \"33.4 ft\"" + LENGTHS);
    assertRefused(
        "33.4 ",
        "\"33.4 \" has nothing after the space; expected a length such as \"33.4 ft\"" + LENGTHS);
    assertRefused(
        "33.4ft",
        "\"33.4ft\" has no space after the number 33.4; expected a length such as \"33.4 ft\""
            + LENGTHS);
  }

  @Test
  void wrongDimensionIsNamed() {
    assertRefused("3 kg", "\"3 kg\" is a mass; expected a length" + LENGTHS);
    assertRefused("3 ft2", "\"3 ft2\" is an area; expected a length" + LENGTHS);
    assertRefused(
        "12 lb ft",
        Dimension.MOMENT,
        "\"12 lb ft\" is a quantity in kg m; expected a moment"
            + " (N m, lbf ft, ft lbf, kN m, lbf in, ...)");
    assertRefused("30 lb", Dimension.FORCE, "\"30 lb\" is a mass; expected a force (N, lbf, kN)");
    assertRefused(
        "2 Hz",
        Dimension.ANGULAR_RATE,
        "\"2 Hz\" is a frequency; expected an angular rate (deg/s, rad/s, rpm, rev/s)");
    assertRefused(
        "5 deg", Dimension.DIMENSIONLESS, "\"5 deg\" is an angle; expected a plain number");
  }

  @Test
  void unknownUnitIsNamed() {
    assertRefused(
        "12 furlong", "\"12 furlong\" is not a length" + LENGTHS + ": unknown unit 'furlong'");
    assertRefused(
        "120 KT",
        Dimension.SPEED,
        "\"120 KT\" is not a speed (m/s, kt, ft/s, km/h, mph, ...): unknown unit 'KT';"
            + " did you mean 'kt'?");
    assertRefused(
        "5 %", Dimension.DIMENSIONLESS, "\"5 %\" is not a plain number: unknown unit '%'");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        " ",
        "ft",
        "NaN ft",
        "Infinity ft",
        "-Infinity ft",
        "- 3 ft",
        "--3 ft",
        ". ft",
        "e3 ft",
        " 3 ft",
        "−3 ft",
        "٣ ft",
        "½ ft",
        "+ ft",
        ",5 ft",
        "(3) ft"
      })
  void textWithoutNumberIsRefused(String text) {
    assertRefused(
        text,
        "\""
            + text
            + "\" does not begin with a decimal number; expected a length such as \"12 ft\""
            + LENGTHS);
  }

  @ParameterizedTest
  @CsvSource({
    "0x10 m, 0",
    "0x1p3 m, 0",
    "1f m, 1",
    "1.0d m, 1.0",
    "1.2.3 m, 1.2",
    "1e m, 1",
    "1e+ m, 1",
    "1_000 m, 1",
    "1'000 m, 1",
    "5'10\" m, 5",
    "1e2.5 m, 1e2",
    "33-ft, 33",
  })
  void numberEndsWhereTheDecimalNumberDoes(String text, String number) {
    assertRefused(
        text,
        "\""
            + text
            + "\" has no space after the number "
            + number
            + "; expected a length such as \""
            + number
            + " ft\""
            + LENGTHS);
  }

  @ParameterizedTest
  @ValueSource(strings = {"1,5 ft", "1,048.5 ft", "-1.0,5 ft", "1,"})
  void commaIsRefused(String text) {
    assertRefused(
        text,
        "\""
            + text
            + "\" has a comma; the decimal mark is a point; expected a length such as \"12 ft\""
            + LENGTHS);
  }

  @Test
  void whatCannotBeSeenIsSpeltOut() {
    assertRefused(
        "3\u00a0ft",
        "\"3\\u00a0ft\" has no space after the number 3; expected a length such as \"3 ft\""
            + LENGTHS);
    assertRefused(
        "3\tft",
        "\"3\\u0009ft\" has no space after the number 3; expected a length such as \"3 ft\""
            + LENGTHS);
    assertRefused(
        "3 ft\u001b[31m",
        "\"3 ft\\u001b[31m\" is not a length" + LENGTHS + ": unknown unit 'ft\\u001b[31m'");
    assertRefused(
        "3 q\u202e", "\"3 q\\u202e\" is not a length" + LENGTHS + ": unknown unit 'q\\u202e'");
    assertRefused(
        "3 \ud83d", "\"3 \\ud83d\" is not a length" + LENGTHS + ": unknown unit '\\ud83d'");
  }

  @ParameterizedTest
  @ValueSource(strings = {"1e400 ft", "-1e400 ft", "1e308 NM", "1e99999999999999999999 ft"})
  void valuesTooLargeAreRefused(String text) {
    assertRefused(
        text,
        "\""
            + text
            + "\" is too large to be computed with; expected a length such as \"12 ft\""
            + LENGTHS);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"1e-400 ft", "-1e-400 ft", "4.9e-324 mm", "0.01e-99999999999999999999 ft"})
  void numbersThatWouldVanishAreRefused(String text) {
    assertRefused(
        text,
        "\""
            + text
            + "\" is too small to be told from 0; expected a length such as \"0 ft\""
            + LENGTHS);
  }

  @Test
  void rangeHoldsForPlainNumbersToo() {
    assertRefused(
        "1e400",
        Dimension.DIMENSIONLESS,
        "\"1e400\" is too large to be computed with; expected a plain number such as \"12\"");
    assertRefused(
        "5x",
        Dimension.DIMENSIONLESS,
        "\"5x\" has something after the number 5; expected a plain number such as \"5\"");
  }

  @Test
  void lengthOfTheTextIsBoundedAndItsEchoCut() {
    String longest = "0".repeat(97) + "1 m";
    assertThat(Quantity.parse(longest, Dimension.LENGTH)).isEqualTo(1);
    assertRefused(
        "0" + longest,
        "\""
            + "0".repeat(40)
            + "...\" has 101 characters; expected at most 100 for a length such as \"12 ft\""
            + LENGTHS);
  }

  @Test
  void outputIsInTheUnitAskedFor() {
    assertThat(Quantity.toUnit(Math.PI, "deg")).isEqualTo(180);
    assertThat(Quantity.toUnit(463, "kt")).isEqualTo(900);
    assertThat(Quantity.toUnit(Double.NaN, "kt")).isNaN();
    assertThatExceptionOfType(QuantityException.class)
        .isThrownBy(() -> Quantity.toUnit(1, "KT"))
        .withMessage("unknown unit 'KT'; did you mean 'kt'?");
  }

  // German writes the decimal mark as a comma; Turkish has two letters i, which upsets comparisons
  // without regard to case; Arabic of Egypt has its own digits.
  @ParameterizedTest
  @ValueSource(strings = {"de-DE", "tr", "ar-EG-u-nu-arab"})
  void defaultLocaleChangesNothing(String locale) {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag(locale));
      assertThat(Quantity.parse("1234.5 mi", Dimension.LENGTH)).isEqualTo(1234.5 * 1609.344);
      assertThat(Quantity.parse("1.5 min", Dimension.TIME)).isEqualTo(90);
      assertRefused(
          "1,5 ft",
          "\"1,5 ft\" has a comma; the decimal mark is a point; expected a"
              + " length such as \"12 ft\""
              + LENGTHS);
      assertRefused(
          "3 MIN",
          "\"3 MIN\" is not a length" + LENGTHS + ": unknown unit 'MIN'; did you mean 'min'?");
      assertRefused(
          "3 MILE",
          "\"3 MILE\" is not a length" + LENGTHS + ": unknown unit 'MILE'; did you mean 'mi'?");
      assertRefused(
          "3\tft",
          "\"3\\u0009ft\" has no space after the number 3; expected a length such as \"3 ft\""
              + LENGTHS);
    } finally {
      Locale.setDefault(before);
    }
  }

  private static void assertRefused(String text, String message) {
    assertRefused(text, Dimension.LENGTH, message);
  }

  private static void assertRefused(String text, Dimension expected, String message) {
    assertThatExceptionOfType(QuantityException.class)
        .isThrownBy(() -> Quantity.parse(text, expected))
        .withMessage(message);
  }
}
