package org.rolltrace.ui.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.ui.chart.TimeWindow;

/** What dragging a block writes into the scenario. */
class FurtherShapesOnLanesTest {
  private static final Path SHIPPED = Path.of("..", "scenarios");
  private static final TimeWindow ALL = new TimeWindow(0, 40);

  private static ScenarioDocument open(String name) {
    return ScenarioDocument.open(SHIPPED.resolve("tarnlark-" + name + ".json"));
  }

  private static LaneBlock first(ScenarioDocument document) {
    return LaneBlock.of(document.check().scenario().orElseThrow().programme().inputs()).get(0);
  }

  @Test
  void theRightEdgeOfAMultistepSetsItsUnit() {
    ScenarioDocument document = open("multistep");
    LaneBlock block = first(document);
    assertThat(block.canStretch()).isTrue();
    // from 1 s, with a hand of 0.15 s, seven units
    ScenarioDocument stretched = block.stretched(document, 1 + 7 * 0.8 + 0.15);
    assertThat(stretched.text("$.inputs[0].unit")).contains("0.8 s");
    assertThat(first(stretched).shape().end()).isCloseTo(6.75, within(1e-9));
    // not shorter than the hand
    assertThat(block.stretched(document, 1.2).text("$.inputs[0].unit")).contains("0.15 s");
    assertThat(block.handUntil(document, 9).text("$.inputs[0].movement")).contains("0.55 s");
  }

  @Test
  void theEndOfTheMovementOfARampSetsItsDuration() {
    ScenarioDocument document = open("ramp");
    LaneBlock block = first(document);
    assertThat(block.canStretch()).isFalse();
    assertThat(block.hasHand()).isTrue();
    assertThat(block.handUntil(document, 4.5).text("$.inputs[0].duration")).contains("3.5 s");
    assertThat(block.handUntil(document, 0).text("$.inputs[0].duration")).contains("0.01 s");
    assertThat(block.resized(document, -0.4).text("$.inputs[0].size")).contains("-0.4");
  }

  @Test
  void theRightEdgeOfASweepSetsItsDuration() {
    ScenarioDocument document = open("sweep");
    LaneBlock block = first(document);
    assertThat(block.canStretch()).isTrue();
    assertThat(block.hasHand()).isFalse();
    assertThat(block.stretched(document, 16).text("$.inputs[0].duration")).contains("15 s");
    assertThat(block.moved(document, 2).text("$.inputs[0].start")).contains("3 s");
  }

  @Test
  void aTraceIsShiftedAndScaled() {
    ScenarioDocument document = open("trace");
    LaneBlock block = first(document);
    assertThat(block.canStretch()).isFalse();
    assertThat(block.hasHand()).isFalse();
    assertThat(block.moved(document, 1.5).text("$.inputs[0].start")).contains("1.5 s");
    ScenarioDocument halved = block.resized(document, 0.5 * block.shape().size());
    assertThat(halved.text("$.inputs[0].size")).contains("0.5");
    assertThat(first(halved).shape().size()).isCloseTo(0.5 * block.shape().size(), within(1e-12));
    // What is recorded cannot be made larger than it is.
    assertThat(block.resized(document, 1).text("$.inputs[0].size")).contains("1");
  }

  @Test
  void outlinesFollowTheMovement() {
    for (String name : List.of("multistep", "ramp", "sweep", "trace", "doublet")) {
      LaneBlock block = first(open(name));
      Movement movement = block.shape().movement();
      List<double[]> outline = block.outline(ALL, 0.02);
      assertThat(outline.get(0)).as(name).containsExactly(block.shape().start(), 0);
      assertThat(outline.get(outline.size() - 1)[1]).as(name).isZero();
      assertThat(outline.get(outline.size() - 1)[0])
          .as(name)
          .isEqualTo(Math.min(block.shape().end(), ALL.to()));
      double before = block.shape().start();
      for (double[] corner : outline.subList(1, outline.size() - 1)) {
        assertThat(corner[0]).as(name).isGreaterThanOrEqualTo(before);
        double at = movement.positionAt(corner[0]);
        double left = movement.positionAt(Math.nextDown(corner[0]));
        assertThat(corner[1]).as(name).isBetween(Math.min(at, left), Math.max(at, left));
        before = corner[0];
      }
    }
  }

  @Test
  void anOutlineOfASineReachesItsTops() {
    LaneBlock block = first(open("sweep"));
    double top =
        block.outline(ALL, 0.01).stream().mapToDouble(corner -> corner[1]).max().orElseThrow();
    // A hundredth of a second of two cycles a second is 0.06 rad on either side of a top at most.
    assertThat(top).isBetween(0.1 * Math.cos(0.07), 0.1);
  }

  @Test
  void aNewInputOfEveryShapeIsOneThatFliesOrWantsOnlyItsFile() {
    ScenarioDocument document = open("doublet");
    for (String shape : ScenarioDocument.shapes()) {
      ScenarioDocument added = document.withInputAdded("stick", shape, 2);
      if (shape.equals("trace")) {
        added = added.with("$.inputs[1].file", "traces/roll-and-back.csv");
      }
      InputShape made = added.check().scenario().orElseThrow().programme().inputs().get(1).shape();
      assertThat(made.name()).isEqualTo(shape);
      assertThat(IntStream.range(0, added.inputCount())).hasSize(2);
    }
  }

  private static LaneBlock recorded(int samples) {
    double[] times = new double[samples];
    double[] positions = new double[samples];
    for (int i = 0; i < samples; i++) {
      times[i] = i;
      positions[i] = i % 2;
    }
    return new LaneBlock(
        0,
        new PilotInput(
            Control.STICK, new TraceInput(2, -0.5, Trace.of("x.csv", "stick", times, positions))));
  }

  @Test
  void theRecordedPointsOfATraceInViewAreShownWhereTheyAreFlown() {
    assertThat(recorded(5).recordedPoints(new TimeWindow(2.5, 5)))
        .containsExactly(new double[] {3, -0.5}, new double[] {4, -0.0}, new double[] {5, -0.5});
    assertThat(recorded(500).recordedPoints(new TimeWindow(0, 50))).hasSize(49);
    assertThat(recorded(500).recordedPoints(new TimeWindow(0, 500)))
        .as("too many to be told apart")
        .isEmpty();
  }

  @Test
  void whatIsNotRecordedHasNoRecordedPoints() {
    LaneBlock step = new LaneBlock(0, new PilotInput(Control.STICK, new StepInput(1, 0.5, 0.1)));

    assertThat(step.recordedPoints(new TimeWindow(0, 10))).isEmpty();
  }
}
