package org.rolltrace.ui.manoeuvre;

import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.ui.control.FieldTarget;
import org.rolltrace.ui.control.PathField;
import org.rolltrace.ui.session.DeskSession;

/** The figures of the aeroplane: size, mass, controls, derivatives, limits. */
final class FiguresPane extends ScrollPane {
  private final DeskSession session;
  private final VBox content = new VBox(10);

  FiguresPane(DeskSession session) {
    this.session = session;
    getStyleClass().add("figures-pane");
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    content.setPadding(new Insets(10));
    Label origin = new Label();
    origin.getStyleClass().add("quiet");
    origin.setWrapText(true);
    origin.setMinHeight(USE_PREF_SIZE);
    content
        .getChildren()
        .addAll(
            heading("Aeroplane"),
            origin,
            text("name", "Name", 22),
            heading("Size and mass"),
            grid(
                quantity("span", "Span", "10 m"),
                quantity("wingArea", "Wing area", "15 m2"),
                quantity("mass", "Mass", "900 kg"),
                quantity("inertia.roll", "Roll inertia", "1200 kg m2"),
                quantity("inertia.yaw", "Yaw inertia", "2500 kg m2"),
                quantity("inertia.product", "Product of inertia", "0 kg m2"),
                quantity("lateralImbalance.mass", "One-sided load", "none"),
                quantity("lateralImbalance.arm", "Its arm to the right", "none")),
            heading("Axes of the figures"),
            grid(
                text("axes", "Axes", 10, "stability", "stability or body"),
                quantity("angleOfAttack", "Angle of attack", "body axes only")),
            heading("Controls"),
            grid(
                quantity("ailerons.up", "Aileron up", "20 deg"),
                quantity("ailerons.down", "Aileron down", "15 deg"),
                quantity("ailerons.rateLimit", "Aileron rate limit", "none"),
                quantity("ailerons.lag", "Aileron lag", "none"),
                quantity("rudder.left", "Rudder left", "25 deg"),
                quantity("rudder.right", "Rudder right", "25 deg"),
                quantity("rudder.rateLimit", "Rudder rate limit", "none"),
                quantity("rudder.lag", "Rudder lag", "none")),
            heading("Derivatives, as the file prints them"),
            derivatives(),
            heading("Own limits"),
            grid(
                quantity("limits.manoeuvringSpeed", "Manoeuvring speed", "none"),
                quantity("limits.neverExceedSpeed", "Never-exceed speed", "none"),
                quantity("limits.rollRate", "Roll rate", "none"),
                quantity("limits.bank", "Bank", "none")));
    setContent(content);
    session.documentProperty().addListener((property, before, now) -> origin.setText(originText()));
    origin.setText(originText());
  }

  private String originText() {
    var document = session.documentProperty().get();
    if (document == null) {
      return "";
    }
    String place =
        document.aeroplaneIsInline()
            ? "The scenario's own copy."
            : "From "
                + document.text("$.aeroplane").orElse("")
                + ". The first change makes the scenario's own copy; the file stays as it is.";
    return document
        .variant()
        .map(name -> place + " Variant " + name + ": changes are its own.")
        .orElse(place);
  }

  private static Label heading(String words) {
    Label label = new Label(words);
    label.getStyleClass().add("heading");
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    return label;
  }

  private PathField text(String key, String title, int columns) {
    return text(key, title, columns, "", title);
  }

  private PathField text(String key, String title, int columns, String prompt, String hint) {
    return new PathField(
        session,
        FieldTarget.quantity(
            "$.aeroplane." + key,
            title,
            title.toLowerCase(java.util.Locale.ROOT),
            prompt,
            hint,
            columns));
  }

  private PathField quantity(String key, String title, String prompt) {
    return new PathField(
        session,
        FieldTarget.quantity(
            "$.aeroplane." + key,
            title,
            title.toLowerCase(java.util.Locale.ROOT),
            prompt,
            title + ", with its unit",
            10));
  }

  private static Node grid(Node... fields) {
    GridPane grid = new GridPane();
    grid.setHgap(10);
    grid.setVgap(6);
    for (int i = 0; i < fields.length; i++) {
      grid.add(fields[i], i % 2, i / 2);
    }
    return grid;
  }

  private Node derivatives() {
    GridPane grid = new GridPane();
    grid.setHgap(6);
    grid.setVgap(4);
    int count = 0;
    for (Coefficient coefficient : Coefficient.values()) {
      grid.add(
          new PathField(
              session,
              FieldTarget.number(
                  "$.aeroplane.derivatives.values." + coefficient.symbol(),
                  coefficient.symbol(),
                  coefficient.symbol(),
                  "absent",
                  coefficient.symbol() + "; left empty it is absent and taken as 0",
                  6)),
          count % 3,
          count / 3);
      count++;
    }
    return grid;
  }
}
