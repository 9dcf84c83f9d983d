package org.rolltrace.core.files;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.scenario.Scenario;

/**
 * Reads and writes scenario files, with the aeroplane files they name. The package page has the
 * format.
 */
public final class ScenarioFile {
  private ScenarioFile() {}

  /**
   * Reads a scenario.
   *
   * @param file a scenario file; an aeroplane file that it names is sought from its directory
   * @return the scenario, in SI units and radians
   * @throws FileFaultsException with all faults of both files, if there are any
   */
  public static Scenario read(Path file) {
    Faults faults = new Faults(file);
    Optional<Scenario> scenario = Optional.empty();
    try {
      scenario = read(TextFile.bytes(file), faults, Map.of());
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    if (scenario.isEmpty() || faults.count() > 0) {
      throw faults.toException();
    }
    return scenario.get();
  }

  /**
   * Reads a scenario.
   *
   * @param carried texts of trace files, by their names in the scenario, that are in no file yet
   */
  static Optional<Scenario> read(byte[] bytes, Faults faults, Map<String, String> carried) {
    Optional<JsonValue.ObjectValue> object = JsonTree.read(bytes, faults);
    return object.isPresent()
        ? ScenarioFormat.read(object.get(), faults, carried)
        : Optional.empty();
  }

  /**
   * Writes a scenario: whole, or not at all. The path of its aeroplane file is written so that it
   * leads there from the new place. Traces that the document {@linkplain
   * ScenarioDocument#carriedTraces carries} are written beside it first, under another name where
   * another file has theirs.
   *
   * @param file where to; one that stands there is replaced
   * @param document what; it may have faults
   * @return the document as it stands there; it carries nothing any more
   * @throws java.io.UncheckedIOException when it cannot be written; its message says what to do
   */
  public static ScenarioDocument write(Path file, ScenarioDocument document) {
    ScenarioDocument written = document.at(file).withFreeTraceNames();
    List<Path> made = new ArrayList<>();
    try {
      for (Map.Entry<String, String> trace : written.carriedTraces().entrySet()) {
        Path place = file.resolveSibling(trace.getKey());
        if (!Files.exists(place)) {
          WholeFile.write(place, trace.getValue());
          made.add(place);
        }
      }
      WholeFile.write(file, written.json());
    } catch (UncheckedIOException failure) {
      made.forEach(ScenarioFile::takeBack);
      throw failure;
    }
    return written.carrying(Map.of());
  }

  private static void takeBack(Path made) {
    try {
      Files.deleteIfExists(made);
    } catch (IOException stays) {
      // A trace that nobody names harms nobody; the failure that is being reported says the rest.
    }
  }
}
