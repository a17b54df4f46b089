package perveance.files.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.geometry.ElectrodeAnswer;
import perveance.engine.device.geometry.ElectrodeDesign;
import perveance.files.toml.SourceText;

/** Files of electrode dimensions: read to the engine's figures, refused with everything wrong. */
class GeometryReaderTest {
  private static final String PLANE =
      """
      perveance_geometry = 1
      shape = "plane"
      length = "10 mm"
      width = "10 mm"
      grid_distance = "0.25 mm"
      grid_pitch = "0.3 mm"
      grid_wire = "0.06 mm"
      anode_distance = "1.25 mm"
      anode_voltage = "250 V"
      grid_voltage = "-4 V"
      """;

  private static List<String> refused(String text) {
    BadInputException refusal =
        assertThrows(
            BadInputException.class, () -> GeometryReader.read(SourceText.of("grid.toml", text)));
    return refusal.problems().stream().map(Problem::message).toList();
  }

  /*
   * Derived, worked by hand from Vogdes and Elder 1924 and Tellegen 1925. Case: 1 cm^2, cathode to
   * grid 0.25 mm, grid to anode 1.0 mm, pitch 0.3 mm, wire 0.06 mm, 250 V, -4 V. Expected: mu
   * 35.46, 14.39 mA, 7.08 mA/V, 2.4575 V. Tolerance: the digits given.
   */
  @Test
  void thePlaneExampleIsWorkedOut() throws BadInputException {
    ElectrodeAnswer answer =
        ElectrodeAnswer.of(GeometryReader.read(Path.of("examples/geometry/plane-triode.toml")));
    assertEquals(35.46, answer.triode().orElseThrow().amplificationFactor(), 0.005);
    assertEquals(14.39e-3, answer.current(), 1e-5);
    assertEquals(7.08e-3, answer.triode().orElseThrow().mutualConductance(), 5e-6);
    assertEquals(2.4575, answer.workingVoltage(), 5e-4);
  }

  /*
   * Derived from Langmuir and Blodgett 1923 (beta^2 1.0783 at a ratio of 100). Case: cathode radius
   * 0.05 mm, anode radius 5 mm, length 20 mm, 100 V. Expected: 54.40 mA were emission enough; what
   * tungsten gives at 2500 K by Dushman's constants: 60.2 x 2500^2 x exp(-4.52 / 0.21544) = 0.291
   * A/cm^2 on 0.0628 cm^2 = 18.3 mA, which ends it. Tolerance: the digits given.
   */
  @Test
  void theFilamentOfTheCylinderExampleIsSaturated() throws BadInputException {
    ElectrodeAnswer answer =
        ElectrodeAnswer.of(GeometryReader.read(Path.of("examples/geometry/cylinder-diode.toml")));
    assertEquals(54.40e-6, answer.perveance(), 0.01e-6);
    assertTrue(answer.saturated());
    assertEquals(18.3e-3, answer.current(), 0.05e-3);
    assertTrue(answer.slopeResistance().isEmpty() && answer.effectiveResistance().isEmpty());
  }

  /*
   * Published: plane grids as worked from Vogdes and Elder's formula (Phys. Rev. 24, 683, 1924), in
   * mm: pitch, wire radius, cathode to grid, grid to anode. Tolerance: the digits given.
   */
  @ParameterizedTest
  @CsvSource({
    "1, 0.05, 1, 2, 10.52",
    "1, 0.1, 1, 3, 31.88",
    "0.25, 0.025, 0.15, 1, 42.62",
    "0.1, 0.01, 0.05, 0.5, 53.35"
  })
  void theAmplificationFactorFollowsTheFile(
      double pitch, double radius, double near, double far, double mu) throws BadInputException {
    String text =
        PLANE
            .replace("grid_pitch = \"0.3", "grid_pitch = \"" + pitch)
            .replace("grid_wire = \"0.06", "grid_wire = \"" + 2 * radius)
            .replace("grid_distance = \"0.25", "grid_distance = \"" + near)
            .replace("anode_distance = \"1.25", "anode_distance = \"" + (near + far));
    ElectrodeDesign design = GeometryReader.read(SourceText.of("grid.toml", text));
    assertEquals(mu, design.triode().orElseThrow().grid().amplificationFactor(), 0.005);
  }

  @Test
  void everythingWrongIsToldAtOnce() {
    List<String> told =
        refused(
            PLANE
                .replace("\"0.06 mm\"", "\"0.25 mm\"")
                .replace("\"1.25 mm\"", "\"0.2 mm\"")
                .replace("\"250 V\"", "\"250 ohm\"")
                .replace("width =", "widht ="));
    assertTrue(told.stream().anyMatch(t -> t.contains("grid.toml:7: grid_wire:")), told.toString());
    assertTrue(told.stream().anyMatch(t -> t.contains("8: anode_distance:")), told.toString());
    assertTrue(told.stream().anyMatch(t -> t.contains("9: anode_voltage:")), told.toString());
    assertTrue(told.stream().anyMatch(t -> t.contains("did you mean \"width\"")), told.toString());
  }

  @ParameterizedTest
  @CsvSource({
    "'shape = \"plane\"', 'shape = \"sphere\"', '2: shape: found \"sphere\"'",
    "'grid_pitch = \"0.3 mm\"', '', 'grid_pitch: found nothing'",
    "'grid_voltage = \"-4 V\"', '', 'grid_voltage: found nothing'",
    "'length = \"10 mm\"', 'length = \"10\"', 'length: found \"10\"'",
    "'length = \"10 mm\"', 'length = \"-1 mm\"', 'length: found \"-1 mm\"'",
    "'perveance_geometry = 1', 'perveance_geometry = 2', 'perveance_geometry: found 2'",
    "'width = \"10 mm\"', 'width = \"10 mm\"\n"
        + "cathode_diameter = \"1 mm\"', 'cathode_diameter: found an unknown key'"
  })
  void aSlipIsToldWithItsPlace(String right, String wrong, String message) {
    assertTrue(PLANE.contains(right), right);
    List<String> told = refused(PLANE.replace(right, wrong));
    assertTrue(told.stream().anyMatch(t -> t.contains(message)), told.toString());
  }
}
