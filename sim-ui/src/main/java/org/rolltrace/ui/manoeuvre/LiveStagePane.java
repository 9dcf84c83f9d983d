package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.LiveStrips;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.Strip;
import org.rolltrace.ui.chart.StripChart;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.chart.WingTrace;
import org.rolltrace.ui.control.CanvasPainter;

/** What happens while a hand flies: the wing trace and the strips of the last seconds. */
final class LiveStagePane extends Region {
  private static final double TRACE_SHARE = 0.3;

  /** What is in view, s, and how much of it has passed. */
  private static final double SEEN = 10;

  private static final double PASSED = 8.5;

  private final HandFlightModel model;
  private final ObjectProperty<Palette> palette;
  private final Canvas canvas = new Canvas();
  private List<ValueRange> ranges = List.of();

  LiveStagePane(HandFlightModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.palette = palette;
    setId("live-stage");
    setAccessibleText("Wing trace and time histories of the flight");
    setMinSize(360, 240);
    getChildren().add(canvas);
    model.timeProperty().addListener((property, before, now) -> draw());
    model
        .flyingProperty()
        .addListener(
            (property, before, now) -> {
              ranges = List.of();
              draw();
            });
    palette.addListener((property, before, now) -> draw());
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
    draw();
  }

  private void draw() {
    double width = getWidth();
    double height = getHeight();
    if (model.flight().isEmpty() || width < 300 || height < 200) {
      return;
    }
    LiveFlight flight = model.flight().get();
    double from = Math.max(0, flight.time() - PASSED);
    TimeWindow window = new TimeWindow(from, from + SEEN);
    TimeHistory history = flight.history(from);
    GraphicsContext context = canvas.getGraphicsContext2D();
    context.setFill(CanvasPainter.colour(palette.get(), Ink.GROUND, 1));
    context.fillRect(0, 0, width, height);
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    double traceHeight = Math.rint(TRACE_SHARE * height);
    painter.paint(
        WingTrace.drawLive(
            history,
            model.scenario().orElseThrow().data().aeroplane().span(),
            window,
            width - StagePane.INSET,
            traceHeight,
            StripChart.LEFT,
            StripChart.RIGHT),
        StagePane.INSET,
        0);
    List<Strip> strips = LiveStrips.of(history, flight.canMove(Control.PEDAL));
    ranges = widened(strips, window);
    painter.paint(
        StripChart.draw(
                strips,
                ranges,
                window,
                width - StagePane.INSET,
                height - traceHeight,
                StripChart.LEFT,
                StripChart.RIGHT)
            .sheet(),
        StagePane.INSET,
        traceHeight);
  }

  /** Axes only ever grow during a flight: nothing jumps under the eye. */
  private List<ValueRange> widened(List<Strip> strips, TimeWindow window) {
    List<ValueRange> wide = new ArrayList<>();
    for (int i = 0; i < strips.size(); i++) {
      ValueRange now = ValueRange.of(strips.get(i), window);
      wide.add(i < ranges.size() ? ranges.get(i).covering(now) : now);
    }
    return wide;
  }
}
