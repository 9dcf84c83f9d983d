package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * What drives a propeller.
 *
 * @param ratedPower the most that the propeller gets, W, above 0
 * @param lag time constant with which the power follows the lever, s; 0 for none, else at least
 *     {@value #SHORTEST_LAG}
 * @param gearRatio turns of the engine for one of the propeller, above 0
 * @param inertia J of all that turns with the engine's speed about the axis of the propeller, kg
 *     m², 0 or more
 * @param rotation the way in which that turns; it matters only with an inertia
 */
public record Engine(
    double ratedPower, double lag, double gearRatio, double inertia, Rotation rotation) {

  /** A lag below this is none that anyone could see, and makes the equations stiff, s. */
  public static final double SHORTEST_LAG = 1e-4;

  public Engine {
    Check.positive("rated power, W,", ratedPower);
    Check.notNegative("engine lag, s,", lag);
    if (lag > 0 && lag < SHORTEST_LAG) {
      throw new IllegalArgumentException(
          "engine lag is " + lag + " s; expected 0 for none, or at least " + SHORTEST_LAG + " s");
    }
    Check.positive("gear ratio", gearRatio);
    Check.notNegative("inertia of the engine, kg m2,", inertia);
  }

  /**
   * An engine on the shaft of its propeller that follows its lever at once, without inertia.
   *
   * @param ratedPower W, above 0
   * @return the engine
   */
  public static Engine of(double ratedPower) {
    return new Engine(ratedPower, 0, 1, 0, Rotation.CLOCKWISE);
  }

  /**
   * Its angular momentum for each unit of the propeller's speed.
   *
   * @return s J times the gear ratio, kg m², positive clockwise seen from behind
   */
  public double momentumPerSpeed() {
    return rotation.sense() * inertia * gearRatio;
  }
}
