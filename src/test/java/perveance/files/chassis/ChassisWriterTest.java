package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.toml.SourceText;

/** Saving changes what was changed and nothing else. */
class ChassisWriterTest {
  private static final String TEXT = Samples.THREE_STAGES;

  private static String saved(String text, Chassis after) throws BadInputException {
    String saved = ChassisWriter.update(SourceText.of("a", text), Samples.read(text), after);
    assertEquals(after, Samples.read(saved), saved);
    return saved;
  }

  private static Chassis withStages(Chassis chassis, List<StageEntry> stages) {
    return new Chassis(chassis.title(), chassis.conditions(), chassis.supplies(), stages);
  }

  private static Chassis withSupplies(Chassis chassis, List<Supply> supplies) {
    return new Chassis(chassis.title(), chassis.conditions(), supplies, chassis.stages());
  }

  @Test
  void withoutAChangeTheTextStaysAsItIs() throws BadInputException {
    assertEquals(TEXT, saved(TEXT, Samples.read(TEXT)));
    String windows = TEXT.replace("\n", "\r\n");
    assertEquals(windows, saved(windows, Samples.read(windows)));
  }

  @Test
  void aChangedAnAddedAndARemovedValueTouchThreeLines() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    stages.set(
        0,
        stages
            .get(0)
            .with("device", new Setting.Word("ECC82"))
            .without("cathode_bypass")
            .without("drive"));
    stages.set(2, stages.get(2).with("drive", new Setting.Number("2 V", 2)));
    assertEquals(
        TEXT.replace("\"12AX7\"   # new", "\"ECC82\"   # new")
            .replace("cathode_bypass = \"22u\"\n", "")
            .replace("drive = \"0,2 V\"\n", "")
            .replace("load = \"100k\"\n", "load = \"100k\"\n")
            .concat("drive = \"2 V\"\n"),
        saved(TEXT, withStages(chassis, stages)));
  }

  /** Both words mean a screen with its own feed; the file keeps the one that was written. */
  @Test
  void theWordForABeamValveStays() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    for (String word : List.of("beam", "tetrode", "pentode")) {
      List<StageEntry> stages = new ArrayList<>(chassis.stages());
      StageEntry beam =
          stages
              .get(0)
              .with("device", new Setting.Word("6V6GT"))
              .with("connection", new Setting.Word(word))
              .with("screen_voltage", new Setting.Number("200 V", 200));
      stages.set(0, beam);
      String text = saved(TEXT, withStages(chassis, stages));
      assertTrue(text.contains("connection = \"" + word + "\""), text);
      stages.set(0, beam.with("drive", new Setting.Number("1 V", 1)));
      String again = saved(text, withStages(Samples.read(text), stages));
      assertTrue(again.contains("connection = \"" + word + "\""), again);
    }
  }

  @Test
  void aRenamedStageAndItsDriverKeepTheirComments() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    StageEntry old = stages.get(2);
    stages.set(2, new StageEntry("V7", old.kind(), old.settings()));
    stages.set(1, stages.get(1).with("drives", new Setting.Word("V7")));
    assertEquals(TEXT.replace("\"V2\"", "\"V7\""), saved(TEXT, withStages(chassis, stages)));
  }

  @Test
  void aDuplicatedStageStandsBelowItsModel() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    stages.add(new StageEntry("V2-copy", "common-cathode", stages.get(2).settings()));
    String saved = saved(TEXT, withStages(chassis, stages));
    assertTrue(saved.startsWith(TEXT + "\n[[stage]]\nref = \"V2-copy\"\n"), saved);
  }

  @Test
  void titleAndConditionsAreChangedInPlace() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    Chassis after =
        new Chassis(
            "New",
            new Conditions(120, 120, 60, 10e6, 0.05, 0.2, 0.06, 60),
            chassis.supplies(),
            chassis.stages());
    assertEquals(
        TEXT.replace("\"Line amplifier \\\"Heron\\\"\"", "\"New\"")
            .replace("mains = \"230 V\"", "mains = \"120 V\"")
            .replace(
                "mains_actual = \"238 V\"",
                "mains_actual = \"120 V\"\nmains_frequency = \"60 Hz\""),
        saved(TEXT, after));
  }

  @Test
  void suppliesAreChangedAddedRenamedAndTakenOut() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    Supply a = chassis.supplies().get(0);
    Supply b = chassis.supplies().get(1);
    Supply stated =
        new Supply("B", new SupplyFeed.Stated(250), OptionalDouble.empty(), OptionalDouble.empty());
    assertEquals(
        TEXT.replace(
            "from = \"A\"\n"
                + "dropper = \"10k\"\n"
                + "reservoir = \"22u\"\n"
                + "bleeder = \"470k\"  # stays in\n",
            "voltage = \"250 V\"\n"),
        saved(TEXT, withSupplies(chassis, List.of(a, stated))));
    Supply c =
        new Supply("C 1", new SupplyFeed.Dropped("B", 1e3), OptionalDouble.empty(), a.bleeder());
    assertEquals(
        TEXT.replace(
            "# stays in\n", "# stays in\n\n[supply.\"C 1\"]\nfrom = \"B\"\ndropper = \"1k\"\n"),
        saved(TEXT, withSupplies(chassis, List.of(a, b, c))));
    List<StageEntry> onX = new ArrayList<>();
    for (StageEntry stage : chassis.stages()) {
      onX.add(stage.with("supply", new Setting.Word("X")));
    }
    Supply x = new Supply("X", a.feed(), a.reservoir(), a.bleeder());
    String saved = saved(TEXT, withStages(withSupplies(chassis, List.of(x)), onX));
    assertTrue(saved.contains("[supply.X]\nvoltage = \"300 V\"      # at the reservoir\n"), saved);
    assertTrue(!saved.contains("smoothing for the input stage"), saved);
  }

  @Test
  void suppliesInBracesStayInBraces() throws BadInputException {
    String text =
        "perveance = 1\nsupply = { A = { voltage = \"300 V\", bleeder = \"1M\" } } # all\n";
    Chassis chassis = Samples.read(text);
    Supply b =
        new Supply(
            "B",
            new SupplyFeed.Dropped("A", 22e3),
            OptionalDouble.of(47e-6),
            OptionalDouble.empty());
    Supply a =
        new Supply("A", new SupplyFeed.Stated(310), OptionalDouble.empty(), OptionalDouble.empty());
    assertEquals(
        "perveance = 1\nsupply = { A = { voltage = \"310 V\" }, B = { from = \"A\", dropper ="
            + " \"22k\", reservoir = \"47u\" } } # all\n",
        saved(text, withSupplies(chassis, List.of(a, b))));
  }

  @Test
  void aFreshChassisIsWrittenInTheUsualOrder() throws BadInputException {
    Chassis chassis = Samples.read(TEXT);
    String fresh = ChassisWriter.fresh(chassis);
    assertEquals(chassis, Samples.read(fresh), fresh);
    assertTrue(
        fresh.startsWith(
            """
            perveance = 1
            title = "Line amplifier \\"Heron\\""

            [conditions]
            mains_actual = "238 V"

            [supply.A]
            voltage = "300 V"

            [supply.B]
            from = "A"
            dropper = "10k"
            reservoir = "22u"
            bleeder = "470k"

            [[stage]]
            ref = "V1a"
            kind = "common-cathode"
            device = "12AX7"
            """),
        fresh);
  }
}
