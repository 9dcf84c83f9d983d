package org.rolltrace.core.pilot;

import org.rolltrace.core.quantity.Check;

/**
 * A slow move to one position, which stays. The hand takes the whole duration for it.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size where it goes, fraction of travel, −1 to 1
 * @param duration how long it takes to get there, s, above 0
 */
public record RampInput(double start, double size, double duration) implements InputShape {

  public RampInput {
    ShapeCheck.common(start, size, 0);
    Check.positive("duration, s,", duration);
  }

  @Override
  public String name() {
    return "ramp";
  }

  @Override
  public double handTime() {
    return duration;
  }

  @Override
  public double end() {
    return Double.POSITIVE_INFINITY;
  }

  /** From the end of the ramp on. */
  @Override
  public boolean isHeld() {
    return true;
  }

  @Override
  public Movement movement() {
    return StraightMoves.of(duration, new double[] {start}, new double[] {size});
  }
}
