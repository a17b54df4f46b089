package perveance.files.device;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Validity;
import perveance.files.toml.Range;
import perveance.files.toml.StrictTable;

/** Reads the tables of a device file that a fit has written: law, fit and validity. */
final class LawReader {
  private LawReader() {}

  static Optional<DeviceLaw> law(StrictTable table) {
    table.require("name", "one of " + String.join(", ", LawForm.words()));
    Optional<LawForm> form = LawForm.named(table.word("name", LawForm.words()).orElse(""));
    if (form.isEmpty()) {
      return Optional.empty();
    }
    Map<String, Double> values = new LinkedHashMap<>();
    for (String key : form.get().keys()) {
      table.require(key, "a number in SI units");
      read(table, key, values);
    }
    for (String key : form.get().further()) {
      read(table, key, values);
    }
    table.refuseOthers();
    if (!values.keySet().containsAll(form.get().keys())) {
      return Optional.empty();
    }
    try {
      return Optional.of(form.get().make(values));
    } catch (IllegalArgumentException e) {
      table.complain("name", String.valueOf(e.getMessage()), "values with a meaning");
      return Optional.empty();
    }
  }

  private static void read(StrictTable table, String key, Map<String, Double> values) {
    OptionalDouble value = table.quantity(key, Ranges.NUMBER);
    if (value.isPresent()) {
      values.put(key, value.getAsDouble());
    }
  }

  static FitSummary fit(StrictTable table) {
    FitSummary fit =
        new FitSummary(
            table.requiredText("method", "least squares on current, gm and mu"),
            table.requiredQuantity("median_error", Ranges.ERROR),
            table.requiredQuantity("worst_error", Ranges.ERROR),
            table.quantities("standard_errors", Ranges.NUMBER),
            table.texts("assumptions"));
    table.refuseOthers();
    return fit;
  }

  static Validity validity(StrictTable table, boolean hasGrid) {
    double[] anode = pair(table, "anode_voltage", Ranges.ANY_VOLTAGE, true);
    double[] current = pair(table, "anode_current", Ranges.CURRENT_OR_NONE, true);
    double[] grid = pair(table, "grid_voltage", Ranges.GRID_VOLTAGE, hasGrid);
    table.refuseOthers();
    return new Validity(anode[0], anode[1], current[0], current[1], grid[0], grid[1]);
  }

  private static double[] pair(StrictTable table, String key, Range range, boolean required) {
    String expected = "the lowest and the highest value in a list";
    if (required) {
      table.require(key, expected);
    }
    boolean there = table.has(key);
    List<Double> values = table.quantities(key, range);
    if (values.size() == 2 && values.get(0) <= values.get(1)) {
      return new double[] {values.get(0), values.get(1)};
    }
    if (there && table.items(key).size() == values.size()) {
      table.complain(key, values.size() + " values, or falling ones", expected);
    }
    return new double[2];
  }
}
