package org.rolltrace.core.derivatives;

/** Where the value of a derivative comes from. */
public enum Origin {
  /** Given by the user. */
  GIVEN("given"),
  /** Estimated from the shape of the aeroplane. */
  ESTIMATED("estimated"),
  /** Given by the user where there is an estimate as well. */
  SET("set over an estimate"),
  /** Neither given nor estimated: taken as 0. */
  ABSENT("absent");

  private final String word;

  Origin(String word) {
    this.word = word;
  }

  /**
   * The word in results.
   *
   * @return the word
   */
  public String word() {
    return word;
  }
}
