package org.rolltrace.core.pilot;

/** A position against time, for a stretch of time in which it is smooth. */
public interface Stroke {

  /**
   * The position at an instant.
   *
   * @param time s
   * @return fraction of travel, to be added to the trimmed position
   */
  double positionAt(double time);

  /**
   * The rate of the position at an instant.
   *
   * @param time s
   * @return fraction of travel per second
   */
  double rateAt(double time);
}
