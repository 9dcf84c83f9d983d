package org.rolltrace.ui.control;

import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.TextAlignment;
import org.rolltrace.ui.chart.Dash;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Mark;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.Sheet;
import org.rolltrace.ui.chart.Stroke;
import org.rolltrace.ui.chart.TypeSize;

/** Paints the drawings that window and paper share onto a canvas. */
public final class CanvasPainter {
  /** The family of type. */
  public static final String FAMILY = "DejaVu Sans";

  /** What places may be off by, px. */
  private static final double ROUNDING = 1e-6;

  private final GraphicsContext canvas;
  private final Palette palette;

  /**
   * A painter.
   *
   * @param canvas what it paints on
   * @param palette the colours
   */
  public CanvasPainter(GraphicsContext canvas, Palette palette) {
    this.canvas = canvas;
    this.palette = palette;
    canvas.setLineCap(StrokeLineCap.ROUND);
    canvas.setLineJoin(StrokeLineJoin.ROUND);
    canvas.setTextBaseline(VPos.BASELINE);
  }

  /**
   * A colour.
   *
   * @param palette the colours of all inks
   * @param ink the role
   * @param opacity 0 to 1
   * @return the colour
   */
  public static Color colour(Palette palette, Ink ink, double opacity) {
    int rgb = palette.rgb(ink);
    return Color.rgb((rgb >> 16) & 0xff, (rgb >> 8) & 0xff, rgb & 0xff, opacity);
  }

  /**
   * Paints a sheet.
   *
   * @param sheet the drawing
   * @param x of its upper left corner, px
   * @param y of its upper left corner, px
   */
  public void paint(Sheet sheet, double x, double y) {
    canvas.save();
    canvas.translate(x, y);
    sheet.marks().forEach(this::paint);
    canvas.restore();
  }

  /**
   * Paints a mark.
   *
   * @param mark the mark
   */
  public void paint(Mark mark) {
    if (mark instanceof Mark.Line line) {
      stroke(line.stroke());
      canvas.strokeLine(line.x1(), line.y1(), line.x2(), line.y2());
    } else if (mark instanceof Mark.Polyline curve) {
      stroke(curve.stroke());
      canvas.strokePolyline(curve.x(), curve.y(), curve.x().length);
    } else if (mark instanceof Mark.Area area) {
      canvas.setFill(colour(palette, area.ink(), area.opacity()));
      canvas.fillPolygon(area.x(), area.y(), area.x().length);
    } else if (mark instanceof Mark.Label label) {
      paintLabel(label);
    } else if (mark instanceof Mark.Dot dot) {
      paintDot(dot);
    } else if (mark instanceof Mark.Clip clip) {
      paintClip(clip);
    }
  }

  /**
   * Clipping costs the renderer more than all the rest, so it is left out where nothing needs it.
   */
  private void paintClip(Mark.Clip clip) {
    if (clip.marks().stream().allMatch(mark -> isInside(mark, clip))) {
      clip.marks().forEach(this::paint);
      return;
    }
    canvas.save();
    canvas.beginPath();
    canvas.rect(clip.x(), clip.y(), clip.width(), clip.height());
    canvas.clip();
    clip.marks().forEach(this::paint);
    canvas.restore();
  }

  /** Whether a mark lies in the rectangle, but for the width of its strokes and its letters. */
  private static boolean isInside(Mark mark, Mark.Clip clip) {
    if (mark instanceof Mark.Line line) {
      return isInside(line.x1(), line.y1(), clip) && isInside(line.x2(), line.y2(), clip);
    } else if (mark instanceof Mark.Polyline curve) {
      return areInside(curve.x(), curve.y(), clip);
    } else if (mark instanceof Mark.Area area) {
      return areInside(area.x(), area.y(), clip);
    } else if (mark instanceof Mark.Label label) {
      return isInside(label.x(), label.y(), clip);
    } else if (mark instanceof Mark.Dot dot) {
      return isInside(dot.x(), dot.y(), clip);
    }
    return false;
  }

  private static boolean areInside(double[] x, double[] y, Mark.Clip clip) {
    for (int i = 0; i < x.length; i++) {
      if (!isInside(x[i], y[i], clip)) {
        return false;
      }
    }
    return true;
  }

  private static boolean isInside(double x, double y, Mark.Clip clip) {
    return x >= clip.x() - ROUNDING
        && x <= clip.x() + clip.width() + ROUNDING
        && y >= clip.y() - ROUNDING
        && y <= clip.y() + clip.height() + ROUNDING;
  }

  private void stroke(Stroke stroke) {
    canvas.setStroke(colour(palette, stroke.ink(), stroke.opacity()));
    canvas.setLineWidth(stroke.width());
    canvas.setLineDashes(dashes(stroke.dash(), stroke.width()));
  }

  private static double[] dashes(Dash dash, double width) {
    double unit = Math.max(1, width);
    return switch (dash) {
      case SOLID -> new double[0];
      case DASHED -> new double[] {5 * unit, 4 * unit};
      case DOTTED -> new double[] {0.5 * unit, 3 * unit};
      case DASH_DOT -> new double[] {6 * unit, 3 * unit, 0.5 * unit, 3 * unit};
    };
  }

  private void paintLabel(Mark.Label label) {
    canvas.setFill(colour(palette, label.ink(), 1));
    canvas.setFont(font(label.size()));
    canvas.setTextAlign(
        switch (label.anchor()) {
          case START -> TextAlignment.LEFT;
          case MIDDLE -> TextAlignment.CENTER;
          case END -> TextAlignment.RIGHT;
        });
    canvas.fillText(label.text(), label.x(), label.y());
  }

  /**
   * The type of a size.
   *
   * @param size the size
   * @return the font
   */
  public static Font font(TypeSize size) {
    return Font.font(FAMILY, size.pixels());
  }

  private void paintDot(Mark.Dot dot) {
    double d = 2 * dot.radius();
    if (dot.filled()) {
      canvas.setFill(colour(palette, dot.ink(), 1));
      canvas.fillOval(dot.x() - dot.radius(), dot.y() - dot.radius(), d, d);
    } else {
      stroke(Stroke.of(dot.ink(), 1.2));
      canvas.strokeOval(dot.x() - dot.radius(), dot.y() - dot.radius(), d, d);
    }
  }
}
