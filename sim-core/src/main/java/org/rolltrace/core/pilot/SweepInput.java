package org.rolltrace.core.pilot;

import java.util.Arrays;
import java.util.Optional;
import org.rolltrace.core.quantity.Check;

/**
 * A sine whose frequency goes from one value to another: size · sin θ, θ̇ = ω, θ = 0 at the start.
 * With τ = t − start, D the duration, ω₀ and ω₁ the two frequencies:
 *
 * <ul>
 *   <li>linear: ω = ω₀ + (ω₁ − ω₀) τ/D, θ = ω₀ τ + (ω₁ − ω₀) τ²/(2D)
 *   <li>logarithmic: ω = ω₀ (ω₁/ω₀)^(τ/D), θ = (ω − ω₀) D/ln(ω₁/ω₀), as many cycles in each octave
 *       as its frequencies are low
 * </ul>
 *
 * <p>After the duration the sine goes on at ω₁ to its next passage through zero, at most half a
 * cycle later, and stays there: the hand never jumps.
 *
 * @param start when the hand begins to move, s, 0 or more
 * @param size how far it goes to each side, fraction of travel, −1 to 1; positive goes right first
 * @param from the frequency at the start, rad/s, above 0 and up to {@value #HIGHEST}
 * @param to the frequency at the end, rad/s, above 0 and up to {@value #HIGHEST}; it may be the
 *     lower
 * @param duration from one to the other, s, above 0
 * @param law how the frequency goes
 */
public record SweepInput(
    double start, double size, double from, double to, double duration, Law law)
    implements InputShape {

  /** The highest frequency, rad/s: 20 Hz, beyond any hand and most actuators. */
  public static final double HIGHEST = 2 * Math.PI * 20;

  /** A sine this close to a passage through zero is in it, rad: rounding. */
  private static final double PASSAGE = 1e-7;

  /** How the frequency goes from one value to the other. */
  public enum Law {
    /** As much in each second. */
    LINEAR("linear"),
    /** By the same factor in each second. */
    LOGARITHMIC("logarithmic");

    private final String word;

    Law(String word) {
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
     * Finds a law by its word.
     *
     * @param word as in files
     * @return the law, or empty when there is none of that word
     */
    public static Optional<Law> ofWord(String word) {
      return Arrays.stream(values()).filter(law -> law.word.equals(word)).findFirst();
    }
  }

  public SweepInput {
    ShapeCheck.common(start, size, 0);
    Check.positive("duration, s,", duration);
    checkFrequency("first frequency, rad/s,", from);
    checkFrequency("last frequency, rad/s,", to);
  }

  private static void checkFrequency(String role, double frequency) {
    if (!(frequency > 0 && frequency <= HIGHEST)) {
      throw new IllegalArgumentException(
          role + " is " + frequency + "; expected above 0 and at most " + HIGHEST);
    }
  }

  @Override
  public String name() {
    return "sweep";
  }

  /** 0: the sine is the movement. */
  @Override
  public double handTime() {
    return 0;
  }

  /**
   * The frequency at an instant.
   *
   * @param time s
   * @return rad/s; that of the start before it, that of the end after it
   */
  public double frequencyAt(double time) {
    double share = Math.max(0, Math.min(1, (time - start) / duration));
    return switch (law) {
      case LINEAR -> from + (to - from) * share;
      case LOGARITHMIC -> from * Math.exp(share * Math.log(to / from));
    };
  }

  /** θ at an instant between the start and the end. */
  private double phaseAt(double time) {
    double tau = Math.min(time - start, duration);
    double after = Math.max(0, time - start - duration);
    return switch (law) {
          case LINEAR -> (from + 0.5 * (to - from) * tau / duration) * tau;
          case LOGARITHMIC -> logarithmicPhase(tau);
        }
        + to * after;
  }

  private double logarithmicPhase(double tau) {
    double growth = Math.log(to / from) * tau / duration;
    // (e^g − 1)/g is 1 where the two frequencies are the same
    return from * tau * (growth == 0 ? 1 : Math.expm1(growth) / growth);
  }

  @Override
  public double end() {
    double phase = phaseAt(start + duration);
    double halfCycles = Math.ceil((phase - PASSAGE) / Math.PI);
    return start + duration + Math.max(0, halfCycles * Math.PI - phase) / to;
  }

  @Override
  public boolean isHeld() {
    return false;
  }

  @Override
  public Movement movement() {
    return new Sine(end());
  }

  private final class Sine implements Movement {
    private final double end;

    Sine(double end) {
      this.end = end;
    }

    private boolean isOver(double time) {
      return !(time >= start && time < end);
    }

    @Override
    public double positionAt(double time) {
      return isOver(time) ? 0 : size * Math.sin(phaseAt(time));
    }

    @Override
    public double rateAt(double time) {
      return isOver(time) ? 0 : size * frequencyAt(time) * Math.cos(phaseAt(time));
    }

    @Override
    public Stroke from(double time) {
      return this;
    }

    @Override
    public double[] breakpoints() {
      double run = start + duration;
      return run < end ? new double[] {start, run, end} : new double[] {start, end};
    }

    @Override
    public double largestPosition() {
      return Math.abs(size);
    }
  }
}
