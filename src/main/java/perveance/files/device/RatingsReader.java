package perveance.files.device;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Heater;
import perveance.engine.device.RatingSystem;
import perveance.engine.device.Ratings;
import perveance.files.toml.StrictTable;

/** Reads the tables of a device file that state limits, heaters and capacitances. */
final class RatingsReader {
  static final List<String> HOW = List.of("found", "memory", "measured");
  static final List<String> CONFIDENCE = List.of("high", "medium", "low");

  private static final List<String> SYSTEMS =
      List.of("design-centre", "design-maximum", "absolute", "unstated");

  private RatingsReader() {}

  static Ratings rating(StrictTable table, String deviceType) {
    Optional<String> type = table.text("type");
    table.word("confidence", CONFIDENCE);
    table.text("note");
    Ratings ratings =
        new Ratings(
            type.orElse(deviceType),
            system(table),
            table.requiredText("source", "RCA Receiving Tube Manual"),
            table.word("how", HOW).orElse(""),
            table.quantity("anode_voltage", Ranges.VOLTAGE),
            table.quantity("cold_anode_voltage", Ranges.VOLTAGE),
            table.quantity("anode_dissipation", Ranges.POWER),
            table.quantity("both_anodes_dissipation", Ranges.POWER),
            table.quantity("screen_voltage", Ranges.VOLTAGE),
            table.quantity("screen_dissipation", Ranges.POWER),
            table.quantity("cathode_current", Ranges.CURRENT),
            table.quantity("grid_leak_fixed", Ranges.RESISTANCE),
            table.quantity("grid_leak_cathode", Ranges.RESISTANCE),
            table.quantity("heater_negative", Ranges.VOLTAGE),
            table.quantity("heater_positive", Ranges.VOLTAGE));
    table.refuseOthers();
    return ratings;
  }

  static RatingSystem system(StrictTable table) {
    String word = table.word("system", SYSTEMS).orElse("unstated");
    for (RatingSystem system : RatingSystem.values()) {
      if (system.word().equals(word)) {
        return system;
      }
    }
    return RatingSystem.UNSTATED;
  }

  static Heater heater(StrictTable table) {
    table.text("source");
    table.word("how", HOW);
    Heater heater =
        new Heater(
            table.requiredQuantity("voltage", Ranges.VOLTAGE),
            table.requiredQuantity("current", Ranges.CURRENT),
            table.text("pins").orElse(""),
            table.flag("directly_heated").orElse(false));
    table.refuseOthers();
    return heater;
  }

  static Capacitances capacitances(StrictTable table) {
    table.text("source");
    table.word("how", HOW);
    table.text("note");
    OptionalDouble gridAnode = table.quantity("grid_anode", Ranges.CAPACITANCE);
    OptionalDouble gridCathode = table.quantity("grid_cathode", Ranges.CAPACITANCE);
    OptionalDouble anodeCathode = table.quantity("anode_cathode", Ranges.CAPACITANCE);
    table.refuseOthers();
    return new Capacitances(gridAnode.orElse(0), gridCathode.orElse(0), anodeCathode.orElse(0));
  }
}
