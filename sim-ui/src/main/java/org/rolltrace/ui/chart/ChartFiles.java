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
import org.rolltrace.core.run.RunResult;

/** Writes the picture of a run. */
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
    Sheet sheet = StagePicture.draw(result, Optional.empty());
    Map<String, ResultFolder.Content> contents = new LinkedHashMap<>();
    contents.put(
        "stage.svg",
        out -> {
          Writer text = new OutputStreamWriter(out, StandardCharsets.UTF_8);
          SvgPainter.write(sheet, Palette.PRINT, text);
          text.flush();
        });
    contents.put("stage.png", out -> PngPainter.write(sheet, Palette.PRINT, SCALE, out));
    return ResultFolder.write(folder, contents);
  }
}
