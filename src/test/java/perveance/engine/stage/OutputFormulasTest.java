package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.circuit.Element;

/** Output stages with linear valves against hand formulas, and the rest point that they state. */
class OutputFormulasTest {
  private static final LinearValve EL34 = LinearValve.pentode(11e-3, 15e3, 11, 1e12);

  private static StageBench single(LinearValve law) {
    return new StageBench("single-ended-output", law).with("grid_bias", -20).with("grid_leak", 1e6);
  }

  /**
   * Derived. Ultra-linear, rp 15 k, gm 11 mA/V, mu g1-g2 11: 1 / ra' = 1 / rp + x gm / mu; mu' = gm
   * ra'. x 0, .2, .4, .43, 1: ra' 15 k, 3750, 2143, 2013, 938; mu' 165, 41.3, 23.6, 22.1, 10.3. At
   * x = 1 it is the triode connection; published mu 10.5 and about 910 ohm (EL34 data). The output
   * stands on a secondary of equal turns, so its resistance is ra' and its gain into RL is mu' RL /
   * (ra' + RL).
   */
  @ParameterizedTest
  @CsvSource({
    "0, 15e3, 165",
    "0.2, 3750, 41.25",
    "0.4, 2143, 23.57",
    "0.43, 2013, 22.14",
    "1, 937.5, 10.31"
  })
  void ultraLinear(double tap, double ra, double mu) {
    StageBench bench = single(EL34).with("primary", 3.5e3);
    if (tap == 1) {
      bench.with("connection", "triode");
    } else if (tap > 0) {
      bench.with("connection", "ultra-linear").with("tap", tap);
    } else {
      bench.with("screen_voltage", 250);
    }
    Measured stage = new Measured(bench);
    // the load hangs on the output: take it off by its conductance
    double withLoad = stage.outputResistance();
    double output = 1 / (1 / withLoad - 1 / 3.5e3);
    assertEquals(ra, output, 0.001 * ra);
    assertEquals(-mu * 3.5e3 / (ra + 3.5e3), stage.gain(), 0.001 * mu);
  }

  /**
   * Derived. Primary 15 H, ra 800, load 2500: 6.43 Hz; leakage 20 mH: 26.3 kHz. Each inductance by
   * itself, because in one circuit they shift each other's corner by their ratio, 0.13 %.
   */
  @Test
  void transformerCorners() {
    StageBench bench =
        single(LinearValve.triode(4.2, 800))
            .with("primary", 2.5e3)
            .with("stray_anode", 1e-14)
            .with("secondary_load", 8);
    Measured low = new Measured(bench.copy().with("primary_inductance", 15));
    Measured high = new Measured(bench.copy().with("leakage_inductance", 20e-3));
    double middle = 4.2 * 2500 / 3300 * Math.sqrt(8 / 2.5e3);
    assertEquals(-middle, low.gain(), 1e-5 * middle);
    assertEquals(6.43, low.corners().low().orElseThrow(), 0.005);
    assertEquals(26.3e3, high.corners().high().orElseThrow(), 50);
  }

  /** Derived. The same corners when the inductances are split by a tap. */
  @Test
  void tappedTransformerKeepsItsInductances() {
    double ra = 1 / (1 / 15e3 + 0.4 * 1e-3);
    StageBench bench =
        single(EL34)
            .with("connection", "ultra-linear")
            .with("tap", 0.4)
            .with("primary", 2.5e3)
            .with("primary_inductance", 15)
            .with("secondary_load", 8);
    double parallel = ra * 2500 / (ra + 2500);
    double corner = parallel / (2 * Math.PI * 15);
    assertEquals(corner, new Measured(bench).corners().low().orElseThrow(), 1e-3 * corner);
  }

  /** Derived. Winding resistance stands in series with the load: gain mu RL / (ra + Rw + RL). */
  @Test
  void windingResistance() {
    StageBench bench =
        single(LinearValve.triode(4.2, 800)).with("primary", 2.5e3).with("winding_resistance", 200);
    assertEquals(-4.2 * 2500 / 3500, new Measured(bench).gain(), 1e-4);
  }

  /**
   * Derived. Push-pull in class A: each valve sees half the anode-to-anode load, the output is
   * twice the swing of one anode: 2 mu (Raa/2) / (ra + Raa/2); output resistance 2 ra. With n
   * valves a side ra / n.
   */
  @ParameterizedTest
  @CsvSource({"1", "2"})
  void pushPull(int sections) {
    StageBench bench =
        new StageBench("push-pull-output", LinearValve.triode(4.2, 800))
            .with("primary", 5e3)
            .with("grid_bias", -40)
            .with("sections", sections);
    Measured stage = new Measured(bench);
    double ra = 800.0 / sections;
    double gain = 2 * 4.2 * 2500 / (ra + 2500);
    assertEquals(-gain, stage.gain(), 1e-4);
    assertEquals(2 * ra, 1 / (1 / stage.outputResistance() - 1 / 5e3), 0.01);
    assertEquals(1, stage.gainTo("grid_in"), 1e-4);
    assertEquals(-1, stage.gainTo("grid_in2"), 1e-4);
  }

  /** Derived. Ultra-linear push-pull has ra' in each half as the single valve has. */
  @Test
  void pushPullUltraLinear() {
    StageBench bench =
        new StageBench("push-pull-output", EL34)
            .with("primary", 6.6e3)
            .with("grid_bias", -30)
            .with("connection", "ultra-linear")
            .with("tap", 0.43);
    Measured stage = new Measured(bench);
    double ra = 1 / (1 / 15e3 + 0.43 * 1e-3);
    double gain = 2 * 11e-3 * ra * 3300 / (ra + 3300);
    assertEquals(-gain, stage.gain(), 1e-4 * gain);
  }

  /** Derived. In class A balanced signals leave a shared cathode resistor without signal. */
  @Test
  void sharedCathodeResistorCarriesNoSignal() {
    StageBench bench =
        new StageBench("push-pull-output", LinearValve.triode(4.2, 800))
            .with("primary", 5e3)
            .with("cathode_resistor", 250)
            .with("shared", true);
    Measured stage = new Measured(bench);
    assertEquals(0, stage.gainTo("cathode"), 1e-9);
    assertEquals(-2 * 4.2 * 2500 / 3300, stage.gain(), 1e-4);
    StageBench apart = bench.copy().without("shared");
    double each = 4.2 * 2500 / (3300 + 5.2 * 250);
    assertEquals(-2 * each, new Measured(apart).gain(), 1e-4);
  }

  /**
   * Derived. Stated electrode voltages hold to cathode at rest whatever the cathode resistor, the
   * winding and the screen resistor take, for one valve and for two that share.
   */
  @ParameterizedTest
  @CsvSource({"single-ended-output, false", "push-pull-output, false", "push-pull-output, true"})
  void statedVoltagesHoldAtRest(String kind, boolean shared) {
    StageBench bench =
        new StageBench(kind, LinearValve.pentode(5e-3, 50e3, 10, 20e3))
            .without("supply")
            .with("anode_voltage", 250)
            .with("screen_voltage", 200)
            .with("screen_resistor", 1e3)
            .with("winding_resistance", 300)
            .with("primary", 5e3)
            .with("cathode_resistor", 150);
    if (shared) {
      bench.with("shared", true);
    }
    Measured stage = new Measured(bench);
    double cathode = stage.volts("cathode");
    assertTrue(cathode > 5, "the cathode is raised");
    assertEquals(250, stage.volts("anode") - cathode, 1e-6);
    assertEquals(200, stage.volts("screen") - cathode, 1e-6);
    // the rail stands above the anode by what the winding takes
    assertTrue(stage.volts("anode_supply") > stage.volts("anode") + 1);
  }

  /** Derived. In the ultra-linear connection the tap shares the winding's drop. */
  @Test
  void tapSharesTheDrop() {
    StageBench bench =
        single(LinearValve.pentode(5e-3, 50e3, 10, 20e3))
            .with("connection", "ultra-linear")
            .with("tap", 0.4)
            .with("winding_resistance", 300)
            .with("primary", 5e3);
    Measured stage = new Measured(bench);
    Element.Transformer transformer =
        (Element.Transformer) stage.circuit.elements().get(stage.circuit.element("V1.primary"));
    assertEquals(120, transformer.windings().get(0).resistance(), 1e-9);
    assertEquals(180, transformer.windings().get(1).resistance(), 1e-9);
  }
}
