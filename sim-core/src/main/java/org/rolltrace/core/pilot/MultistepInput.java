package org.rolltrace.core.pilot;

import java.util.List;

/**
 * Moves to one side and the other by turns, each kept for a whole number of units, then back:
 * 3-2-1-1 and its like. The moves begin one stay apart, and the last one leads back to where it
 * began.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size where it goes first, fraction of travel, −1 to 1; then to the other side, and so on
 * @param unit how long one unit lasts, s, at least {@code handTime}
 * @param pattern how many units it stays at each side, each 1 to {@value #LONGEST_STAY}; 1 to
 *     {@value #MOST_STAYS} of them
 * @param handTime how long each move takes, s, 0 or more
 */
public record MultistepInput(
    double start, double size, double unit, List<Integer> pattern, double handTime)
    implements InputShape {

  /**
   * 3-2-1-1, whose energy reaches over more than a decade of frequency (Koehler and Wilhelm,
   * Marchand, Plaetschke, DFVLR).
   */
  public static final List<Integer> DEFAULT_PATTERN = List.of(3, 2, 1, 1);

  /** The most units of one stay. */
  public static final int LONGEST_STAY = 1000;

  /** The most stays of a pattern. */
  public static final int MOST_STAYS = 100;

  public MultistepInput {
    pattern = List.copyOf(pattern);
    ShapeCheck.common(start, size, handTime);
    ShapeCheck.longerThanMovement("unit, s,", unit, handTime);
    if (pattern.isEmpty() || pattern.size() > MOST_STAYS) {
      throw new IllegalArgumentException(
          "pattern has " + pattern.size() + " stays; expected 1 to " + MOST_STAYS);
    }
    for (int stay : pattern) {
      if (stay < 1 || stay > LONGEST_STAY) {
        throw new IllegalArgumentException(
            "pattern is " + pattern + "; expected whole numbers from 1 to " + LONGEST_STAY);
      }
    }
  }

  @Override
  public String name() {
    return "multistep";
  }

  /**
   * The units of all stays together.
   *
   * @return their number
   */
  public int units() {
    int sum = 0;
    for (int stay : pattern) {
      sum += stay;
    }
    return sum;
  }

  @Override
  public double end() {
    return start + units() * unit + handTime;
  }

  @Override
  public boolean isHeld() {
    return false;
  }

  @Override
  public Movement movement() {
    double[] times = new double[pattern.size() + 1];
    double[] positions = new double[times.length];
    int before = 0;
    for (int i = 0; i < pattern.size(); i++) {
      times[i] = start + before * unit;
      positions[i] = i % 2 == 0 ? size : -size;
      before += pattern.get(i);
    }
    times[pattern.size()] = start + before * unit;
    return StraightMoves.of(handTime, times, positions);
  }
}
