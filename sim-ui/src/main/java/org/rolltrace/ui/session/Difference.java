package org.rolltrace.ui.session;

import java.util.OptionalDouble;
import org.rolltrace.core.measures.MeasureDefinition;

/**
 * A measure beside that of the ghost.
 *
 * @param definition what it is; has the name, title and unit
 * @param value of the result; empty when it could not be had
 * @param ghost of the ghost; empty without ghost or when it could not be had
 * @param remark the reason when there is no value, or what to know beside it; may be empty
 */
public record Difference(
    MeasureDefinition definition, OptionalDouble value, OptionalDouble ghost, String remark) {

  /**
   * How far the result is from the ghost.
   *
   * @return value minus ghost; empty when either is missing
   */
  public OptionalDouble difference() {
    return value.isPresent() && ghost.isPresent()
        ? OptionalDouble.of(value.getAsDouble() - ghost.getAsDouble())
        : OptionalDouble.empty();
  }
}
