package perveance.files.toml;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Finds the place for a key that a table does not have yet, next to its usual neighbours. */
final class KeyInsertion {
  private final SourceText source;
  private final Lines lines;
  private final TextEdits edits;
  private final BraceEdits braces;

  KeyInsertion(SourceText source, Lines lines, TextEdits edits, BraceEdits braces) {
    this.source = source;
    this.lines = lines;
    this.edits = edits;
    this.braces = braces;
  }

  void add(TomlTable table, String key, String value, List<String> order) {
    String pair = KeyReader.write(key) + " = " + value;
    switch (table.form()) {
      case BRACES -> braces.add(table, pair);
      case DOTTED -> {
        TomlEntry sibling = last(table);
        addBelow(sibling, prefix(sibling) + pair);
      }
      case IMPLIED -> throw new IllegalArgumentException("table has no header: " + table.name());
      default -> addLine(table, key, pair, order);
    }
  }

  private void addLine(TomlTable table, String key, String pair, List<String> order) {
    int place = order.indexOf(key);
    for (int i = place - 1; i >= 0; i--) {
      Optional<TomlEntry> before = table.find(order.get(i));
      if (before.isPresent() && hasLine(before.get())) {
        addBelow(before.get(), pair);
        return;
      }
    }
    for (int i = Math.max(place, 0) + 1; place >= 0 && i < order.size(); i++) {
      Optional<TomlEntry> after = table.find(order.get(i));
      if (after.isPresent() && hasLine(after.get())) {
        addAbove(after.get(), pair);
        return;
      }
    }
    List<TomlEntry> own = table.entries().stream().filter(KeyInsertion::hasLine).toList();
    if (!own.isEmpty()) {
      addBelow(own.get(own.size() - 1), pair);
    } else if (table.form() == TomlTable.Form.HEADER) {
      insertLine(lines.next(table.span().end() - 1), pair);
    } else {
      edits.insert(0, pair + lines.separator());
    }
  }

  /** Tables with headers of their own stand elsewhere; a key below them would be theirs. */
  private static boolean hasLine(TomlEntry entry) {
    if (entry.value() instanceof TomlValue.Tables) {
      return false;
    }
    return !(entry.value() instanceof TomlValue.Table below)
        || below.table().form() == TomlTable.Form.BRACES;
  }

  private void addBelow(TomlEntry entry, String pair) {
    String indent = lines.indent(entry.keySpan().start());
    insertLine(lines.next(entry.value().span().end() - 1), indent + pair);
  }

  private void addAbove(TomlEntry entry, String pair) {
    int start = lines.start(entry.keySpan().start());
    String indent = lines.indent(entry.keySpan().start());
    edits.insert(lines.withCommentsAbove(start), indent + pair + lines.separator());
  }

  private void insertLine(int at, String line) {
    boolean unfinished = at == source.text().length() && !source.text().endsWith("\n");
    edits.insert(at, unfinished ? lines.separator() + line : line + lines.separator());
  }

  private static TomlEntry last(TomlTable table) {
    List<TomlEntry> all = new ArrayList<>(table.entries());
    return all.get(all.size() - 1);
  }

  /** What stands before the last part of a dotted key. */
  private String prefix(TomlEntry entry) {
    String whole = source.slice(entry.keySpan());
    int dot = whole.lastIndexOf('.');
    while (dot >= 0 && !isKey(whole.substring(dot + 1), entry.key())) {
      dot = whole.lastIndexOf('.', dot - 1);
    }
    return whole.substring(0, dot + 1);
  }

  private static boolean isKey(String text, String key) {
    try {
      Cursor cursor = new Cursor(text);
      return KeyReader.read(cursor).equals(List.of(key)) && cursor.peek() == Cursor.END;
    } catch (TomlFault fault) {
      return false;
    }
  }
}
