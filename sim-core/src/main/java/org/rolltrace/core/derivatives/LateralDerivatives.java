package org.rolltrace.core.derivatives;

import java.util.Arrays;
import java.util.Collection;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.quantity.Check;

/**
 * A set of lateral-directional derivatives in the convention of the package page. A derivative that
 * was neither given nor estimated is 0 and says that it is absent.
 */
public final class LateralDerivatives {
  private static final String AS_IN_THE_MODEL =
      "non-dimensional, " + PrintedConvention.MODEL.words() + "; stability axes";

  private final EnumMap<Coefficient, Double> given;
  private final String source;
  private final Optional<FlightCondition> validAt;
  private final String convention;
  private final EnumMap<Coefficient, Estimate> estimates = new EnumMap<>(Coefficient.class);
  private Optional<GeometryEstimate> shape = Optional.empty();

  private LateralDerivatives(
      Map<Coefficient, Double> given,
      String source,
      Optional<FlightCondition> validAt,
      String convention) {
    this.given = new EnumMap<>(Coefficient.class);
    this.given.putAll(given);
    this.source = source;
    this.validAt = validAt;
    this.convention = convention;
    given.forEach((coefficient, value) -> Check.finite(coefficient.symbol(), value));
  }

  /**
   * A set of given derivatives.
   *
   * @param values the given ones; the others count as absent
   * @param source where they are from, in the user's words; may be empty
   * @return the set
   * @throws IllegalArgumentException when a value is not finite
   */
  public static LateralDerivatives ofGiven(Map<Coefficient, Double> values, String source) {
    return new LateralDerivatives(values, source, Optional.empty(), AS_IN_THE_MODEL);
  }

  /**
   * The same set, known to hold at one condition.
   *
   * @param condition the condition for which the values were found
   * @return the set
   */
  public LateralDerivatives validAt(FlightCondition condition) {
    return new LateralDerivatives(given, source, Optional.of(condition), convention);
  }

  /**
   * The same set, known to be converted from another convention.
   *
   * @param words the convention in which it was printed
   * @return the set
   */
  public LateralDerivatives printedAs(String words) {
    return new LateralDerivatives(given, source, validAt, words);
  }

  /**
   * The same set with what follows from the shape of the aeroplane. A given value wins over an
   * estimate, which then stands beside it.
   *
   * @param shape the estimates, in place of any from before
   * @return the set
   */
  public LateralDerivatives completedBy(GeometryEstimate shape) {
    LateralDerivatives set = new LateralDerivatives(given, source, validAt, convention);
    shape.estimates().forEach(estimate -> set.estimates.put(estimate.coefficient(), estimate));
    set.shape = Optional.of(shape);
    return set;
  }

  /**
   * What the set was completed by.
   *
   * @return all estimates with the loadings of the wing; empty without a shape
   */
  public Optional<GeometryEstimate> shape() {
    return shape;
  }

  /**
   * A derivative.
   *
   * @param coefficient which one
   * @return its value: the given one, or else the estimate; 0 when absent
   */
  public double value(Coefficient coefficient) {
    Double set = given.get(coefficient);
    if (set != null) {
      return set;
    }
    Estimate estimate = estimates.get(coefficient);
    return estimate == null ? 0 : estimate.value();
  }

  /**
   * The estimate of a derivative.
   *
   * @param coefficient which one
   * @return the estimate, also where a given value wins over it; empty when there is none
   */
  public Optional<Estimate> estimate(Coefficient coefficient) {
    return Optional.ofNullable(estimates.get(coefficient));
  }

  /**
   * Where a derivative comes from.
   *
   * @param coefficient which one
   * @return its origin
   */
  public Origin origin(Coefficient coefficient) {
    boolean estimated = estimates.containsKey(coefficient);
    if (given.containsKey(coefficient)) {
      return estimated ? Origin.SET : Origin.GIVEN;
    }
    return estimated ? Origin.ESTIMATED : Origin.ABSENT;
  }

  /**
   * The derivatives that come from somewhere.
   *
   * @param origin from where
   * @return those of that origin, in the order of the enumeration
   */
  public List<Coefficient> of(Origin origin) {
    return Arrays.stream(Coefficient.values()).filter(c -> origin(c) == origin).toList();
  }

  /**
   * Whether any derivative is given.
   *
   * @return false for a set that follows from the shape alone
   */
  public boolean hasGiven() {
    return !given.isEmpty();
  }

  /**
   * The derivatives among some that are neither given nor estimated.
   *
   * @param wanted those asked about
   * @return the absent ones, in the order of the enumeration
   */
  public List<Coefficient> absentAmong(Collection<Coefficient> wanted) {
    return wanted.stream().filter(c -> origin(c) == Origin.ABSENT).sorted().toList();
  }

  /**
   * Where the set is from.
   *
   * @return the user's words; may be empty
   */
  public String source() {
    return source;
  }

  /**
   * The convention from which the values were converted.
   *
   * @return words such as "dimensional, primed, per radian; mean aileron angle,
   *     right-roll-positive; stability axes"
   */
  public String convention() {
    return convention;
  }

  /**
   * The condition for which the set holds.
   *
   * @return the condition, or empty when none was stated
   */
  public Optional<FlightCondition> validAt() {
    return validAt;
  }
}
