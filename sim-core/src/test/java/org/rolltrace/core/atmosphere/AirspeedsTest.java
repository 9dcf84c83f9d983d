package org.rolltrace.core.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class AirspeedsTest {
  private static final double KNOT = 1852.0 / 3600;
  private static final double A0 = StandardAtmosphere.SEA_LEVEL_SPEED_OF_SOUND;
  private static final double P0 = StandardAtmosphere.SEA_LEVEL_PRESSURE;
  private static final double RHO0 = StandardAtmosphere.SEA_LEVEL_DENSITY;

  /** The file says how its values were computed; half a unit of their last digit. */
  @ParameterizedTest
  @CsvFileSource(resources = "/reference/airspeed-computed.csv", useHeadersInDisplayName = true)
  void agreesWithValuesComputedElsewhere(
      double calibratedKnots,
      double altitudeFeet,
      double impactPressure,
      double mach,
      double equivalentKnots,
      double trueKnots) {
    double altitude = altitudeFeet * 0.3048;
    double pressure = StandardAtmosphere.pressure(altitude);
    double density = StandardAtmosphere.density(altitude);
    double calibrated = calibratedKnots * KNOT;

    assertThat(Airspeeds.mach(impactPressure, pressure)).isCloseTo(mach, within(0.51e-7));
    assertThat(Airspeeds.equivalentFromCalibrated(calibrated, pressure) / KNOT)
        .isCloseTo(equivalentKnots, within(0.51e-5));
    assertThat(Airspeeds.trueFromCalibrated(calibrated, pressure, density) / KNOT)
        .isCloseTo(trueKnots, within(0.51e-5));
    assertThat(Airspeeds.calibratedFromTrue(trueKnots * KNOT, pressure, density) / KNOT)
        .isCloseTo(calibratedKnots, within(0.51e-5));
    // The Mach number's last digit, 0.5e-7, is at most 0.007 Pa of impact pressure.
    assertThat(Airspeeds.impactPressure(mach, pressure)).isCloseTo(impactPressure, within(0.007));
  }

  /**
   * 1e-13 relative: two pairs of log1p and expm1 each way, each good to about 2e-16 and none of
   * them amplifying it more than twofold, give 2e-15; the slowest speeds keep the same digits.
   */
  @ParameterizedTest
  @MethodSource("speedsAndAir")
  void thereAndBackKeepsTheSpeed(double speed, double pressure, double density) {
    double viaTrue =
        Airspeeds.calibratedFromTrue(
            Airspeeds.trueFromCalibrated(speed, pressure, density), pressure, density);
    double viaEquivalent =
        Airspeeds.equivalentFromCalibrated(
            Airspeeds.calibratedFromEquivalent(speed, pressure), pressure);
    double viaDensity =
        Airspeeds.trueFromEquivalent(Airspeeds.equivalentFromTrue(speed, density), density);

    assertThat(viaTrue / speed).isCloseTo(1, within(1e-13));
    assertThat(viaEquivalent / speed).isCloseTo(1, within(1e-13));
    assertThat(viaDensity / speed).isCloseTo(1, within(1e-13));
  }

  static Stream<Arguments> speedsAndAir() {
    Random random = new Random(8);
    Stream<Arguments> slow =
        Stream.of(1e-6, 1e-3, 1.0, 20.0)
            .map(v -> Arguments.of(v, StandardAtmosphere.pressure(3000), 0.95));
    Stream<Arguments> scattered =
        Stream.generate(
                () -> {
                  double pressure =
                      StandardAtmosphere.pressure(-1000 + 13_000 * random.nextDouble());
                  double temperature = 200 + 110 * random.nextDouble();
                  double density = pressure / (StandardAtmosphere.GAS_CONSTANT * temperature);
                  // Up to 0.99 of the speed of sound in equivalent terms, below a0 in calibrated.
                  double fastest = 0.99 * A0 * Math.min(1, Math.sqrt(pressure / P0));
                  return Arguments.of(20 + (fastest - 20) * random.nextDouble(), pressure, density);
                })
            .limit(200);
    return Stream.concat(slow, scattered);
  }

  @ParameterizedTest
  @MethodSource("machNumbers")
  void machInvertsImpactPressure(double mach) {
    double impactPressure = Airspeeds.impactPressure(mach, 54_321);

    assertThat(Airspeeds.mach(impactPressure, 54_321) / mach).isCloseTo(1, within(1e-13));
  }

  /**
   * A second route: the total pressure is found by integrating the compressible momentum equation
   * dp = −ρ V dV along an isentrope to rest, and the calibrated airspeed by bisection for that rise
   * at sea level. Error of 2000 Simpson steps is far below 1e-10; bisection ends at 1e-12 relative.
   */
  @ParameterizedTest
  @ValueSource(doubles = {20, 60, 120, 200, 290})
  void agreesWithStagnationByIntegrationAndBisection(double trueAirspeed) {
    double pressure = 60_000;
    double density = 0.8;
    double rise = stagnationRise(trueAirspeed, pressure, density);
    double low = 0;
    double high = A0;
    while (high - low > 1e-12 * A0) {
      double middle = (low + high) / 2;
      if (stagnationRise(middle, P0, RHO0) < rise) {
        low = middle;
      } else {
        high = middle;
      }
    }

    double calibrated = Airspeeds.calibratedFromTrue(trueAirspeed, pressure, density);

    double mach = trueAirspeed / Math.sqrt(1.4 * pressure / density);
    assertThat(Airspeeds.impactPressure(mach, pressure) / rise).isCloseTo(1, within(1e-10));
    assertThat(calibrated / low).isCloseTo(1, within(1e-10));
  }

  /**
   * Pressure rise to rest. With e = V²/2, dp/de' = ρ as the kinetic energy turns into enthalpy: ρ =
   * ρ₁ (T/T₁)^2.5 and cp (T − T₁) = e', cp = 3.5 R; so the rise is the integral of ρ over e'.
   */
  private static double stagnationRise(double speed, double pressure, double density) {
    double enthalpy = 3.5 * pressure / density;
    double energy = speed * speed / 2;
    DoubleUnaryOperator localDensity = e -> density * Math.pow(1 + e / enthalpy, 2.5);
    int steps = 2000;
    double step = energy / steps;
    double sum = localDensity.applyAsDouble(0) + localDensity.applyAsDouble(energy);
    for (int i = 1; i < steps; i++) {
      sum += (i % 2 == 0 ? 2 : 4) * localDensity.applyAsDouble(i * step);
    }
    return sum * step / 3;
  }

  /** On a standard day at sea level all three are one, by definition; rounding only. */
  @ParameterizedTest
  @ValueSource(doubles = {0.01, 20, 100, 340})
  void allKindsAgreeAtSeaLevel(double speed) {
    assertThat(Airspeeds.equivalentFromCalibrated(speed, P0) / speed).isCloseTo(1, within(1e-14));
    assertThat(Airspeeds.trueFromCalibrated(speed, P0, RHO0) / speed).isCloseTo(1, within(1e-14));
  }

  /** Above sea level the pitot reads high against equivalent: the usual sign, common practice. */
  @Test
  void compressibilityCorrectionIsNegativeAloftAndPositiveBelowSeaLevel() {
    assertThat(Airspeeds.equivalentFromCalibrated(150, 50_000)).isLessThan(149);
    assertThat(Airspeeds.equivalentFromCalibrated(150, 120_000)).isGreaterThan(150.3);
  }

  @Test
  void restIsRest() {
    assertThat(Airspeeds.calibratedFromTrue(0, 50_000, 0.7)).isZero();
    assertThat(Airspeeds.trueFromCalibrated(0, 50_000, 0.7)).isZero();
  }

  @Test
  void refusesSupersonicFlight() {
    String wayOut = "Lower the speed or the altitude";
    assertRefused(() -> Airspeeds.impactPressure(1, P0), "1.0", "Mach 1", wayOut);
    assertRefused(() -> Airspeeds.mach(0.8930 * P0, P0), "impact pressure", "Mach 1.0", wayOut);
    // 300 m/s calibrated is supersonic at 12 km.
    assertRefused(
        () -> Airspeeds.equivalentFromCalibrated(300, StandardAtmosphere.pressure(12_000)),
        "calibrated airspeed",
        "300.0",
        "Mach 1.",
        wayOut);
    assertRefused(
        () -> Airspeeds.calibratedFromEquivalent(200, StandardAtmosphere.pressure(12_000)),
        "equivalent airspeed",
        "200.0",
        "Mach 1.",
        wayOut);
  }

  @Test
  void refusesCalibratedAboveTheSpeedOfSoundAtSeaLevel() {
    assertThatCode(() -> Airspeeds.equivalentFromCalibrated(A0, 110_000))
        .doesNotThrowAnyException();
    assertRefused(
        () -> Airspeeds.equivalentFromCalibrated(Math.nextUp(A0), 110_000),
        "calibrated airspeed",
        "speed of sound at sea level",
        "340.29");
    // Below sea level the calibrated airspeed passes a0 before the flight is supersonic.
    assertRefused(
        () -> Airspeeds.calibratedFromEquivalent(350, 120_000),
        "calibrated airspeed",
        "speed of sound at sea level");
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -1e-9})
  void refusesInvalidSpeeds(double speed) {
    assertRefused(() -> Airspeeds.impactPressure(speed, P0), "Mach", "" + speed);
    assertRefused(() -> Airspeeds.mach(speed, P0), "impact pressure", "" + speed);
    assertRefused(() -> Airspeeds.equivalentFromCalibrated(speed, P0), "calibrated", "" + speed);
    assertRefused(() -> Airspeeds.calibratedFromEquivalent(speed, P0), "equivalent", "" + speed);
    assertRefused(() -> Airspeeds.equivalentFromTrue(speed, RHO0), "true", "" + speed);
    assertRefused(() -> Airspeeds.trueFromEquivalent(speed, RHO0), "equivalent", "" + speed);
    assertRefused(() -> Airspeeds.trueFromCalibrated(speed, P0, RHO0), "calibrated", "" + speed);
    assertRefused(() -> Airspeeds.calibratedFromTrue(speed, P0, RHO0), "true", "" + speed);
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -1, 0})
  void refusesInvalidAir(double value) {
    assertRefused(() -> Airspeeds.impactPressure(0.5, value), "static pressure", "" + value);
    assertRefused(() -> Airspeeds.mach(1, value), "static pressure", "" + value);
    assertRefused(() -> Airspeeds.equivalentFromCalibrated(50, value), "pressure", "" + value);
    assertRefused(() -> Airspeeds.calibratedFromEquivalent(50, value), "pressure", "" + value);
    assertRefused(() -> Airspeeds.equivalentFromTrue(50, value), "density", "" + value);
    assertRefused(() -> Airspeeds.trueFromEquivalent(50, value), "density", "" + value);
    assertRefused(() -> Airspeeds.trueFromCalibrated(50, P0, value), "density", "" + value);
    assertRefused(() -> Airspeeds.calibratedFromTrue(50, value, RHO0), "pressure", "" + value);
  }

  private static void assertRefused(ThrowingCallable call, String... parts) {
    assertThatIllegalArgumentException()
        .isThrownBy(call)
        .satisfies(e -> assertThat(e.getMessage()).contains(parts));
  }

  static Stream<Double> machNumbers() {
    return Stream.concat(
        Stream.of(1e-9, 1e-4, 0.058, 0.999), new Random(35).doubles(50, 0.01, 0.999).boxed());
  }
}
