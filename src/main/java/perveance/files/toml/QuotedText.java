package perveance.files.toml;

import java.util.Locale;
import java.util.Optional;

/** Reads the four quoted forms of TOML and writes the one that is needed. */
final class QuotedText {
  private static final String BASIC = "\"\"\"";
  private static final String LITERAL = "'''";

  private QuotedText() {}

  /** Reads the quoted text at the cursor, which stands on a quote. */
  static String read(Cursor cursor) throws TomlFault {
    if (cursor.startsWith(BASIC)) {
      return many(cursor, BASIC, true);
    }
    if (cursor.startsWith(LITERAL)) {
      return many(cursor, LITERAL, false);
    }
    return one(cursor);
  }

  /** Reads a text that must end on its own line; keys may take no other form. */
  static String one(Cursor cursor) throws TomlFault {
    int line = cursor.line();
    int start = cursor.offset();
    int quote = cursor.next();
    cursor.skipPlain(quote);
    if (cursor.peek() == quote) {
      String plain = cursor.textSince(start + 1);
      cursor.next();
      return plain;
    }
    StringBuilder out = new StringBuilder(cursor.textSince(start + 1));
    while (cursor.peek() != quote) {
      if (cursor.atLineEnd()) {
        throw new TomlFault(
            line, cursor.shown(start), "a closing " + (char) quote + " on the same line");
      }
      append(cursor, quote == '"', out);
    }
    cursor.next();
    return out.toString();
  }

  private static String many(Cursor cursor, String fence, boolean escapes) throws TomlFault {
    int line = cursor.line();
    cursor.advance(3);
    if (cursor.atLineEnd()) {
      cursor.endLine();
    }
    StringBuilder out = new StringBuilder();
    while (!cursor.startsWith(fence)) {
      if (cursor.peek() == Cursor.END) {
        throw new TomlFault(line, "text that is never closed", "a closing " + fence);
      } else if (cursor.atLineEnd()) {
        out.append('\n');
        cursor.endLine();
      } else if (escapes && cursor.peek() == '\\' && endsLine(cursor)) {
        cursor.next();
        skipWhite(cursor);
      } else {
        append(cursor, escapes, out);
      }
    }
    cursor.advance(3);
    // up to two quotes may stand right before the fence and belong to the text
    for (int extra = 0; extra < 2 && cursor.peek() == fence.charAt(0); extra++) {
      out.append((char) cursor.next());
    }
    return out.toString();
  }

  /** Whether nothing but spaces follows the backslash on its line. */
  private static boolean endsLine(Cursor cursor) {
    int ahead = 1;
    while (cursor.peek(ahead) == ' ' || cursor.peek(ahead) == '\t') {
      ahead++;
    }
    int c = cursor.peek(ahead);
    return c == '\n' || (c == '\r' && cursor.peek(ahead + 1) == '\n');
  }

  private static void skipWhite(Cursor cursor) {
    while (cursor.peek() == ' ' || cursor.peek() == '\t') {
      cursor.next();
    }
    while (cursor.peek() != Cursor.END && cursor.atLineEnd()) {
      cursor.endLine();
      cursor.skipSpaces();
    }
  }

  private static void append(Cursor cursor, boolean escapes, StringBuilder out) throws TomlFault {
    int c = cursor.peek();
    if (escapes && c == '\\') {
      cursor.next();
      escape(cursor, out);
    } else {
      cursor.requirePrintable(c);
      out.append((char) cursor.next());
    }
  }

  private static void escape(Cursor cursor, StringBuilder out) throws TomlFault {
    int line = cursor.line();
    int c = cursor.next();
    switch (c) {
      case 'b' -> out.append('\b');
      case 't' -> out.append('\t');
      case 'n' -> out.append('\n');
      case 'f' -> out.append('\f');
      case 'r' -> out.append('\r');
      case '"' -> out.append('"');
      case '\\' -> out.append('\\');
      case 'u' -> out.appendCodePoint(codePoint(cursor, 4));
      case 'U' -> out.appendCodePoint(codePoint(cursor, 8));
      default ->
          throw new TomlFault(
              line,
              c == Cursor.END || c < ' ' ? "a lone backslash" : "\\" + (char) c,
              "\\\\ for a backslash, or single quotes around the text");
    }
  }

  private static int codePoint(Cursor cursor, int digits) throws TomlFault {
    int value = 0;
    for (int i = 0; i < digits; i++) {
      int digit = Character.digit(Math.max(cursor.peek(), 0), 16);
      // Character.digit also knows digits of other scripts
      if (digit < 0 || cursor.peek() > 'f') {
        throw new TomlFault(
            cursor.line(), "an unfinished \\u escape", digits + " hexadecimal digits");
      }
      value = (value << 4) | digit;
      cursor.next();
    }
    boolean surrogate = value >= Character.MIN_SURROGATE && value <= Character.MAX_SURROGATE;
    if (value < 0 || value > Character.MAX_CODE_POINT || surrogate) {
      throw new TomlFault(cursor.line(), "an escape outside Unicode", "a Unicode character");
    }
    return value;
  }

  /** The text itself, where quotes around it are probably all that is missing. */
  static Optional<String> lackingQuotes(String text) {
    boolean plain =
        text.chars().noneMatch(c -> Character.isISOControl(c) || "\"'=#\\\u2026".indexOf(c) >= 0);
    return plain && !text.isBlank() ? Optional.of(text) : Optional.empty();
  }

  /** Puts a text into double quotes, escaping what needs it. */
  static String write(String text) {
    StringBuilder out = new StringBuilder(text.length() + 2).append('"');
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '"' -> out.append("\\\"");
        case '\\' -> out.append("\\\\");
        case '\n' -> out.append("\\n");
        case '\r' -> out.append("\\r");
        case '\t' -> out.append("\\t");
        default -> {
          if (c < ' ' || c == 0x7F) {
            out.append(String.format(Locale.ROOT, "\\u%04X", (int) c));
          } else {
            out.append(c);
          }
        }
      }
    }
    return out.append('"').toString();
  }
}
