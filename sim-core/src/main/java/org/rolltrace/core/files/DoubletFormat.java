package org.rolltrace.core.files;

import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.quantity.Dimension;

/** A move to one side, to the other, and back. */
final class DoubletFormat implements ShapeFormat {
  private static final String WIDTH = "width";

  @Override
  public String word() {
    return "doublet";
  }

  @Override
  public Keys keys() {
    return InputFormat.COMMON.named("shape \"doublet\"").required(WIDTH);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(WIDTH, "1 s");
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    double width = in.quantity(WIDTH, Dimension.TIME, Range.ABOVE_ZERO);
    if (!in.isSound()) {
      return Optional.empty();
    }
    try {
      return Optional.of(new DoubletInput(common.start(), common.size(), width, common.movement()));
    } catch (IllegalArgumentException e) {
      in.refuse(WIDTH, e); // against the movement; each by itself is in range
      return Optional.empty();
    }
  }
}
