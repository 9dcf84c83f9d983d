package org.rolltrace.core.flight;

import org.hipparchus.ode.OrdinaryDifferentialEquation;

/** Equations whose rates are worked out in place, so that a step leaves nothing to collect. */
abstract class Equations implements OrdinaryDifferentialEquation {
  private final int dimension;

  Equations(int dimension) {
    this.dimension = dimension;
  }

  /** The rates of the state at an instant. */
  abstract void rates(double time, double[] state, double[] rates);

  @Override
  public final int getDimension() {
    return dimension;
  }

  @Override
  public final double[] computeDerivatives(double time, double[] state) {
    double[] rates = new double[dimension];
    rates(time, state, rates);
    return rates;
  }
}
