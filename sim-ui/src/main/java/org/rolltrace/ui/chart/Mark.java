package org.rolltrace.ui.chart;

import java.util.List;

/** A mark on a sheet. Coordinates are px, x to the right, y down. */
// Lines of thousands of points: boxed lists would cost too much.
@SuppressWarnings("ArrayRecordComponent")
public sealed interface Mark {

  /**
   * The mark somewhere else.
   *
   * @param dx px to the right
   * @param dy px down
   * @return the mark, moved
   */
  Mark movedBy(double dx, double dy);

  /**
   * A straight line.
   *
   * @param x1 its beginning
   * @param y1 its beginning
   * @param x2 its end
   * @param y2 its end
   * @param stroke how it is drawn; ends cut square
   */
  record Line(double x1, double y1, double x2, double y2, Stroke stroke) implements Mark {
    @Override
    public Mark movedBy(double dx, double dy) {
      return new Line(x1 + dx, y1 + dy, x2 + dx, y2 + dy, stroke);
    }
  }

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

    @Override
    public Mark movedBy(double dx, double dy) {
      return new Polyline(shifted(x, dx), shifted(y, dy), stroke);
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

    @Override
    public Mark movedBy(double dx, double dy) {
      return new Area(shifted(x, dx), shifted(y, dy), ink, opacity);
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
      implements Mark {
    @Override
    public Mark movedBy(double dx, double dy) {
      return new Label(x + dx, y + dy, text, anchor, size, ink);
    }
  }

  /**
   * A round dot.
   *
   * @param x of its centre
   * @param y of its centre
   * @param radius px
   * @param ink its colour
   * @param filled whether it is a disc; else a ring of line width {@link #RING} filled with the
   *     ground
   */
  record Dot(double x, double y, double radius, Ink ink, boolean filled) implements Mark {
    /** The line width of a ring, px. */
    public static final double RING = 1.5;

    @Override
    public Mark movedBy(double dx, double dy) {
      return new Dot(x + dx, y + dy, radius, ink, filled);
    }
  }

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

    @Override
    public Mark movedBy(double dx, double dy) {
      return new Clip(
          x + dx, y + dy, width, height, marks.stream().map(mark -> mark.movedBy(dx, dy)).toList());
    }
  }

  private static void checkLengths(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          x.length + " values of x and " + y.length + " of y; expected as many");
    }
  }

  private static double[] shifted(double[] values, double by) {
    double[] shifted = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      shifted[i] = values[i] + by;
    }
    return shifted;
  }
}
