package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

/** The triode law without spread against published three-halves exercises. */
class ThreeHalvesLawTest {
  private static DeviceLaw law(double perveance, double contact, double mu) {
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(perveance, contact, 1 / mu, 0, 1e-3, 1e-4, -0.5, 0.0862));
  }

  private static ElectrodeCurrents at(DeviceLaw law, double anode, double grid) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(anode, grid, 0, out);
    return out;
  }

  /*
   * Published (W24). Case: 15 mA at 100 V and no bias; cut-off at 100 V and -4 V. Expected: 15 uA
   * V^-1.5 for the anode, mu 25. Source: Schaum's Outline of Electronic Devices and Circuits,
   * problem 7.SP.18. Tolerance: rounding, and the turn-back share at 1 mV.
   */
  @Test
  @DisplayName("15 mA at 100 V with cut-off at -4 V is 15 uA V^-1.5 and mu 25")
  void schaum() {
    DeviceLaw law = law(15e-6 * Math.pow(25, 1.5), 0, 25);
    assertEquals(15e-3, at(law, 100, 0).current(ElectrodeCurrents.ANODE), 1e-10);
    assertEquals(0, at(law, 100, -4).current(ElectrodeCurrents.ANODE), 1e-12);
    assertEquals(15e-6 * Math.pow(50, 1.5), at(law, 50, 0).current(ElectrodeCurrents.ANODE), 1e-9);
  }

  /*
   * Published (W25). Case: raising the grid from 2 V to 4 V takes the current from 2 to 5.5 mA;
   * raising the anode from 200 V to 400 V does the same. Expected: mu 100 and a transconductance of
   * 1750 umho as the ratio of the changes. Source: NEETS module 6, questions 1-53 and 1-54. The
   * grid's own current is left out as in the source (the cathode current is compared).
   */
  @Test
  @DisplayName("200 V on the anode do what 2 V on the grid do at mu 100")
  void neets() {
    double low = Math.cbrt(2e-3 * 2e-3);
    double high = Math.cbrt(5.5e-3 * 5.5e-3);
    double perveance = Math.pow((high - low) / 2, 1.5);
    double effective = low / ((high - low) / 2);
    DeviceLaw law = law(perveance, effective - 2 - 2, 100);
    double first = at(law, 200, 2).current(ElectrodeCurrents.ANODE);
    double byGrid = at(law, 200, 4).current(ElectrodeCurrents.ANODE);
    double byAnode = at(law, 400, 2).current(ElectrodeCurrents.ANODE);
    assertEquals(2e-3, first, 1e-10);
    assertEquals(5.5e-3, byGrid, 1e-10);
    assertEquals(byGrid, byAnode, 1e-10);
    assertEquals(1750e-6, (byGrid - first) / 2, 1e-10);
  }
}
