package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.analysis.CleanSwing.Limit;

/**
 * What builders ask about signals. Expected figures are *derived* with a plain three-halves law
 * with an offset through the published point of the 12AX7; the tolerance is said at each.
 */
class SignalQuestionsTest {
  /** Case: the usual stage into 1 M and 220 k, bypassed and not. Tolerance: 10 %. */
  @ParameterizedTest
  @CsvSource({"1M, 22u, 58", "1M, , 30", "220k, 22u, 51", "220k, , 24"})
  void gainIntoItsLoad(String load, String bypass, double gain) {
    StageAnswer answer =
        Bench.on(310)
            .standardWith("load", load, "cathode_bypass", bypass == null ? "" : bypass)
            .first();
    assertEquals(-gain, answer.smallSignal().gain(), 0.10 * gain);
  }

  /**
   * Case: input to zero bias 1.60 V (anode down 95 V), to a grid-current onset at -0.5 V 1.10 V (64
   * V down), to cut-off 1.92 V (88 V up). The published onset of this type is about -0.6 V, so that
   * the clean peak lies 0.1 V lower. Tolerance: 0.2 V on grid onset, 10 % on the rest.
   */
  @Test
  void roomEachWay() {
    CleanSwing clean = Bench.on(310).standardWith().first().clean();
    assertEquals(1.60, clean.toZeroBias(), 0.10 * 1.60);
    assertEquals(1.10, clean.positivePeak(), 0.2);
    assertEquals(Limit.GRID_CURRENT, clean.positiveLimit());
    assertEquals(1.92, clean.negativePeak(), 0.10 * 1.92);
    assertEquals(Limit.CUT_OFF, clean.negativeLimit());
    assertEquals(88, clean.outputUp(), 0.10 * 88);
    assertEquals(-64, clean.outputDown(), 0.10 * 64);
    assertTrue(clean.toZeroBias() > clean.positivePeak());
  }

  /** Case: the grid side ends first (1.1 against 1.9 V), so a colder bias gives more room. */
  @Test
  void theGridSideEndsFirstAndColderBiasHelps() {
    CleanSwing usual = Bench.on(310).standardWith().first().clean();
    CleanSwing colder = Bench.on(310).standardWith("cathode_resistor", "2k2").first().clean();
    assertEquals(Limit.GRID_CURRENT, usual.limitedBy());
    assertTrue(colder.outputPeak() > usual.outputPeak());
  }

  /**
   * Case: second harmonic 0.5, 1.2, 2.5 % at 0.2, 0.5, 1.0 V peak in, by the three-halves law with
   * a constant mu. That law is known to give it low, by up to half in the 2A3 (2.2 % against 5 %
   * published), because mu falls towards cut-off; so the figure must lie between this and twice
   * this. How well it meets print is checked on the published resistance-coupled rows.
   */
  @ParameterizedTest
  @CsvSource({"0.2 V, 0.005", "0.5 V, 0.012", "1.0 V, 0.025"})
  void secondHarmonic(String drive, double h2) {
    DrivenAnswer driven = Bench.on(310).standardWith("drive", drive).first().driven().orElseThrow();
    assertTrue(driven.harmonics().get(0) > h2);
    assertTrue(driven.harmonics().get(0) < 2 * h2);
  }

  /** Case: output resistance 39.4 k; into 100 k that is -2.9 dB. Tolerance: 0.5 dB. */
  @Test
  void lossIntoAToneNetwork() {
    double light = Bench.on(310).standardWith("load", "100M").first().smallSignal().gain();
    StageAnswer loaded = Bench.on(310).standardWith("load", "100k").first();
    assertEquals(39.4e3, loaded.smallSignal().outputResistance(), 0.10 * 39.4e3);
    assertEquals(-2.9, 20 * Math.log10(loaded.smallSignal().gain() / light), 0.5);
  }

  /** Case: Ra 100 k and next grid 470 k are 82.5 k for signals; ra is not in it. Exact: 0.5 %. */
  @Test
  void theAcLoadLeavesOutTheValve() {
    LoadLineView view = Bench.on(310).standardWith().first().loadLine().orElseThrow();
    assertEquals(82.46e3, view.acResistance(), 0.005 * 82.46e3);
    assertEquals(101.5e3, view.dcResistance(), 0.005 * 101.5e3);
  }

  /** Case: 22 nF into 220 k behind the stage: 28 Hz. Tolerance: 3 %. */
  @Test
  void couplingCorner() {
    StageAnswer answer = Bench.on(310).standardWith("load", "220k").first();
    assertEquals(28, answer.smallSignal().couplingCorner().orElseThrow(), 0.03 * 28);
  }

  /**
   * Case: 0.68 uF bypass: climbs between 156 and 316 Hz by 6.1 dB; 22 uF: 9.8 Hz. Tolerance: 5 %.
   */
  @Test
  void bypassShelf() {
    SmallSignalAnswer.Shelf small =
        Bench.on(310)
            .standardWith("cathode_bypass", "0.68u")
            .first()
            .smallSignal()
            .shelf()
            .orElseThrow();
    assertEquals(156, small.zero(), 0.05 * 156);
    assertEquals(316, small.pole(), 0.05 * 316);
    assertEquals(6.1, small.step(), 0.05 * 6.1);
    SmallSignalAnswer.Shelf large =
        Bench.on(310).standardWith().first().smallSignal().shelf().orElseThrow();
    assertEquals(9.8, large.pole(), 0.05 * 9.8);
  }

  /**
   * Case: Cgk 1.6, Cga 1.7 + 0.7 wiring, gain 58: 145 pF; behind 62.5 k 17.6 kHz, behind 34 k 32
   * kHz. Tolerance: 20 %, since wiring decides.
   */
  @Test
  void trebleLossByMillerCapacitance() {
    StageAnswer answer = Bench.on(310).standardWith("load", "1M", "source", "62.5k").first();
    assertEquals(145e-12, answer.smallSignal().inputCapacitance(), 0.20 * 145e-12);
    assertEquals(17.6e3, answer.smallSignal().highCorner().orElseThrow(), 0.20 * 17.6e3);
    double stopped =
        Bench.on(310)
            .standardWith("load", "1M", "grid_stopper", "34k")
            .first()
            .smallSignal()
            .highCorner()
            .orElseThrow();
    assertEquals(32e3, stopped, 0.20 * 32e3);
  }
}
