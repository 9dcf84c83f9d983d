package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.files.AeroplaneFile;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.testing.Scenarios;

/**
 * What everybody who rolls aeroplanes knows (common practice, no source), on the shipped ones from
 * their shapes alone; beside each fact a case in which it stops holding.
 */
class FactsOfTheTradeTest {
  private static final Path FOLDER = Path.of("..", "scenarios", "aeroplanes");
  private static final String TRAINER = "tarnlark-trainer";
  private static final String RACER = "cragmerle-racer";
  private static final String SURVEYOR = "mosspipit-survey";

  @TempDir Path directory;

  private static AeroplaneData aeroplane(String name) {
    return aeroplane(name, "");
  }

  private static AeroplaneData aeroplane(String name, String variant) {
    return AeroplaneFile.readAll(FOLDER.resolve(name + ".json")).get(variant);
  }

  private AeroplaneData changed(String name, String part, String replacement) throws IOException {
    String text = Files.readString(FOLDER.resolve(name + ".json"));
    assertThat(text).containsOnlyOnce(part);
    Path file = directory.resolve("changed.json");
    Files.writeString(file, text.replace(part, replacement));
    return AeroplaneFile.readAll(file).get("");
  }

  private static FlightCondition at(double height, AirspeedKind kind, double speed) {
    return FlightCondition.of(height, 0, kind, speed);
  }

  private static FlightCondition seaLevel(double speed) {
    return at(0, AirspeedKind.TRUE, speed);
  }

  /** Full stick at once, the ball kept in the middle. */
  private static TimeHistory fullStick(AeroplaneData data, FlightCondition condition, double time) {
    return ScenarioRun.execute(
            Scenarios.of(
                data, condition, SlipTreatment.HELD, time, Scenarios.stick(new StepInput(0, 1, 0))))
        .history();
  }

  /** The rate a second later: seven and more time constants of these aeroplanes. */
  private static double rate(AeroplaneData data, FlightCondition condition) {
    return rateAfter(data, condition, 1.5);
  }

  private static double rateAfter(AeroplaneData data, FlightCondition condition, double time) {
    TimeHistory history = fullStick(data, condition, time);
    return history.value(Channel.ROLL_RATE, history.lastAt(time));
  }

  /**
   * The steady rate at full deflection is proportional to the true airspeed; the turn that comes
   * with the bank helps a roll by Cl_r r, more so when slow: 4 %.
   */
  @ParameterizedTest
  @ValueSource(strings = {TRAINER, RACER, SURVEYOR})
  void steadyRateGrowsWithTrueAirspeed(String name) {
    AeroplaneData data = aeroplane(name);
    double slow = name.equals(SURVEYOR) ? 20 : 50;
    double perSpeed = rate(data, seaLevel(slow)) / slow;
    for (double faster : new double[] {1.2, 1.5}) {
      assertThat(rate(data, seaLevel(faster * slow)) / (faster * slow))
          .isCloseTo(perSpeed, Percentage.withPercentage(4));
    }
  }

  /** Not near the stall, where the tip that goes down stalls and damping is lost. */
  @Test
  void steadyRateDoesNotFallWithTrueAirspeedDownToTheStall() {
    AeroplaneData data = aeroplane(TRAINER);
    double perSpeed = rate(data, seaLevel(45)) / 50;
    assertThat(rate(data, seaLevel(29)) / 29).isGreaterThan(1.1 * perSpeed);
  }

  /** At the same equivalent airspeed, with height as the true airspeed does; 2 % as above. */
  @ParameterizedTest
  @ValueSource(doubles = {2000, 4000, 6000})
  void atTheSameEquivalentAirspeedSteadyRateGrowsWithHeight(double height) {
    AeroplaneData data = aeroplane(RACER);
    FlightCondition high = at(height, AirspeedKind.EQUIVALENT, 70);
    assertThat(rate(data, high) / rate(data, seaLevel(70)))
        .isCloseTo(high.trueAirspeed() / 70, Percentage.withPercentage(2));
  }

  /**
   * Not for a short movement: the moment of the ailerons is that of the equivalent airspeed, and so
   * is the rate before damping takes hold, here within a twentieth of the time constant: 5 %.
   */
  @Test
  void atTheSameEquivalentAirspeedHeightDoesNotHelpAShortMovement() {
    AeroplaneData data = aeroplane(RACER);
    FlightCondition high = at(6000, AirspeedKind.EQUIVALENT, 70);
    assertThat(high.trueAirspeed() / 70).isGreaterThan(1.3);
    double early = 0.005;
    assertThat(rateAfter(data, high, early) / rateAfter(data, seaLevel(70), early))
        .isCloseTo(1, Percentage.withPercentage(5));
  }

  /** A tenth off the span outboard of the ailerons, clearly faster; cut into them, no more. */
  @Test
  void clippedTipsRollFasterUntilTheCutReachesTheAilerons() {
    FlightCondition condition = seaLevel(90);
    AeroplaneData standard = aeroplane(RACER);
    AeroplaneData clipped = aeroplane(RACER, "clipped tips");
    AeroplaneData cut = aeroplane(RACER, "tips cut into the ailerons");
    assertThat(clipped.aeroplane().span() / standard.aeroplane().span())
        .isCloseTo(0.9, Percentage.withPercentage(1));
    assertThat(clipped.aeroplane().geometry().orElseThrow().ailerons())
        .isEqualTo(standard.aeroplane().geometry().orElseThrow().ailerons());
    assertThat(rate(clipped, condition)).isGreaterThan(1.1 * rate(standard, condition));
    assertThat(cut.aeroplane().span()).isLessThan(0.91 * clipped.aeroplane().span());
    assertThat(rate(cut, condition)).isLessThan(rate(clipped, condition));
  }

  @Test
  void largeAileronsRollFast() {
    FlightCondition condition = seaLevel(55);
    assertThat(rate(aeroplane(TRAINER, "larger ailerons"), condition))
        .isGreaterThan(1.3 * rate(aeroplane(TRAINER), condition));
  }

  /** Not when what is added lies near the body, where there is no arm: here twice the length. */
  @Test
  void aileronsThatGrowInwardsGainLittle() throws IOException {
    FlightCondition condition = seaLevel(55);
    AeroplaneData longer = changed(TRAINER, "\"from\": \"2.79 m\"", "\"from\": \"1.305 m\"");
    AeroplaneData longest = changed(TRAINER, "\"from\": \"2.79 m\"", "\"from\": \"0 m\"");
    double first = rate(longer, condition) / rate(aeroplane(TRAINER), condition) - 1;
    double second = rate(longest, condition) / rate(longer, condition) - 1;
    assertThat(first).isGreaterThan(0.25);
    assertThat(second).isBetween(0.0, 0.25 * first);
  }

  /** The helix angles being alike, by the spans. */
  @Test
  void shortWingsRollFast() {
    FlightCondition condition = seaLevel(55);
    double trainer = rate(aeroplane(TRAINER), condition);
    double racer = rate(aeroplane(RACER), condition);
    assertThat(racer).isGreaterThan(1.3 * trainer);
  }

  /** Not just after the stick has moved, if what is inside is as heavy: there inertia counts. */
  @Test
  void aShortWingDoesNotMakeUpForMassFarOut() throws IOException {
    FlightCondition condition = seaLevel(90);
    AeroplaneData loaded =
        changed(
            RACER,
            "\"axes\": \"body\"",
            "\"inertia\": { \"roll\": \"900 kg m2\", \"yaw\": \"1800 kg m2\" }, \"axes\": \"body\"");
    double early = 0.05;
    assertThat(rateAfter(loaded, condition, early))
        .isLessThan(0.6 * rateAfter(aeroplane(RACER), condition, early));
    assertThat(rate(loaded, condition))
        .isCloseTo(rate(aeroplane(RACER), condition), Percentage.withPercentage(1));
  }

  private static LateralModes modes(AeroplaneData data, FlightCondition condition) {
    return dropped(data, condition).modes().orElseThrow();
  }

  private static RunResult dropped(AeroplaneData data, FlightCondition condition) {
    return ScenarioRun.execute(
        Scenarios.of(
            data,
            condition,
            SlipTreatment.FREE,
            new Disturbance(Math.toRadians(20), 0, 0),
            PropellerMoments.NONE,
            40));
  }

  private static double bankAtTheEnd(AeroplaneData data, FlightCondition condition) {
    TimeHistory history = dropped(data, condition).history();
    return history.value(Channel.BANK, history.lastAt(40));
  }

  /**
   * More dihedral brings a dropped wing back sooner, with a dutch roll that stays well damped:
   * twice the 0.08 that MIL-F-8785C asks for at level 1 (read in excerpts).
   */
  @Test
  void moreDihedralReturnsTheWingsFaster() {
    FlightCondition condition = at(1500, AirspeedKind.CALIBRATED, 51);
    AeroplaneData more = aeroplane(TRAINER, "more dihedral");
    double usual = bankAtTheEnd(aeroplane(TRAINER), condition);
    assertThat(bankAtTheEnd(more, condition)).isPositive().isLessThan(0.8 * usual);
    assertThat(modes(aeroplane(TRAINER), condition).spiral().orElseThrow().root()).isNegative();
    assertThat(modes(more, condition).dutchRoll().orElseThrow().dampingRatio()).isGreaterThan(0.16);
  }

  /** Not with a fin too small for it: the dutch roll then takes the damping. */
  @Test
  void dihedralBeyondWhatTheFinBearsCostsTheDutchRoll() throws IOException {
    FlightCondition condition = at(1500, AirspeedKind.CALIBRATED, 51);
    AeroplaneData most = changed(TRAINER, "\"dihedral\": \"7 deg\"", "\"dihedral\": \"25 deg\"");
    double usual = modes(aeroplane(TRAINER), condition).dutchRoll().orElseThrow().dampingRatio();
    assertThat(modes(most, condition).dutchRoll().orElseThrow().dampingRatio())
        .isLessThan(0.6 * usual);
  }

  /** Not where the spiral diverges: slow enough, a dropped wing goes on dropping by itself. */
  @Test
  void dihedralDoesNotReturnTheWingsOfADivergingSpiral() {
    AeroplaneData slow = aeroplane("tarnlark-trainer-approach");
    FlightCondition condition = at(450, AirspeedKind.CALIBRATED, 36);
    assertThat(modes(slow, condition).spiral().orElseThrow().root()).isPositive();
    assertThat(bankAtTheEnd(slow, condition)).isGreaterThan(Math.toRadians(20));
  }
}
