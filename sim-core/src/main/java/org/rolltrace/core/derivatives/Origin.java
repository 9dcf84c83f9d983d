package org.rolltrace.core.derivatives;

/** Where the value of a derivative comes from. */
public enum Origin {
  /** Given by the user. */
  GIVEN("given"),
  /** Not given: taken as 0. */
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
