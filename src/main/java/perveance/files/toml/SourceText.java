package perveance.files.toml;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;

/**
 * The text of a file, decoded strictly: what is not text is refused here with one message.
 *
 * @param file the file as the person named it
 * @param text its text, without a byte order mark
 * @param marked whether the file began with a byte order mark, so that saving can keep it
 */
public record SourceText(String file, String text, boolean marked) {
  /** A chassis of a hundred stages or a device with a thousand readings stays far below this. */
  public static final int MOST_BYTES = 1 << 20;

  /**
   * A text that did not come from a file, for tests and unsaved documents.
   *
   * @param file name to use in messages
   * @param text the text
   * @return the source
   */
  public static SourceText of(String file, String text) {
    return new SourceText(file, text, false);
  }

  /**
   * Reads and decodes a file.
   *
   * @param path the file
   * @return its text
   * @throws BadInputException when it cannot be read, is too large or is not UTF-8 text
   */
  public static SourceText read(Path path) throws BadInputException {
    return read(path, path.toString());
  }

  /**
   * Reads and decodes a file.
   *
   * @param path the file
   * @param file how messages name it
   * @return its text
   * @throws BadInputException when it cannot be read, is too large or is not UTF-8 text
   */
  public static SourceText read(Path path, String file) throws BadInputException {
    try {
      if (Files.isDirectory(path)) {
        throw refused(file, "a folder", "a file");
      }
      try (InputStream in = Files.newInputStream(path)) {
        return decode(file, in.readNBytes(MOST_BYTES + 1));
      }
    } catch (NoSuchFileException e) {
      throw refused(file, "no such file", "a file that exists");
    } catch (IOException e) {
      throw refused(file, "a file that cannot be read: " + e.getMessage(), "a readable file");
    }
  }

  /**
   * Decodes the bytes of a file.
   *
   * @param file the file as the person named it
   * @param bytes all its bytes, or one more than {@link #MOST_BYTES} of them
   * @return its text
   * @throws BadInputException when there are too many or they are not UTF-8 text
   */
  public static SourceText decode(String file, byte[] bytes) throws BadInputException {
    if (bytes.length > MOST_BYTES) {
      throw refused(file, "more than 1 MB", "a text file of at most 1 MB");
    }
    boolean marked =
        bytes.length >= 3
            && bytes[0] == (byte) 0xEF
            && bytes[1] == (byte) 0xBB
            && bytes[2] == (byte) 0xBF;
    int start = marked ? 3 : 0;
    if (bytes.length >= 2 && (bytes[0] & 0xFE) == 0xFE && (bytes[1] & 0xFE) == 0xFE) {
      throw refused(file, "UTF-16 text", "UTF-8 text (save it as UTF-8 in the editor)");
    }
    for (int i = start; i < bytes.length; i++) {
      if (bytes[i] == 0) {
        throw refused(file, lineOf(bytes, i), "a NUL byte (binary data)", "UTF-8 text");
      }
    }
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes, start, bytes.length - start);
    CharBuffer out = CharBuffer.allocate(bytes.length);
    CoderResult result = decoder.decode(in, out, true);
    if (result.isError()) {
      String found =
          String.format(Locale.ROOT, "byte 0x%02X, which is not UTF-8", bytes[in.position()]);
      throw refused(
          file, lineOf(bytes, in.position()), found, "UTF-8 text (save it as UTF-8 in the editor)");
    }
    return new SourceText(file, out.flip().toString(), marked);
  }

  /**
   * A part of the text.
   *
   * @param span its place
   * @return the text there
   */
  public String slice(Span span) {
    return text.substring(span.start(), span.end());
  }

  private static int lineOf(byte[] bytes, int offset) {
    int line = 1;
    for (int i = 0; i < offset; i++) {
      if (bytes[i] == '\n') {
        line++;
      }
    }
    return line;
  }

  private static BadInputException refused(String file, String found, String expected) {
    return new BadInputException(
        new Problem(file, OptionalInt.empty(), "", found, expected, Optional.empty()));
  }

  private static BadInputException refused(String file, int line, String found, String expected) {
    return new BadInputException(Problem.at(file, line, "", found, expected));
  }
}
