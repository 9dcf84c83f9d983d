package org.rolltrace.ui.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.files.AeroplaneFile;
import org.rolltrace.core.files.DerivativesJson;
import org.rolltrace.core.files.ResultFolder;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.quantity.QuantityException;
import org.rolltrace.core.run.AskedCondition;
import org.rolltrace.core.run.ChosenCondition;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.ui.chart.ChartFiles;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Derives an aeroplane: its derivatives, where each comes from, and what its variants change. */
@Command(
    name = "derive",
    description =
        "Shows the derivatives of an aeroplane with their origin, what follows from them, and what"
            + " its variants change.",
    mixinStandardHelpOptions = true,
    versionProvider = Program.class)
final class DeriveCommand implements Callable<Integer> {
  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(
      paramLabel = "AEROPLANE",
      arity = "0..1",
      description = "An aeroplane file (JSON), with or without a shape.")
  private String aeroplane;

  @Option(
      names = "--speed",
      paramLabel = "SPEED",
      description =
          "True airspeed, such as \"120 kt\". Without any speed it is that for which the given"
              + " derivatives hold, else that for a lift coefficient of 0.4.")
  private String trueAirspeed;

  @Option(
      names = "--calibrated",
      paramLabel = "SPEED",
      description = "Calibrated airspeed, instead of --speed.")
  private String calibratedAirspeed;

  @Option(
      names = "--equivalent",
      paramLabel = "SPEED",
      description = "Equivalent airspeed, instead of --speed.")
  private String equivalentAirspeed;

  @Option(
      names = "--altitude",
      paramLabel = "HEIGHT",
      description =
          "Pressure altitude on a standard day, such as \"3000 ft\". Without it, that for which the"
              + " given derivatives hold, else sea level.")
  private String altitude;

  @Option(names = "--load-factor", paramLabel = "N", description = "Load factor; 1 unless given.")
  private Double loadFactor;

  @Option(
      names = "--variant",
      paramLabel = "NAME",
      description = "Show this variant beside the base; may be repeated. All unless given.")
  private List<String> variants;

  @Option(names = "--json", description = "Print the result as one JSON document.")
  private boolean json;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description =
          "Write derivatives.json and, for each aeroplane with a shape, its spanwise loadings as CSV"
              + " into DIR, which is made when missing.")
  private String folder;

  @Option(
      names = "--charts",
      paramLabel = "DIR",
      description =
          "Draw the shape and the spanwise loadings as shape and loadings, .svg and .png, in DIR,"
              + " which is made when missing.")
  private String chartFolder;

  @Option(
      names = "--methods",
      description = "Print all methods of estimation with source and known error, and end.")
  private boolean methods;

  @Override
  public Integer call() {
    PrintWriter out = spec.commandLine().getOut();
    PrintWriter err = spec.commandLine().getErr();
    if (methods) {
      new MethodsReport().print(out);
      return ExitCode.DONE;
    }
    if (aeroplane == null) {
      throw bad("Say which aeroplane, such as: derive scenarios/aeroplanes/tarnlark-trainer.json");
    }
    AskedCondition asked = asked();
    Path into = folder == null ? null : PathArgument.of(spec, folder);
    Path chartsInto = chartFolder == null ? null : PathArgument.of(spec, chartFolder);

    Map<String, AeroplaneData> all = AeroplaneFile.readAll(PathArgument.of(spec, aeroplane));
    AeroplaneData base = all.get("");
    DerivativeReport report = DerivativeReport.of(base, picked(all), condition(asked, base));
    if (chartsInto != null && !ChartFiles.hasShape(report)) {
      throw bad(
          "There is nothing to draw: "
              + aeroplane
              + " gives no \"wing\". Give its shape, or leave --charts out.");
    }
    if (into != null) {
      for (Path written : ResultFolder.write(into, report, Program.identity())) {
        err.println("wrote " + written);
      }
    }
    if (chartsInto != null) {
      for (Path written : ChartFiles.write(chartsInto, report)) {
        err.println("wrote " + written);
      }
    }
    if (json) {
      printJson(report, out);
    } else {
      new DeriveReport(report).print(out);
    }
    for (String caution : report.cautions()) {
      err.println("caution: " + caution);
    }
    return ExitCode.DONE;
  }

  private CommandLine.ParameterException bad(String message) {
    return new CommandLine.ParameterException(spec.commandLine(), message);
  }

  private AskedCondition asked() {
    Map<AirspeedKind, String> speeds = new LinkedHashMap<>();
    if (trueAirspeed != null) {
      speeds.put(AirspeedKind.TRUE, trueAirspeed);
    }
    if (calibratedAirspeed != null) {
      speeds.put(AirspeedKind.CALIBRATED, calibratedAirspeed);
    }
    if (equivalentAirspeed != null) {
      speeds.put(AirspeedKind.EQUIVALENT, equivalentAirspeed);
    }
    if (speeds.size() > 1) {
      throw bad("Several speeds are given; expected one of --speed, --calibrated, --equivalent.");
    }
    try {
      return new AskedCondition(
          altitude == null
              ? OptionalDouble.empty()
              : OptionalDouble.of(quantity("--altitude", altitude, Dimension.LENGTH)),
          speeds.entrySet().stream()
              .findFirst()
              .map(
                  speed ->
                      new AskedCondition.Speed(
                          speed.getKey(), quantity("speed", speed.getValue(), Dimension.SPEED))),
          loadFactor == null ? OptionalDouble.empty() : OptionalDouble.of(loadFactor));
    } catch (IllegalArgumentException outOfRange) {
      throw bad(outOfRange.getMessage());
    }
  }

  private double quantity(String role, String text, Dimension dimension) {
    try {
      return Quantity.parse(text, dimension);
    } catch (QuantityException fault) {
      throw bad(role + ": " + fault.getMessage());
    }
  }

  private ChosenCondition condition(AskedCondition asked, AeroplaneData base) {
    try {
      return asked.of(base);
    } catch (IllegalArgumentException outOfRange) {
      throw bad(outOfRange.getMessage());
    }
  }

  /** The variants asked for, in that order. */
  private Map<String, AeroplaneData> picked(Map<String, AeroplaneData> all) {
    Map<String, AeroplaneData> picked = new LinkedHashMap<>(all);
    picked.remove("");
    if (variants == null) {
      return picked;
    }
    Map<String, AeroplaneData> asked = new LinkedHashMap<>();
    for (String name : variants) {
      if (!picked.containsKey(name)) {
        throw bad(
            aeroplane
                + " has no variant '"
                + name
                + "'; "
                + (picked.isEmpty()
                    ? "it has none at all."
                    : "expected one of "
                        + picked.keySet().stream()
                            .map(one -> "'" + one + "'")
                            .collect(Collectors.joining(", "))
                        + "."));
      }
      asked.put(name, picked.get(name));
    }
    return asked;
  }

  private static void printJson(DerivativeReport report, PrintWriter out) {
    try {
      DerivativesJson.write(report, Program.identity(), out);
    } catch (IOException failure) {
      throw new UncheckedIOException("the result cannot be printed", failure);
    }
  }
}
