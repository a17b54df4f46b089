package perveance.files.chassis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.base.Unit;
import perveance.engine.stage.Conditions;
import perveance.files.toml.Range;

/** The keys of the table of conditions, in their usual order. */
enum ConditionKey {
  MAINS("mains", new Range(Unit.VOLT, 10, 1000)),
  MAINS_ACTUAL("mains_actual", new Range(Unit.VOLT, 10, 1000)),
  MAINS_FREQUENCY("mains_frequency", new Range(Unit.HERTZ, 10, 1000)),
  METER("meter", new Range(Unit.OHM, 1000, 1e9)),
  RESISTOR_TOLERANCE("resistor_tolerance", new Range(Unit.RATIO, 0, 0.5)),
  CAPACITOR_TOLERANCE("capacitor_tolerance", new Range(Unit.RATIO, 0, 1)),
  SUPPLY_TOLERANCE("supply_tolerance", new Range(Unit.RATIO, 0, 0.5)),
  THRESHOLD("threshold", new Range(Unit.VOLT, 1, 1000)),
  HEATER_VOLTAGE("heater_voltage", new Range(Unit.VOLT, 1, 150)),
  HEATER_WINDING("heater_winding", new Range(Unit.AMPERE, 0.01, 1000)),
  HEATER_OTHER("heater_other", new Range(Unit.AMPERE, 0, 1000));

  private final String key;
  private final Range range;

  ConditionKey(String key, Range range) {
    this.key = key;
    this.range = range;
  }

  String key() {
    return key;
  }

  Range range() {
    return range;
  }

  static List<String> order() {
    List<String> order = new ArrayList<>();
    for (ConditionKey one : values()) {
      order.add(one.key);
    }
    return order;
  }

  /** What conditions say under the key; empty where they say nothing. */
  OptionalDouble of(Conditions conditions) {
    return this == HEATER_WINDING
        ? conditions.heaters().winding()
        : OptionalDouble.of(number(conditions));
  }

  private double number(Conditions conditions) {
    return switch (this) {
      case MAINS -> conditions.mains();
      case MAINS_ACTUAL -> conditions.mainsActual();
      case MAINS_FREQUENCY -> conditions.mainsFrequency();
      case METER -> conditions.meter();
      case RESISTOR_TOLERANCE -> conditions.resistorTolerance();
      case CAPACITOR_TOLERANCE -> conditions.capacitorTolerance();
      case SUPPLY_TOLERANCE -> conditions.supplyTolerance();
      case THRESHOLD -> conditions.threshold();
      case HEATER_VOLTAGE -> conditions.heaters().voltage();
      case HEATER_WINDING -> conditions.heaters().winding().orElse(0);
      case HEATER_OTHER -> conditions.heaters().other();
    };
  }

  /** What is taken where the file is silent; mains is as nominal unless measured. */
  OptionalDouble usual(Conditions stated) {
    return this == MAINS_ACTUAL ? OptionalDouble.of(stated.mains()) : of(Conditions.USUAL);
  }
}
