package org.rolltrace.ui.chart;

import java.io.IOException;
import java.io.Writer;

/** Paints sheets as SVG. */
public final class SvgPainter {
  private final Palette palette;
  private final StringBuilder text = new StringBuilder();

  private SvgPainter(Palette palette) {
    this.palette = palette;
  }

  /**
   * Paints a sheet.
   *
   * @param sheet the drawing
   * @param palette its colours
   * @param out receives the document, to be encoded as UTF-8
   * @throws IOException when {@code out} fails
   */
  public static void write(Sheet sheet, Palette palette, Writer out) throws IOException {
    SvgPainter painter = new SvgPainter(palette);
    painter.document(sheet);
    out.write(painter.text.toString());
  }

  private void document(Sheet sheet) {
    // Whole numbers: some readers of SVG take no others here.
    long width = (long) Math.ceil(sheet.width());
    long height = (long) Math.ceil(sheet.height());
    text.append("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n")
        .append("<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"" + width)
        .append("\" height=\"" + height + "\" viewBox=\"0 0 " + width + " " + height)
        .append("\" font-family=\"'DejaVu Sans', sans-serif\">\n<rect width=\"" + width)
        .append("\" height=\"" + height + "\" fill=\"" + colour(Ink.GROUND) + "\"/>\n");
    sheet.marks().forEach(this::paint);
    text.append("</svg>\n");
  }

  private void paint(Mark mark) {
    // Java 17 has no switch over types.
    if (mark instanceof Mark.Line line) {
      text.append("<line");
      number("x1", line.x1());
      number("y1", line.y1());
      number("x2", line.x2());
      number("y2", line.y2());
      stroke(line.stroke());
      text.append("/>\n");
    } else if (mark instanceof Mark.Polyline line) {
      text.append("<polyline");
      points(line.x(), line.y());
      stroke(line.stroke());
      text.append(" fill=\"none\" stroke-linejoin=\"round\"/>\n");
    } else if (mark instanceof Mark.Area area) {
      text.append("<polygon");
      points(area.x(), area.y());
      attribute("fill", colour(area.ink()));
      number("fill-opacity", area.opacity());
      text.append("/>\n");
    } else if (mark instanceof Mark.Label label) {
      text.append("<text");
      number("x", label.x());
      number("y", label.y());
      number("font-size", label.size().pixels());
      attribute(
          "text-anchor",
          switch (label.anchor()) {
            case START -> "start";
            case MIDDLE -> "middle";
            case END -> "end";
          });
      attribute("fill", colour(label.ink()));
      text.append('>').append(escaped(label.text())).append("</text>\n");
    } else if (mark instanceof Mark.Dot dot) {
      text.append("<circle");
      number("cx", dot.x());
      number("cy", dot.y());
      number("r", dot.radius());
      attribute("fill", colour(dot.filled() ? dot.ink() : Ink.GROUND));
      if (!dot.filled()) {
        attribute("stroke", colour(dot.ink()));
        number("stroke-width", Mark.Dot.RING);
      }
      text.append("/>\n");
    } else if (mark instanceof Mark.Clip clip) {
      // An inner svg element clips without an id that could meet another one in a longer document.
      text.append("<svg overflow=\"hidden\"");
      number("x", clip.x());
      number("y", clip.y());
      number("width", clip.width());
      number("height", clip.height());
      attribute(
          "viewBox",
          figure(clip.x())
              + " "
              + figure(clip.y())
              + " "
              + figure(clip.width())
              + " "
              + figure(clip.height()));
      text.append(">\n");
      clip.marks().forEach(this::paint);
      text.append("</svg>\n");
    }
  }

  private void stroke(Stroke stroke) {
    attribute("stroke", colour(stroke.ink()));
    number("stroke-width", stroke.width());
    if (stroke.opacity() < 1) {
      number("stroke-opacity", stroke.opacity());
    }
    double[] lengths = stroke.dash().lengths();
    if (lengths.length > 0) {
      text.append(" stroke-dasharray=\"");
      for (int i = 0; i < lengths.length; i++) {
        text.append(i == 0 ? "" : " ").append(figure(lengths[i]));
      }
      text.append('"');
    }
  }

  private void points(double[] x, double[] y) {
    text.append(" points=\"");
    for (int i = 0; i < x.length; i++) {
      text.append(i == 0 ? "" : " ").append(figure(x[i])).append(',').append(figure(y[i]));
    }
    text.append('"');
  }

  private void number(String name, double value) {
    attribute(name, figure(value));
  }

  private void attribute(String name, String value) {
    text.append(' ').append(name).append("=\"").append(value).append('"');
  }

  /** To a hundredth, without idle zeros. */
  private static String figure(double value) {
    long hundredths = Math.round(value * 100);
    long whole = Math.abs(hundredths) / 100;
    long rest = Math.abs(hundredths) % 100;
    String digits =
        rest == 0 ? "" : rest % 10 == 0 ? "." + rest / 10 : (rest < 10 ? ".0" : ".") + rest;
    return (hundredths < 0 ? "-" : "") + whole + digits;
  }

  private String colour(Ink ink) {
    String digits = Integer.toHexString(palette.rgb(ink));
    return "#" + "0".repeat(6 - digits.length()) + digits;
  }

  /** Also without the control characters that XML 1.0 cannot hold. */
  private static String escaped(String plain) {
    StringBuilder safe = new StringBuilder();
    plain
        .codePoints()
        .forEach(
            point -> {
              switch (point) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                default -> {
                  boolean surrogate =
                      point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE;
                  boolean allowed =
                      point >= ' ' && !surrogate && point != 0xFFFE && point != 0xFFFF;
                  safe.appendCodePoint(allowed ? point : 0xFFFD);
                }
              }
            });
    return safe.toString();
  }
}
