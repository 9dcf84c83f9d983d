package org.rolltrace.ui.control;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.files.ScenarioDocument;

/**
 * A value of the scenario that a field shows and changes.
 *
 * @param path where it stands, such as {@code $.condition.pressureAltitude}
 * @param title what the field is called
 * @param word what changing it is called in undo, such as "height"
 * @param kind how its text is written
 * @param prompt an example
 * @param hint what it means, with its sign
 * @param columns width of the field in characters
 */
public record FieldTarget(
    String path, String title, String word, Kind kind, String prompt, String hint, int columns) {

  /** How a text is written into the file. */
  public enum Kind {
    /** As a text: a quantity with its unit, or words. */
    TEXT,
    /** As a plain number. */
    NUMBER,
    /** As a list of plain numbers. */
    NUMBERS
  }

  private static final String AEROPLANE = "$.aeroplane.";

  /**
   * A quantity with its unit, or words.
   *
   * @param path where it stands
   * @param title what the field is called
   * @param word what changing it is called in undo
   * @param prompt an example
   * @param hint what it means
   * @param columns width of the field in characters
   * @return the target
   */
  public static FieldTarget quantity(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.TEXT, prompt, hint, columns);
  }

  /**
   * A plain number.
   *
   * @param path where it stands
   * @param title what the field is called
   * @param word what changing it is called in undo
   * @param prompt an example
   * @param hint what it means
   * @param columns width of the field in characters
   * @return the target
   */
  public static FieldTarget number(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.NUMBER, prompt, hint, columns);
  }

  /**
   * A list of plain numbers.
   *
   * @param path where it stands
   * @param title what the field is called
   * @param word what changing it is called in undo
   * @param prompt an example
   * @param hint what it means
   * @param columns width of the field in characters
   * @return the target
   */
  public static FieldTarget numbers(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.NUMBERS, prompt, hint, columns);
  }

  /**
   * A name by which tests and style sheets find the field.
   *
   * @return the path without its signs
   */
  public String id() {
    return path.substring(2).replace('.', '-').replace("[", "-").replace("]", "");
  }

  private boolean ofAeroplane() {
    return path.startsWith(AEROPLANE);
  }

  private String inAeroplane() {
    return path.substring(AEROPLANE.length());
  }

  /**
   * What stands in a document.
   *
   * @param document the document
   * @return the text; empty when there is nothing
   */
  public Optional<String> textIn(ScenarioDocument document) {
    if (kind == Kind.NUMBERS) {
      return document.numbers(path);
    }
    return ofAeroplane() ? document.aeroplaneText(inAeroplane()) : document.text(path);
  }

  /**
   * Where faults of the value may be.
   *
   * @param document the document
   * @return the path; for a figure of the aeroplane also that of the variant that flies
   */
  public List<String> pathsIn(ScenarioDocument document) {
    return ofAeroplane() ? document.aeroplanePaths(inAeroplane()) : List.of(path);
  }

  /**
   * Writes a text; a figure of the aeroplane goes into the scenario's own copy of it.
   *
   * @param document the document
   * @param text what to write; nothing takes the value out
   * @return the edited document
   */
  public ScenarioDocument put(ScenarioDocument document, String text) {
    if (ofAeroplane() && kind != Kind.NUMBERS) {
      return text.isEmpty()
          ? document.withoutAeroplane(inAeroplane())
          : kind == Kind.TEXT
              ? document.withAeroplane(inAeroplane(), text)
              : document.withAeroplaneNumber(inAeroplane(), text);
    }
    if (text.isEmpty()) {
      return document.without(path);
    }
    return switch (kind) {
      case TEXT -> document.with(path, text);
      case NUMBER -> document.withNumber(path, text);
      case NUMBERS -> document.withNumbers(path, text);
    };
  }

  /**
   * Whether a text is what stands in a document, though it may be spaced in another way.
   *
   * @param document the document
   * @param text what may stand there
   * @return whether it does
   */
  public boolean says(ScenarioDocument document, String text) {
    return kind == Kind.NUMBERS
        ? put(document, text).equals(document)
        : text.equals(textIn(document).orElse(""));
  }
}
