package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.run.AskedCondition;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.scenario.AeroplaneData;

class DerivativesWritingTest {
  private static final Path TOURER =
      Path.of("src/test/resources/files/aeroplanes/linnetfield-tourer.json");

  @TempDir Path folder;

  private static DerivativeReport report(Path file) {
    Map<String, AeroplaneData> all = new LinkedHashMap<>(AeroplaneFile.readAll(file));
    AeroplaneData base = all.remove("");
    return DerivativeReport.of(base, all, AskedCondition.NOTHING.of(base));
  }

  private Path changed(String old, String text) throws IOException {
    String before = Files.readString(TOURER);
    assertThat(before).contains(old);
    return Files.writeString(folder.resolve("changed.json"), before.replace(old, text));
  }

  private static JsonNode json(DerivativeReport report) throws IOException {
    StringWriter out = new StringWriter();
    DerivativesJson.write(report, "test", out);
    assertThat(out.toString()).doesNotContain("NaN").doesNotContain("Infinity").endsWith("}\n");
    return new ObjectMapper().readTree(out.toString());
  }

  @Test
  void theDocumentHasTheEstimatesPartByPart() throws IOException {
    DerivativeReport report = report(TOURER);
    JsonNode json = json(report);
    assertThat(json.get("format").asText()).isEqualTo("rolltrace-derivatives/1");
    assertThat(json.at("/condition/trueAirspeed").asDouble()).isCloseTo(61.7333, within(1e-4));
    AeroplaneData data = AeroplaneFile.read(TOURER);
    GeometryEstimate shape = data.estimate(report.condition().condition().get()).orElseThrow();
    for (Coefficient coefficient : Coefficient.values()) {
      JsonNode one = json.at("/base/derivatives/" + coefficient.symbol());
      if (shape.estimate(coefficient).isEmpty()) {
        assertThat(one.get("origin").asText()).isEqualTo("absent");
        assertThat(one.has("estimate")).isFalse();
        continue;
      }
      Estimate estimate = shape.estimate(coefficient).orElseThrow();
      boolean given = coefficient == Coefficient.CN_BETA;
      assertThat(one.get("origin").asText())
          .isEqualTo(given ? "set over an estimate" : "estimated");
      assertThat(one.get("value").asDouble()).isEqualTo(given ? 0.085 : estimate.value());
      assertThat(one.get("estimate").asDouble()).isEqualTo(estimate.value());
      assertThat(one.get("parts")).hasSameSizeAs(estimate.terms());
      for (JsonNode part : one.get("parts")) {
        assertThat(json.get("methods").has(part.get("method").asText())).isTrue();
      }
    }
    for (JsonNode method : json.get("methods")) {
      assertThat(method.get("source").asText()).isNotBlank();
      assertThat(method.get("knownError").asText()).isNotBlank();
    }
    assertThat(json.at("/base/inertiaBasis").asText()).isEqualTo("estimated by radii of gyration");
    assertThat(json.at("/base/figures/liftSlope/value").asDouble())
        .isEqualTo(shape.wing().liftSlope());
  }

  @Test
  void theDocumentHasWhatVariantsChange() throws IOException {
    JsonNode variants = json(report(TOURER)).get("variants");
    assertThat(variants).hasSize(4);
    JsonNode clipped = variants.get(0);
    assertThat(clipped.get("name").asText()).isEqualTo("clipped tips");
    assertThat(clipped.at("/changes/span/difference").asDouble()).isCloseTo(-0.6, within(1e-12));
    JsonNode damping = clipped.at("/changes/Cl_p");
    assertThat(damping.get("variant").asDouble() - damping.get("base").asDouble())
        .isEqualTo(damping.get("difference").asDouble());
    assertThat(variants.get(3).get("changes")).isEmpty();
    assertThat(variants.get(3).get("differsIn").get(0).asText()).isEqualTo("limits");
  }

  static Stream<Path> shipped() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("../scenarios/aeroplanes"))) {
      return files.sorted().toList().stream();
    }
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void everyShippedAeroplaneGivesACompleteDocument(Path file) throws IOException {
    JsonNode json = json(report(file));
    assertThat(json.at("/base/derivatives")).hasSize(Coefficient.values().length);
    for (JsonNode figure : json.at("/base/figures")) {
      assertThat(figure.has("value")).isNotEqualTo(figure.has("reason"));
    }
    assertThat(json.at("/condition/density").isNumber()).isTrue();
  }

  private static Map<String, double[]> columns(Path csv) throws IOException {
    List<String> lines = Files.readAllLines(csv);
    String[] names = lines.get(0).split(",");
    Map<String, double[]> columns = new LinkedHashMap<>();
    for (int c = 0; c < names.length; c++) {
      int column = c;
      columns.put(
          names[c],
          lines.stream()
              .skip(1)
              .mapToDouble(line -> Double.parseDouble(line.split(",")[column]))
              .toArray());
    }
    return columns;
  }

  /**
   * ∫ f η^power dη by the trapezoidal rule over arcsin η, where the stations are even and which is
   * exact for the series that the loads are.
   */
  private static double integral(double[] eta, double[] load, int power) {
    double sum = 0;
    for (int i = 1; i < eta.length; i++) {
      double step = Math.asin(eta[i]) - Math.asin(eta[i - 1]);
      sum += 0.5 * step * (term(eta, load, power, i) + term(eta, load, power, i - 1));
    }
    return sum;
  }

  private static double term(double[] eta, double[] load, int power, int i) {
    return load[i] * Math.pow(eta[i], power) * Math.sqrt(1 - eta[i] * eta[i]);
  }

  private static double part(DerivativeReport report, Coefficient coefficient, String part) {
    return report.base().data().derivatives().estimate(coefficient).orElseThrow().terms().stream()
        .filter(term -> term.part().equals(part))
        .mapToDouble(Estimate.Term::value)
        .sum();
  }

  @ParameterizedTest
  @ValueSource(strings = {"lifting-surface", "lifting-line"})
  void loadsIntegrateBackToTheDerivatives(String theory) throws IOException {
    Path swept =
        Files.writeString(
            folder.resolve("swept.json"),
            Files.readString(TOURER)
                .replace(
                    "\"wing\": {\n    \"height\"",
                    "\"wing\": { \"theory\": \"" + theory + "\",\n    \"height\"")
                .replace("\"sweep\": \"1 deg\"", "\"sweep\": \"12 deg\""));
    DerivativeReport report = report(swept);
    assertThat(report.base().shape().orElseThrow().theory().word()).isEqualTo(theory);
    ResultFolder.write(folder.resolve("out"), report, "test");
    Map<String, double[]> columns = columns(folder.resolve("out/loadings.csv"));
    assertThat(columns.keySet())
        .containsExactly(
            "eta[-]",
            "steady[-]",
            "rolling[per pb/2V]",
            "yawing[per rb/2V]",
            "sideslip[1/rad]",
            "aileron[1/rad]");
    double[] eta = columns.get("eta[-]");
    assertThat(eta[0]).isEqualTo(-1);
    assertThat(eta[eta.length - 1]).isEqualTo(1);
    double[] steady = columns.get("steady[-]");
    double lift =
        report.base().data().liftCoefficient(report.condition().condition().get()).orElseThrow();
    // Rounding only: the rule is exact for these series.
    assertThat(0.5 * integral(eta, steady, 0)).isCloseTo(lift, within(1e-9));
    assertThat(-0.25 * integral(eta, columns.get("rolling[per pb/2V]"), 1))
        .isCloseTo(part(report, Coefficient.CL_P, "wing"), within(1e-9));
    assertThat(-0.25 * integral(eta, columns.get("sideslip[1/rad]"), 1))
        .isCloseTo(part(report, Coefficient.CL_BETA, "wing dihedral"), within(1e-9));
    assertThat(-0.25 * integral(eta, columns.get("yawing[per rb/2V]"), 1))
        .isCloseTo(part(report, Coefficient.CL_R, "wing"), within(1e-9));
    assertThat(-0.25 * integral(eta, columns.get("aileron[1/rad]"), 1))
        .isCloseTo(part(report, Coefficient.CL_DA, "ailerons"), within(1e-9));
  }

  @Test
  void withoutAileronsTheirColumnIsLeftOut() throws IOException {
    Path file =
        changed("\"from\": \"2.7 m\", \"to\": \"4.4 m\", \"chordShare\": 0.24, \"up\"", "\"up\"");
    ResultFolder.write(folder.resolve("out"), report(file), "test");
    assertThat(columns(folder.resolve("out/loadings.csv")).keySet())
        .noneMatch(name -> name.startsWith("aileron"))
        .hasSize(5);
  }

  @Test
  void variantsHaveFilesOfTheirOwnUnderNamesThatAnyDiskTakes() throws IOException {
    Path file = changed("\"less dihedral\":", "\"../Clipped, tips\":");
    DerivativeReport report = report(file);
    List<Path> written = ResultFolder.write(folder.resolve("out"), report, "test");
    assertThat(written.stream().map(path -> path.getFileName().toString()))
        .containsExactly(
            "derivatives.json",
            "loadings.csv",
            "loadings-clipped-tips.csv",
            "loadings-clipped-tips-2.csv",
            "loadings-larger-fin.csv",
            "loadings-lower-limit.csv");
    JsonNode json = new ObjectMapper().readTree(written.get(0).toFile());
    assertThat(json.at("/variants/1/loadings").asText()).isEqualTo("loadings-clipped-tips-2.csv");
    assertThat(columns(written.get(3)).get("sideslip[1/rad]"))
        .isNotEqualTo(columns(written.get(2)).get("sideslip[1/rad]"));
  }

  @Test
  void allFilesAreWrittenOrNone() throws IOException {
    Files.createDirectories(folder.resolve("out/loadings-larger-fin.csv"));
    DerivativeReport report = report(TOURER);
    assertThatExceptionOfType(UncheckedIOException.class)
        .isThrownBy(() -> ResultFolder.write(folder.resolve("out"), report, "test"));
    try (Stream<Path> left = Files.list(folder.resolve("out"))) {
      assertThat(left.map(path -> path.getFileName().toString()))
          .containsExactly("loadings-larger-fin.csv");
    }
  }

  @Test
  void withoutAShapeThereAreNoLoads() {
    List<Path> written =
        ResultFolder.write(
            folder.resolve("out"),
            report(Path.of("../scenarios/aeroplanes/light-single.json")),
            "test");
    assertThat(written).hasSize(1);
  }

  @Test
  void aWingEvenOnBothSidesIsLoadedEvenly() throws IOException {
    ResultFolder.write(folder.resolve("out"), report(TOURER), "test");
    double[] steady = columns(folder.resolve("out/loadings.csv")).get("steady[-]");
    double[] turned = new double[steady.length];
    Arrays.setAll(turned, i -> steady[steady.length - 1 - i]);
    assertThat(steady).containsExactly(turned, within(1e-12));
  }
}
