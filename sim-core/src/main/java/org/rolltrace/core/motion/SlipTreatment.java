package org.rolltrace.core.motion;

import java.util.Arrays;
import java.util.Optional;

/** What is assumed of the sideslip. */
public enum SlipTreatment {
  /** The pilot holds the ball centred: no sideslip, one degree of freedom. */
  HELD("held"),
  /** Sideslip and yaw rate follow bank, roll rate and controls at once. */
  SETTLED("settled"),
  /** Sideslip and yaw rate are states of their own. */
  FREE("free");

  private final String word;

  SlipTreatment(String word) {
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

  /**
   * Finds a treatment by its word.
   *
   * @param word as in files
   * @return the treatment, or empty when there is none of that word
   */
  public static Optional<SlipTreatment> ofWord(String word) {
    return Arrays.stream(values()).filter(t -> t.word.equals(word)).findFirst();
  }
}
