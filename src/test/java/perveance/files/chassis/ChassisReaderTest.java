package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.device.DeviceFiles;

/** Chassis files: every value arrives, every slip is told with line, key, found and expected. */
class ChassisReaderTest {
  private static final String SOUND = Samples.THREE_STAGES;

  @TempDir private Path folder;

  private static List<String> problems(String text) {
    BadInputException refusal =
        assertThrows(BadInputException.class, () -> Samples.read(text), text);
    return refusal.problems().stream().map(Problem::message).toList();
  }

  @Test
  void everyValueArrives() throws BadInputException {
    Chassis chassis = Samples.read(SOUND);
    assertEquals("Line amplifier \"Heron\"", chassis.title());
    Conditions usual = Conditions.USUAL;
    assertEquals(
        new Conditions(230, 238, 50, 10e6, 0.05, 0.2, 0.06, 60),
        chassis.conditions(),
        usual.toString());
    assertEquals(
        List.of(
            new Supply(
                "A", new SupplyFeed.Stated(300), OptionalDouble.empty(), OptionalDouble.empty()),
            new Supply(
                "B",
                new SupplyFeed.Dropped("A", 10e3),
                OptionalDouble.of(22e-6),
                OptionalDouble.of(470e3))),
        chassis.supplies());
    StageEntry stage = chassis.stages().get(0);
    assertEquals("V1a", stage.ref());
    assertEquals("common-cathode", stage.kind());
    assertEquals(
        List.of(
            "device",
            "supply",
            "anode_load",
            "cathode_resistor",
            "cathode_bypass",
            "grid_leak",
            "source",
            "coupling",
            "drives",
            "drive"),
        List.copyOf(stage.settings().keySet()));
    assertEquals(new Setting.Number("1k5", 1500), stage.settings().get("cathode_resistor"));
    assertEquals(new Setting.Number("1000000", 1e6), stage.settings().get("grid_leak"));
    assertEquals(new Setting.Number("0,2 V", 0.2), stage.settings().get("drive"));
    assertEquals(new Setting.Word("V1b"), stage.settings().get("drives"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "anode_load = \"100k\" | anode_lod = \"100k\" | 30: stage V1a anode_lod: found an unknown"
            + " key, expected a key that belongs here; did you mean \"anode_load\"?",
        "anode_load = \"100k\" | anode_load = \"100 V\" | 30: stage V1a anode_load: found \"100"
            + " V\", which is a voltage in volts (V), expected a resistance in ohms (\u03A9), for"
            + " example \"4k7\"",
        "anode_load = \"100k\" | anode_load = 100k | 30: found 100k, expected text in quotes, a"
            + " plain number, true or false; did you mean \"100k\"?",
        "anode_load = \"100k\" | anode_load = \"-100k\" | 30: stage V1a anode_load: found"
            + " \"-100k\", expected a resistance from 0R01 to 100M",
        "anode_load = \"100k\" | anode_load = 0 | 30: stage V1a anode_load: found 0, expected a"
            + " resistance from 0R01 to 100M",
        "anode_load = \"100k\" | anode_load = nan | 30: stage V1a anode_load: found nan, expected a"
            + " resistance from 0R01 to 100M",
        "anode_load = \"100k\" | anode_load = [1] | 30: stage V1a anode_load: found [1], expected a"
            + " resistance from 0R01 to 100M",
        "\"12AX7\" | \"12AX8\" | 28: stage V1a device: found \"12AX8\", which no device file names,"
            + " expected a known valve; did you mean \"12AX7\"?",
        "kind = \"common-cathode\" | kind = \"comon-cathode\" | 27: stage V1a kind: found"
            + " \"comon-cathode\", expected one of",
        "supply = \"B\" | supply = \"b\" | 29: stage V1a supply: found \"b\", which is no supply,"
            + " expected one of A, B; did you mean \"B\"?",
        "drives = \"V2\" | drives = \"V3\" | 50: stage V1b drives: found \"V3\", which is no other"
            + " stage, expected the ref of another stage; did you mean",
        "drives = \"V2\" | drives = \"V1a\" | 36: stage V1a drives: found stages that drive each"
            + " other in a circle",
        "drives = \"V2\" | drives = \"V1b\" | 50: stage V1b drives: found itself, expected the ref"
            + " of another stage",
        "drives = \"V1b\" | drives = \"V2\" | 50: stage V1b drives: found V2, which V1a drives"
            + " already",
        "ref = \"V2\" | ref = \"V1a\" | 55: stage V1a ref: found \"V1a\" a second time, expected a"
            + " name of its own; it stands in line 26 already",
        "ref = \"V2\" | ref = \"V.2\" | 55: stage V.2 ref: found \"V.2\", expected",
        "ref = \"V2\" | ref = \"\" | 55: stage ref: found an empty text, expected text",
        "from = \"A\" | from = \"B\" | 17: supply B from: found \"B\", which is no other supply",
        "from = \"A\" | from = \"C\" | 17: supply B from: found \"C\", which is no other supply",
        "from = \"A\" | voltage = 1 | 17: supply B voltage: found a voltage as well as from and"
            + " dropper, expected one or the other",
        "voltage = \"300 V\" | voltage = 0 | 13: supply A voltage: found 0 V, expected a voltage up"
            + " to 10 kV, not zero",
        "[supply.A] | [supply.\"A.B\"] | 12: supply A.B: found a supply named \"A.B\", expected",
        "meter = \"10M\" | meter = \"10\" | 8: conditions meter: found \"10\", expected a"
            + " resistance from 1k to 1000M",
        "perveance = 1 | perveance = 2 | 2: perveance: found 2, a form that a later version"
            + " of the program writes, expected form 1",
        "[supply.B] | [supply.A] | 16: found supply.A a second time, expected it once only; it"
            + " stands in line 12 already",
        "supply = \"B\" | # gone | 25: stage V1a supply: found nothing, expected",
      })
  void aSlipIsToldWithItsPlace(String right, String wrong, String message) {
    assertTrue(SOUND.contains(right), right);
    String text = SOUND.replaceFirst(Pattern.quote(right), wrong);
    List<String> told = problems(text);
    assertTrue(
        told.stream().anyMatch(one -> one.startsWith("amp.toml:" + message)),
        () -> "amp.toml:" + message + "\n" + String.join("\n", told));
  }

  @Test
  void allSlipsAreToldAtOnceInTheOrderOfTheFile() {
    String text =
        SOUND
            .replace("\"230 V\"", "\"230 A\"")
            .replace("\"22u\"\nbleeder", "\"22 k\"\nbleeder")
            .replace("\"1k5\"", "1k5")
            .replace("\"ecc83\"", "\"ecc84\"")
            .replace("grid_stopper", "grid_stoper");
    List<String> told = problems(text);
    List<String> lines = told.stream().map(t -> t.split(":")[1]).toList();
    assertEquals(List.of("6", "19", "31", "43", "62"), lines, String.join("\n", told));
  }

  @Test
  void nothingIsToldThatOnlyFollowsFromSomethingElse() {
    // a load that cannot be read is not also missing, a refused node and stage are still there
    for (String wrong :
        List.of(
            SOUND.replaceFirst("anode_load = \"100k\"", "anode_load = \"100 V\""),
            SOUND.replaceFirst("anode_load = \"100k\"", "anode_load = 100k"),
            SOUND.replaceFirst("anode_load = \"100k\"", "anode_load \"100k\""),
            SOUND.replaceFirst("dropper = \"10k\"", "dropper = \"10 V\""),
            SOUND.replaceFirst("kind = \"common-cathode\"", "kind = \"uncommon\""),
            SOUND.replaceFirst("device = \"12AX7\"", "device = \"12AX8\""),
            SOUND.replace("[supply.B]", "[supply.B"),
            SOUND.replace("# output\n[[stage]]", "[[stage"))) {
      List<String> told = problems(wrong);
      // without a header the keys below it belong nowhere and say nothing
      assertEquals(1, told.size(), String.join("\n", told));
    }
  }

  @Test
  void theKeysOfAMisspeltKindAreJudgedByWhatWasMeant() {
    String wrong =
        SOUND
            .replaceFirst("kind = \"common-cathode\"", "kind = \"common-catode\"")
            .replaceFirst("device = \"12AX7\"", "device = \"12AX8\"")
            .replaceFirst("supply = \"B\"", "supply = \"Z\"")
            .replaceFirst("anode_load = ", "anode_lod = ");
    List<String> keys = List.of("kind", "device", "supply", "anode_lod");
    List<String> told = problems(wrong);
    assertEquals(keys.size(), told.size(), String.join("\n", told));
    for (String key : keys) {
      assertTrue(told.stream().anyMatch(t -> t.contains("stage V1a " + key + ":")), key);
    }
  }

  @Test
  void contradictionsBetweenKeysAreToldByTheKind() {
    List<String> told = problems(SOUND.replaceFirst("anode_load = \"100k\"\n", ""));
    assertTrue(
        told.get(0).startsWith("amp.toml:25: stage V1a anode_load: found nothing that feeds"));
  }

  @Test
  void aFaultyDeviceFileIsToldWithItsOwnPlace() throws Exception {
    Path file = folder.resolve("mine.toml");
    Files.writeString(file, "perveance_device = 1\ntype = \"M1\"\n", StandardCharsets.UTF_8);
    ChassisReader reader = new ChassisReader(new DeviceFiles(List.of(folder)));
    Path chassis = folder.resolve("amp.txt");
    Files.writeString(chassis, SOUND.replace("\"12AX7\"", "\"m1\""), StandardCharsets.UTF_8);
    BadInputException refusal = assertThrows(BadInputException.class, () -> reader.read(chassis));
    List<String> told = refusal.problems().stream().map(Problem::message).toList();
    assertTrue(
        told.get(0).startsWith(chassis + ":28: stage V1a device: found \"m1\""), told.get(0));
    assertTrue(told.get(1).startsWith(file + ":1: kind: found nothing"), told.get(1));
  }

  @Test
  void anEmptyFileIsRefusedForItsVersionOnly() {
    assertEquals(
        List.of("amp.toml:1: perveance: found nothing, expected the version of the file's form, 1"),
        problems(""));
  }
}
