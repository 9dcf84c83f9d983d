package org.rolltrace.core.measures;

import java.util.List;
import java.util.Locale;

/**
 * What stands beside a measure. The sentence is put together when somebody reads it: of tens of
 * thousands of measures few are read.
 *
 * @param pattern the sentence, with places for the values as {@link String#format} has them; taken
 *     as it is when there are none
 * @param values what goes into the places
 */
public record Remark(String pattern, List<Object> values) {
  /** Nothing to remark. */
  public static final Remark NONE = of("");

  public Remark {
    values = List.copyOf(values);
  }

  /**
   * A remark.
   *
   * @param pattern the sentence, with places for the values
   * @param values what goes into the places; none for a sentence that is taken as it is
   * @return the remark
   */
  public static Remark of(String pattern, Object... values) {
    return new Remark(pattern, List.of(values));
  }

  /**
   * The sentence.
   *
   * @return the sentence; empty when there is nothing to remark
   */
  public String text() {
    return values.isEmpty() ? pattern : String.format(Locale.ROOT, pattern, values.toArray());
  }
}
