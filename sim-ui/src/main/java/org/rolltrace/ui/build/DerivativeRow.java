package org.rolltrace.ui.build;

import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.ui.control.Written;

/**
 * A derivative as the table shows it.
 *
 * @param coefficient which one
 * @param value as it flies, 0 when absent
 * @param origin where it comes from
 * @param estimate what the shape gives; empty when it gives none
 * @param kept the value of the run that is compared with; empty when there is none
 */
record DerivativeRow(
    Coefficient coefficient,
    double value,
    Origin origin,
    Optional<Estimate> estimate,
    OptionalDouble kept) {

  static DerivativeRow of(
      Coefficient coefficient, LateralDerivatives now, Optional<LateralDerivatives> other) {
    return new DerivativeRow(
        coefficient,
        now.value(coefficient),
        now.origin(coefficient),
        now.estimate(coefficient),
        other.map(set -> OptionalDouble.of(set.value(coefficient))).orElse(OptionalDouble.empty()));
  }

  boolean isAbsent() {
    return origin == Origin.ABSENT;
  }

  /** Whether a given value stands in place of an estimate. */
  boolean isSet() {
    return origin == Origin.SET;
  }

  /** The origin in a word or two, with a mark when a method was stretched. */
  String originWords() {
    String word = isSet() ? "given" : origin.word();
    return estimate.isPresent() && !isSet() && !estimate.get().extrapolated().isEmpty()
        ? "extrapolated"
        : word;
  }

  /** Where the value comes from, part by part. */
  String explanation() {
    StringBuilder words = new StringBuilder(coefficient.symbol());
    words.append(" = ").append(isAbsent() ? "0" : Written.reading(value));
    words.append(", ").append(origin.word()).append('.');
    if (isAbsent()) {
      return words.append("\nNeither given nor estimated: taken as 0.").toString();
    }
    if (isSet()) {
      words.append("\nThe shape does not change it. Estimated it would be ");
      words.append(Written.reading(estimate.orElseThrow().value())).append(':');
    }
    estimate.ifPresent(found -> found.terms().forEach(term -> append(words, term)));
    return words.toString();
  }

  private static void append(StringBuilder words, Estimate.Term term) {
    words.append("\n\n").append(term.part()).append(' ').append(Written.reading(term.value()));
    words.append(" by ").append(term.method().title()).append(": ").append(term.method().what());
    words.append(".\nAfter ").append(term.method().source());
    words.append(". Known error: ").append(term.method().knownError()).append('.');
    if (!term.extrapolated().isEmpty()) {
      words.append("\nExtrapolated: ").append(term.extrapolated()).append('.');
    }
  }
}
