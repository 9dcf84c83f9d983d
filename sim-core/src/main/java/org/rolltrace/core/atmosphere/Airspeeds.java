package org.rolltrace.core.atmosphere;

import static org.rolltrace.core.atmosphere.StandardAtmosphere.HEAT_RATIO;
import static org.rolltrace.core.atmosphere.StandardAtmosphere.SEA_LEVEL_DENSITY;
import static org.rolltrace.core.atmosphere.StandardAtmosphere.SEA_LEVEL_PRESSURE;
import static org.rolltrace.core.atmosphere.StandardAtmosphere.SEA_LEVEL_SPEED_OF_SOUND;

import org.rolltrace.core.quantity.Check;

/**
 * From one kind of airspeed to another, by the compressible pitot relation for subsonic flow.
 *
 * <p>Equations and sources are on the package page. Speeds are in m/s and may be 0; pressures are
 * static pressures in Pa, densities in kg/m³, both above 0. Every method throws an {@link
 * IllegalArgumentException} for a negative or non-finite argument, and, where the relation is used,
 * for a flight Mach number of 1 or more or a calibrated airspeed above the speed of sound at sea
 * level.
 */
public final class Airspeeds {
  // (γ − 1)/2 and γ/(γ − 1) for γ = 1.4, written out because 1.4 − 1 is not 0.4 in binary.
  private static final double HALF_HEAT_EXCESS = 0.2;
  private static final double ISENTROPIC_EXPONENT = 3.5;

  private static final String PRESSURE = "static pressure, Pa,";
  private static final String DENSITY = "density, kg/m3,";

  private Airspeeds() {}

  /**
   * Impact pressure qc: total less static pressure, what a pitot-static pair feels.
   *
   * @param mach flight Mach number, from 0 to below 1
   * @param pressure static pressure, Pa
   * @return impact pressure, Pa
   * @throws IllegalArgumentException if the Mach number is negative, 1 or more, or the pressure is
   *     not above 0
   */
  public static double impactPressure(double mach, double pressure) {
    Check.notNegative("flight Mach number", mach);
    Check.positive(PRESSURE, pressure);
    requireSubsonic("flight Mach number", mach, mach);
    return pressure * impactRatio(mach);
  }

  /**
   * Flight Mach number from what a pitot-static pair feels.
   *
   * @param impactPressure total less static pressure, Pa, from 0 to below 0.8929 of the static
   *     pressure
   * @param pressure static pressure, Pa
   * @return flight Mach number
   * @throws IllegalArgumentException if the Mach number is 1 or more, the impact pressure is
   *     negative, or the static pressure is not above 0
   */
  public static double mach(double impactPressure, double pressure) {
    Check.notNegative("impact pressure, Pa,", impactPressure);
    Check.positive(PRESSURE, pressure);
    double mach = machOfRatio(impactPressure / pressure);
    requireSubsonic("impact pressure, Pa,", impactPressure, mach);
    return mach;
  }

  /**
   * Equivalent from calibrated airspeed.
   *
   * @param calibrated calibrated airspeed, m/s, from 0 to the speed of sound at sea level
   * @param pressure static pressure, Pa
   * @return equivalent airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range or the flight Mach number
   *     is 1 or more
   */
  public static double equivalentFromCalibrated(double calibrated, double pressure) {
    Check.notNegative(AirspeedKind.CALIBRATED.role(), calibrated);
    Check.positive(PRESSURE, pressure);
    requireCalibratedInRange(calibrated);
    double impactPressure = SEA_LEVEL_PRESSURE * impactRatio(calibrated / SEA_LEVEL_SPEED_OF_SOUND);
    double mach = machOfRatio(impactPressure / pressure);
    requireSubsonic(AirspeedKind.CALIBRATED.role(), calibrated, mach);
    return mach * equivalentSpeedOfSound(pressure);
  }

  /**
   * Calibrated from equivalent airspeed.
   *
   * @param equivalent equivalent airspeed, m/s, 0 or more
   * @param pressure static pressure, Pa
   * @return calibrated airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range, the flight Mach number is
   *     1 or more, or the calibrated airspeed is above the speed of sound at sea level (below Mach
   *     1 only where the pressure is higher than there)
   */
  public static double calibratedFromEquivalent(double equivalent, double pressure) {
    Check.notNegative(AirspeedKind.EQUIVALENT.role(), equivalent);
    Check.positive(PRESSURE, pressure);
    double mach = equivalent / equivalentSpeedOfSound(pressure);
    requireSubsonic(AirspeedKind.EQUIVALENT.role(), equivalent, mach);
    double impactPressure = pressure * impactRatio(mach);
    double calibrated = SEA_LEVEL_SPEED_OF_SOUND * machOfRatio(impactPressure / SEA_LEVEL_PRESSURE);
    requireCalibratedInRange(calibrated);
    return calibrated;
  }

  /**
   * Equivalent from true airspeed. Holds at any Mach number.
   *
   * @param trueAirspeed true airspeed, m/s, 0 or more
   * @param density density, kg/m³
   * @return equivalent airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static double equivalentFromTrue(double trueAirspeed, double density) {
    Check.notNegative(AirspeedKind.TRUE.role(), trueAirspeed);
    Check.positive(DENSITY, density);
    return trueAirspeed * Math.sqrt(density / SEA_LEVEL_DENSITY);
  }

  /**
   * True from equivalent airspeed. Holds at any Mach number.
   *
   * @param equivalent equivalent airspeed, m/s, 0 or more
   * @param density density, kg/m³
   * @return true airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static double trueFromEquivalent(double equivalent, double density) {
    Check.notNegative(AirspeedKind.EQUIVALENT.role(), equivalent);
    Check.positive(DENSITY, density);
    return equivalent / Math.sqrt(density / SEA_LEVEL_DENSITY);
  }

  /**
   * True from calibrated airspeed.
   *
   * @param calibrated calibrated airspeed, m/s, from 0 to the speed of sound at sea level
   * @param pressure static pressure, Pa
   * @param density density, kg/m³
   * @return true airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range or the flight Mach number
   *     is 1 or more
   */
  public static double trueFromCalibrated(double calibrated, double pressure, double density) {
    return trueFromEquivalent(equivalentFromCalibrated(calibrated, pressure), density);
  }

  /**
   * Calibrated from true airspeed.
   *
   * @param trueAirspeed true airspeed, m/s, 0 or more
   * @param pressure static pressure, Pa
   * @param density density, kg/m³
   * @return calibrated airspeed, m/s
   * @throws IllegalArgumentException if an argument is outside its range, the flight Mach number is
   *     1 or more, or the calibrated airspeed is above the speed of sound at sea level
   */
  public static double calibratedFromTrue(double trueAirspeed, double pressure, double density) {
    return calibratedFromEquivalent(equivalentFromTrue(trueAirspeed, density), pressure);
  }

  /** Refuses a flight Mach number of 1 or more, in terms of the value that led to it. */
  static void requireSubsonic(String role, double value, double mach) {
    if (!(mach < 1)) {
      throw new IllegalArgumentException(
          role
              + " is "
              + value
              + ", which is flight at Mach "
              + mach
              + "; expected below Mach 1, as the subsonic pitot relation does not hold beyond."
              + " Lower the speed or the altitude, and check the unit and the kind of airspeed");
    }
  }

  private static void requireCalibratedInRange(double calibrated) {
    if (!(calibrated <= SEA_LEVEL_SPEED_OF_SOUND)) {
      throw new IllegalArgumentException(
          "calibrated airspeed, m/s, is "
              + calibrated
              + "; expected at most the speed of sound at sea level, "
              + SEA_LEVEL_SPEED_OF_SOUND
              + ", as the subsonic pitot relation does not hold beyond."
              + " Lower the speed, and check its unit");
    }
  }

  /** qc/p at a Mach number. */
  private static double impactRatio(double mach) {
    return Math.expm1(ISENTROPIC_EXPONENT * Math.log1p(HALF_HEAT_EXCESS * mach * mach));
  }

  private static double machOfRatio(double impactRatio) {
    return Math.sqrt(Math.expm1(Math.log1p(impactRatio) / ISENTROPIC_EXPONENT) / HALF_HEAT_EXCESS);
  }

  /** Ve/M = a √(ρ/ρ₀), in which the temperature cancels. */
  private static double equivalentSpeedOfSound(double pressure) {
    return Math.sqrt(HEAT_RATIO * pressure / SEA_LEVEL_DENSITY);
  }
}
