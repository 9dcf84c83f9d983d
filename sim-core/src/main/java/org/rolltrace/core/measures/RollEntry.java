package org.rolltrace.core.measures;

import static org.rolltrace.core.measures.MeasureDefinition.*;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme.HeldStretch;

/** How the aeroplane enters a roll. */
final class RollEntry {
  private static final double STEADY_CHANGE = 0.01;
  private static final double HOLD_FOR_STEADY = 5;
  private static final double HOLD_FOR_MEAN = 3;
  private static final double LEAST_SHARE_OF_HOLD = 0.1;

  /** 1 − 1/e to the three figures in which the measure is defined. */
  private static final double RESPONSE_LEVEL = 0.632;

  /** Movements are kept to the nanosecond; a hold this close behind one follows from it, s. */
  private static final double MOVE_ENDS_WITHIN = 1e-6;

  private static final double BANK_OF_TURN = Math.toRadians(30);

  /** A turn that drifts by more than this before the control moves is not steady. */
  private static final double BANK_AGREES_WITHIN = Math.toRadians(0.1);

  private static final String WINDOW = "from %.2f to %.2f s, at banks from %.0f to %.0f deg";

  private static final String ALREADY_ROLLING =
      "the roll rate is at that level already when the control first moves";

  private final Manoeuvre manoeuvre;
  private final MeasureOptions options;

  RollEntry(Manoeuvre manoeuvre, MeasureOptions options) {
    this.manoeuvre = manoeuvre;
    this.options = options;
  }

  List<Measure> measures() {
    List<Measure> measures = new ArrayList<>();
    Measure timeConstant = rollModeTimeConstant();
    Optional<InputShape> leading =
        manoeuvre.programme().leading(manoeuvre.duration()).map(PilotInput::shape);
    if (leading.isEmpty()) {
      String reason =
          manoeuvre.programme().leading(Double.POSITIVE_INFINITY).isPresent()
              ? "the first input starts after the end of the manoeuvre"
              : manoeuvre.programme().isPowerAlone()
                  ? "neither stick nor pedals move: nothing says which way it should roll"
                  : "no control moves in this scenario";
      measures.add(Measure.missing(PEAK_ROLL_RATE, reason));
      measures.add(Measure.missing(STEADY_ROLL_RATE, reason));
      measures.add(timeConstant);
      measures.add(Measure.missing(RESPONSE_TIME_CONSTANT, reason));
      measures.add(Measure.missing(SETTLING_TIME, reason));
      measures.add(Measure.missing(RISE_TIME, reason));
      for (double degrees : options.bankChanges()) {
        measures.add(Measure.missing(timeToBank(degrees), reason));
      }
      measures.add(Measure.missing(TIME_BANK_TO_BANK_30, reason));
      measures.add(Measure.missing(ROLL_ACCELERATION, reason));
      measures.add(Measure.missing(HELIX_ANGLE_PEAK, reason));
      measures.add(Measure.missing(HELIX_ANGLE_STEADY, reason));
      measures.add(Measure.missing(TIP_INCIDENCE, reason));
      return measures;
    }
    InputShape input = leading.get();
    double direction = Math.signum(input.size());
    Curve rate = Curve.ofRollRate(manoeuvre.history(), direction);
    Optional<HeldStretch> hold = manoeuvre.programme().firstHold(manoeuvre.duration());

    Measure peak = peak(rate, input, direction);
    Measure steady = steady(rate, hold, timeConstant, direction);
    measures.add(peak);
    measures.add(steady);
    measures.add(timeConstant);
    double level = direction * steady.value().orElse(0);
    boolean oneMove =
        hold.isPresent()
            && hold.get().from() <= input.start() + input.handTime() + MOVE_ENDS_WITHIN;
    if (level > 0 && oneMove) {
      double release = hold.orElseThrow().to();
      measures.add(responseTimeConstant(rate, input, level, release));
      measures.add(settlingTime(rate, input, level, release));
      measures.add(riseTime(rate, input, level, release));
    } else {
      String reason =
          steady.value().isEmpty()
              ? "no steady roll rate to compare with"
              : level > 0
                  ? "the first movement of the stick is not the one that leads to the hold"
                  : "the steady roll rate is against the commanded direction";
      measures.add(Measure.missing(RESPONSE_TIME_CONSTANT, reason));
      measures.add(Measure.missing(SETTLING_TIME, reason));
      measures.add(Measure.missing(RISE_TIME, reason));
    }
    for (double degrees : options.bankChanges()) {
      measures.add(timeToBankChange(degrees, input.start()));
    }
    measures.add(bankToBank(input, direction));
    measures.add(rollAcceleration(rate, input, direction));
    measures.add(helix(HELIX_ANGLE_PEAK, peak));
    measures.add(helix(HELIX_ANGLE_STEADY, steady));
    measures.add(tipIncidence(helix(HELIX_ANGLE_PEAK, peak)));
    return measures;
  }

  private Measure rollModeTimeConstant() {
    LateralModes modes = manoeuvre.modes();
    if (modes.rollSpiral().isPresent()) {
      return Measure.missing(
          ROLL_MODE_TIME_CONSTANT, "roll and spiral are coupled into one swinging mode");
    }
    Mode.Aperiodic roll = modes.roll().orElseThrow();
    if (!(roll.root() < 0)) {
      return Measure.missing(
          ROLL_MODE_TIME_CONSTANT,
          Remark.of("the roll is not damped: its root is %.4g 1/s", roll.root()));
    }
    return switch (manoeuvre.slip()) {
      case FREE -> Measure.of(ROLL_MODE_TIME_CONSTANT, roll.timeConstant());
      case HELD, SETTLED ->
          Measure.of(
              ROLL_MODE_TIME_CONSTANT,
              roll.timeConstant(),
              "of the equations with " + manoeuvre.slip().word() + " slip");
    };
  }

  private Measure peak(Curve rate, InputShape input, double direction) {
    double peak = rate.largest(input.start(), manoeuvre.duration());
    return peak > 0
        ? Measure.of(PEAK_ROLL_RATE, direction * peak)
        : Measure.missing(PEAK_ROLL_RATE, "it never rolls in the commanded direction");
  }

  private Measure steady(
      Curve rate, Optional<HeldStretch> hold, Measure timeConstant, double direction) {
    if (hold.isEmpty()) {
      return Measure.missing(STEADY_ROLL_RATE, "no held stick in this scenario");
    }
    if (timeConstant.value().isEmpty()) {
      return Measure.missing(STEADY_ROLL_RATE, timeConstant.beside());
    }
    double tau = timeConstant.value().getAsDouble();
    double length = hold.get().length();
    double end = hold.get().to();
    double window = Math.max(tau, LEAST_SHARE_OF_HOLD * length);
    Remark notReached =
        Remark.of(
            "not reached: the stick is held for %.3g s, %.2g time constants", length, length / tau);
    if (length >= HOLD_FOR_STEADY * tau) {
      double mean = rate.mean(end - window, end);
      double relative = rate.spread(end - window, end) / Math.abs(mean);
      if (relative < STEADY_CHANGE) {
        return Measure.of(
            STEADY_ROLL_RATE, direction * mean, withWindow("mean " + WINDOW, end - window, end));
      }
      notReached =
          Remark.of(
              "not reached: the roll rate still changes by %.2g %% at the end", 100 * relative);
    }
    OptionalDouble period = manoeuvre.dutchRollPeriod();
    if (period.isPresent() && length >= HOLD_FOR_MEAN * tau && length >= period.getAsDouble()) {
      double from = end - period.getAsDouble();
      double mean = rate.mean(from, end);
      double swing = 0.5 * rate.spread(from, end);
      return Measure.of(
          STEADY_ROLL_RATE,
          direction * mean,
          withWindow(
              "mean over the last dutch-roll period of the free equations, "
                  + WINDOW
                  + "; it swings by ±%.2g deg/s",
              from,
              end,
              Math.toDegrees(swing)));
    }
    return Measure.missing(STEADY_ROLL_RATE, notReached);
  }

  /**
   * Where a mean was taken: the bank there shows how far the weight and the turn take part in it.
   */
  private Remark withWindow(String pattern, double from, double to, Double... further) {
    Curve bank = Curve.ofBank(manoeuvre.history(), 1, 0);
    List<Object> values = new ArrayList<>();
    values.add(from);
    values.add(to);
    values.add(Math.toDegrees(bank.at(from)));
    values.add(Math.toDegrees(bank.at(to)));
    values.addAll(List.of(further));
    return new Remark(pattern, values);
  }

  private static Measure responseTimeConstant(
      Curve rate, InputShape input, double level, double release) {
    if (rate.at(input.start()) >= RESPONSE_LEVEL * level) {
      return Measure.missing(RESPONSE_TIME_CONSTANT, ALREADY_ROLLING);
    }
    double middle = input.start() + 0.5 * input.handTime();
    return rate.firstAtOrAbove(RESPONSE_LEVEL * level, input.start(), release).stream()
        .mapToObj(time -> Measure.of(RESPONSE_TIME_CONSTANT, time - middle))
        .findFirst()
        .orElse(Measure.missing(RESPONSE_TIME_CONSTANT, "63.2 % is never reached"));
  }

  private Measure settlingTime(Curve rate, InputShape input, double level, double release) {
    double low = level - options.settlingBand() * Math.abs(level);
    double high = level + options.settlingBand() * Math.abs(level);
    int last = rate.indexAt(release);
    if (rate.time(last) > release) {
      last--;
    }
    if (!within(rate.value(last), low, high)) {
      return Measure.missing(SETTLING_TIME, "not settled by the release or the end");
    }
    for (int i = last - 1; i >= 0 && rate.time(i) >= input.start(); i--) {
      // what lies between two samples may be outside although they are not
      double from = rate.turnsIn(i) ? rate.turn(i) : rate.time(i);
      for (double out : new double[] {from, rate.time(i)}) {
        double value = rate.inInterval(i, out);
        if (!within(value, low, high)) {
          double bound = value < low ? low : high;
          return Measure.of(SETTLING_TIME, rate.crossing(i, bound, out) - input.start());
        }
      }
    }
    return Measure.of(SETTLING_TIME, 0);
  }

  private static boolean within(double value, double low, double high) {
    return value >= low && value <= high;
  }

  private static Measure riseTime(Curve rate, InputShape input, double level, double release) {
    if (rate.at(input.start()) >= 0.1 * level) {
      return Measure.missing(RISE_TIME, ALREADY_ROLLING);
    }
    OptionalDouble tenth = rate.firstAtOrAbove(0.1 * level, input.start(), release);
    OptionalDouble ninth = rate.firstAtOrAbove(0.9 * level, input.start(), release);
    return tenth.isPresent() && ninth.isPresent()
        ? Measure.of(RISE_TIME, ninth.getAsDouble() - tenth.getAsDouble())
        : Measure.missing(RISE_TIME, "90 % is never reached");
  }

  private Measure timeToBankChange(double degrees, double start) {
    Double time = manoeuvre.captures().get(Math.toRadians(degrees));
    return time == null
        ? Measure.missing(timeToBank(degrees), "not reached in this manoeuvre")
        : Measure.of(timeToBank(degrees), time - start);
  }

  private Measure bankToBank(InputShape input, double direction) {
    Curve bank = Curve.ofBank(manoeuvre.history(), direction, 0);
    double before = bank.at(input.start());
    if (manoeuvre.start().kind() != SteadyState.Kind.STEADY_TURN
        || !(Math.abs(Math.abs(before) - BANK_OF_TURN) <= BANK_AGREES_WITHIN)) {
      return Measure.missing(
          TIME_BANK_TO_BANK_30,
          "the control does not first move in a steady turn at 30 deg of bank");
    }
    if (before > 0) {
      return Measure.missing(
          TIME_BANK_TO_BANK_30, "the control first moves towards the wing that is down");
    }
    return bank.firstAtOrAbove(BANK_OF_TURN, input.start(), manoeuvre.duration()).stream()
        .mapToObj(time -> Measure.of(TIME_BANK_TO_BANK_30, time - input.start()))
        .findFirst()
        .orElse(Measure.missing(TIME_BANK_TO_BANK_30, "not reached in this manoeuvre"));
  }

  private static Measure rollAcceleration(Curve rate, InputShape input, double direction) {
    double best = rate.steepest(input.start());
    return best > 0
        ? Measure.of(ROLL_ACCELERATION, direction * best)
        : Measure.missing(ROLL_ACCELERATION, "it never accelerates in the commanded direction");
  }

  private Measure helix(MeasureDefinition definition, Measure rate) {
    return rate.value().isPresent()
        ? Measure.of(definition, rate.value().getAsDouble() * manoeuvre.halfSpanOverSpeed())
        : Measure.missing(definition, rate.beside());
  }

  private static Measure tipIncidence(Measure helix) {
    return helix.value().isPresent()
        ? Measure.of(TIP_INCIDENCE, Math.atan(helix.value().getAsDouble()))
        : Measure.missing(TIP_INCIDENCE, helix.beside());
  }
}
