package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BiasMessage;

/**
 * Derived: a wide band of idle current is one for the bench to set only where a voltage on the grid
 * makes the bias. A pair that follows the anode it is wired to may spread as widely, with that
 * anode; no adjustment is there, and its cathodes make its bias.
 */
class FixedBiasSpreadTest {
  private static final AnalysisOptions OPTIONS = AnalysisOptions.FULL.withSamples(400);

  /** A pentode on a fixed bias: most of its spread is found again at its anode. */
  private static final String[] DRIVER = {
    "device",
    "EF86",
    "supply",
    "A",
    "anode_load",
    "100k",
    "screen_voltage",
    "100 V",
    "grid_bias",
    "-2.1 V",
    "grid_leak",
    "1M",
    "drives",
    "V2"
  };

  private static List<String> told(Bench bench) {
    return bench.answer(OPTIONS).findings().stream()
        .filter(f -> f.code() == BiasMessage.FIXED_BIAS_SPREAD)
        .map(f -> f.part().orElse(f.where()))
        .toList();
  }

  private static void isWide(Bench bench, String ref) {
    DevicePoint point =
        bench.answer(OPTIONS).stages().stream()
            .flatMap(s -> s.points().stream())
            .filter(p -> p.ref().equals(ref))
            .findFirst()
            .orElseThrow();
    Band band = point.bands().getOrDefault("anodeCurrent", new Band(0, 0, List.of()));
    assertTrue(band.high() > 1.8 * band.low() && band.low() > 0, ref + " " + band);
  }

  @Test
  void aPairThatFollowsAnAnodeIsNotToBeSet() {
    Bench bench =
        Bench.on(250)
            .stage("V1", "common-cathode", DRIVER)
            .stage(
                "V2",
                "long-tailed-pair",
                "device",
                "12AX7",
                "supply",
                "A",
                "anode_load",
                "100k",
                "tail_resistor",
                "56k",
                "second_grid_leak",
                "1M",
                "second_grid_bypass",
                "100n");
    isWide(bench, "V2a");
    // the pentode before it is on a fixed bias, and is told
    assertEquals(List.of("V1"), told(bench));
  }

  @Test
  void aCathodeBiasedOutputPairIsNotToBeSet() {
    Bench bench =
        FindingCases.pair(
            430, "EL34", "primary", "3k4", "cathode_resistor", "470", "screen_resistor", "1k");
    assertEquals(List.of(), told(bench));
  }

  @Test
  void aPairOnAFixedVoltageIsToBeSet() {
    Bench bench =
        FindingCases.pair(
            430, "EL34", "primary", "3k4", "grid_bias", "-38 V", "screen_resistor", "1k");
    isWide(bench, "V2a");
    assertEquals(List.of("V2a", "V2b"), told(bench));
  }

  /** A resistor of 1 ohm at the cathode is there to measure at and holds no bias. */
  @Test
  void aSenseResistorHoldsNoBias() {
    Bench bench =
        FindingCases.pair(
            430,
            "EL34",
            "primary",
            "3k4",
            "grid_bias",
            "-38 V",
            "screen_resistor",
            "1k",
            "cathode_resistor",
            "1R");
    assertEquals(List.of("V2a", "V2b"), told(bench));
  }
}
