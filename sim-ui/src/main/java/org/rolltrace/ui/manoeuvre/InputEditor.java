package org.rolltrace.ui.manoeuvre;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;
import org.rolltrace.ui.session.DeskSession;

/** The selected input as typed values, and the buttons that add and remove inputs. */
final class InputEditor extends FlowPane {
  private static final List<String> SHAPES = ScenarioDocument.shapes();

  /** The most fields that a shape has beside start and size. */
  private static final int MOST_OWN = 4;

  private final DeskSession session;
  private final LanesPane lanes;
  private final ComboBox<String> control = new ComboBox<>();
  private final ComboBox<String> shape = new ComboBox<>();
  private final PathField start;
  private final PathField size;
  private final List<PathField> own = new ArrayList<>();
  private final ComboBox<String> law = new ComboBox<>();
  private final Node labelledLaw;
  private final Node chooseFile;
  private final List<Node> ofInput;
  private boolean showing;

  InputEditor(DeskSession session, LanesPane lanes, Function<Path, Optional<Path>> askTrace) {
    super(10, 6);
    this.session = session;
    this.lanes = lanes;
    setId("input-editor");
    getStyleClass().add("input-editor");
    MenuButton add = new MenuButton("Add input");
    add.setId("add-input");
    add.setMinWidth(USE_PREF_SIZE);
    for (Control moved : Control.values()) {
      for (String kind : SHAPES) {
        MenuItem item = new MenuItem(moved.word() + " " + kind);
        item.setId("add-" + moved.word() + "-" + kind);
        item.setOnAction(event -> lanes.addInput(moved, kind, 1));
        add.getItems().add(item);
      }
    }
    Button remove = new Button("Remove");
    remove.setId("remove-input");
    remove.setMinWidth(USE_PREF_SIZE);
    remove.setOnAction(event -> lanes.removeSelected());
    remove.disableProperty().bind(lanes.selectedProperty().lessThan(0));
    for (Control moved : Control.values()) {
      control.getItems().add(moved.word());
    }
    control.setId("input-control");
    control.setOnAction(
        event ->
            choose(
                "change control", document -> document.with(path("control"), control.getValue())));
    shape.getItems().setAll(SHAPES);
    shape.setId("input-shape");
    shape.setOnAction(
        event ->
            choose(
                "change shape",
                document ->
                    document.withInputShape(lanes.selectedProperty().get(), shape.getValue())));
    start = new PathField(session, startTarget());
    size = new PathField(session, sizeTarget());
    for (int i = 0; i < MOST_OWN; i++) {
      own.add(new PathField(session, durationTarget("")));
    }
    law.getItems().setAll("linear", "logarithmic");
    law.setId("input-law");
    law.setOnAction(
        event -> choose("change law", document -> document.with(path("law"), law.getValue())));
    labelledLaw = labelled("Law", law);
    ofInput = new ArrayList<>();
    ofInput.addAll(List.of(labelled("Control", control), labelled("Shape", shape), start, size));
    ofInput.addAll(own);
    ofInput.add(labelledLaw);
    Button choose = new Button("Choose\u2026");
    choose.setId("choose-trace");
    choose.setMinWidth(USE_PREF_SIZE);
    choose.setTooltip(new Tooltip("Chooses the CSV file of the trace"));
    choose.setOnAction(
        event ->
            askTrace
                .apply(session.documentProperty().get().directory())
                .ifPresent(
                    file ->
                        choose(
                            "choose trace",
                            document -> document.with(path("file"), document.nameOf(file)))));
    chooseFile = labelled(" ", choose);
    ofInput.add(ofInput.indexOf(own.get(0)) + 1, chooseFile); // behind the field of the file
    getChildren().add(labelled("Inputs", new HBox(6, add, remove)));
    getChildren().addAll(ofInput);
    lanes.selectedProperty().addListener((property, before, now) -> show());
    session.documentProperty().addListener((property, before, now) -> show());
    show();
  }

  private static Node labelled(String words, Node node) {
    Label label = new Label(words);
    label.getStyleClass().add("field-label");
    return new VBox(label, node);
  }

  private void choose(String word, UnaryOperator<ScenarioDocument> change) {
    if (!showing) {
      session.edit(word, change);
    }
  }

  private String path(String key) {
    return "$.inputs[" + Math.max(0, lanes.selectedProperty().get()) + "]." + key;
  }

  private FieldTarget startTarget() {
    return FieldTarget.quantity(
        path("start"), "Start", "start of the input", "1 s", "When the hand begins to move", 6);
  }

  private FieldTarget sizeTarget() {
    return FieldTarget.number(
        path("size"),
        "Size",
        "size of the input",
        "0.5",
        "Fraction of travel, added to the trimmed position, or of the rated power, added to that at"
            + " the start; right and more positive, \u22121 to 1",
        5);
  }

  private FieldTarget shiftTarget() {
    return FieldTarget.quantity(
        path("start"), "Start", "start of the trace", "0 s", "What is added to its times", 6);
  }

  private FieldTarget scaleTarget() {
    return FieldTarget.number(
        path("size"),
        "Times",
        "size of the trace",
        "1",
        "What the recorded positions are multiplied by, \u22121 to 1",
        5);
  }

  private FieldTarget durationTarget(String kind) {
    return FieldTarget.quantity(
        path("duration"),
        kind.equals("hold") ? "Held for" : "Lasts",
        "duration of the " + kind,
        "2 s",
        switch (kind) {
          case "hold" -> "From the start to the beginning of the return";
          case "ramp" -> "From the start until the size is reached, to stay";
          default ->
              "From the first frequency to the last; then on to the next passage through zero";
        },
        6);
  }

  private FieldTarget widthTarget() {
    return FieldTarget.quantity(
        path("width"), "Width", "width of the doublet", "0.5 s", "From one move to the next", 6);
  }

  private FieldTarget unitTarget() {
    return FieldTarget.quantity(
        path("unit"), "Unit", "unit of the steps", "0.5 s", "How long one unit lasts", 6);
  }

  private FieldTarget patternTarget() {
    return FieldTarget.numbers(
        path("pattern"),
        "Pattern",
        "pattern of the steps",
        "3, 2, 1, 1",
        "How many units it stays at each side, by turns; whole numbers",
        8);
  }

  private FieldTarget frequencyTarget(String key, String title, String prompt) {
    return FieldTarget.quantity(
        path(key), title, "frequency", prompt, "In Hz, or as an angle per time in rad/s", 6);
  }

  private FieldTarget fileTarget() {
    return FieldTarget.quantity(
        path("file"),
        "File",
        "file of the trace",
        "traces/roll.csv",
        "A CSV file, from the folder of the scenario",
        14);
  }

  private FieldTarget cutTarget(String key, String title, String word) {
    return FieldTarget.quantity(
        path(key),
        title,
        word + " of the trace",
        word,
        "What is flown of the trace, in the times of its file; left empty, its " + word,
        5);
  }

  private FieldTarget columnTarget() {
    return FieldTarget.quantity(
        path("column"),
        "Column",
        "column of the trace",
        "stick",
        "Its name in the first line of the file, without the unit",
        6);
  }

  /** The fields that only some shapes have, in their order. */
  private List<FieldTarget> ownTargets(String kind) {
    return switch (kind) {
      case "hold" -> List.of(durationTarget(kind), handTarget());
      case "doublet" -> List.of(widthTarget(), handTarget());
      case "multistep" -> List.of(unitTarget(), patternTarget(), handTarget());
      case "ramp" -> List.of(durationTarget(kind));
      case "sweep" ->
          List.of(
              frequencyTarget("from", "From", "0.2 Hz"),
              frequencyTarget("to", "To", "2 Hz"),
              durationTarget(kind));
      case "trace" ->
          List.of(
              fileTarget(),
              columnTarget(),
              cutTarget("cutBefore", "From", "beginning"),
              cutTarget("cutAfter", "To", "end"));
      default -> List.of(handTarget());
    };
  }

  private FieldTarget handTarget() {
    return FieldTarget.quantity(
        path("movement"),
        "Hand takes",
        "movement of the hand",
        "0.1 s",
        "How long the hand takes for a move; 0 s is a jump",
        6);
  }

  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    int index = lanes.selectedProperty().get();
    boolean any = document != null && index >= 0 && index < document.inputCount();
    ofInput.forEach(
        node -> {
          node.setVisible(any);
          node.setManaged(any);
        });
    if (!any) {
      return;
    }
    showing = true;
    control.setValue(document.text(path("control")).orElse(""));
    String kind = document.text(path("shape")).orElse("");
    shape.setValue(kind);
    law.setValue(document.text(path("law")).orElse("linear"));
    showing = false;
    boolean isTrace = kind.equals("trace");
    start.retarget(isTrace ? shiftTarget() : startTarget());
    size.retarget(isTrace ? scaleTarget() : sizeTarget());
    List<FieldTarget> targets = ownTargets(kind);
    for (int i = 0; i < own.size(); i++) {
      own.get(i).setShown(i < targets.size());
      if (i < targets.size()) {
        own.get(i).retarget(targets.get(i));
      }
    }
    labelledLaw.setVisible(kind.equals("sweep"));
    labelledLaw.setManaged(kind.equals("sweep"));
    chooseFile.setVisible(isTrace);
    chooseFile.setManaged(isTrace);
  }
}
