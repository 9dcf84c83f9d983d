package org.rolltrace.core.atmosphere;

import java.util.Locale;
import java.util.Objects;
import org.rolltrace.core.quantity.Check;

/**
 * The air the aeroplane is in, its speed through it, load factor and flight-path angle. Immutable.
 *
 * <p>The pressure altitude fixes the static pressure; a temperature offset from the standard day or
 * a density fixes the rest of the air; one airspeed of a stated kind fixes the others. The airspeed
 * given is kept to the last digit, the others follow from it.
 *
 * <p>A condition starts level with load factor 1. See {@link #withFlightPathAngle} for how the load
 * factor goes with the path.
 */
public final class FlightCondition {
  /** Standard gravity, m/s²: {@link StandardAtmosphere#STANDARD_GRAVITY}. */
  public static final double STANDARD_GRAVITY = StandardAtmosphere.STANDARD_GRAVITY;

  /** Lowest temperature accepted, K: a bound against slips, colder than any air flown in. */
  public static final double LOWEST_TEMPERATURE = 150;

  /**
   * Highest temperature accepted, K: a bound against slips. An air temperature given by mistake
   * where its offset is expected ends above it.
   */
  public static final double HIGHEST_TEMPERATURE = 400;

  private final Air air;
  private final Motion motion;
  private final double loadFactor;
  private final boolean loadFactorGiven;
  private final double flightPathAngle;

  private FlightCondition(
      Air air, Motion motion, double loadFactor, boolean loadFactorGiven, double flightPathAngle) {
    this.air = air;
    this.motion = motion;
    this.loadFactor = loadFactor;
    this.loadFactorGiven = loadFactorGiven;
    this.flightPathAngle = flightPathAngle;
  }

  /**
   * Level flight at load factor 1 on a day that differs from the standard one by an offset.
   *
   * @param pressureAltitude pressure altitude, m, from −5000 to 20 000
   * @param temperatureOffset temperature less that of the standard day at this altitude, K; the
   *     temperature must come out from 150 to 400 K
   * @param kind what kind of airspeed is given
   * @param airspeed the airspeed, m/s, above 0
   * @return the condition
   * @throws IllegalArgumentException if a value is outside its range, the flight Mach number is 1
   *     or more, or the calibrated airspeed is above the speed of sound at sea level
   */
  public static FlightCondition of(
      double pressureAltitude, double temperatureOffset, AirspeedKind kind, double airspeed) {
    return level(Air.ofOffset(pressureAltitude, temperatureOffset), kind, airspeed);
  }

  /**
   * Level flight at load factor 1 in air of a given density; the temperature follows from pressure
   * and density by the gas law.
   *
   * @param pressureAltitude pressure altitude, m, from −5000 to 20 000
   * @param density density, kg/m³; the temperature must come out from 150 to 400 K
   * @param kind what kind of airspeed is given
   * @param airspeed the airspeed, m/s, above 0
   * @return the condition
   * @throws IllegalArgumentException if a value is outside its range, the flight Mach number is 1
   *     or more, or the calibrated airspeed is above the speed of sound at sea level
   */
  public static FlightCondition ofDensity(
      double pressureAltitude, double density, AirspeedKind kind, double airspeed) {
    return level(Air.ofDensity(pressureAltitude, density), kind, airspeed);
  }

  private static FlightCondition level(Air air, AirspeedKind kind, double airspeed) {
    return new FlightCondition(air, Motion.of(air, kind, airspeed), 1, false, 0);
  }

  /**
   * The same condition at a load factor that later changes of the flight path leave alone.
   *
   * @param newLoadFactor lift over weight, positive upwards in the aeroplane; finite
   * @return the condition
   * @throws IllegalArgumentException if the load factor is not finite
   */
  public FlightCondition withLoadFactor(double newLoadFactor) {
    Check.finite("load factor", newLoadFactor);
    return new FlightCondition(air, motion, newLoadFactor, true, flightPathAngle);
  }

  /**
   * The same condition on another flight path. The load factor becomes cos γ, that of straight
   * flight along the path, unless {@link #withLoadFactor} has set one: then it stays.
   *
   * @param newFlightPathAngle flight-path angle γ, rad, positive climbing, inside ±π/2
   * @return the condition
   * @throws IllegalArgumentException if the angle is outside its range
   */
  public FlightCondition withFlightPathAngle(double newFlightPathAngle) {
    if (!(Math.abs(newFlightPathAngle) < Math.PI / 2)) {
      throw new IllegalArgumentException(
          "flight-path angle, rad, is "
              + newFlightPathAngle
              + "; expected a number inside ±π/2. Check that it is in radians");
    }
    return new FlightCondition(
        air,
        motion,
        loadFactorGiven ? loadFactor : Math.cos(newFlightPathAngle),
        loadFactorGiven,
        newFlightPathAngle);
  }

  /**
   * The same condition in a steady turn along its path. The load factor becomes cos γ / cos φ,
   * which keeps path angle and bank, unless {@link #withLoadFactor} has set one: then it stays.
   *
   * @param bank bank φ, rad, inside ±π/2; 0 for straight flight
   * @return the condition
   * @throws IllegalArgumentException if the bank is outside its range
   */
  public FlightCondition inTurn(double bank) {
    if (!(Math.abs(bank) < Math.PI / 2)) {
      throw new IllegalArgumentException(
          "bank of a steady turn, rad, is " + bank + "; expected a number inside ±π/2");
    }
    double turning = Math.cos(flightPathAngle) / Math.cos(bank);
    return loadFactorGiven || turning == loadFactor
        ? this
        : new FlightCondition(air, motion, turning, false, flightPathAngle);
  }

  /**
   * The same condition at another speed in the same air.
   *
   * @param kind what kind of airspeed is given
   * @param airspeed the airspeed, m/s, above 0
   * @return the condition
   * @throws IllegalArgumentException if the speed is outside its range, as in {@link #of}
   */
  public FlightCondition withAirspeed(AirspeedKind kind, double airspeed) {
    return new FlightCondition(
        air, Motion.of(air, kind, airspeed), loadFactor, loadFactorGiven, flightPathAngle);
  }

  /**
   * The same condition at another true airspeed in the same air.
   *
   * @param trueAirspeed true airspeed, m/s, above 0
   * @return the condition
   * @throws IllegalArgumentException if the speed is outside its range, as in {@link #of}
   */
  public FlightCondition withTrueAirspeed(double trueAirspeed) {
    return withAirspeed(AirspeedKind.TRUE, trueAirspeed);
  }

  /**
   * Pressure altitude.
   *
   * @return pressure altitude, m
   */
  public double pressureAltitude() {
    return air.pressureAltitude;
  }

  /**
   * Temperature of the air.
   *
   * @return temperature, K
   */
  public double temperature() {
    return air.temperature;
  }

  /**
   * Temperature less that of the standard day at this pressure altitude.
   *
   * @return temperature offset, K
   */
  public double temperatureOffset() {
    return air.temperature - StandardAtmosphere.temperature(air.pressureAltitude);
  }

  /**
   * Static pressure.
   *
   * @return static pressure, Pa
   */
  public double pressure() {
    return air.pressure;
  }

  /**
   * Density of the air.
   *
   * @return density, kg/m³
   */
  public double density() {
    return air.density;
  }

  /**
   * Speed of sound.
   *
   * @return speed of sound, m/s
   */
  public double speedOfSound() {
    return air.speedOfSound;
  }

  /**
   * True airspeed V.
   *
   * @return true airspeed, m/s
   */
  public double trueAirspeed() {
    return motion.trueAirspeed;
  }

  /**
   * Equivalent airspeed Ve.
   *
   * @return equivalent airspeed, m/s
   */
  public double equivalentAirspeed() {
    return motion.equivalentAirspeed;
  }

  /**
   * Calibrated airspeed Vc.
   *
   * @return calibrated airspeed, m/s
   */
  public double calibratedAirspeed() {
    return motion.calibratedAirspeed;
  }

  /**
   * Flight Mach number.
   *
   * @return Mach number, below 1
   */
  public double mach() {
    return motion.mach;
  }

  /**
   * Dynamic pressure q̄ = ½ρV².
   *
   * @return dynamic pressure, Pa
   */
  public double dynamicPressure() {
    return motion.dynamicPressure;
  }

  /**
   * Load factor n, lift over weight.
   *
   * @return load factor
   */
  public double loadFactor() {
    return loadFactor;
  }

  /**
   * Whether the load factor was set by {@link #withLoadFactor}, so that the flight path leaves it
   * alone.
   *
   * @return true if it was set
   */
  public boolean loadFactorGiven() {
    return loadFactorGiven;
  }

  /**
   * Flight-path angle γ, positive climbing.
   *
   * @return flight-path angle, rad
   */
  public double flightPathAngle() {
    return flightPathAngle;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof FlightCondition that
        && air.equals(that.air)
        && motion.equals(that.motion)
        && Double.compare(loadFactor, that.loadFactor) == 0
        && loadFactorGiven == that.loadFactorGiven
        && Double.compare(flightPathAngle, that.flightPathAngle) == 0;
  }

  @Override
  public int hashCode() {
    return Objects.hash(air, motion, loadFactor, loadFactorGiven, flightPathAngle);
  }

  @Override
  public String toString() {
    return String.format(
        Locale.ROOT,
        "pressure altitude %.6g m, %.6g K, %.6g kg/m3, V %.6g m/s, Ve %.6g m/s, Vc %.6g m/s,"
            + " M %.4g, n %.6g, flight path %.6g rad",
        air.pressureAltitude,
        air.temperature,
        air.density,
        motion.trueAirspeed,
        motion.equivalentAirspeed,
        motion.calibratedAirspeed,
        motion.mach,
        loadFactor,
        flightPathAngle);
  }

  private record Air(
      double pressureAltitude,
      double temperature,
      double pressure,
      double density,
      double speedOfSound) {

    static Air ofOffset(double pressureAltitude, double temperatureOffset) {
      Check.finite("temperature offset, K,", temperatureOffset);
      double standard = StandardAtmosphere.temperature(pressureAltitude);
      double temperature = standard + temperatureOffset;
      if (!isAccepted(temperature)) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "temperature offset, K, is %s, which makes %.6g K at pressure altitude %s m;"
                    + " expected an offset from %.6g to %.6g. Give the difference from the"
                    + " standard day, 0 on a standard day",
                temperatureOffset,
                temperature,
                pressureAltitude,
                LOWEST_TEMPERATURE - standard,
                HIGHEST_TEMPERATURE - standard));
      }
      double pressure = StandardAtmosphere.pressure(pressureAltitude);
      return of(pressureAltitude, temperature, pressure, DryAir.density(pressure, temperature));
    }

    static Air ofDensity(double pressureAltitude, double density) {
      Check.positive("density, kg/m3,", density);
      double pressure = StandardAtmosphere.pressure(pressureAltitude);
      double temperature = DryAir.temperature(pressure, density);
      if (!isAccepted(temperature)) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "density, kg/m3, is %s, which makes %.6g K at pressure altitude %s m;"
                    + " expected a density from %.6g to %.6g. Check its unit and the altitude",
                density,
                temperature,
                pressureAltitude,
                DryAir.density(pressure, HIGHEST_TEMPERATURE),
                DryAir.density(pressure, LOWEST_TEMPERATURE)));
      }
      return of(pressureAltitude, temperature, pressure, density);
    }

    private static Air of(
        double pressureAltitude, double temperature, double pressure, double density) {
      return new Air(
          pressureAltitude, temperature, pressure, density, DryAir.speedOfSound(temperature));
    }

    private static boolean isAccepted(double temperature) {
      return temperature >= LOWEST_TEMPERATURE && temperature <= HIGHEST_TEMPERATURE;
    }
  }

  private record Motion(
      double trueAirspeed,
      double equivalentAirspeed,
      double calibratedAirspeed,
      double mach,
      double dynamicPressure) {

    static Motion of(Air air, AirspeedKind kind, double airspeed) {
      Objects.requireNonNull(kind, "kind of airspeed");
      Check.positive(kind.role(), airspeed);
      double equivalent =
          switch (kind) {
            case TRUE -> Airspeeds.equivalentFromTrue(airspeed, air.density);
            case EQUIVALENT -> airspeed;
            case CALIBRATED -> Airspeeds.equivalentFromCalibrated(airspeed, air.pressure);
          };
      double trueAirspeed =
          kind == AirspeedKind.TRUE
              ? airspeed
              : Airspeeds.trueFromEquivalent(equivalent, air.density);
      double mach = trueAirspeed / air.speedOfSound;
      Airspeeds.requireSubsonic(kind.role(), airspeed, mach);
      double calibrated =
          kind == AirspeedKind.CALIBRATED
              ? airspeed
              : Airspeeds.calibratedFromEquivalent(equivalent, air.pressure);
      double dynamicPressure = 0.5 * air.density * trueAirspeed * trueAirspeed;
      // A speed so small that its square underflows would leave nothing to divide by.
      Check.positive("dynamic pressure, Pa,", dynamicPressure);
      return new Motion(trueAirspeed, equivalent, calibrated, mach, dynamicPressure);
    }
  }
}
