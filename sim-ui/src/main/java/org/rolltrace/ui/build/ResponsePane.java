package org.rolltrace.ui.build;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.scene.canvas.GraphicsContext;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.PlotArea;
import org.rolltrace.ui.chart.RollStrips;
import org.rolltrace.ui.chart.Strip;
import org.rolltrace.ui.chart.StripChart;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.control.CanvasPainter;
import org.rolltrace.ui.control.PulsePane;

/** How the aeroplane rolls with this shape: bank and roll rate of the open manoeuvre. */
final class ResponsePane extends PulsePane {
  private static final double INSET = 10;
  private static final double LEFT = 106;
  private static final double RIGHT = 92;
  private static final int STRIPS = 2;

  private final BuildModel model;
  private final ObjectProperty<Palette> palette;
  private List<Strip> strips = List.of();
  private List<PlotArea> areas = List.of();

  ResponsePane(BuildModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.palette = palette;
    setId("response");
    setAccessibleText("Bank and roll rate against time");
    setMinSize(240, 150);
    model.session().resultProperty().addListener((property, before, now) -> dataChanged());
    model.session().ghostProperty().addListener((property, before, now) -> dataChanged());
    model.windowProperty().addListener((property, before, now) -> askRedraw());
    model.heldProperty().addListener((property, before, now) -> askRedraw());
    palette.addListener((property, before, now) -> askRedraw());
    // What changed elsewhere is worked out when it is seen again.
    sceneProperty().addListener((property, before, now) -> dataChanged());
  }

  private void dataChanged() {
    RunResult result = model.session().resultProperty().get();
    if (getScene() == null) {
      return;
    }
    strips =
        result == null
            ? List.of()
            : RollStrips.of(result, Optional.ofNullable(model.session().ghostProperty().get()))
                .subList(0, STRIPS);
    askRedraw();
  }

  /** The ranges that the axes cover, one a strip, as they were drawn last. */
  List<ValueRange> drawnRanges() {
    return areas.stream().map(area -> new ValueRange(area.low(), area.high())).toList();
  }

  @Override
  protected void draw(GraphicsContext context, double width, double height) {
    context.setFill(CanvasPainter.colour(palette.get(), Ink.GROUND, 1));
    context.fillRect(0, 0, width, height);
    if (strips.isEmpty() || width < LEFT + RIGHT + 60 || height < 120) {
      areas = List.of();
      return;
    }
    List<ValueRange> kept = model.heldProperty().get() ? drawnRanges() : List.of();
    List<ValueRange> ranges = new ArrayList<>();
    for (int i = 0; i < strips.size(); i++) {
      ValueRange now = ValueRange.of(strips.get(i), model.windowProperty().get());
      ranges.add(i < kept.size() ? kept.get(i).covering(now) : now);
    }
    StripChart.Drawing drawn =
        StripChart.draw(
            strips, ranges, model.windowProperty().get(), width - INSET, height - 4, LEFT, RIGHT);
    new CanvasPainter(context, palette.get()).paint(drawn.sheet(), INSET, 0);
    areas = drawn.areas();
  }
}
