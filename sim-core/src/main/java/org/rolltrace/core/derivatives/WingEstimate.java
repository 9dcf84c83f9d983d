package org.rolltrace.core.derivatives;

import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Wing;

/**
 * What one wing does in one condition: its loadings by one of the theories and the derivatives that
 * follow from them. Equations on the package page.
 */
public final class WingEstimate {
  private final Wing wing;
  private final Planform planform;
  private final SpanLoading byIncidence;
  private final SpanLoading byTwist;
  private final SpanLoading rolling;
  private final SpanLoading slipping;
  private final SpanLoading yawingByIncidence;
  private final SpanLoading yawingByTwist;
  private final Optional<SpanLoading> aileron;
  private final double rootIncidence;
  private final SpanLoading steady;

  private WingEstimate(
      Wing wing,
      Planform planform,
      WingTheory theory,
      Optional<AileronPlace> ailerons,
      double liftCoefficient) {
    this.wing = wing;
    this.planform = planform;
    double half = wing.halfSpan();
    DoubleUnaryOperator twist = y -> wing.twistAt(y) - wing.panelAt(y).section().zeroLift();
    this.byIncidence = theory.symmetric(y -> 1);
    this.byTwist = theory.symmetric(twist);
    this.rolling = theory.antisymmetric(y -> y / half);
    this.slipping = theory.antisymmetric(y -> wing.panelAt(y).dihedral());
    this.yawingByIncidence = theory.antisymmetric(y -> -y / half);
    this.yawingByTwist = theory.antisymmetric(y -> -y / half * twist.applyAsDouble(y));
    this.aileron =
        ailerons.map(
            place -> {
              double factor = FlapFactor.thin(place.chordShare());
              return theory.antisymmetric(y -> y > place.from() && y < place.to() ? -factor : 0);
            });
    this.rootIncidence = (liftCoefficient - byTwist.lift()) / byIncidence.lift();
    this.steady = byTwist.plus(rootIncidence, byIncidence);
  }

  /**
   * A wing in a condition.
   *
   * @param wing the wing
   * @param ailerons where its ailerons are; empty for none
   * @param theory which theory
   * @param mach of the flight, 0 or more and below 1
   * @param liftCoefficient C_L, by the wing area
   * @return its loadings
   */
  public static WingEstimate of(
      Wing wing,
      Optional<AileronPlace> ailerons,
      Theory theory,
      double mach,
      double liftCoefficient) {
    Planform planform =
        ailerons.isPresent()
            ? Planform.of(wing, ailerons.get().from(), ailerons.get().to())
            : Planform.of(wing);
    return new WingEstimate(
        wing,
        planform,
        theory == Theory.LIFTING_LINE
            ? LiftingLine.of(planform, mach)
            : LiftingSurface.of(planform, mach),
        ailerons,
        liftCoefficient);
  }

  /** Which theory gives the loadings. */
  public enum Theory {
    /** The lifting surface of one row, nearer to the published values; the default. */
    LIFTING_SURFACE("lifting-surface"),
    /** The lifting line. */
    LIFTING_LINE("lifting-line");

    private final String word;

    Theory(String word) {
      this.word = word;
    }

    /**
     * The word in files.
     *
     * @return the word
     */
    public String word() {
      return word;
    }
  }

  /**
   * The lift slope.
   *
   * @return CL_α, 1/rad
   */
  public double liftSlope() {
    return byIncidence.lift();
  }

  /**
   * How the root stands to the air in this condition.
   *
   * @return incidence of the root chord, rad
   */
  public double rootIncidence() {
    return rootIncidence;
  }

  /**
   * How the body stands to the air in this condition.
   *
   * @return angle of attack of the x axis of the body, rad
   */
  public double angleOfAttack() {
    return rootIncidence - wing.incidence();
  }

  /**
   * The loading in steady flight.
   *
   * @return of the C_L of the condition
   */
  public SpanLoading steady() {
    return steady;
  }

  /**
   * The loading by rolling.
   *
   * @return per unit of pb/2V
   */
  public SpanLoading rolling() {
    return rolling;
  }

  /**
   * The loading by sideslip on the dihedral.
   *
   * @return per rad
   */
  public SpanLoading slipping() {
    return slipping;
  }

  /**
   * The loading by the ailerons at small angles, by thin-aerofoil theory.
   *
   * @return per rad of δa; empty without ailerons
   */
  public Optional<SpanLoading> aileron() {
    return aileron;
  }

  /**
   * The loading by yawing, without what the uneven speed makes of the steady circulation.
   *
   * @return per unit of rb/2V
   */
  public SpanLoading yawing() {
    return yawingByTwist.plus(rootIncidence, yawingByIncidence);
  }

  double rollDamping() {
    return rolling.rollingMoment();
  }

  double dihedralEffect() {
    return slipping.rollingMoment();
  }

  /** Of the circulation that yawing changes, and of the speed that changes under the steady one. */
  double rollWithYaw() {
    return yawing().rollingMoment()
        + wing.aspectRatio() * Math.PI / 8 * (steady.coefficient(1) + steady.coefficient(3));
  }

  /** The lift tilts forward where the wing goes down. */
  double yawWithRoll() {
    double tilt = Math.PI / 8 * (steady.coefficient(1) + steady.coefficient(3));
    return yaw(rolling, tilt);
  }

  double yawWithSlip() {
    GaussRule rule = GaussRule.over(thetas(), 0.1);
    double tilt = 0;
    for (int i = 0; i < rule.size(); i++) {
      double theta = rule.point(i);
      double dihedral = wing.panelAt(wing.halfSpan() * Math.cos(theta)).dihedral();
      tilt +=
          2
              * rule.weight(i)
              * steady.circulation(theta)
              * dihedral
              * Math.sin(theta)
              * Math.cos(theta);
    }
    return yaw(slipping, tilt);
  }

  private double[] thetas() {
    double[] stations = wing.stations();
    double[] thetas = new double[stations.length];
    for (int i = 0; i < stations.length; i++) {
      thetas[i] = planform.theta(stations[i]);
    }
    return thetas;
  }

  double yawWithAileron(SpanLoading loading) {
    return yaw(loading, 0);
  }

  double inducedYawDamping() {
    // Where the wing is faster its steady circulation does not change with it but for the change
    // that yawing() has; the trailing vortices act on both.
    return yaw(yawing(), 0);
  }

  /** −A ∫ [Γ0 (u − w1) − Γ1 w0] cos θ dθ, with ∫ Γ0 u cos θ sin θ … as the tilt. */
  private double yaw(SpanLoading change, double tilt) {
    return -wing.aspectRatio()
        * (tilt - steady.yawByDownwashOf(change) - change.yawByDownwashOf(steady));
  }

  /** −4 c_d ∫ c y² dy / (S b²), both sides. */
  double profileYawDamping() {
    GaussRule rule = GaussRule.over(wing.stations(), wing.span());
    double sum = 0;
    for (int i = 0; i < rule.size(); i++) {
      double y = rule.point(i);
      sum += 2 * rule.weight(i) * wing.panelAt(y).section().profileDrag() * wing.chordAt(y) * y * y;
    }
    return -4 * sum / (wing.area() * wing.span() * wing.span());
  }
}
