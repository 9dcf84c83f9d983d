package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Engine;
import org.rolltrace.core.aeroplane.Position;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rotation;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.StepInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.Start;

class ScenarioFileTest {
  @TempDir Path directory;

  private Scenario read(String text) {
    return ScenarioFile.read(Samples.writeScenario(directory, text));
  }

  @Test
  void readsTheExampleOfTheFormat() {
    Scenario scenario = read(Samples.SCENARIO);

    assertThat(scenario.title()).isEqualTo("Roll entry at cruise");
    assertThat(scenario.data().aeroplane().name()).isEqualTo("Light single of a textbook");
    // 3000 ft of 0.3048 m; 120 kt of 1852 m in 3600 s. Rounding of one product.
    assertThat(scenario.condition().pressureAltitude()).isCloseTo(914.4, within(1e-9));
    assertThat(scenario.condition().calibratedAirspeed())
        .isCloseTo(120 * 1852 / 3600.0, within(1e-12));
    assertThat(scenario.condition().temperatureOffset()).isZero();
    assertThat(scenario.condition().loadFactorGiven()).isFalse();
    assertThat(scenario.propeller()).isEqualTo(PropellerMoments.NONE);
    assertThat(scenario.slip()).isEqualTo(SlipTreatment.FREE);
    assertThat(scenario.start()).isEqualTo(new Start(PropellerMoments.NONE, Disturbance.NONE));
    assertThat(scenario.programme().inputs())
        .containsExactly(new PilotInput(Control.STICK, new StepInput(1, 1, 0.15)));
    assertThat(scenario.duration()).isEqualTo(10);
    assertThat(scenario.measures()).isEqualTo(MeasureOptions.DEFAULT);
  }

  @Test
  void readsEveryKey() {
    Scenario scenario = read(Samples.SCENARIO_WITH_EVERY_KEY);

    assertThat(scenario.data().aeroplane().name()).isEqualTo("Inline");
    assertThat(scenario.condition().pressureAltitude()).isEqualTo(1000);
    // 9 degF are 5 K; the offset comes back as a difference of two temperatures near 300 K.
    assertThat(scenario.condition().temperatureOffset()).isCloseTo(5, within(1e-12));
    assertThat(scenario.condition().trueAirspeed()).isEqualTo(60);
    assertThat(scenario.condition().loadFactor()).isEqualTo(1.5);
    assertThat(scenario.condition().flightPathAngle()).isEqualTo(0.1);
    assertThat(scenario.propeller()).isEqualTo(new PropellerMoments(-400));
    assertThat(scenario.start())
        .isEqualTo(new Start(new PropellerMoments(-100), new Disturbance(-0.2, 0.3, 0.05)));
    assertThat(scenario.programme().inputs())
        .containsExactly(
            new PilotInput(Control.STICK, new StepInput(0, -1, 0.1)),
            new PilotInput(Control.STICK, new HoldInput(1, 0.5, 2, 0)),
            new PilotInput(Control.PEDAL, new DoubletInput(4, -0.25, 0.5, 0.2)),
            new PilotInput(Control.STICK, new MultistepInput(7, 0.1, 0.4, List.of(2, 1, 1), 0.1)),
            new PilotInput(Control.STICK, new RampInput(9, 0.3, 3)),
            new PilotInput(
                Control.STICK, new SweepInput(12, 0.2, Math.PI, 6, 6, SweepInput.Law.LOGARITHMIC)),
            new PilotInput(
                Control.STICK,
                new TraceInput(
                    20,
                    -0.5,
                    Trace.of(
                        "traces/hand.csv",
                        "stick",
                        // the cuts fall half way between samples
                        new double[] {0.25, 0.5, 1, 1.25},
                        new double[] {0.125, 0.25, 1, 0.5}))));
    assertThat(scenario.programme().heldSideslip()).isSameAs(HeldSideslip.NONE);
    assertThat(scenario.duration()).isEqualTo(30);
    assertThat(scenario.measures().settlingBand()).isEqualTo(0.02);
    assertThat(scenario.measures().bankChanges())
        .containsExactly(30.0, 45.0, 50.0, 60.0, 90.0, 360.0);
  }

  @Test
  void readsPowerAndPropellers() {
    Scenario scenario = read(Samples.SCENARIO_WITH_POWER);
    double speed = 2400 * 2 * Math.PI / 60;
    assertThat(((PowerSetting) scenario.propeller()).power()).isEqualTo(90_000);
    assertThat(((PowerSetting) scenario.propeller()).speed().orElseThrow())
        .isCloseTo(speed, within(1e-12));
    assertThat(scenario.start().trimmedWith()).isEqualTo(PowerSetting.of(30_000));
    assertThat(scenario.programme().inputs())
        .containsExactly(new PilotInput(Control.POWER, new StepInput(1, 0.2, 0.1)));
    assertThat(scenario.data().aeroplane().propellers())
        .containsExactly(
            Propeller.builder("one", Rotation.CLOCKWISE, Engine.of(100_000))
                .position(new Position(0, -1, 0))
                .efficiency(0.8)
                .build(),
            Propeller.builder("two", Rotation.CLOCKWISE, Engine.of(50_000))
                .position(new Position(0, 1, 0))
                .efficiency(0.8)
                .build());
  }

  @Test
  void readsEveryKeyOfAPropeller() {
    Aeroplane aeroplane =
        AeroplaneFile.read(
                Samples.write(directory, "aeroplane.json", Samples.AEROPLANE_WITH_EVERY_KEY))
            .aeroplane();
    Propeller left = aeroplane.propellers().get(0);
    assertThat(left.speed().orElseThrow()).isCloseTo(2000 * 2 * Math.PI / 60, within(1e-12));
    assertThat(left)
        .isEqualTo(
            Propeller.builder(
                    "left",
                    Rotation.ANTICLOCKWISE,
                    new Engine(100_000, 0.5, 2.4, 0.1, Rotation.CLOCKWISE))
                .position(new Position(1, -2, -0.1))
                .speed(left.speed().orElseThrow())
                .speedWithoutPower(0.5)
                .inertia(2)
                .straightened(0.25)
                .efficiency(0.8)
                .diameter(2)
                .build());
    Propeller right = aeroplane.propellers().get(1);
    assertThat(right.rotation()).isEqualTo(Rotation.CONTRA_ROTATING);
    assertThat(right.straightened()).isZero();
    assertThat(right.isFixedPitch()).isFalse();
    assertThat(right.momentumPerSpeed()).isZero();
  }

  @Test
  void whatIsAbsentHasItsDefault() {
    Scenario scenario =
        read(
            """
            {
              "format": "rolltrace-scenario/1",
              "title": "As little as there can be",
              "aeroplane": {
                "span": "10 m", "wingArea": "15 m2",
                "inertia": { "roll": "1000 kg m2" },
                "derivatives": { "values": { "Cl_p": -0.5, "Cl_da": 0.1 } }
              },
              "condition": { "pressureAltitude": "0 m", "equivalentAirspeed": "60 m/s",
                             "flightPathAngle": "0.5 rad", "propellerRollMoment": "7 N m" },
              "slip": "held",
              "duration": "3600 s"
            }
            """);

    assertThat(scenario.programme().inputs()).isEmpty();
    // Trimmed with what it flies with.
    assertThat(scenario.start()).isEqualTo(new Start(new PropellerMoments(7), Disturbance.NONE));
    // Straight flight along the path.
    assertThat(scenario.condition().loadFactor()).isEqualTo(Math.cos(0.5));
    assertThat(scenario.data().aeroplane().name()).isEqualTo("Unnamed aeroplane");
    assertThat(scenario.data().derivatives().source()).isEmpty();
    assertThat(scenario.data().aeroplane().mass()).isEmpty();
    assertThat(scenario.data().aeroplane().ailerons()).isEmpty();
    assertThat(scenario.data().aeroplane().inertia().yaw()).isEmpty();
  }

  @Test
  void aTrimThatSaysNothingOfThePropellerIsMadeWithTheOneFlownWith() {
    String text =
        Samples.with(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "{ \"state\": \"wings-level\", \"propellerRollMoment\": \"-100 N m\" }",
            "{ \"state\": \"wings-level\" }");
    assertThat(read(text).start().trimmedWith()).isEqualTo(new PropellerMoments(-400));
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 7, 29, 30, 31, 45, 57, 58, 60, 61, 89, 90, 115, 229, 359, 1799, 3600})
  void aWholeNumberOfDegreesComesBackWhole(int degrees) {
    String text =
        Samples.with(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "[\"50 deg\", \"45 deg\", \"360 deg\"]",
            "[\"" + degrees + " deg\"]");
    boolean isOneOfTheDefaults = MeasureOptions.DEFAULT.bankChanges().contains((double) degrees);
    assertThat(read(text).measures().bankChanges())
        .contains((double) degrees)
        .hasSize(isOneOfTheDefaults ? 4 : 5);
  }

  @Test
  void acceptsAByteOrderMarkAndOtherLineEnds() throws IOException {
    Path file = Samples.writeScenario(directory, Samples.SCENARIO);
    Files.write(
        file, ("\uFEFF" + Samples.SCENARIO.replace("\n", "\r\n")).getBytes(StandardCharsets.UTF_8));
    assertThat(ScenarioFile.read(file).title()).isEqualTo("Roll entry at cruise");
  }

  @Test
  void findsTheAeroplaneByAnyKindOfPath() throws IOException {
    Path aeroplane = Samples.write(directory, "hangar/one.json", Samples.AEROPLANE);
    Path link = Files.createSymbolicLink(directory.resolve("link.json"), aeroplane);
    for (String path :
        List.of(
            aeroplane.toAbsolutePath().toString(),
            "../hangar/one.json",
            "./../hangar/./one.json",
            "../" + link.getFileName())) {
      String text = Samples.with(Samples.SCENARIO, "aeroplanes/some-aeroplane.json", path);
      Path file = Samples.write(directory, "scenarios/s.json", text);
      assertThat(ScenarioFile.read(file).data().aeroplane().span())
          .as(path)
          .isCloseTo(33.4 * 0.3048, within(1e-12));
    }
  }

  @Test
  void readsAScenarioThroughALinkFromTheDirectoryOfTheLink() throws IOException {
    Path file = Samples.write(directory, "elsewhere/s.json", Samples.SCENARIO);
    Samples.write(directory, "aeroplanes/some-aeroplane.json", Samples.AEROPLANE);
    Path link = Files.createSymbolicLink(directory.resolve("link.json"), file);
    assertThat(ScenarioFile.read(link).title()).isEqualTo("Roll entry at cruise");
  }

  @Test
  void patternLawStartAndSizeMayBeAbsent() {
    String inputs =
        """
        { "control": "stick", "shape": "multistep", "start": "1 s", "size": 1, "unit": "1 s" },
        { "control": "stick", "shape": "sweep", "start": "0 s", "size": 1, "from": "1 Hz",
          "to": "180 deg/s", "duration": "1 s" },
        { "control": "stick", "shape": "trace", "file": "traces/hand.csv", "column": "pedal" },
        """;
    String text = Samples.with(Samples.SCENARIO, "\"inputs\": [", "\"inputs\": [" + inputs);
    Scenario scenario = ScenarioFile.read(Samples.writeScenario(directory, text));
    assertThat(scenario.programme().inputs())
        .extracting(PilotInput::shape)
        .startsWith(
            new MultistepInput(1, 1, 1, List.of(3, 2, 1, 1), 0.1),
            new SweepInput(0, 1, 2 * Math.PI, Math.PI, 1, SweepInput.Law.LINEAR),
            new TraceInput(
                0,
                1,
                Trace.of(
                    "traces/hand.csv",
                    "pedal",
                    new double[] {0, 0.5, 1, 1.5},
                    new double[] {0, 0.1, -0.2, 0})));
  }

  @Test
  void aTraceMayHaveAnyLineEndsAByteOrderMarkAndBlanks() {
    Path file = Samples.writeScenario(directory, Samples.SCENARIO_WITH_EVERY_KEY);
    Scenario plain = ScenarioFile.read(file);
    for (String text :
        List.of(
            Samples.TRACE.replace("\n", "\r\n"),
            Samples.TRACE.replace("\n", "\r") + "\r\r",
            "\ufeff" + Samples.TRACE,
            Samples.TRACE.replace(",", " ,\t"),
            Samples.TRACE.stripTrailing())) {
      Samples.write(directory, "traces/hand.csv", text);
      assertThat(ScenarioFile.read(file).programme().inputs())
          .isEqualTo(plain.programme().inputs());
    }
  }

  @Test
  void aHeldSlipIsReadInItsOrder() {
    String text =
        Samples.with(
            Samples.SCENARIO,
            "\"slip\": \"free\"",
            "\"slip\": \"held\", \"heldSlip\": [ { \"time\": \"1 s\", \"sideslip\": \"0 deg\" },"
                + " { \"time\": \"1.5 s\", \"sideslip\": \"-0.1 rad\" } ]");
    Scenario scenario = ScenarioFile.read(Samples.writeScenario(directory, text));
    assertThat(scenario.programme().heldSideslip().points())
        .containsExactly(new HeldSideslip.Point(1, 0), new HeldSideslip.Point(1.5, -0.1));
  }
}
