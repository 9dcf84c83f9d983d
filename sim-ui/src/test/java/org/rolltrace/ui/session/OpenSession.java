package org.rolltrace.ui.session;

import java.nio.file.Path;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.task.SameThread;

/** Sessions for tests that need no window: everything is done on the spot. */
public final class OpenSession {
  private static final Path SHIPPED = Path.of("..", "scenarios");

  private OpenSession() {}

  public static ScenarioDocument document(String name) {
    return ScenarioDocument.open(SHIPPED.resolve(name + ".json").toAbsolutePath());
  }

  public static DeskSession of(String name, Path recovery) {
    DeskSession session = new DeskSession(new SameThread(), new RecoveryStore(recovery));
    session.open(SHIPPED.resolve(name + ".json"));
    return session;
  }

  /** An aeroplane with a shape and variants. */
  public static DeskSession shaped(Path recovery) {
    DeskSession session = new DeskSession(new SameThread(), new RecoveryStore(recovery));
    session.open(Path.of("src", "test", "resources", "shaped", "roll-entry.json"));
    return session;
  }
}
