package org.rolltrace.ui.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The jar that users run. */
class RunnableJarIT {
  private static final Path JAR = Path.of("target", "rolltrace.jar");
  private static final Path ARCHIVE = Path.of("target", "rolltrace.jsa");
  private static final String ROLL_ENTRY =
      Path.of("..", "scenarios", "light-single-roll-entry.json").toString();

  @TempDir Path folder;

  private record Answer(int exitCode, String out, String err) {}

  private Answer java(List<String> options, String... arguments)
      throws IOException, InterruptedException {
    List<String> all = new ArrayList<>(options);
    all.add("-jar");
    all.add(JAR.toString());
    all.addAll(List.of(arguments));
    return virtualMachine(all);
  }

  private Answer virtualMachine(List<String> arguments) throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(arguments);
    File out = folder.resolve("out").toFile();
    File err = folder.resolve("err").toFile();
    ProcessBuilder builder = new ProcessBuilder(command).redirectOutput(out).redirectError(err);
    builder.environment().put("LC_ALL", "C");
    builder.environment().put("LANG", "C");
    Process process = builder.start();
    assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
    return new Answer(
        process.exitValue(),
        Files.readString(out.toPath(), StandardCharsets.UTF_8),
        Files.readString(err.toPath(), StandardCharsets.UTF_8));
  }

  @Test
  void carriesLicencesAndNoticesAndNothingOfTheTests() throws IOException {
    try (JarFile jar = new JarFile(JAR.toFile())) {
      assertThat(jar.getEntry("META-INF/LICENSE")).isNotNull();
      assertThat(jar.getEntry("META-INF/LICENSE.txt")).isNotNull();
      assertThat(jar.getEntry("META-INF/THIRD-PARTY.txt")).isNotNull();
      String notice =
          new String(
              jar.getInputStream(jar.getEntry("META-INF/NOTICE")).readAllBytes(),
              StandardCharsets.UTF_8);
      assertThat(notice).contains("Rolltrace").contains("Hipparchus").contains("Jackson");
      assertThat(jar.getManifest().getMainAttributes().getValue("Automatic-Module-Name"))
          .isEqualTo("org.rolltrace.ui");
      assertThat(jar.stream().map(entry -> entry.getName()))
          .noneMatch(
              name ->
                  name.startsWith("org/junit")
                      || name.startsWith("org/assertj")
                      || name.startsWith("com/tngtech")
                      || name.startsWith("org/ejml")
                      || name.startsWith("tech/units")
                      || name.startsWith("com/networknt")
                      || (name.startsWith("org/rolltrace") && name.endsWith("Test.class")));
    }
  }

  @Test
  void namesItsCommit() throws IOException, InterruptedException {
    Answer answer = java(List.of(), "--version");
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).containsPattern("^Rolltrace \\S+ \\(commit \\w+");
  }

  @Test
  void fliesUnderThePlainLocaleAndOneWithDecimalCommas() throws IOException, InterruptedException {
    Answer plain = java(List.of(), "fly", ROLL_ENTRY);
    assertThat(plain.exitCode()).as(plain.err()).isZero();
    assertThat(plain.out()).contains("-8.431 1/s").doesNotContain("?");
    Answer german = java(List.of("-Duser.language=de", "-Duser.country=DE"), "fly", ROLL_ENTRY);
    assertThat(german.out()).isEqualTo(plain.out());
  }

  @Test
  void bytesOfTheDegreeOfErrorsStayReadable() throws IOException, InterruptedException {
    Path file = Files.writeString(folder.resolve("bad.json"), "{ \"°\": 1 }");
    Answer answer = java(List.of(), "fly", file.toString());
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.err()).contains("°");
  }

  @Test
  void exitCodesReachTheShell() throws IOException, InterruptedException {
    assertThat(java(List.of(), "fly").exitCode()).isEqualTo(2);
    assertThat(java(List.of(), "fly", "none.json").exitCode()).isEqualTo(2);
    Path taken = Files.writeString(folder.resolve("taken"), "x");
    assertThat(java(List.of(), "fly", ROLL_ENTRY, "--out", taken.toString()).exitCode())
        .isEqualTo(3);
  }

  private static List<String> withArchive(Path archive) {
    return List.of("-Xlog:disable", "-XX:SharedArchiveFile=" + archive);
  }

  /** Only a virtual machine that shares its own classes, which not every JDK does, can make one. */
  @Test
  void theBuildMakesAClassDataArchiveWhereItCan() throws IOException, InterruptedException {
    assumeThat(virtualMachine(List.of("-Xshare:on", "-version")).exitCode()).isZero();
    assertThat(ARCHIVE).isNotEmptyFile();
    Path loaded = folder.resolve("loaded");
    Answer answer =
        java(
            List.of(
                "-XX:SharedArchiveFile=" + ARCHIVE,
                "-Xlog:class+load=info:file=" + loaded.toAbsolutePath()),
            "fly",
            ROLL_ENTRY);
    assertThat(answer.exitCode()).as(answer.err()).isZero();
    assertThat(Files.readString(loaded))
        .containsPattern(
            "org\\.rolltrace\\.core\\.run\\.ScenarioRun .*shared objects file \\(top\\)");
  }

  /** With the archive, without it, and with one that is damaged. */
  @Test
  void anArchiveChangesNothingInWhatIsPrinted() throws IOException, InterruptedException {
    Path damaged = Files.writeString(folder.resolve("damaged.jsa"), "no archive");
    for (String form : new String[] {"--json", "--tolerance=1e-9"}) {
      Answer plain = java(List.of(), "fly", ROLL_ENTRY, form);
      assertThat(plain.exitCode()).isZero();
      for (Path archive : List.of(ARCHIVE, folder.resolve("none.jsa"), damaged)) {
        assertThat(java(withArchive(archive), "fly", ROLL_ENTRY, form))
            .as("%s %s", archive, form)
            .isEqualTo(plain);
      }
    }
  }

  /** A history of a million samples, some 80 MB, in a quarter of that. */
  @Test
  void tooLittleMemoryEndsWithThreeAndASentence() throws IOException, InterruptedException {
    Answer answer =
        java(
            List.of("-Xmx24m"),
            "fly",
            Path.of("..", "scenarios", "light-single-held-stick.json").toString(),
            "--rate",
            "3000");
    assertThat(answer.exitCode()).isEqualTo(3);
    assertThat(answer.err()).contains("out of memory").doesNotContain("\tat ");
    assertThat(answer.out()).isEmpty();
  }
}
