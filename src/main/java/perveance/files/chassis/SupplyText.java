package perveance.files.chassis;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.toml.TomlText;

/** The values of a supply node as they stand in a file. */
final class SupplyText {
  private SupplyText() {}

  static Map<String, String> values(Supply supply) {
    Map<String, String> values = new LinkedHashMap<>();
    if (supply.feed() instanceof SupplyFeed.Stated stated) {
      values.put("voltage", quantity(stated.voltage(), Unit.VOLT));
    } else if (supply.feed() instanceof SupplyFeed.Dropped dropped) {
      values.put("from", TomlText.text(dropped.from()));
      values.put("dropper", quantity(dropped.dropper(), Unit.OHM));
    }
    put(values, "reservoir", supply.reservoir(), Unit.FARAD);
    put(values, "bleeder", supply.bleeder(), Unit.OHM);
    put(values, SupplyReader.RESERVOIR_VOLTAGE, supply.ratings().reservoirVoltage(), Unit.VOLT);
    put(values, SupplyReader.DROPPER_POWER, supply.ratings().dropperPower(), Unit.WATT);
    put(values, SupplyReader.BLEEDER_POWER, supply.ratings().bleederPower(), Unit.WATT);
    return values;
  }

  static String header(String name) {
    return "[supply." + TomlText.key(name) + "]";
  }

  static String braces(Supply supply) {
    return values(supply).entrySet().stream()
        .map(e -> e.getKey() + " = " + e.getValue())
        .collect(Collectors.joining(", ", "{ ", " }"));
  }

  private static void put(Map<String, String> values, String key, OptionalDouble value, Unit unit) {
    if (value.isPresent()) {
      values.put(key, quantity(value.getAsDouble(), unit));
    }
  }

  static String quantity(double value, Unit unit) {
    return TomlText.text(QuantityFormat.PLAIN.part(value, unit));
  }
}
