package org.rolltrace.core.derivatives;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;

/** The derivatives of wings, fins, tails and bodies against closed forms and printed values. */
class GeometryEstimateValidationTest {
  private static final double HALF = 5;
  private static final double DIHEDRAL = Math.toRadians(5);

  private static final Section NO_DRAG =
      new Section(Section.THIN, 0, OptionalDouble.empty(), Section.USUAL_FALL, 0);

  private static Wing trapezoid(double aspectRatio, double taper, double sweep, double dihedral) {
    double root = 4 * HALF / (aspectRatio * (1 + taper));
    return new Wing(
        List.of(new WingPanel(0, HALF, root, taper * root, sweep, dihedral, 0, NO_DRAG)), 0, 0);
  }

  /** An ellipse of many short trapezoids, fine enough for six digits. */
  private static Wing ellipse(double aspectRatio) {
    double root = 16 * HALF / (Math.PI * aspectRatio) / 2;
    int count = 3000;
    List<WingPanel> panels = new ArrayList<>();
    double[] stations = new double[count + 1];
    double[] chords = new double[count + 1];
    for (int i = 0; i <= count; i++) {
      double theta = Math.max(1e-5, 0.5 * Math.PI * (count - i) / count);
      stations[i] = i == 0 ? 0 : HALF * Math.cos(theta);
      chords[i] = root * Math.sin(theta);
    }
    for (int i = 0; i < count; i++) {
      panels.add(
          new WingPanel(
              stations[i], stations[i + 1], chords[i], chords[i + 1], 0, DIHEDRAL, 0, NO_DRAG));
    }
    return new Wing(panels, 0, 0);
  }

  private static WingEstimate line(Wing wing, double lift) {
    return WingEstimate.of(wing, Optional.empty(), WingEstimate.Theory.LIFTING_LINE, 0, lift);
  }

  /**
   * Closed forms of the elliptic wing by lifting line, a0 = 2π; Cn_p with the tilt of the lift
   * derived for the purpose and confirmed by series, −(CL/8)(A − 2)/(A + 4).
   */
  @ParameterizedTest
  @ValueSource(doubles = {6, 8, 12})
  void ellipticWing(double aspectRatio) {
    WingEstimate wing = line(ellipse(aspectRatio), 0.7);
    double slope = 2 * Math.PI * aspectRatio / (aspectRatio + 2);
    double damping = -Math.PI / 4 * aspectRatio / (aspectRatio + 4);
    assertThat(wing.liftSlope()).isCloseTo(slope, within(1e-6));
    assertThat(wing.rollDamping()).isCloseTo(damping, within(1e-6));
    assertThat(wing.yawWithRoll())
        .isCloseTo(-0.7 / 8 * (aspectRatio - 2) / (aspectRatio + 4), within(1e-6));
    // By yawing, the incidence counts as if it changed with the speed: 2y/b times that of the wing.
    assertThat(wing.rollWithYaw()).isCloseTo(0.7 / 8 - damping * 0.7 / slope, within(1e-6));
    assertThat(wing.steady().lift()).isCloseTo(0.7, within(1e-12));
  }

  /** Strip theory on a very long wing, a0 = 2π; formulas integrated by hand for a trapezoid. */
  @ParameterizedTest
  @ValueSource(doubles = {0.5, 1})
  void longWings(double taper) {
    double lift = 0.6;
    Wing shape = trapezoid(600, taper, 0, DIHEDRAL);
    AileronPlace place = new AileronPlace(0.5 * HALF, 0.9 * HALF, 0.25);
    WingEstimate wing =
        WingEstimate.of(shape, Optional.of(place), WingEstimate.Theory.LIFTING_LINE, 0, lift);
    Percentage withinSpan = Percentage.withPercentage(2); // 1/A of what is left of the span effect
    assertThat(wing.dihedralEffect())
        .isCloseTo(-2 * Math.PI * DIHEDRAL * (1 + 2 * taper) / (6 * (1 + taper)), withinSpan);
    assertThat(wing.rollWithYaw())
        .isCloseTo(lift * (1 + 3 * taper) / (6 * (1 + taper)), Percentage.withPercentage(3));
    // R.C. Nelson, Flight Stability and Automatic Control, 2nd ed. 1998, from memory; tau 0.608998
    // by the closed form of thin sections.
    double root = shape.panels().get(0).innerChord();
    double moment =
        2
            * 2
            * Math.PI
            * 0.608998
            * root
            / (shape.area() * shape.span())
            * (strip(place.to(), taper, shape.span()) - strip(place.from(), taper, shape.span()));
    assertThat(wing.aileron().orElseThrow().rollingMoment())
        .isCloseTo(moment, Percentage.withPercentage(2));
  }

  private static double strip(double y, double taper, double span) {
    return y * y / 2 + 2 * (taper - 1) / (3 * span) * y * y * y;
  }

  @Test
  void profileDragOfARectangleDampsYawByAThirdOfItself() {
    Section section =
        new Section(Section.THIN, 0, OptionalDouble.empty(), Section.USUAL_FALL, 0.012);
    Wing wing = new Wing(List.of(new WingPanel(0, HALF, 1, 1, 0, 0, 0, section)), 0, 0);
    assertThat(line(wing, 0.5).profileYawDamping()).isCloseTo(-0.012 / 3, within(1e-15));
  }

  /** H. Lamb, Hydrodynamics, ch. V, as M.M. Munk's table prints it; from memory. */
  @ParameterizedTest
  @CsvSource({"4, 0.778", "6, 0.873", "10, 0.939"})
  void apparentMassOfEllipsoids(double fineness, double printed) {
    assertThat(GeometryEstimate.apparentMass(fineness))
        .isCloseTo(printed, within(0.002)); // two coefficients of three digits
  }

  /** First-order geometry of fins: R.C. Nelson 1998, ch. 3 and 5, from memory. */
  @Test
  void finActsAtItsArms() {
    Wing shape = trapezoid(7, 0.7, 0, 0);
    Fin fin = new Fin(1.2, 1.3, 4.5, 0.9, 0, OptionalDouble.of(0.4));
    Geometry bare =
        new Geometry(shape, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    Geometry finned =
        new Geometry(shape, Optional.empty(), Optional.empty(), Optional.of(fin), Optional.empty());
    Rudder rudder = new Rudder(0.4, 0.4, SurfaceDynamics.DIRECT);
    // Without lift the body lies along the flight path.
    GeometryEstimate without = estimate(bare, rudder, 0);
    GeometryEstimate with = estimate(finned, rudder, 0);
    double ratio = 1.3 * 1.3 / 1.2;
    double slope = 2 * Math.PI * ratio / (2 + Math.sqrt(ratio * ratio + 4));
    double volume = slope * fin.area() / shape.area();
    double arm = 4.5 / shape.span();
    double height = 0.9 / shape.span();
    assertThat(more(with, without, Coefficient.CL_P))
        .isCloseTo(-2 * volume * height * height, within(1e-12));
    assertThat(more(with, without, Coefficient.CL_R))
        .isCloseTo(2 * volume * arm * height, within(1e-12));
    assertThat(more(with, without, Coefficient.CN_R))
        .isCloseTo(-2 * volume * arm * arm, within(1e-12));
    double side = with.estimate(Coefficient.CY_BETA).orElseThrow().value();
    assertThat(more(with, without, Coefficient.CN_BETA)).isCloseTo(-side * arm, within(1e-12));
    assertThat(more(with, without, Coefficient.CL_BETA)).isCloseTo(side * height, within(1e-12));
    double rudderForce = with.estimate(Coefficient.CY_DR).orElseThrow().value();
    assertThat(rudderForce).isPositive();
    assertThat(with.estimate(Coefficient.CN_DR).orElseThrow().value())
        .isCloseTo(-rudderForce * arm, within(1e-12));
  }

  private static double more(GeometryEstimate with, GeometryEstimate without, Coefficient which) {
    return with.estimate(which).orElseThrow().value()
        - without.estimate(which).map(Estimate::value).orElse(0.0);
  }

  private static GeometryEstimate estimate(Geometry geometry, Rudder rudder, double lift) {
    return GeometryEstimate.of(
        geometry,
        Optional.of(new Ailerons(0.35, 0.3, SurfaceDynamics.DIRECT)),
        Optional.of(rudder),
        WingEstimate.Theory.LIFTING_SURFACE,
        0,
        lift);
  }

  /** The signs of an ordinary aeroplane; common practice. */
  @Test
  void anOrdinaryAeroplaneHasOrdinarySigns() {
    Geometry geometry =
        new Geometry(
            new Wing(
                List.of(new WingPanel(0, HALF, 1.6, 1.1, 0, DIHEDRAL, -0.03, NO_DRAG)), 0.03, -0.4),
            Optional.of(new AileronPlace(2.8, 4.7, 0.22)),
            Optional.of(new Tailplane(2.5, 3, 4.4, 0.2)),
            Optional.of(new Fin(1.6, 1.5, 4.8, 0.9, 0.3, OptionalDouble.of(0.4))),
            Optional.of(new Body(7.5, 1.1, 1.3)));
    GeometryEstimate all = estimate(geometry, new Rudder(0.4, 0.4, SurfaceDynamics.DIRECT), 0.5);
    for (Coefficient negative :
        List.of(
            Coefficient.CY_BETA,
            Coefficient.CL_BETA,
            Coefficient.CL_P,
            Coefficient.CN_P,
            Coefficient.CN_R,
            Coefficient.CN_DA,
            Coefficient.CN_DR)) {
      assertThat(all.estimate(negative).orElseThrow().value()).as(negative.symbol()).isNegative();
    }
    for (Coefficient positive :
        List.of(
            Coefficient.CN_BETA,
            Coefficient.CL_R,
            Coefficient.CL_DA,
            Coefficient.CY_DR,
            Coefficient.CL_DR)) {
      assertThat(all.estimate(positive).orElseThrow().value()).as(positive.symbol()).isPositive();
    }
    // Handbook ranges of light aeroplanes: common practice.
    assertThat(all.estimate(Coefficient.CL_P).orElseThrow().value()).isBetween(-0.6, -0.35);
    assertThat(all.estimate(Coefficient.CL_DA).orElseThrow().value()).isBetween(0.08, 0.3);
    assertThat(all.estimate(Coefficient.CN_BETA).orElseThrow().value()).isBetween(0.03, 0.2);
  }

  @Test
  void beyondTheRuleOfCompressibilityIsMarked() {
    Geometry geometry =
        new Geometry(
            trapezoid(7, 0.7, 0, 0),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty());
    GeometryEstimate fast =
        GeometryEstimate.of(
            geometry,
            Optional.empty(),
            Optional.empty(),
            WingEstimate.Theory.LIFTING_SURFACE,
            0.75,
            0.3);
    assertThat(fast.estimate(Coefficient.CL_P).orElseThrow().extrapolated()).contains("Mach 0.75");
    assertThat(fast.estimate(Coefficient.CL_DA)).isEmpty();
  }
}
