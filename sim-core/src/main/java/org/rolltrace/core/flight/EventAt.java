package org.rolltrace.core.flight;

import java.util.function.ToDoubleFunction;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketedUnivariateSolver;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.AdaptableInterval;
import org.hipparchus.ode.events.ODEEventDetector;
import org.hipparchus.ode.events.ODEEventHandler;

/** An event where a function of time and state passes through zero. */
final class EventAt implements ODEEventDetector {
  /** Instants are found to this, s. */
  private static final double THRESHOLD = 1e-11;

  private static final int MOST_ITERATIONS = 100;

  private final AdaptableInterval interval;
  private final ToDoubleFunction<ODEStateAndDerivative> function;
  private final ODEEventHandler handler;

  /**
   * An event.
   *
   * @param interval how often the function is looked at, s; two zeros between two looks stay unseen
   */
  EventAt(
      double interval, ToDoubleFunction<ODEStateAndDerivative> function, ODEEventHandler handler) {
    this(AdaptableInterval.of(interval), function, handler);
  }

  /**
   * An event that is looked for the more often the nearer it is.
   *
   * @param interval how long the function may stay unseen from a state on, s
   */
  EventAt(
      AdaptableInterval interval,
      ToDoubleFunction<ODEStateAndDerivative> function,
      ODEEventHandler handler) {
    this.interval = interval;
    this.function = function;
    this.handler = handler;
  }

  @Override
  public AdaptableInterval getMaxCheckInterval() {
    return interval;
  }

  @Override
  public int getMaxIterationCount() {
    return MOST_ITERATIONS;
  }

  @Override
  public BracketedUnivariateSolver<UnivariateFunction> getSolver() {
    return new BracketingNthOrderBrentSolver(0, THRESHOLD, 0, 5);
  }

  @Override
  public ODEEventHandler getHandler() {
    return handler;
  }

  @Override
  public double g(ODEStateAndDerivative state) {
    return function.applyAsDouble(state);
  }
}
