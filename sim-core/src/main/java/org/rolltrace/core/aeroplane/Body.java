package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * The body that carries wing and tail.
 *
 * @param length m, above 0
 * @param width largest, m, above 0
 * @param height largest, m, above 0
 */
public record Body(double length, double width, double height) {

  public Body {
    Check.positive("length of the body, m,", length);
    Check.positive("width of the body, m,", width);
    Check.positive("height of the body, m,", height);
  }

  /**
   * The diameter of a round body of the same largest section.
   *
   * @return m, taking the section for an ellipse
   */
  public double diameter() {
    return Math.sqrt(width * height);
  }
}
