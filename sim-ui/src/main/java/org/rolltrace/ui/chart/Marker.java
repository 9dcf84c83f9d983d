package org.rolltrace.ui.chart;

import org.rolltrace.core.quantity.Check;

/**
 * An event on the time axis.
 *
 * @param time s
 * @param word short, such as "30°"
 */
public record Marker(double time, String word) {

  public Marker {
    Check.finite("time of the marker, s,", time);
  }
}
