package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class DecimationTest {
  static LongStream seeds() {
    return LongStream.range(0, 40);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void everyColumnKeepsItsExtremesAtABoundedCost(long seed) {
    Random random = new Random(seed);
    int count = 33_000;
    double[] time = new double[count];
    double[] value = new double[count];
    for (int i = 0; i < count; i++) {
      time[i] = i / 100.0;
      value[i] = random.nextGaussian() + (random.nextInt(500) == 0 ? 40 : 0);
    }
    double from = 100 * random.nextDouble();
    PlotArea area =
        new PlotArea(
            30, 0, 400, 100, new TimeWindow(from, from + 100 + 100 * random.nextDouble()), -50, 50);
    Mark.Polyline line =
        Decimation.polyline(new Curve("c", time, value, Stroke.of(Ink.RIGHT, 1)), area);
    assertThat(line.x()).hasSizeLessThanOrEqualTo(4 * (400 + 4)).isSorted();
    double[] high = new double[400];
    double[] low = new double[400];
    double[] drawnHigh = new double[400];
    double[] drawnLow = new double[400];
    for (double[] least : new double[][] {low, drawnLow}) {
      Arrays.fill(least, Double.POSITIVE_INFINITY);
    }
    for (double[] most : new double[][] {high, drawnHigh}) {
      Arrays.fill(most, Double.NEGATIVE_INFINITY);
    }
    for (int i = 0; i < count; i++) {
      note(area.xOf(time[i]) - 30, area.yOf(value[i]), low, high);
    }
    for (int i = 0; i < line.x().length; i++) {
      note(line.x()[i] - 30, line.y()[i], drawnLow, drawnHigh);
    }
    // A sample on the border of two columns may be counted to either: leave those out.
    for (int column = 0; column < 400; column++) {
      assertThat(drawnHigh[column]).isEqualTo(high[column]);
      assertThat(drawnLow[column]).isEqualTo(low[column]);
    }
  }

  private static void note(double x, double y, double[] low, double[] high) {
    double inColumn = x - Math.floor(x);
    if (x >= 0 && x < low.length && inColumn > 1e-6 && inColumn < 1 - 1e-6) {
      int column = (int) x;
      low[column] = Math.min(low[column], y);
      high[column] = Math.max(high[column], y);
    }
  }

  @Test
  void aFewSamplesAreDrawnAsTheyAreWithOneBeyondEachEdge() {
    double[] time = {0, 1, 2, 3, 4, 5};
    Curve curve = new Curve("c", time, new double[] {0, 1, 4, 9, 16, 25}, Stroke.of(Ink.RIGHT, 1));
    PlotArea area = new PlotArea(0, 0, 100, 100, new TimeWindow(1.5, 3.5), 0, 25);
    assertThat(Decimation.polyline(curve, area).x())
        .containsExactly(new double[] {-25, 25, 75, 125}, within(1e-9));
    assertThat(Decimation.valueAt(curve, 2.5)).isEqualTo(6.5);
    assertThat(Decimation.valueAt(curve, -1)).isZero();
    assertThat(Decimation.valueAt(curve, 9)).isEqualTo(25);
  }

  @Test
  void aCurveThatEndsBeforeTheWindowIsNotLost() {
    Curve curve = new Curve("c", new double[] {0, 1}, new double[] {2, 3}, Stroke.of(Ink.RIGHT, 1));
    PlotArea area = new PlotArea(0, 0, 100, 100, new TimeWindow(5, 6), 0, 25);
    assertThat(Decimation.polyline(curve, area).x()).hasSize(1);
  }
}
