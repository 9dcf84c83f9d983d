package org.rolltrace.ui.manoeuvre;

import java.util.Locale;
import java.util.Map;
import javafx.animation.AnimationTimer;
import javafx.beans.property.ObjectProperty;
import javafx.event.EventType;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.RearView;
import org.rolltrace.ui.control.CanvasPainter;

/** The workplace while a hand flies: what happens above, aeroplane, stick and pedals below. */
final class HandFlightView extends VBox {
  private static final double NANOSECONDS = 1e-9;
  private static final double REAR_VIEW = 150;
  private static final double STICK_HEIGHT = 84;
  private static final double PEDAL_HEIGHT = 60;
  private static final double FIGURE = 92;

  /** A key of a control. */
  private record Key(Control control, boolean right) {}

  private static final Map<KeyCode, Key> KEYS =
      Map.of(
          KeyCode.LEFT, new Key(Control.STICK, false),
          KeyCode.KP_LEFT, new Key(Control.STICK, false),
          KeyCode.RIGHT, new Key(Control.STICK, true),
          KeyCode.KP_RIGHT, new Key(Control.STICK, true),
          KeyCode.COMMA, new Key(Control.PEDAL, false),
          KeyCode.PERIOD, new Key(Control.PEDAL, true));

  private final HandFlightModel model;
  private final ObjectProperty<Palette> palette;
  private final Canvas rearView = new Canvas(REAR_VIEW, REAR_VIEW);
  private final Label time = figure("hand-time");
  private final Label bank = figure("hand-bank");
  private final Label rate = figure("hand-rate");
  private final Label state = new Label();
  private final HandPane pedals;
  private final AnimationTimer timer;

  HandFlightView(HandFlightModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.palette = palette;
    setId("hand-flight");
    getStyleClass().add("centre");
    LiveStagePane stage = new LiveStagePane(model, palette);
    setVgrow(stage, Priority.ALWAYS);
    pedals = new HandPane(model, palette, Control.PEDAL, PEDAL_HEIGHT);
    VBox hands = new VBox(2, new HandPane(model, palette, Control.STICK, STICK_HEIGHT), pedals);
    HBox.setHgrow(hands, Priority.ALWAYS);
    HBox panel = new HBox(10, rearView, hands, readOuts());
    panel.setAlignment(Pos.CENTER_LEFT);
    panel.setPadding(new Insets(4, 10, 0, 10));
    state.setId("hand-state");
    state.setWrapText(true);
    state.setMinHeight(USE_PREF_SIZE);
    state.getStyleClass().add("hand-state");
    getChildren().addAll(stage, panel, state);
    model.timeProperty().addListener((property, before, now) -> show());
    model.begunProperty().addListener((property, before, now) -> showState());
    palette.addListener((property, before, now) -> show());
    timer = new Timer();
    model
        .flyingProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                timer.start();
                showState();
                show();
              } else {
                timer.stop();
              }
            });
  }

  /** Lets real time go by. */
  private final class Timer extends AnimationTimer {
    private long last;

    @Override
    public void start() {
      last = 0;
      super.start();
    }

    @Override
    public void handle(long now) {
      if (last != 0) {
        model.advance((now - last) * NANOSECONDS);
      }
      last = now;
    }
  }

  private VBox readOuts() {
    Button stop = new Button("Stop");
    stop.setId("stop-hand");
    stop.setTooltip(new Tooltip("Ends the flight (Escape)"));
    stop.setMaxWidth(Double.MAX_VALUE);
    stop.setOnAction(event -> model.stop());
    GridPane grid = new GridPane();
    grid.setHgap(8);
    grid.setVgap(3);
    grid.addRow(0, name("Time"), time);
    grid.addRow(1, name("Bank"), bank);
    grid.addRow(2, name("Roll rate"), rate);
    VBox box = new VBox(10, grid, stop);
    box.setAlignment(Pos.CENTER);
    box.setMinWidth(USE_PREF_SIZE);
    return box;
  }

  private static Label name(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("quiet");
    label.setMinWidth(USE_PREF_SIZE);
    return label;
  }

  private static Label figure(String id) {
    Label label = new Label();
    label.setId(id);
    label.getStyleClass().add("hand-figure");
    label.setAlignment(Pos.CENTER_RIGHT);
    label.setMinWidth(FIGURE);
    label.setPrefWidth(FIGURE);
    return label;
  }

  private void showState() {
    boolean pedalsMove = model.flight().map(flight -> flight.canMove(Control.PEDAL)).orElse(false);
    pedals.setVisible(pedalsMove);
    pedals.setManaged(pedalsMove);
    state.setText(
        (model.begunProperty().get()
                ? "Flying. "
                : "Ready: time begins with the first movement, or with space. ")
            + "Stick: \u2190 and \u2192, all the travel in half a second, back when let go; or hold it"
            + " with the mouse."
            + (pedalsMove ? " Pedals: comma and full stop. " : " ")
            + "Escape ends the flight.");
  }

  private void show() {
    if (model.flight().isEmpty()) {
      return;
    }
    LiveFlight flight = model.flight().get();
    double degrees = Math.toDegrees(flight.now(Channel.BANK));
    time.setText(figure(flight.time(), 1, " s"));
    bank.setText(figure(degrees, 1, "\u00b0"));
    rate.setText(figure(Math.toDegrees(flight.now(Channel.ROLL_RATE)), 1, "\u00b0/s"));
    GraphicsContext context = rearView.getGraphicsContext2D();
    context.clearRect(0, 0, REAR_VIEW, REAR_VIEW);
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    RearView.draw(flight.now(Channel.BANK), REAR_VIEW).forEach(painter::paint);
  }

  private static String figure(double value, int decimals, String unit) {
    String digits = String.format(Locale.ROOT, "%." + decimals + "f", value);
    return (digits.matches("-0\\.?0*") ? digits.substring(1) : digits).replace('-', '\u2212')
        + unit;
  }

  /** Keys fly wherever the focus is; those with Ctrl and the like keep their meaning. */
  void key(KeyEvent event) {
    if (!model.flyingProperty().get() || event.isShortcutDown() || event.isAltDown()) {
      return;
    }
    EventType<KeyEvent> type = event.getEventType();
    Key key = KEYS.get(event.getCode());
    if (key != null && type != KeyEvent.KEY_TYPED) {
      model.key(key.control(), key.right(), type == KeyEvent.KEY_PRESSED);
      event.consume();
    } else if (event.getCode() == KeyCode.ESCAPE && type == KeyEvent.KEY_PRESSED) {
      model.stop();
      event.consume();
    } else if (event.getCode() == KeyCode.SPACE) {
      model.start();
      event.consume();
    }
  }
}
