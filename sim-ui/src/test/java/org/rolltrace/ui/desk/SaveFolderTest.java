package org.rolltrace.ui.desk;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SaveFolderTest {
  @TempDir Path place;

  private Path made(String name) {
    try {
      return Files.createDirectories(place.resolve(name));
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  private SaveFolder folder() {
    return new SaveFolder(made("home"), () -> made("shipped"));
  }

  @Test
  void shippedScenariosAreCopiedToTheUsersOwnFolder() {
    assertThat(folder().toBeginIn(made("shipped").resolve("roll.json")))
        .isEqualTo(place.resolve("home"));
    assertThat(folder().toBeginIn(null)).isEqualTo(place.resolve("home"));
  }

  @Test
  void ownScenariosAreSavedBesideThemselves() {
    assertThat(folder().toBeginIn(made("mine").resolve("roll.json")))
        .isEqualTo(place.resolve("mine"));
  }

  @Test
  void whereSomethingWasSavedLastComesFirst() throws IOException {
    SaveFolder folder = folder();
    folder.remember(made("last").resolve("roll.json"));
    assertThat(folder.toBeginIn(made("shipped").resolve("roll.json")))
        .isEqualTo(place.resolve("last"));

    Files.delete(place.resolve("last"));
    assertThat(folder.toBeginIn(made("shipped").resolve("roll.json")))
        .isEqualTo(place.resolve("home"));
  }

  @Test
  void withoutShippedScenariosAnyFolderIsTheUsersOwn() {
    SaveFolder folder =
        new SaveFolder(
            made("home"),
            () -> {
              throw new IllegalStateException("the jar carries none");
            });
    assertThat(folder.toBeginIn(made("mine").resolve("roll.json")))
        .isEqualTo(place.resolve("mine"));
  }
}
