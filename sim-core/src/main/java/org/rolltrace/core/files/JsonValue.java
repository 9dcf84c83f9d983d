package org.rolltrace.core.files;

import java.util.List;
import java.util.Map;

/** A value of a JSON file, and where it stands. */
sealed interface JsonValue {

  Place place();

  /** What it is, with its article, for messages. */
  String described();

  /**
   * Where something stands.
   *
   * @param path as in {@code $.inputs[0].size}
   * @param line from 1
   * @param column from 1, in characters
   */
  record Place(String path, int line, int column) {

    /** The place of something missing from the object that stands here. */
    Place within(String key) {
      return new Place(memberPath(path, key), line, column);
    }

    static String memberPath(String parent, String key) {
      return isPlain(key) ? parent + "." + key : parent + "[" + Shown.text(key) + "]";
    }

    private static boolean isPlain(String key) {
      for (int i = 0; i < key.length(); i++) {
        char c = key.charAt(i);
        boolean letter = (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == '_';
        if (!letter && !(i > 0 && c >= '0' && c <= '9')) {
          return false;
        }
      }
      return !key.isEmpty() && key.length() <= Shown.LONGEST;
    }
  }

  record Text(Place place, String text) implements JsonValue {
    @Override
    public String described() {
      return "the text " + Shown.text(text);
    }
  }

  /** A number as it is written. */
  record Numeral(Place place, String digits) implements JsonValue {
    @Override
    public String described() {
      return "the number " + Shown.plain(digits);
    }
  }

  /** One of the words true, false and null. */
  record Word(Place place, String word) implements JsonValue {
    @Override
    public String described() {
      return word;
    }
  }

  /**
   * An object.
   *
   * @param members by key; of duplicates the first
   * @param duplicates members whose key stood there before
   */
  record ObjectValue(Place place, Map<String, Member> members, List<Member> duplicates)
      implements JsonValue {
    @Override
    public String described() {
      return "an object";
    }
  }

  /** A member of an object; {@code keyPlace} is where its key stands. */
  record Member(String key, Place keyPlace, JsonValue value) {}

  record ArrayValue(Place place, List<JsonValue> elements) implements JsonValue {
    @Override
    public String described() {
      return "a list";
    }
  }

  /**
   * Something that cannot be used whatever key it stands at, and why.
   *
   * @param written what stands there
   */
  record Refused(Place place, String reason, JsonValue written) implements JsonValue {
    @Override
    public String described() {
      return "something that cannot be used";
    }
  }
}
