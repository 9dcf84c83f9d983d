package org.rolltrace.core.pilot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The geometry of the shapes, worked by hand from their definitions. */
class InputShapeTest {
  /** Straight-line arithmetic on numbers of order one. */
  private static final double ROUNDING = 1e-12;

  @ParameterizedTest
  @CsvSource({"0, 0", "0.999, 0", "1, 0", "1.05, 0.3", "1.1, 0.6", "500, 0.6"})
  void aStepMovesLinearlyAndStays(double time, double expected) {
    Movement step = new StepInput(1, 0.6, 0.1).movement();
    assertThat(step.positionAt(time)).isCloseTo(expected, within(ROUNDING));
  }

  @ParameterizedTest
  @CsvSource({
    "0.9, 0",
    "1, 0",
    "1.1, -0.25",
    "1.2, -0.5",
    "2.9, -0.5",
    "3, -0.5",
    "3.1, -0.25",
    "3.2, 0",
    "9, 0"
  })
  void aHoldGoesBackOneDurationAfterItsStart(double time, double expected) {
    Movement hold = new HoldInput(1, -0.5, 2, 0.2).movement();
    assertThat(hold.positionAt(time)).isCloseTo(expected, within(ROUNDING));
  }

  @ParameterizedTest
  @CsvSource({
    "2, 0",
    "2.1, 1",
    "2.5, 1",
    "2.55, 0",
    "2.6, -1",
    "3, -1",
    "3.05, -0.5",
    "3.1, 0",
    "8, 0"
  })
  void aDoubletGoesToBothSides(double time, double expected) {
    Movement doublet = new DoubletInput(2, 1, 0.5, 0.1).movement();
    assertThat(doublet.positionAt(time)).isCloseTo(expected, within(ROUNDING));
  }

  @Test
  void aJumpHoldsTheNewPositionAtItsInstant() {
    Movement jump = new HoldInput(1, 1, 1, 0).movement();
    assertThat(jump.positionAt(Math.nextDown(1.0))).isZero();
    assertThat(jump.positionAt(1)).isEqualTo(1);
    assertThat(jump.positionAt(Math.nextDown(2.0))).isEqualTo(1);
    assertThat(jump.positionAt(2)).isZero();
    assertThat(jump.breakpoints()).containsExactly(1, 2);
  }

  @Test
  void movesThatAbutLeaveNoRestBetweenThem() {
    Movement doublet = new DoubletInput(0, 1, 0.25, 0.25).movement();
    assertThat(doublet.breakpoints()).containsExactly(0, 0.25, 0.5, 0.75);
    assertThat(doublet.rateAt(0.3)).isCloseTo(-8, within(ROUNDING));
    assertThat(doublet.positionAt(0.375)).isCloseTo(0, within(ROUNDING));
  }

  @Test
  void instantsThatAreTheSameOnPaperAreTheSame() {
    // 0.1 + 0.2 and 0.3 differ in the last bit
    Movement sum = new StepInput(0.1, 1, 0.2).movement();
    assertThat(sum.breakpoints()).containsExactly(0.1, 0.3);
  }

  @Test
  void aMovementTooShortToTellFromAJumpIsOne() {
    Movement step = new StepInput(1, 1, 1e-12).movement();
    assertThat(step.positionAt(1)).isEqualTo(1);
    assertThat(step.rateAt(1)).isZero();
  }

  @Test
  void theRateIsTheSlope() {
    Movement step = new StepInput(1, 0.6, 0.1).movement();
    assertThat(step.rateAt(0.5)).isZero();
    assertThat(step.rateAt(1)).isCloseTo(6, within(1e-7)); // the end is kept to the nanosecond
    assertThat(step.rateAt(1.2)).isZero();
  }

  @ParameterizedTest
  @CsvSource({
    "0.9, 0",
    "1, 0",
    "1.05, 0.2",
    "1.1, 0.4",
    "2.5, 0.4",
    "2.55, 0",
    "2.6, -0.4",
    "3.5, -0.4",
    "3.6, 0.4",
    "4, 0.4",
    "4.1, -0.4",
    "4.5, -0.4",
    "4.55, -0.2",
    "4.6, 0",
    "9, 0"
  })
  void aMultistepGoesToBothSidesByTurnsAndBack(double time, double expected) {
    MultistepInput shape = new MultistepInput(1, 0.4, 0.5, List.of(3, 2, 1, 1), 0.1);
    assertThat(shape.movement().positionAt(time)).isCloseTo(expected, within(ROUNDING));
    assertThat(shape.units()).isEqualTo(7);
    assertThat(shape.end()).isCloseTo(4.6, within(ROUNDING));
  }

  @Test
  void aMultistepOfOneAndOneIsADoublet() {
    Movement one = new MultistepInput(1, 0.4, 0.5, List.of(1, 1), 0.1).movement();
    Movement other = new DoubletInput(1, 0.4, 0.5, 0.1).movement();
    assertThat(one.breakpoints()).containsExactly(other.breakpoints());
    for (double t = 0; t < 3; t += 0.01) {
      assertThat(one.positionAt(t)).isEqualTo(other.positionAt(t));
    }
  }

  @ParameterizedTest
  @CsvSource({"1, 0", "2, -0.2", "3, -0.4", "4, -0.6", "900, -0.6"})
  void aRampTakesItsDurationAndStays(double time, double expected) {
    RampInput ramp = new RampInput(1, -0.6, 3);
    assertThat(ramp.movement().positionAt(time)).isCloseTo(expected, within(ROUNDING));
    assertThat(ramp.end()).isInfinite();
    assertThat(ramp.handTime()).isEqualTo(3);
  }

  @ParameterizedTest
  @EnumSource(SweepInput.Law.class)
  void aSweepBeginsAtItsFirstFrequencyAndEndsAtItsLast(SweepInput.Law law) {
    SweepInput sweep = new SweepInput(2, 0.5, 1, 8, 10, law);
    assertThat(sweep.frequencyAt(2)).isCloseTo(1, within(ROUNDING));
    assertThat(sweep.frequencyAt(12)).isCloseTo(8, within(ROUNDING));
    // half way: the arithmetic or the geometric mean
    assertThat(sweep.frequencyAt(7))
        .isCloseTo(law == SweepInput.Law.LINEAR ? 4.5 : Math.sqrt(8), within(ROUNDING));
    Movement movement = sweep.movement();
    assertThat(movement.positionAt(1.99)).isZero();
    assertThat(movement.rateAt(2)).isCloseTo(0.5 * 1, within(ROUNDING));
    assertThat(movement.positionAt(sweep.end())).isZero();
    assertThat(movement.positionAt(Math.nextDown(sweep.end()))).isCloseTo(0, within(1e-9));
    assertThat(sweep.end() - 12).isBetween(0.0, Math.PI / 8);
    assertThat(movement.positionAt(500)).isZero();
  }

  /** θ̇ from the movement itself: with s = A sin θ and ṡ = A θ̇ cos θ, s² + (ṡ/θ̇)² = A². */
  @ParameterizedTest
  @EnumSource(SweepInput.Law.class)
  void theFrequencyOfASweepIsTheRateOfItsPhase(SweepInput.Law law) {
    SweepInput sweep = new SweepInput(2, -0.5, 6, 0.7, 10, law);
    Movement movement = sweep.movement();
    double step = 1e-5;
    for (double t = 2.01; t < 11.99; t += 0.0137) {
      double position = movement.positionAt(t);
      double slope = (movement.positionAt(t + step) - movement.positionAt(t - step)) / (2 * step);
      // central difference: error (ω step)²/6 of a rate of up to 3
      assertThat(movement.rateAt(t)).isCloseTo(slope, within(1e-8));
      double quadrature = movement.rateAt(t) / sweep.frequencyAt(t);
      assertThat(Math.hypot(position, quadrature)).isCloseTo(0.5, within(1e-12));
    }
  }

  @Test
  void aSweepThatIsAtZeroAfterItsDurationEndsThere() {
    SweepInput whole = new SweepInput(0, 1, 2 * Math.PI, 2 * Math.PI, 3, SweepInput.Law.LINEAR);
    assertThat(whole.end()).isCloseTo(3, within(1e-7)); // what counts as a passage
    SweepInput half = new SweepInput(0, 1, 2 * Math.PI, 2 * Math.PI, 3.2, SweepInput.Law.LINEAR);
    assertThat(half.end()).isCloseTo(3.5, within(ROUNDING));
    assertThat(half.movement().breakpoints()).hasSize(3).startsWith(0, 3.2);
    for (SweepInput.Law law : SweepInput.Law.values()) {
      Movement sine = new SweepInput(0, 1, 3, 3, 3, law).movement();
      assertThat(sine.positionAt(1.3)).isCloseTo(Math.sin(3 * 1.3), within(ROUNDING));
    }
  }

  private static TraceInput trace(double shift, double scale, double... timesAndPositions) {
    int n = timesAndPositions.length / 2;
    double[] times = new double[n];
    double[] positions = new double[n];
    for (int i = 0; i < n; i++) {
      times[i] = timesAndPositions[2 * i];
      positions[i] = timesAndPositions[2 * i + 1];
    }
    return new TraceInput(shift, scale, Trace.of("a.csv", "stick", times, positions));
  }

  @ParameterizedTest
  @CsvSource({
    "1.9, 0",
    "2, 0",
    "3, 0",
    "3.25, 0.2",
    "3.5, 0.4",
    "4.5, -0.1",
    "5.5, -0.6",
    "9, -0.6"
  })
  void aTraceIsStraightBetweenItsSamplesAndStaysAtTheLast(double time, double expected) {
    TraceInput trace = trace(2, -0.5, 0, 0, 1, 0, 1.5, -0.8, 3.5, 1.2);
    assertThat(trace.movement().positionAt(time)).isCloseTo(expected, within(ROUNDING));
    assertThat(trace.movement().breakpoints()).containsExactly(3, 3.5, 5.5);
    // It leaves the trimmed position at 3 s, to the right, and goes as far as 0.6.
    assertThat(trace.start()).isEqualTo(3);
    assertThat(trace.size()).isCloseTo(0.6, within(ROUNDING));
    assertThat(trace.end()).isInfinite();
  }

  @Test
  void aTraceThatComesBackIsOverThere() {
    TraceInput trace = trace(0, 1, 1, 0.5, 2, 0.5, 3, 0, 4, 0, 5, 0);
    assertThat(trace.start()).isEqualTo(1);
    assertThat(trace.end()).isEqualTo(3);
    assertThat(trace.movement().positionAt(Math.nextDown(1.0))).isZero();
    assertThat(trace.movement().positionAt(1)).isEqualTo(0.5);
    assertThat(trace.movement().breakpoints()).containsExactly(1, 2, 3);
    assertThat(trace(0, 1, 0, 0, 1, 0).size()).isZero();
    assertThat(trace(0, 0, 0, 0, 1, 1).end()).isEqualTo(0);
  }

  @Test
  void aTraceKnowsItselfAgain() {
    assertThat(trace(0, 1, 0, 0, 1, 1)).isEqualTo(trace(0, 1, 0, 0, 1, 1));
    assertThat(trace(0, 1, 0, 0, 1, 1).hashCode()).isEqualTo(trace(0, 1, 0, 0, 1, 1).hashCode());
    assertThat(trace(0, 1, 0, 0, 1, 1)).isNotEqualTo(trace(0, 1, 0, 0, 1, 0.9));
  }

  @Test
  void refusesShapesThatAreNone() {
    List<Integer> long1 = Collections.nCopies(101, 1);
    for (List<Integer> pattern : List.of(List.<Integer>of(), long1, List.of(0), List.of(1001))) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> new MultistepInput(0, 1, 1, pattern, 0))
          .withMessageContaining("pattern");
    }
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new MultistepInput(0, 1, 0.05, List.of(1), 0.1))
        .withMessageContaining("at least the movement of the hand");
    assertThatIllegalArgumentException().isThrownBy(() -> new RampInput(0, 1, 0));
    for (double bad : new double[] {0, -1, 20.01 * 2 * Math.PI, Double.NaN}) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> new SweepInput(0, 1, bad, 1, 1, SweepInput.Law.LINEAR))
          .withMessageContaining("first frequency");
      assertThatIllegalArgumentException()
          .isThrownBy(() -> new SweepInput(0, 1, 1, bad, 1, SweepInput.Law.LINEAR))
          .withMessageContaining("last frequency");
    }
    assertThatIllegalArgumentException().isThrownBy(() -> trace(0, 1, 0, 0));
    assertThatIllegalArgumentException().isThrownBy(() -> trace(0, 1, 0, 0, 0, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> trace(0, 1, 0, 0, 1, 1.1));
    assertThatIllegalArgumentException().isThrownBy(() -> trace(0, 1, 0, 0, 1, Double.NaN));
    assertThatIllegalArgumentException().isThrownBy(() -> trace(1, 1, -1.5, 0, 1, 1));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 0.1, 0",
    "1, 0.1, 0.2",
    "1.5, 0.2, 0.2",
    "2, 0.3, -0.1",
    "4, 0.1, 0",
    "9, 0.1, 0"
  })
  void aHeldSideslipIsStraightBetweenItsPoints(double time, double expected, double rate) {
    HeldSideslip held =
        HeldSideslip.of(
            List.of(
                new HeldSideslip.Point(1, 0.1),
                new HeldSideslip.Point(2, 0.3),
                new HeldSideslip.Point(4, 0.1)));
    assertThat(held.at(time)).isCloseTo(expected, within(ROUNDING));
    assertThat(held.rateAt(time)).isCloseTo(rate, within(ROUNDING));
    assertThat(held.breakpoints()).containsExactly(1, 2, 4);
    assertThat(HeldSideslip.NONE.at(time)).isZero();
  }

  @Test
  void refusesSideslipsThatGoBackInTimeOrAreTooLarge() {
    HeldSideslip.Point point = new HeldSideslip.Point(1, 0.1);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> HeldSideslip.of(List.of(point, point)))
        .withMessageContaining("expected increasing times");
    assertThatIllegalArgumentException().isThrownBy(() -> new HeldSideslip.Point(-1, 0.1));
    assertThatIllegalArgumentException().isThrownBy(() -> new HeldSideslip.Point(0, 1.6));
    assertThat(HeldSideslip.of(List.of())).isSameAs(HeldSideslip.NONE);
  }

  @ParameterizedTest
  @ValueSource(doubles = {1.0001, -1.0001, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesSizesBeyondTheTravel(double size) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new StepInput(0, size, 0.1))
        .withMessageContaining("size")
        .withMessageContaining(String.valueOf(size));
  }

  @Test
  void refusesTimesThatRunBackwards() {
    assertThatIllegalArgumentException().isThrownBy(() -> new StepInput(-0.1, 1, 0.1));
    assertThatIllegalArgumentException().isThrownBy(() -> new StepInput(0, 1, -0.1));
    assertThatIllegalArgumentException().isThrownBy(() -> new StepInput(Double.NaN, 1, 0.1));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new HoldInput(0, 1, 0.05, 0.1))
        .withMessageContaining("at least the movement of the hand");
    assertThatIllegalArgumentException().isThrownBy(() -> new DoubletInput(0, 1, 0, 0));
  }
}
