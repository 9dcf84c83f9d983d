package org.rolltrace.ui.chart;

import org.rolltrace.core.quantity.Check;

/**
 * How a line is drawn.
 *
 * @param ink its colour
 * @param width px, above 0
 * @param dash how it is broken
 * @param opacity 0 to 1
 */
public record Stroke(Ink ink, double width, Dash dash, double opacity) {

  public Stroke {
    Check.positive("stroke width, px,", width);
    Check.inRange("stroke opacity", opacity, 0, 1);
  }

  /**
   * An unbroken, opaque line.
   *
   * @param ink its colour
   * @param width px, above 0
   * @return the stroke
   */
  public static Stroke of(Ink ink, double width) {
    return new Stroke(ink, width, Dash.SOLID, 1);
  }
}
