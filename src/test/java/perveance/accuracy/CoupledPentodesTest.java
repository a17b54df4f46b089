package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import perveance.engine.device.DeviceLaw;

/**
 * Published resistance-coupled pentode stages, predicted from a law that has never seen them.
 * Solved by {@link TestCoupledPentode}, without the circuit engine.
 */
@Tag("published")
class CoupledPentodesTest {
  /**
   * EF86: 7 rows (Philips table, memory, two of them marked low; the first row found). Gain within
   * 6 % median and 15 % at worst, cathode current within 6 %. The sheet's gain may be that at the
   * printed output, which lies between the small-signal gain and 10 to 18 % less (see {@link
   * #gainAtThePrintedOutput}); the published characteristics themselves disagree by 10 % in gm.
   */
  @Test
  void currentAndGainOfTheEf86() {
    List<Double> current = currentErrors();
    List<Double> gain = gainErrors();
    assertEquals(7, gain.size());
    assertTrue(ResistanceCoupledTriodesTest.worst(current) <= 0.06, "current " + current);
    assertTrue(ResistanceCoupledTriodesTest.median(gain) <= 0.06, "gain " + gain);
    assertTrue(ResistanceCoupledTriodesTest.worst(gain) <= 0.15, "gain " + gain);
  }

  /**
   * The same gain at the printed output: within 12 % median, which brackets the print from below.
   */
  @Test
  void gainAtThePrintedOutput() {
    List<Double> gain = new ArrayList<>();
    for (ReferenceTable.Row row : rows()) {
      gain.add(stage(row).gainAtOutput(row.number("output_V_rms")) / row.number("gain") - 1);
    }
    assertTrue(ResistanceCoupledTriodesTest.median(gain) <= 0.12, "gain " + gain);
  }

  static List<Double> currentErrors() {
    return rows().stream()
        .map(row -> 1e3 * stage(row).current() / row.number("cathode_current_mA") - 1)
        .toList();
  }

  static List<Double> gainErrors() {
    return rows().stream().map(row -> stage(row).gain() / row.number("gain") - 1).toList();
  }

  private static List<ReferenceTable.Row> rows() {
    return ReferenceTable.read("ef86-resistance-coupled.tsv");
  }

  private static TestCoupledPentode stage(ReferenceTable.Row row) {
    DeviceLaw law = Library.device("EF86").law();
    return new TestCoupledPentode(
        law,
        row.number("supply_V"),
        row.number("anode_load_ohm"),
        row.number("screen_resistor_ohm"),
        row.number("cathode_resistor_ohm"),
        row.number("next_leak_ohm"));
  }
}
