package perveance.files.toml;

import java.util.Locale;

/**
 * A place in the text that moves on while it is read. Counts lines.
 *
 * <p>The loops over keys, quoted text and comments stand here and read an array, because a whole
 * library is read while nothing is compiled yet, when a call for each character costs most.
 */
final class Cursor {
  /** Stands for the end of the text. */
  static final int END = -1;

  private static final int LONGEST_SHOWN = 40;

  private final String text;
  private final char[] chars;
  private int offset;
  private int line = 1;

  Cursor(String text) {
    this.text = text;
    this.chars = text.toCharArray();
  }

  int offset() {
    return offset;
  }

  int line() {
    return line;
  }

  int peek() {
    return offset < chars.length ? chars[offset] : END;
  }

  int peek(int ahead) {
    int at = offset + ahead;
    return at < chars.length ? chars[at] : END;
  }

  int next() {
    if (offset >= chars.length) {
      return END;
    }
    char c = chars[offset++];
    if (c == '\n') {
      line++;
    }
    return c;
  }

  boolean atLineEnd() {
    int c = peek();
    return c == END || c == '\n' || (c == '\r' && peek(1) == '\n');
  }

  boolean startsWith(String word) {
    return text.startsWith(word, offset);
  }

  void advance(int count) {
    for (int i = 0; i < count; i++) {
      next();
    }
  }

  void skipSpaces() {
    while (peek() == ' ' || peek() == '\t') {
      offset++;
    }
  }

  /** Skips spaces and, when there is one, a comment. */
  void skipSpacesAndComment() throws TomlFault {
    skipSpaces();
    if (peek() == '#') {
      while (offset < chars.length && isPlain(chars[offset])) {
        offset++;
      }
      if (!atLineEnd()) {
        requirePrintable(peek());
      }
    }
  }

  /** Skips spaces, comments and line ends. */
  void skipBlank() throws TomlFault {
    while (true) {
      skipSpacesAndComment();
      if (peek() == END || !atLineEnd()) {
        return;
      }
      endLine();
    }
  }

  /** Steps over letters, digits, - and _. */
  void skipBareKey() {
    while (offset < chars.length && isBareKey(chars[offset])) {
      offset++;
    }
  }

  static boolean isBareKey(char c) {
    return (c >= 'a' && c <= 'z')
        || (c >= 'A' && c <= 'Z')
        || (c >= '0' && c <= '9')
        || c == '_'
        || c == '-';
  }

  /** Steps over what may stand in text in these quotes as it is, without a line end or escape. */
  void skipPlain(int quote) {
    while (offset < chars.length) {
      char c = chars[offset];
      if (c == quote || c == '\\' || !isPlain(c)) {
        return;
      }
      offset++;
    }
  }

  private static boolean isPlain(char c) {
    return (c >= ' ' && c != 0x7F) || c == '\t';
  }

  /** Steps over a line end. */
  void endLine() {
    if (peek() == '\r') {
      offset++;
    }
    next();
  }

  void skipLine() {
    while (!atLineEnd()) {
      offset++;
    }
    endLine();
  }

  void backToLineStart() {
    while (offset > 0 && chars[offset - 1] != '\n') {
      offset--;
    }
  }

  /** Control characters other than tab have no place in the text, not even in comments. */
  void requirePrintable(int c) throws TomlFault {
    if (!isPlain((char) c)) {
      throw new TomlFault(
          line, String.format(Locale.ROOT, "control character U+%04X", c), "printable text");
    }
  }

  Span since(int start, int startLine) {
    return new Span(start, offset, startLine);
  }

  String textSince(int start) {
    return text.substring(start, offset);
  }

  /** What is left of the line, without comment, fit to be shown. */
  String restOfLine() {
    return shown(offset);
  }

  String shown(int start) {
    int end = start;
    while (end < text.length() && text.charAt(end) != '\n' && text.charAt(end) != '#') {
      end++;
    }
    return shorten(text.substring(start, end).strip());
  }

  /** A text fit to be shown in a message. */
  static String shorten(String found) {
    if (found.isBlank()) {
      return "nothing";
    }
    if (found.length() <= LONGEST_SHOWN) {
      return found;
    }
    int cut = Character.isHighSurrogate(found.charAt(LONGEST_SHOWN - 2)) ? 2 : 1;
    return found.substring(0, LONGEST_SHOWN - cut) + "\u2026";
  }
}
