package org.rolltrace.core.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitTest {
  @ParameterizedTest
  @CsvSource({
    "ft lbf, lbf ft",
    "ft*lbf, lbf ft",
    "slug ft2, lbf ft s2",
    "m/s, m s-1",
    "m s-1, s-1*m",
    "kg/m s2, Pa",
    "kg m-1 s-2, Pa",
    "kg m2/s2, J",
    "W, N m/s",
    "1/s, Hz",
    "1/s-1, s",
    "s1, s",
    "ft3/ft2, ft",
    "rev/min, rpm",
    "ft/min, fpm",
    "1/ft-2, ft2",
  })
  void differentSpellingsOfAUnitAgree(String one, String other) {
    assertThat(Unit.of(one).dimension()).isEqualTo(Unit.of(other).dimension());
    // The order of the products differs, so that each may round a few times at 1.1e-16.
    assertThat(Unit.of(one).factor() / Unit.of(other).factor()).isCloseTo(1, within(1e-15));
  }

  @Test
  void unitsThatAreWholeQuotientsConvertExactly() {
    assertThat(Unit.of("km/h").toSi(36)).isEqualTo(10);
    assertThat(Unit.of("kt").toSi(900)).isEqualTo(463);
    assertThat(Unit.of("ft").toSi(10)).isEqualTo(3.048);
    assertThat(Unit.of("deg").toSi(180)).isEqualTo(Math.PI);
    assertThat(Unit.of("ft").fromSi(3.048)).isEqualTo(10);
    assertThat(Unit.of("deg").fromSi(Math.PI)).isEqualTo(180);
  }

  @Test
  void angleIsNoPlainNumberAndCyclesAreNoAngle() {
    assertThat(Unit.of("deg").dimension()).isNotEqualTo(Dimension.DIMENSIONLESS);
    assertThat(Unit.of("Hz").dimension()).isNotEqualTo(Unit.of("rpm").dimension());
    assertThat(Unit.of("lb").dimension()).isNotEqualTo(Unit.of("lbf").dimension());
    assertThat(Unit.of("N m").dimension()).isNotEqualTo(Unit.of("kg m2").dimension());
  }

  static Stream<Arguments> randomUnits() {
    Random random = new Random(1959);
    List<String> symbols = UnitSymbols.TABLE.keySet().stream().sorted().toList();
    return IntStream.range(0, 200)
        .mapToObj(
            i -> {
              List<String> above = new ArrayList<>();
              List<String> below = new ArrayList<>();
              double factor = 1;
              Dimension dimension = Dimension.DIMENSIONLESS;
              for (int k = random.nextInt(4); k >= 0; k--) {
                String symbol = symbols.get(random.nextInt(symbols.size()));
                int exponent = random.nextInt(4) - 1;
                boolean divides = random.nextBoolean();
                String written = symbol + (exponent == 0 ? "" : Integer.toString(exponent));
                (divides ? below : above).add(written);
                int power = (exponent == 0 ? 1 : exponent) * (divides ? -1 : 1);
                factor *= Math.pow(Unit.of(symbol).factor(), power);
                dimension = dimension.times(Unit.of(symbol).dimension().power(power));
              }
              String separator = random.nextBoolean() ? " " : "*";
              String text = above.isEmpty() ? "1" : String.join(separator, above);
              if (!below.isEmpty()) {
                text += "/" + String.join(separator, below);
              }
              return Arguments.of(text, factor, dimension, random.nextGaussian() * 1000);
            });
  }

  @ParameterizedTest
  @MethodSource("randomUnits")
  void productsAreTheProductOfTheirFactors(
      String text, double factor, Dimension dimension, double value) {
    Unit unit = Unit.of(text);
    assertThat(unit.dimension()).isEqualTo(dimension);
    // At most four factors to the second power, each rounded a few times at 1.1e-16.
    assertThat(unit.factor() / factor).isCloseTo(1, within(5e-15));
    assertThat(unit).hasToString(text).isEqualTo(Unit.of(text)).hasSameHashCodeAs(Unit.of(text));
  }

  @ParameterizedTest
  @MethodSource("randomUnits")
  void conversionsThereAndBackReturnTheValue(
      String text, double factor, Dimension dimension, double value) {
    Unit unit = Unit.of(text);
    // Four roundings of at most 1.1e-16.
    assertThat(unit.fromSi(unit.toSi(value)) / value).isCloseTo(1, within(5e-16));
    assertThat(unit.toSi(1)).isEqualTo(unit.factor());
  }

  static Stream<Dimension> constants() {
    return DimensionTest.constants().stream();
  }

  @ParameterizedTest
  @MethodSource("constants")
  void offeredSpellingsAreOfTheirDimension(Dimension dimension) {
    List<String> symbols = Unit.symbolsOf(dimension);
    assertThat(symbols.isEmpty()).isEqualTo(dimension.equals(Dimension.DIMENSIONLESS));
    assertThat(symbols).doesNotHaveDuplicates();
    assertThat(symbols)
        .allSatisfy(s -> assertThat(Unit.of(s).dimension()).as(s).isEqualTo(dimension));
  }

  @Test
  void everySymbolIsOfferedForItsDimension() {
    assertThat(UnitSymbols.TABLE)
        .allSatisfy(
            (symbol, unit) -> assertThat(Unit.symbolsOf(unit.dimension())).contains(symbol));
  }

  @Test
  void unitsAreEqualWhenSpeltAlike() {
    assertThat(Unit.of("m/s")).isNotEqualTo(Unit.of("m s-1")).isNotEqualTo("m/s");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "KT        | unknown unit 'KT'; did you mean 'kt'?",
        "Ft        | unknown unit 'Ft'; did you mean 'ft'?",
        "hP        | unknown unit 'hP'; did you mean 'hp'?",
        "pa        | unknown unit 'pa'; did you mean 'Pa'?",
        "kts       | unknown unit 'kts'; did you mean 'kt'?",
        "knots     | unknown unit 'knots'; did you mean 'kt'?",
        "Knots     | unknown unit 'Knots'; did you mean 'kt'?",
        "kn        | unknown unit 'kn'; did you mean 'kt' or 'kN'?",
        "feet      | unknown unit 'feet'; did you mean 'ft'?",
        "feet2     | unknown unit 'feet2'; did you mean 'ft2'?",
        "SLUG FT2  | unknown unit 'SLUG'; did you mean 'slug'?",
        "slug FT2  | unknown unit 'FT2'; did you mean 'ft2'?",
        "deg/sec   | unknown unit 'sec'; did you mean 's'?",
        "degrees   | unknown unit 'degrees'; did you mean 'deg'?",
        "dge       | unknown unit 'dge'; did you mean 'deg'?",
        "degs      | unknown unit 'degs'; did you mean 'deg'?",
        "rmp       | unknown unit 'rmp'; did you mean 'rpm'?",
        "slg       | unknown unit 'slg'; did you mean 'slug'?",
        "pse       | unknown unit 'pse'; did you mean 'psf' or 'psi'?",
        "°         | unknown unit '°'; did you mean 'deg'?",
        "°C        | unknown unit '°C'; did you mean 'degC'?",
        "m^2       | unknown unit 'm^2'; did you mean 'm2'?",
        "ft²       | unknown unit 'ft²'; did you mean 'ft2'?",
        "s^-1      | unknown unit 's^-1'; did you mean 's-1'?",
        "N·m       | unknown unit 'N·m'; did you mean 'N m'?",
        "kg-m2     | unknown unit 'kg-m2'; did you mean 'kg m2'?",
        "ft-lb     | unknown unit 'ft-lb'; did you mean 'ft lbf'?",
        "Nm        | unknown unit 'Nm'; did you mean 'N m' or 'NM'?",
        "Nm2       | unknown unit 'Nm2'; did you mean 'NM2'?",
        "kmh       | unknown unit 'kmh'; did you mean 'km/h'?",
        "furlong   | unknown unit 'furlong'",
        "%         | unknown unit '%'",
        "q         | unknown unit 'q'",
        "m²²²²     | unknown unit 'm²²²²'",
        "m+2       | unknown unit 'm+2'",
        "٣m        | unknown unit '٣m'",
      })
  void unknownSymbolsAreNamedAndNearOnesOffered(String text, String message) {
    assertRefused(text, message);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {" m", "m ", "m  s", "kg * m2", "m / s", "m/", "/s", "/", "1/", "m**2", "*m", " "})
  void emptyFactorsAreRefused(String text) {
    assertRefused(
        text,
        "unit '"
            + text
            + "' has a space, '*' or '/' too many; expected one space or '*' between factors and"
            + " none around '/', as in 'slug ft2' or 'deg/s'");
  }

  @ParameterizedTest
  @CsvSource({"1, 1", "2/s, 2", "m/1, 1", "1 m/s, 1", "m 12, 12", "550 ft lbf/s, 550", "m -1, -1"})
  void numbersInUnitsAreRefused(String text, String number) {
    assertRefused(
        text,
        "unit '"
            + text
            + "' has the number "
            + number
            + " in it; expected a number only as the 1 of '1/s'");
  }

  @ParameterizedTest
  @CsvSource({
    "m0, 0",
    "ft10, 10",
    "m02, 02",
    "s-0, -0",
    "s-12, -12",
    "m99999999999999, 99999999999999"
  })
  void exponentsOutsideOneToNineAreRefused(String text, String exponent) {
    assertRefused(
        text,
        "unit '"
            + text
            + "' has the exponent "
            + exponent
            + "; expected one from 1 to 9, or -1 to -9");
  }

  @Test
  void secondSlashIsRefused() {
    assertRefused(
        "m/s/s",
        "unit 'm/s/s' has more than one '/'; expected all that divides after one '/', as in 'm/s2'");
  }

  @Test
  void emptyTextIsRefused() {
    assertRefused("", "empty unit; expected one such as 'ft' or 'deg/s'");
  }

  @Test
  void sizesBeyondTheRangeOfNumbersAreRefused() {
    String huge = "NM9 ".repeat(20).strip();
    String shown = huge.substring(0, 40);
    String fault = "...' has a size out of range; expected fewer factors or lower exponents";
    assertRefused(huge, "unit '" + shown + fault);
    assertRefused("1/" + huge, "unit '1/" + shown.substring(0, 38) + fault);
  }

  @Test
  void lengthOfTheTextIsBoundedAndItsEchoCut() {
    String longest = "m ".repeat(49) + "m2";
    assertThat(Unit.of(longest).dimension()).isEqualTo(Dimension.LENGTH.power(51));
    assertRefused(
        longest + "3",
        "unit 'm m m m m m m m m m m m m m m m m m m m ...' has 101 characters; expected at most"
            + " 100");
  }

  private static void assertRefused(String text, String message) {
    assertThatExceptionOfType(QuantityException.class)
        .isThrownBy(() -> Unit.of(text))
        .withMessage(message);
  }
}
