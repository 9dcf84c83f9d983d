package org.rolltrace.core.pilot;

import org.rolltrace.core.quantity.Check;

/** The ranges that all shapes share. */
final class ShapeCheck {
  private ShapeCheck() {}

  static void common(double start, double size, double movement) {
    Check.notNegative("start, s,", start);
    Check.inRange("size, fraction of travel,", size, -1, 1);
    Check.notNegative("movement, s,", movement);
  }

  static void longerThanMovement(String role, double time, double movement) {
    Check.positive(role, time);
    if (!(time >= movement)) {
      throw new IllegalArgumentException(
          role
              + " is "
              + time
              + "; expected at least the movement of the hand, "
              + movement
              + " s");
    }
  }
}
