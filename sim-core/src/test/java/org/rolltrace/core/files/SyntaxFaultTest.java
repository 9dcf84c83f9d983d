package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Text that is not JSON by RFC 8259. */
class SyntaxFaultTest {
  private static final String NUMBER = "this is not a number as JSON writes it; expected ";
  private static final String COMMENT =
      "a comment begins here, and JSON has none; take it out, or write it as a \"note\"";
  private static final String EARLY =
      "the file ends too early; what begins on line 1 is not complete. Check that every { and [ is"
          + " closed";

  @TempDir Path directory;

  private static Arguments bad(String text, String path, int line, int column, String beginning) {
    return Arguments.of(text, path, line, column, beginning);
  }

  static Stream<Arguments> texts() {
    return Stream.of(
        bad("{\"a\": 1,\n}", "$", 2, 1, "a comma stands before '}' with nothing after it"),
        bad("{\"a\": [1,]}", "$.a", 1, 10, "a comma stands before ']' with nothing after it"),
        bad("{\"a\": 1 \"b\": 2}", "$", 1, 9, "found '\"' where a comma or a closing bracket"),
        bad("{\"a\": 1,, \"b\": 2}", "$", 1, 9, "found ','; expected a key in double quotation"),
        bad("{\n  'a': 1}", "$", 2, 3, "found the quotation mark '; expected the straight"),
        bad("{\"a\": \u201cx\u201d}", "$.a", 1, 7, "found the quotation mark \u201c; expected"),
        bad("{a: 1}", "$", 1, 2, "found 'a'; expected a key in double quotation marks"),
        bad("{\"a\" 1}", "$.a", 1, 6, "found '1' after a key; expected a colon"),
        bad("{\"a\": }", "$.a", 1, 7, "found '}' where a value is expected"),
        bad("{\"a\": [1,,2]}", "$.a", 1, 10, "found ',' where a value is expected"),
        bad("{\"a\": +1}", "$.a", 1, 8, NUMBER),
        bad("{\"a\": .5}", "$.a", 1, 7, NUMBER),
        bad("{\"a\": 1.}", "$.a", 1, 8, NUMBER),
        bad("{\"a\": 01}", "$.a", 1, 8, NUMBER),
        bad("{\"a\": 1e}", "$.a", 1, 8, NUMBER),
        bad("{\"a\": " + "1".repeat(3000) + "}", "$.a", 1, 3007, "a number is too long"),
        bad("{\"a\": 5 deg}", "$", 1, 9, "found 'd' where a comma or a closing bracket is"),
        bad("{\"a\": True}", "$.a", 1, 7, "found \"True\"; expected a value: text and quantities"),
        bad("{\"a\": \"x\ny\"}", "$.a", 1, 9, "a text holds a line break or another control"),
        bad("{\"a\": \"x\\qy\"}", "$.a", 1, 10, "a text holds a backslash with something unknown"),
        bad("// x\n{}", "$", 1, 1, COMMENT),
        bad("{ /* x */ }", "$", 1, 3, COMMENT),
        bad("{\n# x\n}", "$", 2, 1, COMMENT),
        bad("{\"a\": [1, 2}", "$.a", 1, 12, "'}' closes nothing that is open here"),
        bad("{\"a\": [1, 2", "$.a", 1, 12, EARLY),
        bad("{\"a\": 1", "$", 1, 8, EARLY),
        bad("{\"a\": 1,", "$", 1, 9, EARLY),
        bad("{\"a\"", "$.a", 1, 5, EARLY),
        bad("{", "$", 1, 2, EARLY),
        bad("{\"a\": \"x", "$.a", 1, 9, "the file ends inside a text"),
        bad("{}\n{}", "$", 2, 1, "something stands after the closing brace of the file"),
        bad("{} x", "$", 1, 4, "something stands after the closing brace of the file"),
        bad("{} // x", "$", 1, 4, "something stands after the closing brace of the file"),
        bad("{}}", "$", 1, 3, "something stands after the closing brace of the file"),
        bad("\u0000", "$", 1, 2, "a control character stands between the values"),
        bad("[]", "$", 1, 1, "found a list; expected an object in braces { }"),
        bad("3", "$", 1, 1, "found the number 3; expected an object in braces { }"),
        bad("\"x\"", "$", 1, 1, "found the text \"x\"; expected an object in braces { }"),
        bad("null", "$", 1, 1, "found null; expected an object in braces { }"));
  }

  @ParameterizedTest
  @MethodSource("texts")
  void isRefusedWithLineColumnAndPlainWords(
      String text, String path, int line, int column, String beginning) {
    Path file = Samples.write(directory, "bad.json", text);
    FileFault fault = Samples.only(Samples.refusalOfScenario(file));
    assertThat(fault.message()).startsWith(beginning);
    assertThat(fault.jsonPath()).isEqualTo(path);
    assertThat(fault.line()).isEqualTo(line);
    assertThat(fault.column()).isEqualTo(column);
    assertThat(Samples.only(Samples.refusalOfAeroplane(file))).isEqualTo(fault);
  }

  @Test
  void aFileCutOffAnywhereIsRefusedInPlainWords() {
    String text = Samples.SCENARIO.strip();
    for (int end = 1; end < text.length(); end++) {
      Path file = Samples.write(directory, "cut.json", text.substring(0, end));
      FileFault fault = Samples.only(Samples.refusalOfScenario(file));
      assertThat(fault.line()).as(fault.message()).isPositive();
      assertThat(fault.message())
          .matches("the file ends .*|this is not a number .*|found \"[a-z]+\"; expected a value.*");
      assertThat(fault.message()).doesNotContainIgnoringCase("jackson", "redacted", "source:");
    }
  }
}
