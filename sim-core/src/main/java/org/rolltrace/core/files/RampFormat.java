package org.rolltrace.core.files;

import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.quantity.Dimension;

/** A slow move that stays. */
final class RampFormat implements ShapeFormat {
  private static final String DURATION = "duration";

  @Override
  public String word() {
    return "ramp";
  }

  @Override
  public Keys keys() {
    return InputFormat.SMOOTH.named("shape \"ramp\"").required(DURATION);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(DURATION, "2 s");
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    double duration = in.quantity(DURATION, Dimension.TIME, Range.ABOVE_ZERO);
    return in.isSound()
        ? Optional.of(new RampInput(common.start(), common.size(), duration))
        : Optional.empty();
  }
}
