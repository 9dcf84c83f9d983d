package org.rolltrace.core.controls;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Rudder;

/** The kinematics, worked by hand from the definitions of the angles. */
class ControlRunTest {
  private static final double ROUNDING = 1e-15;

  @Test
  void fullStickGivesTheMeanOfUpAndDown() {
    ControlRun run = ControlRun.of(Ailerons.of(0.4, 0.3));
    assertThat(run.angleAt(1)).isCloseTo(0.35, within(ROUNDING));
    assertThat(run.angleAt(-1)).isCloseTo(-0.35, within(ROUNDING));
    assertThat(run.angleAt(0.5)).isCloseTo(0.175, within(ROUNDING));
  }

  @Test
  void rightPedalMovesTheTrailingEdgeRight() {
    ControlRun run = ControlRun.of(Rudder.of(0.5, 0.4));
    assertThat(run.angleAt(1)).isEqualTo(-0.4);
    assertThat(run.angleAt(-1)).isEqualTo(0.5);
  }

  @Test
  void theHandCannotGoBeyondAStop() {
    ControlRun run = ControlRun.of(Rudder.of(0.5, 0.4));
    assertThat(run.angleAt(3)).isEqualTo(-0.4);
    assertThat(run.angleAt(-3)).isEqualTo(0.5);
    assertThat(run.angleRateAt(3, 1)).isZero();
    assertThat(run.angleRateAt(1, 1)).isZero();
    assertThat(run.angleRateAt(1, -1)).isEqualTo(0.4);
  }

  @ParameterizedTest
  @CsvSource({"-1", "-0.3", "0", "0.7", "1"})
  void thePositionForAnAngleIsTheOneThatGivesIt(double position) {
    ControlRun run = ControlRun.of(Rudder.of(0.5, 0.4));
    assertThat(run.positionFor(run.angleAt(position))).isCloseTo(position, within(ROUNDING));
  }

  @Test
  void anAngleBeyondTheTravelNeedsMoreThanTheTravel() {
    ControlRun run = ControlRun.of(Rudder.of(0.5, 0.4));
    assertThat(run.positionFor(1)).isCloseTo(-2, within(ROUNDING));
    assertThat(run.positionFor(-0.8)).isCloseTo(2, within(ROUNDING));
  }

  @Test
  void refusesARunThatMovesOneWayOnly() {
    assertThatIllegalArgumentException()
        .isThrownBy(
            () -> new ControlRun(0.1, 0.1, org.rolltrace.core.aeroplane.SurfaceDynamics.DIRECT));
  }
}
