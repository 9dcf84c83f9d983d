package org.rolltrace.core.propeller;

import java.util.ArrayList;
import java.util.List;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.atmosphere.FlightCondition;

/**
 * The propellers of an aeroplane in a condition, at the setting it is flown with. Where only their
 * moments are given, there are none to be worked out.
 */
public final class Propulsion {
  private final List<TurningPropeller> propellers;
  private final double ratedPower;
  private final PropellerSetting setting;

  private Propulsion(
      List<TurningPropeller> propellers, double ratedPower, PropellerSetting setting) {
    this.propellers = propellers;
    this.ratedPower = ratedPower;
    this.setting = setting;
  }

  /**
   * The propellers of an aeroplane.
   *
   * @param aeroplane whose propellers they are
   * @param condition what it flies in
   * @param setting what is said of them
   * @return the propellers that are worked out
   * @throws IllegalArgumentException when a power is given and the aeroplane has no propeller, or
   *     the speed of one is not known
   */
  public static Propulsion of(
      Aeroplane aeroplane, FlightCondition condition, PropellerSetting setting) {
    List<TurningPropeller> turning = new ArrayList<>();
    if (setting instanceof PowerSetting power) {
      if (aeroplane.propellers().isEmpty()) {
        throw new IllegalArgumentException(
            "a power is given; expected an aeroplane with propellers");
      }
      double share = power.power() / aeroplane.ratedPower();
      for (Propeller propeller : aeroplane.propellers()) {
        turning.add(
            power.speed().isPresent()
                ? TurningPropeller.of(
                    propeller, condition.trueAirspeed(), power.speed().getAsDouble(), share)
                : TurningPropeller.of(propeller, condition.trueAirspeed()));
      }
    }
    return new Propulsion(List.copyOf(turning), aeroplane.ratedPower(), setting);
  }

  /**
   * The propellers that are worked out.
   *
   * @return in the order of the aeroplane; none where only moments are given
   */
  public List<TurningPropeller> propellers() {
    return propellers;
  }

  /**
   * The rated power of all propellers together.
   *
   * @return W
   */
  public double ratedPower() {
    return ratedPower;
  }

  /**
   * The part of the rated power at which it is flown.
   *
   * @return 0 where only moments are given
   */
  public double share() {
    return setting instanceof PowerSetting power ? power.power() / ratedPower : 0;
  }

  /**
   * The moments at the setting it is flown with.
   *
   * @return steady moments
   */
  public PropellerMoments moments() {
    return moments(setting);
  }

  /**
   * The moments at another setting, the propellers being the same: one of fixed pitch turns slower
   * with less power.
   *
   * @param other moments, or a power, of which the speed is not looked at
   * @return steady moments
   */
  public PropellerMoments moments(PropellerSetting other) {
    if (other instanceof PropellerMoments given) {
      return given;
    }
    double share = ((PowerSetting) other).power() / ratedPower;
    double roll = 0;
    double yaw = 0;
    for (TurningPropeller propeller : propellers) {
      roll += propeller.rollMoment(share, 0);
      yaw += propeller.yawMoment(share);
    }
    return new PropellerMoments(roll, yaw);
  }
}
