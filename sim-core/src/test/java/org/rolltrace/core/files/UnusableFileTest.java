package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that cannot be read, or hold no JSON text. */
class UnusableFileTest {
  @TempDir Path directory;

  private void assertWhole(Path file, String message) {
    for (FileFaultsException refusal :
        new FileFaultsException[] {
          Samples.refusalOfScenario(file), Samples.refusalOfAeroplane(file)
        }) {
      FileFault fault = Samples.only(refusal);
      assertThat(fault).isEqualTo(new FileFault(file, "$", 0, 0, message));
      assertThat(refusal).hasMessage(file + ": " + message);
    }
  }

  @Test
  void missing() {
    assertWhole(directory.resolve("none.json"), "does not exist; check its name and directory");
  }

  @Test
  void directory() {
    assertWhole(directory, "is a directory; expected a file");
  }

  @Test
  void noRegularFile() {
    assertWhole(Path.of("/dev/zero"), "is a device or pipe; expected a file");
  }

  @Test
  void throughAFileAsIfItWereADirectory() throws IOException {
    Path file = Files.writeString(directory.resolve("plain"), "{}");
    FileFault fault = Samples.only(Samples.refusalOfScenario(file.resolve("s.json")));
    assertThat(fault.message()).startsWith("cannot be read; the system says: ");
  }

  @Test
  void linksInACircle() throws IOException {
    Path one = directory.resolve("one.json");
    Path two = Files.createSymbolicLink(directory.resolve("two.json"), one);
    Files.createSymbolicLink(one, two);
    FileFault fault = Samples.only(Samples.refusalOfScenario(one));
    assertThat(fault.message()).startsWith("cannot be read; the system says: ");
  }

  @Test
  void notReadable() throws IOException {
    Path file = Samples.write(directory, "closed.json", Samples.SCENARIO);
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("-w-------"));
    assumeFalse(Files.isReadable(file), "the administrator reads everything");
    assertWhole(file, "may not be read; check its permissions");
  }

  @Test
  void empty() throws IOException {
    assertWhole(
        Files.writeString(directory.resolve("e.json"), ""),
        "is empty; expected an object in braces { }");
    assertWhole(
        Files.writeString(directory.resolve("b.json"), "\uFEFF \n\t"),
        "is empty; expected an object in braces { }");
  }

  @Test
  void hugeFilesAreRefusedUnread() throws IOException {
    Path file = directory.resolve("huge.json");
    try (RandomAccessFile sparse = new RandomAccessFile(file.toFile(), "rw")) {
      sparse.setLength(100_000_000_000L); // could not be read in time, nor held
    }
    assertTimeoutPreemptively(
        Duration.ofSeconds(2),
        () ->
            assertWhole(
                file,
                "is too large: expected at most 1048576 bytes (1 MiB), found 100000000000 bytes"));
  }

  @Test
  void theLargestFileIsStillRead() throws IOException {
    String padded = Samples.SCENARIO + " ".repeat(TextFile.LARGEST - Samples.SCENARIO.length());
    Path file = Samples.writeScenario(directory, padded);
    assertThat(ScenarioFile.read(file).duration()).isEqualTo(10);
    Files.writeString(file, padded + " ");
    assertWhole(file, "is too large: expected at most 1048576 bytes (1 MiB), found 1048577 bytes");
  }

  @Test
  void notUtf8() throws IOException {
    Path file = directory.resolve("latin.json");
    // 0xE9 is é in ISO 8859-1, and in UTF-8 (RFC 3629) the first of three bytes.
    Files.write(file, "{\r\n  \"title\": \"caf\u00e9\" }".getBytes(StandardCharsets.ISO_8859_1));
    assertThat(Samples.only(Samples.refusalOfScenario(file)))
        .isEqualTo(
            new FileFault(file, "$", 2, 16, "byte 0xe9 is not UTF-8; save the file as UTF-8"));
    Files.write(file, Samples.SCENARIO.getBytes(StandardCharsets.UTF_16));
    assertThat(Samples.only(Samples.refusalOfScenario(file)))
        .isEqualTo(
            new FileFault(file, "$", 1, 1, "byte 0xfe is not UTF-8; save the file as UTF-8"));
    Files.write(file, new byte[] {'{', '"', (byte) 0xc3});
    assertThat(Samples.only(Samples.refusalOfScenario(file)).message())
        .isEqualTo("byte 0xc3 is not UTF-8; save the file as UTF-8");
  }

  @Test
  void tooDeep() throws IOException {
    int deepest = 32;
    Path file = directory.resolve("deep.json");
    Files.writeString(
        file, "{ \"note\":\n" + "[".repeat(deepest - 1) + "]".repeat(deepest - 1) + "}");
    assertThat(Samples.refusalOfScenario(file).faults())
        .extracting(FileFault::message)
        .noneMatch(message -> message.contains("nested"));
    for (int more : new int[] {1, 1000, 500_000}) {
      int depth = deepest - 1 + more;
      Files.writeString(file, "{ \"note\":\n" + "[".repeat(depth) + "]".repeat(depth) + "}");
      FileFault fault = Samples.only(Samples.refusalOfScenario(file));
      assertThat(fault.message()).isEqualTo("this is nested deeper than 32 levels");
      assertThat(fault.line()).isEqualTo(2);
      assertThat(fault.column()).isEqualTo(32);
      assertThat(fault.jsonPath()).isEqualTo("$.note" + "[0]".repeat(31));
    }
  }

  @Test
  void tooManyValues() throws IOException {
    Path file = directory.resolve("many.json");
    Files.writeString(file, "{ \"inputs\": [" + "0,".repeat(500_000) + "0] }");
    FileFault fault = Samples.only(Samples.refusalOfScenario(file));
    assertThat(fault.message())
        .isEqualTo("the file has more than 20000 values; expected far fewer");
    assertThat(fault.jsonPath()).isEqualTo("$.inputs[19998]");
  }

  @Test
  void manyKeysAreNoSlowerThanTheyAreLong() throws IOException {
    StringBuilder keys = new StringBuilder("{ \"format\": \"rolltrace-scenario/1\"");
    for (int i = 0; i < 19_000; i++) {
      keys.append(", \"titl").append(i).append("\": 0");
    }
    Path file = Files.writeString(directory.resolve("keys.json"), keys.append(" }"));
    FileFaultsException refusal =
        assertTimeoutPreemptively(
            Duration.ofSeconds(5), () -> Samples.refusalOfScenario(file)); // takes some 0.3 s
    assertThat(refusal.faults()).hasSize(200);
    assertThat(refusal.omitted()).isEqualTo(18_805); // and five keys are missing
  }
}
