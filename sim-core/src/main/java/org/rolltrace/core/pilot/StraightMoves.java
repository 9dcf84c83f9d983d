package org.rolltrace.core.pilot;

import java.util.Arrays;

/** Moves in straight lines from one position to the next, with rests between them. */
final class StraightMoves implements Movement {
  private static final double TICKS_PER_SECOND = 1e9;

  /** Piece i holds from starts[i] on: from[i] + rate[i] (t − starts[i]). Before the first, 0. */
  private final double[] starts;

  private final double[] from;
  private final double[] rate;
  private final double largest;

  private StraightMoves(double[] starts, double[] from, double[] rate, double largest) {
    this.starts = starts;
    this.from = from;
    this.rate = rate;
    this.largest = largest;
  }

  /**
   * Moves that each take the same time.
   *
   * @param movement how long each move takes, s; 0 for jumps
   * @param times when each move begins, s, increasing by at least {@code movement}
   * @param positions where each move ends, fraction of travel
   * @return the movement
   */
  static StraightMoves of(double movement, double[] times, double[] positions) {
    int pieces = 2 * times.length;
    double[] starts = new double[pieces];
    double[] from = new double[pieces];
    double[] rate = new double[pieces];
    int piece = 0;
    double position = 0;
    double largest = 0;
    for (int i = 0; i < times.length; i++) {
      double begin = toNanosecond(times[i]);
      double end = toNanosecond(times[i] + movement);
      if (end > begin) {
        if (piece > 0 && starts[piece - 1] >= begin) {
          piece--; // the rest between two moves has no length
        }
        starts[piece] = begin;
        from[piece] = position;
        rate[piece] = (positions[i] - position) / (end - begin);
        piece++;
      }
      starts[piece] = end;
      from[piece] = positions[i];
      piece++;
      position = positions[i];
      largest = Math.max(largest, Math.abs(position));
    }
    return new StraightMoves(
        Arrays.copyOf(starts, piece),
        Arrays.copyOf(from, piece),
        Arrays.copyOf(rate, piece),
        largest);
  }

  /**
   * Straight from point to point; 0 before the first, the last position from the last on.
   *
   * @param times s, increasing; closer than a nanosecond they make a jump
   * @param positions fraction of travel
   * @return the movement
   */
  static StraightMoves through(double[] times, double[] positions) {
    double[] starts = new double[times.length];
    double[] from = new double[times.length];
    double[] rate = new double[times.length];
    int piece = 0;
    double largest = 0;
    for (int i = 0; i < times.length; i++) {
      largest = Math.max(largest, Math.abs(positions[i]));
      double begin = toNanosecond(times[i]);
      double end = i + 1 < times.length ? toNanosecond(times[i + 1]) : Double.POSITIVE_INFINITY;
      double slope = i + 1 < times.length ? (positions[i + 1] - positions[i]) / (end - begin) : 0;
      boolean goesOn = slope == 0 && (piece > 0 ? rests(piece - 1, from, rate) : 0) == positions[i];
      if (end > begin && !goesOn) {
        starts[piece] = begin;
        from[piece] = positions[i];
        rate[piece] = slope;
        piece++;
      }
    }
    return new StraightMoves(
        Arrays.copyOf(starts, piece),
        Arrays.copyOf(from, piece),
        Arrays.copyOf(rate, piece),
        largest);
  }

  /** Where a piece rests; NaN where it moves. */
  private static double rests(int piece, double[] from, double[] rate) {
    return rate[piece] == 0 ? from[piece] : Double.NaN;
  }

  private static double toNanosecond(double time) {
    return Math.rint(time * TICKS_PER_SECOND) / TICKS_PER_SECOND;
  }

  private int pieceAt(double time) {
    int found = Arrays.binarySearch(starts, time);
    return found >= 0 ? found : -found - 2;
  }

  @Override
  public Stroke from(double start) {
    int piece = pieceAt(start);
    return piece < 0
        ? StraightStroke.REST
        : new StraightStroke(starts[piece], from[piece], rate[piece]);
  }

  @Override
  public double positionAt(double time) {
    int piece = pieceAt(time);
    return piece < 0 ? 0 : from[piece] + rate[piece] * (time - starts[piece]);
  }

  @Override
  public double rateAt(double time) {
    int piece = pieceAt(time);
    return piece < 0 ? 0 : rate[piece];
  }

  @Override
  public double[] breakpoints() {
    return starts.clone();
  }

  @Override
  public double largestPosition() {
    return largest;
  }
}
