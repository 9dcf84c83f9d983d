package org.rolltrace.core.pilot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
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
