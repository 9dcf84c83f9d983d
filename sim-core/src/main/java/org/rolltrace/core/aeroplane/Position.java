package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * A place in the aeroplane, from the centre of gravity.
 *
 * @param x m, positive ahead
 * @param y m, positive to the right
 * @param z m, positive below
 */
public record Position(double x, double y, double z) {

  /** The centre of gravity. */
  public static final Position ORIGIN = new Position(0, 0, 0);

  public Position {
    Check.finite("position x, m,", x);
    Check.finite("position y, m,", y);
    Check.finite("position z, m,", z);
  }
}
