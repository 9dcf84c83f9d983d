package org.rolltrace.core.quantity;

/** Which characters of a user's text a message may repeat as they are. */
public final class Visible {
  private Visible() {}

  /**
   * Whether a reader can see a character, or tell it from a plain space.
   *
   * @param c code point
   * @return false for controls, formats, separators other than the space, and what has no shape
   */
  public static boolean is(int c) {
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.PRIVATE_USE,
          Character.UNASSIGNED,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          false;
      case Character.SPACE_SEPARATOR -> c == ' ';
      default -> true;
    };
  }
}
