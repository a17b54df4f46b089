package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import perveance.engine.analysis.Envelopes.Envelope;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.circuit.DcSolution;

/** Findings about a valve out of its socket, both its sections gone: supply nodes that rise. */
final class PulledFindings {
  /** A supply node that rises by more than this is told of [1]. */
  private static final double RISE = 1.1;

  private PulledFindings() {}

  /** For each supply node the valve whose absence raises it most. */
  static List<Finding> of(ChassisModel model, DcSolution dc) {
    FaultCircuits faults = new FaultCircuits(model.whole().circuit());
    List<Integer> rails = model.rails();
    double[] most = new double[rails.size()];
    String[] valve = new String[rails.size()];
    for (Envelope envelope : Envelopes.of(model)) {
      Optional<DcSolution> without = faults.pulled(Set.copyOf(envelope.sections()));
      for (int i = 0; i < most.length && without.isPresent(); i++) {
        double reached = without.get().voltage(rails.get(i));
        if (reached > most[i]) {
          most[i] = reached;
          valve[i] = envelope.name();
        }
      }
    }
    List<Finding> findings = new ArrayList<>();
    for (int i = 0; i < most.length; i++) {
      double before = dc.voltage(rails.get(i));
      if (before > 0 && most[i] > RISE * before) {
        String node = Words.place(model.whole().circuit().nodes().get(rails.get(i)));
        findings.add(
            Finding.of(
                    HazardMessage.VALVE_PULLED,
                    Severity.NOTE,
                    node,
                    valve[i],
                    node,
                    Words.of(most[i], Unit.VOLT))
                .withValue(most[i], before, Unit.VOLT));
      }
    }
    return findings;
  }
}
