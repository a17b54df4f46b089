package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;

/**
 * The whole circuit in states that no sheet shows: valves cold, a valve shorted, a valve pulled.
 */
final class FaultCircuits {
  /** A short inside a valve, small against every part [ohm]. */
  private static final double SHORT = 1;

  private final Circuit circuit;

  FaultCircuits(Circuit circuit) {
    this.circuit = circuit;
  }

  /** All valves cold: the moment after switch-on. */
  Optional<DcSolution> cold() {
    List<Element> elements = new ArrayList<>();
    for (Element element : circuit.elements()) {
      elements.add(element instanceof Valve valve ? cold(valve) : element);
    }
    return solve(elements);
  }

  /** The sections of one valve out of its socket, the others hot. */
  Optional<DcSolution> pulled(Set<String> refs) {
    List<Element> elements = new ArrayList<>();
    for (Element element : circuit.elements()) {
      elements.add(
          element instanceof Valve valve && refs.contains(valve.name()) ? cold(valve) : element);
    }
    return solve(elements);
  }

  /** One valve with its anode shorted to its cathode. */
  Optional<DcSolution> shorted(String ref) {
    Valve valve = (Valve) circuit.elements().get(circuit.element(ref));
    return withShort(valve, valve.cathode());
  }

  /** One valve with its anode shorted to chassis. */
  Optional<DcSolution> shortedToChassis(String ref) {
    Valve valve = (Valve) circuit.elements().get(circuit.element(ref));
    return withShort(valve, 0);
  }

  private Optional<DcSolution> withShort(Valve valve, int to) {
    if (valve.anode() == to) {
      return Optional.empty();
    }
    List<Element> elements = new ArrayList<>();
    for (Element element : circuit.elements()) {
      elements.add(element.equals(valve) ? cold(valve) : element);
    }
    elements.add(new Resistor(valve.name() + ".short", valve.anode(), to, SHORT));
    return solve(elements);
  }

  private static Valve cold(Valve v) {
    return new Valve(
        v.name(), new ColdLaw(v.law().kind()), v.anode(), v.grid(), v.screen(), v.cathode());
  }

  private Optional<DcSolution> solve(List<Element> elements) {
    return new DcSolver(new Circuit(circuit.nodes(), elements)).solve()
            instanceof DcOutcome.Converged solved
        ? Optional.of(solved.solution())
        : Optional.empty();
  }
}
