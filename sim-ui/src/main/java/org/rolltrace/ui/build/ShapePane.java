package org.rolltrace.ui.build;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import javafx.collections.ListChangeListener;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;

/** What is changed: the values of the shape with fields and sliders, or the way to a shape. */
final class ShapePane extends ScrollPane {
  private final BuildModel model;
  private final Label place = quiet("");
  private final VBox shape = new VBox(8);
  private final VBox missing = new VBox(10);
  private final VBox start = new VBox(6);
  private final HBox panelChoice = new HBox(8);
  private final ComboBox<Integer> panels = new ComboBox<>();
  private final VBox fin = new VBox(8);
  private final VBox noFin = new VBox(6);
  private final Button give = new Button("Give it a shape");
  private final PathField mass;
  private final Label wingFault = fault("wing-fault");
  private final Label aileronFault = fault("ailerons-fault");
  private boolean showing;

  ShapePane(BuildModel model) {
    this.model = model;
    getStyleClass().add("figures-pane");
    setId("shape-pane");
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    mass =
        new PathField(
            model.session(),
            FieldTarget.quantity(
                "$.aeroplane.mass", "Mass", "mass", "900 kg", "Mass, with its unit", 10));
    buildStart();
    buildShape();
    buildMissing();
    VBox content = new VBox(8, heading("Shape"), place, start, missing, shape);
    content.setPadding(new Insets(8, 10, 12, 10));
    setContent(content);
    model.session().documentProperty().addListener((property, before, now) -> show());
    model.panelProperty().addListener((property, before, now) -> show());
    model.session().faults().addListener((ListChangeListener<FileFault>) change -> showFaults());
    show();
    showFaults();
  }

  /** What is wrong as a whole, or where there is no field; the rest stands below its field. */
  private void showFaults() {
    List<String> wing = new ArrayList<>(List.of("wing", "wing.panels", "wingArea", "body"));
    for (int i = 0; i < model.panelCount(); i++) {
      String panel = "wing.panels[" + i + "]";
      wing.addAll(List.of(panel, panel + ".from", panel + ".to", panel + ".sweep"));
    }
    show(wingFault, wing);
    show(aileronFault, List.of("ailerons"));
  }

  private void show(Label label, List<String> places) {
    ScenarioDocument document = model.session().documentProperty().get();
    String words =
        document == null
            ? ""
            : model.session().faults().stream()
                .filter(
                    found ->
                        places.stream()
                            .flatMap(place -> document.aeroplanePaths(place).stream())
                            .anyMatch(document.pathOf(found)::equals))
                .map(FileFault::message)
                .findFirst()
                .orElse("");
    label.setText(words);
    showOnly(label, !words.isEmpty());
  }

  private static Label heading(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("heading");
    return label;
  }

  private static Label fault(String id) {
    Label label = wrapped("");
    label.setId(id);
    label.getStyleClass().add("field-fault");
    return label;
  }

  private static Label quiet(String words) {
    Label label = wrapped(words);
    label.getStyleClass().add("notice");
    return label;
  }

  private static Label wrapped(String words) {
    Label label = new Label(words);
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    return label;
  }

  private void buildStart() {
    start.setId("shape-start");
    Label words = wrapped("This shape is a plain start: make it that of your aeroplane.");
    words.getStyleClass().add("caution");
    Button done = new Button("It is edited");
    done.setId("shape-edited");
    done.setTooltip(new Tooltip("Takes the mark out of the aeroplane's note"));
    done.setOnAction(event -> model.takeMarkOut());
    start.getChildren().addAll(words, done);
  }

  private void buildShape() {
    panels.setId("panel");
    panels.setAccessibleText("Panel of the wing");
    panels
        .valueProperty()
        .addListener(
            (property, before, now) -> {
              if (!showing && now != null) {
                model.panelProperty().set(now - 1);
              }
            });
    panelChoice.setAlignment(Pos.CENTER_LEFT);
    panelChoice.getChildren().addAll(new Label("Panel from the root"), panels);
    Button addFin = new Button("Add a fin");
    addFin.setId("add-fin");
    addFin.setTooltip(new Tooltip("Writes a fin of usual size for this wing, to be edited"));
    addFin.setOnAction(event -> model.giveFin());
    noFin
        .getChildren()
        .addAll(
            wrapped("Without a fin its part of the derivatives is missing, in yaw nearly all."),
            addFin);
    fin.getChildren()
        .addAll(
            rows(
                ShapeValue.FIN_AREA,
                ShapeValue.FIN_SPAN,
                ShapeValue.FIN_ARM,
                ShapeValue.FIN_HEIGHT));
    shape.getChildren().addAll(heading("Wing"), wingFault);
    shape.getChildren().addAll(rows(ShapeValue.SPAN));
    shape
        .getChildren()
        .add(quiet("Scales the stations of panels and ailerons; chords and masses stay."));
    shape.getChildren().add(panelChoice);
    shape
        .getChildren()
        .addAll(rows(ShapeValue.INNER_CHORD, ShapeValue.OUTER_CHORD, ShapeValue.DIHEDRAL));
    shape.getChildren().addAll(heading("Ailerons"), aileronFault);
    shape
        .getChildren()
        .addAll(
            rows(
                ShapeValue.AILERON_FROM,
                ShapeValue.AILERON_TO,
                ShapeValue.AILERON_SHARE,
                ShapeValue.AILERON_UP,
                ShapeValue.AILERON_DOWN));
    shape.getChildren().addAll(heading("Fin"), fin, noFin);
  }

  private List<Node> rows(ShapeValue... values) {
    return java.util.Arrays.stream(values).map(value -> (Node) new ShapeRow(model, value)).toList();
  }

  private void buildMissing() {
    missing.setId("shape-missing");
    give.setId("give-shape");
    give.setTooltip(
        new Tooltip("Writes a tapered wing of this span and area, with ailerons, to be edited"));
    give.setOnAction(event -> model.giveShape());
    missing
        .getChildren()
        .addAll(
            wrapped(
                "This aeroplane has figures and derivatives, but no shape, so there is nothing to"
                    + " draw and nothing to estimate from."),
            wrapped(
                "A shape is a \"wing\" of panels in the aeroplane file, with \"from\", \"to\" and"
                    + " \"chordShare\" in its \"ailerons\"; \"tailplane\", \"fin\" and \"body\" add"
                    + " their parts."),
            mass,
            wrapped(
                "Or begin with a plain wing of its span and area, ailerons at usual places, and"
                    + " change it here. Given derivatives stay, and win."),
            give);
  }

  private void show() {
    ScenarioDocument document = model.session().documentProperty().get();
    boolean shaped = model.hasShape();
    showOnly(shape, shaped);
    showOnly(missing, !shaped && document != null);
    showOnly(start, shaped && model.isStart());
    showOnly(fin, model.hasFin());
    showOnly(noFin, !model.hasFin());
    mass.setShown(!shaped && (model.needsMass() || mass.isFocusWithin()));
    give.setDisable(!model.mayGiveShape());
    showOnly(panelChoice, model.panelCount() > 1);
    showing = true;
    List<Integer> numbers = IntStream.rangeClosed(1, model.panelCount()).boxed().toList();
    if (!panels.getItems().equals(numbers)) {
      panels.setValue(null); // else a value that comes back is not shown
      panels.getItems().setAll(numbers);
    }
    panels.setValue(numbers.isEmpty() ? null : model.panelProperty().get() + 1);
    showing = false;
    place.setText(document == null ? "" : placeWords(document));
  }

  private String placeWords(ScenarioDocument document) {
    String words =
        document.aeroplaneIsInline()
            ? "In the scenario's own copy of the aeroplane."
            : "The first change makes the scenario's own copy of the aeroplane; its file stays.";
    return model.variant().isEmpty()
        ? words
        : words + " Changes are those of the variant; the base stays.";
  }

  private static void showOnly(Node node, boolean shown) {
    node.setVisible(shown);
    node.setManaged(shown);
  }
}
