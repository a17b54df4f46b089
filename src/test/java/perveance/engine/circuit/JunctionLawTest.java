package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class JunctionLawTest {
  /** derived: forward V = n VT ln(I / Is + 1) + I Rs, solved for I and put back. */
  @Test
  void forwardLawIsItsOwnInverse() {
    JunctionLaw law = new JunctionLaw("d", 1e-9, 0.05, 2, Double.POSITIVE_INFINITY, 0.1, 1e-3);
    for (double current = 1e-12; current < 10; current *= 3) {
      double voltage = 0.05 * Math.log1p(current / 1e-9) + current * 2;
      // the branch of the exponential alone carries I + Is, which Rs feels too: 2 nV
      assertEquals(current, law.current(voltage), 1e-6 * current + 1e-16);
    }
  }

  /** derived: the breakdown voltage is met at the test current, and its slope is nz / Iz + Rs. */
  @Test
  void breakdownIsMetAtTheTestCurrent() {
    JunctionLaw law = JunctionLaws.zener(5.1, 5e-3, 40);
    assertEquals(-5e-3, law.current(-5.1), 1e-8);
    assertEquals(40, 1 / law.conductance(-5.1), 0.01);
    assertEquals(0, law.current(-3), 1e-8);
  }

  /** published: forward voltages of data sheets. Tolerance: their limits. */
  @Test
  void dataSheetLimits() {
    assertTrue(JunctionLaws.RECTIFIER_1N4007.current(1.1) > 1, "1N4007: 1.1 V at most at 1 A");
    assertTrue(JunctionLaws.SIGNAL_1N4148.current(0.62) < 5e-3, "1N4448: 0.62 V at least at 5 mA");
    assertTrue(JunctionLaws.SIGNAL_1N4148.current(0.72) > 5e-3, "1N4448: 0.72 V at most at 5 mA");
    assertTrue(JunctionLaws.SIGNAL_1N4148.current(1.0) > 10e-3, "1N4148: 1 V at most at 10 mA");
    assertEquals(10e-3, JunctionLaws.LED_RED.current(1.7), 1e-6);
    assertEquals(10e-3, JunctionLaws.LED_GREEN.current(2.1), 1e-6);
  }

  /** The slope against differences, over laws of all kinds and voltages of both signs. */
  @Test
  void slopeIsTheDerivative() {
    Random random = new Random(5);
    for (int i = 0; i < 2000; i++) {
      double series = random.nextBoolean() ? 0 : Math.pow(10, 4 * random.nextDouble() - 2);
      double breakdown =
          random.nextBoolean() ? Double.POSITIVE_INFINITY : 2 + 20 * random.nextDouble();
      JunctionLaw law = new JunctionLaw("d", 1e-12, 0.04, series, breakdown, 0.2, 5e-3);
      double voltage = 40 * random.nextDouble() - 38;
      double step = 1e-6;
      double slope = (law.current(voltage + step) - law.current(voltage - step)) / (2 * step);
      double expected = law.conductance(voltage);
      assertEquals(slope, expected, 1e-5 * Math.abs(expected) + 1e-12, voltage + " V, " + law);
    }
  }

  @ParameterizedTest
  @CsvSource({"0", "2"})
  void finiteAndRisingEverywhere(double series) {
    JunctionLaw law = new JunctionLaw("d", 1e-14, 0.026, series, 5, 0.03, 1e-3);
    double last = Double.NEGATIVE_INFINITY;
    for (double voltage = -1e4; voltage <= 1e4; voltage += 0.5) {
      double current = law.current(voltage);
      assertTrue(Double.isFinite(current) && Double.isFinite(law.conductance(voltage)));
      assertTrue(current >= last && law.conductance(voltage) >= 0, "at " + voltage);
      last = current;
    }
  }

  @Test
  void refusesWhatHasNoMeaning() {
    assertThrows(IllegalArgumentException.class, () -> JunctionLaws.zener(-5, 5e-3, 40));
    assertThrows(
        IllegalArgumentException.class, () -> new JunctionLaw("d", 0, 0.05, 0, 5, 0.1, 1e-3));
  }

  /** An LED in the cathode holds it near its forward voltage: the stage's current sets the rest. */
  @Test
  void ledBiasesACathode() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .resistor("anode_load", "B", "a", 47e3)
            .triode("V1", new ThreeHalvesTriode(1.6e-3, 40, 0.6, 0, 1), "a", "0", "k")
            .junction("led", "k", "0", JunctionLaws.LED_RED)
            .build();
    DcOutcome outcome = new DcSolver(c).solve();
    DcSolution point = ((DcOutcome.Converged) outcome).solution();
    assertEquals(1.6, point.voltage("k"), 0.1);
    assertEquals(point.current("led"), JunctionLaws.LED_RED.current(point.voltage("k")), 1e-9);
  }
}
