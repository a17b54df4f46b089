package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.circuit.DcOutcome.Converged;

class NoiseTest {
  /**
   * published: equivalent noise resistances of pentodes and triodes (W. A. Harris, RCA Review 5,
   * 1941, and the handbook tables made from it). Tolerance: 1.6 %, the tables' rounding to two or
   * three digits and, for the triodes, of gm to two.
   */
  @ParameterizedTest
  @CsvSource({
    "6AC7, 10, 2.5, 9.0, 720",
    "6AB7, 12.5, 3.2, 5.0, 2440",
    "6SG7, 11.8, 4.4, 4.7, 3300",
    "6SJ7, 3.0, 0.8, 1.65, 5840",
    "6SK7, 9.2, 2.4, 2.0, 10500",
    "956, 5.5, 1.8, 1.8, 9400",
    "6AK5, 7.5, 2.5, 5.0, 1880",
    "6AU6, 10.8, 4.3, 5.2, 2660",
    "6J5, 9, 0, 2.6, 960",
    "955, 7, 0, 2.0, 1250",
    "6AC7 triode, 12.5, 0, 11.2, 220"
  })
  void equivalentResistanceAsTabulated(
      String type, double anode, double screen, double gm, double published) {
    double ours = ValveNoise.resistance(anode / 1e3, screen / 1e3, gm / 1e3);
    assertEquals(published, ours, 0.016 * published, type);
  }

  /**
   * derived: sqrt(4 k T R B) at 290 K in 20 kHz: 1 k, 10 k, 100 k, 1 M give 0.566, 1.790, 5.660,
   * 17.90 uV. Tolerance: half of the last digit.
   */
  @ParameterizedTest
  @CsvSource({
    "1e3, 0.566e-6, 0.5e-9",
    "10e3, 1.790e-6, 0.5e-9",
    "100e3, 5.660e-6, 0.5e-9",
    "1e6, 17.90e-6, 5e-9"
  })
  void resistorAsByNyquist(double ohm, double expected, double digit) {
    Circuit c =
        new CircuitSketch().source("in", "in", "0", 0).resistor("r", "in", "out", ohm).build();
    NoiseAnswer answer = noise(c, NoiseBand.of(1, 20001));
    assertEquals(expected, answer.output(), digit);
    assertEquals(expected, answer.input(), digit);
  }

  /**
   * derived: k T / C. A resistor with a capacitor across it, summed over all frequencies, makes
   * sqrt(k T / C) whatever the resistance: 1 nF at 290 K gives 2.001 uV. Summed from 1 mHz to 1
   * GHz, which leaves out less than 1e-3 of the power for a corner of 15.9 kHz.
   */
  @Test
  void capacitorLimitsTheBand() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 0)
            .resistor("r", "in", "out", 10e3)
            .stray("c", "out", "0", 1e-9)
            .build();
    double expected = Math.sqrt(1.380649e-23 * 290 / 1e-9);
    assertEquals(expected, noise(c, NoiseBand.of(1e-3, 1e9)).output(), 1e-3 * expected);
  }

  /**
   * derived: common cathode, mu 100, ra 62.5 k, Ra 100 k, source 10 k, grid leak 1 M. With A = -mu
   * Ra / (ra + Ra), p = Rs parallel Rg and Zout = Ra parallel ra the output density is 4kT (A^2 (p
   * + 2.5 / gm) + Zout^2 / Ra). Flat, so the flicker term is fc ln(f2 / f1) / (f2 - f1) of the
   * valve's. Tolerance: Simpson's rule, 1e-5.
   */
  @Test
  void stageNoiseAsByHand() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "in", "0", 0)
            .resistor("source", "in", "g", 10e3)
            .resistor("grid_leak", "g", "0", 1e6)
            .resistor("anode_load", "B", "out", 100e3)
            .triode("V1", new LinearTriode(100, 62.5e3, 0), "out", "g", "0")
            .build();
    double gain = 100 * 100e3 / 162.5e3;
    double parallel = 10e3 * 1e6 / 1010e3;
    double valve = 2.5 / 1.6e-3;
    double zout = 62.5e3 * 100e3 / 162.5e3;
    double f1 = 20;
    double f2 = 20e3;
    double flicker = 1 + 1000 * Math.log(f2 / f1) / (f2 - f1);
    double each = 4 * 1.380649e-23 * 290 * (f2 - f1);
    double expected =
        Math.sqrt(each * (gain * gain * (parallel + valve * flicker) + zout * zout / 100e3));
    NoiseAnswer answer = noise(c, NoiseBand.of(f1, f2).withFlickerCorner(1000));
    assertEquals(expected, answer.output(), 1e-5 * expected);
    assertEquals(expected / (gain * 1e6 / 1010e3), answer.input(), 1e-5 * expected);
    assertEquals("source", answer.shares().get(0).element());
    double sum = answer.shares().stream().mapToDouble(NoiseAnswer.Share::fraction).sum();
    assertEquals(1, sum, 1e-12);
    assertTrue(answer.shares().stream().anyMatch(s -> s.element().equals("V1")));
  }

  /** derived: a winding of 100 ohm in series with the output of a dead source: 4 k T 100. */
  @Test
  void windingResistanceIsNoisy() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 0)
            .inductor("choke", "in", "out", 1e-9, 100)
            .build();
    double expected = Math.sqrt(4 * 1.380649e-23 * 290 * 100 * 1e3);
    assertEquals(expected, noise(c, NoiseBand.of(1000, 2000)).output(), 1e-6 * expected);
  }

  private static NoiseAnswer noise(Circuit c, NoiseBand band) {
    Converged found = assertInstanceOf(Converged.class, new DcSolver(c).solve());
    return new Noise(found.solution()).between(c.element("in"), c.node("out"), 0, band);
  }
}
