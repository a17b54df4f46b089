package perveance.files.toml;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.engine.base.BadInputException;

/** What is not a text file of ours is refused with one message. */
class SourceTextTest {
  @TempDir private Path folder;

  private static String refusal(byte[] bytes) {
    BadInputException refusal =
        assertThrows(BadInputException.class, () -> SourceText.decode("a.toml", bytes));
    assertEquals(1, refusal.problems().size());
    return refusal.problems().get(0).message();
  }

  private String refusal(Path path) {
    BadInputException refusal = assertThrows(BadInputException.class, () -> SourceText.read(path));
    assertEquals(1, refusal.problems().size());
    return refusal.problems().get(0).message();
  }

  @Test
  void utf8IsReadWithAndWithoutAMark() throws BadInputException {
    byte[] plain = "a = \"\u00B5\u03A9\"".getBytes(StandardCharsets.UTF_8);
    byte[] marked = "\uFEFFa = 1".getBytes(StandardCharsets.UTF_8);
    assertEquals("a = \"\u00B5\u03A9\"", SourceText.decode("a", plain).text());
    assertEquals("a = 1", SourceText.decode("a", marked).text());
    assertTrue(SourceText.decode("a", marked).marked());
  }

  @Test
  void otherEncodingsAreNamed() {
    assertEquals(
        "a.toml:2: found byte 0xB5, which is not UTF-8, expected UTF-8 text (save it as UTF-8 in"
            + " the editor)",
        refusal("ab\nc\u00B5".getBytes(StandardCharsets.ISO_8859_1)));
    assertTrue(refusal("a = 1".getBytes(StandardCharsets.UTF_16)).contains("found UTF-16 text"));
    byte[] littleEndian = "\uFEFFa".getBytes(StandardCharsets.UTF_16LE);
    assertTrue(refusal(littleEndian).contains("found UTF-16 text"));
    byte[] cut = {'a', (byte) 0xC2};
    assertTrue(refusal(cut).contains("not UTF-8"), refusal(cut));
  }

  @Test
  void binaryDataIsNamedWithItsLine() {
    assertEquals(
        "a.toml:3: found a NUL byte (binary data), expected UTF-8 text",
        refusal(new byte[] {'a', '\n', '\n', 0}));
  }

  @Test
  void aHugeFileIsRefusedWithoutBeingReadWhole() throws IOException {
    Path huge = folder.resolve("huge.toml");
    try (RandomAccessFile file = new RandomAccessFile(huge.toFile(), "rw")) {
      file.setLength(10_000_000_000L); // a hole, which takes no room on the disk
    }
    assertTrue(
        refusal(huge).endsWith("found more than 1 MB, expected a text file of at most 1 MB"));
  }

  @Test
  void whatCannotBeReadIsNamed() {
    assertTrue(refusal(folder).endsWith("found a folder, expected a file"));
    Path none = folder.resolve("none.toml");
    assertEquals(none + ": found no such file, expected a file that exists", refusal(none));
  }

  @Test
  void aTruncatedSequenceAtTheEndIsRefused() {
    for (byte[] bytes : List.of(new byte[] {(byte) 0xE2, (byte) 0x82}, new byte[] {(byte) 0xF0})) {
      assertTrue(refusal(bytes).contains("not UTF-8"));
    }
  }
}
