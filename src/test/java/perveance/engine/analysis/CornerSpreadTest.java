package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.base.Progress;
import perveance.engine.stage.Conditions;

/** Bands of corners: capacitors have tolerances too. */
class CornerSpreadTest {
  private static Conditions tolerances(double resistors, double capacitors) {
    Conditions usual = Conditions.USUAL;
    return new Conditions(
        usual.mains(),
        usual.mainsActual(),
        usual.mainsFrequency(),
        usual.meter(),
        resistors,
        capacitors,
        1e-6,
        usual.threshold());
  }

  private static Band corner(Conditions conditions, String name, String... keysAndTexts) {
    StageAnswer answer =
        new ChassisAnalysis(Bench.LIBRARY)
            .answer(
                Bench.on(310).conditions(conditions).standardWith(keysAndTexts).chassis(),
                new AnalysisOptions(40, 1, false, false),
                Progress.none())
            .stages()
            .get(0);
    return answer.smallSignal().bands().getOrDefault(name, new Band(0, 0, List.of()));
  }

  /**
   * Derived. Where one capacitor sets the corner, f = 1 / (2 pi R C): a capacitor of 20 % (two
   * standard deviations, logarithmic) makes a band of exp(+-0.196) about it. R is 39 k in series
   * with 470 k, and the bypass lies a decade below. Tolerance 3 %: what the bypass still does.
   */
  @Test
  void aCouplingCapacitorOfTwentyPercentMakesABandOfTwentyPercent() {
    Band band = corner(tolerances(1e-6, 0.2), "lowCorner", "cathode_bypass", "1000u");
    assertEquals(Math.exp(2 * 0.196), band.high() / band.low(), 0.03 * 1.48);
    assertEquals("coupling", band.shares().get(0).cause());
    double nominal = 1 / (2 * Math.PI * 22e-9 * (39.4e3 + 470e3));
    assertTrue(band.low() < nominal && nominal < band.high(), band.toString());
  }

  /** Derived. Capacitor and resistor of equal tolerance, the resistor nearly all of R: sqrt 2. */
  @Test
  void independentCausesAddAsSquares() {
    Band one = corner(tolerances(1e-6, 0.2), "lowCorner", "cathode_bypass", "1000u");
    Band both = corner(tolerances(0.2, 0.2), "lowCorner", "cathode_bypass", "1000u");
    double ratio = Math.log(both.high() / both.low()) / Math.log(one.high() / one.low());
    // the next leak is 92 % of the resistance, the anode load a few per cent more
    assertEquals(Math.sqrt(1 + 0.92 * 0.92), ratio, 0.03);
  }

  /** The top is set by strays, whatever the tolerance of the capacitors that are parts. */
  @Test
  void theHighCornerVariesWithStraysAndNotWithParts() {
    Band band = corner(tolerances(1e-6, 0.2), "highCorner", "grid_stopper", "68k");
    assertEquals("stray capacitances", band.shares().get(0).cause());
    assertTrue(band.high() / band.low() > Math.exp(0.3), band.toString());
  }

  /** A specimen's own search finds the corner where the sensitivities put it. */
  @Test
  void aChangedPartMovesTheCornerAsTold() {
    Band band = corner(tolerances(1e-6, 0.2), "lowCorner");
    double up =
        Bench.on(310)
            .standardWith("coupling", "26.77n", "cathode_bypass", "22u")
            .first()
            .smallSignal()
            .lowCorner()
            .orElseThrow();
    assertTrue(up > band.low() && up < band.high(), up + " within " + band);
  }
}
