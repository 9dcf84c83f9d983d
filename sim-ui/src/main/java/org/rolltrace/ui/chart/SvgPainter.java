package org.rolltrace.ui.chart;

import java.io.IOException;
import java.io.Writer;

/** Paints sheets as SVG. */
public final class SvgPainter {
  private SvgPainter() {}

  /**
   * Paints a sheet.
   *
   * @param sheet the drawing
   * @param palette its colours
   * @param out receives the document, to be encoded as UTF-8
   * @throws IOException when {@code out} fails
   */
  public static void write(Sheet sheet, Palette palette, Writer out) throws IOException {}
}
