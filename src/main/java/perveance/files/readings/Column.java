package perveance.files.readings;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import perveance.engine.base.Unit;
import perveance.files.toml.Range;

/** A quantity that is read, with the names that its column may have. */
enum Column {
  ANODE_VOLTAGE(
      "anode_voltage",
      Range.within(Unit.VOLT, 100_000),
      "va",
      "anode_voltage",
      "vp",
      "plate_voltage",
      "anode_volts",
      "plate_volts",
      "ua",
      "vak",
      "vpk"),
  GRID_VOLTAGE(
      "grid_voltage",
      Range.within(Unit.VOLT, 10_000),
      "vg",
      "vg1",
      "grid_voltage",
      "grid_volts",
      "ug",
      "ug1",
      "vgk"),
  ANODE_CURRENT(
      "anode_current",
      Range.from0(Unit.AMPERE, 1000),
      "ia",
      "anode_current",
      "ip",
      "plate_current"),
  SCREEN_VOLTAGE(
      "screen_voltage",
      Range.within(Unit.VOLT, 100_000),
      "vg2",
      "screen_voltage",
      "screen_volts",
      "vs",
      "ug2",
      "vg2k"),
  SCREEN_CURRENT("screen_current", Range.from0(Unit.AMPERE, 1000), "ig2", "screen_current", "is");

  private final String key;
  private final Range range;
  private final List<String> names;

  Column(String key, Range range, String... names) {
    this.key = key;
    this.range = range;
    this.names = List.of(names);
  }

  /** The key in a TOML file and the name in messages. */
  String key() {
    return key;
  }

  Range range() {
    return range;
  }

  /** The column of an electrode's name beside a unit, such as "plate mA". */
  static Optional<Column> ofElectrode(String name, Unit unit) {
    boolean volts = unit == Unit.VOLT;
    return switch (name.strip().toLowerCase(Locale.ROOT)) {
      case "anode", "plate" -> Optional.of(volts ? ANODE_VOLTAGE : ANODE_CURRENT);
      case "screen" -> Optional.of(volts ? SCREEN_VOLTAGE : SCREEN_CURRENT);
      case "grid" -> volts ? Optional.of(GRID_VOLTAGE) : Optional.empty();
      default -> Optional.empty();
    };
  }

  /** The column with a name, whatever its case. */
  static Optional<Column> named(String name) {
    String plain = name.strip().toLowerCase(Locale.ROOT).replace(' ', '_');
    for (Column column : values()) {
      if (column.names.contains(plain)) {
        return Optional.of(column);
      }
    }
    return Optional.empty();
  }

  static List<String> allNames() {
    List<String> all = new ArrayList<>();
    for (Column column : values()) {
      all.addAll(column.names);
    }
    return all;
  }
}
