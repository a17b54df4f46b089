package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.circuit.ValvePoint;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;

/**
 * What a valve sees from its anode and cathode: the same circuit with the valve taken out and its
 * currents put in by sources. Sections in parallel with it carry the same current each. For the
 * composite view of a pair all its valves are taken out, and the load is what the difference of the
 * currents sees: a quarter of the load from anode to anode (B. J. Thompson, Proc. IRE 21, 591,
 * 1933).
 */
final class LoadSeen {
  private static final String SCREEN_SUFFIX = ".screen_current";

  private final Circuit circuit;
  private final Valve valve;
  private final DcSolver solver;
  private final List<Integer> anodeSources = new ArrayList<>();
  private final ValvePoint point;
  private final boolean straight;
  private final boolean composite;

  LoadSeen(StageModel model, String ref, boolean composite) {
    this.composite = composite;
    this.valve = model.valve(ref);
    this.point = model.dc().valve(ref);
    List<Element> elements = new ArrayList<>();
    boolean onlyLinear = true;
    for (Element element : model.circuit().elements()) {
      if (element instanceof Valve other && (besideIt(other) || (composite && model.owns(other)))) {
        addSources(elements, other, model.dc().valve(other.name()));
      } else {
        elements.add(element);
        onlyLinear &= !(element instanceof Valve) && !(element instanceof Junction);
      }
    }
    this.straight = onlyLinear;
    this.circuit = new Circuit(model.circuit().nodes(), elements);
    for (int i = 0; i < elements.size(); i++) {
      if (elements.get(i) instanceof CurrentSource s && carriesAnode(model, s)) {
        anodeSources.add(i);
      }
    }
    this.solver = new DcSolver(circuit);
  }

  private boolean besideIt(Valve other) {
    return other.anode() == valve.anode() && other.cathode() == valve.cathode();
  }

  private static boolean carriesAnode(StageModel model, CurrentSource source) {
    return model.circuit().elements().stream()
        .anyMatch(e -> e instanceof Valve && e.name().equals(source.name()));
  }

  private static void addSources(List<Element> elements, Valve valve, ValvePoint at) {
    elements.add(
        new CurrentSource(
            valve.name(), valve.anode(), valve.cathode(), at.current(ElectrodeCurrents.ANODE)));
    if (valve.law().kind() == LawKind.PENTODE) {
      elements.add(
          new CurrentSource(
              valve.name() + SCREEN_SUFFIX,
              valve.screen(),
              valve.cathode(),
              at.current(ElectrodeCurrents.SCREEN)));
    }
  }

  /** Operating point of the valve. */
  ValvePoint point() {
    return point;
  }

  /** Whether this is the view of a pair. */
  boolean composite() {
    return composite;
  }

  /** Whether everything else is linear, so that the dc line is straight. */
  boolean straight() {
    return straight;
  }

  /** Anode to cathode volts when each section carries a current [A]; empty when not solvable. */
  Optional<Double> dcVoltage(double current) {
    for (int source : anodeSources) {
      solver.setCurrent(source, current);
    }
    return solver.solve() instanceof DcOutcome.Converged solved
        ? Optional.of(anodeToCathode(solved.solution()))
        : Optional.empty();
  }

  private double anodeToCathode(DcSolution solution) {
    return solution.voltage(valve.anode()) - solution.voltage(valve.cathode());
  }

  /** Mid-band resistance that the valve works into [ohm]; empty when not solvable. */
  Optional<Double> acResistance() {
    for (int source : anodeSources) {
      solver.setCurrent(source, point.current(ElectrodeCurrents.ANODE));
    }
    if (!(solver.solve() instanceof DcOutcome.Converged solved)) {
      return Optional.empty();
    }
    SmallSignal signal = new SmallSignal(solved.solution());
    if (signal.refusal().isPresent()) {
      return Optional.empty();
    }
    double sum = 0;
    for (int source : anodeSources) {
      boolean counted = !composite || circuit.elements().get(source).name().equals(valve.name());
      sum -= !counted ? 0 : signal.midbandGain(source, valve.anode(), valve.cathode());
    }
    return Optional.of(sum);
  }
}
