package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;

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
   * All of the anode's current comes through the cathode, whose voltage the anode follows with the
   * gain (mu + 1) RL / (RL + ra). A capacitance C on the anode is seen at the cathode times that
   * gain, less what the turned anode voltage takes back through ra: C (mu + 1) (RL / (RL + ra))^2.
   * 2 %: mu and ra are those of the point, to three figures.
   */
  @Test
  void theAnodesCapacitanceIsSeenThroughTheCathodeTimesTheGain() {
    StageAnswer more = groundedGrid("100n", "20p");
    DevicePoint valve = more.points().get(0);
    double load = 1 / (1 / 10e3 + 1 / 100e3);
    double share = load / (load + valve.anodeResistance());
    double expected = 10e-12 * (valve.amplificationFactor() + 1) * share * share;
    double found =
        more.smallSignal().inputCapacitance()
            - groundedGrid("100n", "10p").smallSignal().inputCapacitance();
    assertEquals(expected, found, 0.02 * expected);
  }
}
