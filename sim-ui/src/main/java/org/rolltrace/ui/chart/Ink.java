package org.rolltrace.ui.chart;

/** What a colour is for. */
public enum Ink {
  /** The ground of the sheet. */
  GROUND,
  /** A surface raised from the ground. */
  PANEL,
  /** Text that is read first. */
  TEXT,
  /** Text that is read second. */
  QUIET,
  /** The grid behind curves. */
  GRID,
  /** Zero lines and axes. */
  AXIS,
  /** The right side: rolls to the right, the right wing tip. */
  RIGHT,
  /** The left side: rolls to the left, the left wing tip. */
  LEFT,
  /** The second variant. */
  SECOND,
  /** The third variant. */
  THIRD,
  /** The fourth variant. */
  FOURTH,
  /** The fifth variant. */
  FIFTH,
  /** The instant under the cursor. */
  CURSOR,
  /** Events on the time axis. */
  MARKER,
  /** The wing and the aeroplane. */
  WING,
  /** Limits. */
  LIMIT
}
