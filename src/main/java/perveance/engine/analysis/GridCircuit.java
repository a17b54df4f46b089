package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;

/** The dc resistance in a valve's grid circuit, which makers limit. */
final class GridCircuit {
  /** The grid current that is sent through it, about what a gassy valve draws [A]. */
  private static final double TEST_CURRENT = 1e-6;

  private static final double TIE = 0.01;

  private GridCircuit() {}

  /**
   * Resistance from grid to cathode with the valves taken as cold and all sources dead. The cathode
   * is tied to chassis: a diode or a valve below it holds it there in use, and lets nothing through
   * when cold; what a cathode resistor adds to a grid leak is too little to count.
   *
   * @param circuit whole circuit
   * @param ref valve
   * @return resistance; empty where no dc path leads from the grid [ohm]
   */
  static OptionalDouble resistance(Circuit circuit, String ref) {
    Valve valve = (Valve) circuit.elements().get(circuit.element(ref));
    List<Element> elements = new ArrayList<>();
    for (Element element : circuit.elements()) {
      elements.add(quiet(element));
    }
    elements.add(
        new CurrentSource(ref + ".grid_test", valve.cathode(), valve.grid(), TEST_CURRENT));
    if (valve.cathode() != 0) {
      elements.add(new Resistor(ref + ".cathode_test", valve.cathode(), 0, TIE));
    }
    return new DcSolver(new Circuit(circuit.nodes(), elements)).solve()
            instanceof DcOutcome.Converged solved
        ? OptionalDouble.of(
            (solved.solution().voltage(valve.grid()) - solved.solution().voltage(valve.cathode()))
                / TEST_CURRENT)
        : OptionalDouble.empty();
  }

  private static Element quiet(Element element) {
    if (element instanceof Valve v) {
      return new Valve(
          v.name(), new ColdLaw(v.law().kind()), v.anode(), v.grid(), v.screen(), v.cathode());
    } else if (element instanceof VoltageSource s) {
      return new VoltageSource(s.name(), s.plus(), s.minus(), 0);
    } else if (element instanceof CurrentSource s) {
      return new CurrentSource(s.name(), s.from(), s.to(), 0);
    }
    return element;
  }
}
