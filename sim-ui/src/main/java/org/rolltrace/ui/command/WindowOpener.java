package org.rolltrace.ui.command;

import java.nio.file.Path;
import java.util.Optional;

/** Opens the window; the command line itself knows no window toolkit. */
@FunctionalInterface
public interface WindowOpener {

  /**
   * Opens the window and returns when it is closed.
   *
   * @param scenario the file to open, or empty for the one a first look starts with
   * @throws UnsupportedOperationException when there is no display to open it on; its message says
   *     so
   */
  void open(Optional<Path> scenario);
}
