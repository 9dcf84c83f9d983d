package org.rolltrace.core.flight;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeSet;
import java.util.stream.DoubleStream;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.pilot.PilotInput;

/** Computes one manoeuvre. */
public final class Flight {
  /** Steps below this mean that the equations cannot be followed, s. */
  private static final double SMALLEST_STEP = 1e-10;

  private static final double LARGEST_STEP = 1;
  private static final int MOST_EVALUATIONS = 20_000_000;
  private static final int MOST_SAMPLES = 1_000_000;

  /** Measures are read off at least this many samples a second, however few are asked for. */
  private static final double LEAST_RATE = 100;

  /** Events are looked for at least this often, s, and this many times in a stretch. */
  private static final double LOOK_EVERY = 0.05;

  private static final int LOOKS_PER_STRETCH = 16;

  /** The roll rate that an aeroplane may gain while nobody looks at its bank, rad/s. */
  private static final double QUICKEST_GAIN = 1;

  /** A state beyond this has left every range in which the equations mean something, rad, rad/s. */
  private static final double RANGE = 1e6;

  /** Breakpoints are kept to this, s; one that is closer to the end is taken for the end. */
  private static final double NANOSECOND = 1e-9;

  private final FlightPlan plan;
  private final FlightSettings settings;
  private final ControlledMotion controlled;
  private final SurfaceDrive stick;
  private final SurfaceDrive pedal;
  private final PowerDrive power;
  private final Optional<PilotInput> leading;
  private final DormandPrince853Integrator integrator;
  private final TimeHistory.Recorder recorder;
  private final List<FlightEvent> events = new ArrayList<>();
  private final List<Double> openCaptures;
  private final double[] sample;
  private final double[] row = new double[Channel.COUNT];
  private final DenseStep step;
  private OptionalDouble captureFrom = OptionalDouble.empty();
  private final int samplesPerEven;
  private int nextSample;
  private double reached;

  private Flight(FlightPlan plan, FlightSettings settings) {
    this.plan = plan;
    this.settings = settings;
    this.leading = plan.programme().leading(plan.duration());
    this.controlled =
        new ControlledMotion(plan, plan.programme().stick(), plan.programme().pedal());
    this.stick = controlled.stick();
    this.pedal = controlled.pedal();
    this.power = controlled.power();
    int states = controlled.dimension();
    this.sample = new double[states];
    this.step = new DenseStep(states);
    this.integrator =
        new DormandPrince853Integrator(
            SMALLEST_STEP,
            LARGEST_STEP,
            settings.absoluteTolerance(),
            settings.relativeTolerance());
    this.openCaptures = new ArrayList<>(plan.captures());
    this.samplesPerEven = samplesPerEven(settings);
    this.recorder =
        TimeHistory.recorder(
            settings.sampleRate(),
            (int) (plan.duration() * settings.sampleRate() * samplesPerEven) + 32);
  }

  /**
   * Computes a manoeuvre.
   *
   * @param plan what is flown
   * @param settings how finely
   * @return its history and events
   * @throws CalculationException when the step collapses, a state leaves the finite range, or the
   *     history would be too long
   */
  public static Flown fly(FlightPlan plan, FlightSettings settings) {
    if (plan.duration() * settings.sampleRate() * samplesPerEven(settings) > MOST_SAMPLES) {
      throw new CalculationException(
          "the history would have more than "
              + MOST_SAMPLES
              + " samples; shorten the duration or lower the sample rate");
    }
    return new Flight(plan, settings).run();
  }

  private static int samplesPerEven(FlightSettings settings) {
    return (int) Math.max(1, Math.ceil(LEAST_RATE / settings.sampleRate()));
  }

  /** When the next sample is due; every {@code samplesPerEven}-th is exactly an even one. */
  private double nextSampleTime() {
    int even = nextSample / samplesPerEven;
    return nextSample == even * samplesPerEven
        ? even / settings.sampleRate()
        : nextSample / (samplesPerEven * settings.sampleRate());
  }

  private Flown run() {
    double[] state = controlled.start();
    double start = 0;
    for (double end : stretchEnds()) {
      state = flyStretch(start, end, state);
      start = end;
    }
    events.sort(Comparator.comparingDouble(FlightEvent::time));
    return new Flown(recorder.finish(), events);
  }

  private NavigableSet<Double> stretchEnds() {
    NavigableSet<Double> ends = new TreeSet<>();
    DoubleStream.of(plan.programme().breakpoints())
        .filter(time -> time > 0 && time < plan.duration() - NANOSECOND)
        .forEach(ends::add);
    ends.add(plan.duration());
    return ends;
  }

  private double[] flyStretch(double start, double end, double[] state) {
    // At the end of the stretch a control that jumps there has not jumped yet.
    double last = Math.nextDown(end);
    if (leading.isPresent() && captureFrom.isEmpty() && start > leadingStart() - NANOSECOND) {
      captureFrom = OptionalDouble.of(state[LateralMotion.BANK]);
    }
    begin(stick, start, state);
    begin(pedal, start, state);
    beginTravel(power.lever(), start);
    record(start, start, state);
    if (nextSampleTime() <= start) {
      nextSample++;
    }

    integrator.clearEventDetectors();
    integrator.clearStepHandlers();
    integrator.setMaxEvaluations(MOST_EVALUATIONS);
    double look = Math.min(LOOK_EVERY, (end - start) / LOOKS_PER_STRETCH);
    addDetectors(stick, look, last);
    addDetectors(pedal, look, last);
    addStop(power.lever(), look, last);
    captureFrom.ifPresent(bank -> addCaptures(bank, look));
    integrator.addStepHandler(interpolator -> takeSamples(interpolator, end));

    double[] reachedState;
    try {
      reachedState =
          integrator
              .integrate(controlled.until(last), new ODEState(start, state), end)
              .getPrimaryState();
    } catch (MathRuntimeException failure) {
      throw new CalculationException(
          "the integration could not go on after "
              + reached
              + " s: "
              + failure.getMessage()
              + "; look for a derivative or inertia that is wrong by orders of magnitude, or shorten"
              + " the duration",
          failure);
    }
    record(end, last, reachedState);
    if (nextSampleTime() <= end) {
      nextSample++;
    }
    return reachedState;
  }

  private double leadingStart() {
    return leading.orElseThrow().shape().start();
  }

  private void beginTravel(Travel travel, double time) {
    if (travel.meetsOrLeavesStop(time)) {
      events.add(new FlightEvent.Stop(time, travel.control(), travel.isOnStop()));
    }
  }

  private void begin(SurfaceDrive drive, double time, double[] state) {
    beginTravel(drive.travel(), time);
    boolean slewed = drive.isSlewing();
    drive.chooseMode(time, state);
    if (drive.isSlewing() != slewed) {
      events.add(new FlightEvent.RateLimit(time, drive.control(), drive.isSlewing()));
    }
  }

  private void addStop(Travel travel, double look, double last) {
    if (travel.mayMeetStop()) {
      integrator.addEventDetector(
          new EventAt(
              look,
              s -> travel.beyondStop(Math.min(s.getTime(), last)),
              (s, detector, increasing) -> {
                recordEvent(s, last);
                travel.setOnStop(increasing);
                events.add(new FlightEvent.Stop(s.getTime(), travel.control(), increasing));
                return Action.RESET_DERIVATIVES;
              }));
    }
  }

  private void addDetectors(SurfaceDrive drive, double look, double last) {
    addStop(drive.travel(), look, last);
    if (drive.hasRateLimit()) {
      integrator.addEventDetector(
          new EventAt(
              look,
              s -> drive.switching(Math.min(s.getTime(), last), s.getPrimaryState()),
              (s, detector, increasing) -> {
                // A surface that begins to slew starts at the zero of its own end.
                if (increasing == drive.isSlewing()) {
                  return Action.CONTINUE;
                }
                recordEvent(s, last);
                drive.switchMode(Math.min(s.getTime(), last), s.getPrimaryState());
                events.add(
                    new FlightEvent.RateLimit(s.getTime(), drive.control(), drive.isSlewing()));
                return Action.RESET_DERIVATIVES;
              }));
    }
  }

  private void addCaptures(double fromBank, double look) {
    double direction = Math.signum(leading.orElseThrow().shape().size());
    for (double change : openCaptures) {
      integrator.addEventDetector(
          new EventAt(
              (s, forward) -> Math.max(look, timeToReach(s, direction, fromBank, change)),
              s -> direction * (s.getPrimaryState()[LateralMotion.BANK] - fromBank) - change,
              (s, detector, increasing) -> {
                if (increasing && openCaptures.remove(change)) {
                  events.add(new FlightEvent.BankCapture(s.getTime(), change));
                }
                return Action.CONTINUE;
              }));
    }
  }

  /** A time in which the bank cannot have changed by what is left, whatever the controls do. */
  private static double timeToReach(
      ODEStateAndDerivative at, double direction, double fromBank, double change) {
    double[] state = at.getPrimaryState();
    double left = Math.abs(direction * (state[LateralMotion.BANK] - fromBank) - change);
    return left / (2 * Math.abs(state[LateralMotion.ROLL_RATE]) + QUICKEST_GAIN);
  }

  private void takeSamples(ODEStateInterpolator interpolator, double stretchEnd) {
    ODEStateAndDerivative current = interpolator.getCurrentState();
    for (double value : current.getPrimaryState()) {
      if (!(Math.abs(value) <= RANGE)) {
        throw new CalculationException(
            "the motion leaves the finite range after "
                + reached
                + " s: the aeroplane diverges; look at its modes, or shorten the duration");
      }
    }
    double time = nextSampleTime();
    if (time <= current.getTime() && time < stretchEnd) {
      step.take(interpolator);
      while (time <= current.getTime() && time < stretchEnd) {
        step.stateAt(time, sample);
        record(time, time, sample);
        nextSample++;
        time = nextSampleTime();
      }
    }
    reached = current.getTime();
  }

  /** Takes a sample where a slope breaks: the largest roll acceleration is often just there. */
  private void recordEvent(ODEStateAndDerivative at, double last) {
    record(at.getTime(), Math.min(at.getTime(), last), at.getPrimaryState());
  }

  private void record(double time, double controlTime, double[] state) {
    controlled.row(controlTime, state, row);
    recorder.add(time, row);
  }
}
