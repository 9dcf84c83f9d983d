package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;

/** Sample files, and ways to spoil them. */
final class Samples {
  static final String SCENARIO = resource("roll-entry.json");
  static final String SCENARIO_WITH_EVERY_KEY = resource("every-key.json");
  static final String SCENARIO_WITH_POWER = resource("power.json");
  static final String SCENARIO_OF_A_VARIANT = resource("variant.json");
  static final String AEROPLANE = resource("aeroplanes/some-aeroplane.json");
  static final String AEROPLANE_WITH_EVERY_KEY = resource("aeroplanes/every-key.json");
  static final String AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY =
      resource("aeroplanes/every-dimensional-key.json");

  static final String AEROPLANE_WITH_SHAPE = resource("aeroplanes/shape.json");

  static final String TRACE = resource("traces/hand.csv");

  private Samples() {}

  private static String resource(String name) {
    try (InputStream in = Samples.class.getResourceAsStream("/files/" + name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A sample with one part of it replaced. */
  static String with(String sample, String part, String replacement) {
    assertThat(sample).as("the sample").containsOnlyOnce(part);
    return sample.replace(part, replacement);
  }

  static Path write(Path directory, String name, String text) {
    try {
      Path file = directory.resolve(name);
      Files.createDirectories(file.getParent());
      return Files.writeString(file, text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Writes a scenario beside the aeroplane and the trace that it may name. */
  static Path writeScenario(Path directory, String text) {
    write(directory, "traces/hand.csv", TRACE);
    write(directory, "aeroplanes/some-aeroplane.json", AEROPLANE);
    write(directory, "aeroplanes/shape.json", AEROPLANE_WITH_SHAPE);
    return write(directory, "scenario.json", text);
  }

  static FileFaultsException refusalOfScenario(Path file) {
    return refusal(() -> ScenarioFile.read(file));
  }

  static FileFaultsException refusalOfAeroplane(Path file) {
    return refusal(() -> AeroplaneFile.read(file));
  }

  private static FileFaultsException refusal(ThrowingCallable reading) {
    FileFaultsException refusal = catchThrowableOfType(FileFaultsException.class, reading);
    assertThat(refusal).as("refusal").isNotNull();
    return refusal;
  }

  static FileFault only(FileFaultsException refusal) {
    List<FileFault> faults = refusal.faults();
    assertThat(faults).hasSize(1);
    return faults.get(0);
  }
}
