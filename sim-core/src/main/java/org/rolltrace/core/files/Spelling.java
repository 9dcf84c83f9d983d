package org.rolltrace.core.files;

import java.util.Collection;
import java.util.Locale;

/** What the writer of an unknown word may have meant. */
final class Spelling {
  private Spelling() {}

  /** A question to put after a message about an unknown word, or nothing. */
  static String question(String given, Collection<String> known) {
    String nearest = null;
    int least = Integer.MAX_VALUE;
    if (given.length() <= Shown.LONGEST) {
      String lower = given.toLowerCase(Locale.ROOT);
      for (String word : known) {
        int distance = distance(lower, word.toLowerCase(Locale.ROOT));
        // A third of the letters wrong is another word; of short ones, one letter.
        if (distance < least && distance <= Math.max(1, word.length() / 3)) {
          least = distance;
          nearest = word;
        }
      }
    }
    return nearest == null ? "" : "; did you mean \"" + nearest + "\"?";
  }

  /** The least number of letters put in, left out, changed, or exchanged with a neighbour. */
  private static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        if (i == 0 || j == 0) {
          d[i][j] = i + j;
          continue;
        }
        boolean same = a.charAt(i - 1) == b.charAt(j - 1);
        int least =
            Math.min(d[i - 1][j - 1] + (same ? 0 : 1), Math.min(d[i - 1][j], d[i][j - 1]) + 1);
        if (i > 1
            && j > 1
            && a.charAt(i - 1) == b.charAt(j - 2)
            && a.charAt(i - 2) == b.charAt(j - 1)) {
          least = Math.min(least, d[i - 2][j - 2] + 1);
        }
        d[i][j] = least;
      }
    }
    return d[a.length()][b.length()];
  }
}
