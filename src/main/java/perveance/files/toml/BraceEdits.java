package perveance.files.toml;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Changes of keys within braces, gathered per table because what becomes of a comma depends on all
 * of them.
 */
final class BraceEdits {
  private static final class Change {
    private final List<TomlEntry> removed = new ArrayList<>();
    private final List<String> added = new ArrayList<>();
  }

  private final Map<TomlTable, Change> changes = new LinkedHashMap<>();

  void add(TomlTable table, String pair) {
    changes.computeIfAbsent(table, t -> new Change()).added.add(pair);
  }

  void remove(TomlTable table, TomlEntry entry) {
    changes.computeIfAbsent(table, t -> new Change()).removed.add(entry);
  }

  void applyTo(TextEdits edits) {
    changes.forEach((table, change) -> apply(table, change, edits));
    changes.clear();
  }

  private static void apply(TomlTable table, Change change, TextEdits edits) {
    List<TomlEntry> all = new ArrayList<>(table.entries());
    String added = String.join(", ", change.added);
    if (all.isEmpty()) {
      edits.insert(table.span().start() + 1, " " + added + " ");
      return;
    }
    int end = all.get(all.size() - 1).value().span().end();
    if (change.removed.containsAll(all)) {
      edits.replace(all.get(0).keySpan().start(), end, added);
      return;
    }
    boolean stays = false;
    for (int i = 0; i < all.size(); i++) {
      TomlEntry entry = all.get(i);
      if (!change.removed.contains(entry)) {
        stays = true;
      } else if (stays) {
        edits.replace(all.get(i - 1).value().span().end(), entry.value().span().end(), "");
      } else {
        edits.replace(entry.keySpan().start(), all.get(i + 1).keySpan().start(), "");
      }
    }
    if (!added.isEmpty()) {
      edits.insert(end, ", " + added);
    }
  }
}
