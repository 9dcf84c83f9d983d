package org.rolltrace.ui.manoeuvre;

import javafx.beans.property.ObjectProperty;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.chart.HandDrawing;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.control.CanvasPainter;

/** A control that the mouse holds while its button is down. */
final class HandPane extends Region {
  private final HandFlightModel model;
  private final ObjectProperty<Palette> palette;
  private final Control control;
  private final Canvas canvas = new Canvas();

  HandPane(HandFlightModel model, ObjectProperty<Palette> palette, Control control, double height) {
    this.model = model;
    this.palette = palette;
    this.control = control;
    setId("hand-" + control.word());
    setAccessibleText(title());
    setCursor(Cursor.H_RESIZE);
    setMinSize(160, height);
    setPrefHeight(height);
    getChildren().add(canvas);
    addEventHandler(MouseEvent.MOUSE_PRESSED, this::grab);
    addEventHandler(MouseEvent.MOUSE_DRAGGED, this::grab);
    addEventHandler(MouseEvent.MOUSE_RELEASED, event -> model.release(control));
    model.timeProperty().addListener((property, before, now) -> draw());
    model.flyingProperty().addListener((property, before, now) -> draw());
    palette.addListener((property, before, now) -> draw());
  }

  private String title() {
    return control == Control.STICK ? "Stick" : "Pedals";
  }

  private void grab(MouseEvent event) {
    if (event.getButton() == MouseButton.PRIMARY) {
      double trim = model.flight().map(flight -> flight.trim(control)).orElse(0.0);
      model.grab(control, HandDrawing.positionAt(event.getX(), getWidth()) - trim);
    }
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
    draw();
  }

  private void draw() {
    if (model.flight().isEmpty() || getWidth() < 100) {
      return;
    }
    LiveFlight flight = model.flight().get();
    GraphicsContext context = canvas.getGraphicsContext2D();
    context.clearRect(0, 0, getWidth(), getHeight());
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    Channel channel = control == Control.STICK ? Channel.STICK : Channel.PEDAL;
    HandDrawing.draw(title(), flight.now(channel), flight.trim(control), getWidth(), getHeight())
        .forEach(painter::paint);
  }
}
