package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Shipped;

class ScenarioDocumentTest {
  @TempDir Path directory;

  private ScenarioDocument document(String text) {
    return ScenarioDocument.open(Samples.writeScenario(directory, text));
  }

  private static Scenario scenario(ScenarioDocument document) {
    assertThat(document.check().faults()).isEmpty();
    return document.check().scenario().orElseThrow();
  }

  private static void assertSame(Scenario one, Scenario other) {
    assertThat(one).usingRecursiveComparison().isEqualTo(other);
  }

  private static List<String> paths(ScenarioDocument document) {
    List<String> paths = new ArrayList<>();
    for (FileFault fault : document.check().faults()) {
      paths.add(document.pathOf(fault));
    }
    return paths;
  }

  static List<Path> shipped() {
    return Shipped.scenarioFiles();
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void anUneditedDocumentIsTheFile(Path file) throws IOException {
    ScenarioDocument document = ScenarioDocument.open(file);

    assertThat(document.json()).isEqualTo(Files.readString(file));
    assertSame(scenario(document), ScenarioFile.read(file));
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void theAeroplaneInsideFliesAsTheOneInItsFile(Path file) {
    ScenarioDocument named = ScenarioDocument.open(file);
    ScenarioDocument inside = named.withAeroplaneInline();

    assertThat(named.aeroplaneIsInline()).isFalse();
    assertThat(inside.aeroplaneIsInline()).isTrue();
    assertSame(scenario(inside), scenario(named));
    assertThat(named.aeroplaneText("name")).isPresent();
    for (String path :
        List.of("span", "inertia.roll", "derivatives.source", "name", "wing.height")) {
      assertThat(inside.aeroplaneText(path)).as(path).isEqualTo(named.aeroplaneText(path));
    }
    assertStable(inside);
  }

  private static void assertStable(ScenarioDocument document) {
    ScenarioDocument again = ScenarioDocument.ofText(document.json(), document.directory());
    assertThat(again.json()).isEqualTo(document.json());
  }

  @Test
  void textWithoutLinesGetsThem() {
    ScenarioDocument document =
        ScenarioDocument.ofText(Samples.SCENARIO_WITH_EVERY_KEY.replaceAll("\\n *", ""), directory);

    // The rules by hand: every value of the scenario on its own line, what is short on that line.
    assertThat(document.json())
        .startsWith("{\n  \"format\": \"rolltrace-scenario/1\",\n  \"title\": \"Every key\",\n")
        .contains("\n    \"inertia\": { \"roll\": \"1000 kg m2\", \"yaw\": \"2500 kg m2\" },\n")
        .endsWith(
            "  \"measures\": { \"settlingBand\": 0.02, \"bankAngles\": [\"50 deg\", \"45 deg\","
                + " \"360 deg\"] }\n}\n");
    assertStable(document);
  }

  @Test
  void valuesAreAsTheyStand() {
    ScenarioDocument document = document(Samples.SCENARIO);

    assertThat(document.text("$.condition.pressureAltitude")).contains("3000 ft");
    assertThat(document.text("$.inputs[0].size")).contains("1.0");
    assertThat(document.text("$.condition")).isEmpty();
    assertThat(document.text("$.inputs[1].size")).isEmpty();
    assertThat(document.text("$.start.trim.state")).isEmpty();
    assertThat(document.inputCount()).isEqualTo(1);
  }

  @Test
  void anEditChangesOneValueAndNothingElse() {
    ScenarioDocument document = document(Samples.SCENARIO);
    ScenarioDocument edited = document.with("$.condition.calibratedAirspeed", "61.5 m/s");

    assertThat(edited.json())
        .isEqualTo(Samples.with(document.json(), "\"120 kt\"", "\"61.5 m/s\""));
    assertThat(scenario(edited).condition().calibratedAirspeed()).isEqualTo(61.5);
    assertThat(edited.with("$.condition.calibratedAirspeed", "120 kt")).isEqualTo(document);
    assertThat(document.with("$.slip", "free")).isSameAs(document);
  }

  @Test
  void whatIsMissingOnTheWayIsMadeAtItsCustomaryPlace() {
    ScenarioDocument document =
        document(Samples.SCENARIO).without("$.start").without("$.inputs").without("$.nowhere.x");
    ScenarioDocument edited =
        document
            .with("$.start.trim.propellerRollMoment", "-7 N m")
            .withNumber("$.measures.settlingBand", "0.10")
            .withInputAdded("pedal", "hold", 1.25);

    assertThat(edited.json().lines().skip(5))
        .containsExactly(
            "  \"slip\": \"free\",",
            "  \"start\": { \"trim\": { \"propellerRollMoment\": \"-7 N m\" } },",
            "  \"inputs\": [",
            "    { \"control\": \"pedal\", \"shape\": \"hold\", \"start\": \"1.25 s\","
                + " \"size\": 0.5, \"duration\": \"2 s\", \"movement\": \"0.15 s\" }",
            "  ],",
            "  \"duration\": \"10 s\",",
            "  \"measures\": { \"settlingBand\": 0.10 }",
            "}");
    assertThat(scenario(edited).start().trimmedWith()).isEqualTo(new PropellerMoments(-7));
    assertThat(scenario(edited).programme().inputs())
        .containsExactly(new PilotInput(Control.PEDAL, new HoldInput(1.25, 0.5, 2, 0.15)));
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-1", "1.50", "1e-3", "-0.25E+2"})
  void numbersKeepTheirDigits(String digits) {
    ScenarioDocument edited = document(Samples.SCENARIO).withNumber("$.inputs[0].size", digits);
    assertThat(edited.text("$.inputs[0].size")).contains(digits);
    assertThat(edited.json()).contains("\"size\": " + digits + ",");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "-", ".5", "+1", "01", "1.", "1e", "0,5", "NaN", "1 s", "0.5 \"}"})
  void whatIsNoNumberIsTextAndAFault(String digits) {
    ScenarioDocument edited = document(Samples.SCENARIO).withNumber("$.inputs[0].size", digits);
    assertThat(edited.text("$.inputs[0].size")).contains(digits);
    assertThat(paths(edited)).containsExactly("$.inputs[0].size");
    assertThat(edited.check().scenario()).isEmpty();
  }

  @Test
  void faultsHaveThePathsOfTheDocumentWhereverTheAeroplaneStands() {
    ScenarioDocument named = document(Samples.SCENARIO).with("$.duration", "10");
    Samples.write(
        directory,
        "aeroplanes/some-aeroplane.json",
        Samples.with(Samples.AEROPLANE, "\"33.4 ft\"", "\"33.4\""));

    assertThat(paths(named)).containsExactly("$.duration", "$.aeroplane.span");
    assertThat(paths(named.withAeroplaneInline()))
        .containsExactlyInAnyOrder("$.duration", "$.aeroplane.span");
    assertThat(paths(named.withAeroplaneInline().with("$.aeroplane.span", "33.4 ft")))
        .containsExactly("$.duration");
  }

  @Test
  void theFileOfTheAeroplaneIsReadAgainWhenItChanges() {
    ScenarioDocument named = document(Samples.SCENARIO);
    assertThat(named.aeroplaneText("span")).contains("33.4 ft");
    Samples.write(
        directory,
        "aeroplanes/some-aeroplane.json",
        Samples.with(Samples.AEROPLANE, "\"33.4 ft\"", "\"33.45 ft\""));
    assertThat(named.aeroplaneText("span")).contains("33.45 ft");
  }

  @Test
  void anAeroplaneThatIsNotThereIsAFaultAndCannotBeTakenIn() {
    ScenarioDocument lost = document(Samples.SCENARIO).with("$.aeroplane", "nowhere.json");

    assertThat(paths(lost)).containsExactly("$.aeroplane");
    assertThat(lost.aeroplaneText("span")).isEmpty();
    assertThatThrownBy(lost::withAeroplaneInline)
        .isInstanceOf(FileFaultsException.class)
        .hasMessageContaining("does not exist");
    assertThat(document(Samples.SCENARIO).with("$.aeroplane", "\0").aeroplaneText("span"))
        .isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "step,hold,duration",
    "step,doublet,width",
    "hold,doublet,width",
    "step,multistep,unit",
    "hold,multistep,unit"
  })
  void shapesChangeBothWays(String one, String other, String keyOfOther) {
    ScenarioDocument document =
        document(Samples.SCENARIO).withInputAdded("stick", one, 2).with("$.inputs[1].note", "?");
    ScenarioDocument changed = document.withInputShape(1, other);

    assertThat(changed.text("$.inputs[1].shape")).contains(other);
    assertThat(changed.text("$.inputs[1].start")).contains("2 s");
    assertThat(changed.text("$.inputs[1]." + keyOfOther)).isPresent();
    // A key that no shape has is nobody's to remove.
    assertThat(paths(changed)).containsExactly("$.inputs[1].note");
    assertThat(changed.withInputShape(1, one)).isEqualTo(document);
    assertThat(document.withoutInput(1)).isEqualTo(document(Samples.SCENARIO));
  }

  @Test
  void whatNoCallerMayAskForIsRefused() {
    ScenarioDocument document = document(Samples.SCENARIO);
    assertThatThrownBy(() -> document.withInputAdded("stick", "wobble", 0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("wobble")
        .hasMessageContaining("doublet");
    assertThatThrownBy(() -> document.withInputAdded("stick", "step", Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> document.withoutInput(1))
        .isInstanceOf(IndexOutOfBoundsException.class);
    assertThatThrownBy(() -> document.with("$.inputs[3].size", "1"))
        .isInstanceOf(IndexOutOfBoundsException.class);
    for (String path : List.of("$", "", "slip", "$.", "$.inputs[]", "$.inputs[-1]", "$.a..b")) {
      assertThatThrownBy(() -> document.text(path)).isInstanceOf(IllegalArgumentException.class);
    }
  }

  @Test
  void mirroringGoesToTheOtherSideAndBack() {
    ScenarioDocument document =
        document(Samples.SCENARIO_WITH_EVERY_KEY)
            .withInputAdded("stick", "step", 5)
            .withNumber("$.inputs[3].size", "0.0")
            .withInputAdded("power", "step", 6);
    ScenarioDocument mirrored = document.mirrored();

    assertThat(mirrored.text("$.inputs[0].size")).contains("1");
    assertThat(mirrored.text("$.inputs[1].size")).contains("-0.5");
    assertThat(mirrored.text("$.inputs[2].size")).contains("0.25");
    assertThat(mirrored.text("$.inputs[3].size")).contains("0.0");
    // power has no other side
    assertThat(mirrored.text("$.inputs[8].size")).contains("0.5");
    assertThat(mirrored.mirrored()).isEqualTo(document);
  }

  @Test
  void contentMayBeFaultyButNotTheText() {
    String strange =
        """
        { "slip": "free", "slip": "held", "a \\"key\\"": [NaN, true, null, [], {}],
          "title": "%s", "inputs": 7, "aeroplane": [] }
        """
            .formatted("x".repeat(JsonTree.LONGEST_TEXT + 1));
    ScenarioDocument document = ScenarioDocument.ofText(strange, directory);

    assertThat(document.check().faults()).hasSizeGreaterThan(5);
    assertThat(document.inputCount()).isZero();
    assertThat(document.aeroplaneIsInline()).isFalse();
    assertThat(document.text("$.title").orElseThrow()).hasSize(JsonTree.LONGEST_TEXT + 1);
    assertThat(document.text("$[\"a \"key\"\"][0]")).contains("NaN");
    assertThat(document.json()).contains("\"slip\": \"held\"");
    assertStable(document);
    assertThatThrownBy(() -> document("{")).isInstanceOf(FileFaultsException.class);
    assertThatThrownBy(() -> document("[]")).isInstanceOf(FileFaultsException.class);
    assertThatThrownBy(() -> ScenarioDocument.open(directory.resolve("none.json")))
        .isInstanceOf(FileFaultsException.class)
        .hasMessageContaining("does not exist");
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void anyTextComesBackAsItWent(long seed) {
    Random random = new Random(seed);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 200; i++) {
      // Many of the first characters, which need care, and some of all others but halves of pairs.
      int c = random.nextInt(random.nextBoolean() ? 0x80 : 0x10ffff);
      text.appendCodePoint(c >= 0xd800 && c < 0xe000 ? '"' : c);
    }
    ScenarioDocument document = document(Samples.SCENARIO).with("$.note", text.toString());
    assertThat(document.text("$.note")).contains(text.toString());
    assertThat(ScenarioDocument.ofText(document.json(), directory).text("$.note"))
        .contains(text.toString());
  }

  @Test
  void halfACharacterIsWrittenSoThatItCanBeRead() {
    ScenarioDocument document = document(Samples.SCENARIO).with("$.note", "\ud83d");
    assertThat(document.json()).contains("\"\\ud83d\"");
    assertThat(scenario(document).title()).isNotBlank();
  }

  /** The tree holds what an independent reader finds; here the reader of files is that. */
  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14, 15})
  void layoutIsStableWhateverIsEdited(long seed) {
    Random random = new Random(seed);
    ScenarioDocument document = document(Samples.SCENARIO_WITH_EVERY_KEY);
    String[] paths = {
      "$.note",
      "$.aeroplane.mass",
      "$.condition.density",
      "$.start.bank",
      "$.inputs[0].size",
      "$.measures.bankAngles[1]",
      "$.aeroplane.derivatives.values.Cn_r",
      "$.new.of[0].some.kind"
    };
    for (int i = 0; i < 200; i++) {
      String path = paths[random.nextInt(paths.length)];
      document =
          switch (random.nextInt(3)) {
            case 0 -> document.with(path, "x".repeat(random.nextInt(90)));
            case 1 -> path.contains("[0]") ? document : document.without(path);
            default -> document.withInputAdded("stick", "hold", random.nextInt(100));
          };
      assertStable(document);
    }
  }

  @Test
  void savingIntoAnotherFolderLeadsToTheSameAeroplane() throws IOException {
    ScenarioDocument document = document(Samples.SCENARIO);
    Path folder = Files.createDirectories(directory.resolve("one/two"));
    Path file = folder.resolve("copy.json");

    ScenarioDocument written = ScenarioFile.write(file, document);

    assertThat(written.text("$.aeroplane")).contains("../../aeroplanes/some-aeroplane.json");
    assertThat(Files.readString(file)).isEqualTo(written.json());
    assertSame(ScenarioFile.read(file), scenario(document));
    assertThat(written.at(directory.resolve("scenario.json")).json()).isEqualTo(document.json());
    assertThat(written.directory()).isEqualTo(folder);
    // Into the same folder the path stays as somebody wrote it.
    String roundabout = "./aeroplanes/../aeroplanes/some-aeroplane.json";
    assertThat(
            document
                .with("$.aeroplane", roundabout)
                .at(directory.resolve("other.json"))
                .text("$.aeroplane"))
        .contains(roundabout);
  }

  @Test
  void savingThroughALinkedFolderLeadsToTheSameAeroplane() throws IOException {
    ScenarioDocument document = document(Samples.SCENARIO);
    Path real = Files.createDirectories(directory.resolve("one/two/three"));
    Path link = Files.createSymbolicLink(directory.resolve("link"), real);

    ScenarioFile.write(link.resolve("copy.json"), document);

    assertSame(ScenarioFile.read(link.resolve("copy.json")), scenario(document));
    assertSame(ScenarioFile.read(real.resolve("copy.json")), scenario(document));
  }

  @Test
  void aFileIsWrittenWholeOrNotAtAll() throws IOException {
    ScenarioDocument document = document(Samples.SCENARIO);
    Path file = directory.resolve("scenario.json");
    Path folder = Files.createDirectory(directory.resolve("folder"));

    for (Path impossible : List.of(folder, directory.resolve("none/x.json"), file.resolve("x"))) {
      UncheckedIOException refusal =
          catchThrowableOfType(
              UncheckedIOException.class, () -> ScenarioFile.write(impossible, document));
      assertThat(refusal)
          .hasMessageStartingWith("cannot write " + impossible)
          .hasMessageEndingWith("; choose a folder that you may write to, with room on its disk");
    }
    ScenarioFile.write(file, document.with("$.title", "Another"));
    assertThat(ScenarioFile.read(file).title()).isEqualTo("Another");
    try (Stream<Path> left = Files.list(directory)) {
      assertThat(left.map(path -> path.getFileName().toString()))
          .containsExactlyInAnyOrder("aeroplanes", "folder", "scenario.json", "traces");
    }
  }

  @ParameterizedTest
  @CsvSource({
    "step,ramp,duration",
    "doublet,sweep,from",
    "multistep,sweep,to",
    "sweep,ramp,duration"
  })
  void aShapeWithoutAHandLeavesOutItsMovement(String one, String other, String keyOfOther) {
    ScenarioDocument changed =
        document(Samples.SCENARIO).withInputAdded("stick", one, 2).withInputShape(1, other);
    assertThat(changed.text("$.inputs[1]." + keyOfOther)).isPresent();
    assertThat(changed.text("$.inputs[1].movement")).isEmpty();
    assertThat(paths(changed)).isEmpty();
    assertThat(paths(changed.withInputShape(1, one))).isEmpty();
  }

  @Test
  void tracesAndHeldSideslipsAreMirroredToo() {
    ScenarioDocument trace =
        document(Samples.SCENARIO)
            .withInputAdded("stick", "trace", 0)
            .with("$.inputs[1].file", "traces/hand.csv")
            .without("$.inputs[1].size");
    assertThat(trace.mirrored().text("$.inputs[1].size")).contains("-1");
    ScenarioDocument held =
        document(Samples.SCENARIO)
            .with("$.slip", "held")
            .with("$.heldSlip[0].time", "1 s")
            .with("$.heldSlip[0].sideslip", "0 deg")
            .with("$.heldSlip[1].time", "2 s")
            .with("$.heldSlip[1].sideslip", "5.0 deg");
    assertThat(paths(held)).isEmpty();
    assertThat(held.mirrored().text("$.heldSlip[0].sideslip")).contains("0 deg");
    assertThat(held.mirrored().text("$.heldSlip[1].sideslip")).contains("-5.0 deg");
    assertThat(held.mirrored().mirrored()).isEqualTo(held);
  }

  @Test
  void aTraceWantsItsFileAndIsThenComplete() {
    ScenarioDocument document = document(Samples.SCENARIO).withInputAdded("pedal", "trace", 0.5);
    assertThat(document.text("$.inputs[1].size")).contains("1");
    assertThat(paths(document)).containsExactly("$.inputs[1].file");
    ScenarioDocument named = document.with("$.inputs[1].file", "traces/hand.csv");
    assertThat(paths(named)).isEmpty();
    // Start and size may be absent in a trace, and must be there in a step.
    ScenarioDocument step =
        named.without("$.inputs[1].start").without("$.inputs[1].size").withInputShape(1, "step");
    assertThat(paths(step)).isEmpty();
    assertThat(step.text("$.inputs[1].file")).isEmpty();
  }

  @Test
  void theWayToATraceIsThatFromTheNewPlace() {
    ScenarioDocument document = document(Samples.SCENARIO_WITH_EVERY_KEY);
    ScenarioDocument moved = document.at(directory.resolve("sub/copy.json"));
    assertThat(moved.text("$.inputs[6].file")).contains("../traces/hand.csv");
    assertThat(document.at(directory.resolve("other.json")).text("$.inputs[6].file"))
        .contains("traces/hand.csv");
  }

  @ParameterizedTest
  @ValueSource(strings = {"3-2-1-1", "3, 2,1 1", " 3 2 1 1 "})
  void patternsAreWrittenAsPeopleDo(String pattern) {
    ScenarioDocument edited =
        document(Samples.SCENARIO_WITH_EVERY_KEY).withNumbers("$.inputs[3].pattern", pattern);
    assertThat(edited.numbers("$.inputs[3].pattern")).contains("3, 2, 1, 1");
    assertThat(edited.json()).contains("\"pattern\": [3, 2, 1, 1]");
    assertThat(paths(edited)).isEmpty();
    assertThat(edited.numbers("$.inputs[3].unit")).isEmpty();
  }

  @Test
  void whatIsNoNumberInAPatternIsAFault() {
    ScenarioDocument edited =
        document(Samples.SCENARIO_WITH_EVERY_KEY).withNumbers("$.inputs[3].pattern", "3-x");
    assertThat(edited.numbers("$.inputs[3].pattern")).contains("3, x");
    assertThat(paths(edited)).containsExactly("$.inputs[3].pattern[1]");
  }

  private static final String SHAPED =
      """
      {
        "format": "rolltrace-scenario/1", "title": "Shaped",
        "aeroplane": {
          "mass": "790 kg",
          "wing": { "panels": [
            { "from": "0 m", "to": "4.5 m", "innerChord": "1.6 m", "outerChord": "1.1 m", "dihedral": "5 deg" } ] },
          "ailerons": { "up": "20 deg", "down": "15 deg", "from": "2.5 m", "to": "4.3 m", "chordShare": 0.25 },
          "body": { "length": "6.5 m", "width": "1.1 m", "height": "1.2 m" },
          "variants": {
            "clipped \u201ctips\u201d": { "wing": { "panels": [
              { "from": "0 m", "to": "4.1 m", "innerChord": "1.6 m", "outerChord": "1.15 m", "dihedral": "5 deg" } ] },
              "ailerons": { "to": "4 m" } },
            "heavy": { "mass": "900 kg" }
          }
        },
        "condition": { "pressureAltitude": "0 m", "trueAirspeed": "50 m/s" },
        "slip": "held", "inputs": [], "duration": "4 s"
      }
      """;

  private static final String CLIPPED = "clipped \u201ctips\u201d";

  private ScenarioDocument shaped() {
    return ScenarioDocument.ofText(SHAPED, directory);
  }

  @Test
  void valuesOfTheAeroplaneAreThoseOfTheChosenVariant() {
    ScenarioDocument base = shaped();
    ScenarioDocument clipped = base.with("$.variant", CLIPPED);

    assertThat(base.variants()).containsExactly(CLIPPED, "heavy");
    assertThat(base.variant()).isEmpty();
    assertThat(clipped.variant()).contains(CLIPPED);
    assertThat(base.aeroplaneText("wing.panels[0].to")).contains("4.5 m");
    assertThat(clipped.aeroplaneText("wing.panels[0].to")).contains("4.1 m");
    assertThat(clipped.aeroplaneText("ailerons.to")).contains("4 m");
    assertThat(clipped.aeroplaneText("ailerons.from")).as("of the base").contains("2.5 m");
    assertThat(clipped.aeroplaneCount("wing.panels")).isEqualTo(1);
    assertThat(clipped.aeroplaneHas("fin")).isFalse();
    // The reader merges by itself; both must see the same wing.
    assertThat(scenario(clipped).data().aeroplane().span()).isEqualTo(8.2);
    ScenarioDocument none = base.with("$.variant", "none such");
    assertThat(none.variant()).isEmpty();
    assertThat(none.aeroplaneText("mass")).contains("790 kg");
  }

  @Test
  void changesWhileAVariantFliesAreTheVariants() {
    ScenarioDocument heavy = shaped().with("$.variant", "heavy");

    ScenarioDocument wider = heavy.withAeroplane("wing.panels[0].to", "5 m");
    assertThat(scenario(wider).data().aeroplane().span()).isEqualTo(10);
    assertThat(wider.text("$.aeroplane.variants.heavy.wing.panels[0].outerChord"))
        .as("a list is a variant's as a whole")
        .contains("1.1 m");
    assertThat(scenario(wider.without("$.variant")).data().aeroplane().span()).isEqualTo(9);
    ScenarioDocument share = heavy.withAeroplaneNumber("ailerons.chordShare", "0.3");
    assertThat(share.aeroplaneText("ailerons.chordShare")).contains("0.3");
    assertThat(share.without("$.variant").aeroplaneText("ailerons.chordShare")).contains("0.25");
    ScenarioDocument bare = heavy.withoutAeroplane("ailerons");
    assertThat(bare.aeroplaneHas("ailerons")).isFalse();
    assertThat(bare.without("$.variant").aeroplaneHas("ailerons")).isTrue();
    ScenarioDocument lighter = heavy.withAeroplane("mass", "nothing");
    assertThat(paths(lighter)).containsExactly("$.aeroplane.variants.heavy.mass");
    assertThat(lighter.aeroplanePaths("mass"))
        .containsExactly("$.aeroplane.mass", "$.aeroplane.variants.heavy.mass");
  }

  @Test
  void changesWithoutAVariantAreTheBases() {
    ScenarioDocument wider = shaped().withAeroplane("wing.panels[0].to", "5 m");
    assertThat(wider.text("$.aeroplane.wing.panels[0].to")).contains("5 m");
    assertThat(wider.withoutAeroplane("ailerons").aeroplaneHas("ailerons")).isFalse();
    assertThat(wider.aeroplanePaths("mass")).containsExactly("$.aeroplane.mass");
    ScenarioDocument clipped =
        shaped().with("$.variant", CLIPPED).withAeroplane("ailerons.to", "3.9 kg");
    assertThat(clipped.aeroplanePaths("ailerons.to")).containsAll(paths(clipped));
  }

  /** Quick enough to be done while somebody types. */
  @Test
  void anEditWithItsCheckCostsLittle() {
    ScenarioDocument document =
        ScenarioDocument.open(Path.of("..", "scenarios", "light-single-roll-entry.json"));
    double[] times = new double[400];
    for (int i = 0; i < times.length; i++) {
      long start = System.nanoTime();
      ScenarioDocument edited = document.with("$.condition.trueAirspeed", 170 + i + " ft/s");
      assertThat(edited.check().scenario()).isPresent();
      times[i] = (System.nanoTime() - start) / 1e6;
    }
    double[] warm = Arrays.copyOfRange(times, times.length / 2, times.length);
    Arrays.sort(warm);
    // About 0.3 ms; a machine ten times slower still shows it within a frame.
    assertThat(warm[warm.length / 2]).as("ms, median").isLessThan(3);
  }
}
