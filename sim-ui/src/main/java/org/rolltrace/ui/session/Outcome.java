package org.rolltrace.ui.session;

import java.util.List;
import java.util.Optional;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;

/**
 * What came of a document.
 *
 * @param faults of the text
 * @param failure of the calculation; nothing when there was none
 * @param result empty when there are faults or a failure
 */
record Outcome(List<FileFault> faults, String failure, Optional<RunResult> result) {

  static Outcome of(ScenarioDocument document) {
    ScenarioDocument.Check check = document.check();
    if (check.scenario().isEmpty()) {
      return new Outcome(check.faults(), "", Optional.empty());
    }
    try {
      RunResult flown = ScenarioRun.execute(check.scenario().get());
      return new Outcome(List.of(), "", Optional.of(ScenarioRun.compareWithFreeSlip(flown)));
    } catch (CalculationException e) {
      return new Outcome(List.of(), e.getMessage(), Optional.empty());
    }
  }

  /** What came when nothing should have gone wrong, and did. */
  static Outcome broken(Throwable thrown) {
    return new Outcome(
        List.of(),
        "the calculation broke off ("
            + thrown
            + "); undo the last change, and report it with the scenario",
        Optional.empty());
  }
}
