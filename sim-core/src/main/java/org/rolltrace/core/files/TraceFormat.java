package org.rolltrace.core.files;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;

/** A recorded movement in a CSV file. */
final class TraceFormat implements ShapeFormat {
  static final String FILE = "file";
  private static final String COLUMN = "column";
  private static final int LONGEST_COLUMN = 200;

  @Override
  public String word() {
    return "trace";
  }

  @Override
  public Keys keys() {
    return InputFormat.RECORDED.named("shape \"trace\"").required(FILE, COLUMN);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(FILE, "", COLUMN, "stick");
  }

  @Override
  public String usualSize() {
    return "1";
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    Optional<String> name = in.freeText(FILE, JsonTree.LONGEST_TEXT);
    Optional<String> column = in.text(COLUMN, LONGEST_COLUMN);
    if (name.isEmpty() || column.isEmpty()) {
      return Optional.empty();
    }
    if (name.get().isBlank()) {
      in.refuse(FILE, "the path is blank; expected one from here to a CSV file");
      return Optional.empty();
    }
    Path file;
    byte[] bytes;
    try {
      file = in.faults().file().resolveSibling(name.get());
      bytes = TextFile.bytes(file);
    } catch (InvalidPathException e) {
      in.refuse(FILE, Shown.text(name.get()) + " is no path; expected one to a CSV file");
      return Optional.empty();
    } catch (UnusableFileException e) {
      in.refuse(
          FILE,
          "the trace file "
              + Shown.text(name.get())
              + " "
              + e.getMessage()
              + ". The path counts from the directory of the scenario");
      return Optional.empty();
    }
    TraceCsv csv = new TraceCsv(in.faults().of(file), common.start(), common.size());
    Optional<Trace> trace =
        csv.read(bytes, name.get(), column.get(), message -> in.refuse(COLUMN, message));
    return trace.isPresent() && in.isSound()
        ? Optional.of(new TraceInput(common.start(), common.size(), trace.get()))
        : Optional.empty();
  }
}
