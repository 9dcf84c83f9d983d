package org.rolltrace.ui.chart;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;

/** Runs to draw, and what a sheet shows. */
final class Runs {
  private static final Path FOLDER = Path.of("..", "scenarios");

  private Runs() {}

  static List<Path> shipped() {
    try (Stream<Path> files = Files.list(FOLDER)) {
      return files
          .filter(file -> file.toString().endsWith(".json"))
          .filter(file -> !file.toString().endsWith(".schema.json"))
          .sorted()
          .toList();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  static RunResult of(Path file) {
    return ScenarioRun.execute(ScenarioFile.read(file));
  }

  static RunResult of(String name) {
    return of(FOLDER.resolve(name + ".json"));
  }

  /** The symmetric light single, a step of the stick. */
  static RunResult step(double size) {
    Scenario shipped = ScenarioFile.read(FOLDER.resolve("light-single-roll-entry.json"));
    return ScenarioRun.execute(
        new Scenario(
            shipped.title(),
            shipped.data(),
            shipped.condition(),
            shipped.propeller(),
            shipped.slip(),
            shipped.start(),
            PilotProgramme.of(List.of(new PilotInput(Control.STICK, new StepInput(1, size, 0.15)))),
            shipped.duration(),
            shipped.measures()));
  }

  /** All marks, those inside clips among them. */
  static List<Mark> flat(List<Mark> marks) {
    List<Mark> flat = new ArrayList<>();
    for (Mark mark : marks) {
      if (mark instanceof Mark.Clip clip) {
        flat.addAll(flat(clip.marks()));
      } else {
        flat.add(mark);
      }
    }
    return flat;
  }

  static <M extends Mark> List<M> all(Class<M> kind, Sheet sheet) {
    return flat(sheet.marks()).stream().filter(kind::isInstance).map(kind::cast).toList();
  }

  static double[] coordinates(Mark mark) {
    if (mark instanceof Mark.Line line) {
      return new double[] {line.x1(), line.y1(), line.x2(), line.y2()};
    }
    if (mark instanceof Mark.Polyline line) {
      return joined(line.x(), line.y());
    }
    if (mark instanceof Mark.Area area) {
      return joined(area.x(), area.y());
    }
    if (mark instanceof Mark.Label label) {
      return new double[] {label.x(), label.y()};
    }
    if (mark instanceof Mark.Dot dot) {
      return new double[] {dot.x(), dot.y(), dot.radius()};
    }
    throw new AssertionError(mark);
  }

  private static double[] joined(double[] x, double[] y) {
    double[] joined = new double[x.length + y.length];
    System.arraycopy(x, 0, joined, 0, x.length);
    System.arraycopy(y, 0, joined, x.length, y.length);
    return joined;
  }

  /** The rectangle of a text: left, top, right, bottom. */
  static double[] box(Mark.Label label) {
    double width = TypeWidths.of(label.text(), label.size());
    double left =
        switch (label.anchor()) {
          case START -> label.x();
          case MIDDLE -> label.x() - 0.5 * width;
          case END -> label.x() - width;
        };
    // DejaVu Sans: its capitals and figures reach to 0.73 em, its tails to 0.21 em below the line.
    double em = label.size().pixels();
    return new double[] {left, label.y() - 0.73 * em, left + width, label.y() + 0.21 * em};
  }

  /** Pairs of texts that cover each other, and texts that leave the sheet. */
  static List<String> crowding(Sheet sheet) {
    List<Mark.Label> labels = all(Mark.Label.class, sheet);
    List<String> faults = new ArrayList<>();
    for (int i = 0; i < labels.size(); i++) {
      double[] a = box(labels.get(i));
      if (a[0] < -1e-9 || a[1] < 0 || a[2] > sheet.width() + 1e-9 || a[3] > sheet.height()) {
        faults.add(labels.get(i) + " leaves the sheet");
      }
      for (int k = i + 1; k < labels.size(); k++) {
        double[] b = box(labels.get(k));
        if (a[0] < b[2] && b[0] < a[2] && a[1] < b[3] && b[1] < a[3]) {
          faults.add(labels.get(i) + " meets " + labels.get(k));
        }
      }
    }
    return faults;
  }
}
