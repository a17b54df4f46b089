package perveance.engine.device.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.SpreadTriodeLaw;

/** Grids and triodes from dimensions. */
class TriodeGeometryTest {
  /*
   * Derived (W26). Cases in mm: pitch, wire radius, grid to anode. Expected: Vogdes and Elder's
   * formula and the thin-wire formula worked by hand; the third figure is a boundary-element
   * solution with the cathode at the distance of the fifth column. Tolerance: digits of the formula
   * figures; against the boundary elements 5 %, what the formula is known to lose.
   */
  @ParameterizedTest
  @CsvSource({
    "1,0.05,2,1,10.52,10.85,10.59",
    "1,0.1,3,1,31.88,40.6,33.34",
    "0.3,0.03,1,0.3,35.46,45.1,37.08",
    "0.25,0.025,1,0.15,42.62,54.1,44.60",
    "0.1,0.01,0.5,0.05,53.35,67.6,55.97"
  })
  @DisplayName("plane grids have the amplification factor of Vogdes and Elder")
  void planeGrids(
      double pitch,
      double radius,
      double gridToAnode,
      double cathodeToGrid,
      double vogdesElder,
      double thinWire,
      double boundaryElements) {
    PlaneGrid grid = new PlaneGrid(pitch * 1e-3, radius * 1e-3, gridToAnode * 1e-3);
    assertEquals(vogdesElder, grid.amplificationFactor(), 0.005);
    assertEquals(thinWire, grid.thinWireFactor(), 0.05);
    assertEquals(boundaryElements, grid.amplificationFactor(), 0.05 * boundaryElements);
  }

  /*
   * Derived. Case: a helix whose radius is large against its distance from the anode. Expected: the
   * plane grid of the same distance; the logarithm's next term is half the ratio, 0.05 %.
   */
  @Test
  @DisplayName("a wide helix is a plane grid")
  void wideHelix() {
    PlaneGrid plane = new PlaneGrid(1e-3, 0.05e-3, 2e-3);
    CylinderGrid helix = new CylinderGrid(1e-3, 0.05e-3, 2, 2.002);
    assertEquals(1, helix.amplificationFactor() / plane.amplificationFactor(), 1e-3);
  }

  /*
   * Derived (W27). Case: 1 cm^2, cathode to grid 0.25 mm, grid to anode 1.0 mm, mu 35.46, 250 V,
   * -4 V. Expected: F 1.2411, effective voltage 2.4575 V, 14.39 mA, 7.08 mA/V (19.9 mA without F).
   * Tolerance: the digits given.
   */
  @Test
  @DisplayName("the equivalent diode of a plane triode draws 14.39 mA")
  void equivalentDiode() {
    TriodeGeometry triode =
        TriodeGeometry.plane(1e-4, 0.25e-3, new PlaneGrid(0.3e-3, 0.03e-3, 1e-3));
    GeometryReport report = triode.report(250, -4, 35.46);
    assertEquals(1.2411, report.loadingFactor(), 5e-5);
    assertEquals(2.4575, report.effectiveVoltage(), 2e-4);
    assertEquals(14.39e-3, report.cathodeCurrent(), 5e-6);
    assertEquals(7.08e-3, report.mutualConductance(), 5e-6);
    double withoutLoading = triode.cathodeToGrid().current(-4 + 250 / 35.46);
    assertEquals(19.9e-3, withoutLoading, 5e-5);
    assertEquals(35.46, triode.report(250, -4).amplificationFactor(), 0.005);
  }

  /*
   * Derived. Case: the triode of W27 with 0.6 mm to its grid, as a device law. Expected: the law's
   * current and gm are the report's but for what the law adds: electrons that turn back (under 0.1
   * %) and the spread of grid and cathode. With variance v about the mean m the three-halves power
   * gains 3 v / (8 m^2), with a cathode spread of 0.3 V and m = 3.5 V 0.1 %. Tolerance 1 %.
   */
  @Test
  @DisplayName("dimensions make a device law that agrees with the report")
  void deviceLaw() {
    TriodeGeometry triode =
        TriodeGeometry.plane(1e-4, 0.6e-3, new PlaneGrid(0.3e-3, 0.03e-3, 1e-3));
    GeometryReport report = triode.report(250, -3);
    ElectrodeCurrents out = new ElectrodeCurrents();
    new SpreadTriodeLaw(triode.law(1000)).evaluate(250, -3, 0, out);
    assertEquals(
        report.cathodeCurrent(),
        out.current(ElectrodeCurrents.ANODE),
        1e-2 * report.cathodeCurrent());
    assertEquals(
        report.mutualConductance(),
        out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID),
        1e-2 * report.mutualConductance());
  }

  /*
   * Derived. Cases: the grid's pattern at the cathode for q = dgk / a of 0.5, 0.75 and 1. Expected:
   * the field factor S swings from tanh(pi q) to coth(pi q), 0.917 to 1.090, 0.982 to 1.018, 0.9963
   * to 1.0037; the spread is sqrt 3 times the standard deviation of the penetration over one pitch,
   * here summed over 1000 places. Tolerance: rounding of the sum.
   */
  @ParameterizedTest
  @CsvSource({"0.5,0.917,1.090,5e-4", "0.75,0.982,1.018,5e-4", "1.0,0.9963,1.0037,5e-5"})
  @DisplayName("the wires' pattern fades within a pitch")
  void pattern(double q, double least, double most, double tolerance) {
    double x = 2 * Math.PI * q;
    double lowest = 2;
    double highest = 0;
    double sum = 0;
    double squares = 0;
    int places = 1000;
    for (int i = 0; i < places; i++) {
      double s = Math.sinh(x) / (Math.cosh(x) - Math.cos(2 * Math.PI * i / places));
      lowest = Math.min(lowest, s);
      highest = Math.max(highest, s);
      sum += (1 - s) / s / places;
      squares += (1 - s) / s * (1 - s) / s / places;
    }
    assertEquals(least, lowest, tolerance);
    assertEquals(most, highest, tolerance);
    PlaneGrid grid = new PlaneGrid(1e-3, 0.05e-3, 2e-3);
    double deviation = Math.sqrt(squares - sum * sum);
    double expected = Math.sqrt(3) * grid.amplificationFactor() * 1.2 * q / (q + 2) * deviation;
    assertEquals(expected, grid.spread(q * 1e-3, (q + 2) * 1e-3, 1.2), 1e-9);
  }

  /*
   * Derived. Case: cathode 0.5 mm, helix 1 mm, anode 3 mm, 20 mm long, 200 V, -2 V, oxide at 1000
   * K. Expected: mu gm ra hangs together and the current density is the current over the cathode.
   */
  @Test
  @DisplayName("a cylindrical triode reports constants that hang together")
  void cylinder() {
    TriodeGeometry triode =
        TriodeGeometry.cylinder(0.5e-3, 20e-3, new CylinderGrid(0.5e-3, 0.04e-3, 1e-3, 3e-3));
    GeometryReport report = triode.report(200, -2);
    assertEquals(
        report.amplificationFactor(), report.mutualConductance() * report.anodeResistance(), 1e-9);
    assertEquals(report.cathodeCurrent(), report.currentDensity() * Math.PI * 1e-3 * 20e-3, 1e-12);
    double use = report.emissionUse(Emitter.OXIDE, 1000);
    assertTrue(use > 0 && use < 1, "emission use " + use);
  }

  @Test
  @DisplayName("refuses grids that cannot be wound")
  void refuses() {
    assertThrows(IllegalArgumentException.class, () -> new PlaneGrid(1, 0.4, 1));
    assertThrows(IllegalArgumentException.class, () -> new CylinderGrid(1, 0.1, 5, 5));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            new TriodeGeometry(
                new PlaneDiode(1, 1), new PlaneDiode(1, 1), new PlaneGrid(1, .1, 1)));
  }
}
