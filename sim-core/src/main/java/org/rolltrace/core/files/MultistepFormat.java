package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.quantity.Dimension;

/** Moves to one side and the other by turns, such as 3-2-1-1. */
final class MultistepFormat implements ShapeFormat {
  private static final String UNIT = "unit";
  private static final String PATTERN = "pattern";

  private static final Range STAY =
      Range.fromTo(1, MultistepInput.LONGEST_STAY, "a whole number from 1 to 1000");

  @Override
  public String word() {
    return "multistep";
  }

  @Override
  public Keys keys() {
    return InputFormat.COMMON.named("shape \"multistep\"").required(UNIT).optional(PATTERN);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(UNIT, "0.5 s");
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    double unit = in.quantity(UNIT, Dimension.TIME, Range.ABOVE_ZERO);
    List<Integer> pattern = pattern(in);
    if (!in.isSound()) {
      return Optional.empty();
    }
    try {
      return Optional.of(
          new MultistepInput(common.start(), common.size(), unit, pattern, common.movement()));
    } catch (IllegalArgumentException e) {
      in.refuse(UNIT, e); // against the movement; each by itself is in range
      return Optional.empty();
    }
  }

  private static List<Integer> pattern(ObjectCursor in) {
    if (!in.has(PATTERN)) {
      return MultistepInput.DEFAULT_PATTERN;
    }
    List<Integer> pattern = new ArrayList<>();
    for (JsonValue element : in.list(PATTERN, MultistepInput.MOST_STAYS)) {
      double stay = in.number(element, STAY);
      if (stay != Math.rint(stay)) {
        if (!Double.isNaN(stay)) {
          in.addWrongType(element, STAY.words());
        }
        continue;
      }
      pattern.add((int) stay);
    }
    if (pattern.isEmpty() && in.isSound()) {
      in.refuse(PATTERN, "the pattern is empty; expected whole numbers such as [3, 2, 1, 1]");
    }
    return pattern;
  }
}
