package org.rolltrace.ui.launch;

/** Starts the program. */
public final class Main {
  private Main() {}

  /**
   * Runs the program.
   *
   * @param arguments the command line
   */
  public static void main(String[] arguments) {
    System.exit(2);
  }
}
