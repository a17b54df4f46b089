package perveance.engine.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.device.DeviceFiles;

/**
 * The value that a search finds is put back into the chassis and worked out again: the figure must
 * then be as wanted. *Derived*: the check is the analysis itself, within the accuracy asked for.
 */
class KeySearchTest {
  private static final double NEAR = 0.002;

  private final ChassisAnalysis analysis = new ChassisAnalysis(new DeviceFiles(List.of()));

  @ParameterizedTest
  @ValueSource(doubles = {1.05e-3, 1.3e-3, 0.5e-3, 0.1e-3})
  void theBiasResistorGivesTheCurrent(double wanted) {
    Chassis chassis = stage(Map.of("cathode_resistor", 1500.0));
    KeyOutcome outcome = KeySearch.find(chassis, goal("cathode_resistor", wanted), this::answer);
    KeyOutcome.Found found = assertInstanceOf(KeyOutcome.Found.class, outcome);
    double again = current(stage(Map.of("cathode_resistor", found.value())));
    assertEquals(wanted, again, NEAR * wanted);
    assertTrue(found.evaluations() <= 10, found.evaluations() + " answers for one step of a drag");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.6e-3, 1.4e-3})
  void aNegativeBiasStaysNegative(double wanted) {
    Chassis chassis = stage(Map.of("grid_bias", -1.6));
    KeyOutcome outcome = KeySearch.find(chassis, goal("grid_bias", wanted), this::answer);
    KeyOutcome.Found found = assertInstanceOf(KeyOutcome.Found.class, outcome);
    assertTrue(found.value() < 0, found.value() + " V");
    assertEquals(wanted, current(stage(Map.of("grid_bias", found.value()))), NEAR * wanted);
  }

  /** 12AX7, 100 kohm from 300 V: no bias resistor gives more than the current at zero bias. */
  @Test
  void aGoalOutOfReachIsToldWithTheNearestValue() {
    Chassis chassis = stage(Map.of("cathode_resistor", 1500.0));
    KeyOutcome outcome = KeySearch.find(chassis, goal("cathode_resistor", 5e-3), this::answer);
    KeyOutcome.NotFound notFound = assertInstanceOf(KeyOutcome.NotFound.class, outcome);
    assertTrue(notFound.reached() < 3e-3, notFound.toString());
    assertTrue(notFound.reached() > current(chassis), "it went towards the goal");
  }

  @Test
  void aStageWithoutASolutionIsToldAtOnce() {
    Chassis chassis = stage(Map.of("cathode_resistor", 1500.0));
    KeyOutcome outcome =
        KeySearch.find(chassis, goal("cathode_resistor", 1e-3), c -> Optional.empty());
    assertInstanceOf(KeyOutcome.NotFound.class, outcome);
  }

  @Test
  void misuseIsRefused() {
    Chassis chassis = stage(Map.of("grid_bias", -1.6));
    assertThrows(
        IllegalArgumentException.class,
        () -> KeySearch.find(chassis, goal("cathode_resistor", 1e-3), this::answer));
    assertThrows(IllegalArgumentException.class, () -> goal("grid_bias", Double.NaN));
  }

  private static KeyGoal goal(String key, double wanted) {
    KeySpec spec =
        StageKinds.find("common-cathode").orElseThrow().keys().stream()
            .filter(k -> k.key().equals(key))
            .findFirst()
            .orElseThrow();
    double accuracy = Double.isNaN(wanted) ? 1 : NEAR * wanted;
    return new KeyGoal(
        "V1", spec, a -> a.loadLine().map(LoadLineView::current).orElse(0.0), wanted, accuracy);
  }

  private Optional<StageAnswer> answer(Chassis chassis) {
    return analysis.answerStage(chassis, "V1", AnalysisOptions.LIVE);
  }

  private double current(Chassis chassis) {
    return answer(chassis).orElseThrow().loadLine().orElseThrow().current();
  }

  private static Chassis stage(Map<String, Double> bias) {
    Map<String, Setting> settings = new LinkedHashMap<>();
    settings.put("device", new Setting.Word("12AX7"));
    settings.put("supply", new Setting.Word("A"));
    settings.put("anode_load", new Setting.Number("100k", 100e3));
    settings.put("grid_leak", new Setting.Number("1M", 1e6));
    bias.forEach((key, value) -> settings.put(key, new Setting.Number(value.toString(), value)));
    return new Chassis(
        "search",
        Conditions.USUAL,
        List.of(
            new Supply(
                "A", new SupplyFeed.Stated(300), OptionalDouble.empty(), OptionalDouble.empty())),
        List.of(new StageEntry("V1", "common-cathode", settings)));
  }
}
