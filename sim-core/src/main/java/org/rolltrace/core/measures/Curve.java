package org.rolltrace.core.measures;

import java.util.OptionalDouble;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;

/**
 * A sampled quantity with its sampled slope, turned so that the wanted direction is positive.
 * Between two samples it is the cubic that has their values and slopes.
 */
final class Curve {
  /** Halvings after which an instant inside a sample interval is known to rounding. */
  private static final int HALVINGS = 50;

  private final TimeHistory history;
  private final Channel values;
  private final Channel slopes;
  private final double factor;
  private final double shift;

  private Curve(TimeHistory history, Channel values, Channel slopes, double factor, double shift) {
    this.history = history;
    this.values = values;
    this.slopes = slopes;
    this.factor = factor;
    this.shift = shift;
  }

  /** The roll rate times a factor. */
  static Curve ofRollRate(TimeHistory history, double factor) {
    return new Curve(history, Channel.ROLL_RATE, Channel.ROLL_ACCELERATION, factor, 0);
  }

  /**
   * The bank times a factor plus a constant, with the roll rate as its slope. In a climb the bank's
   * slope differs a little from the roll rate, which moves nothing by more than the sampling does.
   */
  static Curve ofBank(TimeHistory history, double factor, double shift) {
    return new Curve(history, Channel.BANK, Channel.ROLL_RATE, factor, shift);
  }

  int size() {
    return history.size();
  }

  double time(int index) {
    return history.time(index);
  }

  double value(int index) {
    return factor * history.value(values, index) + shift;
  }

  double slope(int index) {
    return factor * history.value(slopes, index);
  }

  /** The first sample at or after an instant; the one after the jump where it stands twice. */
  int indexAt(double time) {
    int index = history.lastAt(time);
    return history.time(index) < time && index + 1 < size() ? index + 1 : index;
  }

  double at(double time) {
    int index = history.lastAt(time);
    return index + 1 < size() ? inInterval(index, time) : value(index);
  }

  /** The cubic between two samples at an instant. */
  double inInterval(int index, double time) {
    double h = time(index + 1) - time(index);
    if (h <= 0) {
      return value(index + 1);
    }
    double s = (time - time(index)) / h;
    double rest = 1 - s;
    return value(index) * (1 + 2 * s) * rest * rest
        + h * slope(index) * s * rest * rest
        + value(index + 1) * (3 - 2 * s) * s * s
        - h * slope(index + 1) * s * s * rest;
  }

  /** The first instant in [from, to] at which the curve rises to a level, or is at or above it. */
  OptionalDouble firstAtOrAbove(double level, double from, double to) {
    if (at(from) >= level) {
      return OptionalDouble.of(from);
    }
    for (int i = history.lastAt(from); i + 1 < size() && time(i) < to; i++) {
      if (value(i + 1) >= level && time(i + 1) > from) {
        double crossing = crossing(i, level, Math.max(from, time(i)));
        return crossing <= to ? OptionalDouble.of(crossing) : OptionalDouble.empty();
      }
    }
    return OptionalDouble.empty();
  }

  /** The first instant in [from, to] at which the curve falls to a level, or is at or below it. */
  OptionalDouble firstAtOrBelow(double level, double from, double to) {
    return negated().firstAtOrAbove(-level, from, to);
  }

  private Curve negated() {
    return new Curve(history, values, slopes, -factor, -shift);
  }

  /** Where the curve passes a level between two samples that lie on either side of it. */
  double crossing(int index, double level, double from) {
    double low = from;
    double high = time(index + 1);
    boolean lowIsBelow = at(low) < level;
    for (int i = 0; i < HALVINGS && high > low; i++) {
      double middle = 0.5 * (low + high);
      if (inInterval(index, middle) < level == lowIsBelow) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }

  /** The largest value in [from, to]. */
  double largest(double from, double to) {
    double best = Math.max(at(from), at(to));
    for (int i = history.lastAt(from); i < size() && time(i) <= to; i++) {
      if (time(i) >= from) {
        best = Math.max(best, value(i));
      }
      if (i + 1 < size() && slope(i) > 0 && turnsIn(i)) {
        best = Math.max(best, at(Math.max(from, Math.min(to, turn(i)))));
      }
    }
    return best;
  }

  /** Whether the slope changes its sign between two samples. */
  boolean turnsIn(int index) {
    return slope(index) * slope(index + 1) < 0 && time(index + 1) > time(index);
  }

  /** When the cubic between two samples turns, where its slope changes its sign. */
  double turn(int index) {
    double h = time(index + 1) - time(index);
    if (h <= 0) {
      return time(index);
    }
    double rise = value(index + 1) - value(index);
    double first = h * slope(index);
    double last = h * slope(index + 1);
    double linear = 3 * rise - 2 * first - last;
    double square = 3 * (first + last - 2 * rise);
    double root = Math.copySign(Math.sqrt(linear * linear - square * first), first);
    return time(index) + h * (first / (root - linear));
  }

  /** The largest slope from an instant on: of a sample, or of the cubic on either side of it. */
  double steepest(double from) {
    int first = indexAt(from);
    int steepest = first;
    for (int i = first; i < size(); i++) {
      if (slope(i) > slope(steepest)) {
        steepest = i;
      }
    }
    return Math.max(
        steepest > first ? steepestInside(steepest - 1) : slope(steepest),
        steepestInside(steepest));
  }

  private double steepestInside(int index) {
    double steepest = slope(index);
    if (index + 1 == size()) {
      return steepest;
    }
    steepest = Math.max(steepest, slope(index + 1));
    double h = time(index + 1) - time(index);
    double rise = (value(index + 1) - value(index)) / h;
    double linear = 3 * rise - 2 * slope(index) - slope(index + 1);
    double square = 3 * (slope(index) + slope(index + 1) - 2 * rise);
    boolean peaks = h > 0 && linear > 0 && linear + square < 0;
    return peaks ? slope(index) - linear * linear / square : steepest;
  }

  /** The mean over [from, to], from &lt; to. */
  double mean(double from, double to) {
    double integral = 0;
    for (int i = history.lastAt(from); i + 1 < size() && time(i) < to; i++) {
      double begin = Math.max(from, time(i));
      double end = Math.min(to, time(i + 1));
      // Simpson's rule, which is exact for a cubic.
      if (end > begin) {
        integral +=
            (end - begin)
                / 6
                * (inInterval(i, begin)
                    + 4 * inInterval(i, 0.5 * (begin + end))
                    + inInterval(i, end));
      }
    }
    return integral / (to - from);
  }

  /** The largest less the smallest value in [from, to]. */
  double spread(double from, double to) {
    return largest(from, to) + negated().largest(from, to);
  }
}
