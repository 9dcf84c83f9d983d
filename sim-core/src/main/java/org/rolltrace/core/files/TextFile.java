package org.rolltrace.core.files;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.Optional;

/** Reads a file as UTF-8 text, within bounds. */
final class TextFile {
  /** The largest file accepted, bytes. */
  static final int LARGEST = 1 << 20;

  private static final char BYTE_ORDER_MARK = '\uFEFF';

  private TextFile() {}

  /**
   * The bytes of a file.
   *
   * @throws UnusableFileException if it is missing, no regular file, not readable or too large
   */
  static byte[] bytes(Path file) throws UnusableFileException {
    try {
      BasicFileAttributes attributes = Files.readAttributes(file, BasicFileAttributes.class);
      if (attributes.isDirectory()) {
        throw new UnusableFileException("is a directory; expected a file");
      }
      if (!attributes.isRegularFile()) {
        throw new UnusableFileException("is a device or pipe; expected a file");
      }
      if (attributes.size() > LARGEST) {
        throw tooLarge(attributes.size() + " bytes");
      }
      try (InputStream in = Files.newInputStream(file)) {
        byte[] bytes = in.readNBytes(LARGEST + 1);
        if (bytes.length > LARGEST) {
          throw tooLarge("more bytes than that"); // it grew, or the system gave no size
        }
        return bytes;
      }
    } catch (NoSuchFileException e) {
      throw new UnusableFileException("does not exist; check its name and directory");
    } catch (AccessDeniedException e) {
      throw new UnusableFileException("may not be read; check its permissions");
    } catch (IOException e) {
      throw new UnusableFileException("cannot be read; the system says: " + reason(e));
    }
  }

  static UnusableFileException tooLarge(String found) {
    return new UnusableFileException(
        "is too large: expected at most " + LARGEST + " bytes (1 MiB), found " + found);
  }

  private static String reason(IOException e) {
    String reason =
        e instanceof java.nio.file.FileSystemException f ? f.getReason() : e.getMessage();
    return reason == null ? e.getClass().getSimpleName() : reason;
  }

  /** The text of some bytes without a byte-order mark, or a fault where they are not UTF-8. */
  static Optional<char[]> decode(byte[] bytes, Faults faults) {
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CharBuffer out = CharBuffer.allocate(bytes.length); // no byte makes more than one character
    CoderResult result = decoder.decode(in, out, true);
    out.flip();
    if (result.isError()) {
      faults.add(
          placeAfter(out),
          "byte 0x"
              + Integer.toHexString(bytes[in.position()] & 0xff)
              + " is not UTF-8; save the file as UTF-8");
      return Optional.empty();
    }
    if (out.hasRemaining() && out.get(0) == BYTE_ORDER_MARK) {
      out.get();
    }
    char[] text = new char[out.remaining()];
    out.get(text);
    return Optional.of(text);
  }

  private static JsonValue.Place placeAfter(CharBuffer text) {
    int line = 1;
    int lineStart = 0;
    for (int i = 0; i < text.limit(); i++) {
      char c = text.get(i);
      boolean newLine =
          c == '\n' || (c == '\r' && (i + 1 == text.limit() || text.get(i + 1) != '\n'));
      if (newLine) {
        line++;
        lineStart = i + 1;
      }
    }
    return new JsonValue.Place("$", line, text.limit() - lineStart + 1);
  }
}
