package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/**
 * Published: a worked pentode stage (M. Kuehnel's tutorial on the EF86): 820 ohm in the cathode, gm
 * 1.5 mA/V, corners at 8.2 Hz; screen 132 kohm; Cgk 5 pF, Cga 0.05 pF, gain 100, 100 kHz. It prints
 * 368 ohm and 53 uF, 0.15 uF, 10 pF and 159 kohm. Unrounded: 367.7 ohm, 52.7 uF, 0.147 uF, 10.05
 * pF.
 */
class PentodeCornersTest {
  private static final double GM = 1.5e-3;

  private static StageBench stage() {
    return stage(LinearValve.pentode(GM, 1e12, 38, 132e3));
  }

  private static StageBench stage(LinearValve law) {
    return new StageBench("common-cathode", law)
        .with("anode_load", 100 / GM)
        .with("grid_leak", 10e6)
        .with("stray_anode", 1e-14)
        .with("stray_grid", 1e-14)
        .with("stray_grid_anode", 1e-14);
  }

  /**
   * The bypass sees 820 ohm beside 1 / gm = 367.7 ohm. At the pole the gain is sqrt((1 + x^2) / 2)
   * of that at mid-band, x = 367.7 / 820 being the zero over the pole. The sum leaves the screen
   * out, so it neither draws current nor steers here. 0.1 %: 52.7 uF is rounded.
   */
  @Test
  void cathodeBypass() {
    StageBench bench =
        stage(LinearValve.pentode(GM, 1e12, 1e9, 1e15))
            .with("screen_voltage", 100)
            .with("cathode_resistor", 820)
            .with("cathode_bypass", 52.7e-6);
    Measured stage = new Measured(bench);
    double zero = 367.7 / 820;
    double expected = 100 * Math.sqrt((1 + zero * zero) / 2);
    assertEquals(100, -stage.gain(), 1e-2);
    assertEquals(expected, stage.gainAt(8.2), 1e-3 * expected);
  }

  /** The screen's bypass sees the screen's own 132 kohm beside a dropper that is large. 1 %. */
  @Test
  void screenBypass() {
    StageBench bench =
        stage()
            .with("grid_bias", -2)
            .with("screen_resistor", 100e6)
            .with("screen_bypass", 0.147e-6);
    assertEquals(8.2, new Measured(bench).corners().low().orElseThrow(), 0.082);
  }

  /** 5 pF and 0.05 pF (1 + 100) behind 159.2 kohm. 1 %: the page rounds 10.05 pF to 10 pF. */
  @Test
  void inputCapacitance() {
    StageBench bench =
        stage()
            .with("grid_bias", -2)
            .with("screen_voltage", 100)
            .with("source", 159.2e3)
            .with("grid_leak", 100e6)
            .with("stray_grid", 5e-12)
            .with("stray_grid_anode", 0.05e-12);
    assertEquals(100e3, new Measured(bench).corners().high().orElseThrow(), 1e3);
  }
}
