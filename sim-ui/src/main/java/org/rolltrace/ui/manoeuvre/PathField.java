package org.rolltrace.ui.manoeuvre;

import java.util.Optional;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.session.DeskSession;

/**
 * A field for one value of the scenario. What is typed goes into the document at once, in any unit;
 * the fault that the reader finds there stands below the field.
 */
final class PathField extends VBox {
  private static final PseudoClass FAULTY = PseudoClass.getPseudoClass("faulty");

  private final DeskSession session;
  private final FieldTarget target;
  private final TextField field = new TextField();
  private final Label fault = new Label();
  private boolean showing;

  PathField(DeskSession session, FieldTarget target) {
    this.session = session;
    this.target = target;
    getStyleClass().add("path-field");
    Label label = new Label(target.title());
    label.getStyleClass().add("field-label");
    label.setLabelFor(field);
    field.setId(target.id());
    field.setAccessibleText(target.title());
    field.setPromptText(target.prompt());
    field.setTooltip(new Tooltip(target.hint()));
    field.setPrefColumnCount(target.columns());
    fault.getStyleClass().add("field-fault");
    fault.setId(target.id() + "-fault");
    fault.setWrapText(true);
    fault.setManaged(false);
    fault.setVisible(false);
    fault.maxWidthProperty().bind(field.widthProperty().multiply(2.2));
    getChildren().addAll(label, field, fault);

    field.textProperty().addListener((property, before, now) -> typed(now));
    field
        .focusedProperty()
        .addListener(
            (property, before, focused) -> {
              if (!focused) {
                session.endGesture();
                show();
              }
            });
    field.setOnAction(event -> session.endGesture());
    session.documentProperty().addListener((property, before, now) -> show());
    session.faults().addListener((javafx.collections.ListChangeListener<Object>) c -> showFault());
    show();
    showFault();
  }

  private void typed(String text) {
    ScenarioDocument document = session.documentProperty().get();
    if (showing || document == null || text.equals(target.textIn(document).orElse(""))) {
      return;
    }
    session.edit("change " + target.word(), target.id(), edited -> target.put(edited, text));
  }

  /** Shows the document's text, unless it is what the user is typing. */
  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    String text = document == null ? "" : target.textIn(document).orElse("");
    if (!field.getText().equals(text)) {
      showing = true;
      field.setText(text);
      showing = false;
    }
  }

  private void showFault() {
    Optional<String> message = session.faultAt(target.path());
    pseudoClassStateChanged(FAULTY, message.isPresent());
    fault.setText(message.orElse(""));
    fault.setManaged(message.isPresent());
    fault.setVisible(message.isPresent());
  }
}
