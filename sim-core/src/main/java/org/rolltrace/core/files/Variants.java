package org.rolltrace.core.files;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The variants of an aeroplane: by name, each the keys that differ from the base. A key that is an
 * object in both is gone into; null takes a key out; anything else stands in place of what the base
 * has (JSON Merge Patch, RFC 7396). What is merged keeps the places where it was written.
 */
final class Variants {
  static final String KEY = "variants";
  static final int MOST = 50;
  private static final List<String> NOT_IN_A_VARIANT = List.of(KEY, FormatName.KEY);

  private Variants() {}

  /** The names of the variants, in their order; faults in them are not looked for. */
  static List<String> names(JsonValue.ObjectValue aeroplane) {
    JsonValue.Member member = aeroplane.members().get(KEY);
    return member != null && member.value() instanceof JsonValue.ObjectValue all
        ? List.copyOf(all.members().keySet())
        : List.of();
  }

  /** Checks the variants, as far as that can be done without their base. */
  static void check(JsonValue.ObjectValue aeroplane, Faults faults) {
    JsonValue.Member member = aeroplane.members().get(KEY);
    if (member == null) {
      return;
    }
    if (!(member.value() instanceof JsonValue.ObjectValue all)) {
      if (member.value() instanceof JsonValue.Refused refused) {
        faults.add(refused.place(), refused.reason());
      } else {
        faults.add(
            member.value().place(),
            "found " + member.value().described() + "; expected variants by name in braces { }");
      }
      return;
    }
    if (all.members().size() > MOST) {
      faults.add(all.place(), "there are more than " + MOST + " variants; expected fewer");
    }
    for (JsonValue.Member duplicate : all.duplicates()) {
      faults.add(
          duplicate.keyPlace(),
          "the variant " + Shown.text(duplicate.key()) + " stands here a second time");
    }
    for (JsonValue.Member variant : all.members().values()) {
      if (variant.key().isBlank()) {
        faults.add(variant.keyPlace(), "the name of a variant is blank; expected some text");
      }
      int length = variant.key().codePointCount(0, variant.key().length());
      if (length > AeroplaneFormat.LONGEST_NAME) {
        faults.add(
            variant.keyPlace(),
            "the name has "
                + length
                + " characters; expected at most "
                + AeroplaneFormat.LONGEST_NAME);
      }
      if (variant.value() instanceof JsonValue.Refused refused) {
        faults.add(refused.place(), refused.reason());
        continue;
      }
      if (!(variant.value() instanceof JsonValue.ObjectValue changes)) {
        faults.add(
            variant.value().place(),
            "found "
                + variant.value().described()
                + "; expected what the variant changes, in braces { }");
        continue;
      }
      if (changes.members().isEmpty()) {
        faults.add(
            changes.place(),
            "the variant "
                + Shown.text(variant.key())
                + " changes nothing; name what it changes, or take it out");
      }
      for (String key : NOT_IN_A_VARIANT) {
        if (changes.members().containsKey(key)) {
          faults.add(
              changes.members().get(key).keyPlace(),
              "a variant cannot change " + Shown.text(key) + "; take it out");
        }
      }
      checkChanges(aeroplane, changes, faults);
    }
  }

  /** No key twice, and a null must have something to take out. */
  private static void checkChanges(
      JsonValue.ObjectValue base, JsonValue.ObjectValue changes, Faults faults) {
    for (JsonValue.Member duplicate : changes.duplicates()) {
      faults.add(
          duplicate.keyPlace(),
          "the key " + Shown.text(duplicate.key()) + " stands here again. Keep one of the two");
    }
    for (JsonValue.Member change : changes.members().values()) {
      JsonValue.Member there = base.members().get(change.key());
      if (isNull(change.value())) {
        if (there == null) {
          faults.add(
              change.keyPlace(),
              "null takes "
                  + Shown.text(change.key())
                  + " out, which the base does not have; leave it out here as well");
        }
      } else if (there != null
          && there.value() instanceof JsonValue.ObjectValue inner
          && change.value() instanceof JsonValue.ObjectValue deeper) {
        checkChanges(inner, deeper, faults);
      }
    }
  }

  private static boolean isNull(JsonValue value) {
    return value instanceof JsonValue.Word word && word.word().equals("null");
  }

  /** An aeroplane as a variant has it; empty when there is none of that name. */
  static Optional<JsonValue.ObjectValue> of(JsonValue.ObjectValue aeroplane, String name) {
    JsonValue.Member member = aeroplane.members().get(KEY);
    if (member != null
        && member.value() instanceof JsonValue.ObjectValue all
        && all.members().get(name) != null
        && all.members().get(name).value() instanceof JsonValue.ObjectValue changes) {
      return Optional.of(merged(aeroplane, changes));
    }
    return Optional.empty();
  }

  private static JsonValue.ObjectValue merged(
      JsonValue.ObjectValue base, JsonValue.ObjectValue changes) {
    Map<String, JsonValue.Member> members = new LinkedHashMap<>(base.members());
    for (JsonValue.Member change : changes.members().values()) {
      JsonValue.Member there = members.get(change.key());
      if (isNull(change.value())) {
        members.remove(change.key());
      } else if (there != null
          && there.value() instanceof JsonValue.ObjectValue inner
          && change.value() instanceof JsonValue.ObjectValue deeper) {
        members.put(
            change.key(),
            new JsonValue.Member(change.key(), there.keyPlace(), merged(inner, deeper)));
      } else {
        members.put(change.key(), change);
      }
    }
    List<JsonValue.Member> duplicates =
        base.duplicates().stream().filter(again -> members.containsKey(again.key())).toList();
    return new JsonValue.ObjectValue(base.place(), members, duplicates);
  }
}
