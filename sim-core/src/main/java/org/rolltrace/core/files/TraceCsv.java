package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HandRecord;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.quantity.QuantityException;
import org.rolltrace.core.quantity.Unit;

/** Recorded movements as CSV: one column of a file against its time. */
final class TraceCsv {
  static final int MOST_ROWS = 100_000;

  private static final String TIME = "time";
  private static final List<String> UNITS = List.of("-", "%");
  private static final double PERCENT = 0.01;

  private final Faults faults;
  private final double shift;
  private final double scale;
  private final double cutBefore;

  private int line;
  private int rows;
  private double[] times = new double[64];
  private double[] positions = new double[64];

  /**
   * A reader.
   *
   * @param faults of the CSV file
   * @param shift s to be added to its times; NaN when it was refused
   * @param scale what its positions will be multiplied by; NaN when it was refused
   * @param cutBefore s before which nothing of it is wanted; NaN when it was refused
   */
  TraceCsv(Faults faults, double shift, double scale, double cutBefore) {
    this.faults = faults;
    this.shift = Double.isNaN(shift) ? 0 : shift;
    this.scale = Double.isNaN(scale) ? 0 : scale;
    this.cutBefore = Double.isNaN(cutBefore) ? Double.NEGATIVE_INFINITY : cutBefore;
  }

  /** What a hand did, as a file of three columns with all digits that are needed. */
  static String text(HandRecord record) {
    StringBuilder text = new StringBuilder("time[s],stick[-],pedal[-]\n");
    for (int i = 0; i < record.size(); i++) {
      text.append(record.time(i))
          .append(',')
          .append(record.position(Control.STICK, i))
          .append(',')
          .append(record.position(Control.PEDAL, i))
          .append('\n');
    }
    return text.toString();
  }

  /** A column of the header. */
  private record Column(String name, String unit, int index, int place) {}

  /**
   * Reads the file.
   *
   * @param name what the file is called
   * @param column which of its columns is the movement
   * @param refusal is told when there is no such column
   */
  Optional<Trace> read(byte[] bytes, String name, String column, Consumer<String> refusal) {
    int before = faults.count();
    Optional<char[]> text = TextFile.decode(bytes, faults);
    if (text.isEmpty()) {
      return Optional.empty();
    }
    Iterator<String> lines = new String(text.get()).lines().iterator();
    line = 1;
    String header = lines.hasNext() ? lines.next() : "";
    List<Column> columns = header(header);
    if (faults.count() > before) {
      return Optional.empty();
    }
    Optional<Column> time = timeColumn(columns);
    Optional<Column> moved = find(columns, column);
    if (moved.isEmpty()) {
      refusal.accept(noColumn(column, columns));
    } else if (!UNITS.contains(moved.get().unit())) {
      add(
          moved.get().place(),
          "the unit of "
              + Shown.text(column)
              + " is "
              + Shown.text(moved.get().unit())
              + "; expected a fraction or per cent of the travel, ["
              + String.join("] or [", UNITS)
              + "]");
    }
    if (moved.isEmpty() || time.isEmpty() || faults.count() > before) {
      return Optional.empty();
    }
    rows(lines, columns.size(), time.get(), moved.get());
    if (faults.count() > before) {
      return Optional.empty();
    }
    return Optional.of(
        Trace.of(name, column, Arrays.copyOf(times, rows), Arrays.copyOf(positions, rows)));
  }

  private void add(int column, String message) {
    faults.add(new JsonValue.Place("$", line, column), message);
  }

  private List<Column> header(String header) {
    List<Column> columns = new ArrayList<>();
    if (header.isBlank()) {
      add(1, "the first line is blank; expected a header such as time[s],stick[-]");
      return columns;
    }
    int place = 1;
    for (String cell : header.split(",", -1)) {
      String title = cell.strip();
      int bracket = title.indexOf('[');
      if (title.indexOf('"') >= 0) {
        add(place, Shown.text(title) + " is quoted; expected a name without quotation marks");
      } else if (bracket <= 0 || !title.endsWith("]")) {
        add(
            place,
            Shown.text(title)
                + " is no name with a unit; expected a header such as time[s],stick[-]");
      } else {
        String name = title.substring(0, bracket).strip();
        String unit = title.substring(bracket + 1, title.length() - 1).strip();
        if (find(columns, name).isPresent()) {
          add(place, "the column " + Shown.text(name) + " stands here again; keep one of the two");
        }
        columns.add(new Column(name, unit, columns.size(), place));
      }
      place += cell.length() + 1;
    }
    return columns;
  }

  private static Optional<Column> find(List<Column> columns, String name) {
    return columns.stream().filter(column -> column.name().equals(name)).findFirst();
  }

  private static List<String> names(List<Column> columns) {
    return columns.stream().map(Column::name).toList();
  }

  private static String noColumn(String name, List<Column> columns) {
    String question = Spelling.question(name, names(columns));
    return "the trace file has no column "
        + Shown.text(name)
        + question
        + (question.endsWith("?") ? " Its columns are " : ". Its columns are ")
        + Shown.plain(String.join(", ", names(columns)));
  }

  private Optional<Column> timeColumn(List<Column> columns) {
    Optional<Column> time = find(columns, TIME);
    if (time.isEmpty()) {
      add(1, "no column is called time; expected a header such as time[s],stick[-]");
      return time;
    }
    try {
      if (Unit.of(time.get().unit()).dimension().equals(Dimension.TIME)) {
        return time;
      }
    } catch (QuantityException e) {
      // What is no unit at all is none of time either.
    }
    add(
        time.get().place(),
        "the unit of time is " + Shown.text(time.get().unit()) + "; expected [s] or [ms]");
    return Optional.empty();
  }

  private void rows(Iterator<String> lines, int cells, Column time, Column moved) {
    Unit unit = Unit.of(time.unit());
    double factor = moved.unit().equals("%") ? PERCENT : 1;
    int blank = 0;
    while (lines.hasNext()) {
      String row = lines.next();
      line++;
      if (row.isBlank()) {
        blank = blank == 0 ? line : blank;
        continue;
      }
      if (blank > 0) {
        int here = line;
        line = blank;
        add(1, "a blank line stands between the samples; take it out");
        line = here;
        blank = 0;
      }
      if (rows == MOST_ROWS) {
        add(1, "there are more than " + MOST_ROWS + " samples; shorten or thin the trace");
        return;
      }
      String[] values = row.split(",", -1);
      if (values.length != cells) {
        add(1, "the line has " + values.length + " values; expected " + cells + ", as the header");
        continue;
      }
      double at = unit.toSi(number(values, time.index()));
      double position = factor * number(values, moved.index());
      if (!Double.isNaN(at) && !Double.isNaN(position)) {
        take(at, position, placeOf(values, time.index()), placeOf(values, moved.index()));
      }
    }
    if (rows < 2) {
      add(1, "there are fewer than two samples; expected at least two lines of numbers");
    }
  }

  private static int placeOf(String[] values, int index) {
    int place = 1;
    for (int i = 0; i < index; i++) {
      place += values[i].length() + 1;
    }
    return place;
  }

  private double number(String[] values, int index) {
    try {
      return Quantity.parse(values[index].strip(), Dimension.DIMENSIONLESS);
    } catch (QuantityException e) {
      add(placeOf(values, index), e.getMessage());
      return Double.NaN;
    }
  }

  private void take(double at, double position, int timePlace, int positionPlace) {
    if (!(Math.abs(at) <= Double.MAX_VALUE)) {
      add(timePlace, "the time is too large to be computed with");
      return;
    }
    if (!(Math.abs(scale * position) <= 1)) {
      add(
          positionPlace,
          "the position is "
              + position
              + (Math.abs(scale) == 1 ? "" : ", times the size " + scale)
              + "; expected from -1 to 1, a fraction of the travel");
    }
    if (rows > 0 && !(at > times[rows - 1])) {
      add(
          timePlace,
          "the time is " + at + " s after " + times[rows - 1] + " s; expected increasing times");
    } else if (rows == 0 && !(Math.max(at, cutBefore) + shift >= 0)) {
      add(
          timePlace,
          "the time is "
              + at
              + " s, and the start "
              + shift
              + " s; expected a sum of 0 or more: give a later start");
    }
    if (rows == times.length) {
      times = Arrays.copyOf(times, 2 * rows);
      positions = Arrays.copyOf(positions, 2 * rows);
    }
    times[rows] = at;
    positions[rows] = position;
    rows++;
  }
}
