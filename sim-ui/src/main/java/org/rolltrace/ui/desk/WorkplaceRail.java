package org.rolltrace.ui.desk;

import javafx.scene.control.ContentDisplay;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.shape.SVGPath;

/** The narrow rail at the left edge: one button for each workplace, one of them chosen. */
final class WorkplaceRail extends VBox {
  private static final double SIDE = 36;

  private final ToggleGroup group = new ToggleGroup();

  WorkplaceRail() {
    super(6);
    setId("rail");
    getStyleClass().add("rail");
  }

  /**
   * Adds a workplace below the others.
   *
   * @param id for tests and style sheets
   * @param name what it is called
   * @param keys the keys that lead there, for people
   * @param path its sign, in a square of 20 px
   * @param choose goes there
   * @return the button, to be selected when the workplace is shown
   */
  ToggleButton add(String id, String name, String keys, String path, Runnable choose) {
    SVGPath sign = new SVGPath();
    sign.setContent(path);
    sign.getStyleClass().add("rail-sign");
    StackPane square = new StackPane(sign);
    square.setMinSize(20, 20);
    ToggleButton button = new ToggleButton(name, square);
    button.setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
    button.setId(id);
    button.setAccessibleText(name);
    button.setTooltip(new Tooltip(name + " (" + keys + ")"));
    button.setMinSize(SIDE, SIDE);
    button.setMaxSize(SIDE, SIDE);
    button.setToggleGroup(group);
    button.setOnAction(
        event -> {
          button.setSelected(true); // pressing the chosen one leaves it chosen
          choose.run();
        });
    getChildren().add(button);
    return button;
  }
}
