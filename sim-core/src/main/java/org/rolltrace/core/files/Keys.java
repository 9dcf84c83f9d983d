package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;

/** The keys that one kind of object may have. Immutable. */
final class Keys {
  private final String object;
  private final List<String> required;
  private final List<String> all;

  private Keys(String object, List<String> required, List<String> all) {
    this.object = object;
    this.required = required;
    this.all = all;
  }

  /** No keys yet, for an object that messages call by this name and article. */
  static Keys of(String object) {
    return new Keys(object, List.of(), List.of());
  }

  /** The same keys for an object of another name. */
  Keys named(String newObject) {
    return new Keys(newObject, required, all);
  }

  /** These and more keys, without which the object is not complete. */
  Keys required(String... keys) {
    return new Keys(object, joined(required, keys), joined(all, keys));
  }

  /** These and more keys, which may be absent. */
  Keys optional(String... keys) {
    return new Keys(object, required, joined(all, keys));
  }

  private static List<String> joined(List<String> some, String... more) {
    List<String> joined = new ArrayList<>(some);
    joined.addAll(List.of(more));
    return List.copyOf(joined);
  }

  String object() {
    return object;
  }

  List<String> required() {
    return required;
  }

  List<String> all() {
    return all;
  }

  boolean has(String key) {
    return all.contains(key);
  }

  @Override
  public String toString() {
    return object;
  }
}
