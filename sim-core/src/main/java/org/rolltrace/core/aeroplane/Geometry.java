package org.rolltrace.core.aeroplane;

import java.util.Optional;

/**
 * The shape of the aeroplane, as far as it is known.
 *
 * @param wing the wing
 * @param ailerons where the ailerons are; empty when not known
 * @param tailplane the horizontal tail; empty when there is none
 * @param fin the fin; empty when there is none
 * @param body the body; empty for a wing alone
 */
public record Geometry(
    Wing wing,
    Optional<AileronPlace> ailerons,
    Optional<Tailplane> tailplane,
    Optional<Fin> fin,
    Optional<Body> body) {

  public Geometry {
    if (ailerons.isPresent() && !(ailerons.get().to() <= wing.halfSpan() + Wing.JOINT)) {
      throw new IllegalArgumentException(
          "the aileron reaches to "
              + ailerons.get().to()
              + " m, but the wing ends at "
              + wing.halfSpan()
              + " m; expected an aileron on the wing");
    }
    if (body.isPresent() && !(body.get().width() < wing.span())) {
      throw new IllegalArgumentException(
          "the body is "
              + body.get().width()
              + " m wide, the wing "
              + wing.span()
              + " m; expected a wing that sticks out of the body");
    }
  }
}
