package org.rolltrace.core.files;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects the faults of one file; faults of the files it names go to the same collection. */
final class Faults {
  /** Beyond this many, faults are only counted. */
  static final int MOST = 200;

  private final Path file;
  private final String about;
  private final Collection collection;

  Faults(Path file) {
    this(file, "", new Collection());
  }

  private Faults(Path file, String about, Collection collection) {
    this.file = file;
    this.about = about;
    this.collection = collection;
  }

  /** The collector of a file that this one names. */
  Faults of(Path named) {
    return new Faults(named, "", collection);
  }

  /** The same collector, whose messages begin with what was read there, and in what sense. */
  Faults about(String words) {
    return new Faults(file, words, collection);
  }

  Path file() {
    return file;
  }

  void add(JsonValue.Place place, String message) {
    add(new FileFault(file, place.path(), place.line(), place.column(), about + message));
  }

  void addForWholeFile(String message) {
    add(new FileFault(file, "$", 0, 0, message));
  }

  private void add(FileFault fault) {
    collection.count++;
    if (collection.count <= MOST) {
      collection.kept.add(fault);
    }
  }

  /** All faults so far, of all files. */
  int count() {
    return collection.count;
  }

  FileFaultsException toException() {
    List<FileFault> sorted = sorted();
    return new FileFaultsException(sorted, collection.count - sorted.size());
  }

  /** Those that were kept, each file's by line, the file that was asked for first. */
  List<FileFault> sorted() {
    List<Path> files = new ArrayList<>();
    files.add(file);
    for (FileFault fault : collection.kept) {
      if (!files.contains(fault.file())) {
        files.add(fault.file());
      }
    }
    List<FileFault> sorted = new ArrayList<>(collection.kept);
    sorted.sort(
        Comparator.comparingInt((FileFault fault) -> files.indexOf(fault.file()))
            .thenComparingInt(FileFault::line)
            .thenComparingInt(FileFault::column));
    return sorted;
  }

  private static final class Collection {
    private final List<FileFault> kept = new ArrayList<>();
    private int count;
  }
}
