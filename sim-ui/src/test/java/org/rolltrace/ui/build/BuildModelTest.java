package org.rolltrace.ui.build;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import javafx.beans.property.SimpleObjectProperty;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.OpenSession;

class BuildModelTest {
  /** Lengths are written to a tenth of a millimetre. */
  private static final double WRITTEN = 1e-4;

  @TempDir Path recovery;
  private DeskSession session;
  private BuildModel model;

  @BeforeEach
  void openTheTwoSeater() {
    use(OpenSession.shaped(recovery));
  }

  private void use(DeskSession opened) {
    session = opened;
    model = new BuildModel(session, new SimpleObjectProperty<>(new TimeWindow(0, 4)));
  }

  private Geometry shape() {
    assertThat(session.faults()).isEmpty();
    return model.shape().orElseThrow();
  }

  private String text(String path) {
    return session.documentProperty().get().aeroplaneText(path).orElse("absent");
  }

  private void slide(ShapeValue value, double... places) {
    model.hold();
    for (double place : places) {
      model.slide(value, place);
    }
    model.letGo();
  }

  private double value(Coefficient coefficient) {
    return row(coefficient).value();
  }

  private DerivativeRow row(Coefficient coefficient) {
    return model.rows().get(coefficient.ordinal());
  }

  private double rollRate() {
    return session
        .resultProperty()
        .get()
        .measure("peakRollRate")
        .orElseThrow()
        .value()
        .orElseThrow();
  }

  @Test
  void theSpanScalesStationsAndNothingElse() {
    Geometry before = shape();
    slide(ShapeValue.SPAN, 9.5, 8.1);

    Geometry after = shape();
    assertThat(after.wing().span()).isCloseTo(8.1, within(2 * WRITTEN));
    assertThat(after.ailerons().orElseThrow().to() / after.wing().halfSpan())
        .as("share of the half span")
        .isCloseTo(before.ailerons().orElseThrow().to() / 4.5, within(WRITTEN));
    for (int i = 0; i < 2; i++) {
      WingPanel one = after.wing().panels().get(i);
      WingPanel other = before.wing().panels().get(i);
      assertThat(one.to()).isCloseTo(0.9 * other.to(), within(WRITTEN));
      assertThat(one.innerChord()).isEqualTo(other.innerChord());
      assertThat(one.outerChord()).isEqualTo(other.outerChord());
      assertThat(one.dihedral()).isEqualTo(other.dihedral());
    }
    assertThat(text("span")).isEqualTo("8.1 m");
    assertThat(text("inertia.roll")).isEqualTo("919 kg m2");
  }

  @Test
  void aDragIsOneStepAndLeadsBackToTheVeryText() {
    ScenarioDocument before = session.documentProperty().get();
    double slow = rollRate();
    slide(ShapeValue.SPAN, 8.7, 8.4, 8);
    assertThat(rollRate()).as("short wings roll fast (common practice)").isGreaterThan(slow);
    assertThat(session.undoWordProperty().get()).isEqualTo("change span");

    session.undo();
    assertThat(session.documentProperty().get()).isEqualTo(before);
    assertThat(session.canUndoProperty().get()).isFalse();
    assertThat(rollRate()).isEqualTo(slow);
    session.redo();
    assertThat(text("span")).isEqualTo("8 m");
  }

  private static LongStream seeds() {
    return LongStream.range(0, 20);
  }

  /** Each place counts from where the drag began, so nothing is lost on the way. */
  @ParameterizedTest
  @MethodSource("seeds")
  void whereADragWentDoesNotMatter(long seed) {
    Random random = new Random(seed);
    slide(ShapeValue.SPAN, 10);
    ScenarioDocument straight = session.documentProperty().get();
    session.undo();
    double[] places = random.doubles(30, 6, 12).toArray();
    places[29] = 10;
    slide(ShapeValue.SPAN, places);
    assertThat(session.documentProperty().get()).isEqualTo(straight);
  }

  @Test
  void aGivenSpanAndAreaAreKeptInStep() {
    session.edit(
        "give",
        document ->
            document.withAeroplane("span", "29.528 ft").withAeroplane("wingArea", "12.3 m2"));
    assertThat(session.faults()).isEmpty();

    slide(ShapeValue.SPAN, 8);
    assertThat(shape().wing().span()).isCloseTo(8, within(0.016)); // in tenths of a foot
    assertThat(text("span")).endsWith(" ft");
    assertThat(text("wingArea")).endsWith(" m2");
    model.panelProperty().set(1);
    slide(ShapeValue.OUTER_CHORD, 0.8);
    assertThat(shape().wing().panels().get(1).outerChord()).isEqualTo(0.8);
  }

  @Test
  void chordsThatMeetChangeTogether() {
    model.panelProperty().set(1);
    slide(ShapeValue.INNER_CHORD, 1.4);
    assertThat(shape().wing().panels().get(0).outerChord()).isEqualTo(1.4);
    assertThat(shape().wing().panels().get(1).innerChord()).isEqualTo(1.4);
    model.panelProperty().set(0);
    slide(ShapeValue.INNER_CHORD, 1.7);
    assertThat(shape().wing().panels().get(0).innerChord()).isEqualTo(1.7);
    assertThat(shape().wing().panels().get(1).innerChord()).isEqualTo(1.4);
  }

  @Test
  void moreDihedralIsMoreDihedralEffect() {
    double before = value(Coefficient.CL_BETA);
    model.panelProperty().set(1);
    slide(ShapeValue.DIHEDRAL, Math.toRadians(9));
    assertThat(text("wing.panels[1].dihedral")).isEqualTo("9 deg");
    assertThat(value(Coefficient.CL_BETA)).isLessThan(before);
  }

  @ParameterizedTest
  @EnumSource(ShapeValue.class)
  void everySliderCoversItsValueAndFliesAtBothEnds(ShapeValue value) {
    model.panelProperty().set(1);
    double now = model.value(value).orElseThrow();
    ValueRange range = model.range(value).orElseThrow();
    assertThat(now).isBetween(range.low(), range.high());
    for (double end : new double[] {range.low(), range.high(), now}) {
      slide(value, end);
      assertThat(session.faults()).as(value + " at " + end).isEmpty();
      assertThat(session.failureProperty().get()).isEmpty();
    }
    // A slider writes in some two hundred steps or more.
    assertThat(model.value(value).orElseThrow())
        .isCloseTo(now, within((range.high() - range.low()) / BuildModel.STEPS));
  }

  @Test
  void theRangeOfASliderStaysWhileItsValueIsInside() {
    ValueRange before = model.range(ShapeValue.SPAN).orElseThrow();
    slide(ShapeValue.SPAN, 11);
    assertThat(model.range(ShapeValue.SPAN)).contains(before);
    session.edit("type", document -> spanned(document, "30 m"));
    assertThat(model.range(ShapeValue.SPAN).orElseThrow().high()).isGreaterThan(30);
  }

  private static ScenarioDocument spanned(ScenarioDocument document, String span) {
    return ShapeEdits.follow(ShapeValue.SPAN, 0, document, document.withAeroplane("span", span));
  }

  @Test
  void anAileronStaysOnTheWingAndKeepsSomeLength() {
    slide(ShapeValue.AILERON_TO, 99);
    assertThat(shape().ailerons().orElseThrow().to()).isEqualTo(4.5);
    slide(ShapeValue.AILERON_FROM, 99);
    assertThat(shape().ailerons().orElseThrow().from()).isLessThan(4.45);
    slide(ShapeValue.AILERON_TO, 0);
    assertThat(shape().ailerons().orElseThrow().to())
        .isGreaterThan(shape().ailerons().orElseThrow().from());
    slide(ShapeValue.AILERON_TO, 4.5);
    slide(ShapeValue.SPAN, 7.7777);
    assertThat(shape().ailerons().orElseThrow().to())
        .isLessThanOrEqualTo(shape().wing().halfSpan() + 1e-6);
  }

  @Test
  void aSpanThatIsNoneIsAFaultAndLeavesThePanels() {
    session.edit("type", document -> spanned(document, "9 kg"));
    assertThat(session.faultAt("$.aeroplane.span").orElseThrow()).contains("9 kg");
    assertThat(text("wing.panels[1].to")).isEqualTo("4.5 m");
    session.edit("type", document -> spanned(document, "-9 m"));
    assertThat(session.faultAt("$.aeroplane.span")).isPresent();
    assertThat(text("wing.panels[1].to")).isEqualTo("4.5 m");
    assertThat(model.shape()).as("the last sound one").isPresent();
    session.edit("type", document -> spanned(document, "10 m"));
    assertThat(shape().wing().span()).isEqualTo(10);
  }

  @Test
  void choosingAVariantLeavesWhatFlewBehind() {
    assertThat(model.variants()).containsExactly("clipped tips", "large ailerons");
    model.chooseVariant("clipped tips");
    assertThat(model.variant()).isEqualTo("clipped tips");
    assertThat(shape().wing().span()).isEqualTo(8.6);
    assertThat(model.keptShape().orElseThrow().wing().span()).isEqualTo(9);
    assertThat(row(Coefficient.CL_P).kept()).isPresent();

    slide(ShapeValue.SPAN, 8);
    assertThat(shape().wing().span()).isCloseTo(8, within(2 * WRITTEN));
    model.chooseVariant("");
    assertThat(shape().wing().span()).as("the base stayed").isEqualTo(9);
    session.undo();
    session.undo();
    assertThat(shape().wing().span()).isEqualTo(8.6);
  }

  @Test
  void aVariantIsKeptToCompareWithoutChoosingIt() {
    ScenarioDocument before = session.documentProperty().get();
    model.keepVariant("large ailerons");
    assertThat(model.keptShape().orElseThrow().ailerons().orElseThrow().chordShare())
        .isEqualTo(0.32);
    assertThat(session.documentProperty().get()).isEqualTo(before);
    assertThat(row(Coefficient.CL_DA).kept().orElseThrow())
        .as("large ailerons (common practice)")
        .isGreaterThan(value(Coefficient.CL_DA));
    model.keepVariant("none such");
    assertThat(session.problemProperty().get().message()).contains("none such");
  }

  @Test
  void aGivenValueWinsUntilItIsTakenOut() {
    double estimate = value(Coefficient.CL_P);
    assertThat(model.overridden()).isEmpty();
    session.edit(
        "give",
        document ->
            document
                .withAeroplaneNumber("derivatives.values.Cl_p", "-0.3")
                .withAeroplaneNumber("derivatives.values.CY_da", "0.01"));
    assertThat(row(Coefficient.CL_P).origin()).isEqualTo(Origin.SET);
    assertThat(model.overridden()).containsExactly(Coefficient.CL_P);
    assertThat(row(Coefficient.CL_P).explanation())
        .contains("does not change it")
        .contains("lifting surface");
    slide(ShapeValue.SPAN, 8);
    assertThat(value(Coefficient.CL_P)).isEqualTo(-0.3);
    session.undo();

    model.takeOut(model.overridden());
    assertThat(value(Coefficient.CL_P)).isEqualTo(estimate);
    assertThat(row(Coefficient.CY_DA).origin()).as("has no estimate").isEqualTo(Origin.GIVEN);
    model.takeOut(List.of(Coefficient.CY_DA));
    assertThat(text("derivatives.source")).isEqualTo("absent");
    assertThat(session.faults()).isEmpty();
  }

  @Test
  void anAeroplaneWithoutAShapeGetsAPlainOneToBeEdited() {
    use(OpenSession.of("light-single-roll-entry", recovery));
    assertThat(model.hasShape()).isFalse();
    assertThat(model.shape()).isEmpty();
    assertThat(model.range(ShapeValue.SPAN)).isEmpty();
    double before = rollRate();

    model.giveShape();
    // Span and area of the file: 33.4 ft and 184 ft2; chords are written to 1e-3 ft.
    assertThat(shape().wing().span()).isCloseTo(33.4 * 0.3048, within(WRITTEN));
    assertThat(shape().wing().area()).isCloseTo(184 * 0.3048 * 0.3048, within(0.005));
    assertThat(shape().ailerons()).isPresent();
    assertThat(text("wing.panels[0].to")).isEqualTo("16.7 ft");
    assertThat(model.isStart()).isTrue();
    // The area is that of the panels now, which agrees to the digits of their chords.
    assertThat(rollRate()).as("given derivatives win").isCloseTo(before, within(1e-4 * before));
    assertThat(model.overridden()).contains(Coefficient.CL_P, Coefficient.CL_DA);

    model.takeOut(List.of(Coefficient.CL_P));
    assertThat(rollRate()).isNotEqualTo(before);
    model.takeMarkOut();
    assertThat(model.isStart()).isFalse();
    assertThat(text("note")).doesNotContain("plain start");
    assertThat(model.hasFin()).isFalse();
    model.giveFin();
    assertThat(shape().fin()).isPresent();
  }

  @Test
  void withoutAMassThereIsNoShapeYet() {
    use(OpenSession.of("one-degree-roll-step", recovery));
    assertThat(model.needsMass()).isTrue();
    model.giveShape();
    assertThat(model.hasShape()).isFalse();
    session.edit("mass", document -> document.withAeroplane("mass", "1000 kg"));
    model.giveShape();
    assertThat(shape().wing().panels()).hasSize(1);
  }

  @Test
  void anEmptySessionHasAModel() {
    use(
        new DeskSession(
            new org.rolltrace.ui.task.SameThread(),
            new org.rolltrace.ui.session.RecoveryStore(recovery)));
    model.giveShape();
    model.giveFin();
    model.chooseVariant("any");
    model.keepVariant("");
    slide(ShapeValue.SPAN, 3);
    assertThat(model.rows()).isEmpty();
    assertThat(model.flown()).isEmpty();
    assertThat(model.lengthUnit()).isEqualTo("m");
  }
}
