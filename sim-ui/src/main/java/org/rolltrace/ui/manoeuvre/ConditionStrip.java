package org.rolltrace.ui.manoeuvre;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;
import org.rolltrace.ui.control.Written;
import org.rolltrace.ui.session.DeskSession;

/** What is flown: condition, slip, start and duration, in one strip across the top. */
final class ConditionStrip extends FlowPane {

  /** The kinds of airspeed that a file may give. */
  private enum Speed {
    CALIBRATED("calibratedAirspeed", "calibrated"),
    EQUIVALENT("equivalentAirspeed", "equivalent"),
    TRUE("trueAirspeed", "true");

    private final String key;
    private final String word;

    Speed(String key, String word) {
      this.key = key;
      this.word = word;
    }

    private String path() {
      return "$.condition." + key;
    }

    private double of(FlightCondition condition) {
      return switch (this) {
        case CALIBRATED -> condition.calibratedAirspeed();
        case EQUIVALENT -> condition.equivalentAirspeed();
        case TRUE -> condition.trueAirspeed();
      };
    }

    @Override
    public String toString() {
      return word;
    }
  }

  /** The two ways to say how dense the air is. */
  private enum Air {
    OFFSET("temperatureOffset", "off standard"),
    DENSITY("density", "density");

    private final String key;
    private final String word;

    Air(String key, String word) {
      this.key = key;
      this.word = word;
    }

    private String path() {
      return "$.condition." + key;
    }

    @Override
    public String toString() {
      return word;
    }
  }

  /** Width of the choice of a kind, px. */
  private static final double KIND = 104;

  private final DeskSession session;
  private final PathField speed;
  private final PathField air;
  private final ComboBox<Speed> speedKind = new ComboBox<>();
  private final ComboBox<Air> airKind = new ComboBox<>();
  private final ToggleGroup slips = new ToggleGroup();
  private boolean showing;

  ConditionStrip(DeskSession session) {
    super(6, 6);
    this.session = session;
    getStyleClass().add("condition-strip");
    speed = new PathField(session, speedTarget(Speed.TRUE));
    air = new PathField(session, airTarget(Air.OFFSET));
    speedKind.getItems().setAll(Speed.values());
    speedKind.setId("speed-kind");
    speedKind.setPrefWidth(KIND);
    airKind.getItems().setAll(Air.values());
    airKind.setId("air-kind");
    airKind.setPrefWidth(KIND);
    speedKind.valueProperty().addListener((property, before, now) -> speedKindChosen(before, now));
    airKind.valueProperty().addListener((property, before, now) -> airKindChosen(before, now));
    getChildren()
        .addAll(
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.title", "Scenario", "title", "", "Title of the scenario", 8)),
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.condition.pressureAltitude",
                    "Pressure altitude",
                    "height",
                    "3000 ft",
                    "Pressure altitude, in any unit of length",
                    6)),
            new HBox(4, air, labelled(airKind)),
            new HBox(4, speed, labelled(speedKind)),
            slipChoice(),
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.condition.power",
                    "Power",
                    "power",
                    "none",
                    "Power of all propellers together; the propeller moment follows from it",
                    4)),
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.condition.propellerRollMoment",
                    "Propeller moment",
                    "propeller moment",
                    "none",
                    "Rolling moment of the propeller on the airframe, right wing down positive;"
                        + " a propeller turning clockwise seen from behind makes a negative one",
                    7)),
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.start.bank",
                    "Bank at start",
                    "bank at the start",
                    "0 deg",
                    "Bank that displaces the trimmed aeroplane, right wing down positive",
                    5)),
            new PathField(
                session,
                FieldTarget.quantity(
                    "$.duration", "Duration", "duration", "10 s", "Up to 3600 s", 5)));
    session.documentProperty().addListener((property, before, now) -> show());
    show();
  }

  private Node slipChoice() {
    HBox buttons = new HBox();
    buttons.getStyleClass().add("slip-choice");
    List<String> hints =
        List.of(
            "The pilot holds the ball centred: one degree of freedom, no return",
            "Sideslip and yaw follow bank, roll rate and controls at once",
            "Sideslip and yaw rate are states of their own");
    for (SlipTreatment slip : SlipTreatment.values()) {
      ToggleButton button = new ToggleButton(slip.word());
      button.setId("slip-" + slip.word());
      button.setToggleGroup(slips);
      button.setUserData(slip.word());
      button.setTooltip(new Tooltip(hints.get(buttons.getChildren().size())));
      button.setOnAction(
          event -> {
            button.setSelected(true);
            session.edit("change slip", document -> document.with("$.slip", slip.word()));
          });
      buttons.getChildren().add(button);
    }
    Label label = new Label("Slip");
    label.getStyleClass().add("field-label");
    return new VBox(label, buttons);
  }

  private static Optional<Speed> speedIn(ScenarioDocument document) {
    for (Speed kind : Speed.values()) {
      if (document.text(kind.path()).isPresent()) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }

  private static Air airIn(ScenarioDocument document) {
    return document.text(Air.DENSITY.path()).isPresent() ? Air.DENSITY : Air.OFFSET;
  }

  private void show() {
    ScenarioDocument document = session.documentProperty().get();
    if (document == null) {
      return;
    }
    showing = true;
    Speed kind =
        speedIn(document).orElse(speedKind.getValue() == null ? Speed.TRUE : speedKind.getValue());
    speedKind.setValue(kind);
    speed.retarget(speedTarget(kind));
    Air way = airIn(document);
    airKind.setValue(way);
    air.retarget(airTarget(way));
    String slip = document.text("$.slip").orElse("");
    slips.getToggles().forEach(toggle -> toggle.setSelected(slip.equals(toggle.getUserData())));
    showing = false;
  }

  private static FieldTarget speedTarget(Speed kind) {
    return FieldTarget.quantity(
        kind.path(), "Airspeed", "airspeed", "120 kt", "Airspeed of the kind beside", 6);
  }

  private static FieldTarget airTarget(Air way) {
    return way == Air.OFFSET
        ? FieldTarget.quantity(
            way.path(),
            "Temperature",
            "temperature",
            "0 K",
            "Difference from the standard temperature at that altitude",
            9)
        : FieldTarget.quantity(
            way.path(), "Density", "density", "1.225 kg/m3", "Density of the air", 9);
  }

  private static Node labelled(Node node) {
    Label blank = new Label(" ");
    blank.getStyleClass().add("field-label");
    VBox box = new VBox(blank, node);
    box.setAlignment(Pos.TOP_LEFT);
    return box;
  }

  /** Gives the same condition by another kind of airspeed. */
  private void speedKindChosen(Speed before, Speed now) {
    RunResult result = session.resultProperty().get();
    if (showing || before == null || now == null || result == null) {
      return;
    }
    double knots = Quantity.toUnit(now.of(result.scenario().condition()), "kt");
    session.edit(
        "give " + now.word + " airspeed",
        document ->
            document
                .without(before.path())
                .with(now.path(), String.format(Locale.ROOT, "%.6g", knots) + " kt"));
  }

  private void airKindChosen(Air before, Air now) {
    RunResult result = session.resultProperty().get();
    if (showing || before == null || now == null || result == null) {
      return;
    }
    FlightCondition condition = result.scenario().condition();
    String text =
        now == Air.DENSITY
            ? String.format(Locale.ROOT, "%.6g kg/m3", condition.density())
            : Written.plain(condition.temperatureOffset(), 3) + " K";
    session.edit(
        "give " + now.word, document -> document.without(before.path()).with(now.path(), text));
  }
}
