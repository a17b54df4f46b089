package perveance.files.toml;

import java.util.List;
import java.util.Optional;

/** Reads {@code key = value} into a table. */
final class KeyValueReader {
  private final Cursor cursor;
  private final Problems problems;
  private final KeyWords words;
  private int keyEnd;

  KeyValueReader(Cursor cursor, Problems problems, KeyWords words) {
    this.cursor = cursor;
    this.problems = problems;
    this.words = words;
  }

  /** Reads the pair at the cursor; a value that cannot be read still takes its key's place. */
  void read(TomlTable table, int depth) throws TomlFault {
    int start = cursor.offset();
    int line = cursor.line();
    List<String> parts;
    TomlTable owner;
    try {
      parts = readKey(start, line);
      owner = owner(table, parts, cursor.since(start, line));
    } catch (TomlFault fault) {
      table.damage();
      throw fault;
    }
    Span keySpan = new Span(start, keyEnd, line);
    String key = parts.get(parts.size() - 1);
    try {
      TomlValue value = new ValueReader(cursor, problems, words).read(owner, key, depth);
      if (table.form() != TomlTable.Form.BRACES) {
        requireLineEnd(value);
      }
      boolean named = value instanceof TomlValue.Table;
      put(owner, new TomlEntry(named ? key : words.plain(key), keySpan, value));
    } catch (TomlFault fault) {
      put(owner, new TomlEntry(words.plain(key), keySpan, new TomlValue.Unreadable(keySpan)));
      throw fault;
    }
  }

  /** Reads the key and steps over the equals sign. */
  private List<String> readKey(int start, int line) throws TomlFault {
    List<String> parts = KeyReader.read(cursor);
    keyEnd = cursor.offset();
    cursor.skipSpaces();
    if (cursor.peek() != '=') {
      String found = cursor.atLineEnd() ? cursor.shown(start) : cursor.restOfLine();
      throw new TomlFault(line, found, "an equals sign behind the key");
    }
    cursor.next();
    cursor.skipSpaces();
    return parts;
  }

  private void requireLineEnd(TomlValue value) throws TomlFault {
    cursor.skipSpacesAndComment();
    if (cursor.atLineEnd()) {
      return;
    }
    boolean bare =
        !(value instanceof TomlValue.Text
            || value instanceof TomlValue.Items
            || value instanceof TomlValue.Table);
    String found = bare ? cursor.shown(value.span().start()) : cursor.restOfLine();
    throw bare
        ? new TomlFault(cursor.line(), found, "text in quotes", QuotedText.lackingQuotes(found))
        : new TomlFault(cursor.line(), found, "the end of the line behind the value");
  }

  /** The table that a dotted key writes into, made where it is missing. */
  private TomlTable owner(TomlTable table, List<String> parts, Span keySpan) throws TomlFault {
    TomlTable at = table;
    for (String part : parts.subList(0, parts.size() - 1)) {
      Optional<TomlEntry> existing = at.find(part);
      if (existing.isEmpty()) {
        TomlTable made = at.child(part, TomlTable.Form.DOTTED, keySpan);
        at.put(new TomlEntry(part, keySpan, new TomlValue.Table(made)));
        at = made;
      } else if (existing.get().value() instanceof TomlValue.Table below
          && below.table().form() == TomlTable.Form.DOTTED) {
        at = below.table();
      } else {
        throw Structure.repeated(part, existing.get(), keySpan.line());
      }
    }
    return at;
  }

  private void put(TomlTable owner, TomlEntry entry) {
    Optional<TomlEntry> earlier = owner.find(entry.key());
    if (earlier.isPresent()) {
      TomlFault fault = Structure.repeated(entry.key(), earlier.get(), entry.line());
      problems.add(
          entry.line(),
          Cursor.shorten(fullName(owner, entry.key())),
          fault.found(),
          fault.expected());
    } else {
      owner.put(entry);
    }
  }

  private static String fullName(TomlTable owner, String key) {
    return owner.name().isEmpty() ? key : owner.name() + "." + key;
  }
}
