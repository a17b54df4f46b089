package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.base.QuantityFormat;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/**
 * Reader and writer know no kind of stage: whatever keys a kind declares are written and read back
 * the same, for every kind there is or will be.
 */
class EveryKindTest {
  private static final int STAGES = 200;

  private final Random random = new Random(12);

  static List<StageKind> kinds() {
    return StageKinds.all();
  }

  @ParameterizedTest
  @MethodSource("kinds")
  void itsKeysAreWrittenAndReadBack(StageKind kind) {
    for (int i = 0; i < STAGES; i++) {
      Chassis chassis = chassisOf(kind);
      String text = ChassisWriter.fresh(chassis);
      try {
        assertEquals(chassis, Samples.read(text), text);
      } catch (BadInputException e) {
        e.problems().forEach(problem -> assertOnlyContradictions(problem, text));
      }
    }
  }

  /** Keys taken at random contradict each other, which the kind says; nothing else is wrong. */
  private static void assertOnlyContradictions(Problem problem, String text) {
    String message = problem.message();
    assertTrue(problem.key().startsWith("stage S "), message);
    assertTrue(!problem.found().contains("unknown key"), message);
    assertTrue(!problem.expected().matches(".* from \\S+( \\S+)? to .*"), message + "\n" + text);
  }

  private Chassis chassisOf(StageKind kind) {
    StageEntry stage = new StageEntry("S", kind.name(), Map.of());
    StageEntry driven =
        new StageEntry("T", "common-cathode", Map.of())
            .with("device", new Setting.Word("12AX7"))
            .with("supply", new Setting.Word("A"))
            .with("anode_load", new Setting.Number("100k", 100e3))
            .with("cathode_resistor", new Setting.Number("1k5", 1500))
            .with("grid_leak", new Setting.Number("1M", 1e6));
    for (KeySpec key : kind.keys()) {
      if (key.required() || random.nextInt(3) == 0) {
        stage = stage.with(key.key(), setting(key));
      }
    }
    Supply supply =
        new Supply("A", new SupplyFeed.Stated(300), OptionalDouble.empty(), OptionalDouble.empty());
    return new Chassis("t", Conditions.USUAL, List.of(supply), List.of(stage, driven));
  }

  private Setting setting(KeySpec key) {
    return switch (key.form()) {
      case QUANTITY -> {
        double part = random.nextDouble();
        double value =
            key.lowest() > 0
                ? key.lowest() * Math.pow(key.highest() / key.lowest(), part)
                : key.lowest() + part * (key.highest() - key.lowest());
        value = Math.max(key.lowest(), Math.min(key.highest(), value));
        yield new Setting.Number(QuantityFormat.PLAIN.part(value, key.unit()), value);
      }
      case FLAG -> new Setting.Flag(random.nextBoolean());
      case WORD ->
          new Setting.Word(
              key.choices().isEmpty()
                  ? "V9"
                  : key.choices().get(random.nextInt(key.choices().size())));
      case DEVICE -> new Setting.Word(random.nextBoolean() ? "6SN7GT" : "ECC83");
      case SUPPLY -> new Setting.Word("A");
      case STAGE -> new Setting.Word("T");
    };
  }
}
