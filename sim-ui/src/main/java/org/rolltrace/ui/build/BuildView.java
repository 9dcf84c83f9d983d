package org.rolltrace.ui.build;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.ObjectProperty;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.control.CautionsPane;
import org.rolltrace.ui.session.DeskSession;

/**
 * The workplace of the shape: what is flown above, what is changed at the left, the aeroplane and
 * its roll in the middle, the derivatives at the right.
 */
public final class BuildView extends BorderPane {
  private static final double SHAPE = 252;
  private static final double TABLE = 346;
  private static final double RESPONSE = 236;
  private static final String BASE = "base";

  private final BuildModel model;
  private final DeskSession session;
  private final Label flown = new Label();
  private final Label state = new Label();
  private final Label kept = new Label();
  private final ComboBox<String> variants = new ComboBox<>();
  private final MenuButton keepVariant = new MenuButton("Keep a variant");
  private List<String> keepable = List.of();
  private boolean showing;

  /**
   * A view.
   *
   * @param model what it shows
   * @param palette the colours of the drawings
   */
  public BuildView(BuildModel model, ObjectProperty<Palette> palette) {
    this.model = model;
    this.session = model.session();
    getStyleClass().add("build");
    DrawingPane drawing = new DrawingPane(model, palette);
    ResponsePane response = new ResponsePane(model, palette);
    VBox.setVgrow(drawing, Priority.ALWAYS);
    response.setMinHeight(RESPONSE);
    response.setPrefHeight(RESPONSE);
    VBox centre = new VBox(drawing, response);
    centre.getStyleClass().add("centre");
    ShapePane shape = new ShapePane(model);
    shape.setPrefWidth(SHAPE);
    shape.setMinWidth(SHAPE);
    DerivativesPane derivatives = new DerivativesPane(model);
    VBox.setVgrow(derivatives, Priority.ALWAYS);
    VBox right = new VBox(derivatives, new CautionsPane(session));
    right.getStyleClass().add("side");
    right.setPrefWidth(TABLE);
    right.setMinWidth(TABLE);
    setTop(strip());
    setLeft(shape);
    setCenter(centre);
    setRight(right);
    session.documentProperty().addListener((property, before, now) -> showVariants());
    session.resultProperty().addListener((property, before, now) -> showFlown());
    session.ghostProperty().addListener((property, before, now) -> showFlown());
    session.failureProperty().addListener((property, before, now) -> showState());
    session.recoveryProblemProperty().addListener((property, before, now) -> showState());
    session.faults().addListener((ListChangeListener<FileFault>) change -> showState());
    showVariants();
    showFlown();
    showState();
  }

  private HBox strip() {
    flown.setId("build-flown");
    flown.setMinWidth(0);
    state.setId("build-state");
    state.getStyleClass().add("state");
    state.setMinWidth(0);
    kept.setId("build-kept");
    kept.getStyleClass().add("kept");
    kept.setMinWidth(0);
    variants.setId("variant");
    variants.setAccessibleText("Variant of the aeroplane");
    variants.setPrefWidth(150);
    variants.setConverter(
        new StringConverter<>() {
          @Override
          public String toString(String name) {
            return name == null || name.isEmpty() ? BASE : name;
          }

          @Override
          public String fromString(String words) {
            return words.equals(BASE) ? "" : words;
          }
        });
    variants
        .valueProperty()
        .addListener(
            (property, before, now) -> {
              if (!showing && now != null) {
                model.chooseVariant(now);
              }
            });
    Label label = new Label("Variant");
    label.setMinWidth(Region.USE_PREF_SIZE);
    label.setLabelFor(variants);
    VBox words = new VBox(1, flown, kept, state);
    words.setMinWidth(0);
    words.setAlignment(Pos.CENTER_LEFT);
    HBox.setHgrow(words, Priority.ALWAYS);
    HBox strip = new HBox(8, words, label, variants);
    strip.setAlignment(Pos.CENTER_LEFT);
    strip.getStyleClass().add("condition-strip");
    return strip;
  }

  private void showVariants() {
    showing = true;
    List<String> names = new ArrayList<>(List.of(""));
    names.addAll(model.variants());
    if (!variants.getItems().equals(names)) {
      variants.getItems().setAll(names);
    }
    variants.setValue(model.variant());
    boolean none = names.size() == 1;
    variants.setDisable(none);
    variants.setTooltip(
        new Tooltip(
            none
                ? "The aeroplane has no variants; \"variants\" in its file names some"
                : "Flies another variant; what flew before stays behind, dashed"));
    keepVariant.setDisable(none);
    if (!keepable.equals(names)) {
      keepable = names;
      keepVariant.getItems().setAll(names.stream().map(this::keeping).toList());
    }
    showing = false;
  }

  private MenuItem keeping(String name) {
    MenuItem item = new MenuItem(name.isEmpty() ? BASE : name);
    item.setMnemonicParsing(false);
    item.setOnAction(event -> model.keepVariant(name));
    return item;
  }

  private void showFlown() {
    RunResult result = session.resultProperty().get();
    flown.setText(result == null ? "" : model.flown() + ", " + words(result));
    kept.setText(model.kept());
    kept.setVisible(!model.kept().isEmpty());
    kept.setManaged(!model.kept().isEmpty());
  }

  private static String words(RunResult result) {
    FlightCondition condition = result.scenario().condition();
    return String.format(
        Locale.ROOT,
        "%.0f kt true, %.3f kg/m\u00b3, %s slip",
        Quantity.toUnit(condition.trueAirspeed(), "kt"),
        condition.density(),
        result.scenario().slip().word());
  }

  private void showState() {
    int faults = session.faults().size();
    String words =
        faults > 0
            ? (faults == 1 ? "One value cannot be used" : faults + " values cannot be used")
                + "; drawing and curves are from before: "
                + session.faults().get(0).message()
            : !session.failureProperty().get().isEmpty()
                ? session.failureProperty().get()
                : session.recoveryProblemProperty().get();
    state.setText(words);
    state.setTooltip(words.isEmpty() ? null : new Tooltip(words));
    state.setVisible(!words.isEmpty());
    state.setManaged(!words.isEmpty());
  }

  /**
   * The buttons that compare, for the top of the window.
   *
   * @return a row of buttons
   */
  public HBox actions() {
    Button keep = new Button("Keep to compare");
    keep.setId("build-keep");
    keep.setTooltip(
        new Tooltip("Keeps the present shape and curves, dashed, behind the next change"));
    keep.setOnAction(event -> session.keepGhost());
    keepVariant.setId("keep-variant");
    keepVariant.setTooltip(new Tooltip("Keeps another variant, flown in the same way, to compare"));
    Button drop = new Button("Drop");
    drop.setId("build-drop");
    drop.setTooltip(new Tooltip("Forgets what was kept"));
    drop.disableProperty().bind(session.ghostProperty().isNull());
    drop.setOnAction(event -> session.dropGhost());
    HBox actions = new HBox(8, keepVariant, keep, drop);
    actions.getStyleClass().add("actions");
    actions.setAlignment(Pos.CENTER_RIGHT);
    return actions;
  }
}
