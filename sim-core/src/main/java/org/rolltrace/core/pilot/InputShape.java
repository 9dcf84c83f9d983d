package org.rolltrace.core.pilot;

/** The shape of one input on one control. */
public interface InputShape {

  /** How long a hand takes for a move when nothing is said, s. */
  double DEFAULT_MOVEMENT = 0.1;

  /**
   * The name in scenario files and results, such as {@code step}.
   *
   * @return the name
   */
  String name();

  /**
   * When the hand begins to move.
   *
   * @return s
   */
  double start();

  /**
   * How long the hand takes for a move.
   *
   * @return s; 0 for a jump, and for a shape that is itself the movement
   */
  double handTime();

  /**
   * How far the input goes, to the side to which it goes first.
   *
   * @return fraction of travel, or of the rated power; right or more power positive, −1 to 1
   */
  double size();

  /**
   * When the input is over: back at the trimmed position for good, or never.
   *
   * @return s; positive infinity for an input that stays
   */
  double end();

  /**
   * Whether the input is meant to be held until a steady rate is reached; a doublet is not.
   *
   * @return true for a step, a ramp and a hold
   */
  boolean isHeld();

  /**
   * The movement against time.
   *
   * @return the movement
   */
  Movement movement();
}
