package perveance.files.chassis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.files.toml.BlockWanted;
import perveance.files.toml.TomlEditor;
import perveance.files.toml.TomlTable;
import perveance.files.toml.TomlText;

/** Writes the changes of stages. */
final class StagesWriter {
  private StagesWriter() {}

  static void write(TomlEditor editor, List<StageEntry> before, List<StageEntry> after) {
    if (before.equals(after)) {
      return;
    }
    List<TomlTable> tables = editor.root().tables("stage");
    Map<Integer, Integer> pairs = Pairing.of(before, after, StageEntry::ref);
    List<BlockWanted> wanted = new ArrayList<>();
    for (int i = 0; i < after.size(); i++) {
      StageEntry now = after.get(i);
      Integer old = pairs.get(i);
      if (old == null) {
        wanted.add(new BlockWanted.New(editor.block("[[stage]]", values(now))));
      } else {
        change(editor, tables.get(old), before.get(old), now);
        wanted.add(new BlockWanted.Kept(tables.get(old)));
      }
    }
    editor.arrange(tables, wanted);
  }

  private static Map<String, String> values(StageEntry stage) {
    Map<String, String> values = new LinkedHashMap<>();
    values.put("ref", TomlText.text(stage.ref()));
    values.put("kind", TomlText.text(stage.kind()));
    stage.settings().forEach((key, setting) -> values.put(key, text(setting)));
    return values;
  }

  private static void change(TomlEditor editor, TomlTable table, StageEntry old, StageEntry now) {
    List<String> order = order(now.kind());
    if (!old.ref().equals(now.ref())) {
      editor.set(table, "ref", TomlText.text(now.ref()), order);
    }
    if (!old.kind().equals(now.kind())) {
      editor.set(table, "kind", TomlText.text(now.kind()), order);
    }
    // in the usual order, so that several new keys that share a neighbour come out in it
    List<String> keys = new ArrayList<>(now.settings().keySet());
    keys.sort((a, b) -> Integer.compare(order.indexOf(a), order.indexOf(b)));
    for (String key : keys) {
      Setting setting = now.settings().get(key);
      if (setting != null && !setting.equals(old.settings().get(key))) {
        editor.set(table, key, text(setting), order);
      }
    }
    for (String key : old.settings().keySet()) {
      if (!now.settings().containsKey(key)) {
        editor.remove(table, key);
      }
    }
  }

  private static List<String> order(String kind) {
    List<String> order = new ArrayList<>(List.of("ref", "kind"));
    StageKinds.find(kind).map(StageKind::keys).orElse(List.of()).stream()
        .map(KeySpec::key)
        .forEach(order::add);
    return order;
  }

  private static String text(Setting setting) {
    return setting instanceof Setting.Flag flag ? flag.text() : TomlText.text(setting.text());
  }
}
