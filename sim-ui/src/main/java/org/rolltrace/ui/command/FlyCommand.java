package org.rolltrace.ui.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.rolltrace.core.files.ResultFolder;
import org.rolltrace.core.files.ResultJson;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.flight.FlightSettings;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.ui.chart.ChartFiles;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Flies a scenario. */
@Command(
    name = "fly",
    description = "Flies a scenario and reads off how the aeroplane rolls.",
    mixinStandardHelpOptions = true,
    versionProvider = Program.class)
final class FlyCommand implements Callable<Integer> {
  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(paramLabel = "SCENARIO", description = "A scenario file (JSON).")
  private String scenario;

  @Option(names = "--json", description = "Print the result as one JSON document.")
  private boolean json;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Write history.csv and result.json into DIR, which is made when missing.")
  private String folder;

  @Option(
      names = "--charts",
      paramLabel = "DIR",
      description =
          "Draw the result as stage.svg and stage.png in DIR, which is made when missing.")
  private String chartFolder;

  @Option(
      names = "--rate",
      paramLabel = "HZ",
      description =
          "Samples a second in the history, 1 to 10000, at most a million in all; 100 unless given.")
  private Double sampleRate;

  @Option(
      names = "--tolerance",
      paramLabel = "REL",
      description =
          "Relative tolerance of the integration, 1e-13 to 1e-3; 1e-9 unless given. The absolute"
              + " tolerance is a tenth of it, in rad and rad/s.")
  private Double tolerance;

  @Override
  public Integer call() {
    PrintWriter out = spec.commandLine().getOut();
    PrintWriter err = spec.commandLine().getErr();
    FlightSettings settings = settings();
    Path into = folder == null ? null : PathArgument.of(spec, folder);
    Path chartsInto = chartFolder == null ? null : PathArgument.of(spec, chartFolder);

    Scenario flown = ScenarioFile.read(PathArgument.of(spec, scenario));
    RunResult result = ScenarioRun.compareWithFreeSlip(ScenarioRun.execute(flown, settings));
    if (into != null) {
      for (Path written : ResultFolder.write(into, result, Program.identity())) {
        err.println("wrote " + written);
      }
    }
    if (chartsInto != null) {
      for (Path written : ChartFiles.write(chartsInto, result)) {
        err.println("wrote " + written);
      }
    }
    if (json) {
      printJson(result, out);
    } else {
      new FlyReport(result).print(out);
    }
    for (String caution : result.cautions()) {
      err.println("caution: " + caution);
    }
    return ExitCode.DONE;
  }

  private FlightSettings settings() {
    try {
      FlightSettings settings = FlightSettings.DEFAULT;
      if (tolerance != null) {
        settings = settings.withTolerance(tolerance);
      }
      return sampleRate == null ? settings : settings.withSampleRate(sampleRate);
    } catch (IllegalArgumentException outOfRange) {
      throw new CommandLine.ParameterException(spec.commandLine(), outOfRange.getMessage());
    }
  }

  private static void printJson(RunResult result, PrintWriter out) {
    try {
      ResultJson.write(result, Program.identity(), out);
    } catch (IOException failure) {
      throw new UncheckedIOException("the result cannot be printed", failure);
    }
  }
}
