package org.rolltrace.ui.chart;

/**
 * A quantity against time.
 *
 * @param name what stands at its end
 * @param time s, not falling; not to be changed by anyone
 * @param value as many, finite; not to be changed by anyone
 * @param stroke how it is drawn
 */
// Thousands of points: boxed lists would cost too much.
@SuppressWarnings("ArrayRecordComponent")
public record Curve(String name, double[] time, double[] value, Stroke stroke) {

  public Curve {
    if (time.length != value.length) {
      throw new IllegalArgumentException(
          name
              + " has "
              + time.length
              + " times and "
              + value.length
              + " values; expected as many");
    }
  }
}
