package org.rolltrace.core.pilot;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;

/** All inputs of a scenario. Inputs on the same control add up. */
public final class PilotProgramme {
  /** Below this a position counts as centred, fraction of travel: rounding, not a hand. */
  private static final double CENTRED = 1e-9;

  private final List<PilotInput> inputs;
  private final Movement stick;
  private final Movement pedal;
  private final Movement power;
  private final HeldSideslip heldSideslip;

  private PilotProgramme(List<PilotInput> inputs, HeldSideslip heldSideslip) {
    this.inputs = List.copyOf(inputs);
    this.heldSideslip = heldSideslip;
    this.stick = movementOf(Control.STICK);
    this.pedal = movementOf(Control.PEDAL);
    this.power = movementOf(Control.POWER);
  }

  /**
   * A programme of inputs.
   *
   * @param inputs in any order; may be empty
   * @return the programme
   */
  public static PilotProgramme of(List<PilotInput> inputs) {
    return new PilotProgramme(inputs, HeldSideslip.NONE);
  }

  /**
   * The same with a sideslip that the pilot holds.
   *
   * @param sideslip against time
   * @return the programme
   */
  public PilotProgramme holding(HeldSideslip sideslip) {
    return new PilotProgramme(inputs, sideslip);
  }

  /**
   * The same with stick and pedals left to somebody else.
   *
   * @return a programme without inputs on them
   */
  public PilotProgramme handsOff() {
    return new PilotProgramme(
        inputs.stream()
            .filter(input -> input.control() != Control.STICK && input.control() != Control.PEDAL)
            .toList(),
        heldSideslip);
  }

  private Movement movementOf(Control control) {
    Movement[] parts =
        inputs.stream()
            .filter(input -> input.control() == control)
            .map(input -> input.shape().movement())
            .toArray(Movement[]::new);
    return switch (parts.length) {
      case 0 -> Movement.NONE;
      case 1 -> parts[0];
      default -> new SummedMovement(parts);
    };
  }

  /**
   * The inputs.
   *
   * @return as given
   */
  public List<PilotInput> inputs() {
    return inputs;
  }

  /**
   * The movement of the stick.
   *
   * @return the sum of all stick inputs
   */
  public Movement stick() {
    return stick;
  }

  /**
   * The movement of the pedals.
   *
   * @return the sum of all pedal inputs
   */
  public Movement pedal() {
    return pedal;
  }

  /**
   * The movement of the power levers.
   *
   * @return the sum of all power inputs, part of the rated power, added to that at the start
   */
  public Movement power() {
    return power;
  }

  /**
   * Whether the power moves and nothing else does.
   *
   * @return true when there is an input on the power, and none on stick or pedals
   */
  public boolean isPowerAlone() {
    return power.largestPosition() > 0
        && stick.largestPosition() == 0
        && pedal.largestPosition() == 0;
  }

  /**
   * The sideslip that the pilot holds, however the pedals have to be moved for it.
   *
   * @return against time; none unless one was given
   */
  public HeldSideslip heldSideslip() {
    return heldSideslip;
  }

  /**
   * The instants at which the integration has to start anew.
   *
   * @return breakpoints of stick, pedals, power and held sideslip, s, increasing
   */
  public double[] breakpoints() {
    return Stream.of(
            stick.breakpoints(),
            pedal.breakpoints(),
            power.breakpoints(),
            heldSideslip.breakpoints())
        .flatMapToDouble(DoubleStream::of)
        .sorted()
        .distinct()
        .toArray();
  }

  /**
   * The input from which times count: the first that moves the stick, or the pedals where the stick
   * stays still.
   *
   * @param end the end of the manoeuvre, s; what starts then or later does not count
   * @return the input, or empty when nothing moves
   */
  public Optional<PilotInput> leading(double end) {
    return firstOn(Control.STICK, end).or(() -> firstOn(Control.PEDAL, end));
  }

  private Optional<PilotInput> firstOn(Control control, double end) {
    return inputs.stream()
        .filter(input -> input.control() == control && input.shape().size() != 0)
        .filter(input -> input.shape().start() < end)
        .min(Comparator.comparingDouble(input -> input.shape().start()));
  }

  /**
   * The first stretch of time over which the stick is held still, away from its trimmed position,
   * by inputs meant to be held.
   *
   * @param end the end of the manoeuvre, s
   * @return the stretch, or empty when there is none
   */
  public Optional<HeldStretch> firstHold(double end) {
    double[] breaks = stick.breakpoints();
    for (int i = 0; i < breaks.length; i++) {
      double from = breaks[i];
      double position = stick.positionAt(from);
      if (from >= end || !isRest(from) || Math.abs(position) < CENTRED || !onlyHeldInputsAt(from)) {
        continue;
      }
      int next = i + 1;
      while (next < breaks.length
          && isRest(breaks[next])
          && Math.abs(stick.positionAt(breaks[next]) - position) < CENTRED) {
        next++;
      }
      return Optional.of(
          new HeldStretch(from, next < breaks.length ? Math.min(breaks[next], end) : end));
    }
    return Optional.empty();
  }

  private boolean isRest(double time) {
    return stick.rateAt(time) == 0;
  }

  private boolean onlyHeldInputsAt(double time) {
    return inputs.stream()
        .filter(input -> input.control() == Control.STICK)
        .map(PilotInput::shape)
        .filter(shape -> shape.start() <= time && time < shape.end())
        .allMatch(InputShape::isHeld);
  }

  /**
   * When stick, pedals and power have come back to where they were at the start, to stay there.
   *
   * @param end the end of the manoeuvre, s
   * @return s, 0 when nothing moves; empty when one is away from there at the end
   */
  public OptionalDouble backAtTrim(double end) {
    double last = 0;
    for (double time : breakpoints()) {
      if (time < end) {
        last = time;
      }
    }
    double at = last;
    boolean away =
        Stream.of(stick, pedal, power)
            .anyMatch(moved -> Math.abs(moved.positionAt(at)) >= CENTRED || moved.rateAt(at) != 0);
    return away ? OptionalDouble.empty() : OptionalDouble.of(last);
  }

  /**
   * When the stick first begins a move that ends at its trimmed position.
   *
   * @return s, or empty when it never goes back
   */
  public OptionalDouble firstCentring() {
    double[] breaks = stick.breakpoints();
    for (int i = 0; i < breaks.length; i++) {
      double before = stick.positionAt(Math.nextDown(breaks[i]));
      boolean away = Math.abs(before) >= CENTRED;
      boolean centredAtOnce = Math.abs(stick.positionAt(breaks[i])) < CENTRED;
      boolean centredByNext =
          i + 1 < breaks.length
              && Math.abs(stick.positionAt(breaks[i + 1])) < CENTRED
              && isRest(breaks[i + 1]);
      if (away && (centredAtOnce || (centredByNext && !isRest(breaks[i])))) {
        return OptionalDouble.of(breaks[i]);
      }
    }
    return OptionalDouble.empty();
  }

  /**
   * A stretch of time.
   *
   * @param from s
   * @param to s
   */
  public record HeldStretch(double from, double to) {

    /**
     * How long it lasts.
     *
     * @return s
     */
    public double length() {
      return to - from;
    }
  }
}
