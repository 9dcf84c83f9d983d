package org.rolltrace.ui.desk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.stream.Stream;
import javafx.application.Platform;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.image.PixelReader;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.Region;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.manoeuvre.LanesOnScreen;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/**
 * The window as people use it: mouse and keys go in, what stands on the screen and in files comes
 * out. Runs without a display.
 */
@ExtendWith(ApplicationExtension.class)
class DeskWindowTest {
  private static final Path SHIPPED = Path.of("..", "scenarios");
  private static final String STEP = "light-single-roll-entry.json";
  private static final String HOLD = "light-single-held-stick.json";
  private static final String SPEED = "$.condition.trueAirspeed";

  /** Long enough for a machine that is busy with other things. */
  private static final int PATIENCE_SECONDS = 20;

  @TempDir Path folder;
  private final FxRobot robot = new FxRobot();
  private final List<Throwable> thrown = Collections.synchronizedList(new ArrayList<>());
  private Background runner;
  private Stage stage;
  private DeskSession session;
  private DeskWindow window;
  private Path recoveryFolder;

  @Start
  void makeTheWindow(Stage first) {
    Thread.currentThread().setUncaughtExceptionHandler((thread, failure) -> thrown.add(failure));
    stage = first;
    recoveryFolder = folder.resolve("recovery");
    RecoveryStore recovery = new RecoveryStore(recoveryFolder);
    runner = new Background(Platform::runLater);
    session = new DeskSession(runner, recovery);
    window = new DeskWindow(stage, session, recovery);
    stage.setWidth(1100);
    stage.setHeight(700);
  }

  @BeforeEach
  void copyTheScenarios() throws IOException {
    Files.createDirectories(folder.resolve("aeroplanes"));
    for (String name : List.of("aeroplanes/light-single.json", STEP, HOLD)) {
      Files.copy(SHIPPED.resolve(name), folder.resolve(name));
    }
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

  /** Opens the window and waits until there are curves; questions may stand before it. */
  private void open(String name) {
    Platform.runLater(() -> window.show(folder.resolve(name)));
    until("first result", () -> session.resultProperty().get() != null);
    drawn();
  }

  /** Until what was asked for so far has been flown, laid out and drawn. */
  private void drawn() {
    until("flown", () -> !session.staleProperty().get() || !session.faults().isEmpty());
    WaitForAsyncUtils.waitForFxEvents(3);
  }

  private Node node(String query) {
    return robot.lookup(query).queryAll().iterator().next();
  }

  private RunResult result() {
    return onWindow(() -> session.resultProperty().get());
  }

  private String written(String path) {
    return onWindow(() -> session.documentProperty().get().text(path).orElse("absent"));
  }

  private void untilWritten(String path, String text) {
    until(
        path + " is " + text,
        () -> session.documentProperty().get().text(path).orElse("absent").equals(text));
  }

  private void untilFlown(double airspeedFeet) {
    until(
        "flown at " + airspeedFeet + " ft/s",
        () -> {
          RunResult now = session.resultProperty().get();
          return now != null
              && Math.abs(now.scenario().condition().trueAirspeed() - 0.3048 * airspeedFeet) < 1e-9;
        });
  }

  /** Clicks without moving the mouse there pixel by pixel, which takes most of the time. */
  private void click(String query) {
    clickAt(robot.point(query).query());
  }

  private void clickAt(Point2D place) {
    robot.robotContext().getBaseRobot().moveMouse(place);
    WaitForAsyncUtils.waitForFxEvents(1);
    robot.clickOn(MouseButton.PRIMARY);
  }

  private void type(String field, String text) {
    click(field);
    robot.push(KeyCode.CONTROL, KeyCode.A);
    robot.write(text, 0);
  }

  /** The figures beside a title: now, and when curves are kept, those and the difference. */
  private List<String> reading(String title) {
    return onWindow(
        () -> {
          for (Node row : robot.lookup("#readings .reading").queryAll()) {
            List<Label> labels =
                robot.from(row).lookup(".label").queryAllAs(Label.class).stream().toList();
            if (labels.stream().anyMatch(label -> label.getText().equals(title))) {
              return labels.stream()
                  .filter(label -> label.getStyleClass().contains("figure"))
                  .filter(label -> label.isVisible() && label.getParent().isVisible())
                  .map(Label::getText)
                  .filter(text -> !text.isEmpty())
                  .toList();
            }
          }
          return List.of();
        });
  }

  private void untilReading(String title, int count) {
    WaitForAsyncUtils.waitForFxEvents();
    try {
      WaitForAsyncUtils.waitFor(
          PATIENCE_SECONDS, TimeUnit.SECONDS, () -> reading(title).size() == count);
    } catch (TimeoutException e) {
      throw new AssertionError(title + " shows " + reading(title), e);
    }
  }

  /** How many pixels of a part of the window have the very colour of an ink. */
  private int inked(String query, Palette palette, Ink ink) {
    return onWindow(
        () -> {
          WritableImage image = node(query).snapshot(null, null);
          PixelReader pixels = image.getPixelReader();
          int count = 0;
          for (int y = 0; y < image.getHeight(); y++) {
            for (int x = 0; x < image.getWidth(); x++) {
              if ((pixels.getArgb(x, y) & 0xffffff) == palette.rgb(ink)) {
                count++;
              }
            }
          }
          return count;
        });
  }

  private Point2D onLanes(double time, double position) {
    return onWindow(() -> LanesOnScreen.at(node("#lanes"), Control.STICK, time, position));
  }

  private void drag(Point2D from, Point2D to) {
    robot.robotContext().getBaseRobot().moveMouse(from);
    robot.press(MouseButton.PRIMARY);
    robot.moveTo(from.midpoint(to));
    robot.moveTo(to);
    robot.release(MouseButton.PRIMARY);
  }

  private double number(String path, String unit) {
    return Double.parseDouble(written(path).replace(unit, ""));
  }

  private void answer(String button) {
    until("a question with " + button, () -> robot.lookup(button).tryQuery().isPresent());
    click(button);
    until("the question is gone", () -> robot.lookup(".dialog-pane").tryQuery().isEmpty());
  }

  private String message() {
    until("a message", () -> robot.lookup(".dialog-pane").tryQuery().isPresent());
    return onWindow(
        () ->
            String.join(
                "\n",
                robot.lookup(".dialog-pane .label").queryAllAs(Label.class).stream()
                    .map(Label::getText)
                    .toList()));
  }

  private void askToClose() {
    Platform.runLater(
        () -> stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST)));
  }

  @Test
  void aShippedScenarioOpensWithCurvesAndReadings() {
    open(STEP);

    assertThat(stage.getTitle())
        .isEqualTo(
            "Light single: roll entry to the right \u2013 "
                + session.fileProperty().get().getFileName()
                + " \u2013 Rolltrace");
    // What the command line prints for the same file: 12.66 deg/s and 96.97 deg.
    assertThat(reading("Peak roll rate")).containsExactly("12.66");
    assertThat(reading("Bank at the end")).containsExactly("96.97");
    assertThat(inked("#stage", Palette.LIGHT, Ink.RIGHT)).isGreaterThan(500);
    assertThat(inked("#lanes", Palette.LIGHT, Ink.RIGHT)).isGreaterThan(100);
    assertThat(robot.lookup("#condition-trueAirspeed").queryAs(TextField.class).getText())
        .isEqualTo("176 ft/s");
  }

  @Test
  void aWrongUnitIsToldBelowItsFieldAndTheCurvesStay() {
    open(STEP);
    RunResult before = result();

    type("#condition-trueAirspeed", "176 kg");
    untilWritten(SPEED, "176 kg");
    until(
        "the fault is below the field",
        () ->
            node("#condition-trueAirspeed-fault").isVisible()
                && ((Label) node("#condition-trueAirspeed-fault")).getText().contains("176 kg"));
    drawn();
    assertThat(node("#state").isVisible()).isTrue();
    assertThat(inked("#stage", Palette.LIGHT, Ink.RIGHT)).as("curves").isGreaterThan(500);

    type("#condition-trueAirspeed", "200 ft/s");
    untilFlown(200);
    until("no fault", () -> !node("#condition-trueAirspeed-fault").isVisible());
    assertThat(node("#state").isVisible()).isFalse();
    assertThat(result().measures()).isNotEqualTo(before.measures());
  }

  @Test
  void draggingABlockMovesTheInputAndTheCurvesFollow() {
    open(STEP);
    RunResult before = result();

    drag(onLanes(3, 0.0), onLanes(5, 0.0));

    until("moved", () -> session.resultProperty().get() != before);
    drawn();
    // 2 s later, give or take the two pixels at which the mouse may stand.
    assertThat(number("$.inputs[0].start", " s")).isBetween(2.95, 3.05);
    until(
        "flown with the input there",
        () ->
            session.resultProperty().get().scenario().programme().inputs().get(0).shape().start()
                == number("$.inputs[0].start", " s"));
    assertThat(onWindow(() -> session.undoWordProperty().get())).isEqualTo("move input");

    robot.push(KeyCode.CONTROL, KeyCode.Z);
    untilWritten("$.inputs[0].start", "1 s");
    assertThat(onWindow(() -> session.canUndoProperty().get())).as("one step").isFalse();
  }

  @Test
  void theTopEdgeSetsTheSize() {
    open(STEP);
    drag(onLanes(4, 0.2), onLanes(4, 0.8));
    untilMoreThan("$.inputs[0].size", 0.7);
    // The mouse stands on whole pixels; one is a good twentieth of the travel.
    assertThat(number("$.inputs[0].size", "")).isBetween(0.68, 0.92);
    assertThat(written("$.inputs[0].start")).isEqualTo("1 s");
  }

  private void untilMoreThan(String path, double value) {
    until(
        path + " above " + value,
        () ->
            Double.parseDouble(
                    session.documentProperty().get().text(path).orElse("0").replace(" s", ""))
                > value);
  }

  @Test
  void theRightEdgeOfAHoldSetsItsDuration() {
    open(HOLD);
    robot.interact(() -> session.edit("shorten", document -> document.with("$.duration", "12 s")));
    until("12 s", () -> session.resultProperty().get().scenario().duration() == 12);
    robot.interact(window.model()::resetView);
    drawn();

    drag(onLanes(4.65, 0.0), onLanes(6.65, 0.0));

    untilMoreThan("$.inputs[0].duration", 5);
    assertThat(number("$.inputs[0].duration", " s")).isBetween(5.4, 5.6);
    assertThat(written("$.inputs[0].start")).isEqualTo("1 s");
  }

  @Test
  void inputsAreAddedAndRemoved() {
    open(STEP);

    click("#add-input");
    click("pedal doublet");
    until("two inputs", () -> session.documentProperty().get().inputCount() == 2);
    assertThat(written("$.inputs[1].control")).isEqualTo("pedal");
    assertThat(written("$.inputs[1].shape")).isEqualTo("doublet");
    until("its width can be typed", () -> robot.lookup("#inputs-1-width").tryQuery().isPresent());
    type("#inputs-1-width", "0.8 s");
    untilWritten("$.inputs[1].width", "0.8 s");

    click("#remove-input");
    click("#remove-input");
    until("none left", () -> session.documentProperty().get().inputCount() == 0);
    until("nothing selected", () -> node("#remove-input").isDisabled());

    robot.robotContext().getBaseRobot().moveMouse(onLanes(2, 0.0));
    robot.doubleClickOn(MouseButton.PRIMARY);
    until("one again", () -> session.documentProperty().get().inputCount() == 1);
    assertThat(written("$.inputs[0].shape")).isEqualTo("hold");
    assertThat(number("$.inputs[0].start", " s")).isBetween(1.95, 2.05);
  }

  @Test
  void inputsAreAddedAndRemovedAlsoWhileAValueIsWrong() {
    open(STEP);
    type("#condition-trueAirspeed", "fast");
    until("a fault", () -> !session.faults().isEmpty());

    click("#add-input");
    click("stick hold");
    click("#add-input");
    click("pedal step");
    until("three inputs", () -> session.documentProperty().get().inputCount() == 3);
    assertThat(robot.lookup("#inputs-2-start").tryQuery()).as("the new one is chosen").isPresent();
    for (int left = 2; left >= 0; left--) {
      int count = left;
      click("#remove-input");
      WaitForAsyncUtils.waitForFxEvents(5);
      until(left + " left", () -> session.documentProperty().get().inputCount() == count);
    }
    until("nothing to remove", () -> node("#remove-input").isDisabled());
    drag(onLanes(3, 0.0), onLanes(5, 0.0));
    robot.push(KeyCode.DELETE);
    assertThat(onWindow(() -> session.documentProperty().get().inputCount())).isZero();
  }

  @ParameterizedTest
  @ValueSource(strings = {"held", "settled"})
  void theSlipIsChosen(String slip) {
    open(STEP);
    RunResult free = result();
    click("#slip-" + slip);
    untilWritten("$.slip", slip);
    until("flown", () -> session.resultProperty().get() != free);
    assertThat(result().scenario().slip().word()).isEqualTo(slip);
  }

  @Test
  void theReplayPlaysPausesStepsAndIsScrubbed() {
    open(STEP);
    assertThat(window.model().clock().position()).isZero();

    click("#play");
    until("it goes on", () -> window.model().clock().position() > 0.1);
    click("#play");
    until("it stands", () -> !window.model().clock().isPlaying());
    double stood = window.model().clock().position();
    WaitForAsyncUtils.waitForFxEvents(5);
    assertThat(window.model().clock().position()).isEqualTo(stood);
    assertThat(stood).isLessThan(10);

    double drawnBefore = inked("#stage", Palette.LIGHT, Ink.CURSOR);
    assertThat(drawnBefore).as("the instant is shown").isPositive();

    robot.interact(() -> window.model().clock().moveTo(2));
    clickAt(robot.point(button("One frame on")).query());
    until("a frame on", () -> Math.abs(window.model().clock().position() - 2.02) < 1e-9);
    clickAt(robot.point(button("One frame back")).query());
    clickAt(robot.point(button("One frame back")).query());
    until("a frame back", () -> Math.abs(window.model().clock().position() - 1.98) < 1e-9);

    robot.interact(() -> robot.lookup("#replay-position").queryAs(Slider.class).setValue(7.25));
    assertThat(window.model().clock().position()).isEqualTo(7.25);
    click("#replay-position");
    until("the middle", () -> Math.abs(window.model().clock().position() - 5) < 0.3);

    robot.interact(() -> node("#stage").requestFocus());
    robot.push(KeyCode.SPACE);
    until("space plays", () -> window.model().clock().isPlaying());
    robot.push(KeyCode.SPACE);
    until("space pauses", () -> !window.model().clock().isPlaying());
  }

  private Node button(String says) {
    return robot
        .lookup((Node found) -> says.equals(found.getAccessibleText()))
        .queryAll()
        .iterator()
        .next();
  }

  @Test
  void keptCurvesAndReadingsStandBesideThePresentOnes() {
    open(STEP);
    assertThat(reading("Bank at the end")).containsExactly("96.97");

    click("#keep-ghost");
    untilReading("Bank at the end", 3);
    type("#condition-trueAirspeed", "200 ft/s");
    untilFlown(200);
    drawn();
    List<String> figures = reading("Bank at the end");
    double now = Double.parseDouble(figures.get(0));
    double difference = Double.parseDouble(figures.get(2));
    assertThat(figures.get(1)).isEqualTo("96.97");
    // Four figures: above 100 deg the present one is rounded to a tenth, the others to hundredths.
    assertThat(now - 96.97).isCloseTo(difference, within(0.0601));
    assertThat(difference).as("a faster roll").isGreaterThan(1);

    click("#drop-ghost");
    untilReading("Bank at the end", 1);
  }

  @Test
  void leftIsComparedWithRight() {
    open(STEP);
    click("#mirror");
    untilWritten("$.inputs[0].size", "-0.2");
    until("flown", () -> session.resultProperty().get() != session.ghostProperty().get());
    untilReading("Bank at the end", 3);

    // Opposite rolls compare by size, and this aeroplane rolls alike both ways.
    assertThat(reading("Bank at the end")).containsExactly("\u221296.97", "96.97", "0");
    assertThat(((Label) node("#kept-words")).getText()).contains("stick step 20 % right");
    assertThat(inked("#stage", Palette.LIGHT, Ink.LEFT)).isGreaterThan(500);
    assertThat(inked("#stage", Palette.LIGHT, Ink.RIGHT)).isGreaterThan(200);
  }

  @Test
  void editsAreUndoneAndDoneAgainByKeysAndMenu() {
    open(STEP);
    type("#condition-trueAirspeed", "200 ft/s");
    untilFlown(200);

    robot.push(KeyCode.CONTROL, KeyCode.Z);
    untilWritten(SPEED, "176 ft/s");
    untilFlown(176);
    assertThat(onWindow(() -> session.dirtyProperty().get())).isFalse();
    robot.push(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
    untilWritten(SPEED, "200 ft/s");

    click("Edit");
    click("Undo: change airspeed");
    untilWritten(SPEED, "176 ft/s");
    click("Edit");
    click("Redo: change airspeed");
    untilWritten(SPEED, "200 ft/s");
    untilFlown(200);
  }

  @Test
  void savingWritesTheFile() {
    open(STEP);
    type("#condition-trueAirspeed", "200 ft/s");
    untilWritten(SPEED, "200 ft/s");
    until("unsaved", () -> stage.getTitle().endsWith("(unsaved)"));

    robot.push(KeyCode.CONTROL, KeyCode.S);

    until("saved", () -> !stage.getTitle().endsWith("(unsaved)"));
    ScenarioDocument saved = ScenarioDocument.open(folder.resolve(STEP));
    assertThat(saved.text(SPEED)).contains("200 ft/s");
    assertThat(saved.text("$.aeroplane")).contains("aeroplanes/light-single.json");
  }

  @Test
  void anInputOnThePowerHasALaneOfItsOwn() throws IOException {
    for (String name :
        List.of("aeroplanes/tarnlark-trainer-approach.json", "tarnlark-power-step.json")) {
      Files.copy(SHIPPED.resolve(name), folder.resolve(name));
    }
    open(STEP);
    double two = onWindow(() -> ((Region) node("#lanes")).getHeight());

    open("tarnlark-power-step.json");
    until("a third lane", () -> ((Region) node("#lanes")).getHeight() > two + 30);
    Point2D top = onWindow(() -> LanesOnScreen.at(node("#lanes"), Control.POWER, 3, 0.73));
    Point2D half = onWindow(() -> LanesOnScreen.at(node("#lanes"), Control.POWER, 3, 0.5));
    drag(top, half);

    until(
        "less power", () -> Math.abs(Double.parseDouble(written("$.inputs[0].size")) - 0.5) < 0.06);
    until(
        "flown with less power",
        () -> {
          TimeHistory history = result().history();
          return history.value(Channel.POWER, history.size() - 1) < 0.85;
        });
  }

  @Test
  void whatCannotBeSavedIsToldAndStays() throws IOException {
    open(STEP);
    click("#slip-held");
    untilWritten("$.slip", "held");
    // A folder that is not empty stands where the file was: nobody may write over it.
    Files.delete(folder.resolve(STEP));
    Files.createDirectories(folder.resolve(STEP).resolve("something"));

    robot.push(KeyCode.CONTROL, KeyCode.S);

    assertThat(message()).contains("Cannot save " + STEP).contains("Your edits are still here");
    answer("OK");
    assertThat(onWindow(() -> session.dirtyProperty().get())).isTrue();
    assertThat(written("$.slip")).isEqualTo("held");
  }

  @Test
  void closingAsksAboutUnsavedChangesAndMayBeGivenUp() {
    open(STEP);
    click("#slip-held");
    untilWritten("$.slip", "held");

    askToClose();
    assertThat(message()).contains("roll entry to the right").contains("not saved");
    answer("Go back");
    assertThat(onWindow(stage::isShowing)).isTrue();
    click("#slip-settled");
    untilWritten("$.slip", "settled");
    until(
        "the window goes on as before",
        () -> session.resultProperty().get().scenario().slip().word().equals("settled"));
  }

  @Test
  void closingWithoutSavingLeavesTheFileAndNothingToRecover() throws IOException {
    open(STEP);
    String asShipped = Files.readString(folder.resolve(STEP));
    click("#slip-held");
    untilWritten("$.slip", "held");

    robot.push(KeyCode.CONTROL, KeyCode.W);
    answer("Do not save");

    until("closed", () -> !stage.isShowing());
    assertThat(Files.readString(folder.resolve(STEP))).isEqualTo(asShipped);
    assertThat(new RecoveryStore(recoveryFolder).pending()).isEmpty();
  }

  @Test
  void closingMaySaveFirst() {
    open(STEP);
    click("#slip-held");
    untilWritten("$.slip", "held");

    askToClose();
    answer("Save");

    until("closed", () -> !stage.isShowing());
    assertThat(ScenarioDocument.open(folder.resolve(STEP)).text("$.slip")).contains("held");
    assertThat(new RecoveryStore(recoveryFolder).pending()).isEmpty();
  }

  @Test
  void withoutChangesNothingIsAsked() {
    open(STEP);
    askToClose();
    until("closed", () -> !stage.isShowing());
  }

  private void crashWith(String speed) {
    Path file = folder.resolve(STEP).toAbsolutePath();
    new RecoveryStore(recoveryFolder)
        .keep(Optional.of(file), ScenarioDocument.open(file).with(SPEED, speed));
  }

  private List<Path> kept() throws IOException {
    try (Stream<Path> files = Files.list(recoveryFolder)) {
      return files.toList();
    }
  }

  @Test
  void whatACrashLeftIsOfferedAndTakenUp() {
    crashWith("210 ft/s");
    Platform.runLater(() -> window.show(folder.resolve(HOLD)));

    assertThat(message()).contains("Light single: roll entry to the right").contains(STEP);
    answer("Take it up");

    untilFlown(210);
    assertThat(stage.getTitle()).contains("roll entry").endsWith("(unsaved)");
    robot.push(KeyCode.CONTROL, KeyCode.S);
    until("saved", () -> !session.dirtyProperty().get());
    assertThat(ScenarioDocument.open(folder.resolve(STEP)).text(SPEED)).contains("210 ft/s");
  }

  @Test
  void whatACrashLeftMayBeThrownAway() throws IOException {
    crashWith("210 ft/s");
    Platform.runLater(() -> window.show(folder.resolve(HOLD)));
    answer("Throw it away");
    until("opened", () -> session.resultProperty().get() != null);
    assertThat(stage.getTitle()).contains("stick held");
    assertThat(kept()).isEmpty();
  }

  @Test
  void aFileThatCannotBeReadIsToldAndTheWindowStaysUsable() throws IOException {
    Path bad = folder.resolve("bad.json");
    Files.writeString(bad, "{ \"format\": \"rolltrace-scenario/1\", ");
    open(STEP);

    Platform.runLater(() -> session.open(bad));

    assertThat(message()).contains("Cannot open bad.json");
    answer("OK");
    assertThat(stage.getTitle()).contains("roll entry");
    click("#slip-held");
    until("flown on", () -> session.resultProperty().get().scenario().slip().word().equals("held"));
  }

  @Test
  void aFirstFileThatCannotBeReadStillGivesAWindow() throws IOException {
    Path bad = folder.resolve("bad.json");
    Files.writeString(bad, "not a scenario");

    Platform.runLater(() -> window.show(bad));

    assertThat(message()).contains("Cannot open bad.json");
    answer("OK");
    until("the window is there", stage::isShowing);
    click("#play");
    click("#mirror");
    click("#slip-held");
    robot.interact(() -> session.open(folder.resolve(STEP)));
    until("curves", () -> session.resultProperty().get() != null);
    untilReading("Bank at the end", 1);
  }

  @Test
  void faultsOfAWrongFileAreShownInTheirFields() throws IOException {
    Path wrong = folder.resolve("wrong.json");
    Files.writeString(
        wrong, Files.readString(folder.resolve(STEP)).replace("\"0 ft\"", "\"0 furlong\""));
    Platform.runLater(() -> window.show(wrong));
    until(
        "the fault is below its field",
        () ->
            robot
                .lookup("#condition-pressureAltitude-fault")
                .tryQueryAs(Label.class)
                .filter(label -> label.getText().contains("furlong"))
                .isPresent());
    type("#condition-pressureAltitude", "300 m");
    until("flown", () -> session.resultProperty().get() != null);
  }

  @Test
  void theGroundIsPaperOrSlate() {
    open(STEP);
    assertThat(inked("#stage", Palette.LIGHT, Ink.GROUND)).isGreaterThan(10_000);
    click("View");
    click("#theme-slate");
    until("slate", () -> stage.getScene().getStylesheets().get(0).endsWith("slate.css"));
    drawn();
    assertThat(inked("#stage", Palette.SLATE, Ink.GROUND)).isGreaterThan(10_000);
    assertThat(inked("#stage", Palette.LIGHT, Ink.GROUND)).isZero();
    click("View");
    click("#theme-paper");
    until("paper", () -> stage.getScene().getStylesheets().get(0).endsWith("paper.css"));
    drawn();
    assertThat(inked("#stage", Palette.LIGHT, Ink.GROUND)).isGreaterThan(10_000);
  }

  @Test
  void theFiguresOfTheAeroplaneAreEditedInACopy() {
    open(STEP);
    RunResult before = result();
    click("#show-figures");
    until("figures", () -> robot.lookup("#aeroplane-mass").tryQuery().isPresent());
    type("#aeroplane-mass", "1100 kg");
    untilWritten("$.aeroplane.mass", "1100 kg");
    until("flown", () -> session.resultProperty().get() != before);
    click("#show-figures");
    until("gone", () -> robot.lookup("#aeroplane-mass").tryQuery().isEmpty());
  }
}
