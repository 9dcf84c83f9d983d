package org.rolltrace.core.history;

/** A quantity recorded against time. Positive to the right throughout. */
public enum Channel {
  /** Bank φ, right wing down, never wrapped. */
  BANK("bank", "rad", 0),
  /** Roll rate p. */
  ROLL_RATE("rollRate", "rad/s", 1),
  /** Yaw rate r. */
  YAW_RATE("yawRate", "rad/s", 2),
  /** Sideslip β, wind from the right. */
  SIDESLIP("sideslip", "rad", 3),
  /** Stick position, fraction of travel. */
  STICK("stick", "-", 4),
  /** Pedal position, fraction of travel. */
  PEDAL("pedal", "-", 5),
  /** Aileron angle δa. */
  AILERON("aileron", "rad", 6),
  /** Rudder angle δr, trailing edge left. */
  RUDDER("rudder", "rad", 7),
  /** Roll acceleration ṗ. */
  ROLL_ACCELERATION("rollAcceleration", "rad/s2", 8),
  /** Power that the propellers get, part of the rated power; 0 where it is not given. */
  POWER("power", "-", 9),
  /** Rolling moment of the propellers on the airframe, right wing down. */
  PROPELLER_ROLL_MOMENT("propellerRollMoment", "N m", 10),
  /** Yawing moment of the propellers on the airframe, nose right. */
  PROPELLER_YAW_MOMENT("propellerYawMoment", "N m", 11);

  /** The number of channels. */
  public static final int COUNT = values().length;

  private final String label;
  private final String unit;
  private final int column;

  Channel(String label, String unit, int column) {
    this.label = label;
    this.unit = unit;
    this.column = column;
  }

  /**
   * Where the channel stands in a row of samples.
   *
   * @return from 0 to {@link #COUNT} − 1
   */
  public int column() {
    return column;
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
   * @return the unit; {@code -} for a fraction of travel or of the rated power
   */
  public String unit() {
    return unit;
  }
}
