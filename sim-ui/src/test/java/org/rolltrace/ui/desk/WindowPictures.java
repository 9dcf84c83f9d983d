package org.rolltrace.ui.desk;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import javafx.animation.PauseTransition;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.geometry.Rectangle2D;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.image.WritableImage;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import javafx.util.Duration;
import javax.imageio.ImageIO;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.manoeuvre.HandFlightModel;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;

/**
 * Takes pictures of the real window, on paper and slate, at two sizes, in the states that matter.
 * Run by {@code .dev/window-pictures}.
 */
public final class WindowPictures extends Application {
  private static final Duration SETTLE = Duration.millis(1500);
  private static final Path SCENARIOS = Path.of("scenarios").toAbsolutePath();

  private static final Path SHAPED =
      Path.of("sim-ui", "src", "test", "resources", "shaped", "roll-entry.json").toAbsolutePath();

  private final Deque<Shot> shots = new ArrayDeque<>();
  private Background runner;
  private DeskSession session;
  private DeskWindow window;
  private Stage stage;

  /** Made by the window toolkit. */
  public WindowPictures() {}

  private record Shot(String name, Runnable before) {}

  @Override
  public void start(Stage first) throws IOException {
    stage = first;
    runner = new Background(Platform::runLater);
    RecoveryStore recovery =
        new RecoveryStore(java.nio.file.Files.createTempDirectory("rolltrace-pictures"));
    session = new DeskSession(runner, recovery);
    window = new DeskWindow(stage, session, recovery);
    window.show(SCENARIOS.resolve("light-single-roll-entry.json"));
    shots.add(
        new Shot(
            "figures-first-on-slate",
            () -> {
              window.useDark(true);
              figures(true);
            }));
    shots.add(new Shot("figures-closed", () -> figures(false)));
    for (int[] size : List.of(new int[] {1240, 800}, new int[] {1000, 680})) {
      for (boolean dark : new boolean[] {false, true}) {
        String suffix = (dark ? "slate" : "paper") + "-" + size[0];
        shots.add(
            new Shot(
                "entry-" + suffix,
                () -> {
                  stage.setX(0);
                  stage.setY(0);
                  stage.setWidth(size[0]);
                  stage.setHeight(size[1]);
                  window.useDark(dark);
                  session.open(SCENARIOS.resolve("light-single-roll-entry.json"));
                }));
        shots.add(new Shot("left-right-" + suffix, () -> window.model().compareMirrored()));
        shots.add(
            new Shot(
                "cursor-" + suffix,
                () -> {
                  session.dropGhost();
                  session.open(SCENARIOS.resolve("light-single-held-stick.json"));
                  session.edit("shorten", d -> d.with("$.duration", "12 s"));
                  window.model().resetView();
                  window.model().clock().moveTo(3.2);
                }));
        shots.add(
            new Shot(
                "fault-" + suffix,
                () -> {
                  session.edit("spoil", d -> d.with("$.condition.trueAirspeed", "176 kg"));
                  figures(true);
                }));
        for (String input : List.of("multistep", "sweep", "trace", "power-step")) {
          shots.add(
              new Shot(
                  input + "-" + suffix,
                  () -> {
                    figures(false);
                    session.open(SCENARIOS.resolve("tarnlark-" + input + ".json"));
                    window.model().resetView();
                  }));
        }
        shots.add(
            new Shot(
                "scenario-" + suffix,
                () -> {
                  session.open(SCENARIOS.resolve("tarnlark-held-sideslip.json"));
                  toggle("#show-scenario", true);
                }));
        shots.add(
            new Shot(
                "hand-ready-" + suffix,
                () -> {
                  toggle("#show-scenario", false);
                  session.open(SCENARIOS.resolve("tarnlark-cruise-roll-entry.json"));
                  window.model().hand().begin();
                }));
        shots.add(new Shot("hand-flying-" + suffix, this::flyToAndFro));
        shots.add(new Shot("hand-flown-" + suffix, () -> window.model().hand().stop()));
        shots.add(
            new Shot(
                "drop-" + suffix,
                () -> {
                  figures(false);
                  session.open(SCENARIOS.resolve("tarnlark-wing-drop.json"));
                }));
        addBuild(suffix);
      }
    }
    next();
  }

  /** The workplace of the shape; it ends where it began. */
  private void addBuild(String suffix) {
    shots.add(
        new Shot(
            "build-" + suffix,
            () -> {
              session.open(SHAPED);
              window.showBuild();
            }));
    shots.add(
        new Shot(
            "build-variant-" + suffix,
            () -> {
              session.keepGhost();
              session.edit("choose variant", d -> d.with("$.variant", "clipped tips"));
            }));
    shots.add(
        new Shot(
            "build-given-" + suffix,
            () ->
                session.edit(
                    "give",
                    d ->
                        d.withAeroplaneNumber("derivatives.values.Cl_p", "-0.4")
                            .withAeroplaneNumber("derivatives.values.Cn_da", "-0.004"))));
    shots.add(
        new Shot(
            "build-fault-" + suffix,
            () -> {
              session.dropGhost();
              session.open(SHAPED);
              session.edit("spoil", d -> d.withAeroplane("ailerons.to", "5 m"));
              session.edit("spoil", d -> d.withAeroplane("span", "9 kg"));
            }));
    shots.add(
        new Shot(
            "build-no-shape-" + suffix,
            () -> session.open(SCENARIOS.resolve("light-single-roll-entry.json"))));
    shots.add(
        new Shot(
            "build-start-" + suffix,
            () -> ((Button) stage.getScene().lookup("#give-shape")).fire()));
    for (String name : List.of("tarnlark-cruise", "cragmerle-clipped", "mosspipit")) {
      shots.add(
          new Shot(
              "build-" + name + "-" + suffix,
              () -> session.open(SCENARIOS.resolve(name + "-roll-entry.json"))));
    }
    shots.add(new Shot("back-" + suffix, window::showManoeuvre));
  }

  private void figures(boolean shown) {
    toggle("#show-figures", shown);
  }

  private void toggle(String button, boolean on) {
    ((ToggleButton) stage.getScene().lookup(button)).setSelected(on);
  }

  /** Twelve seconds of stick and pedals, then the stick held while the picture is taken. */
  private void flyToAndFro() {
    HandFlightModel hand = window.model().hand();
    for (int i = 0; i < 120; i++) {
      int phase = i / 10 % 4;
      hand.key(Control.STICK, true, phase == 0);
      hand.key(Control.STICK, false, phase == 2);
      hand.key(Control.PEDAL, true, i % 40 == 4);
      hand.advance(0.1);
    }
    hand.grab(Control.STICK, -0.35);
  }

  private void next() {
    Shot shot = shots.poll();
    if (shot == null) {
      runner.close();
      Platform.exit();
      return;
    }
    shot.before().run();
    PauseTransition pause = new PauseTransition(SETTLE);
    pause.setOnFinished(
        event -> {
          take(shot.name());
          next();
        });
    pause.play();
  }

  private void take(String name) {
    WritableImage image =
        new Robot()
            .getScreenCapture(
                null,
                new Rectangle2D(stage.getX(), stage.getY(), stage.getWidth(), stage.getHeight()));
    File file = new File(getParameters().getUnnamed().get(0), name + ".png");
    try {
      ImageIO.write(SwingFXUtils.fromFXImage(image, null), "png", file);
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }
}
