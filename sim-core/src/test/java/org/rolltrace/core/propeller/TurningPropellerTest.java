package org.rolltrace.core.propeller;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.Position;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.testing.Scenarios;

class TurningPropellerTest {
  private static Propeller.Builder fixedPitch(double without, double engineInertia) {
    return Propeller.builder(
            "p",
            Rotation.CLOCKWISE,
            new Engine(75_000, 0.4, 2, engineInertia, Rotation.ANTICLOCKWISE))
        .speed(250)
        .speedWithoutPower(without);
  }

  /** (Ω³ − Ω₀³)/(Ω_r³ − Ω₀³) = P/P_r, the law that the package page states. */
  @ParameterizedTest
  @ValueSource(doubles = {0, 0.1, 0.5, 0.9, 1})
  void speedOfFixedPitchFollowsItsLaw(double share) {
    TurningPropeller propeller = TurningPropeller.of(fixedPitch(0.6, 0).build(), 50);
    double slow = Math.pow(150, 3);
    double cube = Math.pow(propeller.speed(share), 3);
    assertThat((cube - slow) / (Math.pow(250, 3) - slow)).isCloseTo(share, within(1e-14));
    // the slope is that of the law: a difference over h = 1e-5, whose error is h²
    double h = 1e-5;
    double slope = (propeller.speed(share + h) - propeller.speed(share - h)) / (2 * h);
    assertThat(propeller.speedRate(share, 3)).isCloseTo(3 * slope, within(1e-5 * slope));
  }

  @Test
  void speedKnownAtSomePowerFixesTheLaw() {
    Propeller propeller = fixedPitch(0.6, 0).build();
    double atThird = TurningPropeller.of(propeller, 50).speed(1.0 / 3);
    TurningPropeller other = TurningPropeller.of(propeller, 50, atThird, 1.0 / 3);
    assertThat(other.speed(1)).isCloseTo(250, within(1e-12));
    assertThat(other.speed(0)).isCloseTo(150, within(1e-12));
  }

  @Test
  void aGovernorKeepsTheSpeed() {
    TurningPropeller propeller =
        TurningPropeller.of(
            Propeller.builder(
                    "p", Rotation.CLOCKWISE, new Engine(75_000, 1, 1, 5, Rotation.CLOCKWISE))
                .inertia(9)
                .build(),
            50,
            240,
            0.3);
    for (double share : new double[] {0, 0.3, 1}) {
      assertThat(propeller.speed(share)).isEqualTo(240);
      assertThat(propeller.speedRate(share, 1)).isZero();
      assertThat(propeller.rollMoment(share, 1)).isEqualTo(-propeller.torque(share));
      assertThat(propeller.torque(share)).isCloseTo(75_000 * share / 240, within(1e-12));
    }
  }

  /** An engine that is geared to turn the other way takes some of the propeller's momentum back. */
  @Test
  void everyPartCountsWithItsSenseAndSpeed() {
    Propeller propeller = fixedPitch(0.6, 0.2).inertia(1.5).build();
    // 1.5 clockwise, and 0.2 at twice the speed anticlockwise
    assertThat(propeller.momentumPerSpeed()).isCloseTo(1.1, within(1e-15));
    TurningPropeller turning = TurningPropeller.of(propeller, 50);
    assertThat(turning.rollMoment(0.5, 0.7))
        .isCloseTo(-turning.torque(0.5) - 1.1 * turning.speedRate(0.5, 0.7), within(1e-11));
  }

  @Test
  void theOtherWayRoundAllIsMirroredAndContraRotationHasNone() {
    for (long seed = 0; seed < 20; seed++) {
      Random random = new Random(seed);
      double kappa = random.nextDouble();
      double share = random.nextDouble();
      double rate = random.nextDouble() - 0.5;
      double[] moments = new double[3];
      Rotation[] rotations = Rotation.values();
      for (int i = 0; i < 3; i++) {
        moments[i] =
            TurningPropeller.of(
                    Propeller.builder("p", rotations[i], new Engine(1e5, 0.4, 1, 0.3, rotations[i]))
                        .speed(250)
                        .speedWithoutPower(0.5)
                        .inertia(1.5)
                        .straightened(kappa)
                        .build(),
                    50)
                .rollMoment(share, rate);
      }
      assertThat(moments[1]).isEqualTo(-moments[0]);
      assertThat(moments[2]).isZero();
      assertThat(moments[0]).isNotZero();
    }
  }

  /** All of the rotation straightened: wing and fuselage give all of the torque back. */
  @Test
  void whatIsStraightenedGivesTorqueBack() {
    for (double kappa : new double[] {0, 0.25, 1}) {
      TurningPropeller propeller =
          TurningPropeller.of(
              Propeller.builder("p", Rotation.CLOCKWISE, Engine.of(1e5))
                  .speed(250)
                  .straightened(kappa)
                  .build(),
              50);
      assertThat(propeller.rollMoment(1, 0)).isCloseTo(-400 * (1 - kappa), within(1e-12));
    }
  }

  /** The right of two propellers pulls the nose to the left, N = −T y (common practice). */
  @Test
  void thrustOffTheCentreLineYaws() {
    Propeller.Builder right =
        Propeller.builder("right", Rotation.CLOCKWISE, Engine.of(1e5))
            .speed(250)
            .position(new Position(1, 2.5, 0));
    TurningPropeller known = TurningPropeller.of(right.efficiency(0.8).build(), 50);
    assertThat(known.thrust(0.5)).hasValue(800);
    assertThat(known.yawMoment(0.5)).isCloseTo(-2000, within(1e-9));
    TurningPropeller unknown =
        TurningPropeller.of(
            Propeller.builder("right", Rotation.CLOCKWISE, Engine.of(1e5))
                .speed(250)
                .position(new Position(1, 2.5, 0))
                .build(),
            50);
    assertThat(unknown.thrust(0.5)).isEmpty();
    assertThat(unknown.yawMoment(0.5)).isZero();
  }

  private static Aeroplane twin(Rotation left, Rotation right) {
    Aeroplane.Builder builder = Aeroplane.builder("twin", 12, 20, Inertia.of(5000, 9000, 0));
    double side = -2.5;
    for (Rotation rotation : new Rotation[] {left, right}) {
      builder.propeller(
          Propeller.builder(side < 0 ? "left" : "right", rotation, Engine.of(1e5))
              .speed(250)
              .position(new Position(1, side, 0))
              .efficiency(0.8)
              .build());
      side = -side;
    }
    return builder.build();
  }

  @Test
  void propellersThatTurnAlikeAddUpAndOpposedOnesCancel() {
    PowerSetting half = PowerSetting.of(1e5);
    Propulsion alike =
        Propulsion.of(twin(Rotation.CLOCKWISE, Rotation.CLOCKWISE), Scenarios.seaLevel(50), half);
    assertThat(alike.share()).isEqualTo(0.5);
    assertThat(alike.moments().roll()).isCloseTo(-2 * 50_000 / 250.0, within(1e-10));
    assertThat(alike.moments().yaw()).isZero();
    assertThat(alike.moments(PowerSetting.of(2e5)).roll())
        .isCloseTo(2 * alike.moments().roll(), within(1e-10));
    Propulsion opposed =
        Propulsion.of(
            twin(Rotation.CLOCKWISE, Rotation.ANTICLOCKWISE), Scenarios.seaLevel(50), half);
    assertThat(opposed.moments()).isEqualTo(PropellerMoments.NONE);
  }

  @Test
  void whatCannotBeIsRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> TurningPropeller.of(twinless().build(), 50))
        .withMessageContaining("p has no speed");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> twinless().straightened(1.01).build())
        .withMessageContaining("straightened");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> twinless().efficiency(0).build())
        .withMessageContaining("efficiency");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> twinless().speedWithoutPower(0.5).build())
        .withMessageContaining("engine lag is 0 s");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> fixedPitch(Double.NaN, 0).build())
        .withMessageContaining("speed without power is NaN");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new Engine(1, 1e-5, 1, 0, Rotation.CLOCKWISE))
        .withMessageContaining("engine lag is 1.0E-5");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new PowerSetting(-1, OptionalDouble.empty()))
        .withMessageContaining("power, W, is -1.0");
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                Propulsion.of(
                    Aeroplane.builder("glider", 15, 12, Inertia.ofRoll(1000)).build(),
                    Scenarios.seaLevel(50),
                    PowerSetting.of(1)))
        .withMessageContaining("aeroplane with propellers");
    Aeroplane.Builder builder = Aeroplane.builder("a", 10, 15, Inertia.ofRoll(1000));
    assertThatIllegalArgumentException()
        .isThrownBy(
            () -> builder.propeller(twinless().build()).propeller(twinless().build()).build())
        .withMessageContaining("two propellers are called p");
    Aeroplane.Builder other = Aeroplane.builder("a", 10, 15, Inertia.ofRoll(1000));
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                other
                    .propeller(twinless().build())
                    .propeller(Propeller.builder("q", Rotation.CLOCKWISE, Engine.of(1)).build())
                    .build())
        .withMessageContaining("p and q are at one place");
  }

  private static Propeller.Builder twinless() {
    return Propeller.builder("p", Rotation.CLOCKWISE, Engine.of(1e5));
  }
}
