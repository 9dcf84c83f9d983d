package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * A piece of the half wing between two stations, with straight edges. All lengths lie in the ground
 * plan: a panel with dihedral is longer than its stations are apart.
 *
 * @param from distance of its inner end from the plane of symmetry, m, 0 or more
 * @param to distance of its outer end, m, above {@code from}
 * @param innerChord chord at its inner end, m, above 0
 * @param outerChord chord at its outer end, m, above 0
 * @param sweep of its quarter-chord line, rad, positive backwards, inside 60° either way
 * @param dihedral Γ, rad, positive with the outer end higher, inside 60° either way
 * @param twist incidence of its outer end less that of its inner end, rad, negative for washout
 * @param section its section
 */
public record WingPanel(
    double from,
    double to,
    double innerChord,
    double outerChord,
    double sweep,
    double dihedral,
    double twist,
    Section section) {

  private static final double STEEPEST = Math.toRadians(60);
  private static final double MOST_TWIST = Math.toRadians(15);

  public WingPanel {
    Check.notNegative("inner station of a panel, m,", from);
    Check.finite("outer station of a panel, m,", to);
    if (!(to > from)) {
      throw new IllegalArgumentException(
          "a panel reaches from " + from + " m to " + to + " m; expected an outer end further out");
    }
    Check.positive("inner chord of a panel, m,", innerChord);
    Check.positive("outer chord of a panel, m,", outerChord);
    Check.inRange("sweep of a panel, rad,", sweep, -STEEPEST, STEEPEST);
    Check.inRange("dihedral of a panel, rad,", dihedral, -STEEPEST, STEEPEST);
    Check.inRange("twist of a panel, rad,", twist, -MOST_TWIST, MOST_TWIST);
  }

  /**
   * The area of this panel on one side.
   *
   * @return m²
   */
  public double area() {
    return 0.5 * (innerChord + outerChord) * (to - from);
  }

  /**
   * The chord at a station.
   *
   * @param station distance from the plane of symmetry, m; beyond the panel its edges go on
   * @return m
   */
  public double chordAt(double station) {
    return innerChord + (outerChord - innerChord) * share(station);
  }

  /** How far out in the panel a station lies, 0 to 1 inside it. */
  double share(double station) {
    return (station - from) / (to - from);
  }
}
