package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.rolltrace.core.testing.Scenarios.stick;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.Limits;
import org.rolltrace.core.aeroplane.Position;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;
import org.rolltrace.core.testing.Scenarios;

/** Each caution appears when its limit is met, and not before. */
class CautionsTest {
  private static final FlightCondition AT_60 = condition(60);
  private Limits limits = Limits.NONE;
  private FlightCondition flownAt = AT_60;
  private SlipTreatment slip = SlipTreatment.FREE;
  private Disturbance disturbance = Disturbance.NONE;
  private PropellerMoments propeller = PropellerMoments.NONE;
  private SurfaceDynamics dynamics = SurfaceDynamics.DIRECT;
  private double duration = 3;
  private final Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);

  CautionsTest() {
    values.put(Coefficient.CY_BETA, -0.5);
    values.put(Coefficient.CL_BETA, -0.08);
    values.put(Coefficient.CL_P, -0.5);
    values.put(Coefficient.CL_R, 0.1);
    values.put(Coefficient.CL_DA, 0.12);
    values.put(Coefficient.CN_BETA, 0.08);
    values.put(Coefficient.CN_R, -0.1);
    values.put(Coefficient.CN_DA, -0.005);
    values.put(Coefficient.CN_DR, -0.07);
  }

  private static FlightCondition condition(double speed) {
    return FlightCondition.of(0, 0, AirspeedKind.CALIBRATED, speed);
  }

  private List<String> cautions(double stick) {
    return cautions(stick(new StepInput(0.5, stick, 0.1)));
  }

  private List<String> cautions(PilotInput... inputs) {
    Aeroplane aeroplane =
        Aeroplane.builder("test", 10, 15, Inertia.of(1500, 2500, 0))
            .mass(900)
            .ailerons(new Ailerons(0.35, 0.3, dynamics))
            .rudder(Rudder.of(0.4, 0.4))
            .limits(limits)
            .build();
    AeroplaneData data =
        new AeroplaneData(aeroplane, LateralDerivatives.ofGiven(values, "test").validAt(AT_60));
    return ScenarioRun.execute(
            Scenarios.of(data, flownAt, slip, disturbance, propeller, duration, inputs))
        .cautions();
  }

  private static Limits limits(double va, double vne, double rate, double bank) {
    return new Limits(
        OptionalDouble.of(va),
        OptionalDouble.of(vne),
        OptionalDouble.of(2.5),
        OptionalDouble.of(rate),
        OptionalDouble.of(bank));
  }

  @Test
  void anOrdinarySmallInputHasNone() {
    limits = limits(70, 90, 2, 1.5);
    assertThat(cautions(0.2)).isEmpty();
  }

  @Test
  void fullStickAboveTheManoeuvringSpeed() {
    limits = limits(55, 90, 9, 9);
    assertThat(cautions(1.0))
        .anyMatch(
            c -> c.startsWith("full stick at 116.6 kt CAS, above the manoeuvring speed of 106.9"));
    assertThat(cautions(0.9)).noneMatch(c -> c.startsWith("full stick"));
  }

  @Test
  void aboveTheNeverExceedSpeedMoreThanAThirdOfTheStick() {
    limits = limits(40, 55, 9, 9);
    assertThat(cautions(0.3))
        .anyMatch(c -> c.contains("is above the never-exceed speed of 106.9 kt"))
        .noneMatch(c -> c.contains("more than a third"));
    assertThat(cautions(0.4)).anyMatch(c -> c.contains("more than a third"));
  }

  @Test
  void ownLimitsOfRateBankAndLoadFactor() {
    limits = limits(70, 90, Math.toRadians(20), Math.toRadians(30));
    flownAt = AT_60.withLoadFactor(2.6);
    assertThat(cautions(0.8))
        .anyMatch(c -> c.startsWith("roll rate of"))
        .anyMatch(c -> c.startsWith("bank of"))
        .anyMatch(c -> c.startsWith("load factor 2.60 is above the rolling limit of 2.50"));
  }

  @Test
  void stopsAndRateLimits() {
    dynamics = new SurfaceDynamics(0.5, 0);
    assertThat(cautions(1.0))
        .anyMatch(c -> c.equals("the stick is on its stop from 0.60 s"))
        .anyMatch(
            c -> c.equals("the surface moved by the stick is at its largest rate from 0.50 s"));
  }

  @Test
  void largeSlip() {
    disturbance = new Disturbance(0, 0, Math.toRadians(16));
    assertThat(cautions()).anyMatch(c -> c.startsWith("sideslip reaches 16.0 deg"));
    disturbance = new Disturbance(0, 0, Math.toRadians(14));
    assertThat(cautions()).noneMatch(c -> c.startsWith("sideslip reaches"));
  }

  @Test
  void machNumberAndDerivativesFlownElsewhere() {
    flownAt = condition(245);
    assertThat(cautions())
        .anyMatch(c -> c.startsWith("Mach 0.720 is above 0.7"))
        .anyMatch(c -> c.contains("the lift coefficient is 0.0600 times"))
        .anyMatch(c -> c.contains("Mach 0.72 instead of 0.18"));
  }

  @Test
  void constantSpeedAssumedTooLong() {
    disturbance = new Disturbance(Math.toRadians(61), 0, 0);
    duration = 12;
    assertThat(cautions())
        .anyMatch(
            c ->
                c.startsWith("speed and load factor are held constant, although the bank reaches")
                    && c.endsWith("and the manoeuvre lasts 12 s"));
  }

  @Test
  void rollCoupling() {
    values.put(Coefficient.CN_BETA, 0.01);
    values.put(Coefficient.CL_DA, 0.3);
    assertThat(cautions(1.0)).anyMatch(c -> c.contains("above the natural frequency in yaw"));
  }

  @Test
  void absentDerivativesOfSlip() {
    values.remove(Coefficient.CN_BETA);
    values.remove(Coefficient.CN_R);
    assertThat(cautions(0.2)).anyMatch(c -> c.startsWith("absent and taken as 0: Cn_beta, Cn_r;"));
  }

  @Test
  void trimBeyondTheStop() {
    propeller = new PropellerMoments(-25_000);
    slip = SlipTreatment.HELD;
    assertThat(cautions())
        .anyMatch(
            c -> c.startsWith("wings-level trim: not enough aileron:") && c.contains("% needed"));
  }

  @Test
  void slipThatThePedalsCannotHold() {
    slip = SlipTreatment.HELD;
    values.put(Coefficient.CN_DA, -0.3);
    assertThat(cautions(1.0))
        .anyMatch(c -> c.startsWith("holding the slip needs") && c.endsWith("the pedal travel"));
  }

  @Test
  void derivativesOfUnknownCondition() {
    AeroplaneData data =
        new AeroplaneData(
            Scenarios.oneDegree(0.4, 8).aeroplane(), Scenarios.oneDegree(0.4, 8).derivatives());
    assertThat(ScenarioRun.execute(Scenarios.of(data, AT_60, SlipTreatment.HELD, 1)).cautions())
        .anyMatch(c -> c.contains("does not say at which condition"));
  }

  @Test
  void derivativesWithoutASourceCarryACaution() {
    AeroplaneData known = Scenarios.oneDegree(0.4, 8);
    String caution = "the aeroplane file does not say where its derivatives are from";
    assertThat(cautionsOf(known)).doesNotContain(caution);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, known.derivatives().value(Coefficient.CL_P));
    values.put(Coefficient.CL_DA, known.derivatives().value(Coefficient.CL_DA));
    assertThat(
            cautionsOf(
                new AeroplaneData(known.aeroplane(), LateralDerivatives.ofGiven(values, ""))))
        .contains(caution);
  }

  private static List<String> cautionsOf(AeroplaneData data) {
    return ScenarioRun.execute(Scenarios.of(data, Scenarios.seaLevel(50), SlipTreatment.HELD, 1))
        .cautions();
  }

  @Test
  void wrongSignsOfAileronAndDamping() {
    values.put(Coefficient.CL_DA, -0.12);
    assertThat(cautions(0.2)).anyMatch(c -> c.startsWith("right stick does not roll right"));
    values.put(Coefficient.CL_P, 0.01);
    assertThat(cautions()).anyMatch(c -> c.startsWith("the roll is not damped"));
  }

  @Test
  void slipThatDoesNotSettle() {
    slip = SlipTreatment.SETTLED;
    values.put(Coefficient.CN_BETA, -0.02);
    assertThat(cautions(0.2)).anyMatch(c -> c.startsWith("Cn_beta is not positive"));
  }

  private static List<String> withPropeller(PropellerSetting setting, Propeller propeller) {
    AeroplaneData bare = Scenarios.oneDegree(0.4, 8);
    AeroplaneData data =
        new AeroplaneData(
            Aeroplane.builder("test", 10, 15, bare.aeroplane().inertia())
                .propeller(propeller)
                .build(),
            bare.derivatives());
    return ScenarioRun.execute(
            new Scenario(
                "test",
                data,
                Scenarios.seaLevel(50),
                setting,
                SlipTreatment.HELD,
                new Start(setting, Disturbance.NONE),
                PilotProgramme.of(List.of()),
                1,
                MeasureOptions.DEFAULT))
        .cautions();
  }

  private static Propeller.Builder nose() {
    return Propeller.builder("nose", Rotation.CLOCKWISE, Engine.of(75_000)).speed(251);
  }

  @Test
  void aPropellerWithoutPowerIsLeftOut() {
    String caution =
        "the aeroplane has a propeller, but the condition gives no power: what power does is left"
            + " out";
    assertThat(withPropeller(PropellerMoments.NONE, nose().build())).contains(caution);
    assertThat(withPropeller(new PropellerMoments(-9), nose().build())).doesNotContain(caution);
    assertThat(withPropeller(PowerSetting.of(0), nose().build()))
        .doesNotContain(caution)
        .noneMatch(c -> c.startsWith("of what power does"));
    assertThat(withPropeller(PowerSetting.of(75_000), nose().build()))
        .doesNotContain(caution)
        .anyMatch(c -> c.startsWith("of what power does"));
  }

  @Test
  void thrustOffTheCentreLineWithoutEfficiency() {
    Position right = new Position(1, 2, 0);
    String caution = "the propeller nose is off the centre line and gives no efficiency";
    assertThat(withPropeller(PowerSetting.of(1000), nose().position(right).build()))
        .anyMatch(c -> c.startsWith(caution));
    assertThat(withPropeller(PowerSetting.of(1000), nose().position(right).efficiency(0.8).build()))
        .noneMatch(c -> c.startsWith(caution));
    assertThat(withPropeller(PowerSetting.of(1000), nose().build()))
        .noneMatch(c -> c.startsWith(caution));
  }

  /** 2.6 m at 251 rad/s and 50 m/s: √(326.3² + 50²)/340.3 = 0.970; 2.8 m: 1.043. */
  @Test
  void propellerTipsBeyondTheSpeedOfSound() {
    assertThat(withPropeller(PowerSetting.of(1000), nose().diameter(2.6).build()))
        .noneMatch(c -> c.startsWith("the tips"));
    assertThat(withPropeller(PowerSetting.of(1000), nose().diameter(2.8).build()))
        .contains(
            "the tips of the propeller nose move at Mach 1.04; is its speed that of the engine,"
                + " before the gear?");
  }

  @Test
  void anInputAfterTheEnd() {
    assertThat(cautions(stick(new StepInput(5, 0.2, 0.1))))
        .anyMatch(c -> c.equals("the stick input at 5.00 s starts after the end of the manoeuvre"));
  }
}
