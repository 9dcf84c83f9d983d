package org.rolltrace.ui.manoeuvre;

import java.util.OptionalDouble;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.ReplayClock;

/** What the workplace shows of a session: the stretch of time in view, the cursor, the replay. */
public final class ManoeuvreModel {
  private final DeskSession session;
  private final ReplayClock clock = new ReplayClock();
  private final ObjectProperty<TimeWindow> window =
      new SimpleObjectProperty<>(this, "window", new TimeWindow(0, 10));
  private final DoubleProperty cursor = new SimpleDoubleProperty(this, "cursor", Double.NaN);
  private double shownDuration = 10;

  /**
   * A model.
   *
   * @param session what is shown
   */
  public ManoeuvreModel(DeskSession session) {
    this.session = session;
    clock.setRange(0, shownDuration);
    session.resultProperty().addListener((property, before, now) -> follow(now));
    follow(session.resultProperty().get());
  }

  /** A whole view stays whole when the manoeuvre gets longer or shorter. */
  private void follow(RunResult result) {
    if (result == null) {
      return;
    }
    double duration = result.scenario().duration();
    if (duration != shownDuration) {
      boolean whole = window.get().from() <= 0 && window.get().to() >= shownDuration;
      TimeWindow full = new TimeWindow(0, duration);
      window.set(whole ? full : window.get().clampedTo(full));
      shownDuration = duration;
      clock.setRange(0, duration);
    }
  }

  /**
   * The session.
   *
   * @return what is shown
   */
  public DeskSession session() {
    return session;
  }

  /**
   * The replay.
   *
   * @return its clock
   */
  public ReplayClock clock() {
    return clock;
  }

  /**
   * The stretch of time in view.
   *
   * @return the property
   */
  public ObjectProperty<TimeWindow> windowProperty() {
    return window;
  }

  /**
   * The time under the mouse, s; NaN when the mouse is elsewhere.
   *
   * @return the property
   */
  public DoubleProperty cursorProperty() {
    return cursor;
  }

  /**
   * The instant that the read-outs show: under the mouse, else that of the replay once it has
   * begun.
   *
   * @return s, or empty
   */
  public OptionalDouble shownInstant() {
    if (!Double.isNaN(cursor.get())) {
      return OptionalDouble.of(cursor.get());
    }
    double position = clock.positionProperty().get();
    return clock.isPlaying() || position > 0 ? OptionalDouble.of(position) : OptionalDouble.empty();
  }

  /**
   * Zooms about an instant.
   *
   * @param time stays where it is, s
   * @param factor below 1 to see less, above 1 to see more
   */
  public void zoom(double time, double factor) {
    window.set(window.get().zoomedAt(time, factor).clampedTo(new TimeWindow(0, shownDuration)));
  }

  /**
   * Moves the view.
   *
   * @param byTime s, to later times when positive
   */
  public void pan(double byTime) {
    window.set(window.get().movedBy(byTime).clampedTo(new TimeWindow(0, shownDuration)));
  }

  /** Shows the whole manoeuvre. */
  public void resetView() {
    window.set(new TimeWindow(0, shownDuration));
  }

  /** Turns all inputs round, keeping the curves of now to compare with: left against right. */
  public void compareMirrored() {
    session.keepGhost();
    session.mirror();
  }
}
