package org.rolltrace.ui.chart;

import java.util.Arrays;

/**
 * A closed outline of a part of an aeroplane, in m.
 *
 * @param part which part
 * @param across positive to the right
 * @param up on the drawing: forward in a planform, upwards from behind
 */
// Corners of a wing: boxed lists would cost more than they clear up.
@SuppressWarnings("ArrayRecordComponent")
record Outline(Part part, double[] across, double[] up) {

  /** What is drawn alike. */
  enum Part {
    BODY,
    SURFACE,
    AILERON
  }

  Outline mirrored() {
    return new Outline(part, Arrays.stream(across).map(x -> -x).toArray(), up);
  }

  /** Whether another one lies on this one. */
  boolean covers(Outline other) {
    return part == other.part && Arrays.equals(across, other.across) && Arrays.equals(up, other.up);
  }
}
