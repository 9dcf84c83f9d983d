package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.seaLevel;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Position;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;

/** Power that changes in flight, against closed forms and against flights at a steady power. */
class PowerFlightTest {
  private static final double RATED = 100_000;
  private static final double SPEED = 250;
  private static final double LAG = 0.6;
  private static final double ROLL_MODE = 0.4;
  private static final double INERTIA = 1500; // of Scenarios.oneDegree

  private static Propeller.Builder propeller(Rotation rotation, double lag) {
    return Propeller.builder("p", rotation, new Engine(RATED, lag, 1, 0, rotation)).speed(SPEED);
  }

  private static AeroplaneData with(AeroplaneData data, Propeller... propellers) {
    Aeroplane plane = data.aeroplane();
    return new AeroplaneData(
        new Aeroplane(
            plane.name(),
            plane.span(),
            plane.wingArea(),
            plane.mass(),
            plane.inertia(),
            plane.ailerons(),
            plane.rudder(),
            plane.limits(),
            plane.imbalance(),
            List.of(propellers),
            plane.geometry(),
            plane.inertiaBasis()),
        data.derivatives());
  }

  private static AeroplaneData oneDegree(double rollMode, Propeller propeller) {
    return with(Scenarios.oneDegree(rollMode, 8), propeller);
  }

  private static RunResult fly(
      AeroplaneData data,
      FlightCondition condition,
      SlipTreatment slip,
      PropellerSetting flown,
      PropellerSetting trimmed,
      double duration,
      InputShape... onPower) {
    return ScenarioRun.execute(
        new Scenario(
            "power",
            data,
            condition,
            flown,
            slip,
            new Start(trimmed, Disturbance.NONE),
            PilotProgramme.of(
                List.of(onPower).stream()
                    .map(shape -> new PilotInput(Control.POWER, shape))
                    .toList()),
            duration,
            MeasureOptions.DEFAULT));
  }

  private static RunResult flyOneDegree(
      double rollMode, Propeller propeller, double share, double duration, InputShape... onPower) {
    PowerSetting power = PowerSetting.of(share * RATED);
    return fly(
        oneDegree(rollMode, propeller),
        seaLevel(50),
        SlipTreatment.HELD,
        power,
        power,
        duration,
        onPower);
  }

  /**
   * A jump of the lever: x = x₀ + Δ (1 − e^(−t/τ)), and the roll that the torque makes,
   *
   * <p>ṗ + p/T = −a (1 − e^(−t/τ)), a = Q Δ/Ixx, so p = −a [T (1 − e^(−t/T)) − (e^(−t/τ) −
   * e^(−t/T))/(1/T − 1/τ)].
   */
  @Test
  void aJumpOfTheLeverGivesALaggedPowerAndTheRollOfItsTorque() {
    double from = 0.3;
    double change = 0.5;
    RunResult result =
        flyOneDegree(
            ROLL_MODE,
            propeller(Rotation.CLOCKWISE, LAG).build(),
            from,
            4,
            new StepInput(0.5, change, 0));
    TimeHistory history = result.history();
    double a = RATED / SPEED * change / INERTIA;
    for (int i = 0; i < history.size(); i++) {
      double t = Math.max(0, history.time(i) - 0.5);
      double slow = Math.exp(-t / LAG);
      double quick = Math.exp(-t / ROLL_MODE);
      double x = from + change * (1 - slow);
      double p = -a * (ROLL_MODE * (1 - quick) - (slow - quick) / (1 / ROLL_MODE - 1 / LAG));
      // the local tolerance of some dozen steps
      assertThat(history.value(Channel.POWER, i)).isCloseTo(x, within(1e-8));
      assertThat(history.value(Channel.PROPELLER_ROLL_MOMENT, i))
          .isCloseTo(-RATED / SPEED * x, within(RATED / SPEED * 1e-8));
      assertThat(history.value(Channel.ROLL_RATE, i)).isCloseTo(p, within(1e-8));
    }
  }

  /** A hand that takes its time: while it moves, x − x₀ = (Δ/m) (t − τ (1 − e^(−t/τ))). */
  @Test
  void aHandThatTakesItsTime() {
    double move = 0.8;
    double change = -0.4;
    TimeHistory history =
        flyOneDegree(
                ROLL_MODE,
                propeller(Rotation.CLOCKWISE, LAG).build(),
                0.7,
                4,
                new RampInput(0.5, change, move))
            .history();
    for (int i = 0; i < history.size(); i++) {
      double t = Math.max(0, history.time(i) - 0.5);
      double x = 0.7 + change / move * (follow(t) - follow(Math.max(0, t - move)));
      assertThat(history.value(Channel.POWER, i)).isCloseTo(x, within(1e-8));
    }
  }

  /** The lagged answer to a unit ramp. */
  private static double follow(double t) {
    return t - LAG * (1 - Math.exp(-t / LAG));
  }

  @Test
  void withoutLagThePowerIsWhereTheLeverIs() {
    SweepInput sweep = new SweepInput(0.5, 0.2, 2, 9, 3, SweepInput.Law.LINEAR);
    TimeHistory history =
        flyOneDegree(ROLL_MODE, propeller(Rotation.CLOCKWISE, 0).build(), 0.5, 5, sweep).history();
    for (int i = 0; i < history.size(); i++) {
      assertThat(history.value(Channel.POWER, i))
          .isCloseTo(0.5 + sweep.movement().positionAt(history.time(i)), within(1e-12));
    }
  }

  /** The lever stops at the rated power: the lag then goes on from where it is, and is told. */
  @Test
  void theLeverStopsAtTheRatedPowerAndAtNone() {
    RunResult up =
        flyOneDegree(
            ROLL_MODE,
            propeller(Rotation.CLOCKWISE, LAG).build(),
            0.6,
            4,
            new RampInput(0.5, 0.8, 1));
    // 0.6 + 0.8 (t − 0.5) reaches 1 at 1 s
    assertThat(up.events()).hasSize(1);
    FlightEvent.Stop stop = (FlightEvent.Stop) up.events().get(0);
    assertThat(stop.control()).isEqualTo(Control.POWER);
    assertThat(stop.reached()).isTrue();
    assertThat(stop.time()).isCloseTo(1, within(1e-8));
    assertThat(up.cautions())
        .contains("the power input goes beyond the rated power from 1.00 s; the lever stops there");
    TimeHistory history = up.history();
    double atStop = 0.6 + 0.8 * follow(0.5);
    for (int i = history.lastAt(1.001); i < history.size(); i++) {
      double x = 1 + (atStop - 1) * Math.exp(-(history.time(i) - 1) / LAG);
      assertThat(history.value(Channel.POWER, i)).isCloseTo(x, within(1e-8));
    }
    RunResult down =
        flyOneDegree(
            ROLL_MODE,
            propeller(Rotation.CLOCKWISE, 0).build(),
            0.3,
            4,
            new DoubletInput(1, -0.5, 1, 0));
    assertThat(down.cautions())
        .contains("the power input goes below no power from 1.00 s; the lever stops there");
    assertThat(down.history().value(Channel.POWER, down.history().lastAt(1.5))).isZero();
    assertThat(down.history().value(Channel.POWER, down.history().lastAt(2.5))).isEqualTo(0.8);
    assertThat(
            flyOneDegree(
                    ROLL_MODE,
                    propeller(Rotation.CLOCKWISE, 0).build(),
                    0.5,
                    2,
                    new StepInput(1, 0.5, 0.1))
                .events())
        .isEmpty(); // exactly the rated power
  }

  /**
   * With all of the torque straightened only the change of angular momentum is left: without
   * damping the aeroplane ends up rolling at p = −J (Ω₁ − Ω₀)/Ixx, however the power went there.
   */
  @Test
  void theSpinUpReactionGivesTheAirframeWhatThePropellerTakes() {
    double undamped = 1e9;
    double inertia = 2;
    Propeller propeller =
        propeller(Rotation.CLOCKWISE, LAG)
            .speedWithoutPower(0.5)
            .inertia(inertia)
            .straightened(1)
            .build();
    double slow = SPEED * Math.cbrt(0.125 + 0.875 * 0.2);
    double quick = SPEED * Math.cbrt(0.125 + 0.875 * 0.9);
    for (InputShape shape :
        List.of(
            new StepInput(0.5, 0.7, 0), new StepInput(0.5, 0.7, 0.3), new RampInput(0.5, 0.7, 4))) {
      TimeHistory history = flyOneDegree(undamped, propeller, 0.2, 25, shape).history();
      // after 20 s no more than e^(−20/0.6) of the change is left; the tolerance of the steps
      assertThat(history.value(Channel.ROLL_RATE, history.size() - 1))
          .isCloseTo(-inertia * (quick - slow) / INERTIA, within(1e-7));
    }
  }

  /** Common practice: adding power rolls an aeroplane against the turning of its propeller. */
  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void addedPowerRollsAgainstThePropeller(SlipTreatment slip) {
    for (long seed = 0; seed < 20; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      TimeHistory[] histories = new TimeHistory[3];
      for (Rotation rotation : Rotation.values()) {
        PowerSetting power = PowerSetting.of(0.2 * RATED);
        // without trim against the torque the aeroplane is symmetrical but for the propeller
        histories[rotation.ordinal()] =
            fly(
                    with(
                        any.data(),
                        propeller(rotation, LAG)
                            .speedWithoutPower(0.6)
                            .inertia(1)
                            .straightened(0.3)
                            .build()),
                    any.condition(),
                    slip,
                    power,
                    power,
                    3,
                    new HoldInput(0.5, 0.8, 2, 0.1))
                .history();
      }
      TimeHistory clockwise = histories[0];
      int last = clockwise.lastAt(2.4);
      assertThat(clockwise.value(Channel.ROLL_RATE, clockwise.lastAt(1))).isNegative();
      assertThat(clockwise.value(Channel.BANK, last)).isNegative();
      for (int i = 0; i < clockwise.size(); i++) {
        // all is mirrored but the rounding of the trim
        assertThat(histories[1].value(Channel.BANK, i))
            .isCloseTo(-clockwise.value(Channel.BANK, i), within(1e-12));
      }
      assertThat(histories[2].values(Channel.BANK)).containsOnly(0);
    }
  }

  /**
   * An engine without lag and a jump at once is a flight at the new power from the trim of the old:
   * what is added to the steady moments does as they do, in roll and, through a propeller on one
   * side, in yaw.
   */
  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void aJumpAtOnceIsAFlightAtTheNewPower(SlipTreatment slip) {
    for (long seed = 0; seed < 20; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      AeroplaneData data =
          with(
              any.data(),
              propeller(Rotation.CLOCKWISE, 0)
                  .position(new Position(1, 0.4, 0))
                  .efficiency(0.8)
                  .build());
      FlightCondition condition = any.condition().withFlightPathAngle(0.1);
      PowerSetting before = PowerSetting.of(0.2 * RATED);
      PowerSetting after = PowerSetting.of(0.9 * RATED);
      RunResult steady = fly(data, condition, slip, after, before, 4);
      RunResult jumped = fly(data, condition, slip, before, before, 4, new StepInput(0, 0.7, 0));
      assertThat(steady.history().size()).isGreaterThan(400);
      for (int k = 0; k <= 400; k++) {
        int i = steady.history().lastAt(k / 100.0);
        int j = jumped.history().lastAt(k / 100.0);
        for (Channel channel :
            List.of(
                Channel.BANK,
                Channel.ROLL_RATE,
                Channel.SIDESLIP,
                Channel.YAW_RATE,
                Channel.POWER)) {
          assertThat(jumped.history().value(channel, j))
              .as("%s at %s s, seed %s", channel, k / 100.0, seed)
              // the rounding of other sums, grown by an unstable spiral
              .isCloseTo(steady.history().value(channel, i), within(1e-9));
        }
        assertThat(jumped.history().value(Channel.PROPELLER_YAW_MOMENT, j))
            .isCloseTo(steady.history().value(Channel.PROPELLER_YAW_MOMENT, i), within(1e-9));
      }
      double pedal = pedalToHold(steady);
      if (slip == SlipTreatment.HELD) {
        assertThat(pedalToHold(jumped)).isCloseTo(pedal, within(1e-9));
      }
    }
  }

  private static double pedalToHold(RunResult result) {
    return result
        .measure("pedalToHoldSlip")
        .flatMap(measure -> measure.value().stream().boxed().findFirst())
        .orElse(Double.NaN);
  }

  /** A power is the moment that follows from it; trim and flight are the same. */
  @ParameterizedTest
  @ValueSource(doubles = {0, 0.5, 1})
  void aPowerIsTheMomentThatFollowsFromIt(double share) {
    RandomAeroplane any = RandomAeroplane.of(3);
    AeroplaneData data =
        with(any.data(), propeller(Rotation.CLOCKWISE, 1).straightened(0.25).build());
    PropellerMoments moment = new PropellerMoments(-0.75 * share * RATED / SPEED);
    PropellerMoments other = new PropellerMoments(-0.75 * 0.3 * RATED / SPEED);
    RunResult given = fly(any.data(), any.condition(), SlipTreatment.FREE, moment, other, 3);
    RunResult worked =
        fly(
            data,
            any.condition(),
            SlipTreatment.FREE,
            PowerSetting.of(share * RATED),
            PowerSetting.of(0.3 * RATED),
            3);
    assertThat(worked.trim().aileron()).isCloseTo(given.trim().aileron(), within(1e-15));
    // a left-rolling torque is held with right aileron
    assertThat(worked.trim().aileron()).isPositive();
    int last = given.history().size() - 1;
    assertThat(worked.history().value(Channel.BANK, last))
        .isCloseTo(given.history().value(Channel.BANK, last), within(1e-10));
  }

  /**
   * Nothing of the propeller changes: the same numbers to the last bit, input of no size or none.
   */
  @Test
  void anInputOfNoSizeChangesNothing() {
    RandomAeroplane any = RandomAeroplane.of(4);
    AeroplaneData data = with(any.data(), propeller(Rotation.CLOCKWISE, LAG).build());
    PowerSetting power = PowerSetting.of(0.5 * RATED);
    TimeHistory without =
        fly(data, any.condition(), SlipTreatment.FREE, power, PowerSetting.of(0), 2).history();
    TimeHistory with =
        fly(
                data,
                any.condition(),
                SlipTreatment.FREE,
                power,
                PowerSetting.of(0),
                2,
                new StepInput(3, 0, 0.1))
            .history();
    for (int i = 0; i < without.size(); i++) {
      for (Channel channel : Channel.values()) {
        assertThat(with.value(channel, i)).isEqualTo(without.value(channel, i));
      }
    }
  }

  @Test
  void measuresOfARollSayThatOnlyThePowerMoves() {
    RunResult result =
        flyOneDegree(
            ROLL_MODE,
            propeller(Rotation.CLOCKWISE, LAG).build(),
            0.3,
            2,
            new StepInput(0.5, 0.2, 0.1));
    assertThat(result.measure("peakRollRate").orElseThrow().remark())
        .isEqualTo("neither stick nor pedals move: nothing says which way it should roll");
    assertThat(result.measure("returnTimeToHalf").orElseThrow().value()).isEmpty();
  }
}
