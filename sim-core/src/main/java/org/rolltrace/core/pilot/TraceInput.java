package org.rolltrace.core.pilot;

import org.rolltrace.core.quantity.Check;

/**
 * A recorded movement, flown again: straight from sample to sample, at the trimmed position before
 * the first and where the last one leaves it after that.
 *
 * @param shift what is added to its times, s, 0 or more
 * @param scale what its positions are multiplied by, −1 to 1
 * @param trace what was recorded; scaled it stays within −1 to 1, shifted it begins at 0 s or later
 */
public record TraceInput(double shift, double scale, Trace trace) implements InputShape {

  public TraceInput {
    Check.notNegative("start, s,", shift);
    Check.inRange("size, a factor,", scale, -1, 1);
    Check.notNegative("time of the first sample, shifted, s,", shift + trace.time(0));
    Check.inRange("largest position, scaled, fraction of travel,", scale * trace.largest(), -1, 1);
  }

  @Override
  public String name() {
    return "trace";
  }

  /**
   * Where the recorded hand first leaves the trimmed position; its first sample if it never does.
   */
  @Override
  public double start() {
    int away = trace.firstAway();
    return shift + trace.time(away == trace.size() ? 0 : Math.max(0, away - 1));
  }

  /** 0: the movement is as recorded. */
  @Override
  public double handTime() {
    return 0;
  }

  /** The largest position of all, counted positive when the hand first goes to the right. */
  @Override
  public double size() {
    int away = trace.firstAway();
    return away == trace.size()
        ? 0
        : Math.signum(scale * trace.position(away)) * Math.abs(scale) * trace.largest();
  }

  @Override
  public double end() {
    return scale != 0 && trace.firstBack() == trace.size()
        ? Double.POSITIVE_INFINITY
        : shift + trace.time(trace.firstBack() % trace.size());
  }

  @Override
  public boolean isHeld() {
    return false;
  }

  @Override
  public Movement movement() {
    double[] times = trace.times();
    double[] positions = trace.positions();
    for (int i = 0; i < times.length; i++) {
      times[i] += shift;
      positions[i] *= scale;
    }
    return StraightMoves.through(times, positions);
  }
}
