package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.StageCircuit.Output;

/** A splitter wired straight to the grids of an output pair, with linear valves. */
class DirectOutputTest {
  private static ChassisBench driver(String kind, Object... keysAndValues) {
    return new ChassisBench()
        .device("SMALL", LinearValve.triode(20, 7.7e3))
        .device("POWER", LinearValve.triode(4.2, 800))
        .supply("A", 400)
        .stage("V1", kind, keysAndValues)
        .stage(
            "V2",
            "push-pull-output",
            "device",
            "POWER",
            "supply",
            "A",
            "primary",
            5e3,
            "cathode_resistor",
            2e3,
            "shared",
            true);
  }

  /**
   * Derived. Concertina: mu R / (ra + (mu + 2) R) to each output, of opposite sign. The pair: 2 mu
   * (Raa / 2) / (ra + Raa / 2) from either grid, its shared cathode without signal. Together their
   * product. Tolerance: the digits of the sums.
   */
  @Test
  void gainsMultiply() {
    ChassisBench bench =
        driver(
            "concertina",
            "device",
            "SMALL",
            "supply",
            "A",
            "anode_load",
            22e3,
            "cathode_load",
            22e3,
            "grid_bias",
            100,
            "grid_leak",
            1e6,
            "drives",
            "V2");
    assertEquals(List.of(), bench.complaints());
    ChassisCircuits.Built built = bench.circuits().whole();
    DcSolution dc =
        assertInstanceOf(DcOutcome.Converged.class, new DcSolver(built.circuit()).solve())
            .solution();
    double splitter = 20 * 22e3 / (7.7e3 + 22 * 22e3);
    double pair = 2 * 4.2 * 2500 / (800 + 2500);
    Output out = built.stages().get(1).outputs().get(0);
    int source = built.circuit().element("V1.input");
    double gain = new SmallSignal(dc).midbandGain(source, out.plus(), out.minus());
    assertEquals(splitter * pair, gain, 1e-3 * gain);
  }

  /** Each grid is the node of one output of the splitter; no leak is left. */
  @Test
  void gridsAreTheOutputsOfTheSplitter() {
    ChassisBench bench =
        driver(
            "long-tailed-pair",
            "device",
            "SMALL",
            "supply",
            "A",
            "anode_load",
            47e3,
            "tail_resistor",
            10e3,
            "grid_bias",
            40,
            "drives",
            "V2");
    assertEquals(List.of(), bench.complaints());
    var circuit = bench.circuits().whole().circuit();
    Element.Valve first = (Element.Valve) circuit.elements().get(circuit.element("V2a"));
    Element.Valve second = (Element.Valve) circuit.elements().get(circuit.element("V2b"));
    assertEquals(circuit.node("V1.anode"), first.grid());
    assertEquals(circuit.node("V1.anode2"), second.grid());
    assertEquals(
        List.of(),
        circuit.elements().stream().filter(e -> e.name().startsWith("V2.grid_leak")).toList());
  }

  /** A stage with one output cannot hold two grids. */
  @Test
  void oneOutputIsRefused() {
    ChassisBench bench =
        driver(
            "common-cathode",
            "device",
            "SMALL",
            "supply",
            "A",
            "anode_load",
            47e3,
            "cathode_resistor",
            1e3,
            "drives",
            "V2");
    assertEquals(1, bench.complaints().size());
  }
}
