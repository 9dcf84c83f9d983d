package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.FULL_AILERON;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
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

  /**
   * While the hand itself moves smoothly steps are long, and samples inside them come from an
   * interpolation one order below that of the steps.
   */
  private static final double INSIDE_STEPS = 1e-7;

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
    assertRollRate(history, expected, TOLERANCE);
  }

  private static void assertRollRate(
      TimeHistory history, DoubleUnaryOperator expected, double tolerance) {
    for (int i = 0; i < history.size(); i++) {
      assertThat(history.value(Channel.ROLL_RATE, i))
          .as("roll rate at %s s", history.time(i))
          .isCloseTo(expected.applyAsDouble(history.time(i)), within(tolerance));
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

  @ParameterizedTest
  @ValueSource(doubles = {0, 0.1})
  void multistep(double hand) {
    double size = -0.5 * FULL_AILERON;
    TimeHistory history =
        fly(oneDegree(T, K), new MultistepInput(1, -0.5, 0.4, List.of(3, 2, 1, 1), hand), 6);
    assertRollRate(
        history,
        sum(
            move(1, hand, size),
            move(2.2, hand, -2 * size),
            move(3, hand, 2 * size),
            move(3.4, hand, -2 * size),
            move(3.8, hand, size)));
  }

  @Test
  void slowRamp() {
    TimeHistory history = fly(oneDegree(T, K), new RampInput(1, 0.8, 2.5), 6);
    assertRollRate(history, move(1, 2.5, 0.8 * FULL_AILERON));
  }

  /** ṗ + p/T = K A sin ωτ is answered by K A ((sin ωτ)/T − ω cos ωτ + ω e^(−τ/T))/(1/T² + ω²). */
  @Test
  void aSweepThatKeepsItsFrequencyIsASine() {
    double w = 5;
    TimeHistory history =
        fly(oneDegree(T, K), new SweepInput(1, 0.6, w, w, 20, SweepInput.Law.LINEAR), 8);
    assertRollRate(
        history,
        t -> {
          double tau = t - 1;
          return tau <= 0
              ? 0
              : K
                  * 0.6
                  * FULL_AILERON
                  * (Math.sin(w * tau) / T - w * Math.cos(w * tau) + w * Math.exp(-tau / T))
                  / (1 / (T * T) + w * w);
        },
        INSIDE_STEPS);
  }

  /**
   * Against Simpson's rule at a tenth of a millisecond, the phase summed from the frequency and the
   * rate from ṗ = −p/T + K δ by its integrating factor.
   */
  @ParameterizedTest
  @EnumSource(SweepInput.Law.class)
  void sweep(SweepInput.Law law) {
    double start = 0.5;
    double from = 1;
    double to = 15;
    double span = 6;
    SweepInput sweep = new SweepInput(start, 0.7, from, to, span, law);
    TimeHistory history = fly(oneDegree(T, K), sweep, 9);
    double h = 1e-4;
    double phase = 0;
    double rate = 0;
    int next = 0;
    for (int k = 0; k < 90_000; k++) {
      double tau = k * h - start;
      while (next < history.size() && history.time(next) <= k * h + 1e-9) {
        if (Math.abs(history.time(next) - k * h) < 1e-9) {
          assertThat(history.value(Channel.ROLL_RATE, next))
              .as("roll rate at %s s", k * h)
              .isCloseTo(rate, within(INSIDE_STEPS));
        }
        next++;
      }
      if (tau < -0.5 * h) {
        continue;
      }
      double w0 = frequency(law, from, to, tau / span);
      double w1 = frequency(law, from, to, (tau + 0.25 * h) / span);
      double w2 = frequency(law, from, to, (tau + 0.5 * h) / span);
      double w4 = frequency(law, from, to, (tau + h) / span);
      double middle = phase + h / 12 * (w0 + 4 * w1 + w2);
      double after = phase + h / 6 * (w0 + 4 * w2 + w4);
      // After its duration the sine goes on to the next multiple of π.
      boolean over = isOver(phase, tau, span, to);
      double a0 = over ? 0 : Math.sin(phase);
      double a1 = over || isOver(middle, tau + h / 2, span, to) ? 0 : Math.sin(middle);
      double a2 = over || isOver(after, tau + h, span, to) ? 0 : Math.sin(after);
      double fade = Math.exp(-h / T);
      rate =
          rate * fade
              + K * 0.7 * FULL_AILERON * h / 6 * (a0 * fade + 4 * a1 * Math.exp(-h / 2 / T) + a2);
      phase = after;
    }
    assertThat(next).isGreaterThan(850);
  }

  private static double frequency(SweepInput.Law law, double from, double to, double share) {
    double s = Math.min(1, share);
    return law == SweepInput.Law.LINEAR
        ? (1 - s) * from + s * to
        : Math.pow(from, 1 - s) * Math.pow(to, s);
  }

  /** Whether a multiple of π lies between the end of the duration and here. */
  private static boolean isOver(double phase, double tau, double span, double to) {
    if (tau <= span) {
      return false;
    }
    double atSpan = phase - to * (tau - span);
    return Math.floor(phase / Math.PI) > Math.floor(atSpan / Math.PI);
  }

  private static TraceInput traced(InputShape shape, double[] times) {
    double[] positions = new double[times.length];
    for (int i = 0; i < times.length; i++) {
      positions[i] = shape.movement().positionAt(times[i]);
    }
    return new TraceInput(0, 1, Trace.of("hold.csv", "stick", times, positions));
  }

  @Test
  void aTraceOfAHoldIsAnsweredAsTheHold() {
    HoldInput hold = new HoldInput(1, 0.5, 2, 0.25);
    TimeHistory typed = fly(oneDegree(T, K), hold, 6);
    TimeHistory corners =
        fly(oneDegree(T, K), traced(hold, new double[] {0, 1, 1.25, 3, 3.25, 4}), 6);
    double[] often = new double[1601];
    for (int i = 0; i < often.length; i++) {
      often[i] = i / 400.0;
    }
    TimeHistory samples = fly(oneDegree(T, K), traced(hold, often), 6);
    int[] even = typed.evenSamples();
    for (TimeHistory other : List.of(corners, samples)) {
      int[] its = other.evenSamples();
      assertThat(its).hasSameSizeAs(even);
      for (Channel channel : Channel.values()) {
        for (int i = 0; i < even.length; i++) {
          // the local tolerance; the acceleration is the rate's error over T, with a margin
          double tolerance = channel == Channel.ROLL_ACCELERATION ? 4e-9 : 1e-9;
          assertThat(other.value(channel, its[i]))
              .as("%s at %s s", channel, typed.time(even[i]))
              .isCloseTo(typed.value(channel, even[i]), within(tolerance));
        }
      }
    }
  }

  /** A surface that cannot follow a sweep, against steps of 10 µs that never exceed the limit. */
  @Test
  void aRateLimitedSurfaceChasesASweep() {
    double limit = 1;
    SweepInput sweep = new SweepInput(0.5, 1, 3, 12, 5, SweepInput.Law.LINEAR);
    TimeHistory history = flown(new SurfaceDynamics(limit, 0), sweep, 7).history();
    double h = 1e-5;
    double angle = 0;
    long step = 0;
    for (int i = 0; i < history.size(); i++) {
      while ((step + 1) * h <= history.time(i)) {
        step++;
        double gap = FULL_AILERON * sweep.movement().positionAt(step * h) - angle;
        angle += Math.max(-limit * h, Math.min(limit * h, gap));
      }
      // a step of the demand, whose rate is at most 4.2 rad/s
      assertThat(history.value(Channel.AILERON, i))
          .as("aileron at %s s", history.time(i))
          .isCloseTo(angle, within(5e-5));
    }
  }

  /** A slip that is led in straight rolls as a straight move of the ailerons does. */
  @Test
  void aSlipHeldAgainstTimeRollsThroughTheDihedralEffect() {
    AeroplaneData plain = oneDegree(T, K);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient one : List.of(Coefficient.CL_P, Coefficient.CL_DA)) {
      values.put(one, plain.derivatives().value(one));
    }
    double perAileron = plain.derivatives().value(Coefficient.CL_DA);
    values.put(Coefficient.CL_BETA, -0.3 * perAileron);
    values.put(Coefficient.CY_BETA, -0.5);
    AeroplaneData data =
        new AeroplaneData(
            Aeroplane.builder("with dihedral", 10, 15, Inertia.ofRoll(1500)).mass(800).build(),
            LateralDerivatives.ofGiven(values, "test"));
    HeldSideslip held =
        HeldSideslip.of(
            List.of(
                new HeldSideslip.Point(1, 0),
                new HeldSideslip.Point(2, 0.1),
                new HeldSideslip.Point(3.5, 0.1),
                new HeldSideslip.Point(4, 0)));
    Scenario still = Scenarios.of(data, seaLevel(50), SlipTreatment.HELD, 6);
    TimeHistory history =
        ScenarioRun.execute(
                new Scenario(
                    still.title(),
                    still.data(),
                    still.condition(),
                    still.propeller(),
                    still.slip(),
                    still.start(),
                    still.programme().holding(held),
                    still.duration(),
                    still.measures()))
            .history();
    assertRollRate(history, sum(move(1, 1, -0.03), move(3.5, 0.5, 0.03)));
    double turn = 0.5 * 1.225 * 50 * 50 * 15 * -0.5 / (800 * 50); // q̄ S CY_β/(mV)
    for (int index : history.evenSamples()) {
      double t = history.time(index);
      double slip =
          0.1 * (Math.min(1, Math.max(0, t - 1)) - Math.min(1, Math.max(0, 2 * (t - 3.5))));
      double slope = t >= 1 && t < 2 ? 0.1 : t >= 3.5 && t < 4 ? -0.2 : 0;
      assertThat(history.value(Channel.SIDESLIP, index)).isCloseTo(slip, within(1e-12));
      assertThat(history.value(Channel.YAW_RATE, index))
          .isCloseTo(
              9.80665 / 50 * Math.sin(history.value(Channel.BANK, index)) + turn * slip - slope,
              within(1e-6)); // the density to four figures
    }
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
