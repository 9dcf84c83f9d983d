package org.rolltrace.core.aeroplane;

import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * A wing section.
 *
 * @param liftSlope a0, 1/rad, in incompressible flow; above 0, at most 8
 * @param zeroLift incidence of the chord at which it does not lift, rad; negative for a cambered
 *     section
 * @param stall incidence of the chord at which its lift is largest, rad; empty when not known
 * @param stallFall how fast its lift falls beyond the stall, by how fast it rose before, 0 or more;
 *     small for thick sections that stall gently, above 1 for those that stall at once
 * @param profileDrag drag coefficient at small lift, 0 or more
 */
public record Section(
    double liftSlope, double zeroLift, OptionalDouble stall, double stallFall, double profileDrag) {

  /** The slope of a thin section, 1/rad (thin-aerofoil theory). */
  public static final double THIN = 2 * Math.PI;

  /** What is taken for the profile drag when it is not given: a plain light aeroplane's. */
  public static final double USUAL_DRAG = 0.010;

  /**
   * What is taken for the fall when it is not given: a section that stalls at once, as it is wise
   * to expect. The trailing vortices of the unstalled wing, which ease what a strip meets, stay in
   * the loadings; the fall stands for what they no longer do as well.
   */
  public static final double USUAL_FALL = 3;

  private static final double STEEPEST = 8;

  public Section {
    Check.positive("lift slope of the section, 1/rad,", liftSlope);
    Check.inRange("lift slope of the section, 1/rad,", liftSlope, 0, STEEPEST);
    Check.inRange("zero-lift incidence, rad,", zeroLift, -0.3, 0.3);
    Check.notNegative("fall of the lift beyond the stall", stallFall);
    Check.notNegative("profile drag coefficient", profileDrag);
    if (stall.isPresent() && !(stall.getAsDouble() > zeroLift)) {
      throw new IllegalArgumentException(
          "stalling incidence is "
              + stall.getAsDouble()
              + " rad; expected one above the zero-lift incidence, "
              + zeroLift
              + " rad");
    }
  }

  /**
   * A thin uncambered section of unknown stall.
   *
   * @return a0 = 2π
   */
  public static Section thin() {
    return new Section(THIN, 0, OptionalDouble.empty(), USUAL_FALL, USUAL_DRAG);
  }
}
