package org.rolltrace.core.flight;

import java.util.function.DoublePredicate;
import org.hipparchus.ode.EquationsMapper;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.sampling.AbstractODEStateInterpolator;

/** The dense output of one step: for each state a polynomial of degree 7 in the time. */
final class DenseStep extends AbstractODEStateInterpolator {
  /** How many coefficients a polynomial has. */
  static final int TERMS = 8;

  private static final long serialVersionUID = 1;

  /** After these, a part of a second is known to 1e-11 s. */
  private static final int HALVINGS = 36;

  private final double start;
  private final double perLength;

  /** The coefficients of the first state, then those of the next. */
  private final double[] terms;

  /** A whole step. */
  DenseStep(
      double[] terms,
      ODEStateAndDerivative previous,
      ODEStateAndDerivative current,
      EquationsMapper mapper) {
    this(terms, previous, current, previous, current, mapper);
  }

  private DenseStep(
      double[] terms,
      ODEStateAndDerivative wholePrevious,
      ODEStateAndDerivative wholeCurrent,
      ODEStateAndDerivative previous,
      ODEStateAndDerivative current,
      EquationsMapper mapper) {
    super(true, wholePrevious, wholeCurrent, previous, current, mapper);
    this.terms = terms;
    this.start = wholePrevious.getTime();
    this.perLength = 1 / (wholeCurrent.getTime() - start);
  }

  @Override
  protected DenseStep create(
      boolean forward,
      ODEStateAndDerivative wholePrevious,
      ODEStateAndDerivative wholeCurrent,
      ODEStateAndDerivative previous,
      ODEStateAndDerivative current,
      EquationsMapper mapper) {
    return new DenseStep(terms, wholePrevious, wholeCurrent, previous, current, mapper);
  }

  @Override
  protected ODEStateAndDerivative computeInterpolatedStateAndDerivatives(
      EquationsMapper mapper, double time, double theta, double gone, double left) {
    double[] state = new double[mapper.getTotalDimension()];
    double[] rates = new double[state.length];
    for (int i = 0; i < state.length; i++) {
      state[i] = value(terms, i, theta);
      rates[i] = slope(i, theta) * perLength;
    }
    return mapper.mapStateAndDerivative(time, state, rates);
  }

  /** The polynomial of a state at a share of the step. */
  static double value(double[] terms, int state, double theta) {
    int i = state * TERMS;
    double low = terms[i] + theta * (terms[i + 1] + theta * (terms[i + 2] + theta * terms[i + 3]));
    double high =
        terms[i + 4] + theta * (terms[i + 5] + theta * (terms[i + 6] + theta * terms[i + 7]));
    double square = theta * theta;
    return low + square * square * high;
  }

  private double slope(int state, double theta) {
    int first = state * TERMS;
    double sum = 0;
    for (int power = TERMS - 1; power > 0; power--) {
      sum = sum * theta + power * terms[first + power];
    }
    return sum;
  }

  private double share(double time) {
    return (time - start) * perLength;
  }

  /** All states at an instant of the step. */
  void stateAt(double time, double[] state) {
    double theta = share(time);
    for (int i = 0; i < state.length; i++) {
      state[i] = value(terms, i, theta);
    }
  }

  /** One state at an instant of the step. */
  double at(int state, double time) {
    return value(terms, state, share(time));
  }

  /** The rate of one state at an instant of the step. */
  double rateAt(int state, double time) {
    return slope(state, share(time)) * perLength;
  }

  /** When, in a part of the step, something ends that holds at its beginning. */
  static double end(double from, double to, DoublePredicate holds) {
    double low = from;
    double high = to;
    for (int i = 0; i < HALVINGS; i++) {
      double middle = 0.5 * (low + high);
      if (holds.test(middle)) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }
}
