package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.quantity.Check;
import org.rolltrace.core.scenario.AeroplaneData;

/**
 * What is asked for of a condition; the aeroplane has the rest. What is not asked for is that of
 * the condition for which its given derivatives hold. Where it states none, it is level flight at
 * sea level on a standard day, at the speed for a lift coefficient of {@value #USUAL_LIFT}. A
 * height alone keeps the equivalent airspeed, and so the lift coefficient.
 *
 * @param pressureAltitude m, on a standard day
 * @param speed the airspeed
 * @param loadFactor n
 */
public record AskedCondition(
    OptionalDouble pressureAltitude, Optional<Speed> speed, OptionalDouble loadFactor) {

  /** The lift coefficient of a fast cruise (common practice). */
  public static final double USUAL_LIFT = 0.4;

  /** Nothing: the condition that the aeroplane brings with it. */
  public static final AskedCondition NOTHING =
      new AskedCondition(OptionalDouble.empty(), Optional.empty(), OptionalDouble.empty());

  private static final String OF_THE_SET = "the condition for which the given derivatives hold";

  /** A speed at which any air that can be flown in can be asked about. */
  private static final double ANY_SPEED = 1;

  /**
   * An airspeed.
   *
   * @param kind what it is measured by
   * @param value m/s, above 0
   */
  public record Speed(AirspeedKind kind, double value) {
    public Speed {
      Check.positive("airspeed, m/s,", value);
    }
  }

  /**
   * Finds the condition of an aeroplane.
   *
   * @param data the aeroplane, before any estimate
   * @return the condition; none when nothing is known to find a speed from
   * @throws IllegalArgumentException when a value is outside its range
   */
  public ChosenCondition of(AeroplaneData data) {
    Optional<FlightCondition> held = data.derivatives().validAt();
    if (equals(NOTHING) && held.isPresent()) {
      return new ChosenCondition(held, OF_THE_SET);
    }
    FlightCondition air = air(held);
    List<String> rest = new ArrayList<>();
    FlightCondition chosen;
    if (speed.isPresent()) {
      chosen = air.withAirspeed(speed.get().kind(), speed.get().value());
      if (pressureAltitude.isEmpty()) {
        rest.add(held.isPresent() ? "the height is that of " + OF_THE_SET : "at sea level");
      }
    } else if (held.isPresent()) {
      chosen =
          air.withAirspeed(AirspeedKind.EQUIVALENT, held.get().equivalentAirspeed())
              .withFlightPathAngle(held.get().flightPathAngle())
              .withLoadFactor(held.get().loadFactor());
      rest.add("the equivalent airspeed is that of " + OF_THE_SET);
    } else if (data.aeroplane().mass().isPresent()) {
      chosen = air.withAirspeed(AirspeedKind.EQUIVALENT, usualSpeed(data, air));
      rest.add(
          "the speed is that for a lift coefficient of "
              + USUAL_LIFT
              + " at load factor 1"
              + (pressureAltitude.isEmpty() ? " at sea level" : ""));
    } else {
      return new ChosenCondition(
          Optional.empty(),
          "none: the aeroplane file gives neither a mass nor the condition of its derivatives; ask"
              + " for a speed");
    }
    if (loadFactor.isPresent()) {
      chosen = chosen.withLoadFactor(loadFactor.getAsDouble());
    }
    String begin = equals(NOTHING) ? "none is asked for" : "as asked for";
    rest.add(0, begin);
    return new ChosenCondition(Optional.of(chosen), String.join("; ", rest));
  }

  private FlightCondition air(Optional<FlightCondition> held) {
    if (pressureAltitude.isPresent()) {
      return FlightCondition.of(pressureAltitude.getAsDouble(), 0, AirspeedKind.TRUE, ANY_SPEED);
    }
    return held.map(
            there ->
                FlightCondition.ofDensity(
                    there.pressureAltitude(), there.density(), AirspeedKind.TRUE, ANY_SPEED))
        .orElseGet(() -> FlightCondition.of(0, 0, AirspeedKind.TRUE, ANY_SPEED));
  }

  private static double usualSpeed(AeroplaneData data, FlightCondition air) {
    FlightCondition seaLevel =
        air.withAirspeed(AirspeedKind.EQUIVALENT, ANY_SPEED).withLoadFactor(1);
    double lift = data.liftCoefficient(seaLevel).orElseThrow();
    double speed = ANY_SPEED * Math.sqrt(lift / USUAL_LIFT);
    try {
      seaLevel.withAirspeed(AirspeedKind.EQUIVALENT, speed);
    } catch (IllegalArgumentException tooFast) {
      throw new IllegalArgumentException(
          "no speed is asked for, and for a lift coefficient of "
              + USUAL_LIFT
              + " mass and wing area make it "
              + speed
              + " m/s: "
              + tooFast.getMessage()
              + "; ask for a speed",
          tooFast);
    }
    return speed;
  }
}
