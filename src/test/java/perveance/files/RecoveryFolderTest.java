package perveance.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a program has not saved is found by the next one, unless the first still runs. */
class RecoveryFolderTest {
  /** No process has this number, for the largest number of a process is smaller. */
  private static final long ENDED = Long.MAX_VALUE;

  private static final String TEXT = "perveance = 1\n\ntitle = \"\u00B5\"\n";

  @TempDir private Path home;

  @Test
  void anEndedProgramsDocumentsAreFoundLatestFirst() throws IOException {
    Path folder = home.resolve("state").resolve("recovery");
    RecoveryFolder ended = new RecoveryFolder(folder, ENDED, "");
    Path original = home.resolve("amp.toml");
    ended.keep(1, Optional.of(original), "old");
    ended.keep(1, Optional.of(original), TEXT);
    ended.keep(2, Optional.empty(), "unsaved");
    Path first = folder.resolve(ENDED + "-1.recovery.toml");
    Files.setLastModifiedTime(first, FileTime.from(Instant.parse("2020-01-01T00:00:00Z")));
    RecoveryFolder now = new RecoveryFolder(folder);
    List<Recovery> left = now.left();
    assertEquals(List.of("unsaved", TEXT), left.stream().map(Recovery::text).toList());
    assertEquals(Optional.empty(), left.get(0).original());
    assertEquals(Optional.of(original), left.get(1).original());
    now.forget(left.get(0));
    ended.forget(1);
    assertEquals(List.of(), now.left());
  }

  @Test
  void whatARunningProgramKeepsIsNotOffered() throws IOException {
    RecoveryFolder running = new RecoveryFolder(home);
    running.keep(1, Optional.empty(), TEXT);
    assertEquals(List.of(), running.left());
    assertTrue(Files.size(home.resolve(ProcessHandle.current().pid() + "-1.recovery.toml")) > 0);
  }

  @Test
  void aNumberGivenToAnotherProcessSinceDoesNotHideADocument() throws IOException {
    long ours = ProcessHandle.current().pid();
    new RecoveryFolder(home, ours, "2001-01-01T00:00:00Z").keep(1, Optional.empty(), TEXT);
    assertEquals(1, new RecoveryFolder(home).left().size());
  }

  @Test
  void otherFilesArePassedOver() throws IOException {
    Files.writeString(home.resolve("1-1.recovery.toml"), "perveance = 1\n\n");
    Files.writeString(home.resolve("note.txt"), "x");
    assertEquals(List.of(), new RecoveryFolder(home).left());
    assertEquals(List.of(), new RecoveryFolder(home.resolve("none")).left());
  }
}
