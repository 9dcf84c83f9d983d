package org.rolltrace.core.files;

import java.util.Locale;

/**
 * Writes JSON for people: two blanks for each level, short objects and lists on one line. Lines
 * that somebody chose are kept, up to a length at which nobody would have.
 */
final class JsonPrinter {
  /** The longest line made of what has no lines of its own, columns. */
  static final int SHORT = 120;

  /** The longest line kept, columns; beyond that, whoever wrote it had no lines in mind. */
  static final int LONGEST = 200;

  private final StringBuilder out = new StringBuilder();
  private int lineStart;

  private JsonPrinter() {}

  static String print(JsonNode.Group root) {
    JsonPrinter printer = new JsonPrinter();
    if (root.items().isEmpty()) {
      return "{}\n";
    }
    printer.lines(root, 0, hasLines(root));
    return printer.out.append('\n').toString();
  }

  private void value(JsonNode node, int level) {
    if (!(node instanceof JsonNode.Group group)) {
      scalar(node);
    } else if (group.items().isEmpty()) {
      out.append(group.isList() ? "[]" : "{}");
    } else if (!fitsOnLine(group)) {
      lines(group, level, group.laidOut() && hasLines(group));
    }
  }

  private void scalar(JsonNode node) {
    if (node instanceof JsonNode.Text text) {
      quote(text.text());
    } else {
      out.append(((JsonNode.Bare) node).written());
    }
  }

  /** Writes it on one line if that may be, and nothing otherwise. */
  private boolean fitsOnLine(JsonNode.Group group) {
    int before = out.length();
    int limit = group.laidOut() ? LONGEST : SHORT;
    // Behind it may come a bracket and a comma.
    if (isOneLine(group) && writeOnLine(group, limit) && out.length() - lineStart + 3 <= limit) {
      return true;
    }
    out.setLength(before);
    return false;
  }

  private boolean writeOnLine(JsonNode.Group group, int limit) {
    out.append(group.isList() ? "[" : "{ ");
    for (int i = 0; i < group.items().size(); i++) {
      JsonNode.Item item = group.items().get(i);
      out.append(i > 0 ? ", " : "");
      key(group, item);
      if (item.value() instanceof JsonNode.Group inner && !inner.items().isEmpty()) {
        if (!writeOnLine(inner, limit)) {
          return false;
        }
      } else {
        value(item.value(), 0);
      }
      if (out.length() - lineStart > limit) {
        return false;
      }
    }
    out.append(group.isList() ? "]" : " }");
    return true;
  }

  private static boolean isOneLine(JsonNode.Group group) {
    if (group.laidOut() && hasLines(group)) {
      return false;
    }
    for (JsonNode.Item item : group.items()) {
      if (item.value() instanceof JsonNode.Group inner
          && (!isOneLine(inner) || (!group.laidOut() && group.isList()))) {
        return false; // a list of objects has one on each line
      }
    }
    return true;
  }

  private static boolean hasLines(JsonNode.Group group) {
    for (JsonNode.Item item : group.items()) {
      if (item.newLine()) {
        return true;
      }
    }
    return false;
  }

  private void lines(JsonNode.Group group, int level, boolean asLaidOut) {
    out.append(group.isList() ? '[' : '{');
    boolean mayJoin = false; // nothing joins what has lines of its own
    for (int i = 0; i < group.items().size(); i++) {
      JsonNode.Item item = group.items().get(i);
      boolean joins = mayJoin && asLaidOut && !item.newLine();
      int before = out.append(i > 0 ? "," : "").length();
      int lineBefore = lineStart;
      if (joins) {
        out.append(' ');
        key(group, item);
        value(item.value(), level + 1);
        joins = lineStart == lineBefore && out.length() - lineStart + 1 <= LONGEST;
      }
      if (!joins) {
        out.setLength(before);
        lineStart = lineBefore;
        newLine(level + 1);
        int begun = lineStart;
        key(group, item);
        value(item.value(), level + 1);
        mayJoin = lineStart == begun;
      }
    }
    newLine(level);
    out.append(group.isList() ? ']' : '}');
  }

  private void newLine(int level) {
    lineStart = out.append('\n').length();
    for (int i = 0; i < level; i++) {
      out.append("  ");
    }
  }

  private void key(JsonNode.Group group, JsonNode.Item item) {
    if (!group.isList()) {
      quote(item.key());
      out.append(": ");
    }
  }

  private void quote(String text) {
    out.append('"');
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '"' -> out.append("\\\"");
        case '\\' -> out.append("\\\\");
        case '\n' -> out.append("\\n");
        case '\r' -> out.append("\\r");
        case '\t' -> out.append("\\t");
        default -> {
          if (c < ' ' || isHalfACharacter(text, i)) {
            out.append(String.format(Locale.ROOT, "\\u%04x", (int) c));
          } else {
            out.append(c);
          }
        }
      }
    }
    out.append('"');
  }

  /** Half of a pair without its other half, which no encoding can write. */
  private static boolean isHalfACharacter(String text, int i) {
    char c = text.charAt(i);
    if (Character.isHighSurrogate(c)) {
      return i + 1 == text.length() || !Character.isLowSurrogate(text.charAt(i + 1));
    }
    return Character.isLowSurrogate(c)
        && (i == 0 || !Character.isHighSurrogate(text.charAt(i - 1)));
  }
}
