package perveance.files.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Validity;
import perveance.files.toml.KeyWords;
import perveance.files.toml.SourceText;
import perveance.files.toml.TomlEditor;
import perveance.files.toml.TomlEntry;
import perveance.files.toml.TomlTable;

/** Writes device files: a law into a file of evidence, or a whole file. */
public final class DeviceWriter {
  private DeviceWriter() {}

  /**
   * A device file with a fitted law; everything else in it stays as it was written.
   *
   * @param source the file as it is, with or without a law
   * @param law the law
   * @param fit how good it is
   * @param validity what its evidence covers
   * @return the new text
   * @throws IllegalArgumentException when the text has faults or the law has no form in a file
   */
  public static String update(SourceText source, DeviceLaw law, FitSummary fit, Validity validity) {
    TomlEditor editor = new TomlEditor(source, KeyWords.OF_THE_TRADE);
    put(editor, "law", LawText.law(law));
    put(editor, "fit", LawText.fit(fit));
    put(editor, "validity", LawText.validity(validity, law.kind()));
    return editor.result();
  }

  private static void put(TomlEditor editor, String name, Values values) {
    Optional<TomlTable> table = editor.root().table(name);
    Map<String, String> wanted = values.map();
    if (table.isEmpty()) {
      editor.addAbove(editor.block("[" + name + "]", wanted), Optional.empty());
      return;
    }
    List<String> order = new ArrayList<>(wanted.keySet());
    wanted.forEach((key, value) -> editor.set(table.get(), key, value, order));
    for (TomlEntry entry : table.get().entries()) {
      if (!wanted.containsKey(entry.key())) {
        editor.remove(table.get(), entry.key());
      }
    }
  }

  /**
   * The text of a new device file.
   *
   * @param sheet what is published or was measured
   * @param law the law
   * @param fit how good it is
   * @param validity what its evidence covers
   * @return the text
   * @throws IllegalArgumentException when the law has no form in a file
   */
  public static String fresh(DeviceSheet sheet, DeviceLaw law, FitSummary fit, Validity validity) {
    List<String> blocks = new ArrayList<>(SheetText.blocks(sheet));
    blocks.add(LawText.law(law).block("[law]"));
    blocks.add(LawText.fit(fit).block("[fit]"));
    blocks.add(LawText.validity(validity, law.kind()).block("[validity]"));
    return String.join("\n", blocks);
  }
}
