package org.rolltrace.core.aeroplane;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * A propeller and the engine behind it.
 *
 * @param name what it is called; no other propeller of the aeroplane has the same name
 * @param rotation the way it turns
 * @param engine what drives it
 * @param position the middle of its disc, from the centre of gravity
 * @param speed Ω, of the propeller, not of the engine, rad/s, above 0: the one it is governed to,
 *     or with fixed pitch that at rated power; empty when the condition has to give it
 * @param speedWithoutPower of a propeller of fixed pitch the part of its speed at rated power with
 *     which the air turns it when the engine gives none, above 0 and below 1; empty for one that is
 *     governed to a constant speed. The power then grows with the cube of the speed
 * @param inertia J of the propeller about its axis, kg m², 0 or more
 * @param straightened κ, the part of the slipstream's rotation that wing and fuselage take out
 *     again, from 0 to 1. 0 unless given: all of the torque rolls the aeroplane
 * @param efficiency η, thrust times true airspeed over power, above 0 and up to 1; empty when not
 *     known, which leaves the thrust out
 * @param diameter m, above 0; empty when not known
 */
public record Propeller(
    String name,
    Rotation rotation,
    Engine engine,
    Position position,
    OptionalDouble speed,
    OptionalDouble speedWithoutPower,
    double inertia,
    double straightened,
    OptionalDouble efficiency,
    OptionalDouble diameter) {

  public Propeller {
    if (name.isBlank()) {
      throw new IllegalArgumentException("propeller name is blank; expected some text");
    }
    speed.ifPresent(value -> Check.positive("propeller speed, rad/s,", value));
    if (speedWithoutPower.isPresent()) {
      checkFixedPitch(speedWithoutPower.getAsDouble(), engine);
    }
    Check.notNegative("inertia of the propeller, kg m2,", inertia);
    Check.inRange("straightened part of the slipstream's rotation", straightened, 0, 1);
    efficiency.ifPresent(
        value -> {
          Check.positive("propeller efficiency", value);
          Check.inRange("propeller efficiency", value, 0, 1);
        });
    diameter.ifPresent(value -> Check.positive("propeller diameter, m,", value));
  }

  private static void checkFixedPitch(double share, Engine engine) {
    if (!(share > 0 && share < 1)) {
      throw new IllegalArgumentException(
          "speed without power is "
              + share
              + " of that at rated power; expected above 0 and below 1");
    }
    if (engine.lag() == 0) {
      throw new IllegalArgumentException(
          "engine lag is 0 s; expected some with fixed pitch, where a jump of the power would be a"
              + " jump of the speed");
    }
  }

  /**
   * Whether its pitch is fixed, so that its speed follows the power.
   *
   * @return false when it is governed to a constant speed
   */
  public boolean isFixedPitch() {
    return speedWithoutPower.isPresent();
  }

  /**
   * The angular momentum of all that turns with it, for each unit of its speed.
   *
   * @return Σ s J ω/Ω, kg m², positive clockwise seen from behind
   */
  public double momentumPerSpeed() {
    return rotation.sense() * inertia + engine.momentumPerSpeed();
  }

  /**
   * Starts a propeller of constant speed at the centre of gravity.
   *
   * @param name what it is called
   * @param rotation the way it turns
   * @param engine what drives it
   * @return a builder with everything else still missing
   */
  public static Builder builder(String name, Rotation rotation, Engine engine) {
    return new Builder(name, rotation, engine);
  }

  /** Collects the parts that may be missing. */
  public static final class Builder {
    private final String name;
    private final Rotation rotation;
    private final Engine engine;
    private Position position = Position.ORIGIN;
    private OptionalDouble speed = OptionalDouble.empty();
    private OptionalDouble speedWithoutPower = OptionalDouble.empty();
    private double inertia;
    private double straightened;
    private OptionalDouble efficiency = OptionalDouble.empty();
    private OptionalDouble diameter = OptionalDouble.empty();

    private Builder(String name, Rotation rotation, Engine engine) {
      this.name = name;
      this.rotation = rotation;
      this.engine = engine;
    }

    /**
     * Sets where it is.
     *
     * @param value the middle of its disc
     * @return this builder
     */
    public Builder position(Position value) {
      position = value;
      return this;
    }

    /**
     * Sets its speed.
     *
     * @param value Ω, rad/s
     * @return this builder
     */
    public Builder speed(double value) {
      speed = OptionalDouble.of(value);
      return this;
    }

    /**
     * Fixes its pitch.
     *
     * @param value its speed without power as a part of that at rated power
     * @return this builder
     */
    public Builder speedWithoutPower(double value) {
      speedWithoutPower = OptionalDouble.of(value);
      return this;
    }

    /**
     * Sets its inertia.
     *
     * @param value J, kg m²
     * @return this builder
     */
    public Builder inertia(double value) {
      inertia = value;
      return this;
    }

    /**
     * Sets what wing and fuselage straighten.
     *
     * @param value κ
     * @return this builder
     */
    public Builder straightened(double value) {
      straightened = value;
      return this;
    }

    /**
     * Sets its efficiency.
     *
     * @param value η
     * @return this builder
     */
    public Builder efficiency(double value) {
      efficiency = OptionalDouble.of(value);
      return this;
    }

    /**
     * Sets its diameter.
     *
     * @param value m
     * @return this builder
     */
    public Builder diameter(double value) {
      diameter = OptionalDouble.of(value);
      return this;
    }

    /**
     * Makes the propeller.
     *
     * @return the propeller
     * @throws IllegalArgumentException when a value is out of range
     */
    public Propeller build() {
      return new Propeller(
          name,
          rotation,
          engine,
          position,
          speed,
          speedWithoutPower,
          inertia,
          straightened,
          efficiency,
          diameter);
    }
  }
}
