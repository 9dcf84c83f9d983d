package org.rolltrace.ui.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import javax.imageio.ImageIO;
import javax.imageio.stream.ImageOutputStream;
import javax.imageio.stream.MemoryCacheImageOutputStream;
import org.rolltrace.core.quantity.Check;

/** Paints sheets as PNG. */
public final class PngPainter {
  static {
    // A picture needs no screen, and there may be none; must be said before the first picture.
    if (System.getProperty("java.awt.headless") == null) {
      System.setProperty("java.awt.headless", "true");
    }
  }

  private final Palette palette;
  private final Graphics2D graphics;
  private final String family;

  private PngPainter(Palette palette, Graphics2D graphics) {
    this.palette = palette;
    this.graphics = graphics;
    String wanted = "DejaVu Sans";
    // A font that is not there turns into one of another name.
    boolean there = new Font(wanted, Font.PLAIN, 10).getFamily().equals(wanted);
    this.family = there ? wanted : Font.SANS_SERIF;
  }

  /**
   * Paints a sheet.
   *
   * @param sheet the drawing
   * @param palette its colours
   * @param scale px of the picture to one of the sheet, above 0
   * @param out receives the file
   * @throws IOException when {@code out} fails
   */
  public static void write(Sheet sheet, Palette palette, double scale, OutputStream out)
      throws IOException {
    Check.positive("scale of the picture", scale);
    BufferedImage image =
        new BufferedImage(
            (int) Math.ceil(sheet.width() * scale),
            (int) Math.ceil(sheet.height() * scale),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    try {
      graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      graphics.setRenderingHint(
          RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
      graphics.setRenderingHint(
          RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
      graphics.setRenderingHint(
          RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
      graphics.setColor(new Color(palette.rgb(Ink.GROUND)));
      graphics.fillRect(0, 0, image.getWidth(), image.getHeight());
      graphics.scale(scale, scale);
      new PngPainter(palette, graphics).paint(sheet.marks());
    } finally {
      graphics.dispose();
    }
    // In memory: the usual way wants to write a temporary file.
    try (ImageOutputStream png = new MemoryCacheImageOutputStream(out)) {
      if (!ImageIO.write(image, "png", png)) {
        throw new IOException(
            "this Java runtime cannot write PNG; use one with its desktop module");
      }
    }
  }

  private void paint(List<Mark> marks) {
    marks.forEach(this::paint);
  }

  private void paint(Mark mark) {
    if (mark instanceof Mark.Line line) {
      use(line.stroke());
      graphics.draw(new Line2D.Double(line.x1(), line.y1(), line.x2(), line.y2()));
    } else if (mark instanceof Mark.Polyline line) {
      if (line.x().length > 0) {
        use(line.stroke());
        graphics.draw(path(line.x(), line.y()));
      }
    } else if (mark instanceof Mark.Area area) {
      if (area.x().length > 0) {
        use(area.ink(), area.opacity());
        Path2D outline = path(area.x(), area.y());
        outline.closePath();
        graphics.fill(outline);
      }
    } else if (mark instanceof Mark.Label label) {
      use(label.ink(), 1);
      Font font = new Font(family, Font.PLAIN, 1).deriveFont((float) label.size().pixels());
      graphics.setFont(font);
      double width =
          graphics.getFontMetrics(font).getStringBounds(label.text(), graphics).getWidth();
      double start =
          switch (label.anchor()) {
            case START -> label.x();
            case MIDDLE -> label.x() - 0.5 * width;
            case END -> label.x() - width;
          };
      graphics.drawString(label.text(), (float) start, (float) label.y());
    } else if (mark instanceof Mark.Dot dot) {
      Ellipse2D circle =
          new Ellipse2D.Double(
              dot.x() - dot.radius(), dot.y() - dot.radius(), 2 * dot.radius(), 2 * dot.radius());
      use(dot.filled() ? dot.ink() : Ink.GROUND, 1);
      graphics.fill(circle);
      if (!dot.filled()) {
        use(Stroke.of(dot.ink(), Mark.Dot.RING));
        graphics.draw(circle);
      }
    } else if (mark instanceof Mark.Clip clip) {
      Shape before = graphics.getClip();
      graphics.clip(new Rectangle2D.Double(clip.x(), clip.y(), clip.width(), clip.height()));
      paint(clip.marks());
      graphics.setClip(before);
    }
  }

  private static Path2D path(double[] x, double[] y) {
    Path2D path = new Path2D.Double(Path2D.WIND_NON_ZERO, x.length);
    path.moveTo(x[0], y[0]);
    for (int i = 1; i < x.length; i++) {
      path.lineTo(x[i], y[i]);
    }
    return path;
  }

  private void use(Stroke stroke) {
    use(stroke.ink(), stroke.opacity());
    double[] lengths = stroke.dash().lengths();
    float[] dashes = new float[lengths.length];
    for (int i = 0; i < lengths.length; i++) {
      dashes[i] = (float) lengths[i];
    }
    graphics.setStroke(
        new BasicStroke(
            (float) stroke.width(),
            BasicStroke.CAP_BUTT,
            BasicStroke.JOIN_ROUND,
            10,
            dashes.length == 0 ? null : dashes,
            0));
  }

  private void use(Ink ink, double opacity) {
    int rgb = palette.rgb(ink);
    graphics.setColor(
        new Color(rgb >> 16 & 0xFF, rgb >> 8 & 0xFF, rgb & 0xFF, (int) Math.round(255 * opacity)));
  }
}
