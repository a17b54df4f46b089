package perveance.engine.device.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

/** Langmuir's functions and the diode built on them. */
class InitialVelocitiesTest {
  /*
   * Derived. Case: every eta of langmuir_xi_eta.tsv. Tolerance: half of the fourth decimal printed.
   */
  @Test
  @DisplayName("agrees with an independent integration on both sides")
  void independentIntegration() {
    List<double[]> rows = ReferenceTable.rows("langmuir_xi_eta.tsv");
    assertEquals(24, rows.size());
    for (double[] row : rows) {
      assertEquals(row[1], InitialVelocities.cathodeSide(row[0]), 6e-5, "cathode, eta " + row[0]);
      assertEquals(row[2], InitialVelocities.anodeSide(row[0]), 6e-5, "anode, eta " + row[0]);
    }
  }

  /*
   * Published (W12). Expected: Langmuir 1923 gives 9.180e5 T^(-3/4) sqrt(J) with J in A/cm^2 and
   * distance in cm, and 2.5539 as the limit on the cathode's side; with the constants of 2018 the
   * factor is 9.186e5. Case: 1 K, 1 A/cm^2, 1 cm. Tolerance: the digits given.
   */
  @Test
  @DisplayName("has Langmuir's constants")
  void constants() {
    assertEquals(9.186e5, InitialVelocities.scale(1, 1e4) * 0.01, 50);
    assertEquals(2.55395, InitialVelocities.cathodeSide(1000), 5e-6);
  }

  /*
   * Derived (W13). Case: plane diode, 1000 K, emission 1 A/cm^2, gap 0.2 mm, 0.05 A/cm^2. Expected
   * by exact integration: 2.617 V, minimum -0.2582 V at 19.3 um; the plane law at that voltage
   * gives 0.0247 A/cm^2, counted from the minimum 0.0349, with the practical form 0.0509.
   * Tolerance: the digits given.
   */
  @Test
  @DisplayName("a close plane diode draws 0.05 A/cm2 at 2.617 V")
  void closeDiode() {
    ThermalDiode diode = new ThermalDiode(0.2e-3, 1000, 1e4);
    ThermalDiode.State state = diode.atCurrentDensity(500);
    assertEquals(2.617, state.voltage(), 5e-4);
    assertEquals(-0.2582, state.minimum(), 5e-5);
    assertEquals(19.3e-6, state.minimumDistance(), 5e-8);
    PlaneDiode cold = new PlaneDiode(1e-4, 0.2e-3);
    assertEquals(0.0247, cold.current(state.voltage()), 5e-5);
    PlaneDiode moved = new PlaneDiode(1e-4, 0.2e-3 - state.minimumDistance());
    assertEquals(0.0349, moved.current(state.voltage() - state.minimum()), 5e-5);
    assertEquals(0.0509e4, diode.practicalForm(state), 0.5);
  }

  /*
   * Derived. Case: the same diode from -1 V up. Expected: the current density found for a voltage
   * gives that voltage back; retarded current follows exp(V/VT); it rises with voltage.
   */
  @Test
  @DisplayName("voltage and current density are inverse to each other")
  void inverse() {
    ThermalDiode diode = new ThermalDiode(0.2e-3, 1000, 1e4);
    double last = 0;
    for (double voltage = -1; voltage <= 10; voltage += 0.5) {
      ThermalDiode.State state = diode.atVoltage(voltage).orElseThrow();
      assertEquals(voltage, state.voltage(), 1e-8);
      assertTrue(state.currentDensity() > last);
      last = state.currentDensity();
    }
    double retarded = diode.atVoltage(-1).orElseThrow().currentDensity();
    assertEquals(1e4 * Math.exp(-1 / 0.0861733), retarded, 1e-4 * retarded);
    assertTrue(diode.atVoltage(1000).isEmpty(), "saturated");
  }

  @Test
  @DisplayName("refuses what has no meaning")
  void refuses() {
    ThermalDiode diode = new ThermalDiode(0.2e-3, 1000, 1e4);
    assertThrows(IllegalArgumentException.class, () -> diode.atCurrentDensity(1e4));
    assertThrows(IllegalArgumentException.class, () -> diode.atCurrentDensity(0));
    assertThrows(IllegalArgumentException.class, () -> InitialVelocities.anodeSide(-1));
    assertThrows(IllegalArgumentException.class, () -> InitialVelocities.cathodeSide(Double.NaN));
  }
}
