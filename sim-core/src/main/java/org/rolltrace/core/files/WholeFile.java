package org.rolltrace.core.files;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFilePermission;
import java.util.Set;

/**
 * Writes a text file whole or not at all: first beside its place under another name, then, when it
 * is complete and on the disk, over what stood there.
 */
public final class WholeFile {
  private WholeFile() {}

  /**
   * Writes a text file in UTF-8.
   *
   * @param file where to, in a folder that exists; a file that stands there is replaced and hands
   *     down its permissions, and a link leads to the new text too
   * @param text what it says
   * @throws UncheckedIOException when it cannot be written; its message says what to do
   */
  public static void write(Path file, String text) {
    Path draft = null;
    try {
      Path place = Files.isSymbolicLink(file) ? file.toRealPath() : file;
      refuseWhatMustStay(place);
      draft =
          place.resolveSibling(
              "."
                  + place.getFileName()
                  + "."
                  + ProcessHandle.current().pid()
                  + "-"
                  + System.nanoTime()
                  + ".part");
      writeThrough(draft, text);
      handDownPermissions(place, draft);
      move(draft, place);
    } catch (IOException failure) {
      delete(draft);
      throw new UncheckedIOException(
          "cannot write "
              + file
              + ": "
              + reason(failure)
              + "; choose a folder that you may write to, with room on its disk",
          failure);
    }
  }

  private static void refuseWhatMustStay(Path place) throws IOException {
    if (place.getFileName() == null || Files.isDirectory(place)) {
      throw new FileSystemException(place.toString(), null, "it is a folder");
    }
    if (Files.exists(place) && !Files.isWritable(place)) {
      throw new FileSystemException(place.toString(), null, "the file is write-protected");
    }
  }

  private static void writeThrough(Path draft, String text) throws IOException {
    try (FileChannel out =
        FileChannel.open(draft, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
      ByteBuffer bytes = StandardCharsets.UTF_8.encode(text);
      while (bytes.hasRemaining()) {
        out.write(bytes);
      }
      out.force(true);
    }
  }

  private static void handDownPermissions(Path place, Path draft) throws IOException {
    if (Files.exists(place)) {
      try {
        Set<PosixFilePermission> permissions = Files.getPosixFilePermissions(place);
        Files.setPosixFilePermissions(draft, permissions);
      } catch (UnsupportedOperationException none) {
        return; // the folder hands down its own
      }
    }
  }

  static void move(Path draft, Path place) throws IOException {
    try {
      Files.move(draft, place, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException plainMove) {
      Files.move(draft, place, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static void delete(Path draft) {
    try {
      if (draft != null) {
        Files.deleteIfExists(draft);
      }
    } catch (IOException stays) {
      // The failure that is being reported says what is wrong with the folder.
    }
  }

  static String reason(IOException failure) {
    String what =
        switch (failure.getClass().getSimpleName()) {
          case "FileAlreadyExistsException" -> "there is a file of that name";
          case "AccessDeniedException" -> "it is not allowed";
          case "NotDirectoryException" -> "it is not a folder";
          case "NoSuchFileException" -> "its folder does not exist or cannot be made";
          case "ReadOnlyFileSystemException" -> "the disk is read only";
          default -> "";
        };
    if (!what.isEmpty()) {
      return what;
    }
    String said =
        failure instanceof FileSystemException system && system.getReason() != null
            ? system.getReason()
            : failure.getMessage();
    return said == null ? failure.getClass().getSimpleName() : said;
  }
}
