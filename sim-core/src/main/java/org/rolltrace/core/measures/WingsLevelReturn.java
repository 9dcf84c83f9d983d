package org.rolltrace.core.measures;

import static org.rolltrace.core.measures.MeasureDefinition.*;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.PilotInput;

/** Whether, and how fast, the wings come level by themselves. */
final class WingsLevelReturn {
  private static final double LEVEL = Math.toRadians(5);

  /** A bank below this at the start is no wing drop. */
  private static final double LEAST_BANK = Math.toRadians(1);

  private WingsLevelReturn() {}

  static List<Measure> of(Manoeuvre manoeuvre) {
    if (manoeuvre.slip() == SlipTreatment.HELD) {
      return none("held slip cannot return by itself; choose settled or free slip");
    }
    if (manoeuvre.start().kind() != SteadyState.Kind.WINGS_LEVEL) {
      return none(
          "the controls are not trimmed for wings level but for a "
              + manoeuvre.start().kind().word().replace('-', ' '));
    }
    Optional<PilotInput> shaking =
        manoeuvre.programme().inputs().stream()
            .filter(input -> input.shape().size() != 0 && !input.shape().isHeld())
            .findFirst();
    if (shaking.isPresent()) {
      return none(
          "a "
              + shaking.get().shape().name()
              + " leaves the aeroplane swinging, not with a wing down");
    }
    OptionalDouble back = manoeuvre.programme().backAtTrim(manoeuvre.duration());
    if (back.isEmpty()) {
      return none("a control is away from trim to the end of the manoeuvre");
    }
    double start = back.getAsDouble();
    TimeHistory history = manoeuvre.history();
    double bankThen = Curve.ofBank(history, 1, 0).at(start);
    double turns = 2 * Math.PI * Math.rint(bankThen / (2 * Math.PI));
    double reduced = bankThen - turns;
    if (Math.abs(reduced) < LEAST_BANK) {
      return none("no wing is down: the bank is less than 1 deg when the controls are at trim");
    }
    double side = Math.signum(reduced);
    Curve bank = Curve.ofBank(history, side, -side * turns);
    double end = manoeuvre.duration();
    double size = Math.abs(reduced);
    return List.of(
        timeToHalf(manoeuvre, bank, start, end, size),
        timeToLevel(bank, start, end),
        Measure.of(RETURN_OVERSHOOT, Math.max(0, -smallest(bank, start, end))));
  }

  private static List<Measure> none(String reason) {
    return List.of(
        Measure.missing(RETURN_TIME_TO_HALF, reason),
        Measure.missing(RETURN_TIME_TO_FIVE_DEGREES, reason),
        Measure.missing(RETURN_OVERSHOOT, reason));
  }

  private static Measure timeToHalf(
      Manoeuvre manoeuvre, Curve bank, double start, double end, double size) {
    OptionalDouble half = bank.firstAtOrBelow(0.5 * size, start, end);
    if (half.isPresent()) {
      return Measure.of(
          RETURN_TIME_TO_HALF, half.getAsDouble() - start, "with the controls held at trim");
    }
    double last = bank.at(end);
    OptionalDouble doubled = bank.firstAtOrAbove(2 * size, start, end);
    if (doubled.isPresent()) {
      return Measure.missing(
          RETURN_TIME_TO_HALF,
          Remark.of("diverging: the bank doubles in %.3g s", doubled.getAsDouble() - start));
    }
    Optional<Mode.Aperiodic> spiral = manoeuvre.modes().spiral();
    if (last > size && spiral.isPresent() && spiral.get().root() > 0) {
      return Measure.missing(
          RETURN_TIME_TO_HALF,
          Remark.of("diverging: the spiral doubles in %.3g s", spiral.get().timeToHalfOrDouble()));
    }
    return Measure.missing(
        RETURN_TIME_TO_HALF,
        Remark.of(
            "not reached in %.3g s: the bank is then %.3g deg; lengthen the duration",
            end - start, Math.toDegrees(last)));
  }

  private static Measure timeToLevel(Curve bank, double start, double end) {
    int last = bank.size() - 1;
    if (Math.abs(bank.value(last)) > LEVEL) {
      return Measure.missing(
          RETURN_TIME_TO_FIVE_DEGREES,
          Remark.of(
              "not reached in %.3g s: the bank is then %.3g deg",
              end - start, Math.toDegrees(bank.value(last))));
    }
    int index = last;
    while (index >= 0 && bank.time(index) >= start && Math.abs(bank.value(index)) <= LEVEL) {
      index--;
    }
    if (index < 0 || bank.time(index) < start) {
      return Measure.of(RETURN_TIME_TO_FIVE_DEGREES, 0);
    }
    double level = Math.copySign(LEVEL, bank.value(index));
    return Measure.of(
        RETURN_TIME_TO_FIVE_DEGREES, bank.crossing(index, level, bank.time(index)) - start);
  }

  private static double smallest(Curve bank, double start, double end) {
    double least = bank.at(start);
    for (int i = bank.indexAt(start); i < bank.size() && bank.time(i) <= end; i++) {
      least = Math.min(least, bank.value(i));
    }
    return least;
  }
}
