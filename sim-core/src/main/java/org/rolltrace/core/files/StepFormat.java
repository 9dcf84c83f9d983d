package org.rolltrace.core.files;

import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.StepInput;

/** A move that stays. */
final class StepFormat implements ShapeFormat {
  @Override
  public String word() {
    return "step";
  }

  @Override
  public Keys keys() {
    return InputFormat.COMMON.named("shape \"step\"");
  }

  @Override
  public Map<String, String> usual() {
    return Map.of();
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    return in.isSound()
        ? Optional.of(new StepInput(common.start(), common.size(), common.movement()))
        : Optional.empty();
  }
}
