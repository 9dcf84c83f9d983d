package org.rolltrace.ui.chart;

import java.util.List;

/** A mark on a sheet. Coordinates are px, x to the right, y down. */
// Lines of thousands of points: boxed lists would cost too much.
@SuppressWarnings("ArrayRecordComponent")
public sealed interface Mark {

  /**
   * A straight line.
   *
   * @param x1 its beginning
   * @param y1 its beginning
   * @param x2 its end
   * @param y2 its end
   * @param stroke how it is drawn; ends cut square
   */
  record Line(double x1, double y1, double x2, double y2, Stroke stroke) implements Mark {}

  /**
   * A line through points.
   *
   * @param x of its points; not to be changed by anyone
   * @param y of its points, as many; not to be changed by anyone
   * @param stroke how it is drawn; corners round
   */
  record Polyline(double[] x, double[] y, Stroke stroke) implements Mark {
    public Polyline {
      checkLengths(x, y);
    }
  }

  /**
   * A filled outline, closed from the last point to the first, by the non-zero rule.
   *
   * @param x of its corners; not to be changed by anyone
   * @param y of its corners, as many; not to be changed by anyone
   * @param ink its colour
   * @param opacity 0 to 1
   */
  record Area(double[] x, double[] y, Ink ink, double opacity) implements Mark {
    public Area {
      checkLengths(x, y);
    }
  }

  /**
   * A text on one line.
   *
   * @param x of its anchor
   * @param y of its base line
   * @param text what it says
   * @param anchor which of its points stands at x
   * @param size of the type
   * @param ink its colour
   */
  record Label(double x, double y, String text, Anchor anchor, TypeSize size, Ink ink)
      implements Mark {}

  /**
   * A round dot.
   *
   * @param x of its centre
   * @param y of its centre
   * @param radius px
   * @param ink its colour
   * @param filled whether it is a disc; else a ring of line width 1.5 filled with the ground
   */
  record Dot(double x, double y, double radius, Ink ink, boolean filled) implements Mark {}

  /**
   * Marks of which only what lies in a rectangle is seen.
   *
   * @param x of its left edge
   * @param y of its upper edge
   * @param width px
   * @param height px
   * @param marks what is drawn inside, in the coordinates of the sheet
   */
  record Clip(double x, double y, double width, double height, List<Mark> marks) implements Mark {
    public Clip {
      marks = List.copyOf(marks);
    }
  }

  private static void checkLengths(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          x.length + " values of x and " + y.length + " of y; expected as many");
    }
  }
}
