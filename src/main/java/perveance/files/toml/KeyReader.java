package perveance.files.toml;

import java.util.ArrayList;
import java.util.List;

/** Reads keys: bare, quoted, dotted. */
final class KeyReader {
  private static final int MOST_PARTS = 16;

  private KeyReader() {}

  /** Reads the parts of a key and stops behind it. */
  static List<String> read(Cursor cursor) throws TomlFault {
    List<String> parts = new ArrayList<>(2);
    while (true) {
      cursor.skipSpaces();
      parts.add(part(cursor));
      if (parts.size() > MOST_PARTS) {
        throw new TomlFault(cursor.line(), "a key of too many parts", "at most " + MOST_PARTS);
      }
      int ahead = 0;
      while (cursor.peek(ahead) == ' ' || cursor.peek(ahead) == '\t') {
        ahead++;
      }
      if (cursor.peek(ahead) != '.') {
        return parts;
      }
      cursor.advance(ahead + 1);
    }
  }

  private static String part(Cursor cursor) throws TomlFault {
    int c = cursor.peek();
    if (c == '"' || c == '\'') {
      return QuotedText.one(cursor);
    }
    int start = cursor.offset();
    cursor.skipBareKey();
    if (cursor.offset() == start) {
      String found = cursor.atLineEnd() ? "nothing" : cursor.restOfLine();
      throw new TomlFault(cursor.line(), found, "a key of letters, digits, - and _");
    }
    return cursor.textSince(start);
  }

  /** Writes a key as it must stand in a file. */
  static String write(String key) {
    for (int i = 0; i < key.length(); i++) {
      if (!Cursor.isBareKey(key.charAt(i))) {
        return QuotedText.write(key);
      }
    }
    return key.isEmpty() ? "\"\"" : key;
  }
}
