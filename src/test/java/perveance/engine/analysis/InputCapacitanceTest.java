package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Derived: what the input shows of its own, apart from the phase of the coupling behind it. */
class InputCapacitanceTest {
  private static StageAnswer groundedGrid(String coupling, String strayAnode) {
    return Bench.on(150)
        .stage(
            "V1",
            "grounded-grid",
            "device",
            "6DJ8",
            "supply",
            "A",
            "anode_load",
            "10k",
            "cathode_resistor",
            "470R",
            "source",
            "50R",
            "coupling",
            coupling,
            "load",
            "100k",
            "stray_anode",
            strayAnode)
        .first();
  }

  /** The coupling capacitor turns the phase at audio; 1 % is the rounding of the sums. */
  @ParameterizedTest
  @ValueSource(strings = {"1n", "10n", "1u"})
  void theCouplingCapacitorIsNoInputCapacitance(String coupling) {
    double expected = groundedGrid("100n", "10p").smallSignal().inputCapacitance();
    assertEquals(
        expected, groundedGrid(coupling, "10p").smallSignal().inputCapacitance(), 0.01 * expected);
  }

  /**
   * All of the anode's current comes through the cathode: with a load RL and a capacitance C on the
   * anode the input sees C times the gain A, less what the turned anode voltage takes back through
   * ra: C A RL / (RL + ra). 2 %: ra changes a little between the two.
   */
  @Test
  void theAnodesCapacitanceIsSeenThroughTheCathodeTimesTheGain() {
    StageAnswer more = groundedGrid("100n", "20p");
    double load = 1 / (1 / 10e3 + 1 / 100e3);
    double gain = more.smallSignal().gain();
    assertTrue(gain > 5, "" + gain);
    double expected = 10e-12 * gain * load / (load + more.points().get(0).anodeResistance());
    double found =
        more.smallSignal().inputCapacitance()
            - groundedGrid("100n", "10p").smallSignal().inputCapacitance();
    assertEquals(expected, found, 0.02 * expected);
  }
}
