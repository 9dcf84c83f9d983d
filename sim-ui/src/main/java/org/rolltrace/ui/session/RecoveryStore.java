package org.rolltrace.ui.session;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.zip.CRC32;
import org.rolltrace.core.files.FileFaultsException;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.files.WholeFile;

/**
 * Keeps unsaved work where a crash does not reach it: one file for each running program, in a
 * folder of the user, gone when there is nothing unsaved. Safe for use by several threads.
 *
 * <p>A file begins with lines that say what it is, among them the traces that the document carries,
 * then comes the text of the document. A check sum tells whole files from damaged ones; those are
 * neither offered nor touched.
 */
public final class RecoveryStore {
  private static final String FORMAT = "rolltrace-recovery/1";
  private static final String ENDING = ".recovery";
  private static final String TRACE = "trace ";
  private static final String SUM = "sum ";

  /** Lines before those of the traces. */
  private static final int LINES = 5;

  private static final int LARGEST = 1 << 22;

  private final Path folder;
  private final Path own;

  /**
   * A store.
   *
   * @param folder made when something is kept
   */
  public RecoveryStore(Path folder) {
    this.folder = folder;
    this.own =
        folder.resolve(
            ProcessHandle.current().pid() + "-" + Long.toHexString(System.nanoTime()) + ENDING);
  }

  /**
   * What a crash left.
   *
   * @param origin the file it was opened from; empty when it never had one
   * @param time when it was kept
   * @param document the work; it may have faults
   * @param keptIn the file that keeps it
   */
  public record Pending(
      Optional<Path> origin, Instant time, ScenarioDocument document, Path keptIn) {}

  /**
   * The folder of the present user, by the habits of the operating system.
   *
   * @return it need not exist
   */
  public static Path defaultFolder() {
    return defaultFolder(
        System.getProperty("os.name", ""),
        System.getenv(),
        Path.of(System.getProperty("user.home", ".")));
  }

  static Path defaultFolder(String system, Map<String, String> environment, Path home) {
    String name = system.toLowerCase(Locale.ROOT);
    if (name.startsWith("windows")) {
      return fromEnvironment(environment, "LOCALAPPDATA", home.resolve("AppData").resolve("Local"))
          .resolve("Rolltrace");
    }
    if (name.startsWith("mac")) {
      return home.resolve("Library").resolve("Application Support").resolve("Rolltrace");
    }
    return fromEnvironment(environment, "XDG_STATE_HOME", home.resolve(".local").resolve("state"))
        .resolve("rolltrace");
  }

  /** A folder that must be absolute to count, as the base directory specification says. */
  private static Path fromEnvironment(Map<String, String> environment, String key, Path usual) {
    try {
      Path given = Path.of(environment.getOrDefault(key, ""));
      return given.isAbsolute() ? given : usual;
    } catch (InvalidPathException e) {
      return usual;
    }
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
   * Keeps work in place of what was kept before.
   *
   * @param origin the file it was opened from; empty when it never had one
   * @param document the work
   * @throws UncheckedIOException when it cannot be kept; its message says what to do
   */
  public synchronized void keep(Optional<Path> origin, ScenarioDocument document) {
    String json = document.json();
    List<String> lines = new ArrayList<>();
    lines.add(FORMAT);
    lines.add("process " + ProcessHandle.current().pid() + " " + started(ProcessHandle.current()));
    lines.add("time " + Instant.now());
    lines.add("origin " + origin.map(path -> quoted(path.toAbsolutePath().toString())).orElse(""));
    lines.add("directory " + quoted(document.directory().toString()));
    document
        .carriedTraces()
        .forEach(
            (name, text) -> {
              lines.add(TRACE + quoted(name));
              lines.add(TRACE + quoted(text));
            });
    String head = String.join("\n", lines);
    try {
      Files.createDirectories(folder);
    } catch (FileAlreadyExistsException taken) {
      throw new UncheckedIOException(
          "cannot make the folder " + folder + ": there is a file of that name; move it away",
          taken);
    } catch (IOException failure) {
      throw new UncheckedIOException(
          "cannot make the folder "
              + folder
              + "; see that its disk has room and that you may write there",
          failure);
    }
    WholeFile.write(own, head + "\n" + SUM + sum(head + json) + "\n" + json);
  }

  /** A text on one line, whatever it has in it. */
  private static String quoted(String text) {
    return text.replace("%", "%25").replace("\n", "%0A").replace("\r", "%0D");
  }

  private static String unquoted(String text) {
    return text.replace("%0D", "\r").replace("%0A", "\n").replace("%25", "%");
  }

  private static long started(ProcessHandle process) {
    return process.info().startInstant().map(Instant::toEpochMilli).orElse(0L);
  }

  private static String sum(String text) {
    CRC32 sum = new CRC32();
    sum.update(text.getBytes(StandardCharsets.UTF_8));
    return Long.toHexString(sum.getValue());
  }

  /** Gives up what this store kept. A file that cannot be deleted stays, and is offered again. */
  public synchronized void discard() {
    delete(own);
  }

  private static void delete(Path file) {
    try {
      Files.deleteIfExists(file);
    } catch (IOException stays) {
      // Being asked once too often harms nobody.
    }
  }

  /**
   * What programs left that run no longer, the newest first.
   *
   * @return nothing when the folder cannot be read; without damaged files
   */
  public List<Pending> pending() {
    List<Pending> found = new ArrayList<>();
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + ENDING)) {
      for (Path file : files) {
        if (!file.equals(own)) {
          read(file).ifPresent(found::add);
        }
      }
    } catch (IOException | DirectoryIteratorException unreadable) {
      return found; // what cannot be read cannot be offered
    }
    found.sort(Comparator.comparing(Pending::time).reversed());
    return found;
  }

  private static Optional<Pending> read(Path file) {
    try {
      if (!Files.isRegularFile(file) || Files.size(file) > LARGEST) {
        return Optional.empty();
      }
      String all = Files.readString(file);
      int sumAt = all.indexOf("\n" + SUM);
      int jsonAt = sumAt < 0 ? 0 : all.indexOf('\n', sumAt + 1) + 1;
      if (jsonAt == 0) {
        return Optional.empty();
      }
      String head = all.substring(0, sumAt);
      String json = all.substring(jsonAt);
      List<String> lines = List.of(head.split("\n", -1));
      if (lines.size() < LINES
          || !lines.get(0).equals(FORMAT)
          || !all.substring(sumAt + 1 + SUM.length(), jsonAt - 1).equals(sum(head + json))
          || isAlive(value(lines.get(1), "process"))) {
        return Optional.empty();
      }
      Optional<Path> origin =
          Optional.of(unquoted(value(lines.get(3), "origin")))
              .filter(path -> !path.isEmpty())
              .map(Path::of);
      Path directory = Path.of(unquoted(value(lines.get(4), "directory")));
      ScenarioDocument document =
          origin.isEmpty()
              ? ScenarioDocument.ofText(json, directory)
              : ScenarioDocument.ofFileText(json, origin.get());
      return Optional.of(
          new Pending(
              origin,
              Instant.parse(value(lines.get(2), "time")),
              document.carrying(traces(lines.subList(LINES, lines.size()))),
              file));
    } catch (IOException
        | IllegalArgumentException
        | DateTimeParseException
        | FileFaultsException damaged) {
      return Optional.empty();
    }
  }

  /** Each trace has a line with its name and one with its text. */
  private static Map<String, String> traces(List<String> lines) {
    Map<String, String> traces = new TreeMap<>();
    for (int i = 0; i + 1 < lines.size(); i += 2) {
      traces.put(
          unquoted(lines.get(i).substring(TRACE.length())),
          unquoted(lines.get(i + 1).substring(TRACE.length())));
    }
    return traces;
  }

  private static String value(String line, String key) {
    if (!line.startsWith(key + " ")) {
      throw new IllegalArgumentException("found " + line + "; expected " + key);
    }
    return line.substring(key.length() + 1);
  }

  /** Whether another program is still at work on it. This one knows its own file. */
  private static boolean isAlive(String process) {
    String[] parts = process.split(" ", 2);
    if (parts.length < 2) {
      return false;
    }
    long id = Long.parseLong(parts[0]);
    if (id == ProcessHandle.current().pid()) {
      return false;
    }
    Optional<ProcessHandle> running = ProcessHandle.of(id).filter(ProcessHandle::isAlive);
    // The number may have gone to another program since.
    return running.isPresent() && String.valueOf(started(running.get())).equals(parts[1]);
  }

  /**
   * Gives up what a crash left.
   *
   * @param pending out of {@link #pending}
   */
  public void forget(Pending pending) {
    delete(pending.keptIn());
  }
}
