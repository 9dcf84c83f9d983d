package org.rolltrace.core.propeller;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;

/**
 * Torque, thrust and angular momentum against numbers worked out by hand from their definitions and
 * the exact definitions of the units; digits as derived.
 */
class PropellerValidationTest {
  private static double si(String text, Dimension dimension) {
    return Quantity.parse(text, dimension);
  }

  private static TurningPropeller propeller(String power, String speed, Rotation rotation) {
    return TurningPropeller.of(
        Propeller.builder("p", rotation, Engine.of(si(power, Dimension.POWER)))
            .speed(si(speed, Dimension.ANGULAR_RATE))
            .build(),
        60);
  }

  /** Q = P/Ω; in lbf ft, 5252.113 hp/rpm. */
  @ParameterizedTest
  @CsvSource({
    "180 hp, 2700 rpm, 474.727, 350.141, 5e-4",
    "1000 hp, 1200 rpm, 5934.09, 4376.76, 5e-3",
    "1500 kW, 1300 rpm, 11018.42, , 5e-3"
  })
  void torque(String power, String speed, double newtonMetres, Double footPounds, double digits) {
    TurningPropeller propeller = propeller(power, speed, Rotation.CLOCKWISE);
    assertThat(propeller.torque(1)).isCloseTo(newtonMetres, within(digits));
    if (footPounds != null) {
      assertThat(Quantity.toUnit(propeller.torque(1), "lbf ft"))
          .isCloseTo(footPounds, within(digits));
    }
    // action and reaction: a propeller that turns clockwise seen from behind rolls it left
    assertThat(propeller.rollMoment(1, 0)).isEqualTo(-propeller.torque(1));
  }

  /** T = 325.87 η P/V in lbf, hp and kt; the handbook of the flight test engineers prints 326. */
  @Test
  void thrust() {
    TurningPropeller propeller =
        TurningPropeller.of(
            Propeller.builder("p", Rotation.CLOCKWISE, Engine.of(si("180 hp", Dimension.POWER)))
                .speed(si("2700 rpm", Dimension.ANGULAR_RATE))
                .efficiency(0.8)
                .build(),
            si("120 kt", Dimension.SPEED));
    double expected = 325.87 * 0.8 * 180 / 120;
    // five digits of the constant
    assertThat(Quantity.toUnit(propeller.thrust(1).orElseThrow(), "lbf"))
        .isCloseTo(expected, within(expected * 2e-5));
  }

  /** h = J Ω: 1.5 kg m² at 2700 rpm has 424.115 N m s. */
  @Test
  void angularMomentum() {
    Propeller propeller =
        Propeller.builder("p", Rotation.CLOCKWISE, Engine.of(1))
            .inertia(1.5)
            .speed(si("2700 rpm", Dimension.ANGULAR_RATE))
            .build();
    assertThat(propeller.momentumPerSpeed() * propeller.speed().orElseThrow())
        .isCloseTo(424.115, within(5e-4));
  }

  /** L = −J dΩ/dt on the airframe, beside the torque: the sum of both about x is external only. */
  @Test
  void spinUp() {
    TurningPropeller still =
        TurningPropeller.of(
            Propeller.builder(
                    "p", Rotation.CLOCKWISE, new Engine(134_226, 0.5, 1, 0, Rotation.CLOCKWISE))
                .speed(si("2700 rpm", Dimension.ANGULAR_RATE))
                .speedWithoutPower(1e-3)
                .inertia(1.5)
                .build(),
            60);
    // Ω ∝ P^(1/3), so dΩ/dt = Ω/3 · dP/dt/P: at full power, growing by a fifth a second, 18.8496
    // rad/s² = 2700 rpm · 0.2/3
    assertThat(still.speedRate(1, 0.2)).isCloseTo(18.8496, within(5e-5));
    assertThat(still.rollMoment(1, 0.2) - still.rollMoment(1, 0))
        .isCloseTo(-1.5 * 18.8496, within(1e-4));
  }
}
