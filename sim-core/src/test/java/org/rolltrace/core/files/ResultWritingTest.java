package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.testing.Scenarios.oneDegree;
import static org.rolltrace.core.testing.Scenarios.seaLevel;
import static org.rolltrace.core.testing.Scenarios.stick;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.testing.Scenarios;
import org.rolltrace.core.testing.Shipped;

class ResultWritingTest {
  @TempDir Path folder;

  private static RunResult small() {
    return ScenarioRun.execute(
        Scenarios.of(
            oneDegree(0.4, 8),
            seaLevel(50),
            SlipTreatment.HELD,
            2,
            stick(new HoldInput(0.5, 1, 1, 0))));
  }

  static List<Path> shipped() {
    return Shipped.scenarioFiles();
  }

  private static JsonNode json(RunResult result) throws IOException {
    StringWriter out = new StringWriter();
    ResultJson.write(result, "test", out);
    return new ObjectMapper().readTree(out.toString());
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void everyShippedScenarioGivesACompleteResult(Path file) throws IOException {
    RunResult result = ScenarioRun.execute(ScenarioFile.read(file));
    JsonNode json = json(result);
    assertThat(json.get("format").asText()).isEqualTo("rolltrace-result/1");
    assertThat(json.get("notice").asText()).isEqualTo(Safety.NOTICE);
    assertThat(json.at("/condition/density").isNumber()).isTrue();
    assertThat(json.at("/condition/dynamicPressure").isNumber()).isTrue();
    assertThat(json.at("/derivatives/Cl_p/origin").asText())
        .isEqualTo(
            result.scenario().data().aeroplane().geometry().isPresent() ? "estimated" : "given");
    assertThat(json.get("requirements").isArray()).isTrue();
    assertThat(json.get("cautions").isArray()).isTrue();
    for (JsonNode measure : json.get("measures")) {
      assertThat(measure.has("value")).isNotEqualTo(measure.has("reason"));
      assertThat(measure.has("value")).isEqualTo(measure.has("unit"));
    }
    assertThat(json.toString()).doesNotContain("NaN").doesNotContain("Infinity");
  }

  @Test
  void modesAreNamedAsTheFormatSays() throws IOException {
    JsonNode modes =
        json(ScenarioRun.execute(Shipped.scenario("light-single-roll-entry"))).get("modes");
    assertThat(modes.at("/roll/root").asDouble()).isCloseTo(-8.43, within(0.01));
    assertThat(modes.at("/roll/timeConstant").asDouble()).isCloseTo(0.1186, within(1e-4));
    assertThat(modes.at("/spiral/timeToHalf").asDouble()).isCloseTo(84.6, within(0.1));
    assertThat(modes.at("/spiral").has("timeToDouble")).isFalse();
    assertThat(modes.at("/dutchRoll/naturalFrequency").asDouble()).isCloseTo(2.397, within(1e-3));
    assertThat(modes.at("/dutchRoll/dampingRatio").asDouble()).isCloseTo(0.203, within(1e-3));
    JsonNode diverging =
        json(ScenarioRun.execute(Shipped.scenario("four-engine-jet-approach-roll-entry")));
    assertThat(diverging.at("/modes/spiral/timeToDouble").asDouble()).isPositive();
  }

  @Test
  void powerIsInTheResult() throws IOException {
    JsonNode json = json(ScenarioRun.execute(Shipped.scenario("tarnlark-go-around")));
    assertThat(json.at("/condition/power").asDouble()).isEqualTo(75_000);
    assertThat(json.at("/condition/powerFraction").asDouble()).isEqualTo(1);
    // 75 kW at 2400 rpm, half of it straightened
    double torque = 75_000 / (80 * Math.PI);
    assertThat(json.at("/condition/propellers/0/torque").asDouble())
        .isCloseTo(torque, within(1e-9));
    assertThat(json.at("/condition/propellerRollMoment").asDouble())
        .isCloseTo(-0.5 * torque, within(1e-9));
    assertThat(json.at("/scenario/start/trimmedWithPower").asDouble()).isEqualTo(20_000);
    // 1901 rpm by the law of the fixed pitch, of which its note says 1900
    assertThat(json.at("/scenario/start/trimmedWithPropellerRollMoment").asDouble())
        .isCloseTo(-0.5 * 20_000 / (1900 * Math.PI / 30), within(0.05));
    assertThat(json.at("/aeroplane/propellers/0/pitch").asText()).isEqualTo("fixed");
    assertThat(json.at("/aeroplane/propellers/0/rotatingInertia/engine").asDouble())
        .isEqualTo(0.15);
  }

  @Test
  void historyHasItsHeaderAndARowEveryHundredth() throws IOException {
    RunResult result = small();
    StringBuilder out = new StringBuilder();
    HistoryCsv.write(result.history(), out);
    List<String> lines = out.toString().lines().toList();
    assertThat(lines.get(0))
        .isEqualTo(
            "time[s],bank[deg],rollRate[deg/s],yawRate[deg/s],sideslip[deg],stick[-],pedal[-],"
                + "aileron[deg],rudder[deg],rollAcceleration[deg/s2],"
                + "power[-],propellerRollMoment[N m],propellerYawMoment[N m]");
    assertThat(lines).hasSize(202);
    for (int k = 0; k <= 200; k++) {
      String[] cells = lines.get(k + 1).split(",");
      assertThat(cells).hasSize(13);
      assertThat(Double.parseDouble(cells[0])).isEqualTo(k / 100.0);
    }
    // full precision: what is read back is what was computed
    String[] cells = lines.get(101).split(",");
    int index = result.history().lastAt(1.0);
    assertThat(Double.parseDouble(cells[2]))
        .isEqualTo(Math.toDegrees(result.history().value(Channel.ROLL_RATE, index)));
    // at a jump the row holds what follows
    assertThat(Double.parseDouble(lines.get(51).split(",")[5])).isEqualTo(1);
  }

  @Test
  void numbersDoNotDependOnTheLocale() throws IOException {
    Locale before = Locale.getDefault();
    try {
      StringBuilder plain = new StringBuilder();
      HistoryCsv.write(small().history(), plain);
      String json = json(small()).toString();
      Locale.setDefault(Locale.GERMANY);
      StringBuilder german = new StringBuilder();
      HistoryCsv.write(small().history(), german);
      assertThat(german.toString()).isEqualTo(plain.toString());
      assertThat(json(small()).toString()).isEqualTo(json);
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void filesAreWrittenIntoAFolderThatIsMade() throws IOException {
    Path into = folder.resolve("a").resolve("b");
    assertThat(ResultFolder.write(into, small(), "test"))
        .containsExactly(into.resolve("history.csv"), into.resolve("result.json"));
    assertThat(namesIn(into)).containsExactly("history.csv", "result.json");
    byte[] csv = Files.readAllBytes(into.resolve("history.csv"));
    assertThat((char) csv[0]).isEqualTo('t'); // no byte-order mark
  }

  @Test
  void olderResultsAreReplacedWhole() throws IOException {
    Files.writeString(folder.resolve("history.csv"), "old");
    ResultFolder.write(folder, small(), "test");
    assertThat(Files.readString(folder.resolve("history.csv"))).startsWith("time[s]");
    assertThat(namesIn(folder)).containsExactly("history.csv", "result.json");
  }

  @Test
  void aFileInPlaceOfTheFolderIsAFailedWrite() throws IOException {
    Path file = Files.writeString(folder.resolve("taken"), "mine");
    assertThatExceptionOfType(UncheckedIOException.class)
        .isThrownBy(() -> ResultFolder.write(file, small(), "test"))
        .withMessageContaining("cannot write the result into " + file)
        .withMessageContaining("choose a folder");
    assertThat(Files.readString(file)).isEqualTo("mine");
  }

  /** A folder in the place of one of the files: nothing is left half done. */
  @ParameterizedTest
  @ValueSource(strings = {"history.csv", "result.json"})
  void whenOneFileCannotTakeItsPlaceNothingIsWritten(String taken) throws IOException {
    Files.createDirectories(folder.resolve(taken).resolve("full"));
    assertThatExceptionOfType(UncheckedIOException.class)
        .isThrownBy(() -> ResultFolder.write(folder, small(), "test"))
        .withMessageContaining(taken + " is a folder");
    assertThat(namesIn(folder)).containsExactly(taken);
  }

  private static List<String> namesIn(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).sorted().toList();
    }
  }

  private static JsonNode scenarioOf(String name) throws IOException {
    Path file = Path.of("..", "scenarios", "tarnlark-" + name + ".json");
    return json(ScenarioRun.execute(ScenarioFile.read(file))).get("scenario");
  }

  @Test
  void whatOnlyOneShapeHasIsInTheResult() throws IOException {
    JsonNode multistep = scenarioOf("multistep").at("/inputs/0");
    assertThat(multistep.get("unit").asDouble()).isEqualTo(0.55);
    assertThat(multistep.get("pattern")).hasToString("[3,2,1,1]");
    JsonNode sweep = scenarioOf("sweep").at("/inputs/0");
    assertThat(sweep.get("law").asText()).isEqualTo("logarithmic");
    assertThat(sweep.get("to").asDouble()).isCloseTo(4 * Math.PI, within(1e-12));
    assertThat(sweep.get("end").asDouble()).isBetween(26.0, 26.25);
    assertThat(scenarioOf("ramp").at("/inputs/0/movement").asDouble()).isEqualTo(2);
    JsonNode pedal = scenarioOf("trace").at("/inputs/1");
    assertThat(pedal.get("file").asText()).isEqualTo("traces/roll-and-back.csv");
    assertThat(pedal.get("column").asText()).isEqualTo("pedal");
    assertThat(pedal.get("scale").asDouble()).isEqualTo(0.8);
    JsonNode held = scenarioOf("held-sideslip").get("heldSlip");
    assertThat(held).hasSize(4);
    assertThat(held.at("/1/sideslip").asDouble()).isCloseTo(Math.toRadians(5), within(1e-12));
    assertThat(scenarioOf("ramp").has("heldSlip")).isFalse();
  }

  @Test
  void aSlipHeldAgainstTimeReportsItsPedalAndNoFreeSlipToCompareWith() {
    RunResult result =
        ScenarioRun.compareWithFreeSlip(
            ScenarioRun.execute(
                ScenarioFile.read(Path.of("..", "scenarios", "tarnlark-held-sideslip.json"))));
    // Held at 5 deg, Cn_beta/Cn_dr of the file give -0.0816/-0.0735 · 5 deg of rudder of 25 deg:
    // 22 % of the pedal, left for a wind from the right; leading in and out change it by the rest.
    assertThat(result.measure("pedalToHoldSlip").orElseThrow().value().orElseThrow())
        .isBetween(-0.35, -0.18);
    assertThat(result.measure("freeSlipBankDifference").orElseThrow().remark())
        .contains("no counterpart in free slip");
  }
}
