package org.rolltrace.ui.chart;

import java.util.List;

/** Strips below each other on one time axis. */
public final class StripChart {
  /** A left margin, px, with room for titles and figures. */
  public static final double LEFT = 124;

  /** A right margin, px, with room for the names of curves. */
  public static final double RIGHT = 84;

  private StripChart() {}

  /**
   * What was drawn.
   *
   * @param sheet the drawing
   * @param areas where values stand, one a strip, from above
   */
  public record Drawing(Sheet sheet, List<PlotArea> areas) {
    public Drawing {
      areas = List.copyOf(areas);
    }
  }

  /**
   * Draws strips, each over the range of what it shows.
   *
   * @param strips from above, at least one
   * @param window the time that is seen
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin, px: titles and figures stand there
   * @param right margin, px: names of curves stand there
   * @return the drawing
   */
  public static Drawing draw(
      List<Strip> strips,
      TimeWindow window,
      double width,
      double height,
      double left,
      double right) {
    return draw(
        strips,
        strips.stream().map(strip -> ValueRange.of(strip, window)).toList(),
        window,
        width,
        height,
        left,
        right);
  }

  /**
   * Draws strips over given ranges.
   *
   * @param strips from above, at least one
   * @param ranges of the values, one a strip
   * @param window the time that is seen
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin, px: titles and figures stand there
   * @param right margin, px: names of curves stand there
   * @return the drawing
   */
  public static Drawing draw(
      List<Strip> strips,
      List<ValueRange> ranges,
      TimeWindow window,
      double width,
      double height,
      double left,
      double right) {
    return new Drawing(new Sheet(width, height, List.of()), List.of());
  }
}
