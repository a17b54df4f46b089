package perveance.files.device;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.LimitingResistance;
import perveance.engine.device.RectifierFilter;
import perveance.engine.device.RectifierLimit;
import perveance.engine.device.RectifierOutput;
import perveance.engine.device.RectifierRatings;
import perveance.files.toml.StrictTable;

/** Reads the table [rectifier] of a device file with its lists. */
final class RectifierReader {
  private static final List<String> FILTERS =
      List.of(RectifierFilter.CAPACITOR.word(), RectifierFilter.CHOKE.word());

  private RectifierReader() {}

  static RectifierRatings read(StrictTable table, String deviceType) {
    List<RectifierLimit> limits = new ArrayList<>();
    for (StrictTable row : table.tables("limit")) {
      limits.add(limit(row, deviceType));
    }
    List<LimitingResistance> resistances = new ArrayList<>();
    for (StrictTable row : table.tables("resistance")) {
      resistances.add(resistance(row));
    }
    List<RectifierOutput> outputs = new ArrayList<>();
    for (StrictTable row : table.tables("output")) {
      outputs.add(output(row));
    }
    table.refuseOthers();
    return new RectifierRatings(limits, resistances, outputs);
  }

  private static RectifierFilter filter(StrictTable row) {
    row.require("filter", "one of " + String.join(", ", FILTERS));
    String word = row.word("filter", FILTERS).orElse("");
    return word.equals(RectifierFilter.CHOKE.word())
        ? RectifierFilter.CHOKE
        : RectifierFilter.CAPACITOR;
  }

  private static RectifierLimit limit(StrictTable row, String deviceType) {
    RectifierLimit limit =
        new RectifierLimit(
            row.text("type").orElse(deviceType),
            RatingsReader.system(row),
            filter(row),
            row.quantity("anode_voltage", Ranges.VOLTAGE),
            row.quantity("output_current", Ranges.CURRENT),
            row.quantity("peak_current", Ranges.CURRENT),
            row.quantity("inverse_voltage", Ranges.VOLTAGE),
            row.quantity("capacitance", Ranges.RESERVOIR),
            row.quantity("heater_voltage", Ranges.VOLTAGE),
            source(row),
            how(row),
            confidence(row),
            row.text("note").orElse(""));
    row.refuseOthers();
    return limit;
  }

  private static LimitingResistance resistance(StrictTable row) {
    LimitingResistance resistance =
        new LimitingResistance(
            row.requiredQuantity("anode_voltage", Ranges.VOLTAGE),
            row.requiredQuantity("resistance", Ranges.RESISTANCE),
            source(row),
            how(row),
            confidence(row),
            row.text("note").orElse(""));
    row.refuseOthers();
    return resistance;
  }

  private static RectifierOutput output(StrictTable row) {
    RectifierOutput output =
        new RectifierOutput(
            filter(row),
            row.requiredQuantity("anode_voltage", Ranges.VOLTAGE),
            row.requiredQuantity("output_current", Ranges.CURRENT),
            row.quantity("capacitance", Ranges.RESERVOIR),
            row.quantity("resistance", Ranges.RESISTANCE),
            row.requiredQuantity("output_voltage", Ranges.VOLTAGE),
            source(row),
            how(row),
            confidence(row),
            row.text("note").orElse(""));
    row.refuseOthers();
    return output;
  }

  private static String source(StrictTable row) {
    return row.requiredText("source", "RCA Receiving Tube Manual");
  }

  private static String how(StrictTable row) {
    return row.word("how", RatingsReader.HOW).orElse("");
  }

  private static String confidence(StrictTable row) {
    return row.word("confidence", RatingsReader.CONFIDENCE).orElse("");
  }
}
