package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.pedal;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
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
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;

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
}
