package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Device;
import perveance.engine.device.RatingSystem;
import perveance.engine.device.RectifierFilter;
import perveance.engine.device.RectifierLimit;
import perveance.engine.device.RectifierOutput;
import perveance.engine.device.RectifierRatings;
import perveance.files.toml.SourceText;

/** The rectifier's part of a device file. */
class RectifierReaderTest {
  private static final String SOUND =
      """
      perveance_device = 1
      type = "R1"
      kind = "rectifier"
      sections = 2
      [[evidence]]
      anode_voltage = "17 V"
      anode_current = "225 mA"
      source = "a book"
      [rectifier]
      [[rectifier.limit]]
      filter = "capacitor"
      system = "design-maximum"
      anode_voltage = "450 V"
      output_current = "250 mA"
      peak_current = "750 mA"
      inverse_voltage = "1500 V"
      capacitance = "60u"
      source = "a book"
      how = "memory"
      confidence = "high"
      note = "a note"
      [[rectifier.limit]]
      filter = "choke"
      output_current = "260 mA"
      source = "a book"
      [[rectifier.resistance]]
      anode_voltage = "450 V"
      resistance = "150"
      source = "a book"
      [[rectifier.output]]
      filter = "capacitor"
      anode_voltage = "450 V"
      output_current = "250 mA"
      capacitance = "60u"
      resistance = "150"
      output_voltage = "480 V"
      source = "a book"
      [law]
      name = "space-charge-diode"
      perveance = 3e-3
      contact_potential = 0.5
      thermal_voltage = 0.09
      [fit]
      method = "drop"
      median_error = 0
      worst_error = 0
      [validity]
      anode_voltage = ["0 V", "25 V"]
      anode_current = ["0 mA", "750 mA"]
      """;

  @Test
  void everyFieldArrives() throws BadInputException {
    Device device = DeviceReader.read(SourceText.of("r1.toml", SOUND));
    RectifierRatings ratings = device.rectifier().orElseThrow();
    RectifierLimit limit = ratings.limitAt(RectifierFilter.CAPACITOR, 400).orElseThrow();
    assertEquals("R1", limit.type());
    assertEquals(RatingSystem.DESIGN_MAXIMUM, limit.system());
    assertEquals(450, limit.anodeVoltage().orElseThrow());
    assertEquals(0.25, limit.outputCurrent().orElseThrow());
    assertEquals(0.75, limit.peakCurrent().orElseThrow());
    assertEquals(1500, limit.inverseVoltage().orElseThrow());
    assertEquals(60e-6, limit.capacitance().orElseThrow(), 1e-18);
    assertTrue(limit.heaterVoltage().isEmpty());
    assertEquals("high", limit.confidence());
    assertEquals("a note", limit.note());
    assertEquals(
        0.26,
        ratings.limitAt(RectifierFilter.CHOKE, 2000).orElseThrow().outputCurrent().orElseThrow());
    assertEquals(150, ratings.leastResistance(450).orElseThrow());
    RectifierOutput output = ratings.outputs().get(0);
    assertEquals(480, output.outputVoltage());
    assertEquals(0.25, output.outputCurrent());
    assertEquals(150, output.resistance().orElseThrow());
    assertEquals("diode", device.evidence().get(0).connection());
  }

  @Test
  void slipsAreToldWithTheirLine() {
    String slipped =
        SOUND.replace("filter = \"choke\"", "filter = \"coke\"").replace("60u\"\nres", "-1\"\nres");
    BadInputException refusal =
        assertThrows(
            BadInputException.class, () -> DeviceReader.read(SourceText.of("r1.toml", slipped)));
    assertEquals(2, refusal.problems().size());
    assertEquals(23, refusal.problems().get(0).line().orElseThrow());
    assertTrue(refusal.problems().get(0).key().endsWith("filter"));
    assertEquals(34, refusal.problems().get(1).line().orElseThrow());
  }
}
