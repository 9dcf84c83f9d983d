package org.rolltrace.core.pilot;

import java.util.Arrays;
import java.util.stream.DoubleStream;
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

  /**
   * When it begins.
   *
   * @return s
   */
  public double begin() {
    return times[0];
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
   * A piece of it.
   *
   * @param from s; what is before is left out
   * @param to s; what is after is left out
   * @return the trace from {@code from} to {@code to}, where these lie inside it
   * @throws IllegalArgumentException when nothing is left
   */
  public Trace between(double from, double to) {
    double first = Math.max(from, begin());
    double last = Math.min(to, end());
    if (!(last > first)) {
      throw new IllegalArgumentException(
          "the piece lasts from "
              + first
              + " s to "
              + last
              + " s; expected a piece of "
              + begin()
              + " s to "
              + end()
              + " s");
    }
    if (first == begin() && last == end()) {
      return this;
    }
    double[] cut =
        DoubleStream.concat(
                DoubleStream.of(first, last),
                Arrays.stream(times).filter(time -> time > first && time < last))
            .sorted()
            .toArray();
    return new Trace(file, column, cut, Arrays.stream(cut).map(this::at).toArray());
  }

  /** The position at an instant inside, straight between samples. */
  private double at(double time) {
    int found = Arrays.binarySearch(times, time);
    if (found >= 0) {
      return positions[found];
    }
    int next = -found - 1;
    double share = (time - times[next - 1]) / (times[next] - times[next - 1]);
    return positions[next - 1] + share * (positions[next] - positions[next - 1]);
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
