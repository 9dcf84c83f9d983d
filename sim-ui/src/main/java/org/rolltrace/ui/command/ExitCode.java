package org.rolltrace.ui.command;

/** The exit codes. */
final class ExitCode {
  static final int DONE = 0;
  static final int BAD_INPUT = 2;
  static final int FAILED = 3;

  private ExitCode() {}
}
