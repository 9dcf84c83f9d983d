package org.rolltrace.ui.chart;

import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.run.RunResult;

/**
 * The wing at even instants along the path, its tips drawing helices. The right tip has a disc and
 * an unbroken line, the left tip a ring and a dashed one; what lies further back from the cursor,
 * or from the end without one, is fainter and thinner.
 */
public final class WingTrace {
  private WingTrace() {}

  /**
   * Draws a wing trace.
   *
   * @param result the run
   * @param ghost the run it is compared with: the paths of its tips, thin
   * @param span m
   * @param window the time that is seen
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin of the time axis, px
   * @param right margin of the time axis, px
   * @param cursorTime the instant that is drawn strong, and seen from behind in the left margin, s;
   *     empty for none
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
    PlotArea area = new PlotArea(left, 0, width - left - right, height, window, 0, 1);
    WingDrawing drawing = new WingDrawing(area, cursorTime);
    drawing.addTitle(span);
    drawing.addPath();
    ghost.ifPresent(drawing::addGhost);
    drawing.addWings(result);
    cursorTime.ifPresent(instant -> drawing.addRearView(result, instant));
    return new Sheet(width, height, drawing.marks());
  }

  /**
   * Draws the wing trace of a flight that goes on: the wing of now is strong.
   *
   * @param history what has been flown, at least a piece of it
   * @param span m
   * @param window the time that is seen
   * @param width of the sheet, px
   * @param height of the sheet, px
   * @param left margin of the time axis, px
   * @param right margin of the time axis, px
   * @return the drawing
   */
  public static Sheet drawLive(
      TimeHistory history,
      double span,
      TimeWindow window,
      double width,
      double height,
      double left,
      double right) {
    PlotArea area = new PlotArea(left, 0, width - left - right, height, window, 0, 1);
    BankPath path = new BankPath(history);
    WingDrawing drawing = new WingDrawing(area, OptionalDouble.of(path.end()));
    drawing.addTitle(span);
    drawing.addPath();
    drawing.addWings(path);
    return new Sheet(width, height, drawing.marks());
  }

  /**
   * The bank at an instant.
   *
   * @param result the run
   * @param instant s; outside of the run the bank of its nearer end is meant
   * @return rad, not wrapped
   */
  public static double bankAt(RunResult result, double instant) {
    return BankPath.of(result).at(instant);
  }
}
