package org.rolltrace.ui.chart;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.run.RunResult;

/** The strips of a roll: bank, roll rate, sideslip with yaw rate, stick with pedal, surfaces. */
public final class RollStrips {
  private RollStrips() {}

  /**
   * The strips of a run, with those of another one behind.
   *
   * @param result the run
   * @param ghost the run it is compared with
   * @return bank; roll rate; sideslip and yaw rate; stick and pedal; aileron and rudder
   */
  public static List<Strip> of(RunResult result, Optional<RunResult> ghost) {
    return List.of();
  }

  /**
   * The time that a run covers.
   *
   * @param result the run
   * @return from 0 to its end
   */
  public static TimeWindow window(RunResult result) {
    return new TimeWindow(0, result.scenario().duration());
  }
}
