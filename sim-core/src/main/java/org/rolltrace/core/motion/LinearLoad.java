package org.rolltrace.core.motion;

/**
 * A force or moment that is linear in the lateral motion: at = β·sideslip + p·rollRate + r·yawRate
 * + δa·aileron + δr·rudder + constant.
 *
 * @param perSideslip N or N m per rad
 * @param perRollRate N or N m per rad/s
 * @param perYawRate N or N m per rad/s
 * @param perAileron N or N m per rad
 * @param perRudder N or N m per rad
 * @param constant N or N m
 */
public record LinearLoad(
    double perSideslip,
    double perRollRate,
    double perYawRate,
    double perAileron,
    double perRudder,
    double constant) {

  /**
   * The load in a state of motion.
   *
   * @param sideslip rad
   * @param rollRate rad/s
   * @param yawRate rad/s
   * @param aileron rad
   * @param rudder rad
   * @return N or N m
   */
  public double at(
      double sideslip, double rollRate, double yawRate, double aileron, double rudder) {
    return perSideslip * sideslip
        + perRollRate * rollRate
        + perYawRate * yawRate
        + perAileron * aileron
        + perRudder * rudder
        + constant;
  }
}
