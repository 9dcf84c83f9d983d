package org.rolltrace.ui.desk;

import java.nio.file.Path;
import java.util.Optional;
import javafx.application.Application;

/** Starts the window from a program that is not itself a window application. */
public final class DeskLauncher {
  private DeskLauncher() {}

  /**
   * Opens the window and returns when it is closed.
   *
   * @param scenario the file to open, or empty for a shipped one
   * @throws UnsupportedOperationException when there is no display
   */
  public static void open(Optional<Path> scenario) {
    Application.launch(
        DeskApplication.class,
        scenario.map(file -> new String[] {file.toString()}).orElse(new String[0]));
  }
}
