package org.rolltrace.core.derivatives;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * How the loads of a wing lie along its span, each as c_l c / (S/b): the lift per unit of span by
 * q̄ and the mean chord, for one unit of its cause. With η = 2y/b
 *
 * <pre>
 * CL = ½ ∫ c_l c / (S/b) dη,   Cl = −¼ ∫ c_l c / (S/b) η dη,   η from −1 to 1
 * </pre>
 *
 * <p>gives the lift coefficient from the steady load, and from the others the part of the wing in
 * Cl_p, Cl_r, of the dihedral in Cl_beta, and Cl_da.
 */
public final class SpanLoads {
  private final WingEstimate wing;
  private final double swept;
  private final Optional<SpanLoading> aileron;

  SpanLoads(WingEstimate wing, double swept, Optional<SpanLoading> aileron) {
    this.wing = wing;
    this.swept = swept;
    this.aileron = aileron;
  }

  /** What makes a load. */
  public enum Cause {
    /** Steady flight at the lift coefficient of the condition. */
    STEADY("steady", "-"),
    /** Rolling right. */
    ROLLING("rolling", "per pb/2V"),
    /** Yawing right: by the circulation and the speed that it changes. */
    YAWING("yawing", "per rb/2V"),
    /** Sideslip on the dihedral, wind from the right. */
    SIDESLIP("sideslip", "1/rad"),
    /** Ailerons that roll right. */
    AILERON("aileron", "1/rad");

    private final String word;
    private final String unit;

    Cause(String word, String unit) {
      this.word = word;
      this.unit = unit;
    }

    /**
     * The word in files.
     *
     * @return the word
     */
    public String word() {
      return word;
    }

    /**
     * The unit of its load.
     *
     * @return such as "per pb/2V"; "-" for none
     */
    public String unit() {
      return unit;
    }
  }

  /**
   * The causes whose loads are known.
   *
   * @return all, or all but the ailerons when their place or travel is not known
   */
  public List<Cause> causes() {
    return Arrays.stream(Cause.values())
        .filter(cause -> cause != Cause.AILERON || aileron.isPresent())
        .toList();
  }

  /**
   * The load at a station.
   *
   * @param cause one of {@link #causes()}
   * @param eta 2y/b, from −1 at the left tip to 1 at the right one
   * @return c_l c / (S/b); 0 at the tips and beyond
   * @throws IllegalArgumentException when the load of the ailerons is not known
   */
  public double at(Cause cause, double eta) {
    if (!(Math.abs(eta) < 1)) {
      return 0;
    }
    return switch (cause) {
      case STEADY -> wing.steady().load(eta);
      case ROLLING -> swept * wing.rolling().load(eta);
      // The left wing goes faster: its steady lift grows by the part −η r̂.
      case YAWING -> wing.yawing().load(eta) - eta * wing.steady().load(eta);
      case SIDESLIP -> swept * wing.slipping().load(eta);
      case AILERON ->
          aileron
              .orElseThrow(
                  () ->
                      new IllegalArgumentException(
                          "the load of the ailerons is not known; give their place and travel"))
              .load(eta);
    };
  }
}
