package org.rolltrace.core.flight;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.TreeSet;
import java.util.stream.DoubleStream;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.Action;
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

  /** Room for samples where something breaks. */
  private static final int BREAKS = 32;

  /** Room for the samples of a usual outline; the history grows where it is not enough. */
  private static final int OUTLINE_SAMPLES = 256;

  /** Events are looked for at least this often, s, and this many times in a stretch. */
  private static final double LOOK_EVERY = 0.05;

  private static final int LOOKS_PER_STRETCH = 16;

  /** A state beyond this has left every range in which the equations mean something, rad, rad/s. */
  private static final double RANGE = 1e6;

  /** Breakpoints are kept to this, s; one that is closer to the end is taken for the end. */
  private static final double NANOSECOND = 1e-9;

  private final FlightPlan plan;
  private final ControlledMotion controlled;
  private final SurfaceDrive stick;
  private final SurfaceDrive pedal;
  private final PowerDrive power;
  private final Optional<PilotInput> leading;
  private final LeanIntegrator integrator;
  private final TimeHistory.Recorder recorder;
  private final List<FlightEvent> events = new ArrayList<>();
  private final BankCaptures captures;
  private final double[] sample;
  private final double[] row = new double[Channel.COUNT];
  private boolean capturesToBegin;
  private final SampleClock clock;
  private double reached;

  private Flight(FlightPlan plan, FlightSettings settings, SampleClock clock, int expectedSamples) {
    this.plan = plan;
    this.leading = plan.programme().leading(plan.duration());
    this.controlled =
        new ControlledMotion(plan, plan.programme().stick(), plan.programme().pedal());
    this.stick = controlled.stick();
    this.pedal = controlled.pedal();
    this.power = controlled.power();
    int states = controlled.dimension();
    this.sample = new double[states];
    this.integrator =
        new LeanIntegrator(
            states,
            SMALLEST_STEP,
            LARGEST_STEP,
            settings.absoluteTolerance(),
            settings.relativeTolerance());
    this.captures = new BankCaptures(plan.captures());
    this.capturesToBegin = leading.isPresent();
    this.clock = clock;
    this.recorder = TimeHistory.recorder(settings.sampleRate(), expectedSamples);
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
    EvenClock clock = new EvenClock(settings.sampleRate());
    double samples = plan.duration() * clock.samplesPerSecond();
    if (samples > MOST_SAMPLES) {
      throw tooManySamples();
    }
    return new Flight(plan, settings, clock, (int) samples + BREAKS).run();
  }

  /**
   * Computes a manoeuvre with only as many samples as measures need: a few in each step of the
   * integration.
   *
   * @param plan what is flown
   * @param settings how finely; there are no even samples, so their rate does not matter
   * @return its history and events
   * @throws CalculationException as {@link #fly} does
   */
  public static Flown outline(FlightPlan plan, FlightSettings settings) {
    return new Flight(plan, settings, new StepClock(), OUTLINE_SAMPLES).run();
  }

  private static CalculationException tooManySamples() {
    return new CalculationException(
        "the history would have more than "
            + MOST_SAMPLES
            + " samples; shorten the duration or lower the sample rate");
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
    if (capturesToBegin && start > leading.orElseThrow().shape().start() - NANOSECOND) {
      captures.begin(state[LateralMotion.BANK], Math.signum(leading.orElseThrow().shape().size()));
      capturesToBegin = false;
    }
    begin(stick, start, state);
    begin(pedal, start, state);
    beginTravel(power.lever(), start);
    record(start, start, state);
    clock.pass(start);

    integrator.clearEventDetectors();
    integrator.clearStepHandlers();
    integrator.setMaxEvaluations(MOST_EVALUATIONS);
    double look = Math.min(LOOK_EVERY, (end - start) / LOOKS_PER_STRETCH);
    addDetectors(stick, look, last);
    addDetectors(pedal, look, last);
    addStop(power.lever(), look, last);
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
    clock.pass(end);
    return reachedState;
  }

  private void beginTravel(Travel travel, double time) {
    travel.enter(time);
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

  private void takeSamples(ODEStateInterpolator interpolator, double stretchEnd) {
    ODEStateAndDerivative current = interpolator.getCurrentState();
    double[] state = current.getPrimaryState();
    for (double value : state) {
      if (!(Math.abs(value) <= RANGE)) {
        throw new CalculationException(
            "the motion leaves the finite range after "
                + reached
                + " s: the aeroplane diverges; look at its modes, or shorten the duration");
      }
    }
    DenseStep step = (DenseStep) interpolator;
    double from = interpolator.getPreviousState().getTime();
    reached = current.getTime();
    clock.enter(from, reached);
    if (recorder.size() > 2 * MOST_SAMPLES) {
      throw tooManySamples();
    }
    while (clock.due() <= reached && clock.due() < stretchEnd) {
      double time = clock.due();
      step.stateAt(time, sample);
      record(time, time, sample);
      captures.look(step, from, time, sample, events);
      from = time;
      clock.advance();
    }
    captures.look(step, from, reached, state, events);
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
