package org.rolltrace.ui.desk;

import com.sun.javafx.tk.RenderJob;
import com.sun.javafx.tk.Toolkit;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.function.UnaryOperator;
import javafx.animation.AnimationTimer;
import javafx.animation.PauseTransition;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;
import javafx.util.Duration;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;

/**
 * Times the real window: how long after a change the new curves stand on the screen, and how even
 * the replay is. Run by {@code .dev/window-benchmark}.
 *
 * <p>A change begins with the call that edits the document. It is <em>laid out</em> when the pulse
 * that carries the new curves has laid out the window, and <em>painted</em> when the renderer has
 * done what that pulse gave it. Changes begin at random instants between two pulses, as those of
 * people do. The renderer is asked by an internal of the toolkit, as there is no public way.
 */
public final class WindowBenchmark extends Application {
  private static final Path SCENARIO =
      Path.of("scenarios", "light-single-roll-entry.json").toAbsolutePath();
  private static final Path SHAPED =
      Path.of("sim-ui", "src", "test", "resources", "shaped", "roll-entry.json").toAbsolutePath();

  /** What 95 % of changes take at most, ms. */
  private static final double BOUND = 33;

  private static final int WARM_UP = 100;
  private static final int CHANGES = 300;
  private static final Duration SETTLE = Duration.seconds(2);
  private static final double REPLAY_SECONDS = 10;

  private final Random random = new Random(1);
  private final Figures laidOut = new Figures("edit to laid out");
  private final Figures painted = new Figures("edit to painted");
  private final Figures flown = new Figures("  of it: check and flight, beside the window");
  private final Figures shown = new Figures("  of it: readings, fields, strips, lanes");
  private final Figures laying = new Figures("  of it: style, layout, drawing the stage");
  private final Figures rendering = new Figures("  of it: renderer");
  private final Figures frames = new Figures("from frame to frame");
  private final Figures moving = new Figures("own work: overlay, slider, time");
  private final Figures frameLaying = new Figures("own work: style and layout");
  private final Figures own = new Figures("own work in all");
  private final Figures frameRendering = new Figures("renderer, beside the window");

  private Background runner;
  private DeskSession session;
  private DeskWindow window;
  private Stage stage;

  private int done;
  private boolean awaitsResult;
  private boolean awaitsPulse;
  private boolean replays;
  private boolean builds;
  private boolean manoeuvreKept;
  private long edited;
  private long moved;
  private long lastFrame;
  private double movingNow;
  private long pulse;
  private double lastFlown;
  private double lastShown;

  /** Made by the window toolkit. */
  public WindowBenchmark() {}

  /** Times in milliseconds. */
  private static final class Figures {
    private final String name;
    private final List<Double> values = new ArrayList<>();

    Figures(String name) {
      this.name = name;
    }

    void add(double milliseconds) {
      values.add(milliseconds);
    }

    void clear() {
      values.clear();
    }

    int count() {
      return values.size();
    }

    /** The smallest value that a share of all does not exceed. */
    double within(double share) {
      double[] sorted = values.stream().mapToDouble(Double::doubleValue).toArray();
      Arrays.sort(sorted);
      return sorted[(int) Math.ceil(share * sorted.length) - 1];
    }

    void print() {
      System.out.printf(
          Locale.ROOT, "%-46s %7.1f %7.1f %7.1f%n", name, within(0.5), within(0.95), within(1));
    }
  }

  @Override
  public void start(Stage first) throws IOException {
    stage = first;
    runner = new Background(Platform::runLater);
    RecoveryStore recovery =
        new RecoveryStore(Files.createTempDirectory("rolltrace-benchmark").resolve("recovery"));
    session = new DeskSession(runner, recovery);
    watchResultFirst();
    window = new DeskWindow(stage, session, recovery);
    watchResultLast();
    watchReplay();
    stage.setX(0);
    stage.setY(0);
    stage.setWidth(1100);
    stage.setHeight(700);
    window.show(SCENARIO);
    stage.getScene().addPreLayoutPulseListener(() -> pulse = System.nanoTime());
    stage.getScene().addPostLayoutPulseListener(this::pulsed);
    after(SETTLE, this::change);
  }

  private static double since(long nanoTime) {
    return (System.nanoTime() - nanoTime) * 1e-6;
  }

  private static void after(Duration pause, Runnable action) {
    PauseTransition transition = new PauseTransition(pause);
    transition.setOnFinished(event -> action.run());
    transition.play();
  }

  private void change() {
    if (done == WARM_UP + CHANGES) {
      if (builds) {
        reportBuild();
      } else {
        startReplay();
      }
      return;
    }
    // The timer ends with a pulse; the wait behind it puts the change anywhere between two.
    long delay = random.nextInt(17_000_000);
    Thread waiting =
        new Thread(
            () -> {
              java.util.concurrent.locks.LockSupport.parkNanos(delay);
              Platform.runLater(this::edit);
            });
    waiting.setDaemon(true);
    waiting.start();
  }

  private void edit() {
    int round = done / 4;
    awaitsResult = true;
    edited = System.nanoTime();
    if (builds) {
      reshape(round);
      return;
    }
    switch (done % 4) {
      case 0 ->
          typed(
              "$.condition.trueAirspeed",
              document -> document.with("$.condition.trueAirspeed", 150 + round % 60 + " ft/s"));
      case 1 ->
          typed(
              "$.aeroplane",
              document ->
                  document
                      .withAeroplaneInline()
                      .withNumber(
                          "$.aeroplane.derivatives.values.Cl_p", "-0." + (400 + round % 99)));
      case 2 ->
          typed(
              "drag-0TOP",
              document -> document.withNumber("$.inputs[0].size", "0." + (200 + round % 99)));
      default ->
          typed(
              "drag-0BODY",
              document -> document.with("$.inputs[0].start", "1." + (100 + round % 99) + " s"));
    }
  }

  /** As a slider that is held does it, always from where it began. */
  private void reshape(int round) {
    switch (done % 4) {
      case 0 -> slid("wing.panels[1].to", 4.3 + 0.001 * round + " m");
      case 1 -> slid("wing.panels[1].outerChord", 0.9 + 0.001 * round + " m");
      case 2 -> slid("ailerons.to", 4.1 + 0.001 * round + " m");
      default -> slid("wing.panels[1].dihedral", 4 + 0.01 * round + " deg");
    }
  }

  private void slid(String path, String text) {
    session.editFromStart("change", path, start -> start.withAeroplane(path, text));
  }

  private void typed(String key, UnaryOperator<ScenarioDocument> change) {
    session.edit("change", key, change);
  }

  /** Invalidation comes before what listens for the change. */
  private void watchResultFirst() {
    session
        .resultProperty()
        .addListener(
            observable -> {
              if (awaitsResult) {
                lastFlown = since(edited);
              }
            });
  }

  /** Comes behind all that the window does with a result; the next pulse draws the stage. */
  private void watchResultLast() {
    session
        .resultProperty()
        .addListener(
            (property, before, now) -> {
              if (!awaitsResult) {
                return;
              }
              awaitsResult = false;
              lastShown = since(edited) - lastFlown;
              awaitsPulse = true;
            });
  }

  private void pulsed() {
    double layout = since(pulse);
    if (awaitsPulse) {
      awaitsPulse = false;
      double whole = since(edited);
      // Behind this pulse, the renderer has got its work; what is asked of it now comes after.
      askRenderer(
          rendered -> {
            if (done >= WARM_UP) {
              laidOut.add(whole);
              painted.add(whole + rendered);
              flown.add(lastFlown);
              shown.add(lastShown);
              laying.add(layout);
              rendering.add(rendered);
            }
            done++;
            after(Duration.millis(20), this::change);
          });
    } else if (replays && moved != 0) {
      moved = 0;
      frameLaying.add(layout);
      own.add(movingNow + layout);
      askRenderer(frameRendering::add);
    }
  }

  private static void askRenderer(java.util.function.DoubleConsumer answer) {
    long asked = System.nanoTime();
    Platform.runLater(
        () ->
            Toolkit.getToolkit()
                .addRenderJob(
                    new RenderJob(
                        () -> {
                          double time = since(asked);
                          Platform.runLater(() -> answer.accept(time));
                        })));
  }

  private void watchReplay() {
    var position = window.model().clock().positionProperty();
    position.addListener(observable -> moved = System.nanoTime());
    position.addListener(
        (property, before, now) -> {
          if (!replays) {
            return;
          }
          movingNow = since(moved);
          moving.add(movingNow);
          if (lastFrame != 0) {
            frames.add((moved - lastFrame) * 1e-6);
          }
          lastFrame = moved;
        });
  }

  private void startReplay() {
    after(
        SETTLE,
        () -> {
          window.model().clock().moveTo(0);
          moved = 0;
          replays = true;
          long begun = System.nanoTime();
          window.model().clock().play();
          new AnimationTimer() {
            @Override
            public void handle(long now) {
              if (!window.model().clock().isPlaying()) {
                stop();
                report(since(begun) * 1e-3);
              }
            }
          }.start();
        });
  }

  private void report(double seconds) {
    System.out.printf(
        Locale.ROOT,
        "%d changes at %.0f x %.0f px%n%-46s %7s %7s %7s%n",
        painted.count(),
        stage.getWidth(),
        stage.getHeight(),
        "ms",
        "median",
        "95 %",
        "most");
    List.of(painted, laidOut, flown, shown, laying, rendering).forEach(Figures::print);
    System.out.printf(
        Locale.ROOT,
        "%nreplay of %.0f s: %.1f frames a second%n",
        REPLAY_SECONDS,
        moving.count() / seconds);
    List.of(frames, own, moving, frameLaying, frameRendering).forEach(Figures::print);
    manoeuvreKept = painted.within(0.95) <= BOUND && own.within(0.95) <= 8;
    replays = false;
    builds = true;
    done = 0;
    List.of(painted, laidOut, flown, shown, laying, rendering).forEach(Figures::clear);
    session.open(SHAPED);
    window.showBuild();
    after(SETTLE, this::change);
  }

  private void reportBuild() {
    System.out.printf(
        Locale.ROOT,
        "%n%d changes of the shape at %.0f x %.0f px%n",
        painted.count(),
        stage.getWidth(),
        stage.getHeight());
    List.of(painted, laidOut, flown, shown, laying, rendering).forEach(Figures::print);
    boolean kept = manoeuvreKept && painted.within(0.95) <= BOUND;
    System.out.println(
        "\nbounds: 95 % of changes painted within 33 ms, 8 ms of own work a frame: "
            + (kept ? "kept" : "NOT kept"));
    runner.close();
    Platform.exit();
  }
}
