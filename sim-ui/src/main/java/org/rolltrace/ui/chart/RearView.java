package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;

/**
 * A plain aeroplane seen from behind, with a level line. The right tip is a disc, the left a ring.
 */
public final class RearView {
  // Corners in half spans, of the right half; y up.
  private static final double[][] WING = {
    {0, 0.05}, {1, 0.075}, {1, 0.045}, {0.1, -0.045}, {0, -0.05},
  };
  private static final double[][] TAILPLANE = {{0, 0.2}, {0.34, 0.2}, {0.34, 0.172}, {0, 0.165}};
  private static final double[][] FIN = {{0, 0.42}, {0.018, 0.42}, {0.035, 0.1}, {0, 0.1}};
  private static final double[][] BODY = bodyOutline();
  private static final double TIP_HEIGHT = 0.06;
  private static final double TIP_RADIUS = 0.065;

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
    double half = 0.5 * size / (1 + TIP_RADIUS);
    List<Mark> marks = new ArrayList<>();
    marks.add(
        new Mark.Line(
            x - 0.5 * size, y, x + 0.5 * size, y, new Stroke(Ink.AXIS, 1, Dash.DOTTED, 1)));
    for (double[][] part : List.of(FIN, TAILPLANE, WING, BODY)) {
      marks.add(outline(part, bank, x, y, half));
    }
    double[] right = turned(1, TIP_HEIGHT, bank);
    double[] left = turned(-1, TIP_HEIGHT, bank);
    double radius = Math.max(2, TIP_RADIUS * half);
    marks.add(new Mark.Dot(x + half * right[0], y + half * right[1], radius, Ink.RIGHT, true));
    marks.add(new Mark.Dot(x + half * left[0], y + half * left[1], radius, Ink.LEFT, false));
    return marks;
  }

  private static Mark outline(double[][] right, double bank, double x, double y, double half) {
    int count = right.length;
    double[] xs = new double[2 * count];
    double[] ys = new double[2 * count];
    for (int i = 0; i < count; i++) {
      double[] corner = turned(right[i][0], right[i][1], bank);
      double[] mirrored = turned(-right[i][0], right[i][1], bank);
      xs[i] = x + half * corner[0];
      ys[i] = y + half * corner[1];
      xs[2 * count - 1 - i] = x + half * mirrored[0];
      ys[2 * count - 1 - i] = y + half * mirrored[1];
    }
    return new Mark.Area(xs, ys, Ink.WING, 1);
  }

  /** From half spans, y up, to the screen, y down, turned clockwise by the bank. */
  private static double[] turned(double x, double up, double bank) {
    double cos = Math.cos(bank);
    double sin = Math.sin(bank);
    return new double[] {x * cos + up * sin, x * sin - up * cos};
  }

  private static double[][] bodyOutline() {
    int count = 13;
    double[][] outline = new double[count][];
    for (int i = 0; i < count; i++) {
      double angle = Math.PI * i / (count - 1);
      outline[i] = new double[] {0.105 * Math.sin(angle), 0.02 + 0.125 * Math.cos(angle)};
    }
    return outline;
  }
}
