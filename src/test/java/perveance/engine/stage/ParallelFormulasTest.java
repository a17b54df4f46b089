package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Derived: sections in parallel, and screens fed together, with linear valves against hand
 * formulas. n sections have n times the mutual conductance and an n-th of the anode resistance.
 * Tolerances are the digits of the sums; mid-band figures differ from them by the corners, below
 * 1e-5.
 */
class ParallelFormulasTest {
  /** Gain n gm (Ra || ra / n) with the screens held still by the bypass. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 4})
  void pentodes(int sections) {
    StageBench bench =
        new StageBench("common-cathode", LinearValve.pentode(2e-3, 1e6, 40, 50e3))
            .with("sections", sections)
            .with("anode_load", 22e3)
            .with("cathode_resistor", 1e3)
            .with("cathode_bypass", 100e-6)
            .with("screen_resistor", 100e3)
            .with("screen_bypass", 1e-6)
            .with("grid_stopper", 1e3)
            .with("grid_leak", 1e6);
    double seen = 1 / (1 / 22e3 + sections / 1e6);
    double gain = sections * 2e-3 * seen;
    Measured stage = new Measured(bench);
    assertEquals(-gain, stage.gain(), 1e-4 * gain);
    assertEquals(seen, stage.outputResistance(), 1e-4 * seen);
  }

  /** Follower: gain mu R / (ra / n + (mu + 1) R), output resistance ra / n / (mu + 1) beside R. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3})
  void followers(int sections) {
    StageBench bench =
        new StageBench("cathode-follower", LinearValve.triode(20, 7.7e3))
            .with("sections", sections)
            .with("cathode_load", 10e3)
            .with("grid_bias", 80)
            .with("grid_stopper", 1e3)
            .with("grid_leak", 1e6);
    double ra = 7.7e3 / sections;
    double gain = 20 * 10e3 / (ra + 21 * 10e3);
    double output = 1 / (21 / ra + 1 / 10e3);
    Measured stage = new Measured(bench);
    assertEquals(gain, stage.gain(), 1e-5);
    assertEquals(output, stage.outputResistance(), 1e-3 * output);
  }

  /** Two valves of 5 mA a screen through 10 k from 250 V: 150 V on both screens. */
  @Test
  void oneDropperCarriesAllScreenCurrents() {
    StageBench bench =
        new StageBench("push-pull-output", new FixedPentode(40e-3, 5e-3))
            .with("primary", 6.6e3)
            .with("grid_bias", -20)
            .with("screen_dropper", 10e3)
            .with("screen_bypass", 22e-6);
    assertEquals(150, new Measured(bench).volts("screen_feed"), 1e-6);
  }

  /** Stated screen volts hold at rest behind a dropper and a resistor for each valve. */
  @Test
  void statedScreenVoltageHoldsBehindTheDropper() {
    StageBench bench =
        new StageBench("push-pull-output", LinearValve.pentode(5e-3, 50e3, 10, 20e3))
            .without("supply")
            .with("sections", 2)
            .with("anode_voltage", 400)
            .with("screen_voltage", 300)
            .with("screen_resistor", 470)
            .with("screen_dropper", 1e3)
            .with("cathode_resistor", 100)
            .with("shared", true)
            .with("primary", 5e3);
    Measured stage = new Measured(bench);
    assertEquals(300, stage.volts("screen") - stage.volts("cathode"), 1e-6);
    assertEquals(300, stage.volts("screen4") - stage.volts("cathode"), 1e-6);
  }

  /**
   * One side driven alone moves the screens' common feed: without a bypass by the screen currents'
   * sum through the dropper, with one not at all. Antiphase drive of like valves moves it in
   * neither case, so the gain is that of still screens: 2 gm (ra || Raa / 2).
   */
  @Test
  void antiphaseScreenCurrentsCancelInTheDropper() {
    StageBench bench =
        new StageBench("push-pull-output", LinearValve.pentode(5e-3, 50e3, 10, 20e3))
            .with("primary", 6.6e3)
            .with("grid_bias", -20)
            .with("screen_dropper", 4.7e3);
    Measured stage = new Measured(bench);
    double gain = 2 * 5e-3 / (1 / 50e3 + 1 / 3.3e3);
    assertEquals(0, stage.gainTo("screen_feed"), 1e-9);
    assertEquals(-gain, stage.gain(), 1e-4 * gain);
  }
}
