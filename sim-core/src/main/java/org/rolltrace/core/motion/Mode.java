package org.rolltrace.core.motion;

/** One natural motion of the linearised equations. */
public sealed interface Mode permits Mode.Aperiodic, Mode.Oscillatory {

  /**
   * A motion that fades or grows without swinging: e^(λt).
   *
   * @param root λ, 1/s; negative when it fades
   */
  record Aperiodic(double root) implements Mode {

    /**
     * The time in which the motion fades to 1/e, or for a growing one grows by e, as a negative
     * time.
     *
     * @return −1/λ, s
     */
    public double timeConstant() {
      return -1 / root;
    }

    /**
     * The time in which the motion halves, or doubles when it grows.
     *
     * @return ln 2/|λ|, s
     */
    public double timeToHalfOrDouble() {
      return Math.log(2) / Math.abs(root);
    }
  }

  /**
   * A swinging motion: roots real ± i imaginary.
   *
   * @param real 1/s; negative when it fades
   * @param imaginary rad/s, above 0
   */
  record Oscillatory(double real, double imaginary) implements Mode {

    /**
     * The undamped natural frequency.
     *
     * @return ω_n = |λ|, rad/s
     */
    public double naturalFrequency() {
      return Math.hypot(real, imaginary);
    }

    /**
     * The damping ratio.
     *
     * @return ζ = −real/ω_n
     */
    public double dampingRatio() {
      return -real / naturalFrequency();
    }

    /**
     * The period of the damped swing.
     *
     * @return 2π/imaginary, s
     */
    public double period() {
      return 2 * Math.PI / imaginary;
    }
  }
}
