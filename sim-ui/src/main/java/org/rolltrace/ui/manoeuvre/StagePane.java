package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.application.Platform;
import javafx.beans.property.ObjectProperty;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Region;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.Anchor;
import org.rolltrace.ui.chart.Curve;
import org.rolltrace.ui.chart.Dash;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Mark;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.PlotArea;
import org.rolltrace.ui.chart.RearView;
import org.rolltrace.ui.chart.RollStrips;
import org.rolltrace.ui.chart.Strip;
import org.rolltrace.ui.chart.StripChart;
import org.rolltrace.ui.chart.Stroke;
import org.rolltrace.ui.chart.TypeSize;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.chart.WingTrace;
import org.rolltrace.ui.control.CanvasPainter;

/**
 * What happened: the wing trace above, the strips below it; what the hands did is in the lanes. The
 * drawing is made anew only when data or view change; cursor and replay are drawn on a layer of
 * their own.
 */
final class StagePane extends Region {
  private static final double TRACE_SHARE = 0.27;
  private static final double ZOOM_STEP = 1.25;

  /** About the width of a letter of the small type, px. */
  private static final double LETTER = 6.4;

  /** Room at the left of the drawings, px. */
  static final double INSET = 10;

  /** Where the time axis begins, px from the left of this pane. */
  static final double AXIS_FROM = INSET + StripChart.LEFT;

  private final ManoeuvreModel model;
  private final ObjectProperty<Palette> palette;
  private final Canvas drawing = new Canvas();
  private final Canvas overlay = new Canvas();
  private List<PlotArea> areas = List.of();
  private List<Strip> strips = List.of();
  private List<ValueRange> heldRanges = List.of();
  private double traceHeight;
  private double dragFrom;
  private boolean redrawAsked;

  /** What the overlay shows, as far as it depends on anything. */
  private List<Object> overlaid = List.of();

  StagePane(ManoeuvreModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.palette = palette;
    setId("stage");
    setFocusTraversable(true);
    setAccessibleText("Wing trace and time histories");
    getChildren().addAll(drawing, overlay);
    setMinSize(360, 260);
    overlay.setMouseTransparent(true);
    model.session().resultProperty().addListener((property, before, now) -> dataChanged());
    model.session().ghostProperty().addListener((property, before, now) -> dataChanged());
    model.windowProperty().addListener((property, before, now) -> askRedraw());
    palette.addListener((property, before, now) -> askRedraw());
    model.cursorProperty().addListener((property, before, now) -> drawOverlay());
    model.clock().positionProperty().addListener((property, before, now) -> drawOverlay());
    addEventHandler(MouseEvent.MOUSE_MOVED, event -> moveCursor(event.getX()));
    addEventHandler(MouseEvent.MOUSE_EXITED, event -> model.cursorProperty().set(Double.NaN));
    addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
    addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
    addEventHandler(
        MouseEvent.MOUSE_CLICKED,
        event -> {
          if (event.getClickCount() == 2) {
            model.resetView();
          } else if (event.isStillSincePress() && !areas.isEmpty()) {
            model.clock().moveTo(timeAt(event.getX()));
          }
        });
    addEventHandler(ScrollEvent.SCROLL, this::scrolled);
    addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
    Runnable atPulse = this::redrawIfAsked;
    sceneProperty()
        .addListener(
            (property, before, now) -> {
              if (before != null) {
                before.removePostLayoutPulseListener(atPulse);
              }
              if (now != null) {
                now.addPostLayoutPulseListener(atPulse);
              }
            });
    dataChanged();
  }

  @Override
  protected void layoutChildren() {
    drawing.setWidth(getWidth());
    drawing.setHeight(getHeight());
    askRedraw();
  }

  @Override
  protected double computePrefHeight(double width) {
    return 460;
  }

  private void dataChanged() {
    RunResult result = model.session().resultProperty().get();
    strips =
        result == null
            ? List.of()
            : RollStrips.of(result, Optional.ofNullable(model.session().ghostProperty().get()))
                .stream()
                .filter(strip -> !strip.title().equals(RollStrips.HANDS))
                .toList();
    askRedraw();
  }

  /** Keeps the value axes where they are while something is being dragged. */
  void holdRanges(boolean hold) {
    heldRanges =
        hold
            ? areas.stream().map(area -> new ValueRange(area.low(), area.high())).toList()
            : List.of();
    if (!hold) {
      askRedraw();
    }
  }

  /** Several changes within one pulse are drawn once, and by that pulse. */
  private void askRedraw() {
    redrawAsked = true;
    Platform.requestNextPulse();
  }

  private void redrawIfAsked() {
    if (redrawAsked) {
      redrawAsked = false;
      redraw();
    }
  }

  private void redraw() {
    double width = getWidth();
    double height = getHeight();
    RunResult result = model.session().resultProperty().get();
    if (width < 200 || height < 120) {
      return;
    }
    GraphicsContext context = drawing.getGraphicsContext2D();
    context.setFill(CanvasPainter.colour(palette.get(), Ink.GROUND, 1));
    context.fillRect(0, 0, width, height);
    if (result == null) {
      areas = List.of();
      drawOverlay();
      return;
    }
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    traceHeight = Math.rint(TRACE_SHARE * height);
    Optional<RunResult> ghost = Optional.ofNullable(model.session().ghostProperty().get());
    painter.paint(
        WingTrace.draw(
            result,
            ghost,
            result.scenario().data().aeroplane().span(),
            model.windowProperty().get(),
            width - INSET,
            traceHeight,
            StripChart.LEFT,
            StripChart.RIGHT,
            OptionalDouble.empty()),
        INSET,
        0);
    StripChart.Drawing drawn =
        StripChart.draw(
            strips,
            rangesNow(),
            model.windowProperty().get(),
            width - INSET,
            height - traceHeight,
            StripChart.LEFT,
            StripChart.RIGHT);
    painter.paint(drawn.sheet(), INSET, traceHeight);
    areas = drawn.areas();
    drawOverlay();
  }

  private List<ValueRange> rangesNow() {
    List<ValueRange> ranges = new ArrayList<>();
    for (int i = 0; i < strips.size(); i++) {
      ValueRange now = ValueRange.of(strips.get(i), model.windowProperty().get());
      ranges.add(i < heldRanges.size() ? heldRanges.get(i).covering(now) : now);
    }
    return ranges;
  }

  private double timeAt(double x) {
    if (areas.isEmpty()) {
      return 0;
    }
    PlotArea area = areas.get(0);
    return Math.max(area.time().from(), Math.min(area.time().to(), area.timeAt(x - INSET)));
  }

  private void moveCursor(double x) {
    if (!areas.isEmpty()) {
      model.cursorProperty().set(timeAt(x));
    }
  }

  private void pressed(MouseEvent event) {
    requestFocus();
    dragFrom = event.getX();
  }

  private void dragged(MouseEvent event) {
    if (event.getButton() != MouseButton.PRIMARY || areas.isEmpty()) {
      return;
    }
    PlotArea area = areas.get(0);
    model.pan(area.timeAt(dragFrom) - area.timeAt(event.getX()));
    dragFrom = event.getX();
  }

  private void scrolled(ScrollEvent event) {
    if (areas.isEmpty() || event.getDeltaY() == 0) {
      return;
    }
    model.zoom(timeAt(event.getX()), event.getDeltaY() > 0 ? 1 / ZOOM_STEP : ZOOM_STEP);
    event.consume();
  }

  private void keyPressed(KeyEvent event) {
    double middle = 0.5 * (model.windowProperty().get().from() + model.windowProperty().get().to());
    double step = 0.1 * model.windowProperty().get().length();
    if (event.getCode() == KeyCode.PLUS
        || event.getCode() == KeyCode.ADD
        || event.getCode() == KeyCode.EQUALS) {
      model.zoom(middle, 1 / ZOOM_STEP);
    } else if (event.getCode() == KeyCode.MINUS || event.getCode() == KeyCode.SUBTRACT) {
      model.zoom(middle, ZOOM_STEP);
    } else if (event.getCode() == KeyCode.DIGIT0 || event.getCode() == KeyCode.HOME) {
      model.resetView();
    } else if (event.getCode() == KeyCode.LEFT) {
      model.pan(-step);
    } else if (event.getCode() == KeyCode.RIGHT) {
      model.pan(step);
    } else {
      return;
    }
    event.consume();
  }

  /** The cursor through all strips with its read-out, and the aeroplane seen from behind. */
  private void drawOverlay() {
    GraphicsContext context = overlay.getGraphicsContext2D();
    RunResult result = model.session().resultProperty().get();
    if (result == null || areas.isEmpty()) {
      overlaid = List.of();
      overlay.setVisible(false);
      return;
    }
    TimeHistory history = result.history();
    OptionalDouble instant = model.shownInstant();
    double shown = instant.orElse(0);
    int index = history.lastAt(shown + 1e-9);
    double bank = history.value(Channel.BANK, index);
    // Without a cursor only the rear view is here, and mostly it is the one that is here already.
    List<Object> now = List.of(instant, bank, palette.get(), getWidth(), getHeight());
    if (instant.isEmpty() && now.equals(overlaid)) {
      return;
    }
    overlaid = now;
    coverWithOverlay(instant.isPresent());
    context.clearRect(0, 0, overlay.getWidth(), overlay.getHeight());
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    double size = Math.min(0.62 * StripChart.LEFT, 0.56 * traceHeight);
    RearView.draw(bank, INSET + 0.42 * StripChart.LEFT, 0.6 * traceHeight, size)
        .forEach(painter::paint);
    painter.paint(
        new Mark.Label(
            INSET + 0.42 * StripChart.LEFT,
            0.6 * traceHeight + 0.5 * size + 12,
            figure(Math.toDegrees(bank), "°"),
            Anchor.MIDDLE,
            TypeSize.SMALL,
            Ink.TEXT));
    PlotArea first = areas.get(0);
    if (instant.isEmpty() || shown < first.time().from() || shown > first.time().to()) {
      return;
    }
    double x = INSET + first.xOf(shown);
    painter.paint(
        new Mark.Line(x, 6, x, getHeight() - 22, new Stroke(Ink.CURSOR, 1, Dash.SOLID, 0.8)));
    for (int i = 0; i < areas.size() && i < strips.size(); i++) {
      readOut(painter, areas.get(i), strips.get(i), shown, x);
    }
    tag(painter, x, traceHeight - 3, figure(shown, " s"));
  }

  /** An overlay costs the renderer its area, so without a cursor it covers the rear view alone. */
  private void coverWithOverlay(boolean all) {
    overlay.setVisible(true);
    overlay.setWidth(all ? getWidth() : AXIS_FROM);
    overlay.setHeight(all ? getHeight() : traceHeight + TypeSize.SMALL.pixels());
  }

  private void readOut(CanvasPainter painter, PlotArea area, Strip strip, double shown, double x) {
    StringBuilder words = new StringBuilder();
    for (Curve curve : strip.curves()) {
      double value = at(curve.time(), curve.value(), shown);
      if (value >= area.low() && value <= area.high()) {
        painter.paint(
            new Mark.Dot(x, traceHeight + area.yOf(value), 3, curve.stroke().ink(), true));
      }
      boolean crowded = strip.curves().size() > 2 && curve.name().endsWith(", kept");
      if (!curve.name().isEmpty() && !crowded) {
        words.append(words.isEmpty() ? "" : "   ");
        words.append(curve.name()).append(' ').append(figure(value, ""));
      }
    }
    tag(painter, x, traceHeight + area.y() + 11, words.toString());
  }

  private static double at(double[] times, double[] values, double time) {
    int found = Arrays.binarySearch(times, time);
    int index = found >= 0 ? found : -found - 2;
    return values[Math.max(0, Math.min(values.length - 1, index))];
  }

  /** A short text beside the cursor, on the side that has room. */
  private void tag(CanvasPainter painter, double x, double y, String words) {
    double width = LETTER * words.length() + 8;
    boolean right = x + width < getWidth() - StripChart.RIGHT;
    double from = right ? x + 4 : x - 4 - width;
    painter.paint(
        new Mark.Area(
            new double[] {from, from + width, from + width, from},
            new double[] {y - 10, y - 10, y + 4, y + 4},
            Ink.GROUND,
            0.82));
    painter.paint(
        new Mark.Label(
            right ? x + 8 : x - 8,
            y,
            words,
            right ? Anchor.START : Anchor.END,
            TypeSize.SMALL,
            Ink.TEXT));
  }

  private static String figure(double value, String unit) {
    return String.format(Locale.ROOT, "%.2f", value).replace('-', '\u2212') + unit;
  }
}
