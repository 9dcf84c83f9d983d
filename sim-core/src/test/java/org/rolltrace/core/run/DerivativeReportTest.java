package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.files.AeroplaneFile;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.run.DerivedFigure.Kind;
import org.rolltrace.core.scenario.AeroplaneData;

class DerivativeReportTest {
  private static final Path TOURER =
      Path.of("src/test/resources/files/aeroplanes/linnetfield-tourer.json");

  /** Of U.S. Standard Atmosphere 1976, sea level. */
  private static final double SEA_LEVEL_DENSITY = 1.225;

  private static final double GRAVITY = 9.80665;
  private static final double KNOT = 1852.0 / 3600;

  @TempDir Path folder;

  private static AskedCondition asked(double altitude, AirspeedKind kind, double speed, double n) {
    return new AskedCondition(
        OptionalDouble.of(altitude),
        Optional.of(new AskedCondition.Speed(kind, speed)),
        OptionalDouble.of(n));
  }

  private static DerivativeReport tourer(AskedCondition asked) {
    Map<String, AeroplaneData> all = new LinkedHashMap<>(AeroplaneFile.readAll(TOURER));
    AeroplaneData base = all.remove("");
    return DerivativeReport.of(base, all, asked.of(base));
  }

  private static DerivedAeroplane variant(DerivativeReport report, String name) {
    return report.variants().stream()
        .filter(one -> one.variant().equals(name))
        .findFirst()
        .orElseThrow();
  }

  private AeroplaneData read(String old, String changed) throws Exception {
    String text = Files.readString(TOURER);
    assertThat(text).contains(old);
    return AeroplaneFile.read(
        Files.writeString(folder.resolve("changed.json"), text.replace(old, changed)));
  }

  private AeroplaneData withoutCondition() throws Exception {
    return read(
        "\"validAt\": { \"pressureAltitude\": \"3000 ft\", \"trueAirspeed\": \"120 kt\" },", "");
  }

  private static double value(DerivedAeroplane derived, Kind kind) {
    return derived.figure(kind).value().orElseThrow();
  }

  @Test
  void theConditionOfTheSetIsTakenWhenNoneIsAskedFor() {
    DerivativeReport report = tourer(AskedCondition.NOTHING);
    FlightCondition condition = report.condition().condition().orElseThrow();
    assertThat(condition.trueAirspeed()).isCloseTo(120 * KNOT, within(1e-9));
    assertThat(condition.pressureAltitude()).isCloseTo(3000 * 0.3048, within(1e-9));
    assertThat(report.condition().basis()).contains("for which the given derivatives hold");
  }

  @Test
  void withoutAnyConditionTheSpeedIsThatForAPlainLiftCoefficientAtSeaLevel() throws Exception {
    AeroplaneData data = withoutCondition();
    ChosenCondition chosen = AskedCondition.NOTHING.of(data);
    double speed = chosen.condition().orElseThrow().trueAirspeed();
    // CL = m g/(½ ρ V² S)
    assertThat(
            980 * GRAVITY / (0.5 * SEA_LEVEL_DENSITY * speed * speed * data.aeroplane().wingArea()))
        .isCloseTo(0.4, within(1e-4)); // the density of the standard is rounded
    assertThat(chosen.basis()).contains("lift coefficient of 0.4").contains("sea level");
  }

  @Test
  void heightAloneKeepsTheEquivalentAirspeed() throws Exception {
    AskedCondition high =
        new AskedCondition(OptionalDouble.of(4000), Optional.empty(), OptionalDouble.empty());
    for (AeroplaneData data : List.of(AeroplaneFile.read(TOURER), withoutCondition())) {
      FlightCondition usual = AskedCondition.NOTHING.of(data).condition().orElseThrow();
      FlightCondition there = high.of(data).condition().orElseThrow();
      assertThat(there.equivalentAirspeed()).isCloseTo(usual.equivalentAirspeed(), within(1e-9));
      assertThat(there.pressureAltitude()).isEqualTo(4000);
      assertThat(there.loadFactor()).isEqualTo(1);
    }
  }

  @Test
  void allThatIsAskedForIsTaken() {
    for (AirspeedKind kind : AirspeedKind.values()) {
      FlightCondition condition =
          asked(2000, kind, 55, 2.5).of(AeroplaneFile.read(TOURER)).condition().orElseThrow();
      double speed =
          switch (kind) {
            case TRUE -> condition.trueAirspeed();
            case EQUIVALENT -> condition.equivalentAirspeed();
            case CALIBRATED -> condition.calibratedAirspeed();
          };
      assertThat(speed).isCloseTo(55, within(1e-6));
      assertThat(condition.loadFactor()).isEqualTo(2.5);
    }
  }

  @Test
  void whatCannotBeFlownIsRefused() {
    AeroplaneData data = AeroplaneFile.read(TOURER);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> asked(99_000, AirspeedKind.TRUE, 50, 1).of(data));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> asked(0, AirspeedKind.TRUE, 400, 1).of(data));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> asked(0, AirspeedKind.TRUE, 50, Double.NaN).of(data));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new AskedCondition.Speed(AirspeedKind.TRUE, Double.NaN));
  }

  @Test
  void withoutMassAndConditionThereIsNone() throws Exception {
    Path file =
        Files.writeString(
            folder.resolve("bare.json"),
            """
            { "format": "rolltrace-aeroplane/1", "span": "10 m", "wingArea": "15 m2",
              "inertia": { "roll": "1000 kg m2" },
              "derivatives": { "values": { "Cl_p": -0.4, "Cl_da": 0.1 } } }
            """);
    AeroplaneData data = AeroplaneFile.read(file);
    DerivativeReport report = DerivativeReport.of(data, Map.of(), AskedCondition.NOTHING.of(data));
    assertThat(report.condition().condition()).isEmpty();
    assertThat(report.base().figure(Kind.ROLL_TIME_CONSTANT).reason()).contains("no condition");
    assertThat(report.cautions())
        .anyMatch(caution -> caution.contains("taken as 0: CY_beta, Cl_beta, Cn_beta, Cn_r"));
  }

  /**
   * Closed forms of the roll about one axis: T = −4 Ixx/(ρ V S b² Cl_p), pb/2V = −Cl_da δa/Cl_p.
   */
  @Test
  void timeConstantAndHelixAngleAreThoseOfTheRollAlone() {
    DerivedAeroplane base = tourer(asked(0, AirspeedKind.TRUE, 60, 1)).base();
    double damping = base.data().derivatives().value(Coefficient.CL_P);
    double power = base.data().derivatives().value(Coefficient.CL_DA);
    double span = 9.4;
    // Standard radius of gyration of the estimate, 0.25 b/2 (J. Roskam, from memory).
    double inertia = 980 * Math.pow(0.125 * span, 2);
    double area = 2 * (1.6 * 1.75 + 3.1 * 1.4);
    assertThat(value(base, Kind.ROLL_TIME_CONSTANT))
        .isCloseTo(
            -4 * inertia / (SEA_LEVEL_DENSITY * 60 * area * span * span * damping),
            Percentage.withPercentage(0.01)); // the density of the standard is rounded
    double helix = -power * Math.toRadians(20) / damping;
    assertThat(value(base, Kind.FULL_HELIX_ANGLE)).isCloseTo(helix, within(1e-12));
    assertThat(value(base, Kind.FULL_ROLL_RATE)).isCloseTo(helix * 120 / span, within(1e-12));
  }

  @Test
  void aGivenValueWinsAndTheEstimateStandsBesideIt() {
    DerivedAeroplane base = tourer(AskedCondition.NOTHING).base();
    assertThat(base.data().derivatives().origin(Coefficient.CN_BETA)).isEqualTo(Origin.SET);
    assertThat(base.data().derivatives().value(Coefficient.CN_BETA)).isEqualTo(0.085);
    assertThat(base.data().derivatives().estimate(Coefficient.CN_BETA).orElseThrow().value())
        .isNotCloseTo(0.085, within(0.01));
  }

  @Test
  void aVariantChangesWhatItNamesAndWhatFollows() {
    DerivativeReport report = tourer(AskedCondition.NOTHING);
    DerivedAeroplane fin = variant(report, "larger fin");
    assertThat(fin.differsFrom(report.base())).containsExactly("fin");
    List<String> changed = report.changes(fin).stream().map(FigureChange::name).toList();
    assertThat(changed)
        .contains("CY_beta", "Cn_r", "dutchRollDampingRatio")
        .doesNotContain("Cl_da", "span", "liftSlope", "Cn_beta"); // given, and so the same
    FigureChange area =
        report.changes(variant(report, "clipped tips")).stream()
            .filter(change -> change.name().equals("span"))
            .findFirst()
            .orElseThrow();
    assertThat(area.difference().orElseThrow()).isCloseTo(-0.6, within(1e-12));
    assertThat(area.relative().orElseThrow()).isCloseTo(-0.6 / 9.4, within(1e-12));
  }

  @Test
  void aVariantThatChangesNoNumberSaysWhatItChanges() {
    DerivativeReport report = tourer(AskedCondition.NOTHING);
    DerivedAeroplane limits = variant(report, "lower limit");
    assertThat(report.changes(limits)).isEmpty();
    assertThat(limits.differsFrom(report.base())).containsExactly("limits");
  }

  @Test
  void aChangeFromNothingHasNoPercentage() {
    FigureChange change =
        new FigureChange("Cl_beta", "Cl_beta", "1", OptionalDouble.of(0), OptionalDouble.of(-0.1));
    assertThat(change.difference().orElseThrow()).isEqualTo(-0.1);
    assertThat(change.relative()).isEmpty();
    assertThat(
            new FigureChange("m", "m", "kg", OptionalDouble.empty(), OptionalDouble.of(1))
                .difference())
        .isEmpty();
  }

  @Test
  void cautionsNameWhatWasEstimatedAndTheirVariant() throws Exception {
    DerivativeReport report = tourer(AskedCondition.NOTHING);
    assertThat(report.cautions())
        .anyMatch(caution -> caution.startsWith("estimated from the shape and never checked"))
        .anyMatch(caution -> caution.contains("radii of gyration"))
        .noneMatch(caution -> caution.startsWith("larger fin:"));
    assertThat(tourer(asked(0, AirspeedKind.TRUE, 15, 1)).cautions())
        .anyMatch(caution -> caution.contains("beyond what a plain wing carries"))
        .anyMatch(caution -> caution.contains("flown off their condition"));
    AeroplaneData wrongSign = read("\"Cn_beta\": 0.085", "\"Cn_beta\": -0.085");
    assertThat(
            DerivativeReport.of(wrongSign, Map.of(), AskedCondition.NOTHING.of(wrongSign))
                .cautions())
        .anyMatch(caution -> caution.contains("opposite signs") && caution.endsWith("Cn_beta"));
    assertThat(report.cautions()).noneMatch(caution -> caution.contains("opposite signs"));
  }

  @Test
  void beyondTheRangeOfTheTheoryEstimatesAreMarked() {
    DerivativeReport fast = tourer(asked(0, AirspeedKind.TRUE, 270, 1));
    assertThat(
            fast.base()
                .data()
                .derivatives()
                .estimate(Coefficient.CL_P)
                .orElseThrow()
                .extrapolated())
        .contains("Mach");
    assertThat(fast.cautions()).anyMatch(caution -> caution.contains("extrapolated: Mach 0.79"));
  }

  @Test
  void whatIsNotFiniteFails() throws Exception {
    AeroplaneData data = read("\"profileDrag\": 0.009", "\"profileDrag\": 1.7e308");
    ChosenCondition condition = AskedCondition.NOTHING.of(data);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> DerivativeReport.of(data, Map.of(), condition))
        .withMessageContaining("Cn_r of Linnetfield tourer");
  }
}
