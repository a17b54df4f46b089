package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.MessageCode;
import perveance.engine.base.Remedy;
import perveance.engine.stage.ChassisChecks;

/**
 * The control of a fixed bias. Derived (exercise): from -58 V with a potentiometer of 25 k, -30 V
 * to -48 V are wanted. 18 V over 25 k are 0.72 mA; 10 V then drop in 13.9 k towards the supply and
 * 30 V in 41.7 k towards chassis. Tolerance: the digits printed.
 */
class BiasSupplyTest {
  private static BiasSupplyAnswer answer(Bench bench) {
    return bench.first().biasSupply().orElseThrow();
  }

  private static List<Finding> told(Bench bench, MessageCode code) {
    return bench.answer(AnalysisOptions.FULL.withSamples(400)).findings().stream()
        .filter(f -> f.code() == code)
        .toList();
  }

  @Test
  void theResistorsForARange() {
    BiasDivider divider = BiasDivider.reaching(-58, 25e3, -48, -30);
    assertEquals(13.9e3, divider.top(), 50);
    assertEquals(41.7e3, divider.bottom(), 50);
  }

  @Test
  void theRangeOfTheResistors() {
    BiasSupplyAnswer answer =
        answer(FindingCases.control("bias_top", "13.889k", "bias_bottom", "41.667k"));
    assertEquals(0.72e-3, answer.current(), 0.005e-3);
    assertEquals(-48, answer.most(), 0.01);
    assertEquals(-30, answer.least(), 0.01);
    // -38 V stand at 8 V of the 18 V
    assertEquals(8.0 / 18, answer.setting().orElseThrow(), 1e-3);
    assertEquals(OptionalDouble.empty(), answer.openWiper());
  }

  /**
   * Derived. A resistor of 250 k from the wiper to the supply takes an open wiper to -58 V, more
   * negative. It moves the ends too: 250 k across the 13.9 k at one, across 38.9 k at the other.
   */
  @Test
  void aHeldWiperFailsToTheNegativeSide() {
    BiasSupplyAnswer answer =
        answer(
            FindingCases.control(
                "bias_top", "13.889k", "bias_bottom", "41.667k", "bias_hold", "250k"));
    assertEquals(-58, answer.openWiper().orElseThrow(), 1e-12);
    assertTrue(answer.openWiper().orElseThrow() < answer.most());
    double top = parallel(13.889e3, 250e3);
    assertEquals(-58 * 66.667e3 / (66.667e3 + top), answer.most(), 0.01);
    double upper = parallel(38.889e3, 250e3);
    assertEquals(-58 * 41.667e3 / (41.667e3 + upper), answer.least(), 0.01);
  }

  private static double parallel(double a, double b) {
    return a * b / (a + b);
  }

  @Test
  void anOpenWiperIsToldOfUnlessItIsHeld() {
    Bench loose = FindingCases.control("bias_top", "13k", "bias_bottom", "36k");
    Finding finding = told(loose, BiasMessage.BIAS_WIPER_OPEN).get(0);
    String hold =
        finding.remedy().map(Remedy::edits).orElse(Map.of()).getOrDefault("bias_hold", "");
    Bench held = FindingCases.control("bias_top", "13k", "bias_bottom", "36k", "bias_hold", hold);
    assertEquals(List.of(), told(held, BiasMessage.BIAS_WIPER_OPEN));
    assertEquals(-58, answer(held).openWiper().orElseThrow(), 1e-12);
  }

  /** The resistors proposed for a bias out of range make it possible to set it. */
  @Test
  void theRemedyReachesTheBias() {
    Bench bench = FindingCases.control("bias_top", "33k", "bias_bottom", "22k");
    assertTrue(answer(bench).setting().isEmpty());
    Map<String, String> edits =
        told(bench, BiasMessage.BIAS_OUT_OF_RANGE).get(0).remedy().orElseThrow().edits();
    Bench cured =
        FindingCases.control(
            "bias_top", edits.getOrDefault("bias_top", ""),
            "bias_bottom", edits.getOrDefault("bias_bottom", ""));
    assertTrue(answer(cured).setting().isPresent());
    assertEquals(List.of(), told(cured, BiasMessage.BIAS_OUT_OF_RANGE));
    assertEquals(List.of(), told(cured, BiasMessage.BIAS_RANGE_SMALL));
  }

  @Test
  void aControlWithoutItsSupplyIsRefused() {
    Bench bench =
        FindingCases.pair(
            430,
            "EL34",
            "primary",
            "3k4",
            "cathode_resistor",
            "470",
            "screen_resistor",
            "1k",
            "bias_pot",
            "25k");
    assertEquals(
        List.of(
            "stage V2 grid_bias: found a bias control without it, expected voltage to chassis at"
                + " the foot of the grid leak with the others",
            "stage V2 bias_supply: found a bias control without it, expected negative voltage that"
                + " the bias is taken from with the others"),
        ChassisChecks.all(bench.chassis(), Bench.LIBRARY).stream().map(c -> c.message()).toList());
  }
}
