package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;

/**
 * Questions that builders and repairers ask, with the answers that a plain three-halves law through
 * one published point gives by hand ({@link YardstickTriode}). Derived: the circuit with that same
 * law must give the same figures to the digits in which they stand.
 */
class BenchQuestionsTest {
  private static StageBench twelveAx7(double rk) {
    return new StageBench("common-cathode", YardstickTriode.T12AX7)
        .with("anode_load", 100e3)
        .with("cathode_resistor", rk)
        .with("cathode_bypass", 22e-6)
        .with("grid_leak", 1e6);
  }

  /** What cathode resistor gives -1.5 V? 285 V, 100 k: 1.53 k, with 0.98 mA and 187 V. */
  @Test
  void wantedBias() {
    Measured stage = new Measured(twelveAx7(1.53e3), 285);
    assertEquals(1.5, stage.volts("cathode"), 0.005);
    assertEquals(0.98e-3, stage.amperes("V1"), 0.005e-3);
    assertEquals(187, stage.volts("anode"), 0.5);
    StageBench fixed = twelveAx7(1e3).without("cathode_resistor").without("cathode_bypass");
    Measured negative = new Measured(fixed.with("grid_bias", -1.5), 285);
    assertEquals(0.98e-3, negative.amperes("V1"), 0.015e-3);
  }

  /**
   * Where does it sit? 310 V, 100 k with the cathode resistor given: current, anode and cathode.
   * The anode's dissipation at 1.5 k is 0.215 W.
   */
  @ParameterizedTest
  @CsvSource({
    "820, 1.37e-3, 173, ",
    "1.2e3, 1.18e-3, 192, 1.42",
    "1.5e3, 1.07e-3, 203, 1.60",
    "1.8e3, 0.97e-3, 213, 1.75",
    "2.7e3, 0.77e-3, 233, ",
    "10e3, 0.30e-3, 280, "
  })
  void givenResistors(double rk, double current, double anode, @Nullable Double cathode) {
    Measured stage = new Measured(twelveAx7(rk), 310);
    assertEquals(current, stage.amperes("V1"), 0.006e-3);
    assertEquals(anode, stage.volts("anode"), 0.6);
    if (cathode != null) {
      assertEquals(cathode, stage.volts("cathode"), 0.006);
    }
    if (rk == 1.5e3) {
      double power = (stage.volts("anode") - stage.volts("cathode")) * stage.amperes("V1");
      assertEquals(0.215, power, 0.001);
    }
  }

  /** What gain, bypassed and not? 1 M: 58 and 30; 220 k: 51 and 24; 470 k: 56, output 39 k. */
  @ParameterizedTest
  @CsvSource({"1e6, 58, 30", "220e3, 51, 24"})
  void gainIntoALoad(double load, double bypassed, double not) {
    StageBench bench = twelveAx7(1.5e3).with("load", load);
    assertEquals(-bypassed, new Measured(bench, 310).gain(), 0.6);
    StageBench plain = bench.copy().without("cathode_bypass");
    // printed to whole numbers; the unbypassed ones come out at 29.5 and 24.7
    assertEquals(-not, new Measured(plain, 310).gain(), 0.8);
  }

  @Test
  void standardStage() {
    Measured stage = new Measured(twelveAx7(1.5e3), 310);
    assertEquals(39e3, stage.outputResistance(), 500);
    Measured loaded = new Measured(twelveAx7(1.5e3).with("load", 470e3), 310);
    assertEquals(-56, loaded.gain(), 0.5);
  }

  /**
   * Direct-coupled follower on the standard stage, 100 k: cathode near 203 V, 2.03 mA, grid about
   * -0.1 V to it, output near 0.5 k.
   */
  @Test
  void directCoupledFollower() {
    ChassisCircuits circuits =
        new ChassisBench()
            .device("12AX7", YardstickTriode.T12AX7)
            .supply("A", 310)
            .stage(
                "V1a",
                "common-cathode",
                "device",
                "12AX7",
                "supply",
                "A",
                "anode_load",
                100e3,
                "cathode_resistor",
                1.5e3,
                "drives",
                "V1b")
            .stage(
                "V1b", "cathode-follower", "device", "12AX7", "supply", "A", "cathode_load", 100e3)
            .circuits();
    Circuit circuit = circuits.whole().circuit();
    DcSolution point = ((DcOutcome.Converged) new DcSolver(circuit).solve()).solution();
    assertEquals(203, point.voltage("V1b.cathode"), 1);
    assertEquals(2.03e-3, point.current("V1b"), 0.01e-3);
    double bias = point.voltage("V1a.anode") - point.voltage("V1b.cathode");
    assertTrue(bias > -0.2 && bias < 0, "grid to cathode " + bias);
  }

  /**
   * Concertina 6SN7, 320 V, 22 k + 22 k, grid at 85 V: 4.08 mA, cathode 90 V, anode 230 V, gain
   * 0.89; resistors 5 % off in opposite ways unbalance it by 0.87 dB.
   */
  @Test
  void concertina() {
    StageBench bench =
        new StageBench("concertina", YardstickTriode.T6SN7)
            .with("anode_load", 22e3)
            .with("cathode_load", 22e3)
            .with("grid_bias", 85);
    Measured stage = new Measured(bench, 320);
    assertEquals(4.08e-3, stage.amperes("V1"), 0.005e-3);
    assertEquals(90, stage.volts("cathode"), 0.5);
    assertEquals(230, stage.volts("anode"), 0.5);
    assertEquals(0.89, stage.gain(1), 0.005);
    Measured off =
        new Measured(
            bench.copy().with("anode_load", 22e3 * 1.05).with("cathode_load", 22e3 * 0.95), 320);
    assertEquals(0.87, 20 * Math.log10(-off.gain(0) / off.gain(1)), 0.005);
  }

  /**
   * A diode of 1.6 V instead of 1.5 k: valves of 0.7, 1 and 1.3 times the current give 0.92, 1.07,
   * 1.18 mA (resistor 0.98, 1.07, 1.12). The sum took the diode as a fixed voltage; its own slope
   * of 52 mV to the e-fold moves the outer figures by less than 0.01 mA.
   */
  @ParameterizedTest
  @CsvSource({"0.7, 0.92e-3, 0.98e-3", "1, 1.07e-3, 1.07e-3", "1.3, 1.18e-3, 1.12e-3"})
  void diodeBias(double conduction, double withDiode, double withResistor) {
    StageBench diode = twelveAx7(1).without("cathode_resistor").without("cathode_bypass");
    diode.with("cathode_voltage", 1.6).in(supplied(310));
    assertEquals(withDiode, specimen(diode, conduction), 0.01e-3);
    assertEquals(withResistor, specimen(twelveAx7(1.5e3), conduction), 0.01e-3);
  }

  private static Surroundings supplied(double voltage) {
    Surroundings none = Surroundings.NONE;
    return new Surroundings(
        none.directInput(),
        none.directInput2(),
        none.drivenBy(),
        none.sourceResistance(),
        none.directOutput(),
        none.next(),
        java.util.OptionalDouble.of(voltage));
  }

  /** Current of the stage with another specimen in the socket: the diode stays the same. */
  private static double specimen(StageBench bench, double conduction) {
    Circuit circuit = bench.build(310).circuit();
    DcSolver solver = new DcSolver(circuit);
    solver.setLaw(circuit.element("V1"), YardstickTriode.T12AX7.specimen(conduction, 0));
    return ((DcOutcome.Converged) solver.solve()).solution().current("V1");
  }

  /**
   * Current source instead of 15 k: 6SN7, 8 mA, 150 V need -3.4 V; with 15 k the supply would have
   * to be 273 V (the cathode's 3.4 V included) and the gain 12.7, with the source near mu = 20. The
   * law gives gm 2.50 mA/V there, ra 8.0 k and so 13.0; 12.7 is within the 10 % that the question
   * allows its gain.
   */
  @Test
  void constantCurrentLoad() {
    StageBench bench =
        new StageBench("common-cathode", YardstickTriode.T6SN7)
            .with("grid_bias", -3.4)
            .with("grid_leak", 1e6);
    Measured resistor = new Measured(bench.copy().with("anode_load", 15e3), 270);
    assertEquals(8e-3, resistor.amperes("V1"), 0.1e-3);
    assertEquals(150, resistor.volts("anode"), 1);
    assertEquals(-12.7, resistor.gain(), 1.27);
    assertEquals(-20 * 15e3 / (15e3 + 8.006e3), resistor.gain(), 0.01);
    Measured source = new Measured(bench.copy().with("anode_current", 8e-3), 200);
    assertEquals(150, source.volts("anode"), 2);
    assertEquals(-20, source.gain(), 0.05);
  }

  /** Totem pole 6SN7, 290 V, 680 ohm twice: 5.7 mA, cathode 3.9 V, midpoint 145 to 149 V. */
  @Test
  void totemPole() {
    StageBench bench =
        new StageBench("totem-pole", YardstickTriode.T6SN7)
            .with("cathode_resistor", 680)
            .with("grid_leak", 1e6);
    Measured stage = new Measured(bench, 290);
    assertEquals(5.7e-3, stage.amperes("V1a"), 0.05e-3);
    assertEquals(3.9, stage.volts("cathode"), 0.05);
    assertEquals(149, stage.volts("upper_cathode"), 0.5);
    assertEquals(145, stage.volts("lower_anode"), 0.5);
  }

  /**
   * Small pentode: 260 V, 0.75 mA and 0.16 mA through 220 k and 1 M: anode 95 V, screen 100 V,
   * cathode 2.0 V on 2.2 k. The valve here takes just these currents, so it is Ohm's law alone.
   */
  @Test
  void smallPentode() {
    StageBench bench =
        new StageBench("common-cathode", new FixedPentode(0.75e-3, 0.16e-3))
            .with("anode_load", 220e3)
            .with("screen_resistor", 1e6)
            .with("screen_bypass", 0.15e-6)
            .with("cathode_resistor", 2.2e3)
            .with("grid_leak", 1e6);
    Measured stage = new Measured(bench, 260);
    assertEquals(95, stage.volts("anode"), 0.01);
    assertEquals(100, stage.volts("screen"), 0.01);
    assertEquals(2.0, stage.volts("cathode"), 0.005);
  }

  /**
   * Cathode-biased pair on one 250 ohm with 20.0 V, anodes 340 V, 8 % screen: 40 mA of cathode and
   * 36.8 mA of anode current each, 320 V, 11.8 W and not 13.6 W; 1.6 W in the resistor. Back to
   * fixed bias the 20 V come back to the anode.
   */
  @Test
  void sharedCathodeResistor() {
    StageBench bench =
        new StageBench("push-pull-output", new FixedPentode(36.8e-3, 3.2e-3))
            .with("primary", 8e3)
            .with("cathode_resistor", 250)
            .with("shared", true);
    Measured stage = new Measured(bench, 340);
    double cathode = stage.volts("cathode");
    assertEquals(20.0, cathode, 1e-6);
    double anode = stage.volts("anode") - cathode;
    assertEquals(320, anode, 1e-6);
    assertEquals(11.8, anode * stage.amperes("V1a"), 0.05);
    assertEquals(1.6, stage.point.power("V1.cathode_resistor"), 1e-6);
    StageBench fixed =
        bench.copy().without("cathode_resistor").without("shared").with("grid_bias", -20);
    assertEquals(340, new Measured(fixed, 340).volts("anode"), 1e-6);
  }
}
