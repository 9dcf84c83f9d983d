package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.Shipped;

/** What stalling sections do to a flight. */
class StalledRollTest {
  private static final double CHORD = 1.4;
  private static final double HALF = 4.9;
  private static final double MASS = 900;

  private static AeroplaneData aeroplane(OptionalDouble stall) {
    Section section = new Section(6, 0, stall, Section.USUAL_FALL, 0.01);
    Wing wing = new Wing(List.of(new WingPanel(0, HALF, CHORD, CHORD, 0, 0, 0, section)), 0, 0);
    Geometry geometry =
        new Geometry(
            wing,
            Optional.of(new AileronPlace(2.8, 4.7, 0.2)),
            Optional.empty(),
            Optional.empty(),
            Optional.empty());
    Aeroplane aeroplane =
        Aeroplane.builder("stalls", wing.span(), wing.area(), Inertia.ofRoll(1300))
            .mass(MASS)
            .ailerons(new Ailerons(0.35, 0.35, SurfaceDynamics.DIRECT))
            .geometry(geometry)
            .build();
    return new AeroplaneData(aeroplane, LateralDerivatives.ofGiven(Map.of(), ""));
  }

  /** A roll rate of 30 deg/s at the start, nobody at the stick, at a share of the largest lift. */
  private static RunResult flown(OptionalDouble stall, double lift) {
    FlightCondition any = Shipped.scenario("light-single-roll-entry").condition();
    AeroplaneData data = aeroplane(stall);
    double speed =
        Math.sqrt(
            2
                * MASS
                * FlightCondition.STANDARD_GRAVITY
                / (any.density() * data.aeroplane().wingArea() * lift));
    FlightCondition condition = any.withTrueAirspeed(speed);
    return ScenarioRun.execute(
        new Scenario(
            "Roll rate at the start",
            data,
            condition,
            PropellerMoments.NONE,
            SlipTreatment.HELD,
            new Start(PropellerMoments.NONE, new Disturbance(0, 0.52, 0)),
            PilotProgramme.of(List.of()),
            3,
            MeasureOptions.DEFAULT));
  }

  private static double lastRate(RunResult result) {
    return result.history().value(Channel.ROLL_RATE, result.history().size() - 1);
  }

  @Test
  void farFromTheStallTheRollDiesAwayAndNothingIsLost() {
    RunResult calm = flown(OptionalDouble.of(0.25), 0.5);
    assertThat(lastRate(calm)).isLessThan(0.01);
    assertThat(calm.measure("dampingLostTime").orElseThrow().value()).isEmpty();
    assertThat(calm.cautions()).noneMatch(words -> words.contains("stall"));
    RunResult unknown = flown(OptionalDouble.empty(), 0.5);
    assertThat(unknown.measure("dampingLostTime")).isEmpty();
    assertThat(lastRate(unknown)).isEqualTo(lastRate(calm));
  }

  /** Autorotation: common practice, a wing near its stall goes on once it rolls. */
  @Test
  void nearTheStallTheWingGoesOnByItself() {
    RunResult stalled = flown(OptionalDouble.of(0.25), 1.45);
    RunResult linear = flown(OptionalDouble.empty(), 1.45);
    assertThat(lastRate(linear)).isLessThan(0.1); // a fifth of it, and falling
    assertThat(lastRate(stalled)).isGreaterThan(0.3);
    assertThat(stalled.measure("dampingLostTime").orElseThrow().value()).isPresent();
    assertThat(stalled.cautions()).anyMatch(words -> words.contains("roll damping is lost"));
  }
}
