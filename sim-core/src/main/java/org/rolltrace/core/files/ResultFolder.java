package org.rolltrace.core.files;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.DerivedAeroplane;
import org.rolltrace.core.run.RunResult;

/**
 * Writes the files of a result into a folder: all of them whole, or none. Each is first written
 * beside its place under another name, and takes its place only when all are complete.
 */
public final class ResultFolder {
  private ResultFolder() {}

  /** Writes one file. */
  @FunctionalInterface
  public interface Content {
    /**
     * Writes it.
     *
     * @param out receives the bytes, closed by the caller
     * @throws IOException when {@code out} fails
     */
    void write(OutputStream out) throws IOException;
  }

  /**
   * Writes {@code history.csv} and {@code result.json}.
   *
   * @param folder made when it does not exist
   * @param result what is written
   * @param producedBy the program and its version
   * @return the files written
   * @throws UncheckedIOException when the folder or a file cannot be written; its message says what
   *     to do
   */
  public static List<Path> write(Path folder, RunResult result, String producedBy) {
    Map<String, Content> contents = new LinkedHashMap<>();
    contents.put("history.csv", text(out -> HistoryCsv.write(result.history(), out)));
    contents.put("result.json", text(out -> ResultJson.write(result, producedBy, out)));
    return write(folder, contents);
  }

  /**
   * Writes {@code derivatives.json}, and {@code loadings.csv} for each aeroplane whose shape is
   * known.
   *
   * @param folder made when it does not exist
   * @param report what is written
   * @param producedBy the program and its version
   * @return the files written
   * @throws UncheckedIOException when the folder or a file cannot be written; its message says what
   *     to do
   */
  public static List<Path> write(Path folder, DerivativeReport report, String producedBy) {
    Map<String, Content> contents = new LinkedHashMap<>();
    contents.put("derivatives.json", text(out -> DerivativesJson.write(report, producedBy, out)));
    for (DerivedAeroplane derived : report.all()) {
      derived
          .shape()
          .ifPresent(
              shape ->
                  contents.put(
                      LoadingsCsv.fileName(report, derived),
                      text(out -> LoadingsCsv.write(shape.loads(), out))));
    }
    return write(folder, contents);
  }

  /** Writes a text. */
  @FunctionalInterface
  private interface Text {
    void write(Writer out) throws IOException;
  }

  private static Content text(Text text) {
    return out -> {
      Writer writer = new OutputStreamWriter(out, StandardCharsets.UTF_8);
      text.write(writer);
      writer.flush();
    };
  }

  /**
   * Writes files of any content.
   *
   * @param folder made when it does not exist
   * @param contents by file name, written in the order of the map
   * @return the files written
   * @throws UncheckedIOException when the folder or a file cannot be written; its message says what
   *     to do
   */
  public static List<Path> write(Path folder, Map<String, Content> contents) {
    Map<Path, Path> places = new LinkedHashMap<>();
    String writer = ProcessHandle.current().pid() + "-" + System.nanoTime();
    try {
      Files.createDirectories(folder);
      for (Map.Entry<String, Content> entry : contents.entrySet()) {
        Path draft = folder.resolve("." + entry.getKey() + "." + writer + ".part");
        places.put(draft, folder.resolve(entry.getKey()));
        try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(draft))) {
          entry.getValue().write(out);
        }
      }
      for (Path place : places.values()) {
        if (Files.isDirectory(place)) {
          throw new FileSystemException(place.toString(), null, place + " is a folder");
        }
      }
      for (Map.Entry<Path, Path> place : places.entrySet()) {
        WholeFile.move(place.getKey(), place.getValue());
      }
      return new ArrayList<>(places.values());
    } catch (IOException failure) {
      throw new UncheckedIOException(
          "cannot write the result into "
              + folder
              + ": "
              + WholeFile.reason(failure)
              + "; choose a folder that you may write to, with room on its disk",
          failure);
    } finally {
      deleteDrafts(places);
    }
  }

  private static void deleteDrafts(Map<Path, Path> places) {
    for (Path draft : places.keySet()) {
      try {
        Files.deleteIfExists(draft);
      } catch (IOException stays) {
        // The failure that is being reported says what is wrong with the folder.
      }
    }
  }
}
