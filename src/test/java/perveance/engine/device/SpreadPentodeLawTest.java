package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

/** The contract, for an output pentode with a rounded knee. */
class SpreadPentodeLawTest extends DeviceLawContractTest {
  private final DeviceLaw law =
      new SpreadPentodeLaw(
          new SpreadPentodeParameters(
              3.6e-3, 0.5, 1 / 20.8, 0.37, 0.3, 0.04, 0.114, 0.2, 0.5, 0, 0.08, 1.5, 1e-3, -0.7,
              0.09));

  @Override
  protected DeviceLaw law() {
    return law;
  }

  @Override
  protected double highestAnodeVoltage() {
    return 400;
  }

  @Override
  protected double lowestGridVoltage() {
    return -40;
  }

  @Override
  protected double highestGridVoltage() {
    return 3;
  }

  @Override
  protected double highestScreenVoltage() {
    return 350;
  }

  private ElectrodeCurrents at(double anode, double grid, double screen) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(anode, grid, screen, out);
    return out;
  }

  /*
   * Derived. Case: screen 250 V, grid -7 V, anode falling. Expected: the anode current falls to 0
   * at Va = 0 while the cathode current falls only by what the anode's small influence explains,
   * (1 - L Va/Vg2)-like, here under 15 %.
   */
  @Test
  @DisplayName("as the anode falls to zero the screen takes over its current")
  void screenTakesOver() {
    double cathode = at(250, -7, 250).cathode();
    double before = at(250, -7, 250).current(ElectrodeCurrents.ANODE);
    for (double anode = 240; anode >= 0; anode -= 10) {
      ElectrodeCurrents now = at(anode, -7, 250);
      assertTrue(now.current(ElectrodeCurrents.ANODE) < before, "at " + anode);
      assertTrue(now.cathode() > 0.85 * cathode, "cathode current at " + anode);
      before = now.current(ElectrodeCurrents.ANODE);
    }
    assertEquals(0, at(0, -7, 250).current(ElectrodeCurrents.ANODE), 0);
    assertTrue(at(0, -7, 250).current(ElectrodeCurrents.SCREEN) > 0.85 * cathode);
  }

  /*
   * Derived. Case: the same valve with other constants of division. Expected: the cathode current
   * does not depend on how it divides. Tolerance: rounding.
   */
  @Test
  @DisplayName("the cathode current does not depend on its division")
  void divisionConserves() {
    DeviceLaw sharp =
        new SpreadPentodeLaw(
            new SpreadPentodeParameters(
                3.6e-3, 0.5, 1 / 20.8, 0.37, 0.3, 0.04, 0.3, 1, 0.7, 0.5, 0.2, 2.2, 1e-3, -0.7,
                0.09));
    ElectrodeCurrents other = new ElectrodeCurrents();
    for (double anode = -50; anode <= 400; anode += 25) {
      sharp.evaluate(anode, -6, 240, other);
      ElectrodeCurrents own = at(anode, -6, 240);
      assertEquals(own.cathode(), other.cathode(), 1e-14);
      double slope =
          own.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID)
              + own.slope(ElectrodeCurrents.SCREEN, ElectrodeCurrents.GRID);
      double otherSlope =
          other.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID)
              + other.slope(ElectrodeCurrents.SCREEN, ElectrodeCurrents.GRID);
      assertEquals(slope, otherSlope, 1e-12);
    }
  }

  /*
   * Derived. Case: anode and screen tied. Expected: the mu of the tied electrodes is that of a
   * triode with the penetration D0 (1 + L), 1/(0.0480769 * 1.04) = 20.0, at zero spread.
   */
  @Test
  @DisplayName("tied to the anode it is a triode of mu 1/(D0 (1 + L))")
  void triodeConnection() {
    DeviceLaw even =
        new SpreadPentodeLaw(
            new SpreadPentodeParameters(
                3.6e-3, 0.5, 1 / 20.8, 0, 0, 0.04, 0.114, 0.2, 0.5, 0, 0.08, 1.5, 1e-3, -0.7,
                0.09));
    ElectrodeCurrents out = new ElectrodeCurrents();
    even.evaluate(250, -9, 250, out);
    double byGrid = 0;
    double byTied = 0;
    for (int e : new int[] {ElectrodeCurrents.ANODE, ElectrodeCurrents.SCREEN}) {
      byGrid += out.slope(e, ElectrodeCurrents.GRID);
      byTied += out.slope(e, ElectrodeCurrents.ANODE) + out.slope(e, ElectrodeCurrents.SCREEN);
    }
    assertEquals(20.8 / 1.04, byGrid / byTied, 1e-9);
  }

  @Test
  @DisplayName("constants without a meaning are refused by name")
  void refusesNonsense() {
    IllegalArgumentException refusal =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                new SpreadPentodeParameters(
                    3.6e-3, 0.5, 1 / 20.8, 1.2, 0, 0.04, 0.1, 0.1, 0.1, 0, 0.1, 1, 1e-3, -0.7,
                    0.09));
    assertEquals("spread must be from 0.0 to 1.0, found 1.2", refusal.getMessage());
  }
}
