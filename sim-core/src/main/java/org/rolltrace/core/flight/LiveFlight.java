package org.rolltrace.core.flight;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HandRecord;

/**
 * A manoeuvre that is computed while a hand flies it, tick by tick.
 *
 * <p>The equations, the integrator and its tolerances are those of {@link Flight}; each tick is a
 * stretch between two breakpoints of a movement that is straight between ticks. So the {@linkplain
 * #record record} of the hand, flown again as a trace, gives the same history within the promise of
 * the integration. A hand never goes beyond the stops, and so needs no {@link FlightEvent.Stop}.
 */
public final class LiveFlight {
  /** Ticks a second. */
  public static final int TICKS_PER_SECOND = 50;

  /** The longest flight, s. */
  public static final double LONGEST = 300;

  /** Positions are kept to this, fraction of travel, so that a file says them in few digits. */
  private static final double GRAIN = 1e-4;

  private static final double SMALLEST_STEP = 1e-10;
  private static final double LARGEST_STEP = 1.0 / TICKS_PER_SECOND;
  private static final double LOOK_EVERY = LARGEST_STEP / 8;

  /** A state beyond this has left every range in which the equations mean something, rad, rad/s. */
  private static final double RANGE = 1e6;

  private final FlightPlan plan;
  private final HandMove stickMove = new HandMove();
  private final HandMove pedalMove = new HandMove();
  private final ControlledMotion controlled;
  private final DormandPrince853Integrator integrator;
  private final List<double[]> rows = new ArrayList<>();
  private final double[] breakpoints;
  private double[] stick = new double[60 * TICKS_PER_SECOND];
  private double[] pedal = new double[60 * TICKS_PER_SECOND];
  private double[] state;
  private int ticks;

  private LiveFlight(FlightPlan plan, FlightSettings settings) {
    this.plan = plan;
    this.controlled = new ControlledMotion(plan, stickMove, pedalMove);
    this.integrator =
        new DormandPrince853Integrator(
            SMALLEST_STEP,
            LARGEST_STEP,
            settings.absoluteTolerance(),
            settings.relativeTolerance());
    this.breakpoints = plan.programme().breakpoints();
    this.state = controlled.start();
    record(0);
  }

  /**
   * Begins a flight.
   *
   * @param plan what is flown; its programme moves neither stick nor pedals, and its duration says
   *     nothing
   * @return the flight at 0 s
   * @throws IllegalArgumentException when the programme moves stick or pedals
   */
  public static LiveFlight begin(FlightPlan plan) {
    if (plan.programme().stick().largestPosition() != 0
        || plan.programme().pedal().largestPosition() != 0) {
      throw new IllegalArgumentException(
          "the programme moves stick or pedals; expected one that leaves them to the hand");
    }
    return new LiveFlight(plan, FlightSettings.DEFAULT);
  }

  /**
   * Whether the aeroplane has what a control moves.
   *
   * @param control the control
   * @return false when its surfaces have no travel
   */
  public boolean canMove(Control control) {
    return run(control).isPresent();
  }

  private Optional<ControlRun> run(Control control) {
    return switch (control) {
      case STICK -> plan.stickRun();
      case PEDAL -> plan.pedalRun();
      case POWER -> Optional.empty(); // the levers stay with the programme
    };
  }

  private double trimmed(Control control) {
    return switch (control) {
      case STICK -> plan.trim().stick().orElse(0);
      case PEDAL -> plan.trim().pedal().orElse(0);
      case POWER -> plan.propulsion().share();
    };
  }

  /**
   * A position as near to a wanted one as a hand can bring the control.
   *
   * @param control the control
   * @param wanted fraction of travel from the trimmed position, right positive
   * @return the same, not beyond the stops nor further than a whole travel from trim, to 1e-4; 0
   *     for a control that {@linkplain #canMove cannot be moved}
   * @throws IllegalArgumentException when it is no number
   */
  public double within(Control control, double wanted) {
    if (Double.isNaN(wanted)) {
      throw new IllegalArgumentException(
          "the " + control.word() + " position is NaN; expected a fraction of travel");
    }
    if (!canMove(control)) {
      return 0;
    }
    double trim = trimmed(control);
    double low = Math.ceil(Math.max(-1, -1 - trim) / GRAIN);
    double high = Math.floor(Math.min(1, 1 - trim) / GRAIN);
    double grains =
        Math.max(Math.min(0, low), Math.min(Math.max(0, high), Math.rint(wanted / GRAIN)));
    return grains == 0 ? 0 : grains / Math.rint(1 / GRAIN);
  }

  /**
   * Flies one tick. The hand moves straight from where it is to where it shall be at its end.
   *
   * @param stickTo fraction of travel from the trimmed position, right positive; brought
   *     {@linkplain #within within} what the hand can do
   * @param pedalTo the same of the pedals
   * @throws IllegalArgumentException when a position is no number
   * @throws IllegalStateException when the flight {@linkplain #isOver is over}
   * @throws CalculationException when the equations cannot be followed; the record ends before this
   *     tick
   */
  public void tick(double stickTo, double pedalTo) {
    if (isOver()) {
      throw new IllegalStateException("the flight has lasted " + LONGEST + " s; it is over");
    }
    double begin = time();
    double end = (ticks + 1) / (double) TICKS_PER_SECOND;
    stickMove.moveOn(begin, end, within(Control.STICK, stickTo));
    pedalMove.moveOn(begin, end, within(Control.PEDAL, pedalTo));
    double[] flown = state;
    double from = begin;
    for (double at : breakpoints) {
      if (at > begin && at < end) {
        flown = fly(from, at, flown);
        from = at;
      }
    }
    flown = fly(from, end, flown);
    for (double value : flown) {
      if (!(Math.abs(value) <= RANGE)) {
        throw new CalculationException(
            "the motion leaves the finite range after "
                + begin
                + " s: the aeroplane diverges; look at its modes");
      }
    }
    state = flown;
    ticks++;
    record(Math.nextDown(end));
  }

  private double[] fly(double from, double to, double[] at) {
    double last = Math.nextDown(to);
    integrator.clearEventDetectors();
    for (SurfaceDrive drive : new SurfaceDrive[] {controlled.stick(), controlled.pedal()}) {
      drive.chooseMode(from, at);
      if (drive.hasRateLimit()) {
        addRateLimit(drive, last);
      }
    }
    try {
      return integrator
          .integrate(controlled.until(last), new ODEState(from, at), to)
          .getPrimaryState();
    } catch (MathRuntimeException failure) {
      throw new CalculationException(
          "the integration could not go on after "
              + from
              + " s: "
              + failure.getMessage()
              + "; look for a derivative or inertia that is wrong by orders of magnitude",
          failure);
    }
  }

  private void addRateLimit(SurfaceDrive drive, double last) {
    integrator.addEventDetector(
        new EventAt(
            LOOK_EVERY,
            s -> drive.switching(Math.min(s.getTime(), last), s.getPrimaryState()),
            (s, detector, increasing) -> {
              // A surface that begins to slew starts at the zero of its own end.
              if (increasing == drive.isSlewing()) {
                return Action.CONTINUE;
              }
              drive.switchMode(Math.min(s.getTime(), last), s.getPrimaryState());
              return Action.RESET_DERIVATIVES;
            }));
  }

  private void record(double controlTime) {
    if (ticks == stick.length) {
      stick = Arrays.copyOf(stick, 2 * ticks);
      pedal = Arrays.copyOf(pedal, 2 * ticks);
    }
    stick[ticks] = stickMove.end();
    pedal[ticks] = pedalMove.end();
    double[] row = new double[Channel.COUNT];
    controlled.row(controlTime, state, row);
    rows.add(row);
  }

  /**
   * How long it has been flown.
   *
   * @return s
   */
  public double time() {
    return ticks / (double) TICKS_PER_SECOND;
  }

  /**
   * Whether it has lasted as long as a flight may.
   *
   * @return true at {@value #LONGEST} s
   */
  public boolean isOver() {
    return time() >= LONGEST;
  }

  /**
   * What is now.
   *
   * @param channel the quantity
   * @return the value in the channel's SI unit
   */
  public double now(Channel channel) {
    return rows.get(ticks)[channel.column()];
  }

  /**
   * Where a control is at rest in trim.
   *
   * @param control the control
   * @return fraction of travel, right positive
   */
  public double trim(Control control) {
    return trimmed(control);
  }

  /**
   * What has been flown so far, a sample at each tick.
   *
   * @return the history
   */
  public TimeHistory history() {
    return history(0);
  }

  /**
   * What has been flown of late, a sample at each tick.
   *
   * @param from s; the ticks from the last one at or before this on
   * @return the history from there on
   */
  public TimeHistory history(double from) {
    int first = (int) Math.max(0, Math.min(ticks, Math.floor(from * TICKS_PER_SECOND)));
    TimeHistory.Recorder recorder = TimeHistory.recorder(TICKS_PER_SECOND, ticks - first + 1);
    for (int i = first; i <= ticks; i++) {
      recorder.add(i / (double) TICKS_PER_SECOND, rows.get(i));
    }
    return recorder.finish();
  }

  /**
   * What the hand has done so far.
   *
   * @return its positions at the ticks
   */
  public HandRecord record() {
    double[] times = new double[ticks + 1];
    for (int i = 0; i <= ticks; i++) {
      times[i] = i / (double) TICKS_PER_SECOND;
    }
    return HandRecord.of(times, Arrays.copyOf(stick, ticks + 1), Arrays.copyOf(pedal, ticks + 1));
  }
}
