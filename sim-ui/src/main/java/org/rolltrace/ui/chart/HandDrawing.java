package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;

/**
 * Where a control is in its travel, to be moved by a hand: a bed from stop to stop with marks at
 * each quarter, a notch where it is trimmed, a band from there to the knob.
 */
public final class HandDrawing {
  /** Room for the knob beyond either stop, px. */
  public static final double INSET = 16;

  private static final double WORDS = 16;
  private static final double KNOB = 7;

  private HandDrawing() {}

  /**
   * Draws a control in a rectangle whose upper left corner is the origin.
   *
   * @param title such as {@code Stick}
   * @param position fraction of travel, right positive, −1 to 1
   * @param trim where it is at rest, fraction of travel
   * @param width of the rectangle, px
   * @param height of the rectangle, px
   * @return the marks
   */
  public static List<Mark> draw(
      String title, double position, double trim, double width, double height) {
    List<Mark> marks = new ArrayList<>();
    double top = WORDS;
    double bottom = height - WORDS;
    double middle = 0.5 * (top + bottom);
    double left = xOf(-1, width);
    double right = xOf(1, width);
    marks.add(
        new Mark.Area(
            new double[] {left, right, right, left},
            new double[] {top, top, bottom, bottom},
            Ink.PANEL,
            1));
    for (double at : new double[] {-1, -0.5, 0, 0.5, 1}) {
      double x = xOf(at, width);
      boolean stop = Math.abs(at) == 1;
      marks.add(
          new Mark.Line(x, top, x, bottom, Stroke.of(stop ? Ink.LIMIT : Ink.GRID, stop ? 2 : 1)));
      marks.add(
          new Mark.Label(
              x, height - 3, Ticks.figure(100 * at, 0), Anchor.MIDDLE, TypeSize.SMALL, Ink.QUIET));
    }
    marks.add(new Mark.Line(left, middle, right, middle, Stroke.of(Ink.AXIS, 1)));
    double from = xOf(trim, width);
    double to = xOf(position, width);
    double half = 0.24 * (bottom - top);
    Ink ink = position < trim ? Ink.LEFT : Ink.RIGHT;
    marks.add(
        new Mark.Area(
            new double[] {from, to, to, from},
            new double[] {middle - half, middle - half, middle + half, middle + half},
            ink,
            0.45));
    marks.add(new Mark.Line(from, top, from, bottom, new Stroke(Ink.MARKER, 1.4, Dash.DOTTED, 1)));
    marks.add(new Mark.Line(to, top + 2, to, bottom - 2, Stroke.of(Ink.CURSOR, 3)));
    marks.add(new Mark.Dot(to, middle, KNOB, Ink.CURSOR, true));
    marks.add(new Mark.Label(left, 11, title, Anchor.START, TypeSize.NORMAL, Ink.TEXT));
    marks.add(
        new Mark.Label(
            right,
            11,
            Ticks.figure(100 * position, 0) + " % of travel",
            Anchor.END,
            TypeSize.SMALL,
            Ink.QUIET));
    return marks;
  }

  private static double xOf(double position, double width) {
    return 0.5 * width + position * (0.5 * width - INSET);
  }

  /**
   * The position that stands at a place.
   *
   * @param x px from the left edge
   * @param width of the rectangle, px
   * @return fraction of travel; beyond a stop more than 1 in size
   */
  public static double positionAt(double x, double width) {
    return (x - 0.5 * width) / (0.5 * width - INSET);
  }
}
