package org.rolltrace.ui.desk;

import javafx.application.Application;

/**
 * Starts {@link WindowBenchmark} from the class path, where an application class may not be first.
 */
public final class RunWindowBenchmark {
  private RunWindowBenchmark() {}

  /**
   * Measures and prints.
   *
   * @param arguments none
   */
  public static void main(String[] arguments) {
    Application.launch(WindowBenchmark.class, arguments);
  }
}
