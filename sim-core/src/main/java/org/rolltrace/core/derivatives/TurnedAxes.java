package org.rolltrace.core.derivatives;

import java.util.EnumMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.rolltrace.core.quantity.Check;

/**
 * Derivatives about axes turned about the y axis, x' = x cos a + z sin a: by the angle of attack,
 * body axes become stability axes. Inertias turn with them, by {@link
 * org.rolltrace.core.aeroplane.Inertia#turned}.
 *
 * @param angle a, rad
 */
public record TurnedAxes(double angle) {

  public TurnedAxes {
    Check.finite("angle of the axes, rad,", angle);
  }

  /**
   * The derivatives without which others cannot be turned: those by p and r, and those of rolling
   * and yawing moment, turn into each other.
   *
   * @param printed those that are given
   * @return those that are missing, in the order of the enumeration
   */
  public Set<Coefficient> missingBeside(Set<Coefficient> printed) {
    Set<Coefficient> missing = new TreeSet<>();
    if (angle == 0) {
      return missing;
    }
    Set<Coefficient> all = new TreeSet<>(printed);
    // Of the four moments by rates each needs all the others: once by rate, then by moment.
    Pair.OF_RATES.forEach(pair -> pair.addMissing(printed, missing));
    all.addAll(missing);
    Set<Coefficient> byMoment = new TreeSet<>();
    Pair.OF_MOMENTS.forEach(pair -> pair.addMissing(all, byMoment));
    missing.addAll(byMoment);
    return missing;
  }

  /**
   * Turns a set.
   *
   * @param coefficients non-dimensional derivatives about the old axes; where one of those that
   *     belong together is given, the others count as 0
   * @return the same about the turned axes
   */
  public Map<Coefficient, Double> turn(Map<Coefficient, Double> coefficients) {
    Map<Coefficient, Double> turned = new EnumMap<>(Coefficient.class);
    turned.putAll(coefficients);
    if (angle != 0) {
      Pair.OF_MOMENTS.forEach(pair -> turn(pair, turned));
      Pair.OF_RATES.forEach(pair -> turn(pair, turned));
    }
    return turned;
  }

  private void turn(Pair pair, Map<Coefficient, Double> set) {
    if (!set.containsKey(pair.first()) && !set.containsKey(pair.second())) {
      return;
    }
    double first = set.getOrDefault(pair.first(), 0.0);
    double second = set.getOrDefault(pair.second(), 0.0);
    set.put(pair.first(), first * Math.cos(angle) + second * Math.sin(angle));
    set.put(pair.second(), second * Math.cos(angle) - first * Math.sin(angle));
  }
}
