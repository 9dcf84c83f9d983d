package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * A horizontal tail.
 *
 * @param area S_h, m², above 0
 * @param span b_h, m, above 0
 * @param arm from the centre of gravity back to its quarter chord, m, above 0
 * @param height of it above the centre of gravity, m
 */
public record Tailplane(double area, double span, double arm, double height) {

  public Tailplane {
    Check.positive("area of the tailplane, m2,", area);
    Check.positive("span of the tailplane, m,", span);
    Check.positive("arm of the tailplane, m,", arm);
    Check.finite("height of the tailplane, m,", height);
  }

  /**
   * The aspect ratio.
   *
   * @return span² / area
   */
  public double aspectRatio() {
    return span * span / area;
  }
}
