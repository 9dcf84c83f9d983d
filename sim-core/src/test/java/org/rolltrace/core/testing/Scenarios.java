package org.rolltrace.core.testing;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;

/** Short ways to the scenarios that tests fly. */
public final class Scenarios {
  /** Aileron angle at full stick of {@link #oneDegree}, rad. */
  public static final double FULL_AILERON = Math.toRadians(20);

  private Scenarios() {}

  /** A scenario at rest in trim, without propeller. */
  public static Scenario of(
      AeroplaneData data,
      FlightCondition condition,
      SlipTreatment slip,
      double duration,
      PilotInput... inputs) {
    return of(data, condition, slip, Disturbance.NONE, PropellerMoments.NONE, duration, inputs);
  }

  /** A scenario trimmed with the propeller moment it flies with. */
  public static Scenario of(
      AeroplaneData data,
      FlightCondition condition,
      SlipTreatment slip,
      Disturbance disturbance,
      PropellerMoments propeller,
      double duration,
      PilotInput... inputs) {
    return new Scenario(
        "test",
        data,
        condition,
        propeller,
        slip,
        new Start(propeller, disturbance),
        PilotProgramme.of(List.of(inputs)),
        duration,
        MeasureOptions.DEFAULT);
  }

  public static PilotInput stick(InputShape shape) {
    return new PilotInput(Control.STICK, shape);
  }

  public static PilotInput pedal(InputShape shape) {
    return new PilotInput(Control.PEDAL, shape);
  }

  /**
   * An aeroplane with nothing but damping and ailerons, whose roll equation at {@link #seaLevel}(50
   * m/s) is ṗ = −p/T + K δa with the constants given.
   */
  public static AeroplaneData oneDegree(double timeConstant, double perAileron) {
    return oneDegree(timeConstant, perAileron, SurfaceDynamics.DIRECT);
  }

  /** The same with ailerons that do not follow at once. */
  public static AeroplaneData oneDegree(
      double timeConstant, double perAileron, SurfaceDynamics dynamics) {
    double span = 10;
    double area = 15;
    double inertia = 1500;
    FlightCondition condition = seaLevel(50);
    double moment = condition.dynamicPressure() * area * span;
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, -inertia / timeConstant / moment / (span / (2 * 50)));
    values.put(Coefficient.CL_DA, perAileron * inertia / moment);
    return new AeroplaneData(
        Aeroplane.builder("one degree", span, area, Inertia.ofRoll(inertia))
            .ailerons(new Ailerons(FULL_AILERON, FULL_AILERON, dynamics))
            .build(),
        LateralDerivatives.ofGiven(values, "test"));
  }

  /** Sea level, standard day. */
  public static FlightCondition seaLevel(double trueAirspeed) {
    return FlightCondition.of(0, 0, AirspeedKind.TRUE, trueAirspeed);
  }
}
