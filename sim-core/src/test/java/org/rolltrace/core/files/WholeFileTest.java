package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {
  @TempDir Path directory;

  @Test
  void replacesWhatStoodThereAndKeepsItsPermissions() throws IOException {
    Path file = Files.writeString(directory.resolve("a.json"), "a longer text than the new one");
    var permissions = PosixFilePermissions.fromString("rw-rw----");
    Files.setPosixFilePermissions(file, permissions);

    WholeFile.write(file, "−5 °");

    assertThat(file).hasContent("−5 °");
    assertThat(Files.getPosixFilePermissions(file)).isEqualTo(permissions);
  }

  @Test
  void aLinkStaysALink() throws IOException {
    Path file = Files.writeString(directory.resolve("a.json"), "old");
    Path link = Files.createSymbolicLink(directory.resolve("link.json"), file);

    WholeFile.write(link, "new");

    assertThat(Files.isSymbolicLink(link)).isTrue();
    assertThat(file).hasContent("new");
  }

  @Test
  void aProtectedFileIsLeftAlone() throws IOException {
    Path file = Files.writeString(directory.resolve("a.json"), "old");
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("r--r--r--"));
    assumeThat(Files.isWritable(file)).as("nothing is protected from the administrator").isFalse();
    assertThatThrownBy(() -> WholeFile.write(file, "new"))
        .hasMessageContaining("the file is write-protected");
    assertThat(file).hasContent("old");
  }
}
