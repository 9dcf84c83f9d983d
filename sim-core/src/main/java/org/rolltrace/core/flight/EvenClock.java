package org.rolltrace.core.flight;

/**
 * Even samples, at k/rate exactly, and as many between them as measures need where few are asked
 * for.
 */
final class EvenClock implements SampleClock {
  /** Measures are read off at least this many samples a second. */
  private static final double LEAST_RATE = 100;

  private final double rate;
  private final int perEven;
  private int even;
  private int between;
  private double due;

  EvenClock(double rate) {
    this.rate = rate;
    this.perEven = (int) Math.max(1, Math.ceil(LEAST_RATE / rate));
  }

  /** All samples of a second, even or not. */
  double samplesPerSecond() {
    return rate * perEven;
  }

  @Override
  public void enter(double from, double to) {
    // samples come when they are due, whatever the steps
  }

  @Override
  public double due() {
    return due;
  }

  @Override
  public void advance() {
    between++;
    if (between == perEven) {
      between = 0;
      even++;
    }
    due = between == 0 ? even / rate : (even * perEven + between) / (rate * perEven);
  }

  @Override
  public void pass(double time) {
    if (due <= time) {
      advance();
    }
  }
}
