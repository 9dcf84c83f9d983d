package org.rolltrace.ui.chart;

import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.files.ResultFolder;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.RunResult;

/** Writes pictures of runs and of derivatives. */
public final class ChartFiles {
  /** Two px to one of the sheet: sharp on paper at the width of a page. */
  private static final double SCALE = 2;

  private ChartFiles() {}

  /**
   * Writes {@code stage.svg} and {@code stage.png}: both whole, or none.
   *
   * @param folder made when it does not exist
   * @param result what is drawn
   * @return the files written
   * @throws java.io.UncheckedIOException when the folder or a file cannot be written; its message
   *     says what to do
   */
  public static List<Path> write(Path folder, RunResult result) {
    Map<String, ResultFolder.Content> contents = new LinkedHashMap<>();
    add(contents, "stage", StagePicture.draw(result, Optional.empty()));
    return ResultFolder.write(folder, contents);
  }

  /**
   * Whether there is anything to draw of derivatives.
   *
   * @param report the derivatives
   * @return whether the shape of the base or of a variant is known
   */
  public static boolean hasShape(DerivativeReport report) {
    return report.all().stream().anyMatch(derived -> derived.shape().isPresent());
  }

  /**
   * Writes {@code shape} and {@code loadings}, each as SVG and PNG: all whole, or none.
   *
   * @param folder made when it does not exist
   * @param report what is drawn; at least one shape of it is known
   * @return the files written
   * @throws java.io.UncheckedIOException when the folder or a file cannot be written; its message
   *     says what to do
   */
  public static List<Path> write(Path folder, DerivativeReport report) {
    Map<String, ResultFolder.Content> contents = new LinkedHashMap<>();
    add(contents, "shape", ShapePicture.draw(report));
    add(contents, "loadings", LoadingsPicture.draw(report));
    return ResultFolder.write(folder, contents);
  }

  private static void add(Map<String, ResultFolder.Content> contents, String name, Sheet sheet) {
    contents.put(
        name + ".svg",
        out -> {
          Writer text = new OutputStreamWriter(out, StandardCharsets.UTF_8);
          SvgPainter.write(sheet, Palette.PRINT, text);
          text.flush();
        });
    contents.put(name + ".png", out -> PngPainter.write(sheet, Palette.PRINT, SCALE, out));
  }
}
