package org.rolltrace.core.flight;

import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.sampling.ODEStateInterpolator;

/**
 * The dense output of one step as a polynomial that is cheap to evaluate many times.
 *
 * <p>The dense output of the method is a polynomial of degree 7 in θ = (t − t₀)/h whose values and
 * slopes at both ends are those of the step. So it is the cubic that has these, plus θ²(1 − θ)²
 * times another cubic, which four values inside the step fix. What comes out is the interpolator's
 * own value, to rounding.
 */
final class DenseStep {
  private static final double[] INSIDE = {0.2, 0.4, 0.6, 0.8};

  /** The coefficients of the cubics that are 1 at one of the inside points and 0 at the others. */
  private static final double[][] LAGRANGE = lagrange();

  private final int dimension;
  private final double[][] inner;
  private double start;
  private double length;
  private double[] from;
  private double[] to;
  private double[] slopeFrom;
  private double[] slopeTo;

  DenseStep(int dimension) {
    this.dimension = dimension;
    this.inner = new double[dimension][4];
  }

  private static double[][] lagrange() {
    double[][] cubics = new double[4][];
    for (int k = 0; k < 4; k++) {
      double[] cubic = {1, 0, 0, 0};
      double scale = 1;
      int degree = 0;
      for (int m = 0; m < 4; m++) {
        if (m != k) {
          for (int i = ++degree; i > 0; i--) {
            cubic[i] = cubic[i - 1] - INSIDE[m] * cubic[i];
          }
          cubic[0] *= -INSIDE[m];
          scale *= INSIDE[k] - INSIDE[m];
        }
      }
      for (int i = 0; i < 4; i++) {
        cubic[i] /= scale;
      }
      cubics[k] = cubic;
    }
    return cubics;
  }

  /** Takes the step that an interpolator stands for. */
  void take(ODEStateInterpolator interpolator) {
    ODEStateAndDerivative previous = interpolator.getPreviousState();
    ODEStateAndDerivative current = interpolator.getCurrentState();
    start = previous.getTime();
    length = current.getTime() - start;
    from = previous.getPrimaryState();
    to = current.getPrimaryState();
    slopeFrom = previous.getPrimaryDerivative();
    slopeTo = current.getPrimaryDerivative();
    for (int i = 0; i < dimension; i++) {
      java.util.Arrays.fill(inner[i], 0);
    }
    for (int k = 0; k < INSIDE.length; k++) {
      double theta = INSIDE[k];
      double bubble = theta * theta * (1 - theta) * (1 - theta);
      double[] value = interpolator.getInterpolatedState(start + theta * length).getPrimaryState();
      for (int i = 0; i < dimension; i++) {
        double rest = (value[i] - hermite(i, theta)) / bubble;
        for (int c = 0; c < 4; c++) {
          inner[i][c] += rest * LAGRANGE[k][c];
        }
      }
    }
  }

  private double hermite(int i, double theta) {
    double rest = 1 - theta;
    return from[i] * (1 + 2 * theta) * rest * rest
        + length * slopeFrom[i] * theta * rest * rest
        + to[i] * (3 - 2 * theta) * theta * theta
        - length * slopeTo[i] * theta * theta * rest;
  }

  /** The state at an instant of the step. */
  void stateAt(double time, double[] state) {
    double theta = (time - start) / length;
    double rest = 1 - theta;
    double bubble = theta * theta * rest * rest;
    for (int i = 0; i < dimension; i++) {
      double[] c = inner[i];
      state[i] =
          hermite(i, theta) + bubble * (c[0] + theta * (c[1] + theta * (c[2] + theta * c[3])));
    }
  }
}
