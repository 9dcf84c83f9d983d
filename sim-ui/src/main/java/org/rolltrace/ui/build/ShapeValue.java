package org.rolltrace.ui.build;

import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.ui.control.FieldTarget;

/** What of a shape has a field and a slider. */
@SuppressWarnings("ImmutableEnumChecker") // dimensions cannot be changed
enum ShapeValue {
  SPAN(
      "span",
      "Span",
      "span",
      Dimension.LENGTH,
      "10 m",
      "From tip to tip. Changing it scales the stations where panels and ailerons begin and end;"
          + " chords, angles and masses stay"),
  INNER_CHORD(
      "wing.panels[#].innerChord",
      "Inner chord",
      "inner chord",
      Dimension.LENGTH,
      "1.5 m",
      "Chord at the inner end of the panel, at the root of the innermost. Where it meets that of the"
          + " panel inside, both change"),
  OUTER_CHORD(
      "wing.panels[#].outerChord",
      "Outer chord",
      "outer chord",
      Dimension.LENGTH,
      "1 m",
      "Chord at the outer end of the panel, at the tip of the outermost. Where it meets that of the"
          + " panel outside, both change"),
  DIHEDRAL(
      "wing.panels[#].dihedral",
      "Dihedral",
      "dihedral",
      Dimension.ANGLE,
      "0 deg",
      "Of the panel, positive with its outer end higher; empty for none"),
  AILERON_FROM(
      "ailerons.from",
      "Inner end",
      "inner end of the aileron",
      Dimension.LENGTH,
      "none",
      "From the plane of symmetry"),
  AILERON_TO(
      "ailerons.to",
      "Outer end",
      "outer end of the aileron",
      Dimension.LENGTH,
      "none",
      "From the plane of symmetry, no further out than the tip"),
  AILERON_SHARE(
      "ailerons.chordShare",
      "Chord share",
      "chord share of the aileron",
      Dimension.DIMENSIONLESS,
      "none",
      "Chord of the aileron behind its hinge by that of the wing, such as 0.25"),
  AILERON_UP(
      "ailerons.up",
      "Travel up",
      "aileron travel up",
      Dimension.ANGLE,
      "20 deg",
      "Largest, upwards"),
  AILERON_DOWN(
      "ailerons.down",
      "Travel down",
      "aileron travel down",
      Dimension.ANGLE,
      "15 deg",
      "Largest, downwards; less than upwards in differential ailerons"),
  FIN_AREA(
      "fin.area",
      "Area",
      "fin area",
      Dimension.AREA,
      "none",
      "With the rudder. The span of the fin stays, so its chord changes"),
  FIN_SPAN("fin.span", "Span", "fin span", Dimension.LENGTH, "none", "From root to tip of the fin"),
  FIN_ARM(
      "fin.arm",
      "Arm",
      "fin arm",
      Dimension.LENGTH,
      "none",
      "From the centre of gravity back to the quarter-chord point of the fin"),
  FIN_HEIGHT(
      "fin.height",
      "Height",
      "fin height",
      Dimension.LENGTH,
      "none",
      "Of the fin's aerodynamic centre above the centre of gravity");

  private static final int COLUMNS = 8;

  private final String path;
  private final String title;
  private final String word;
  private final Dimension dimension;
  private final String prompt;
  private final String hint;

  ShapeValue(
      String path, String title, String word, Dimension dimension, String prompt, String hint) {
    this.path = path;
    this.title = title;
    this.word = word;
    this.dimension = dimension;
    this.prompt = prompt;
    this.hint = hint;
  }

  /** From the aeroplane on. */
  String path(int panel) {
    return path.replace("#", String.valueOf(panel));
  }

  boolean ofPanel() {
    return path.contains("#");
  }

  boolean isChord() {
    return this == INNER_CHORD || this == OUTER_CHORD;
  }

  Dimension dimension() {
    return dimension;
  }

  /** What changing it is called in undo. */
  String word() {
    return word;
  }

  /** A name by which tests and style sheets find its slider. */
  String sliderId() {
    return "slide-" + name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }

  FieldTarget target(int panel) {
    String at = "$.aeroplane." + path(panel);
    return dimension.equals(Dimension.DIMENSIONLESS)
        ? FieldTarget.number(at, title, word, prompt, hint, COLUMNS)
        : FieldTarget.quantity(at, title, word, prompt, hint, COLUMNS);
  }
}
