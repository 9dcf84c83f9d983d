package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.FULL_AILERON;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.testing.Scenarios;

/**
 * The single-degree-of-freedom response against its closed form: ṗ = −p/T + K δa is answered by a
 * ramp of slope s begun at t₀ with K s T (τ − T (1 − e^(−τ/T))), τ = t − t₀, and by a jump of size
 * δ with K δ T (1 − e^(−τ/T)); inputs of straight moves are sums of these (linear systems, any
 * textbook).
 */
class ClosedFormTest {
  private static final double T = 0.4;
  private static final double K = 8;

  /** Ten times the local tolerance of 1e-9: errors of a few dozen steps, damped, stay below it. */
  private static final double TOLERANCE = 1e-8;

  private static DoubleUnaryOperator ramp(double start, double slope) {
    return t -> {
      double tau = t - start;
      return tau <= 0 ? 0 : K * slope * T * (tau + T * Math.expm1(-tau / T));
    };
  }

  private static DoubleUnaryOperator jump(double start, double size) {
    return t -> t < start ? 0 : -K * size * T * Math.expm1(-(t - start) / T);
  }

  private static DoubleUnaryOperator move(double start, double hand, double size) {
    if (hand == 0) {
      return jump(start, size);
    }
    DoubleUnaryOperator up = ramp(start, size / hand);
    DoubleUnaryOperator stop = ramp(start + hand, -size / hand);
    return t -> up.applyAsDouble(t) + stop.applyAsDouble(t);
  }

  private static DoubleUnaryOperator sum(DoubleUnaryOperator... parts) {
    return t -> {
      double sum = 0;
      for (DoubleUnaryOperator part : parts) {
        sum += part.applyAsDouble(t);
      }
      return sum;
    };
  }

  private static TimeHistory fly(AeroplaneData data, InputShape shape, double duration) {
    return ScenarioRun.execute(
            Scenarios.of(data, seaLevel(50), SlipTreatment.HELD, duration, stick(shape)))
        .history();
  }

  private static void assertRollRate(TimeHistory history, DoubleUnaryOperator expected) {
    for (int i = 0; i < history.size(); i++) {
      assertThat(history.value(Channel.ROLL_RATE, i))
          .as("roll rate at %s s", history.time(i))
          .isCloseTo(expected.applyAsDouble(history.time(i)), within(TOLERANCE));
    }
  }

  @ParameterizedTest
  @CsvSource({"0, 0", "1, 0", "1, 0.15", "0.003, 0.1"})
  void step(double start, double hand) {
    TimeHistory history = fly(oneDegree(T, K), new StepInput(start, 0.7, hand), 5);
    assertRollRate(history, move(start, hand, 0.7 * FULL_AILERON));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 0.15, 0.2})
  void hold(double hand) {
    double size = -FULL_AILERON;
    TimeHistory history = fly(oneDegree(T, K), new HoldInput(0.5, -1, 2, hand), 6);
    assertRollRate(history, sum(move(0.5, hand, size), move(2.5, hand, -size)));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 0.1, 0.5})
  void doublet(double hand) {
    double size = 0.5 * FULL_AILERON;
    TimeHistory history = fly(oneDegree(T, K), new DoubletInput(1, 0.5, 0.5, hand), 4);
    assertRollRate(
        history, sum(move(1, hand, size), move(1.5, hand, -2 * size), move(2, hand, size)));
  }

  @Test
  void bankIsTheIntegralOfTheRate() {
    TimeHistory history = fly(oneDegree(T, K), new StepInput(0, 1, 0), 3);
    for (int i = 0; i < history.size(); i++) {
      double t = history.time(i);
      // the integral of K δ T (1 − e^(−t/T)); the error is that of the rate times the duration
      double expected = K * FULL_AILERON * T * (t + T * Math.expm1(-t / T));
      assertThat(history.value(Channel.BANK, i)).isCloseTo(expected, within(3 * TOLERANCE));
    }
  }

  @Test
  void aJumpStandsTwiceBeforeAndAfter() {
    TimeHistory history = fly(oneDegree(T, K), new HoldInput(1, 1, 1, 0), 3);
    int after = history.lastAt(1);
    assertThat(history.time(after - 1)).isEqualTo(1);
    assertThat(history.value(Channel.AILERON, after - 1)).isZero();
    assertThat(history.value(Channel.AILERON, after)).isEqualTo(FULL_AILERON);
    assertThat(history.value(Channel.ROLL_ACCELERATION, after))
        .isCloseTo(K * FULL_AILERON, within(TOLERANCE));
    assertThat(history.evenSamples()).hasSize(301).contains(after).doesNotContain(after - 1);
  }

  @Test
  void aLaggingSurfaceFollowsTheFirstOrderLag() {
    double lag = 0.08;
    TimeHistory history =
        fly(
            oneDegree(T, K, new SurfaceDynamics(Double.POSITIVE_INFINITY, lag)),
            new StepInput(0.5, 1, 0),
            3);
    for (int i = 0; i < history.size(); i++) {
      double tau = Math.max(0, history.time(i) - 0.5);
      assertThat(history.value(Channel.AILERON, i))
          .isCloseTo(-FULL_AILERON * Math.expm1(-tau / lag), within(TOLERANCE));
      // two first-order lags in series
      double rate =
          K
              * FULL_AILERON
              * T
              * (1 - (T * Math.exp(-tau / T) - lag * Math.exp(-tau / lag)) / (T - lag));
      assertThat(history.value(Channel.ROLL_RATE, i)).isCloseTo(rate, within(TOLERANCE));
    }
  }

  @Test
  void aRateLimitedSurfaceMovesAtItsLargestRate() {
    double limit = 1.0;
    Flown flown = flown(new SurfaceDynamics(limit, 0), new HoldInput(0.5, 1, 2, 0.1), 4);
    double needed = FULL_AILERON / limit;
    TimeHistory history = flown.history();
    for (int i = 0; i < history.size(); i++) {
      double t = history.time(i);
      double up = Math.min(Math.max(0, t - 0.5), needed) * limit;
      double down = Math.min(Math.max(0, t - 2.5), needed) * limit;
      assertThat(history.value(Channel.AILERON, i)).isCloseTo(up - down, within(TOLERANCE));
    }
    assertThat(flown.events())
        .extracting(FlightEvent::time)
        .satisfiesExactly(
            t -> assertThat(t).isEqualTo(0.5),
            t -> assertThat(t).isCloseTo(0.5 + needed, within(1e-9)),
            t -> assertThat(t).isEqualTo(2.5),
            t -> assertThat(t).isCloseTo(2.5 + needed, within(1e-9)));
  }

  @Test
  void aSlowHandIsFollowedExactlyDespiteTheRateLimit() {
    TimeHistory history = flown(new SurfaceDynamics(1, 0), new StepInput(0.5, 1, 1), 3).history();
    for (int i = 0; i < history.size(); i++) {
      double expected = FULL_AILERON * Math.min(Math.max(0, history.time(i) - 0.5), 1);
      assertThat(history.value(Channel.AILERON, i)).isCloseTo(expected, within(TOLERANCE));
    }
  }

  @Test
  void rateLimitAndLagTogetherSlewFirstAndThenLag() {
    double limit = 1;
    double lag = 0.1;
    TimeHistory history =
        flown(new SurfaceDynamics(limit, lag), new StepInput(0, 1, 0), 2).history();
    // slews until the gap is R τ, then fades exponentially
    double switched = (FULL_AILERON - limit * lag) / limit;
    for (int i = 0; i < history.size(); i++) {
      double t = history.time(i);
      double expected =
          t <= switched ? limit * t : FULL_AILERON - limit * lag * Math.exp(-(t - switched) / lag);
      assertThat(history.value(Channel.AILERON, i)).isCloseTo(expected, within(TOLERANCE));
    }
  }

  private static Flown flown(SurfaceDynamics dynamics, InputShape shape, double duration) {
    var result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(T, K, dynamics),
                seaLevel(50),
                SlipTreatment.HELD,
                duration,
                stick(shape)));
    return new Flown(
        result.history(),
        result.events().stream().filter(e -> e instanceof FlightEvent.RateLimit).toList());
  }
}
