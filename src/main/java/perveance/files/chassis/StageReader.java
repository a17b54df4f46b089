package perveance.files.chassis;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.BadInputException;
import perveance.engine.base.NearMiss;
import perveance.engine.device.Device;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
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
  private final StrictTable table;
  private final DeviceFiles library;
  private final Problems problems;
  private final Map<String, Setting> settings = new HashMap<>();
  private final Map<String, Device> devices = new HashMap<>();
  private boolean sound = true;

  StageReader(StageKind kind, StrictTable table, DeviceFiles library, Problems problems) {
    this.kind = kind;
    this.table = table;
    this.library = library;
    this.problems = problems;
  }

  StageEntry read(String ref) {
    int before = problems.count();
    for (KeySpec spec : kind.keys()) {
      if (spec.required()) {
        table.require(spec.key(), meaning(spec));
      }
      Optional<Setting> setting = setting(spec);
      setting.ifPresent(value -> settings.put(spec.key(), value));
    }
    table.refuseOthers();
    sound &= problems.count() == before && !table.table().damaged();
    return new StageEntry(ref, kind.name(), inOrderOfFile());
  }

  /** Checks the keys against each other once the other stages are known. */
  void checkTogether(Chassis chassis, StageEntry entry) {
    if (sound) {
      ChassisChecks.contradictions(chassis, entry, devices)
          .forEach(c -> table.complain(c.key(), c.found(), c.expected()));
    }
  }

  private Map<String, Setting> inOrderOfFile() {
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
    if (table.has(spec.key()) && table.unreadable(spec.key())) {
      sound = false;
    }
    switch (spec.form()) {
      case QUANTITY:
        OptionalDouble value = table.quantity(spec.key(), range(spec));
        return value.isEmpty()
            ? Optional.empty()
            : Optional.of(new Setting.Number(table.written(spec.key()), value.getAsDouble()));
      case FLAG:
        return table.flag(spec.key()).map(Setting.Flag::new);
      case WORD:
        return word(spec).map(Setting.Word::new);
      case DEVICE:
        return table.text(spec.key()).flatMap(name -> device(spec.key(), name));
      default:
        return table.text(spec.key()).map(Setting.Word::new);
    }
  }

  private static String meaning(KeySpec spec) {
    boolean quantity = spec.form() == KeySpec.Form.QUANTITY;
    return quantity
        ? spec.meaning() + ", for example \"" + spec.unit().example() + "\""
        : spec.meaning();
  }

  private static Range range(KeySpec spec) {
    return new Range(
        spec.unit(), Math.max(spec.lowest(), -LARGEST), Math.min(spec.highest(), LARGEST));
  }

  private Optional<String> word(KeySpec spec) {
    Optional<String> word =
        spec.choices().isEmpty() ? table.text(spec.key()) : table.word(spec.key(), spec.choices());
    if (word.isPresent() && word.get().isBlank()) {
      table.complain(spec.key(), "an empty text", spec.meaning());
      return Optional.empty();
    }
    return word;
  }

  private Optional<Setting> device(String key, String name) {
    try {
      Optional<Device> device = library.load(name);
      if (device.isPresent()) {
        devices.put(key, device.get());
        return Optional.of(new Setting.Word(name));
      }
      table.complain(
          key,
          "\"" + name + "\"",
          "a device of the library",
          NearMiss.suggest(name, library.names()));
    } catch (BadInputException e) {
      table.complain(key, "\"" + name + "\", whose device file has faults", "a sound device file");
      problems.addAll(e.problems());
    }
    return Optional.empty();
  }
}
