package org.rolltrace.ui.chart;

import java.io.IOException;
import java.io.OutputStream;

/** Paints sheets as PNG. */
public final class PngPainter {
  private PngPainter() {}

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
      throws IOException {}
}
