package org.rolltrace.ui.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.ui.control.Written;
import org.rolltrace.ui.session.OpenSession;

/** Expected texts are worked out by hand from the shipped scenarios named in each test. */
class LaneBlockTest {
  /** A stick step at 1 s to 0.2 of the travel, the hand takes 0.15 s. */
  private final ScenarioDocument step = OpenSession.document("light-single-roll-entry");

  /** A stick hold at 1 s to 0.25 for 3.5 s, the hand takes 0.15 s. */
  private final ScenarioDocument hold = OpenSession.document("light-single-held-stick");

  /** A stick doublet at 1 s to 0.4 with a width of 1 s, the hand takes 0.15 s. */
  private final ScenarioDocument doublet = OpenSession.document("light-single-doublet");

  private static LaneBlock block(ScenarioDocument document) {
    return LaneBlock.of(document.check().scenario().orElseThrow().programme().inputs()).get(0);
  }

  private static String of(ScenarioDocument document, String key) {
    return document.text("$.inputs[0]." + key).orElse("absent");
  }

  @Test
  void blocksStandForTheInputsInTheirOrder() {
    ScenarioDocument two = step.withInputAdded("pedal", "doublet", 2);
    var blocks = LaneBlock.of(two.check().scenario().orElseThrow().programme().inputs());

    assertThat(blocks).extracting(LaneBlock::index).containsExactly(0, 1);
    assertThat(blocks).extracting(LaneBlock::control).containsExactly(Control.STICK, Control.PEDAL);
    assertThat(blocks.get(1).path("size")).isEqualTo("$.inputs[1].size");
  }

  @Test
  void aStepEndsWhereTheLaneEndsAndOthersWhereTheHandIsBack() {
    assertThat(block(step).canStretch()).isFalse();
    assertThat(block(step).shownEnd(10)).isEqualTo(10);
    assertThat(block(hold).canStretch()).isTrue();
    assertThat(block(hold).shownEnd(330)).isEqualTo(1 + 3.5 + 0.15);
    assertThat(block(hold).shownEnd(2)).isEqualTo(2);
    assertThat(block(doublet).shownEnd(10)).isEqualTo(1 + 2 * 1 + 0.15);
  }

  @ParameterizedTest
  @CsvSource({
    "0.504, 1.5 s",
    "0.506, 1.51 s",
    "-0.25, 0.75 s",
    "1, 2 s",
    "-1, 0 s",
    "-7, 0 s",
    "100, 101 s"
  })
  void aMovedBlockStartsOnAHundredthOfASecondAndNotBeforeTheBeginning(
      double byTime, String written) {
    for (ScenarioDocument document : new ScenarioDocument[] {step, hold, doublet}) {
      ScenarioDocument moved = block(document).moved(document, byTime);
      assertThat(of(moved, "start")).isEqualTo(written);
      assertThat(of(moved, "size")).isEqualTo(of(document, "size"));
      assertThat(of(moved, "duration")).isEqualTo(of(document, "duration"));
      assertThat(of(moved, "width")).isEqualTo(of(document, "width"));
    }
  }

  @ParameterizedTest
  @CsvSource({"0.333, 0.33", "-0.5, -0.5", "1.7, 1", "-1.7, -1", "0.001, 0", "-0.001, 0"})
  void aResizedBlockKeepsToTheTravelInHundredths(double size, String written) {
    for (ScenarioDocument document : new ScenarioDocument[] {step, hold, doublet}) {
      ScenarioDocument resized = block(document).resized(document, size);
      assertThat(of(resized, "size")).isEqualTo(written);
      assertThat(of(resized, "start")).isEqualTo("1 s");
      assertThat(resized.json()).as("a number, not a text").contains("\"size\": " + written);
    }
  }

  @ParameterizedTest
  @CsvSource({"6.15, 5 s", "3.004, 1.85 s", "1.2, 0.15 s", "0, 0.15 s"})
  void theRightEdgeOfAHoldSetsItsDuration(double toTime, String written) {
    ScenarioDocument stretched = block(hold).stretched(hold, toTime);
    assertThat(of(stretched, "duration")).isEqualTo(written);
    assertThat(of(stretched, "start")).isEqualTo("1 s");
    assertThat(of(stretched, "movement")).isEqualTo("0.15 s");
  }

  @ParameterizedTest
  @CsvSource({"5.15, 2 s", "2.17, 0.51 s", "1.2, 0.15 s", "0, 0.15 s"})
  void theRightEdgeOfADoubletSetsItsWidth(double toTime, String written) {
    ScenarioDocument stretched = block(doublet).stretched(doublet, toTime);
    assertThat(of(stretched, "width")).isEqualTo(written);
    assertThat(of(stretched, "duration")).isEqualTo("absent");
  }

  @Test
  void aStepHasNoRightEdgeToDrag() {
    assertThat(block(step).stretched(step, 5)).isEqualTo(step);
  }

  @ParameterizedTest
  @CsvSource({"1.4, 0.4 s", "1, 0 s", "0.2, 0 s", "9, 8 s"})
  void theHandOfAStepMayTakeAnyTime(double toTime, String written) {
    assertThat(of(block(step).handUntil(step, toTime), "movement")).isEqualTo(written);
  }

  @ParameterizedTest
  @CsvSource({"1.4, 0.4 s, 0.4 s", "0.2, 0 s, 0 s", "9, 3.5 s, 1 s"})
  void theHandIsBackBeforeItMovesAgain(double toTime, String inHold, String inDoublet) {
    assertThat(of(block(hold).handUntil(hold, toTime), "movement")).isEqualTo(inHold);
    assertThat(of(block(doublet).handUntil(doublet, toTime), "movement")).isEqualTo(inDoublet);
  }

  private static LongStream seeds() {
    return LongStream.range(0, 40);
  }

  /** Typed times may be finer than the hundredths that the mouse keeps to. */
  @ParameterizedTest
  @MethodSource("seeds")
  void noDragMakesAnInputThatCannotBeFlown(long seed) {
    Random random = new Random(seed);
    ScenarioDocument document = (random.nextBoolean() ? hold : doublet).with("$.duration", "9 s");
    String length = document.text("$.inputs[0].width").isPresent() ? "width" : "duration";
    double hand = random.nextInt(1, 900) / 1000.0;
    document =
        document
            .with("$.inputs[0].movement", Written.seconds(hand))
            .with("$.inputs[0]." + length, Written.seconds(hand + random.nextInt(900) / 1000.0));
    for (int i = 0; i < 12; i++) {
      LaneBlock block = block(document);
      double time = -2 + 14 * random.nextDouble();
      document =
          switch (random.nextInt(4)) {
            case 0 -> block.moved(document, time);
            case 1 -> block.resized(document, time / 3);
            case 2 -> block.stretched(document, block.shape().start() + 0.2 * time);
            default -> block.handUntil(document, time);
          };
      assertThat(document.check().faults()).as(document.json()).isEmpty();
    }
    assertThat(block(document).shape()).isInstanceOfAny(HoldInput.class, DoubletInput.class);
  }
}
