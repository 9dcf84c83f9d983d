package org.rolltrace.ui.session;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;

/**
 * Where a replay stands, and how it goes on. Times are those of the manoeuvre, s; something else
 * tells how much time goes by.
 */
public final class ReplayClock {
  /** Length of a frame that {@link #step} moves by, s. */
  public static final double FRAME = 1.0 / 50;

  /** The slowest rate: seconds of the manoeuvre in a second. */
  public static final double SLOWEST = 0.25;

  /** The fastest rate: seconds of the manoeuvre in a second. */
  public static final double FASTEST = 4;

  private final ReadOnlyDoubleWrapper position = new ReadOnlyDoubleWrapper(this, "position", 0);
  private final ReadOnlyBooleanWrapper playing = new ReadOnlyBooleanWrapper(this, "playing", false);
  private final ReadOnlyDoubleWrapper from = new ReadOnlyDoubleWrapper(this, "from", 0);
  private final ReadOnlyDoubleWrapper to = new ReadOnlyDoubleWrapper(this, "to", 0);
  private final DoubleProperty rate =
      new SimpleDoubleProperty(this, "rate", 1) {
        @Override
        public void set(double newRate) {
          super.set(inside(finite("rate", newRate), SLOWEST, FASTEST));
        }
      };
  private final BooleanProperty loop = new SimpleBooleanProperty(this, "loop", false);

  /** A clock that stands at 0 s of nothing. */
  public ReplayClock() {}

  /**
   * Where it stands.
   *
   * @return s, inside the range
   */
  public ReadOnlyDoubleProperty positionProperty() {
    return position.getReadOnlyProperty();
  }

  /**
   * Where it stands.
   *
   * @return s, inside the range
   */
  public double position() {
    return position.get();
  }

  /**
   * Whether it goes on with time.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty playingProperty() {
    return playing.getReadOnlyProperty();
  }

  /**
   * Whether it goes on with time.
   *
   * @return true while it plays
   */
  public boolean isPlaying() {
    return playing.get();
  }

  /**
   * How fast it plays, seconds of the manoeuvre in a second. What it is set to is brought between
   * {@value #SLOWEST} and {@value #FASTEST}.
   *
   * @return the property, to be set by anybody
   */
  public DoubleProperty rateProperty() {
    return rate;
  }

  /**
   * Whether it begins again at the end.
   *
   * @return the property, to be set by anybody
   */
  public BooleanProperty loopProperty() {
    return loop;
  }

  /**
   * Where it begins.
   *
   * @return s
   */
  public ReadOnlyDoubleProperty fromProperty() {
    return from.getReadOnlyProperty();
  }

  /**
   * Where it ends.
   *
   * @return s
   */
  public ReadOnlyDoubleProperty toProperty() {
    return to.getReadOnlyProperty();
  }

  /**
   * Plays another range. A position outside is brought inside; nothing else changes.
   *
   * @param newFrom s
   * @param newTo s, not before {@code newFrom}
   * @throws IllegalArgumentException if either is no number, or they are the wrong way round
   */
  public void setRange(double newFrom, double newTo) {
    if (!(finite("beginning", newFrom) <= finite("end", newTo))) {
      throw new IllegalArgumentException(
          "the range ends at "
              + newTo
              + " s; expected not before its beginning, "
              + newFrom
              + " s");
    }
    from.set(newFrom);
    to.set(newTo);
    moveTo(position.get());
  }

  /**
   * Goes to a time; it plays on from there if it played.
   *
   * @param seconds brought inside the range
   * @throws IllegalArgumentException if it is no number
   */
  public void moveTo(double seconds) {
    position.set(inside(finite("position", seconds), from.get(), to.get()));
  }

  /** Plays on; from the beginning when it stands at the end. Nothing happens in an empty range. */
  public void play() {
    if (from.get() < to.get()) {
      if (position.get() >= to.get()) {
        position.set(from.get());
      }
      playing.set(true);
    }
  }

  /** Stands still. */
  public void pause() {
    playing.set(false);
  }

  /** Plays when it stands, stands when it plays. */
  public void toggle() {
    if (playing.get()) {
      pause();
    } else {
      play();
    }
  }

  /**
   * Stands still and moves to the next frame, or back. Frames are counted from the beginning, so
   * that steps meet the same times whatever was between.
   *
   * @param frames how many; negative goes back
   */
  public void step(int frames) {
    pause();
    double exact = (position.get() - from.get()) / FRAME;
    double nearest = Math.rint(exact);
    // Between two frames, the first step only reaches the next one.
    boolean onFrame = Math.abs(exact - nearest) < 1e-6;
    double frame = onFrame ? nearest : frames > 0 ? Math.floor(exact) : Math.ceil(exact);
    moveTo(from.get() + (frame + frames) * FRAME);
  }

  /**
   * Lets time go by. At the end it begins again when it loops, and stands still there otherwise.
   *
   * @param elapsedSeconds s of real time; what is not above 0 does nothing
   */
  public void advance(double elapsedSeconds) {
    if (!playing.get() || !(elapsedSeconds > 0)) {
      return;
    }
    double next = position.get() + elapsedSeconds * rate.get();
    if (next < to.get()) {
      position.set(next);
    } else if (loop.get() && next < Double.POSITIVE_INFINITY && from.get() < to.get()) {
      position.set(from.get() + (next - from.get()) % (to.get() - from.get()));
    } else {
      position.set(to.get());
      playing.set(false);
    }
  }

  private static double finite(String role, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(
          "the " + role + " is " + value + "; expected a finite number");
    }
    return value;
  }

  private static double inside(double value, double low, double high) {
    return Math.max(low, Math.min(high, value));
  }
}
