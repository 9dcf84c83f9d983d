package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Valid files changed at random: whatever comes of it is a value or a list of faults. */
class MutatedFilesTest {
  private static final int FILES = 2000;
  private static final long SEED = 20_240_229;

  /** What people and programs put in the wrong place. */
  private static final String[] TOKENS = {
    "{",
    "}",
    "[",
    "]",
    ",",
    ":",
    "\"",
    "null",
    "true",
    "0",
    "-1",
    "1e308",
    "-1e308",
    "1e999",
    "NaN",
    "-Infinity",
    "5e-324",
    "\"0 s\"",
    "\"1e308 s\"",
    "\"1e300 deg\"",
    "\"-1 ft\"",
    "\"\"",
    "\\",
    "//",
    "\u0000",
    "\ufeff",
    "{}",
    "[]",
    "\"trueAirspeed\": \"1e-200 m/s\",",
    "\"movement\": \"1e308 s\","
  };

  @TempDir Path directory;

  @Test
  void nothingButAValueOrFaultsComesOfAnyFile() {
    Random random = new Random(SEED);
    String[] samples = {
      Samples.SCENARIO,
      Samples.SCENARIO_WITH_EVERY_KEY,
      Samples.SCENARIO_WITH_POWER,
      Samples.AEROPLANE,
      Samples.AEROPLANE_WITH_EVERY_KEY,
      Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY,
      Samples.TRACE
    };
    Path traced = Samples.writeScenario(directory, Samples.SCENARIO_WITH_EVERY_KEY);
    Samples.write(directory, "aeroplanes/some-aeroplane.json", Samples.AEROPLANE);
    int accepted = 0;
    for (int i = 0; i < FILES; i++) {
      int sample = i % samples.length;
      byte[] mutated = mutated(samples[sample], random);
      String text = new String(mutated, StandardCharsets.ISO_8859_1);
      boolean isTrace = sample == samples.length - 1;
      boolean isScenario = sample < 3;
      // A file of this size takes about a millisecond; a second is far beyond a slow machine.
      accepted +=
          assertTimeoutPreemptively(
              Duration.ofSeconds(1),
              () -> isAccepted(mutated, isScenario, isTrace, traced) ? 1 : 0,
              text);
      if (isTrace) {
        Samples.write(directory, "traces/hand.csv", Samples.TRACE);
      }
    }
    // Some changes hit blanks, titles and digits; most do harm.
    assertThat(accepted).isBetween(FILES / 50, FILES / 2);
  }

  private boolean isAccepted(byte[] bytes, boolean isScenario, boolean isTrace, Path traced)
      throws IOException {
    Path file = Files.write(directory.resolve(isTrace ? "traces/hand.csv" : "mutated.json"), bytes);
    try {
      if (isTrace) {
        assertThat(ScenarioFile.read(traced)).isNotNull();
      } else if (isScenario) {
        assertThat(ScenarioFile.read(file)).isNotNull();
      } else {
        assertThat(AeroplaneFile.read(file)).isNotNull();
      }
      return true;
    } catch (FileFaultsException e) {
      assertThat(e.faults()).isNotEmpty();
      for (FileFault fault : e.faults()) {
        assertThat(fault.jsonPath()).startsWith("$");
        assertThat(fault.message()).isNotBlank().doesNotContain("\n");
        assertThat(fault.message()).doesNotContainIgnoringCase("jackson", "redacted", "exception");
      }
      return false;
    }
  }

  private static byte[] mutated(String sample, Random random) {
    if (random.nextBoolean()) {
      return mutatedBytes(sample.getBytes(StandardCharsets.UTF_8), random);
    }
    List<String> tokens = tokens(sample);
    for (int changes = 1 + random.nextInt(3); changes > 0; changes--) {
      int at = random.nextInt(tokens.size());
      int other = random.nextInt(tokens.size());
      switch (random.nextInt(5)) {
        case 0 -> tokens.remove(at);
        case 1 -> tokens.add(at, tokens.get(at));
        case 2 -> Collections.swap(tokens, at, other);
        case 3 -> tokens.set(at, tokens.get(other));
        default -> tokens.set(at, TOKENS[random.nextInt(TOKENS.length)]);
      }
    }
    return String.join("", tokens).getBytes(StandardCharsets.UTF_8);
  }

  private static byte[] mutatedBytes(byte[] sample, Random random) {
    List<Byte> bytes = new ArrayList<>();
    for (byte b : sample) {
      bytes.add(b);
    }
    for (int changes = 1 + random.nextInt(3); changes > 0; changes--) {
      int at = random.nextInt(bytes.size());
      switch (random.nextInt(5)) {
        case 0 -> bytes.remove(at);
        case 1 -> bytes.add(at, bytes.get(at));
        case 2 -> Collections.swap(bytes, at, random.nextInt(bytes.size()));
        case 3 -> bytes.set(at, (byte) random.nextInt(256));
        default -> bytes.subList(at, Math.min(at + random.nextInt(20), bytes.size())).clear();
      }
    }
    byte[] mutated = new byte[bytes.size()];
    for (int i = 0; i < mutated.length; i++) {
      mutated[i] = bytes.get(i);
    }
    return mutated;
  }

  /** Texts, words and single marks; what stands between them goes with them. */
  private static List<String> tokens(String sample) {
    List<String> tokens = new ArrayList<>();
    int i = 0;
    while (i < sample.length()) {
      int end = i + 1;
      if (sample.charAt(i) == '"') {
        end = sample.indexOf('"', i + 1) + 1;
      } else if (Character.isLetterOrDigit(sample.charAt(i))) {
        while (end < sample.length()
            && (Character.isLetterOrDigit(sample.charAt(end)) || sample.charAt(end) == '.')) {
          end++;
        }
      }
      tokens.add(sample.substring(i, end));
      i = end;
    }
    return tokens;
  }
}
