package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;

/** Reads paths such as {@code $.inputs[0].size}, as faults name them. */
final class JsonPath {
  private JsonPath() {}

  /**
   * One step of a path.
   *
   * @param key nothing when it is an index
   * @param index −1 when it is a key
   */
  record Step(String key, int index) {
    boolean isIndex() {
      return index >= 0;
    }

    /** Whether it leads to a key, which faults may name shortened. */
    boolean isKey(String other) {
      return key.equals(other) || key.equals(Shown.plain(other));
    }
  }

  /**
   * The steps of a path.
   *
   * @throws IllegalArgumentException if it is none, or leads to the root
   */
  static List<Step> steps(String path) {
    List<Step> steps = new ArrayList<>();
    int i = 1;
    while (path.startsWith("$") && i < path.length()) {
      int end;
      if (path.charAt(i) == '.') {
        end = endOfKey(path, i + 1);
        steps.add(new Step(path.substring(i + 1, end), -1));
      } else if (path.startsWith("[\"", i)) {
        end = path.indexOf("\"]", i + 2) + 2;
        if (end < 2) {
          break;
        }
        steps.add(new Step(path.substring(i + 2, end - 2), -1));
      } else {
        end = path.indexOf(']', i) + 1;
        if (path.charAt(i) != '[' || !path.substring(i, Math.max(end, i)).matches("\\[\\d{1,6}]")) {
          break;
        }
        steps.add(new Step("", Integer.parseInt(path.substring(i + 1, end - 1))));
      }
      i = end;
    }
    if (i != path.length() || steps.isEmpty() || steps.contains(new Step("", -1))) {
      throw new IllegalArgumentException(
          "the path is " + Shown.text(path) + "; expected one such as $.inputs[0].size");
    }
    return steps;
  }

  private static int endOfKey(String path, int from) {
    int end = from;
    while (end < path.length() && path.charAt(end) != '.' && path.charAt(end) != '[') {
      end++;
    }
    return end;
  }
}
