package org.rolltrace.ui.chart;

import java.util.List;

/**
 * What an axis shows.
 *
 * @param quantity such as "Time"
 * @param unit such as "s"
 */
record AxisTitle(String quantity, String unit) {

  /** Draws it on one line. */
  void draw(double x, double base, List<Mark> marks) {
    marks.add(new Mark.Label(x, base, quantity, Anchor.START, TypeSize.NORMAL, Ink.TEXT));
    marks.add(
        new Mark.Label(
            x + TypeWidths.of(quantity + " ", TypeSize.NORMAL),
            base,
            unit,
            Anchor.START,
            TypeSize.SMALL,
            Ink.QUIET));
  }
}
