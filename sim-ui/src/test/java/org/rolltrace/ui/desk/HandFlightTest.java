package org.rolltrace.ui.desk;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** Flying by hand in the window, and what the scenario pane edits. Runs without a display. */
@ExtendWith(ApplicationExtension.class)
class HandFlightTest {
  private static final Path SHIPPED = Path.of("..", "scenarios");
  private static final String ROLL = "tarnlark-cruise-roll-entry.json";
  private static final String HOLD = "light-single-held-stick.json";
  private static final String TRACE = "tarnlark-cruise-roll-entry-by-hand.csv";

  /** Long enough for a machine that is busy with other things. */
  private static final int PATIENCE_SECONDS = 20;

  @TempDir Path folder;
  private final FxRobot robot = new FxRobot();
  private final List<Throwable> thrown = Collections.synchronizedList(new ArrayList<>());
  private Background runner;
  private Stage stage;
  private DeskSession session;
  private DeskWindow window;
  private RecoveryStore recovery;

  @Start
  void makeTheWindow(Stage first) {
    Thread.currentThread().setUncaughtExceptionHandler((thread, failure) -> thrown.add(failure));
    stage = first;
    recovery = new RecoveryStore(folder.resolve("recovery"));
    runner = new Background(Platform::runLater);
    session = new DeskSession(runner, recovery);
    window = new DeskWindow(stage, session, recovery);
    stage.setWidth(1100);
    stage.setHeight(700);
  }

  @BeforeEach
  void openAScenario() throws IOException {
    Files.createDirectories(folder.resolve("aeroplanes"));
    for (String name :
        List.of("aeroplanes/tarnlark-trainer.json", "aeroplanes/light-single.json", ROLL, HOLD)) {
      Files.copy(SHIPPED.resolve(name), folder.resolve(name));
    }
    Platform.runLater(() -> window.show(folder.resolve(ROLL)));
    until("first result", () -> session.resultProperty().get() != null);
  }

  @AfterEach
  void nothingWasThrown() {
    robot.interact(stage::hide);
    runner.close();
    assertThat(thrown).isEmpty();
  }

  private static <T> T onWindow(Callable<T> question) {
    return WaitForAsyncUtils.waitForAsyncFx(1000L * PATIENCE_SECONDS, question);
  }

  private static void until(String what, Callable<Boolean> condition) {
    try {
      WaitForAsyncUtils.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS, () -> onWindow(condition));
    } catch (TimeoutException e) {
      throw new AssertionError("waited in vain: " + what, e);
    }
  }

  private Node node(String query) {
    return robot.lookup(query).queryAll().iterator().next();
  }

  private boolean isThere(String query) {
    return robot.lookup(query).tryQuery().isPresent();
  }

  private void click(String query) {
    robot.robotContext().getBaseRobot().moveMouse(robot.point(query).query());
    WaitForAsyncUtils.waitForFxEvents(1);
    robot.clickOn(MouseButton.PRIMARY);
  }

  private ScenarioDocument document() {
    return onWindow(() -> session.documentProperty().get());
  }

  private Scenario flownScenario() {
    return onWindow(() -> session.resultProperty().get().scenario());
  }

  private double time() {
    return onWindow(() -> window.model().hand().timeProperty().get());
  }

  private double now(Channel channel) {
    return onWindow(() -> window.model().hand().flight().orElseThrow().now(channel));
  }

  private void untilTime(double seconds) {
    until(
        "flown for " + seconds + " s", () -> window.model().hand().timeProperty().get() > seconds);
  }

  private void flyByKeys() {
    robot.push(KeyCode.CONTROL, KeyCode.F);
    until("ready", () -> isThere("#hand-flight"));
    robot.press(KeyCode.RIGHT);
    untilTime(0.4);
    robot.release(KeyCode.RIGHT);
    double turned = time();
    robot.press(KeyCode.COMMA);
    untilTime(turned + 0.4);
    robot.release(KeyCode.COMMA);
    robot.push(KeyCode.ESCAPE);
    until("stopped", () -> !isThere("#hand-flight"));
    until("flown", () -> session.resultProperty().get().scenario().duration() < 3.99);
  }

  @Test
  void keysFlyAndEscapePutsWhatWasFlownInPlaceOfTheInputs() {
    flyByKeys();

    assertThat(document().inputCount()).isEqualTo(2);
    Scenario flown = flownScenario();
    assertThat(flown.programme().inputs())
        .allSatisfy(input -> assertThat(input.shape()).isInstanceOf(TraceInput.class));
    assertThat(flown.programme().inputs().get(0).shape().size()).isBetween(0.5, 1.0);
    assertThat(flown.programme().inputs().get(1).shape().size()).isBetween(-1.0, -0.4);
    assertThat(stage.getTitle()).endsWith("(unsaved)");
    assertThat(onWindow(() -> node("#stage").isFocused())).as("space plays").isTrue();
  }

  @Test
  void nothingMovesBeforeTheFirstKeyAndCautionsStayInSight() {
    robot.interact(() -> node("#stage").requestFocus());
    robot.push(KeyCode.CONTROL, KeyCode.F);
    until("ready", () -> isThere("#hand-flight"));
    WaitForAsyncUtils.sleep(150, TimeUnit.MILLISECONDS);
    assertThat(time()).isZero();
    assertThat(((Label) node("#hand-state")).getText()).startsWith("Ready");
    assertThat(
            onWindow(() -> node("#cautions").getScene() != null && node("#cautions").isVisible()))
        .isTrue();
    assertThat(((Label) node("#state")).getText()).startsWith("Flying by hand");

    robot.push(KeyCode.SPACE);
    untilTime(0.1);
    assertThat(onWindow(() -> window.model().clock().isPlaying())).as("replay").isFalse();
    assertThat(((Label) node("#hand-state")).getText()).startsWith("Flying");
    assertThat(((Label) node("#hand-time")).getText()).endsWith(" s");
    click("#stop-hand");
    until("stopped", () -> !isThere("#hand-flight"));
    assertThat(onWindow(() -> session.dirtyProperty().get())).as("nothing was moved").isFalse();
  }

  @Test
  void theMouseHoldsTheStickUntilItLetsGo() {
    click("#fly-by-hand");
    until("ready", () -> isThere("#hand-stick"));
    Point2D middle = robot.point("#hand-stick").query();
    double width = onWindow(() -> node("#hand-stick").getLayoutBounds().getWidth());
    robot.robotContext().getBaseRobot().moveMouse(middle.subtract(0.25 * width, 0));
    robot.press(MouseButton.PRIMARY);
    untilTime(0.4);
    // A quarter of the width is a little more than half the travel: room is left for the knob.
    assertThat(now(Channel.STICK)).isBetween(-0.6, -0.5);
    assertThat(now(Channel.ROLL_RATE)).isNegative();

    robot.release(MouseButton.PRIMARY);
    untilTime(time() + 0.4);

    assertThat(Math.abs(now(Channel.STICK))).isLessThan(0.05);
  }

  @Test
  void undoBringsTheOldInputsBackAndIsQuietDuringTheFlight() {
    ScenarioDocument before = document();
    robot.push(KeyCode.CONTROL, KeyCode.F);
    until("ready", () -> isThere("#hand-flight"));
    robot.press(KeyCode.LEFT);
    untilTime(0.2);
    robot.push(KeyCode.CONTROL, KeyCode.Z);
    assertThat(onWindow(() -> window.model().hand().flyingProperty().get())).isTrue();
    robot.release(KeyCode.LEFT);
    robot.push(KeyCode.ESCAPE);
    until("taken", () -> session.dirtyProperty().get());

    robot.push(KeyCode.CONTROL, KeyCode.Z);

    until("undone", () -> session.documentProperty().get().equals(before));
    robot.push(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
    until("done again", () -> session.documentProperty().get().carriedTraces().size() == 1);
  }

  @Test
  void savingWritesTheTraceWholeAndTheFileFliesTheSame() throws IOException {
    flyByKeys();
    double bankAtTheEnd =
        onWindow(
            () -> {
              var history = session.resultProperty().get().history();
              return history.value(Channel.BANK, history.size() - 1);
            });

    robot.push(KeyCode.CONTROL, KeyCode.S);
    until("saved", () -> !session.dirtyProperty().get());

    List<String> lines = Files.readAllLines(folder.resolve(TRACE));
    assertThat(lines.get(0)).isEqualTo("time[s],stick[-],pedal[-]");
    assertThat(lines.size()).isBetween(4, 40);
    var history =
        org.rolltrace.core.run.ScenarioRun.execute(ScenarioFile.read(folder.resolve(ROLL)))
            .history();
    assertThat(history.value(Channel.BANK, history.size() - 1)).isEqualTo(bankAtTheEnd);
  }

  @Test
  void whatWasFlownIsKeptAgainstACrash() {
    flyByKeys();
    ScenarioDocument flown = document();

    until("kept", () -> !new RecoveryStore(folder.resolve("recovery")).pending().isEmpty());

    RecoveryStore.Pending pending = new RecoveryStore(folder.resolve("recovery")).pending().get(0);
    assertThat(pending.document()).isEqualTo(flown);
    assertThat(pending.document().check().faults()).isEmpty();
  }

  @Test
  void closingDuringAFlightAsksAboutWhatWasFlown() {
    robot.push(KeyCode.CONTROL, KeyCode.F);
    until("ready", () -> isThere("#hand-flight"));
    robot.press(KeyCode.LEFT);
    untilTime(0.3);
    robot.release(KeyCode.LEFT);

    robot.push(KeyCode.CONTROL, KeyCode.W);
    until("a question", () -> isThere("Do not save"));
    click("Go back");
    until("answered", () -> robot.lookup(".dialog-pane").tryQuery().isEmpty());

    assertThat(onWindow(() -> stage.isShowing())).isTrue();
    assertThat(document().text("$.inputs[0].shape")).contains("trace");
  }

  private void type(String field, String text) {
    click(field);
    robot.push(KeyCode.CONTROL, KeyCode.A);
    robot.write(text, 0);
  }

  @Test
  void aTraceIsScaledShiftedAndCutInItsFields() {
    flyByKeys();
    assertThat(((TextField) node("#inputs-0-file")).getText()).isEqualTo(TRACE);

    type("#inputs-0-size", "0.5");
    type("#inputs-0-cutAfter", "0.2 s");

    until("cut", () -> session.documentProperty().get().text("$.inputs[0].cutAfter").isPresent());
    until(
        "flown",
        () ->
            session.resultProperty().get().scenario().programme().inputs().get(0).shape()
                    instanceof TraceInput trace
                && trace.scale() == 0.5
                && trace.trace().end() == 0.2);
    assertThat(onWindow(() -> session.faults().isEmpty())).isTrue();
  }

  @Test
  void theScenarioPaneEditsStartAndNote() {
    click("#show-scenario");
    until("the pane", () -> isThere("#trim-state"));
    robot.interact(() -> ((ComboBox<?>) node("#trim-state")).getSelectionModel().select(3));
    until(
        "trimmed in a turn",
        () ->
            session.resultProperty().get().scenario().start().state().kind()
                == SteadyState.Kind.STEADY_TURN);
    type("#start-trim-bank", "-20 deg");
    until(
        "at the bank typed",
        () ->
            Math.abs(
                    session.resultProperty().get().scenario().start().state().bankOfTurn()
                        + Math.toRadians(20))
                < 1e-9);
    robot.interact(() -> ((TextArea) node("#note")).setText("Two\nlines"));
    assertThat(document().text("$.note")).contains("Two\nlines");

    robot.interact(() -> ((ComboBox<?>) node("#trim-state")).getSelectionModel().select(0));
    until(
        "level again", () -> session.documentProperty().get().text("$.start.trim.state").isEmpty());
    assertThat(onWindow(() -> session.faults().isEmpty())).isTrue();
  }

  @Test
  void aHeldSideslipIsEditedPointByPoint() {
    click("#slip-held");
    click("#show-scenario");
    until("the pane", () -> isThere("#add-held-slip"));
    robot.interact(() -> ((javafx.scene.control.Button) node("#add-held-slip")).fire());
    robot.interact(() -> ((javafx.scene.control.Button) node("#add-held-slip")).fire());
    until("two points", () -> isThere("#heldSlip-1-sideslip"));
    type("#heldSlip-1-sideslip", "-3 deg");
    until(
        "flown",
        () -> {
          var points =
              session.resultProperty().get().scenario().programme().heldSideslip().points();
          return points.size() == 2
              && Math.abs(points.get(1).sideslip() + Math.toRadians(3)) < 1e-9;
        });

    click("#heldSlip-0-remove");
    click("#heldSlip-0-remove");

    until("no point", () -> session.documentProperty().get().heldSlipCount() == 0);
    until(
        "flown without",
        () -> session.resultProperty().get().scenario().programme().heldSideslip().isNone());
    assertThat(onWindow(() -> session.faults().isEmpty())).isTrue();
  }

  @Test
  void aLongManoeuvreOpensWhereSomethingIsDone() {
    robot.interact(() -> session.open(folder.resolve(HOLD)));
    until("opened", () -> session.resultProperty().get().scenario().duration() == 330);

    // The stick is back at 4.65 s; three seconds after that are in view.
    until(
        "the inputs are in view",
        () -> Math.abs(window.model().windowProperty().get().to() - 7.65) < 1e-9);
    robot.push(KeyCode.CONTROL, KeyCode.DIGIT0);
    until("all is in view", () -> window.model().windowProperty().get().to() == 330);
    robot.push(KeyCode.CONTROL, KeyCode.DIGIT9);
    until(
        "the inputs again",
        () -> Math.abs(window.model().windowProperty().get().to() - 7.65) < 1e-9);
  }
}
