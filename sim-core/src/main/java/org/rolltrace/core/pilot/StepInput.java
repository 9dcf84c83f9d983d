package org.rolltrace.core.pilot;

/**
 * A move to one position, which stays.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size where it goes, fraction of travel, −1 to 1
 * @param handTime how long the move takes, s, 0 or more
 */
public record StepInput(double start, double size, double handTime) implements InputShape {

  public StepInput {
    ShapeCheck.common(start, size, handTime);
  }

  @Override
  public String name() {
    return "step";
  }

  @Override
  public double end() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public boolean isHeld() {
    return true;
  }

  @Override
  public Movement movement() {
    return StraightMoves.of(handTime, new double[] {start}, new double[] {size});
  }
}
