package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.ChassisAnswer.Failure;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;
import perveance.engine.stage.ChassisCircuits.Built;
import perveance.engine.stage.ChassisCircuits.Group;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.engine.stage.Surroundings.NextInput;

/**
 * A chassis solved: all of it together at dc, then each group of stages by itself on the supply
 * voltages found. Groups that are coupled by capacitors are built twice, the second time with the
 * output resistance of what drives them and the input capacitance of what they drive.
 */
final class ChassisModel {
  private final Chassis chassis;
  private final ChassisCircuits circuits;
  private final Built whole;
  private final Optional<DcSolution> dc;
  private final Map<String, StageModel> models = new LinkedHashMap<>();
  private final List<Failure> failures = new ArrayList<>();

  /**
   * Solves a chassis.
   *
   * @param chassis the chassis, without complaints
   * @param circuits its circuits
   */
  ChassisModel(Chassis chassis, ChassisCircuits circuits) {
    this.chassis = chassis;
    this.circuits = circuits;
    this.whole = circuits.whole();
    DcOutcome outcome = new DcSolver(whole.circuit()).solve();
    this.dc =
        outcome instanceof DcOutcome.Converged solved
            ? Optional.of(solved.solution())
            : Optional.empty();
    String reason = outcome instanceof DcOutcome.NotConverged failed ? failed.reason() : "";
    Map<String, Double> supplies = supplyVoltages();
    for (Group group : circuits.groups()) {
      solve(group, supplies, OptionalDouble.empty(), Map.of(), reason);
    }
    if (circuits.groups().stream().anyMatch(g -> g.drivenBy().isPresent())) {
      couple(supplies, reason);
    }
  }

  private Map<String, Double> supplyVoltages() {
    Map<String, Double> voltages = new HashMap<>();
    for (Supply supply : chassis.supplies()) {
      if (dc.isPresent()) {
        voltages.put(supply.name(), dc.get().voltage(ChassisNames.supply(supply.name())));
      } else if (supply.feed() instanceof SupplyFeed.Stated stated) {
        voltages.put(supply.name(), stated.voltage() * chassis.conditions().mainsRatio());
      }
    }
    return voltages;
  }

  private void couple(Map<String, Double> supplies, String reason) {
    Map<String, Double> capacitance = new HashMap<>();
    Map<String, Double> resistance = new HashMap<>();
    for (StageModel model : models.values()) {
      capacitance.put(model.stage().ref(), InputAdmittance.capacitance(model));
      resistance.put(
          model.stage().ref(),
          OutputLoad.sourceResistance(model, model.signal(), model.mainOutput()));
    }
    Map<String, NextInput> nexts = new HashMap<>();
    for (Group group : circuits.groups()) {
      for (String ref : group.refs()) {
        circuits.values(ref).around().next().ifPresent(n -> put(nexts, n, capacitance));
      }
    }
    models.clear();
    failures.clear();
    for (Group group : circuits.groups()) {
      Double source = group.drivenBy().map(resistance::get).orElse(null);
      solve(
          group,
          supplies,
          source == null ? OptionalDouble.empty() : OptionalDouble.of(source),
          nexts,
          reason);
    }
  }

  private static void put(
      Map<String, NextInput> nexts, NextInput next, Map<String, Double> capacitance) {
    double known = capacitance.getOrDefault(next.ref(), next.capacitance());
    nexts.put(next.ref(), new NextInput(next.ref(), next.leak(), next.stopper(), known));
  }

  private void solve(
      Group group,
      Map<String, Double> supplies,
      OptionalDouble source,
      Map<String, NextInput> nexts,
      String reason) {
    if (!supplies.keySet().containsAll(group.supplies())) {
      fail(group, reason);
      return;
    }
    Built built = circuits.build(group, supplies, source, nexts);
    DcOutcome outcome = new DcSolver(built.circuit()).solve();
    if (outcome instanceof DcOutcome.NotConverged failed) {
      fail(group, failed.reason());
    } else if (outcome instanceof DcOutcome.Converged solved) {
      SmallSignal signal = new SmallSignal(solved.solution());
      Optional<String> refusal = signal.refusal();
      if (refusal.isPresent()) {
        fail(group, refusal.get());
        return;
      }
      for (StageCircuit stage : built.stages()) {
        models.put(stage.ref(), new StageModel(stage, built, solved.solution(), signal));
      }
    }
  }

  private void fail(Group group, String reason) {
    group.refs().forEach(ref -> failures.add(new Failure(ref, reason)));
  }

  Chassis chassis() {
    return chassis;
  }

  ChassisCircuits circuits() {
    return circuits;
  }

  /** The whole chassis as one circuit. */
  Built whole() {
    return whole;
  }

  /** Dc point of the whole chassis, empty when none was found. */
  Optional<DcSolution> dc() {
    return dc;
  }

  /** Solved stages in the order of the chassis. */
  List<StageModel> models() {
    return List.copyOf(models.values());
  }

  List<Failure> failures() {
    return List.copyOf(failures);
  }

  /** Supply nodes of the whole circuit. */
  List<Integer> rails() {
    return chassis.supplies().stream()
        .map(s -> whole.circuit().node(ChassisNames.supply(s.name())))
        .toList();
  }
}
