package org.rolltrace.ui.build;

import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.property.ObjectProperty;
import javafx.scene.canvas.GraphicsContext;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.ui.chart.Anchor;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Mark;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.ShapeDrawing;
import org.rolltrace.ui.chart.TypeSize;
import org.rolltrace.ui.control.CanvasPainter;
import org.rolltrace.ui.control.PulsePane;

/** The aeroplane from above and from behind, to scale. */
final class DrawingPane extends PulsePane {
  private static final double INSET = 10;

  private final BuildModel model;
  private final ObjectProperty<Palette> palette;

  /** Of the last drawing; kept while a slider is held. */
  private OptionalDouble scale = OptionalDouble.empty();

  DrawingPane(BuildModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.palette = palette;
    setId("drawing");
    setAccessibleText("The aeroplane from above and from behind");
    setFocusTraversable(true);
    setMinSize(240, 200);
    model.session().resultProperty().addListener((property, before, now) -> askRedraw());
    model.session().ghostProperty().addListener((property, before, now) -> askRedraw());
    model.panelProperty().addListener((property, before, now) -> askRedraw());
    model.heldProperty().addListener((property, before, now) -> askRedraw());
    palette.addListener((property, before, now) -> askRedraw());
  }

  @Override
  protected void draw(GraphicsContext context, double width, double height) {
    context.setFill(CanvasPainter.colour(palette.get(), Ink.GROUND, 1));
    context.fillRect(0, 0, width, height);
    if (width < ShapeDrawing.LEAST + 2 * INSET || height < ShapeDrawing.LEAST + 2 * INSET) {
      return;
    }
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    Optional<Geometry> shape = model.shape();
    if (shape.isEmpty()) {
      scale = OptionalDouble.empty();
      painter.paint(
          new Mark.Label(
              0.5 * width,
              0.5 * height,
              "No shape to draw",
              Anchor.MIDDLE,
              TypeSize.NORMAL,
              Ink.QUIET));
      return;
    }
    ShapeDrawing.Drawing drawing =
        ShapeDrawing.draw(
            shape.get(),
            model.keptShape(),
            width - 2 * INSET,
            height - INSET,
            model.lengthUnit(),
            model.panelProperty().get(),
            model.heldProperty().get() ? scale : OptionalDouble.empty());
    painter.paint(drawing.sheet(), INSET, INSET);
    scale = OptionalDouble.of(drawing.scale());
  }
}
