package org.rolltrace.ui.manoeuvre;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.event.EventHandler;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.control.CautionsPane;
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
  private static final double NARROW = 1032;

  private final ManoeuvreModel model;
  private final FiguresPane figures;
  private final ScenarioPane scenario;
  private final ReadingsPane readings;
  private final CautionsPane cautions;
  private final VBox left = new VBox();
  private final VBox right = new VBox();
  private final ToggleButton showFigures = new ToggleButton("Aeroplane\u2026");
  private final ToggleButton showScenario = new ToggleButton("Scenario\u2026");
  private final VBox centre;
  private final StagePane stage;
  private final HandFlightView handFlight;
  private final ConditionStrip conditions;

  /**
   * A view.
   *
   * @param model what it shows
   * @param palette the colours of the drawings
   * @param askTrace asks for the file of a trace, beginning in a folder
   */
  public ManoeuvreView(
      ManoeuvreModel model,
      ObjectProperty<Palette> palette,
      Function<Path, Optional<Path>> askTrace) {
    this.model = model;
    DeskSession session = model.session();
    getStyleClass().add("manoeuvre");
    figures = new FiguresPane(session);
    scenario = new ScenarioPane(session);
    left.setPrefWidth(SIDE);
    left.setMinWidth(SIDE);
    stage = new StagePane(model, palette);
    LanesPane lanes = new LanesPane(model, palette, stage);
    VBox.setVgrow(stage, Priority.ALWAYS);
    ReplayBar replay = new ReplayBar(model);
    InputEditor editor = new InputEditor(session, lanes, askTrace);
    centre = new VBox(stage, lanes, replay, editor);
    centre.getStyleClass().add("centre");
    handFlight = new HandFlightView(model.hand(), palette);
    setCenter(centre);
    readings = new ReadingsPane(session, model.hand().flyingProperty());
    cautions = new CautionsPane(session);
    VBox.setVgrow(readings, Priority.ALWAYS);
    VBox.setVgrow(figures, Priority.ALWAYS);
    VBox.setVgrow(scenario, Priority.ALWAYS);
    right.getStyleClass().add("side");
    left.getStyleClass().add("side");
    right.setPrefWidth(READINGS);
    right.setMinWidth(READINGS);
    arrange();
    conditions = new ConditionStrip(session);
    setTop(conditions);
    model.hand().flyingProperty().addListener((property, before, now) -> fly(now));
    EventHandler<KeyEvent> keys = handFlight::key;
    sceneProperty()
        .addListener(
            (property, before, now) -> {
              if (before != null) {
                before.removeEventFilter(KeyEvent.ANY, keys);
              }
              if (now != null) {
                now.addEventFilter(KeyEvent.ANY, keys);
              }
            });
    showFigures.setId("show-figures");
    showFigures.setTooltip(new Tooltip("Figures and derivatives of the aeroplane"));
    showFigures.selectedProperty().addListener((property, before, now) -> arrange());
    showScenario.setId("show-scenario");
    showScenario.setTooltip(new Tooltip("Note, start and held slip of the scenario"));
    showScenario.selectedProperty().addListener((property, before, now) -> arrange());
    ToggleGroup sides = new ToggleGroup();
    showFigures.setToggleGroup(sides);
    showScenario.setToggleGroup(sides);
    widthProperty().addListener((property, before, now) -> arrange());
  }

  /** While a hand flies, nothing else can be edited. */
  private void fly(boolean flying) {
    setCenter(flying ? handFlight : centre);
    conditions.setDisable(flying);
    left.setDisable(flying);
    if (!flying) {
      stage.requestFocus();
    }
  }

  private void arrange() {
    Region side = showScenario.isSelected() ? scenario : figures;
    boolean shown = showFigures.isSelected() || showScenario.isSelected();
    boolean narrow = getWidth() > 0 && getWidth() < NARROW;
    boolean replaced = shown && narrow;
    left.getChildren().setAll(replaced ? List.of(side, cautions) : List.of(side));
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
    HBox actions = new HBox(8, showScenario, showFigures, keep, drop, mirror);
    actions.getStyleClass().add("actions");
    actions.disableProperty().bind(model.hand().flyingProperty());
    actions.setAlignment(Pos.CENTER_RIGHT);
    return actions;
  }
}
