package org.rolltrace.ui.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.files.ScenarioDocument;

class RecoveryStoreTest {
  @TempDir Path directory;

  private Path folder() {
    return directory.resolve("state").resolve("rolltrace");
  }

  private ScenarioDocument work() {
    return ScenarioDocument.ofText("{ \"title\": \"Half done\", \"size\": 1.50 }", directory);
  }

  private List<RecoveryStore.Pending> afterTheCrash() {
    return new RecoveryStore(folder()).pending();
  }

  @Test
  void whatWasKeptComesBack() {
    Path origin = directory.resolve("100 % odd\nname.json");
    ScenarioDocument opened = work().at(origin);
    new RecoveryStore(folder()).keep(Optional.of(origin), opened);
    new RecoveryStore(folder()).keep(Optional.empty(), work());

    List<RecoveryStore.Pending> pending = afterTheCrash();
    assertThat(pending).hasSize(2);
    assertThat(pending)
        .extracting(RecoveryStore.Pending::origin)
        .containsExactlyInAnyOrder(Optional.empty(), Optional.of(origin));
    assertThat(pending)
        .extracting(RecoveryStore.Pending::document)
        .containsExactlyInAnyOrder(opened, work());
    assertThat(pending.get(0).time()).isAfterOrEqualTo(pending.get(1).time());
  }

  @Test
  void tracesThatAreInNoFileYetComeBackToo() {
    ScenarioDocument flown =
        ScenarioDocument.ofText(
                "{ \"inputs\": [ { \"shape\": \"trace\", \"file\": \"100 %0A odd.csv\" } ] }",
                directory)
            .carrying(Map.of("100 %0A odd.csv", "time[s],stick[%]\n0,0\r\nsum 1\n1,5\n"));

    new RecoveryStore(folder()).keep(Optional.empty(), flown);

    assertThat(afterTheCrash())
        .singleElement()
        .satisfies(left -> assertThat(left.document()).isEqualTo(flown))
        .satisfies(
            left -> assertThat(left.document().carriedTraces()).isEqualTo(flown.carriedTraces()));
  }

  @Test
  void onlyTheLastIsKeptAndOnlyUntilItIsGivenUp() throws IOException {
    RecoveryStore store = new RecoveryStore(folder());
    store.keep(Optional.empty(), work());
    store.keep(Optional.empty(), work().with("$.title", "Further"));
    assertThat(store.pending()).as("its own work is no crash").isEmpty();
    assertThat(afterTheCrash())
        .singleElement()
        .satisfies(left -> assertThat(left.document().text("$.title")).contains("Further"));
    store.discard();
    store.discard();
    assertThat(afterTheCrash()).isEmpty();
    try (var files = Files.list(folder())) {
      assertThat(files).isEmpty();
    }
  }

  @Test
  void whatIsForgottenIsNotOfferedAgain() {
    new RecoveryStore(folder()).keep(Optional.empty(), work());
    RecoveryStore next = new RecoveryStore(folder());
    next.forget(next.pending().get(0));
    assertThat(next.pending()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void damagedFilesAreNeitherOfferedNorTouched(long seed) throws IOException {
    new RecoveryStore(folder()).keep(Optional.empty(), work());
    Path kept = afterTheCrash().get(0).keptIn();
    byte[] whole = Files.readAllBytes(kept);
    Random random = new Random(seed);
    for (int i = 0; i < 200; i++) {
      byte[] damaged = whole.clone();
      if (random.nextBoolean()) {
        damaged = java.util.Arrays.copyOf(damaged, random.nextInt(damaged.length));
      } else {
        damaged[random.nextInt(damaged.length)] ^= (byte) (1 << random.nextInt(8));
      }
      Files.write(kept, damaged);
      assertThat(afterTheCrash()).isEmpty();
      assertThat(kept).hasBinaryContent(damaged);
    }
    Files.write(kept, whole);
    assertThat(afterTheCrash()).hasSize(1);
  }

  @Test
  void oneDamagedFileDoesNotHideTheOthers() throws IOException {
    new RecoveryStore(folder()).keep(Optional.empty(), work());
    Files.writeString(folder().resolve("0-0.recovery"), "");
    Files.createDirectory(folder().resolve("folder.recovery"));
    Files.write(folder().resolve("1-1.recovery"), new byte[] {(byte) 0xff, 0, '\n'});
    assertThat(afterTheCrash()).hasSize(1);
  }

  @Test
  void workOfAnotherProgramThatStillRunsIsLeftAlone() throws IOException {
    new RecoveryStore(folder()).keep(Optional.empty(), work());
    Path kept = afterTheCrash().get(0).keptIn();
    ProcessHandle parent = ProcessHandle.current().parent().orElseThrow();
    long started = parent.info().startInstant().orElseThrow().toEpochMilli();

    assertThat(pendingAs(kept, parent.pid() + " " + started)).isEmpty();
    // The number of a program that ended may go to another one.
    assertThat(pendingAs(kept, parent.pid() + " " + (started - 1))).hasSize(1);
  }

  /** Writes the file anew as another process would have, with its check sum. */
  private List<RecoveryStore.Pending> pendingAs(Path kept, String process) throws IOException {
    String[] lines = Files.readString(kept).split("\n", 7);
    lines[1] = "process " + process;
    String head = String.join("\n", List.of(lines).subList(0, 5));
    java.util.zip.CRC32 sum = new java.util.zip.CRC32();
    sum.update((head + lines[6]).getBytes(StandardCharsets.UTF_8));
    Files.writeString(kept, head + "\nsum " + Long.toHexString(sum.getValue()) + "\n" + lines[6]);
    return afterTheCrash();
  }

  @Test
  void afolderThatCannotBeUsedIsReportedByKeepingOnly() throws IOException {
    Files.writeString(directory.resolve("state"), "a file in the way");
    RecoveryStore store = new RecoveryStore(folder());
    assertThat(store.pending()).isEmpty();
    store.discard();
    assertThatThrownBy(() -> store.keep(Optional.empty(), work()))
        .isInstanceOf(UncheckedIOException.class)
        .hasMessageContaining("cannot make the folder " + folder())
        .hasMessageContaining("see that");
  }

  @Test
  void theFolderFollowsTheHabitsOfTheSystem() {
    Path home = directory.resolve("home");
    String absolute = directory.resolve("elsewhere").toString();
    assertThat(RecoveryStore.defaultFolder("Linux", Map.of(), home))
        .isEqualTo(home.resolve(".local/state/rolltrace"));
    assertThat(RecoveryStore.defaultFolder("Linux", Map.of("XDG_STATE_HOME", absolute), home))
        .isEqualTo(Path.of(absolute, "rolltrace"));
    // XDG Base Directory Specification 0.8: relative paths are invalid and to be ignored.
    assertThat(RecoveryStore.defaultFolder("Linux", Map.of("XDG_STATE_HOME", "state"), home))
        .isEqualTo(home.resolve(".local/state/rolltrace"));
    assertThat(RecoveryStore.defaultFolder("Windows 11", Map.of("LOCALAPPDATA", absolute), home))
        .isEqualTo(Path.of(absolute, "Rolltrace"));
    assertThat(RecoveryStore.defaultFolder("Windows 11", Map.of(), home))
        .isEqualTo(home.resolve("AppData/Local/Rolltrace"));
    assertThat(RecoveryStore.defaultFolder("Mac OS X", Map.of(), home))
        .isEqualTo(home.resolve("Library/Application Support/Rolltrace"));
  }
}
