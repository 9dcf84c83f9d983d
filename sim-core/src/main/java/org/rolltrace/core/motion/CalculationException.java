package org.rolltrace.core.motion;

/** A calculation that has no answer for the values it was given; the message says why. */
public final class CalculationException extends RuntimeException {
  private static final long serialVersionUID = 1;

  /**
   * A failed calculation.
   *
   * @param message what was asked, why there is no answer, and the way out
   */
  public CalculationException(String message) {
    super(message);
  }

  /**
   * A failed calculation with the error beneath it.
   *
   * @param message what was asked, why there is no answer, and the way out
   * @param cause the error beneath
   */
  public CalculationException(String message, Throwable cause) {
    super(message, cause);
  }
}
