package perveance.files.chassis;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.stage.Supply;
import perveance.files.toml.BlockWanted;
import perveance.files.toml.TomlEditor;
import perveance.files.toml.TomlTable;
import perveance.files.toml.TomlValue;

/** Writes the changes of supply nodes. */
final class SuppliesWriter {
  private final TomlEditor editor;
  private final List<Supply> before;
  private final Optional<TomlTable> all;

  private SuppliesWriter(TomlEditor editor, List<Supply> before) {
    this.editor = editor;
    this.before = before;
    this.all = editor.root().table("supply");
  }

  static void write(TomlEditor editor, List<Supply> before, List<Supply> after) {
    if (!before.equals(after)) {
      new SuppliesWriter(editor, before).write(after);
    }
  }

  /** The tables of supply nodes that have headers of their own, in the order of the file. */
  static List<TomlTable> headed(TomlTable root) {
    List<TomlTable> headed = new ArrayList<>();
    for (var entry : root.table("supply").map(TomlTable::entries).orElse(List.of())) {
      if (entry.value() instanceof TomlValue.Table one
          && one.table().form() == TomlTable.Form.HEADER) {
        headed.add(one.table());
      }
    }
    return headed;
  }

  private void write(List<Supply> after) {
    List<TomlTable> headed = headed(editor.root());
    Map<Integer, Integer> pairs = Pairing.of(before, after, Supply::name);
    List<BlockWanted> wanted = new ArrayList<>();
    Set<TomlTable> kept = new HashSet<>();
    for (int i = 0; i < after.size(); i++) {
      Integer index = pairs.get(i);
      Optional<Supply> old = index == null ? Optional.empty() : Optional.of(before.get(index));
      Optional<TomlTable> table = tableFor(old, after.get(i), headed);
      if (old.isEmpty() || table.isEmpty()) {
        add(after.get(i), headed, wanted);
        continue;
      }
      kept.add(table.get());
      change(table.get(), old.get(), after.get(i));
      if (headed.contains(table.get())) {
        wanted.add(new BlockWanted.Kept(table.get()));
      }
    }
    removeOthers(headed, kept);
    arrange(headed, wanted);
  }

  /** The table to keep for a node; a node without header cannot be renamed in place. */
  private Optional<TomlTable> tableFor(Optional<Supply> old, Supply now, List<TomlTable> headed) {
    if (old.isEmpty()) {
      return Optional.empty();
    }
    String name = old.get().name();
    return all.flatMap(supply -> supply.table(name))
        .filter(table -> headed.contains(table) || name.equals(now.name()));
  }

  private void add(Supply supply, List<TomlTable> headed, List<BlockWanted> wanted) {
    boolean ownForm = all.isPresent() && all.get().form() != TomlTable.Form.IMPLIED;
    if (ownForm && headed.isEmpty()) {
      editor.set(all.get(), supply.name(), SupplyText.braces(supply), List.of());
    } else {
      String header = SupplyText.header(supply.name());
      wanted.add(new BlockWanted.New(editor.block(header, SupplyText.values(supply))));
    }
  }

  private void change(TomlTable table, Supply old, Supply now) {
    if (!old.name().equals(now.name())) {
      editor.rename(table, SupplyText.header(now.name()));
    }
    Map<String, String> oldValues = SupplyText.values(old);
    Map<String, String> newValues = SupplyText.values(now);
    newValues.forEach(
        (key, value) -> {
          if (!value.equals(oldValues.get(key))) {
            editor.set(table, key, value, SupplyReader.ORDER);
          }
        });
    for (String key : oldValues.keySet()) {
      if (!newValues.containsKey(key)) {
        editor.remove(table, key);
      }
    }
  }

  private void removeOthers(List<TomlTable> headed, Set<TomlTable> kept) {
    for (Supply old : before) {
      Optional<TomlTable> table = all.flatMap(supply -> supply.table(old.name()));
      if (table.isPresent() && !kept.contains(table.get()) && !headed.contains(table.get())) {
        editor.remove(all.orElseThrow(), old.name());
      }
    }
  }

  private void arrange(List<TomlTable> headed, List<BlockWanted> wanted) {
    if (!headed.isEmpty()) {
      editor.arrange(headed, wanted);
      return;
    }
    Optional<TomlTable> firstStage = editor.root().tables("stage").stream().findFirst();
    for (BlockWanted one : wanted) {
      if (one instanceof BlockWanted.New fresh) {
        editor.addAbove(fresh.text(), firstStage);
      }
    }
  }
}
