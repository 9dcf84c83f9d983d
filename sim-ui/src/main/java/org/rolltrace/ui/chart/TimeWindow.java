package org.rolltrace.ui.chart;

import org.rolltrace.core.quantity.Check;

/**
 * The stretch of time that is seen.
 *
 * @param from s
 * @param to s, after {@code from}
 */
public record TimeWindow(double from, double to) {

  /** The shortest stretch that zooming in leads to, s. */
  public static final double SHORTEST = 0.05;

  public TimeWindow {
    Check.finite("start of the time window, s,", from);
    Check.finite("end of the time window, s,", to);
    if (!(to > from)) {
      throw new IllegalArgumentException(
          "time window ends at " + to + " s; expected after its start at " + from + " s");
    }
  }

  /**
   * Its length.
   *
   * @return s
   */
  public double length() {
    return to - from;
  }

  /**
   * The window nearer to an instant, or further from it, which keeps its place on the screen.
   *
   * @param time the instant, s
   * @param factor of the length, above 0: below 1 to see less
   * @return the window, never shorter than {@value #SHORTEST} s
   */
  public TimeWindow zoomedAt(double time, double factor) {
    Check.positive("zoom factor", factor);
    double sound = Math.max(factor, SHORTEST / length());
    return new TimeWindow(time - (time - from) * sound, time + (to - time) * sound);
  }

  /**
   * The window moved along.
   *
   * @param dt s, positive to later times
   * @return the window
   */
  public TimeWindow movedBy(double dt) {
    return new TimeWindow(from + dt, to + dt);
  }

  /**
   * The window moved, and shortened when it is too long, so that it lies in another.
   *
   * @param full what there is to see
   * @return the window
   */
  public TimeWindow clampedTo(TimeWindow full) {
    if (length() >= full.length()) {
      return full;
    }
    if (from < full.from) {
      return new TimeWindow(full.from, full.from + length());
    }
    return to > full.to ? new TimeWindow(full.to - length(), full.to) : this;
  }
}
