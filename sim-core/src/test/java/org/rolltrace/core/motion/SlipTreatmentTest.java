package org.rolltrace.core.motion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.propeller.AddedMoments;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.testing.RandomAeroplane;
import org.rolltrace.core.testing.Scenarios;

/** The equations against themselves, written out another way. */
class SlipTreatmentTest {
  private static LateralModel model(long seed, double climb) {
    RandomAeroplane any = RandomAeroplane.of(seed);
    return LateralModel.of(
        any.data().aeroplane(),
        any.data().derivatives(),
        any.condition().withFlightPathAngle(climb),
        new PropellerMoments(-300));
  }

  private static double[] randomState(Random random, int size) {
    return random.doubles(size, -0.4, 0.4).toArray();
  }

  @Test
  void freeSlipSolvesTheInertiaMatrix() {
    Random random = new Random(1);
    for (long seed = 0; seed < 50; seed++) {
      LateralModel m = model(seed, 0);
      double[] x = randomState(random, 4);
      double[] rates = new double[4];
      double da = 0.2;
      double dr = -0.1;
      LateralMotion.of(SlipTreatment.FREE, m).rates(0, x, da, dr, rates);
      double l = m.rollMoment().at(x[2], x[1], x[3], da, dr);
      double n = m.yawMoment().at(x[2], x[1], x[3], da, dr);
      double ixx = m.inertia().roll();
      double izz = m.inertia().yaw().orElseThrow();
      double ixz = m.inertia().product();
      // relative to the size of the moments
      double size = Math.abs(l) + Math.abs(n);
      assertThat(ixx * rates[1] - ixz * rates[3]).isCloseTo(l, within(1e-12 * size));
      assertThat(-ixz * rates[1] + izz * rates[3]).isCloseTo(n, within(1e-12 * size));
      double mv = m.mass().orElseThrow() * m.speed();
      double y = m.sideForce().at(x[2], x[1], x[3], da, dr);
      assertThat(rates[2])
          .isCloseTo(y / mv + 9.80665 / m.speed() * Math.sin(x[0]) - x[3], within(1e-12));
      assertThat(rates[0]).isEqualTo(x[1]);
    }
  }

  @Test
  void settledSlipLeavesNoSideForceAndNoYawingMoment() {
    Random random = new Random(2);
    for (long seed = 0; seed < 50; seed++) {
      LateralModel m = model(seed, 0.1);
      LateralMotion settled = LateralMotion.of(SlipTreatment.SETTLED, m);
      double[] x = randomState(random, 2);
      double da = 0.2;
      double dr = -0.1;
      double slip = settled.sideslip(0, x, da, dr);
      double r = settled.yawRate(0, x, da, dr);
      double mv = m.mass().orElseThrow() * m.speed();
      double weight = m.mass().orElseThrow() * 9.80665 * Math.cos(0.1) * Math.sin(x[0]);
      double side = m.sideForce().at(slip, x[1], r, da, dr) + weight - mv * r;
      assertThat(side).isCloseTo(0, within(1e-9 * m.mass().orElseThrow()));
      double yaw = m.yawMoment().at(slip, x[1], r, da, dr);
      assertThat(yaw).isCloseTo(0, within(1e-9 * m.inertia().roll()));
      double[] rates = new double[2];
      settled.rates(0, x, da, dr, rates);
      double l = m.rollMoment().at(slip, x[1], r, da, dr);
      assertThat(rates[1] * m.inertia().roll()).isCloseTo(l, within(1e-9 * m.inertia().roll()));
    }
  }

  @Test
  void heldSlipTurnsWithTheBank() {
    LateralModel m = model(4, 0);
    LateralMotion held = LateralMotion.of(SlipTreatment.HELD, m);
    double[] x = {0.6, 0.3};
    assertThat(held.sideslip(0, x, 0.1, 0.1)).isZero();
    assertThat(held.yawRate(0, x, 0.1, 0.1))
        .isCloseTo(9.80665 / m.speed() * Math.sin(0.6), within(1e-15));
  }

  @ParameterizedTest
  @EnumSource(SlipTreatment.class)
  void theLinearisedEquationsAreTheSlopesOfTheFullOnes(SlipTreatment slip) {
    for (long seed = 0; seed < 20; seed++) {
      for (double climb : new double[] {0, 0.2, -0.1}) {
        LateralMotion motion = LateralMotion.of(slip, model(seed, climb));
        double[][] a = motion.linearised();
        int n = motion.dimension();
        double step = 1e-5;
        for (int j = 0; j < n; j++) {
          double[] plus = new double[n];
          double[] minus = new double[n];
          plus[j] = step;
          minus[j] = -step;
          double[] up = new double[n];
          double[] down = new double[n];
          motion.rates(0, plus, 0, 0, up);
          motion.rates(0, minus, 0, 0, down);
          for (int i = 0; i < n; i++) {
            // central difference: error of the order of step², times slopes up to some 30
            assertThat((up[i] - down[i]) / (2 * step)).isCloseTo(a[i][j], within(1e-7));
          }
        }
      }
    }
  }

  @Test
  void theRudderThatHoldsTheSlipBalancesTheYaw() {
    RandomAeroplane any = RandomAeroplane.of(11);
    LateralModel m =
        LateralModel.of(
            any.data().aeroplane(),
            any.data().derivatives(),
            any.condition(),
            PropellerMoments.NONE);
    HeldSlip held = (HeldSlip) LateralMotion.of(SlipTreatment.HELD, m);
    double[] x = {0.5, 0.4};
    double[] rates = new double[2];
    held.rates(0, x, 0.1, 0, rates);
    double rudder =
        held.rudderToHold(x, 0, held.yawRate(0, x, 0.1, 0), rates[1], 0.1, new AddedMoments());
    double r = held.yawRate(0, x, 0.1, 0);
    double yawAcceleration = 9.80665 / m.speed() * Math.cos(0.5) * 0.4;
    double n = m.yawMoment().at(0, 0.4, r, 0.1, rudder);
    double needed =
        m.inertia().yaw().orElseThrow() * yawAcceleration - m.inertia().product() * rates[1];
    assertThat(n).isCloseTo(needed, within(1e-9 * m.inertia().roll()));
  }

  private static final HeldSideslip LED_IN =
      HeldSideslip.of(List.of(new HeldSideslip.Point(1, 0), new HeldSideslip.Point(2, 0.1)));

  @Test
  void aSlipHeldAgainstTimeTurnsAndRollsTheAeroplane() {
    LateralModel m = model(12, 0.1);
    HeldSlip held = LateralMotion.holding(m, LED_IN);
    double[] x = {0.4, -0.2};
    // half way in: β = 0.05, β̇ = 0.1
    double r =
        9.80665 / m.speed() * Math.sin(0.4) * Math.cos(0.1)
            + m.sideForce().perSideslip() * 0.05 / (m.mass().orElseThrow() * m.speed())
            - 0.1;
    assertThat(held.sideslip(1.5, x, 0.1, 0.2)).isCloseTo(0.05, within(1e-12));
    assertThat(held.yawRate(1.5, x, 0.1, 0.2)).isCloseTo(r, within(1e-12));
    double[] rates = new double[2];
    held.rates(1.5, x, 0.1, 0.2, rates);
    double moment = m.rollMoment().at(0.05, -0.2, r, 0.1, 0.2);
    assertThat(rates[1] * m.inertia().roll()).isCloseTo(moment, within(1e-12 * m.inertia().roll()));
    // before, it is the plain held slip
    double[] plain = new double[2];
    LateralMotion.of(SlipTreatment.HELD, m).rates(0, x, 0.1, 0.2, plain);
    held.rates(0.9, x, 0.1, 0.2, rates);
    assertThat(rates).containsExactly(plain);
  }

  /** ṙ by a difference along the motion, instead of by the formula. */
  @Test
  void theRudderThatHoldsASlipAgainstTimeBalancesTheYaw() {
    LateralModel m = model(13, 0);
    HeldSlip held = LateralMotion.holding(m, LED_IN);
    double[] x = {0.5, 0.4};
    AddedMoments added = new AddedMoments();
    for (double t : new double[] {1.5, 3}) {
      added.set(-40 * t, 70);
      double[] rates = new double[2];
      held.rates(t, x, 0.1, 0, added, rates);
      double h = 1e-5;
      double[] after = {x[0] + h * rates[0], x[1] + h * rates[1]};
      double[] before = {x[0] - h * rates[0], x[1] - h * rates[1]};
      double yawAcceleration =
          (held.yawRate(t + h, after, 0.1, 0) - held.yawRate(t - h, before, 0.1, 0)) / (2 * h);
      double rudder =
          held.rudderToHold(
              x, held.sideslip(t, x, 0.1, 0), held.yawRate(t, x, 0.1, 0), rates[1], 0.1, added);
      double n =
          m.yawMoment().at(held.sideslip(t, x, 0, 0), 0.4, held.yawRate(t, x, 0, 0), 0.1, rudder)
              + 70;
      double needed =
          m.inertia().yaw().orElseThrow() * yawAcceleration - m.inertia().product() * rates[1];
      // the difference: rounding of 1e-16/h, and h² times slopes of order one
      assertThat(n).isCloseTo(needed, within(1e-8 * m.inertia().yaw().orElseThrow()));
    }
  }

  @Test
  void aSlipHeldAgainstTimeNeedsTheMass() {
    LateralModel bare =
        LateralModel.of(
            Scenarios.oneDegree(0.4, 8).aeroplane(),
            Scenarios.oneDegree(0.4, 8).derivatives(),
            Scenarios.seaLevel(50),
            PropellerMoments.NONE);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> LateralMotion.holding(bare, LED_IN))
        .withMessageContaining("mass");
  }

  @Test
  void settledAndFreeNeedMassAndYawInertia() {
    LateralModel bare =
        LateralModel.of(
            Scenarios.oneDegree(0.4, 8).aeroplane(),
            Scenarios.oneDegree(0.4, 8).derivatives(),
            Scenarios.seaLevel(50),
            PropellerMoments.NONE);
    for (SlipTreatment slip : new SlipTreatment[] {SlipTreatment.SETTLED, SlipTreatment.FREE}) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> LateralMotion.of(slip, bare))
          .withMessageContaining("missing: mass and yaw inertia");
    }
  }

  @Test
  void settledSlipThatNothingDeterminesSaysSo() {
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, -0.4);
    values.put(Coefficient.CL_DA, 0.2);
    Aeroplane aeroplane =
        Aeroplane.builder("no fin", 10, 15, Inertia.of(1000, 2000, 0)).mass(800).build();
    LateralModel model =
        LateralModel.of(
            aeroplane,
            LateralDerivatives.ofGiven(values, "test"),
            Scenarios.seaLevel(50),
            PropellerMoments.NONE);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> LateralMotion.of(SlipTreatment.SETTLED, model))
        .withMessageContaining("give Cn_beta");
  }
}
