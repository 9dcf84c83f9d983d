package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HandRecord;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.scenario.Scenario;

/** Traces that a document holds until it is written. */
class CarriedTracesTest {
  private static final HandRecord HAND =
      HandRecord.of(
          new double[] {0, 0.02, 0.04, 1.5},
          new double[] {0, 0.25, 0.5, 0},
          new double[] {0, 0, 0, -0.125});
  private static final String TEXT =
      "time[s],stick[-],pedal[-]\n0.0,0.0,0.0\n0.04,0.5,0.0\n1.5,0.0,-0.125\n";

  @TempDir Path directory;
  private Path file;
  private ScenarioDocument document;

  @BeforeEach
  void openASample() {
    file = Samples.writeScenario(directory, Samples.SCENARIO);
    document = ScenarioDocument.open(file);
  }

  private static Scenario scenario(ScenarioDocument document) {
    ScenarioDocument.Check check = document.check();
    assertThat(check.faults()).isEmpty();
    return check.scenario().orElseThrow();
  }

  private static List<PilotInput> flown(String file) {
    double[] times = {0, 0.04, 1.5};
    return List.of(
        new PilotInput(
            Control.STICK,
            new TraceInput(0, 1, Trace.of(file, "stick", times, new double[] {0, 0.5, 0}))),
        new PilotInput(
            Control.PEDAL,
            new TraceInput(0, 1, Trace.of(file, "pedal", times, new double[] {0, 0, -0.125}))));
  }

  private List<String> names() throws IOException {
    try (Stream<Path> left = Files.list(directory)) {
      return left.map(path -> path.getFileName().toString())
          .filter(name -> !List.of("aeroplanes", "traces").contains(name))
          .sorted()
          .toList();
    }
  }

  @Test
  void whatAHandFlewIsInTheDocumentAndInNoFile() throws IOException {
    ScenarioDocument byHand = document.flownByHand(HAND, "by-hand.csv");

    assertThat(scenario(byHand).programme().inputs()).isEqualTo(flown("by-hand.csv"));
    assertThat(scenario(byHand).duration()).isEqualTo(1.5);
    assertThat(byHand.carriedTraces()).isEqualTo(Map.of("by-hand.csv", TEXT));
    assertThat(byHand.text("$.duration")).contains("1.5 s");
    assertThat(names()).containsExactly("scenario.json");
    assertThat(document.carriedTraces()).isEmpty();
  }

  @Test
  void onlyWhatMovedIsAnInput() {
    HandRecord still = HandRecord.of(new double[] {0, 1}, new double[2], new double[] {0, 1});

    ScenarioDocument byHand = document.flownByHand(still, "by-hand.csv");

    assertThat(byHand.inputCount()).isEqualTo(1);
    assertThat(byHand.text("$.inputs[0].control")).contains("pedal");
    assertThatThrownBy(
            () ->
                document.flownByHand(
                    HandRecord.of(new double[] {0, 1}, new double[2], new double[2]), "x.csv"))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(
            () ->
                document.flownByHand(
                    HandRecord.of(new double[] {0}, new double[] {1}, new double[1]), "x.csv"))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void writingWritesTheTraceBesideTheScenario() throws IOException {
    ScenarioDocument written = ScenarioFile.write(file, document.flownByHand(HAND, "by-hand.csv"));

    assertThat(Files.readString(directory.resolve("by-hand.csv"))).isEqualTo(TEXT);
    assertThat(names()).containsExactly("by-hand.csv", "scenario.json");
    assertThat(ScenarioFile.read(file).programme().inputs()).isEqualTo(flown("by-hand.csv"));
    assertThat(written.carriedTraces()).isEmpty();
    assertThat(written).isEqualTo(ScenarioDocument.open(file));
  }

  @Test
  void intoAnotherFolderTheTraceGoesAlongAndOthersStay() throws IOException {
    Path folder = Files.createDirectory(directory.resolve("other"));
    ScenarioDocument byHand =
        document.flownByHand(HAND, "by-hand.csv").withInputAdded("stick", "trace", 1);
    byHand = byHand.with("$.inputs[2].file", "traces/hand.csv").withNumber("$.inputs[2].size", "0");

    ScenarioDocument written = ScenarioFile.write(folder.resolve("copy.json"), byHand);

    assertThat(written.text("$.inputs[0].file")).contains("by-hand.csv");
    assertThat(written.text("$.inputs[2].file")).contains("../traces/hand.csv");
    assertThat(Files.readString(folder.resolve("by-hand.csv"))).isEqualTo(TEXT);
    assertThat(names()).containsExactly("other", "scenario.json");
    assertThat(scenario(written).programme().inputs()).hasSize(3);
  }

  @Test
  void noFileOfAnotherIsWrittenOver() throws IOException {
    Samples.write(directory, "by-hand.csv", "mine");
    ScenarioDocument byHand = document.flownByHand(HAND, "by-hand.csv");
    assertThat(byHand.text("$.inputs[0].file")).contains("by-hand-2.csv");

    // One that appears only after the flight.
    Samples.write(directory, "by-hand-2.csv", "mine, too");
    ScenarioDocument written = ScenarioFile.write(file, byHand);

    assertThat(written.text("$.inputs[0].file")).contains("by-hand-2-2.csv");
    assertThat(written.text("$.inputs[1].file")).contains("by-hand-2-2.csv");
    assertThat(Files.readString(directory.resolve("by-hand.csv"))).isEqualTo("mine");
    assertThat(Files.readString(directory.resolve("by-hand-2.csv"))).isEqualTo("mine, too");
    assertThat(Files.readString(directory.resolve("by-hand-2-2.csv"))).isEqualTo(TEXT);
  }

  @Test
  void savingTheSameOnceMoreNeedsNoOtherName() throws IOException {
    ScenarioDocument byHand = document.flownByHand(HAND, "by-hand.csv");
    ScenarioFile.write(file, byHand);

    ScenarioFile.write(file, byHand.with("$.title", "Again"));

    assertThat(names()).containsExactly("by-hand.csv", "scenario.json");
  }

  @Test
  void aScenarioThatCannotBeWrittenLeavesNoTraceBehind() throws IOException {
    Path folder = Files.createDirectory(directory.resolve("folder.json"));

    assertThatThrownBy(() -> ScenarioFile.write(folder, document.flownByHand(HAND, "by-hand.csv")))
        .isInstanceOf(UncheckedIOException.class)
        .hasMessageStartingWith("cannot write " + folder);

    assertThat(names()).containsExactly("folder.json", "scenario.json");
  }

  @Test
  void anotherFlightTakesThePlaceOfTheFirst() {
    ScenarioDocument first = document.flownByHand(HAND, "by-hand.csv");
    ScenarioDocument second =
        first.flownByHand(
            HandRecord.of(new double[] {0, 2}, new double[] {0, 1}, new double[2]), "by-hand.csv");

    assertThat(second.inputCount()).isEqualTo(1);
    assertThat(second.carriedTraces().keySet()).containsExactly("by-hand-2.csv");
    assertThat(scenario(first).programme().inputs()).isEqualTo(flown("by-hand.csv"));
  }

  @Test
  void aNameThatIsTypedWrongIsAFaultAndComesBackWithTheTrace() {
    ScenarioDocument byHand = document.flownByHand(HAND, "by-hand.csv");
    ScenarioDocument mistyped = byHand.with("$.inputs[0].file", "by-han.csv");

    assertThat(mistyped.check().faults().get(0).message()).contains("does not exist");
    assertThat(mistyped.pathOf(mistyped.check().faults().get(0))).isEqualTo("$.inputs[0].file");
    assertThat(mistyped.with("$.inputs[0].file", "by-hand.csv")).isEqualTo(byHand);
  }

  @Test
  void aCarriedTraceCanBeShiftedScaledAndCut() {
    ScenarioDocument edited =
        document
            .flownByHand(HAND, "by-hand.csv")
            .with("$.inputs[0].start", "2 s")
            .withNumber("$.inputs[0].size", "-0.5")
            .with("$.inputs[0].cutBefore", "0.02 s")
            .with("$.inputs[0].cutAfter", "0.04 s")
            .with("$.duration", "5 s");

    assertThat(scenario(edited).programme().inputs().get(0).shape())
        .isEqualTo(
            new TraceInput(
                2,
                -0.5,
                Trace.of(
                    "by-hand.csv", "stick", new double[] {0.02, 0.04}, new double[] {0.25, 0.5})));
  }

  @Test
  void aFileIsCalledByTheWayToIt() {
    assertThat(document.nameOf(directory.resolve("traces/hand.csv"))).isEqualTo("traces/hand.csv");
    assertThat(document.nameOf(directory.resolve("x.csv"))).isEqualTo("x.csv");
    assertThat(document.at(directory.resolve("a/b.json")).nameOf(directory.resolve("x.csv")))
        .isEqualTo("../x.csv");
  }
}
