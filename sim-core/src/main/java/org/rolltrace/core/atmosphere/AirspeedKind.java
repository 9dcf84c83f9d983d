package org.rolltrace.core.atmosphere;

/**
 * What a speed through the air is measured by.
 *
 * <p>Indicated airspeed is none of them: it becomes calibrated by the aeroplane's own
 * position-error table.
 */
public enum AirspeedKind {
  /** True airspeed V: the speed through the air. */
  TRUE("true airspeed, m/s,"),

  /** Equivalent airspeed Ve = V √(ρ/ρ₀): the speed with the same dynamic pressure at sea level. */
  EQUIVALENT("equivalent airspeed, m/s,"),

  /** Calibrated airspeed Vc: the speed with the same impact pressure at sea level. */
  CALIBRATED("calibrated airspeed, m/s,");

  private final String role;

  AirspeedKind(String role) {
    this.role = role;
  }

  /** What messages call a speed of this kind. */
  String role() {
    return role;
  }
}
