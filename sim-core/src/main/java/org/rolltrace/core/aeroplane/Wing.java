package org.rolltrace.core.aeroplane;

import java.util.List;
import org.rolltrace.core.quantity.Check;

/**
 * A wing, the same on both sides, by its panels from the root outwards.
 *
 * @param panels from the plane of symmetry to the tip, each beginning where the one before ends
 * @param incidence of the root chord to the x axis of the body, rad
 * @param height of the root quarter-chord above the centre line of the body, m; negative for a low
 *     wing
 */
public record Wing(List<WingPanel> panels, double incidence, double height) {

  /** How far ends that meet may lie apart, m. */
  public static final double JOINT = 1e-6;

  private static final double MOST_INCIDENCE = Math.toRadians(15);

  public Wing {
    panels = List.copyOf(panels);
    if (panels.isEmpty()) {
      throw new IllegalArgumentException("the wing has no panels; expected at least one");
    }
    Check.inRange("incidence of the wing, rad,", incidence, -MOST_INCIDENCE, MOST_INCIDENCE);
    Check.finite("height of the wing, m,", height);
    double end = 0;
    for (WingPanel panel : panels) {
      if (!(Math.abs(panel.from() - end) <= JOINT)) {
        throw new IllegalArgumentException(
            "a panel begins at "
                + panel.from()
                + " m, "
                + (panel.from() < end ? "inside" : "away from")
                + " the one before it, which ends at "
                + end
                + " m; expected panels that join, the first at 0 m");
      }
      end = panel.to();
    }
  }

  /**
   * The span.
   *
   * @return b, m, from tip to tip in the ground plan
   */
  public double span() {
    return 2 * halfSpan();
  }

  /**
   * Where the tip is.
   *
   * @return b/2, m
   */
  public double halfSpan() {
    return panels.get(panels.size() - 1).to();
  }

  /**
   * The area of both sides.
   *
   * @return S, m², in the ground plan, with what the body covers
   */
  public double area() {
    return 2 * panels.stream().mapToDouble(WingPanel::area).sum();
  }

  /**
   * The aspect ratio.
   *
   * @return b²/S
   */
  public double aspectRatio() {
    return span() * span() / area();
  }

  /**
   * The panel at a station.
   *
   * @param station distance from the plane of symmetry, m
   * @return the panel; the outer one of two at a joint, the last one beyond the tip
   */
  public WingPanel panelAt(double station) {
    for (WingPanel panel : panels) {
      if (station < panel.to()) {
        return panel;
      }
    }
    return panels.get(panels.size() - 1);
  }

  /**
   * The chord at a station.
   *
   * @param station distance from the plane of symmetry, m
   * @return m
   */
  public double chordAt(double station) {
    return panelAt(station).chordAt(station);
  }

  /**
   * The incidence of the chord at a station to that of the root.
   *
   * @param station distance from the plane of symmetry, m
   * @return rad, negative for washout
   */
  public double twistAt(double station) {
    double twist = 0;
    for (WingPanel panel : panels) {
      if (station < panel.to()) {
        return twist + panel.twist() * panel.share(station);
      }
      twist += panel.twist();
    }
    return twist;
  }

  /**
   * How far the quarter-chord point of a station lies behind that of the root.
   *
   * @param station distance from the plane of symmetry, m
   * @return m
   */
  public double quarterChordAt(double station) {
    double back = 0;
    for (WingPanel panel : panels) {
      double tangent = Math.tan(panel.sweep());
      if (station < panel.to()) {
        return back + (station - panel.from()) * tangent;
      }
      back += (panel.to() - panel.from()) * tangent;
    }
    return back;
  }

  /**
   * The ends of the panels.
   *
   * @return from 0 to the tip, m
   */
  public double[] stations() {
    double[] stations = new double[panels.size() + 1];
    for (int i = 0; i < panels.size(); i++) {
      stations[i + 1] = panels.get(i).to();
    }
    return stations;
  }

  /**
   * The mean of the sweep over the area.
   *
   * @return rad
   */
  public double meanSweep() {
    return mean(panels.stream().mapToDouble(WingPanel::sweep).toArray());
  }

  private double mean(double[] ofPanels) {
    double sum = 0;
    for (int i = 0; i < ofPanels.length; i++) {
      sum += 2 * panels.get(i).area() * ofPanels[i];
    }
    return sum / area();
  }

  /**
   * The mean profile drag coefficient over the area.
   *
   * @return 0 or more
   */
  public double meanProfileDrag() {
    return mean(panels.stream().mapToDouble(panel -> panel.section().profileDrag()).toArray());
  }
}
