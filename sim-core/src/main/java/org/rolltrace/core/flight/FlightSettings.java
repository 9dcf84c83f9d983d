package org.rolltrace.core.flight;

import org.rolltrace.core.quantity.Check;

/**
 * How finely a manoeuvre is computed.
 *
 * @param relativeTolerance error allowed in a step against the state, 1e-13 to 1e-3
 * @param absoluteTolerance error allowed in a step, rad and rad/s, 1e-15 to 1e-3
 * @param sampleRate samples of the history a second, 1 to 10,000
 */
public record FlightSettings(
    double relativeTolerance, double absoluteTolerance, double sampleRate) {

  /** 1e-9 relative, 1e-10 rad absolute, 100 samples a second. */
  public static final FlightSettings DEFAULT = new FlightSettings(1e-9, 1e-10, 100);

  /**
   * For the measures of many rolls: 1e-7 relative, 1e-8 rad absolute. Samples then are still within
   * 5e-3 deg and deg/s of a run at 1e-12.
   */
  public static final FlightSettings OUTLINE = new FlightSettings(1e-7, 1e-8, 100);

  public FlightSettings {
    Check.inRange("relative tolerance", relativeTolerance, 1e-13, 1e-3);
    Check.inRange("absolute tolerance, rad,", absoluteTolerance, 1e-15, 1e-3);
    Check.inRange("sample rate, 1/s,", sampleRate, 1, 10_000);
  }

  /**
   * The same tolerances with another sample rate.
   *
   * @param rate samples a second
   * @return the settings
   */
  public FlightSettings withSampleRate(double rate) {
    return new FlightSettings(relativeTolerance, absoluteTolerance, rate);
  }

  /**
   * The same sample rate with other tolerances.
   *
   * @param relative error allowed in a step against the state
   * @return the settings, with a tenth of it as the absolute tolerance
   */
  public FlightSettings withTolerance(double relative) {
    return new FlightSettings(relative, relative / 10, sampleRate);
  }
}
