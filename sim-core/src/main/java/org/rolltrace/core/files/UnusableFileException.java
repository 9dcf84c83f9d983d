package org.rolltrace.core.files;

/**
 * A file that cannot be read at all; the message continues a sentence that begins with its name.
 */
final class UnusableFileException extends Exception {
  private static final long serialVersionUID = 1;

  UnusableFileException(String message) {
    super(message);
  }
}
