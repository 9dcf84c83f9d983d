package org.rolltrace.core.flight;

import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.pilot.Stroke;

/** Where the hand puts one control, between its stops. */
final class Travel {
  /** Beyond a stop by less than this is at it, fraction of travel: rounding, not a hand. */
  private static final double ROUNDING = 1e-9;

  private final Control control;
  private final Movement movement;
  private final double start;
  private final double low;
  private final double high;
  private Stroke stroke;
  private boolean onStop;

  /**
   * A travel.
   *
   * @param start where the control is before the hand moves it; may lie beyond a stop
   */
  Travel(Control control, Movement movement, double start, double low, double high) {
    this.control = control;
    this.movement = movement;
    this.stroke = movement;
    this.start = start;
    this.low = low;
    this.high = high;
  }

  /** Comes to a stretch between two breakpoints. */
  void enter(double time) {
    stroke = movement.from(time);
  }

  Control control() {
    return control;
  }

  boolean isMoved() {
    return movement.largestPosition() > 0;
  }

  boolean mayMeetStop() {
    return isMoved() && Math.max(start - high, low - start) + movement.largestPosition() > ROUNDING;
  }

  /** Above 0 while the hand wants more than the travel. */
  double beyondStop(double time) {
    double wanted = wanted(time);
    return Math.max(wanted - high, low - wanted) - ROUNDING;
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

  /** Where the hand wants it, stops or not. */
  double wanted(double time) {
    return start + stroke.positionAt(time);
  }

  double wantedRate(double time) {
    return stroke.rateAt(time);
  }

  double position(double time) {
    return Math.max(low, Math.min(high, wanted(time)));
  }
}
