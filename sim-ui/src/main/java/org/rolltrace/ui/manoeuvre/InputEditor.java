package org.rolltrace.ui.manoeuvre;

import java.util.List;
import java.util.function.UnaryOperator;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.session.DeskSession;

/** The selected input as typed values, and the buttons that add and remove inputs. */
final class InputEditor extends FlowPane {
  private static final List<String> SHAPES = List.of("step", "hold", "doublet");

  private final DeskSession session;
  private final LanesPane lanes;
  private final ComboBox<String> control = new ComboBox<>();
  private final ComboBox<String> shape = new ComboBox<>();
  private final PathField start;
  private final PathField size;
  private final PathField length;
  private final PathField hand;
  private final List<Node> ofInput;
  private boolean showing;

  InputEditor(DeskSession session, LanesPane lanes) {
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
    control.getItems().setAll("stick", "pedal");
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
    length = new PathField(session, durationTarget());
    hand = new PathField(session, handTarget());
    ofInput =
        List.of(labelled("Control", control), labelled("Shape", shape), start, size, length, hand);
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
        "Fraction of travel, added to the trimmed position; right positive, \u22121 to 1",
        5);
  }

  private FieldTarget durationTarget() {
    return FieldTarget.quantity(
        path("duration"),
        "Held for",
        "duration of the hold",
        "2 s",
        "From the start to the beginning of the return",
        6);
  }

  private FieldTarget widthTarget() {
    return FieldTarget.quantity(
        path("width"), "Width", "width of the doublet", "0.5 s", "From one move to the next", 6);
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
    showing = false;
    start.retarget(startTarget());
    size.retarget(sizeTarget());
    length.retarget(kind.equals("doublet") ? widthTarget() : durationTarget());
    length.setShown(!kind.equals("step"));
    hand.retarget(handTarget());
  }
}
