package org.rolltrace.ui.build;

import java.util.List;
import javafx.scene.Node;
import org.rolltrace.ui.chart.ValueRange;

/** What the axes of the response cover, for tests of the whole window. */
public final class ResponseOnScreen {
  private ResponseOnScreen() {}

  /** From the strip at the top down. */
  public static List<ValueRange> ranges(Node response) {
    return ((ResponsePane) response).drawnRanges();
  }
}
