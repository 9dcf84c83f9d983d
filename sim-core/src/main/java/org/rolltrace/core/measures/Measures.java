package org.rolltrace.core.measures;

import static org.rolltrace.core.measures.MeasureDefinition.FINAL_BANK;

import java.util.ArrayList;
import java.util.List;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;

/** Reads all measures off a manoeuvre. */
public final class Measures {
  private Measures() {}

  /**
   * All measures of a manoeuvre.
   *
   * @param manoeuvre what was flown
   * @param options what may be chosen
   * @return the measures in the order in which they are shown
   */
  public static List<Measure> of(Manoeuvre manoeuvre, MeasureOptions options) {
    List<Measure> measures = new ArrayList<>(new RollEntry(manoeuvre, options).measures());
    measures.add(Coast.of(manoeuvre));
    measures.addAll(WingsLevelReturn.of(manoeuvre));
    TimeHistory history = manoeuvre.history();
    measures.add(Measure.of(FINAL_BANK, history.value(Channel.BANK, history.size() - 1)));
    return measures;
  }
}
