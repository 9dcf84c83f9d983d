package org.rolltrace.core.files;

import java.util.Optional;

/** What the key {@code format} says: the kind of a file and the version of its layout. */
final class FormatName {
  static final String KEY = "format";
  static final String SCENARIO = "rolltrace-scenario/1";
  static final String AEROPLANE = "rolltrace-aeroplane/1";

  private FormatName() {}

  /**
   * Whether an object may be of a format. When it says that it is another, that is reported, and
   * nothing else about it is worth saying.
   */
  static boolean mayBe(String expected, JsonValue.ObjectValue object, Faults faults) {
    JsonValue.Member member = object.members().get(KEY);
    if (member == null || member.value() instanceof JsonValue.Refused) {
      return true; // reported elsewhere
    }
    Optional<String> found =
        member.value() instanceof JsonValue.Text text ? Optional.of(text.text()) : Optional.empty();
    if (found.isPresent() && found.get().equals(expected)) {
      return true;
    }
    String kind = kind(found.orElse(""));
    faults.add(
        member.value().place(),
        "found "
            + member.value().described()
            + "; expected \""
            + expected
            + '"'
            + (kind.isEmpty() || kind.equals(kind(expected))
                ? ""
                : ". This is " + kind + ", where " + kind(expected) + " is expected"));
    return false;
  }

  private static String kind(String format) {
    if (format.startsWith("rolltrace-scenario/")) {
      return "a scenario";
    }
    if (format.startsWith("rolltrace-aeroplane/")) {
      return "an aeroplane";
    }
    return "";
  }
}
