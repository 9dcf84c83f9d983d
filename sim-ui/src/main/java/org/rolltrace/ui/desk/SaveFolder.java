package org.rolltrace.ui.desk;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Supplier;

/**
 * Where saving under another name begins: where something was saved last, else beside the open
 * file, but at home when that is one of the shipped scenarios, which are there to be copied.
 */
final class SaveFolder {
  private final Path home;
  private final Supplier<Path> shipped;
  private Optional<Path> last = Optional.empty();

  SaveFolder(Path home, Supplier<Path> shipped) {
    this.home = home;
    this.shipped = shipped;
  }

  /** Takes note of where something was saved. */
  void remember(Path file) {
    last = Optional.ofNullable(file.toAbsolutePath().getParent());
  }

  /**
   * Where to begin.
   *
   * @param file that is open; null for none
   */
  Path toBeginIn(Path file) {
    if (last.filter(Files::isDirectory).isPresent()) {
      return last.get();
    }
    Path folder = file == null ? null : file.toAbsolutePath().getParent();
    return folder == null || isShipped(folder) ? home : folder;
  }

  private boolean isShipped(Path folder) {
    try {
      return Files.isSameFile(folder, shipped.get());
    } catch (IOException | RuntimeException unknown) {
      return false; // without shipped scenarios it is none of them
    }
  }
}
