package org.rolltrace.ui.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.SameThread;

/** Flying by hand without a window: keys and time go in, a trace comes out. */
class HandFlightModelTest {
  private static final Path SHIPPED = Path.of("..", "scenarios");
  private static final String NAME = "tarnlark-cruise-roll-entry.json";

  /** A frame of a screen, s. */
  private static final double FRAME = 1.0 / 60;

  @TempDir Path folder;
  private DeskSession session;
  private ManoeuvreModel model;
  private HandFlightModel hand;

  @BeforeEach
  void open() throws IOException {
    Files.createDirectories(folder.resolve("aeroplanes"));
    for (String name : List.of(NAME, "aeroplanes/tarnlark-trainer.json")) {
      Files.copy(SHIPPED.resolve(name), folder.resolve(name));
    }
    session = new DeskSession(new SameThread(), new RecoveryStore(folder.resolve("recovery")));
    session.open(folder.resolve(NAME));
    model = new ManoeuvreModel(session);
    hand = model.hand();
  }

  private void pass(double seconds) {
    for (int i = 0; i < Math.round(seconds / FRAME); i++) {
      hand.advance(FRAME);
    }
  }

  private double stick() {
    LiveFlight flight = hand.flight().orElseThrow();
    return flight.now(Channel.STICK) - flight.trim(Control.STICK);
  }

  private void rollRightAndBack() {
    hand.key(Control.STICK, true, true);
    pass(1);
    hand.key(Control.STICK, true, false);
    hand.key(Control.PEDAL, false, true);
    pass(0.3);
    hand.key(Control.PEDAL, false, false);
    hand.key(Control.STICK, false, true);
    pass(1);
    hand.key(Control.STICK, false, false);
    pass(1);
  }

  @Test
  void timeBeginsWithTheFirstMovement() {
    hand.begin();
    assertThat(hand.flyingProperty().get()).isTrue();
    pass(1);
    assertThat(hand.timeProperty().get()).isZero();

    hand.key(Control.STICK, true, true);
    pass(1);

    // A tick may just not be full.
    assertThat(hand.timeProperty().get()).isCloseTo(1, within(0.02 + 1e-9));
  }

  @Test
  void aKeyMovesTheStickAtTheStatedRateAndLetGoItReturns() {
    hand.begin();
    hand.key(Control.STICK, false, true);
    hand.advance(0.1);
    // 2 of the travel a second for 0.1 s.
    assertThat(stick()).isCloseTo(-0.2, within(1e-9));
    for (int i = 0; i < 9; i++) {
      hand.advance(0.1);
    }
    assertThat(stick()).as("at the stop").isCloseTo(-1, within(0.1));
    double held = stick();

    hand.key(Control.STICK, false, false);
    hand.advance(0.1);

    assertThat(stick()).isCloseTo(held + 0.4, within(1e-4 + 1e-9)); // kept to 1e-4
    hand.advance(0.2);
    assertThat(stick()).isCloseTo(0, within(1e-9));
  }

  @Test
  void theMouseHoldsTheStickWhereItIs() {
    hand.begin();
    hand.grab(Control.STICK, 0.35);
    hand.advance(0.02);
    assertThat(stick()).as("no hand jumps").isCloseTo(0.2, within(1e-9));
    pass(0.2);
    assertThat(stick()).isCloseTo(0.35, within(1e-9));

    hand.release(Control.STICK);
    pass(0.2);

    assertThat(stick()).isCloseTo(0, within(1e-9));
  }

  @Test
  void bothKeysHoldTheStickAndLeavingTheWindowLetsGo() {
    hand.begin();
    hand.key(Control.STICK, true, true);
    hand.advance(0.1);
    hand.key(Control.STICK, false, true);
    hand.advance(0.1);
    assertThat(stick()).isCloseTo(0.2, within(1e-9));

    hand.letGo();
    hand.advance(0.1);

    assertThat(stick()).isCloseTo(0, within(1e-9));
  }

  @Test
  void whatWasFlownIsTheInputAndTheRunIsTheFlight() {
    hand.begin();
    rollRightAndBack();
    TimeHistory live = hand.flight().orElseThrow().history();

    hand.stop();

    ScenarioDocument document = session.documentProperty().get();
    assertThat(document.inputCount()).isEqualTo(2);
    assertThat(document.text("$.inputs[0].shape")).contains("trace");
    assertThat(document.text("$.inputs[0].file"))
        .contains("tarnlark-cruise-roll-entry-by-hand.csv");
    TimeHistory run = session.resultProperty().get().history();
    for (int i = 0; i < live.size(); i++) {
      int index = run.lastAt(live.time(i));
      for (Channel channel : List.of(Channel.BANK, Channel.ROLL_RATE, Channel.SIDESLIP)) {
        // The promise of the integration: 5e-3 deg and deg/s.
        assertThat(Math.toDegrees(run.value(channel, index) - live.value(channel, i)))
            .as("%s at %s s", channel, live.time(i))
            .isCloseTo(0, within(5e-3));
      }
    }
    assertThat(session.resultProperty().get().scenario().duration())
        .isEqualTo(live.time(live.size() - 1));
    assertThat(model.windowProperty().get().to()).isEqualTo(live.time(live.size() - 1));
    assertThat(hand.flyingProperty().get()).isFalse();
  }

  @Test
  void theRecordHasCornersAndNotEveryTick() {
    hand.begin();
    rollRightAndBack();
    int ticks = hand.flight().orElseThrow().record().size();
    hand.stop();

    String csv = session.documentProperty().get().carriedTraces().values().iterator().next();
    assertThat(ticks).isGreaterThan(150);
    // Four moves of the stick and two of the pedals have two corners each; the ends.
    assertThat(csv.lines().count()).isBetween(8L, 20L);
  }

  @Test
  void oneUndoBringsTheOldInputsBack() {
    ScenarioDocument before = session.documentProperty().get();
    hand.begin();
    rollRightAndBack();
    hand.stop();
    ScenarioDocument after = session.documentProperty().get();
    assertThat(session.undoWordProperty().get()).isEqualTo("fly by hand");

    session.undo();
    assertThat(session.documentProperty().get()).isEqualTo(before);
    assertThat(session.dirtyProperty().get()).isFalse();

    session.redo();
    assertThat(session.documentProperty().get()).isEqualTo(after);
    assertThat(session.faults()).isEmpty();
  }

  @Test
  void savingWritesTheTraceAndTheFileFliesAlike() throws IOException {
    hand.begin();
    rollRightAndBack();
    hand.stop();
    TimeHistory shown = session.resultProperty().get().history();

    assertThat(session.save()).isTrue();

    assertThat(session.dirtyProperty().get()).isFalse();
    assertThat(Files.readString(folder.resolve("tarnlark-cruise-roll-entry-by-hand.csv")))
        .startsWith("time[s],stick[-],pedal[-]\n0.0,0.0,0.0\n");
    TimeHistory file = ScenarioRun.execute(ScenarioFile.read(folder.resolve(NAME))).history();
    assertThat(file.values(Channel.BANK)).isEqualTo(shown.values(Channel.BANK));
    assertThat(new RecoveryStore(folder.resolve("recovery")).pending()).isEmpty();
  }

  @Test
  void aCrashBeforeSavingLosesNothing() {
    hand.begin();
    rollRightAndBack();
    hand.stop();
    ScenarioDocument flown = session.documentProperty().get();

    // Another program starts; this one did not end in order.
    RecoveryStore next = new RecoveryStore(folder.resolve("recovery"));
    DeskSession after = new DeskSession(new SameThread(), next);
    after.recover(next.pending().get(0));

    assertThat(after.documentProperty().get()).isEqualTo(flown);
    assertThat(after.faults()).isEmpty();
    assertThat(after.resultProperty().get().history().values(Channel.BANK))
        .isEqualTo(session.resultProperty().get().history().values(Channel.BANK));
    assertThat(after.save()).isTrue();
    assertThat(folder.resolve("tarnlark-cruise-roll-entry-by-hand.csv")).exists();
  }

  @Test
  void whoMovesNothingChangesNothing() {
    ScenarioDocument before = session.documentProperty().get();
    hand.begin();
    hand.stop();
    hand.begin();
    hand.start();
    pass(2);
    hand.stop();

    assertThat(session.documentProperty().get()).isSameAs(before);
    assertThat(session.canUndoProperty().get()).isFalse();
  }

  @Test
  void anotherScenarioEndsTheFlight() {
    hand.begin();
    hand.key(Control.STICK, true, true);
    pass(0.5);

    session.open(SHIPPED.resolve("light-single-roll-entry.json"));

    assertThat(hand.flyingProperty().get()).isFalse();
    pass(1);
    hand.stop();
    assertThat(session.dirtyProperty().get()).isFalse();
  }

  @Test
  void whatCannotBeFlownIsSaidWithTheReason() {
    session.edit("spoil", document -> document.with("$.duration", "10 m"));
    hand.begin();
    assertThat(hand.flyingProperty().get()).isFalse();
    assertThat(session.problemProperty().get().message())
        .startsWith("first mend the value that cannot be used: \"10 m\" is a length");

    session.open(SHIPPED.resolve("light-single-roll-entry.json")); // its derivatives are given
    session.edit(
        "take the controls away",
        document -> {
          ScenarioDocument bare = document.withAeroplaneInline();
          while (bare.inputCount() > 0) {
            bare = bare.withoutInput(0);
          }
          return bare.without("$.aeroplane.ailerons").without("$.aeroplane.rudder");
        });
    assertThat(session.faults()).isEmpty();
    hand.begin();
    assertThat(hand.flyingProperty().get()).isFalse();
    assertThat(session.problemProperty().get().message())
        .startsWith("the aeroplane gives the travel of neither ailerons nor rudder");
  }

  @Test
  void theFlightEndsByItselfAtItsLimit() {
    hand.begin();
    hand.key(Control.PEDAL, true, true);
    hand.advance(0.1);
    hand.key(Control.PEDAL, true, false);
    for (int i = 0; i < 1250 && hand.flyingProperty().get(); i++) {
      hand.advance(0.25);
    }

    assertThat(hand.flyingProperty().get()).isFalse();
    assertThat(session.documentProperty().get().text("$.duration")).contains("300 s");
  }

  @Test
  void aLongPauseOfTheMachineIsNotFlownBlind() {
    hand.begin();
    hand.start();
    hand.advance(30);

    assertThat(hand.timeProperty().get()).isLessThanOrEqualTo(0.25);
  }
}
