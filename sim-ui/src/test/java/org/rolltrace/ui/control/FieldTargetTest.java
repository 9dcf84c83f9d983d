package org.rolltrace.ui.control;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.OpenSession;

class FieldTargetTest {
  private final ScenarioDocument document = OpenSession.document("light-single-roll-entry");
  private final FieldTarget mass = text("$.aeroplane.mass");
  private final FieldTarget damping = number("$.aeroplane.derivatives.values.Cl_p");

  private static FieldTarget text(String path) {
    return FieldTarget.quantity(path, "Title", "word", "prompt", "hint", 6);
  }

  private static FieldTarget number(String path) {
    return FieldTarget.number(path, "Title", "word", "prompt", "hint", 6);
  }

  @ParameterizedTest
  @CsvSource({
    "$.title, title",
    "$.condition.trueAirspeed, condition-trueAirspeed",
    "$.inputs[2].size, inputs-2-size"
  })
  void theNameFollowsThePath(String path, String id) {
    assertThat(text(path).id()).isEqualTo(id);
  }

  @Test
  void aTextIsPutAsItWasTyped() {
    FieldTarget speed = text("$.condition.trueAirspeed");
    assertThat(speed.textIn(document)).contains("176 ft/s");
    assertThat(speed.textIn(speed.put(document, "104 kt"))).contains("104 kt");
    assertThat(speed.put(document, "nonsense").text("$.condition.trueAirspeed"))
        .as("the reader judges it, not the field")
        .contains("nonsense");
  }

  @Test
  void aNumberIsPutAsANumberAndAnythingElseForTheReaderToJudge() {
    FieldTarget size = number("$.inputs[0].size");
    assertThat(size.put(document, "0.35").json()).contains("\"size\": 0.35");
    assertThat(size.put(document, "0.35 m").json()).contains("\"size\": \"0.35 m\"");
    assertThat(size.put(document, "0.35 m").check().faults())
        .extracting(fault -> fault.jsonPath())
        .containsExactly("$.inputs[0].size");
  }

  @Test
  void anEmptyTextTakesTheValueOut() {
    FieldTarget density = text("$.condition.density");
    ScenarioDocument without = density.put(document, "");
    assertThat(density.textIn(without)).isEmpty();
    assertThat(without.json()).doesNotContain("density");
  }

  @Test
  void figuresOfTheAeroplaneAreReadFromItsFile() {
    assertThat(document.aeroplaneIsInline()).isFalse();
    assertThat(mass.textIn(document)).contains("2750 lb");
    assertThat(damping.textIn(document)).contains("-0.41");
  }

  @Test
  void theFirstChangeOfTheAeroplaneMakesTheScenariosOwnCopy(@TempDir Path folder)
      throws IOException {
    Path aeroplane = folder.resolve("aeroplanes").resolve("light-single.json");
    Path shipped = Path.of("..", "scenarios");
    Files.createDirectories(aeroplane.getParent());
    Files.copy(shipped.resolve("aeroplanes/light-single.json"), aeroplane);
    Path file = folder.resolve("mine.json");
    Files.copy(shipped.resolve("light-single-roll-entry.json"), file);
    String asShipped = Files.readString(aeroplane);
    ScenarioDocument mine = ScenarioDocument.open(file);

    ScenarioDocument once = mass.put(mine, "1200 kg");
    ScenarioDocument twice = damping.put(once, "-0.5");

    assertThat(once.aeroplaneIsInline()).isTrue();
    assertThat(mass.textIn(twice)).contains("1200 kg");
    assertThat(damping.textIn(twice)).contains("-0.5");
    assertThat(text("$.aeroplane.span").textIn(twice))
        .as("the rest came along")
        .contains("33.4 ft");
    assertThat(twice.check().faults()).isEmpty();
    assertThat(Files.readString(aeroplane)).isEqualTo(asShipped);
  }

  @Test
  void aFigureLeftEmptyIsTakenOutOfTheCopyOnly() {
    ScenarioDocument without = damping.put(document, "");
    assertThat(without.aeroplaneIsInline()).isTrue();
    assertThat(damping.textIn(without)).isEmpty();
    assertThat(damping.textIn(document)).contains("-0.41");
  }

  @Test
  void anAeroplaneFileThatIsGoneLeavesAMessage(@TempDir Path folder) {
    DeskSession session = OpenSession.of("light-single-roll-entry", folder);
    session.edit("change file", edited -> edited.with("$.aeroplane", "aeroplanes/none.json"));
    assertThat(session.faultAt("$.aeroplane")).isPresent();

    session.edit("change mass", edited -> mass.put(edited, "1200 kg"));

    assertThat(session.problemProperty().get().title()).isEqualTo("Not done: change mass");
    assertThat(session.problemProperty().get().message()).contains("none.json");
  }
}
