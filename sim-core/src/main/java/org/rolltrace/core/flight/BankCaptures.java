package org.rolltrace.core.flight;

import java.util.List;
import org.rolltrace.core.motion.LateralMotion;

/** Notes when the bank has first changed by stated angles in the direction of the leading input. */
final class BankCaptures {
  /** The roll rate that an aeroplane may have gained and lost between two looks, rad/s. */
  private static final double QUICKEST_GAIN = 1;

  private static final int BANK = LateralMotion.BANK;

  private final double[] changes;
  private double direction;
  private double fromBank;
  private int next;

  /** Captures of bank changes, rad, each above 0, none of which is looked for yet. */
  BankCaptures(List<Double> changes) {
    this.changes = changes.stream().mapToDouble(Double::doubleValue).sorted().toArray();
    this.next = this.changes.length;
  }

  /** Counts from a bank on, rad, in a direction, 1 or −1. */
  void begin(double bank, double towards) {
    fromBank = bank;
    direction = towards;
    next = 0;
  }

  /**
   * Looks at a short part of a step. Whoever comes to a bank between its ends, and leaves it again,
   * is seen too.
   *
   * @param state at the end of the part
   */
  void look(DenseStep step, double from, double to, double[] state, List<FlightEvent> events) {
    while (next < changes.length) {
      double change = changes[next];
      double missing = change - gained(state[BANK]);
      double by = to;
      if (missing > 0) {
        double within =
            (to - from) * (2 * Math.abs(state[LateralMotion.ROLL_RATE]) + QUICKEST_GAIN);
        if (missing > within || !gains(step, from) || gains(step, to)) {
          return;
        }
        by = DenseStep.end(from, to, time -> gains(step, time));
        if (gained(step.at(BANK, by)) < change) {
          return;
        }
      }
      double time = DenseStep.end(from, by, at -> gained(step.at(BANK, at)) < change);
      events.add(new FlightEvent.BankCapture(time, change));
      next++;
    }
  }

  private double gained(double bank) {
    return direction * (bank - fromBank);
  }

  private boolean gains(DenseStep step, double time) {
    return direction * step.rateAt(BANK, time) > 0;
  }
}
