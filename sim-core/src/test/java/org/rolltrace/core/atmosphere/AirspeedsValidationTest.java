package org.rolltrace.core.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The pitot relation against published figures. */
class AirspeedsValidationTest {

  /**
   * qc/p at M = 1 is printed as 0.892929158 in Society of Flight Test Engineers, Reference
   * Handbook, 2013. The last number below one stands for one, which is refused; one unit of the
   * last digit, as the printed value is cut (0.89292915878).
   */
  @Test
  void impactPressureAtMachOne() {
    assertThat(Airspeeds.impactPressure(Math.nextDown(1.0), 1))
        .isCloseTo(0.892929158, within(1e-9));
  }

  /**
   * Static over total pressure in subsonic isentropic flow, NACA Report 1135, 1953, Table I; from
   * memory. Half a unit of the fourth decimal.
   */
  @ParameterizedTest
  @CsvSource({
    "0.1, 0.9930",
    "0.3, 0.9395",
    "0.5, 0.8430",
    "0.6, 0.7840",
    "0.8, 0.6560",
    "0.9, 0.5913"
  })
  void totalPressureInIsentropicFlow(double mach, double staticOverTotal) {
    assertThat(1 / (1 + Airspeeds.impactPressure(mach, 1)))
        .isCloseTo(staticOverTotal, within(0.5e-4));
    assertThat(Airspeeds.mach(1 / staticOverTotal - 1, 1))
        // Half a unit of the fourth decimal of the ratio is at most 0.0004 in M (at M 0.1).
        .isCloseTo(mach, within(4e-4));
  }

  /**
   * qc = q̄ (1 + M²/4 + M⁴/40 + M⁶/1600 + …) with q̄ = 0.7 p M², the series common in texts on air
   * data (a closed form: the binomial series of the pitot relation). Its next term, −M⁸/80000,
   * bounds what is left out.
   */
  @ParameterizedTest
  @ValueSource(doubles = {0.01, 0.1, 0.3, 0.5, 0.7, 0.9})
  void impactPressureSeries(double mach) {
    double m2 = mach * mach;
    double series = 0.7 * m2 * (1 + m2 / 4 + m2 * m2 / 40 + m2 * m2 * m2 / 1600);

    assertThat(Airspeeds.impactPressure(mach, 1) / series)
        .isCloseTo(1, within(m2 * m2 * m2 * m2 / 80_000 + 1e-15));
  }

  /** Speed of sound at sea level, 661.48 kt: common practice. */
  @Test
  void speedOfSoundAtSeaLevelInKnots() {
    assertThat(StandardAtmosphere.SEA_LEVEL_SPEED_OF_SOUND * 3600 / 1852)
        .isCloseTo(661.48, within(0.005));
  }
}
