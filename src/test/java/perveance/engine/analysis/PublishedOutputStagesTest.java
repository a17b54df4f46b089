package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import perveance.accuracy.ReferenceTable;
import perveance.accuracy.ReferenceTable.Row;
import perveance.engine.numeric.Statistics;

/**
 * *Published* output stages and small pentodes through the whole engine. Errors are relative for
 * power, gain and current, in percentage points for distortion. Tolerances are those of the
 * requirement: triode power 5 % median; pentode power 5 % median and 15 % at worst; push-pull power
 * 8 % median; distortion 1.2 points median; gain 6 % median.
 */
@Tag("published")
class PublishedOutputStagesTest {
  /** Errors of a set of rows. */
  private record Errors(List<Double> power, List<Double> distortion) {
    Errors() {
      this(new ArrayList<>(), new ArrayList<>());
    }

    void add(DrivenAnswer driven, double watts, double percent) {
      power.add(driven.power().orElseThrow() / watts - 1);
      distortion.add(100 * driven.distortion() - percent);
    }
  }

  private static DrivenAnswer driven(String kind, List<String> keys) {
    return new Bench()
        .stage("V1", kind, keys.toArray(new String[0]))
        .first()
        .driven()
        .orElseThrow();
  }

  private static void put(List<String> keys, String key, String text, String unit) {
    if (!text.isEmpty()) {
      keys.addAll(List.of(key, text + unit));
    }
  }

  /**
   * Case: 2A3, 45 and 300B, class A1, ideal transformer, drive equal to the bias. Part of the 300B
   * rows were in its fit (said in its device file). The sheets print 5 % for what is mostly second
   * harmonic.
   */
  @Test
  void singleEndedTriodes() {
    Errors errors = new Errors();
    for (Row row : ReferenceTable.read("single-ended-triodes.tsv")) {
      if (row.text("drive_V_peak").isEmpty()) {
        continue;
      }
      List<String> keys = new ArrayList<>(List.of("device", row.text("type")));
      put(keys, "anode_voltage", row.text("anode_voltage_V"), " V");
      put(keys, "grid_bias", row.text("bias_V"), " V");
      put(keys, "primary", row.text("load_ohm"), "");
      put(keys, "drive", row.text("drive_V_peak"), " V");
      DrivenAnswer driven = driven("single-ended-output", keys);
      errors.add(driven, row.number("power_W"), row.number("second_percent"));
      assertTrue(driven.harmonics().get(0) > driven.harmonics().get(1), keys.toString());
    }
    assertTrue(errors.power().size() >= 15, "rows " + errors.power().size());
    assertTrue(median(errors.power()) <= 0.05, "power " + errors.power());
    assertTrue(median(errors.distortion()) <= 1.2, "distortion " + errors.distortion());
  }

  /** Case: EL84, EL34, 6L6, 6V6GT class A. Rows that set the knee of a class are marked there. */
  @Test
  void singleEndedPentodes() {
    Errors errors = new Errors();
    for (Row row : ReferenceTable.read("single-ended-pentodes.tsv")) {
      if (row.text("screen_voltage_V").isEmpty()) {
        continue;
      }
      List<String> keys = new ArrayList<>(List.of("device", row.text("type")));
      keys.addAll(List.of("connection", "pentode"));
      put(keys, "anode_voltage", row.text("anode_voltage_V"), " V");
      put(keys, "screen_voltage", row.text("screen_voltage_V"), " V");
      if (row.text("bias_V").isEmpty()) {
        put(keys, "cathode_resistor", row.text("cathode_resistor_ohm"), "");
        put(keys, "cathode_bypass", "1000u", "");
      } else {
        put(keys, "grid_bias", row.text("bias_V"), " V");
      }
      put(keys, "primary", row.text("load_ohm"), "");
      put(keys, "drive", row.text("drive_V_peak"), " V");
      errors.add(
          driven("single-ended-output", keys),
          row.number("power_W"),
          row.number("distortion_percent"));
    }
    assertTrue(errors.power().size() >= 9, "rows " + errors.power().size());
    assertTrue(median(errors.power()) <= 0.05, "power " + errors.power());
    assertTrue(worst(errors.power()) <= 0.15, "power " + errors.power());
    assertTrue(median(errors.distortion()) <= 1.2, "distortion " + errors.distortion());
  }

  /** Case: pairs of EL84, 6L6, 6V6GT, class A to AB1, fixed and shared cathode bias. */
  @Test
  void pushPullPentodes() {
    Errors errors = new Errors();
    List<Double> idle = new ArrayList<>();
    List<Double> atDrive = new ArrayList<>();
    for (Row row : ReferenceTable.read("push-pull-pentodes.tsv")) {
      List<String> keys = pair(row);
      StageAnswer answer =
          new Bench().stage("V1", "push-pull-output", keys.toArray(new String[0])).first();
      DrivenAnswer driven = answer.driven().orElseThrow();
      errors.add(driven, row.number("power_W"), row.number("distortion_percent"));
      double pair = answer.points().stream().mapToDouble(DevicePoint::anodeCurrent).sum();
      idle.add(1e3 * pair / row.number("current_mA") - 1);
      atDrive.add(1e3 * driven.meanAnodeCurrent() / row.number("current_at_drive_mA") - 1);
    }
    assertTrue(errors.power().size() >= 10, "rows " + errors.power().size());
    assertTrue(median(errors.power()) <= 0.08, "power " + errors.power());
    assertTrue(median(errors.distortion()) <= 1.2, "distortion " + errors.distortion());
    assertTrue(median(idle) <= 0.06, "idle current " + idle);
    assertTrue(median(atDrive) <= 0.06, "current at drive " + atDrive);
  }

  /**
   * Case: class AB2 pairs of the RCA Receiving Tube Manual (memory), fixed bias, drive by a
   * transformer, anode voltage, screen voltage, bias, drive from grid to grid, load, power, mean
   * anode current at drive. Not in any fit. Tolerance: push-pull power 8 % median as the
   * requirement sets it, 15 % at worst in power and current, the sheets rounding the drive.
   */
  @Test
  void pairsDrivenIntoGridCurrent() {
    double[][] rows = {
      {360, 270, -22.5, 72, 3800, 47, 205},
      {360, 225, -18, 52, 6000, 31, 142},
      {375, 250, -26, 82, 10e3, 18.5, 82}
    };
    List<String> types = List.of("6L6", "6L6", "6F6");
    List<Double> power = new ArrayList<>();
    List<Double> current = new ArrayList<>();
    for (int i = 0; i < rows.length; i++) {
      double[] row = rows[i];
      List<String> keys = new ArrayList<>(List.of("device", types.get(i)));
      keys.addAll(List.of("connection", "pentode"));
      put(keys, "anode_voltage", Double.toString(row[0]), " V");
      put(keys, "screen_voltage", Double.toString(row[1]), " V");
      put(keys, "grid_bias", Double.toString(row[2]), " V");
      put(keys, "drive", Double.toString(row[3] / 2), " V");
      put(keys, "primary", Double.toString(row[4]), "");
      DrivenAnswer driven = driven("push-pull-output", keys);
      power.add(driven.power().orElseThrow() / row[5] - 1);
      current.add(1e3 * driven.meanAnodeCurrent() / row[6] - 1);
    }
    assertTrue(median(power) <= 0.08, "power " + power);
    assertTrue(worst(power) <= 0.15, "power " + power);
    assertTrue(worst(current) <= 0.15, "current at drive " + current);
  }

  /** A capacitor before the grids lets their current shift the bias: the same pair gives less. */
  @Test
  void aCouplingCapacitorBlocksAnOverdrivenPair() {
    List<String> keys =
        new ArrayList<>(List.of("device", "6L6", "connection", "pentode", "primary", "3800"));
    keys.addAll(List.of("anode_voltage", "360 V", "screen_voltage", "270 V"));
    keys.addAll(List.of("grid_bias", "-22.5 V", "drive", "36 V"));
    double byTransformer = driven("push-pull-output", keys).power().orElseThrow();
    keys.addAll(List.of("input_coupling", "100n", "grid_leak", "220k"));
    double byCapacitor = driven("push-pull-output", keys).power().orElseThrow();
    assertTrue(byCapacitor < 0.6 * byTransformer, byCapacitor + " of " + byTransformer);
  }

  private static List<String> pair(Row row) {
    List<String> keys = new ArrayList<>(List.of("device", row.text("type")));
    keys.addAll(List.of("connection", "pentode"));
    put(keys, "anode_voltage", row.text("anode_voltage_V"), " V");
    put(keys, "screen_voltage", row.text("screen_voltage_V"), " V");
    if (row.text("common_cathode_resistor_ohm").isEmpty()) {
      put(keys, "grid_bias", row.text("bias_V"), " V");
    } else {
      put(keys, "cathode_resistor", row.text("common_cathode_resistor_ohm"), "");
      put(keys, "cathode_bypass", "1000u", "");
      put(keys, "shared", "true", "");
    }
    put(keys, "primary", row.text("load_ohm"), "");
    put(keys, "drive", Double.toString(row.number("drive_V_peak") / 2), " V");
    return keys;
  }

  /**
   * Case: EF86 rows of the Philips table; gain of rows that are not marked low, cathode current of
   * all. The sheet's gain may be the one at the printed output, which is 10 to 18 % lower.
   */
  @Test
  void smallPentode() {
    List<Double> gain = new ArrayList<>();
    List<Double> current = new ArrayList<>();
    for (Row row : ReferenceTable.read("ef86-resistance-coupled.tsv")) {
      StageAnswer answer =
          Bench.on(row.number("supply_V"))
              .stage(
                  "V1",
                  "common-cathode",
                  "device",
                  "EF86",
                  "supply",
                  "A",
                  "anode_load",
                  row.text("anode_load_ohm"),
                  "screen_resistor",
                  row.text("screen_resistor_ohm"),
                  "screen_bypass",
                  "10u",
                  "cathode_resistor",
                  row.text("cathode_resistor_ohm"),
                  "cathode_bypass",
                  "1000u",
                  "grid_leak",
                  "1M",
                  "coupling",
                  "100n",
                  "load",
                  row.text("next_leak_ohm"))
              .first();
      DevicePoint at = answer.points().get(0);
      double cathode = at.anodeCurrent() + at.screenCurrent().orElseThrow();
      current.add(1e3 * cathode / row.number("cathode_current_mA") - 1);
      if (!Optional.of(row.text("confidence")).filter("low"::equals).isPresent()) {
        gain.add(-answer.smallSignal().gain() / row.number("gain") - 1);
      }
    }
    assertEquals(5, gain.size());
    assertTrue(median(gain) <= 0.06, "gain " + gain);
    assertTrue(worst(current) <= 0.06, "current " + current);
  }

  private static double median(List<Double> errors) {
    return Statistics.median(errors.stream().mapToDouble(Math::abs).toArray());
  }

  private static double worst(List<Double> errors) {
    return errors.stream().mapToDouble(Math::abs).max().orElseThrow();
  }
}
