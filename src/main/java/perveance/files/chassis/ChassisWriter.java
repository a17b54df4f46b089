package perveance.files.chassis;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.files.toml.KeyWords;
import perveance.files.toml.SourceText;
import perveance.files.toml.TomlEditor;
import perveance.files.toml.TomlTable;
import perveance.files.toml.TomlText;

/**
 * Writes a chassis into the text it came from: what has not changed stays as the person wrote it,
 * with comments, order, blank lines and spelling of values.
 */
public final class ChassisWriter {
  private static final List<String> ORDER = List.of("perveance", "title");

  private static final String EMPTY = "perveance = " + ChassisReader.VERSION + "\n";

  private ChassisWriter() {}

  /**
   * The text of a chassis that has no file yet.
   *
   * @param chassis the chassis
   * @return its text
   */
  public static String fresh(Chassis chassis) {
    Chassis nothing = new Chassis("", Conditions.USUAL, List.of(), List.of());
    return update(SourceText.of("new", EMPTY), nothing, chassis);
  }

  /**
   * The text of a changed chassis.
   *
   * @param source the text that the chassis before was read from
   * @param before the chassis that stands in the text
   * @param after the chassis that shall stand in it
   * @return the new text
   */
  public static String update(SourceText source, Chassis before, Chassis after) {
    TomlEditor editor = new TomlEditor(source, KeyWords.OF_THE_TRADE);
    if (!before.title().equals(after.title())) {
      editor.set(editor.root(), "title", TomlText.text(after.title()), ORDER);
    }
    writeConditions(editor, before.conditions(), after.conditions());
    SuppliesWriter.write(editor, before.supplies(), after.supplies());
    StagesWriter.write(editor, before.stages(), after.stages());
    return editor.result();
  }

  private static void writeConditions(TomlEditor editor, Conditions before, Conditions after) {
    Optional<TomlTable> table = editor.root().table("conditions");
    var added = new java.util.LinkedHashMap<String, String>();
    for (ConditionKey key : ConditionKey.values()) {
      OptionalDouble value = key.of(after);
      boolean there = table.isPresent() && table.get().find(key.key()).isPresent();
      OptionalDouble silent = there ? key.of(before) : key.usual(after);
      if (value.isPresent() && !value.equals(silent)) {
        added.put(key.key(), SupplyText.quantity(value.getAsDouble(), key.range().unit()));
      }
    }
    if (table.isPresent()) {
      added.forEach((key, text) -> editor.set(table.get(), key, text, ConditionKey.order()));
    } else if (!added.isEmpty()) {
      editor.addAbove(editor.block("[conditions]", added), firstBlock(editor.root()));
    }
  }

  private static Optional<TomlTable> firstBlock(TomlTable root) {
    return SuppliesWriter.headed(root).stream()
        .findFirst()
        .or(() -> root.tables("stage").stream().findFirst());
  }
}
