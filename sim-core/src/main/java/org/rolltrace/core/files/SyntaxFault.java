package org.rolltrace.core.files;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;

/** Says in plain words what is wrong with text that is not JSON. */
final class SyntaxFault {
  static final String AFTER_THE_END =
      "something stands after the closing brace of the file; expected nothing more. Take it out, or"
          + " check the braces";

  private SyntaxFault() {}

  /**
   * The message.
   *
   * @param e what the parser says; only key words of it are used
   * @param text the file
   * @param at where the parser stopped
   * @param open what was being read
   */
  static String message(
      JsonProcessingException e, char[] text, JsonLocation at, JsonValue.Place open) {
    String said = e.getOriginalMessage();
    if (said.contains("closing quote")) {
      return "the file ends inside a text; expected a closing quotation mark";
    }
    if (said.contains("Illegal character")) {
      return "a control character stands between the values; expected JSON text";
    }
    if (e instanceof StreamConstraintsException) {
      return "a number is too long; expected at most " + JsonTree.LONGEST_TEXT + " characters";
    }
    int offset = (int) at.getCharOffset();
    if (e instanceof JsonEOFException || offset >= text.length) {
      return "the file ends too early; what begins on line "
          + open.line()
          + " is not complete. Check that every { and [ is closed";
    }
    char found = text[offset];
    String shown = "'" + Shown.plain(String.valueOf(found)) + "'";
    if (said.contains("comment") || (found == '#' && said.contains("expect"))) {
      return "a comment begins here, and JSON has none; take it out, or write it as a \"note\"";
    }
    if (said.contains("numeric value")) {
      return "this is not a number as JSON writes it; expected one such as 12, -0.5 or 1.5e3,"
          + " without leading zeros or plus sign, and with digits on both sides of the point";
    }
    if (said.contains("unquoted character")) {
      return "a text holds a line break or another control character; expected the text on one"
          + " line, closed by a quotation mark (write \\n for a line break)";
    }
    if (said.contains("escape")) {
      return "a text holds a backslash with something unknown after it; write \\\\ for a backslash";
    }
    if (said.contains("close marker")) {
      return shown + " closes nothing that is open here; check the pairs of { } and [ ]";
    }
    if ((found == '}' || found == ']') && lastBefore(text, offset) == ',') {
      return "a comma stands before " + shown + " with nothing after it; take the comma out";
    }
    if (found == '\'' || found == '`' || found == '\u201c' || found == '\u201d') {
      return "found the quotation mark " + found + "; expected the straight double one, \"";
    }
    if (said.contains("comma")) {
      return "found "
          + shown
          + " where a comma or a closing bracket is expected; "
          + (Character.isLetter(found)
              ? "a quantity with its unit stands in double quotation marks, such as \"5 deg\""
              : "a comma is missing, or a quotation mark");
    }
    if (said.contains("colon")) {
      return "found " + shown + " after a key; expected a colon";
    }
    if (said.contains("field name")) {
      return "found " + shown + "; expected a key in double quotation marks";
    }
    if (found == '}' || found == ']' || found == ',') {
      return "found " + shown + " where a value is expected; a value is missing";
    }
    if (found == '.' || found == '+') {
      return "this is not a number as JSON writes it; expected a digit before the point, and no plus"
          + " sign";
    }
    return "found "
        + Shown.text(wordAt(text, offset))
        + "; expected a value: text and quantities stand in double quotation marks";
  }

  private static char lastBefore(char[] text, int offset) {
    int i = offset - 1;
    while (i >= 0 && text[i] <= ' ') {
      i--;
    }
    return i >= 0 ? text[i] : ' ';
  }

  private static String wordAt(char[] text, int offset) {
    int end = offset;
    while (end < text.length && Character.isLetterOrDigit(text[end])) {
      end++;
    }
    return new String(text, offset, Math.min(Math.max(end, offset + 1), text.length) - offset);
  }
}
