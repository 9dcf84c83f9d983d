package org.rolltrace.ui.control;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class WrittenTest {
  @ParameterizedTest
  @CsvSource({
    "0.30000000000000004, 2, 0.3",
    "100, 2, 100",
    "-0.004, 2, 0",
    "-0, 2, 0",
    "1.005, 2, 1.01",
    "-12.50, 1, -12.5",
    "1e-9, 3, 0",
    "1234567.8, 0, 1234568"
  })
  void plainNumbersHaveNoZerosBehind(double value, int decimals, String expected) {
    assertThat(Written.plain(value, decimals)).isEqualTo(expected);
  }

  @ParameterizedTest
  @CsvSource({"0.15, 0.15 s", "3, 3 s", "0.1234, 0.123 s", "0, 0 s"})
  void timesCarryTheirUnit(double value, String expected) {
    assertThat(Written.seconds(value)).isEqualTo(expected);
  }

  /** U+2212 is the minus sign; the hyphen of keyboards is not. */
  @ParameterizedTest
  @CsvSource({
    "0, 0",
    "12.6637, 12.66",
    "-12.6637, \u221212.66",
    "84.606, 84.61",
    "0.118649, 0.1186",
    "9.99996, 10.00",
    "99999, 100000",
    "123456, 123500",
    "1234567, 1.23e+06",
    "0.00123456, 0.001235",
    "0.000123449, 0.0001234",
    "0.00001234, 1.23e\u221205",
    "5, 5.000"
  })
  void readingsHaveFourFiguresAndAProperMinus(double value, String expected) {
    assertThat(Written.reading(value)).isEqualTo(expected);
  }

  @ParameterizedTest
  @CsvSource({
    "-0.4318, 4, \u22120.4318",
    "-0.00712345, 4, \u22120.0071",
    "0, 4, 0",
    "-0.00001, 4, 0.0000",
    "0.2, 4, 0.2000"
  })
  void columnsHaveFixedDecimals(double value, int decimals, String expected) {
    assertThat(Written.fixed(value, decimals)).isEqualTo(expected);
  }

  private static LongStream seeds() {
    return LongStream.range(0, 50);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aReadingIsWithinHalfOfItsLastFigure(long seed) {
    Random random = new Random(seed);
    double value = Math.pow(10, -3.9 + 9 * random.nextDouble()) * (random.nextBoolean() ? 1 : -1);
    double read = Double.parseDouble(Written.reading(value).replace('\u2212', '-'));
    double lastFigure = Math.pow(10, Math.floor(Math.log10(Math.abs(value))) - 3);
    // Half a unit of the fourth figure, and what a double adds to it.
    assertThat(Math.abs(read - value)).isLessThanOrEqualTo(0.5 * lastFigure * (1 + 1e-9));
  }
}
