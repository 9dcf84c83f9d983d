package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Shipped;

/**
 * The invented aeroplanes, whose derivatives follow from their shapes, against closed forms and
 * against what such aeroplanes are like. The figures are those of {@code scenarios/README.md}.
 */
class OwnAeroplanesValidationTest {
  private static final String GEOMETRY =
      """
      scenario,                     slope, fin, finSpan, arm, height, trimAngle
      tarnlark-cruise-roll-entry,   5.7, 1.10,  1.35,    4.25, 0.75,  1.0
      tarnlark-approach-roll-entry, 5.7, 1.10,  1.35,    4.25, 0.75,  6.3
      cragmerle-roll-entry,         5.9, 0.80,  1.12,    3.45, 0.55,  0.3
      cragmerle-torque-right,       5.9, 0.80,  1.12,    3.45, 0.55,  6.1
      mosspipit-roll-entry,         5.5, 0.075, 0.34,    1.18, 0.12,  2.0
      """;

  private static double value(Scenario scenario, Coefficient coefficient) {
    return scenario.data().derivatives().value(coefficient);
  }

  private static double aspectRatio(Aeroplane aeroplane) {
    return aeroplane.span() * aeroplane.span() / aeroplane.wingArea();
  }

  private static double liftCoefficient(Scenario scenario) {
    Aeroplane aeroplane = scenario.data().aeroplane();
    FlightCondition condition = scenario.condition();
    return aeroplane.mass().orElseThrow()
        * 9.80665
        / (condition.dynamicPressure() * aeroplane.wingArea());
  }

  /**
   * The elliptic wing by lifting line (closed forms, derived): Cl_p −(a₀/8) AR/(AR + 2a₀/π), Cn_p
   * −(CL/8)(1 − 3a₀/(πAR + 2a₀)); CL/4 for the wing's Cl_r by strips with elliptic chord (common
   * practice). Straight tapers of 0.55 to 0.7 damp 3 to 10 % more than the ellipse of the same span
   * (lifting line, series of 120 terms), and tail and fin add one; the lifting surface damps 13 %
   * less than the line at AR 6 (R.S. Swanson and E.L. Priddy, NACA ARR L5F23, 1945, re-read) and a
   * little nearer to it at 8. Yaw due to roll, a difference of two larger terms, and the rule for
   * Cl_r hold to a tenth.
   */
  @ParameterizedTest
  @CsvSource(useHeadersInDisplayName = true, textBlock = GEOMETRY)
  void wing(
      String name, double slope, double fin, double finSpan, double arm, double up, double turn) {
    Scenario scenario = Shipped.scenario(name);
    Aeroplane aeroplane = scenario.data().aeroplane();
    double ar = aspectRatio(aeroplane);
    double ellipse = -slope / 8 * ar / (ar + 2 * slope / Math.PI);
    assertThat(value(scenario, Coefficient.CL_P) / ellipse).isBetween(0.89, 0.98);

    Fin tail = Fin.of(aeroplane, fin, finSpan, arm, up, turn);
    double lift = liftCoefficient(scenario);
    double tilt = -lift / 8 * (1 - 3 * slope / (Math.PI * ar + 2 * slope));
    assertThat(value(scenario, Coefficient.CN_P) - 2 * tail.force() * tail.arm() * tail.height())
        .isCloseTo(tilt, within(0.1 * lift / 8));
    assertThat(value(scenario, Coefficient.CL_R) - 2 * tail.force() * tail.arm() * tail.height())
        .isCloseTo(lift / 4, Percentage.withPercentage(12.5));
  }

  /**
   * A fin: side-force slope 2πA/(2 + √(A² + 4)) with 1.55 of its own aspect ratio, arm and height
   * (first-order geometry, from memory), turned to the flight path.
   *
   * @param force of the fin on the wing's area, per rad
   * @param arm in spans
   * @param height in spans
   */
  private record Fin(double force, double arm, double height) {
    static Fin of(
        Aeroplane aeroplane, double area, double span, double arm, double up, double turn) {
      double a = 1.55 * span * span / area;
      double angle = Math.toRadians(turn);
      return new Fin(
          2 * Math.PI * a / (2 + Math.sqrt(a * a + 4)) * area / aeroplane.wingArea(),
          (arm * Math.cos(angle) + up * Math.sin(angle)) / aeroplane.span(),
          (up * Math.cos(angle) - arm * Math.sin(angle)) / aeroplane.span());
    }
  }

  /**
   * The fin's slope rises by half of M², up to 5 % at the racer's Mach 0.33, less for its low
   * aspect ratio, and its arm turns by the last half degree of incidence: 3 %. The wing damps yaw
   * by up to a tenth of the fin.
   */
  @ParameterizedTest
  @CsvSource(useHeadersInDisplayName = true, textBlock = GEOMETRY)
  void fin(
      String name, double slope, double fin, double finSpan, double arm, double up, double turn) {
    Scenario scenario = Shipped.scenario(name);
    Fin tail = Fin.of(scenario.data().aeroplane(), fin, finSpan, arm, up, turn);
    Percentage figures = Percentage.withPercentage(3);
    assertThat(value(scenario, Coefficient.CY_R)).isCloseTo(2 * tail.force() * tail.arm(), figures);
    assertThat(value(scenario, Coefficient.CN_DR) / value(scenario, Coefficient.CY_DR))
        .isCloseTo(-tail.arm(), figures);
    assertThat(value(scenario, Coefficient.CN_R) / (-2 * tail.force() * tail.arm() * tail.arm()))
        .isBetween(1.0, 1.12);
    // the body takes a fifth to two thirds of the fin's stiffness from it
    assertThat(value(scenario, Coefficient.CN_BETA) / (tail.force() * tail.arm()))
        .isBetween(0.33, 0.8);
  }

  /**
   * MIL-F-8785C, November 1980, level 1 for light aeroplanes (class I) in gradual manoeuvres: roll
   * mode at most 1.4 s (re-read), dutch roll at least 0.08, 0.15 rad/s and 0.4 rad/s, spiral at
   * least 20 s to double (both read in excerpts). The approach set of the trainer stands right at
   * the last, which is 12 s there (terminal phase). Radii of gyration of light singles, 0.11 to
   * 0.14 of the span in roll and 0.16 to 0.21 in yaw: common practice.
   */
  @ParameterizedTest
  @CsvSource({
    "tarnlark-cruise-roll-entry, 20",
    "tarnlark-approach-roll-entry, 12",
    "cragmerle-roll-entry, 20",
    "cragmerle-torque-right, 12",
    "mosspipit-roll-entry, 20"
  })
  void fliesLikeSuchAnAeroplane(String name, double toDouble) {
    Scenario scenario = Shipped.scenario(name);
    LateralModes modes = ScenarioRun.execute(scenario).modes().orElseThrow();
    assertThat(modes.roll().orElseThrow().timeConstant()).isBetween(0.04, 0.2);
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(dutchRoll.dampingRatio()).isBetween(0.08, 0.4);
    assertThat(-dutchRoll.real()).isGreaterThan(0.15);
    assertThat(dutchRoll.naturalFrequency()).isGreaterThan(0.4);
    assertThat(modes.spiral().orElseThrow().root()).isLessThan(Math.log(2) / toDouble);

    Aeroplane aeroplane = scenario.data().aeroplane();
    double mass = aeroplane.mass().orElseThrow();
    assertThat(Math.sqrt(aeroplane.inertia().roll() / mass) / aeroplane.span())
        .isBetween(0.105, 0.14);
    assertThat(Math.sqrt(aeroplane.inertia().yaw().orElseThrow() / mass) / aeroplane.span())
        .isBetween(0.16, 0.21);
  }

  /** Nothing is given: all follows from the shape, inside the range of the methods. */
  @ParameterizedTest
  @CsvSource({
    "tarnlark-cruise-roll-entry",
    "tarnlark-approach-roll-entry",
    "cragmerle-roll-entry",
    "cragmerle-torque-right",
    "mosspipit-roll-entry"
  })
  void derivativesFollowFromTheShape(String name) {
    LateralDerivatives set = Shipped.scenario(name).data().derivatives();
    for (Coefficient coefficient : Coefficient.values()) {
      assertThat(set.origin(coefficient))
          .as(coefficient.symbol())
          .isEqualTo(coefficient == Coefficient.CY_DA ? Origin.ABSENT : Origin.ESTIMATED);
      assertThat(set.estimate(coefficient).map(Estimate::extrapolated).orElse("")).isEmpty();
    }
  }

  /** The two sides differ by twice what the added moment of the propeller does alone. */
  @ParameterizedTest
  @CsvSource({"cragmerle-torque, -294", "mosspipit-torque, -0.5"})
  void torqueTakesItsShareFromOneSide(String name, double added) {
    Scenario right = Shipped.scenario(name + "-right");
    Scenario left = Shipped.scenario(name + "-left");
    Propulsion propulsion = right.propulsion();
    assertThat(propulsion.moments().roll() - propulsion.moments(right.start().trimmedWith()).roll())
        .isCloseTo(added, within(1e-9));
    double toTheRight = peak(right);
    double toTheLeft = peak(left);
    assertThat(toTheRight).isPositive();
    assertThat(toTheLeft).isNegative();
    // One degree of freedom: p = L / (q̄ S b · −Cl_p · b/2V); slip moves it by some per cent.
    Aeroplane aeroplane = right.data().aeroplane();
    FlightCondition condition = right.condition();
    double damping =
        condition.dynamicPressure()
            * aeroplane.wingArea()
            * aeroplane.span()
            * aeroplane.span()
            / (2 * condition.trueAirspeed())
            * value(right, Coefficient.CL_P);
    assertThat(toTheRight + toTheLeft)
        .isCloseTo(-2 * added / damping, Percentage.withPercentage(15));
  }

  private static double peak(Scenario scenario) {
    return ScenarioRun.execute(scenario)
        .measure("peakRollRate")
        .orElseThrow()
        .value()
        .orElseThrow();
  }
}
