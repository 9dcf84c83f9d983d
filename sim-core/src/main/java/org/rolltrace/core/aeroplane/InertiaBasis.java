package org.rolltrace.core.aeroplane;

/** Where the moments of inertia come from. */
public enum InertiaBasis {
  /** Given by the user. */
  GIVEN("given"),
  /** Summed over masses at stations. */
  MASSES("from masses"),
  /** By radii of gyration that aeroplanes of the kind usually have: the roughest of the three. */
  RADII_OF_GYRATION("estimated by radii of gyration");

  private final String words;

  InertiaBasis(String words) {
    this.words = words;
  }

  /**
   * The words in results.
   *
   * @return the words
   */
  public String words() {
    return words;
  }
}
