package perveance.files.chassis;

import perveance.engine.stage.Conditions;
import perveance.engine.stage.HeaterSupply;
import perveance.files.toml.StrictTable;

/** Reads the table of conditions. */
final class ConditionsReader {
  private ConditionsReader() {}

  static Conditions read(StrictTable table) {
    double mains = value(table, ConditionKey.MAINS);
    Conditions conditions =
        new Conditions(
            mains,
            table
                .quantity(ConditionKey.MAINS_ACTUAL.key(), ConditionKey.MAINS_ACTUAL.range())
                .orElse(mains),
            value(table, ConditionKey.MAINS_FREQUENCY),
            value(table, ConditionKey.METER),
            value(table, ConditionKey.RESISTOR_TOLERANCE),
            value(table, ConditionKey.CAPACITOR_TOLERANCE),
            value(table, ConditionKey.SUPPLY_TOLERANCE),
            value(table, ConditionKey.THRESHOLD),
            heaters(table));
    table.refuseOthers();
    return conditions;
  }

  private static HeaterSupply heaters(StrictTable table) {
    ConditionKey winding = ConditionKey.HEATER_WINDING;
    return new HeaterSupply(
        value(table, ConditionKey.HEATER_VOLTAGE),
        table.quantity(winding.key(), winding.range()),
        value(table, ConditionKey.HEATER_OTHER));
  }

  private static double value(StrictTable table, ConditionKey key) {
    return table.quantity(key.key(), key.range()).orElse(key.of(Conditions.USUAL).orElseThrow());
  }
}
