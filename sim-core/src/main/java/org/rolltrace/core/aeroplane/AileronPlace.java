package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * Where on the half wing an aileron is.
 *
 * @param from its inner end from the plane of symmetry, m, 0 or more
 * @param to its outer end, m, above {@code from}
 * @param chordShare its chord behind the hinge by that of the wing, above 0 and below 1
 */
public record AileronPlace(double from, double to, double chordShare) {

  public AileronPlace {
    Check.notNegative("inner end of the aileron, m,", from);
    Check.finite("outer end of the aileron, m,", to);
    if (!(to > from)) {
      throw new IllegalArgumentException(
          "the aileron reaches from "
              + from
              + " m to "
              + to
              + " m; expected an outer end further out");
    }
    checkShare(chordShare);
  }

  static void checkShare(double chordShare) {
    if (!(chordShare > 0 && chordShare < 1)) {
      throw new IllegalArgumentException(
          "chord share is " + chordShare + "; expected a number above 0 and below 1");
    }
  }
}
