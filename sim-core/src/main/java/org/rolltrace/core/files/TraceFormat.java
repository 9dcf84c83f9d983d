package org.rolltrace.core.files;

import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.quantity.Dimension;

/** A recorded movement in a CSV file. */
final class TraceFormat implements ShapeFormat {
  static final String FILE = "file";
  private static final String COLUMN = "column";
  private static final String CUT_BEFORE = "cutBefore";
  private static final String CUT_AFTER = "cutAfter";
  private static final int LONGEST_COLUMN = 200;

  @Override
  public String word() {
    return "trace";
  }

  @Override
  public Keys keys() {
    return InputFormat.RECORDED
        .named("shape \"trace\"")
        .required(FILE, COLUMN)
        .optional(CUT_BEFORE, CUT_AFTER);
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
    double from = in.quantity(CUT_BEFORE, Dimension.TIME, Range.ANY, Double.NEGATIVE_INFINITY);
    double to = in.quantity(CUT_AFTER, Dimension.TIME, Range.ANY, Double.POSITIVE_INFINITY);
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
      String text = common.carried().get(name.get());
      bytes = text == null ? TextFile.bytes(file) : text.getBytes(StandardCharsets.UTF_8);
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
    TraceCsv csv = new TraceCsv(in.faults().of(file), common.start(), common.size(), from);
    Optional<Trace> trace =
        csv.read(bytes, name.get(), column.get(), message -> in.refuse(COLUMN, message));
    if (trace.isEmpty() || !in.isSound() || !somethingIsLeft(in, trace.get(), from, to)) {
      return Optional.empty();
    }
    return Optional.of(
        new TraceInput(common.start(), common.size(), trace.get().between(from, to)));
  }

  private static boolean somethingIsLeft(ObjectCursor in, Trace trace, double from, double to) {
    double begin = Math.max(from, trace.begin());
    double end = Math.min(to, trace.end());
    if (end > begin) {
      return true;
    }
    in.refuse(
        from > trace.begin() ? CUT_BEFORE : CUT_AFTER,
        "nothing of the trace is left: it lasts from "
            + trace.begin()
            + " s to "
            + trace.end()
            + " s, and the cuts leave what is after "
            + begin
            + " s and before "
            + end
            + " s");
    return false;
  }
}
