package org.rolltrace.ui.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import picocli.CommandLine;

/** A path among the arguments. */
final class PathArgument {
  private PathArgument() {}

  static Path of(CommandLine.Model.CommandSpec spec, String text) {
    if (text.isBlank()) {
      throw new CommandLine.ParameterException(
          spec.commandLine(), "An empty path; expected the name of a file or folder.");
    }
    try {
      return Path.of(text);
    } catch (InvalidPathException noPath) {
      throw new CommandLine.ParameterException(
          spec.commandLine(),
          "'"
              + text
              + "' is not a path on this system. Letters beyond ASCII in it need a locale that has"
              + " them, such as LC_ALL=C.UTF-8.");
    }
  }
}
