package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/** The polynomial against the interpolator it stands for, of the library. */
class DenseStepTest {
  @Test
  void isTheDenseOutputToRounding() {
    DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-8, 1, 1e-8, 1e-8);
    DenseStep step = new DenseStep(2);
    double[] state = new double[2];
    int[] steps = new int[1];
    integrator.addStepHandler(
        interpolator -> {
          step.take(interpolator);
          steps[0]++;
          double from = interpolator.getPreviousState().getTime();
          double to = interpolator.getCurrentState().getTime();
          for (int i = 0; i <= 40; i++) {
            double time = from + (to - from) * i / 40;
            step.stateAt(time, state);
            // states of order one, a handful of operations
            assertThat(state)
                .containsExactly(
                    interpolator.getInterpolatedState(time).getPrimaryState(), within(1e-13));
          }
        });
    integrator.integrate(
        new OrdinaryDifferentialEquation() {
          @Override
          public int getDimension() {
            return 2;
          }

          @Override
          public double[] computeDerivatives(double time, double[] y) {
            return new double[] {y[1], -9 * Math.sin(y[0]) - 0.3 * y[1] + Math.cos(2 * time)};
          }
        },
        new ODEState(0, new double[] {1, 0}),
        10);
    assertThat(steps[0]).isGreaterThan(10);
  }
}
