package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.core.scenario.Scenario;

/** A run on one page: what was flown, the wing trace, the strips, and what to beware of. */
public final class StagePicture {
  /** Of the page, px. */
  public static final double WIDTH = 1100;

  /** Of the page, px. */
  public static final double HEIGHT = 900;

  private static final double MARGIN = 26;
  private static final double TRACE = 232;
  private static final double SMALL_LINE = 14;

  private StagePicture() {}

  /**
   * Draws the page.
   *
   * @param result the run
   * @param ghost the run it is compared with
   * @return the drawing, {@value #WIDTH} by {@value #HEIGHT} px
   */
  public static Sheet draw(RunResult result, Optional<RunResult> ghost) {
    double inside = WIDTH - 2 * MARGIN;
    List<Mark> marks = new ArrayList<>();
    double y = addHead(marks, 32, result.scenario().title(), TypeSize.LARGE, Ink.TEXT) + 1;
    y = addHead(marks, y, conditionLine(result), TypeSize.NORMAL, Ink.QUIET);
    double traceTop = addHead(marks, y, inputLine(result), TypeSize.NORMAL, Ink.QUIET) - 4;

    List<String> foot = footLines(result, inside);
    double footTop = HEIGHT - 18 - (foot.size() - 1) * SMALL_LINE;
    addText(marks, footTop, foot, TypeSize.SMALL, Ink.QUIET, SMALL_LINE);

    TimeWindow window = RollStrips.window(result);
    Sheet trace =
        WingTrace.draw(
            result,
            ghost,
            result.scenario().data().aeroplane().span(),
            window,
            inside,
            TRACE,
            StripChart.LEFT,
            StripChart.RIGHT,
            OptionalDouble.of(strongInstant(result)));
    place(trace, MARGIN, traceTop, marks);
    double stripsTop = traceTop + TRACE;
    Sheet strips =
        StripChart.draw(
                RollStrips.of(result, ghost),
                window,
                inside,
                footTop - 22 - stripsTop,
                StripChart.LEFT,
                StripChart.RIGHT)
            .sheet();
    place(strips, MARGIN, stripsTop, marks);
    return new Sheet(WIDTH, HEIGHT, marks);
  }

  private static void place(Sheet sheet, double x, double y, List<Mark> marks) {
    sheet.marks().forEach(mark -> marks.add(mark.movedBy(x, y)));
  }

  /** Adds a paragraph, of two lines at most, and returns where the next one begins. */
  private static double addHead(List<Mark> marks, double y, String text, TypeSize size, Ink ink) {
    List<String> lines = TextLines.wrapped(text, size, WIDTH - 2 * MARGIN - 20);
    if (lines.size() > 2) {
      lines = List.of(lines.get(0), lines.get(1) + " …");
    }
    double pitch = size == TypeSize.LARGE ? 20 : 18;
    addText(marks, y, lines, size, ink, pitch);
    return y + lines.size() * pitch;
  }

  private static void addText(
      List<Mark> marks, double y, List<String> lines, TypeSize size, Ink ink, double pitch) {
    for (int i = 0; i < lines.size(); i++) {
      marks.add(new Mark.Label(MARGIN, y + i * pitch, lines.get(i), Anchor.START, size, ink));
    }
  }

  /** The last bank capture, or else the instant of the largest bank. */
  private static double strongInstant(RunResult result) {
    OptionalDouble capture =
        result.events().stream()
            .filter(FlightEvent.BankCapture.class::isInstance)
            .mapToDouble(FlightEvent::time)
            .max();
    if (capture.isPresent()) {
      return capture.getAsDouble();
    }
    TimeHistory history = result.history();
    int most = 0;
    for (int i = 1; i < history.size(); i++) {
      if (Math.abs(history.value(Channel.BANK, i)) > Math.abs(history.value(Channel.BANK, most))) {
        most = i;
      }
    }
    return history.time(most);
  }

  private static String conditionLine(RunResult result) {
    Scenario scenario = result.scenario();
    FlightCondition condition = scenario.condition();
    return String.format(
        Locale.ROOT,
        "%s, %s ft, %s kt calibrated (%s kt true), load factor %s, %s slip",
        scenario.data().aeroplane().name(),
        Ticks.figure(Quantity.toUnit(condition.pressureAltitude(), "ft"), 0),
        Ticks.figure(Quantity.toUnit(condition.calibratedAirspeed(), "kt"), 1),
        Ticks.figure(Quantity.toUnit(condition.trueAirspeed(), "kt"), 1),
        Ticks.figure(condition.loadFactor(), 2),
        scenario.slip().word());
  }

  private static String inputLine(RunResult result) {
    Scenario scenario = result.scenario();
    List<String> parts = new ArrayList<>();
    double bank = Math.toDegrees(scenario.start().disturbance().bank());
    if (bank != 0) {
      parts.add("bank " + Ticks.figure(bank, 1) + "° at the start");
    }
    for (PilotInput input : scenario.programme().inputs()) {
      InputShape shape = input.shape();
      parts.add(
          String.format(
              Locale.ROOT,
              "%s %s, %s %% %s at %s s",
              input.control().word(),
              shape.name(),
              Ticks.figure(Math.abs(100 * shape.size()), 0),
              input.control().way(shape.size()),
              Ticks.figure(shape.start(), 2)));
    }
    return parts.isEmpty() ? "hands off" : String.join("; ", parts);
  }

  private static List<String> footLines(RunResult result, double inside) {
    String cautions =
        result.cautions().stream()
            .map(caution -> "Caution: " + caution + ". ")
            .collect(Collectors.joining());
    return TextLines.wrapped(cautions + Safety.NOTICE, TypeSize.SMALL, inside);
  }
}
