package org.rolltrace.core.pilot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Where the energy of multisteps lies, against the figures known of them: the doublet peaks at ω Δt
 * = 2.3311, the solution of tan x = 2x with x = ω Δt/2; 3-2-1-1 at 0.6336 and 2-1-1 at 2.0514, with
 * half-power bands from 1.144 to 3.653 (doublet) and 0.282 to 2.647 (3-2-1-1), from the transforms
 * of the ideal steps in closed form. 3-2-1-1: Koehler and Wilhelm, Marchand, Plaetschke, DFVLR.
 */
class InputSpectrumValidationTest {
  /** Cells of the midpoint rule a unit; the moves lie on their edges. */
  private static final int CELLS = 200;

  /** Half of the last printed digit, and what the search leaves. */
  private static final double LAST_OF_FOUR = 1e-4;

  private static final double LAST_OF_THREE = 6e-4;

  /** |∫ s e^(−iωt) dt|², the units of one second, moves as jumps. */
  private static double energy(Movement movement, int units, double frequency) {
    double real = 0;
    double imaginary = 0;
    double cell = 1.0 / CELLS;
    for (int i = 0; i < units * CELLS; i++) {
      double t = (i + 0.5) * cell;
      real += movement.positionAt(t) * Math.cos(frequency * t) * cell;
      imaginary += movement.positionAt(t) * Math.sin(frequency * t) * cell;
    }
    return real * real + imaginary * imaginary;
  }

  private static MultistepInput jumps(String pattern) {
    List<Integer> stays = List.of(pattern.split("-")).stream().map(Integer::valueOf).toList();
    return new MultistepInput(0, 1, 1, stays, 0);
  }

  private static double peak(Movement movement, int units) {
    double best = 0;
    double at = 0;
    for (double step : new double[] {1e-2, 1e-3, 1e-4, 1e-5}) {
      double from = step == 1e-2 ? step : at - 10 * step;
      double to = step == 1e-2 ? 2 * Math.PI : at + 10 * step;
      best = 0;
      for (double frequency = from; frequency <= to; frequency += step) {
        double energy = energy(movement, units, frequency);
        if (energy > best) {
          best = energy;
          at = frequency;
        }
      }
    }
    return at;
  }

  @ParameterizedTest
  @CsvSource({"1-1, 2.3311", "3-2-1-1, 0.6336", "2-1-1, 2.0514"})
  void theLargestPeakIsWhereItIsKnownToBe(String pattern, double expected) {
    MultistepInput input = jumps(pattern);
    assertThat(peak(input.movement(), input.units())).isCloseTo(expected, within(LAST_OF_FOUR));
  }

  @ParameterizedTest
  @CsvSource({"1-1, 1.144, 3.653", "3-2-1-1, 0.282, 2.647"})
  void theHalfPowerBandIsAsWideAsItIsKnownToBe(String pattern, double low, double high) {
    MultistepInput input = jumps(pattern);
    Movement movement = input.movement();
    double half = 0.5 * energy(movement, input.units(), peak(movement, input.units()));
    double step = 1e-3;
    double first = Double.NaN;
    double last = Double.NaN;
    for (double frequency = step; frequency < 2 * Math.PI; frequency += step) {
      if (energy(movement, input.units(), frequency) >= half) {
        first = Double.isNaN(first) ? frequency : first;
        last = frequency;
      }
    }
    assertThat(first - 0.5 * step).isCloseTo(low, within(0.5 * step + LAST_OF_THREE));
    assertThat(last + 0.5 * step).isCloseTo(high, within(0.5 * step + LAST_OF_THREE));
  }

  @Test
  void theNetImpulseOf3211IsOneUnit() {
    MultistepInput input = jumps("3-2-1-1");
    // 3 − 2 + 1 − 1
    assertThat(energy(input.movement(), input.units(), 0)).isCloseTo(1, within(1e-9));
  }
}
