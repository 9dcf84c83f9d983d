package org.rolltrace.core.motion;

import java.util.Arrays;
import java.util.OptionalDouble;

/**
 * A state in which nothing changes, to trim in.
 *
 * @param kind which kind of state
 * @param bank φ, rad, inside ±½π; given in a turn, and in a sideslip without β
 * @param sideslip β, rad, inside ±½π; given in a sideslip without φ
 */
public record SteadyState(Kind kind, OptionalDouble bank, OptionalDouble sideslip) {

  /** Wings level, straight. */
  public static final SteadyState WINGS_LEVEL =
      new SteadyState(Kind.WINGS_LEVEL, OptionalDouble.empty(), OptionalDouble.empty());

  /** The kinds of steady state. */
  public enum Kind {
    /** φ = r = 0. */
    WINGS_LEVEL("wings-level"),
    /** r = 0, a wing down against the side force. */
    STRAIGHT_SIDESLIP("straight-sideslip"),
    /** A bank, no side force: the ball is centred, and r = (g/V) sin φ cos γ. */
    STEADY_TURN("steady-turn");

    private final String word;

    Kind(String word) {
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
     * Finds a kind by its word.
     *
     * @param word as in files
     * @return the kind
     * @throws IllegalArgumentException when there is none of that word
     */
    public static Kind ofWord(String word) {
      return Arrays.stream(values())
          .filter(kind -> kind.word.equals(word))
          .findFirst()
          .orElseThrow(
              () ->
                  new IllegalArgumentException(
                      "no steady state is called " + word + "; expected one of the kinds"));
    }
  }

  public SteadyState {
    checkInside("bank, rad,", bank);
    checkInside("sideslip, rad,", sideslip);
    boolean fits =
        switch (kind) {
          case WINGS_LEVEL -> bank.isEmpty() && sideslip.isEmpty();
          case STRAIGHT_SIDESLIP -> bank.isPresent() != sideslip.isPresent();
          case STEADY_TURN -> bank.isPresent() && sideslip.isEmpty();
        };
    if (!fits) {
      throw new IllegalArgumentException(
          switch (kind) {
            case WINGS_LEVEL -> "wings-level flight takes neither bank nor sideslip";
            case STRAIGHT_SIDESLIP -> "a straight sideslip takes either a sideslip or a bank";
            case STEADY_TURN -> "a steady turn takes a bank, and no sideslip";
          });
    }
  }

  private static void checkInside(String role, OptionalDouble angle) {
    if (angle.isPresent() && !(Math.abs(angle.getAsDouble()) < Math.PI / 2)) {
      throw new IllegalArgumentException(
          role + " is " + angle.getAsDouble() + "; expected a number inside ±π/2");
    }
  }

  /**
   * Straight flight with a sideslip that is given.
   *
   * @param sideslip β, rad, positive with the wind from the right
   * @return the state
   */
  public static SteadyState straightAtSideslip(double sideslip) {
    return new SteadyState(
        Kind.STRAIGHT_SIDESLIP, OptionalDouble.empty(), OptionalDouble.of(sideslip));
  }

  /**
   * Straight flight with a bank that is given.
   *
   * @param bank φ, rad
   * @return the state
   */
  public static SteadyState straightAtBank(double bank) {
    return new SteadyState(Kind.STRAIGHT_SIDESLIP, OptionalDouble.of(bank), OptionalDouble.empty());
  }

  /**
   * A turn with the ball centred.
   *
   * @param bank φ, rad, positive to the right
   * @return the state
   */
  public static SteadyState turn(double bank) {
    return new SteadyState(Kind.STEADY_TURN, OptionalDouble.of(bank), OptionalDouble.empty());
  }

  /**
   * The bank of the turn.
   *
   * @return φ, rad; 0 in straight flight, whatever its bank
   */
  public double bankOfTurn() {
    return kind == Kind.STEADY_TURN ? bank.getAsDouble() : 0;
  }
}
