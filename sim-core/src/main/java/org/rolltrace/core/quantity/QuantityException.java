package org.rolltrace.core.quantity;

import java.util.Locale;

/**
 * A text that is no quantity, or a quantity of another dimension than was expected. The message
 * says what was given and what was expected, on one line, ready to be shown.
 */
public final class QuantityException extends RuntimeException {
  private static final int ECHOED = 40;

  /**
   * Makes an exception.
   *
   * @param message what was given and what was expected
   */
  public QuantityException(String message) {
    super(message);
  }

  /** A text between quotation marks: cut when long, and with what cannot be seen spelt out. */
  static String echo(String text, char mark) {
    boolean cut = text.length() > ECHOED;
    StringBuilder out = new StringBuilder().append(mark);
    (cut ? text.substring(0, ECHOED) : text)
        .codePoints()
        .forEach(
            c -> {
              if (Visible.is(c)) {
                out.appendCodePoint(c);
              } else {
                out.append(String.format(Locale.ROOT, "\\u%04x", c));
              }
            });
    return out.append(cut ? "..." : "").append(mark).toString();
  }
}
