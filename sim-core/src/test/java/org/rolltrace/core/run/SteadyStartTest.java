package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.FULL_AILERON;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.StringWriter;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.files.ResultJson;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Shipped;

/** Manoeuvres that start from a turn, a sideslip or a climb. */
class SteadyStartTest {
  private static final PropellerMoments POWER = new PropellerMoments(-300);
  private static final RandomAeroplane ANY = RandomAeroplane.of(5);

  private static RunResult fly(
      AeroplaneData data,
      FlightCondition condition,
      SlipTreatment slip,
      Start start,
      double duration,
      PilotInput... inputs) {
    return ScenarioRun.execute(
        new Scenario(
            "steady start",
            data,
            condition,
            data == ANY.data() ? POWER : PropellerMoments.NONE,
            slip,
            start,
            PilotProgramme.of(List.of(inputs)),
            duration,
            MeasureOptions.DEFAULT));
  }

  private static Start from(SteadyState state) {
    return new Start(state, POWER, Disturbance.NONE);
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void aTurnLeftAloneGoesOn(SlipTreatment slip) {
    for (double climb : new double[] {0, 0.15, -0.1}) {
      FlightCondition condition = ANY.condition().withFlightPathAngle(climb);
      RunResult result = fly(ANY.data(), condition, slip, from(SteadyState.turn(-0.5)), 20);
      TimeHistory history = result.history();
      int last = history.size() - 1;
      for (Channel channel : List.of(Channel.BANK, Channel.ROLL_RATE, Channel.YAW_RATE)) {
        assertThat(history.value(channel, last))
            .isCloseTo(history.value(channel, 0), within(1e-8)); // an unstable spiral's rounding
      }
      assertThat(history.value(Channel.BANK, 0)).isEqualTo(-0.5);
      double gravityOverSpeed = 9.80665 / condition.trueAirspeed();
      assertThat(history.value(Channel.YAW_RATE, 0))
          .isCloseTo(gravityOverSpeed * Math.sin(-0.5) * Math.cos(climb), within(1e-12));
      assertThat(result.scenario().condition().loadFactor())
          .isCloseTo(Math.cos(climb) / Math.cos(0.5), within(1e-14));
    }
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void aSideslipLeftAloneGoesOn(SlipTreatment slip) {
    for (double climb : new double[] {0, 0.15, -0.1}) {
      FlightCondition condition = ANY.condition().withFlightPathAngle(climb);
      RunResult result =
          fly(ANY.data(), condition, slip, from(SteadyState.straightAtSideslip(0.12)), 10);
      TimeHistory history = result.history();
      int last = history.size() - 1;
      assertThat(history.value(Channel.SIDESLIP, 0)).isCloseTo(0.12, within(1e-12));
      assertThat(history.value(Channel.SIDESLIP, last)).isCloseTo(0.12, within(1e-8));
      assertThat(history.value(Channel.BANK, last))
          .isCloseTo(history.value(Channel.BANK, 0), within(1e-8));
      assertThat(history.value(Channel.YAW_RATE, 0)).isCloseTo(0, within(1e-12));
      // the wing is down on the side that the wind comes from
      assertThat(history.value(Channel.BANK, 0)).isPositive();
    }
  }

  /**
   * A held sideslip of an aeroplane without Cl_r: ṗ = −(p − K δa T)/T from a step of the stick, as
   * without slip, while the turn is that of the weight less what held the bank against the slip.
   */
  @Test
  void aHeldSideslipRollsByTheClosedFormAndKeepsItsSlip() {
    double slip = Math.toRadians(6);
    double t = 0.4;
    double k = 8;
    FlightCondition condition = seaLevel(50);
    AeroplaneData bare = oneDegree(t, k);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient same : List.of(Coefficient.CL_P, Coefficient.CL_DA)) {
      values.put(same, bare.derivatives().value(same));
    }
    values.put(Coefficient.CY_BETA, -0.5);
    values.put(Coefficient.CL_BETA, -0.08);
    Aeroplane plane = bare.aeroplane();
    AeroplaneData data =
        new AeroplaneData(
            Aeroplane.builder("slipping", plane.span(), plane.wingArea(), plane.inertia())
                .mass(900)
                .ailerons(plane.ailerons().orElseThrow())
                .build(),
            LateralDerivatives.ofGiven(values, "test"));
    RunResult result =
        fly(
            data,
            condition,
            SlipTreatment.HELD,
            new Start(
                SteadyState.straightAtSideslip(slip), PropellerMoments.NONE, Disturbance.NONE),
            3,
            stick(new StepInput(0.5, 0.3, 0)));
    double force = condition.dynamicPressure() * plane.wingArea() * 0.5 * slip;
    double bank0 = Math.asin(force / (900 * 9.80665));
    assertThat(result.trim().bank()).isCloseTo(bank0, within(1e-14));
    double steady = k * 0.3 * FULL_AILERON * t;
    TimeHistory history = result.history();
    for (int i = 0; i < history.size(); i++) {
      double since = Math.max(0, history.time(i) - 0.5);
      double faded = -Math.expm1(-since / t);
      double bank = bank0 + steady * (since - t * faded);
      assertThat(history.value(Channel.SIDESLIP, i)).isEqualTo(result.trim().sideslip());
      // the local tolerance of some dozen steps
      assertThat(history.value(Channel.ROLL_RATE, i)).isCloseTo(steady * faded, within(1e-8));
      assertThat(history.value(Channel.BANK, i)).isCloseTo(bank, within(1e-8));
      assertThat(history.value(Channel.YAW_RATE, i))
          .isCloseTo(9.80665 / 50 * (Math.sin(bank) - Math.sin(bank0)), within(1e-8));
    }
    assertThat(
            ScenarioRun.compareWithFreeSlip(result)
                .measure("freeSlipBankDifference")
                .orElseThrow()
                .value())
        .isEmpty();
  }

  /** Against free slip, which starts from the same slip with the pedals that hold it. */
  @Test
  void aHeldSideslipSaysHowFarFreeSlipIs() {
    RunResult result =
        fly(
            ANY.data(),
            ANY.condition(),
            SlipTreatment.HELD,
            from(SteadyState.straightAtSideslip(0.1)),
            3,
            stick(new StepInput(0.5, 0.2, 0.1)));
    double difference =
        ScenarioRun.compareWithFreeSlip(result)
            .measure("freeSlipBankDifference")
            .orElseThrow()
            .value()
            .orElseThrow();
    // they start with different banks, for the rudder's side force, and swing apart by degrees
    assertThat(difference).isBetween(Math.toRadians(0.1), Math.toRadians(90));
    // the pedal that holds it balances Cn_β β, to the left with the wind from the right: from zero
    // rudder it takes about β Cn_β/Cn_δr
    assertThat(result.measure("pedalToHoldSlip").orElseThrow().value().orElseThrow()).isNegative();
  }

  /** Trimmed at one power and flown with another, a turn rolls off to the side of the torque. */
  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void aTurnTrimmedWithoutTheTorqueRollsAway(SlipTreatment slip) {
    RunResult result =
        fly(
            ANY.data(),
            ANY.condition(),
            slip,
            new Start(SteadyState.turn(0.5), PropellerMoments.NONE, Disturbance.NONE),
            3);
    assertThat(result.history().value(Channel.BANK, 0)).isEqualTo(0.5);
    assertThat(result.measure("finalBank").orElseThrow().value().orElseThrow()).isLessThan(0.45);
  }

  @Test
  void aDisturbanceComesOnTopOfTheTrim() {
    RunResult result =
        fly(
            ANY.data(),
            ANY.condition(),
            SlipTreatment.FREE,
            new Start(SteadyState.turn(0.5), POWER, new Disturbance(0.1, 0.2, 0.03)),
            1);
    assertThat(result.history().value(Channel.BANK, 0)).isCloseTo(0.6, within(1e-15));
    assertThat(result.history().value(Channel.ROLL_RATE, 0)).isCloseTo(0.2, within(1e-15));
    assertThat(result.history().value(Channel.SIDESLIP, 0) - result.trim().sideslip())
        .isCloseTo(0.03, within(1e-15));
  }

  /**
   * Bank change of the one-degree roll after a jump of the stick, φ = p∞ (t − T (1 − e^(−t/T))).
   */
  @ParameterizedTest
  @CsvSource({"-30, 1, 0.5", "30, -0.6, 1", "-30, 0.8, 0"})
  void timeFromOneBankToTheOther(double bankDeg, double size, double start) {
    double timeConstant = 0.4;
    double perAileron = 8;
    RunResult result =
        fly(
            oneDegree(timeConstant, perAileron),
            seaLevel(50),
            SlipTreatment.HELD,
            new Start(
                SteadyState.turn(Math.toRadians(bankDeg)), PropellerMoments.NONE, Disturbance.NONE),
            6,
            stick(new StepInput(start, size, 0)));
    double time = result.measure("timeBankToBank30").orElseThrow().value().orElseThrow();
    double steady = perAileron * FULL_AILERON * Math.abs(size) * timeConstant;
    double change = steady * (time + timeConstant * Math.expm1(-time / timeConstant));
    assertThat(Math.toDegrees(change)).isCloseTo(60, within(1e-6)); // as for the times to bank
  }

  private static String reason(RunResult result, String name) {
    Measure measure = result.measure(name).orElseThrow();
    assertThat(measure.value()).isEmpty();
    return measure.remark();
  }

  @Test
  void noTimeFromBankToBankSaysWhy() {
    String name = "timeBankToBank30";
    Start turn = new Start(SteadyState.turn(Math.toRadians(-30)), POWER, Disturbance.NONE);
    AeroplaneData data = ANY.data();
    FlightCondition condition = ANY.condition();
    assertThat(reason(fly(data, condition, SlipTreatment.FREE, turn, 3), name))
        .isEqualTo("no control moves in this scenario");
    assertThat(
            reason(
                fly(
                    data,
                    condition,
                    SlipTreatment.FREE,
                    turn,
                    1,
                    stick(new StepInput(0.5, 0.1, 0.1))),
                name))
        .isEqualTo("not reached in this manoeuvre");
    assertThat(
            reason(
                fly(
                    data,
                    condition,
                    SlipTreatment.FREE,
                    turn,
                    3,
                    stick(new StepInput(0.5, -0.5, 0.1))),
                name))
        .isEqualTo("the control first moves towards the wing that is down");
    for (Start other :
        List.of(
            from(SteadyState.turn(-0.6)),
            new Start(POWER, new Disturbance(Math.toRadians(-30), 0, 0)))) {
      assertThat(
              reason(
                  fly(
                      data,
                      condition,
                      SlipTreatment.FREE,
                      other,
                      3,
                      stick(new StepInput(0, 0.8, 0.1))),
                  name))
          .isEqualTo("the control does not first move in a steady turn at 30 deg of bank");
    }
  }

  @Test
  void controlsTrimmedForATurnDoNotReturnToWingsLevel() {
    RunResult result =
        fly(ANY.data(), ANY.condition(), SlipTreatment.FREE, from(SteadyState.turn(0.5)), 3);
    assertThat(reason(result, "returnTimeToHalf"))
        .isEqualTo("the controls are not trimmed for wings level but for a steady turn");
  }

  @Test
  void aLoadFactorThatDoesNotGoWithTheTurnIsACaution() {
    FlightCondition given = ANY.condition().withLoadFactor(1);
    Start turn = from(SteadyState.turn(Math.toRadians(45)));
    assertThat(fly(ANY.data(), given, SlipTreatment.FREE, turn, 1).cautions())
        .contains(
            "load factor 1.00 is given, but a steady turn at 45 deg of bank has 1.41: the flight"
                + " path curves down");
    assertThat(fly(ANY.data(), ANY.condition(), SlipTreatment.FREE, turn, 1).cautions())
        .noneMatch(caution -> caution.contains("curves"));
  }

  private static JsonNode json(String scenario) throws IOException {
    StringWriter out = new StringWriter();
    ResultJson.write(ScenarioRun.execute(Shipped.scenario(scenario)), "test", out);
    return new ObjectMapper().readTree(out.toString());
  }

  @Test
  void theResultSaysHowItStartedAndWhatWasConverted() throws IOException {
    JsonNode turn = json("tarnlark-turn-reversal");
    assertThat(turn.at("/trim/state").asText()).isEqualTo("steady-turn");
    assertThat(turn.at("/trim/bank").asDouble()).isCloseTo(-Math.PI / 6, within(1e-12));
    assertThat(turn.at("/trim/yawRate").asDouble()).isNegative();
    assertThat(turn.at("/measures/timeBankToBank30/value").asDouble()).isPositive();
    assertThat(json("tarnlark-straight-sideslip").at("/trim/state").asText())
        .isEqualTo("straight-sideslip");
    assertThat(json("tarnlark-fuel-imbalance").at("/aeroplane/lateralImbalance/arm").asDouble())
        .isEqualTo(1.45);
    assertThat(
            json("four-engine-jet-cruise-primed-roll-entry")
                .at("/scenario/derivativesConvention")
                .asText())
        .isEqualTo(
            "dimensional, primed, per radian; mean aileron angle, right-roll-positive; stability"
                + " axes");
  }
}
