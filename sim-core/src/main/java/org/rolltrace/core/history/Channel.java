package org.rolltrace.core.history;

/** A quantity recorded against time. Positive to the right throughout. */
public enum Channel {
  /** Bank φ, right wing down, never wrapped. */
  BANK("bank", "rad"),
  /** Roll rate p. */
  ROLL_RATE("rollRate", "rad/s"),
  /** Yaw rate r. */
  YAW_RATE("yawRate", "rad/s"),
  /** Sideslip β, wind from the right. */
  SIDESLIP("sideslip", "rad"),
  /** Stick position, fraction of travel. */
  STICK("stick", "-"),
  /** Pedal position, fraction of travel. */
  PEDAL("pedal", "-"),
  /** Aileron angle δa. */
  AILERON("aileron", "rad"),
  /** Rudder angle δr, trailing edge left. */
  RUDDER("rudder", "rad"),
  /** Roll acceleration ṗ. */
  ROLL_ACCELERATION("rollAcceleration", "rad/s2");

  private final String label;
  private final String unit;

  Channel(String label, String unit) {
    this.label = label;
    this.unit = unit;
  }

  /**
   * The name in files.
   *
   * @return the name, such as {@code rollRate}
   */
  public String label() {
    return label;
  }

  /**
   * The SI unit of the samples.
   *
   * @return the unit; {@code -} for a fraction of travel
   */
  public String unit() {
    return unit;
  }
}
