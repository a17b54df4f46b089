package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;

/**
 * Derived: the sum that is shown behind a figure comes to the figure, as near as its own note says.
 * Tolerances: three printed digits where sum and engine are the same thing, 3 % where the engine
 * also counts the loss before the grid, 5 % where it counts the other parts' noise or wiring.
 */
class HandSumsTest {
  private static StageAnswer answer;
  private static Map<String, String> results;

  @BeforeAll
  static void solve() {
    answer =
        Bench.on(310)
            .standardWith("drive", "0.5 V", "source", "10k", "grid_stopper", "10k")
            .answer(AnalysisOptions.FULL.withSamples(40))
            .stages()
            .get(0);
    results =
        answer.sums().stream()
            .collect(Collectors.toMap(HandSum::figure, HandSum::result, (a, b) -> a));
  }

  private static double result(String figure, Unit unit) throws QuantityException {
    String text = results.getOrDefault(figure, "");
    assertTrue(!text.isEmpty(), figure + " in " + results.keySet());
    return QuantityParser.parse(text.replace(" rms", "").replace('\u2212', '-'), unit).value();
  }

  private static void near(double engine, double sum, double tolerance) {
    assertEquals(Math.abs(engine), Math.abs(sum), tolerance * Math.abs(engine));
  }

  @Test
  void theOperatingPoint() throws QuantityException {
    DevicePoint point = answer.points().get(0);
    near(point.anodeCurrent(), result("V1a anode current", Unit.AMPERE), 0.01);
    near(point.cathodeChassis(), result("V1a cathode voltage", Unit.VOLT), 0.01);
    near(point.anodeDissipation(), result("V1a anode dissipation", Unit.WATT), 0.01);
  }

  @Test
  void gainResistanceAndCorners() throws QuantityException {
    SmallSignalAnswer small = answer.smallSignal();
    near(small.gain(), result("gain", Unit.RATIO), 0.03);
    near(small.outputResistance(), result("output resistance", Unit.OHM), 0.01);
    SmallSignalAnswer.Shelf shelf = small.shelf().orElseThrow();
    near(shelf.zero(), result("bypass, lower corner", Unit.HERTZ), 0.01);
    near(shelf.pole(), result("bypass, upper corner", Unit.HERTZ), 0.01);
    near(small.couplingCorner().orElseThrow(), result("coupling corner", Unit.HERTZ), 0.01);
    // 0.7 pF and 1.5 pF of wiring are not in the sum
    double wiring = 0.7e-12 * (1 + Math.abs(small.gain())) + 1.5e-12;
    near(small.inputCapacitance(), result("input capacitance", Unit.FARAD) + wiring, 0.05);
  }

  @Test
  void noiseHeadroomAndDistortion() throws QuantityException {
    near(
        answer.smallSignal().noiseInput().orElseThrow(),
        result("noise at the grid", Unit.VOLT),
        0.05);
    near(answer.clean().inputPeak(), result("clean input", Unit.VOLT), 0.03);
    near(answer.clean().headroom().orElseThrow(), result("headroom", Unit.DECIBEL), 0.005);
    double second = answer.driven().orElseThrow().harmonics().get(0);
    near(second, result("second harmonic", Unit.RATIO), 0.05);
  }

  /** The input's corner is the lower of the two that make the upper corner of the stage. */
  @Test
  void theUpperCornerOfTheInput() throws QuantityException {
    double sum = result("upper corner of the input", Unit.HERTZ);
    double engine = answer.smallSignal().highCorner().orElseThrow();
    assertTrue(engine < sum && engine > 0.8 * sum, engine + " and " + sum);
  }
}
