package org.rolltrace.ui.chart;

import java.util.List;

/** A plain aeroplane seen from behind. */
public final class RearView {
  private RearView() {}

  /**
   * Draws it in a square whose upper left corner is the origin.
   *
   * @param bank rad, right wing down positive
   * @param size side of the square, px: the span fills it
   * @return the marks
   */
  public static List<Mark> draw(double bank, double size) {
    return draw(bank, 0.5 * size, 0.5 * size, size);
  }

  /**
   * Draws it around a point.
   *
   * @param bank rad, right wing down positive
   * @param x of its centre, px
   * @param y of its centre, px
   * @param size its span, px
   * @return the marks
   */
  public static List<Mark> draw(double bank, double x, double y, double size) {
    return List.of();
  }
}
