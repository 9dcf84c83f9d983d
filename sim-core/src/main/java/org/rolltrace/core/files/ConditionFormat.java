package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.atmosphere.StandardAtmosphere;
import org.rolltrace.core.quantity.Dimension;

/** The condition a scenario flies in, and the one for which derivatives hold. */
final class ConditionFormat {
  private static final String ALTITUDE = "pressureAltitude";
  private static final String OFFSET = "temperatureOffset";
  private static final String DENSITY = "density";
  private static final String LOAD_FACTOR = "loadFactor";
  private static final String PATH_ANGLE = "flightPathAngle";

  private static final Range PATH =
      Range.fromTo(
          Math.nextUp(-Math.PI / 2), Math.nextDown(Math.PI / 2), "inside 90 deg either way");

  private static final List<String> SPEEDS =
      List.of("trueAirspeed", "equivalentAirspeed", "calibratedAirspeed");

  /** A speed at which any air that can be flown in can be asked about. */
  private static final double ANY_SPEED = 1;

  static final Keys VALID_AT =
      Keys.of("the condition of derivatives")
          .required(ALTITUDE)
          .optional(OFFSET, DENSITY)
          .optional(SPEEDS.get(0), SPEEDS.get(1), SPEEDS.get(2))
          .optional(LOAD_FACTOR, PATH_ANGLE);

  static final Keys CONDITION = VALID_AT.named("a condition").optional(SettingFormat.KEYS);

  private ConditionFormat() {}

  static Optional<FlightCondition> read(ObjectCursor in) {
    double altitude = in.quantity(ALTITUDE, Dimension.LENGTH, Range.ANY);
    double offset = in.quantity(OFFSET, Dimension.TEMPERATURE_DIFFERENCE, Range.ANY, 0);
    double density = in.quantity(DENSITY, Dimension.DENSITY, Range.ABOVE_ZERO, 0);
    if (in.has(OFFSET) && in.has(DENSITY)) {
      in.refuse(
          DENSITY, "density and temperatureOffset stand together; keep one, it fixes the other");
    }
    String speedKey = speedKey(in);
    double speed =
        speedKey.isEmpty() ? Double.NaN : in.quantity(speedKey, Dimension.SPEED, Range.ABOVE_ZERO);
    double loadFactor = in.number(LOAD_FACTOR, Range.ANY, 1);
    double pathAngle = in.quantity(PATH_ANGLE, Dimension.ANGLE, PATH, 0);

    if (Double.isNaN(altitude)) {
      return Optional.empty();
    }
    String refused = ALTITUDE; // the value that the next step brings in
    try {
      StandardAtmosphere.pressure(altitude);
      refused = in.has(DENSITY) ? DENSITY : OFFSET;
      if (Double.isNaN(offset) || Double.isNaN(density)) {
        return Optional.empty();
      }
      FlightCondition condition =
          in.has(DENSITY)
              ? FlightCondition.ofDensity(altitude, density, AirspeedKind.TRUE, ANY_SPEED)
              : FlightCondition.of(altitude, offset, AirspeedKind.TRUE, ANY_SPEED);
      refused = PATH_ANGLE;
      if (in.has(PATH_ANGLE) && !Double.isNaN(pathAngle)) {
        condition = condition.withFlightPathAngle(pathAngle);
      }
      refused = speedKey;
      if (!Double.isNaN(speed)) {
        condition = condition.withAirspeed(kind(speedKey), speed);
      }
      if (in.has(LOAD_FACTOR) && !Double.isNaN(loadFactor)) {
        condition = condition.withLoadFactor(loadFactor);
      }
      return in.isSound() ? Optional.of(condition) : Optional.empty();
    } catch (IllegalArgumentException e) {
      in.refuse(refused, e);
      return Optional.empty();
    }
  }

  /** The one speed that is given, or nothing and a fault. */
  private static String speedKey(ObjectCursor in) {
    List<String> given = new ArrayList<>();
    for (String key : SPEEDS) {
      if (in.has(key)) {
        given.add(key);
      }
    }
    if (given.size() == 1) {
      return given.get(0);
    }
    if (given.isEmpty()) {
      in.faults()
          .add(
              in.place(),
              "no speed is given; expected exactly one of " + String.join(", ", SPEEDS));
    } else {
      in.refuse(
          given.get(1),
          String.join(" and ", given) + " stand together; expected exactly one speed");
    }
    return "";
  }

  private static AirspeedKind kind(String speedKey) {
    return switch (SPEEDS.indexOf(speedKey)) {
      case 0 -> AirspeedKind.TRUE;
      case 1 -> AirspeedKind.EQUIVALENT;
      default -> AirspeedKind.CALIBRATED;
    };
  }
}
