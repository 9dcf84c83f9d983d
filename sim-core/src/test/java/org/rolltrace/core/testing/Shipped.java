package org.rolltrace.core.testing;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.scenario.Scenario;

/** The scenarios that users get. */
public final class Shipped {
  private static final Path FOLDER = Path.of("..", "scenarios");

  private Shipped() {}

  /** Reads one by its name without the ending. */
  public static Scenario scenario(String name) {
    return ScenarioFile.read(FOLDER.resolve(name + ".json"));
  }

  /** All scenario files. */
  public static List<Path> scenarioFiles() {
    return jsonIn(FOLDER);
  }

  /** All aeroplane files. */
  public static List<Path> aeroplaneFiles() {
    return jsonIn(FOLDER.resolve("aeroplanes"));
  }

  private static List<Path> jsonIn(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files
          .filter(file -> file.toString().endsWith(".json"))
          .filter(file -> !file.toString().endsWith(".schema.json"))
          .sorted()
          .toList();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
