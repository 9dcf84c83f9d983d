package org.rolltrace.core.pilot;

/**
 * A move to one side, then as far to the other, then back. Each of the three moves takes the same
 * time; the first two begin one width apart, and so do the last two.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size where it goes first, fraction of travel, −1 to 1
 * @param width from the beginning of one move to that of the next, s, at least {@code handTime}
 * @param handTime how long each move takes, s, 0 or more
 */
public record DoubletInput(double start, double size, double width, double handTime)
    implements InputShape {

  public DoubletInput {
    ShapeCheck.common(start, size, handTime);
    ShapeCheck.longerThanMovement("width, s,", width, handTime);
  }

  @Override
  public String name() {
    return "doublet";
  }

  @Override
  public double end() {
    return start + 2 * width + handTime;
  }

  @Override
  public boolean isHeld() {
    return false;
  }

  @Override
  public Movement movement() {
    return StraightMoves.of(
        handTime,
        new double[] {start, start + width, start + 2 * width},
        new double[] {size, -size, 0});
  }
}
