package org.rolltrace.ui.chart;

import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.run.RunResult;

/**
 * Bank against time.
 *
 * @param history the samples
 */
record BankPath(TimeHistory history) {

  static BankPath of(RunResult result) {
    return new BankPath(result.history());
  }

  /** The last instant, s. */
  double end() {
    return history.time(history.size() - 1);
  }

  /** The bank, rad; outside of the run that of the nearer end. */
  double at(double instant) {
    int index = history.lastAt(instant);
    double bank = history.value(Channel.BANK, index);
    if (index + 1 == history.size() || instant <= history.time(index)) {
      return bank;
    }
    double share =
        (instant - history.time(index)) / (history.time(index + 1) - history.time(index));
    return bank + share * (history.value(Channel.BANK, index + 1) - bank);
  }
}
