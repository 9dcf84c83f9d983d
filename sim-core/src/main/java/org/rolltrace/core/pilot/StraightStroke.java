package org.rolltrace.core.pilot;

/**
 * A stroke at one rate.
 *
 * @param start an instant, s
 * @param position where the control is then, fraction of travel
 * @param rate fraction of travel per second
 */
record StraightStroke(double start, double position, double rate) implements Stroke {
  static final StraightStroke REST = new StraightStroke(0, 0, 0);

  @Override
  public double positionAt(double time) {
    return position + rate * (time - start);
  }

  @Override
  public double rateAt(double time) {
    return rate;
  }
}
