package org.rolltrace.core.derivatives;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.derivatives.Coefficient.*;

import java.util.EnumMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;

/** Conversions against values worked by hand and against a matrix library. */
class ConvertedSetsTest {
  /** Rounding of a few products of values near 1. */
  private static final double ROUNDING = 1e-13;

  private static final FlightCondition CONDITION =
      FlightCondition.ofDensity(0, 1.2, AirspeedKind.TRUE, 50);

  private static Map<Coefficient, Double> anySet(Random random) {
    Map<Coefficient, Double> set = new EnumMap<>(Coefficient.class);
    for (Coefficient coefficient : Coefficient.values()) {
      set.put(coefficient, random.nextDouble() - 0.5);
    }
    return set;
  }

  private static DimensionalSet form(Inertia inertia, boolean primed) {
    return new DimensionalSet(10, 15, OptionalDouble.of(1000), inertia, CONDITION, primed);
  }

  @Test
  void namesOfTheDimensionalForm() {
    assertThat(CY_BETA.dimensionalSymbol()).isEqualTo("Y_beta");
    assertThat(CL_P.dimensionalSymbol()).isEqualTo("L_p");
    assertThat(CN_DR.dimensionalSymbol()).isEqualTo("N_dr");
  }

  /** q̄ = 1500 Pa, q̄ S = 22 500 N, q̄ S b = 225 000 N m, b/2V = 0.1 s: worked by hand. */
  @Test
  void coefficientsWorkedByHand() {
    Map<Coefficient, Double> printed = new EnumMap<>(Coefficient.class);
    printed.put(CY_BETA, -9.0);
    printed.put(CY_R, 0.45);
    printed.put(CL_BETA, -18.0);
    printed.put(CL_P, -9.0);
    printed.put(CN_DR, -5.0);
    Map<Coefficient, Double> found = form(Inertia.of(1000, 2250, 0), false).toCoefficients(printed);
    assertThat(found.keySet()).isEqualTo(printed.keySet());
    assertThat(found.get(CY_BETA)).isCloseTo(-0.4, within(ROUNDING));
    assertThat(found.get(CY_R)).isCloseTo(0.2, within(ROUNDING));
    assertThat(found.get(CL_BETA)).isCloseTo(-0.08, within(ROUNDING));
    assertThat(found.get(CL_P)).isCloseTo(-0.4, within(ROUNDING));
    assertThat(found.get(CN_DR)).isCloseTo(-0.05, within(ROUNDING));
  }

  /** [ṗ; ṙ] = [Ixx −Ixz; −Ixz Izz]⁻¹ [L; N] by a matrix library gives the primed values. */
  @ParameterizedTest
  @ValueSource(doubles = {-400, -30, 120, 600})
  void primedIsWhatTheInertiaMatrixMakes(double product) {
    RealMatrix inertia =
        MatrixUtils.createRealMatrix(new double[][] {{1000, -product}, {-product, 2250}});
    double[] accelerations =
        MatrixUtils.inverse(inertia).operate(new double[] {1000 * -18.0, 2250 * 5.0});
    Map<Coefficient, Double> primed = new EnumMap<>(Coefficient.class);
    primed.put(CL_BETA, accelerations[0]);
    primed.put(CN_BETA, accelerations[1]);
    Map<Coefficient, Double> found =
        form(Inertia.of(1000, 2250, product), true).toCoefficients(primed);
    assertThat(found.get(CL_BETA)).isCloseTo(1000 * -18.0 / 225_000, within(ROUNDING));
    assertThat(found.get(CN_BETA)).isCloseTo(2250 * 5.0 / 225_000, within(ROUNDING));
  }

  @Test
  void whatIsMissingForPrimes() {
    assertThat(form(Inertia.of(1000, 2250, 10), true).missingBeside(Set.of(CL_P, CN_R, CY_BETA)))
        .containsExactly(CL_R, CN_P);
    assertThat(form(Inertia.of(1000, 2250, 0), true).missingBeside(Set.of(CL_P))).isEmpty();
    assertThat(form(Inertia.of(1000, 2250, 10), false).missingBeside(Set.of(CL_P))).isEmpty();
    assertThatIllegalArgumentException()
        .isThrownBy(() -> form(Inertia.ofRoll(1000), false).toCoefficients(Map.of(CN_BETA, 1.0)))
        .withMessage("N_beta is a moment by yaw inertia; give the yaw inertia too");
  }

  @Test
  void whatIsMissingForTurnedAxes() {
    TurnedAxes axes = new TurnedAxes(0.1);
    assertThat(axes.missingBeside(Set.of(CL_P))).containsExactly(CL_R, CN_P, CN_R);
    assertThat(axes.missingBeside(Set.of(CL_P, CN_R))).containsExactly(CL_R, CN_P);
    assertThat(axes.missingBeside(Set.of(CY_P, CL_DA, CY_DR))).containsExactly(CY_R, CN_DA);
    assertThat(new TurnedAxes(0).missingBeside(Set.of(CL_P))).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void thereAndBackIsTheSame(long seed) {
    Random random = new Random(seed);
    Map<Coefficient, Double> set = anySet(random);
    double angle = random.nextDouble() - 0.5;
    Map<Coefficient, Double> turned = new TurnedAxes(angle).turn(set);
    Map<Coefficient, Double> back = new TurnedAxes(-angle).turn(turned);
    set.forEach((c, value) -> assertThat(back.get(c)).isCloseTo(value, within(ROUNDING)));
    assertThat(turned.get(CN_P)).isNotCloseTo(set.get(CN_P), within(1e-6));
    Inertia inertia = Inertia.of(1000, 2250, 200).turned(angle).turned(-angle);
    assertThat(inertia.roll()).isCloseTo(1000, within(1e4 * ROUNDING));
    assertThat(inertia.yaw().orElseThrow()).isCloseTo(2250, within(1e4 * ROUNDING));
    assertThat(inertia.product()).isCloseTo(200, within(1e4 * ROUNDING));
  }

  /**
   * Point masses have known inertias about any axes, ∫(y² + z²), ∫(x² + y²) and ∫ x z, from their
   * places as seen from axes whose x is lowered by the angle.
   */
  @Test
  void inertiasOfPointMassesAboutTurnedAxes() {
    double[][] masses = {{100, 1.5, 0.4, 0.2}, {80, -2.0, -0.7, -0.5}, {40, 0.3, 1.1, 0.9}};
    double angle = Math.toRadians(11);
    Inertia about = of(masses, 0).turned(angle);
    Inertia direct = of(masses, angle);
    assertThat(about.roll()).isCloseTo(direct.roll(), within(1e4 * ROUNDING));
    assertThat(about.yaw().orElseThrow())
        .isCloseTo(direct.yaw().orElseThrow(), within(1e4 * ROUNDING));
    assertThat(about.product()).isCloseTo(direct.product(), within(1e4 * ROUNDING));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Inertia.ofRoll(1000).turned(angle))
        .withMessage("inertias about turned axes need the yaw inertia; give it too");
  }

  private static Inertia of(double[][] masses, double angle) {
    double roll = 0;
    double yaw = 0;
    double product = 0;
    for (double[] mass : masses) {
      double x = mass[1] * Math.cos(angle) + mass[3] * Math.sin(angle);
      double z = mass[3] * Math.cos(angle) - mass[1] * Math.sin(angle);
      roll += mass[0] * (mass[2] * mass[2] + z * z);
      yaw += mass[0] * (x * x + mass[2] * mass[2]);
      product += mass[0] * x * z;
    }
    return Inertia.of(roll, yaw, product);
  }

  /** At 90 deg the stability p is the body r, the stability r is minus the body p; so L and N. */
  @Test
  void aQuarterOfATurnMakesRollOfYaw() {
    Map<Coefficient, Double> body = new EnumMap<>(Coefficient.class);
    body.put(CY_P, 7.0);
    body.put(CY_R, 8.0);
    body.put(CL_P, 1.0);
    body.put(CL_R, 2.0);
    body.put(CN_P, 3.0);
    body.put(CN_R, 4.0);
    body.put(CL_BETA, 5.0);
    body.put(CN_BETA, 6.0);
    Map<Coefficient, Double> found = new TurnedAxes(Math.PI / 2).turn(body);
    assertThat(found.get(CY_P)).isCloseTo(8, within(1e-12));
    assertThat(found.get(CY_R)).isCloseTo(-7, within(1e-12));
    assertThat(found.get(CL_P)).isCloseTo(4, within(1e-12));
    assertThat(found.get(CL_R)).isCloseTo(-3, within(1e-12));
    assertThat(found.get(CN_P)).isCloseTo(-2, within(1e-12));
    assertThat(found.get(CN_R)).isCloseTo(1, within(1e-12));
    assertThat(found.get(CL_BETA)).isCloseTo(6, within(1e-12));
    assertThat(found.get(CN_BETA)).isCloseTo(-5, within(1e-12));
  }
}
