package org.rolltrace.ui.manoeuvre;

import javafx.geometry.Point2D;
import javafx.scene.Node;
import org.rolltrace.core.pilot.Control;

/** Where things stand on the lanes, for tests that move the mouse there. */
public final class LanesOnScreen {
  private LanesOnScreen() {}

  /**
   * A place on the lanes.
   *
   * @param lanes the node of the lanes
   * @param control whose lane
   * @param time s
   * @param position of the control, fraction of travel
   * @return px on the screen
   */
  public static Point2D at(Node lanes, Control control, double time, double position) {
    LanesPane pane = (LanesPane) lanes;
    return pane.localToScreen(pane.xOf(time), LanesPane.yOf(control, position));
  }
}
