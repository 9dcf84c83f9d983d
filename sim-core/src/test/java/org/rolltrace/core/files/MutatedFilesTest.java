package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;

/**
 * Valid files changed at random: whatever comes of it is the value that stands there or a list of
 * faults, in time, and nothing half-written. The profile "mutated" takes many more files.
 */
class MutatedFilesTest {
  private static final int FILES = Integer.getInteger("rolltrace.mutatedFiles", 2000);
  private static final long SEED = Long.getLong("rolltrace.mutationSeed", 20_240_229);

  /** One accepted file in so many is also flown, or saved from the window's document. */
  private static final int SELDOM = 20;

  private static final SchemaRegistry REGISTRY =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
  private static final Schema SCENARIO_SCHEMA = REGISTRY.getSchema(Schemas.text("scenario"));
  private static final Schema AEROPLANE_SCHEMA = REGISTRY.getSchema(Schemas.text("aeroplane"));

  /** A dimensional set whose rows stand alone, so that each can be checked by itself. */
  private static final String PLAIN_DIMENSIONAL_SET =
      Samples.with(
          Samples.with(
              Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY,
              "\"axes\": \"body\",\n  \"angleOfAttack\": \"6 deg\",",
              "\"axes\": \"stability\","),
          "\"primed\": true",
          "\"primed\": false");

  /** A shape that is also flown. */
  private static final String SHAPE_IN_A_SCENARIO =
      Samples.with(
          Samples.SCENARIO_OF_A_VARIANT,
          "\"aeroplanes/shape.json\"",
          Samples.AEROPLANE_WITH_SHAPE.strip());

  private enum Kind {
    SCENARIO,
    AEROPLANE,
    TRACE,
    TRACE_IN_PER_CENT
  }

  private record Sample(Kind kind, String text) {}

  private static final Sample[] SAMPLES = {
    new Sample(Kind.SCENARIO, Samples.SCENARIO),
    new Sample(Kind.SCENARIO, Samples.SCENARIO_WITH_EVERY_KEY),
    new Sample(Kind.SCENARIO, Samples.SCENARIO_WITH_POWER),
    new Sample(Kind.AEROPLANE, Samples.AEROPLANE),
    new Sample(Kind.AEROPLANE, Samples.AEROPLANE_WITH_EVERY_KEY),
    new Sample(Kind.AEROPLANE, Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY),
    new Sample(Kind.AEROPLANE, PLAIN_DIMENSIONAL_SET),
    new Sample(Kind.AEROPLANE, Samples.AEROPLANE_WITH_SHAPE),
    new Sample(Kind.SCENARIO, Samples.SCENARIO_OF_A_VARIANT),
    new Sample(Kind.SCENARIO, SHAPE_IN_A_SCENARIO),
    new Sample(Kind.TRACE, Samples.TRACE),
    new Sample(Kind.TRACE_IN_PER_CENT, Samples.TRACE),
  };

  @TempDir Path directory;

  private final SecondReading second = new SecondReading();
  private int flown;
  private int saved;

  @Test
  void nothingButTheValueOrFaultsComesOfAnyFile() {
    Random random = new Random(SEED);
    Samples.write(directory, "aeroplanes/some-aeroplane.json", Samples.AEROPLANE);
    Samples.write(directory, "aeroplanes/shape.json", Samples.AEROPLANE_WITH_SHAPE);
    int accepted = 0;
    for (int i = 0; i < FILES; i++) {
      Sample sample = SAMPLES[i % SAMPLES.length];
      byte[] mutated = Mutations.of(sample.text(), random);
      boolean seldom = random.nextInt(SELDOM) == 0;
      String told =
          "file " + i + " of seed " + SEED + ":\n" + new String(mutated, StandardCharsets.UTF_8);
      // A file of this size takes a millisecond and a flight of an hour a second or two; half a
      // minute is far beyond a slow machine with a hard disk.
      accepted +=
          assertTimeoutPreemptively(
              Duration.ofSeconds(seldom ? 30 : 2),
              () -> isAccepted(sample.kind(), mutated, seldom, told) ? 1 : 0,
              told);
    }
    // Some changes hit blanks, titles and digits; most do harm.
    assertThat(accepted).isBetween(FILES / 20, FILES / 2);
    assertThat(second.compared()).as("numbers compared").isGreaterThan(5 * accepted);
    assertThat(flown).isGreaterThan(FILES / 2000);
    assertThat(saved).isGreaterThan(FILES / 2000);
  }

  private boolean isAccepted(Kind kind, byte[] bytes, boolean seldom, String told) {
    try {
      return switch (kind) {
        case SCENARIO -> scenario(bytes, seldom);
        case AEROPLANE -> aeroplane(bytes);
        case TRACE -> trace(bytes, "stick", seldom);
        case TRACE_IN_PER_CENT -> trace(bytes, "pedal", seldom);
      };
    } catch (FileFaultsException e) {
      assertThat(e.faults()).as(told).isNotEmpty();
      for (FileFault fault : e.faults()) {
        assertThat(fault.jsonPath()).as(told).startsWith("$");
        assertThat(fault.message()).as(told).isNotBlank().doesNotContain("\n");
        assertThat(fault.message())
            .as(told)
            .doesNotContainIgnoringCase("jackson", "redacted", "exception");
      }
      return false;
    } catch (IOException | RuntimeException | AssertionError e) {
      throw new AssertionError(told, e);
    }
  }

  private boolean scenario(byte[] bytes, boolean seldom) throws IOException {
    Samples.write(directory, "traces/hand.csv", Samples.TRACE);
    Path file = Files.write(directory.resolve("mutated.json"), bytes);
    if (seldom) {
      save(file);
    }
    Scenario scenario = ScenarioFile.read(file);
    JsonNode tree = SecondReading.tree(bytes);
    second.scenario(tree, scenario, directory);
    JsonNode picked = SecondReading.picked(tree); // what a variant replaces is not looked at
    assertThat(SCENARIO_SCHEMA.validate(picked.toString(), InputFormat.JSON)).isEmpty();
    if (seldom) {
      fly(scenario);
    }
    return true;
  }

  private boolean aeroplane(byte[] bytes) throws IOException {
    Path file = Files.write(directory.resolve("mutated.json"), bytes);
    var all = AeroplaneFile.readAll(file);
    JsonNode tree = SecondReading.tree(bytes);
    second.aeroplanes(tree, all);
    assertThat(AEROPLANE_SCHEMA.validate(tree.toString(), InputFormat.JSON)).isEmpty();
    return true;
  }

  private boolean trace(byte[] bytes, String column, boolean seldom) throws IOException {
    Path file =
        Samples.writeScenario(
            directory,
            Samples.with(
                Samples.SCENARIO_WITH_EVERY_KEY,
                "\"column\": \"stick\"",
                "\"column\": \"" + column + "\""));
    Files.write(directory.resolve("traces/hand.csv"), bytes);
    Scenario scenario = ScenarioFile.read(file);
    second.scenario(SecondReading.tree(Files.readAllBytes(file)), scenario, directory);
    if (seldom) {
      fly(scenario);
    }
    return true;
  }

  /** What the window keeps of a file, right or wrong, is written whole and means the same. */
  private void save(Path file) throws IOException {
    ScenarioDocument document = ScenarioDocument.open(file);
    Path folder = Files.createTempDirectory(directory, "saved");
    Files.createDirectories(folder.resolve("traces"));
    Files.copy(directory.resolve("traces/hand.csv"), folder.resolve("traces/hand.csv"));
    Path copy = folder.resolve("copy.json");
    ScenarioDocument written = ScenarioFile.write(copy, document);
    assertThat(Files.readString(copy)).isEqualTo(written.json());
    assertThat(namesIn(folder)).containsExactlyInAnyOrder("copy.json", "traces");
    assertThat(ScenarioDocument.open(copy)).isEqualTo(written);
    saved++;
  }

  /** A result is there whole or not at all. */
  private void fly(Scenario scenario) throws IOException {
    Path folder = Files.createTempDirectory(directory, "flown");
    flown++;
    try {
      ResultFolder.write(folder, ScenarioRun.execute(scenario), "a test");
    } catch (CalculationException e) {
      assertThat(e.getMessage()).isNotBlank();
      assertThat(namesIn(folder)).isEmpty();
      return;
    }
    assertThat(namesIn(folder)).containsExactlyInAnyOrder("history.csv", "result.json");
    assertThat(
            SecondReading.tree(Files.readAllBytes(folder.resolve("result.json")))
                .get("format")
                .textValue())
        .isEqualTo("rolltrace-result/1");
    assertThat(Files.readString(folder.resolve("history.csv")))
        .endsWith("\n")
        .doesNotContain("NaN", "Infinity");
    Files.delete(folder.resolve("history.csv")); // up to an hour of samples
  }

  private static String[] namesIn(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).toArray(String[]::new);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
