package org.rolltrace.ui.chart;

/** How a line is broken. */
public enum Dash {
  /** Unbroken. */
  SOLID,
  /** Long dashes. */
  DASHED,
  /** Dots. */
  DOTTED,
  /** Dashes and dots in turn. */
  DASH_DOT;

  /**
   * The lengths of marks and gaps in turn.
   *
   * @return px; empty for an unbroken line
   */
  public double[] lengths() {
    return switch (this) {
      case SOLID -> new double[0];
      case DASHED -> new double[] {7, 4};
      case DOTTED -> new double[] {1.5, 3.5};
      case DASH_DOT -> new double[] {10, 3.5, 2, 3.5};
    };
  }
}
