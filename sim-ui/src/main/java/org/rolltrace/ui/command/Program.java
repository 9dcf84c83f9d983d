package org.rolltrace.ui.command;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine;

/** Name, version and commit, from what the build left beside this class. */
final class Program implements CommandLine.IVersionProvider {
  static final String NAME = "Rolltrace";

  @Override
  public String[] getVersion() {
    return new String[] {identity()};
  }

  /** Such as {@code Rolltrace 0.1.0 (commit 0123456789ab)}. */
  static String identity() {
    Properties build = new Properties();
    try (InputStream in = Program.class.getResourceAsStream("build.properties")) {
      if (in != null) {
        build.load(in);
      }
    } catch (IOException unreadable) {
      throw new UncheckedIOException("the build's properties cannot be read", unreadable);
    }
    String version = build.getProperty("git.build.version", "of unknown version");
    String commit = build.getProperty("git.commit.id.abbrev", "");
    boolean changed = Boolean.parseBoolean(build.getProperty("git.dirty", "false"));
    return NAME
        + " "
        + version
        + (commit.isEmpty()
            ? " (commit unknown)"
            : " (commit " + commit + (changed ? ", with changes" : "") + ")");
  }
}
