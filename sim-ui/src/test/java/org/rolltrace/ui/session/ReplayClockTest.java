package org.rolltrace.ui.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ReplayClockTest {
  /** Sums of a few hundred steps, each rounded to about 1e-16 of 10 s. */
  private static final double ROUNDING = 1e-9;

  private final ReplayClock clock = new ReplayClock();

  @BeforeEach
  void tenSeconds() {
    clock.setRange(0, 10);
  }

  @ParameterizedTest
  @CsvSource({"0.25, 0.25", "1, 1", "4, 4", "0.1, 0.25", "100, 4", "-1, 0.25"})
  void timeGoesByAtTheRate(double set, double used) {
    clock.rateProperty().set(set);
    clock.play();
    for (int i = 0; i < 60; i++) {
      clock.advance(1 / 60.0);
    }
    assertThat(clock.rateProperty().get()).isEqualTo(used);
    assertThat(clock.position()).isCloseTo(used, within(ROUNDING));
  }

  @Test
  void nothingMovesWhileItStands() {
    clock.advance(3);
    assertThat(clock.position()).isZero();
    clock.play();
    clock.pause();
    clock.advance(3);
    assertThat(clock.position()).isZero();
    clock.play();
    clock.advance(0);
    clock.advance(-1);
    clock.advance(Double.NaN);
    assertThat(clock.position()).isZero();
  }

  @Test
  void itStandsStillAtTheEndAndBeginsAgainWhenPlayed() {
    clock.play();
    clock.advance(11);
    assertThat(clock.position()).isEqualTo(10);
    assertThat(clock.isPlaying()).isFalse();
    clock.toggle();
    assertThat(clock.position()).isZero();
    assertThat(clock.isPlaying()).isTrue();
    clock.toggle();
    assertThat(clock.isPlaying()).isFalse();
  }

  @Test
  void aLoopCarriesTheRestOver() {
    clock.loopProperty().set(true);
    clock.setRange(2, 5);
    assertThat(clock.position()).isEqualTo(2);
    clock.play();
    clock.advance(7.5); // two rounds of 3 s and a half
    assertThat(clock.position()).isCloseTo(3.5, within(ROUNDING));
    assertThat(clock.isPlaying()).isTrue();
  }

  @Test
  void stepsMeetTheFramesFromWhereverItStood() {
    clock.moveTo(1.013);
    clock.step(1);
    assertThat(clock.position()).isCloseTo(1.02, within(ROUNDING));
    clock.step(1);
    assertThat(clock.position()).isCloseTo(1.04, within(ROUNDING));
    clock.step(-1);
    assertThat(clock.position()).isCloseTo(1.02, within(ROUNDING));
    clock.moveTo(1.013);
    clock.play();
    clock.step(-1);
    assertThat(clock.position()).isCloseTo(1.0, within(ROUNDING));
    assertThat(clock.isPlaying()).isFalse();
    clock.moveTo(0);
    clock.step(-1);
    assertThat(clock.position()).isZero();
    clock.moveTo(10);
    clock.step(1);
    assertThat(clock.position()).isEqualTo(10);
  }

  @Test
  void stepsThereAndBackLoseNothing() {
    for (int i = 0; i < 400; i++) {
      clock.step(1);
    }
    assertThat(clock.position()).isCloseTo(8, within(ROUNDING));
    for (int i = 0; i < 400; i++) {
      clock.step(-1);
    }
    assertThat(clock.position()).isZero();
  }

  @Test
  void anotherRangeKeepsThePositionInside() {
    clock.moveTo(8);
    clock.setRange(0, 5);
    assertThat(clock.position()).isEqualTo(5);
    clock.setRange(6, 9);
    assertThat(clock.position()).isEqualTo(6);
    clock.setRange(0, 0);
    clock.play();
    assertThat(clock.isPlaying()).isFalse();
  }

  @Test
  void whatIsNoTimeIsRefused() {
    assertThatThrownBy(() -> clock.setRange(0, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> clock.setRange(2, 1)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> clock.moveTo(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> clock.rateProperty().set(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4})
  void itNeverLeavesItsRange(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 5000; i++) {
      switch (random.nextInt(7)) {
        case 0 -> clock.play();
        case 1 -> clock.step(random.nextInt(9) - 4);
        case 2 -> clock.moveTo(random.nextDouble() * 40 - 10);
        case 3 -> {
          double from = random.nextDouble() * 10;
          clock.setRange(from, from + random.nextInt(3) * random.nextDouble());
        }
        case 4 -> clock.loopProperty().set(random.nextBoolean());
        case 5 -> clock.rateProperty().set(random.nextDouble() * 5);
        default -> clock.advance(random.nextDouble() * random.nextInt(20));
      }
      assertThat(clock.position()).isBetween(clock.fromProperty().get(), clock.toProperty().get());
    }
  }
}
