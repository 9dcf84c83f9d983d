package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.ui.session.DeskSession;

/** The selected input as typed values, and the buttons that add and remove inputs. */
final class InputEditor extends HBox {
  private static final List<String> SHAPES = List.of("step", "hold", "doublet");

  private final DeskSession session;
  private final LanesPane lanes;
  private final HBox fields = new HBox(8);
  private String shown = "";

  InputEditor(DeskSession session, LanesPane lanes) {
    super(10);
    this.session = session;
    this.lanes = lanes;
    setId("input-editor");
    getStyleClass().add("input-editor");
    setAlignment(Pos.TOP_LEFT);
    MenuButton add = new MenuButton("Add input");
    add.setId("add-input");
    for (Control control : Control.values()) {
      for (String shape : SHAPES) {
        MenuItem item = new MenuItem(control.word() + " " + shape);
        item.setId("add-" + control.word() + "-" + shape);
        item.setOnAction(event -> lanes.addInput(control, shape, 1));
        add.getItems().add(item);
      }
    }
    Button remove = new Button("Remove");
    remove.setId("remove-input");
    remove.setOnAction(event -> lanes.removeSelected());
    remove.disableProperty().bind(lanes.selectedProperty().lessThan(0));
    getChildren().addAll(labelled("Inputs", new HBox(6, add, remove)), fields);
    lanes.selectedProperty().addListener((property, before, now) -> show());
    session.documentProperty().addListener((property, before, now) -> show());
    show();
  }

  private static Node labelled(String words, Node node) {
    Label label = new Label(words);
    label.getStyleClass().add("field-label");
    return new VBox(label, node);
  }

  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    int index = lanes.selectedProperty().get();
    if (document == null || index < 0 || index >= document.inputCount()) {
      fields.getChildren().clear();
      shown = "";
      return;
    }
    String base = "$.inputs[" + index + "].";
    String shape = document.text(base + "shape").orElse("");
    String control = document.text(base + "control").orElse("");
    String key = index + control + shape;
    if (key.equals(shown)) {
      return;
    }
    shown = key;
    List<Node> nodes = new ArrayList<>();
    nodes.add(labelled("Control", choice("control", List.of("stick", "pedal"), control, base)));
    nodes.add(labelled("Shape", choice("shape", SHAPES, shape, base)));
    nodes.add(
        quantity(
            base + "start", "Start", "start of the input", "1 s", "When the hand begins to move"));
    nodes.add(
        new PathField(
            session,
            FieldTarget.number(
                base + "size",
                "Size",
                "size of the input",
                "0.5",
                "Fraction of travel, right positive, \u22121 to 1",
                5)));
    if (shape.equals("hold")) {
      nodes.add(
          quantity(
              base + "duration",
              "Held for",
              "duration of the hold",
              "2 s",
              "From the start to the beginning of the return"));
    }
    if (shape.equals("doublet")) {
      nodes.add(
          quantity(
              base + "width",
              "Width",
              "width of the doublet",
              "0.5 s",
              "From one move to the next"));
    }
    nodes.add(
        quantity(
            base + "movement",
            "Hand takes",
            "movement of the hand",
            "0.1 s",
            "How long the hand takes for a move; 0 s is a jump"));
    fields.getChildren().setAll(nodes);
  }

  private PathField quantity(String path, String title, String word, String prompt, String hint) {
    return new PathField(session, FieldTarget.quantity(path, title, word, prompt, hint, 6));
  }

  private ComboBox<String> choice(String key, List<String> words, String value, String base) {
    ComboBox<String> box = new ComboBox<>();
    box.getItems().setAll(words);
    box.setValue(value);
    box.setId("input-" + key);
    int index = lanes.selectedProperty().get();
    box.setOnAction(
        event -> {
          String chosen = box.getValue();
          if (chosen == null) {
            return;
          }
          session.edit(
              "change " + key,
              document ->
                  key.equals("shape")
                      ? document.withInputShape(index, chosen)
                      : document.with(base + key, chosen));
        });
    return box;
  }
}
