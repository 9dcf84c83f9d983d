package org.rolltrace.ui.chart;

import org.rolltrace.core.quantity.Check;

/**
 * A rectangle of a sheet in which values stand against time.
 *
 * @param x of its left edge, px
 * @param y of its upper edge, px
 * @param width px, above 0
 * @param height px, above 0
 * @param time from the left edge to the right one
 * @param low the value at the lower edge
 * @param high the value at the upper edge, above {@code low}
 */
public record PlotArea(
    double x, double y, double width, double height, TimeWindow time, double low, double high) {

  public PlotArea {
    Check.positive("plot width, px,", width);
    Check.positive("plot height, px,", height);
    if (!(high > low)) {
      throw new IllegalArgumentException(
          "the upper edge stands for " + high + "; expected more than " + low);
    }
  }

  /**
   * Where an instant stands.
   *
   * @param instant s
   * @return px
   */
  public double xOf(double instant) {
    return x + (instant - time.from()) / time.length() * width;
  }

  /**
   * Which instant stands at a place.
   *
   * @param px x
   * @return s
   */
  public double timeAt(double px) {
    return time.from() + (px - x) / width * time.length();
  }

  /**
   * Where a value stands.
   *
   * @param value in the unit of the plot
   * @return px
   */
  public double yOf(double value) {
    return y + (high - value) / (high - low) * height;
  }

  /**
   * Which value stands at a place.
   *
   * @param px y
   * @return in the unit of the plot
   */
  public double valueAt(double px) {
    return high - (px - y) / height * (high - low);
  }
}
