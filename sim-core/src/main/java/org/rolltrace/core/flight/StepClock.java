package org.rolltrace.core.flight;

/**
 * A few samples in each step. Steps are short where the motion changes quickly, so that a cubic
 * from sample to sample follows it as well in four parts of a step as in hundredths of a second.
 */
final class StepClock implements SampleClock {
  private static final int MOST_PARTS = 4;

  /** Parts of a step need not be shorter than this, s. */
  private static final double SHORTEST_PART = 0.01;

  private double from;
  private double to;
  private int parts;
  private int part;

  @Override
  public void enter(double stepFrom, double stepTo) {
    from = stepFrom;
    to = stepTo;
    parts = (int) Math.min(MOST_PARTS, Math.ceil((to - from) / SHORTEST_PART));
    part = 1;
  }

  @Override
  public double due() {
    if (part < parts) {
      return from + (to - from) * part / parts;
    }
    return part == parts ? to : Double.POSITIVE_INFINITY;
  }

  @Override
  public void advance() {
    part++;
  }

  @Override
  public void pass(double time) {
    // the end of each step is a sample already
  }
}
