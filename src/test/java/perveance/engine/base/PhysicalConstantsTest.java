package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class PhysicalConstantsTest {
  /**
   * Published: 2.33395e-6 A V^-1.5 between planes and 1.46647e-5 A V^-1.5 between cylinders, from
   * CODATA values; older books print 2.33e-6 to 2.336e-6 and 14.65e-6 to 14.68e-6. Tolerance half
   * of the last digit.
   */
  @Test
  void spaceChargeFactors() {
    assertEquals(2.33395e-6, PhysicalConstants.PLANE_SPACE_CHARGE, 0.000005e-6);
    assertEquals(1.46647e-5, PhysicalConstants.CYLINDER_SPACE_CHARGE, 0.000005e-5);
  }

  /** Published: 120.17 A cm^-2 K^-2; tolerance half of the last digit. */
  @Test
  void richardsonFactor() {
    assertEquals(120.17e4, PhysicalConstants.RICHARDSON, 0.005e4);
  }

  /** Published: T / 11604.5 V, thus 0.0862 V at 1000 K and 0.0948 V at 1100 K. */
  @Test
  void thermalVoltages() {
    assertEquals(0.0862, PhysicalConstants.thermalVoltage(1000), 0.00005);
    assertEquals(0.0948, PhysicalConstants.thermalVoltage(1100), 0.00005);
    assertEquals(1, PhysicalConstants.thermalVoltage(11604.5), 0.000005);
    assertThrows(IllegalArgumentException.class, () -> PhysicalConstants.thermalVoltage(0));
    assertThrows(
        IllegalArgumentException.class, () -> PhysicalConstants.thermalVoltage(Double.NaN));
  }

  /**
   * Published: thermal noise of a resistor at 290 K over 20 kHz, sqrt(4 k T R B): 0.566, 1.790,
   * 5.660 and 17.90 uV for 1 k, 10 k, 100 k and 1 M. Tolerance half of the last digit.
   */
  @Test
  void thermalNoise() {
    double power =
        4 * PhysicalConstants.BOLTZMANN * PhysicalConstants.STANDARD_NOISE_TEMPERATURE * 20e3;
    assertEquals(0.566e-6, Math.sqrt(power * 1e3), 0.0005e-6);
    assertEquals(1.790e-6, Math.sqrt(power * 10e3), 0.0005e-6);
    assertEquals(5.660e-6, Math.sqrt(power * 100e3), 0.0005e-6);
    assertEquals(17.90e-6, Math.sqrt(power * 1e6), 0.005e-6);
  }
}
