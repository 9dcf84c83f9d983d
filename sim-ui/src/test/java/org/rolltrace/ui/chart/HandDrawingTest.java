package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HandDrawingTest {
  private static final double WIDTH = 400;

  private static Mark.Dot knob(List<Mark> marks) {
    return marks.stream()
        .filter(Mark.Dot.class::isInstance)
        .map(Mark.Dot.class::cast)
        .reduce((one, other) -> other)
        .orElseThrow();
  }

  private static List<Ink> inksOfAreas(List<Mark> marks) {
    return marks.stream()
        .filter(Mark.Area.class::isInstance)
        .map(mark -> ((Mark.Area) mark).ink())
        .toList();
  }

  /** What the mouse grabs is where the knob is drawn. */
  @ParameterizedTest
  @ValueSource(doubles = {-1, -0.35, 0, 0.02, 1})
  void theKnobStandsWhereTheMouseHoldsIt(double position) {
    Mark.Dot knob = knob(HandDrawing.draw("Stick", position, 0, WIDTH, 80));

    assertThat(HandDrawing.positionAt(knob.x(), WIDTH)).isCloseTo(position, within(1e-12));
    assertThat(knob.x() - knob.radius()).isPositive();
    assertThat(knob.x() + knob.radius()).isLessThan(WIDTH);
  }

  @Test
  void theBandHasTheInkOfItsSideOfTrim() {
    assertThat(inksOfAreas(HandDrawing.draw("Stick", 0.1, 0.2, WIDTH, 80)))
        .containsExactly(Ink.PANEL, Ink.LEFT);
    assertThat(inksOfAreas(HandDrawing.draw("Stick", 0.1, -0.2, WIDTH, 80)))
        .containsExactly(Ink.PANEL, Ink.RIGHT);
  }
}
