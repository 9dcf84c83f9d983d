package org.rolltrace.core.files;

import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.quantity.Dimension;

/** A move, held, and then back. */
final class HoldFormat implements ShapeFormat {
  private static final String DURATION = "duration";

  @Override
  public String word() {
    return "hold";
  }

  @Override
  public Keys keys() {
    return InputFormat.COMMON.named("shape \"hold\"").required(DURATION);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(DURATION, "2 s");
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    double duration = in.quantity(DURATION, Dimension.TIME, Range.ABOVE_ZERO);
    if (!in.isSound()) {
      return Optional.empty();
    }
    try {
      return Optional.of(new HoldInput(common.start(), common.size(), duration, common.movement()));
    } catch (IllegalArgumentException e) {
      in.refuse(DURATION, e); // against the movement; each by itself is in range
      return Optional.empty();
    }
  }
}
