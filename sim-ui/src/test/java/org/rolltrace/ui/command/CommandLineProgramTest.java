package org.rolltrace.ui.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The command line as its user meets it: what is printed where, and with which exit code. */
class CommandLineProgramTest {
  private static final Path SCENARIOS = Path.of("..", "scenarios");
  private static final String ROLL_ENTRY =
      SCENARIOS.resolve("light-single-roll-entry.json").toString();

  @TempDir Path folder;

  private record Answer(int exitCode, String out, String err) {}

  private static Answer run(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int exitCode =
        CommandLineProgram.run(arguments, new PrintWriter(out), new PrintWriter(err), file -> {});
    assertThat(err.toString()).doesNotContain("\tat ").doesNotContain("Exception");
    return new Answer(exitCode, out.toString(), err.toString());
  }

  private Path scenario(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }

  @Test
  void flyPrintsTheResultInAlignedColumns() {
    Answer answer = run("fly", ROLL_ENTRY);
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out())
        .contains("Light single: roll entry to the right")
        .contains("104.3 kt true")
        .containsPattern("roll +-8\\.431 1/s +halves in 0\\.08221 s, time constant 0\\.1186 s")
        .containsPattern("Steady roll rate +1\\d\\.\\d\\d deg/s +0\\.\\d{4} rad/s")
        .contains("flight must follow");
    assertThat(answer.out().lines()).allMatch(line -> line.length() <= 120);
    assertThat(answer.out().lines()).noneMatch(line -> line.endsWith(" "));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "multistep | stick multistep, 20 % right at 1 s, 3-2-1-1 units of 0.55 s, hand takes 0.15 s",
        "ramp | stick ramp, 25 % right at 1 s, reached in 2 s",
        "sweep | stick sweep, 10 % right at 1 s, logarithmic from 0.1 to 2 Hz in 25 s",
        "trace | column stick of traces/roll-and-back.csv times 1, from 0 s",
        "power-step | power step, 73 % more at 1 s, hand takes 0.5 s",
        "power-step | 20.00 kW (26.82 hp), 26.7 % of the rated power",
        "power-step | nose: clockwise, 1900 rpm, torque 100.5 N m, thrust 407 N",
        "go-around | 75.00 kW (100.6 hp), 100 % of the rated power",
        "go-around | Trim, wings level, with 20.00 kW (26.82 hp) and a propeller moment of -50.22 N m",
        "held-sideslip | held: sideslip 0 deg at 1 s, 5 deg at 2 s, 5 deg at 4 s, 0 deg at 5 s"
      })
  void theReportSaysWhatTheHandDid(String name, String words) {
    Answer answer = run("fly", SCENARIOS.resolve("tarnlark-" + name + ".json").toString());
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).contains(words);
  }

  @Test
  void flyPrintsTheStateItStartsFromAndTheFormOfTheSet() {
    Answer turn = run("fly", SCENARIOS.resolve("tarnlark-turn-reversal.json").toString());
    assertThat(turn.out())
        .contains("Trim, steady turn")
        .containsPattern("bank +-30\\.00 deg")
        .containsPattern("yaw rate +-5\\.07 deg/s")
        .containsPattern("Time from 30 deg one way to 30 deg the other +1\\.361 s");
    Answer fuel = run("fly", SCENARIOS.resolve("tarnlark-fuel-imbalance.json").toString());
    assertThat(fuel.out()).contains("on one side       20.00 kg of the mass, 1.450 m to the right");
    Answer primed =
        run("fly", SCENARIOS.resolve("four-engine-jet-cruise-primed-roll-entry.json").toString());
    assertThat(primed.out()).contains("given as          dimensional, primed, per radian");
  }

  @Test
  void smallMomentsKeepTheirFigures() {
    Answer answer = run("fly", SCENARIOS.resolve("mosspipit-torque-right.json").toString());
    assertThat(answer.out())
        .contains("propeller moment  -0.8800 N m in roll")
        .contains("Trim, wings level, with a propeller moment of -0.3800 N m");
  }

  @Test
  void cautionsGoToStandardError() {
    Answer answer = run("fly", SCENARIOS.resolve("light-single-wing-drop.json").toString());
    assertThat(answer.err()).contains("caution: speed and load factor are held constant");
    assertThat(answer.out()).doesNotContain("caution: ");
  }

  @Test
  void jsonIsOneDocumentAndNothingElse() {
    Answer answer = run("fly", ROLL_ENTRY, "--json");
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).startsWith("{").endsWith("}\n");
    assertThat(answer.out()).contains("\"format\" : \"rolltrace-result/1\"");
  }

  @Test
  void outWritesBothFiles() throws IOException {
    Path into = folder.resolve("result");
    Answer answer = run("fly", ROLL_ENTRY, "--out", into.toString(), "--rate", "50");
    assertThat(answer.exitCode()).isZero();
    assertThat(Files.readAllLines(into.resolve("history.csv"))).hasSize(502);
    assertThat(into.resolve("result.json")).isRegularFile();
    assertThat(answer.err()).contains("wrote " + into.resolve("history.csv"));
  }

  @Test
  void chartsDrawsBothPictures() {
    Path into = folder.resolve("charts");
    Answer answer = run("fly", ROLL_ENTRY, "--json", "--charts", into.toString());
    assertThat(answer.exitCode()).isZero();
    assertThat(into.resolve("stage.svg")).isNotEmptyFile();
    assertThat(into.resolve("stage.png")).isNotEmptyFile();
    assertThat(answer.err()).contains("wrote " + into.resolve("stage.png"));
    assertThat(answer.out()).startsWith("{").endsWith("}\n");
  }

  @Test
  void chartsThatCannotBeWrittenEndWithThree() throws IOException {
    Path file = Files.writeString(folder.resolve("taken"), "mine");
    Answer answer = run("fly", ROLL_ENTRY, "--charts", file.toString());
    assertThat(answer.exitCode()).isEqualTo(3);
    assertThat(answer.err()).contains("cannot write the result into " + file);
    assertThat(answer.out()).isEmpty();
  }

  @Test
  void aFolderThatCannotBeWrittenEndsWithThree() throws IOException {
    Path file = Files.writeString(folder.resolve("taken"), "mine");
    Answer answer = run("fly", ROLL_ENTRY, "--json", "--out", file.toString());
    assertThat(answer.exitCode()).isEqualTo(3);
    assertThat(answer.err()).contains("cannot write the result into " + file);
    assertThat(answer.out()).isEmpty();
  }

  static List<Path> shipped() throws IOException {
    try (Stream<Path> files = Files.list(SCENARIOS)) {
      return files
          .filter(file -> file.toString().endsWith(".json"))
          .filter(file -> !file.toString().endsWith(".schema.json"))
          .sorted()
          .toList();
    }
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void everyShippedScenarioFlies(Path file) {
    Answer answer = run("fly", file.toString());
    assertThat(answer.exitCode()).as(answer.err()).isZero();
    assertThat(answer.out()).doesNotContain("NaN").doesNotContain("Infinity");
  }

  @Test
  void aMissingFileEndsWithTwo() {
    Answer answer = run("fly", folder.resolve("none.json").toString());
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.err()).contains("none.json");
    assertThat(answer.out()).isEmpty();
  }

  @Test
  void allFaultsOfAFileAreReportedAtOnceWithPathAndLine() throws IOException {
    Path file =
        scenario(
            "faulty.json",
            """
            {
              "format": "rolltrace-scenario/1",
              "title": "faulty",
              "aeroplane": { "name": "x", "span": "-33.4 ft", "wingArea": "184", "colour": "red",
                "inertia": { "roll": "0 kg m2" },
                "derivatives": { "source": "test", "values": { "Cl_p": -0.4, "Cl_da": 0.1 } } },
              "condition": { "pressureAltitude": "3000 kg", "trueAirspeed": "60 m/s" },
              "slip": "held",
              "duration": "10 s"
            }
            """);
    Answer answer = run("fly", file.toString(), "--json");
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.out()).isEmpty();
    assertThat(answer.err())
        .contains("faulty.json:4")
        .contains("$.aeroplane.span")
        .contains("$.aeroplane.wingArea")
        .contains("$.aeroplane.colour")
        .contains("faulty.json:5")
        .contains("$.aeroplane.inertia.roll")
        .contains("faulty.json:7")
        .contains("$.condition.pressureAltitude");
  }

  @Test
  void aCalculationWithoutAnAnswerEndsWithThree() throws IOException {
    Path file =
        scenario(
            "diverging.json",
            """
            {
              "format": "rolltrace-scenario/1",
              "title": "diverging",
              "aeroplane": { "name": "x", "span": "10 m", "wingArea": "15 m2",
                "inertia": { "roll": "1000 kg m2" }, "ailerons": { "up": "20 deg", "down": "20 deg" },
                "derivatives": { "source": "test", "values": { "Cl_p": 0.4, "Cl_da": 0.1 } } },
              "condition": { "pressureAltitude": "0 m", "trueAirspeed": "60 m/s" },
              "slip": "held",
              "inputs": [ { "control": "stick", "shape": "step", "start": "0 s", "size": 1 } ],
              "duration": "3000 s"
            }
            """);
    Path into = folder.resolve("never");
    Answer answer = run("fly", file.toString(), "--out", into.toString());
    assertThat(answer.exitCode()).isEqualTo(3);
    assertThat(answer.err()).contains("leaves the finite range");
    assertThat(answer.out()).isEmpty();
    assertThat(into).doesNotExist();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "soar",
        "fly",
        "fly a.json b.json",
        "fly a.json --unknown",
        "fly a.json --rate fast",
        "fly a.json --rate 0",
        "fly a.json --tolerance 1",
        "schema",
        "schema nothing"
      })
  void badArgumentsEndWithTwo(String words) {
    Answer answer = run(words.isEmpty() ? new String[0] : words.split(" "));
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.err()).isNotBlank();
    assertThat(answer.out()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(strings = {"--help", "fly --help", "schema --help"})
  void helpIsEverywhere(String words) {
    Answer answer = run(words.split(" "));
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).contains("Usage: rolltrace").contains("--version");
  }

  @ParameterizedTest
  @ValueSource(strings = {"--version", "fly --version", "schema --version"})
  void theVersionNamesTheCommit(String words) {
    Answer answer = run(words.split(" "));
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).containsPattern("^Rolltrace \\d\\S* \\(commit \\w+");
  }

  @ParameterizedTest
  @ValueSource(strings = {"scenario", "aeroplane"})
  void schemasArePrintedAsShipped(String format) throws IOException {
    Answer answer = run("schema", format);
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out())
        .isEqualTo(Files.readString(SCENARIOS.resolve(format + ".schema.json")));
  }

  /** A full disk behind standard output. */
  @Test
  void aResultThatCannotBePrintedEndsWithThree() {
    Writer full =
        new Writer() {
          @Override
          public void write(char[] text, int from, int length) throws IOException {
            throw new IOException("no room");
          }

          @Override
          public void flush() {}

          @Override
          public void close() {}
        };
    StringWriter err = new StringWriter();
    String[] arguments = {"fly", ROLL_ENTRY, "--json"};
    assertThat(
            CommandLineProgram.run(
                arguments, new PrintWriter(full), new PrintWriter(err), file -> {}))
        .isEqualTo(3);
    assertThat(err.toString()).contains("the result cannot be printed");
  }

  @Test
  void aDecimalCommaLocaleChangesNothing() {
    Locale before = Locale.getDefault();
    try {
      String plain = run("fly", ROLL_ENTRY).out();
      Locale.setDefault(Locale.GERMANY);
      assertThat(run("fly", ROLL_ENTRY).out()).isEqualTo(plain);
    } finally {
      Locale.setDefault(before);
    }
  }
}
