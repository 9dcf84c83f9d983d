package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.Safety;

/** A page about derivatives, filled from above: what it is of, drawings, what to beware of. */
final class Page {
  static final double WIDTH = 1100;

  private static final double MARGIN = 26;

  /** Between the margins. */
  static final double INSIDE = WIDTH - 2 * MARGIN;

  private static final double SMALL_LINE = 14;
  private static final double LINE = 18;

  private final List<Mark> marks = new ArrayList<>();
  private double y = 32;

  void addHead(DerivativeReport report, String what) {
    addText(report.base().data().aeroplane().name(), TypeSize.LARGE, Ink.TEXT, 21);
    StringBuilder words = new StringBuilder(what);
    report
        .condition()
        .condition()
        .ifPresent(
            condition ->
                words.append(
                    String.format(
                        Locale.ROOT,
                        ", at %s ft and %s kt true (%s kt calibrated), load factor %s",
                        Ticks.figure(Quantity.toUnit(condition.pressureAltitude(), "ft"), 0),
                        Ticks.figure(Quantity.toUnit(condition.trueAirspeed(), "kt"), 1),
                        Ticks.figure(Quantity.toUnit(condition.calibratedAirspeed(), "kt"), 1),
                        Ticks.figure(condition.loadFactor(), 2))));
    addText(words.toString(), TypeSize.NORMAL, Ink.QUIET, LINE);
  }

  private void addText(String text, TypeSize size, Ink ink, double pitch) {
    for (String line : TextLines.wrapped(text, size, INSIDE)) {
      marks.add(new Mark.Label(MARGIN, y, line, Anchor.START, size, ink));
      y += pitch;
    }
  }

  void add(Sheet sheet) {
    sheet.marks().forEach(mark -> marks.add(mark.movedBy(MARGIN, y)));
    y += sheet.height();
  }

  void addFoot(String words) {
    y += 26;
    addText(words + Safety.NOTICE, TypeSize.SMALL, Ink.QUIET, SMALL_LINE);
  }

  Sheet sheet() {
    return new Sheet(WIDTH, Math.ceil(y + 8), marks);
  }
}
