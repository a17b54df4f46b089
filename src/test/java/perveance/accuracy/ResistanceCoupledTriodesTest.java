package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import perveance.engine.device.DeviceLaw;
import perveance.engine.numeric.Statistics;

/**
 * Published resistance-coupled stages, predicted from laws that have never seen them: the laws are
 * fitted to tabulated and chart points only. Solved by {@link TestStage}, without the circuit
 * engine.
 */
@Tag("published")
class ResistanceCoupledTriodesTest {
  /**
   * ECC83: 15 rows of the Philips/Mullard table (memory). Current within 2.5 % median and 6 % at
   * worst, gain 3 % median, distortion at the printed output 1.2 percentage points median; the row
   * of 200 V and 220 k, marked low, apart from the gain. Printed digits alone are 0.5 % to 1.4 % of
   * current and gain and up to 3 % of an output.
   */
  @Test
  void theEcc83TableIsPredicted() {
    StageErrors errors = StageErrors.ecc83(Library.device("ECC83").law());
    assertEquals(15, errors.current().size());
    assertEquals(14, errors.gain().size());
    assertTrue(median(errors.current()) <= 0.025, "current " + errors.current());
    assertTrue(worst(errors.current()) <= 0.06, "current " + errors.current());
    assertTrue(median(errors.gain()) <= 0.03, "gain " + errors.gain());
    assertTrue(median(errors.distortion()) <= 1.2, "distortion " + errors.distortion());
  }

  /**
   * 6SL7GT: 27 rows of the RCA charts (memory), gain at 5 V rms. The sheet does not say what feeds
   * the grid, so these rows judge the law at low current and no tolerance comes from the print. The
   * even spread gave 15 % too much gain on the average at 90 V (below 0.25 mA); it must be half of
   * that, and no supply may come out worse than with the even spread.
   */
  @Test
  void gainAtLowCurrentIsNearerThanWithAnEvenSpread() {
    List<List<Double>> before = StageErrors.gain6sl7gt(EvenSpreadTriode.of("6SL7GT"));
    List<List<Double>> now = StageErrors.gain6sl7gt(Library.device("6SL7GT").law());
    for (int supply = 0; supply < 3; supply++) {
      assertEquals(9, now.get(supply).size());
      assertTrue(
          median(now.get(supply)) < median(before.get(supply)),
          "before " + before.get(supply) + " now " + now.get(supply));
    }
    assertTrue(mean(before.get(0)) > 0.14, "90 V, before: " + mean(before.get(0)));
    assertTrue(mean(now.get(0)) < 0.075, "90 V, now: " + mean(now.get(0)));
  }

  /**
   * The onset of grid current that the library assumes for indirectly heated types comes from here:
   * at the printed outputs, which end where the grid draws 0.3 uA, the ECC83's grid reaches -0.6 V.
   * 0.1 V: the outputs are printed to a volt, 3 % of the drive.
   */
  @Test
  void theEcc83TableEndsWhereGridCurrentStarts() {
    DeviceLaw law = Library.device("ECC83").law();
    List<Double> peaks = new ArrayList<>();
    for (ReferenceTable.Row row : ReferenceTable.read("ecc83-resistance-coupled.tsv")) {
      TestStage stage = StageErrors.stage(law, row);
      TestStage.Driven driven = stage.atOutput(row.number("output_V_rms"));
      peaks.add(stage.bias(driven.mean()) + driven.amplitude());
    }
    double middle = Statistics.median(peaks.stream().mapToDouble(peak -> peak).toArray());
    assertEquals(law.gridCurrentOnset(), middle, 0.1, peaks.toString());
  }

  /** And the ECC83's rows do not pay for it: gain and distortion improve there too. */
  @Test
  void theEcc83IsNotSpoilt() {
    StageErrors before = StageErrors.ecc83(EvenSpreadTriode.of("12AX7"));
    StageErrors now = StageErrors.ecc83(Library.device("12AX7").law());
    assertTrue(median(now.gain()) < median(before.gain()));
    assertTrue(median(now.distortion()) < median(before.distortion()));
    assertEquals(median(before.current()), median(now.current()), 0.002);
  }

  /**
   * 12AY7 as a low-noise first stage (RCA Receiving Tube Manual, memory): 150 V, 20 k, 2.7 k gain
   * 12.5. 6 %: the two publications of the type differ by 10 % in mu, the gain is printed to 4 %.
   */
  @Test
  void the12ay7StageIsPredicted() {
    DeviceLaw law = Library.device("12AY7").law();
    for (ReferenceTable.Row row : ReferenceTable.read("12ay7-resistance-coupled.tsv")) {
      assertEquals(row.number("gain"), StageErrors.stage(law, row).gain(), 0.06 * 12.5);
    }
  }

  static double median(List<Double> errors) {
    return Statistics.median(errors.stream().mapToDouble(Math::abs).toArray());
  }

  static double worst(List<Double> errors) {
    return errors.stream().mapToDouble(Math::abs).max().orElseThrow();
  }

  private static double mean(List<Double> errors) {
    return Statistics.mean(new ArrayList<>(errors).stream().mapToDouble(e -> e).toArray());
  }
}
