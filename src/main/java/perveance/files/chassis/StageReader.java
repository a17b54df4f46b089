package perveance.files.chassis;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageKind;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.Problems;
import perveance.files.toml.Range;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlEntry;

/** Reads one stage by the keys that its kind declares; knows no kind itself. */
final class StageReader {
  private static final double LARGEST = 1e15;

  private final StageKind kind;
  private final ReadTable read;
  private final StrictTable table;
  private final DeviceFiles library;
  private final Problems problems;

  StageReader(StageKind kind, ReadTable read, DeviceFiles library, Problems problems) {
    this.kind = kind;
    this.read = read;
    this.table = read.table();
    this.library = library;
    this.problems = problems;
  }

  /** The settings that could be read, in the order of the file. */
  Map<String, Setting> read() {
    int before = problems.count();
    Map<String, Setting> settings = new LinkedHashMap<>();
    for (KeySpec spec : kind.keys()) {
      if (spec.required()) {
        table.require(spec.key(), meaning(spec));
      }
      table.allow(spec.key());
      if (table.has(spec.key())) {
        Optional<Setting> setting = setting(spec);
        if (setting.isPresent()) {
          settings.put(spec.key(), setting.get());
        } else {
          read.told(spec.key());
        }
      }
    }
    table.refuseOthers();
    if (problems.count() > before || table.table().damaged()) {
      read.unsound();
    }
    return inOrderOfFile(settings);
  }

  private Map<String, Setting> inOrderOfFile(Map<String, Setting> settings) {
    Map<String, Setting> ordered = new LinkedHashMap<>();
    for (TomlEntry entry : table.table().entries()) {
      Setting setting = settings.get(entry.key());
      if (setting != null) {
        ordered.put(entry.key(), setting);
      }
    }
    return ordered;
  }

  private Optional<Setting> setting(KeySpec spec) {
    switch (spec.form()) {
      case QUANTITY:
        OptionalDouble value = table.quantity(spec.key(), range(spec));
        return value.isEmpty()
            ? Optional.empty()
            : Optional.of(new Setting.Number(table.written(spec.key()), value.getAsDouble()));
      case FLAG:
        return table.flag(spec.key()).map(Setting.Flag::new);
      case DEVICE:
        readDevice(spec.key());
        return word(spec);
      default:
        return word(spec);
    }
  }

  private static String meaning(KeySpec spec) {
    return switch (spec.form()) {
      case QUANTITY -> spec.meaning() + ", for example \"" + spec.unit().example() + "\"";
      case DEVICE -> spec.meaning() + ", for example \"12AX7\"";
      default -> spec.meaning();
    };
  }

  private static Range range(KeySpec spec) {
    return new Range(
        spec.unit(), Math.max(spec.lowest(), -LARGEST), Math.min(spec.highest(), LARGEST));
  }

  private Optional<Setting> word(KeySpec spec) {
    Optional<String> word =
        spec.choices().isEmpty() ? table.text(spec.key()) : table.word(spec.key(), spec.choices());
    if (word.isPresent() && word.get().isBlank()) {
      table.complain(spec.key(), "an empty text", spec.meaning());
      return Optional.empty();
    }
    return word.map(Setting.Word::new);
  }

  /** A device file with faults is told here; that there is none is told with the other names. */
  private void readDevice(String key) {
    String name = table.text(key).orElse("");
    try {
      library.load(name);
    } catch (BadInputException e) {
      table.complain(key, "\"" + name + "\", whose device file has faults", "a sound device file");
      problems.addAll(e.problems());
      read.told(key);
    }
  }
}
