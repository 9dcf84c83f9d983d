package org.rolltrace.ui.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.derivatives.EstimateMethod;

/** {@code derive} as its user meets it. */
class DeriveCommandTest {
  private static final String TOURER =
      Path.of("..", "sim-core/src/test/resources/files/aeroplanes/linnetfield-tourer.json")
          .toString();
  private static final Path AEROPLANES = Path.of("..", "scenarios", "aeroplanes");

  @TempDir Path folder;

  private record Answer(int exitCode, String out, String err) {}

  private static Answer run(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    List<String> all = new ArrayList<>(List.of("derive"));
    all.addAll(List.of(arguments));
    int exitCode =
        CommandLineProgram.run(
            all.toArray(String[]::new), new PrintWriter(out), new PrintWriter(err), file -> {});
    assertThat(err.toString()).doesNotContain("\tat ").doesNotContain("Exception");
    return new Answer(exitCode, out.toString(), err.toString());
  }

  private String changed(String old, String text) throws IOException {
    String before = Files.readString(Path.of(TOURER));
    assertThat(before).contains(old);
    return Files.writeString(folder.resolve("changed.json"), before.replace(old, text)).toString();
  }

  @Test
  void eachDerivativeHasItsOriginAndItsParts() {
    Answer answer = run(TOURER);
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out())
        .contains("the condition for which the given derivatives hold")
        .containsPattern("Cl_p +-0\\.4\\d{4}  estimated\n +wing +-0\\.4\\d{4}  lifting surface\n")
        .containsPattern("Cn_beta +0\\.08500  set over an estimate +0\\.05\\d{3}  -3\\d\\.\\d %")
        .containsPattern("CY_da +-  absent")
        .containsPattern("slender body +30 % of itself")
        .containsPattern("Roll-mode time constant +0\\.1428 s")
        .containsPattern("Helix angle at full stick +8\\.562 deg +0\\.1494 rad")
        .contains("estimated by radii of gyration")
        .contains("flight must follow");
    assertThat(answer.out().lines()).allMatch(line -> line.length() <= 120);
    assertThat(answer.out().lines()).noneMatch(line -> line.endsWith(" "));
    assertThat(answer.err()).contains("caution: estimated from the shape and never checked");
  }

  @Test
  void variantsStandBesideTheBaseWithTheirChanges() {
    Answer answer = run(TOURER);
    assertThat(answer.out())
        .contains("  larger fin:       fin\n")
        .contains("  lower limit:      limits; no derivative and no figure changes")
        .containsPattern("Span, m +9\\.400 +8\\.800 +-0\\.6000 +-6\\.4 % +same\n");
    Answer picked = run(TOURER, "--variant", "less dihedral", "--variant", "larger fin");
    assertThat(picked.out()).contains("less dihedral").doesNotContain("clipped tips");
    assertThat(picked.out().indexOf("less dihedral:")).isLessThan(picked.out().indexOf("larger"));
  }

  @ParameterizedTest
  @CsvSource({
    "--speed, 100 kt, 100.0 kt true",
    "--calibrated, 100 kt, 100.0 kt calibrated",
    "--equivalent, 100 kt, 100.0 kt equivalent",
    "--altitude, 8000 ft, 8000 ft (2438 m)",
    "--load-factor, 2.5, load factor       2.500"
  })
  void theConditionIsAsAskedFor(String option, String value, String words) {
    Answer answer = run(TOURER, option, value);
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).contains(words).contains("as asked for");
  }

  @Test
  void jsonIsOneDocumentAndNothingElse() {
    Answer answer = run(TOURER, "--json");
    assertThat(answer.exitCode()).isZero();
    assertThat(answer.out()).startsWith("{").endsWith("}\n");
    assertThat(answer.out()).contains("\"format\" : \"rolltrace-derivatives/1\"");
  }

  @Test
  void outAndChartsWriteTheirFiles() {
    Path out = folder.resolve("out");
    Path charts = folder.resolve("charts");
    Answer answer = run(TOURER, "--out", out.toString(), "--charts", charts.toString());
    assertThat(answer.exitCode()).isZero();
    assertThat(out.resolve("derivatives.json")).isNotEmptyFile();
    assertThat(out.resolve("loadings-clipped-tips.csv")).isNotEmptyFile();
    for (String name : List.of("shape.svg", "shape.png", "loadings.svg", "loadings.png")) {
      assertThat(charts.resolve(name)).isNotEmptyFile();
      assertThat(answer.err()).contains("wrote " + charts.resolve(name));
    }
  }

  @Test
  void whatCannotBeWrittenEndsWithThree() throws IOException {
    Path file = Files.writeString(folder.resolve("taken"), "mine");
    for (String option : List.of("--out", "--charts")) {
      Answer answer = run(TOURER, option, file.toString());
      assertThat(answer.exitCode()).isEqualTo(3);
      assertThat(answer.err()).contains("cannot write the result into " + file);
      assertThat(answer.out()).isEmpty();
    }
  }

  @Test
  void whatIsNotFiniteEndsWithThree() throws IOException {
    Answer answer = run(changed("\"profileDrag\": 0.009", "\"profileDrag\": 1.7e308"), "--json");
    assertThat(answer.exitCode()).isEqualTo(3);
    assertThat(answer.err()).contains("Cn_r of Linnetfield tourer");
    assertThat(answer.out()).isEmpty();
  }

  @Test
  void methodsNeedNoAeroplane() {
    Answer answer = run("--methods");
    assertThat(answer.exitCode()).isZero();
    for (EstimateMethod method : EstimateMethod.values()) {
      assertThat(answer.out()).contains("\n  " + method.title() + "\n");
    }
    assertThat(answer.out()).contains("J. Weissinger, NACA TM 1120, 1947").contains("known error");
  }

  @Test
  void faultsOfBaseAndVariantsAreReportedWithPathAndLine() throws IOException {
    Answer answer =
        run(changed("\"area\": \"1.7 m2\"", "\"area\": \"-1.7 m2\", \"colour\": \"red\""));
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.out()).isEmpty();
    assertThat(answer.err())
        .contains("changed.json:42: $.variants[\"larger fin\"].fin.area: ")
        .contains("changed.json:42: $.variants[\"larger fin\"].fin.colour: as variant")
        .contains("unknown key \"colour\"");
  }

  static List<List<String>> bad() {
    return List.of(
        List.of(),
        List.of("none.json"),
        List.of(TOURER, "--unknown"),
        List.of(TOURER, "--speed", "120"),
        List.of(TOURER, "--speed", "120 kg"),
        List.of(TOURER, "--speed", "-120 kt"),
        List.of(TOURER, "--speed", "900 kt"),
        List.of(TOURER, "--speed", "120 kt", "--calibrated", "120 kt"),
        List.of(TOURER, "--altitude", "3000"),
        List.of(TOURER, "--altitude", "90 km"),
        List.of(TOURER, "--load-factor", "NaN"),
        List.of(TOURER, "--load-factor", "two"),
        List.of(TOURER, "--variant", "none"),
        List.of(AEROPLANES.resolve("light-single.json").toString(), "--variant", "none"),
        List.of(AEROPLANES.resolve("light-single.json").toString(), "--charts", "never"));
  }

  @ParameterizedTest
  @MethodSource("bad")
  void badArgumentsEndWithTwo(List<String> arguments) {
    Answer answer = run(arguments.toArray(String[]::new));
    assertThat(answer.exitCode()).isEqualTo(2);
    assertThat(answer.err()).isNotBlank();
    assertThat(answer.out()).isEmpty();
    assertThat(Path.of("never")).doesNotExist();
  }

  @Test
  void aVariantThatIsNotThereIsNamedWithThoseThatAre() {
    assertThat(run(TOURER, "--variant", "none").err())
        .contains("no variant 'none'")
        .contains("'clipped tips', 'less dihedral', 'larger fin', 'lower limit'");
  }

  static List<Path> shipped() throws IOException {
    try (Stream<Path> files = Files.list(AEROPLANES)) {
      return files.sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void everyShippedAeroplaneIsDerived(Path file) {
    Answer answer = run(file.toString());
    assertThat(answer.exitCode()).as(answer.err()).isZero();
    assertThat(answer.out())
        .contains("Roll-mode time constant")
        .contains("Results are for planning");
    assertThat(answer.out()).doesNotContain("NaN").doesNotContain("Infinity");
    assertThat(answer.out().lines()).allMatch(line -> line.length() <= 120);
  }

  @Test
  void aDecimalCommaLocaleChangesNothing() {
    Locale before = Locale.getDefault();
    try {
      String plain = run(TOURER).out();
      Locale.setDefault(Locale.GERMANY);
      assertThat(run(TOURER).out()).isEqualTo(plain);
    } finally {
      Locale.setDefault(before);
    }
  }
}
