package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.Severity;
import perveance.engine.base.SupplyMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.Supply;

/**
 * What stages take from the supply nodes at their stated drives beyond what they take at idle, and
 * how far that pulls nodes behind droppers down. The stages are taken to be driven all at once; the
 * drives are held, so a stage whose supply sags is counted with the drive it has at idle volts.
 */
final class SupplyDrain {
  /** A node that falls by more than this is told of, and beyond the second cautioned [1]. */
  private static final double FALL = 0.05;

  private static final double MUCH = 0.15;

  /** Mean current beyond idle by source and supply node [A]. */
  private final Map<String, Map<String, Double>> extra = new HashMap<>();

  /** Adds a stage's cycle; of several driven by one source the one that takes most counts. */
  void add(StageModel model, MidbandSolution cycle) {
    Map<String, Double> taken = new HashMap<>();
    List<Element> elements = model.circuit().elements();
    String prefix = ChassisNames.supply("");
    for (int i = 0; i < elements.size(); i++) {
      String name = elements.get(i).name();
      if (elements.get(i) instanceof VoltageSource && name.startsWith(prefix)) {
        taken.put(name, model.dc().current(name) - cycle.meanCurrent(i));
      }
    }
    extra.merge(elements.get(model.source()).name(), taken, (a, b) -> total(a) >= total(b) ? a : b);
  }

  private static double total(Map<String, Double> taken) {
    return taken.values().stream().mapToDouble(Double::doubleValue).sum();
  }

  /** Findings about nodes that fall at the stated drives. */
  List<Finding> findings(ChassisModel model, DcSolution idle) {
    List<Finding> findings = new ArrayList<>();
    solved(model.whole().circuit())
        .ifPresent(
            driven -> model.chassis().supplies().forEach(s -> fall(s, idle, driven, findings)));
    return findings;
  }

  private Optional<DcSolution> solved(Circuit whole) {
    List<Element> elements = new ArrayList<>(whole.elements());
    extra.forEach(
        (source, taken) ->
            taken.forEach(
                (node, current) ->
                    elements.add(
                        new CurrentSource(
                            source + " at drive from " + node, whole.node(node), 0, current))));
    return !extra.isEmpty()
            && new DcSolver(new Circuit(whole.nodes(), elements)).solve()
                instanceof DcOutcome.Converged found
        ? Optional.of(found.solution())
        : Optional.empty();
  }

  private static void fall(
      Supply supply, DcSolution idle, DcSolution driven, List<Finding> findings) {
    String node = ChassisNames.supply(supply.name());
    double before = idle.voltage(node);
    double after = driven.voltage(node);
    if (before > 0 && after < (1 - FALL) * before) {
      findings.add(
          Finding.of(
                  SupplyMessage.SUPPLY_SAGS,
                  after < (1 - MUCH) * before ? Severity.CAUTION : Severity.NOTE,
                  Words.place(node),
                  supply.name(),
                  Words.of(before, Unit.VOLT),
                  Words.of(after, Unit.VOLT))
              .withValue(after, before, Unit.VOLT));
    }
  }
}
