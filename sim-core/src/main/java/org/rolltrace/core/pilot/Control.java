package org.rolltrace.core.pilot;

/** What the pilot moves. */
public enum Control {
  /** The stick or wheel, sideways; right positive. */
  STICK("stick"),
  /** The pedals; right pedal forward positive. */
  PEDAL("pedal");

  private final String word;

  Control(String word) {
    this.word = word;
  }

  /**
   * The word in files and results.
   *
   * @return the word
   */
  public String word() {
    return word;
  }
}
