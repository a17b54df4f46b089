package perveance.files.readings;

import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.device.Evidence;

/** Makes evidence of a reading. */
final class ReadingsEvidence {
  private ReadingsEvidence() {}

  /** Evidence of a reading that has an anode voltage and an anode current. */
  static Evidence of(Map<Column, Double> values, String file, String note) {
    boolean screen = values.containsKey(Column.SCREEN_VOLTAGE);
    boolean grid = values.containsKey(Column.GRID_VOLTAGE);
    String connection = screen ? "pentode" : grid ? "triode" : "diode";
    return new Evidence(
        connection,
        // a table of readings is weighed like a chart: by its highest current
        "curve",
        values.getOrDefault(Column.ANODE_VOLTAGE, 0.0),
        value(values, Column.GRID_VOLTAGE),
        value(values, Column.SCREEN_VOLTAGE),
        value(values, Column.ANODE_CURRENT),
        value(values, Column.SCREEN_CURRENT),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        true,
        file,
        "measured",
        "high",
        note);
  }

  private static OptionalDouble value(Map<Column, Double> values, Column column) {
    Double value = values.get(column);
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }
}
