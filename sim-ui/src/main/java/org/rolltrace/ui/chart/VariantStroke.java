package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.DerivedAeroplane;

/**
 * How one of several aeroplanes is drawn: the base unbroken and dark, each variant in a colour and
 * a dash of its own, so that they differ in grey as well.
 *
 * @param derived the aeroplane; its shape is known
 * @param stroke of its lines
 */
record VariantStroke(DerivedAeroplane derived, Stroke stroke) {
  /** More than these cannot be told apart. */
  static final int MOST = 7;

  private static final Ink[] INKS = {Ink.SECOND, Ink.THIRD, Ink.FOURTH, Ink.FIFTH};
  private static final Dash[] DASHES = {Dash.DASHED, Dash.DASH_DOT, Dash.DOTTED};

  /** The aeroplanes of a report that can be drawn, the base first. */
  static List<VariantStroke> of(DerivativeReport report) {
    List<VariantStroke> strokes = new ArrayList<>();
    for (DerivedAeroplane derived : report.all()) {
      if (derived.shape().isPresent() && strokes.size() < MOST) {
        strokes.add(new VariantStroke(derived, next(strokes.size())));
      }
    }
    return strokes;
  }

  private static Stroke next(int place) {
    if (place == 0) {
      return Stroke.of(Ink.WING, 1.8);
    }
    int variant = place - 1;
    return new Stroke(INKS[variant % INKS.length], 1.8, DASHES[variant % DASHES.length], 1);
  }

  /** What is not drawn, and why, in words; empty when all is. */
  static String remark(DerivativeReport report) {
    List<String> names = new ArrayList<>();
    int drawn = 0;
    for (DerivedAeroplane derived : report.all()) {
      if (derived.shape().isEmpty() || drawn++ >= MOST) {
        names.add(derived.label());
      }
    }
    return (report.variants().isEmpty()
            ? ""
            : "Where a variant has no line of its own, it is as the base. ")
        + (names.isEmpty() ? "" : "Not drawn: " + String.join(", ", names) + ". ");
  }

  /** A name that fits beside a drawing. */
  static String shortened(String name, double room) {
    String shown = name;
    while (shown.length() > 1 && TypeWidths.of(shown + "…", TypeSize.SMALL) > room) {
      shown = shown.substring(0, shown.length() - 1);
    }
    return TypeWidths.of(name, TypeSize.SMALL) <= room ? name : shown + "…";
  }
}
