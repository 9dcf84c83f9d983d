package org.rolltrace.core.files;

import java.nio.file.Path;

/**
 * One thing that is wrong in a file, and where.
 *
 * @param file the file, as it was named or as the naming file leads to it
 * @param jsonPath where in the file, such as {@code $.inputs[0].size}; {@code $} for all of it
 * @param line line from 1; 0 when the file as a whole is meant
 * @param column column from 1 in characters; 0 when the file as a whole is meant
 * @param message what was found, what was expected, and the way out; one line
 */
public record FileFault(Path file, String jsonPath, int line, int column, String message) {

  /**
   * The fault on one line.
   *
   * @return {@code file:line: path: message}, or {@code file: message} when the file as a whole is
   *     meant
   */
  @Override
  public String toString() {
    return line > 0 ? file + ":" + line + ": " + jsonPath + ": " + message : file + ": " + message;
  }
}
