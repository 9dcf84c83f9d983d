package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.measures.MeasureDefinition;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.control.Written;

/**
 * One line of the readings, in the unit in which it is read.
 *
 * @param title what it is
 * @param unit of all three values
 * @param now the present value, or a dash
 * @param kept that of the kept curves; empty when none are kept
 * @param difference now less kept; empty when none are kept
 * @param hint its definition, and what to know beside it
 * @param available whether there is a present value
 */
record Reading(
    String title,
    String unit,
    String now,
    String kept,
    String difference,
    String hint,
    boolean available) {

  private static final String NONE = "\u2013";

  /** A difference this small against the values is rounding. */
  private static final double ROUNDING = 1e-9;

  /** All readings of a result, those that could not be had last. */
  static List<Reading> of(RunResult result, Optional<RunResult> kept) {
    List<Reading> had = new ArrayList<>();
    List<Reading> missing = new ArrayList<>();
    boolean ofSizes = kept.map(ghost -> areOpposite(result, ghost)).orElse(false);
    for (Measure measure : result.measures()) {
      OptionalDouble other =
          kept.flatMap(ghost -> ghost.measure(measure.definition().name()))
              .map(Measure::value)
              .orElse(OptionalDouble.empty());
      Reading reading =
          of(
              measure.definition().title(),
              Scale.of(measure.definition()),
              measure.value(),
              kept.isPresent(),
              other,
              ofSizes,
              hint(measure));
      (reading.available() ? had : missing).add(reading);
    }
    result.modes().ifPresent(modes -> addModes(had, modes, kept.flatMap(RunResult::modes), kept));
    had.addAll(missing);
    return had;
  }

  private static void addModes(
      List<Reading> readings,
      LateralModes modes,
      Optional<LateralModes> keptModes,
      Optional<RunResult> kept) {
    if (modes.spiral().isPresent()) {
      Mode.Aperiodic spiral = modes.spiral().get();
      boolean returns = spiral.root() <= 0;
      readings.add(
          of(
              returns ? "Spiral halves in" : "Spiral doubles in",
              Scale.SECONDS,
              OptionalDouble.of(spiral.timeToHalfOrDouble()),
              kept.isPresent(),
              value(
                  keptModes
                      .flatMap(LateralModes::spiral)
                      .filter(other -> other.root() <= 0 == returns)
                      .map(Mode.Aperiodic::timeToHalfOrDouble)),
              false,
              "Root of the spiral of the free equations: "
                  + Written.reading(spiral.root())
                  + " 1/s."));
    }
    if (modes.dutchRoll().isPresent()) {
      Mode.Oscillatory dutchRoll = modes.dutchRoll().get();
      readings.add(
          of(
              "Dutch roll",
              Scale.RADIANS_PER_SECOND,
              OptionalDouble.of(dutchRoll.naturalFrequency()),
              kept.isPresent(),
              value(
                  keptModes
                      .flatMap(LateralModes::dutchRoll)
                      .map(Mode.Oscillatory::naturalFrequency)),
              false,
              "Undamped natural frequency of the dutch roll; damping ratio "
                  + Written.reading(dutchRoll.dampingRatio())
                  + "."));
    }
  }

  private static OptionalDouble value(Optional<Double> value) {
    return value.map(OptionalDouble::of).orElse(OptionalDouble.empty());
  }

  private static Reading of(
      String title,
      Scale scale,
      OptionalDouble value,
      boolean compares,
      OptionalDouble other,
      boolean ofSizes,
      String hint) {
    OptionalDouble difference =
        value.isPresent() && other.isPresent()
            ? OptionalDouble.of(difference(value.getAsDouble(), other.getAsDouble(), ofSizes))
            : OptionalDouble.empty();
    return new Reading(
        title,
        scale.unit(),
        scale.words(value),
        compares ? scale.words(other) : "",
        compares ? scale.signed(difference) : "",
        hint,
        value.isPresent());
  }

  private static double difference(double now, double kept, boolean ofSizes) {
    double difference = ofSizes ? Math.abs(now) - Math.abs(kept) : now - kept;
    double size = Math.max(Math.abs(now), Math.abs(kept));
    return Math.abs(difference) < ROUNDING * size ? 0 : difference;
  }

  /** Whether one rolls right and the other left, so that their sizes are what is compared. */
  static boolean areOpposite(RunResult one, RunResult other) {
    return side(one) * side(other) < 0;
  }

  private static double side(RunResult result) {
    return result
        .scenario()
        .programme()
        .leading(result.scenario().duration())
        .map(input -> Math.signum(input.shape().size()))
        .orElse(0.0);
  }

  /** What was flown, in a few words. */
  static String flown(RunResult result) {
    String inputs =
        result.scenario().programme().inputs().stream()
            .map(
                input ->
                    input.control().word()
                        + " "
                        + input.shape().name()
                        + " "
                        + Written.plain(100 * Math.abs(input.shape().size()), 1)
                        + " % "
                        + input.control().way(input.shape().size()))
            .collect(Collectors.joining(", "));
    return (inputs.isEmpty() ? "no input" : inputs)
        + "; "
        + result.scenario().slip().word()
        + " slip, "
        + Written.plain(Quantity.toUnit(result.scenario().condition().trueAirspeed(), "kt"), 1)
        + " kt true";
  }

  private static String hint(Measure measure) {
    String definition = sentence(measure.definition().definition());
    return measure.remark().isEmpty() ? definition : definition + "\n" + sentence(measure.remark());
  }

  private static String sentence(String words) {
    return Character.toUpperCase(words.charAt(0)) + words.substring(1) + ".";
  }

  /** How an SI value is read. */
  private record Scale(String unit, double factor) {
    static final Scale SECONDS = new Scale("s", 1);
    static final Scale RADIANS_PER_SECOND = new Scale("rad/s", 1);

    static Scale of(MeasureDefinition definition) {
      double degrees = Math.toDegrees(1);
      return switch (definition.unit()) {
        case "rad" ->
            definition.name().startsWith("helix") ? new Scale("rad", 1) : new Scale("deg", degrees);
        case "rad/s" -> new Scale("deg/s", degrees);
        case "rad/s2" -> new Scale("deg/s\u00b2", degrees);
        case "1" -> new Scale("%", 100);
        default -> new Scale(definition.unit(), 1);
      };
    }

    String words(OptionalDouble value) {
      return value.isPresent() ? Written.reading(factor * value.getAsDouble()) : NONE;
    }

    String signed(OptionalDouble value) {
      String words = words(value);
      return value.isPresent() && value.getAsDouble() > 0 ? "+" + words : words;
    }
  }
}
