package org.rolltrace.ui.control;

import java.util.Optional;
import java.util.function.BinaryOperator;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.geometry.BoundingBox;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
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
public final class PathField extends VBox {
  private static final PseudoClass SKINNED = PseudoClass.getPseudoClass("skinned");
  private static final PseudoClass FAULTY = PseudoClass.getPseudoClass("faulty");

  private static final double FAULT_WIDTH = 290;
  private static final double MARGIN = 8;

  private final DeskSession session;
  private final Label label = new Label();
  private final TextField field = new TextField();
  private final Tooltip hint = new Tooltip();
  private final Label fault = new Label();
  private final BinaryOperator<ScenarioDocument> follow;
  private final Function<ScenarioDocument, Optional<String>> implied;
  private FieldTarget target;
  private boolean showing;

  /**
   * A field.
   *
   * @param session what is edited
   * @param target the value
   */
  public PathField(DeskSession session, FieldTarget target) {
    this(session, target, (document, put) -> put);
  }

  /**
   * A field whose changes bring others along.
   *
   * @param session what is edited
   * @param target the value
   * @param follow makes of the document with which the typing began, and of the same with what is
   *     typed, the one with all that follows
   */
  public PathField(
      DeskSession session, FieldTarget target, BinaryOperator<ScenarioDocument> follow) {
    this(session, target, follow, document -> Optional.empty());
  }

  /**
   * A field that shows what follows from other values where nothing is written.
   *
   * @param session what is edited
   * @param target the value
   * @param follow as in the other constructor
   * @param implied the text that follows; empty when none does
   */
  public PathField(
      DeskSession session,
      FieldTarget target,
      BinaryOperator<ScenarioDocument> follow,
      Function<ScenarioDocument, Optional<String>> implied) {
    this.session = session;
    this.follow = follow;
    this.implied = implied;
    getStyleClass().add("path-field");
    label.getStyleClass().add("field-label");
    label.setLabelFor(field);
    field.setTooltip(hint);
    fault.getStyleClass().add("field-fault");
    fault.setWrapText(true);
    fault.setMinHeight(USE_PREF_SIZE);
    fault.setManaged(false);
    fault.setMouseTransparent(true);
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
    // A field gets the colour of its text only in a style pass after the one that made its skin.
    field
        .skinProperty()
        .addListener(
            (property, before, now) ->
                Platform.runLater(() -> field.pseudoClassStateChanged(SKINNED, true)));
    field.setOnAction(event -> session.endGesture());
    session.documentProperty().addListener((property, before, now) -> show());
    session.faults().addListener((ListChangeListener<FileFault>) change -> showFault());
  }

  /**
   * Shows and changes another value from now on.
   *
   * @param newTarget the value
   */
  public final void retarget(FieldTarget newTarget) {
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

  /**
   * Takes part in the layout, or not.
   *
   * @param shown whether it does
   */
  public final void setShown(boolean shown) {
    setVisible(shown);
    setManaged(shown);
  }

  private void typed(String text) {
    ScenarioDocument document = session.documentProperty().get();
    if (showing || document == null || says(document, text)) {
      return;
    }
    session.editFromStart(
        "change " + target.word(),
        target.id(),
        start -> follow.apply(start, target.put(start, text)));
  }

  private Optional<String> textIn(ScenarioDocument document) {
    return target.textIn(document).or(() -> implied.apply(document));
  }

  private boolean says(ScenarioDocument document, String text) {
    return target.says(document, text)
        || (target.textIn(document).isEmpty() && implied.apply(document).equals(Optional.of(text)));
  }

  /** Shows the document's text, unless it is what the user is typing. */
  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    boolean shown = document == null ? field.getText().isEmpty() : isShown(document);
    if (!shown) {
      showing = true;
      field.setText(document == null ? "" : textIn(document).orElse(""));
      showing = false;
    }
  }

  /** A field that is being emptied stays empty, also where something follows without it. */
  private boolean isShown(ScenarioDocument document) {
    if (field.getText().isEmpty()) {
      return textIn(document).isEmpty() || (field.isFocused() && target.textIn(document).isEmpty());
    }
    return says(document, field.getText());
  }

  private void showFault() {
    ScenarioDocument document = session.documentProperty().get();
    Optional<String> message =
        document == null
            ? Optional.empty()
            : target.pathsIn(document).stream()
                .flatMap(path -> session.faultAt(path).stream())
                .findFirst()
                .or(this::missingOneOfSeveral);
    pseudoClassStateChanged(FAULTY, message.isPresent());
    fault.setText(message.orElse(""));
    fault.setVisible(message.isPresent());
    // In front of whatever stands where the text floats.
    for (Node node = this; node != null; node = node.getParent()) {
      node.setViewOrder(message.isPresent() ? -1 : 0);
    }
    requestLayout();
  }

  /** Without any of the airspeeds the fault is the condition's. */
  private Optional<String> missingOneOfSeveral() {
    return target.path().endsWith("Airspeed") && field.getText().isEmpty()
        ? session.faults().stream()
            .filter(found -> found.jsonPath().equals("$.condition"))
            .map(FileFault::message)
            .findFirst()
        : Optional.empty();
  }

  /** The fault floats below the field, or above it where the window ends, and moves nothing. */
  @Override
  protected void layoutChildren() {
    super.layoutChildren();
    if (!fault.isVisible() || getScene() == null) {
      return;
    }
    Bounds room = room();
    double width =
        Math.min(Math.min(FAULT_WIDTH, room.getWidth() - 2 * MARGIN), fault.prefWidth(-1));
    double height = fault.prefHeight(width);
    Point2D place = localToScene(0, field.getBoundsInParent().getMaxY() + 2);
    double x = Math.min(0, room.getMaxX() - MARGIN - width - place.getX());
    boolean below = place.getY() + height + MARGIN < room.getMaxY();
    double y = below ? field.getBoundsInParent().getMaxY() + 2 : -height - 2;
    fault.resizeRelocate(x, y, width, height);
  }

  /** What of the scene the fault may cover: a pane that scrolls shows nothing outside itself. */
  private Bounds room() {
    for (Node node = getParent(); node != null; node = node.getParent()) {
      if (node instanceof ScrollPane pane) {
        Bounds whole = pane.localToScene(pane.getLayoutBounds());
        return new BoundingBox(
            whole.getMinX(),
            whole.getMinY(),
            pane.getViewportBounds().getWidth(), // without the scroll bar
            whole.getHeight());
      }
    }
    return new BoundingBox(0, 0, getScene().getWidth(), getScene().getHeight());
  }
}
