package org.rolltrace.core.motion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.ejml.data.Complex_F64;
import org.ejml.simple.SimpleMatrix;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.testing.RandomAeroplane;

class LateralModesTest {
  private static LateralModel model(RandomAeroplane any, LateralDerivatives derivatives) {
    return LateralModel.of(
        any.data().aeroplane(), derivatives, any.condition(), PropellerMoments.NONE);
  }

  private static LateralModel model(RandomAeroplane any) {
    return model(any, any.data().derivatives());
  }

  /** EJML, a linear algebra library of its own, finds the same roots. */
  @Test
  void rootsAgreeWithAnIndependentLibrary() {
    for (long seed = 0; seed < 200; seed++) {
      LateralMotion motion = LateralMotion.of(SlipTreatment.FREE, model(RandomAeroplane.of(seed)));
      List<Complex_F64> expected =
          new ArrayList<>(new SimpleMatrix(motion.linearised()).eig().getEigenvalues());
      expected.sort(
          Comparator.comparingDouble(Complex_F64::getReal)
              .thenComparingDouble(Complex_F64::getImaginary));
      List<double[]> found = roots(LateralModes.of(motion));
      assertThat(found).hasSize(4);
      for (int i = 0; i < 4; i++) {
        // roots up to 30 1/s; both libraries work to about 1e-14 of the largest
        assertThat(found.get(i)[0]).isCloseTo(expected.get(i).getReal(), within(1e-10));
        assertThat(found.get(i)[1]).isCloseTo(expected.get(i).getImaginary(), within(1e-10));
      }
    }
  }

  /**
   * Odd aeroplanes too keep all four roots, whichever they are called: their sum is the trace of
   * the matrix (linear algebra).
   */
  @Test
  void noRootIsLostOrNamedTwice() {
    for (long seed = 0; seed < 500; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      Random random = new Random(seed);
      Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
      for (Coefficient c : Coefficient.values()) {
        values.put(c, any.data().derivatives().value(c));
      }
      values.put(Coefficient.CL_P, -0.6 * random.nextDouble());
      values.put(Coefficient.CN_BETA, -0.1 + 0.2 * random.nextDouble());
      values.put(Coefficient.CL_BETA, -0.2 + 0.3 * random.nextDouble());
      values.put(Coefficient.CN_R, -0.15 * random.nextDouble());
      LateralMotion motion =
          LateralMotion.of(
              SlipTreatment.FREE, model(any, LateralDerivatives.ofGiven(values, "test")));
      List<double[]> found = roots(LateralModes.of(motion));
      assertThat(found).hasSize(4);
      double[][] a = motion.linearised();
      // a few roots of up to 30 1/s, each to about 1e-14 of the largest
      assertThat(found.stream().mapToDouble(root -> root[0]).sum())
          .isCloseTo(a[0][0] + a[1][1] + a[2][2] + a[3][3], within(1e-10));
    }
  }

  private static List<double[]> roots(LateralModes modes) {
    List<double[]> roots = new ArrayList<>();
    modes.roll().ifPresent(m -> roots.add(new double[] {m.root(), 0}));
    modes.spiral().ifPresent(m -> roots.add(new double[] {m.root(), 0}));
    modes.aperiodicYaw().forEach(m -> roots.add(new double[] {m.root(), 0}));
    for (var pair : List.of(modes.dutchRoll(), modes.rollSpiral())) {
      pair.ifPresent(
          m -> {
            roots.add(new double[] {m.real(), m.imaginary()});
            roots.add(new double[] {m.real(), -m.imaginary()});
          });
    }
    roots.sort(
        Comparator.comparingDouble((double[] root) -> root[0])
            .thenComparingDouble(root -> root[1]));
    return roots;
  }

  @Test
  void ordinaryAeroplanesHaveTheThreeUsualModes() {
    for (long seed = 0; seed < 200; seed++) {
      LateralModes modes =
          LateralModes.of(LateralMotion.of(SlipTreatment.FREE, model(RandomAeroplane.of(seed))));
      assertThat(modes.rollSpiral()).isEmpty();
      assertThat(modes.dutchRoll()).isPresent();
      assertThat(modes.roll().orElseThrow().root())
          .isLessThan(-Math.abs(modes.spiral().orElseThrow().root()));
    }
  }

  /**
   * With no dihedral effect and no other coupling the roots are those of three separate motions.
   */
  @Test
  void uncoupledMotionsHaveTheRootsOfEach() {
    RandomAeroplane any = RandomAeroplane.of(7);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, -0.5);
    values.put(Coefficient.CL_DA, 0.2);
    values.put(Coefficient.CN_BETA, 0.08);
    values.put(Coefficient.CN_R, -0.1);
    values.put(Coefficient.CY_BETA, -0.4);
    AeroplaneData data = any.data();
    var aeroplane =
        org.rolltrace.core.aeroplane.Aeroplane.builder(
                "uncoupled",
                data.aeroplane().span(),
                data.aeroplane().wingArea(),
                org.rolltrace.core.aeroplane.Inertia.of(
                    data.aeroplane().inertia().roll(),
                    data.aeroplane().inertia().yaw().orElseThrow(),
                    0))
            .mass(data.aeroplane().mass().orElseThrow())
            .build();
    LateralModel model =
        LateralModel.of(
            aeroplane,
            LateralDerivatives.ofGiven(values, "test"),
            any.condition(),
            PropellerMoments.NONE);
    LateralModes modes = LateralModes.of(LateralMotion.of(SlipTreatment.FREE, model));
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(model.rollDampingRoot(), within(1e-9));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(0, within(1e-9));
    // β̇ = Yβ/(mV) β − r and ṙ = Nβ/Izz β + Nr/Izz r: sum and product of the two roots
    double yb = model.sideForce().perSideslip() / (model.mass().orElseThrow() * model.speed());
    double izz = model.inertia().yaw().orElseThrow();
    double nb = model.yawMoment().perSideslip() / izz;
    double nr = model.yawMoment().perYawRate() / izz;
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(2 * dutchRoll.real()).isCloseTo(yb + nr, within(1e-9));
    assertThat(Math.pow(dutchRoll.naturalFrequency(), 2)).isCloseTo(nb + yb * nr, within(1e-9));
  }

  /** Weak roll damping with a strong dihedral effect couples roll and spiral (common practice). */
  @Test
  void weakDampingAndStrongDihedralCoupleRollAndSpiral() {
    RandomAeroplane any = RandomAeroplane.of(3);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient c : Coefficient.values()) {
      values.put(c, any.data().derivatives().value(c));
    }
    values.put(Coefficient.CL_P, -0.02);
    values.put(Coefficient.CL_BETA, -0.15);
    values.put(Coefficient.CL_R, 0.0);
    values.put(Coefficient.CN_P, 0.0);
    LateralModes modes =
        LateralModes.of(
            LateralMotion.of(
                SlipTreatment.FREE, model(any, LateralDerivatives.ofGiven(values, "test"))));
    assertThat(modes.rollSpiral()).isPresent();
    assertThat(modes.roll()).isEmpty();
    assertThat(modes.spiral()).isEmpty();
    assertThat(modes.dutchRoll()).isPresent();
    assertThat(modes.rollSpiral().get().naturalFrequency())
        .isLessThan(modes.dutchRoll().get().naturalFrequency());
  }

  @Test
  void withoutWeathercockStabilityTheYawDoesNotSwing() {
    RandomAeroplane any = RandomAeroplane.of(3);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient c : Coefficient.values()) {
      values.put(c, any.data().derivatives().value(c));
    }
    values.put(Coefficient.CN_BETA, -0.05);
    LateralModes modes =
        LateralModes.of(
            LateralMotion.of(
                SlipTreatment.FREE, model(any, LateralDerivatives.ofGiven(values, "test"))));
    assertThat(modes.dutchRoll()).isEmpty();
    assertThat(modes.aperiodicYaw()).hasSize(2);
    assertThat(modes.roll()).isPresent();
  }

  /** The spiral is neutral where Cl_β Cn_r = Cl_r Cn_β (e.g. Etkin and Reid 1996, sec. 6.8). */
  @Test
  void theSpiralChangesSignAtItsBoundary() {
    for (long seed = 0; seed < 50; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      LateralDerivatives d = any.data().derivatives();
      double boundary =
          d.value(Coefficient.CL_BETA) * d.value(Coefficient.CN_R) / d.value(Coefficient.CN_BETA);
      assertThat(spiral(any, boundary)).isCloseTo(0, within(1e-9));
      assertThat(spiral(any, 1.1 * boundary)).isPositive();
      assertThat(spiral(any, 0.9 * boundary)).isNegative();
    }
  }

  private static double spiral(RandomAeroplane any, double rollDueToYaw) {
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient c : Coefficient.values()) {
      values.put(c, any.data().derivatives().value(c));
    }
    values.put(Coefficient.CL_R, rollDueToYaw);
    return LateralModes.of(
            LateralMotion.of(
                SlipTreatment.FREE, model(any, LateralDerivatives.ofGiven(values, "test"))))
        .spiral()
        .orElseThrow()
        .root();
  }

  @Test
  void heldSlipHasTheDampingRootAndNoReturn() {
    for (long seed = 0; seed < 50; seed++) {
      LateralModel model = model(RandomAeroplane.of(seed));
      LateralModes modes = LateralModes.of(LateralMotion.of(SlipTreatment.HELD, model));
      double lr = model.rollMoment().perYawRate() / model.inertia().roll();
      // λ² − L_p λ − L_r g/V = 0
      double lp = model.rollDampingRoot();
      double slow = 0.5 * (lp + Math.sqrt(lp * lp + 4 * lr * model.gravityOverSpeed()));
      assertThat(modes.roll().orElseThrow().root()).isCloseTo(lp - slow, within(1e-9));
      assertThat(modes.spiral().orElseThrow().root()).isCloseTo(slow, within(1e-9));
      assertThat(modes.dutchRoll()).isEmpty();
    }
  }
}
