package perveance.files.toml;

import java.util.List;

/**
 * Reads TOML 1.0 without dates. Faults are gathered and reading goes on with the next line, so that
 * a person sees all of them at once; what could be read is returned all the same, and the keys
 * whose values could not are marked so that nothing further complains of them.
 */
public final class TomlParser {
  private final Cursor cursor;
  private final Problems problems;
  private final KeyWords words;
  private final TomlTable root;
  private final Structure structure;

  private TomlParser(SourceText source, Problems problems, KeyWords words) {
    this.cursor = new Cursor(source.text());
    this.problems = problems;
    this.words = words.in(source.text());
    this.root = new TomlTable("", TomlTable.Form.ROOT, new Span(0, 0, 1));
    this.structure = new Structure(root);
  }

  /**
   * Reads a text.
   *
   * @param source the text
   * @param problems receives the faults
   * @return what could be read
   */
  public static TomlTable parse(SourceText source, Problems problems) {
    return parse(source, problems, KeyWords.AS_WRITTEN);
  }

  /**
   * Reads a text whose keys may be written in several words.
   *
   * @param source the text
   * @param problems receives the faults
   * @param words other words for those in keys
   * @return what could be read, each key under its one name
   */
  public static TomlTable parse(SourceText source, Problems problems, KeyWords words) {
    return new TomlParser(source, problems, words).parse();
  }

  private TomlTable parse() {
    TomlTable table = root;
    while (cursor.peek() != Cursor.END) {
      int line = cursor.line();
      try {
        cursor.skipBlank();
        line = cursor.line();
        if (cursor.peek() == '[') {
          // keys under a header that cannot be read belong nowhere
          table = new TomlTable("", TomlTable.Form.HEADER, new Span(0, 0, line));
          table = header();
        } else if (cursor.peek() != Cursor.END) {
          new KeyValueReader(cursor, problems, words).read(table, 0);
        }
      } catch (TomlFault fault) {
        problems.add(fault.line(), "", fault.found(), fault.expected(), fault.suggestion());
        recover(line);
      }
    }
    return root;
  }

  private TomlTable header() throws TomlFault {
    try {
      return readHeader();
    } catch (TomlFault fault) {
      root.damage();
      throw fault;
    }
  }

  private TomlTable readHeader() throws TomlFault {
    int start = cursor.offset();
    int line = cursor.line();
    boolean repeated = cursor.peek(1) == '[';
    cursor.advance(repeated ? 2 : 1);
    List<String> parts = KeyReader.read(cursor);
    cursor.skipSpaces();
    String close = repeated ? "]]" : "]";
    if (!cursor.startsWith(close)) {
      throw new TomlFault(line, cursor.shown(start), "a closing " + close);
    }
    cursor.advance(close.length());
    Span span = cursor.since(start, line);
    cursor.skipSpacesAndComment();
    if (!cursor.atLineEnd()) {
      throw new TomlFault(line, cursor.restOfLine(), "the end of the line behind the header");
    }
    return repeated ? structure.append(parts, span) : structure.open(parts, span);
  }

  /** Goes to the next line that begins something, so that one fault is not told twice. */
  private void recover(int faultyLine) {
    if (cursor.line() == faultyLine) {
      cursor.skipLine();
    } else {
      // a list that was not closed has run into this line, which may begin something itself
      cursor.backToLineStart();
    }
    while (cursor.peek() != Cursor.END && !beginsSomething()) {
      cursor.skipLine();
    }
  }

  private boolean beginsSomething() {
    int ahead = skipSpaces(0);
    int c = cursor.peek(ahead);
    if (c == '\n' || c == '\r' || c == '#') {
      return true;
    }
    if (c == '[') {
      int inner = cursor.peek(ahead + 1);
      return inner == '[' || Character.isLetter(Math.max(inner, 0));
    }
    int start = ahead;
    while (isKeyPart(cursor.peek(ahead))) {
      ahead++;
    }
    return ahead > start && cursor.peek(skipSpaces(ahead)) == '=';
  }

  private int skipSpaces(int from) {
    int ahead = from;
    while (cursor.peek(ahead) == ' ' || cursor.peek(ahead) == '\t') {
      ahead++;
    }
    return ahead;
  }

  private static boolean isKeyPart(int c) {
    return c == '_'
        || c == '-'
        || c == '.'
        || (c < 0x80 && Character.isLetterOrDigit(Math.max(c, 0)));
  }
}
