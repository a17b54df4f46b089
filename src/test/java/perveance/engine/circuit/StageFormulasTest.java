package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.circuit.DcOutcome.Converged;

/**
 * derived: the stage formulas of the handbooks for a linear triode (gm, ra) against the nodal
 * engine. Each case states its inputs; the expected figure is the formula in the case's comment,
 * computed here from those inputs, and beside it the figure as it is usually quoted. Tolerance:
 * rounding of the nodal solution and its leak of 1e-13 S (1e-6), and half a unit of the last quoted
 * digit.
 */
class StageFormulasTest {
  private static SmallSignal of(Circuit circuit) {
    Converged found = assertInstanceOf(Converged.class, new DcSolver(circuit).solve());
    return new SmallSignal(found.solution());
  }

  private static double gain(Circuit c, String node) {
    return of(c).midbandGain(c.element("in"), c.node(node), 0);
  }

  private static double output(Circuit c, String node) {
    return of(c).midbandOutputResistance(c.node(node), 0);
  }

  private static CircuitSketch stage() {
    return new CircuitSketch().source("supply", "B", "0", 250).source("in", "g", "0", 0);
  }

  private static LinearTriode triode(double mu, double ra) {
    return new LinearTriode(mu, ra, 0);
  }

  /** A = mu Ra' / (ra + Ra'), Ra' = Ra parallel next grid leak. */
  @ParameterizedTest
  @CsvSource({
    "100, 80e3, 220e3, 470e3, 65.20, 0.005",
    "60, 10.9e3, 3e3, 1e12, 12.95, 0.005",
    "17, 7.7e3, 3e3, 1e12, 4.766, 0.0005",
    "41, 4.8e3, 3e3, 1e12, 15.77, 0.005",
    "100, 80e3, 3e3, 1e12, 3.614, 0.0005"
  })
  void commonCathodeBypassed(
      double mu, double ra, double load, double next, double quoted, double digit) {
    Circuit c =
        stage()
            .resistor("anode_load", "B", "a", load)
            .triode("V1", triode(mu, ra), "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1e3)
            .holds("bypass", "k", "0", 1e-5)
            .holds("coupling", "a", "out", 1e-7)
            .resistor("next", "out", "0", next)
            .build();
    double parallel = 1 / (1 / load + 1 / next);
    assertEquals(-mu * parallel / (ra + parallel), gain(c, "out"), 1e-6 * mu);
    assertEquals(-quoted, gain(c, "out"), digit);
  }

  /** A = mu Ra' / (ra + Ra' + (mu + 1) Rk): mu 100, 80 k, 220 k, 470 k, Rk 3.3 k gives 26.61. */
  @Test
  void commonCathodeUnbypassed() {
    Circuit c =
        stage()
            .resistor("anode_load", "B", "a", 220e3)
            .triode("V1", triode(100, 80e3), "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 3.3e3)
            .holds("coupling", "a", "out", 1e-7)
            .resistor("next", "out", "0", 470e3)
            .build();
    assertEquals(-26.61, gain(c, "out"), 0.005);
  }

  private static Circuit reference(boolean loaded, double bypass) {
    CircuitSketch sketch =
        stage()
            .resistor("anode_load", "B", "a", 100e3)
            .triode("V1", triode(100, 62.5e3), "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1.5e3);
    if (bypass > 0) {
      sketch.holds("bypass", "k", "0", bypass);
    }
    sketch.holds("coupling", "a", "out", 22e-9);
    return sketch.resistor("next", "out", "0", loaded ? 1e6 : 1e12).build();
  }

  /**
   * mu 100, ra 62.5 k, Ra 100 k, Rk 1.5 k, next 1 M: bypassed -59.26, unbypassed -29.82; without
   * the next stage -61.54 and -31.85; output 38.46 k and 68.15 k.
   */
  @Test
  void referenceStageGainsAndOutputResistances() {
    assertEquals(-59.26, gain(reference(true, 22e-6), "out"), 0.005);
    assertEquals(-29.82, gain(reference(true, 0), "out"), 0.005);
    assertEquals(-61.54, gain(reference(false, 22e-6), "out"), 0.005);
    assertEquals(-31.85, gain(reference(false, 0), "out"), 0.005);
    assertEquals(38.46e3, output(reference(false, 22e-6), "a"), 5);
    assertEquals(68.15e3, output(reference(false, 0), "a"), 5);
  }

  /**
   * The bypass shelf of the same stage without coupling: zero f1 = 1 / (2 pi Rk Ck), pole f2 = f1
   * (1 + (mu + 1) Rk / (ra + Ra')). With 0.68 uF 156.0 and 310.1 Hz; |A| at f1 37.67, at f2 46.91,
   * at the geometric mean 42.03.
   */
  @Test
  void bypassShelf() {
    Circuit c =
        stage()
            .resistor("anode_load", "B", "a", 1 / (1 / 100e3 + 1 / 1e6))
            .triode("V1", triode(100, 62.5e3), "a", "g", "k")
            .resistor("cathode_resistor", "k", "0", 1.5e3)
            .holds("bypass", "k", "0", 0.68e-6)
            .build();
    SmallSignal signals = of(c);
    double f1 = 1 / (2 * Math.PI * 1.5e3 * 0.68e-6);
    double f2 = f1 * (1 + 101 * 1.5e3 / (62.5e3 + 90909.0909));
    int in = c.element("in");
    int a = c.node("a");
    assertEquals(156.0, f1, 0.05);
    assertEquals(310.1, f2, 0.05);
    assertEquals(37.67, signals.transfer(in, a, 0, f1).magnitude(), 0.005);
    assertEquals(46.91, signals.transfer(in, a, 0, f2).magnitude(), 0.005);
    assertEquals(42.03, signals.transfer(in, a, 0, Math.sqrt(f1 * f2)).magnitude(), 0.005);
  }

  /** A = mu Rk / (ra + (mu + 1) Rk), Zout = Rk parallel ra / (mu + 1). */
  @ParameterizedTest
  @CsvSource({"17, 7.7e3, 22e3, 0.92643, 419.6", "20, 7.7e3, 20e3, 0.93523, 360.1"})
  void cathodeFollower(double mu, double ra, double rk, double quoted, double quotedOutput) {
    Circuit c =
        stage().triode("V1", triode(mu, ra), "B", "g", "k").resistor("load", "k", "0", rk).build();
    assertEquals(quoted, gain(c, "k"), 5e-6);
    assertEquals(quotedOutput, output(c, "k"), 0.05);
  }

  /** A = (mu + 1) RL / (ra + RL), Rin = (ra + RL) / (mu + 1): 40.79 and 539.3 ohm. */
  @Test
  void groundedGrid() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "k", "0", 0)
            .resistor("anode_load", "B", "a", 22e3)
            .triode("V1", triode(60, 10.9e3), "a", "0", "k")
            .build();
    assertEquals(40.79, gain(c, "a"), 0.005);
    assertEquals(539.3, of(c).midbandInputResistance(c.element("in")), 0.05);
  }

  /** A = -mu (mu + 1) RL / (RL + ra + (mu + 1) ra), mu 33, ra 2.65 k, 22 k: -215.1, 17.78 k. */
  @Test
  void cascode() {
    Circuit c =
        stage()
            .resistor("anode_load", "B", "a", 22e3)
            .source("bias", "g2", "0", 80)
            .triode("V2", triode(33, 2.65e3), "a", "g2", "m")
            .triode("V1", triode(33, 2.65e3), "m", "g", "0")
            .build();
    assertEquals(-215.1, gain(c, "a"), 0.05);
    assertEquals(17.78e3, output(c, "a"), 5);
  }

  /** One grid driven: i2 / i1 = (mu + 1) Rt / ((mu + 1) Rt + R2 + ra). */
  @ParameterizedTest
  @CsvSource({
    "20, 7.7e3, 21.87e3, 26e3, 8.5e3, -7.552, 7.552",
    "20, 7.7e3, 26e3, 26e3, 8.5e3, -8.381, 7.050",
    "100, 62.5e3, 100e3, 100e3, 10e3, -33.06, 28.48",
    "100, 62.5e3, 82e3, 100e3, 10e3, -28.825, 30.28"
  })
  void longTailedPair(
      double mu, double ra, double r1, double r2, double tail, double first, double second) {
    Circuit c =
        stage()
            .resistor("load1", "B", "a1", r1)
            .resistor("load2", "B", "a2", r2)
            .triode("V1", triode(mu, ra), "a1", "g", "k")
            .triode("V2", triode(mu, ra), "a2", "0", "k")
            .resistor("tail", "k", "0", tail)
            .build();
    double digit = Math.abs(first) > 10 ? 0.005 : 0.0015;
    assertEquals(first, gain(c, "a1"), digit);
    assertEquals(second, gain(c, "a2"), digit);
  }

  /**
   * Concertina, Ra = Rk = R: A = mu R / (ra + (mu + 2) R); between the outputs, R ra / (ra + (mu +
   * 2) R) a side; single-ended R parallel (ra + R) / (mu + 1) and R parallel (ra + (mu + 1) R).
   */
  @ParameterizedTest
  @CsvSource({
    "20, 7.7e3, 22e3, 0.8949, 344.5, 1329, 21.0e3, 50",
    "100, 62.5e3, 100e3, 0.9744, 609, 1583, 99.0e3, 50"
  })
  void concertina(
      double mu, double ra, double r, double gain, double side, double k, double a, double digit) {
    Circuit c =
        stage()
            .resistor("anode_load", "B", "a", r)
            .triode("V1", triode(mu, ra), "a", "g", "k")
            .resistor("cathode_load", "k", "0", r)
            .build();
    SmallSignal signals = of(c);
    assertEquals(gain, gain(c, "k"), 5e-5);
    assertEquals(-gain, gain(c, "a"), 5e-5);
    double across = signals.midbandOutputResistance(c.node("a"), c.node("k"));
    assertEquals(side, across / 2, 0.5);
    assertEquals(k, output(c, "k"), 0.5);
    assertEquals(a, output(c, "a"), digit);
  }

  /** A0 = -mu (ra + mu R) / (2 ra + (mu + 1) R), Zout = ra (ra + R) / (2 ra + (mu + 1) R). */
  @ParameterizedTest
  @CsvSource({
    "33, 2.65e3, 220, -25.59, 595, 0.5",
    "33, 2.65e3, 470, -28.16, 388.5, 0.05",
    "33, 2.65e3, 680, -29.13, 310.5, 0.05"
  })
  void totemPole(double mu, double ra, double r, double gain, double zout, double digit) {
    Circuit c =
        stage()
            .triode("V2", triode(mu, ra), "B", "m", "out")
            .resistor("between", "out", "m", r)
            .triode("V1", triode(mu, ra), "m", "g", "0")
            .build();
    assertEquals(gain, gain(c, "out"), 0.005);
    assertEquals(zout, output(c, "out"), digit);
  }

  /** The same with the upper grid coupled: mu 20, 7.7 k, 22 k: -18.76, anode -19.68, 479 ohm. */
  @Test
  void muFollower() {
    Circuit c =
        stage()
            .triode("V2", triode(20, 7.7e3), "B", "g2", "out")
            .resistor("between", "out", "m", 22e3)
            .holds("couple", "m", "g2", 1e-7)
            .resistor("leak", "g2", "out", 1e12)
            .triode("V1", triode(20, 7.7e3), "m", "g", "0")
            .build();
    assertEquals(-18.76, gain(c, "out"), 0.005);
    assertEquals(-19.68, gain(c, "m"), 0.005);
    assertEquals(479, output(c, "out"), 0.5);
  }

  /** mu 33, ra 2.65 k, resistor in the upper anode, lower cathode bypassed. */
  @ParameterizedTest
  @CsvSource({"100, 0.9576, 35.5, 0.05", "1e3, 0.9677, 7.96, 0.005", "10e3, 0.9695, 2.96, 0.005"})
  void whiteFollower(double r, double gain, double zout, double digit) {
    Circuit c =
        stage()
            .resistor("anode_resistor", "B", "a", r)
            .triode("V1", triode(33, 2.65e3), "a", "g", "out")
            .triode("V2", triode(33, 2.65e3), "out", "g2", "0")
            .holds("couple", "a", "g2", 1e-7)
            .resistor("leak", "g2", "0", 1e12)
            .build();
    assertEquals(gain, gain(c, "out"), 5e-5);
    assertEquals(zout, output(c, "out"), digit);
  }
}
