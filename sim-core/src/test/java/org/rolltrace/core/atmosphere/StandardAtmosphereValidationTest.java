package org.rolltrace.core.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

/** The standard atmosphere against published figures; the mark of each source is in the file. */
class StandardAtmosphereValidationTest {

  @ParameterizedTest
  @CsvFileSource(
      resources = "/reference/standard-atmosphere-1976-geometric.csv",
      useHeadersInDisplayName = true)
  void agreesWithTheTablesAgainstGeometricAltitude(
      double geometric,
      BigDecimal temperature,
      BigDecimal pressure,
      BigDecimal density,
      BigDecimal speedOfSound,
      BigDecimal handbookTemperature,
      BigDecimal handbookPressure,
      BigDecimal handbookDensity,
      BigDecimal handbookSpeedOfSound) {
    double h = StandardAtmosphere.geopotentialAltitude(geometric);

    assertPrinted(StandardAtmosphere.temperature(h), temperature);
    assertPrinted(StandardAtmosphere.pressure(h), pressure);
    assertPrinted(StandardAtmosphere.density(h), density);
    assertPrinted(StandardAtmosphere.speedOfSound(h), speedOfSound);
    if (handbookTemperature != null) {
      assertPrinted(StandardAtmosphere.temperature(h), handbookTemperature);
      assertPrinted(StandardAtmosphere.pressure(h) / 1e5, handbookPressure);
      assertPrinted(StandardAtmosphere.density(h), handbookDensity);
      assertPrinted(StandardAtmosphere.speedOfSound(h), handbookSpeedOfSound);
    }
  }

  /**
   * Pressure at the bases of the layers at 11 and 20 km, as published for the 1976 standard; from
   * memory. Half a unit of the last digit.
   */
  @ParameterizedTest
  @CsvSource({"11000, 22632.06", "20000, 5474.89"})
  void agreesWithThePublishedBasePressures(double altitude, BigDecimal pressure) {
    assertThat(StandardAtmosphere.pressure(altitude))
        .isCloseTo(pressure.doubleValue(), within(pressure.ulp().doubleValue() / 2));
  }

  /**
   * Exponent of the pressure relation, from Society of Flight Test Engineers, Reference Handbook,
   * 2013, chapter 3 (re-read): 5.255876. Read off the pressure at 5 km; its six decimals allow half
   * a unit of the last.
   */
  @Test
  void hasThePublishedExponent() {
    double exponent =
        Math.log(StandardAtmosphere.pressure(5000) / StandardAtmosphere.pressure(0))
            / Math.log(StandardAtmosphere.temperature(5000) / StandardAtmosphere.temperature(0));

    assertThat(exponent).isCloseTo(5.255876, within(0.5e-6));
  }

  /** One unit of the last printed digit, as some printed values are cut and not rounded. */
  private static void assertPrinted(double value, BigDecimal printed) {
    assertThat(value).isCloseTo(printed.doubleValue(), Offset.offset(printed.ulp().doubleValue()));
  }
}
