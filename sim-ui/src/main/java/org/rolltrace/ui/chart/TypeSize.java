package org.rolltrace.ui.chart;

/** The three sizes of type. */
public enum TypeSize {
  /** Figures at axes, words at markers, small print. */
  SMALL(11),
  /** Names. */
  NORMAL(13),
  /** Titles. */
  LARGE(16);

  private final double pixels;

  TypeSize(double pixels) {
    this.pixels = pixels;
  }

  /**
   * The height of the type.
   *
   * @return px of the em
   */
  public double pixels() {
    return pixels;
  }
}
