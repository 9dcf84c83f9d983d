package org.rolltrace.core.files;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.FileTime;
import java.util.Optional;

/** The aeroplane file that a scenario names. What was read is kept until the file changes. */
final class NamedAeroplane {
  private Path readFrom;
  private FileTime time;
  private long size;
  private JsonNode.Group read;

  /**
   * What stands in the file.
   *
   * @param scenario the file of the scenario
   * @param name what it calls the aeroplane file
   * @throws FileFaultsException if the file cannot be read as a JSON object
   */
  synchronized JsonNode.Group object(Path scenario, String name) {
    Path file;
    try {
      file = scenario.resolveSibling(name);
    } catch (InvalidPathException e) {
      throw noPath(scenario, name);
    }
    Optional<BasicFileAttributes> now = attributes(file);
    if (read == null
        || !file.equals(readFrom)
        || now.isEmpty()
        || !now.get().lastModifiedTime().equals(time)
        || now.get().size() != size) {
      read = read(file);
      readFrom = file;
      time = now.map(BasicFileAttributes::lastModifiedTime).orElse(null);
      size = now.map(BasicFileAttributes::size).orElse(-1L);
    }
    return read;
  }

  static JsonNode.Group read(Path file) {
    Faults faults = new Faults(file);
    Optional<JsonValue.ObjectValue> object = Optional.empty();
    try {
      object = JsonTree.read(TextFile.bytes(file), faults);
    } catch (UnusableFileException e) {
      faults.addForWholeFile(e.getMessage());
    }
    return JsonNode.group(object.orElseThrow(faults::toException));
  }

  private static FileFaultsException noPath(Path scenario, String name) {
    Faults faults = new Faults(scenario);
    faults.add(
        new JsonValue.Place("$.aeroplane", 0, 0),
        Shown.text(name) + " is no path; expected one to an aeroplane file");
    return faults.toException();
  }

  private static Optional<BasicFileAttributes> attributes(Path file) {
    try {
      return Optional.of(Files.readAttributes(file, BasicFileAttributes.class));
    } catch (IOException e) {
      return Optional.empty(); // what is wrong with it shows when it is read
    }
  }

  /** The name by which the same aeroplane file goes in a scenario at another place. */
  static String seenFrom(Path newScenario, Path scenario, String name) {
    try {
      Path named = Path.of(name);
      Path from = folder(newScenario);
      if (name.isBlank() || named.isAbsolute() || from.equals(folder(scenario))) {
        return name;
      }
      Path file = folder(scenario).resolve(named);
      Path real = folder(file).resolve(file.getFileName());
      if (!real.getRoot().equals(from.getRoot())) {
        return real.toString(); // on another disk
      }
      return from.relativize(real).toString().replace('\\', '/');
    } catch (InvalidPathException e) {
      return name; // the fault that it is shows when it is read
    }
  }

  /** The folder of a file without links, so that going up from it leads where it seems to. */
  private static Path folder(Path file) {
    Path folder = file.toAbsolutePath().getParent();
    if (folder == null) {
      return file.toAbsolutePath();
    }
    try {
      return folder.toRealPath();
    } catch (IOException e) {
      return folder.normalize();
    }
  }
}
