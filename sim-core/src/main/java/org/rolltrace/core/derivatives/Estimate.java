package org.rolltrace.core.derivatives;

import java.util.List;
import java.util.stream.Collectors;

/**
 * A derivative by estimation, part by part.
 *
 * @param coefficient which one
 * @param terms its parts; their sum is the derivative
 */
public record Estimate(Coefficient coefficient, List<Term> terms) {

  public Estimate {
    terms = List.copyOf(terms);
  }

  /**
   * A part of a derivative.
   *
   * @param part of the aeroplane
   * @param value what it contributes
   * @param method how it was found
   * @param extrapolated what lies outside the range of the method; empty when nothing does
   */
  public record Term(String part, double value, EstimateMethod method, String extrapolated) {}

  /**
   * The derivative.
   *
   * @return the sum of the parts, per radian
   */
  public double value() {
    return terms.stream().mapToDouble(Term::value).sum();
  }

  /**
   * What lies outside the range of a method.
   *
   * @return sentences without full stop, joined; empty when nothing does
   */
  public String extrapolated() {
    return terms.stream()
        .map(Term::extrapolated)
        .filter(words -> !words.isEmpty())
        .distinct()
        .collect(Collectors.joining("; "));
  }
}
