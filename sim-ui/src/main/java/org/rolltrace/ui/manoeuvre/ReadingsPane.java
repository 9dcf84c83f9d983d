package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.collections.ListChangeListener;
import javafx.geometry.HPos;
import javafx.geometry.Insets;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.ui.session.DeskSession;

/**
 * What the roll means: measures with their definitions, modes, and the cautions, always in sight.
 */
final class ReadingsPane extends VBox {
  private final DeskSession session;
  private final GridPane rows = new GridPane();
  private final VBox cautions = new VBox(4);
  private final Label state = new Label();

  ReadingsPane(DeskSession session) {
    this.session = session;
    getStyleClass().add("readings-pane");
    setPadding(new Insets(8, 10, 8, 10));
    setSpacing(6);
    rows.setHgap(7);
    rows.setVgap(3);
    rows.setPadding(new Insets(0, 12, 0, 0)); // clear of the scroll bar
    ColumnConstraints titles = new ColumnConstraints();
    titles.setHgrow(Priority.ALWAYS);
    ColumnConstraints values = new ColumnConstraints();
    values.setHalignment(HPos.RIGHT);
    ColumnConstraints units = new ColumnConstraints();
    ColumnConstraints differences = new ColumnConstraints();
    differences.setHalignment(HPos.RIGHT);
    rows.getColumnConstraints().setAll(titles, values, units, differences);
    state.getStyleClass().add("state");
    state.setWrapText(true);
    state.setId("state");
    state.setMinHeight(USE_PREF_SIZE);
    cautions.setId("cautions");
    cautions.getStyleClass().add("cautions");
    ScrollPane scroll = new ScrollPane(rows);
    scroll.setFitToWidth(true);
    scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    scroll.getStyleClass().add("edge-to-edge");
    VBox.setVgrow(scroll, Priority.ALWAYS);
    getChildren().addAll(heading("Readings"), state, scroll, cautions);
    session.resultProperty().addListener((property, before, now) -> show());
    session.ghostProperty().addListener((property, before, now) -> show());
    session.staleProperty().addListener((property, before, now) -> showState());
    session.failureProperty().addListener((property, before, now) -> showState());
    session.recoveryProblemProperty().addListener((property, before, now) -> showState());
    session.faults().addListener((ListChangeListener<Object>) change -> showState());
    show();
    showState();
  }

  private static Label heading(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("heading");
    return label;
  }

  private void showState() {
    int faults = session.faults().size();
    String words = "";
    if (faults > 0) {
      words =
          (faults == 1 ? "One value cannot be used" : faults + " values cannot be used")
              + "; the curves are those before it: "
              + session.faults().get(0).message();
    } else if (!session.failureProperty().get().isEmpty()) {
      words = session.failureProperty().get();
    } else {
      words = session.recoveryProblemProperty().get();
    }
    state.setText(words);
    state.setManaged(!words.isEmpty());
    state.setVisible(!words.isEmpty());
    rows.setOpacity(session.staleProperty().get() ? 0.45 : 1);
  }

  private void show() {
    rows.getChildren().clear();
    cautions.getChildren().clear();
    RunResult result = session.resultProperty().get();
    if (result == null) {
      return;
    }
    RunResult ghost = session.ghostProperty().get();
    int row = 0;
    if (ghost != null) {
      addRow(row++, "", "now", "", "kept", "", "quiet");
    }
    List<Measure> missing = new ArrayList<>();
    for (Measure measure : result.measures()) {
      if (measure.value().isEmpty()) {
        missing.add(measure);
        continue;
      }
      Shown shown = Shown.of(measure);
      addRow(
          row++,
          measure.definition().title(),
          shown.value(),
          shown.unit(),
          keptValue(measure, ghost),
          hint(measure),
          "reading");
    }
    row = addModes(row, result);
    for (Measure measure : missing) {
      addRow(
          row++,
          measure.definition().title(),
          "\u2013",
          "",
          keptValue(measure, ghost),
          hint(measure),
          "quiet");
    }
    for (String caution : result.cautions()) {
      cautions.getChildren().add(cautionLabel("Caution: " + caution, "caution"));
    }
    cautions.getChildren().add(cautionLabel(Safety.NOTICE, "notice"));
  }

  private static Label cautionLabel(String words, String style) {
    Label label = new Label(words);
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    label.getStyleClass().add(style);
    return label;
  }

  private int addModes(int row, RunResult result) {
    Optional<LateralModes> modes = result.modes();
    if (modes.isEmpty()) {
      return row;
    }
    int next = row;
    LateralModes found = modes.get();
    if (found.spiral().isPresent()) {
      double root = found.spiral().get().root();
      addRow(
          next++,
          root <= 0 ? "Spiral halves in" : "Spiral doubles in",
          Written.reading(found.spiral().get().timeToHalfOrDouble()),
          "s",
          "",
          "Root of the spiral of the free equations: " + Written.reading(root) + " 1/s",
          "reading");
    }
    if (found.dutchRoll().isPresent()) {
      addRow(
          next++,
          "Dutch roll",
          Written.reading(found.dutchRoll().get().naturalFrequency()),
          "rad/s",
          "",
          "Undamped natural frequency of the dutch roll; damping ratio "
              + Written.reading(found.dutchRoll().get().dampingRatio()),
          "reading");
    }
    return next;
  }

  private static String hint(Measure measure) {
    String definition = capitalised(measure.definition().definition()) + ".";
    return measure.remark().isEmpty()
        ? definition
        : definition + "\n" + capitalised(measure.remark()) + ".";
  }

  private static String capitalised(String words) {
    return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }

  private static String keptValue(Measure measure, RunResult ghost) {
    if (ghost == null) {
      return "";
    }
    return ghost
        .measure(measure.definition().name())
        .filter(other -> other.value().isPresent())
        .map(other -> Shown.of(other).value())
        .orElse("\u2013");
  }

  private void addRow(
      int row, String title, String value, String unit, String kept, String hint, String style) {
    Label name = new Label(title);
    name.getStyleClass().add(style);
    if (!hint.isEmpty()) {
      Tooltip tooltip = new Tooltip(hint);
      tooltip.setWrapText(true);
      tooltip.setMaxWidth(340);
      tooltip.setShowDelay(Duration.millis(250));
      name.setTooltip(tooltip);
    }
    Label figure = new Label(value);
    figure.getStyleClass().addAll(style, "figure");
    figure.setMinWidth(USE_PREF_SIZE);
    Label measure = new Label(unit);
    measure.getStyleClass().add("quiet");
    measure.setMinWidth(USE_PREF_SIZE);
    name.setWrapText(true);
    name.setMinHeight(USE_PREF_SIZE);
    rows.addRow(row, name, figure, measure);
    if (!kept.isEmpty()) {
      Label other = new Label(kept);
      other.getStyleClass().addAll("figure", "kept");
      other.setMinWidth(USE_PREF_SIZE);
      rows.add(other, 3, row);
    }
  }

  /** A value in the unit in which it is read. */
  private record Shown(String value, String unit) {

    static Shown of(Measure measure) {
      double value = measure.value().orElseThrow();
      return switch (measure.definition().unit()) {
        case "rad" ->
            measure.definition().name().startsWith("helix")
                ? new Shown(Written.reading(value), "rad")
                : new Shown(Written.reading(Math.toDegrees(value)), "deg");
        case "rad/s" -> new Shown(Written.reading(Math.toDegrees(value)), "deg/s");
        case "rad/s2" -> new Shown(Written.reading(Math.toDegrees(value)), "deg/s\u00b2");
        case "1" -> new Shown(Written.reading(100 * value), "%");
        default -> new Shown(Written.reading(value), measure.definition().unit());
      };
    }
  }
}
