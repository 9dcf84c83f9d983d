package org.rolltrace.core.pilot;

import java.util.List;
import org.rolltrace.core.quantity.Check;

/**
 * The sideslip that the pilot holds, against time: straight from point to point, that of the first
 * point before it and that of the last point after it. Immutable.
 */
public final class HeldSideslip {
  /** The ball in the middle. */
  public static final HeldSideslip NONE = new HeldSideslip(List.of(), Movement.NONE, 0);

  /** The largest sideslip, rad. */
  public static final double LARGEST = Math.PI / 2;

  private final List<Point> points;
  private final Movement change;
  private final double first;

  private HeldSideslip(List<Point> points, Movement change, double first) {
    this.points = points;
    this.change = change;
    this.first = first;
  }

  /**
   * A sideslip at an instant.
   *
   * @param time s, 0 or more
   * @param sideslip β, rad, wind from the right positive, at most {@link #LARGEST} either way
   */
  public record Point(double time, double sideslip) {
    public Point {
      Check.notNegative("time, s,", time);
      Check.inRange("sideslip, rad,", sideslip, -LARGEST, LARGEST);
    }
  }

  /**
   * A sideslip against time.
   *
   * @param points with increasing times; none for the ball in the middle
   * @return the sideslip
   */
  public static HeldSideslip of(List<Point> points) {
    if (points.isEmpty()) {
      return NONE;
    }
    double first = points.get(0).sideslip();
    double[] times = new double[points.size()];
    double[] changes = new double[points.size()];
    for (int i = 0; i < times.length; i++) {
      times[i] = points.get(i).time();
      changes[i] = points.get(i).sideslip() - first;
      if (i > 0 && !(times[i] > times[i - 1])) {
        throw new IllegalArgumentException(
            "time is " + times[i] + " s after " + times[i - 1] + " s; expected increasing times");
      }
    }
    return new HeldSideslip(List.copyOf(points), StraightMoves.through(times, changes), first);
  }

  /**
   * The same sideslip all the time.
   *
   * @param sideslip β, rad, wind from the right positive, at most {@link #LARGEST} either way
   * @return the sideslip
   */
  public static HeldSideslip constant(double sideslip) {
    return of(List.of(new Point(0, sideslip)));
  }

  /**
   * The points.
   *
   * @return as given; none for the ball in the middle
   */
  public List<Point> points() {
    return points;
  }

  /**
   * Whether the ball stays in the middle without anything being said.
   *
   * @return true when there is no point
   */
  public boolean isNone() {
    return points.isEmpty();
  }

  /**
   * The sideslip at an instant.
   *
   * @param time s
   * @return β, rad
   */
  public double at(double time) {
    return first + change.positionAt(time);
  }

  /**
   * Its rate; at a breakpoint, the one after it.
   *
   * @param time s
   * @return β̇, rad/s
   */
  public double rateAt(double time) {
    return change.rateAt(time);
  }

  /**
   * The instants at which its rate jumps.
   *
   * @return times, s, increasing; a copy
   */
  public double[] breakpoints() {
    return change.breakpoints();
  }
}
