package org.rolltrace.core.files;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import com.fasterxml.jackson.core.util.JsonRecyclerPools;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads JSON text into values that know where they stand. */
final class JsonTree {
  /** The deepest nesting accepted: levels of objects and lists. */
  static final int DEEPEST = 32;

  /** The longest text accepted, characters. */
  static final int LONGEST_TEXT = 2000;

  /** The largest number of values accepted. */
  static final int MOST_VALUES = 20_000;

  // NaN and its like are taken in here and refused by name, so that the other faults are found too.
  private static final JsonFactory FACTORY =
      JsonFactory.builder()
          .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
          .streamReadConstraints(
              StreamReadConstraints.builder()
                  .maxNestingDepth(2 * DEEPEST)
                  .maxNumberLength(LONGEST_TEXT)
                  .maxNameLength(TextFile.LARGEST)
                  .build())
          .recyclerPool(JsonRecyclerPools.nonRecyclingPool())
          .build();

  private final JsonParser parser;
  private int values;
  private int depth;

  /** Where the innermost object or list, or the value after a key, begins. */
  private JsonValue.Place open = new JsonValue.Place("$", 1, 1);

  /** The last complete key while the next one is awaited, null otherwise. */
  private String awaitedAfter;

  private JsonTree(JsonParser parser) {
    this.parser = parser;
  }

  /** The object that a file holds, or faults that leave none. */
  static Optional<JsonValue.ObjectValue> read(byte[] bytes, Faults faults) {
    Optional<char[]> text = TextFile.decode(bytes, faults);
    if (text.isEmpty()) {
      return Optional.empty();
    }
    return read(text.get(), faults);
  }

  private static Optional<JsonValue.ObjectValue> read(char[] text, Faults faults) {
    try (JsonParser parser = FACTORY.createParser(text, 0, text.length)) {
      JsonTree tree = new JsonTree(parser);
      boolean complete = false;
      try {
        if (parser.nextToken() == null) {
          faults.addForWholeFile("is empty; expected an object in braces { }");
          return Optional.empty();
        }
        JsonValue root = tree.value("$");
        complete = true;
        if (parser.nextToken() != null) {
          faults.add(tree.place("$"), SyntaxFault.AFTER_THE_END);
          return Optional.empty();
        }
        if (root instanceof JsonValue.ObjectValue object) {
          return Optional.of(object);
        }
        faults.add(
            root.place(), "found " + root.described() + "; expected an object in braces { }");
      } catch (TreeTooLargeException e) {
        faults.add(e.place, e.getMessage());
      } catch (JsonProcessingException e) {
        JsonLocation at = e.getLocation() == null ? parser.currentLocation() : e.getLocation();
        faults.add(
            new JsonValue.Place(
                complete ? "$" : tree.pathOfFault(), at.getLineNr(), at.getColumnNr()),
            complete ? SyntaxFault.AFTER_THE_END : SyntaxFault.message(e, text, at, tree.open));
      }
      return Optional.empty();
    } catch (IOException e) {
      throw new UncheckedIOException("reading from memory cannot fail", e);
    }
  }

  private JsonValue value(String path) throws IOException, TreeTooLargeException {
    JsonValue.Place place = place(path);
    if (++values > MOST_VALUES) {
      throw new TreeTooLargeException(
          place, "the file has more than " + MOST_VALUES + " values; expected far fewer");
    }
    return switch (parser.currentToken()) {
      case START_OBJECT -> object(place);
      case START_ARRAY -> array(place);
      case VALUE_STRING -> text(place);
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> number(place);
      default -> new JsonValue.Word(place, parser.getText());
    };
  }

  private JsonValue object(JsonValue.Place place) throws IOException, TreeTooLargeException {
    JsonValue.Place outer = open;
    open = place;
    deepen();
    Map<String, JsonValue.Member> members = new LinkedHashMap<>();
    List<JsonValue.Member> duplicates = new ArrayList<>();
    String completed = "";
    while (nextToken(completed) != JsonToken.END_OBJECT) {
      String key = parser.currentName();
      JsonValue.Place keyPlace = place(JsonValue.Place.memberPath(place.path(), key));
      open = keyPlace;
      parser.nextToken();
      JsonValue.Member member = new JsonValue.Member(key, keyPlace, value(keyPlace.path()));
      open = place;
      if (members.putIfAbsent(key, member) != null) {
        duplicates.add(member);
      }
      completed = key;
    }
    depth--;
    open = outer;
    return new JsonValue.ObjectValue(place, members, duplicates);
  }

  /** Advances to a key. The parser looks at the value behind it too, and may find fault there. */
  private JsonToken nextToken(String completedKey) throws IOException {
    awaitedAfter = completedKey;
    JsonToken token = parser.nextToken();
    awaitedAfter = null;
    return token;
  }

  private String pathOfFault() throws IOException {
    String key = awaitedAfter == null ? null : parser.currentName();
    return key == null || key.equals(awaitedAfter)
        ? open.path()
        : JsonValue.Place.memberPath(open.path(), key);
  }

  private void deepen() throws TreeTooLargeException {
    if (++depth > DEEPEST) {
      throw new TreeTooLargeException(open, "this is nested deeper than " + DEEPEST + " levels");
    }
  }

  private JsonValue array(JsonValue.Place place) throws IOException, TreeTooLargeException {
    JsonValue.Place outer = open;
    open = place;
    deepen();
    List<JsonValue> elements = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      elements.add(value(place.path() + "[" + elements.size() + "]"));
    }
    depth--;
    open = outer;
    return new JsonValue.ArrayValue(place, elements);
  }

  private JsonValue text(JsonValue.Place place) throws IOException {
    String text = parser.getText();
    if (text.length() > LONGEST_TEXT) {
      return new JsonValue.Refused(
          place,
          "the text has " + text.length() + " characters; expected at most " + LONGEST_TEXT,
          new JsonValue.Text(place, text));
    }
    return new JsonValue.Text(place, text);
  }

  private JsonValue number(JsonValue.Place place) throws IOException {
    if (parser.isNaN()) {
      return new JsonValue.Refused(
          place,
          parser.getText() + " is no number in JSON; expected a decimal number",
          new JsonValue.Word(place, parser.getText()));
    }
    return new JsonValue.Numeral(place, parser.getText());
  }

  private JsonValue.Place place(String path) {
    JsonLocation start = parser.currentTokenLocation();
    return new JsonValue.Place(path, start.getLineNr(), start.getColumnNr());
  }

  private static final class TreeTooLargeException extends Exception {
    private static final long serialVersionUID = 1;
    private final transient JsonValue.Place place;

    TreeTooLargeException(JsonValue.Place place, String message) {
      super(message);
      this.place = place;
    }
  }
}
