package org.rolltrace.ui.session;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;

/** Where a replay stands. */
public final class ReplayClock {
  /** Length of a frame that {@link #step} moves by, s. */
  public static final double FRAME = 1.0 / 50;

  /** The slowest rate. */
  public static final double SLOWEST = 0.25;

  /** The fastest rate. */
  public static final double FASTEST = 4;

  private final ReadOnlyDoubleWrapper position = new ReadOnlyDoubleWrapper(this, "position", 0);
  private final ReadOnlyBooleanWrapper playing = new ReadOnlyBooleanWrapper(this, "playing", false);
  private final ReadOnlyDoubleWrapper from = new ReadOnlyDoubleWrapper(this, "from", 0);
  private final ReadOnlyDoubleWrapper to = new ReadOnlyDoubleWrapper(this, "to", 0);
  private final DoubleProperty rate = new SimpleDoubleProperty(this, "rate", 1);
  private final BooleanProperty loop = new SimpleBooleanProperty(this, "loop", false);

  public ReadOnlyDoubleProperty positionProperty() {
    return position.getReadOnlyProperty();
  }

  public double position() {
    return position.get();
  }

  public ReadOnlyBooleanProperty playingProperty() {
    return playing.getReadOnlyProperty();
  }

  public boolean isPlaying() {
    return playing.get();
  }

  public DoubleProperty rateProperty() {
    return rate;
  }

  public BooleanProperty loopProperty() {
    return loop;
  }

  public ReadOnlyDoubleProperty fromProperty() {
    return from.getReadOnlyProperty();
  }

  public ReadOnlyDoubleProperty toProperty() {
    return to.getReadOnlyProperty();
  }

  public void setRange(double newFrom, double newTo) {
    from.set(newFrom);
    to.set(newTo);
  }

  public void moveTo(double seconds) {
    position.set(seconds);
  }

  public void play() {
    playing.set(true);
  }

  public void pause() {
    playing.set(false);
  }

  public void toggle() {
    playing.set(!playing.get());
  }

  public void step(int frames) {
    position.set(position.get() + frames * FRAME);
  }

  public void advance(double elapsedSeconds) {
    position.set(position.get() + elapsedSeconds * rate.get());
  }
}
