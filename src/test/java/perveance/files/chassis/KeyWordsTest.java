package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.files.toml.SourceText;

/** Keys in either vocabulary of the trade, and what is said of keys in neither. */
class KeyWordsTest {
  private static final String BRITISH =
      """
      perveance = 1
      title = "Phono stage"
      [supply.plate]
      voltage = "300 V"
      [[stage]]
      ref = "V1"
      kind = "common-cathode"
      device = "EF86"
      supply = "plate"
      anode_load = "220k"          # wirewound
      anode_load_power = "1 W"
      screen_resistor = "1M"
      screen_bypass = "100n"
      cathode_resistor = "2k2"
      cathode_bypass = "47u"
      """;

  private static final String AMERICAN =
      BRITISH
          .replace("device =", "tube =")
          .replace("anode_", "plate_")
          .replace("bypass", "decoupling");

  /** Derived: one stage in both vocabularies; a supply's own name is no word of the trade. */
  @Test
  void bothVocabulariesTellTheSame() throws BadInputException {
    Chassis american = Samples.read(AMERICAN);
    assertEquals(Samples.read(BRITISH), american);
    assertEquals("plate", american.supplies().get(0).name());
  }

  @Test
  void aSavedValueKeepsItsWriterSWord() throws BadInputException {
    Chassis before = Samples.read(AMERICAN);
    Chassis after =
        new Chassis(
            before.title(),
            before.conditions(),
            before.supplies(),
            List.of(before.stages().get(0).with("anode_load", new Setting.Number("100k", 1e5))));
    assertEquals(
        AMERICAN.replace("plate_load = \"220k\"", "plate_load = \"100k\""),
        ChassisWriter.update(SourceText.of("a", AMERICAN), before, after));
  }

  @ParameterizedTest
  @CsvSource(
      quoteCharacter = '|',
      delimiter = ';',
      value = {
        "anode_load = 1; stage.anode_load: found anode_load a second time",
        "cathode_bypass_capacitor = 1; did you mean \"cathode_bypass\"?",
        "stopper = 1; did you mean \"grid_stopper\"?",
        "grid = 1; expected one of grid_bias, grid_leak, grid_stopper, stray_grid_anode,"
            + " stray_grid",
        "tone = 1; grid_stopper, coupling, load, load_capacitance, drives, drive, heater_elevation",
      })
  void aKeyInNeitherIsAnsweredWithTheLikelyOnes(String line, String told) {
    BadInputException refused =
        assertThrows(BadInputException.class, () -> Samples.read(AMERICAN + line + "\n"));
    assertEquals(1, refused.problems().size());
    String message = refused.problems().get(0).message();
    assertTrue(message.contains(told), message);
    assertFalse(message.contains("_power"), message);
  }
}
