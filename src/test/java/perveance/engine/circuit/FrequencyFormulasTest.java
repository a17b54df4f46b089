package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.circuit.CircuitSketch.Coil;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.circuit.Element.Valve;

/**
 * derived: corner frequencies, input capacitance and taps by the formulas of the handbooks against
 * the nodal engine, with linear valves. Tolerance: half a unit of the last quoted digit, and 1e-6
 * where a corner is compared with its own formula.
 */
class FrequencyFormulasTest {
  private static SmallSignal of(Circuit circuit) {
    Converged found = assertInstanceOf(Converged.class, new DcSolver(circuit).solve());
    return new SmallSignal(found.solution());
  }

  /** f = 1 / (2 pi C (Zout + Rg)): 22 nF, 38.46 k, 1 M give 6.97 Hz. */
  @Test
  void couplingCorner() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 0)
            .resistor("zout", "in", "a", 38.46e3)
            .holds("coupling", "a", "out", 22e-9)
            .resistor("next", "out", "0", 1e6)
            .build();
    Corners corners = of(c).corners(c.element("in"), c.node("out"), 0);
    double formula = 1 / (2 * Math.PI * 22e-9 * 1.03846e6);
    assertEquals(6.97, formula, 0.005);
    assertEquals(formula, corners.low().orElseThrow(), 1e-6 * formula);
    assertTrue(corners.high().isEmpty());
  }

  /** f = 1 / (2 pi R C) above: 100 k source, 100 pF gives 15.9 kHz. */
  @Test
  void strayCorner() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 0)
            .resistor("source", "in", "out", 100e3)
            .stray("c", "out", "0", 100e-12)
            .build();
    Corners corners = of(c).corners(c.element("in"), c.node("out"), 0);
    double formula = 1 / (2 * Math.PI * 100e3 * 100e-12);
    assertEquals(formula, corners.high().orElseThrow(), 1e-6 * formula);
    assertEquals(1, corners.reference(), 1e-7);
  }

  /**
   * Output transformer: (ra parallel RL') / (2 pi Lp) and (ra + RL') / (2 pi Lleak). 15 H, 20 mH,
   * 800 and 2500 ohm give 6.43 Hz and 26.3 kHz. Each formula neglects the other inductance: 1e-3.
   */
  @Test
  void transformerCorners() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g", "0", 0)
            .triode("V1", new LinearTriode(4.2, 800, 0), "a", "g", "0")
            .transformer("t", 15, new Coil("B", "a", 1, 0, 0), new Coil("s", "0", 0.04, 0, 32e-6))
            .resistor("load", "s", "0", 4)
            .build();
    Corners corners = of(c).corners(c.element("in"), c.node("s"), 0);
    assertEquals(6.43, corners.low().orElseThrow(), 1e-3 * 6.43);
    assertEquals(26.3e3, corners.high().orElseThrow(), 2e-3 * 26.3e3);
  }

  /**
   * Cin = Cgk + Cga (1 + |A|): 1.8 + 1.5 and 1.7 + 1.5 pF with a gain of 56 give 185.7 pF; with
   * 42.85 k of source 20 kHz.
   */
  @Test
  void millerCapacitance() {
    // mu 100 and ra 62.5 k have a gain of 56 on 56 / 44 of ra
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g", "0", 0)
            .resistor("anode_load", "B", "a", 62.5e3 * 56 / 44)
            .triode("V1", new LinearTriode(100, 62.5e3, 0), "a", "g", "0")
            .stray("cga", "g", "a", 3.2e-12)
            .stray("cgk", "g", "0", 3.3e-12)
            .build();
    double omega = 2 * Math.PI * 100;
    double capacitance = of(c).inputAdmittance(c.element("in"), 100).im() / omega;
    assertEquals(185.7e-12, capacitance, 0.05e-12);
    assertEquals(42.85e3, 1 / (2 * Math.PI * 20e3 * capacitance), 15);
  }

  /**
   * Screen dropper Rs and bypass Cs: zero 1 / (2 pi Rs Cs), pole (1 + Rs / rs) higher. 1 M, 0.1 uF,
   * rs 132 k: 1.59 Hz, 13.65 Hz, low-frequency gain 0.1166 of the other.
   */
  @Test
  void screenShelf() {
    LinearPentode law = new LinearPentode(2e-3, 38, 1e9, 1 / 132e3);
    CircuitSketch sketch =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g", "0", 0)
            .resistor("anode_load", "B", "a", 100e3)
            .resistor("screen", "B", "s", 1e6)
            .holds("bypass", "s", "0", 0.1e-6);
    int a = sketch.number("a");
    int g = sketch.number("g");
    int s = sketch.number("s");
    Circuit c = sketch.add(new Valve("V1", law, a, g, s, 0)).build();
    SmallSignal signals = of(c);
    int in = c.element("in");
    double full = Math.abs(signals.midbandGain(in, a, 0));
    assertEquals(0.1166, signals.transfer(in, a, 0, 1e-3).magnitude() / full, 5e-5);
    double zero = 1 / (2 * Math.PI * 1e6 * 0.1e-6);
    double pole = zero * (1 + 1e6 / 132e3);
    assertEquals(1.59, zero, 0.005);
    assertEquals(13.65, pole, 0.005);
    double shape = Math.hypot(1, pole / zero) / Math.sqrt(2) * 0.1166;
    assertEquals(shape, signals.transfer(in, a, 0, pole).magnitude() / full, 1e-4);
  }

  /**
   * Distributed screen on a tap x of the anode winding: 1 / ra' = 1 / rp + x gm / mu, mu' = gm ra'.
   * EL34, rp 15 k, gm 11 mA/V, mu(g1-g2) 11. Of the open stage gain and output resistance.
   */
  @ParameterizedTest
  @CsvSource({
    "0.2, 3750, 41.3, 0.5",
    "0.4, 2143, 23.6, 0.5",
    "0.43, 2013, 22.1, 0.5",
    "0.999999, 938, 10.3, 0.5"
  })
  void ultraLinearTap(double tap, double resistance, double mu, double digit) {
    LinearPentode law = new LinearPentode(11e-3, 11, 15e3, 0);
    CircuitSketch sketch =
        new CircuitSketch().source("supply", "B", "0", 250).source("in", "g", "0", -13.5);
    int a = sketch.number("a");
    int s = sketch.number("s");
    Circuit c =
        sketch
            .transformer(
                "t",
                Double.POSITIVE_INFINITY,
                new Coil("B", "s", tap, 0, 0),
                new Coil("s", "a", 1 - tap, 0, 0))
            .add(new Valve("V1", law, a, sketch.number("g"), s, 0))
            .build();
    SmallSignal signals = of(c);
    assertEquals(resistance, signals.midbandOutputResistance(a, 0), digit);
    assertEquals(-mu, signals.midbandGain(c.element("in"), a, 0), 0.051);
  }

  /** Mid-band holds what couples and lifts what is stray, whatever their values are. */
  @Test
  void midbandIgnoresValues() {
    for (double farad : new double[] {1e-12, 1e-3}) {
      Circuit c =
          new CircuitSketch()
              .source("in", "in", "0", 0)
              .resistor("r1", "in", "a", 1e3)
              .holds("coupling", "a", "out", farad)
              .stray("stray", "out", "0", farad)
              .resistor("r2", "out", "0", 3e3)
              .inductor("choke", "out", "0", farad, 10)
              .build();
      SmallSignal signals = of(c);
      assertEquals(0.75, signals.midbandGain(c.element("in"), c.node("out"), 0), 1e-9);
      assertEquals(4e3, signals.midbandInputResistance(c.element("in")), 1e-3);
    }
  }
}
