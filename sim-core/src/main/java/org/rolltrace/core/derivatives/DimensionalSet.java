package org.rolltrace.core.derivatives;

import java.util.EnumMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.quantity.Check;

/**
 * What turns dimensional derivatives, as the package page has them, into coefficients.
 *
 * @param span b, m, above 0
 * @param wingArea S, m², above 0
 * @param mass m, kg, above 0; empty when not known, which leaves the side force out
 * @param inertia about the axes of the set; without yaw inertia the yawing moments are left out
 * @param condition for which the set holds
 * @param primed whether the product of inertia is worked in
 */
public record DimensionalSet(
    double span,
    double wingArea,
    OptionalDouble mass,
    Inertia inertia,
    FlightCondition condition,
    boolean primed) {

  public DimensionalSet {
    Check.positive("span, m,", span);
    Check.positive("wing area, m2,", wingArea);
    if (mass.isPresent()) {
      Check.positive("mass, kg,", mass.getAsDouble());
    }
  }

  /**
   * The derivatives without which others cannot be converted: in a primed set with a product of
   * inertia L' and N' of the same motion go together.
   *
   * @param printed those that are given
   * @return those that are missing, in the order of the enumeration
   */
  public Set<Coefficient> missingBeside(Set<Coefficient> printed) {
    Set<Coefficient> missing = new TreeSet<>();
    if (isUnprimed()) {
      return missing;
    }
    for (Pair pair : Pair.OF_MOMENTS) {
      pair.addMissing(printed, missing);
    }
    return missing;
  }

  private boolean isUnprimed() {
    return !primed || inertia.product() == 0;
  }

  /**
   * Converts a set.
   *
   * @param printed dimensional derivatives, SI units and radians
   * @return the coefficients in the same axes; not finite where a value leaves the range of double
   * @throws IllegalArgumentException when mass or yaw inertia are missing for one of them
   */
  public Map<Coefficient, Double> toCoefficients(Map<Coefficient, Double> printed) {
    Map<Coefficient, Double> unprimed = new EnumMap<>(Coefficient.class);
    unprimed.putAll(printed);
    if (!isUnprimed()) {
      double overRoll = inertia.product() / inertia.roll();
      double overYaw = inertia.product() / inertia.yaw().orElseThrow();
      for (Pair pair : Pair.OF_MOMENTS) {
        if (printed.containsKey(pair.first()) && printed.containsKey(pair.second())) {
          double roll = printed.get(pair.first());
          double yaw = printed.get(pair.second());
          unprimed.put(pair.first(), roll - overRoll * yaw);
          unprimed.put(pair.second(), yaw - overYaw * roll);
        }
      }
    }
    Map<Coefficient, Double> coefficients = new EnumMap<>(Coefficient.class);
    unprimed.forEach((c, value) -> coefficients.put(c, value * resistance(c) / size(c)));
    return coefficients;
  }

  /** The mass or inertia by which a force or moment was divided. */
  private double resistance(Coefficient coefficient) {
    return switch (coefficient.load()) {
      case SIDE ->
          mass.orElseThrow(
              () ->
                  new IllegalArgumentException(
                      coefficient.dimensionalSymbol() + " is a force by mass; give the mass too"));
      case ROLL -> inertia.roll();
      case YAW ->
          inertia
              .yaw()
              .orElseThrow(
                  () ->
                      new IllegalArgumentException(
                          coefficient.dimensionalSymbol()
                              + " is a moment by yaw inertia; give the yaw inertia too"));
    };
  }

  /** The force or moment for a coefficient of 1. */
  private double size(Coefficient coefficient) {
    double size = condition.dynamicPressure() * wingArea;
    if (coefficient.load() != Coefficient.Load.SIDE) {
      size *= span;
    }
    return coefficient.motion() == Coefficient.Motion.RATE
        ? size * span / (2 * condition.trueAirspeed())
        : size;
  }
}
