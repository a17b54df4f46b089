package perveance.files.toml;

import java.util.ArrayList;
import java.util.List;

/** Reads the value behind an equals sign. */
final class ValueReader {
  /** Our files nest twice; a limit keeps a hostile file from exhausting the stack. */
  private static final int DEEPEST = 32;

  private final Cursor cursor;
  private final Problems problems;
  private final KeyWords words;

  ValueReader(Cursor cursor, Problems problems, KeyWords words) {
    this.cursor = cursor;
    this.problems = problems;
    this.words = words;
  }

  /** Reads the value at the cursor; braces make a table below the given one. */
  TomlValue read(TomlTable parent, String key, int depth) throws TomlFault {
    if (depth > DEEPEST) {
      throw new TomlFault(cursor.line(), "lists or tables nested too deep", "at most " + DEEPEST);
    }
    int start = cursor.offset();
    int line = cursor.line();
    switch (cursor.peek()) {
      case '"', '\'':
        String text = QuotedText.read(cursor);
        return new TomlValue.Text(text, cursor.since(start, line));
      case '[':
        List<TomlValue> values = items(parent, key, depth);
        return new TomlValue.Items(values, cursor.since(start, line));
      case '{':
        return braces(parent, key, depth);
      default:
        return BareValue.read(cursor);
    }
  }

  private List<TomlValue> items(TomlTable parent, String key, int depth) throws TomlFault {
    int line = cursor.line();
    cursor.next();
    List<TomlValue> values = new ArrayList<>();
    while (true) {
      cursor.skipBlank();
      if (cursor.peek() == ']') {
        cursor.next();
        return values;
      }
      requireMore(line, "a closing ]");
      values.add(read(parent, key, depth + 1));
      cursor.skipBlank();
      if (cursor.peek() == ',') {
        cursor.next();
      } else if (cursor.peek() != ']') {
        requireMore(line, "a closing ]");
        throw new TomlFault(cursor.line(), cursor.restOfLine(), "a comma or a closing ]");
      }
    }
  }

  private TomlValue braces(TomlTable parent, String key, int depth) throws TomlFault {
    int start = cursor.offset();
    int line = cursor.line();
    cursor.next();
    TomlTable table = parent.child(key, TomlTable.Form.BRACES, new Span(start, start, line));
    cursor.skipSpaces();
    boolean first = true;
    while (cursor.peek() != '}') {
      if (!first) {
        if (cursor.peek() != ',') {
          throw new TomlFault(
              cursor.line(), shownOrLineEnd(), "a comma or a closing } on the same line");
        }
        cursor.next();
        cursor.skipSpaces();
      }
      if (cursor.atLineEnd()) {
        throw new TomlFault(cursor.line(), "the end of the line", "a key or a closing }");
      }
      new KeyValueReader(cursor, problems, words).read(table, depth + 1);
      cursor.skipSpaces();
      first = false;
    }
    cursor.next();
    table.close(cursor.since(start, line));
    return new TomlValue.Table(table);
  }

  private String shownOrLineEnd() {
    return cursor.atLineEnd() ? "the end of the line" : cursor.restOfLine();
  }

  private void requireMore(int line, String expected) throws TomlFault {
    if (cursor.peek() == Cursor.END) {
      throw new TomlFault(line, "a list that is never closed", expected);
    }
  }
}
