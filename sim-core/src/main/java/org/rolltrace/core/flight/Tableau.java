package org.rolltrace.core.flight;

import org.hipparchus.ode.ExpandableODE;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.nonstiff.interpolators.DormandPrince853StateInterpolator;

/**
 * The numbers of the method, all asked of the library that has it.
 *
 * <p>Its dense output is y(θ) = y₀ + h Σ w_k(θ) k_k, with θ = (t − t₀)/h, the slopes k_k of the
 * stages, and polynomials w_k of degree 7. So the library's interpolator, given a slope of 1 in one
 * stage at a time, tells the polynomials: each is the cubic with its values and slopes at both ends
 * of the step, plus θ²(1 − θ)² times another cubic, which four values inside the step fix.
 */
final class Tableau {
  /** The stages that lead to the end of the step. */
  static final int STEP_STAGES = 12;

  /** These, the one at the end of the step, and three inside it for the dense output. */
  static final int STAGES = 16;

  /** When a stage is, as a share of the step. */
  private static final double[] TIMES;

  /** The weights of all slopes before a stage, in its state. */
  private static final double[][] WEIGHTS;

  /** Between the first slope and this one, all weights of a stage are 0. */
  private static final int[] AFTER_GAP = {1, 1, 1, 2, 2, 3, 3, 3, 3, 3, 3, 3, 5, 5, 5, 5, 5};

  /** The coefficients of each power of θ in the polynomials w_k. */
  private static final double[][] DENSE;

  private static final double[] INSIDE = {0.2, 0.4, 0.6, 0.8};

  static {
    DormandPrince853Integrator method = new DormandPrince853Integrator(1, 1, 1, 1);
    TIMES = method.getC();
    WEIGHTS = method.getA();
    DENSE = dense(method.getB());
  }

  private Tableau() {}

  /** When a stage, from 1 on, is, as a share of the step. */
  static double time(int stage) {
    return TIMES[stage - 1];
  }

  /** What a state has gained at a stage, from 1 on, for a step of length 1. */
  static double gain(int stage, double[] slopes) {
    return sum(WEIGHTS[stage - 1], AFTER_GAP[stage], slopes);
  }

  /** The coefficient of a power of θ, from 2 on, in the dense output for a step of length 1. */
  static double term(int power, double[] slopes) {
    return sum(DENSE[power], AFTER_GAP[STAGES], slopes);
  }

  private static double sum(double[] weights, int afterGap, double[] slopes) {
    double sum = weights[0] * slopes[0];
    for (int k = afterGap; k < weights.length; k++) {
      sum += weights[k] * slopes[k];
    }
    return sum;
  }

  private static double[][] dense(double[] atEnd) {
    double[][] oneAtATime = new double[STAGES][STAGES];
    for (int k = 0; k < STAGES; k++) {
      oneAtATime[k][k] = 1;
    }
    ODEStateAndDerivative from = new ODEStateAndDerivative(0, new double[STAGES], oneAtATime[0]);
    ODEStateAndDerivative to = new ODEStateAndDerivative(1, atEnd, oneAtATime[STEP_STAGES]);
    DormandPrince853StateInterpolator interpolator =
        new DormandPrince853StateInterpolator(
            true, oneAtATime, from, to, from, to, new ExpandableODE(new Nothing()).getMapper());
    double[][] inside = new double[INSIDE.length][];
    for (int m = 0; m < INSIDE.length; m++) {
      inside[m] = interpolator.getInterpolatedState(INSIDE[m]).getPrimaryState();
    }
    double[][] coefficients = new double[DenseStep.TERMS][STAGES];
    for (int k = 0; k < STAGES; k++) {
      double[] polynomial = polynomial(k, atEnd[k], inside);
      for (int power = 0; power < polynomial.length; power++) {
        coefficients[power][k] = polynomial[power];
      }
    }
    return coefficients;
  }

  private static double[] polynomial(int k, double atEnd, double[][] inside) {
    double slopeFrom = k == 0 ? 1 : 0;
    double slopeTo = k == STEP_STAGES ? 1 : 0;
    double square = 3 * atEnd - 2 * slopeFrom - slopeTo;
    double cube = slopeFrom + slopeTo - 2 * atEnd;
    double[] polynomial = {0, slopeFrom, square, cube, 0, 0, 0, 0};
    for (int m = 0; m < INSIDE.length; m++) {
      double theta = INSIDE[m];
      double bubble = theta * theta * (1 - theta) * (1 - theta);
      double ends = theta * (slopeFrom + theta * (square + theta * cube));
      double rest = (inside[m][k] - ends) / bubble;
      double[] cubic = oneAt(m);
      for (int i = 0; i < cubic.length; i++) {
        polynomial[i + 2] += rest * cubic[i];
        polynomial[i + 3] -= 2 * rest * cubic[i];
        polynomial[i + 4] += rest * cubic[i];
      }
    }
    return polynomial;
  }

  /** The coefficients of the cubic that is 1 at one of the inside points and 0 at the others. */
  private static double[] oneAt(int point) {
    double[] cubic = {1, 0, 0, 0};
    double scale = 1;
    int degree = 0;
    for (int m = 0; m < INSIDE.length; m++) {
      if (m != point) {
        for (int i = ++degree; i > 0; i--) {
          cubic[i] = cubic[i - 1] - INSIDE[m] * cubic[i];
        }
        cubic[0] *= -INSIDE[m];
        scale *= INSIDE[point] - INSIDE[m];
      }
    }
    for (int i = 0; i < cubic.length; i++) {
      cubic[i] /= scale;
    }
    return cubic;
  }

  /** As many states as there are stages, for the interpolator to have its number. */
  private static final class Nothing extends Equations {
    Nothing() {
      super(STAGES);
    }

    @Override
    void rates(double time, double[] state, double[] rates) {
      throw new UnsupportedOperationException("only the number of states is known");
    }
  }
}
