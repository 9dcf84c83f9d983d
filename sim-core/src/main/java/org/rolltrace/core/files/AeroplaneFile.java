package org.rolltrace.core.files;

import java.nio.file.Path;
import java.util.Optional;
import org.rolltrace.core.scenario.AeroplaneData;

/** Reads aeroplane files. The package page has the format. */
public final class AeroplaneFile {
  private AeroplaneFile() {}

  /**
   * Reads an aeroplane with its derivatives.
   *
   * @param file an aeroplane file
   * @return the aeroplane, in SI units, radians and the conventions of the model
   * @throws FileFaultsException with all faults of the file, if there are any
   */
  public static AeroplaneData read(Path file) {
    Faults faults = new Faults(file);
    Optional<AeroplaneData> data = Optional.empty();
    try {
      data = read(TextFile.bytes(file), faults);
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    if (data.isEmpty() || faults.count() > 0) {
      throw faults.toException();
    }
    return data.get();
  }

  static Optional<AeroplaneData> read(byte[] bytes, Faults faults) {
    Optional<JsonValue.ObjectValue> object = JsonTree.read(bytes, faults);
    return object.isPresent()
        ? AeroplaneFormat.read(object.get(), AeroplaneFormat.IN_FILE, faults)
        : Optional.empty();
  }
}
