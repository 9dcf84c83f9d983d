package org.rolltrace.core.files;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Valid files changed at random. */
final class Mutations {
  /** What people and programs put in the wrong place. */
  private static final String[] TOKENS = {
    "{",
    "}",
    "[",
    "]",
    ",",
    ":",
    "\"",
    "null",
    "true",
    "0",
    "-1",
    "1e308",
    "-1e308",
    "1e999",
    "NaN",
    "-Infinity",
    "5e-324",
    "\"0 s\"",
    "\"1e308 s\"",
    "\"1e300 deg\"",
    "\"-1 ft\"",
    "\"\"",
    "\\",
    "//",
    "\u0000",
    "\ufeff",
    "{}",
    "[]",
    "\"trueAirspeed\": \"1e-200 m/s\",",
    "\"movement\": \"1e308 s\","
  };

  /** What slips into numbers and units. */
  private static final String[] STROKES = {
    "0", "1", "7", "9", ".", "-", "+", "e", "E", "e2", "e-3", ",", " ", "_", "0x", "f", "d",
    "\u0660", "\u00a0", "m", "ft", "k", "s", "2", "/", "deg", "rad", "%", "\u2212"
  };

  private Mutations() {}

  /** A file with a handful of changes of one sort: to bytes, to marks and words, or to numbers. */
  static byte[] of(String sample, Random random) {
    return switch (random.nextInt(4)) {
      case 0 -> inTokens(sample, random).getBytes(StandardCharsets.UTF_8);
      case 1 -> inNumbers(sample, random).getBytes(StandardCharsets.UTF_8);
      default -> inBytes(sample.getBytes(StandardCharsets.UTF_8), random);
    };
  }

  private static String inTokens(String sample, Random random) {
    List<String> tokens = tokens(sample);
    for (int changes = 1 + random.nextInt(3); changes > 0; changes--) {
      int at = random.nextInt(tokens.size());
      int other = random.nextInt(tokens.size());
      switch (random.nextInt(5)) {
        case 0 -> tokens.remove(at);
        case 1 -> tokens.add(at, tokens.get(at));
        case 2 -> Collections.swap(tokens, at, other);
        case 3 -> tokens.set(at, tokens.get(other));
        default -> tokens.set(at, TOKENS[random.nextInt(TOKENS.length)]);
      }
    }
    return String.join("", tokens);
  }

  /** Strokes added to numbers and what follows them, taken away, or put in place of others. */
  private static String inNumbers(String sample, Random random) {
    StringBuilder text = new StringBuilder(sample);
    for (int changes = 1 + random.nextInt(2); changes > 0; changes--) {
      int at = random.nextInt(text.length());
      while (at < text.length() && !Character.isDigit(text.charAt(at))) {
        at++;
      }
      if (at == text.length()) {
        continue;
      }
      at = Math.min(at + random.nextInt(4), text.length() - 1);
      String stroke = STROKES[random.nextInt(STROKES.length)];
      switch (random.nextInt(4)) {
        case 0 -> text.deleteCharAt(at);
        case 1 -> text.insert(at, stroke);
        case 2 -> text.insert(at, text.charAt(at));
        default -> text.replace(at, at + 1, stroke);
      }
    }
    return text.toString();
  }

  private static byte[] inBytes(byte[] sample, Random random) {
    List<Byte> bytes = new ArrayList<>();
    for (byte b : sample) {
      bytes.add(b);
    }
    for (int changes = 1 + random.nextInt(3); changes > 0; changes--) {
      int at = random.nextInt(bytes.size());
      switch (random.nextInt(5)) {
        case 0 -> bytes.remove(at);
        case 1 -> bytes.add(at, bytes.get(at));
        case 2 -> Collections.swap(bytes, at, random.nextInt(bytes.size()));
        case 3 -> bytes.set(at, (byte) random.nextInt(256));
        default -> bytes.subList(at, Math.min(at + random.nextInt(20), bytes.size())).clear();
      }
    }
    byte[] mutated = new byte[bytes.size()];
    for (int i = 0; i < mutated.length; i++) {
      mutated[i] = bytes.get(i);
    }
    return mutated;
  }

  /** Texts, words and single marks; what stands between them goes with them. */
  private static List<String> tokens(String sample) {
    List<String> tokens = new ArrayList<>();
    int i = 0;
    while (i < sample.length()) {
      int end = i + 1;
      if (sample.charAt(i) == '"') {
        end = sample.indexOf('"', i + 1) + 1;
      } else if (Character.isLetterOrDigit(sample.charAt(i))) {
        while (end < sample.length()
            && (Character.isLetterOrDigit(sample.charAt(end)) || sample.charAt(end) == '.')) {
          end++;
        }
      }
      tokens.add(sample.substring(i, end));
      i = end;
    }
    return tokens;
  }
}
