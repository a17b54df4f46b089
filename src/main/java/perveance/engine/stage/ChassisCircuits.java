package perveance.engine.stage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Surroundings.NextInput;

/**
 * The circuits of a chassis: all of it together with its supply chain, for the dc point; and each
 * group of stages that hang together without a capacitor, on supply nodes of given voltage, for
 * everything else.
 */
public final class ChassisCircuits {
  private final Chassis chassis;
  private final Map<String, StageValues> values = new LinkedHashMap<>();
  private final Map<String, StageKind> kinds = new HashMap<>();

  /**
   * Prepares a chassis.
   *
   * @param chassis a chassis without complaints, see {@link ChassisChecks#all}
   * @param library where devices are found
   * @throws IllegalArgumentException when there are complaints
   */
  public ChassisCircuits(Chassis chassis, DeviceLibrary library) {
    List<ChassisComplaint> complaints = ChassisChecks.all(chassis, library);
    if (!complaints.isEmpty()) {
      throw new IllegalArgumentException("chassis: " + complaints.get(0).message());
    }
    this.chassis = chassis;
    for (StageEntry entry : chassis.stages()) {
      StageKind kind = StageKinds.find(entry.kind()).orElseThrow();
      kinds.put(entry.ref(), kind);
      Map<String, Device> devices = devices(entry, kind, library);
      Surroundings around = ChassisWiring.roughly(chassis, entry);
      values.put(entry.ref(), new StageValues(entry, devices, around));
    }
  }

  private static Map<String, Device> devices(
      StageEntry entry, StageKind kind, DeviceLibrary library) {
    Map<String, Device> devices = new HashMap<>();
    for (KeySpec key : kind.keys()) {
      Setting setting = entry.settings().get(key.key());
      if (key.form() == KeySpec.Form.DEVICE && setting != null) {
        library.find(setting.text()).ifPresent(d -> devices.put(key.key(), d));
      }
    }
    return devices;
  }

  /**
   * A circuit with the stages in it.
   *
   * @param circuit the circuit
   * @param stages what is where, in the order in which the stages drive each other
   */
  public record Built(Circuit circuit, List<StageCircuit> stages) {
    /** Copies the list. */
    public Built {
      stages = List.copyOf(stages);
    }
  }

  /**
   * Stages that hang together without a capacitor.
   *
   * @param refs references, drivers first
   * @param supplies supply nodes that feed them
   * @param drivenBy stage that drives the first of them through a capacitor, empty when none does
   */
  public record Group(List<String> refs, List<String> supplies, Optional<String> drivenBy) {
    /** Copies the lists. */
    public Group {
      refs = List.copyOf(refs);
      supplies = List.copyOf(supplies);
    }
  }

  /**
   * The values of a stage in its chassis, with devices found.
   *
   * @param ref reference
   * @return values
   */
  public StageValues values(String ref) {
    StageValues found = values.get(ref);
    if (found == null) {
      throw new IllegalArgumentException("ref names no stage: " + ref);
    }
    return found;
  }

  /**
   * The drawing of a stage.
   *
   * @param ref reference
   * @return drawing
   */
  public Drawing drawing(String ref) {
    return kind(ref).draw(values(ref));
  }

  /**
   * The kind of a stage.
   *
   * @param ref reference
   * @return kind
   */
  public StageKind kind(String ref) {
    StageKind kind = kinds.get(ref);
    if (kind == null) {
      throw new IllegalArgumentException("ref names no stage: " + ref);
    }
    return kind;
  }

  /**
   * The whole chassis with its supply chain. Stages coupled by a capacitor do not touch each other
   * at dc; each has its own source.
   *
   * @return circuit and stages, group by group
   */
  public Built whole() {
    Circuit.Builder builder = new Circuit.Builder();
    SupplyWiring.wire(chassis, builder);
    List<StageCircuit> stages = new ArrayList<>();
    for (Group group : groups()) {
      stages.addAll(stages(group, builder, OptionalDouble.empty(), Map.of()));
    }
    return new Built(builder.build(), stages);
  }

  /**
   * The groups of stages that hang together.
   *
   * @return groups in the order of the chassis
   */
  public List<Group> groups() {
    List<Group> groups = new ArrayList<>();
    for (StageEntry entry : chassis.stages()) {
      Optional<StageEntry> driver = ChassisWiring.driver(chassis, entry.ref());
      if (driver.isEmpty() || !ChassisWiring.direct(driver.get())) {
        groups.add(group(entry, driver.map(StageEntry::ref)));
      }
    }
    return List.copyOf(groups);
  }

  private Group group(StageEntry first, Optional<String> driver) {
    List<String> refs = new ArrayList<>();
    Set<String> supplies = new LinkedHashSet<>();
    Optional<StageEntry> at = Optional.of(first);
    while (at.isPresent()) {
      StageEntry entry = at.get();
      refs.add(entry.ref());
      for (KeySpec key : kind(entry.ref()).keys()) {
        Setting setting = entry.settings().get(key.key());
        if (key.form() == KeySpec.Form.SUPPLY && setting != null) {
          supplies.add(setting.text());
        }
      }
      at = at.filter(ChassisWiring::direct).flatMap(ChassisWiring::drives).flatMap(chassis::stage);
    }
    return new Group(refs, List.copyOf(supplies), driver);
  }

  /**
   * One group on supply nodes of given voltage.
   *
   * @param group one of {@link #groups}
   * @param supplyVoltages voltage of each supply node that feeds it, by name [V]
   * @param sourceResistance output resistance of what drives it, used where the first stage states
   *     no {@code source}; empty when nothing does [ohm]
   * @param nexts input networks of stages that it drives through a capacitor, by reference; those
   *     missing are made from their own keys
   * @return circuit and stages
   */
  public Built build(
      Group group,
      Map<String, Double> supplyVoltages,
      OptionalDouble sourceResistance,
      Map<String, NextInput> nexts) {
    Circuit.Builder builder = new Circuit.Builder();
    for (String supply : group.supplies()) {
      Double voltage = supplyVoltages.get(supply);
      if (voltage == null) {
        throw new IllegalArgumentException("supplyVoltages has no voltage for " + supply);
      }
      String name = ChassisNames.supply(supply);
      builder.add(new Element.VoltageSource(name, builder.node(name), 0, voltage));
    }
    List<StageCircuit> stages = stages(group, builder, sourceResistance, nexts);
    return new Built(builder.build(), stages);
  }

  private List<StageCircuit> stages(
      Group group,
      Circuit.Builder builder,
      OptionalDouble sourceResistance,
      Map<String, NextInput> nexts) {
    List<StageCircuit> stages = new ArrayList<>();
    Optional<String> input = Optional.empty();
    Optional<String> input2 = Optional.empty();
    OptionalDouble source = sourceResistance;
    for (String ref : group.refs()) {
      Surroundings rough = values(ref).around();
      Surroundings around =
          new Surroundings(
              input,
              input2,
              rough.drivenBy(),
              source,
              rough.directOutput(),
              rough.next().map(next -> nexts.getOrDefault(next.ref(), next)),
              rough.supplyVoltage());
      StageCircuit stage = kind(ref).build(values(ref).in(around), builder);
      stages.add(stage);
      List<String> nodes = builder.build().nodes();
      input = Optional.of(nodes.get(stage.outputs().get(0).plus()));
      input2 = stage.outputs().stream().skip(1).findFirst().map(o -> nodes.get(o.plus()));
      source = OptionalDouble.empty();
    }
    return stages;
  }
}
