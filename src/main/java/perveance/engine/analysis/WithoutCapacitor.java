package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.SmallSignal;

/** The small signals of a stage in which one capacitor is open at mid-band. */
final class WithoutCapacitor {
  private WithoutCapacitor() {}

  /** Small signals about the same dc point; empty when the equations then have no answer. */
  static Optional<SmallSignal> signal(StageModel model, Capacitor capacitor) {
    List<Element> elements = new ArrayList<>();
    for (Element element : model.circuit().elements()) {
      elements.add(element.equals(capacitor) ? opened(capacitor) : element);
    }
    Circuit open = new Circuit(model.circuit().nodes(), elements);
    if (!(new DcSolver(open).solveFrom(model.dc()) instanceof DcOutcome.Converged solved)) {
      return Optional.empty();
    }
    SmallSignal signal = new SmallSignal(solved.solution());
    return signal.refusal().isPresent() ? Optional.empty() : Optional.of(signal);
  }

  private static Capacitor opened(Capacitor c) {
    return new Capacitor(c.name(), c.a(), c.b(), c.capacitance(), CapacitorRole.STRAY);
  }
}
