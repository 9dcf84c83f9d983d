package org.rolltrace.core.derivatives;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The page that lists the estimates says what the program says. */
class EstimatesPageTest {

  @Test
  void everyEstimateStandsThereWithSourceAndKnownError() throws IOException {
    List<String> expected = new ArrayList<>();
    for (EstimateMethod method : EstimateMethod.values()) {
      expected.add(
          "| "
              + String.join(
                  " | ",
                  method.title(),
                  method.what().replace("|h|", "\\|h\\|"),
                  method.source(),
                  method.knownError())
              + " |");
    }
    List<String> rows =
        Files.readString(Path.of("..", "scenarios", "ESTIMATES.md"))
            .lines()
            .filter(line -> line.startsWith("| "))
            .skip(1) // the heads of the columns
            .toList();
    assertThat(rows).containsExactlyElementsOf(expected);
  }
}
