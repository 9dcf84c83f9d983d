package org.rolltrace.core.flight;

import java.util.List;
import org.rolltrace.core.history.TimeHistory;

/**
 * A manoeuvre that has been computed.
 *
 * @param history all channels against time
 * @param events in the order of time
 */
public record Flown(TimeHistory history, List<FlightEvent> events) {

  public Flown {
    events = List.copyOf(events);
  }
}
