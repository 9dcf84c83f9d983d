package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.FULL_AILERON;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.pedal;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.ejml.simple.SimpleMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.FreeSlip;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;

/** Properties of computed manoeuvres that hold for every aeroplane. */
class FlightTest {
  private static final List<Channel> TURNED =
      List.of(
          Channel.BANK,
          Channel.ROLL_RATE,
          Channel.YAW_RATE,
          Channel.SIDESLIP,
          Channel.STICK,
          Channel.AILERON,
          Channel.ROLL_ACCELERATION);

  private static Scenario held(RandomAeroplane any, SlipTreatment slip, double size) {
    return Scenarios.of(
        any.data(), any.condition(), slip, 8, stick(new HoldInput(0.5, size, 2.5, 0.15)));
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void mirroredInputsGiveMirroredRolls(SlipTreatment slip) {
    for (long seed = 0; seed < 20; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      TimeHistory right = ScenarioRun.execute(held(any, slip, 0.6)).history();
      TimeHistory left = ScenarioRun.execute(held(any, slip, -0.6)).history();
      for (Channel channel : TURNED) {
        for (int i = 0; i < right.size(); i++) {
          // every operation of the equations is odd, so even rounding is mirrored
          assertThat(left.value(channel, i)).isEqualTo(-right.value(channel, i));
        }
      }
    }
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void rightStickRollsRightFirst(SlipTreatment slip) {
    for (long seed = 0; seed < 50; seed++) {
      RunResult result = ScenarioRun.execute(held(RandomAeroplane.of(seed), slip, 0.6));
      TimeHistory history = result.history();
      assertThat(history.value(Channel.ROLL_RATE, history.lastAt(0.8))).isPositive();
      assertThat(result.measure("peakRollRate").orElseThrow().value().orElseThrow()).isPositive();
    }
  }

  @Test
  void rightPedalYawsTheNoseRightAndRollsRightThroughDihedral() {
    for (long seed = 0; seed < 50; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      TimeHistory history =
          ScenarioRun.execute(
                  Scenarios.of(
                      any.data(),
                      any.condition(),
                      SlipTreatment.FREE,
                      3,
                      pedal(new StepInput(0, 0.5, 0.1))))
              .history();
      assertThat(history.value(Channel.YAW_RATE, history.lastAt(0.4))).isPositive();
      assertThat(history.value(Channel.SIDESLIP, history.lastAt(0.6))).isNegative();
      assertThat(history.value(Channel.BANK, history.size() - 1)).isPositive();
    }
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void usualToleranceIsCloseToTheFinest(SlipTreatment slip) {
    double allowed = Math.toRadians(5e-3); // stated for every sample, deg and deg/s
    for (long seed = 0; seed < 20; seed++) {
      Scenario scenario = held(RandomAeroplane.of(seed), slip, 1);
      TimeHistory usual = ScenarioRun.execute(scenario).history();
      TimeHistory outline = ScenarioRun.execute(scenario, FlightSettings.OUTLINE).history();
      TimeHistory finest =
          ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withTolerance(1e-12)).history();
      for (int i = 0; i < usual.size(); i++) {
        for (Channel channel : List.of(Channel.BANK, Channel.ROLL_RATE, Channel.YAW_RATE)) {
          double value = finest.value(channel, i);
          assertThat(usual.value(channel, i)).isCloseTo(value, within(allowed / 1000));
          assertThat(outline.value(channel, i)).isCloseTo(value, within(allowed / 20));
        }
      }
    }
  }

  /** A bank that is passed and left again between two samples, a hundredth of a second apart. */
  @Test
  void aBankThatIsOnlyJustReachedIsCaptured() {
    Scenario scenario =
        Scenarios.of(
            oneDegree(0.4, 8),
            seaLevel(50),
            SlipTreatment.HELD,
            5,
            stick(new DoubletInput(1, 0.7, 1.003, 0.15)));
    TimeHistory fine =
        ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withSampleRate(10_000)).history();
    TimeHistory usual = ScenarioRun.execute(scenario).history();
    double top = Math.toDegrees(fine.largest(Channel.BANK));
    // ṗ is some 3 rad/s² at the top: within 1e-4 s of it the bank falls by 2e-8 rad
    assertThat(Math.toDegrees(usual.largest(Channel.BANK))).isLessThan(top - 2e-6);
    RunResult result =
        ScenarioRun.execute(
            new Scenario(
                scenario.title(),
                scenario.data(),
                scenario.condition(),
                scenario.propeller(),
                scenario.slip(),
                scenario.start(),
                scenario.programme(),
                scenario.duration(),
                new MeasureOptions(0.05, List.of(top - 2e-6, top + 1e-5))));
    assertThat(result.events())
        .filteredOn(FlightEvent.BankCapture.class::isInstance)
        .singleElement()
        .satisfies(
            event -> {
              int index = fine.lastAt(event.time());
              assertThat(Math.toDegrees(fine.value(Channel.BANK, index)))
                  .isCloseTo(top - 2e-6, within(1e-5));
            });
  }

  @Test
  void halvingTheToleranceChangesNothingBeyondIt() {
    for (long seed = 0; seed < 20; seed++) {
      Scenario scenario = held(RandomAeroplane.of(seed), SlipTreatment.FREE, 1);
      for (double tolerance : new double[] {1e-6, 1e-8, 1e-10}) {
        double one =
            end(ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withTolerance(tolerance)));
        double two =
            end(ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withTolerance(tolerance / 2)));
        // a local error of the tolerance in each of some dozen steps, on banks of a few rad
        assertThat(two).isCloseTo(one, within(50 * tolerance));
      }
    }
  }

  private static double end(RunResult result) {
    return result.history().value(Channel.BANK, result.history().size() - 1);
  }

  /** Free slip at small angles is linear: the matrix exponential is an independent way to it. */
  @Test
  void smallMotionsFollowTheMatrixExponential() {
    for (long seed = 0; seed < 20; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      double bank = 1e-4;
      Scenario scenario =
          Scenarios.of(
              any.data(),
              any.condition(),
              SlipTreatment.FREE,
              new Disturbance(bank, 2e-4, -1e-4),
              PropellerMoments.NONE,
              5);
      TimeHistory history =
          ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withTolerance(1e-12)).history();
      LateralModel model =
          LateralModel.of(
              any.data().aeroplane(),
              any.data().derivatives(),
              any.condition(),
              PropellerMoments.NONE);
      SimpleMatrix a =
          new SimpleMatrix(((FreeSlip) LateralMotion.of(SlipTreatment.FREE, model)).linearised());
      SimpleMatrix step = exponential(a.scale(0.01));
      SimpleMatrix state = new SimpleMatrix(new double[] {bank, 2e-4, -1e-4, 0});
      for (int index : history.evenSamples()) {
        // sin φ differs from φ by φ³/6, under 1e-12 here; the rest is what some dozen steps within
        // an absolute tolerance of 1e-13 add up to, and the dense output between them
        assertThat(history.value(Channel.BANK, index)).isCloseTo(state.get(0), within(1e-10));
        assertThat(history.value(Channel.ROLL_RATE, index)).isCloseTo(state.get(1), within(1e-10));
        assertThat(history.value(Channel.SIDESLIP, index)).isCloseTo(state.get(2), within(1e-10));
        assertThat(history.value(Channel.YAW_RATE, index)).isCloseTo(state.get(3), within(1e-10));
        state = step.mult(state);
      }
    }
  }

  /** The exponential series, which converges at once for a step of a hundredth of a second. */
  private static SimpleMatrix exponential(SimpleMatrix a) {
    SimpleMatrix sum = SimpleMatrix.identity(a.getNumRows());
    SimpleMatrix term = sum;
    for (int k = 1; k < 30; k++) {
      term = term.mult(a).divide(k);
      sum = sum.plus(term);
    }
    return sum;
  }

  /**
   * Stiff yaw (Cn_β × 100) of little inertia (Izz / 100) follows at once, as settled slip assumes.
   */
  @Test
  void settledSlipIsTheLimitOfFreeSlipWithAStiffAndLightYawAxis() {
    for (long seed = 0; seed < 10; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      double plain = largestDifference(any.data(), any);
      double stiff = largestDifference(stiffAndLight(any.data()), any);
      assertThat(stiff).isLessThan(Math.toRadians(1.5)).isLessThan(plain / 5);
    }
  }

  private static double largestDifference(AeroplaneData data, RandomAeroplane any) {
    TimeHistory[] histories = new TimeHistory[2];
    SlipTreatment[] slips = {SlipTreatment.SETTLED, SlipTreatment.FREE};
    for (int k = 0; k < 2; k++) {
      histories[k] =
          ScenarioRun.execute(
                  Scenarios.of(
                      data, any.condition(), slips[k], 6, stick(new HoldInput(0.5, 0.4, 1.5, 0.3))))
              .history();
    }
    double largest = 0;
    for (int i = 0; i < histories[0].size(); i++) {
      largest =
          Math.max(
              largest,
              Math.abs(histories[0].value(Channel.BANK, i) - histories[1].value(Channel.BANK, i)));
    }
    return largest;
  }

  private static AeroplaneData stiffAndLight(AeroplaneData data) {
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient c : Coefficient.values()) {
      values.put(c, data.derivatives().value(c) * (c == Coefficient.CN_BETA ? 100 : 1));
    }
    Aeroplane a = data.aeroplane();
    double izz = a.inertia().yaw().orElseThrow() / 100;
    return new AeroplaneData(
        Aeroplane.builder(a.name(), a.span(), a.wingArea(), Inertia.of(a.inertia().roll(), izz, 0))
            .mass(a.mass().orElseThrow())
            .ailerons(a.ailerons().orElseThrow())
            .rudder(a.rudder().orElseThrow())
            .build(),
        LateralDerivatives.ofGiven(values, "stiff"));
  }

  @Test
  void bankCapturesAreWhereTheClosedFormPutsThem() {
    double t = 0.4;
    double k = 8;
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(t, k),
                seaLevel(50),
                SlipTreatment.HELD,
                new Disturbance(0.3, 0, 0),
                PropellerMoments.NONE,
                5,
                stick(new StepInput(1, -1, 0))));
    for (double degrees : new double[] {30, 45, 60, 90}) {
      double time =
          result.measure("timeToBank" + (int) degrees).orElseThrow().value().orElseThrow();
      double change = k * FULL_AILERON * t * (time + t * Math.expm1(-time / t));
      assertThat(Math.toDegrees(change)).isCloseTo(degrees, within(1e-6));
    }
  }

  @Test
  void aHandThatWantsMoreThanTheTravelIsStoppedAndItIsSaidWhen() {
    PilotInput[] inputs = {stick(new StepInput(1, 0.8, 0.2)), stick(new HoldInput(2, 0.6, 1, 0.4))};
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(oneDegree(0.4, 8), seaLevel(50), SlipTreatment.HELD, 5, inputs));
    TimeHistory history = result.history();
    assertThat(history.value(Channel.STICK, history.lastAt(2.5))).isEqualTo(1);
    assertThat(history.value(Channel.AILERON, history.lastAt(2.5))).isEqualTo(FULL_AILERON);
    // 0.8 + 0.6 (t − 2)/0.4 passes 1 at 2.1333…; on the way back 1.4 − 0.6 (t − 3)/0.4 at 3.2666…
    assertThat(result.events())
        .filteredOn(e -> e instanceof FlightEvent.Stop)
        .satisfiesExactly(
            e -> {
              assertThat(((FlightEvent.Stop) e).reached()).isTrue();
              assertThat(((FlightEvent.Stop) e).control()).isEqualTo(Control.STICK);
              assertThat(e.time()).isCloseTo(2 + 0.4 / 3, within(1e-8));
            },
            e -> {
              assertThat(((FlightEvent.Stop) e).reached()).isFalse();
              assertThat(e.time()).isCloseTo(3 + 0.8 / 3, within(1e-8));
            });
    assertThat(result.cautions()).anyMatch(c -> c.startsWith("the stick is on its stop from 2.1"));
  }

  @Test
  void aJumpOntoTheStopAndOffItIsSaidToo() {
    PilotInput[] inputs = {stick(new StepInput(1, 0.8, 0)), stick(new HoldInput(2, 0.6, 1, 0))};
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(oneDegree(0.4, 8), seaLevel(50), SlipTreatment.HELD, 5, inputs));
    assertThat(result.events())
        .filteredOn(e -> e instanceof FlightEvent.Stop)
        .containsExactly(
            new FlightEvent.Stop(2, Control.STICK, true),
            new FlightEvent.Stop(3, Control.STICK, false));
  }

  @Test
  void everyHundredthHasItsRowFromZeroToTheEnd() {
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(0.4, 8),
                seaLevel(50),
                SlipTreatment.HELD,
                10,
                stick(new StepInput(1.0 / 3, 1, 0.15))));
    int[] even = result.history().evenSamples();
    assertThat(even).hasSize(1001);
    for (int k = 0; k < even.length; k++) {
      assertThat(result.history().time(even[k])).isEqualTo(k / 100.0);
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.004, 1.2345})
  void aDurationBetweenSamplesEndsWhereItEnds(double duration) {
    TimeHistory history =
        ScenarioRun.execute(
                Scenarios.of(oneDegree(0.4, 8), seaLevel(50), SlipTreatment.HELD, duration))
            .history();
    assertThat(history.time(history.size() - 1)).isEqualTo(duration);
    assertThat(history.evenSamples()).hasSize((int) (duration * 100) + 1);
  }

  /** A movement that ends a rounding before the duration leaves nothing to be integrated. */
  @Test
  void aBreakpointAtTheEndDoesNotStopTheFlight() {
    TimeHistory history =
        ScenarioRun.execute(
                Scenarios.of(
                    oneDegree(0.4, 8),
                    seaLevel(50),
                    SlipTreatment.HELD,
                    Math.nextUp(4.2),
                    stick(new StepInput(4, 1, 0.2))))
            .history();
    assertThat(history.time(history.size() - 1)).isEqualTo(Math.nextUp(4.2));
  }

  /** Every kind of break in one manoeuvre: a kink at unequal rudder travel, a jump, both stops. */
  @Test
  void usualToleranceHoldsForPedalAndStickTogether() {
    double allowed = Math.toRadians(5e-3); // stated for every sample, deg and deg/s
    for (long seed = 0; seed < 20; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      Scenario scenario =
          Scenarios.of(
              any.data(),
              any.condition(),
              SlipTreatment.FREE,
              8,
              pedal(new DoubletInput(0.503, 1, 0.8, 0.317)),
              stick(new DoubletInput(0.7, -0.9, 0.8, 0)),
              stick(new HoldInput(1, -0.4, 3, 0.2)));
      TimeHistory usual = ScenarioRun.execute(scenario).history();
      TimeHistory finest =
          ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withTolerance(1e-12)).history();
      int[] here = usual.evenSamples();
      int[] there = finest.evenSamples();
      for (int i = 0; i < here.length; i++) {
        for (Channel channel : List.of(Channel.BANK, Channel.ROLL_RATE, Channel.YAW_RATE)) {
          assertThat(usual.value(channel, here[i]))
              .isCloseTo(finest.value(channel, there[i]), within(allowed / 10));
        }
      }
    }
  }

  @Test
  void aDivergingAeroplaneEndsInAMessage() {
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, 0.4);
    values.put(Coefficient.CL_DA, 0.1);
    AeroplaneData data =
        new AeroplaneData(
            oneDegree(0.4, 8).aeroplane(), LateralDerivatives.ofGiven(values, "test"));
    Scenario scenario =
        Scenarios.of(data, seaLevel(50), SlipTreatment.HELD, 3000, stick(new StepInput(1, 1, 0.1)));
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> ScenarioRun.execute(scenario))
        .withMessageContaining("leaves the finite range after")
        .withMessageContaining("shorten the duration");
  }

  @Test
  void equationsTooStiffToFollowEndInAMessage() {
    Scenario scenario =
        Scenarios.of(
            oneDegree(1e-11, 8e11),
            seaLevel(50),
            SlipTreatment.HELD,
            10,
            stick(new StepInput(1, 1, 0.1)));
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> ScenarioRun.execute(scenario))
        .withMessageContaining("could not go on after")
        .withMessageContaining("wrong by orders of magnitude");
  }

  @Test
  void tooManySamplesAreRefused() {
    Scenario scenario = Scenarios.of(oneDegree(0.4, 8), seaLevel(50), SlipTreatment.HELD, 3600);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(
            () -> ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withSampleRate(10_000)))
        .withMessageContaining("1000000 samples");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 1e-14, 1e-2, Double.NaN})
  void refusesTolerancesOutOfRange(double tolerance) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> FlightSettings.DEFAULT.withTolerance(tolerance))
        .withMessageContaining("tolerance");
  }
}
