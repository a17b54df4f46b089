package perveance.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.engine.base.BadInputException;

/** A file is there whole or as it was before. */
class WholeFileTest {
  private static final byte[] MUCH = "x".repeat(1 << 20).getBytes(StandardCharsets.US_ASCII);

  @TempDir private Path folder;
  private Path target = Path.of("");

  @BeforeEach
  void olderFile() throws IOException {
    target = folder.resolve("a.toml");
    Files.writeString(target, "old");
  }

  /** A disk that takes so many bytes and no more. */
  private static WholeFile onDiskWith(int room) {
    return new WholeFile(channel -> new FullDisk(Channels.newOutputStream(channel), room));
  }

  private static final class FullDisk extends FilterOutputStream {
    private int room;

    FullDisk(OutputStream out, int room) {
      super(out);
      this.room = room;
    }

    @Override
    public void write(byte[] bytes, int start, int length) throws IOException {
      room -= length;
      if (room < 0) {
        throw new IOException("No space left on device");
      }
      out.write(bytes, start, length);
    }
  }

  @Test
  void anOlderFileIsReplacedAndNothingIsLeftBeside() throws Exception {
    WholeFile.write(target, List.of(folder.resolve("b.toml")), out -> out.write(MUCH));
    assertEquals(MUCH.length, Files.size(target));
    assertOnlyTheTarget();
  }

  @Test
  void aFullDiskLeavesTheOlderFile() throws IOException {
    for (int room : new int[] {0, 1, 70_000, MUCH.length - 1}) {
      WholeFile file = onDiskWith(room);
      IOException e =
          assertThrows(
              IOException.class, () -> file.writeWhole(target, List.of(), out -> out.write(MUCH)));
      assertEquals("No space left on device", e.getMessage());
      assertEquals("old", Files.readString(target));
      assertOnlyTheTarget();
    }
  }

  @Test
  void aFullDiskIsNoticedWhenOnlyTheLastBufferDoesNotFit() throws IOException {
    WholeFile file = onDiskWith(2);
    assertThrows(
        IOException.class,
        () ->
            file.writeWhole(
                target, List.of(), out -> out.write("abc".getBytes(StandardCharsets.US_ASCII))));
    assertEquals("old", Files.readString(target));
  }

  @Test
  void aFailureOfTheWriterLeavesTheOlderFile() throws IOException {
    assertThrows(
        IllegalStateException.class,
        () ->
            WholeFile.write(
                target,
                List.of(),
                out -> {
                  out.write(1);
                  throw new IllegalStateException("half way");
                }));
    assertEquals("old", Files.readString(target));
    assertOnlyTheTarget();
  }

  @Test
  void aWriterMayCloseTheStream() throws Exception {
    WholeFile.write(
        target,
        List.of(),
        out -> {
          out.write('n');
          out.close();
        });
    assertEquals("n", Files.readString(target));
  }

  @Test
  void theInputIsNeverReplaced() throws IOException {
    Path link = Files.createSymbolicLink(folder.resolve("link.toml"), target);
    Path roundabout = folder.resolve("x").resolve("..").resolve("a.toml");
    for (Path input : List.of(target, link, roundabout)) {
      BadInputException refusal =
          assertThrows(
              BadInputException.class,
              () -> WholeFile.write(target, List.of(input), out -> out.write(1)));
      assertEquals(
          target + ": output: found the input itself, expected another file for the output",
          refusal.getMessage());
    }
    assertThrows(
        BadInputException.class, () -> WholeFile.write(link, List.of(target), out -> out.write(1)));
    assertEquals("old", Files.readString(target));
  }

  @Test
  void aLinkStillPointsToTheFileAfterwards() throws Exception {
    Path link = Files.createSymbolicLink(folder.resolve("link.toml"), target);
    WholeFile.save(link, "new", false);
    assertTrue(Files.isSymbolicLink(link));
    assertEquals("new", Files.readString(target));
  }

  @Test
  void placesThatCannotBeMeantAreRefused() {
    BadInputException directory =
        assertThrows(BadInputException.class, () -> WholeFile.save(folder, "x", false));
    assertTrue(
        String.valueOf(directory.getMessage())
            .contains("found a folder, expected the name of a file"));
    Path nowhere = folder.resolve("no").resolve("a.toml");
    BadInputException missing =
        assertThrows(BadInputException.class, () -> WholeFile.save(nowhere, "x", false));
    assertTrue(String.valueOf(missing.getMessage()).contains("found a folder that does not exist"));
  }

  @Test
  void permissionsAndTheByteOrderMarkStay() throws Exception {
    Files.setPosixFilePermissions(target, PosixFilePermissions.fromString("rw-rw-r--"));
    WholeFile.save(target, "\u03A9", true);
    assertEquals("rw-rw-r--", PosixFilePermissions.toString(Files.getPosixFilePermissions(target)));
    assertEquals("\uFEFF\u03A9", Files.readString(target));
  }

  private void assertOnlyTheTarget() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(List.of(target), files.toList());
    }
    assertFalse(Files.isDirectory(target));
  }
}
