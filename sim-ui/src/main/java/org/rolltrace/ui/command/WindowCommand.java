package org.rolltrace.ui.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Opens the window. */
@Command(
    name = "window",
    description = "Opens the window: edit a scenario, see the roll at once, replay and compare.",
    mixinStandardHelpOptions = true,
    versionProvider = Program.class)
final class WindowCommand implements Callable<Integer> {
  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(
      paramLabel = "SCENARIO",
      arity = "0..1",
      description = "A scenario file (JSON); a shipped one when none is given.")
  private String scenario;

  private final WindowOpener opener;

  WindowCommand(WindowOpener opener) {
    this.opener = opener;
  }

  @Override
  public Integer call() {
    Optional<Path> file;
    try {
      file = Optional.ofNullable(scenario).map(Path::of);
    } catch (InvalidPathException noPath) {
      throw new CommandLine.ParameterException(
          spec.commandLine(), "'" + scenario + "' is not a path on this system.");
    }
    try {
      opener.open(file);
    } catch (UnsupportedOperationException noDisplay) {
      spec.commandLine()
          .getErr()
          .println(
              "The window cannot be opened: "
                  + noDisplay.getMessage()
                  + ". It needs a display and, on a bare Linux, the packages libgtk-3-0, libgl1,"
                  + " libxtst6, libxxf86vm1 and a font such as fonts-dejavu-core. The command line"
                  + " works without.");
      return ExitCode.FAILED;
    }
    return ExitCode.DONE;
  }
}
