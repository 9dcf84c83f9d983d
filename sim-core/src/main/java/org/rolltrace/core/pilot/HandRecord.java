package org.rolltrace.core.pilot;

import java.util.Arrays;
import org.rolltrace.core.quantity.Check;

/**
 * What a hand did with stick and pedals: positions at instants, straight between them. Immutable.
 */
public final class HandRecord {
  /** What a position may be off a straight line and still count as on it, fraction of travel. */
  private static final double STRAIGHT = 1e-9;

  private final double[] times;
  private final double[] stick;
  private final double[] pedal;

  private HandRecord(double[] times, double[] stick, double[] pedal) {
    this.times = times;
    this.stick = stick;
    this.pedal = pedal;
  }

  /**
   * A record.
   *
   * @param times s, increasing from 0 or later, at least one
   * @param stick fractions of travel from the trimmed position, right positive, −1 to 1, as many
   * @param pedal the same of the pedals
   * @return the record
   */
  public static HandRecord of(double[] times, double[] stick, double[] pedal) {
    if (times.length == 0 || stick.length != times.length || pedal.length != times.length) {
      throw new IllegalArgumentException(
          times.length
              + " times, "
              + stick.length
              + " stick and "
              + pedal.length
              + " pedal positions; expected at least one, as many of each");
    }
    for (int i = 0; i < times.length; i++) {
      Check.notNegative("time, s,", times[i]);
      Check.inRange("stick position, fraction of travel,", stick[i], -1, 1);
      Check.inRange("pedal position, fraction of travel,", pedal[i], -1, 1);
      if (i > 0 && !(times[i] > times[i - 1])) {
        throw new IllegalArgumentException(
            "time is " + times[i] + " s after " + times[i - 1] + " s; expected increasing times");
      }
    }
    return new HandRecord(times.clone(), stick.clone(), pedal.clone());
  }

  /**
   * How many instants there are.
   *
   * @return the number, at least 1
   */
  public int size() {
    return times.length;
  }

  /**
   * An instant.
   *
   * @param index from 0
   * @return s
   */
  public double time(int index) {
    return times[index];
  }

  /**
   * Where a control was.
   *
   * @param control stick or pedal
   * @param index of the instant, from 0
   * @return fraction of travel from the trimmed position, right positive
   */
  public double position(Control control, int index) {
    return positions(control)[index];
  }

  private double[] positions(Control control) {
    return switch (control) {
      case STICK -> stick;
      case PEDAL -> pedal;
      case POWER -> throw new IllegalArgumentException("a hand record has no power");
    };
  }

  /**
   * When it ends.
   *
   * @return s
   */
  public double end() {
    return times[times.length - 1];
  }

  /**
   * Whether a control was moved at all.
   *
   * @param control stick or pedal
   * @return false when it stayed at its trimmed position
   */
  public boolean moves(Control control) {
    return Arrays.stream(positions(control)).anyMatch(position -> position != 0);
  }

  /**
   * The same movement with fewer instants: those are left out at which both controls are on the
   * straight line between the instants that stay.
   *
   * @return a record that is nowhere more than 1e-9 of the travel from this one
   */
  public HandRecord simplified() {
    int[] kept = new int[times.length];
    int count = 0;
    int anchor = 0;
    kept[count++] = anchor;
    Cone forStick = new Cone(stick);
    Cone forPedal = new Cone(pedal);
    for (int i = 1; i < times.length; i++) {
      if (!forStick.reaches(anchor, i) || !forPedal.reaches(anchor, i)) {
        anchor = i - 1;
        kept[count++] = anchor;
        forStick.open();
        forPedal.open();
      }
      forStick.narrow(anchor, i);
      forPedal.narrow(anchor, i);
    }
    if (times.length > 1) {
      kept[count++] = times.length - 1;
    }
    return new HandRecord(at(kept, count, times), at(kept, count, stick), at(kept, count, pedal));
  }

  private static double[] at(int[] indices, int count, double[] values) {
    double[] found = new double[count];
    for (int i = 0; i < count; i++) {
      found[i] = values[indices[i]];
    }
    return found;
  }

  /** The slopes of lines from an anchor that pass all positions since. */
  private final class Cone {
    private final double[] positions;
    private double least = Double.NEGATIVE_INFINITY;
    private double most = Double.POSITIVE_INFINITY;

    Cone(double[] positions) {
      this.positions = positions;
    }

    void open() {
      least = Double.NEGATIVE_INFINITY;
      most = Double.POSITIVE_INFINITY;
    }

    boolean reaches(int anchor, int index) {
      double slope = (positions[index] - positions[anchor]) / (times[index] - times[anchor]);
      return slope >= least && slope <= most;
    }

    void narrow(int anchor, int index) {
      double step = times[index] - times[anchor];
      double rise = positions[index] - positions[anchor];
      least = Math.max(least, (rise - STRAIGHT) / step);
      most = Math.min(most, (rise + STRAIGHT) / step);
    }
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof HandRecord record
        && Arrays.equals(record.times, times)
        && Arrays.equals(record.stick, stick)
        && Arrays.equals(record.pedal, pedal);
  }

  @Override
  public int hashCode() {
    return 31 * (31 * Arrays.hashCode(times) + Arrays.hashCode(stick)) + Arrays.hashCode(pedal);
  }

  /** How many instants there are, and when it ends. */
  @Override
  public String toString() {
    return times.length + " instants to " + end() + " s";
  }
}
