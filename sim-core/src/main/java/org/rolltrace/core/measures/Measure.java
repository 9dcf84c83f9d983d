package org.rolltrace.core.measures;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * A measure that was read off, or the reason why it could not be.
 *
 * @param definition what it is
 * @param value in the unit of the definition; empty when it could not be had
 * @param remark the reason when there is no value; else what the reader should know beside it, or
 *     nothing
 */
public record Measure(MeasureDefinition definition, OptionalDouble value, String remark) {

  public Measure {
    if (value.isPresent()) {
      Check.finite(definition.name(), value.getAsDouble());
    } else if (remark.isBlank()) {
      throw new IllegalArgumentException(
          definition.name() + " has neither a value nor a reason; expected one of them");
    }
  }

  /**
   * A measure with its value.
   *
   * @param definition what it is
   * @param value in its unit
   * @return the measure
   */
  public static Measure of(MeasureDefinition definition, double value) {
    return new Measure(definition, OptionalDouble.of(value), "");
  }

  /**
   * A measure with its value and a remark.
   *
   * @param definition what it is
   * @param value in its unit
   * @param remark what the reader should know
   * @return the measure
   */
  public static Measure of(MeasureDefinition definition, double value, String remark) {
    return new Measure(definition, OptionalDouble.of(value), remark);
  }

  /**
   * A measure that could not be had.
   *
   * @param definition what it is
   * @param reason why not
   * @return the measure
   */
  public static Measure missing(MeasureDefinition definition, String reason) {
    return new Measure(definition, OptionalDouble.empty(), reason);
  }
}
