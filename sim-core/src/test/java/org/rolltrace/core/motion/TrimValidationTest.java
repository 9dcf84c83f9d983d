package org.rolltrace.core.motion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.testing.RandomAeroplane;

class TrimValidationTest {
  /** P/Ω of 180 hp at 2700 rpm, N m: 180 · 745.69987158 W over 2700 · 2π/60 rad/s. */
  private static final double TORQUE = 180 * 745.69987158 / (2700 * 2 * Math.PI / 60);

  private static LateralModel torqueOnAWing(double aileronPower) {
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(Coefficient.CL_P, -0.47);
    values.put(Coefficient.CL_DA, aileronPower);
    return LateralModel.of(
        Aeroplane.builder("torque example", 10, 16, Inertia.ofRoll(1000)).build(),
        LateralDerivatives.ofGiven(values, "test"),
        FlightCondition.ofDensity(0, 1.225, AirspeedKind.TRUE, 60),
        new PropellerMoments(-TORQUE));
  }

  /**
   * A torque of 474.727 N m on a wing of 16 m², 10 m at 60 m/s and 1.225 kg/m³: Cl 0.00134560,
   * balanced by 0.5140 deg of aileron with Cl_δa 0.15, or rolling at 1.968 deg/s with Cl_p −0.47.
   * Derived by hand from Q = P/Ω and the definitions of the coefficients; digits as derived.
   */
  @Test
  void torqueOfAPropellerNeedsTheAileronWorkedByHand() {
    LateralModel model = torqueOnAWing(0.15);
    assertThat(TORQUE).isCloseTo(474.727, within(5e-4));
    assertThat(TORQUE / (0.5 * 1.225 * 60 * 60 * 16 * 10)).isCloseTo(0.00134560, within(5e-9));
    Trim trim =
        Trim.wingsLevel(
            SlipTreatment.HELD,
            model,
            Optional.of(ControlRun.of(Ailerons.of(0.3, 0.3))),
            Optional.empty());
    assertThat(Math.toDegrees(trim.aileron())).isCloseTo(0.5140, within(5e-5));
    assertThat(trim.stick().orElseThrow()).isCloseTo(trim.aileron() / 0.3, within(1e-15));
    double steady = -model.rollMoment().constant() / model.rollMoment().perRollRate();
    assertThat(Math.toDegrees(steady)).isCloseTo(-1.968, within(5e-4));
  }

  @Test
  void trimmedFreeFlightStaysTrimmed() {
    for (long seed = 0; seed < 100; seed++) {
      RandomAeroplane any = RandomAeroplane.of(seed);
      LateralModel model =
          LateralModel.of(
              any.data().aeroplane(),
              any.data().derivatives(),
              any.condition(),
              new PropellerMoments(-400));
      for (SlipTreatment slip : new SlipTreatment[] {SlipTreatment.FREE, SlipTreatment.SETTLED}) {
        Trim trim = Trim.wingsLevel(slip, model, Optional.empty(), Optional.empty());
        LateralMotion motion = LateralMotion.of(slip, model);
        double[] state = new double[motion.dimension()];
        if (state.length > 2) {
          state[LateralMotion.SIDESLIP] = trim.sideslip();
        }
        double[] rates = new double[state.length];
        motion.rates(0, state, trim.aileron(), trim.rudder(), rates);
        // accelerations that would move a wing by a second of arc in an hour
        assertThat(rates).containsExactly(new double[state.length], within(1e-11));
        assertThat(motion.sideslip(0, state, trim.aileron(), trim.rudder()))
            .isCloseTo(trim.sideslip(), within(1e-12));
        // a left-rolling torque is held with right aileron
        assertThat(trim.aileron()).isPositive();
      }
    }
  }

  @Test
  void trimBeyondAStopIsAnAnswer() {
    Trim trim =
        Trim.wingsLevel(
            SlipTreatment.HELD,
            torqueOnAWing(0.0111),
            Optional.of(ControlRun.of(Ailerons.of(Math.toRadians(6.2), Math.toRadians(6.2)))),
            Optional.empty());
    // 0.00134560/0.0111 rad = 6.946 deg of 6.2 deg: 112.03 %, and more than 112 % is needed
    assertThat(trim.shortfalls()).containsExactly("not enough aileron: 113 % needed");
  }

  @Test
  void singularTrimSaysWhy() {
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(
            () ->
                Trim.wingsLevel(
                    SlipTreatment.HELD, torqueOnAWing(0), Optional.empty(), Optional.empty()))
        .withMessageContaining("Cl_da is 0");
    RandomAeroplane any = RandomAeroplane.of(1);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    for (Coefficient c : Coefficient.values()) {
      values.put(c, any.data().derivatives().value(c));
    }
    values.put(Coefficient.CN_DR, 0.0);
    values.put(Coefficient.CL_DR, 0.0);
    values.put(Coefficient.CY_DR, 0.0);
    LateralModel model =
        LateralModel.of(
            any.data().aeroplane(),
            LateralDerivatives.ofGiven(values, "no rudder"),
            any.condition(),
            new PropellerMoments(-400));
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(
            () -> Trim.wingsLevel(SlipTreatment.FREE, model, Optional.empty(), Optional.empty()))
        .withMessageContaining("Cn_dr");
  }

  @Test
  void withoutUnevenMomentsAllIsNeutralEvenWithoutARudder() {
    Trim trim =
        Trim.wingsLevel(
            SlipTreatment.HELD,
            LateralModel.of(
                Aeroplane.builder("plain", 10, 16, Inertia.ofRoll(1000)).build(),
                LateralDerivatives.ofGiven(Map.of(), "none"),
                FlightCondition.ofDensity(0, 1.225, AirspeedKind.TRUE, 60),
                PropellerMoments.NONE),
            Optional.empty(),
            Optional.empty());
    assertThat(trim.aileron()).isZero();
    assertThat(trim.stick()).isEmpty();
  }
}
