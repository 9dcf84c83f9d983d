package org.rolltrace.core.run;

import static org.rolltrace.core.measures.MeasureDefinition.DAMPING_LOST;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.StalledRoll;

/** When sections of the wing stalled, and when it no longer damped. */
record StallMeasure(boolean isKnown, double firstStalled, double dampingLost) {

  /** Of a wing that is never beyond its stall, or of which none is known. */
  static final StallMeasure NONE = new StallMeasure(false, Double.NaN, Double.NaN);

  static StallMeasure of(Optional<StalledRoll> stalled, TimeHistory history) {
    if (stalled.isEmpty()) {
      return NONE;
    }
    double first = Double.NaN;
    for (int i = 0; i < history.size(); i++) {
      double rollRate = history.value(Channel.ROLL_RATE, i);
      double yawRate = history.value(Channel.YAW_RATE, i);
      double sideslip = history.value(Channel.SIDESLIP, i);
      double aileron = history.value(Channel.AILERON, i);
      if (stalled.get().moment(rollRate, yawRate, sideslip, aileron) != 0) {
        first = Double.isNaN(first) ? history.time(i) : first;
        if (stalled.get().isDampingLost(rollRate, yawRate, sideslip, aileron)) {
          return new StallMeasure(true, first, history.time(i));
        }
      }
    }
    return new StallMeasure(true, first, Double.NaN);
  }

  List<Measure> measures() {
    if (!isKnown) {
      return List.of();
    }
    return List.of(
        Double.isNaN(dampingLost)
            ? Measure.missing(
                DAMPING_LOST,
                Double.isNaN(firstStalled)
                    ? "no section of the wing is beyond its stall"
                    : "sections are beyond their stall, but the wing goes on damping")
            : Measure.of(DAMPING_LOST, dampingLost));
  }
}
