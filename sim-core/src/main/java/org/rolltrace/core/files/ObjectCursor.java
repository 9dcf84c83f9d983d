package org.rolltrace.core.files;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.quantity.QuantityException;
import org.rolltrace.core.quantity.Unit;

/**
 * Reads the members of one object. What is wrong is added to the faults and stands as NaN or empty
 * from then on, so that reading goes on; whoever builds a value asks {@link #isSound} first.
 */
final class ObjectCursor {
  private final JsonValue.ObjectValue object;
  private final Keys keys;
  private final Faults faults;
  private final int faultsBefore;

  private ObjectCursor(JsonValue.ObjectValue object, Keys keys, Faults faults, int faultsBefore) {
    this.object = object;
    this.keys = keys;
    this.faults = faults;
    this.faultsBefore = faultsBefore;
  }

  /** Begins to read an object: reports unknown, duplicate and missing keys. */
  static ObjectCursor of(JsonValue.ObjectValue object, Keys keys, Faults faults) {
    return of(object, keys, List.of(), faults);
  }

  /** The same for one of several kinds of object: an unknown key may be one of another kind. */
  static ObjectCursor of(JsonValue.ObjectValue object, Keys keys, List<Keys> kinds, Faults faults) {
    ObjectCursor cursor = new ObjectCursor(object, keys, faults, faults.count());
    cursor.checkKeys(kinds);
    return cursor;
  }

  private void checkKeys(List<Keys> kinds) {
    for (JsonValue.Member member : object.members().values()) {
      if (!keys.has(member.key())) {
        faults.add(member.keyPlace(), unknown(member.key(), kinds));
      } else if (member.value() instanceof JsonValue.Refused refused) {
        faults.add(refused.place(), refused.reason());
      }
    }
    for (JsonValue.Member duplicate : object.duplicates()) {
      faults.add(
          duplicate.keyPlace(),
          "the key "
              + Shown.text(duplicate.key())
              + " stands here again; it was on line "
              + object.members().get(duplicate.key()).keyPlace().line()
              + ". Keep one of the two");
    }
    for (String key : keys.required()) {
      if (!has(key)) {
        addMissing(key);
      }
    }
  }

  private String unknown(String key, List<Keys> kinds) {
    StringBuilder out = new StringBuilder("unknown key ").append(Shown.text(key));
    StringBuilder owners = new StringBuilder();
    for (Keys kind : kinds) {
      if (kind.has(key)) {
        owners.append(owners.length() > 0 ? " and " : "").append(kind.object());
      }
    }
    if (owners.length() > 0) {
      out.append("; ")
          .append(keys.object())
          .append(" has none, but ")
          .append(owners)
          .append(" has");
    } else {
      out.append(Spelling.question(key, keys.all()));
    }
    return out.append(out.charAt(out.length() - 1) == '?' ? " The keys of " : ". The keys of ")
        .append(keys.object())
        .append(" are ")
        .append(String.join(", ", keys.all()))
        .toString();
  }

  /** Reports that a key is missing, and why it must be there. */
  void addMissing(String key, String why) {
    faults.add(object.place().within(key), "the key " + Shown.text(key) + " is missing; " + why);
  }

  private void addMissing(String key) {
    faults.add(
        object.place().within(key),
        "the key " + Shown.text(key) + " is missing; " + keys.object() + " must have it");
  }

  /** Whether nothing was reported since reading of this object began. */
  boolean isSound() {
    return faults.count() == faultsBefore;
  }

  boolean has(String key) {
    return object.members().containsKey(key);
  }

  /** Where the value of a key stands, or would stand. */
  JsonValue.Place placeOf(String key) {
    JsonValue.Member member = object.members().get(key);
    return member == null ? object.place().within(key) : member.value().place();
  }

  /**
   * Where a path from the root stands, when this is the root; where the path leads nowhere, the
   * place of the last part that there is.
   */
  JsonValue.Place placeAt(String path) {
    return placeAt(object, path);
  }

  private static JsonValue.Place placeAt(JsonValue from, String path) {
    if (from instanceof JsonValue.ObjectValue object) {
      for (JsonValue.Member member : object.members().values()) {
        if (leadsTo(member.value(), path)) {
          return placeAt(member.value(), path);
        }
      }
    } else if (from instanceof JsonValue.ArrayValue array) {
      for (JsonValue element : array.elements()) {
        if (leadsTo(element, path)) {
          return placeAt(element, path);
        }
      }
    }
    return from.place();
  }

  private static boolean leadsTo(JsonValue value, String path) {
    String here = value.place().path();
    return path.startsWith(here)
        && (path.length() == here.length()
            || path.charAt(here.length()) == '.'
            || path.charAt(here.length()) == '[');
  }

  /** Where the object stands. */
  JsonValue.Place place() {
    return object.place();
  }

  Faults faults() {
    return faults;
  }

  void refuse(String key, String message) {
    faults.add(placeOf(key), message);
  }

  /** Reports what a domain value says against the value of a key. */
  void refuse(String key, IllegalArgumentException reason) {
    JsonValue.Member member = object.members().get(key);
    String given = member == null ? "" : written(member.value()) + ": ";
    faults.add(placeOf(key), given + reason.getMessage());
  }

  private static String written(JsonValue value) {
    if (value instanceof JsonValue.Text text) {
      return Shown.text(text.text());
    }
    return value instanceof JsonValue.Numeral number
        ? Shown.plain(number.digits())
        : value.described();
  }

  /** The value of a key; empty when there is none or it cannot be used at all. */
  Optional<JsonValue> value(String key) {
    JsonValue.Member member = object.members().get(key);
    return member == null || member.value() instanceof JsonValue.Refused
        ? Optional.empty()
        : Optional.of(member.value());
  }

  void addWrongType(JsonValue value, String expected) {
    String wayOut =
        value instanceof JsonValue.Word word && word.word().equals("null")
            ? ". Where there is nothing to say, leave the key out"
            : "";
    faults.add(value.place(), "found " + value.described() + "; expected " + expected + wayOut);
  }

  /** Text with something in it. */
  Optional<String> text(String key, int longest) {
    Optional<String> text = freeText(key, longest);
    if (text.isPresent() && text.get().isBlank()) {
      refuse(key, "the text is blank; expected some words");
      return Optional.empty();
    }
    return text;
  }

  /** Text that may be blank. */
  Optional<String> freeText(String key, int longest) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (!(value.get() instanceof JsonValue.Text text)) {
      addWrongType(value.get(), "text in double quotation marks");
      return Optional.empty();
    }
    int length = text.text().codePointCount(0, text.text().length());
    if (length > longest) {
      refuse(key, "the text has " + length + " characters; expected at most " + longest);
      return Optional.empty();
    }
    return Optional.of(text.text());
  }

  /** One of some words. */
  Optional<String> word(String key, List<String> accepted) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (!(value.get() instanceof JsonValue.Text text)) {
      addWrongType(value.get(), "one of the words " + listed(accepted));
      return Optional.empty();
    }
    if (!accepted.contains(text.text())) {
      refuse(
          key,
          "unknown "
              + key
              + " "
              + Shown.text(text.text())
              + "; expected "
              + (accepted.size() == 1 ? "" : "one of ")
              + listed(accepted)
              + Spelling.question(text.text(), accepted));
      return Optional.empty();
    }
    return Optional.of(text.text());
  }

  /** The word true or false. */
  Optional<Boolean> flag(String key) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (value.get() instanceof JsonValue.Word word && !word.word().equals("null")) {
      return Optional.of(word.word().equals("true"));
    }
    addWrongType(value.get(), "true or false, without quotation marks");
    return Optional.empty();
  }

  private static String listed(List<String> words) {
    return '"' + String.join("\", \"", words) + '"';
  }

  /** A quantity with unit, in SI; the fallback when absent, NaN when it was refused. */
  double quantity(String key, Dimension dimension, Range range, double fallback) {
    if (!has(key)) {
      return fallback;
    }
    Optional<JsonValue> value = value(key);
    return value.isEmpty() ? Double.NaN : quantity(value.get(), dimension, range);
  }

  /** A quantity that must be there; NaN when it is not, or was refused. */
  double quantity(String key, Dimension dimension, Range range) {
    return quantity(key, dimension, range, Double.NaN);
  }

  /** A frequency in cycles or angle per time, in rad/s; NaN when it is absent or was refused. */
  double frequency(String key, Range range) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty() || !(value.get() instanceof JsonValue.Text text)) {
      return quantity(key, Dimension.FREQUENCY, range);
    }
    try {
      return inRange(value.get(), Quantity.parseFrequency(text.text()), range);
    } catch (QuantityException e) {
      refuse(key, e.getMessage());
      return Double.NaN;
    }
  }

  /** A quantity that may be absent; empty also when it was refused. */
  OptionalDouble optionalQuantity(String key, Dimension dimension, Range range) {
    return asOptional(quantity(key, dimension, range, Double.NaN));
  }

  /** A quantity out of a list. */
  double quantity(JsonValue value, Dimension dimension, Range range) {
    if (value instanceof JsonValue.Text text) {
      try {
        return inRange(value, Quantity.parse(text.text(), dimension), range);
      } catch (QuantityException e) {
        faults.add(value.place(), e.getMessage());
      }
    } else if (value instanceof JsonValue.Numeral number) {
      faults.add(value.place(), bareNumber(number.digits(), dimension));
    } else if (value instanceof JsonValue.Refused refused) {
      faults.add(refused.place(), refused.reason());
    } else {
      addWrongType(
          value, "a quantity with its unit in quotation marks, such as " + example(dimension));
    }
    return Double.NaN;
  }

  private static String bareNumber(String digits, Dimension dimension) {
    try {
      Quantity.parse(digits, dimension);
    } catch (QuantityException e) {
      return "the number stands bare: " + e.getMessage();
    }
    throw new IllegalArgumentException(dimension + " needs no unit");
  }

  private static String example(Dimension dimension) {
    return "\"1 " + Unit.symbolsOf(dimension).get(0) + '"';
  }

  /** A number without unit; the fallback when absent, NaN when it was refused. */
  double number(String key, Range range, double fallback) {
    if (!has(key)) {
      return fallback;
    }
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return Double.NaN;
    }
    return number(value.get(), range);
  }

  /** A number without unit out of a list. */
  double number(JsonValue value, Range range) {
    if (value instanceof JsonValue.Refused refused) {
      faults.add(refused.place(), refused.reason());
      return Double.NaN;
    }
    if (!(value instanceof JsonValue.Numeral number)) {
      addWrongType(value, "a plain number such as 0.5, without unit and quotation marks");
      return Double.NaN;
    }
    try {
      return inRange(value, Quantity.parse(number.digits(), Dimension.DIMENSIONLESS), range);
    } catch (QuantityException e) {
      faults.add(value.place(), e.getMessage());
      return Double.NaN;
    }
  }

  /** A number that must be there; NaN when it is not, or was refused. */
  double number(String key, Range range) {
    return number(key, range, Double.NaN);
  }

  /** A number that may be absent; empty also when it was refused. */
  OptionalDouble optionalNumber(String key, Range range) {
    return asOptional(number(key, range, Double.NaN));
  }

  private double inRange(JsonValue value, double si, Range range) {
    if (range.admits(si)) {
      return si;
    }
    faults.add(value.place(), written(value) + " is out of range; expected " + range.words());
    return Double.NaN;
  }

  private static OptionalDouble asOptional(double value) {
    return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
  }

  /** An object inside this one. */
  Optional<ObjectCursor> object(String key, Keys inner) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (value.get() instanceof JsonValue.ObjectValue found) {
      return Optional.of(of(found, inner, faults));
    }
    addWrongType(value.get(), "an object in braces { }");
    return Optional.empty();
  }

  /** The elements of a list; none when it is absent or was refused. */
  List<JsonValue> list(String key, int longest) {
    Optional<JsonValue> value = value(key);
    if (value.isEmpty()) {
      return List.of();
    }
    if (!(value.get() instanceof JsonValue.ArrayValue array)) {
      addWrongType(value.get(), "a list in brackets [ ]");
      return List.of();
    }
    if (array.elements().size() > longest) {
      refuse(
          key,
          "the list has " + array.elements().size() + " elements; expected at most " + longest);
      return List.of();
    }
    return array.elements();
  }
}
