package org.rolltrace.ui;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.run.Safety;
import org.rolltrace.ui.command.CommandLineProgram;

/** The documents say what the program does. */
class DocumentsTest {
  private static final Path TOP = Path.of("..");

  private static String read(String file) throws IOException {
    return Files.readString(TOP.resolve(file));
  }

  @Test
  void theReadmeShowsWhatTheFirstCommandPrints() throws IOException {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    CommandLineProgram.run(
        new String[] {"fly", "../scenarios/light-single-held-stick.json"},
        new PrintWriter(out),
        new PrintWriter(err),
        file -> {});
    assertThat(read("README.md"))
        .contains("fly scenarios/light-single-held-stick.json\"")
        .contains("```\n" + out + "```")
        .contains("```\n" + err + "```")
        .contains("```json\n" + read("scenarios/light-single-held-stick.json") + "```");
  }

  @Test
  void theReadmeShowsTheTableThatDerivePrints() throws IOException {
    StringWriter out = new StringWriter();
    CommandLineProgram.run(
        new String[] {"derive", "../scenarios/aeroplanes/tarnlark-trainer.json"},
        new PrintWriter(out),
        new PrintWriter(new StringWriter()),
        file -> {});
    String printed = out.toString();
    String table = printed.substring(printed.indexOf("Derivatives, per rad"));
    assertThat(read("README.md"))
        .contains("derive scenarios/aeroplanes/tarnlark-trainer.json\n")
        .contains("```\n" + table.substring(0, table.indexOf("\n\n") + 1) + "```");
  }

  @Test
  void theReadmeNamesEveryCommandAndOptionOfDerive() throws IOException {
    StringWriter out = new StringWriter();
    CommandLineProgram.run(
        new String[] {"derive", "--help"},
        new PrintWriter(out),
        new PrintWriter(new StringWriter()),
        file -> {});
    String readme = read("README.md");
    assertThat(readme).contains("| `derive AEROPLANE` |").contains("| `fly SCENARIO` |");
    Pattern.compile("--[a-z-]+")
        .matcher(out.toString())
        .results()
        .map(MatchResult::group)
        .filter(option -> !option.equals("--help") && !option.equals("--version"))
        .forEach(option -> assertThat(readme).contains("`" + option));
  }

  @Test
  void theReadmeWarns() throws IOException {
    assertThat(read("README.md")).contains(Safety.NOTICE);
  }

  @Test
  void oneCommandTestsEverything() throws IOException {
    assertThat(read("README.md")).contains("Run the tests:\n\n```\nmvn verify\n```");
    assertThat(read(".ci/run").lines().toList()).contains("mvn verify");
  }

  @Test
  void theTopLevelHoldsWhatItShould() throws IOException {
    Set<String> names = new TreeSet<>();
    try (Stream<Path> files = Files.list(TOP)) {
      files.map(file -> file.getFileName().toString()).forEach(names::add);
    }
    names.removeIf(name -> name.startsWith(".") || name.equals("target"));
    assertThat(names)
        .containsExactlyInAnyOrder(
            "README.md", "DEVELOPERS.md", "pom.xml", "LICENSE", "scenarios", "sim-core", "sim-ui");
  }

  @Test
  void everyScenarioAndAeroplaneIsInTheListOfItsFolder() throws IOException {
    String list = read("scenarios/README.md");
    for (String folder : new String[] {"scenarios", "scenarios/aeroplanes"}) {
      try (Stream<Path> files = Files.list(TOP.resolve(folder))) {
        files
            .map(file -> file.getFileName().toString())
            .filter(name -> name.endsWith(".json") && !name.endsWith(".schema.json"))
            .forEach(name -> assertThat(list).contains("`" + name + "`"));
      }
    }
  }
}
