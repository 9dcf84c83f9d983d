package org.rolltrace.ui.build;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.SimpleIntegerProperty;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.session.DeskSession;

/** What the workplace shows of a session: the shape, what is chosen of it, and what it gives. */
public final class BuildModel {
  private static final String PANELS = "wing.panels";
  private static final String VARIANT = "$.variant";

  /** The least length of an aileron that a slider leaves, by the half span. */
  private static final double SHORTEST_AILERON = 0.02;

  /** A slider writes in at least so many steps over its range. */
  static final int STEPS = 200;

  private final DeskSession session;
  private final ReadOnlyObjectProperty<TimeWindow> window;
  private final IntegerProperty panel = new SimpleIntegerProperty(this, "panel", 0);
  private final ReadOnlyBooleanWrapper held = new ReadOnlyBooleanWrapper(this, "held", false);

  /** Of sliders, kept while their values stay inside, so that nothing moves under the mouse. */
  private final Map<ShapeValue, ValueRange> ranges = new EnumMap<>(ShapeValue.class);

  private int shownDocument = -1;

  /**
   * A model.
   *
   * @param session what is shown
   * @param window the stretch of time that is seen of the response
   */
  public BuildModel(DeskSession session, ReadOnlyObjectProperty<TimeWindow> window) {
    this.session = session;
    this.window = window;
    panel.addListener((property, before, now) -> forgetPanelRanges());
    session.documentProperty().addListener((property, before, now) -> follow());
    follow();
  }

  private void follow() {
    if (session.openedProperty().get() != shownDocument) {
      shownDocument = session.openedProperty().get();
      ranges.clear();
      panel.set(Math.max(0, panelCount() - 1)); // the tip is what is changed most
    }
    if (panel.get() >= Math.max(1, panelCount())) {
      panel.set(Math.max(0, panelCount() - 1));
    }
  }

  private void forgetPanelRanges() {
    ranges.keySet().removeIf(ShapeValue::ofPanel);
  }

  /**
   * The session.
   *
   * @return what is shown
   */
  public DeskSession session() {
    return session;
  }

  /**
   * The stretch of time that is seen of the response.
   *
   * @return the property
   */
  public ReadOnlyObjectProperty<TimeWindow> windowProperty() {
    return window;
  }

  /**
   * The panel of the wing whose values are shown, from 0 at the root.
   *
   * @return the property
   */
  public IntegerProperty panelProperty() {
    return panel;
  }

  /**
   * Whether a slider is held: then axes and scale stay.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty heldProperty() {
    return held.getReadOnlyProperty();
  }

  private Optional<ScenarioDocument> document() {
    return Optional.ofNullable(session.documentProperty().get());
  }

  private Optional<RunResult> result() {
    return Optional.ofNullable(session.resultProperty().get());
  }

  /**
   * Whether the document gives the aeroplane a wing, right or wrong.
   *
   * @return false also without a document
   */
  public boolean hasShape() {
    return document().map(now -> now.aeroplaneHas("wing")).orElse(false);
  }

  /**
   * Whether the document gives the aeroplane a fin.
   *
   * @return false also without a document
   */
  public boolean hasFin() {
    return document().map(now -> now.aeroplaneHas("fin")).orElse(false);
  }

  /**
   * How many panels a side the wing has.
   *
   * @return 0 without a wing
   */
  public int panelCount() {
    return document().map(now -> now.aeroplaneCount(PANELS)).orElse(0);
  }

  /**
   * What is flown, in a line.
   *
   * @return the aeroplane with its variant; empty when nothing was flown yet
   */
  public String flown() {
    return result().map(now -> now.scenario().data().aeroplane().name()).orElse("");
  }

  /**
   * The shape that was flown last.
   *
   * @return empty when the aeroplane has none
   */
  public Optional<Geometry> shape() {
    return result().flatMap(BuildModel::shapeOf);
  }

  /**
   * The shape of the run that was kept to compare with.
   *
   * @return empty when nothing is kept, or it has none
   */
  public Optional<Geometry> keptShape() {
    return Optional.ofNullable(session.ghostProperty().get()).flatMap(BuildModel::shapeOf);
  }

  private static Optional<Geometry> shapeOf(RunResult result) {
    return result.scenario().data().aeroplane().geometry();
  }

  /**
   * What is kept to compare with, in a line.
   *
   * @return empty when nothing is
   */
  public String kept() {
    return Optional.ofNullable(session.ghostProperty().get())
        .map(ghost -> "Dashed: kept, " + ghost.scenario().data().aeroplane().name())
        .orElse("");
  }

  /**
   * The unit of lengths on the drawing.
   *
   * @return that in which the file gives the span
   */
  public String lengthUnit() {
    return document().map(ShapeEdits::lengthUnit).orElse("m");
  }

  /** A value as the document has it, in SI units; empty when absent or wrong. */
  OptionalDouble value(ShapeValue value) {
    if (document().isEmpty()) {
      return OptionalDouble.empty();
    }
    ScenarioDocument now = document().get();
    if (value == ShapeValue.SPAN) {
      return ShapeEdits.span(now);
    }
    OptionalDouble written = ShapeEdits.quantity(now, value.path(panel.get()), value.dimension());
    return written.isEmpty() && value == ShapeValue.DIHEDRAL && hasShape()
        ? OptionalDouble.of(0)
        : written;
  }

  /** What the slider of a value covers, in SI units; empty when there is nothing to slide. */
  Optional<ValueRange> range(ShapeValue value) {
    OptionalDouble now = value(value);
    if (now.isEmpty() || !hasShape()) {
      return Optional.empty();
    }
    double present = now.getAsDouble();
    ValueRange range = ranges.get(value);
    boolean fits = range != null && fits(range, present);
    if (!fits || value == ShapeValue.AILERON_FROM || value == ShapeValue.AILERON_TO) {
      Optional<ValueRange> usual = usual(value, present);
      usual.ifPresent(made -> ranges.put(value, made));
      return usual;
    }
    return Optional.of(range);
  }

  /** An end that was written with fewer digits still belongs to the range. */
  private static boolean fits(ValueRange range, double present) {
    double rounding = (range.high() - range.low()) / STEPS;
    return present >= range.low() - rounding && present <= range.high() + rounding;
  }

  private Optional<ValueRange> usual(ShapeValue value, double now) {
    double degree = Math.toRadians(1);
    return switch (value) {
      case SPAN -> about(now, 0.6, 1.4);
      case INNER_CHORD, OUTER_CHORD -> about(now, 0.4, 1.6);
      case DIHEDRAL -> reaching(-5 * degree, 12 * degree, now, 5 * degree);
      case AILERON_FROM, AILERON_TO -> {
        double tip = 0.5 * value(ShapeValue.SPAN).orElse(0);
        yield tip > 0 ? Optional.of(new ValueRange(0, Math.max(tip, now))) : Optional.empty();
      }
      case AILERON_SHARE -> reaching(0.05, 0.5, now, 0);
      case AILERON_UP -> reaching(degree, 30 * degree, now, 0);
      case AILERON_DOWN -> reaching(0, 30 * degree, now, 0);
      case FIN_AREA -> about(now, 0.3, 2);
      case FIN_SPAN, FIN_ARM -> about(now, 0.5, 1.5);
      case FIN_HEIGHT -> {
        double reach = value(ShapeValue.FIN_SPAN).orElse(1);
        yield reach > 0
            ? Optional.of(new ValueRange(now - 0.5 * reach, now + 0.5 * reach))
            : Optional.empty();
      }
    };
  }

  private static Optional<ValueRange> about(double now, double less, double more) {
    return now > 0 ? Optional.of(new ValueRange(less * now, more * now)) : Optional.empty();
  }

  private static Optional<ValueRange> reaching(double low, double high, double now, double beyond) {
    return Optional.of(
        new ValueRange(now < low ? now - beyond : low, now > high ? now + beyond : high));
  }

  /** Takes a slider in hand. */
  void hold() {
    held.set(true);
  }

  /** Lets go of a slider: what was done with it is one step. */
  void letGo() {
    session.endGesture();
    held.set(false);
  }

  /** Moves the slider of a value to a place in SI units. */
  void slide(ShapeValue value, double to) {
    Optional<ValueRange> range = range(value);
    if (range.isEmpty() || document().isEmpty()) {
      return;
    }
    int at = panel.get();
    double place = allowed(value, Math.max(range.get().low(), Math.min(range.get().high(), to)));
    session.editFromStart(
        "change " + value.word(),
        value.sliderId() + at,
        start -> {
          String path = value.path(at);
          String unit = ShapeEdits.unit(start, path, value.dimension(), usualUnit(start, value));
          int decimals = ShapeEdits.decimals(range.get().high() - range.get().low(), unit);
          String text = ShapeEdits.written(place, unit, decimals);
          ScenarioDocument put = value.target(at).put(start, text);
          return ShapeEdits.follow(value, at, start, put);
        });
  }

  private static String usualUnit(ScenarioDocument document, ShapeValue value) {
    if (value.dimension().equals(Dimension.ANGLE)) {
      return "deg";
    }
    String length = ShapeEdits.lengthUnit(document);
    return value.dimension().equals(Dimension.AREA) ? length + "2" : length;
  }

  /** An aileron keeps some length, and stays on the wing. */
  private double allowed(ShapeValue value, double to) {
    double tip = 0.5 * value(ShapeValue.SPAN).orElse(0);
    double least = SHORTEST_AILERON * tip;
    return switch (value) {
      case AILERON_FROM ->
          Math.max(0, Math.min(to, value(ShapeValue.AILERON_TO).orElse(tip) - least));
      case AILERON_TO ->
          Math.min(tip, Math.max(to, value(ShapeValue.AILERON_FROM).orElse(0) + least));
      default -> to;
    };
  }

  /** Whether the aeroplane still needs a mass before a shape can be flown. */
  boolean needsMass() {
    return document()
        .map(now -> !now.aeroplaneHas("mass") && !now.aeroplaneHas("masses"))
        .orElse(false);
  }

  /** Whether there is enough to make a shape of. */
  boolean mayGiveShape() {
    return document().isPresent() && !hasShape() && !needsMass() && size().isPresent();
  }

  /** Span and area, m and m². */
  private Optional<double[]> size() {
    OptionalDouble span = ShapeEdits.quantity(document().orElseThrow(), "span", Dimension.LENGTH);
    OptionalDouble area = ShapeEdits.quantity(document().orElseThrow(), "wingArea", Dimension.AREA);
    boolean usable =
        span.isPresent() && area.isPresent() && span.getAsDouble() > 0 && area.getAsDouble() > 0;
    return usable
        ? Optional.of(new double[] {span.getAsDouble(), area.getAsDouble()})
        : Optional.empty();
  }

  /** Writes a plain wing of span and area into the scenario's own copy, as a start. */
  public void giveShape() {
    if (mayGiveShape()) {
      double[] size = size().orElseThrow();
      session.edit("give a shape", now -> ShapeEdits.plainShape(now, size[0], size[1]));
    }
  }

  /** Writes a fin of usual size for the wing into the scenario's own copy, as a start. */
  public void giveFin() {
    shape()
        .map(Geometry::wing)
        .ifPresent(
            wing ->
                session.edit(
                    "add a fin", now -> ShapeEdits.plainFin(now, wing.span(), wing.area())));
  }

  /** Whether the shape is marked as a start that is still to be edited. */
  boolean isStart() {
    return document()
        .flatMap(now -> now.aeroplaneText("note"))
        .map(note -> note.contains(ShapeEdits.START_MARK))
        .orElse(false);
  }

  /** Takes the mark of a start out of the aeroplane's note. */
  void takeMarkOut() {
    session.edit("take the mark out", ShapeEdits::withoutMark);
  }

  /**
   * The names of the aeroplane's variants.
   *
   * @return none when it has none
   */
  public List<String> variants() {
    return document().map(ScenarioDocument::variants).orElse(List.of());
  }

  /**
   * The variant that flies.
   *
   * @return its name, empty text for the base
   */
  public String variant() {
    return document().flatMap(ScenarioDocument::variant).orElse("");
  }

  /**
   * Flies another variant, with what flew before kept to compare with.
   *
   * @param name empty for the base
   */
  public void chooseVariant(String name) {
    if (document().isEmpty() || name.equals(variant())) {
      return;
    }
    session.keepGhost();
    session.edit("choose variant", now -> picking(now, name));
  }

  private static ScenarioDocument picking(ScenarioDocument document, String name) {
    return name.isEmpty() ? document.without(VARIANT) : document.with(VARIANT, name);
  }

  /**
   * Keeps a variant as it is now to compare with, in the same condition and manoeuvre.
   *
   * @param name empty for the base
   */
  public void keepVariant(String name) {
    session.keepGhostOf(
        name.isEmpty() ? "the base" : "the variant " + name, now -> picking(now, name));
  }

  /**
   * The derivatives as they were flown last.
   *
   * @return one row for each, in the order of the enumeration; none when nothing was flown
   */
  List<DerivativeRow> rows() {
    Optional<LateralDerivatives> now = result().map(RunResult::scenario).map(BuildModel::setOf);
    Optional<LateralDerivatives> other =
        Optional.ofNullable(session.ghostProperty().get())
            .map(RunResult::scenario)
            .map(BuildModel::setOf);
    return now.map(
            set ->
                Arrays.stream(Coefficient.values())
                    .map(coefficient -> DerivativeRow.of(coefficient, set, other))
                    .toList())
        .orElse(List.of());
  }

  private static LateralDerivatives setOf(Scenario scenario) {
    return scenario.data().derivatives();
  }

  /** The derivatives of which a given value stands in place of an estimate. */
  List<Coefficient> overridden() {
    return rows().stream().filter(DerivativeRow::isSet).map(DerivativeRow::coefficient).toList();
  }

  /** Whether values can be taken out one by one, which those that are converted together cannot. */
  boolean mayTakeOutOne() {
    return document()
        .map(
            now ->
                now.aeroplaneHas("derivatives.values")
                    && !now.aeroplaneText("axes").orElse("").equals("body"))
        .orElse(false);
  }

  /** Takes given values out, so that the estimates fly. */
  void takeOut(List<Coefficient> given) {
    List<Coefficient> wanted = new ArrayList<>(given);
    boolean oneByOne = mayTakeOutOne();
    session.edit(
        wanted.size() == 1 ? "take " + wanted.get(0).symbol() + " out" : "take given values out",
        now -> {
          if (!oneByOne) {
            return now.withoutAeroplane("derivatives");
          }
          ScenarioDocument without = now;
          for (Coefficient coefficient : wanted) {
            without = without.withoutAeroplane("derivatives.values." + coefficient.symbol());
          }
          return hasValues(without) ? without : without.withoutAeroplane("derivatives");
        });
  }

  private static boolean hasValues(ScenarioDocument document) {
    return Arrays.stream(Coefficient.values())
        .anyMatch(one -> document.aeroplaneHas("derivatives.values." + one.symbol()));
  }
}
