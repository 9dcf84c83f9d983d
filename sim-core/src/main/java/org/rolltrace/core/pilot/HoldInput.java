package org.rolltrace.core.pilot;

/**
 * A move to one position, held, and then back.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size where it goes, fraction of travel, −1 to 1
 * @param duration from the start to the beginning of the return, s, at least {@code handTime}
 * @param handTime how long each move takes, s, 0 or more
 */
public record HoldInput(double start, double size, double duration, double handTime)
    implements InputShape {

  public HoldInput {
    ShapeCheck.common(start, size, handTime);
    ShapeCheck.longerThanMovement("duration, s,", duration, handTime);
  }

  @Override
  public String name() {
    return "hold";
  }

  @Override
  public double end() {
    return start + duration + handTime;
  }

  @Override
  public boolean isHeld() {
    return true;
  }

  @Override
  public Movement movement() {
    return StraightMoves.of(
        handTime, new double[] {start, start + duration}, new double[] {size, 0});
  }
}
