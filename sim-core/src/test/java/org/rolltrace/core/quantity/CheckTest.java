package org.rolltrace.core.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CheckTest {
  @ParameterizedTest
  @ValueSource(doubles = {0, -0.0, 1, -1, Double.MIN_VALUE, Double.MAX_VALUE, -Double.MAX_VALUE})
  void finiteReturnsEveryFiniteValue(double value) {
    assertThat(Check.finite("bank, rad", value)).isEqualTo(value);
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
  void nothingThatIsNoFiniteNumberPassesAnyCheck(double value) {
    assertRefused(() -> Check.finite("x", value), "x is " + value + "; expected a finite number");
    assertRefused(
        () -> Check.positive("x", value), "x is " + value + "; expected a finite number above 0");
    assertRefused(
        () -> Check.notNegative("x", value),
        "x is " + value + "; expected a finite number of 0 or more");
    assertRefused(
        () -> Check.inRange("x", value, -1, 1),
        "x is " + value + "; expected a number from -1.0 to 1.0");
  }

  @Test
  void positiveBeginsAboveZero() {
    assertThat(Check.positive("span, m", Double.MIN_VALUE)).isEqualTo(Double.MIN_VALUE);
    assertThat(Check.positive("span, m", Double.MAX_VALUE)).isEqualTo(Double.MAX_VALUE);
    assertRefused(
        () -> Check.positive("span, m", 0), "span, m is 0.0; expected a finite number above 0");
    assertRefused(
        () -> Check.positive("span, m", -Double.MIN_VALUE),
        "span, m is -4.9E-324; expected a finite number above 0");
  }

  @Test
  void notNegativeBeginsAtZero() {
    assertThat(Check.notNegative("delay, s", 0)).isZero();
    assertThat(Check.notNegative("delay, s", Double.MAX_VALUE)).isEqualTo(Double.MAX_VALUE);
    assertRefused(
        () -> Check.notNegative("delay, s", -Double.MIN_VALUE),
        "delay, s is -4.9E-324; expected a finite number of 0 or more");
  }

  @Test
  void rangeIncludesItsEndsAndNothingBeyond() {
    assertThat(Check.inRange("stick", -1, -1, 1)).isEqualTo(-1);
    assertThat(Check.inRange("stick", 1, -1, 1)).isEqualTo(1);
    assertThat(Check.inRange("stick", 0.25, -1, 1)).isEqualTo(0.25);
    assertRefused(
        () -> Check.inRange("stick", Math.nextUp(1.0), -1, 1),
        "stick is 1.0000000000000002; expected a number from -1.0 to 1.0");
    assertRefused(
        () -> Check.inRange("stick", Math.nextDown(-1.0), -1, 1),
        "stick is -1.0000000000000002; expected a number from -1.0 to 1.0");
  }

  private static void assertRefused(Runnable check, String message) {
    assertThatExceptionOfType(IllegalArgumentException.class)
        .isThrownBy(check::run)
        .withMessage(message);
  }
}
