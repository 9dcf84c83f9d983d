package org.rolltrace.core.files;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.scenario.AeroplaneData;

/** Reads aeroplane files. The package page has the format. */
public final class AeroplaneFile {
  private AeroplaneFile() {}

  /**
   * Reads an aeroplane with its derivatives, as its variants take it for their base.
   *
   * @param file an aeroplane file
   * @return the aeroplane, in SI units, radians and the conventions of the model
   * @throws FileFaultsException with all faults of the file, its variants included
   */
  public static AeroplaneData read(Path file) {
    return readAll(file).get("");
  }

  /**
   * Reads an aeroplane with all its variants.
   *
   * @param file an aeroplane file
   * @return the base under an empty name, then the variants by name, in the order of the file
   * @throws FileFaultsException with all faults of the file, if there are any
   */
  public static Map<String, AeroplaneData> readAll(Path file) {
    Faults faults = new Faults(file);
    Map<String, AeroplaneData> all = new LinkedHashMap<>();
    try {
      Optional<JsonValue.ObjectValue> object = JsonTree.read(TextFile.bytes(file), faults);
      if (object.isPresent()) {
        AeroplaneFormat.read(object.get(), AeroplaneFormat.IN_FILE, faults)
            .ifPresent(base -> all.put("", base));
        // On a base with faults each variant would repeat them.
        List<String> variants = faults.count() > 0 ? List.of() : Variants.names(object.get());
        for (String variant : variants) {
          AeroplaneFormat.readVariant(object.get(), variant, AeroplaneFormat.IN_FILE, faults)
              .ifPresent(data -> all.put(variant, data));
        }
      }
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    if (all.isEmpty() || faults.count() > 0) {
      throw faults.toException();
    }
    return all;
  }
}
