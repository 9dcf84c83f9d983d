package org.rolltrace.core.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatNullPointerException;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.Random;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class FlightConditionTest {
  private static final FlightCondition LEVEL =
      FlightCondition.of(3000, 10, AirspeedKind.CALIBRATED, 60);

  @Test
  void standardDayHasTheStandardAir() {
    FlightCondition condition = FlightCondition.of(5000, 0, AirspeedKind.TRUE, 80);

    assertThat(condition.pressureAltitude()).isEqualTo(5000);
    assertThat(condition.temperature()).isEqualTo(StandardAtmosphere.temperature(5000));
    assertThat(condition.pressure()).isEqualTo(StandardAtmosphere.pressure(5000));
    assertThat(condition.density()).isEqualTo(StandardAtmosphere.density(5000));
    assertThat(condition.speedOfSound()).isEqualTo(StandardAtmosphere.speedOfSound(5000));
    assertThat(condition.temperatureOffset()).isZero();
  }

  /**
   * A warm day thins the air at one pressure: ρ T and a²/T stay (gas law, a² = γ R T). Rounding
   * only.
   */
  @Test
  void warmDayKeepsThePressureAndThinsTheAir() {
    FlightCondition standard = FlightCondition.of(2000, 0, AirspeedKind.EQUIVALENT, 70);
    FlightCondition warm = FlightCondition.of(2000, 25, AirspeedKind.EQUIVALENT, 70);

    assertThat(warm.pressure()).isEqualTo(standard.pressure());
    assertThat(warm.temperature()).isCloseTo(300.15, within(1e-9));
    assertThat(warm.temperatureOffset()).isCloseTo(25, within(1e-9));
    assertThat(warm.density() / standard.density()).isCloseTo(275.15 / 300.15, within(1e-12));
    assertThat(warm.speedOfSound() / standard.speedOfSound())
        .isCloseTo(Math.sqrt(300.15 / 275.15), within(1e-12));
    // What the pitot reads and what the wing feels do not know the temperature.
    assertThat(warm.calibratedAirspeed()).isEqualTo(standard.calibratedAirspeed());
    assertThat(warm.dynamicPressure() / standard.dynamicPressure()).isCloseTo(1, within(1e-14));
    assertThat(warm.mach() / standard.mach()).isCloseTo(1, within(1e-14));
  }

  @Test
  void densityGivesTheTemperature() {
    FlightCondition offset = FlightCondition.of(1500, -12, AirspeedKind.TRUE, 50);
    FlightCondition density =
        FlightCondition.ofDensity(1500, offset.density(), AirspeedKind.TRUE, 50);

    assertThat(density.density()).isEqualTo(offset.density());
    assertThat(density.temperature()).isCloseTo(offset.temperature(), within(1e-11));
    assertThat(density.temperatureOffset()).isCloseTo(-12, within(1e-11));
    assertThat(density.calibratedAirspeed() / offset.calibratedAirspeed())
        .isCloseTo(1, within(1e-14));
  }

  /**
   * The rounded sea-level density of textbooks, 0.002377 slug/ft³ (common practice), with 1
   * slug/ft³ = 515.37881839 kg/m³: a standard day within what its four digits say, 0.06 K.
   */
  @Test
  void textbookDensityAtSeaLevelIsAStandardDay() {
    FlightCondition condition =
        FlightCondition.ofDensity(0, 0.002377 * 515.37881839, AirspeedKind.TRUE, 53.64);

    assertThat(condition.temperatureOffset()).isCloseTo(0, within(0.07));
  }

  /** The same flight described by each of its three speeds; 1e-13 as in the airspeed relations. */
  @ParameterizedTest
  @MethodSource("conditions")
  void anyOfTheThreeSpeedsDescribesTheFlight(double altitude, double offset, double calibrated) {
    FlightCondition given =
        FlightCondition.of(altitude, offset, AirspeedKind.CALIBRATED, calibrated);

    FlightCondition byTrue =
        FlightCondition.of(altitude, offset, AirspeedKind.TRUE, given.trueAirspeed());
    FlightCondition byEquivalent =
        FlightCondition.of(altitude, offset, AirspeedKind.EQUIVALENT, given.equivalentAirspeed());

    assertThat(given.calibratedAirspeed()).isEqualTo(calibrated);
    assertThat(byTrue.calibratedAirspeed() / calibrated).isCloseTo(1, within(1e-13));
    assertThat(byEquivalent.calibratedAirspeed() / calibrated).isCloseTo(1, within(1e-13));
    assertThat(byEquivalent.trueAirspeed() / given.trueAirspeed()).isCloseTo(1, within(1e-13));
    assertThat(byTrue.mach() / given.mach()).isCloseTo(1, within(1e-13));
  }

  /** q̄ = ½ρV² = ½ρ₀Ve² = 0.7 p M²: three ways to one value, rounding only. */
  @ParameterizedTest
  @MethodSource("conditions")
  void dynamicPressureIsOneThreeWays(double altitude, double offset, double calibrated) {
    FlightCondition c = FlightCondition.of(altitude, offset, AirspeedKind.CALIBRATED, calibrated);
    double ve = c.equivalentAirspeed();

    assertThat(c.dynamicPressure())
        .isEqualTo(0.5 * c.density() * c.trueAirspeed() * c.trueAirspeed());
    assertThat(0.5 * StandardAtmosphere.SEA_LEVEL_DENSITY * ve * ve / c.dynamicPressure())
        .isCloseTo(1, within(1e-13));
    assertThat(0.7 * c.pressure() * c.mach() * c.mach() / c.dynamicPressure())
        .isCloseTo(1, within(1e-13));
    assertThat(c.mach()).isCloseTo(c.trueAirspeed() / c.speedOfSound(), within(1e-15));
  }

  static Stream<Arguments> conditions() {
    Random random = new Random(27);
    return Stream.generate(
            () ->
                Arguments.of(
                    -1000 + 13_000 * random.nextDouble(),
                    -30 + 60 * random.nextDouble(),
                    // 150 m/s calibrated is Mach 0.93 at 12 km.
                    15 + 135 * random.nextDouble()))
        .limit(100);
  }

  @Test
  void startsLevelAtLoadFactorOne() {
    assertThat(LEVEL.loadFactor()).isEqualTo(1);
    assertThat(LEVEL.flightPathAngle()).isZero();
    assertThat(LEVEL.loadFactorGiven()).isFalse();
  }

  /** Straight flight at 60° to the level: lift is half the weight. */
  @Test
  void flightPathBringsTheLoadFactorOfStraightFlight() {
    FlightCondition diving = LEVEL.withFlightPathAngle(-Math.PI / 3);

    assertThat(diving.loadFactor()).isCloseTo(0.5, within(1e-15));
    assertThat(diving.flightPathAngle()).isEqualTo(-Math.PI / 3);
    assertThat(diving.withFlightPathAngle(0)).isEqualTo(LEVEL);
  }

  @Test
  void loadFactorThatWasSetStays() {
    FlightCondition setFirst = LEVEL.withLoadFactor(2).withFlightPathAngle(0.3);
    FlightCondition setLast = LEVEL.withFlightPathAngle(0.3).withLoadFactor(2);

    assertThat(setFirst.loadFactor()).isEqualTo(2);
    assertThat(setFirst.loadFactorGiven()).isTrue();
    assertThat(setFirst).isEqualTo(setLast).hasSameHashCodeAs(setLast);
    assertThat(LEVEL.withLoadFactor(1)).isNotEqualTo(LEVEL);
  }

  @Test
  void anotherSpeedKeepsAirPathAndLoadFactor() {
    FlightCondition pulling = LEVEL.withLoadFactor(1.5).withFlightPathAngle(0.1);

    FlightCondition faster = pulling.withTrueAirspeed(2 * pulling.trueAirspeed());

    assertThat(faster.trueAirspeed()).isEqualTo(2 * pulling.trueAirspeed());
    assertThat(faster.dynamicPressure() / pulling.dynamicPressure()).isCloseTo(4, within(1e-14));
    assertThat(faster.density()).isEqualTo(pulling.density());
    assertThat(faster.loadFactor()).isEqualTo(1.5);
    assertThat(faster.flightPathAngle()).isEqualTo(0.1);
    assertThat(faster.withAirspeed(AirspeedKind.CALIBRATED, 60)).isEqualTo(pulling);
  }

  @Test
  void valuesDifferByAnyPart() {
    assertThat(LEVEL)
        .isEqualTo(FlightCondition.of(3000, 10, AirspeedKind.CALIBRATED, 60))
        .isNotEqualTo(FlightCondition.of(3001, 10, AirspeedKind.CALIBRATED, 60))
        .isNotEqualTo(FlightCondition.of(3000, 11, AirspeedKind.CALIBRATED, 60))
        .isNotEqualTo(FlightCondition.of(3000, 10, AirspeedKind.TRUE, 60))
        .isNotEqualTo(LEVEL.withFlightPathAngle(0.01))
        .isNotEqualTo("3000 m");
  }

  @Test
  void printsTheSameInAnyLocale() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertThat(LEVEL.toString()).contains("altitude 3000.00 m", "278.650 K", "n 1.00000");
    } finally {
      Locale.setDefault(before);
    }
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -5001, 20_001})
  void refusesAltitudesOutsideTheModel(double altitude) {
    assertRefused(
        () -> FlightCondition.of(altitude, 0, AirspeedKind.TRUE, 50),
        "pressure",
        "" + altitude,
        "-5000.0 to 20000.0");
    assertRefused(
        () -> FlightCondition.ofDensity(altitude, 1, AirspeedKind.TRUE, 50),
        "pressure",
        "" + altitude,
        "-5000.0 to 20000.0");
  }

  /** 288.15 stands for the temperature itself given in place of the offset. */
  @ParameterizedTest
  @ValueSource(
      doubles = {
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        -300,
        -139,
        112,
        288.15
      })
  void refusesOffsetsThatMakeNoAir(double offset) {
    assertRefused(
        () -> FlightCondition.of(0, offset, AirspeedKind.TRUE, 50),
        "temperature offset",
        "" + offset,
        "expected");
  }

  /** 0.002377 stands for slug/ft³ given in place of kg/m³. */
  @ParameterizedTest
  @ValueSource(
      doubles = {
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        -1,
        0,
        0.002377,
        0.88,
        2.4
      })
  void refusesDensitiesThatMakeNoAir(double density) {
    assertRefused(
        () -> FlightCondition.ofDensity(0, density, AirspeedKind.TRUE, 50),
        "density",
        "" + density,
        "expected");
  }

  @Test
  void saysWhichDensitiesWouldDo() {
    assertRefused(
        () -> FlightCondition.ofDensity(0, 2.4, AirspeedKind.TRUE, 50),
        // p0/(R T) at 400 K and at 150 K.
        "from 0.882459 to 2.35322");
  }

  @ParameterizedTest
  @EnumSource(AirspeedKind.class)
  void refusesInvalidSpeedsOfEachKind(AirspeedKind kind) {
    double[] invalid = {
      Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -50, -0.0, 0, 400
    };
    for (double speed : invalid) {
      assertRefused(() -> FlightCondition.of(0, 0, kind, speed), kind.role(), "" + speed);
      assertRefused(() -> LEVEL.withAirspeed(kind, speed), kind.role(), "" + speed);
    }
    assertRefused(() -> FlightCondition.of(0, 0, kind, Double.MIN_VALUE), "dynamic pressure");
  }

  @Test
  void refusesSupersonicFlightInTermsOfTheSpeedGiven() {
    assertRefused(
        () -> FlightCondition.of(12_000, 0, AirspeedKind.TRUE, 296),
        "true airspeed, m/s, is 296.0",
        "Mach 1.003",
        "expected below Mach 1");
    assertRefused(
        () -> FlightCondition.of(12_000, 0, AirspeedKind.CALIBRATED, 170),
        "calibrated airspeed, m/s, is 170.0",
        "Mach 1.0",
        "expected below Mach 1");
    // The same speed is subsonic in air 20 K warmer.
    assertThat(FlightCondition.of(12_000, 20, AirspeedKind.TRUE, 296).mach()).isLessThan(0.96);
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        Math.PI / 2,
        -Math.PI / 2,
        5
      })
  void refusesPathsThatAreVerticalOrMore(double angle) {
    assertRefused(() -> LEVEL.withFlightPathAngle(angle), "flight-path angle", "" + angle, "π/2");
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
  void refusesLoadFactorsThatAreNoNumbers(double loadFactor) {
    assertRefused(() -> LEVEL.withLoadFactor(loadFactor), "load factor", "" + loadFactor);
  }

  @Test
  void refusesASpeedOfNoKind() {
    assertThatNullPointerException()
        .isThrownBy(() -> FlightCondition.of(0, 0, null, 50))
        .withMessageContaining("kind of airspeed");
  }

  private static void assertRefused(ThrowingCallable call, String... parts) {
    assertThatIllegalArgumentException()
        .isThrownBy(call)
        .satisfies(e -> assertThat(e.getMessage()).contains(parts));
  }
}
