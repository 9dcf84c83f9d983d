package org.rolltrace.core.derivatives;

import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.Wing;

/**
 * What a wing loses in roll when some of its sections stall.
 *
 * <p>The loadings of the linear theory give each strip its lift coefficient. Up to the largest one
 * of its section, a (α_stall − α₀), nothing is lost. Beyond it the strip lifts less the further it
 * goes: the lift falls half as fast as it rose, down to six tenths of the largest and no further (a
 * plain stalled section; from memory, common practice). The downward side of the curve is that of
 * the upward one. Loss on the right rolls right:
 *
 * <pre>
 * ΔCl = Σ (c_l − c_l,stalled) c y dy / (S b)
 * </pre>
 *
 * <p>A rolling wing meets the air at a larger incidence on the side that goes down. When that side
 * stalls it loses lift by going down: the damping weakens, and where more is lost than the rest of
 * the wing damps, the wing goes on by itself.
 */
public final class StallingWing {
  private static final int STRIPS = 60;
  private static final double LEAST = 0.6;

  private final double[] arms;
  private final double[] largest;
  private final double[] fall;
  private final double[] steady;
  private final double[] rolling;
  private final double[] yawing;
  private final double[] slipping;
  private final double[] aileron;

  private StallingWing(Wing wing, WingEstimate estimate, double effectiveness) {
    arms = new double[2 * STRIPS];
    largest = new double[2 * STRIPS];
    fall = new double[2 * STRIPS];
    steady = new double[2 * STRIPS];
    rolling = new double[2 * STRIPS];
    yawing = new double[2 * STRIPS];
    slipping = new double[2 * STRIPS];
    aileron = new double[2 * STRIPS];
    double meanChord = wing.area() / wing.span();
    SpanLoading byYawing = estimate.yawing();
    for (int i = 0; i < 2 * STRIPS; i++) {
      double from = Math.cos(Math.PI * (i + 1) / (2 * STRIPS));
      double to = Math.cos(Math.PI * i / (2 * STRIPS));
      double eta = Math.cos(Math.PI * (i + 0.5) / (2 * STRIPS));
      double y = Math.abs(eta) * wing.halfSpan();
      double chord = wing.chordAt(y);
      double width = (to - from) * wing.halfSpan();
      arms[i] = chord * eta * wing.halfSpan() * width / (wing.area() * wing.span());
      Section section = wing.panelAt(y).section();
      largest[i] =
          section.stall().isPresent()
              ? section.liftSlope() * (section.stall().getAsDouble() - section.zeroLift())
              : Double.POSITIVE_INFINITY;
      fall[i] = section.stallFall();
      double toSection = meanChord / chord;
      steady[i] = estimate.steady().load(eta) * toSection;
      rolling[i] = estimate.rolling().load(eta) * toSection;
      yawing[i] = byYawing.load(eta) * toSection;
      slipping[i] = estimate.slipping().load(eta) * toSection;
      aileron[i] =
          estimate.aileron().map(loading -> loading.load(eta)).orElse(0.0)
              * effectiveness
              * toSection;
    }
  }

  /**
   * A wing whose sections stall.
   *
   * @param wing the wing, at least one section of it with a known stall
   * @param estimate its loadings in the condition
   * @param effectiveness what of the thin-aerofoil lift of the ailerons is left, 0 to 1
   * @return the wing
   */
  public static StallingWing of(Wing wing, WingEstimate estimate, double effectiveness) {
    return new StallingWing(wing, estimate, effectiveness);
  }

  /**
   * Whether any section of a wing has a known stall.
   *
   * @param wing the wing
   * @return false when there is nothing to be lost
   */
  public static boolean isKnownFor(Wing wing) {
    return wing.panels().stream().anyMatch(panel -> panel.section().stall().isPresent());
  }

  /**
   * What is lost, as a rolling moment.
   *
   * @param rollRate pb/2V
   * @param yawRate rb/2V
   * @param sideslip β, rad
   * @param angle δa, rad
   * @return ΔCl; 0 while no section is beyond its stall
   */
  public double lost(double rollRate, double yawRate, double sideslip, double angle) {
    double sum = 0;
    for (int i = 0; i < arms.length; i++) {
      double lift =
          steady[i]
              + rolling[i] * rollRate
              + yawing[i] * yawRate
              + slipping[i] * sideslip
              + aileron[i] * angle;
      double beyond = Math.abs(lift) - largest[i];
      if (beyond > 0) {
        double stalled = Math.max(LEAST * largest[i], largest[i] - fall[i] * beyond);
        sum += (lift - Math.copySign(stalled, lift)) * arms[i];
      }
    }
    return sum;
  }

  /**
   * Whether any strip is beyond its stall.
   *
   * @param rollRate pb/2V
   * @param yawRate rb/2V
   * @param sideslip β, rad
   * @param angle δa, rad
   * @return true when something is lost
   */
  public boolean isStalled(double rollRate, double yawRate, double sideslip, double angle) {
    return lost(rollRate, yawRate, sideslip, angle) != 0;
  }
}
