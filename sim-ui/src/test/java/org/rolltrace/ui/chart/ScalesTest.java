package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Axes: places and values, ticks, ranges, windows, widths of type. */
class ScalesTest {
  static LongStream seeds() {
    return LongStream.range(0, 200);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void placesAndValuesAreEachOthersInverse(long seed) {
    Random random = new Random(seed);
    double from = 100 * random.nextGaussian();
    double low = 100 * random.nextGaussian();
    PlotArea area =
        new PlotArea(
            500 * random.nextDouble(),
            500 * random.nextDouble(),
            1 + 2000 * random.nextDouble(),
            1 + 900 * random.nextDouble(),
            new TimeWindow(from, from + 0.05 + 400 * random.nextDouble()),
            low,
            low + 0.01 + 300 * random.nextDouble());
    double instant = area.time().from() + random.nextDouble() * area.time().length();
    double value = area.low() + random.nextDouble() * (area.high() - area.low());
    // Rounding of numbers up to some thousands.
    assertThat(area.timeAt(area.xOf(instant))).isCloseTo(instant, within(1e-9));
    assertThat(area.valueAt(area.yOf(value))).isCloseTo(value, within(1e-9));
    assertThat(area.xOf(area.time().from())).isEqualTo(area.x());
    assertThat(area.xOf(area.time().to())).isCloseTo(area.x() + area.width(), within(1e-9));
    assertThat(area.yOf(area.high())).isEqualTo(area.y());
    assertThat(area.yOf(area.low())).isCloseTo(area.y() + area.height(), within(1e-9));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void zoomingKeepsTheInstantInPlace(long seed) {
    Random random = new Random(seed);
    TimeWindow window = new TimeWindow(2, 2 + 20 * random.nextDouble() + 0.1);
    double share = random.nextDouble();
    double instant = window.from() + share * window.length();
    double factor = Math.exp(2 * random.nextGaussian());
    TimeWindow zoomed = window.zoomedAt(instant, factor);
    assertThat((instant - zoomed.from()) / zoomed.length()).isCloseTo(share, within(1e-9));
    assertThat(zoomed.length())
        .isCloseTo(Math.max(TimeWindow.SHORTEST, factor * window.length()), within(1e-9));
  }

  @Test
  void aWindowIsKeptInsideWhatThereIsToSee() {
    TimeWindow full = new TimeWindow(0, 10);
    assertThat(new TimeWindow(-1, 3).clampedTo(full)).isEqualTo(new TimeWindow(0, 4));
    assertThat(new TimeWindow(8, 12).clampedTo(full)).isEqualTo(new TimeWindow(6, 10));
    assertThat(new TimeWindow(2, 5).clampedTo(full)).isEqualTo(new TimeWindow(2, 5));
    assertThat(new TimeWindow(-5, 40).clampedTo(full)).isEqualTo(full);
    assertThat(new TimeWindow(2, 5).movedBy(-1)).isEqualTo(new TimeWindow(1, 4));
  }

  @Test
  void whatIsNoRangeIsRefused() {
    assertThatIllegalArgumentException().isThrownBy(() -> new TimeWindow(3, 3));
    assertThatIllegalArgumentException().isThrownBy(() -> new TimeWindow(0, Double.NaN));
    assertThatIllegalArgumentException().isThrownBy(() -> new ValueRange(1, Double.NaN));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new PlotArea(0, 0, 10, 10, new TimeWindow(0, 1), 2, 2));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new PlotArea(0, 0, Double.NaN, 10, new TimeWindow(0, 1), 0, 2));
  }

  @ParameterizedTest
  @CsvSource({
    "0.013, 0.02",
    "0.3, 0.5",
    "1, 1",
    "1.01, 2",
    "4, 5",
    "6, 10",
    "11, 15",
    "16, 30",
    "31, 45",
    "46, 90",
    "100, 180",
    "200, 360",
    "400, 720",
    "1000, 1800"
  })
  void anglesHaveStepsThatDivideATurn(double least, double step) {
    assertThat(Ticks.step(least, true)).isCloseTo(step, within(1e-12 * step));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void ticksAreRoundInsideAndDistinct(long seed) {
    Random random = new Random(seed);
    double scale = Math.exp(3 * random.nextGaussian());
    double low = scale * random.nextGaussian();
    double high = low + scale * (0.1 + random.nextDouble());
    int count = 1 + random.nextInt(12);
    Ticks ticks = Ticks.of(low, high, count, random.nextBoolean());
    assertThat(ticks.size()).isLessThanOrEqualTo(count + 1);
    Set<String> figures = new HashSet<>();
    for (int i = 0; i < ticks.size(); i++) {
      double slack = 1e-6 * (high - low);
      assertThat(ticks.value(i)).isBetween(low - slack, high + slack);
      String figure = ticks.figure(i);
      assertThat(figures.add(figure)).as(figure).isTrue();
      assertThat(figure).doesNotContain("-").doesNotContain("e");
      // What is printed is the value, not a rounded one.
      assertThat(Double.parseDouble(figure.replace('\u2212', '-')))
          .isCloseTo(ticks.value(i), within(1e-9 * Math.max(1, Math.abs(ticks.value(i)))));
    }
  }

  @Test
  void figuresHaveAProperMinusAndNoNegativeZero() {
    assertThat(Ticks.figure(-12.34, 1)).isEqualTo("\u221212.3");
    assertThat(Ticks.figure(-0.04, 1)).isEqualTo("0.0");
    assertThat(Ticks.figure(7, 0)).isEqualTo("7");
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e-12, 0.3, 1, 7, 25, 100, 400, 5000})
  void rangesHoldTheirCurvesAndZero(double size) {
    double[] time = {0, 1, 2};
    Curve curve =
        new Curve("c", time, new double[] {0, size, -0.2 * size}, Stroke.of(Ink.RIGHT, 1));
    Curve mirrored =
        new Curve("c", time, new double[] {0, -size, 0.2 * size}, Stroke.of(Ink.LEFT, 1));
    TimeWindow window = new TimeWindow(0, 2);
    for (String unit : List.of("deg", "deg/s")) {
      ValueRange range = ValueRange.of(new Strip("t", unit, List.of(curve), List.of()), window);
      assertThat(range.low()).isLessThan(-0.2 * size);
      assertThat(range.high()).isGreaterThan(size);
      // Room, but no third of the side empty, down to the least range of about one.
      assertThat(range.high()).isLessThan(Math.max(size < 0.9 ? 1.01 : 1.51, 1.5 * size));
      ValueRange other = ValueRange.of(new Strip("t", unit, List.of(mirrored), List.of()), window);
      assertThat(other).isEqualTo(new ValueRange(-range.high(), -range.low()));
      assertThat(range.covering(other)).isEqualTo(new ValueRange(-range.high(), range.high()));
    }
  }

  /** Against the font itself, as the Java runtime reads it. */
  @Test
  void typeIsAsWideAsTheFontSays() {
    Font font = new Font("DejaVu Sans", Font.PLAIN, 11);
    Assumptions.assumeTrue(font.getFamily().equals("DejaVu Sans"), "DejaVu Sans is installed");
    FontRenderContext exact = new FontRenderContext(null, true, true);
    for (String text :
        List.of("sideslip, yaw rate", "\u2212123.45", "% of travel", "30°", "63 %", "AVAWA mmm")) {
      // Kerning is not looked at, and the table is rounded to a thousandth of the em.
      assertThat(TypeWidths.of(text, TypeSize.SMALL))
          .as(text)
          .isCloseTo(font.getStringBounds(text, exact).getWidth(), within(0.3));
    }
  }
}
