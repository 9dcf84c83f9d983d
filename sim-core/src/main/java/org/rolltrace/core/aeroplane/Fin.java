package org.rolltrace.core.aeroplane;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * A fin with its rudder.
 *
 * @param area S_v, m², with the rudder, above 0
 * @param span its height from root to tip, m, above 0
 * @param arm l_v from the centre of gravity back to its quarter-chord point at the aerodynamic
 *     centre, m, along the body axis, above 0
 * @param height z_v of its aerodynamic centre above the centre of gravity, m, along the body axis
 * @param sweep of its quarter-chord line, rad
 * @param rudderShare rudder chord by fin chord, above 0 and below 1; empty when unknown
 */
public record Fin(
    double area, double span, double arm, double height, double sweep, OptionalDouble rudderShare) {

  private static final double STEEPEST = Math.toRadians(70);

  public Fin {
    Check.positive("area of the fin, m2,", area);
    Check.positive("span of the fin, m,", span);
    Check.positive("arm of the fin, m,", arm);
    Check.finite("height of the fin, m,", height);
    Check.inRange("sweep of the fin, rad,", sweep, -STEEPEST, STEEPEST);
    rudderShare.ifPresent(AileronPlace::checkShare);
  }

  /**
   * The aspect ratio of the fin alone.
   *
   * @return span² / area
   */
  public double aspectRatio() {
    return span * span / area;
  }
}
