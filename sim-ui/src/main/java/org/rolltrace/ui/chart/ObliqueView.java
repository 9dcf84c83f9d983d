package org.rolltrace.ui.chart;

/**
 * How points of the wing come onto the sheet. Time runs to the right and so does the aeroplane; its
 * right side is towards the reader, drawn to the left and down. Heights keep their true length, so
 * a wing at 90° of bank is upright and one at small bank leans as it does in the air.
 *
 * @param middle y of the path, px
 * @param halfSpan px
 */
record ObliqueView(double middle, double halfSpan) {
  /** What a length towards the reader takes to the left, and down. */
  private static final double ACROSS = 0.28;

  private static final double DOWN = 0.2;

  /** The view that fills a height, whatever the bank. */
  static ObliqueView filling(double height, double edge) {
    return new ObliqueView(0.5 * height, (0.5 * height - edge) / Math.hypot(1, DOWN));
  }

  /** The furthest that a tip stands beside its instant. */
  double reach() {
    return ACROSS * halfSpan;
  }

  /**
   * Where a point of the wing stands beside its instant.
   *
   * @param station half spans to the right
   */
  double aside(double station, double bank) {
    return -ACROSS * halfSpan * station * Math.cos(bank);
  }

  double y(double station, double bank) {
    return middle + halfSpan * station * (Math.sin(bank) + DOWN * Math.cos(bank));
  }

  /** Whether a side of the wing is towards the reader. */
  static boolean isNear(double side, double bank) {
    return side * Math.cos(bank) > 0;
  }
}
