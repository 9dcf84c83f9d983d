package org.rolltrace.core.run;

import java.util.OptionalDouble;

/**
 * A number that goes with a set of derivatives.
 *
 * @param kind which one
 * @param value in its unit; empty when it cannot be had
 * @param reason why not; else empty
 */
public record DerivedFigure(Kind kind, OptionalDouble value, String reason) {

  /** Which number it is. */
  public enum Kind {
    /** Span. */
    SPAN("span", "Span", "m", "b"),
    /** Wing area. */
    WING_AREA("wingArea", "Wing area", "m2", "S"),
    /** Aspect ratio. */
    ASPECT_RATIO("aspectRatio", "Aspect ratio", "1", "b²/S"),
    /** Mass. */
    MASS("mass", "Mass", "kg", "m"),
    /** Roll inertia. */
    ROLL_INERTIA("inertiaRoll", "Inertia in roll", "kg m2", "Ixx with a lateral imbalance"),
    /** Yaw inertia. */
    YAW_INERTIA("inertiaYaw", "Inertia in yaw", "kg m2", "Izz with a lateral imbalance"),
    /** Product of inertia. */
    PRODUCT("inertiaProduct", "Product of inertia", "kg m2", "Ixz"),
    /** Lift coefficient. */
    LIFT_COEFFICIENT("liftCoefficient", "Lift coefficient", "1", "n m g/(q̄ S)"),
    /** Lift slope. */
    LIFT_SLOPE("liftSlope", "Lift slope of the wing", "1/rad", "CL_α, by the theory of the wing"),
    /** Angle of attack. */
    ANGLE_OF_ATTACK(
        "angleOfAttack", "Angle of attack", "rad", "of the x axis of the body, for that lift"),
    /** Time constant of the roll mode. */
    ROLL_TIME_CONSTANT(
        "rollModeTimeConstant",
        "Roll-mode time constant",
        "s",
        "of the roll alone, −Ixx 2V/(q̄ S b² Cl_p)"),
    /** Helix angle at full stick. */
    FULL_HELIX_ANGLE(
        "helixAngleFullStick",
        "Helix angle at full stick",
        "rad",
        "steady pb/2V of the roll alone, −Cl_da δa/Cl_p, δa half the travel up and down"),
    /** Roll rate at full stick. */
    FULL_ROLL_RATE(
        "rollRateFullStick", "Roll rate at full stick", "rad/s", "steady, of the roll alone"),
    /** Spiral. */
    SPIRAL_ROOT(
        "spiralRoot",
        "Spiral root",
        "1/s",
        "of the free equations; negative when it comes back by itself"),
    /** Frequency of the dutch roll. */
    DUTCH_ROLL_FREQUENCY(
        "dutchRollFrequency", "Dutch-roll frequency", "rad/s", "natural one of the free equations"),
    /** Damping of the dutch roll. */
    DUTCH_ROLL_DAMPING(
        "dutchRollDampingRatio", "Dutch-roll damping ratio", "1", "of the free equations");

    private final String label;
    private final String title;
    private final String unit;
    private final String definition;

    Kind(String label, String title, String unit, String definition) {
      this.label = label;
      this.title = title;
      this.unit = unit;
      this.definition = definition;
    }

    /**
     * The name in files.
     *
     * @return such as {@code rollModeTimeConstant}
     */
    public String label() {
      return label;
    }

    /**
     * What it is called in print.
     *
     * @return the title
     */
    public String title() {
      return title;
    }

    /**
     * The unit of its value.
     *
     * @return an SI unit, or "1"
     */
    public String unit() {
      return unit;
    }

    /**
     * What it is.
     *
     * @return in words and symbols
     */
    public String definition() {
      return definition;
    }
  }

  static DerivedFigure of(Kind kind, double value) {
    return new DerivedFigure(kind, OptionalDouble.of(value), "");
  }

  static DerivedFigure of(Kind kind, OptionalDouble value, String otherwise) {
    return value.isPresent() ? of(kind, value.getAsDouble()) : missing(kind, otherwise);
  }

  static DerivedFigure missing(Kind kind, String reason) {
    return new DerivedFigure(kind, OptionalDouble.empty(), reason);
  }
}
