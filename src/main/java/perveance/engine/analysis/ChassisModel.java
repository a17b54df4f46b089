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
  private final String reason;
  private final Map<String, Double> supplies;
  private final Coupling coupling;
  private final Map<String, StageModel> models = new LinkedHashMap<>();
  private final List<Failure> failures = new ArrayList<>();

  /** What the stages show each other through capacitors, by reference. */
  private record Coupling(Map<String, Double> resistance, Map<String, NextInput> nexts) {
    static final Coupling NONE = new Coupling(Map.of(), Map.of());
  }

  private ChassisModel(Chassis chassis, ChassisCircuits circuits, Coupling coupling) {
    this.chassis = chassis;
    this.circuits = circuits;
    this.coupling = coupling;
    this.whole = circuits.whole();
    DcOutcome outcome = new DcSolver(whole.circuit()).solve();
    this.dc =
        outcome instanceof DcOutcome.Converged solved
            ? Optional.of(solved.solution())
            : Optional.empty();
    this.reason = outcome instanceof DcOutcome.NotConverged failed ? failed.reason() : "";
    this.supplies = supplyVoltages();
  }

  /**
   * Solves a chassis.
   *
   * @param chassis the chassis, without complaints
   * @param circuits its circuits
   */
  static ChassisModel of(Chassis chassis, ChassisCircuits circuits) {
    ChassisModel alone = new ChassisModel(chassis, circuits, Coupling.NONE);
    circuits.groups().forEach(alone::solve);
    if (circuits.groups().stream().allMatch(g -> g.drivenBy().isEmpty())) {
      return alone;
    }
    ChassisModel coupled = new ChassisModel(chassis, circuits, alone.found());
    circuits.groups().forEach(coupled::solve);
    return coupled;
  }

  /**
   * One stage after an edit of its keys, on what the other stages show it now.
   *
   * @param edited the chassis as edited, without complaints
   * @param edits its circuits
   * @param ref the stage
   * @return the stage; empty when it has no solution
   */
  Optional<StageModel> again(Chassis edited, ChassisCircuits edits, String ref) {
    ChassisModel changed = new ChassisModel(edited, edits, coupling);
    edits.groups().stream().filter(g -> g.refs().contains(ref)).forEach(changed::solve);
    return Optional.ofNullable(changed.models.get(ref));
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

  /** What the stages, solved alone, show each other. */
  private Coupling found() {
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
    return new Coupling(resistance, nexts);
  }

  private static void put(
      Map<String, NextInput> nexts, NextInput next, Map<String, Double> capacitance) {
    double known = capacitance.getOrDefault(next.ref(), next.capacitance());
    nexts.put(next.ref(), new NextInput(next.ref(), next.leak(), next.stopper(), known));
  }

  private void solve(Group group) {
    if (!supplies.keySet().containsAll(group.supplies())) {
      fail(group, reason);
      return;
    }
    OptionalDouble source =
        group
            .drivenBy()
            .flatMap(ref -> Optional.ofNullable(coupling.resistance().get(ref)))
            .map(OptionalDouble::of)
            .orElse(OptionalDouble.empty());
    Built built = circuits.build(group, supplies, source, coupling.nexts());
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
        models.put(
            stage.ref(),
            new StageModel(stage, group.drivenBy().isPresent(), built, solved.solution(), signal));
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
