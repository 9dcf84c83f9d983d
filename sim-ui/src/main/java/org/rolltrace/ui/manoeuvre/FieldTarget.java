package org.rolltrace.ui.manoeuvre;

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
record FieldTarget(
    String path, String title, String word, Kind kind, String prompt, String hint, int columns) {

  /** How a text is written into the file. */
  enum Kind {
    /** As a text: a quantity with its unit, or words. */
    TEXT,
    /** As a plain number. */
    NUMBER,
    /** As a list of plain numbers. */
    NUMBERS
  }

  private static final String AEROPLANE = "$.aeroplane.";

  static FieldTarget quantity(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.TEXT, prompt, hint, columns);
  }

  static FieldTarget number(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.NUMBER, prompt, hint, columns);
  }

  static FieldTarget numbers(
      String path, String title, String word, String prompt, String hint, int columns) {
    return new FieldTarget(path, title, word, Kind.NUMBERS, prompt, hint, columns);
  }

  /** A name by which tests and style sheets find the field. */
  String id() {
    return path.substring(2).replace('.', '-').replace("[", "-").replace("]", "");
  }

  private boolean ofAeroplane() {
    return path.startsWith(AEROPLANE);
  }

  Optional<String> textIn(ScenarioDocument document) {
    if (kind == Kind.NUMBERS) {
      return document.numbers(path);
    }
    return ofAeroplane()
        ? document.aeroplaneText(path.substring(AEROPLANE.length()))
        : document.text(path);
  }

  /** Writes a text; a figure of the aeroplane makes the scenario's own copy of it first. */
  ScenarioDocument put(ScenarioDocument document, String text) {
    ScenarioDocument base =
        ofAeroplane() && !document.aeroplaneIsInline() ? document.withAeroplaneInline() : document;
    if (text.isEmpty()) {
      return base.without(path);
    }
    return switch (kind) {
      case TEXT -> base.with(path, text);
      case NUMBER -> base.withNumber(path, text);
      case NUMBERS -> base.withNumbers(path, text);
    };
  }

  /** Whether a text is what stands in the document, though it may be spaced in another way. */
  boolean says(ScenarioDocument document, String text) {
    return kind == Kind.NUMBERS
        ? put(document, text).equals(document)
        : text.equals(textIn(document).orElse(""));
  }
}
