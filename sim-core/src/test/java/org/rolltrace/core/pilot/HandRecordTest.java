package org.rolltrace.core.pilot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HandRecordTest {
  private static HandRecord stick(double... positions) {
    double[] times = new double[positions.length];
    for (int i = 0; i < times.length; i++) {
      times[i] = i / 50.0;
    }
    return HandRecord.of(times, positions, new double[positions.length]);
  }

  @Test
  void cornersStayAndWhatLiesOnStraightLinesGoes() {
    HandRecord record = stick(0, 0, 0.04, 0.08, 0.12, 0.12, 0.12, 0.08, 0.04, 0, 0).simplified();

    assertThat(record)
        .isEqualTo(
            HandRecord.of(
                new double[] {0, 0.02, 0.08, 0.12, 0.18, 0.2},
                new double[] {0, 0, 0.12, 0.12, 0, 0},
                new double[6]));
  }

  @Test
  void aCornerOfEitherControlKeepsTheInstantOfBoth() {
    HandRecord record =
        HandRecord.of(
                new double[] {0, 1, 2, 3, 4},
                new double[] {0, 0.1, 0.2, 0.3, 0.4},
                new double[] {0, 0, -0.5, -0.5, -0.5})
            .simplified();

    assertThat(record)
        .isEqualTo(
            HandRecord.of(
                new double[] {0, 1, 2, 4},
                new double[] {0, 0.1, 0.2, 0.4},
                new double[] {0, 0, -0.5, -0.5}));
  }

  /** A turn too slow to be seen from one instant to the next must not add up. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void nowhereIsTheSimplifiedMovementOffTheRecordedOne(long seed) {
    Random random = new Random(seed);
    double[] positions = new double[3000];
    double rate = 0;
    for (int i = 1; i < positions.length; i++) {
      rate = random.nextInt(8) == 0 ? (random.nextDouble() - 0.5) * 0.04 : rate + 1e-10;
      positions[i] = Math.max(-1, Math.min(1, positions[i - 1] + rate));
    }
    HandRecord record = stick(positions);

    HandRecord simplified = record.simplified();

    assertThat(simplified.size()).isLessThan(record.size());
    int next = 1;
    for (int i = 0; i < record.size(); i++) {
      while (simplified.time(next) < record.time(i)) {
        next++;
      }
      double share =
          (record.time(i) - simplified.time(next - 1))
              / (simplified.time(next) - simplified.time(next - 1));
      double before = simplified.position(Control.STICK, next - 1);
      double after = simplified.position(Control.STICK, next);
      assertThat(before + share * (after - before))
          .as("at %s s", record.time(i))
          .isCloseTo(positions[i], within(1.1e-9)); // the promise, and rounding
    }
  }

  @Test
  void aRecordOfOneInstantStaysAsItIs() {
    assertThat(stick(0).simplified()).isEqualTo(stick(0));
    assertThat(stick(0, 0).simplified()).isEqualTo(stick(0, 0));
  }

  @Test
  void itSaysWhatMoves() {
    HandRecord record = stick(0, 0.1, 0);

    assertThat(record.moves(Control.STICK)).isTrue();
    assertThat(record.moves(Control.PEDAL)).isFalse();
    assertThat(record.end()).isEqualTo(0.04);
  }

  @Test
  void whatIsNoRecordIsRefused() {
    assertThatThrownBy(() -> HandRecord.of(new double[0], new double[0], new double[0]))
        .hasMessageContaining("0 times, 0 stick and 0 pedal positions; expected at least one");
    assertThatThrownBy(
            () -> HandRecord.of(new double[] {0, 0}, new double[] {0, 0}, new double[] {0, 0}))
        .hasMessageContaining("time is 0.0 s after 0.0 s");
    assertThatThrownBy(() -> stick(0, Double.NaN)).hasMessageContaining("stick position");
    assertThatThrownBy(() -> stick(0, 1.01)).hasMessageContaining("stick position");
  }
}
