package org.rolltrace.core.files;

import java.util.List;

/** A file that cannot be used, with everything that is wrong in it and in the files it names. */
public final class FileFaultsException extends RuntimeException {
  private final transient List<FileFault> faults;
  private final int omitted;

  FileFaultsException(List<FileFault> faults, int omitted) {
    super(message(faults, omitted));
    this.faults = List.copyOf(faults);
    this.omitted = omitted;
  }

  private static String message(List<FileFault> faults, int omitted) {
    StringBuilder out = new StringBuilder();
    for (FileFault fault : faults) {
      out.append(out.length() > 0 ? "\n" : "").append(fault);
    }
    if (omitted > 0) {
      out.append("\nand ").append(omitted).append(" more");
    }
    return out.toString();
  }

  /**
   * The faults, each file's by line, the file that was asked for first.
   *
   * @return at least one, at most 200
   */
  public List<FileFault> faults() {
    return faults;
  }

  /**
   * How many faults there are beyond the listed ones.
   *
   * @return 0 unless the list was cut
   */
  public int omitted() {
    return omitted;
  }
}
