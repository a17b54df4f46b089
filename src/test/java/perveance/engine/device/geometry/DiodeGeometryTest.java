package perveance.engine.device.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.PhysicalConstants;

/** Plane and cylindrical diodes. */
class DiodeGeometryTest {
  private static final double PERMITTIVITY = PhysicalConstants.VACUUM_PERMITTIVITY;

  /*
   * Published (W1). Case: 1 m^2, 1 m. Expected: 2.334e-6 A V^-1.5 (Child 1911, Langmuir 1913; older
   * books print 2.33e-6 to 2.336e-6); 2.33395e-6 from the constants of 2018. Tolerance: its digits.
   */
  @Test
  @DisplayName("one square metre at one metre has the constant of the plane law")
  void planeConstant() {
    assertEquals(2.33395e-6, new PlaneDiode(1, 1).perveance(), 5e-12);
  }

  /*
   * Published (W2). Expected: 14.66e-6 A V^-1.5 times l / (r beta^2), Langmuir and Blodgett 1923;
   * 1.46647e-5 from the constants of 2018. Case: the radius ratio of 100, beta^2 = 1.07826.
   */
  @Test
  @DisplayName("the cylinder has the constant of Langmuir and Blodgett")
  void cylinderConstant() {
    CylinderDiode diode = new CylinderDiode(0.01, 1, 1);
    assertEquals(1.46647e-5, diode.perveance() * diode.betaSquared(), 5e-11);
  }

  /*
   * Derived (W5). Case: cathode radius 0.05 mm, anode radius 5 mm, length 20 mm, 100 V. Expected:
   * 54.40 mA by the formula with beta^2 = 1.07826. Tolerance: the digits given.
   */
  @Test
  @DisplayName("a fine filament in a wide anode draws 54.40 mA at 100 V")
  void filament() {
    assertEquals(54.40e-3, new CylinderDiode(0.05e-3, 5e-3, 20e-3).current(100), 5e-6);
  }

  /*
   * Published (W6). Case: anode power 1.0 W at 36 V, then 49 V. Expected 2.2 W, 2.161 exactly
   * (V^2.5). Source: H. C. Verma, Concepts of Physics 2, exercises on valves. Tolerance: rounding
   * of the exact figure; the print rounds to two digits.
   */
  @Test
  @DisplayName("anode power goes with the five-halves power of the voltage")
  void anodePower() {
    PlaneDiode diode = new PlaneDiode(1e-4, 1e-3);
    double ratio = 49 * diode.current(49) / (36 * diode.current(36));
    assertEquals(Math.pow(7.0 / 6.0, 5), ratio, 1e-12);
    assertEquals(2.2, ratio, 0.05);
  }

  /*
   * Published (W7). Case: 10 mA at 60 V. Expected: slope resistance 4 kohm, effective 6 kohm.
   * Source: the same exercises. Tolerance: rounding.
   */
  @Test
  @DisplayName("slope resistance is two thirds of voltage over current")
  void slopeResistance() {
    double perveanceWanted = 10e-3 / Math.pow(60, 1.5);
    double area = perveanceWanted / PhysicalConstants.PLANE_SPACE_CHARGE * 1e-6;
    PlaneDiode diode = new PlaneDiode(area, 1e-3);
    assertEquals(10e-3, diode.current(60), 1e-12);
    assertEquals(4000, diode.slopeResistance(60), 1e-6);
    assertEquals(6000, diode.effectiveResistance(60), 1e-6);
  }

  /*
   * Derived. Cases: plane, cathode inside, cathode outside. Expected: the field is the slope of the
   * potential; charge over eps0 is the divergence of the field (Poisson); the charge times the
   * speed carries the current; at the anode the potential is the voltage. Tolerance: differences
   * over a thousandth of the gap.
   */
  @ParameterizedTest
  @CsvSource({"0,0", "0.5e-3,5e-3", "5e-3,0.5e-3"})
  @DisplayName("potential, field, charge and speed belong together across the gap")
  void poisson(double cathodeRadius, double anodeRadius) {
    boolean plane = cathodeRadius == 0;
    DiodeGeometry diode =
        plane ? new PlaneDiode(2e-4, 1e-3) : new CylinderDiode(cathodeRadius, anodeRadius, 20e-3);
    double voltage = 80;
    double step = 1e-3 * diode.gap();
    assertEquals(voltage, diode.at(diode.gap(), voltage).potential(), 1e-9);
    assertEquals(voltage, diode.at(diode.gap(), voltage).emptyPotential(), 1e-9);
    double outward = Math.signum(anodeRadius - cathodeRadius);
    for (double part = 0.1; part < 0.95; part += 0.1) {
      double x = part * diode.gap();
      GapPoint before = diode.at(x - step, voltage);
      GapPoint here = diode.at(x, voltage);
      GapPoint after = diode.at(x + step, voltage);
      double field = (after.potential() - before.potential()) / (2 * step);
      assertEquals(field, here.field(), 1e-4 * field);
      double emptyField = (after.emptyPotential() - before.emptyPotential()) / (2 * step);
      assertEquals(emptyField, here.emptyField(), 1e-4 * emptyField);
      double radius = plane ? 1 : cathodeRadius + outward * x;
      double out = plane ? 0 : outward * step;
      double divergence =
          ((radius + out) * after.field() - (radius - out) * before.field()) / (2 * step * radius);
      assertEquals(
          divergence,
          here.chargeDensity() / PERMITTIVITY,
          2e-4 * Math.abs(divergence),
          "at " + part);
      double area = plane ? diode.cathodeArea() : diode.cathodeArea() * radius / cathodeRadius;
      assertEquals(diode.current(voltage), here.chargeDensity() * here.speed() * area, 1e-12);
      assertTrue(here.potential() < here.emptyPotential());
    }
  }

  /*
   * Derived. Case: 100 V. Expected: an electron at the anode has 0.5 m v^2 = e V.
   */
  @Test
  @DisplayName("the speed at the anode is that of the full voltage")
  void speed() {
    GapPoint anode = GapProfile.across(new PlaneDiode(1e-4, 1e-3), 100, 50).points().get(49);
    double energy = 0.5 * PhysicalConstants.ELECTRON_MASS * anode.speed() * anode.speed();
    assertEquals(100 * PhysicalConstants.ELEMENTARY_CHARGE, energy, 1e-28);
    assertEquals(5.931e6, anode.speed(), 5e2);
  }

  @Test
  @DisplayName("refuses gaps and voltages without a meaning")
  void refuses() {
    assertThrows(IllegalArgumentException.class, () -> new PlaneDiode(0, 1));
    assertThrows(IllegalArgumentException.class, () -> new PlaneDiode(1, -1));
    assertThrows(IllegalArgumentException.class, () -> new CylinderDiode(1, 1, 1));
    assertThrows(IllegalArgumentException.class, () -> new PlaneDiode(1, 1).current(-1));
    assertThrows(IllegalArgumentException.class, () -> new PlaneDiode(1, 1).at(0, 10));
    assertThrows(IllegalArgumentException.class, () -> new PlaneDiode(1, 1).at(1.01, 10));
    assertThrows(
        IllegalArgumentException.class, () -> GapProfile.across(new PlaneDiode(1, 1), 10, 0));
  }
}
