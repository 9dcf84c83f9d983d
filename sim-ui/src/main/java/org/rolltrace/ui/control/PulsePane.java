package org.rolltrace.ui.control;

import javafx.application.Platform;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;

/** A pane with one drawing. Several changes within one pulse are drawn once, and by that pulse. */
public abstract class PulsePane extends Region {
  private final Canvas canvas = new Canvas();
  private boolean redrawAsked = true;

  /** A pane that is drawn when it is shown. */
  protected PulsePane() {
    getChildren().add(canvas);
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
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
    askRedraw();
  }

  /** Has the drawing made anew by the next pulse. */
  protected final void askRedraw() {
    redrawAsked = true;
    if (getScene() != null) {
      Platform.requestNextPulse();
    }
  }

  private void redrawIfAsked() {
    if (redrawAsked) {
      redrawAsked = false;
      draw(canvas.getGraphicsContext2D(), getWidth(), getHeight());
    }
  }

  /**
   * Draws all anew, the ground too.
   *
   * @param context what is drawn on
   * @param width px
   * @param height px
   */
  protected abstract void draw(GraphicsContext context, double width, double height);
}
