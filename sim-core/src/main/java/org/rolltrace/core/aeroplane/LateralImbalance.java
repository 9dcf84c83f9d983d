package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * Fuel or stores on one side only. The mass of the aeroplane counts them; its moments of inertia do
 * not.
 *
 * @param mass m_f, kg, above 0
 * @param arm y_f, m, positive to the right
 */
public record LateralImbalance(double mass, double arm) {

  public LateralImbalance {
    Check.positive("mass of the lateral imbalance, kg,", mass);
    Check.finite("arm of the lateral imbalance, m,", arm);
  }

  /**
   * The rolling moment for each unit of acceleration along the lift: n g times it is the moment.
   *
   * @return m_f y_f, kg m, positive right wing down
   */
  public double massMoment() {
    return mass * arm;
  }
}
