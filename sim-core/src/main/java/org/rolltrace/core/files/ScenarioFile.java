package org.rolltrace.core.files;

import java.nio.file.Path;
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
      scenario = read(TextFile.bytes(file), faults);
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    if (scenario.isEmpty() || faults.count() > 0) {
      throw faults.toException();
    }
    return scenario.get();
  }

  static Optional<Scenario> read(byte[] bytes, Faults faults) {
    Optional<JsonValue.ObjectValue> object = JsonTree.read(bytes, faults);
    return object.isPresent() ? ScenarioFormat.read(object.get(), faults) : Optional.empty();
  }

  /**
   * Writes a scenario: whole, or not at all. The path of its aeroplane file is written so that it
   * leads there from the new place.
   *
   * @param file where to; one that stands there is replaced
   * @param document what; it may have faults
   * @return the document as it stands there
   * @throws java.io.UncheckedIOException when it cannot be written; its message says what to do
   */
  public static ScenarioDocument write(Path file, ScenarioDocument document) {
    ScenarioDocument written = document.at(file);
    WholeFile.write(file, written.json());
    return written;
  }
}
