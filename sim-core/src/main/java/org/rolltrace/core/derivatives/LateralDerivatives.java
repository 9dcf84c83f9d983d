package org.rolltrace.core.derivatives;

import java.util.Collection;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.quantity.Check;

/**
 * A set of lateral-directional derivatives in the convention of the package page. A derivative that
 * was not given is 0 and says that it is absent.
 */
public final class LateralDerivatives {
  private static final String AS_IN_THE_MODEL =
      "non-dimensional, " + PrintedConvention.MODEL.words() + "; stability axes";

  private final EnumMap<Coefficient, Double> given;
  private final String source;
  private final Optional<FlightCondition> validAt;
  private final String convention;

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
   * A derivative.
   *
   * @param coefficient which one
   * @return its value; 0 when absent
   */
  public double value(Coefficient coefficient) {
    return given.getOrDefault(coefficient, 0.0);
  }

  /**
   * Where a derivative comes from.
   *
   * @param coefficient which one
   * @return its origin
   */
  public Origin origin(Coefficient coefficient) {
    return given.containsKey(coefficient) ? Origin.GIVEN : Origin.ABSENT;
  }

  /**
   * The derivatives among some that were not given.
   *
   * @param wanted those asked about
   * @return the absent ones, in the order of the enumeration
   */
  public List<Coefficient> absentAmong(Collection<Coefficient> wanted) {
    return wanted.stream().filter(c -> !given.containsKey(c)).sorted().toList();
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
