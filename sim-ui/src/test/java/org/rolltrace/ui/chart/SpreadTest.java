package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SpreadTest {
  static LongStream seeds() {
    return LongStream.range(0, 500);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void thingsKeepTheirOrderAndDoNotOverlap(long seed) {
    Random random = new Random(seed);
    int count = 1 + random.nextInt(12);
    double[] lengths = random.doubles(count, 1, 60).toArray();
    double total = 0;
    for (double length : lengths) {
      total += length;
    }
    double low = random.nextDouble();
    double high = low + total * (1 + random.nextDouble());
    double[] wanted = random.doubles(count, low - 20, high + 20).sorted().toArray();
    double[] placed = Spread.apart(wanted, lengths, low, high);
    // Rounding of sums of some hundreds.
    double slack = 1e-9;
    double edge = low - slack;
    for (int i = 0; i < count; i++) {
      assertThat(placed[i] - 0.5 * lengths[i]).isGreaterThanOrEqualTo(edge - slack);
      edge = placed[i] + 0.5 * lengths[i];
    }
    assertThat(edge).isLessThanOrEqualTo(high + slack);
    double least = squares(wanted, placed);
    for (int attempt = 0; attempt < 200; attempt++) {
      double[] other = placed.clone();
      int first = random.nextInt(count);
      int last = first + random.nextInt(count - first);
      double by = 3 * random.nextGaussian();
      for (int i = first; i <= last; i++) {
        other[i] += by;
      }
      if (fits(other, lengths, low, high)) {
        // No other arrangement is nearer to where things belong.
        assertThat(squares(wanted, other)).isGreaterThanOrEqualTo(least - 1e-6);
      }
    }
  }

  private static boolean fits(double[] placed, double[] lengths, double low, double high) {
    double edge = low;
    for (int i = 0; i < placed.length; i++) {
      if (placed[i] - 0.5 * lengths[i] < edge) {
        return false;
      }
      edge = placed[i] + 0.5 * lengths[i];
    }
    return edge <= high;
  }

  private static double squares(double[] wanted, double[] placed) {
    double sum = 0;
    for (int i = 0; i < wanted.length; i++) {
      sum += (wanted[i] - placed[i]) * (wanted[i] - placed[i]);
    }
    return sum;
  }

  @Test
  void whatHasRoomStaysWhereItBelongs() {
    assertThat(Spread.apart(new double[] {10, 50, 80}, new double[] {20, 20, 20}, 0, 100))
        .containsExactly(new double[] {10, 50, 80}, within(1e-12));
    assertThat(Spread.apart(new double[0], new double[0], 0, 100)).isEmpty();
  }
}
