package org.rolltrace.core.aeroplane;

/** The way in which a propeller, or the engine that drives it, turns. */
public enum Rotation {
  /** Clockwise seen from behind. */
  CLOCKWISE("clockwise", 1),
  /** Anticlockwise seen from behind. */
  ANTICLOCKWISE("anticlockwise", -1),
  /** Two halves on one shaft that turn against each other and share the torque. */
  CONTRA_ROTATING("contra-rotating", 0);

  private final String word;
  private final int sense;

  Rotation(String word, int sense) {
    this.word = word;
    this.sense = sense;
  }

  /**
   * The word in files and results.
   *
   * @return the word
   */
  public String word() {
    return word;
  }

  /**
   * The sign of its angular momentum along x, forwards.
   *
   * @return s: 1 clockwise seen from behind, −1 anticlockwise, 0 for two halves that cancel
   */
  public int sense() {
    return sense;
  }
}
