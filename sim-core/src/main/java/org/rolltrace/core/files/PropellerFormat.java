package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Position;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.quantity.Dimension;

/** The propellers of an aeroplane, each with its engine. */
final class PropellerFormat {
  static final int MOST = 20;

  private static final String NAME = "name";
  private static final String ROTATION = "rotation";
  private static final String SPEED = "speed";
  private static final String PITCH = "pitch";
  private static final String SPEED_WITHOUT_POWER = "speedWithoutPower";
  private static final String INERTIA = "rotatingInertia";
  private static final String ENGINE = "engine";
  private static final String ENGINE_ROTATION = "engineRotation";
  private static final String ENGINE_LAG = "engineLag";
  private static final String POSITION = "position";

  private static final String FIXED = "fixed";

  private static final Range PART = Range.fromTo(0, 1, "a part from 0 to 1");
  private static final Range PART_ABOVE_ZERO = Range.aboveZeroTo(1, "a part above 0 and at most 1");
  private static final Range PART_INSIDE =
      Range.aboveZeroTo(Math.nextDown(1), "a part above 0 and below 1");

  static final List<String> ROTATIONS = words(Rotation.values());
  static final List<String> ENGINE_ROTATIONS = words(Rotation.CLOCKWISE, Rotation.ANTICLOCKWISE);
  static final List<String> PITCHES = List.of("constant-speed", FIXED);

  static final Keys PROPELLER =
      Keys.of("a propeller")
          .required(NAME, ROTATION, "ratedPower")
          .optional(SPEED, PITCH, SPEED_WITHOUT_POWER, "gearRatio", INERTIA, ENGINE_ROTATION)
          .optional(ENGINE_LAG, POSITION, "diameter", "efficiency", "straightened");

  static final Keys ROTATING_INERTIA =
      Keys.of("the rotating inertia").optional("propeller", ENGINE);
  static final Keys PLACE = Keys.of("a position").optional("x", "y", "z");

  private PropellerFormat() {}

  private static List<String> words(Rotation... rotations) {
    List<String> words = new ArrayList<>();
    for (Rotation rotation : rotations) {
      words.add(rotation.word());
    }
    return words;
  }

  /** The propellers; where one was refused it is not among them. */
  static List<Propeller> read(ObjectCursor aeroplane, String key) {
    List<Propeller> propellers = new ArrayList<>();
    for (JsonValue element : aeroplane.list(key, MOST)) {
      if (!(element instanceof JsonValue.ObjectValue object)) {
        aeroplane.addWrongType(element, "a propeller in braces { }");
        continue;
      }
      ObjectCursor in = ObjectCursor.of(object, PROPELLER, aeroplane.faults());
      Optional<Propeller> propeller = propeller(in);
      if (propeller.isPresent() && isApart(in, propeller.get(), propellers)) {
        propellers.add(propeller.get());
      }
    }
    return propellers;
  }

  private static boolean isApart(ObjectCursor in, Propeller propeller, List<Propeller> others) {
    for (Propeller other : others) {
      if (other.name().equals(propeller.name())) {
        in.refuse(
            NAME,
            "another propeller is called "
                + Shown.text(propeller.name())
                + " already; expected a name of its own for each");
        return false;
      }
      if (other.position().equals(propeller.position())) {
        in.refuse(
            POSITION,
            "it is at the same place as the propeller "
                + Shown.text(other.name())
                + "; expected a position of its own for each");
        return false;
      }
    }
    return true;
  }

  private static Optional<Propeller> propeller(ObjectCursor in) {
    Optional<String> name = in.text(NAME, AeroplaneFormat.LONGEST_NAME);
    Optional<Rotation> rotation = rotation(in, ROTATION, ROTATIONS);
    double ratedPower = in.quantity("ratedPower", Dimension.POWER, Range.ABOVE_ZERO);
    OptionalDouble speed = in.optionalQuantity(SPEED, Dimension.ANGULAR_RATE, Range.ABOVE_ZERO);
    double gearRatio = in.number("gearRatio", Range.ABOVE_ZERO, 1);
    double lag = in.quantity(ENGINE_LAG, Dimension.TIME, Range.ZERO_OR_MORE, 0);
    OptionalDouble speedWithoutPower = speedWithoutPower(in, lag);
    double[] inertia = inertia(in);
    Optional<Rotation> engineRotation = engineRotation(in, rotation, inertia[1]);
    Optional<Position> position = position(in);
    double straightened = in.number("straightened", PART, 0);
    OptionalDouble efficiency = in.optionalNumber("efficiency", PART_ABOVE_ZERO);
    OptionalDouble diameter = in.optionalQuantity("diameter", Dimension.LENGTH, Range.ABOVE_ZERO);
    if (!in.isSound()) {
      return Optional.empty();
    }
    Engine engine;
    try {
      engine = new Engine(ratedPower, lag, gearRatio, inertia[1], engineRotation.orElseThrow());
    } catch (IllegalArgumentException e) {
      in.refuse(ENGINE_LAG, e); // each of the others by itself is in range
      return Optional.empty();
    }
    return Optional.of(
        new Propeller(
            name.orElseThrow(),
            rotation.orElseThrow(),
            engine,
            position.orElseThrow(),
            speed,
            speedWithoutPower,
            inertia[0],
            straightened,
            efficiency,
            diameter));
  }

  private static Optional<Rotation> rotation(ObjectCursor in, String key, List<String> words) {
    Optional<String> word = in.word(key, words);
    for (Rotation rotation : Rotation.values()) {
      if (word.isPresent() && rotation.word().equals(word.get())) {
        return Optional.of(rotation);
      }
    }
    return Optional.empty();
  }

  /** That of the propeller unless it is given. */
  private static Optional<Rotation> engineRotation(
      ObjectCursor in, Optional<Rotation> propeller, double inertia) {
    if (in.has(ENGINE_ROTATION)) {
      return rotation(in, ENGINE_ROTATION, ENGINE_ROTATIONS);
    }
    if (propeller.isPresent() && propeller.get() == Rotation.CONTRA_ROTATING && inertia > 0) {
      in.addMissing(
          ENGINE_ROTATION,
          "the engine has an inertia, and the halves of its propeller do not say which way it"
              + " turns");
    }
    return propeller;
  }

  private static OptionalDouble speedWithoutPower(ObjectCursor in, double lag) {
    Optional<String> pitch = in.word(PITCH, PITCHES);
    OptionalDouble part = in.optionalNumber(SPEED_WITHOUT_POWER, PART_INSIDE);
    boolean fixed = pitch.isPresent() && pitch.get().equals(FIXED);
    if (fixed && !in.has(SPEED_WITHOUT_POWER)) {
      in.addMissing(
          SPEED_WITHOUT_POWER,
          "with fixed pitch it says how fast the air turns the propeller, as a part of its speed at"
              + " rated power");
    }
    if (fixed && lag == 0) {
      String reason = "with fixed pitch the speed follows the power, and without lag it would jump";
      if (in.has(ENGINE_LAG)) {
        in.refuse(ENGINE_LAG, reason + "; expected a time above 0");
      } else {
        in.addMissing(ENGINE_LAG, reason);
      }
    }
    if (!fixed && in.has(SPEED_WITHOUT_POWER) && (pitch.isPresent() || !in.has(PITCH))) {
      in.refuse(
          SPEED_WITHOUT_POWER,
          "a propeller of constant speed has none; write \"pitch\": \"fixed\", or leave it out");
    }
    return part;
  }

  /** Of the propeller, and of what turns with the engine. */
  private static double[] inertia(ObjectCursor propeller) {
    Optional<ObjectCursor> object = propeller.object(INERTIA, ROTATING_INERTIA);
    if (object.isEmpty()) {
      return new double[2];
    }
    ObjectCursor in = object.get();
    return new double[] {
      in.quantity("propeller", Dimension.INERTIA, Range.ZERO_OR_MORE, 0),
      in.quantity(ENGINE, Dimension.INERTIA, Range.ZERO_OR_MORE, 0)
    };
  }

  private static Optional<Position> position(ObjectCursor propeller) {
    Optional<ObjectCursor> object = propeller.object(POSITION, PLACE);
    if (object.isEmpty()) {
      return Optional.of(Position.ORIGIN);
    }
    ObjectCursor in = object.get();
    double x = in.quantity("x", Dimension.LENGTH, Range.ANY, 0);
    double y = in.quantity("y", Dimension.LENGTH, Range.ANY, 0);
    double z = in.quantity("z", Dimension.LENGTH, Range.ANY, 0);
    return in.isSound() ? Optional.of(new Position(x, y, z)) : Optional.empty();
  }
}
