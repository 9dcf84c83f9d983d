package org.rolltrace.ui.manoeuvre;

import java.util.Optional;
import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.session.DeskSession;

/**
 * A field for one value of the scenario. What is typed goes into the document at once, in any unit;
 * the fault that the reader finds there stands below the field.
 */
final class PathField extends VBox {
  private static final PseudoClass FAULTY = PseudoClass.getPseudoClass("faulty");

  private final DeskSession session;
  private final Label label = new Label();
  private final TextField field = new TextField();
  private final Tooltip hint = new Tooltip();
  private final Label fault = new Label();
  private FieldTarget target;
  private boolean showing;

  PathField(DeskSession session, FieldTarget target) {
    this.session = session;
    getStyleClass().add("path-field");
    label.getStyleClass().add("field-label");
    label.setLabelFor(field);
    field.setTooltip(hint);
    fault.getStyleClass().add("field-fault");
    fault.setWrapText(true);
    fault.setMinHeight(USE_PREF_SIZE);
    fault.maxWidthProperty().bind(field.widthProperty().multiply(2.2));
    getChildren().addAll(label, field, fault);
    retarget(target);

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
    session.faults().addListener((ListChangeListener<FileFault>) change -> showFault());
  }

  /** Shows and changes another value from now on. */
  final void retarget(FieldTarget newTarget) {
    target = newTarget;
    label.setText(target.title());
    field.setId(target.id());
    field.setAccessibleText(target.title());
    field.setPromptText(target.prompt());
    field.setPrefColumnCount(target.columns());
    hint.setText(target.hint());
    fault.setId(target.id() + "-fault");
    show();
    showFault();
  }

  /** Takes part in the layout, or not. */
  final void setShown(boolean shown) {
    setVisible(shown);
    setManaged(shown);
  }

  private void typed(String text) {
    ScenarioDocument document = session.documentProperty().get();
    if (showing || document == null || target.says(document, text)) {
      return;
    }
    session.edit("change " + target.word(), target.id(), edited -> target.put(edited, text));
  }

  /** Shows the document's text, unless it is what the user is typing. */
  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    String text = document == null ? "" : target.textIn(document).orElse("");
    boolean shown =
        document == null ? field.getText().isEmpty() : target.says(document, field.getText());
    if (!shown) {
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
