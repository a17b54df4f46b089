package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import perveance.accuracy.ReferenceTable;
import perveance.accuracy.ReferenceTable.Row;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;
import perveance.engine.numeric.Statistics;

/**
 * *Published* resistance-coupled stages through the whole engine: chassis, circuit, dc point, small
 * signals, steady cycle at the printed output. The laws are fitted to tabulated points only.
 */
@Tag("published")
class PublishedTriodeStagesTest {
  private static Bench stage(String type, Row row) {
    return Bench.on(row.number("supply_V"))
        .standardWith(
            "device", type,
            "anode_load", row.text("anode_load_ohm"),
            "load", row.text("next_leak_ohm"),
            "cathode_resistor", row.text("cathode_resistor_ohm"),
            "cathode_bypass", "1000u");
  }

  private static StageAnswer driven(String type, Row row, double peak) {
    return Bench.on(row.number("supply_V"))
        .standardWith(
            "device", type,
            "anode_load", row.text("anode_load_ohm"),
            "load", row.text("next_leak_ohm"),
            "cathode_resistor", row.text("cathode_resistor_ohm"),
            "cathode_bypass", "1000u",
            "drive", Double.toString(peak))
        .first();
  }

  /** The stage at the drive that gives an output; rms [V]. */
  private static DrivenAnswer atOutput(String type, Row row, double output) {
    RootOutcome outcome =
        Roots.bracketed(
            peak -> driven(type, row, peak).driven().orElseThrow().output() - output,
            1e-3,
            10,
            1e-4);
    double peak = ((RootOutcome.Found) outcome).x();
    return driven(type, row, peak).driven().orElseThrow();
  }

  /**
   * Case: the 15 rows of the Philips/Mullard ECC83 table (memory): current, gain, distortion at the
   * printed output. Tolerance as the requirement sets it: current 2.5 % median and 6 % at worst,
   * gain 3 % median without the 200 V, 220 k row (marked low), distortion 1.2 points median.
   */
  @Test
  void ecc83Table() {
    List<Double> current = new ArrayList<>();
    List<Double> gain = new ArrayList<>();
    List<Double> distortion = new ArrayList<>();
    for (Row row : ReferenceTable.read("ecc83-resistance-coupled.tsv")) {
      StageAnswer answer = stage("ECC83", row).first();
      current.add(
          answer.points().get(0).anodeCurrent() / (1e-3 * row.number("anode_current_mA")) - 1);
      if (!row.text("confidence").equals("low")) {
        gain.add(-answer.smallSignal().gain() / row.number("gain") - 1);
      }
      DrivenAnswer driven = atOutput("ECC83", row, row.number("output_V_rms"));
      distortion.add(100 * driven.distortion() - row.number("distortion_percent"));
    }
    assertEquals(15, current.size());
    assertTrue(median(current) <= 0.025, "current " + current);
    assertTrue(worst(current) <= 0.06, "current " + current);
    assertTrue(median(gain) <= 0.03, "gain " + gain);
    assertTrue(median(distortion) <= 1.2, "distortion " + distortion);
  }

  /**
   * Case: 27 rows of the RCA 6SL7GT charts (memory), gain at 5 V rms output. Tolerance 6 % median
   * at 180 V and above, as the requirement sets it; the 90 V rows are measured already compressed.
   */
  @Test
  void gainOf6sl7gtCharts() {
    List<Double> gain = new ArrayList<>();
    for (Row row : ReferenceTable.read("6sl7gt-resistance-coupled.tsv")) {
      if (row.number("supply_V") >= 180) {
        DrivenAnswer at = atOutput("6SL7GT", row, 5);
        gain.add(5 * Math.sqrt(2) / at.inputPeak() / row.number("gain") - 1);
      }
    }
    assertEquals(18, gain.size());
    assertTrue(median(gain) <= 0.06, "gain " + gain);
  }

  /**
   * Case: ECC83, 250 V, 100 k, 1k5, next grid 330 k (Mullard data, secondary copy): 0.86 mA, gain
   * 54.5, 26 V rms at the start of grid current. Tolerance: 6 % in current and gain; the output at
   * the onset moves by 10 % for 0.1 V of onset, which is not told better.
   */
  @Test
  void mullardStageEndsInGridCurrent() {
    Row row =
        ReferenceTable.read("ecc83-resistance-coupled.tsv").stream()
            .filter(r -> r.number("supply_V") == 250 && r.number("anode_load_ohm") == 100e3)
            .findFirst()
            .orElseThrow();
    StageAnswer answer = stage("ECC83", row).first();
    assertEquals(0.86e-3, answer.points().get(0).anodeCurrent(), 0.06 * 0.86e-3);
    assertEquals(-54.5, answer.smallSignal().gain(), 0.06 * 54.5);
    assertEquals(CleanSwing.Limit.GRID_CURRENT, answer.clean().limitedBy());
    DrivenAnswer clean = driven("ECC83", row, answer.clean().inputPeak()).driven().orElseThrow();
    assertEquals(26, clean.output(), 0.20 * 26);
  }

  private static double median(List<Double> errors) {
    return Statistics.median(errors.stream().mapToDouble(Math::abs).toArray());
  }

  private static double worst(List<Double> errors) {
    return errors.stream().mapToDouble(Math::abs).max().orElseThrow();
  }
}
