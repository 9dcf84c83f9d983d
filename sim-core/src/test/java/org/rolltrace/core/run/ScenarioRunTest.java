package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.pedal;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;
import org.rolltrace.core.testing.Shipped;

class ScenarioRunTest {

  @Test
  void aTrimmedAeroplaneLeftAloneStaysWhereItIs() {
    for (SlipTreatment slip : SlipTreatment.values()) {
      RandomAeroplane any = RandomAeroplane.of(5);
      RunResult result =
          ScenarioRun.execute(
              Scenarios.of(
                  any.data(),
                  any.condition(),
                  slip,
                  Disturbance.NONE,
                  new PropellerMoments(-300),
                  20));
      assertThat(result.measure("finalBank").orElseThrow().value().orElseThrow())
          .isCloseTo(0, within(1e-9));
    }
  }

  @Test
  void trimAtAnotherTorqueThanItFliesWithRollsAway() {
    RandomAeroplane any = RandomAeroplane.of(5);
    PropellerMoments on = new PropellerMoments(-300);
    Scenario scenario =
        new Scenario(
            "power on",
            any.data(),
            any.condition(),
            on,
            SlipTreatment.FREE,
            new Start(PropellerMoments.NONE, Disturbance.NONE),
            PilotProgramme.of(List.of()),
            3,
            MeasureOptions.DEFAULT);
    RunResult result = ScenarioRun.execute(scenario);
    assertThat(result.measure("finalBank").orElseThrow().value().orElseThrow()).isNegative();
  }

  @Test
  void inputsAreAddedToTheTrimmedStick() {
    RandomAeroplane any = RandomAeroplane.of(5);
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                any.data(),
                any.condition(),
                SlipTreatment.FREE,
                Disturbance.NONE,
                new PropellerMoments(-300),
                3,
                stick(new StepInput(1, 0.3, 0.1))));
    double trimmed = result.trim().stick().orElseThrow();
    TimeHistory history = result.history();
    assertThat(trimmed).isPositive();
    assertThat(history.value(Channel.STICK, 0)).isEqualTo(trimmed);
    assertThat(history.value(Channel.STICK, history.size() - 1))
        .isCloseTo(trimmed + 0.3, within(1e-12));
  }

  @Test
  void aBankAtTheStartChangesNothingElse() {
    RandomAeroplane any = RandomAeroplane.of(5);
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                any.data(),
                any.condition(),
                SlipTreatment.FREE,
                new Disturbance(0.3, 0, 0),
                PropellerMoments.NONE,
                3));
    assertThat(result.history().value(Channel.BANK, 0)).isEqualTo(0.3);
    assertThat(result.history().value(Channel.ROLL_RATE, 0)).isZero();
    assertThat(result.history().value(Channel.YAW_RATE, 0)).isZero();
    assertThat(result.history().value(Channel.SIDESLIP, 0)).isZero();
  }

  @Test
  void heldAndSettledSayHowFarTheyAreFromFree() {
    RandomAeroplane any = RandomAeroplane.of(5);
    for (SlipTreatment slip : List.of(SlipTreatment.HELD, SlipTreatment.SETTLED)) {
      RunResult result =
          ScenarioRun.execute(
              Scenarios.of(
                  any.data(), any.condition(), slip, 5, stick(new HoldInput(1, 0.4, 2, 0.1))));
      RunResult free =
          ScenarioRun.execute(
              Scenarios.of(
                  any.data(),
                  any.condition(),
                  SlipTreatment.FREE,
                  5,
                  stick(new HoldInput(1, 0.4, 2, 0.1))));
      double largest = 0;
      for (int k = 0; k <= 500; k++) {
        int one = result.history().lastAt(k / 100.0);
        int two = free.history().lastAt(k / 100.0);
        largest =
            Math.max(
                largest,
                Math.abs(
                    result.history().value(Channel.BANK, one)
                        - free.history().value(Channel.BANK, two)));
      }
      assertThat(result.measure("freeSlipBankDifference")).isEmpty();
      assertThat(
              ScenarioRun.compareWithFreeSlip(result)
                  .measure("freeSlipBankDifference")
                  .orElseThrow()
                  .value()
                  .orElseThrow())
          .isCloseTo(largest, within(1e-12))
          .isPositive();
      assertThat(ScenarioRun.compareWithFreeSlip(free)).isSameAs(free);
    }
  }

  @Test
  void withoutTheDataForFreeSlipItSaysWhatIsMissing() {
    RunResult result =
        ScenarioRun.execute(
            Scenarios.of(
                oneDegree(0.4, 8),
                seaLevel(50),
                SlipTreatment.HELD,
                5,
                stick(new StepInput(1, 1, 0.1))));
    assertThat(result.modes()).isEmpty();
    assertThat(result.modesRemark())
        .isEqualTo("the free equations need mass and yaw inertia, CY_beta, Cl_beta, Cn_beta, Cn_r");
    assertThat(
            ScenarioRun.compareWithFreeSlip(result)
                .measure("freeSlipBankDifference")
                .orElseThrow()
                .remark())
        .isEqualTo(result.modesRemark());
    assertThat(result.liftCoefficient()).isEmpty();
  }

  @Test
  void aScenarioThatDoesNotFitTogetherIsRefusedWhole() {
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                Scenarios.of(
                    oneDegree(0.4, 8),
                    seaLevel(50),
                    SlipTreatment.SETTLED,
                    new Disturbance(0, 0, 0.1),
                    PropellerMoments.NONE,
                    5,
                    pedal(new StepInput(1, 1, 0.1))))
        .withMessageContaining("$.slip: settled slip needs mass and inertia.yaw")
        .withMessageContaining("$.start.sideslip")
        .withMessageContaining("$.inputs[0].control: the pedals move");
  }

  @Test
  void dampingAndAileronPowerAreAlwaysNeeded() {
    AeroplaneData bare =
        new AeroplaneData(
            Aeroplane.builder("bare", 10, 15, Inertia.ofRoll(1000)).build(),
            LateralDerivatives.ofGiven(Map.of(), "none"));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Scenarios.of(bare, seaLevel(50), SlipTreatment.HELD, 5))
        .withMessageContaining("Cl_p is missing")
        .withMessageContaining("Cl_da is missing");
  }

  @Test
  void settledSlipThatIsNotDeterminedFailsWithAWayOut() {
    AeroplaneData data =
        new AeroplaneData(
            Aeroplane.builder("no fin", 10, 15, Inertia.of(1000, 2000, 0)).mass(800).build(),
            LateralDerivatives.ofGiven(
                Map.of(Coefficient.CL_P, -0.4, Coefficient.CL_DA, 0.2), "test"));
    Scenario scenario = Scenarios.of(data, seaLevel(50), SlipTreatment.SETTLED, 5);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> ScenarioRun.execute(scenario))
        .withMessageContaining("use free slip");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -1, 3600.1, Double.NaN, Double.POSITIVE_INFINITY})
  void durationsOutOfRangeAreRefused(double duration) {
    assertThatIllegalArgumentException()
        .isThrownBy(
            () -> Scenarios.of(oneDegree(0.4, 8), seaLevel(50), SlipTreatment.HELD, duration))
        .withMessageContaining("duration is");
  }

  private static void haveTheSameMeasures(Scenario scenario) {
    List<Measure> whole = ScenarioRun.execute(scenario).measures();
    List<Measure> only = ScenarioRun.measure(scenario);
    assertThat(only).hasSameSizeAs(whole);
    for (int i = 0; i < whole.size(); i++) {
      Measure expected = whole.get(i);
      Measure found = only.get(i);
      String name = expected.definition().name();
      assertThat(found.definition()).isEqualTo(expected.definition());
      assertThat(found.value().isPresent()).as(name).isEqualTo(expected.value().isPresent());
      if (expected.value().isEmpty()) {
        assertThat(found.remark()).isEqualTo(expected.remark());
      } else {
        double value = expected.value().getAsDouble();
        // what a cubic over a quarter of a step leaves; the pedal is that of the nearest sample
        // so is the peak acceleration through a servo's lag, which lies between samples
        double relative =
            name.equals("pedalToHoldSlip") || name.equals("rollAcceleration") ? 1e-3 : 1e-4;
        assertThat(found.value().getAsDouble())
            .as(name)
            .isCloseTo(value, within(relative * Math.abs(value) + 2e-5));
      }
    }
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void measuresOnlyAreThoseOfTheWholeRun(SlipTreatment slip) {
    for (long seed = 0; seed < 40; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      haveTheSameMeasures(
          Scenarios.of(
              any.data(), any.condition(), slip, 8, stick(new HoldInput(0.5, -0.8, 2.5, 0.15))));
      haveTheSameMeasures(
          Scenarios.of(
              any.data(),
              any.condition(),
              slip,
              6,
              stick(new StepInput(0.5, 0.4, 0)),
              pedal(new DoubletInput(1, 0.5, 1, 0.1))));
    }
  }

  @Test
  void measuresOnlyOfAllShippedScenarios() {
    for (Path file : Shipped.scenarioFiles()) {
      haveTheSameMeasures(ScenarioFile.read(file));
    }
  }

  @Test
  void measuresMayBeTakenInSeveralThreads() {
    List<Scenario> scenarios =
        LongStream.range(0, 60)
            .mapToObj(RandomAeroplane::of)
            .map(
                any ->
                    Scenarios.of(
                        any.data(),
                        any.condition(),
                        SlipTreatment.FREE,
                        5,
                        stick(new StepInput(0.5, 0.4, 0.1))))
            .toList();
    List<List<Measure>> one = scenarios.stream().map(ScenarioRun::measure).toList();
    List<List<Measure>> many = scenarios.parallelStream().map(ScenarioRun::measure).toList();
    assertThat(many).isEqualTo(one);
  }
}
