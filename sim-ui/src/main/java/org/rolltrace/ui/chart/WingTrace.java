package org.rolltrace.ui.chart;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.run.RunResult;

/** The wing at even instants along the path, its tips drawing helices. */
public final class WingTrace {
  private WingTrace() {}

  /**
   * Draws a wing trace.
   *
   * @param result the run
   * @param ghost the run it is compared with
   * @param span m
   * @param window the time that is seen
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin of the time axis, px
   * @param right margin of the time axis, px
   * @param cursorTime the instant that is drawn strong, s; empty for none
   * @return the drawing
   */
  public static Sheet draw(
      RunResult result,
      Optional<RunResult> ghost,
      double span,
      TimeWindow window,
      double width,
      double height,
      double left,
      double right,
      OptionalDouble cursorTime) {
    return new Sheet(width, height, List.of());
  }
}
