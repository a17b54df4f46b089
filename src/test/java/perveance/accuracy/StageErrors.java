package perveance.accuracy;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.DeviceLaw;

/**
 * Errors of a law over published resistance-coupled stages.
 *
 * @param current relative errors of the anode current [1]
 * @param gain relative errors of the gain [1]
 * @param distortion errors of the total distortion at the printed output [percentage points]
 */
record StageErrors(List<Double> current, List<Double> gain, List<Double> distortion) {
  static StageErrors ecc83(DeviceLaw law) {
    List<Double> current = new ArrayList<>();
    List<Double> gain = new ArrayList<>();
    List<Double> distortion = new ArrayList<>();
    for (ReferenceTable.Row row : ReferenceTable.read("ecc83-resistance-coupled.tsv")) {
      TestStage stage = stage(law, row);
      current.add(stage.current() / (1e-3 * row.number("anode_current_mA")) - 1);
      if (!row.text("confidence").equals("low")) {
        gain.add(stage.gain() / row.number("gain") - 1);
      }
      distortion.add(
          stage.atOutput(row.number("output_V_rms")).distortion()
              - row.number("distortion_percent"));
    }
    return new StageErrors(current, gain, distortion);
  }

  /** Relative errors of the gain at 5 V rms (less where the stage does not reach it), by supply. */
  static List<List<Double>> gain6sl7gt(DeviceLaw law) {
    List<List<Double>> bySupply = List.of(new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
    for (ReferenceTable.Row row : ReferenceTable.read("6sl7gt-resistance-coupled.tsv")) {
      double output = Math.min(5, row.number("output_V_peak") / Math.sqrt(2));
      double gain = stage(law, row).atOutput(output).gain();
      int place = row.number("supply_V") < 100 ? 0 : row.number("supply_V") < 200 ? 1 : 2;
      bySupply.get(place).add(gain / row.number("gain") - 1);
    }
    return bySupply;
  }

  static TestStage stage(DeviceLaw law, ReferenceTable.Row row) {
    return TestStage.resistanceCoupled(
        law,
        row.number("supply_V"),
        row.number("anode_load_ohm"),
        row.number("next_leak_ohm"),
        row.number("cathode_resistor_ohm"));
  }
}
