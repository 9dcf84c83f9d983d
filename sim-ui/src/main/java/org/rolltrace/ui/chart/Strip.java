package org.rolltrace.ui.chart;

import java.util.List;

/**
 * Curves that share an axis of values.
 *
 * @param title what the axis shows
 * @param unit its unit, or the units of several quantities with a comma between
 * @param curves the first one is painted last
 * @param markers events
 */
public record Strip(String title, String unit, List<Curve> curves, List<Marker> markers) {

  public Strip {
    curves = List.copyOf(curves);
    markers = List.copyOf(markers);
  }
}
