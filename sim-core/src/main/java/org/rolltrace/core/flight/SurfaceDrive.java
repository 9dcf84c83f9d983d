package org.rolltrace.core.flight;

import java.util.Optional;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.controls.SurfaceMode;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.pilot.Stroke;

/**
 * One control and its surface during a flight. A surface with a rate limit or a lag has its angle
 * as a state; one without is where the control puts it.
 */
final class SurfaceDrive {
  /** Beyond a stop by less than this is at it, fraction of travel: rounding, not a hand. */
  private static final double ROUNDING = 1e-9;

  private final Control control;
  private final Optional<ControlRun> run;
  private final Movement movement;
  private final double trimPosition;
  private final double trimAngle;
  private final int stateIndex;
  private Stroke stroke;
  private SurfaceMode mode = SurfaceMode.FOLLOWING;
  private boolean onStop;

  /**
   * A drive.
   *
   * @param nextState the index of the next free state, which this drive takes if it needs one
   */
  SurfaceDrive(
      Control control,
      Optional<ControlRun> run,
      Movement movement,
      double trimPosition,
      double trimAngle,
      int nextState) {
    this.control = control;
    this.run = run;
    this.movement = movement;
    this.stroke = movement;
    this.trimPosition = trimPosition;
    this.trimAngle = trimAngle;
    this.stateIndex = run.isPresent() && !run.get().dynamics().isDirect() ? nextState : -1;
  }

  Control control() {
    return control;
  }

  boolean hasState() {
    return stateIndex >= 0;
  }

  boolean hasRateLimit() {
    return hasState() && dynamics().rateLimit() != Double.POSITIVE_INFINITY;
  }

  boolean mayMeetStop() {
    return run.isPresent()
        && movement.largestPosition() > 0
        && Math.abs(trimPosition) + movement.largestPosition() > 1 + ROUNDING;
  }

  /** Above 0 while the hand wants more than the travel. */
  double beyondStop(double time) {
    return Math.abs(wanted(time)) - 1 - ROUNDING;
  }

  boolean isOnStop() {
    return onStop;
  }

  void setOnStop(boolean reached) {
    onStop = reached;
  }

  /** Whether a jump has just put the control on its stop, or taken it off. */
  boolean meetsOrLeavesStop(double time) {
    boolean before = onStop;
    onStop = mayMeetStop() && beyondStop(time) > 0;
    return onStop != before;
  }

  /** Where the hand wants the control, stops or not. */
  double wanted(double time) {
    return trimPosition + stroke.positionAt(time);
  }

  private double demand(double time) {
    return demandFor(wanted(time));
  }

  private double demandFor(double wanted) {
    return run.isPresent() ? run.get().angleAt(wanted) : trimAngle;
  }

  private double demandRate(double time) {
    return run.orElseThrow().angleRateAt(wanted(time), stroke.rateAt(time));
  }

  /** The angle of the surface, with the control wanted at a position. */
  double angle(double wanted, double[] state) {
    return hasState() ? state[stateIndex] : demandFor(wanted);
  }

  /** Puts the surface where the trimmed control holds it. */
  void initialise(double[] state) {
    if (hasState()) {
      state[stateIndex] = run.orElseThrow().angleAt(trimPosition);
    }
  }

  private SurfaceDynamics dynamics() {
    return run.orElseThrow().dynamics();
  }

  /** Comes to a stretch between two breakpoints. */
  void enter(double start) {
    stroke = movement.from(start);
  }

  boolean isSlewing() {
    return mode == SurfaceMode.SLEWING_UP || mode == SurfaceMode.SLEWING_DOWN;
  }

  void chooseMode(double time, double[] state) {
    if (hasState()) {
      mode = SurfaceMode.of(dynamics(), demand(time), demandRate(time), state[stateIndex]);
    }
  }

  void switchMode(double time, double[] state) {
    mode = mode.next(dynamics(), demand(time), demandRate(time), state[stateIndex]);
  }

  double switching(double time, double[] state) {
    return mode.switching(dynamics(), demand(time), demandRate(time), state[stateIndex]);
  }

  void rate(double time, double[] state, double[] rates) {
    if (hasState()) {
      rates[stateIndex] = mode.rate(dynamics(), demand(time), demandRate(time), state[stateIndex]);
    }
  }
}
