package org.rolltrace.core.flight;

import org.hipparchus.exception.MathIllegalStateException;
import org.hipparchus.ode.ExpandableODE;
import org.hipparchus.ode.LocalizedODEFormats;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.ODEEventDetector;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.sampling.AbstractODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;

/**
 * The library's integrator with steps that work in place. Events, the error at the end of a step
 * and the bounds of its length stay the library's. Two things differ:
 *
 * <p>The error inside a step is held too. The library looks at the end of the step only, and where
 * a step is long against the fastest mode, the dense output can be a thousand times worse. The last
 * stage lies inside the step, at 7/9: as long as the dense output agrees there with the state of
 * that stage to some error, it is nowhere in the step worse than that.
 *
 * <p>The first step is the same wherever the integration starts. The library's guess is a millionth
 * of a second wherever nothing moves yet, as at the start of every manoeuvre.
 */
final class LeanIntegrator extends DormandPrince853Integrator {
  /** s; a stretch that needs a shorter one finds it in a try or two. */
  private static final double FIRST_STEP = 0.05;

  /** An error inside the step may be this many times what is allowed at its end. */
  private static final double INSIDE = 30;

  private final int states;

  /** The rates at each stage. */
  private final double[][] rates;

  /** The same, turned: the rates of each state. */
  private final double[][] slopes;

  private final double[] within;
  private final double[] end;
  private double[] terms;
  private boolean watchesEvents;

  /**
   * An integrator.
   *
   * @param smallestStep s; a shorter one ends the integration with an exception
   * @param largestStep s
   * @param absoluteTolerance error allowed at the end of a step
   * @param relativeTolerance the same against the state
   */
  LeanIntegrator(
      int states,
      double smallestStep,
      double largestStep,
      double absoluteTolerance,
      double relativeTolerance) {
    super(smallestStep, largestStep, absoluteTolerance, relativeTolerance);
    this.states = states;
    this.rates = new double[Tableau.STAGES][states];
    this.slopes = new double[states][Tableau.STAGES];
    this.within = new double[states];
    this.end = new double[states];
  }

  @Override
  public void addEventDetector(ODEEventDetector detector) {
    super.addEventDetector(detector);
    watchesEvents = true;
  }

  @Override
  public void clearEventDetectors() {
    super.clearEventDetectors();
    watchesEvents = false;
  }

  @Override
  public ODEStateAndDerivative integrate(ExpandableODE whole, ODEState initial, double finish) {
    sanityChecks(initial, finish);
    setStepStart(initIntegration(whole, initial, finish));
    setIsLastStep(false);
    Equations equations = (Equations) whole.getPrimary();
    double next = Math.min(FIRST_STEP, getMaxStep());
    while (!isLastStep()) {
      ODEStateAndDerivative from = getStepStart();
      double start = from.getTime();
      double[] state = from.getPrimaryState();
      keep(0, from.getPrimaryDerivative());

      double error = Double.POSITIVE_INFINITY;
      while (!(error < 1)) {
        setStepSize(start + next >= finish ? finish - start : next);
        error = attempt(equations, start, state);
        next = getStepSize() * growth(error);
        if (!(error < 1)) {
          next = getStepSizeHelper().filterStep(next, true, false);
        }
      }
      ODEStateAndDerivative to =
          new ODEStateAndDerivative(start + getStepSize(), end, rates[Tableau.STEP_STAGES]);
      setStepStart(acceptStep(new DenseStep(terms, from, to, whole.getMapper()), finish));
      boolean nextIsLast = getStepStart().getTime() + next >= finish;
      next = getStepSizeHelper().filterStep(next, true, nextIsLast || isLastStep());
    }
    ODEStateAndDerivative reached = getStepStart();
    resetInternalState();
    return reached;
  }

  /** By how much the next step may be longer, or the next attempt has to be shorter. */
  private double growth(double error) {
    double wanted = getSafety() * Math.pow(error, -1.0 / getOrder());
    return Math.min(getMaxGrowth(), Math.max(getMinReduction(), wanted));
  }

  /** Tries a step and returns its error, which is small enough below 1. */
  private double attempt(Equations equations, double start, double[] state) {
    double length = getStepSize();
    for (int stage = 1; stage < Tableau.STEP_STAGES; stage++) {
      goTo(stage, state, within);
      evaluate(equations, stage, start + Tableau.time(stage) * length, within);
    }
    goTo(Tableau.STEP_STAGES, state, end);
    incrementEvaluations(Tableau.STEP_STAGES - 1);
    double error = estimateError(rates, state, end, length);
    if (Double.isNaN(error)) {
      throw new MathIllegalStateException(
          LocalizedODEFormats.NAN_APPEARING_DURING_INTEGRATION, start + length);
    }
    if (error >= 1) {
      return error;
    }
    evaluate(equations, Tableau.STEP_STAGES, start + length, end);
    for (int stage = Tableau.STEP_STAGES + 1; stage < Tableau.STAGES; stage++) {
      goTo(stage, state, within);
      evaluate(equations, stage, start + Tableau.time(stage) * length, within);
    }
    incrementEvaluations(Tableau.STAGES - Tableau.STEP_STAGES);
    terms = terms(state);
    return Math.max(error, errorInside(state));
  }

  private void goTo(int stage, double[] from, double[] to) {
    double length = getStepSize();
    for (int i = 0; i < states; i++) {
      to[i] = from[i] + length * Tableau.gain(stage, slopes[i]);
    }
  }

  private void evaluate(Equations equations, int stage, double time, double[] state) {
    equations.rates(time, state, rates[stage]);
    keep(stage, rates[stage]);
  }

  private void keep(int stage, double[] found) {
    for (int i = 0; i < states; i++) {
      rates[stage][i] = found[i];
      slopes[i][stage] = found[i];
    }
  }

  private double[] terms(double[] state) {
    double length = getStepSize();
    double[] found = new double[states * DenseStep.TERMS];
    for (int i = 0; i < states; i++) {
      int first = i * DenseStep.TERMS;
      found[first] = state[i];
      found[first + 1] = length * slopes[i][0];
      for (int power = 2; power < DenseStep.TERMS; power++) {
        found[first + power] = length * Tableau.term(power, slopes[i]);
      }
    }
    return found;
  }

  /** How far the dense output is from the last stage, against what is allowed. */
  private double errorInside(double[] state) {
    double theta = Tableau.time(Tableau.STAGES - 1);
    double worst = 0;
    for (int i = 0; i < states; i++) {
      double scale = Math.max(Math.abs(state[i]), Math.abs(end[i]));
      double allowed = INSIDE * getStepSizeHelper().getTolerance(i, scale);
      worst = Math.max(worst, Math.abs(DenseStep.value(terms, i, theta) - within[i]) / allowed);
    }
    return worst;
  }

  /** Without events to look for, a step is over when its handlers have seen it. */
  @Override
  protected ODEStateAndDerivative acceptStep(AbstractODEStateInterpolator step, double finish) {
    if (watchesEvents) {
      return super.acceptStep(step, finish);
    }
    ODEStateAndDerivative reached = step.getGlobalCurrentState();
    setIsLastStep(Math.abs(reached.getTime() - finish) < Math.ulp(finish));
    for (ODEStepHandler handler : getStepHandlers()) {
      handler.handleStep(step);
    }
    return reached;
  }
}
