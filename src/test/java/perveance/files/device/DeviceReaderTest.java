package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.RatingSystem;
import perveance.engine.device.Ratings;
import perveance.files.toml.SourceText;

/** Device files: every field arrives, every slip is told with line, key, found and expected. */
class DeviceReaderTest {
  private static final String SOUND =
      """
      perveance_device = 1
      type = "T1"
      aliases = ["T1A"]
      kind = "triode"
      sections = 2
      base = "B9A"
      pins = ["1 a2", "2 g2"]
      notes = ["a note"]
      [[heater]]
      voltage = "6.3 V"
      current = "0.3 A"
      pins = "4-5"
      directly_heated = true
      [[rating]]
      system = "absolute"
      anode_voltage = "300 V"
      grid_leak_fixed = "1M"
      source = "a book"
      how = "found"
      [capacitance]
      grid_anode = "1.7 pF"
      [[evidence]]
      anode_voltage = "250 V"
      grid_voltage = "-2 V"
      anode_current = "1.2 mA"
      gm = "1.6 mA/V"
      mu = 100
      source = "a book"
      [law]
      name = "spread-triode"
      perveance = 1.2e-3
      contact_potential = 0.6
      penetration = 0.01
      spread = 0.4
      turn_back = 4
      cathode_spread = 0.3
      grid_perveance = 4e-4
      grid_onset = -0.6
      thermal_voltage = 0.09
      [fit]
      method = "least squares"
      median_error = 0.01
      worst_error = 0.02
      standard_errors = [1, 0.5]
      [validity]
      anode_voltage = ["100 V", "250 V"]
      anode_current = ["0.5 mA", "1.2 mA"]
      grid_voltage = ["-2 V", "-1 V"]
      """;

  private static Device read(String text) throws BadInputException {
    return DeviceReader.read(SourceText.of("t1.toml", text));
  }

  private static List<String> problems(String text) {
    BadInputException refusal = assertThrows(BadInputException.class, () -> read(text));
    return refusal.problems().stream().map(Problem::message).toList();
  }

  @Test
  void everyFieldArrivesInSiUnits() throws BadInputException {
    Device device = read(SOUND);
    assertEquals(List.of("T1A"), device.aliases());
    assertEquals(Map.of("1", "a2", "2", "g2"), device.pins());
    assertEquals(6.3, device.heaters().get(0).voltage());
    assertTrue(device.heaters().get(0).directlyHeated());
    Ratings ratings = device.defaultRatings().orElseThrow();
    assertEquals(RatingSystem.ABSOLUTE, ratings.system());
    assertEquals("T1", ratings.type());
    assertEquals(1e6, ratings.gridLeakFixed().orElseThrow());
    assertTrue(ratings.cathodeCurrent().isEmpty());
    assertEquals(1.7e-12, device.capacitances().gridAnode());
    Evidence evidence = device.evidence().get(0);
    assertEquals(1.2e-3, evidence.anodeCurrent().orElseThrow());
    assertEquals(1.6e-3, evidence.mutualConductance().orElseThrow());
    assertTrue(evidence.fit());
    assertEquals("triode", evidence.connection());
    assertEquals(-0.6, device.law().gridCurrentOnset());
    assertEquals(List.of(1.0, 0.5), device.fit().standardErrors());
    assertEquals(1.2e-3, device.validity().highestCurrent());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "sections = 2 | sections = 0 | 5: sections: found 0, expected a whole number from 1 to 4",
        "kind = \"triode\" | kind = \"triod\" | 4: kind: found \"triod\", expected one of triode,"
            + " pentode, beam, rectifier; did you mean \"triode\"?",
        "anode_voltage = \"300 V\" | anode_voltge = 300 | 16: rating anode_voltge: found an"
            + " unknown key, expected a key that belongs here; did you mean \"anode_voltage\"?",
        "\"6.3 V\" | \"6.3 A\" | 10: heater voltage: found \"6.3 A\", which is a current in amperes"
            + " (A), expected a voltage in volts (V), for example \"300 V\"",
        "\"6.3 V\" | \"0 V\" | 10: heater voltage: found \"0 V\", expected a voltage above 0, at"
            + " most 100 kV",
        "\"6.3 V\" | nan | 10: heater voltage: found nan, expected a voltage above 0, at most 100"
            + " kV",
        "\"6.3 V\" | 1e400 | 10: found 1e400, which is too large, expected a smaller number",
        "\"1 a2\" | \"1\" | 7: pins: found \"1\", expected a pin and its electrode, such as \"1"
            + " a2\"",
        "spread = 0.4 | spread = 2 | 30: law name: found spread is not between 0.0 and 1.0: 2.0,"
            + " expected values with a meaning",
        "turn_back = 4 | turn_bak = 4 | 29: law turn_back: found nothing, expected a number in SI"
            + " units",
        "[\"100 V\", \"250 V\"] | [\"250 V\", \"100 V\"] | 46: validity anode_voltage: found 2"
            + " values, or falling ones, expected the lowest and the highest value in a list",
        "perveance_device = 1 | perveance_device = 2 | 1: perveance_device: found 2, a form that"
            + " a later version of the program writes, expected form 1",
        "notes = [\"a note\"] | notes = [3] | 8: notes: found 3, expected text in quotes",
        "directly_heated = true | directly_heated = \"yes\" | 13: heater directly_heated: found"
            + " \"yes\", expected true or false without quotes",
      })
  void aSlipIsToldWithItsPlace(String right, String wrong, String message) {
    assertTrue(SOUND.contains(right));
    assertEquals("t1.toml:" + message, problems(SOUND.replaceFirst(quote(right), wrong)).get(0));
  }

  @Test
  void allProblemsAreToldAtOnceInTheOrderOfTheFile() {
    List<String> told =
        problems(
            SOUND
                .replace("\"T1\"", "T1")
                .replace("sections = 2", "sections = \"two\"")
                .replace("\"250 V\"\n", "\"250 W\"\n")
                .replace("[fit]", "[fitt]"));
    assertEquals(5, told.size(), told.toString());
    assertTrue(told.get(0).startsWith("t1.toml:1: fit: found nothing"), told.get(0));
    assertTrue(told.get(1).startsWith("t1.toml:2: found T1, expected text"), told.get(1));
    assertTrue(told.get(2).startsWith("t1.toml:5: sections: found \"two\""), told.get(2));
    assertTrue(told.get(3).startsWith("t1.toml:23: evidence anode_voltage:"), told.get(3));
    assertTrue(told.get(4).startsWith("t1.toml:40: fitt: found an unknown key"), told.get(4));
  }

  @Test
  void aSheetIsReadWithoutALaw() throws BadInputException {
    String draft = SOUND.substring(0, SOUND.indexOf("[law]"));
    DeviceSheet sheet = DeviceReader.readSheet(SourceText.of("t1.toml", draft));
    assertEquals("T1", sheet.type());
    assertEquals(1, sheet.evidence().size());
    assertTrue(problems(draft).get(0).contains("law: found nothing, expected a table [law]"));
  }

  private static String quote(String text) {
    return java.util.regex.Pattern.quote(text);
  }
}
