package org.rolltrace.ui.manoeuvre;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.flight.LiveFlight;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HandRecord;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.Problem;

/**
 * The scenario flown by hand in real time. Something else tells how much time goes by and what hand
 * and keys do.
 *
 * <p>Time begins with the first movement, so that nobody is hurried. What was flown becomes the
 * scenario's input when the flight ends.
 */
public final class HandFlightModel {
  /** How fast a key moves its control, fraction of travel a second. */
  public static final double KEY_RATE = 2;

  /** How fast a control that is let go returns to trim, fraction of travel a second. */
  public static final double RETURN_RATE = 4;

  /** How fast a control follows the mouse at most, fraction of travel a second. */
  public static final double MOUSE_RATE = 10;

  /** More time than this between two pictures did not pass for whoever flies, s. */
  private static final double LONGEST_PAUSE = 0.25;

  private static final double TICK = 1.0 / LiveFlight.TICKS_PER_SECOND;

  /** What adding up pieces of time may be off by, s. */
  private static final double ROUNDING = 1e-9;

  private final DeskSession session;
  private final Runnable flown;
  private final ReadOnlyBooleanWrapper flying = new ReadOnlyBooleanWrapper(this, "flying");
  private final ReadOnlyBooleanWrapper begun = new ReadOnlyBooleanWrapper(this, "begun");
  private final ReadOnlyDoubleWrapper time = new ReadOnlyDoubleWrapper(this, "time");
  private final Map<Control, Hand> hands =
      Map.of(Control.STICK, new Hand(), Control.PEDAL, new Hand());
  private Optional<LiveFlight> flight = Optional.empty();
  private Optional<Scenario> scenario = Optional.empty();
  private double untaken;

  /** What moves one control. */
  private static final class Hand {
    private boolean left;
    private boolean right;
    private Optional<Double> grabbed = Optional.empty();
    private double position;

    void letGo() {
      left = false;
      right = false;
      grabbed = Optional.empty();
    }

    /** Where the control is a tick later. */
    double next() {
      if (grabbed.isPresent()) {
        return towards(grabbed.get(), MOUSE_RATE);
      }
      if (left != right) {
        return position + (right ? KEY_RATE : -KEY_RATE) * TICK;
      }
      return left ? position : towards(0, RETURN_RATE);
    }

    private double towards(double wanted, double rate) {
      double most = rate * TICK;
      return position + Math.max(-most, Math.min(most, wanted - position));
    }
  }

  /**
   * A model.
   *
   * @param session what is flown, and what takes what was flown
   * @param flown is run before the session takes what was flown
   */
  HandFlightModel(DeskSession session, Runnable flown) {
    this.session = session;
    this.flown = flown;
    session.documentProperty().addListener((property, before, now) -> end());
  }

  /**
   * Whether the scenario is being flown, or stands ready to be.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty flyingProperty() {
    return flying.getReadOnlyProperty();
  }

  /**
   * Whether time passes; it does from the first movement on.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty begunProperty() {
    return begun.getReadOnlyProperty();
  }

  /**
   * How long it has been flown. Whatever shows the flight changes with it.
   *
   * @return s
   */
  public ReadOnlyDoubleProperty timeProperty() {
    return time.getReadOnlyProperty();
  }

  /**
   * The flight.
   *
   * @return empty when nothing is flown
   */
  public Optional<LiveFlight> flight() {
    return flight;
  }

  /**
   * What is flown.
   *
   * @return empty when nothing is
   */
  public Optional<Scenario> scenario() {
    return scenario;
  }

  /** Stands ready; when the scenario cannot be flown, the session has the reason as a problem. */
  public void begin() {
    ScenarioDocument document = session.documentProperty().get();
    if (flying.get() || document == null) {
      return;
    }
    ScenarioDocument.Check check = document.check();
    if (check.scenario().isEmpty()) {
      refuse("first mend the value that cannot be used: " + check.faults().get(0).message());
      return;
    }
    LiveFlight ready;
    try {
      ready = ScenarioRun.byHand(check.scenario().get());
    } catch (CalculationException e) {
      refuse(e.getMessage());
      return;
    }
    if (!ready.canMove(Control.STICK) && !ready.canMove(Control.PEDAL)) {
      refuse(
          "the aeroplane gives the travel of neither ailerons nor rudder; give one under Aeroplane");
      return;
    }
    flight = Optional.of(ready);
    scenario = check.scenario();
    untaken = 0;
    for (Hand hand : hands.values()) {
      hand.letGo();
      hand.position = 0;
    }
    begun.set(false);
    time.set(0);
    flying.set(true);
  }

  private void refuse(String why) {
    session.tell(new Problem("Cannot fly by hand", why));
  }

  /**
   * A key of a control goes down or up.
   *
   * @param control which control
   * @param right which of its two keys
   * @param down whether it is held from now on
   */
  public void key(Control control, boolean right, boolean down) {
    Hand hand = hands.get(control);
    if (right) {
      hand.right = down;
    } else {
      hand.left = down;
    }
    if (down) {
      start();
    }
  }

  /**
   * The mouse holds a control at a place until it {@linkplain #release lets go}.
   *
   * @param control which control
   * @param position fraction of travel from the trimmed position
   */
  public void grab(Control control, double position) {
    hands.get(control).grabbed = Optional.of(position);
    start();
  }

  /**
   * The mouse lets a control go.
   *
   * @param control which control
   */
  public void release(Control control) {
    hands.get(control).grabbed = Optional.empty();
  }

  /** Mouse and keys let go of everything, as when the window is left. */
  public void letGo() {
    hands.values().forEach(Hand::letGo);
  }

  /** Lets time begin without a movement. */
  public void start() {
    if (flying.get()) {
      begun.set(true);
    }
  }

  /**
   * Lets time go by; at the limit the flight ends.
   *
   * @param elapsedSeconds s of real time; of a long pause only a quarter of a second counts
   */
  public void advance(double elapsedSeconds) {
    if (!begun.get() || flight.isEmpty() || !(elapsedSeconds > 0)) {
      return;
    }
    untaken += Math.min(elapsedSeconds, LONGEST_PAUSE);
    LiveFlight live = flight.get();
    try {
      while (untaken >= TICK - ROUNDING && !live.isOver()) {
        untaken -= TICK;
        Hand stick = hands.get(Control.STICK);
        Hand pedal = hands.get(Control.PEDAL);
        stick.position = live.within(Control.STICK, stick.next());
        pedal.position = live.within(Control.PEDAL, pedal.next());
        live.tick(stick.position, pedal.position);
      }
    } catch (CalculationException e) {
      stop();
      session.tell(new Problem("The flight by hand has ended", e.getMessage()));
      return;
    }
    time.set(live.time());
    if (live.isOver()) {
      stop();
    }
  }

  /**
   * Ends the flight; what was flown takes the place of the inputs. Nothing changes when neither
   * stick nor pedals were moved.
   */
  public void stop() {
    if (!flying.get()) {
      return;
    }
    HandRecord record = flight.orElseThrow().record();
    end();
    if (List.of(Control.STICK, Control.PEDAL).stream().anyMatch(record::moves)) {
      flown.run();
      session.takeFlown(record);
    }
  }

  /** Ends the flight, as when there is another scenario. */
  private void end() {
    flying.set(false);
    begun.set(false);
    flight = Optional.empty();
    scenario = Optional.empty();
  }
}
