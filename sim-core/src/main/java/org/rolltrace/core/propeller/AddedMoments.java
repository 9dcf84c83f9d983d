package org.rolltrace.core.propeller;

/**
 * Moments on the airframe at an instant, beside those that stay. Mutable, so that a computation
 * needs one of them and not one for each step.
 */
public final class AddedMoments {
  private double roll;
  private double yaw;

  /** No moment yet. */
  public AddedMoments() {}

  /**
   * Sets both.
   *
   * @param rollMoment N m, positive right wing down
   * @param yawMoment N m, positive nose right
   */
  public void set(double rollMoment, double yawMoment) {
    roll = rollMoment;
    yaw = yawMoment;
  }

  /**
   * The moment in roll.
   *
   * @return N m, positive right wing down
   */
  public double roll() {
    return roll;
  }

  /**
   * The moment in yaw.
   *
   * @return N m, positive nose right
   */
  public double yaw() {
    return yaw;
  }
}
