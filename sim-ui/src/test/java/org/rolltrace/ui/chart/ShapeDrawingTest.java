package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.files.AeroplaneFile;

class ShapeDrawingTest {
  private static final Path FILE =
      Path.of("src", "test", "resources", "shaped", "aeroplanes", "two-seater.json");
  private static final Geometry BASE = variant("");
  private static final Geometry CLIPPED = variant("clipped tips");

  private static Geometry variant(String name) {
    return AeroplaneFile.readAll(FILE).get(name).aeroplane().geometry().orElseThrow();
  }

  private static ShapeDrawing.Drawing draw(Geometry shape, Optional<Geometry> other) {
    return ShapeDrawing.draw(shape, other, 600, 500, "m", 1, OptionalDouble.empty());
  }

  private static List<String> words(ShapeDrawing.Drawing drawing) {
    return drawing.sheet().marks().stream()
        .filter(Mark.Label.class::isInstance)
        .map(mark -> ((Mark.Label) mark).text())
        .toList();
  }

  private static double width(DoubleStream x) {
    var statistics = x.summaryStatistics();
    return statistics.getMax() - statistics.getMin();
  }

  /** The wing spans 9 m, and its outline is the widest line that is closed. */
  @Test
  void theWingIsToScale() {
    ShapeDrawing.Drawing drawing = draw(BASE, Optional.empty());
    double widest =
        drawing.sheet().marks().stream()
            .filter(Mark.Polyline.class::isInstance)
            .mapToDouble(mark -> width(Arrays.stream(((Mark.Polyline) mark).x())))
            .max()
            .orElseThrow();
    assertThat(widest).isCloseTo(9 * drawing.scale(), within(1e-6));
  }

  @Test
  void theAileronsHaveTheInksOfTheirSides() {
    for (Ink ink : List.of(Ink.RIGHT, Ink.LEFT)) {
      ShapeDrawing.Drawing drawing = draw(BASE, Optional.empty());
      Mark.Area aileron =
          drawing.sheet().marks().stream()
              .filter(mark -> mark instanceof Mark.Area area && area.ink() == ink)
              .map(Mark.Area.class::cast)
              .findFirst()
              .orElseThrow();
      // From 2.6 m to 4.3 m.
      assertThat(width(Arrays.stream(aileron.x()))).isCloseTo(1.7 * drawing.scale(), within(1e-6));
    }
  }

  @ParameterizedTest
  @CsvSource({"m, span 9.00 m, aileron 1.70 m", "ft, span 29.53 ft, aileron 5.58 ft"})
  void dimensionsHaveTheUnitOfTheFile(String unit, String span, String aileron) {
    ShapeDrawing.Drawing drawing =
        ShapeDrawing.draw(BASE, Optional.empty(), 600, 500, unit, 1, OptionalDouble.empty());
    assertThat(words(drawing)).contains(span, aileron, "dihedral 6.0°");
  }

  @Test
  void anotherShapeStandsBehindInDashes() {
    ShapeDrawing.Drawing alone = draw(CLIPPED, Optional.empty());
    ShapeDrawing.Drawing both = draw(CLIPPED, Optional.of(BASE));
    assertThat(both.scale()).as("the larger one fits too").isLessThanOrEqualTo(alone.scale());
    assertThat(both.sheet().marks())
        .filteredOn(mark -> mark instanceof Mark.Polyline line && line.stroke().ink() == Ink.SECOND)
        .isNotEmpty()
        .allMatch(mark -> ((Mark.Polyline) mark).stroke().dash() == Dash.DASHED);
    assertThat(alone.sheet().marks())
        .noneMatch(mark -> mark instanceof Mark.Polyline line && line.stroke().ink() == Ink.SECOND);
  }

  @Test
  void aHeldScaleStaysAsLongAsAllFits() {
    double before = draw(BASE, Optional.empty()).scale();
    assertThat(
            ShapeDrawing.draw(
                    CLIPPED, Optional.empty(), 600, 500, "m", 0, OptionalDouble.of(before))
                .scale())
        .isEqualTo(before);
    assertThat(
            ShapeDrawing.draw(
                    BASE, Optional.empty(), 600, 500, "m", 0, OptionalDouble.of(10 * before))
                .scale())
        .isEqualTo(before);
  }

  @ParameterizedTest
  @CsvSource({"600, 500", "340, 300", "1200, 300", "130, 130", "300, 900"})
  void nothingOfTheAeroplaneLeavesTheSheet(double width, double height) {
    ShapeDrawing.Drawing drawing =
        ShapeDrawing.draw(
            BASE, Optional.of(CLIPPED), width, height, "m", 1, OptionalDouble.empty());
    for (Mark mark : drawing.sheet().marks()) {
      if (mark instanceof Mark.Polyline line) {
        assertThat(Arrays.stream(line.x())).allMatch(x -> x >= 0 && x <= width);
        assertThat(Arrays.stream(line.y())).allMatch(y -> y >= 0 && y <= height);
      } else if (mark instanceof Mark.Area area) {
        assertThat(Arrays.stream(area.x())).allMatch(x -> x >= 0 && x <= width);
        assertThat(Arrays.stream(area.y())).allMatch(y -> y >= 0 && y <= height);
      }
    }
  }

  /** A pod of 1 m or so, with the tail more than that behind it. */
  @Test
  void aBodyThatIsTooShortForTheTailCarriesTheWingAndHasABoom() {
    Geometry survey =
        AeroplaneFile.read(Path.of("..", "scenarios", "aeroplanes", "mosspipit-survey.json"))
            .aeroplane()
            .geometry()
            .orElseThrow();
    ShapeDrawing.Drawing drawing = draw(survey, Optional.empty());
    List<Mark.Area> areas =
        drawing.sheet().marks().stream()
            .filter(Mark.Area.class::isInstance)
            .map(Mark.Area.class::cast)
            .toList();
    double nose = top(areas.stream().filter(area -> area.ink() == Ink.GROUND).findFirst());
    double wing = top(areas.stream().filter(area -> area.opacity() == 0.1).findFirst());
    assertThat(nose).isLessThan(wing);
    assertThat(drawing.sheet().marks())
        .anyMatch(
            mark ->
                mark instanceof Mark.Line line
                    && line.stroke().equals(Stroke.of(Ink.WING, 3))
                    && line.y2() > line.y1());
  }

  private static double top(Optional<Mark.Area> area) {
    return Arrays.stream(area.orElseThrow().y()).min().orElseThrow();
  }

  @Test
  void aSheetTooSmallIsRefused() {
    assertThatThrownBy(
            () ->
                ShapeDrawing.draw(BASE, Optional.empty(), 100, 500, "m", 0, OptionalDouble.empty()))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("100");
  }
}
