package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * What builders ask about the operating point. All expected figures are *derived*: worked out with
 * a plain three-halves law with an offset through one published point of the type (12AX7 250 V, -2
 * V, 1.2 mA, 1.6 mA/V, mu 100). Tolerance: another honest law through published points may differ
 * by 10 % in current, 5 % of the supply in anode volts, 10 % in cathode volts.
 */
class OperatingPointQuestionsTest {
  private static final double CURRENT = 0.10;
  private static final double ANODE_SHARE = 0.05;

  private static void point(StageAnswer answer, double supply, double mA, double va, double vk) {
    DevicePoint at = answer.points().get(0);
    assertEquals(mA * 1e-3, at.anodeCurrent(), CURRENT * mA * 1e-3);
    assertEquals(va, at.anodeChassis(), ANODE_SHARE * supply);
    assertEquals(vk, at.cathodeChassis(), 0.10 * vk);
  }

  /** Case: 12AX7, 285 V, 100 k; a bias of -1.5 V asks for 1.53 k, so 1k5: 0.98 mA, 187 V. */
  @Test
  void whichCathodeResistorGivesTheBias() {
    StageAnswer answer = Bench.on(285).standardWith().first();
    point(answer, 285, 0.98, 187, 1.5);
    DevicePoint at = answer.points().get(0);
    assertEquals(1530, 1.5 / at.anodeCurrent(), 0.10 * 1530);
  }

  /** Case: 12AX7, 310 V, 100 k, 1k5: 1.07 mA, 203 V, 1.60 V, 0.215 W. */
  @Test
  void whereDoesItSit() {
    StageAnswer answer = Bench.on(310).standardWith().first();
    point(answer, 310, 1.07, 203, 1.60);
    assertEquals(0.215, answer.points().get(0).anodeDissipation(), 0.1 * 0.215);
  }

  /** Case: the same with other cathode resistors; 820 ohm to 10 k. */
  @ParameterizedTest
  @CsvSource({
    "820, 1.37, 173, 1.12",
    "1k2, 1.18, 192, 1.42",
    "1k5, 1.07, 203, 1.60",
    "1k8, 0.97, 213, 1.75",
    "2k7, 0.77, 233, 2.08",
    "10k, 0.30, 280, 3.0"
  })
  void hotAndCold(String resistor, double mA, double va, double vk) {
    point(Bench.on(310).standardWith("cathode_resistor", resistor).first(), 310, mA, va, vk);
  }

  @Test
  void aLargerCathodeResistorAlwaysRaisesTheAnode() {
    double last = 0;
    for (String resistor : new String[] {"820", "1k", "1k2", "1k5", "1k8", "2k2", "2k7", "10k"}) {
      double anode =
          Bench.on(310)
              .standardWith("cathode_resistor", resistor)
              .first()
              .points()
              .get(0)
              .anodeChassis();
      assertTrue(anode > last);
      last = anode;
    }
  }

  /** Kirchhoff's law in the answer itself: what the anode load carries is the anode current. */
  @Test
  void theAnswerClosesTheLoadLine() {
    DevicePoint at = Bench.on(310).standardWith().first().points().get(0);
    assertEquals(at.anodeCurrent(), (310 - at.anodeChassis()) / 100e3, 1e-12);
    assertEquals(at.anode(), at.anodeChassis() - at.cathodeChassis(), 1e-9);
    assertEquals(at.amplificationFactor(), at.mutualConductance() * at.anodeResistance(), 1e-9);
  }
}
