package org.rolltrace.core.pilot;

/** What the pilot moves. */
public enum Control {
  /** The stick or wheel, sideways; right positive. */
  STICK("stick", "right", "left"),
  /** The pedals; right pedal forward positive. */
  PEDAL("pedal", "right", "left"),
  /** The levers of all engines together; more power positive. */
  POWER("power", "more", "less");

  private final String word;
  private final String above;
  private final String below;

  Control(String word, String above, String below) {
    this.word = word;
    this.above = above;
    this.below = below;
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
   * The way that a size goes, in a word.
   *
   * @param size fraction of travel, or of the rated power
   * @return such as {@code right}, or {@code more}; {@code left}, or {@code less}, below 0
   */
  public String way(double size) {
    return size < 0 ? below : above;
  }
}
