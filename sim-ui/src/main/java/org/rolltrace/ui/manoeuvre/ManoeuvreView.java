package org.rolltrace.ui.manoeuvre;

import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.session.DeskSession;

/**
 * The workplace of one manoeuvre: what is flown above, what happened in the middle, what it means
 * at the right, what the hand did below.
 */
public final class ManoeuvreView extends BorderPane {
  /** Width of the panes at either side, px. */
  private static final double SIDE = 276;

  private static final double READINGS = 322;

  /** Below this width the figures of the aeroplane take the place of the readings, px. */
  private static final double NARROW = 1080;

  private final ManoeuvreModel model;
  private final FiguresPane figures;
  private final ReadingsPane readings;
  private final CautionsPane cautions;
  private final VBox left = new VBox();
  private final VBox right = new VBox();
  private final ToggleButton showFigures = new ToggleButton("Aeroplane\u2026");

  /**
   * A view.
   *
   * @param model what it shows
   * @param palette the colours of the drawings
   */
  public ManoeuvreView(ManoeuvreModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    DeskSession session = model.session();
    getStyleClass().add("manoeuvre");
    figures = new FiguresPane(session);
    left.setPrefWidth(SIDE);
    left.setMinWidth(SIDE);
    StagePane stage = new StagePane(model, palette);
    LanesPane lanes = new LanesPane(model, palette, stage);
    VBox.setVgrow(stage, Priority.ALWAYS);
    ReplayBar replay = new ReplayBar(model);
    InputEditor editor = new InputEditor(session, lanes);
    VBox centre = new VBox(stage, lanes, replay, editor);
    centre.getStyleClass().add("centre");
    setCenter(centre);
    readings = new ReadingsPane(session);
    cautions = new CautionsPane(session);
    VBox.setVgrow(readings, Priority.ALWAYS);
    VBox.setVgrow(figures, Priority.ALWAYS);
    right.getStyleClass().add("side");
    left.getStyleClass().add("side");
    right.setPrefWidth(READINGS);
    right.setMinWidth(READINGS);
    arrange();
    setTop(new ConditionStrip(session));
    showFigures.setId("show-figures");
    showFigures.setTooltip(new Tooltip("Figures and derivatives of the aeroplane"));
    showFigures.selectedProperty().addListener((property, before, now) -> arrange());
    widthProperty().addListener((property, before, now) -> arrange());
  }

  private void arrange() {
    boolean shown = showFigures.isSelected();
    boolean narrow = getWidth() > 0 && getWidth() < NARROW;
    boolean replaced = shown && narrow;
    left.getChildren().setAll(replaced ? List.of(figures, cautions) : List.of(figures));
    right.getChildren().setAll(replaced ? List.of(readings) : List.of(readings, cautions));
    setLeft(shown ? left : null);
    setRight(replaced ? null : right);
  }

  /**
   * The buttons that compare and that show the aeroplane, for the top of the window.
   *
   * @return a row of buttons
   */
  public HBox actions() {
    DeskSession session = model.session();
    Button keep = new Button("Keep to compare");
    keep.setId("keep-ghost");
    keep.setTooltip(
        new Tooltip("Keeps the present curves, dashed, to compare the next change with"));
    keep.setOnAction(event -> session.keepGhost());
    Button drop = new Button("Drop");
    drop.setId("drop-ghost");
    drop.setTooltip(new Tooltip("Forgets the kept curves"));
    drop.disableProperty().bind(session.ghostProperty().isNull());
    drop.setOnAction(event -> session.dropGhost());
    Button mirror = new Button("Left against right");
    mirror.setId("mirror");
    mirror.setTooltip(
        new Tooltip("Keeps the present curves and turns all inputs to the other side"));
    mirror.setOnAction(event -> model.compareMirrored());
    HBox actions = new HBox(8, showFigures, keep, drop, mirror);
    actions.getStyleClass().add("actions");
    actions.setAlignment(Pos.CENTER_RIGHT);
    return actions;
  }
}
