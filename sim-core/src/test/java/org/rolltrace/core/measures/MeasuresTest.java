package org.rolltrace.core.measures;

import static org.assertj.core.api.Assertions.assertThat;
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
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.flight.FlightSettings;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;

/** Measures of the one-degree roll against their closed forms, and of rolls that lack them. */
class MeasuresTest {
  private static final double T = 0.4;
  private static final double K = 8;
  private static final double STEADY = K * FULL_AILERON * T;

  /** The closed forms hold for the roll rate to 1e-8; times follow to that over its slope. */
  private static final double CLOSE = 1e-6;

  private static RunResult fly(double duration, InputShape... shapes) {
    return ScenarioRun.execute(
        Scenarios.of(
            oneDegree(T, K),
            seaLevel(50),
            SlipTreatment.HELD,
            duration,
            List.of(shapes).stream().map(Scenarios::stick).toArray(PilotInput[]::new)));
  }

  private static double value(RunResult result, String name) {
    Measure measure = result.measure(name).orElseThrow();
    assertThat(measure.value()).as(name + ": " + measure.remark()).isPresent();
    return measure.value().getAsDouble();
  }

  private static String reason(RunResult result, String name) {
    Measure measure = result.measure(name).orElseThrow();
    assertThat(measure.value()).as(name).isEmpty();
    return measure.remark();
  }

  @Test
  void anAbruptStepHasTheTimesOfAFirstOrderLag() {
    RunResult result = fly(10, new StepInput(1, 1, 0));
    assertThat(value(result, "rollModeTimeConstant")).isCloseTo(T, within(1e-9));
    // the last tenth of the hold is at e^(−20) of the steady rate
    assertThat(value(result, "steadyRollRate")).isCloseTo(STEADY, within(1e-8));
    assertThat(value(result, "peakRollRate")).isCloseTo(STEADY, within(1e-8));
    assertThat(value(result, "responseTimeConstant"))
        .isCloseTo(-T * Math.log(1 - 0.632), within(CLOSE));
    assertThat(value(result, "riseTime")).isCloseTo(T * Math.log(9), within(CLOSE));
    assertThat(value(result, "settlingTime")).isCloseTo(T * Math.log(20), within(CLOSE));
    assertThat(value(result, "rollAcceleration")).isCloseTo(K * FULL_AILERON, within(1e-8));
    assertThat(value(result, "helixAngleSteady")).isCloseTo(STEADY * 10 / 100, within(1e-8));
    assertThat(reason(result, "bankCoast")).isEqualTo("the stick is never centred");
  }

  @Test
  void leftRollsAreMeasuredInTheirOwnDirection() {
    RunResult right = fly(10, new HoldInput(1, 0.5, 4, 0.15));
    RunResult left = fly(10, new HoldInput(1, -0.5, 4, 0.15));
    for (Measure measure : right.measures()) {
      Measure other = left.measure(measure.definition().name()).orElseThrow();
      assertThat(other.value().isPresent()).isEqualTo(measure.value().isPresent());
      if (measure.value().isPresent()) {
        boolean time = measure.definition().unit().equals("s");
        assertThat(other.value().getAsDouble())
            .as(measure.definition().name())
            .isEqualTo((time ? 1 : -1) * measure.value().getAsDouble());
      }
    }
  }

  /** A ramp of length h seen from its middle is a step, up to terms of (h/T)². */
  @Test
  void theResponseTimeConstantCountsFromTheMiddleOfTheMovement() {
    RunResult result = fly(10, new StepInput(1, 1, 0.1));
    double ramped = T * Math.log(Math.sinh(0.05 / T) / (0.05 / T) / (1 - 0.632));
    assertThat(value(result, "responseTimeConstant")).isCloseTo(ramped, within(CLOSE));
  }

  @Test
  void theBankCoastIsTheAreaUnderTheFadingRate() {
    RunResult result = fly(10, new HoldInput(1, 1, 4, 0));
    double then = -STEADY * Math.expm1(-4 / T);
    assertThat(value(result, "bankCoast")).isCloseTo(then * T * 0.95, within(CLOSE));
    assertThat(result.measure("bankCoast").orElseThrow().remark())
        .contains("in 1.20 s") // T ln 20 = 1.198 s
        .contains("left over");
  }

  @Test
  void aShortHoldHasNoSteadyRate() {
    RunResult result = fly(5, new HoldInput(1, 1, 0.8, 0));
    assertThat(reason(result, "steadyRollRate"))
        .isEqualTo("not reached: the stick is held for 0.800 s, 2.0 time constants");
    assertThat(reason(result, "settlingTime")).isEqualTo("no steady roll rate to compare with");
    assertThat(value(result, "peakRollRate"))
        .isCloseTo(STEADY * -Math.expm1(-0.8 / T), within(CLOSE));
  }

  @Test
  void theSettlingBandCanBeChosen() {
    var base =
        Scenarios.of(
            oneDegree(T, K), seaLevel(50), SlipTreatment.HELD, 10, stick(new StepInput(1, 1, 0)));
    var scenario =
        new Scenario(
            base.title(),
            base.data(),
            base.condition(),
            base.propeller(),
            base.slip(),
            base.start(),
            base.programme(),
            base.duration(),
            new MeasureOptions(0.02, List.of(50.0, 7.5)));
    RunResult result = ScenarioRun.execute(scenario);
    assertThat(value(result, "settlingTime")).isCloseTo(T * Math.log(50), within(CLOSE));
    for (double degrees : new double[] {50, 7.5}) {
      String name = "timeToBank" + (degrees == 50 ? "50" : "7.5");
      double time = value(result, name);
      double bank = STEADY * (time + T * Math.expm1(-time / T));
      assertThat(Math.toDegrees(bank)).isCloseTo(degrees, within(1e-6));
    }
    assertThat(result.measure("timeToBank30")).isEmpty();
  }

  @Test
  void aDoubletHasNoSteadyRate() {
    RunResult result = fly(20, new DoubletInput(1, 1, 5, 0.1));
    assertThat(reason(result, "steadyRollRate")).isEqualTo("no held stick in this scenario");
  }

  /** The times of an entry count from its own movement, not from an earlier one. */
  @Test
  void aHoldAfterADoubletHasASteadyRateButNoTimesFromTheDoublet() {
    RunResult result = fly(20, new DoubletInput(1, 0.5, 1, 0.1), new StepInput(8, 1, 0.1));
    assertThat(value(result, "steadyRollRate")).isCloseTo(STEADY, within(1e-8));
    for (String name : List.of("responseTimeConstant", "settlingTime", "riseTime")) {
      assertThat(reason(result, name)).contains("not the one that leads to the hold");
    }
  }

  @Test
  void aScenarioWithoutInputsSaysSo() {
    RunResult result = fly(5);
    assertThat(reason(result, "peakRollRate")).isEqualTo("no control moves in this scenario");
    assertThat(reason(result, "timeToBank30")).isEqualTo("no control moves in this scenario");
    assertThat(value(result, "finalBank")).isZero();
  }

  @Test
  void anInputAfterTheEndSaysSo() {
    assertThat(reason(fly(5, new StepInput(6, 1, 0.1)), "peakRollRate"))
        .contains("after the end of the manoeuvre");
  }

  @Test
  void heldSlipRefusesTheQuestionOfTheReturn() {
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(T, K),
                seaLevel(50),
                SlipTreatment.HELD,
                new Disturbance(Math.toRadians(20), 0, 0),
                PropellerMoments.NONE,
                10));
    for (String name : List.of("returnTimeToHalf", "returnTimeToFiveDegrees", "returnOvershoot")) {
      assertThat(reason(result, name)).startsWith("held slip cannot return by itself");
    }
  }

  /** Once the fast modes are gone the bank fades with the spiral: its half time is ln 2/|λ|. */
  @ParameterizedTest
  @ValueSource(longs = {2, 5, 8, 13})
  void theReturnHasTheHalfTimeOfTheSpiral(long seed) {
    RandomAeroplane any = RandomAeroplane.of(seed);
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                any.data(),
                any.condition(),
                SlipTreatment.FREE,
                new Disturbance(Math.toRadians(-10), 0, 0),
                PropellerMoments.NONE,
                600));
    double root = result.modes().orElseThrow().spiral().orElseThrow().root();
    if (root < 0) {
      // the start-up of roll and yaw costs the bank a share of T_R over the half time
      assertThat(value(result, "returnTimeToHalf"))
          .isCloseTo(Math.log(2) / -root, within(0.12 * Math.log(2) / -root));
      assertThat(value(result, "returnOvershoot")).isLessThan(Math.toRadians(0.1));
    } else {
      assertThat(reason(result, "returnTimeToHalf")).startsWith("diverging");
    }
  }

  @Test
  void theReturnCountsWholeTurnsAway() {
    RandomAeroplane any = stableSpiral();
    double[] times = new double[2];
    for (int turns = 0; turns < 2; turns++) {
      RunResult result =
          ScenarioRun.execute(
              Scenarios.of(
                  any.data(),
                  any.condition(),
                  SlipTreatment.FREE,
                  new Disturbance(Math.toRadians(20) + turns * 2 * Math.PI, 0, 0),
                  PropellerMoments.NONE,
                  900));
      times[turns] = value(result, "returnTimeToFiveDegrees");
    }
    // sin φ of a whole turn more differs by rounding
    assertThat(times[1]).isCloseTo(times[0], within(1e-3));
  }

  private static RandomAeroplane stableSpiral() {
    for (long seed = 0; ; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      RunResult result =
          ScenarioRun.execute(Scenarios.of(any.data(), any.condition(), SlipTreatment.FREE, 1));
      if (result.modes().orElseThrow().spiral().orElseThrow().root() < -0.01) {
        return any;
      }
    }
  }

  @Test
  void aPedalLeadsWhereTheStickIsStill() {
    RandomAeroplane any = RandomAeroplane.of(3);
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                any.data(),
                any.condition(),
                SlipTreatment.FREE,
                6,
                pedal(new StepInput(1, 0.5, 0.1))));
    assertThat(value(result, "peakRollRate")).isPositive();
    assertThat(reason(result, "steadyRollRate")).isEqualTo("no held stick in this scenario");
  }

  /**
   * A wing of 14.44 m at 120 deg/s moves its tip at 15 m/s; at 370 km/h that is 8.4 deg of
   * incidence (common practice, no source).
   */
  @Test
  void helixAngleAndTipIncidenceOfAFastRoll() {
    double span = 14.44;
    double speed = 370 / 3.6;
    double tipSpeed = Math.toRadians(120) * span / 2;
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, -0.5);
    // in a steady roll Cl_p p̂ + Cl_δa δa = 0
    values.put(Coefficient.CL_DA, 0.5 * tipSpeed / speed / FULL_AILERON);
    AeroplaneData data =
        new AeroplaneData(
            Aeroplane.builder("fast roll", span, 20, Inertia.ofRoll(3000))
                .ailerons(Ailerons.of(FULL_AILERON, FULL_AILERON))
                .build(),
            LateralDerivatives.ofGiven(values, "test"));
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                data, seaLevel(speed), SlipTreatment.HELD, 10, stick(new StepInput(0, 1, 0))));
    assertThat(Math.toDegrees(value(result, "steadyRollRate"))).isCloseTo(120, within(1e-6));
    assertThat(value(result, "helixAngleSteady") * speed).isCloseTo(15, within(0.5)); // two figures
    // two figures of 8.4
    assertThat(Math.toDegrees(value(result, "tipIncidence"))).isCloseTo(8.4, within(0.05));
  }

  /** What is read off does not depend on how many rows the history is to have. */
  @Test
  void measuresDoNotDependOnTheSampleRate() {
    RandomAeroplane any = RandomAeroplane.of(4);
    Scenario scenario =
        Scenarios.of(
            any.data(),
            any.condition(),
            SlipTreatment.FREE,
            12,
            stick(new HoldInput(1.003, 0.4, 6, 0.15)));
    RunResult usual = ScenarioRun.execute(scenario);
    for (double rate : new double[] {1, 33.3, 1000}) {
      RunResult other = ScenarioRun.execute(scenario, FlightSettings.DEFAULT.withSampleRate(rate));
      assertThat(other.history().evenSamples()).hasSize((int) (12 * rate) + 1);
      for (Measure measure : usual.measures()) {
        Measure there = other.measure(measure.definition().name()).orElseThrow();
        assertThat(there.value().isPresent()).isEqualTo(measure.value().isPresent());
        if (measure.value().isPresent()) {
          // a cubic over 0.01 s is off by its fourth power, some 1e-6 of what changes within 0.1 s;
          // the largest acceleration is taken from the samples themselves, off by their square
          double share = measure.definition().name().equals("rollAcceleration") ? 1e-3 : 1e-4;
          assertThat(there.value().getAsDouble())
              .as(measure.definition().name() + " at " + rate)
              .isCloseTo(
                  measure.value().getAsDouble(),
                  within(share * Math.abs(measure.value().getAsDouble())));
        }
      }
    }
  }

  /** With a rate limit R the roll accelerates most just when the surface arrives, at δ/R. */
  @Test
  void theLargestAccelerationIsFoundWhereTheSurfaceStops() {
    double limit = Math.toRadians(63.7);
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(T, K, new SurfaceDynamics(limit, 0)),
                seaLevel(50),
                SlipTreatment.HELD,
                5,
                stick(new StepInput(1, 1, 0))));
    // ṗ + p/T = K R t from rest has ṗ = K R T (1 − e^(−t/T))
    assertThat(value(result, "rollAcceleration"))
        .isCloseTo(-K * limit * T * Math.expm1(-FULL_AILERON / limit / T), within(1e-8));
  }

  @Test
  void aRollThatIsThereAlreadyHasNoRiseTime() {
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(T, K),
                seaLevel(50),
                SlipTreatment.HELD,
                new Disturbance(0, 0.9 * STEADY, 0),
                PropellerMoments.NONE,
                10,
                stick(new StepInput(0, 1, 0.1))));
    assertThat(value(result, "steadyRollRate")).isCloseTo(STEADY, within(1e-8));
    assertThat(reason(result, "riseTime")).contains("already");
    assertThat(reason(result, "responseTimeConstant")).contains("already");
  }

  @Test
  void anInputAfterTheEndNeitherLeadsNorHindersTheReturn() {
    RandomAeroplane any = stableSpiral();
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                any.data(),
                any.condition(),
                SlipTreatment.FREE,
                new Disturbance(Math.toRadians(20), 0, 0),
                PropellerMoments.NONE,
                300,
                stick(new StepInput(400, 1, 0.1)),
                pedal(new HoldInput(1, 0.01, 1, 0.1))));
    assertThat(value(result, "peakRollRate")).isPositive();
    assertThat(value(result, "returnTimeToHalf")).isPositive();
  }

  /** The first minimum of the roll rate after release, found between samples. */
  @Test
  void theCoastEndsAtTheFirstMinimumWhereTheRateDoesNotFade() {
    RandomAeroplane any = RandomAeroplane.of(2);
    // a second push takes over while the rate of the first still fades
    PilotInput[] inputs = {
      stick(new HoldInput(1, 1, 2, 0)), stick(new StepInput(3.0537, 0.8, 0.2))
    };
    double[] coasts = new double[2];
    for (int i = 0; i < 2; i++) {
      coasts[i] =
          value(
              ScenarioRun.execute(
                  Scenarios.of(any.data(), any.condition(), SlipTreatment.FREE, 6, inputs),
                  FlightSettings.DEFAULT.withSampleRate(i == 0 ? 100 : 5000)),
              "bankCoast");
    }
    // the rate at the bottom, under 1 rad/s, times what straight slopes miss of its instant
    assertThat(coasts[0]).isCloseTo(coasts[1], within(2e-4));
  }

  @Test
  void optionsOutOfRangeAreRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new MeasureOptions(0, List.of()))
        .withMessageContaining("settling band");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new MeasureOptions(0.05, List.of(-3.0)))
        .withMessageContaining("bank change");
  }
}
