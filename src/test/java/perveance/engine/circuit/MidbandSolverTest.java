package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.CircuitSketch.Coil;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.numeric.Harmonics;

/** Large signals at mid-band against exact harmonics and against their own means. */
class MidbandSolverTest {
  private static final ThreeHalvesTriode SMALL = new ThreeHalvesTriode(1.6e-3, 100, 0.6, 1e-5, 0.1);

  /** The 2A3 as a pure three-halves law: from mu 4.2, gm 5.25 mA/V and 60 mA at 250 V. */
  private static final ThreeHalvesTriode POWER = new ThreeHalvesTriode(8.45e-4, 4.2, 0, 0, 1);

  private static MidbandSolution driven(Circuit c, Map<Integer, Double> shares, double peak) {
    Converged rest = assertInstanceOf(Converged.class, new DcSolver(c).solve());
    MidbandSolver solver =
        new MidbandSolver(rest.solution(), new Drive(Waveform.cosine(64), shares));
    MidbandOutcome outcome = solver.solve(peak);
    return assertInstanceOf(MidbandOutcome.Converged.class, outcome).solution();
  }

  private static MidbandSolution driven(Circuit c, double peak) {
    return driven(c, Map.of(c.element("in"), 1.0), peak);
  }

  /**
   * derived: i = 40 + 30 x + 4 x^2 + 1.5 x^3 + 0.5 x^4 mA with x = cos gives A0 42.1875, A1 31.125,
   * A2 2.25, A3 0.375, A4 0.0625 mA (exact, by the multiple-angle formulas). Tolerance: rounding.
   */
  @Test
  void harmonicsOfAPolynomialAreExact() {
    Circuit c =
        new CircuitSketch()
            .source("in", "g", "0", 0)
            .source("supply", "B", "0", 250)
            .triode(
                "V1",
                new PolynomialValve(List.of(40e-3, 30e-3, 4e-3, 1.5e-3, 0.5e-3)),
                "a",
                "g",
                "0")
            .resistor("load", "B", "a", 1e3)
            .build();
    MidbandSolution cycle = driven(c, 1);
    Harmonics h = Harmonics.of(cycle.current(c.element("V1")));
    assertEquals(42.1875e-3, cycle.meanCurrent(c.element("V1")), 1e-14);
    assertEquals(31.125e-3, h.amplitude(1), 1e-14);
    assertEquals(2.25e-3, h.amplitude(2), 1e-14);
    assertEquals(0.375e-3, h.amplitude(3), 1e-14);
    assertEquals(0.0625e-3, h.amplitude(4), 1e-14);
    assertEquals(0.07331, Math.hypot(Math.hypot(2.25, 0.375), 0.0625) / 31.125, 5e-6);
  }

  /** derived: a linear stage has the gain of the small-signal solution and no harmonics. */
  @Test
  void linearStageIsClean() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "in", "0", 0)
            .holds("input", "in", "g", 1e-7)
            .resistor("grid_leak", "g", "0", 1e6)
            .resistor("anode_load", "B", "a", 100e3)
            .triode("V1", new LinearTriode(100, 62.5e3, 0), "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1.5e3)
            .holds("bypass", "k", "0", 22e-6)
            .holds("coupling", "a", "out", 22e-9)
            .resistor("next", "out", "0", 1e6)
            .stray("miller", "a", "g", 2e-12)
            .build();
    Harmonics h = driven(c, 0.5).harmonics(c.node("out"), 0);
    assertEquals(0.5 * 59.2593, h.amplitude(1), 5e-4);
    assertTrue(h.cosine(1) < 0);
    assertEquals(0, h.amplitude(2), 1e-9);
    assertEquals(0, h.mean(), 1e-6);
  }

  /**
   * derived: the 2A3 as a pure three-halves law (mu 4.2, K 8.45e-4 A V^-1.5) with a load line of
   * 2500 ohm through its rest at 250 V, -42.4 V, drive equal to the bias: 3.56 W, second harmonic
   * 2.2 %, third 0.43 %, current between 9.3 and 115.4 mA, anode between 111 and 377 V (independent
   * computation along the line). The line is a resistor from a supply that is higher by its drop.
   * Tolerance: 0.15 mA, as K and bias are quoted to three digits; else the digits quoted.
   */
  @Test
  void loadLineThroughTheRest() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250 + 2500 * 0.0598766)
            .source("in", "g", "0", -42.4)
            .triode("V1", POWER, "a", "g", "0")
            .resistor("load", "B", "a", 2500)
            .build();
    MidbandSolution cycle = driven(c, 42.4);
    Harmonics h = cycle.harmonics(c.node("a"), 0);
    assertEquals(3.56, h.amplitude(1) * h.amplitude(1) / 2 / 2500, 0.005);
    assertEquals(0.022, h.relative(2).orElseThrow(), 5e-4);
    assertEquals(0.0043, h.relative(3).orElseThrow(), 1e-4);
    double[] ia = cycle.current(c.element("V1"));
    assertEquals(0.1154, Arrays.stream(ia).max().orElseThrow(), 1.5e-4);
    assertEquals(0.0093, Arrays.stream(ia).min().orElseThrow(), 1.5e-4);
    double[] va = cycle.voltage(c.node("a"), 0);
    assertEquals(111, Arrays.stream(va).min().orElseThrow(), 0.5);
    assertEquals(377, Arrays.stream(va).max().orElseThrow(), 0.5);
  }

  /**
   * derived: the same valve with an ideal transformer, no winding resistance. Its core can hold no
   * mean voltage, so the mean anode voltage stays at 250 V and the line rises with the mean
   * current: 3.59738 W, second harmonic 2.0362 %, third 0.37338 %, magnetising current 64.2201 mA,
   * anode between 113.5574 and 380.7052 V (independent computation: line raised until the mean of
   * 256 samples was 250 V). Tolerance: the digits quoted.
   */
  @Test
  void singleEndedOutputStage() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g", "0", -42.4)
            .triode("V1", POWER, "a", "g", "0")
            .transformer(
                "output",
                Double.POSITIVE_INFINITY,
                new Coil("B", "a", 1, 0, 0),
                new Coil("s", "0", 0.04, 0, 0))
            .resistor("load", "s", "0", 4)
            .build();
    MidbandSolution cycle = driven(c, 42.4);
    Harmonics h = cycle.harmonics(c.node("s"), 0);
    assertEquals(3.59738, h.amplitude(1) * h.amplitude(1) / 2 / 4, 5e-6);
    assertEquals(0.020362, h.relative(2).orElseThrow(), 5e-7);
    assertEquals(0.0037338, h.relative(3).orElseThrow(), 5e-8);
    assertEquals(0.0642201, cycle.meanCurrent(c.element("V1")), 5e-8);
    double[] va = cycle.voltage(c.node("a"), 0);
    assertEquals(113.5574, Arrays.stream(va).min().orElseThrow(), 5e-5);
    assertEquals(380.7052, Arrays.stream(va).max().orElseThrow(), 5e-5);
    assertEquals(250, cycle.meanVoltage(c.node("a"), 0), 1e-9);
    assertEquals(0, cycle.powerBalance(), 1e-9);
    assertTrue(cycle.residual() < 1e-9);
  }

  /**
   * derived: two of the same valves in push-pull, 5000 ohm anode to anode, drive 42.4 V a grid:
   * 7.23 W, no even harmonics, third 0.11 % (independent computation on the composite
   * characteristic).
   */
  @Test
  void pushPullOutputStage() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g1", "0", -42.4)
            .source("in2", "g2", "0", -42.4)
            .triode("V1", POWER, "a1", "g1", "0")
            .triode("V2", POWER, "a2", "g2", "0")
            .transformer(
                "output",
                Double.POSITIVE_INFINITY,
                new Coil("a1", "B", 1, 0, 0),
                new Coil("B", "a2", 1, 0, 0),
                new Coil("s", "0", 0.1, 0, 0))
            .resistor("load", "s", "0", 5000 / 400.0)
            .build();
    MidbandSolution cycle = driven(c, Map.of(c.element("in"), 1.0, c.element("in2"), -1.0), 42.4);
    Harmonics h = cycle.harmonics(c.node("s"), 0);
    assertEquals(7.23, h.amplitude(1) * h.amplitude(1) / 2 / (5000 / 400.0), 0.005);
    assertEquals(0, h.relative(2).orElseThrow(), 1e-9);
    assertEquals(0.0011, h.relative(3).orElseThrow(), 5e-5);
  }

  /**
   * derived: a grid driven through a capacitor rectifies. In the steady state nothing flows through
   * the capacitor in the mean, so the leak's mean current is the grid's; the cathode's mean current
   * times its resistor is what the bypass holds; a choke's mean voltage is its resistance times its
   * current.
   */
  @Test
  void heldQuantitiesBalanceInTheMean() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 300)
            .source("in", "in", "0", 0)
            .resistor("source", "in", "i", 10e3)
            .holds("input", "i", "g", 1e-7)
            .resistor("grid_leak", "g", "0", 1e6)
            .inductor("choke", "B", "a", 100, 2e3)
            .triode("V1", SMALL, "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1.5e3)
            .holds("bypass", "k", "0", 22e-6)
            .holds("coupling", "a", "out", 1e-7)
            .resistor("next", "out", "0", 220e3)
            .build();
    MidbandSolution cycle = driven(c, 6);
    int v1 = c.element("V1");
    double grid = cycle.meanElectrodeCurrent(v1, ElectrodeCurrents.GRID);
    assertTrue(grid > 1e-7, "rectified " + grid);
    assertEquals(-grid * 1e6, cycle.meanVoltage(c.node("g"), 0), 1e-4);
    double cathode = grid + cycle.meanCurrent(v1);
    assertEquals(cathode * 1.5e3, cycle.voltage(c.node("k"), 0)[5], 1e-4);
    double choke = cycle.meanVoltage(c.node("B"), c.node("a"));
    assertEquals(2e3 * cycle.meanCurrent(c.element("choke")), choke, 1e-4);
    assertEquals(0, cycle.meanCurrent(c.element("input")), 1e-10);
    assertEquals(0, cycle.powerBalance(), 1e-6);
  }

  /**
   * derived: two tones through i = x^2 of a polynomial valve: with x = (cos 19 t + cos 20 t) / 2
   * the square has the difference tone at 1 and the sum at 39, each 1/4; and none at 18 and 21.
   */
  @Test
  void differenceToneOfASquareLaw() {
    Circuit c =
        new CircuitSketch()
            .source("in", "g", "0", 0)
            .source("supply", "a", "0", 250)
            .triode("V1", new PolynomialValve(List.of(1e-3, 0.0, 1e-3)), "a", "g", "0")
            .build();
    Converged rest = assertInstanceOf(Converged.class, new DcSolver(c).solve());
    MidbandSolver solver =
        new MidbandSolver(rest.solution(), Drive.of(Waveform.ccif(), c.element("in")));
    MidbandSolution cycle =
        assertInstanceOf(MidbandOutcome.Converged.class, solver.solve(1)).solution();
    Harmonics h = Harmonics.of(cycle.current(c.element("V1")));
    assertEquals(0.25e-3, h.amplitude(1), 1e-15);
    assertEquals(0.25e-3, h.amplitude(39), 1e-15);
    assertEquals(0, h.amplitude(18), 1e-15);
    assertEquals(0, h.amplitude(21), 1e-15);
  }

  /**
   * derived: 60 and 7000 Hz, 4 to 1, through i = x + c x^2 with x = 0.8 cos a + 0.2 cos b: 2 c 0.8
   * 0.2 cos a cos b are side tones of c 0.16 each at 347 and 353, none at 344 and 356.
   */
  @Test
  void sideTonesOfASquareLaw() {
    Circuit c =
        new CircuitSketch()
            .source("in", "g", "0", 0)
            .source("supply", "a", "0", 250)
            .triode("V1", new PolynomialValve(List.of(1e-3, 1e-3, 0.1e-3)), "a", "g", "0")
            .build();
    Converged rest = assertInstanceOf(Converged.class, new DcSolver(c).solve());
    MidbandSolver solver =
        new MidbandSolver(rest.solution(), Drive.of(Waveform.smpte(), c.element("in")));
    MidbandSolution cycle =
        assertInstanceOf(MidbandOutcome.Converged.class, solver.solve(1)).solution();
    Harmonics h = Harmonics.of(cycle.current(c.element("V1")));
    assertEquals(0.2e-3, h.amplitude(350), 1e-14);
    assertEquals(0.016e-3, h.amplitude(347), 1e-14);
    assertEquals(0.016e-3, h.amplitude(353), 1e-14);
    assertEquals(0, h.amplitude(344), 1e-14);
    assertEquals(0, h.amplitude(356), 1e-14);
  }

  /**
   * A sweep gives at each level what the level gives by itself. Tolerance: held voltages are found
   * to 1e-8 V, which the stage's gain of 60 shows as 1e-6 V.
   */
  @Test
  void sweepDoesNotDependOnItsStart() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 300)
            .source("in", "in", "0", 0)
            .holds("input", "in", "g", 1e-7)
            .resistor("grid_leak", "g", "0", 1e6)
            .resistor("anode_load", "B", "a", 100e3)
            .triode("V1", SMALL, "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1.5e3)
            .holds("bypass", "k", "0", 22e-6)
            .build();
    Converged rest = assertInstanceOf(Converged.class, new DcSolver(c).solve());
    Drive drive = Drive.of(Waveform.cosine(64), c.element("in"));
    MidbandSolver sweep = new MidbandSolver(rest.solution(), drive);
    for (double peak = 0.25; peak < 20; peak *= 1.2) {
      MidbandSolution swept =
          assertInstanceOf(MidbandOutcome.Converged.class, sweep.solve(peak)).solution();
      MidbandOutcome alone = new MidbandSolver(rest.solution(), drive).solve(peak);
      MidbandSolution fresh = assertInstanceOf(MidbandOutcome.Converged.class, alone).solution();
      assertEquals(
          fresh.meanVoltage(c.node("a"), 0), swept.meanVoltage(c.node("a"), 0), 2e-6, "at " + peak);
    }
  }
}
