package org.rolltrace.ui.control;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Insets;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.ui.session.DeskSession;

/** The limits that the result met, and what it may be used for: always in sight. */
public final class CautionsPane extends VBox {
  private final DeskSession session;
  private List<String> shown = List.of();

  /**
   * A pane.
   *
   * @param session whose result is shown
   */
  public CautionsPane(DeskSession session) {
    super(4);
    this.session = session;
    setId("cautions");
    getStyleClass().add("cautions");
    setPadding(new Insets(6, 10, 8, 10));
    session.resultProperty().addListener((property, before, now) -> show());
    show();
  }

  private void show() {
    RunResult result = session.resultProperty().get();
    List<String> sentences = new ArrayList<>();
    if (result != null) {
      result.cautions().forEach(sentence -> sentences.add("Caution: " + sentence));
    }
    sentences.add(Safety.NOTICE);
    if (sentences.equals(shown)) {
      return;
    }
    shown = sentences;
    getChildren().clear();
    for (String sentence : sentences) {
      Label label = new Label(sentence);
      label.setWrapText(true);
      label.setMinHeight(USE_PREF_SIZE);
      label.getStyleClass().add(sentence.equals(Safety.NOTICE) ? "notice" : "caution");
      getChildren().add(label);
    }
  }
}
