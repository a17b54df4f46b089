package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.analysis.SignalChain.Link;

/** Gain budget, levels and what overloads first in a row of stages. */
class SignalChainTest {
  private static Bench three() {
    return Bench.on(310)
        .stage(
            "V1a",
            "common-cathode",
            "device",
            "12AX7",
            "supply",
            "A",
            "anode_load",
            "100k",
            "cathode_resistor",
            "1k5",
            "cathode_bypass",
            "22u",
            "grid_leak",
            "1M",
            "source",
            "10k",
            "coupling",
            "22n",
            "drives",
            "V1b",
            "drive",
            "5 mV")
        .stage(
            "V1b",
            "common-cathode",
            "device",
            "12AX7",
            "supply",
            "A",
            "anode_load",
            "100k",
            "cathode_resistor",
            "1k5",
            "grid_leak",
            "470k",
            "coupling",
            "22n",
            "drives",
            "V2")
        .stage(
            "V2",
            "cathode-follower",
            "device",
            "12AX7",
            "supply",
            "A",
            "cathode_load",
            "100k",
            "cathode_resistor",
            "2k2",
            "grid_leak",
            "1M",
            "load",
            "100k",
            "coupling",
            "1u");
  }

  /**
   * Derived. The whole gain is the product of the stages' gains, each into the next one's leak; the
   * level at each input is that of the first times the gains before. Exact.
   */
  @Test
  void levelsAreProductsOfGains() {
    ChassisAnswer answer = three().answer(AnalysisOptions.LIVE);
    SignalChain chain = answer.chains().get(0);
    List<Link> links = chain.links();
    assertEquals(List.of("V1a", "V1b", "V2"), links.stream().map(Link::ref).toList());
    double gain = 1;
    for (Link link : links) {
      assertEquals(chain.inputPeak() * Math.abs(gain), link.inputPeak(), 1e-9 * link.inputPeak());
      assertEquals(
          5e-3 * Math.abs(gain),
          link.drivenInput().orElseThrow(),
          1e-9 * link.drivenInput().orElseThrow());
      gain *= link.gain();
    }
    assertEquals(gain, chain.gain(), 1e-9 * Math.abs(gain));
    assertEquals(chain.outputPeak(), chain.inputPeak() * Math.abs(gain), 1e-6);
  }

  /**
   * Derived. The level at each input when the first stage clips is within that stage's own clean
   * input, and equal to it at the one that clips first. The gain into 470 k is 56 (hand sum), so
   * that V1b is reached by 2.2 V at 39 mV, long before V1a's own 1 V. Tolerance 10 %, the law's.
   */
  @Test
  void theFirstToOverloadIsTheOneWithoutRoom() {
    ChassisAnswer answer = three().answer(AnalysisOptions.LIVE);
    SignalChain chain = answer.chains().get(0);
    for (Link link : chain.links()) {
      StageAnswer stage =
          answer.stages().stream()
              .filter(s -> s.ref().equals(link.ref()))
              .findFirst()
              .orElseThrow();
      double room = stage.clean().inputPeak() / link.inputPeak();
      assertTrue(room >= 1 - 1e-9, link.toString());
      assertEquals(20 * Math.log10(room), link.spare(), 1e-6);
    }
    Link first =
        chain.links().stream()
            .filter(l -> l.ref().equals(chain.clipsFirst()))
            .findFirst()
            .orElseThrow();
    assertEquals(0, first.spare(), 1e-9);
    assertTrue(chain.inputPeak() < 0.05, chain.toString());
  }

  @Test
  void aStageByItselfMakesNoChain() {
    assertTrue(Bench.on(310).standardWith().answer(AnalysisOptions.LIVE).chains().isEmpty());
  }
}
