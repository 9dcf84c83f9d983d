package org.rolltrace.ui.manoeuvre;

import java.util.Locale;
import javafx.animation.AnimationTimer;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.shape.SVGPath;
import javafx.util.StringConverter;
import org.rolltrace.ui.session.ReplayClock;

/** Play, pause, step, loop, speed, and a slider to scrub with. */
final class ReplayBar extends HBox {
  private static final String PLAY = "M3 1 L13 7 L3 13 Z";
  private static final String PAUSE = "M3 1 H6 V13 H3 Z M9 1 H12 V13 H9 Z";
  private static final String BACK = "M11 2 L5 7 L11 12 Z M3 2 H4.5 V12 H3 Z";
  private static final String FORTH = "M3 2 L9 7 L3 12 Z M9.5 2 H11 V12 H9.5 Z";
  private static final String START = "M12 2 L7 7 L12 12 Z M7 2 L2 7 L7 12 Z";
  private static final double NANOSECONDS = 1e-9;
  private static final double TIME_WIDTH = 58;

  private final ReplayClock clock;
  private final AnimationTimer timer;

  ReplayBar(ManoeuvreModel model) {
    super(5);
    this.clock = model.clock();
    getStyleClass().add("replay-bar");
    setAlignment(Pos.CENTER_LEFT);
    SVGPath playShape = shape(PLAY);
    Button play = new Button();
    play.setGraphic(playShape);
    play.setId("play");
    play.setTooltip(new Tooltip("Play or pause (space)"));
    play.setAccessibleText("Play or pause");
    play.setOnAction(event -> clock.toggle());
    clock
        .playingProperty()
        .addListener((property, before, now) -> playShape.setContent(now ? PAUSE : PLAY));
    Slider position = new Slider();
    position.setId("replay-position");
    position.setAccessibleText("Instant of the replay");
    position.minProperty().bind(clock.fromProperty());
    position.maxProperty().bind(clock.toProperty());
    position
        .valueProperty()
        .addListener(
            (property, before, now) -> {
              if (Math.abs(now.doubleValue() - clock.position()) > 1e-9) {
                clock.moveTo(now.doubleValue());
              }
            });
    HBox.setHgrow(position, Priority.ALWAYS);
    Label time = new Label();
    time.getStyleClass().add("figure");
    time.setMinWidth(TIME_WIDTH);
    time.setAlignment(Pos.CENTER_RIGHT);
    Runnable showPosition =
        () -> {
          position.setValue(clock.position());
          time.setText(String.format(Locale.ROOT, "%.2f s", clock.position()));
        };
    clock.positionProperty().addListener((property, before, now) -> showPosition.run());
    showPosition.run();
    ToggleButton loop = new ToggleButton("Loop");
    loop.setId("loop");
    loop.selectedProperty().bindBidirectional(clock.loopProperty());
    Button fly = new Button("Fly by hand");
    fly.setId("fly-by-hand");
    fly.setTooltip(
        new Tooltip("Flies the scenario in real time with mouse or keys, in place of its inputs"));
    fly.setOnAction(event -> model.hand().begin());
    getChildren()
        .addAll(
            fly,
            button(START, "To the start", () -> clock.moveTo(clock.fromProperty().get())),
            button(BACK, "One frame back", () -> clock.step(-1)),
            play,
            button(FORTH, "One frame on", () -> clock.step(1)),
            position,
            time,
            speed(),
            loop,
            zoomButton("Zoom in", "+", () -> model.zoom(middle(model), 0.8)),
            zoomButton("Zoom out", "\u2212", () -> model.zoom(middle(model), 1.25)),
            zoomButton("Whole manoeuvre", "All", model::resetView));
    for (Node node : getChildren()) {
      if (node instanceof Region region && node != position) {
        region.setMinWidth(region == time ? TIME_WIDTH : USE_PREF_SIZE);
      }
    }
    position.setMinWidth(30);
    timer =
        new AnimationTimer() {
          private long last;

          @Override
          public void start() {
            last = 0;
            super.start();
          }

          @Override
          public void handle(long now) {
            if (last != 0) {
              clock.advance((now - last) * NANOSECONDS);
            }
            last = now;
          }
        };
    clock
        .playingProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                timer.start();
              } else {
                timer.stop();
              }
            });
  }

  private static double middle(ManoeuvreModel model) {
    return 0.5 * (model.windowProperty().get().from() + model.windowProperty().get().to());
  }

  private ChoiceBox<Double> speed() {
    ChoiceBox<Double> speed = new ChoiceBox<>();
    speed.setId("replay-speed");
    speed.setPrefWidth(74);
    speed.getItems().addAll(0.25, 0.5, 1.0, 2.0, 4.0);
    speed.setConverter(
        new StringConverter<>() {
          @Override
          public String toString(Double rate) {
            return rate == null
                ? ""
                : rate == 0.25
                    ? "\u00bc \u00d7"
                    : rate == 0.5 ? "\u00bd \u00d7" : rate.intValue() + " \u00d7";
          }

          @Override
          public Double fromString(String text) {
            throw new UnsupportedOperationException("the speed is chosen, not typed");
          }
        });
    speed.setValue(1.0);
    speed.valueProperty().addListener((property, before, now) -> clock.rateProperty().set(now));
    speed.setTooltip(new Tooltip("Speed of the replay"));
    return speed;
  }

  private static SVGPath shape(String path) {
    SVGPath shape = new SVGPath();
    shape.setContent(path);
    shape.getStyleClass().add("symbol");
    return shape;
  }

  private static Button button(String path, String hint, Runnable action) {
    Button button = new Button();
    button.setGraphic(shape(path));
    button.setTooltip(new Tooltip(hint));
    button.setAccessibleText(hint);
    button.setOnAction(event -> action.run());
    return button;
  }

  private static Node zoomButton(String hint, String words, Runnable action) {
    Button button = new Button(words);
    button.setTooltip(new Tooltip(hint));
    button.setAccessibleText(hint);
    button.setOnAction(event -> action.run());
    return button;
  }
}
