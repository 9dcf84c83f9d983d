package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.collections.ListChangeListener;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextArea;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;
import org.rolltrace.ui.session.DeskSession;

/** What else a scenario says: the state it starts from, a sideslip held against time, a note. */
final class ScenarioPane extends ScrollPane {
  private static final String NOTE = "$.note";
  private static final String TRIM = "$.start.trim";

  /** The states to trim in, and what is given with each. */
  private enum Trimmed {
    WINGS_LEVEL("wings level", "wings-level", ""),
    AT_SIDESLIP("straight, at a sideslip", "straight-sideslip", "sideslip"),
    AT_BANK("straight, at a bank", "straight-sideslip", "bank"),
    TURN("steady turn", "steady-turn", "bank");

    private final String words;
    private final String state;
    private final String key;

    Trimmed(String words, String state, String key) {
      this.words = words;
      this.state = state;
      this.key = key;
    }

    static Trimmed in(ScenarioDocument document) {
      String state = document.text(TRIM + ".state").orElse("wings-level");
      boolean byBank = document.text(TRIM + ".bank").isPresent();
      return switch (state) {
        case "steady-turn" -> TURN;
        case "straight-sideslip" -> byBank ? AT_BANK : AT_SIDESLIP;
        default -> WINGS_LEVEL;
      };
    }

    ScenarioDocument put(ScenarioDocument document) {
      if (this == WINGS_LEVEL) {
        ScenarioDocument level =
            document.without(TRIM + ".state").without(TRIM + ".bank").without(TRIM + ".sideslip");
        return level.text(TRIM + ".propellerRollMoment").isPresent() ? level : level.without(TRIM);
      }
      ScenarioDocument changed = document.with(TRIM + ".state", state);
      for (String other : List.of("bank", "sideslip")) {
        if (!other.equals(key)) {
          changed = changed.without(TRIM + "." + other);
        }
      }
      String path = TRIM + "." + key;
      return changed.text(path).isPresent()
          ? changed
          : changed.with(path, this == TURN ? "30 deg" : "5 deg");
    }

    @Override
    public String toString() {
      return words;
    }
  }

  private final DeskSession session;
  private final ComboBox<Trimmed> trim = new ComboBox<>();
  private final PathField trimValue;
  private final Label trimFault = new Label();
  private final TextArea note = new TextArea();
  private final VBox points = new VBox(4);
  private final List<Point> rows = new ArrayList<>();
  private final Label slipFault = new Label();
  private boolean showing;

  /** One point of the held sideslip. */
  private final class Point extends HBox {
    private final PathField time;
    private final PathField sideslip;

    Point(int index) {
      super(8);
      time = new PathField(session, target(index, "time", "Time", "0 s"));
      sideslip = new PathField(session, target(index, "sideslip", "Sideslip", "0 deg"));
      Button remove = new Button("\u2212");
      remove.setId("heldSlip-" + index + "-remove");
      remove.setAccessibleText("Remove this point");
      remove.setTooltip(new Tooltip("Removes this point"));
      remove.setOnAction(event -> removePoint(index));
      Label blank = new Label(" ");
      blank.getStyleClass().add("field-label");
      getChildren().addAll(time, sideslip, new VBox(blank, remove));
    }

    private static FieldTarget target(int index, String key, String title, String prompt) {
      return FieldTarget.quantity(
          "$.heldSlip[" + index + "]." + key,
          title,
          "held sideslip",
          prompt,
          key.equals("time")
              ? "Increasing from point to point"
              : "Wind from the right positive; straight from point to point",
          8);
    }
  }

  ScenarioPane(DeskSession session) {
    this.session = session;
    setId("scenario-pane");
    getStyleClass().add("figures-pane");
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    trim.getItems().setAll(Trimmed.values());
    trim.setId("trim-state");
    trim.setMaxWidth(Double.MAX_VALUE);
    trim.setOnAction(
        event -> {
          if (!showing) {
            session.edit("change trim", document -> trim.getValue().put(document));
          }
        });
    trimValue = new PathField(session, trimTarget(Trimmed.TURN));
    note.setId("note");
    note.setWrapText(true);
    note.setPrefRowCount(8);
    note.setAccessibleText("Note");
    note.textProperty().addListener((property, before, now) -> noteTyped(now));
    note.focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                session.endGesture();
              }
            });
    Button add = new Button("Add a point");
    add.setId("add-held-slip");
    add.setOnAction(event -> addPoint());
    VBox content =
        new VBox(
            10,
            heading("Start"),
            labelled("Trimmed", trim),
            trimValue,
            fault(trimFault, "trim-fault"),
            grid(
                quantity(
                    "trim.propellerRollMoment",
                    "Trim moment",
                    "as flown",
                    "Rolling moment of the propeller that it is trimmed against; left empty, the one it"
                        + " flies with"),
                quantity(
                    "bank",
                    "Then banked by",
                    "0 deg",
                    "What displaces it from trim, right wing down positive"),
                quantity(
                    "rollRate",
                    "Then rolling at",
                    "0 deg/s",
                    "What is added to the roll rate of the trim, right positive"),
                quantity(
                    "sideslip",
                    "Then slipping by",
                    "0 deg",
                    "What is added to the sideslip of the trim, wind from the right positive; free slip"
                        + " only")),
            heading("Held sideslip"),
            quiet("With held slip only: the sideslip that the pilot holds against time."),
            points,
            fault(slipFault, "heldSlip-fault"),
            add,
            heading("Note"),
            note);
    content.setPadding(new Insets(10));
    setContent(content);
    session.documentProperty().addListener((property, before, now) -> show());
    session.faults().addListener((ListChangeListener<FileFault>) change -> showFaults());
    show();
  }

  private static Label heading(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("heading");
    return label;
  }

  private static Label quiet(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("quiet");
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    return label;
  }

  private static Label fault(Label label, String id) {
    label.setId(id);
    label.getStyleClass().add("state");
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    return label;
  }

  private static Node labelled(String words, Node node) {
    Label label = new Label(words);
    label.getStyleClass().add("field-label");
    label.setLabelFor(node);
    return new VBox(label, node);
  }

  private PathField quantity(String key, String title, String prompt, String hint) {
    return new PathField(
        session, FieldTarget.quantity("$.start." + key, title, "start", prompt, hint, 9));
  }

  private static Node grid(Node... fields) {
    GridPane grid = new GridPane();
    grid.setHgap(10);
    grid.setVgap(6);
    for (int i = 0; i < fields.length; i++) {
      grid.add(fields[i], i % 2, i / 2);
    }
    return grid;
  }

  private static FieldTarget trimTarget(Trimmed kind) {
    boolean bank = kind.key.equals("bank");
    return FieldTarget.quantity(
        TRIM + "." + (bank ? "bank" : "sideslip"),
        bank ? "Bank" : "Sideslip",
        "trim",
        bank ? "30 deg" : "5 deg",
        bank ? "Right wing down positive" : "Wind from the right positive",
        9);
  }

  private void noteTyped(String text) {
    if (showing || text.equals(written())) {
      return;
    }
    session.edit(
        "change note",
        "note",
        document -> text.isEmpty() ? document.without(NOTE) : document.with(NOTE, text));
  }

  private String written() {
    ScenarioDocument document = session.documentProperty().get();
    return document == null ? "" : document.text(NOTE).orElse("");
  }

  private void addPoint() {
    session.edit(
        "add held sideslip",
        document -> {
          int count = document.heldSlipCount();
          String at = "$.heldSlip[" + count + "]";
          Optional<String> last =
              count == 0
                  ? Optional.empty()
                  : document.text("$.heldSlip[" + (count - 1) + "].sideslip");
          return document
              .with(at + ".time", count + " s")
              .with(at + ".sideslip", last.orElse("5 deg"));
        });
  }

  private void removePoint(int index) {
    session.edit(
        "remove held sideslip",
        document ->
            document.heldSlipCount() == 1
                ? document.without("$.heldSlip")
                : document.without("$.heldSlip[" + index + "]"));
  }

  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    if (document == null) {
      return;
    }
    showing = true;
    Trimmed kind = Trimmed.in(document);
    trim.setValue(kind);
    trimValue.setShown(kind != Trimmed.WINGS_LEVEL);
    if (kind != Trimmed.WINGS_LEVEL) {
      trimValue.retarget(trimTarget(kind));
    }
    if (!note.getText().equals(written())) {
      note.setText(written());
    }
    int count = document.heldSlipCount();
    while (rows.size() < count) {
      rows.add(new Point(rows.size()));
    }
    points.getChildren().setAll(rows.subList(0, count));
    showing = false;
    showFaults();
  }

  /** What is wrong as a whole; what is wrong with a field stands below it. */
  private void showFaults() {
    show(trimFault, TRIM + ".state");
    show(slipFault, "$.heldSlip");
  }

  private void show(Label label, String path) {
    Optional<String> message =
        session.faults().stream()
            .filter(found -> session.documentProperty().get().pathOf(found).equals(path))
            .map(FileFault::message)
            .findFirst();
    label.setText(message.orElse(""));
    label.setVisible(message.isPresent());
    label.setManaged(message.isPresent());
  }
}
