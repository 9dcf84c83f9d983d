package org.rolltrace.core.derivatives;

import java.util.ArrayList;
import java.util.Collection;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;

/** The derivatives that follow from the shape of an aeroplane, in one condition. */
public final class GeometryEstimate {
  /** Prandtl and Glauert's rule holds below the Mach number at which some flow is sonic. */
  public static final double LARGEST_MACH = 0.7;

  /** What a body does for the fin on it, by the fin's own aspect ratio. */
  private static final double END_PLATE = 1.55;

  private static final double FILLED = 0.6;
  private static final double WIDEST_SWEEP = Math.toRadians(60);

  private final Geometry geometry;
  private final Theory theory;
  private final double mach;
  private final WingEstimate wing;
  private final double aileronEffectiveness;
  private final double swept;
  private Optional<SpanLoading> aileronLoading = Optional.empty();
  private final Map<Coefficient, List<Estimate.Term>> terms = new EnumMap<>(Coefficient.class);

  private record Theory(WingEstimate.Theory kind, EstimateMethod method) {}

  private GeometryEstimate(
      Geometry geometry,
      Optional<Ailerons> ailerons,
      Optional<Rudder> rudder,
      WingEstimate.Theory theory,
      double mach,
      double liftCoefficient) {
    this.geometry = geometry;
    this.theory =
        new Theory(
            theory,
            theory == WingEstimate.Theory.LIFTING_LINE
                ? EstimateMethod.LIFTING_LINE
                : EstimateMethod.LIFTING_SURFACE);
    this.mach = mach;
    this.wing =
        WingEstimate.of(geometry.wing(), geometry.ailerons(), theory, mach, liftCoefficient);
    this.aileronEffectiveness =
        ailerons.map(travel -> FlapFactor.left(0.25 * (travel.up() + travel.down()))).orElse(1.0);
    // The lifting surface has the sweep already.
    this.swept =
        theory == WingEstimate.Theory.LIFTING_LINE
            ? sweepFactor(geometry.wing().aspectRatio(), geometry.wing().meanSweep())
            : 1;
    addWing(liftCoefficient);
    wing.aileron().ifPresent(thin -> ailerons.ifPresent(travel -> addAilerons(thin, travel)));
    geometry.body().ifPresent(this::addBody);
    geometry.fin().ifPresent(fin -> addFin(fin, rudder));
    geometry.tailplane().ifPresent(this::addTailplane);
  }

  /**
   * Estimates all that the shape allows.
   *
   * @param geometry the shape
   * @param ailerons their travel; without it there is no aileron derivative
   * @param rudder its travel; without it there is no rudder derivative
   * @param theory the theory of the wing
   * @param mach of the flight, 0 or more and below 1; beyond {@value #LARGEST_MACH} the estimates
   *     are marked as extrapolated
   * @param liftCoefficient C_L of the flight, by the wing area
   * @return the estimates
   */
  public static GeometryEstimate of(
      Geometry geometry,
      Optional<Ailerons> ailerons,
      Optional<Rudder> rudder,
      WingEstimate.Theory theory,
      double mach,
      double liftCoefficient) {
    return new GeometryEstimate(geometry, ailerons, rudder, theory, mach, liftCoefficient);
  }

  /**
   * The estimates.
   *
   * @return one for each derivative of which some part could be estimated, in the order of the
   *     enumeration
   */
  public Collection<Estimate> estimates() {
    List<Estimate> all = new ArrayList<>();
    terms.forEach((coefficient, parts) -> all.add(new Estimate(coefficient, parts)));
    return all;
  }

  /**
   * One of the estimates.
   *
   * @param coefficient which derivative
   * @return its estimate; empty when the shape does not give it
   */
  public Optional<Estimate> estimate(Coefficient coefficient) {
    return Optional.ofNullable(terms.get(coefficient))
        .map(parts -> new Estimate(coefficient, parts));
  }

  /**
   * The wing with its loadings.
   *
   * @return the wing
   */
  public WingEstimate wing() {
    return wing;
  }

  /**
   * The wing with sections that stall.
   *
   * @return empty when no section has a known stall
   */
  public Optional<StallingWing> stallingWing() {
    return StallingWing.isKnownFor(geometry.wing())
        ? Optional.of(StallingWing.of(geometry.wing(), wing, aileronEffectiveness))
        : Optional.empty();
  }

  /**
   * How the loads of the wing lie along its span, as they stand in the estimates: with what sweep
   * and gaps take from them.
   *
   * @return the loads
   */
  public SpanLoads loads() {
    return new SpanLoads(wing, swept, aileronLoading);
  }

  /**
   * The theory of the wing.
   *
   * @return which one
   */
  public WingEstimate.Theory theory() {
    return theory.kind();
  }

  private void add(
      Coefficient coefficient,
      String part,
      double value,
      EstimateMethod method,
      String extrapolated) {
    terms
        .computeIfAbsent(coefficient, unused -> new ArrayList<>())
        .add(new Estimate.Term(part, value, method, extrapolated));
  }

  private String beyondMach() {
    return mach > LARGEST_MACH
        ? "Mach "
            + Math.round(100 * mach) / 100.0
            + " is beyond "
            + LARGEST_MACH
            + ", where Prandtl and Glauert's rule ends"
        : "";
  }

  private void addWing(double liftCoefficient) {
    EstimateMethod method = theory.method();
    String beyond = beyondMach();
    double sweep = geometry.wing().meanSweep();
    add(Coefficient.CL_P, "wing", swept * wing.rollDamping(), method, beyond);
    add(Coefficient.CL_R, "wing", wing.rollWithYaw(), method, beyond);
    add(Coefficient.CL_BETA, "wing dihedral", swept * wing.dihedralEffect(), method, beyond);
    addSweep(liftCoefficient, sweep);
    add(Coefficient.CN_BETA, "wing", wing.yawWithSlip(), EstimateMethod.INDUCED_YAW, beyond);
    add(Coefficient.CN_P, "wing", wing.yawWithRoll(), EstimateMethod.INDUCED_YAW, beyond);
    add(Coefficient.CN_R, "wing", wing.inducedYawDamping(), EstimateMethod.INDUCED_YAW, beyond);
    add(Coefficient.CN_R, "wing", wing.profileYawDamping(), EstimateMethod.PROFILE_DRAG, "");
  }

  /** T.A. Toll and M.J. Queijo, NACA TN 1581, 1948, from memory. */
  static double sweepFactor(double aspectRatio, double sweep) {
    return (aspectRatio + 4) * Math.cos(sweep) / (aspectRatio + 4 * Math.cos(sweep));
  }

  private void addSweep(double liftCoefficient, double sweep) {
    if (sweep == 0) {
      return;
    }
    Wing shape = geometry.wing();
    double aspectRatio = shape.aspectRatio();
    // Each side carries half the lift at 4/(3π) of the half span, as an elliptic loading does.
    double arm = 4 / (3 * Math.PI);
    double value =
        -liftCoefficient
            * Math.tan(sweep)
            * arm
            * aspectRatio
            / (aspectRatio + 4 * Math.cos(sweep));
    add(
        Coefficient.CL_BETA,
        "wing sweep",
        value,
        EstimateMethod.SWEEP,
        Math.abs(sweep) > WIDEST_SWEEP ? "sweep beyond the charts" : "");
  }

  private void addAilerons(SpanLoading thin, Ailerons travel) {
    SpanLoading loading = thin.times(aileronEffectiveness);
    String beyond =
        0.5 * (travel.up() + travel.down()) > FlapFactor.LARGEST
            ? "aileron travel is beyond the charts of flap losses"
            : beyondMach();
    aileronLoading = Optional.of(loading.times(swept));
    add(
        Coefficient.CL_DA,
        "ailerons",
        swept * loading.rollingMoment(),
        EstimateMethod.AILERON,
        beyond);
    add(
        Coefficient.CN_DA,
        "ailerons",
        wing.yawWithAileron(loading),
        EstimateMethod.INDUCED_YAW,
        beyond);
  }

  private void addBody(Body body) {
    Wing shape = geometry.wing();
    double span = shape.span();
    add(
        Coefficient.CL_BETA,
        "wing on the body",
        -1.2
            * Math.sqrt(shape.aspectRatio())
            * (shape.height() / span)
            * (2 * body.diameter() / span),
        EstimateMethod.WING_HEIGHT,
        Math.abs(shape.height()) > 0.5 * body.height()
            ? "the wing lies outside the body, the charts do not"
            : "");
    double offset = 2 * shape.height() / body.diameter();
    double carried = 1 + (offset > 0 ? 0.85 : -0.49) * offset;
    add(
        Coefficient.CY_BETA,
        "body",
        -2 * carried * 0.25 * Math.PI * body.width() * body.height() / shape.area(),
        EstimateMethod.BODY_SIDE_FORCE,
        Math.abs(offset) > 1 ? "the wing lies outside the body, the charts do not" : "");
    double fineness = body.length() / body.diameter();
    add(
        Coefficient.CN_BETA,
        "body",
        -2
            * apparentMass(fineness)
            * FILLED
            * body.length()
            * body.width()
            * body.height()
            / (shape.area() * span),
        EstimateMethod.BODY,
        fineness < 4 ? "a body of fineness below 4 is not slender" : "");
  }

  /** k2 − k1 of an ellipsoid by its fineness; H. Lamb, Hydrodynamics, ch. V. */
  static double apparentMass(double fineness) {
    if (!(fineness > 1)) {
      return 0; // a sphere turns nowhere
    }
    double e = Math.sqrt(1 - 1 / (fineness * fineness));
    double log = Math.log((1 + e) / (1 - e));
    double along = 2 * (1 - e * e) / (e * e * e) * (0.5 * log - e);
    double across = 1 / (e * e) - (1 - e * e) / (2 * e * e * e) * log;
    return across / (2 - across) - along / (2 - along);
  }

  private void addFin(Fin fin, Optional<Rudder> rudder) {
    Wing shape = geometry.wing();
    double span = shape.span();
    double share = fin.area() / shape.area();
    double slope = finSlope(fin);
    double sidewash =
        0.724
            + 3.06 * share / (1 + Math.cos(shape.meanSweep()))
            + geometry.body().map(body -> -0.4 * shape.height() / body.diameter()).orElse(0.0)
            + 0.009 * shape.aspectRatio();
    double force = -slope * share * sidewash;
    double angle = wing.angleOfAttack();
    double arm = (fin.arm() * Math.cos(angle) + fin.height() * Math.sin(angle)) / span;
    double height = (fin.height() * Math.cos(angle) - fin.arm() * Math.sin(angle)) / span;
    String beyond = beyondMach();
    // By sideslip the fin stands in the sidewash of wing and body; by its own motion it does not.
    double own = -slope * share;
    addFinTerm(Coefficient.CY_BETA, force, beyond);
    addFinTerm(Coefficient.CL_BETA, force * height, beyond);
    addFinTerm(Coefficient.CN_BETA, -force * arm, beyond);
    addFinTerm(Coefficient.CY_P, 2 * own * height, beyond);
    addFinTerm(Coefficient.CL_P, 2 * own * height * height, beyond);
    addFinTerm(Coefficient.CN_P, -2 * own * height * arm, beyond);
    addFinTerm(Coefficient.CY_R, -2 * own * arm, beyond);
    addFinTerm(Coefficient.CL_R, -2 * own * arm * height, beyond);
    addFinTerm(Coefficient.CN_R, 2 * own * arm * arm, beyond);
    if (fin.rudderShare().isPresent() && rudder.isPresent()) {
      double travel = 0.5 * (rudder.get().left() + rudder.get().right());
      double factor =
          FlapFactor.thin(fin.rudderShare().getAsDouble()) * FlapFactor.left(0.5 * travel);
      String beyondCharts =
          travel > FlapFactor.LARGEST
              ? "rudder travel is beyond the charts of flap losses"
              : beyond;
      double side = slope * share * factor;
      add(Coefficient.CY_DR, "rudder", side, EstimateMethod.RUDDER, beyondCharts);
      add(Coefficient.CL_DR, "rudder", side * height, EstimateMethod.RUDDER, beyondCharts);
      add(Coefficient.CN_DR, "rudder", -side * arm, EstimateMethod.RUDDER, beyondCharts);
    }
  }

  private void addFinTerm(Coefficient coefficient, double value, String extrapolated) {
    add(coefficient, "fin", value, EstimateMethod.FIN, extrapolated);
  }

  /** 2πA / (2 + √(A² (β² + tan² Λ) + 4)), Datcom sec. 4.1.3.2, from memory, for a0 = 2π. */
  private double finSlope(Fin fin) {
    double aspectRatio = fin.aspectRatio() * (geometry.body().isPresent() ? END_PLATE : 1);
    double tangent = Math.tan(fin.sweep());
    return 2
        * Math.PI
        * aspectRatio
        / (2 + Math.sqrt(aspectRatio * aspectRatio * (1 - mach * mach + tangent * tangent) + 4));
  }

  private void addTailplane(Tailplane tail) {
    Wing shape = geometry.wing();
    double aspectRatio = tail.aspectRatio();
    double alone = -Math.PI / 4 * aspectRatio / (aspectRatio + 4);
    double spans = tail.span() / shape.span();
    add(
        Coefficient.CL_P,
        "tailplane",
        0.5 * alone * tail.area() / shape.area() * spans * spans,
        EstimateMethod.TAILPLANE,
        "");
  }
}
