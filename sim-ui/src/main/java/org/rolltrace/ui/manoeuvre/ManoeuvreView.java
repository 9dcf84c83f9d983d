package org.rolltrace.ui.manoeuvre;

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

  private final ManoeuvreModel model;
  private final FiguresPane figures;
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
    figures.setPrefWidth(SIDE);
    figures.setMinWidth(SIDE);
    StagePane stage = new StagePane(model, palette);
    LanesPane lanes = new LanesPane(model, palette, stage);
    VBox.setVgrow(stage, Priority.ALWAYS);
    ReplayBar replay = new ReplayBar(model);
    InputEditor editor = new InputEditor(session, lanes);
    VBox centre = new VBox(stage, lanes, replay, editor);
    centre.getStyleClass().add("centre");
    setCenter(centre);
    ReadingsPane readings = new ReadingsPane(session);
    readings.setPrefWidth(READINGS);
    readings.setMinWidth(READINGS);
    setRight(readings);
    setTop(new ConditionStrip(session));
    showFigures.setId("show-figures");
    showFigures.setTooltip(new Tooltip("Figures and derivatives of the aeroplane"));
    showFigures
        .selectedProperty()
        .addListener((property, before, now) -> setLeft(now ? figures : null));
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
