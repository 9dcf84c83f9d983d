package org.rolltrace.ui.build;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.ui.control.Written;

/** What the shape gives: the derivatives with value, origin and method. */
final class DerivativesPane extends VBox {
  private static final double SYMBOL = 56;
  private static final double FIGURE = 56;
  private static final double ORIGIN = 74;
  private static final int DECIMALS = 4;
  private static final double TOOLTIP = 420;

  private final BuildModel model;
  private final List<Row> rows = new ArrayList<>();
  private final Label estimateTitle = title("estimate", FIGURE, Pos.CENTER_RIGHT);
  private final Label keptTitle = title("kept", FIGURE, Pos.CENTER_RIGHT);
  private final VBox overridden = new VBox(6);
  private final Label overriddenWords = new Label();
  private final Button takeOut = new Button("Fly the estimates instead");
  private final VBox list = new VBox(2);

  DerivativesPane(BuildModel model) {
    super(6);
    this.model = model;
    setPadding(new Insets(8, 4, 6, 10));
    getStyleClass().add("readings-pane");
    setId("derivatives");
    Label heading = new Label("Derivatives");
    heading.getStyleClass().add("heading");
    Label origin = title("origin", ORIGIN, Pos.CENTER_LEFT);
    origin.getStyleClass().add("origin");
    HBox titles =
        new HBox(
            title("", SYMBOL, Pos.CENTER_LEFT),
            title("value", FIGURE, Pos.CENTER_RIGHT),
            origin,
            estimateTitle,
            keptTitle);
    titles.setSpacing(4);
    for (Coefficient coefficient : Coefficient.values()) {
      Row row = new Row(coefficient);
      rows.add(row);
      list.getChildren().add(row);
    }
    overriddenWords.setWrapText(true);
    overriddenWords.setMinHeight(USE_PREF_SIZE);
    overriddenWords.getStyleClass().add("caution");
    takeOut.setId("take-out-given");
    takeOut.setOnAction(event -> model.takeOut(model.overridden()));
    overridden.setId("overridden");
    overridden.getChildren().addAll(overriddenWords, takeOut);
    overridden.setPadding(new Insets(2, 0, 6, 0));
    VBox content = new VBox(2, overridden, titles, list);
    content.setPadding(new Insets(0, 10, 0, 0)); // clear of the scroll bar
    ScrollPane scroll = new ScrollPane(content);
    scroll.setFitToWidth(true);
    scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    scroll.getStyleClass().add("edge-to-edge");
    VBox.setVgrow(scroll, Priority.ALWAYS);
    getChildren().addAll(heading, scroll);
    model.session().resultProperty().addListener((property, before, now) -> show());
    model.session().ghostProperty().addListener((property, before, now) -> show());
    model.session().staleProperty().addListener((property, before, now) -> showAge());
    sceneProperty().addListener((property, before, now) -> show());
  }

  private static Label title(String words, double width, Pos place) {
    Label label = cell(width, place);
    label.setText(words);
    label.getStyleClass().add("quiet");
    return label;
  }

  private static Label cell(double width, Pos place) {
    Label label = new Label();
    label.setAlignment(place);
    label.setMinWidth(width);
    label.setPrefWidth(width);
    label.setMaxWidth(width);
    return label;
  }

  private void showAge() {
    list.setOpacity(model.session().staleProperty().get() ? 0.55 : 1);
  }

  private void show() {
    if (getScene() == null) {
      return; // shown when it is seen again
    }
    List<DerivativeRow> now = model.rows();
    boolean anySet = now.stream().anyMatch(DerivativeRow::isSet);
    boolean anyKept = now.stream().anyMatch(row -> row.kept().isPresent());
    showOnly(estimateTitle, anySet);
    showOnly(keptTitle, anyKept);
    for (int i = 0; i < now.size(); i++) {
      rows.get(i).show(now.get(i), anySet, anyKept);
    }
    showOnly(overridden, anySet);
    if (anySet) {
      overriddenWords.setText(
          "Given values win over estimates: changing the shape does not change "
              + now.stream()
                  .filter(DerivativeRow::isSet)
                  .map(row -> row.coefficient().symbol())
                  .collect(Collectors.joining(", "))
              + "."
              + (model.mayTakeOutOne()
                  ? " An estimate that is pressed flies instead."
                  : " They are converted together, and can only be taken out together."));
    }
    showAge();
  }

  private static void showOnly(Node node, boolean shown) {
    node.setVisible(shown);
    node.setManaged(shown);
  }

  /** One derivative. */
  private final class Row extends HBox {
    private final Label symbol = cell(SYMBOL, Pos.CENTER_LEFT);
    private final Label value = cell(FIGURE, Pos.CENTER_RIGHT);
    private final Label origin = cell(ORIGIN, Pos.CENTER_LEFT);
    private final Hyperlink estimate = new Hyperlink();
    private final Label kept = cell(FIGURE, Pos.CENTER_RIGHT);
    private DerivativeRow shown;

    Row(Coefficient coefficient) {
      super(4);
      setId("derivative-" + coefficient.symbol());
      setFocusTraversable(true);
      getStyleClass().addAll("reading", "derivative");
      symbol.setText(coefficient.symbol());
      origin.getStyleClass().addAll("quiet", "origin");
      kept.getStyleClass().add("kept");
      estimate.setId("estimate-" + coefficient.symbol());
      estimate.getStyleClass().add("estimate");
      estimate.setMinWidth(FIGURE);
      estimate.setPrefWidth(FIGURE);
      estimate.setMaxWidth(FIGURE);
      estimate.setAlignment(Pos.CENTER_RIGHT);
      estimate.setAccessibleText("Fly the estimate of " + coefficient.symbol());
      estimate.setOnAction(
          event -> {
            estimate.setVisited(false);
            model.takeOut(List.of(coefficient));
          });
      Tooltip tooltip = new Tooltip();
      tooltip.setWrapText(true);
      tooltip.setMaxWidth(TOOLTIP);
      tooltip.setShowDelay(Duration.millis(250));
      tooltip.setShowDuration(Duration.INDEFINITE);
      tooltip.setOnShowing(event -> tooltip.setText(shown == null ? "" : shown.explanation()));
      Tooltip.install(this, tooltip);
      focusedProperty()
          .addListener(
              (property, before, now) -> {
                if (shown != null) {
                  setAccessibleText(shown.explanation());
                }
              });
      getChildren().addAll(symbol, value, origin, estimate, kept);
    }

    void show(DerivativeRow row, boolean withEstimates, boolean withKept) {
      shown = row;
      value.setText(row.isAbsent() ? "\u2013" : figure(row.value()));
      origin.setText(row.originWords());
      boolean set = row.isSet();
      estimate.setText(set ? figure(row.estimate().orElseThrow().value()) : "");
      estimate.setVisible(set);
      estimate.setManaged(withEstimates);
      estimate.setDisable(!model.mayTakeOutOne());
      kept.setText(row.kept().isPresent() ? figure(row.kept().getAsDouble()) : "");
      showOnly(kept, withKept);
    }

    private String figure(double number) {
      return Written.fixed(number, DECIMALS);
    }
  }
}
