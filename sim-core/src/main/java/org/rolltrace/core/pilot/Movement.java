package org.rolltrace.core.pilot;

/** A position against time that is smooth between its breakpoints. */
public interface Movement extends Stroke {

  /** A control that stays where it is trimmed. */
  Movement NONE = StraightMoves.of(0, new double[0], new double[0]);

  /**
   * The position at an instant; at a jump, the one after it.
   *
   * @param time s
   * @return fraction of travel, to be added to the trimmed position
   */
  @Override
  double positionAt(double time);

  /**
   * The rate of the position at an instant; at a breakpoint, the one after it.
   *
   * @param time s
   * @return fraction of travel per second
   */
  @Override
  double rateAt(double time);

  /**
   * The movement from an instant to the next breakpoint, which is quicker to look up than the
   * whole.
   *
   * @param start s
   * @return the movement from start on, up to the breakpoint after it
   */
  Stroke from(double start);

  /**
   * The instants at which the position or its rate jumps.
   *
   * @return times, s, increasing; a copy
   */
  double[] breakpoints();

  /**
   * A bound of the position's size over all time.
   *
   * @return a fraction of travel that the position never exceeds in size
   */
  double largestPosition();
}
