package org.rolltrace.core.files;

import java.nio.file.Path;
import java.util.Optional;
import org.rolltrace.core.scenario.Scenario;

/** Reads scenario files, with the aeroplane files they name. The package page has the format. */
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
      Optional<JsonValue.ObjectValue> object = JsonTree.read(TextFile.bytes(file), faults);
      if (object.isPresent()) {
        scenario = ScenarioFormat.read(object.get(), faults);
      }
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    if (scenario.isEmpty() || faults.count() > 0) {
      throw faults.toException();
    }
    return scenario.get();
  }

  /**
   * Writes a scenario.
   *
   * @param file where to
   * @param document what
   * @return the document as it stands there
   */
  public static ScenarioDocument write(Path file, ScenarioDocument document) {
    return document.at(file);
  }
}
