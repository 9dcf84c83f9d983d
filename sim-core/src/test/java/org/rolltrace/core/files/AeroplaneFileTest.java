package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.Limits;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.scenario.AeroplaneData;

class AeroplaneFileTest {
  /** Rounding of a few products of numbers that are exact to the last bit. */
  private static final Percentage ROUNDING = Percentage.withPercentage(1e-12);

  @TempDir Path directory;

  private AeroplaneData read(String text) {
    return AeroplaneFile.read(Samples.write(directory, "aeroplane.json", text));
  }

  @Test
  void readsTheExampleOfTheFormat() {
    AeroplaneData data = read(Samples.AEROPLANE);

    assertThat(data.aeroplane().name()).isEqualTo("Light single of a textbook");
    assertThat(data.aeroplane().span()).isCloseTo(33.4 * 0.3048, ROUNDING);
    assertThat(data.aeroplane().wingArea()).isCloseTo(184 * 0.3048 * 0.3048, ROUNDING);
    assertThat(data.aeroplane().mass().orElseThrow()).isCloseTo(2750 * 0.45359237, ROUNDING);
    // The slug is lb × g in ft/s2, standard gravity (international pound and foot of 1959).
    double slugFoot2 = 0.45359237 * 9.80665 / 0.3048 * 0.3048 * 0.3048;
    assertThat(data.aeroplane().inertia().roll()).isCloseTo(1048 * slugFoot2, ROUNDING);
    assertThat(data.aeroplane().inertia().yaw().orElseThrow())
        .isCloseTo(3530 * slugFoot2, ROUNDING);
    assertThat(data.aeroplane().inertia().product()).isZero();
    assertThat(data.aeroplane().ailerons().orElseThrow().up())
        .isCloseTo(Math.toRadians(20), ROUNDING);
    assertThat(data.aeroplane().rudder().orElseThrow().dynamics())
        .isEqualTo(SurfaceDynamics.DIRECT);
    assertThat(data.aeroplane().limits()).isEqualTo(Limits.NONE);
    assertThat(data.derivatives().source()).isEqualTo("where they are from");
    assertThat(data.derivatives().validAt()).isEmpty();
    assertThat(data.derivatives().value(Coefficient.CL_P)).isEqualTo(-0.41);
    assertThat(data.derivatives().value(Coefficient.CN_DR)).isEqualTo(-0.072);
    assertThat(data.derivatives().absentAmong(List.of(Coefficient.values())))
        .containsExactly(Coefficient.CY_P, Coefficient.CY_R, Coefficient.CY_DA);
  }

  @Test
  void readsEveryKey() {
    AeroplaneData data = read(Samples.AEROPLANE_WITH_EVERY_KEY);

    assertThat(data.aeroplane().span()).isEqualTo(10);
    assertThat(data.aeroplane().wingArea()).isEqualTo(15);
    assertThat(data.aeroplane().mass()).hasValue(1000);
    assertThat(data.aeroplane().inertia()).isEqualTo(Inertia.of(1000, 2500, -100));
    assertThat(data.aeroplane().ailerons())
        .contains(new Ailerons(Math.PI / 2, 0, new SurfaceDynamics(1, 0.05)));
    assertThat(data.aeroplane().rudder()).contains(new Rudder(0.4, 0.5, new SurfaceDynamics(2, 0)));
    assertThat(data.aeroplane().limits())
        .isEqualTo(
            new Limits(
                OptionalDouble.of(50),
                OptionalDouble.of(80),
                OptionalDouble.of(2.5),
                OptionalDouble.of(1.5),
                OptionalDouble.of(1)));
    FlightCondition validAt = data.derivatives().validAt().orElseThrow();
    assertThat(validAt.pressureAltitude()).isEqualTo(1000);
    assertThat(validAt.density()).isEqualTo(1.1);
    assertThat(validAt.equivalentAirspeed()).isEqualTo(60);
    assertThat(validAt.loadFactor()).isEqualTo(1.2);
    assertThat(validAt.flightPathAngle()).isEqualTo(-0.05);
  }

  @Test
  void printedDerivativesBecomeThoseOfTheModel() {
    LateralDerivatives set = read(Samples.AEROPLANE_WITH_EVERY_KEY).derivatives();
    double perRadian = 180 / Math.PI;

    // By degree and by rates: angles are converted, rates are not.
    assertThat(set.value(Coefficient.CL_BETA)).isCloseTo(-0.001 * perRadian, ROUNDING);
    assertThat(set.value(Coefficient.CN_DR)).isCloseTo(-0.001 * perRadian, ROUNDING);
    assertThat(set.value(Coefficient.CL_P)).isEqualTo(-0.5);
    // By the total of both ailerons, positive to the left: twice the value, other sign.
    assertThat(set.value(Coefficient.CL_DA)).isCloseTo(0.004 * perRadian, ROUNDING);
    assertThat(set.value(Coefficient.CN_DA)).isCloseTo(-0.0002 * perRadian, ROUNDING);
    assertThat(set.value(Coefficient.CY_DA)).isCloseTo(-0.002 * perRadian, ROUNDING);
  }

  @Test
  void theAngleOfOneSideIsThatOfBothWhenTheyMoveAlike() {
    String text =
        Samples.with(
            Samples.with(Samples.AEROPLANE_WITH_EVERY_KEY, "\"total\"", "\"one-side\""),
            "\"left-roll-positive\"",
            "\"right-roll-positive\"");
    assertThat(read(text).derivatives().value(Coefficient.CL_DA))
        .isCloseTo(-0.002 * 180 / Math.PI, within(1e-15));
  }

  @Test
  void unitsMayBePutTogether() {
    String text = Samples.with(Samples.AEROPLANE, "\"184 ft2\"", "\"184   ft*ft\"");
    assertThat(read(text).aeroplane().wingArea()).isCloseTo(184 * 0.3048 * 0.3048, ROUNDING);
  }
}
