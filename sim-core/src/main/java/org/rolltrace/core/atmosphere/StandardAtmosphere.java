package org.rolltrace.core.atmosphere;

import org.rolltrace.core.quantity.Check;

/**
 * U.S. Standard Atmosphere 1976 from 5000 m below sea level to 20 km, against geopotential
 * altitude.
 *
 * <p>Equations and sources are on the package page. Every method throws an {@link
 * IllegalArgumentException} naming value and range when its argument is outside the model.
 */
public final class StandardAtmosphere {
  /** Standard gravity g₀, m/s². */
  public static final double STANDARD_GRAVITY = 9.80665;

  /** Gas constant of dry air R, J/(kg K): 8314.32 J/(kmol K) over 28.9644 kg/kmol. */
  public static final double GAS_CONSTANT = 8314.32 / 28.9644;

  /** Ratio of the specific heats of air, 1.4. */
  public static final double HEAT_RATIO = 1.4;

  /** Radius of the earth r₀ in the geopotential relation, m. */
  public static final double EARTH_RADIUS = 6_356_766;

  /** Temperature at sea level T₀, K. */
  public static final double SEA_LEVEL_TEMPERATURE = 288.15;

  /** Pressure at sea level p₀, Pa. */
  public static final double SEA_LEVEL_PRESSURE = 101_325;

  /** Density at sea level ρ₀, kg/m³; 1.2250 by the gas law. */
  public static final double SEA_LEVEL_DENSITY =
      SEA_LEVEL_PRESSURE / (GAS_CONSTANT * SEA_LEVEL_TEMPERATURE);

  /** Speed of sound at sea level a₀, m/s; 340.294. */
  public static final double SEA_LEVEL_SPEED_OF_SOUND = DryAir.speedOfSound(SEA_LEVEL_TEMPERATURE);

  /** Fall of temperature with geopotential altitude below the tropopause L, K/m. */
  public static final double LAPSE_RATE = 0.0065;

  /** Geopotential altitude of the tropopause, m. */
  public static final double TROPOPAUSE_ALTITUDE = 11_000;

  /** Lowest geopotential altitude accepted, m. */
  public static final double LOWEST_ALTITUDE = -5_000;

  /** Highest geopotential altitude accepted, m. */
  public static final double HIGHEST_ALTITUDE = 20_000;

  private static final double EXPONENT = STANDARD_GRAVITY / (GAS_CONSTANT * LAPSE_RATE);
  private static final double TROPOPAUSE_TEMPERATURE =
      SEA_LEVEL_TEMPERATURE - LAPSE_RATE * TROPOPAUSE_ALTITUDE;
  private static final double TROPOPAUSE_PRESSURE = tropospherePressure(TROPOPAUSE_ALTITUDE);
  private static final double STRATOSPHERE_SCALE_HEIGHT =
      GAS_CONSTANT * TROPOPAUSE_TEMPERATURE / STANDARD_GRAVITY;
  private static final double LOWEST_PRESSURE = stratospherePressure(HIGHEST_ALTITUDE);
  private static final double HIGHEST_PRESSURE = tropospherePressure(LOWEST_ALTITUDE);
  private static final double LOWEST_GEOMETRIC = geometricAltitude(LOWEST_ALTITUDE);
  private static final double HIGHEST_GEOMETRIC = geometricAltitude(HIGHEST_ALTITUDE);

  private StandardAtmosphere() {}

  /**
   * Temperature on a standard day.
   *
   * @param altitude geopotential or pressure altitude, m, from −5000 to 20 000
   * @return temperature, K
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double temperature(double altitude) {
    checkAltitude(altitude);
    return altitude <= TROPOPAUSE_ALTITUDE
        ? SEA_LEVEL_TEMPERATURE - LAPSE_RATE * altitude
        : TROPOPAUSE_TEMPERATURE;
  }

  /**
   * Pressure on a standard day; for a pressure altitude, the pressure on any day.
   *
   * @param altitude geopotential or pressure altitude, m, from −5000 to 20 000
   * @return static pressure, Pa
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double pressure(double altitude) {
    checkAltitude(altitude);
    return altitude <= TROPOPAUSE_ALTITUDE
        ? tropospherePressure(altitude)
        : stratospherePressure(altitude);
  }

  /**
   * Density on a standard day.
   *
   * @param altitude geopotential or pressure altitude, m, from −5000 to 20 000
   * @return density, kg/m³
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double density(double altitude) {
    return DryAir.density(pressure(altitude), temperature(altitude));
  }

  /**
   * Speed of sound on a standard day.
   *
   * @param altitude geopotential or pressure altitude, m, from −5000 to 20 000
   * @return speed of sound, m/s
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double speedOfSound(double altitude) {
    return DryAir.speedOfSound(temperature(altitude));
  }

  /**
   * Pressure altitude: where the standard atmosphere has this pressure.
   *
   * @param pressure static pressure, Pa, from that at 20 000 m (5474.89) to that at −5000 m (177
   *     687)
   * @return pressure altitude, m
   * @throws IllegalArgumentException if no altitude of the model has this pressure
   */
  public static double pressureAltitude(double pressure) {
    Check.inRange("static pressure, Pa,", pressure, LOWEST_PRESSURE, HIGHEST_PRESSURE);
    double altitude =
        pressure >= TROPOPAUSE_PRESSURE
            ? -SEA_LEVEL_TEMPERATURE
                / LAPSE_RATE
                * Math.expm1(Math.log(pressure / SEA_LEVEL_PRESSURE) / EXPONENT)
            : TROPOPAUSE_ALTITUDE
                - STRATOSPHERE_SCALE_HEIGHT * Math.log(pressure / TROPOPAUSE_PRESSURE);
    return keepInside(altitude);
  }

  /**
   * Geopotential altitude of a geometric altitude.
   *
   * @param geometricAltitude height above sea level as measured with a rule, m, from −4996.07 to 20
   *     063.12
   * @return geopotential altitude, m
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double geopotentialAltitude(double geometricAltitude) {
    Check.inRange("geometric altitude, m,", geometricAltitude, LOWEST_GEOMETRIC, HIGHEST_GEOMETRIC);
    return keepInside(EARTH_RADIUS * geometricAltitude / (EARTH_RADIUS + geometricAltitude));
  }

  /**
   * Geometric altitude of a geopotential altitude.
   *
   * @param altitude geopotential altitude, m, from −5000 to 20 000
   * @return geometric altitude, m
   * @throws IllegalArgumentException if the altitude is outside the model
   */
  public static double geometricAltitude(double altitude) {
    checkAltitude(altitude);
    return EARTH_RADIUS * altitude / (EARTH_RADIUS - altitude);
  }

  private static void checkAltitude(double altitude) {
    Check.inRange(
        "pressure or geopotential altitude, m,", altitude, LOWEST_ALTITUDE, HIGHEST_ALTITUDE);
  }

  /** Rounding at an end of the range must not make an altitude that other methods refuse. */
  private static double keepInside(double altitude) {
    return Math.max(LOWEST_ALTITUDE, Math.min(HIGHEST_ALTITUDE, altitude));
  }

  private static double tropospherePressure(double altitude) {
    return SEA_LEVEL_PRESSURE
        * Math.exp(EXPONENT * Math.log1p(-LAPSE_RATE * altitude / SEA_LEVEL_TEMPERATURE));
  }

  private static double stratospherePressure(double altitude) {
    return TROPOPAUSE_PRESSURE
        * Math.exp(-(altitude - TROPOPAUSE_ALTITUDE) / STRATOSPHERE_SCALE_HEIGHT);
  }
}
