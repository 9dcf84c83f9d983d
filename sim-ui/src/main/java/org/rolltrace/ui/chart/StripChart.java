package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;

/** Strips below each other on one time axis. */
public final class StripChart {
  /** A left margin, px, with room for titles and figures. */
  public static final double LEFT = 124;

  /** A right margin, px, with room for the names of curves. */
  public static final double RIGHT = 96;

  /** Above each strip, for the words of its markers. */
  static final double WORDS = 18;

  /** Below the last strip, for the time axis. */
  static final double FOOT = 22;

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
    return draw(strips, ranges, window, new AxisTitle("Time", "s"), width, height, left, right);
  }

  /**
   * Draws strips on a common axis of something else than time.
   *
   * @param strips from above, at least one
   * @param ranges of the values, one a strip
   * @param window what is seen of the common axis
   * @param axis what it shows
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin, px: titles and figures stand there
   * @param right margin, px: names of curves stand there
   * @return the drawing
   */
  static Drawing draw(
      List<Strip> strips,
      List<ValueRange> ranges,
      TimeWindow window,
      AxisTitle axis,
      double width,
      double height,
      double left,
      double right) {
    int count = strips.size();
    if (count == 0 || ranges.size() != count) {
      throw new IllegalArgumentException(
          count + " strips and " + ranges.size() + " ranges; expected at least one, and as many");
    }
    double each = (height - FOOT) / count - WORDS;
    double across = width - left - right;
    if (!(each >= 1 && across >= 1)) {
      throw new IllegalArgumentException(
          "the chart is "
              + width
              + " by "
              + height
              + " px; expected room for "
              + count
              + " strips beside its margins");
    }
    List<Mark> marks = new ArrayList<>();
    List<PlotArea> areas = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      ValueRange range = ranges.get(i);
      PlotArea area =
          new PlotArea(
              left, i * (each + WORDS) + WORDS, across, each, window, range.low(), range.high());
      areas.add(area);
      new StripDrawing(strips.get(i), area, width, marks).draw();
    }
    addAxis(areas.get(count - 1), axis, marks);
    return new Drawing(new Sheet(width, height, marks), areas);
  }

  private static void addAxis(PlotArea lowest, AxisTitle axis, List<Mark> marks) {
    double base = lowest.y() + lowest.height() + 16;
    TimeWindow window = lowest.time();
    Ticks ticks = Ticks.ofTime(window, lowest.width());
    for (int i = 0; i < ticks.size(); i++) {
      marks.add(
          new Mark.Label(
              lowest.xOf(ticks.value(i)),
              base,
              ticks.figure(i),
              Anchor.MIDDLE,
              TypeSize.SMALL,
              Ink.QUIET));
    }
    axis.draw(0, base, marks);
  }
}
