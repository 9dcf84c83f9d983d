package org.rolltrace.ui.command;

import java.util.concurrent.Callable;
import org.rolltrace.core.files.Schemas;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Prints the JSON Schema of a file format. */
@Command(
    name = "schema",
    description = "Prints the JSON Schema of a file format.",
    mixinStandardHelpOptions = true,
    versionProvider = Program.class)
final class SchemaCommand implements Callable<Integer> {
  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(paramLabel = "FORMAT", description = "scenario or aeroplane")
  private String format;

  @Override
  public Integer call() {
    if (!Schemas.names().contains(format)) {
      throw new CommandLine.ParameterException(
          spec.commandLine(),
          "There is no schema '" + format + "'; expected one of " + Schemas.names() + ".");
    }
    spec.commandLine().getOut().print(Schemas.text(format));
    return ExitCode.DONE;
  }
}
