package org.rolltrace.core.flight;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.ode.AbstractIntegrator;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.testing.RandomAeroplane;

/** The steps that work in place against those of the library they stand for. */
class LeanIntegratorTest {
  /** A pendulum that is pushed: smooth, and never at rest. */
  private static final Equations PENDULUM =
      new Equations(2) {
        @Override
        void rates(double time, double[] y, double[] rates) {
          rates[0] = y[1];
          rates[1] = -9 * Math.sin(y[0]) - 0.3 * y[1] + Math.cos(2 * time);
        }
      };

  /** A quick aeroplane at full stick: some steps are six times its roll mode's time constant. */
  private static Equations quickRoll() {
    RandomAeroplane any = RandomAeroplane.of(3);
    LateralMotion motion =
        LateralMotion.of(
            SlipTreatment.FREE,
            LateralModel.of(
                any.data().aeroplane(),
                any.data().derivatives(),
                any.condition(),
                PropellerMoments.NONE));
    double aileron = any.data().aeroplane().ailerons().orElseThrow().fullAngle();
    return new Equations(4) {
      @Override
      void rates(double time, double[] y, double[] rates) {
        motion.rates(time, y, aileron, 0, rates);
      }
    };
  }

  private static List<ODEStateInterpolator> steps(
      AbstractIntegrator integrator, Equations equations, double... start) {
    List<ODEStateInterpolator> steps = new ArrayList<>();
    integrator.addStepHandler(steps::add);
    integrator.integrate(equations, new ODEState(0, start), 5);
    return steps;
  }

  @Test
  void everyStepIsTheLibrarys() {
    List<ODEStateInterpolator> steps =
        steps(new LeanIntegrator(2, 1e-8, 1, 1e-9, 1e-8), PENDULUM, 1, 0);
    assertThat(steps).hasSizeGreaterThan(20);
    double[] state = new double[2];
    for (ODEStateInterpolator interpolator : steps) {
      DenseStep step = (DenseStep) interpolator;
      double from = step.getPreviousState().getTime();
      double to = step.getCurrentState().getTime();
      DormandPrince853Integrator library = new DormandPrince853Integrator(1e-8, 1, 1e-9, 1e-8);
      library.setInitialStepSize(to - from);
      List<ODEStateInterpolator> theirs = new ArrayList<>();
      library.addStepHandler(theirs::add);
      library.integrate(
          PENDULUM, new ODEState(from, step.getPreviousState().getPrimaryState()), to);
      assertThat(theirs).hasSize(1);
      for (int i = 0; i <= 20; i++) {
        double time = from + (to - from) * i / 20;
        step.stateAt(time, state);
        // states of order one; weights of some hundreds that cancel
        assertThat(state)
            .containsExactly(
                theirs.get(0).getInterpolatedState(time).getPrimaryState(), within(1e-12));
        assertThat(step.getInterpolatedState(time).getPrimaryState())
            .containsExactly(state, within(1e-12));
        assertThat(step.at(1, time)).isEqualTo(state[1]);
        assertThat(step.rateAt(0, time))
            .isCloseTo(
                theirs.get(0).getInterpolatedState(time).getPrimaryDerivative()[0], within(1e-11));
      }
    }
  }

  /** The largest error inside steps, each taken up from its own beginning at a fine tolerance. */
  private static double largestError(List<ODEStateInterpolator> steps, Equations equations) {
    double largest = 0;
    for (ODEStateInterpolator step : steps) {
      double from = step.getPreviousState().getTime();
      double to = step.getCurrentState().getTime();
      ODEState exact = new ODEState(from, step.getPreviousState().getPrimaryState());
      for (int i = 1; i <= 20 && to - from > 1e-6; i++) {
        double time = from + (to - from) * i / 20;
        exact =
            new DormandPrince853Integrator(1e-10, 1, 1e-14, 1e-13)
                .integrate(equations, exact, time);
        double[] found = step.getInterpolatedState(time).getPrimaryState();
        for (int s = 0; s < found.length; s++) {
          largest = Math.max(largest, Math.abs(found[s] - exact.getPrimaryState()[s]));
        }
      }
    }
    return largest;
  }

  @Test
  void theErrorInsideAStepIsHeldWhereTheLibrarysIsNot() {
    Equations roll = quickRoll();
    double[] rest = new double[4];
    double library =
        largestError(steps(new DormandPrince853Integrator(1e-8, 1, 1e-8, 1e-8), roll, rest), roll);
    double ours = largestError(steps(new LeanIntegrator(4, 1e-8, 1, 1e-8, 1e-8), roll, rest), roll);
    // thirty times what is allowed at the end of a step, for roll rates up to 2.5 rad/s
    double allowed = 30 * 1e-8 * (1 + 2.5);
    assertThat(ours).isLessThan(allowed);
    assertThat(library).isGreaterThan(5 * allowed);
  }

  @Test
  void aStretchInWhichNothingMovesTakesFewSteps() {
    List<ODEStateInterpolator> steps =
        steps(
            new LeanIntegrator(1, 1e-8, 1, 1e-9, 1e-8),
            new Equations(1) {
              @Override
              void rates(double time, double[] y, double[] rates) {
                rates[0] = 0;
              }
            },
            1);
    // 0.05 s, then ten times as long, then 1 s each
    assertThat(steps).hasSizeLessThanOrEqualTo(7);
  }

  @Test
  void whatCannotBeFollowedIsSaid() {
    Equations explosion =
        new Equations(1) {
          @Override
          void rates(double time, double[] y, double[] rates) {
            rates[0] = y[0] * y[0];
          }
        };
    assertThatExceptionOfType(MathRuntimeException.class)
        .isThrownBy(() -> steps(new LeanIntegrator(1, 1e-8, 1, 1e-9, 1e-8), explosion, 1));
  }
}
