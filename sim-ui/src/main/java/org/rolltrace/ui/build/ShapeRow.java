package org.rolltrace.ui.build;

import java.util.Optional;
import java.util.OptionalDouble;
import javafx.geometry.Pos;
import javafx.scene.control.Slider;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.rolltrace.ui.chart.ValueRange;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;

/** One value of the shape: a field for any unit, and a slider beside it. */
final class ShapeRow extends HBox {
  private static final double FIELD = 106;

  /** Steps that a key makes over the range of a slider. */
  private static final double STEPS = 50;

  private final BuildModel model;
  private final ShapeValue value;
  private final PathField field;
  private final Slider slider = new Slider();
  private boolean showing;
  private boolean pressed;

  ShapeRow(BuildModel model, ShapeValue value) {
    super(8);
    this.model = model;
    this.value = value;
    FieldTarget target = value.target(0);
    field =
        new PathField(
            model.session(),
            target,
            (start, put) -> ShapeEdits.follow(value, model.panelProperty().get(), start, put),
            document ->
                value == ShapeValue.SPAN ? ShapeEdits.impliedSpan(document) : Optional.empty());
    field.setPrefWidth(FIELD);
    field.setMinWidth(FIELD);
    slider.setId(value.sliderId());
    slider.setAccessibleText(target.title() + ", slider");
    slider.setTooltip(new Tooltip(target.hint()));
    HBox.setHgrow(slider, Priority.ALWAYS);
    setAlignment(Pos.BOTTOM_LEFT);
    getChildren().addAll(field, slider);
    slider.valueProperty().addListener((property, before, now) -> moved());
    slider.addEventFilter(
        MouseEvent.MOUSE_PRESSED,
        event -> {
          pressed = true;
          model.hold();
        });
    slider.addEventFilter(
        MouseEvent.MOUSE_RELEASED,
        event -> {
          if (pressed) {
            pressed = false;
            model.letGo();
            show();
          }
        });
    slider
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                model.session().endGesture();
              }
            });
    if (value.ofPanel()) {
      model
          .panelProperty()
          .addListener(
              (property, before, now) -> {
                field.retarget(value.target(now.intValue()));
                show();
              });
    }
    model.session().documentProperty().addListener((property, before, now) -> show());
    show();
  }

  private void moved() {
    if (!showing) {
      model.slide(value, slider.getValue());
    }
  }

  /** The thumb stays where the mouse holds it. */
  private void show() {
    if (pressed) {
      return;
    }
    Optional<ValueRange> range = model.range(value);
    OptionalDouble now = model.value(value);
    slider.setDisable(range.isEmpty());
    if (range.isEmpty() || now.isEmpty()) {
      return;
    }
    showing = true;
    // One bound may pass the other on the way.
    slider.setMax(Math.max(slider.getMax(), range.get().high()));
    slider.setMin(range.get().low());
    slider.setMax(range.get().high());
    slider.setBlockIncrement((range.get().high() - range.get().low()) / STEPS);
    slider.setValue(now.getAsDouble());
    showing = false;
  }
}
