package org.rolltrace.core.measures;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * A measure that was read off, or the reason why it could not be.
 *
 * @param definition what it is
 * @param value in the unit of the definition; empty when it could not be had
 * @param beside the reason when there is no value; else what the reader should know beside it, or
 *     nothing
 */
public record Measure(MeasureDefinition definition, OptionalDouble value, Remark beside) {

  public Measure {
    if (value.isPresent()) {
      Check.finite(definition.name(), value.getAsDouble());
    } else if (beside.pattern().isBlank()) {
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
    return new Measure(definition, OptionalDouble.of(value), Remark.NONE);
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
    return of(definition, value, Remark.of(remark));
  }

  static Measure of(MeasureDefinition definition, double value, Remark beside) {
    return new Measure(definition, OptionalDouble.of(value), beside);
  }

  /**
   * A measure that could not be had.
   *
   * @param definition what it is
   * @param reason why not
   * @return the measure
   */
  public static Measure missing(MeasureDefinition definition, String reason) {
    return missing(definition, Remark.of(reason));
  }

  static Measure missing(MeasureDefinition definition, Remark reason) {
    return new Measure(definition, OptionalDouble.empty(), reason);
  }

  /**
   * The reason when there is no value; else what the reader should know beside it.
   *
   * @return a sentence, or nothing
   */
  public String remark() {
    return beside.text();
  }
}
