package org.rolltrace.ui.build;

import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.quantity.QuantityException;
import org.rolltrace.core.quantity.Unit;
import org.rolltrace.ui.control.Written;

/**
 * What follows in an aeroplane's text when one value of its shape is changed.
 *
 * <p>The span scales the stations of panels and ailerons; chords and angles stay. Chords that meet
 * at a joint change together. A wing area that the file gives besides is brought into step.
 */
final class ShapeEdits {
  /** What an aeroplane's note has while its shape is one that nobody has looked at. */
  static final String START_MARK =
      "The shape is a plain start made from span and area, to be edited.";

  /** Lengths are written to a tenth of a millimetre, or of a thousandth of a foot. */
  private static final int DECIMALS = 4;

  private static final double TAPER = 0.6;
  private static final double AILERON_FROM = 0.55;
  private static final double AILERON_TO = 0.95;
  private static final String PANELS = "wing.panels";

  /** Chords that are this near meet, m. */
  private static final double MEETS = 1e-4;

  private ShapeEdits() {}

  /** A quantity of the aeroplane in SI units; empty when it is absent or not understood. */
  static OptionalDouble quantity(ScenarioDocument document, String path, Dimension dimension) {
    Optional<String> text = document.aeroplaneText(path);
    if (text.isEmpty()) {
      return OptionalDouble.empty();
    }
    try {
      return OptionalDouble.of(Quantity.parse(text.get(), dimension));
    } catch (QuantityException e) {
      return OptionalDouble.empty(); // the reader tells what is wrong with it
    }
  }

  /** The unit in which a value is written; another one when it has none of its kind. */
  static String unit(ScenarioDocument document, String path, Dimension dimension, String other) {
    if (dimension.equals(Dimension.DIMENSIONLESS)) {
      return "";
    }
    if (quantity(document, path, dimension).isEmpty()) {
      return other;
    }
    String text = document.aeroplaneText(path).orElseThrow().strip();
    return text.substring(text.indexOf(' ') + 1).strip();
  }

  /** The unit of lengths: that of the span, or of the wing's tip. */
  static String lengthUnit(ScenarioDocument document) {
    String ofTip = unit(document, lastPanel(document) + ".to", Dimension.LENGTH, "m");
    return unit(document, "span", Dimension.LENGTH, ofTip);
  }

  private static String panel(int index) {
    return PANELS + "[" + index + "]";
  }

  private static String lastPanel(ScenarioDocument document) {
    return panel(Math.max(0, document.aeroplaneCount(PANELS) - 1));
  }

  /** From tip to tip by the panels, m. */
  static OptionalDouble span(ScenarioDocument document) {
    OptionalDouble tip = quantity(document, lastPanel(document) + ".to", Dimension.LENGTH);
    return tip.isPresent() && tip.getAsDouble() > 0
        ? OptionalDouble.of(2 * tip.getAsDouble())
        : OptionalDouble.empty();
  }

  /** The span as the panels have it, for a file that does not give it besides. */
  static Optional<String> impliedSpan(ScenarioDocument document) {
    OptionalDouble span = span(document);
    return span.isPresent()
        ? Optional.of(written(span.getAsDouble(), lengthUnit(document), DECIMALS))
        : Optional.empty();
  }

  static String written(double si, String unit, int decimals) {
    return unit.isEmpty()
        ? Written.plain(si, decimals)
        : Written.plain(Unit.of(unit).fromSi(si), decimals) + " " + unit;
  }

  /**
   * What follows from a change.
   *
   * @param start the document before it
   * @param put the same with the new text, right or wrong
   */
  static ScenarioDocument follow(
      ShapeValue value, int panel, ScenarioDocument start, ScenarioDocument put) {
    ScenarioDocument changed = put;
    if (value == ShapeValue.SPAN) {
      changed = spanned(put);
    } else if (value.isChord()) {
      changed = joined(value, panel, start, put);
    }
    return changed.equals(start) ? changed : withArea(changed);
  }

  private static ScenarioDocument spanned(ScenarioDocument document) {
    OptionalDouble wanted = quantity(document, "span", Dimension.LENGTH);
    OptionalDouble present = span(document);
    if (wanted.isEmpty() || !(wanted.getAsDouble() > 0) || present.isEmpty()) {
      return document;
    }
    double factor = wanted.getAsDouble() / present.getAsDouble();
    ScenarioDocument scaled = document;
    int count = document.aeroplaneCount(PANELS);
    for (int i = 0; i < count; i++) {
      String to = panel(i) + ".to";
      OptionalDouble station = quantity(document, to, Dimension.LENGTH);
      if (station.isEmpty()) {
        return document;
      }
      String unit = unit(document, to, Dimension.LENGTH, "m");
      String text = written(factor * station.getAsDouble(), unit, DECIMALS);
      scaled = scaled.withAeroplane(to, text);
      if (i + 1 < count) {
        scaled = scaled.withAeroplane(panel(i + 1) + ".from", text); // they meet to the last digit
      }
    }
    double tip = 0.5 * span(scaled).orElse(0);
    for (String end : new String[] {"ailerons.from", "ailerons.to"}) {
      OptionalDouble station = quantity(document, end, Dimension.LENGTH);
      if (station.isPresent()) {
        String unit = unit(document, end, Dimension.LENGTH, "m");
        double place = Math.min(tip, factor * station.getAsDouble());
        scaled = scaled.withAeroplane(end, inside(place, unit));
      }
    }
    return scaled;
  }

  /** Rounded towards the root, so that an aileron that reaches the tip stays on the wing. */
  private static String inside(double si, String unit) {
    double nearest = Unit.of(unit).fromSi(si) + 1e-9; // what was written exactly stays so
    return java.math.BigDecimal.valueOf(nearest)
            .setScale(DECIMALS, RoundingMode.FLOOR)
            .stripTrailingZeros()
            .toPlainString()
        + " "
        + unit;
  }

  private static ScenarioDocument joined(
      ShapeValue value, int panel, ScenarioDocument start, ScenarioDocument put) {
    boolean inner = value == ShapeValue.INNER_CHORD;
    int neighbour = inner ? panel - 1 : panel + 1;
    if (neighbour < 0 || neighbour >= start.aeroplaneCount(PANELS)) {
      return put;
    }
    String own = value.path(panel);
    String other = panel(neighbour) + (inner ? ".outerChord" : ".innerChord");
    OptionalDouble before = quantity(start, own, Dimension.LENGTH);
    OptionalDouble beside = quantity(start, other, Dimension.LENGTH);
    OptionalDouble now = quantity(put, own, Dimension.LENGTH);
    boolean met =
        before.isPresent()
            && beside.isPresent()
            && Math.abs(before.getAsDouble() - beside.getAsDouble()) <= MEETS;
    return met && now.isPresent()
        ? put.withAeroplane(other, put.aeroplaneText(own).orElseThrow())
        : put;
  }

  /** A given area must be that of the panels. */
  private static ScenarioDocument withArea(ScenarioDocument document) {
    if (!document.aeroplaneHas("wingArea")) {
      return document;
    }
    double area = 0;
    int count = document.aeroplaneCount(PANELS);
    for (int i = 0; i < count; i++) {
      OptionalDouble from = quantity(document, panel(i) + ".from", Dimension.LENGTH);
      OptionalDouble to = quantity(document, panel(i) + ".to", Dimension.LENGTH);
      OptionalDouble inner = quantity(document, panel(i) + ".innerChord", Dimension.LENGTH);
      OptionalDouble outer = quantity(document, panel(i) + ".outerChord", Dimension.LENGTH);
      if (from.isEmpty() || to.isEmpty() || inner.isEmpty() || outer.isEmpty()) {
        return document;
      }
      area += (inner.getAsDouble() + outer.getAsDouble()) * (to.getAsDouble() - from.getAsDouble());
    }
    if (!(area > 0)) {
      return document;
    }
    String unit = unit(document, "wingArea", Dimension.AREA, "m2");
    return document.withAeroplane("wingArea", written(area, unit, DECIMALS));
  }

  /**
   * A plain wing of an aeroplane's span and area, with ailerons at usual places.
   *
   * @param span m
   * @param area m²
   */
  static ScenarioDocument plainShape(ScenarioDocument document, double span, double area) {
    String unit = lengthUnit(document);
    double root = 2 * area / (span * (1 + TAPER));
    String first = panel(0);
    ScenarioDocument shaped =
        document
            .withAeroplane(first + ".from", "0 " + unit)
            .withAeroplane(first + ".to", written(0.5 * span, unit, DECIMALS))
            .withAeroplane(first + ".innerChord", written(root, unit, 3))
            .withAeroplane(first + ".outerChord", written(TAPER * root, unit, 3))
            .withAeroplane(first + ".dihedral", "0 deg");
    if (!document.aeroplaneHas("ailerons")) {
      shaped =
          shaped.withAeroplane("ailerons.up", "20 deg").withAeroplane("ailerons.down", "20 deg");
    }
    if (!document.aeroplaneHas("ailerons.from")) {
      shaped =
          shaped
              .withAeroplane("ailerons.from", inside(0.5 * AILERON_FROM * span, unit))
              .withAeroplane("ailerons.to", inside(0.5 * AILERON_TO * span, unit))
              .withAeroplaneNumber("ailerons.chordShare", "0.25");
    }
    String note = document.aeroplaneText("note").map(text -> text + " ").orElse("");
    return shaped.withAeroplane("note", note + START_MARK);
  }

  /** A fin of usual size for a wing, as a start to be edited. */
  static ScenarioDocument plainFin(ScenarioDocument document, double span, double area) {
    String unit = lengthUnit(document);
    double size = 0.1 * area;
    double height = Math.sqrt(1.5 * size);
    return document
        .withAeroplane("fin.area", written(size, unit + "2", 3))
        .withAeroplane("fin.span", written(height, unit, 2))
        .withAeroplane("fin.arm", written(0.45 * span, unit, 2))
        .withAeroplane("fin.height", written(0.6 * height, unit, 2));
  }

  static ScenarioDocument withoutMark(ScenarioDocument document) {
    String note = document.aeroplaneText("note").orElse("").replace(START_MARK, "").strip();
    return note.isEmpty()
        ? document.withoutAeroplane("note")
        : document.withAeroplane("note", note);
  }

  /** Decimals in which a slider over a range writes: some two hundred steps at least. */
  static int decimals(double range, String unit) {
    double shown = unit.isEmpty() ? range : range / Unit.of(unit).factor();
    return (int) Math.max(0, Math.min(6, Math.ceil(-Math.log10(shown / BuildModel.STEPS))));
  }
}
