package perveance.files.toml;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A text cut into the blocks under its headers. A block takes with it the comment lines that touch
 * it; blank lines and comments that stand apart belong to the place between two blocks and stay
 * there when blocks come, go or change places.
 */
final class Layout {
  /** What a block consists of. */
  private sealed interface Content {}

  private record Existing(TomlTable table, int start, int end) implements Content {}

  private record Fresh(String text) implements Content {}

  private static final class Block {
    private String gapAbove;
    private Content content;

    Block(String gapAbove, Content content) {
      this.gapAbove = gapAbove;
      this.content = content;
    }
  }

  private final Lines lines;
  private final List<Block> blocks = new ArrayList<>();
  private String tail;

  Layout(String text, TomlTable root) {
    this.lines = new Lines(text);
    List<TomlTable> headed = new ArrayList<>();
    collect(root, headed);
    headed.sort(Comparator.comparingInt(table -> table.span().start()));
    int first = startOf(headed, 0);
    int at = root.entries().isEmpty() ? 0 : Math.min(contentEnd(root, 0), first);
    blocks.add(new Block("", new Existing(root, 0, at)));
    for (int i = 0; i < headed.size(); i++) {
      int start = startOf(headed, i);
      int end = Math.min(contentEnd(headed.get(i), start), startOf(headed, i + 1));
      blocks.add(new Block(text.substring(at, start), new Existing(headed.get(i), start, end)));
      at = end;
    }
    this.tail = text.substring(at);
  }

  private static void collect(TomlTable table, List<TomlTable> headed) {
    for (TomlEntry entry : table.entries()) {
      if (entry.value() instanceof TomlValue.Table below) {
        collectOne(below.table(), headed);
      } else if (entry.value() instanceof TomlValue.Tables below) {
        below.tables().forEach(one -> collectOne(one, headed));
      }
    }
  }

  private static void collectOne(TomlTable table, List<TomlTable> headed) {
    if (table.form() == TomlTable.Form.HEADER) {
      headed.add(table);
    }
    collect(table, headed);
  }

  private int startOf(List<TomlTable> headed, int index) {
    return index < headed.size()
        ? lines.withCommentsAbove(lines.start(headed.get(index).span().start()))
        : lines.text().length();
  }

  private int contentEnd(TomlTable table, int start) {
    int last = Math.max(lastOffset(table), start);
    return lines.withCommentsBelow(lines.next(last));
  }

  /** The last character of a table's own header and keys; tables with headers do not count. */
  private static int lastOffset(TomlTable table) {
    int last = table.form() == TomlTable.Form.HEADER ? table.span().end() - 1 : 0;
    for (TomlEntry entry : table.entries()) {
      TomlValue value = entry.value();
      if (value instanceof TomlValue.Table below) {
        boolean dotted = below.table().form() == TomlTable.Form.DOTTED;
        boolean braces = below.table().form() == TomlTable.Form.BRACES;
        if (dotted) {
          last = Math.max(last, lastOffset(below.table()));
        } else if (braces) {
          last = Math.max(last, value.span().end() - 1);
        }
      } else if (!(value instanceof TomlValue.Tables)) {
        last = Math.max(last, value.span().end() - 1);
      }
    }
    return last;
  }

  /** Whether a table has a block of its own. */
  boolean holds(TomlTable table) {
    return indexOf(table) >= 0;
  }

  private int indexOf(TomlTable table) {
    for (int i = 0; i < blocks.size(); i++) {
      if (blocks.get(i).content instanceof Existing existing && existing.table().equals(table)) {
        return i;
      }
    }
    return -1;
  }

  /** Takes a block out; comments that stood apart above it stay. */
  void remove(TomlTable table) {
    int index = indexOf(table);
    String gap = blocks.remove(index).gapAbove;
    String kept = gap.isBlank() ? "" : gap.stripTrailing() + lines.separator();
    if (index < blocks.size()) {
      Block next = blocks.get(index);
      // the first gap belongs to the top of the file, not to the block that is gone
      next.gapAbove = kept.isEmpty() && index == 1 ? gap : kept + next.gapAbove;
    } else {
      tail = kept + tail;
    }
  }

  /** Puts new text, whole lines, behind a table's block. */
  void insertBelow(TomlTable table, String text) {
    insert(indexOf(table) + 1, text);
  }

  /** Puts new text, whole lines, above a table's block. */
  void insertAbove(TomlTable table, String text) {
    int index = indexOf(table);
    blocks.add(index, new Block(blocks.get(index).gapAbove, new Fresh(text)));
    blocks.get(index + 1).gapAbove = lines.separator();
  }

  /** Puts new text, whole lines, behind everything. */
  void append(String text) {
    String apart = tail.isBlank() ? "" : tail.stripTrailing() + lines.separator();
    tail = "";
    insert(blocks.size(), text);
    Block added = blocks.get(blocks.size() - 1);
    added.gapAbove = apart + added.gapAbove;
  }

  private void insert(int index, String text) {
    blocks.add(index, new Block(lines.separator(), new Fresh(text)));
  }

  /** Gives the places of these tables' blocks to the same tables in another order. */
  void permute(List<TomlTable> inNewOrder) {
    List<Integer> places = new ArrayList<>();
    List<Content> contents = new ArrayList<>();
    for (TomlTable table : inNewOrder) {
      int index = indexOf(table);
      places.add(index);
      contents.add(blocks.get(index).content);
    }
    places.sort(Comparator.naturalOrder());
    for (int i = 0; i < places.size(); i++) {
      blocks.get(places.get(i)).content = contents.get(i);
    }
  }

  /** The text with all changes. */
  String result(TextEdits edits) {
    StringBuilder out = new StringBuilder();
    for (Block block : blocks) {
      if (!block.gapAbove.isEmpty() || block.content instanceof Fresh) {
        endLine(out);
      }
      out.append(block.gapAbove);
      if (block.content instanceof Existing existing) {
        String text = edits.apply(existing.start(), existing.end());
        if (!text.isEmpty()) {
          endLine(out);
        }
        out.append(text);
      } else if (block.content instanceof Fresh fresh) {
        out.append(fresh.text());
      }
    }
    return out.append(tail).toString();
  }

  private void endLine(StringBuilder out) {
    if (!out.isEmpty() && out.charAt(out.length() - 1) != '\n') {
      out.append(lines.separator());
    }
  }
}
