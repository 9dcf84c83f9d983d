package org.rolltrace.ui.desk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

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
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.image.PixelReader;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.build.ResponseOnScreen;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The workplace of the shape as people use it, with mouse and keys. Runs without a display. */
@ExtendWith(ApplicationExtension.class)
class BuildWorkplaceTest {
  private static final Path SHAPED = Path.of("src", "test", "resources", "shaped");
  private static final Path SHIPPED = Path.of("..", "scenarios");

  /** Long enough for a machine that is busy with other things. */
  private static final int PATIENCE_SECONDS = 20;

  @TempDir Path folder;
  private final FxRobot robot = new FxRobot();
  private final List<Throwable> thrown = Collections.synchronizedList(new ArrayList<>());
  private Background runner;
  private Stage stage;
  private DeskSession session;
  private DeskWindow window;

  @Start
  void makeTheWindow(Stage first) {
    Thread.currentThread().setUncaughtExceptionHandler((thread, failure) -> thrown.add(failure));
    stage = first;
    RecoveryStore recovery = new RecoveryStore(folder.resolve("recovery"));
    runner = new Background(Platform::runLater);
    session = new DeskSession(runner, recovery);
    window = new DeskWindow(stage, session, recovery);
    stage.setWidth(1100);
    stage.setHeight(760);
  }

  @BeforeEach
  void copyTheScenarios() throws IOException {
    Files.createDirectories(folder.resolve("aeroplanes"));
    Files.copy(
        SHAPED.resolve("aeroplanes/two-seater.json"), folder.resolve("aeroplanes/two-seater.json"));
    Files.copy(SHAPED.resolve("roll-entry.json"), folder.resolve("shaped.json"));
    Files.copy(
        SHIPPED.resolve("aeroplanes/light-single.json"),
        folder.resolve("aeroplanes/light-single.json"));
    Files.copy(
        SHIPPED.resolve("light-single-roll-entry.json"), folder.resolve("light-single.json"));
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

  private void open(String name) {
    Platform.runLater(() -> window.show(folder.resolve(name)));
    until("first result", () -> session.resultProperty().get() != null);
    WaitForAsyncUtils.waitForFxEvents(3);
  }

  private void build(String name) {
    open(name);
    robot.push(KeyCode.CONTROL, KeyCode.DIGIT2);
    until("build is shown", () -> isShown("#drawing"));
    WaitForAsyncUtils.waitForFxEvents(3);
  }

  private boolean isShown(String query) {
    return robot.lookup(query).tryQuery().isPresent();
  }

  private Node node(String query) {
    return robot.lookup(query).queryAll().iterator().next();
  }

  private void click(String query) {
    robot.robotContext().getBaseRobot().moveMouse(robot.point(query).query());
    WaitForAsyncUtils.waitForFxEvents(1);
    robot.clickOn(MouseButton.PRIMARY);
  }

  private void type(String field, String text) {
    click(field);
    robot.push(KeyCode.CONTROL, KeyCode.A);
    robot.write(text, 0);
  }

  private RunResult result() {
    return onWindow(() -> session.resultProperty().get());
  }

  private static Geometry shape(RunResult result) {
    return result.scenario().data().aeroplane().geometry().orElseThrow();
  }

  private static double rollRate(RunResult result) {
    return result.measure("peakRollRate").orElseThrow().value().orElseThrow();
  }

  private void untilSpan(double span) {
    until(
        "a span of " + span + " m",
        () -> Math.abs(shape(session.resultProperty().get()).wing().span() - span) < 2e-4);
  }

  private String text(String query) {
    return onWindow(
        () ->
            node(query) instanceof TextField field
                ? field.getText()
                : ((Label) node(query)).getText());
  }

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

  private Point2D thumb(String slider) {
    return onWindow(
        () -> {
          Bounds bounds =
              node(slider)
                  .lookup(".thumb")
                  .localToScreen(node(slider).lookup(".thumb").getBoundsInLocal());
          return new Point2D(bounds.getCenterX(), bounds.getCenterY());
        });
  }

  @Test
  void theRailAndTheKeysLeadToEachWorkplace() {
    open("shaped.json");
    assertThat(isShown("#stage")).isTrue();
    assertThat(((ToggleButton) node("#workplace-manoeuvre")).isSelected()).isTrue();
    assertThat(node("#workplace-build").getAccessibleText()).isEqualTo("Build");
    assertThat(node("#workplace-manoeuvre").getAccessibleText()).isEqualTo("Manoeuvre");

    click("#workplace-build");
    until("build", () -> isShown("#drawing") && !isShown("#stage"));
    assertThat(((ToggleButton) node("#workplace-build")).isSelected()).isTrue();
    assertThat(inked("#drawing", Palette.LIGHT, Ink.WING)).isGreaterThan(200);
    assertThat(inked("#response", Palette.LIGHT, Ink.RIGHT)).isGreaterThan(100);
    click("#workplace-build");
    assertThat(((ToggleButton) node("#workplace-build")).isSelected()).as("stays").isTrue();

    robot.push(KeyCode.CONTROL, KeyCode.DIGIT1);
    until("manoeuvre", () -> isShown("#stage") && !isShown("#drawing"));
    robot.push(KeyCode.CONTROL, KeyCode.DIGIT2);
    until("build again", () -> isShown("#drawing"));
    robot.interact(() -> node("#drawing").requestFocus());
    robot.push(KeyCode.SPACE);
    assertThat(onWindow(() -> window.model().clock().isPlaying())).as("no replay here").isFalse();

    robot.push(KeyCode.CONTROL, KeyCode.F);
    until("flying by hand", () -> window.model().hand().flyingProperty().get());
    assertThat(onWindow(() -> node("#workplace-build").isDisabled() || node("#rail").isDisabled()))
        .isTrue();
    robot.push(KeyCode.CONTROL, KeyCode.DIGIT2);
    assertThat(isShown("#drawing")).as("a flight is ended first").isFalse();
    robot.push(KeyCode.ESCAPE);
    until("ended", () -> !window.model().hand().flyingProperty().get());
    until("the stage is back", () -> isShown("#stage"));
  }

  @Test
  void aWrongUnitIsToldBelowItsFieldAndAnotherUnitIsTaken() {
    build("shaped.json");
    assertThat(text("#aeroplane-span")).as("as the panels have it").isEqualTo("9 m");

    type("#aeroplane-span", "8.5 kg");
    until(
        "the fault is below the field",
        () ->
            node("#aeroplane-span-fault").isVisible()
                && ((Label) node("#aeroplane-span-fault")).getText().contains("8.5 kg"));
    assertThat(node("#build-state").isVisible()).isTrue();
    assertThat(inked("#drawing", Palette.LIGHT, Ink.WING)).as("the last one").isGreaterThan(200);

    type("#aeroplane-span", "27 ft");
    untilSpan(27 * 0.3048);
    until("no fault", () -> !node("#aeroplane-span-fault").isVisible());
    assertThat(node("#build-state").isVisible()).isFalse();
    assertThat(text("#aeroplane-span")).as("as it was typed").isEqualTo("27 ft");

    type("#aeroplane-ailerons-to", "14.5 ft");
    until(
        "an aileron beyond the tip",
        () ->
            node("#aeroplane-ailerons-to-fault").isVisible()
                && ((Label) node("#aeroplane-ailerons-to-fault"))
                    .getText()
                    .contains("the aileron ends at"));
  }

  @Test
  void draggingASliderChangesTheRollAndIsOneStep() {
    build("shaped.json");
    RunResult before = result();
    assertThat(onWindow(() -> session.canUndoProperty().get())).isFalse();

    Point2D from = thumb("#slide-span");
    robot.robotContext().getBaseRobot().moveMouse(from);
    robot.press(MouseButton.PRIMARY);
    for (int i = 1; i <= 5; i++) {
      robot.moveTo(from.subtract(6 * i, 0));
    }
    until(
        "a shorter wing while the slider is held",
        () -> shape(session.resultProperty().get()).wing().span() < 8.6);
    double held = onWindow(() -> ((Slider) node("#slide-span")).getMax());
    robot.release(MouseButton.PRIMARY);
    WaitForAsyncUtils.waitForFxEvents(3);
    RunResult after = result();
    // Short wings roll fast (common practice).
    assertThat(rollRate(after)).isGreaterThan(rollRate(before));
    assertThat(onWindow(() -> ((Slider) node("#slide-span")).getMax())).isEqualTo(held);
    assertThat(onWindow(() -> session.undoWordProperty().get())).isEqualTo("change span");
    assertThat(onWindow(() -> session.documentProperty().get().aeroplaneIsInline())).isTrue();

    robot.push(KeyCode.CONTROL, KeyCode.Z);
    untilSpan(9);
    assertThat(onWindow(() -> session.dirtyProperty().get())).as("one step").isFalse();
    assertThat(rollRate(result())).isEqualTo(rollRate(before));
    robot.push(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
    untilSpan(shape(after).wing().span());
  }

  @Test
  void axesStayWhileASliderIsHeldAndFitAfterwards() {
    build("shaped.json");
    List<ValueRange> before = ranges();
    Point2D from = thumb("#slide-span");
    robot.robotContext().getBaseRobot().moveMouse(from);
    robot.press(MouseButton.PRIMARY);
    robot.moveTo(from.add(20, 0));
    robot.moveTo(from.add(44, 0));
    until("a longer wing", () -> shape(session.resultProperty().get()).wing().span() > 11.5);
    WaitForAsyncUtils.waitForFxEvents(5);
    assertThat(ranges()).isEqualTo(before);

    robot.release(MouseButton.PRIMARY);
    // A longer wing rolls more slowly, so that less of the axis is needed.
    until("axes that fit", () -> ranges().get(0).high() < before.get(0).high());
  }

  private List<ValueRange> ranges() {
    return onWindow(() -> ResponseOnScreen.ranges(node("#response")));
  }

  @Test
  void keysMoveASlider() {
    build("shaped.json");
    robot.interact(() -> node("#slide-aileron-share").requestFocus());
    robot.push(KeyCode.RIGHT);
    robot.push(KeyCode.RIGHT);
    until(
        "a deeper aileron",
        () -> shape(session.resultProperty().get()).ailerons().orElseThrow().chordShare() > 0.255);
  }

  @Test
  void aVariantIsChosenAndTheBaseStandsBehind() {
    build("shaped.json");
    double base = rollRate(result());
    assertThat(inked("#drawing", Palette.LIGHT, Ink.SECOND)).isZero();

    click("#variant");
    click("clipped tips");
    untilSpan(8.6);
    assertThat(onWindow(() -> session.documentProperty().get().text("$.variant")))
        .contains("clipped tips");
    // Tips outboard of the ailerons only damp (common practice).
    assertThat(rollRate(result())).isGreaterThan(base);
    until("the base behind", () -> isShown("#build-kept") && node("#build-kept").isVisible());
    WaitForAsyncUtils.waitForFxEvents(3);
    assertThat(text("#build-flown")).startsWith("Shaped two-seater (clipped tips)");
    assertThat(inked("#drawing", Palette.LIGHT, Ink.SECOND)).isGreaterThan(50);

    click("#build-drop");
    until("alone", () -> session.ghostProperty().get() == null);
    click("#keep-variant");
    click("large ailerons");
    until(
        "another variant behind",
        () -> session.ghostProperty().get() != null && node("#build-kept").isVisible());
    assertThat(text("#build-kept")).contains("large ailerons");
    assertThat(shape(result()).wing().span()).isEqualTo(8.6);
  }

  @Test
  void anAeroplaneWithoutAShapeSaysSoAndIsGivenOne() {
    build("light-single.json");
    assertThat(node("#shape-missing").isVisible()).isTrue();
    assertThat(inked("#drawing", Palette.LIGHT, Ink.WING)).isZero();
    RunResult before = result();

    click("#give-shape");
    until("a wing", () -> session.resultProperty().get() != before);
    WaitForAsyncUtils.waitForFxEvents(3);
    assertThat(node("#shape-missing").isVisible()).isFalse();
    assertThat(node("#shape-start").isVisible()).isTrue();
    assertThat(inked("#drawing", Palette.LIGHT, Ink.WING)).isGreaterThan(200);
    assertThat(node("#overridden").isVisible()).as("given values win").isTrue();
    double given = rollRate(result());
    // The area is that of the panels now, which agrees to the digits of their chords.
    assertThat(given).isCloseTo(rollRate(before), within(1e-4 * given));

    click("#estimate-Cl_p");
    until("the estimate flies", () -> rollRate(session.resultProperty().get()) != given);
    click("#take-out-given");
    until("all estimates fly", () -> !node("#overridden").isVisible());
    robot.push(KeyCode.CONTROL, KeyCode.Z);
    robot.push(KeyCode.CONTROL, KeyCode.Z);
    robot.push(KeyCode.CONTROL, KeyCode.Z);
    until("no shape again", () -> node("#shape-missing").isVisible());
    assertThat(onWindow(() -> session.dirtyProperty().get())).isFalse();
  }
}
