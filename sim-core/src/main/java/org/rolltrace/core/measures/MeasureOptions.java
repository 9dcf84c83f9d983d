package org.rolltrace.core.measures;

import java.util.List;
import org.rolltrace.core.quantity.Check;

/**
 * What may be chosen about the measures.
 *
 * @param settlingBand half width of the band of the settling time, as a fraction of the steady
 *     rate, 0.001 to 0.5
 * @param bankChanges bank changes whose times are wanted, deg, each above 0 and up to 3600
 */
public record MeasureOptions(double settlingBand, List<Double> bankChanges) {

  /** A band of 5 %, and times to 30, 45, 60 and 90 deg. */
  public static final MeasureOptions DEFAULT =
      new MeasureOptions(0.05, List.of(30.0, 45.0, 60.0, 90.0));

  public MeasureOptions {
    Check.inRange("settling band", settlingBand, 0.001, 0.5);
    bankChanges = bankChanges.stream().distinct().sorted().toList();
    for (double change : bankChanges) {
      Check.positive("bank change, deg,", change);
      Check.inRange("bank change, deg,", change, 0, 3600);
    }
  }
}
