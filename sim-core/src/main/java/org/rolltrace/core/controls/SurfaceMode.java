package org.rolltrace.core.controls;

import org.rolltrace.core.aeroplane.SurfaceDynamics;

/**
 * How a surface that has a rate limit or a lag is moving. The mode holds until {@link #switching}
 * passes through zero, or until the demand has a breakpoint.
 */
public enum SurfaceMode {
  /** At the demand, moving with it. */
  FOLLOWING,
  /** Behind the demand by the first-order lag. */
  LAGGING,
  /** Moving at the largest rate towards larger angles. */
  SLEWING_UP,
  /** Moving at the largest rate towards smaller angles. */
  SLEWING_DOWN;

  /**
   * A gap between demand and surface below this counts as none, rad: what finding an end leaves.
   */
  private static final double CLOSED = 1e-9;

  /**
   * The mode in which a surface goes on.
   *
   * @param dynamics of the surface
   * @param demand the angle asked for, rad
   * @param demandRate its rate, rad/s
   * @param angle where the surface is, rad
   * @return the mode
   */
  public static SurfaceMode of(
      SurfaceDynamics dynamics, double demand, double demandRate, double angle) {
    double gap = demand - angle;
    if (dynamics.lag() > 0) {
      double excess = Math.abs(gap) - slewGap(dynamics);
      boolean slews =
          Math.abs(excess) > CLOSED
              ? excess > 0
              : Math.signum(gap) * demandRate > dynamics.rateLimit();
      if (!slews) {
        return LAGGING;
      }
      return gap > 0 ? SLEWING_UP : SLEWING_DOWN;
    }
    if (Math.abs(gap) > CLOSED) {
      return gap > 0 ? SLEWING_UP : SLEWING_DOWN;
    }
    if (Math.abs(demandRate) <= dynamics.rateLimit()) {
      return FOLLOWING;
    }
    return demandRate > 0 ? SLEWING_UP : SLEWING_DOWN;
  }

  /**
   * The rate of the surface.
   *
   * @param dynamics of the surface
   * @param demand the angle asked for, rad
   * @param demandRate its rate, rad/s
   * @param angle where the surface is, rad
   * @return rad/s
   */
  public double rate(SurfaceDynamics dynamics, double demand, double demandRate, double angle) {
    return switch (this) {
      case FOLLOWING -> demandRate;
      case LAGGING -> (demand - angle) / dynamics.lag();
      case SLEWING_UP -> dynamics.rateLimit();
      case SLEWING_DOWN -> -dynamics.rateLimit();
    };
  }

  /**
   * A function that passes through zero where the mode ends.
   *
   * @param dynamics of the surface
   * @param demand the angle asked for, rad
   * @param demandRate its rate, rad/s
   * @param angle where the surface is, rad
   * @return above 0 while the surface is slewing, below 0 otherwise; rad, or rad/s when following
   */
  public double switching(
      SurfaceDynamics dynamics, double demand, double demandRate, double angle) {
    double gap = demand - angle;
    return switch (this) {
      case FOLLOWING -> Math.abs(demandRate) - dynamics.rateLimit();
      case LAGGING -> Math.abs(gap) - slewGap(dynamics);
      case SLEWING_UP -> gap - slewGap(dynamics);
      case SLEWING_DOWN -> -gap - slewGap(dynamics);
    };
  }

  /**
   * The mode that follows when {@link #switching} has passed through zero.
   *
   * @param dynamics of the surface
   * @param demand the angle asked for, rad
   * @param demandRate its rate, rad/s
   * @param angle where the surface is, rad
   * @return the next mode
   */
  public SurfaceMode next(
      SurfaceDynamics dynamics, double demand, double demandRate, double angle) {
    return switch (this) {
      case FOLLOWING -> demandRate > 0 ? SLEWING_UP : SLEWING_DOWN;
      case LAGGING -> demand > angle ? SLEWING_UP : SLEWING_DOWN;
      case SLEWING_UP, SLEWING_DOWN ->
          // A demand that comes past faster than the surface can turn is slewed after at once.
          dynamics.lag() > 0 ? LAGGING : of(dynamics, demand, demandRate, angle);
    };
  }

  /** The gap at which lagging and slewing are equally fast, rad. */
  private static double slewGap(SurfaceDynamics dynamics) {
    return dynamics.lag() == 0 ? 0 : dynamics.rateLimit() * dynamics.lag();
  }
}
