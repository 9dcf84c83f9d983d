package org.rolltrace.ui.manoeuvre;

import java.util.OptionalDouble;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.scenario.Scenario;
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
  private final HandFlightModel hand;
  private double shownDuration = 10;
  private int shownDocument;
  private boolean wholeNext;

  /**
   * A manoeuvre that goes on for this many times the time of its inputs opens with those in view.
   */
  private static final double MUCH_LONGER = 4;

  /** What is seen of the time after the last input, at least, s. */
  private static final double AFTER = 3;

  /**
   * A model.
   *
   * @param session what is shown
   */
  public ManoeuvreModel(DeskSession session) {
    this.session = session;
    clock.setRange(0, shownDuration);
    hand = new HandFlightModel(session, this::beginAnew);
    hand.flyingProperty().addListener((property, before, now) -> clock.pause());
    session.resultProperty().addListener((property, before, now) -> follow(now));
    follow(session.resultProperty().get());
  }

  /** What was just flown is seen whole and replayed from its start. */
  private void beginAnew() {
    wholeNext = true;
    clock.moveTo(0);
  }

  /**
   * A whole view stays whole when the manoeuvre gets longer or shorter; a document that was just
   * opened is seen where something is done.
   */
  private void follow(RunResult result) {
    if (result == null) {
      return;
    }
    double duration = result.scenario().duration();
    boolean another = session.openedProperty().get() != shownDocument;
    shownDocument = session.openedProperty().get();
    if (another || wholeNext) {
      shownDuration = duration;
      clock.setRange(0, duration);
      window.set(new TimeWindow(0, wholeNext ? duration : opening(result.scenario())));
      wholeNext = false;
    } else if (duration != shownDuration) {
      boolean whole = window.get().from() <= 0 && window.get().to() >= shownDuration;
      TimeWindow full = new TimeWindow(0, duration);
      window.set(whole ? full : window.get().clampedTo(full));
      shownDuration = duration;
      clock.setRange(0, duration);
    }
  }

  /** The end of what is done, with some time after it; the whole duration when that is near. */
  private static double opening(Scenario scenario) {
    double done = doneBy(scenario);
    return scenario.duration() > MUCH_LONGER * done ? done : scenario.duration();
  }

  private static double doneBy(Scenario scenario) {
    double last = 0;
    for (double time : scenario.programme().breakpoints()) {
      last = time < scenario.duration() ? time : last;
    }
    return last == 0
        ? scenario.duration()
        : Math.min(scenario.duration(), last + Math.max(AFTER, 0.5 * last));
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
   * The flight by hand.
   *
   * @return its model
   */
  public HandFlightModel hand() {
    return hand;
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

  /** Shows the time from the start to some time after the last input. */
  public void showInputs() {
    RunResult result = session.resultProperty().get();
    if (result != null) {
      window.set(new TimeWindow(0, doneBy(result.scenario())));
    }
  }

  /** Turns all inputs round, keeping the curves of now to compare with: left against right. */
  public void compareMirrored() {
    session.keepGhost();
    session.mirror();
  }
}
