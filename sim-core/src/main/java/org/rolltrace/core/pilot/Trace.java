package org.rolltrace.core.pilot;

import java.util.Arrays;
import org.rolltrace.core.quantity.Check;

/** A recorded movement: positions at instants. Immutable. */
public final class Trace {
  private final String file;
  private final String column;
  private final double[] times;
  private final double[] positions;
  private final int firstAway;
  private final int firstBack;
  private final double largest;

  private Trace(String file, String column, double[] times, double[] positions) {
    this.file = file;
    this.column = column;
    this.times = times;
    this.positions = positions;
    int away = 0;
    while (away < positions.length && positions[away] == 0) {
      away++;
    }
    int back = positions.length;
    while (back > 0 && positions[back - 1] == 0) {
      back--;
    }
    this.firstAway = away;
    this.firstBack = back;
    this.largest = Arrays.stream(positions).map(Math::abs).max().orElse(0);
  }

  /**
   * A trace.
   *
   * @param file what the file that it is from is called
   * @param column what its column there is called
   * @param times s, increasing, at least two
   * @param positions fractions of travel, right positive, finite, as many as there are times
   * @return the trace
   */
  public static Trace of(String file, String column, double[] times, double[] positions) {
    if (times.length < 2 || times.length != positions.length) {
      throw new IllegalArgumentException(
          times.length
              + " times and "
              + positions.length
              + " positions; expected at least two, as many of one as of the other");
    }
    for (int i = 0; i < times.length; i++) {
      Check.finite("time, s,", times[i]);
      Check.finite("position, fraction of travel,", positions[i]);
      if (i > 0 && !(times[i] > times[i - 1])) {
        throw new IllegalArgumentException(
            "time is " + times[i] + " s after " + times[i - 1] + " s; expected increasing times");
      }
    }
    return new Trace(file, column, times.clone(), positions.clone());
  }

  /**
   * Where it is from.
   *
   * @return what the file is called
   */
  public String file() {
    return file;
  }

  /**
   * Where in the file it stands.
   *
   * @return what the column is called
   */
  public String column() {
    return column;
  }

  /**
   * The instants.
   *
   * @return s, increasing; a copy
   */
  public double[] times() {
    return times.clone();
  }

  /**
   * The positions at these instants.
   *
   * @return fractions of travel; a copy
   */
  public double[] positions() {
    return positions.clone();
  }

  /** How many samples there are. */
  int size() {
    return times.length;
  }

  double time(int index) {
    return times[index];
  }

  double position(int index) {
    return positions[index];
  }

  /** The first sample that is away from the trimmed position; the number of samples if none is. */
  int firstAway() {
    return firstAway;
  }

  /**
   * The sample from which on it is at the trimmed position; the number of samples if it never is.
   */
  int firstBack() {
    return firstBack;
  }

  /** The size of the largest position. */
  double largest() {
    return largest;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Trace trace
        && trace.file.equals(file)
        && trace.column.equals(column)
        && Arrays.equals(trace.times, times)
        && Arrays.equals(trace.positions, positions);
  }

  @Override
  public int hashCode() {
    return 31 * Arrays.hashCode(times) + Arrays.hashCode(positions);
  }

  /** The column and the file. */
  @Override
  public String toString() {
    return "column " + column + " of " + file;
  }
}
