package org.rolltrace.core.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class StandardAtmosphereTest {

  /** The file says how its values were computed; half a unit of their last digit. */
  @ParameterizedTest
  @CsvFileSource(
      resources = "/reference/standard-atmosphere-1976-geopotential-computed.csv",
      useHeadersInDisplayName = true)
  void agreesWithValuesComputedElsewhere(
      double altitude, double temperature, double pressure, double density, double speedOfSound) {
    assertThat(StandardAtmosphere.temperature(altitude)).isCloseTo(temperature, within(0.51e-4));
    assertThat(StandardAtmosphere.pressure(altitude)).isCloseTo(pressure, within(0.51e-4));
    assertThat(StandardAtmosphere.density(altitude)).isCloseTo(density, within(0.51e-7));
    assertThat(StandardAtmosphere.speedOfSound(altitude)).isCloseTo(speedOfSound, within(0.51e-4));
  }

  /**
   * dp/dH = −ρ g₀ integrated from sea level by the classical Runge-Kutta method, with nothing taken
   * from the code but the temperature. Error of the method in 10 m steps: about (step/8000 m)⁴ of
   * the pressure, 3e-12; rounding of 2000 steps stays below 1e-12.
   */
  @ParameterizedTest
  @ValueSource(doubles = {-5000, -2000, 3000, 8000, 11_000, 15_000, 20_000})
  void pressureSolvesTheHydrostaticEquation(double altitude) {
    double integrated =
        integrate(101_325, 0, altitude, h -> 9.80665 / StandardAtmosphere.temperature(h));

    assertThat(StandardAtmosphere.pressure(altitude) / integrated).isCloseTo(1, within(1e-11));
  }

  /**
   * The same in geometric altitude, dp/dz = −ρ g(z) with gravity falling as the inverse square:
   * this checks the relation of the two altitudes, which is made so that both give one pressure.
   */
  @ParameterizedTest
  @ValueSource(doubles = {-3000, 5000, 10_980, 12_000, 20_000})
  void geopotentialAltitudeAccountsForTheFallOfGravity(double geometric) {
    double radius = 6_356_766;
    double integrated =
        integrate(
            101_325,
            0,
            geometric,
            z ->
                9.80665
                    * Math.pow(radius / (radius + z), 2)
                    / StandardAtmosphere.temperature(StandardAtmosphere.geopotentialAltitude(z)));

    double pressure =
        StandardAtmosphere.pressure(StandardAtmosphere.geopotentialAltitude(geometric));
    // Steps do not end at the tropopause here, so the kink in T costs some of the method's order.
    assertThat(pressure / integrated).isCloseTo(1, within(1e-8));
  }

  /** Integrates dp/dx = −p k(x)/R. */
  private static double integrate(double start, double from, double to, DoubleUnaryOperator k) {
    double gasConstant = 8314.32 / 28.9644;
    int steps = (int) Math.round(Math.abs(to - from) / 10);
    double dx = (to - from) / steps;
    double p = start;
    for (int i = 0; i < steps; i++) {
      double x = from + i * dx;
      double begin = -k.applyAsDouble(x) / gasConstant;
      double middle = -k.applyAsDouble(x + dx / 2) / gasConstant;
      double end = -k.applyAsDouble(x + dx) / gasConstant;
      double k1 = begin * p;
      double k2 = middle * (p + dx / 2 * k1);
      double k3 = middle * (p + dx / 2 * k2);
      double k4 = end * (p + dx * k3);
      p += dx / 6 * (k1 + 2 * k2 + 2 * k3 + k4);
    }
    return p;
  }

  /**
   * Tables against geometric altitude must not be read as geopotential: at 11 000 m they differ by
   * 0.124 K and 68 Pa (U.S. Standard Atmosphere 1976, Table I, from memory: 216.774 K, 22 699 Pa).
   */
  @Test
  void elevenKilometresGeometricIsNotTheTropopause() {
    double h = StandardAtmosphere.geopotentialAltitude(11_000);

    assertThat(h).isCloseTo(10_980.998, within(0.0005));
    assertThat(StandardAtmosphere.temperature(h)).isCloseTo(216.774, within(0.001));
    assertThat(StandardAtmosphere.temperature(11_000)).isCloseTo(216.650, within(1e-9));
    assertThat(StandardAtmosphere.pressure(h) - StandardAtmosphere.pressure(11_000))
        .isCloseTo(67.9, within(0.1));
  }

  /** Across a gap of 2 µm, pressure changes by ρ g ΔH = 7e-6 Pa; below, temperature by 6.5e-9 K. */
  @Test
  void layersMeetAtTheTropopause() {
    double below = 11_000 - 1e-6;
    double above = 11_000 + 1e-6;

    assertThat(StandardAtmosphere.pressure(below))
        .isCloseTo(StandardAtmosphere.pressure(above), within(1e-5));
    assertThat(StandardAtmosphere.temperature(below))
        .isCloseTo(StandardAtmosphere.temperature(above), within(7e-9));
  }

  /**
   * 1e-10 m: rounding of the pressure's logarithm (1e-15) times the scale height, 8 km, with room.
   */
  @ParameterizedTest
  @MethodSource("altitudes")
  void pressureAltitudeInvertsPressure(double altitude) {
    assertThat(StandardAtmosphere.pressureAltitude(StandardAtmosphere.pressure(altitude)))
        .isCloseTo(altitude, within(1e-10));
  }

  /** 2e-11 m: five units in the last place of 20 000 m. */
  @ParameterizedTest
  @MethodSource("altitudes")
  void geometricAltitudeInvertsGeopotential(double altitude) {
    double geometric = StandardAtmosphere.geometricAltitude(altitude);

    assertThat(StandardAtmosphere.geopotentialAltitude(geometric))
        .isCloseTo(altitude, within(2e-11));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-5000, 20_000})
  void bothEndsOfTheRangeSurviveThereAndBack(double altitude) {
    double viaPressure = StandardAtmosphere.pressureAltitude(StandardAtmosphere.pressure(altitude));
    double viaGeometric =
        StandardAtmosphere.geopotentialAltitude(StandardAtmosphere.geometricAltitude(altitude));

    assertThat(StandardAtmosphere.density(viaPressure))
        .isCloseTo(StandardAtmosphere.density(viaGeometric), withinPercentage(1e-9));
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        -5000.001,
        20_000.001,
        36_089.24
      })
  void refusesAltitudesOutsideTheModel(double altitude) {
    assertRefused(StandardAtmosphere::temperature, altitude, "-5000.0 to 20000.0");
    assertRefused(StandardAtmosphere::pressure, altitude, "-5000.0 to 20000.0");
    assertRefused(StandardAtmosphere::density, altitude, "-5000.0 to 20000.0");
    assertRefused(StandardAtmosphere::speedOfSound, altitude, "-5000.0 to 20000.0");
    assertRefused(StandardAtmosphere::geometricAltitude, altitude, "-5000.0 to 20000.0");
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -4997, 20_064})
  void refusesGeometricAltitudesOutsideTheModel(double altitude) {
    assertRefused(StandardAtmosphere::geopotentialAltitude, altitude, "-4996.07");
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {Double.NaN, Double.POSITIVE_INFINITY, -101_325, 0, 1013.25, 5474, 177_688})
  void refusesPressuresOutsideTheModel(double pressure) {
    assertRefused(StandardAtmosphere::pressureAltitude, pressure, "5474.88");
  }

  private static void assertRefused(DoubleUnaryOperator method, double value, String range) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> method.applyAsDouble(value))
        .withMessageContaining(" is " + value)
        .withMessageContaining(range);
  }

  static DoubleStream altitudes() {
    return DoubleStream.concat(
        DoubleStream.of(-5000, -1e-3, 0, 1e-3, 11_000, 11_000.001, 20_000),
        new Random(1976).doubles(50, -5000, 20_000));
  }
}
