package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Scenarios;
import org.rolltrace.core.testing.Shipped;

class LiveFlightTest {
  /** The promise for every sample, deg and deg/s. */
  private static final double PROMISE = 5e-3;

  private static final double TICK = 1.0 / LiveFlight.TICKS_PER_SECOND;

  static Stream<Scenario> shipped() {
    return Shipped.scenarioFiles().stream()
        .map(file -> Shipped.scenario(file.getFileName().toString().replace(".json", "")));
  }

  /** A restless hand that begins at trim; where the aeroplane has a rudder, its feet too. */
  private static void flyWildly(LiveFlight flight, long seed, int ticks) {
    Random random = new Random(seed);
    double stick = 0;
    double pedal = 0;
    double stickRate = 0;
    double pedalRate = 0;
    for (int i = 0; i < ticks; i++) {
      if (random.nextInt(10) == 0) {
        stickRate = 0.4 * (random.nextDouble() - 0.5);
        pedalRate = 0.1 * (random.nextDouble() - 0.5);
      }
      stick = flight.within(Control.STICK, 0.98 * stick + stickRate);
      pedal = flight.within(Control.PEDAL, 0.95 * pedal + pedalRate);
      flight.tick(stick, pedal);
    }
  }

  private static ScenarioDocument document(Scenario scenario) {
    return Shipped.scenarioFiles().stream()
        .map(ScenarioDocument::open)
        .filter(one -> one.text("$.title").orElse("").equals(scenario.title()))
        .findFirst()
        .orElseThrow();
  }

  /** The record as a scenario would have it, flown by the ordinary run. */
  private static TimeHistory flownAgain(ScenarioDocument document, LiveFlight flight) {
    ScenarioDocument byHand = document.flownByHand(flight.record(), "by-hand.csv");
    ScenarioDocument.Check check = byHand.check();
    assertThat(check.faults()).isEmpty();
    return ScenarioRun.execute(check.scenario().orElseThrow()).history();
  }

  private static void assertSameFlight(TimeHistory live, TimeHistory again) {
    for (int i = 0; i < live.size(); i++) {
      // Each tick is an even sample, too: two a tick.
      int index = again.lastAt(live.time(i));
      assertThat(again.time(index)).isCloseTo(live.time(i), within(1e-12));
      for (Channel channel : Channel.values()) {
        if (channel == Channel.ROLL_ACCELERATION) {
          continue; // it jumps where the hand's rate does, and may be taken before or after
        }
        double factor = channel.unit().startsWith("rad") ? Math.toDegrees(1) : 1;
        double flown = factor * live.value(channel, i);
        double difference = Math.abs(factor * again.value(channel, index) - flown);
        if (index > 0 && again.time(index - 1) == again.time(index)) {
          // Where the rate of a held sideslip jumps, the yaw rate does: live it is that before.
          difference =
              Math.min(difference, Math.abs(factor * again.value(channel, index - 1) - flown));
        }
        assertThat(difference).as("%s at %s s", channel, live.time(i)).isLessThan(PROMISE);
      }
    }
  }

  /** Every shipped scenario: all slip treatments, starts, rate limits and lags. */
  @ParameterizedTest
  @MethodSource("shipped")
  void whatWasFlownComesOutAgainAsATrace(Scenario scenario) {
    LiveFlight flight = ScenarioRun.byHand(scenario);

    flyWildly(flight, 7, 400);

    assertSameFlight(flight.history(), flownAgain(document(scenario), flight));
  }

  /** Half the stick held: p = K δa (1 − e^(−t/T)) after a jump; the closed form of a first lag. */
  @Test
  void aHeldStickRollsAsTheClosedFormSays() {
    double timeConstant = 0.2;
    double perAileron = 20;
    LiveFlight flight =
        ScenarioRun.byHand(
            Scenarios.of(
                Scenarios.oneDegree(timeConstant, perAileron),
                Scenarios.seaLevel(50),
                SlipTreatment.HELD,
                1));

    for (int i = 0; i < 100; i++) {
      flight.tick(0.5, 0);
    }

    double steady = perAileron * timeConstant * 0.5 * Scenarios.FULL_AILERON;
    // The hand takes the first tick h for its move: a ramp, whose lag is (T/h)(e^(h/T) − 1).
    double after = timeConstant / TICK * Math.expm1(TICK / timeConstant);
    double expected = steady * (1 - after * Math.exp(-flight.time() / timeConstant));
    assertThat(flight.time()).isEqualTo(2);
    assertThat(flight.now(Channel.ROLL_RATE)).isCloseTo(expected, within(1e-8));
    assertThat(flight.now(Channel.STICK)).isEqualTo(0.5);
  }

  /** A rate limit of 20 deg/s moves ailerons by 0.4 deg a tick, whatever the hand does. */
  @Test
  void aileronsAreNoFasterThanTheirLimit() {
    LiveFlight flight =
        ScenarioRun.byHand(
            Scenarios.of(
                Scenarios.oneDegree(0.2, 20, new SurfaceDynamics(Math.toRadians(20), 0)),
                Scenarios.seaLevel(50),
                SlipTreatment.HELD,
                1));

    for (int i = 0; i < 10; i++) {
      flight.tick(1, 0);
    }

    assertThat(Math.toDegrees(flight.now(Channel.AILERON))).isCloseTo(4, within(1e-6));
  }

  @Test
  void itBeginsTrimmedAndDisplacedAndWithoutTheInputsOfTheScenario() {
    LiveFlight flight = ScenarioRun.byHand(Shipped.scenario("tarnlark-wing-drop"));
    TimeHistory run = ScenarioRun.execute(Shipped.scenario("tarnlark-wing-drop")).history();

    assertThat(flight.time()).isZero();
    for (Channel channel : Channel.values()) {
      assertThat(flight.now(channel)).as(channel.label()).isEqualTo(run.value(channel, 0));
    }
    LiveFlight step = ScenarioRun.byHand(Shipped.scenario("light-single-roll-entry"));
    for (int i = 0; i < 200; i++) {
      step.tick(0, 0);
    }
    assertThat(step.now(Channel.BANK)).isCloseTo(0, within(1e-12));
  }

  @Test
  void theHandStaysWithinTheStops() {
    LiveFlight flight = ScenarioRun.byHand(Shipped.scenario("tarnlark-cruise-roll-entry"));
    double trim = flight.trim(Control.STICK);
    assertThat(trim).as("the propeller is trimmed against").isNotZero();

    flight.tick(3, -3);
    assertThat(flight.now(Channel.STICK)).isBetween(1 - 1e-4 - Math.max(0, -trim), 1.0);
    flight.tick(-3, 3);
    assertThat(flight.now(Channel.STICK)).isBetween(-1.0, -1 + 1e-4 + Math.max(0, trim));
    assertThat(flight.within(Control.STICK, 0.123456)).isEqualTo(0.1235);
  }

  @Test
  void whatTheAeroplaneLacksCannotBeMoved() {
    LiveFlight flight = ScenarioRun.byHand(Shipped.scenario("one-degree-roll-step"));

    assertThat(flight.canMove(Control.STICK)).isTrue();
    assertThat(flight.canMove(Control.PEDAL)).isFalse();
    flight.tick(0.1, 0.5);
    assertThat(flight.record().moves(Control.PEDAL)).isFalse();
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.NEGATIVE_INFINITY})
  void aHandThatIsNowhereIsRefusedOrStopped(double wanted) {
    LiveFlight flight = ScenarioRun.byHand(Shipped.scenario("light-single-roll-entry"));

    if (Double.isNaN(wanted)) {
      assertThatThrownBy(() -> flight.tick(wanted, 0))
          .hasMessage("the stick position is NaN; expected a fraction of travel");
      assertThat(flight.time()).isZero();
    } else {
      flight.tick(wanted, 0);
      assertThat(flight.now(Channel.STICK)).isCloseTo(-1, within(1e-12));
    }
  }

  @Test
  void itIsOverAfterFiveMinutes() {
    LiveFlight flight = ScenarioRun.byHand(Shipped.scenario("one-degree-roll-step"));
    for (int i = 0; i < 15_000; i++) {
      assertThat(flight.isOver()).isFalse();
      flight.tick(0, 0);
    }

    assertThat(flight.isOver()).isTrue();
    assertThatThrownBy(() -> flight.tick(0, 0)).isInstanceOf(IllegalStateException.class);
    assertThat(flight.history().size()).isEqualTo(15_001);
    assertThat(flight.record().simplified().size()).isEqualTo(2);
  }
}
