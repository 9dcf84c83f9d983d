package org.rolltrace.ui.manoeuvre;

import java.nio.file.Path;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.SameThread;

/** Sessions for tests that need no window: everything is done on the spot. */
final class OpenSession {
  private static final Path SHIPPED = Path.of("..", "scenarios");

  private OpenSession() {}

  static ScenarioDocument document(String name) {
    return ScenarioDocument.open(SHIPPED.resolve(name + ".json").toAbsolutePath());
  }

  static DeskSession of(String name, Path recovery) {
    DeskSession session = new DeskSession(new SameThread(), new RecoveryStore(recovery));
    session.open(SHIPPED.resolve(name + ".json"));
    return session;
  }
}
