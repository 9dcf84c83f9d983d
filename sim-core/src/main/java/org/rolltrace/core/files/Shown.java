package org.rolltrace.core.files;

import org.rolltrace.core.quantity.Visible;

/** Pieces of a file as messages show them: short, on one line, nothing invisible. */
final class Shown {
  static final int LONGEST = 40;

  private static final String HEX = "0123456789abcdef";

  private Shown() {}

  /** In quotation marks. */
  static String text(String text) {
    return '"' + plain(text) + '"';
  }

  static String plain(String text) {
    StringBuilder out = new StringBuilder();
    int end = text.offsetByCodePoints(0, Math.min(LONGEST, text.codePointCount(0, text.length())));
    for (int i = 0; i < end; i += Character.charCount(text.codePointAt(i))) {
      int c = text.codePointAt(i);
      if (Visible.is(c)) {
        out.appendCodePoint(c);
      } else {
        escape(out, c);
      }
    }
    return end < text.length() ? out.append("...").toString() : out.toString();
  }

  private static void escape(StringBuilder out, int c) {
    if (c > 0xffff) {
      escape(out, Character.highSurrogate(c));
      escape(out, Character.lowSurrogate(c));
      return;
    }
    out.append("\\u");
    for (int shift = 12; shift >= 0; shift -= 4) {
      out.append(HEX.charAt((c >> shift) & 0xf));
    }
  }
}
