package org.rolltrace.core.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.flight.FlightSettings;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.scenario.Scenario;

/**
 * All that came of a run.
 *
 * @param scenario what was flown
 * @param settings how finely
 * @param trim the controls before the manoeuvre
 * @param modes of the free equations; empty when they could not be had
 * @param modesRemark why there are no modes, or what to know beside them; may be empty
 * @param history all channels against time
 * @param events in the order of time
 * @param measures in the order in which they are shown
 * @param cautions sentences that belong beside the result
 */
public record RunResult(
    Scenario scenario,
    FlightSettings settings,
    Trim trim,
    Optional<LateralModes> modes,
    String modesRemark,
    TimeHistory history,
    List<FlightEvent> events,
    List<Measure> measures,
    List<String> cautions) {

  public RunResult {
    events = List.copyOf(events);
    measures = List.copyOf(measures);
    cautions = List.copyOf(cautions);
  }

  RunResult withMeasures(List<Measure> others) {
    return new RunResult(
        scenario, settings, trim, modes, modesRemark, history, events, others, cautions);
  }

  /**
   * A measure by its name.
   *
   * @param name such as {@code steadyRollRate}
   * @return the measure, or empty when this run has none of that name
   */
  public Optional<Measure> measure(String name) {
    return measures.stream().filter(m -> m.definition().name().equals(name)).findFirst();
  }

  /**
   * The lift coefficient of the condition.
   *
   * @return CL = n m g/(q̄ S); empty when the mass is not known
   */
  public OptionalDouble liftCoefficient() {
    return scenario.data().liftCoefficient(scenario.condition());
  }
}
