package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.files.AeroplaneFile;
import org.rolltrace.core.run.AskedCondition;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.scenario.AeroplaneData;

/** What stands on the pages about derivatives, read off their marks. */
class DerivativePicturesTest {
  private static final Path TOURER =
      Path.of("..", "sim-core/src/test/resources/files/aeroplanes/linnetfield-tourer.json");

  private static DerivativeReport report(int copies) {
    Map<String, AeroplaneData> all = new LinkedHashMap<>(AeroplaneFile.readAll(TOURER));
    AeroplaneData base = all.remove("");
    AeroplaneData other = all.get("clipped tips");
    for (int i = 0; i < copies; i++) {
      all.put("a copy with a name much longer than there is room beside the drawing " + i, other);
    }
    return DerivativeReport.of(base, all, AskedCondition.NOTHING.of(base));
  }

  private static List<Mark> flat(List<Mark> marks) {
    List<Mark> flat = new ArrayList<>();
    for (Mark mark : marks) {
      if (mark instanceof Mark.Clip clip) {
        flat.addAll(flat(clip.marks()));
      } else {
        flat.add(mark);
      }
    }
    return flat;
  }

  private static <T extends Mark> List<T> of(Class<T> kind, Sheet sheet) {
    return flat(sheet.marks()).stream().filter(kind::isInstance).map(kind::cast).toList();
  }

  private static double extent(double[] values) {
    return Arrays.stream(values).max().orElseThrow() - Arrays.stream(values).min().orElseThrow();
  }

  private static Mark.Area widest(List<Mark.Area> areas) {
    return areas.stream().max((a, b) -> Double.compare(extent(a.x()), extent(b.x()))).orElseThrow();
  }

  @Test
  void theShapeIsDrawnToScale() {
    Sheet sheet = ShapePicture.draw(report(0));
    List<Mark.Area> areas = of(Mark.Area.class, sheet);
    double pixels = extent(widest(areas).x()) / 9.4; // px to 1 m by the span
    // Areas, of both views: body, tailplane, wing, two ailerons, fin; the rest from behind.
    assertThat(areas).hasSize(12);
    Mark.Area body = areas.get(0);
    assertThat(extent(body.y())).isCloseTo(7.1 * pixels, within(1e-6));
    assertThat(extent(body.x())).isCloseTo(1.15 * pixels, within(1e-6));
    assertThat(extent(areas.get(1).x())).isCloseTo(3.2 * pixels, within(1e-6));
    assertThat(extent(areas.get(3).x())).isCloseTo(1.7 * pixels, within(1e-6));
    Mark.Area bodyFromBehind = areas.get(6);
    assertThat(extent(bodyFromBehind.y())).isCloseTo(1.3 * pixels, within(1e-6));
    Mark.Area finFromBehind = areas.get(8);
    assertThat(extent(finFromBehind.y())).isCloseTo(1.45 * pixels, within(1e-6));
  }

  @Test
  void withRightStickTheRightAileronIsUp() {
    List<Mark.Area> areas = of(Mark.Area.class, ShapePicture.draw(report(0)));
    Mark.Area right = areas.get(10);
    Mark.Area left = areas.get(11);
    double middle = Arrays.stream(areas.get(6).x()).average().orElseThrow();
    assertThat(Arrays.stream(right.x()).min().orElseThrow()).isGreaterThan(middle);
    assertThat(Arrays.stream(left.x()).max().orElseThrow()).isLessThan(middle);
    // The trailing edge is the second half of each outline; y goes down.
    assertThat(right.y()[right.y().length - 1]).isLessThan(right.y()[0]);
    assertThat(left.y()[left.y().length - 1]).isGreaterThan(left.y()[0]);
  }

  @Test
  void variantsDifferInInkAndDash() {
    List<VariantStroke> strokes = VariantStroke.of(report(20));
    assertThat(strokes).hasSize(VariantStroke.MOST);
    Set<String> looks =
        strokes.stream()
            .map(each -> each.stroke().ink() + " " + each.stroke().dash())
            .collect(Collectors.toSet());
    assertThat(looks).hasSize(VariantStroke.MOST);
    assertThat(strokes.get(0).stroke().dash()).isEqualTo(Dash.SOLID);
    assertThat(strokes.stream().skip(1)).noneMatch(each -> each.stroke().dash() == Dash.SOLID);
    assertThat(VariantStroke.remark(report(20))).contains("Not drawn: ");
    assertThat(VariantStroke.remark(report(0))).doesNotContain("Not drawn: ");
  }

  @Test
  void eachLoadHasTheLinesThatDiffer() {
    Sheet sheet = LoadingsPicture.draw(report(0));
    // Of clipped tips everywhere, of the dihedral in sideslip only.
    assertThat(of(Mark.Polyline.class, sheet)).hasSize(5 * 2 + 1);
    List<String> words = of(Mark.Label.class, sheet).stream().map(Mark.Label::text).toList();
    assertThat(words)
        .contains("Steady load", "By rolling right", "By yawing right", "By sideslip")
        .contains("By the ailerons", "Station", "c_l c/(S/b), per pb/2V", "clipped tips");
    assertThat(words.stream().filter("less dihedral"::equals)).hasSize(1);
  }

  @Test
  void everythingStandsOnThePage() {
    for (Sheet sheet :
        List.of(
            ShapePicture.draw(report(0)),
            ShapePicture.draw(report(20)),
            LoadingsPicture.draw(report(0)),
            LoadingsPicture.draw(report(20)))) {
      for (Mark.Label label : of(Mark.Label.class, sheet)) {
        double width = TypeWidths.of(label.text(), label.size());
        double left =
            switch (label.anchor()) {
              case START -> label.x();
              case MIDDLE -> label.x() - 0.5 * width;
              case END -> label.x() - width;
            };
        assertThat(left).as(label.text()).isGreaterThanOrEqualTo(0);
        assertThat(left + width).as(label.text()).isLessThanOrEqualTo(sheet.width());
        assertThat(label.y()).as(label.text()).isBetween(0.0, sheet.height());
      }
      for (Mark.Polyline line : of(Mark.Polyline.class, sheet)) {
        assertThat(Arrays.stream(line.x()).max().orElseThrow()).isLessThan(sheet.width());
        assertThat(Arrays.stream(line.y()).max().orElseThrow()).isLessThan(sheet.height());
        assertThat(Arrays.stream(line.y()).min().orElseThrow()).isPositive();
      }
    }
  }
}
