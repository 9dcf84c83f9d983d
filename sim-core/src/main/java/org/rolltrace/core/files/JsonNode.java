package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** A value of a JSON text that is edited: what is written, in its order and lines. Immutable. */
sealed interface JsonNode {

  /** Text without its quotation marks. */
  record Text(String text) implements JsonNode {}

  /** A number, or one of the words true, false and null, as it is written. */
  record Bare(String written) implements JsonNode {}

  /**
   * One value of an object or a list.
   *
   * @param key nothing in a list
   * @param newLine whether it begins a line
   */
  record Item(String key, JsonNode value, boolean newLine) {
    Item withValue(JsonNode newValue) {
      return new Item(key, newValue, newLine);
    }
  }

  /**
   * An object or a list.
   *
   * @param items with keys that stand there twice
   * @param laidOut whether its lines were chosen by whoever wrote it
   */
  record Group(boolean isList, List<Item> items, boolean laidOut) implements JsonNode {
    static final Group EMPTY_OBJECT = new Group(false, List.of(), false);
    static final Group EMPTY_LIST = new Group(true, List.of(), false);

    public Group {
      items = List.copyOf(items);
    }

    /** Where a step leads; the number of items, or beyond, when it leads to none of them. */
    int indexOf(JsonPath.Step step) {
      if (isList) {
        return step.isIndex() ? step.index() : items.size();
      }
      for (int i = 0; i < items.size(); i++) {
        if (!step.isIndex() && step.isKey(items.get(i).key())) {
          return i;
        }
      }
      return items.size();
    }

    Group with(int index, JsonNode value) {
      List<Item> changed = new ArrayList<>(items);
      changed.set(index, items.get(index).withValue(value));
      return new Group(isList, changed, laidOut);
    }

    /** One more, at the place that its key has by custom, laid out as its neighbour is. */
    Group withAdded(String key, JsonNode value) {
      int index = isList ? items.size() : KeyOrder.placeIn(items, key);
      boolean newLine = !items.isEmpty() && items.get(Math.max(index - 1, 0)).newLine();
      List<Item> changed = new ArrayList<>(items);
      changed.add(index, new Item(key, value, newLine));
      return new Group(isList, changed, laidOut && !items.isEmpty());
    }

    Group without(int index) {
      List<Item> changed = new ArrayList<>(items);
      Item removed = changed.remove(index);
      if (removed.newLine() && index < changed.size()) {
        Item next = changed.get(index);
        changed.set(index, new Item(next.key(), next.value(), true));
      }
      return new Group(isList, changed, laidOut);
    }
  }

  /** A value that was read, with the lines on which it stood. */
  static JsonNode of(JsonValue value) {
    if (value instanceof JsonValue.ObjectValue object) {
      return group(object);
    }
    if (value instanceof JsonValue.ArrayValue array) {
      List<Item> items = new ArrayList<>();
      int line = array.place().line();
      for (JsonValue element : array.elements()) {
        items.add(new Item("", of(element), element.place().line() > line));
        line = lastLine(element);
      }
      return new Group(true, items, true);
    }
    if (value instanceof JsonValue.Refused refused) {
      return of(refused.written());
    }
    if (value instanceof JsonValue.Text text) {
      return new Text(text.text());
    }
    return new Bare(
        value instanceof JsonValue.Numeral number
            ? number.digits()
            : ((JsonValue.Word) value).word());
  }

  static Group group(JsonValue.ObjectValue object) {
    List<Item> items = new ArrayList<>();
    int line = object.place().line();
    for (JsonValue.Member member : membersAsWritten(object)) {
      items.add(new Item(member.key(), of(member.value()), member.keyPlace().line() > line));
      line = lastLine(member.value());
    }
    return new Group(false, items, true);
  }

  private static List<JsonValue.Member> membersAsWritten(JsonValue.ObjectValue object) {
    List<JsonValue.Member> members = new ArrayList<>(object.members().values());
    if (!object.duplicates().isEmpty()) {
      members.addAll(object.duplicates());
      members.sort(
          Comparator.comparingInt((JsonValue.Member member) -> member.keyPlace().line())
              .thenComparingInt(member -> member.keyPlace().column()));
    }
    return members;
  }

  /** The line on which the last value inside begins. */
  private static int lastLine(JsonValue value) {
    int line = value.place().line();
    if (value instanceof JsonValue.ObjectValue object) {
      for (JsonValue.Member member : object.members().values()) {
        line = Math.max(line, lastLine(member.value()));
      }
    } else if (value instanceof JsonValue.ArrayValue array) {
      for (JsonValue element : array.elements()) {
        line = Math.max(line, lastLine(element));
      }
    }
    return line;
  }

  /** The value that a path leads to from here. */
  static Optional<JsonNode> find(JsonNode from, List<JsonPath.Step> path) {
    JsonNode at = from;
    for (JsonPath.Step step : path) {
      if (!(at instanceof Group group)) {
        return Optional.empty();
      }
      int index = group.indexOf(step);
      if (index >= group.items().size()) {
        return Optional.empty();
      }
      at = group.items().get(index).value();
    }
    return Optional.of(at);
  }

  /** The same with a value where a path leads; what is missing on the way is made. */
  static JsonNode with(JsonNode from, List<JsonPath.Step> path, JsonNode value) {
    if (path.isEmpty()) {
      return value;
    }
    JsonPath.Step step = path.get(0);
    List<JsonPath.Step> rest = path.subList(1, path.size());
    Group group =
        from instanceof Group found && found.isList() == step.isIndex()
            ? found
            : step.isIndex() ? Group.EMPTY_LIST : Group.EMPTY_OBJECT;
    int index = group.indexOf(step);
    int size = group.items().size();
    if (index < size) {
      return group.with(index, with(group.items().get(index).value(), rest, value));
    }
    if (index > size) {
      throw new IndexOutOfBoundsException(
          "index " + index + " of a list of " + size + "; expected at most " + size);
    }
    return group.withAdded(step.key(), with(Group.EMPTY_OBJECT, rest, value));
  }

  /** The same without what a path leads to; the same when it leads nowhere. */
  static JsonNode without(JsonNode from, List<JsonPath.Step> path) {
    if (!(from instanceof Group group)) {
      return from;
    }
    int index = group.indexOf(path.get(0));
    if (index >= group.items().size()) {
      return from;
    }
    if (path.size() == 1) {
      return group.without(index);
    }
    return group.with(
        index, without(group.items().get(index).value(), path.subList(1, path.size())));
  }

  /** An object as another one changes it: as {@link Variants} does it while reading. */
  static Group merged(Group base, Group changes) {
    Group merged = base;
    for (Item change : changes.items()) {
      JsonPath.Step step = new JsonPath.Step(change.key(), -1);
      int index = merged.indexOf(step);
      boolean isThere = index < merged.items().size();
      JsonNode there = isThere ? merged.items().get(index).value() : null;
      if (change.value().equals(new Bare("null"))) {
        merged = isThere ? merged.without(index) : merged;
      } else if (there instanceof Group inner
          && change.value() instanceof Group deeper
          && !inner.isList()
          && !deeper.isList()) {
        merged = merged.with(index, merged(inner, deeper));
      } else {
        merged =
            isThere
                ? merged.with(index, change.value())
                : merged.withAdded(change.key(), change.value());
      }
    }
    return merged;
  }
}
