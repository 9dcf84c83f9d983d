package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;

/** Breaks text into lines. */
final class TextLines {
  private TextLines() {}

  /** Breaks at blanks; a word longer than the room has its own line. */
  static List<String> wrapped(String text, TypeSize size, double room) {
    return broken(text.split(" +", -1), size, room);
  }

  /** Breaks after commas only. */
  static List<String> brokenAtCommas(String text, TypeSize size, double room) {
    return broken(text.split("(?<=,) ", -1), size, room);
  }

  private static List<String> broken(String[] parts, TypeSize size, double room) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String part : parts) {
      String longer = line.isEmpty() ? part : line + " " + part;
      if (!line.isEmpty() && TypeWidths.of(longer, size) > room) {
        lines.add(line);
        line = part;
      } else {
        line = longer;
      }
    }
    lines.add(line);
    return lines;
  }
}
