package org.rolltrace.ui.command;

import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.util.Locale;
import org.rolltrace.core.files.FileFaultsException;
import org.rolltrace.core.motion.CalculationException;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The root of the command line. */
@Command(
    name = "rolltrace",
    description =
        "Roll dynamics of propeller aeroplanes: how an aeroplane enters a roll, settles,"
            + " coasts and comes back.",
    subcommands = {FlyCommand.class, DeriveCommand.class, SchemaCommand.class},
    mixinStandardHelpOptions = true,
    versionProvider = Program.class,
    footer = {
      "",
      "Exit codes: 0 done, every judged requirement met; 1 done, some requirement not met;",
      "2 bad arguments or input file; 3 the calculation failed or a result could not be written."
    })
public final class CommandLineProgram implements Runnable {
  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  private CommandLineProgram() {}

  /**
   * Runs a command line.
   *
   * @param arguments the words after the program's name
   * @param out receives results
   * @param err receives progress, cautions and faults
   * @param opener opens the window
   * @return the exit code
   */
  public static int run(String[] arguments, PrintWriter out, PrintWriter err, WindowOpener opener) {
    Locale.setDefault(Locale.ROOT);
    CommandLine commandLine = new CommandLine(new CommandLineProgram());
    commandLine.addSubcommand(new WindowCommand(opener));
    commandLine.setExpandAtFiles(false); // a file may be called @something
    commandLine.setOut(out);
    commandLine.setErr(err);
    commandLine.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
    commandLine.setParameterExceptionHandler(CommandLineProgram::badArguments);
    commandLine.setExecutionExceptionHandler(
        (failure, command, parsed) -> failed(failure, command.getErr()));
    int exitCode = execute(commandLine, arguments, err);
    if (out.checkError()) {
      err.println("the result cannot be printed: standard output takes no more");
      exitCode = ExitCode.FAILED;
    }
    err.flush();
    return exitCode;
  }

  private static int execute(CommandLine commandLine, String[] arguments, PrintWriter err) {
    try {
      return commandLine.execute(arguments);
    } catch (VirtualMachineError exhausted) {
      // picocli lets errors pass, and Java would end with 1 and a stack trace.
      err.println("The program ran out of memory (" + exhausted + "). Give Java more with -Xmx.");
      return ExitCode.FAILED;
    }
  }

  private static int badArguments(CommandLine.ParameterException fault, String[] arguments) {
    PrintWriter err = fault.getCommandLine().getErr();
    err.println(fault.getMessage());
    if (!CommandLine.UnmatchedArgumentException.printSuggestions(fault, err)) {
      err.println("Try '" + fault.getCommandLine().getCommandSpec().qualifiedName() + " --help'.");
    }
    return ExitCode.BAD_INPUT;
  }

  private static int failed(Exception failure, PrintWriter err) {
    if (failure instanceof FileFaultsException) {
      err.println(failure.getMessage());
      return ExitCode.BAD_INPUT;
    }
    if (failure instanceof CalculationException || failure instanceof UncheckedIOException) {
      err.println(failure.getMessage());
    } else {
      err.println(
          "The program met something it did not expect ("
              + failure
              + "). The input may still be right: please report it with the input file.");
    }
    return ExitCode.FAILED;
  }

  @Override
  public void run() {
    throw new CommandLine.ParameterException(
        spec.commandLine(), "Say what to do, such as: fly scenarios/light-single-roll-entry.json");
  }
}
