package org.rolltrace.ui.desk;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
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

  private static Path unpackedInto(Path folder) {
    try (InputStream list = ShippedScenarios.class.getResourceAsStream("scenarios/list.txt")) {
      if (list == null) {
        throw new IllegalStateException("the jar carries no scenarios; it was built incompletely");
      }
      String names = new String(list.readAllBytes(), StandardCharsets.UTF_8);
      for (String name : names.lines().toList()) {
        Path place = folder.resolve(name);
        if (!Files.exists(place)) {
          Files.createDirectories(place.getParent());
          try (InputStream in = ShippedScenarios.class.getResourceAsStream("scenarios/" + name)) {
            Files.write(place, in.readAllBytes());
          }
        }
      }
      return folder;
    } catch (IOException unwritable) {
      throw new UncheckedIOException(
          "the shipped scenarios cannot be copied into " + folder, unwritable);
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
