package perveance.files.toml;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Changes a TOML text at known places and leaves everything else as the person wrote it: comments,
 * order, blank lines, alignment, line ends. Comment lines are never removed unless the block they
 * touch is; a comment behind a value goes when its key goes.
 */
public final class TomlEditor {
  private final SourceText source;
  private final TomlTable root;
  private final Lines lines;
  private final TextEdits edits;
  private final BraceEdits braces = new BraceEdits();
  private final Layout layout;

  /**
   * Starts to edit a text.
   *
   * @param source a text without faults
   * @param words other words for those in keys
   * @throws IllegalArgumentException when the text has faults
   */
  public TomlEditor(SourceText source, KeyWords words) {
    Problems problems = new Problems(source.file());
    this.source = source;
    this.root = TomlParser.parse(source, problems, words);
    if (!problems.isEmpty()) {
      throw new IllegalArgumentException("source has faults: " + problems.list().get(0).message());
    }
    this.lines = new Lines(source.text());
    this.edits = new TextEdits(source.text());
    this.layout = new Layout(source.text(), root);
  }

  /**
   * The file as it was at first; edits do not show here.
   *
   * @return the root table
   */
  public TomlTable root() {
    return root;
  }

  /**
   * Gives a key a value.
   *
   * @param table the table
   * @param key the key; it must not name a table
   * @param value the value as it stands in a file, see {@link TomlText}
   * @param order the usual order of keys in such a table, for a key that is new
   */
  public void set(TomlTable table, String key, String value, List<String> order) {
    Optional<TomlEntry> entry = table.find(key);
    if (entry.isPresent()) {
      Span span = entry.get().value().span();
      if (!source.slice(span).equals(value)) {
        edits.replace(span.start(), span.end(), value);
      }
    } else {
      new KeyInsertion(source, lines, edits, braces).add(table, key, value, order);
    }
  }

  /**
   * Gives a table another header.
   *
   * @param table a table with a header of its own
   * @param header the header with its brackets
   */
  public void rename(TomlTable table, String header) {
    edits.replace(table.span().start(), table.span().end(), header);
  }

  /**
   * Takes a key out, with the comment behind its value.
   *
   * @param table the table
   * @param key the key
   */
  public void remove(TomlTable table, String key) {
    Optional<TomlEntry> entry = table.find(key);
    if (entry.isPresent()) {
      removeEntry(table, entry.get());
    }
  }

  private void removeEntry(TomlTable table, TomlEntry entry) {
    if (entry.value() instanceof TomlValue.Table below) {
      removeTable(table, entry, below.table());
    } else if (table.form() == TomlTable.Form.BRACES) {
      braces.remove(table, entry);
    } else {
      removeLines(entry);
    }
  }

  private void removeTable(TomlTable table, TomlEntry entry, TomlTable below) {
    switch (below.form()) {
      case HEADER -> layout.remove(below);
      case DOTTED -> List.copyOf(below.entries()).forEach(one -> removeEntry(below, one));
      case BRACES -> {
        if (table.form() == TomlTable.Form.BRACES) {
          braces.remove(table, entry);
        } else {
          removeLines(entry);
        }
      }
      default ->
          throw new IllegalArgumentException("table has no place of its own: " + below.name());
    }
  }

  private void removeLines(TomlEntry entry) {
    int start = lines.start(entry.keySpan().start());
    edits.replace(start, lines.next(entry.value().span().end() - 1), "");
  }

  /**
   * Puts the blocks of a family in order, takes out those that are not named, and adds new ones.
   *
   * @param family the tables of one kind that have headers, in the order of the file
   * @param wanted the tables that stay and, between them, texts of new blocks made by {@link
   *     #block}
   */
  public void arrange(List<TomlTable> family, List<BlockWanted> wanted) {
    List<TomlTable> kept = new ArrayList<>();
    for (BlockWanted one : wanted) {
      if (one instanceof BlockWanted.Kept table) {
        kept.add(table.table());
      }
    }
    addNew(family, wanted);
    for (TomlTable table : family) {
      if (!kept.contains(table)) {
        layout.remove(table);
      }
    }
    layout.permute(kept);
  }

  /** New blocks go by the place their neighbour above will have, so before anything moves. */
  private void addNew(List<TomlTable> family, List<BlockWanted> wanted) {
    List<TomlTable> places = new ArrayList<>();
    for (TomlTable table : family) {
      if (wanted.contains(new BlockWanted.Kept(table))) {
        places.add(table);
      }
    }
    int kept = 0;
    List<String> waiting = new ArrayList<>();
    for (BlockWanted one : wanted) {
      if (one instanceof BlockWanted.Kept) {
        flush(family, places, kept, waiting);
        kept++;
      } else if (one instanceof BlockWanted.New fresh) {
        waiting.add(fresh.text());
      }
    }
    flush(family, places, kept, waiting);
  }

  /** Puts waiting blocks behind the last of the places used, or above the first. */
  private void flush(
      List<TomlTable> family, List<TomlTable> places, int used, List<String> waiting) {
    if (used == 0) {
      for (String text : waiting) {
        if (!places.isEmpty()) {
          layout.insertAbove(places.get(0), text);
        } else if (!family.isEmpty()) {
          layout.insertAbove(family.get(0), text);
        } else {
          layout.append(text);
        }
      }
    } else {
      for (int i = waiting.size() - 1; i >= 0; i--) {
        layout.insertBelow(places.get(used - 1), waiting.get(i));
      }
    }
    waiting.clear();
  }

  /**
   * Adds a block above another one, or at the end of the file.
   *
   * @param text the block, made by {@link #block}
   * @param neighbour a table with a header, or empty for the end of the file
   */
  public void addAbove(String text, Optional<TomlTable> neighbour) {
    if (neighbour.isPresent() && layout.holds(neighbour.get())) {
      layout.insertAbove(neighbour.get(), text);
    } else {
      layout.append(text);
    }
  }

  /**
   * The text of a new block, with this file's line ends.
   *
   * @param header the header with its brackets
   * @param values values as they stand in a file, by key, in order
   * @return whole lines
   */
  public String block(String header, Map<String, String> values) {
    return TomlText.block(header, values, lines.separator());
  }

  /**
   * The text with all edits.
   *
   * @return the new text
   */
  public String result() {
    braces.applyTo(edits);
    return layout.result(edits);
  }
}
