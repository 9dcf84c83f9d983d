package org.rolltrace.core.files;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The JSON Schemas of the file formats, for editors and other programs. */
public final class Schemas {
  private static final List<String> NAMES = List.of("scenario", "aeroplane");

  private Schemas() {}

  /**
   * The formats that have a schema.
   *
   * @return their names
   */
  public static List<String> names() {
    return NAMES;
  }

  /**
   * A schema, complete in itself.
   *
   * @param name one of {@link #names}
   * @return JSON Schema, draft 2020-12
   * @throws IllegalArgumentException if there is none of that name
   */
  public static String text(String name) {
    if (!NAMES.contains(name)) {
      throw new IllegalArgumentException(
          "no schema is called "
              + Shown.text(name)
              + "; expected one of "
              + String.join(", ", NAMES)
              + Spelling.question(name, NAMES));
    }
    String resource = name + ".schema.json";
    try (InputStream in = Schemas.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("the program was packed without " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + resource + " out of the program", e);
    }
  }
}
