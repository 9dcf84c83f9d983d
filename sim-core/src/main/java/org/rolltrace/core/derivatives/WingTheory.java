package org.rolltrace.core.derivatives;

import java.util.function.DoubleUnaryOperator;

/** From the incidence along the span to the circulation along the span. */
interface WingTheory {
  /**
   * The loading of an incidence that is the same on both sides.
   *
   * @param incidence of the sections from their zero-lift direction, rad, against y ≥ 0, m
   * @return its loading
   */
  SpanLoading symmetric(DoubleUnaryOperator incidence);

  /**
   * The loading of an incidence that is opposite on the left.
   *
   * @param incidence on the right side, rad, against y ≥ 0, m
   * @return its loading
   */
  SpanLoading antisymmetric(DoubleUnaryOperator incidence);
}
