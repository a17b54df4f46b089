package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/**
 * Derived: which way round each shipped example amplifies, and how far its output can swing.
 *
 * <p>Sign: a grid that rises draws more current, so an anode under a load falls (inverting) and a
 * cathode above one rises with it (not inverting); with the grid held and the cathode driven the
 * anode rises with it. A second output that is to oppose the first has the other sign. The anode of
 * an output stage counts as its output through a winding of the same sense.
 *
 * <p>Swing: a node between two parts of a resistor stage stays between chassis and supply, so it
 * moves by no more than the nearer of the two. Under a choke or a winding it may rise above the
 * supply, but falls to chassis at most; a winding hands on no more than its ratio of that, and both
 * halves of a push-pull primary move together.
 */
class ExampleSwingTest {
  private static final DeviceFiles DEVICES = new DeviceFiles(List.of());

  /** Sign of the gain of every kind. */
  private static final Map<String, Integer> SIGNS =
      Map.ofEntries(
          Map.entry("common-cathode", -1),
          Map.entry("choke-load", -1),
          Map.entry("cascode", -1),
          Map.entry("totem-pole", -1),
          Map.entry("mu-follower", -1),
          Map.entry("long-tailed-pair", -1),
          Map.entry("paraphase", -1),
          Map.entry("concertina", -1),
          Map.entry("single-ended-output", -1),
          Map.entry("push-pull-output", -1),
          Map.entry("cathode-follower", 1),
          Map.entry("white-follower", 1),
          Map.entry("grounded-grid", 1));

  @ParameterizedTest
  @MethodSource("perveance.engine.analysis.ExampleAnswersTest#examples")
  void signAndSwingAreThoseOfTheWiring(Path example) throws BadInputException {
    ChassisAnswer answer =
        new ChassisAnalysis(DEVICES)
            .answer(
                new ChassisReader(DEVICES).read(example), AnalysisOptions.LIVE, Progress.none());
    for (StageAnswer stage : answer.stages()) {
      String name = example.getFileName() + " " + stage.ref();
      int sign = SIGNS.getOrDefault(stage.kind(), 0);
      double gain = stage.smallSignal().gain();
      assertEquals(sign, (int) Math.signum(gain), name + " gain " + gain);
      stage
          .smallSignal()
          .secondGain()
          .ifPresent(second -> assertEquals(-sign, (int) Math.signum(second), name + " second"));
      double room = room(stage, answer);
      double peak = stage.clean().outputPeak();
      assertTrue(peak > 0 && peak < room, name + " " + peak + " of " + room);
    }
  }

  /** Largest peak that the output has room for. */
  private static double room(StageAnswer stage, ChassisAnswer answer) {
    DevicePoint first = stage.points().get(0);
    DevicePoint last = stage.points().get(stage.points().size() - 1);
    return switch (stage.kind()) {
      case "single-ended-output" -> first.anodeChassis() * ratio(stage, answer);
      case "push-pull-output" -> 2 * first.anodeChassis() * ratio(stage, answer);
      case "choke-load" -> first.anodeChassis();
      case "cathode-follower", "white-follower" -> nearer(stage, answer, first.cathodeChassis());
      case "totem-pole", "mu-follower" -> nearer(stage, answer, last.cathodeChassis());
      case "grounded-grid", "cascode" -> nearer(stage, answer, last.anodeChassis());
      default -> nearer(stage, answer, first.anodeChassis());
    };
  }

  private static double nearer(StageAnswer stage, ChassisAnswer answer, double rest) {
    String feed = setting(entry(stage, answer), "supply").text();
    double supply =
        answer.supplies().stream()
            .filter(s -> s.name().equals(feed))
            .findFirst()
            .orElseThrow()
            .voltage();
    return Math.min(rest, supply - rest);
  }

  /** Volts at the load for a volt across the whole primary; 1 where the load is the primary's. */
  private static double ratio(StageAnswer stage, ChassisAnswer answer) {
    StageEntry entry = entry(stage, answer);
    double primary = number(entry, "primary");
    boolean wound = entry.settings().containsKey("secondary_load");
    return wound ? Math.sqrt(number(entry, "secondary_load") / primary) : 1;
  }

  private static double number(StageEntry entry, String key) {
    return ((Setting.Number) setting(entry, key)).value();
  }

  private static Setting setting(StageEntry entry, String key) {
    return Objects.requireNonNull(entry.settings().get(key), key);
  }

  private static StageEntry entry(StageAnswer stage, ChassisAnswer answer) {
    return answer.chassis().stage(stage.ref()).orElseThrow();
  }
}
