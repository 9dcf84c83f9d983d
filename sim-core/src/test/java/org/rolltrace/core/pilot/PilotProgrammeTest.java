package org.rolltrace.core.pilot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class PilotProgrammeTest {
  private static PilotProgramme stick(InputShape... shapes) {
    return PilotProgramme.of(
        List.of(shapes).stream().map(shape -> new PilotInput(Control.STICK, shape)).toList());
  }

  @Test
  void inputsOnOneControlAddUp() {
    PilotProgramme programme = stick(new StepInput(1, 0.5, 0), new StepInput(2, 0.25, 0));
    assertThat(programme.stick().positionAt(3)).isEqualTo(0.75);
    assertThat(programme.stick().largestPosition()).isEqualTo(0.75);
    assertThat(programme.pedal()).isSameAs(Movement.NONE);
  }

  @Test
  void breakpointsOfBothControlsComeInOrderAndOnce() {
    PilotProgramme programme =
        PilotProgramme.of(
            List.of(
                new PilotInput(Control.PEDAL, new StepInput(2, 0.5, 0.1)),
                new PilotInput(Control.STICK, new StepInput(1, 0.5, 1.0))));
    assertThat(programme.breakpoints()).containsExactly(1, 2, 2.1);
  }

  @Test
  void theStickLeadsEvenWhenThePedalsMoveFirst() {
    PilotInput pedal = new PilotInput(Control.PEDAL, new StepInput(0, 0.5, 0.1));
    PilotInput stick = new PilotInput(Control.STICK, new StepInput(1, -0.5, 0.1));
    assertThat(PilotProgramme.of(List.of(pedal, stick)).leading(9)).contains(stick);
    assertThat(PilotProgramme.of(List.of(pedal)).leading(9)).contains(pedal);
    assertThat(PilotProgramme.of(List.of()).leading(9)).isEmpty();
    assertThat(stick(new StepInput(0, 0, 0.1)).leading(9)).isEmpty();
    assertThat(stick(new StepInput(9, 1, 0.1)).leading(9)).isEmpty();
  }

  @Test
  void aStepIsHeldToTheEndAndNeverCentred() {
    PilotProgramme programme = stick(new StepInput(1, 0.5, 0.2));
    assertThat(programme.firstHold(10)).contains(new PilotProgramme.HeldStretch(1.2, 10));
    assertThat(programme.firstCentring()).isEmpty();
  }

  @Test
  void aHoldEndsWhereItsReturnBegins() {
    PilotProgramme programme = stick(new HoldInput(1, -0.5, 3, 0.2));
    assertThat(programme.firstHold(10)).contains(new PilotProgramme.HeldStretch(1.2, 4));
    assertThat(programme.firstCentring()).hasValue(4);
    assertThat(programme.firstHold(3)).contains(new PilotProgramme.HeldStretch(1.2, 3));
  }

  @Test
  void jumpsAreHeldAndCentredToo() {
    PilotProgramme programme = stick(new HoldInput(1, 1, 3, 0));
    assertThat(programme.firstHold(10)).contains(new PilotProgramme.HeldStretch(1, 4));
    assertThat(programme.firstCentring()).hasValue(4);
  }

  @Test
  void twoStepsThatCancelAreAHold() {
    PilotProgramme programme = stick(new StepInput(1, 0.5, 0.1), new StepInput(5, -0.5, 0.1));
    assertThat(programme.firstHold(10)).contains(new PilotProgramme.HeldStretch(1.1, 5));
    assertThat(programme.firstCentring()).hasValue(5);
  }

  @Test
  void controlsAreBackAtTrimWhenTheirSumIs() {
    assertThat(stick().backAtTrim(10)).hasValue(0);
    assertThat(stick(new StepInput(1, 0.5, 0.1)).backAtTrim(10)).isEmpty();
    assertThat(stick(new HoldInput(1, 0.5, 2, 0.1)).backAtTrim(10)).hasValue(3.1);
    assertThat(stick(new HoldInput(1, 0.5, 2, 0.1)).backAtTrim(3.05)).isEmpty();
    assertThat(stick(new StepInput(1, 0.5, 0.1), new StepInput(5, -0.5, 0.1)).backAtTrim(10))
        .hasValue(5.1);
    assertThat(stick(new StepInput(12, 0.5, 0.1)).backAtTrim(10)).hasValue(0);
  }

  @Test
  void aDoubletHasNoHoldAndIsCentredAtItsEnd() {
    PilotProgramme programme = stick(new DoubletInput(1, 1, 2, 0.1));
    assertThat(programme.firstHold(20)).isEmpty();
    assertThat(programme.firstCentring().orElseThrow()).isCloseTo(5, within(1e-12));
  }

  @Test
  void aRampIsHeldFromItsEnd() {
    assertThat(stick(new RampInput(1, 0.5, 2)).firstHold(10))
        .contains(new PilotProgramme.HeldStretch(3, 10));
  }

  private static TraceInput trace(double[] times, double... positions) {
    return new TraceInput(0, 1, Trace.of("a.csv", "stick", times, positions));
  }

  @Test
  void shapesThatAreNotMeantToBeHeldHaveNoHold() {
    double[] times = {0, 1, 5, 6};
    for (InputShape shape :
        List.of(
            new MultistepInput(1, 1, 1, List.of(3, 2, 1, 1), 0.1),
            new SweepInput(1, 1, 1, 2, 5, SweepInput.Law.LINEAR),
            trace(times, 0, 1, 1, 0))) {
      assertThat(stick(shape).firstHold(20)).as(shape.name()).isEmpty();
    }
    // What goes on after them is.
    assertThat(
            stick(new StepInput(0, 0.5, 0.1), new MultistepInput(0, 0.2, 1, List.of(1, 1), 0.1))
                .firstHold(20))
        .contains(new PilotProgramme.HeldStretch(2.1, 20));
  }

  @Test
  void aTraceIsCentredWhereItComesToRestAtTrimAndNotWhereItPasses() {
    double[] times = {0, 1, 2, 3, 4, 5};
    assertThat(stick(trace(times, 0, 1, 0, -1, 0, 0)).firstCentring()).hasValue(3);
    assertThat(stick(trace(times, 0, 1, 1, 0, 0, 0)).firstCentring()).hasValue(2);
    assertThat(stick(trace(times, 0, 1, 1, 0, 0, 0)).backAtTrim(10)).hasValue(3);
  }

  @Test
  void aHeldSideslipAddsItsBreakpoints() {
    HeldSideslip held =
        HeldSideslip.of(List.of(new HeldSideslip.Point(0.5, 0), new HeldSideslip.Point(3, 0.1)));
    PilotProgramme programme = stick(new StepInput(1, 0.5, 0)).holding(held);
    assertThat(programme.breakpoints()).containsExactly(0.5, 1, 3);
    assertThat(programme.heldSideslip()).isSameAs(held);
    assertThat(programme.inputs()).hasSize(1);
  }
}
