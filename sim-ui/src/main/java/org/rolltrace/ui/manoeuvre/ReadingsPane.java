package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.animation.PauseTransition;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.session.DeskSession;

/**
 * What the roll means: measures with their definitions, the values kept to compare with and the
 * differences.
 */
final class ReadingsPane extends VBox {
  private static final PseudoClass MISSING = PseudoClass.getPseudoClass("missing");

  /** After this without a result the readings no longer pass for those of what is typed. */
  private static final Duration LATE = Duration.millis(150);

  private static final double DIMMED = 0.45;

  /** Width of a column of figures, px. */
  private static final double FIGURE = 80;

  private final DeskSession session;
  private final ReadOnlyBooleanProperty flying;
  private final VBox list = new VBox(3);
  private final HBox header = new HBox();
  private final Label differenceTitle = figure("");
  private final Label keptWords = new Label();
  private final PauseTransition late = new PauseTransition(LATE);
  private final List<Row> rows = new ArrayList<>();
  private final Label state = new Label();

  ReadingsPane(DeskSession session, ReadOnlyBooleanProperty flying) {
    this.session = session;
    this.flying = flying;
    flying.addListener((property, before, now) -> showState());
    getStyleClass().add("readings-pane");
    setPadding(new Insets(8, 10, 8, 10));
    setSpacing(6);
    state.getStyleClass().add("state");
    state.setWrapText(true);
    state.setId("state");
    state.setMinHeight(USE_PREF_SIZE);
    header.setAlignment(Pos.CENTER_RIGHT);
    header.setPadding(new Insets(0, 12, 0, 0));
    header.getChildren().addAll(figure("now"), figure("kept"), differenceTitle);
    header.getChildren().forEach(label -> label.getStyleClass().add("quiet"));
    keptWords.getStyleClass().add("quiet");
    keptWords.setWrapText(true);
    keptWords.setMinHeight(USE_PREF_SIZE);
    keptWords.setId("kept-words");
    late.setOnFinished(event -> list.setOpacity(DIMMED));
    list.setId("readings");
    list.setPadding(new Insets(0, 12, 0, 0)); // clear of the scroll bar
    ScrollPane scroll = new ScrollPane(list);
    scroll.setFitToWidth(true);
    scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    scroll.getStyleClass().add("edge-to-edge");
    VBox.setVgrow(scroll, Priority.ALWAYS);
    Label heading = new Label("Readings");
    heading.getStyleClass().add("heading");
    getChildren().addAll(heading, state, keptWords, header, scroll);
    session.documentProperty().addListener((property, before, now) -> late.playFromStart());
    session.resultProperty().addListener((property, before, now) -> show());
    session.ghostProperty().addListener((property, before, now) -> show());
    session.staleProperty().addListener((property, before, now) -> showState());
    session.failureProperty().addListener((property, before, now) -> showState());
    session.recoveryProblemProperty().addListener((property, before, now) -> showState());
    session.faults().addListener((ListChangeListener<FileFault>) change -> showState());
    show();
    showState();
  }

  private static Label figure(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("figure");
    label.setAlignment(Pos.CENTER_RIGHT);
    label.setMinWidth(FIGURE);
    label.setPrefWidth(FIGURE);
    return label;
  }

  private void showState() {
    int faults = session.faults().size();
    String words;
    if (flying.get()) {
      words = "Flying by hand: these are the readings of the run before.";
    } else if (faults > 0) {
      words =
          (faults == 1 ? "One value cannot be used" : faults + " values cannot be used")
              + "; the curves are from before: "
              + session.faults().get(0).message();
    } else if (!session.failureProperty().get().isEmpty()) {
      words = session.failureProperty().get();
    } else {
      words = session.recoveryProblemProperty().get();
    }
    state.setText(words);
    state.setManaged(!words.isEmpty());
    state.setVisible(!words.isEmpty());
    late.stop();
    list.setOpacity(session.staleProperty().get() || flying.get() ? DIMMED : 1);
  }

  private void show() {
    RunResult result = session.resultProperty().get();
    if (result == null) {
      return;
    }
    Optional<RunResult> kept = Optional.ofNullable(session.ghostProperty().get());
    header.setManaged(kept.isPresent());
    header.setVisible(kept.isPresent());
    keptWords.setManaged(kept.isPresent());
    keptWords.setVisible(kept.isPresent());
    if (kept.isPresent()) {
      keptWords.setText("Kept: " + Reading.flown(kept.get()));
      differenceTitle.setText(Reading.areOpposite(result, kept.get()) ? "of sizes" : "difference");
    }
    showState();
    List<Reading> readings = Reading.of(result, kept);
    while (rows.size() < readings.size()) {
      Row row = new Row();
      rows.add(row);
      list.getChildren().add(row);
    }
    for (int i = 0; i < rows.size(); i++) {
      rows.get(i).show(i < readings.size() ? Optional.of(readings.get(i)) : Optional.empty());
    }
  }

  /** One reading: a line, or two when there is something to compare with. */
  private static final class Row extends VBox {
    private final Label title = new Label();
    private final Label unit = new Label();
    private final Label now = figure("");
    private final Label keptNow = figure("");
    private final Label kept = figure("");
    private final Label difference = figure("");
    private final HBox line = new HBox(6);
    private final HBox figures = new HBox(keptNow, kept, difference);
    private final Tooltip tooltip = new Tooltip();

    Row() {
      getStyleClass().add("reading");
      title.setMaxWidth(Double.MAX_VALUE);
      HBox.setHgrow(title, Priority.ALWAYS);
      title.setTooltip(tooltip);
      tooltip.setWrapText(true);
      tooltip.setMaxWidth(340);
      tooltip.setShowDelay(Duration.millis(250));
      unit.getStyleClass().add("quiet");
      unit.setMinWidth(44);
      kept.getStyleClass().add("kept");
      figures.setAlignment(Pos.CENTER_RIGHT);
      now.setMinWidth(64);
      now.setPrefWidth(64);
      line.getChildren().addAll(title, now, unit);
      getChildren().addAll(line, figures);
    }

    void show(Optional<Reading> reading) {
      setManaged(reading.isPresent());
      setVisible(reading.isPresent());
      if (reading.isEmpty()) {
        return;
      }
      Reading shown = reading.get();
      boolean compares = !shown.kept().isEmpty();
      title.setText(shown.title());
      title.setMinWidth(0);
      tooltip.setText(shown.hint());
      unit.setText(shown.unit());
      now.setText(compares ? "" : shown.now());
      now.setManaged(!compares);
      keptNow.setText(shown.now());
      kept.setText(shown.kept());
      difference.setText(shown.difference());
      figures.setManaged(compares);
      figures.setVisible(compares);
      pseudoClassStateChanged(MISSING, !shown.available());
    }
  }
}
