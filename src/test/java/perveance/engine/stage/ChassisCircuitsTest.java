package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;

/** The circuits that a chassis makes: all of it, and the groups that hang together. */
class ChassisCircuitsTest {
  private static ChassisBench bench() {
    return new ChassisBench()
        .device("12AX7", YardstickTriode.T12AX7)
        .supply("A", 385)
        .dropped("B", "A", 10e3)
        .dropped("C", "B", 10e3)
        .stage(
            "V2a",
            "common-cathode",
            "device",
            "12ax7",
            "supply",
            "B",
            "anode_load",
            47e3,
            "cathode_resistor",
            56e3)
        .stage(
            "V1a",
            "common-cathode",
            "device",
            "12AX7",
            "supply",
            "C",
            "anode_load",
            100e3,
            "cathode_resistor",
            1500,
            "coupling",
            22e-9,
            "drives",
            "V1b")
        .stage(
            "V1b",
            "common-cathode",
            "device",
            "12AX7",
            "supply",
            "C",
            "anode_load",
            220e3,
            "cathode_resistor",
            1500,
            "grid_leak",
            470e3,
            "grid_stopper",
            10e3,
            "drives",
            "V2a");
  }

  private static DcSolution solve(Circuit circuit) {
    return assertInstanceOf(DcOutcome.Converged.class, new DcSolver(circuit).solve()).solution();
  }

  @Test
  void groupsFollowTheSignal() {
    ChassisCircuits circuits = bench().circuits();
    assertEquals(
        List.of(
            new ChassisCircuits.Group(List.of("V1a"), List.of("C"), Optional.empty()),
            new ChassisCircuits.Group(
                List.of("V1b", "V2a"), List.of("C", "B"), Optional.of("V1a"))),
        circuits.groups());
  }

  @Test
  void supplyChainCarriesWhatTheStagesDraw() {
    DcSolution whole = solve(bench().circuits().whole().circuit());
    double c = whole.current("V1a.anode_load") + whole.current("V1b.anode_load");
    double b = c + whole.current("V2a.anode_load");
    // Ohm's law along the chain: 385 V - 10 kohm for all - 10 kohm for the two at its end.
    assertEquals(385 - 10e3 * b, whole.voltage("supply.B"), 1e-6);
    assertEquals(385 - 10e3 * b - 10e3 * c, whole.voltage("supply.C"), 1e-6);
  }

  @Test
  void groupOnSolvedNodesRestsAsInTheWhole() {
    ChassisCircuits circuits = bench().circuits();
    DcSolution whole = solve(circuits.whole().circuit());
    Map<String, Double> voltages = new HashMap<>();
    for (String supply : List.of("A", "B", "C")) {
      voltages.put(supply, whole.voltage("supply." + supply));
    }
    for (ChassisCircuits.Group group : circuits.groups()) {
      Circuit alone = circuits.build(group, voltages, OptionalDouble.of(39e3), Map.of()).circuit();
      DcSolution part = solve(alone);
      for (String node : alone.nodes()) {
        assertEquals(whole.voltage(node), part.voltage(node), 1e-6, node);
      }
    }
  }

  @Test
  void directCoupledGridIsTheAnodeBefore() {
    ChassisCircuits circuits = bench().circuits();
    Circuit whole = circuits.whole().circuit();
    Element.Valve driven = (Element.Valve) whole.elements().get(whole.element("V2a"));
    assertEquals(whole.node("V1b.anode"), driven.grid());
    StageCircuit stage = circuits.whole().stages().get(2);
    assertEquals(Optional.empty(), stage.input());
    assertEquals(whole.node("V1b.anode"), stage.inputNode());
  }

  @Test
  void capacitorCoupledStageIsLoadedByTheNextInput() {
    ChassisCircuits circuits = bench().circuits();
    ChassisCircuits.Group first = circuits.groups().get(0);
    Circuit byKeys =
        circuits.build(first, Map.of("C", 270.0), OptionalDouble.empty(), Map.of()).circuit();
    assertEquals(470e3, resistance(byKeys, "V1a.next_leak"), 0);
    Surroundings.NextInput known = new Surroundings.NextInput("V1b", 460e3, 10e3, 150e-12);
    Circuit measured =
        circuits
            .build(first, Map.of("C", 270.0), OptionalDouble.empty(), Map.of("V1b", known))
            .circuit();
    assertEquals(460e3, resistance(measured, "V1a.next_leak"), 0);
    assertEquals(10e3, resistance(measured, "V1a.next_stopper"), 0);
    Element.Capacitor miller =
        (Element.Capacitor) measured.elements().get(measured.element("V1a.next_capacitance"));
    assertEquals(150e-12, miller.capacitance(), 0);
  }

  private static double resistance(Circuit circuit, String name) {
    return ((Element.Resistor) circuit.elements().get(circuit.element(name))).resistance();
  }

  @Test
  void drivenStageHasItsDriversOutputResistance() {
    ChassisCircuits circuits = bench().circuits();
    Circuit driven =
        circuits
            .build(
                circuits.groups().get(1),
                Map.of("B", 330.0, "C", 300.0),
                OptionalDouble.of(39e3),
                Map.of())
            .circuit();
    assertEquals(39e3, resistance(driven, "V1b.source"), 0);
  }
}
