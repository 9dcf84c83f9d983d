package org.rolltrace.ui.launch;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import org.rolltrace.ui.command.CommandLineProgram;
import org.rolltrace.ui.desk.DeskLauncher;

/** Starts the program. */
public final class Main {
  private Main() {}

  /**
   * Runs the program and ends with its exit code.
   *
   * @param arguments the command line
   */
  public static void main(String[] arguments) {
    // Standard output and error in UTF-8 whatever the locale: under LANG=C others print "?".
    PrintWriter out = utf8(FileDescriptor.out);
    PrintWriter err = utf8(FileDescriptor.err);
    int exitCode = CommandLineProgram.run(arguments, out, err, DeskLauncher::open);
    out.flush();
    err.flush();
    System.exit(exitCode);
  }

  private static PrintWriter utf8(FileDescriptor stream) {
    return new PrintWriter(
        new OutputStreamWriter(new FileOutputStream(stream), StandardCharsets.UTF_8), false);
  }
}
