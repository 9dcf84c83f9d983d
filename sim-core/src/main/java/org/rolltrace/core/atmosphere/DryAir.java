package org.rolltrace.core.atmosphere;

/** Dry air as a perfect gas. */
final class DryAir {
  private DryAir() {}

  static double density(double pressure, double temperature) {
    return pressure / (StandardAtmosphere.GAS_CONSTANT * temperature);
  }

  static double temperature(double pressure, double density) {
    return pressure / (StandardAtmosphere.GAS_CONSTANT * density);
  }

  static double speedOfSound(double temperature) {
    return Math.sqrt(StandardAtmosphere.HEAT_RATIO * StandardAtmosphere.GAS_CONSTANT * temperature);
  }
}
