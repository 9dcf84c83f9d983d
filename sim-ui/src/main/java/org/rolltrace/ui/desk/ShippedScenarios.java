package org.rolltrace.ui.desk;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * The scenarios that come with the program: the folder beside it where there is one, else copies
 * from inside the jar.
 */
final class ShippedScenarios {
  private static final String FIRST = "light-single-roll-entry.json";
  private static final String FOLDER = "scenarios";

  private ShippedScenarios() {}

  /** The scenario that a first look starts with. */
  static Path first(Path copies) {
    return folder(copies).resolve(FIRST);
  }

  /** The folder of the shipped scenarios; unpacked when none lies beside the program. */
  static Path folder(Path copies) {
    return besideTheProgram().orElseGet(() -> unpackedInto(copies.resolve(FOLDER)));
  }

  private static Optional<Path> besideTheProgram() {
    List<Path> places = new ArrayList<>();
    places.add(Path.of(FOLDER).toAbsolutePath());
    try {
      Path code =
          Path.of(
              ShippedScenarios.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      for (Path above = code.getParent(); above != null; above = above.getParent()) {
        places.add(above.resolve(FOLDER));
      }
    } catch (URISyntaxException | SecurityException noPlace) {
      // The program does not lie in the file system: the working directory is all there is.
      return places.stream().filter(ShippedScenarios::isOurs).findFirst();
    }
    return places.stream().filter(ShippedScenarios::isOurs).findFirst();
  }

  private static boolean isOurs(Path folder) {
    return Files.isRegularFile(folder.resolve(FIRST));
  }

  /** Copies what the jar carries; a file that is there already is the user's and stays. */
  private static Path unpackedInto(Path folder) {
    URL inside = ShippedScenarios.class.getResource(FOLDER);
    if (inside == null) {
      throw new IllegalStateException("the jar carries no scenarios; it was built incompletely");
    }
    try (FileSystem jar = FileSystems.newFileSystem(inside.toURI(), Map.of());
        Stream<Path> files = Files.walk(jar.provider().getPath(inside.toURI()))) {
      Path top = jar.provider().getPath(inside.toURI());
      for (Path file : files.filter(Files::isRegularFile).toList()) {
        Path place = folder.resolve(top.relativize(file).toString());
        if (!Files.exists(place)) {
          Files.createDirectories(place.getParent());
          Files.copy(file, place);
        }
      }
      return folder;
    } catch (IOException unwritable) {
      throw new UncheckedIOException(
          "the shipped scenarios cannot be copied into " + folder, unwritable);
    } catch (URISyntaxException impossible) {
      throw new IllegalStateException("the place of the scenarios is no address", impossible);
    }
  }

  /** The scenario files of a folder, by name. */
  static List<Path> scenariosIn(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files
          .filter(file -> file.toString().endsWith(".json"))
          .filter(file -> !file.toString().endsWith(".schema.json"))
          .sorted()
          .toList();
    } catch (IOException unreadable) {
      return List.of();
    }
  }
}
