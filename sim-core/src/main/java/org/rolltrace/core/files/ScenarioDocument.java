package org.rolltrace.core.files;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.rolltrace.core.scenario.Scenario;

/** A scenario file as it is written, to be edited. Immutable. */
public final class ScenarioDocument {
  private final String json;
  private final Path file;

  private ScenarioDocument(String json, Path file) {
    this.json = json;
    this.file = file;
  }

  /** What reading makes of a document. */
  public record Check(Optional<Scenario> scenario, List<FileFault> faults) {
    public Check {
      faults = List.copyOf(faults);
    }
  }

  public static ScenarioDocument open(Path file) {
    return new ScenarioDocument("", file);
  }

  public static ScenarioDocument ofText(String json, Path directory) {
    return new ScenarioDocument(json, directory.resolve("unsaved scenario"));
  }

  public Optional<String> text(String path) {
    return Optional.empty();
  }

  public ScenarioDocument with(String path, String text) {
    return this;
  }

  public ScenarioDocument withNumber(String path, String digits) {
    return this;
  }

  public ScenarioDocument without(String path) {
    return this;
  }

  public int inputCount() {
    return 0;
  }

  public ScenarioDocument withInputAdded(String control, String shape, double startSeconds) {
    return this;
  }

  public ScenarioDocument withoutInput(int index) {
    return this;
  }

  public ScenarioDocument withInputShape(int index, String shape) {
    return this;
  }

  public ScenarioDocument mirrored() {
    return this;
  }

  public boolean aeroplaneIsInline() {
    return false;
  }

  public ScenarioDocument withAeroplaneInline() {
    return this;
  }

  public Optional<String> aeroplaneText(String path) {
    return Optional.empty();
  }

  /** The same scenario as it would stand in another file. */
  public ScenarioDocument at(Path newFile) {
    return new ScenarioDocument(json, newFile);
  }

  public String json() {
    return json;
  }

  public Check check() {
    return new Check(Optional.empty(), List.of());
  }

  /** The path of a fault as seen from the document; below {@code $.aeroplane} for its file. */
  public String pathOf(FileFault fault) {
    return fault.jsonPath();
  }

  public Path directory() {
    return file.toAbsolutePath().getParent();
  }
}
