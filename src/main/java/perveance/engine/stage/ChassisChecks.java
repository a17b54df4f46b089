package perveance.engine.stage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import perveance.engine.base.NearMiss;
import perveance.engine.circuit.Circuit;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.device.LawKind;
import perveance.engine.stage.ChassisComplaint.Place;

/**
 * Checks what no single key shows: names that name nothing, names used twice, wiring in a circle,
 * keys of a stage that contradict each other. All complaints are told at once.
 */
public final class ChassisChecks {
  private final Chassis chassis;
  private final DeviceLibrary library;
  private final List<ChassisComplaint> complaints = new ArrayList<>();
  private final Map<Integer, Set<String>> valves = new HashMap<>();

  private ChassisChecks(Chassis chassis, DeviceLibrary library) {
    this.chassis = chassis;
    this.library = library;
  }

  /**
   * Checks a chassis whose single keys are sound; see {@link KeyChecks} for those.
   *
   * @param chassis the chassis
   * @param library where devices are found
   * @return complaints in the order of the chassis, empty when it can be built
   */
  public static List<ChassisComplaint> beyondKeys(Chassis chassis, DeviceLibrary library) {
    ChassisChecks checks = new ChassisChecks(chassis, library);
    checks.complaints.addAll(SupplyChecks.complaints(chassis));
    for (int i = 0; i < chassis.stages().size(); i++) {
      checks.stage(i, chassis.stages().get(i));
    }
    checks.references();
    checks.complaints.addAll(DriveChecks.complaints(chassis));
    return List.copyOf(checks.complaints);
  }

  /**
   * Checks the keys of one stage against each other, with what drives it and what it drives.
   *
   * @param chassis the chassis; other stages of it need not be sound
   * @param entry a stage of known kind whose single keys are sound
   * @param devices its devices by key
   * @return contradictions, empty when it can be built
   */
  public static List<StageKind.Complaint> contradictions(
      Chassis chassis, StageEntry entry, Map<String, Device> devices) {
    StageKind kind = StageKinds.find(entry.kind()).orElseThrow();
    Surroundings around = ChassisWiring.roughly(chassis, entry);
    return kind.check(new StageValues(entry, devices, around));
  }

  /**
   * Checks a chassis and every single key of it.
   *
   * @param chassis the chassis
   * @param library where devices are found
   * @return complaints, empty when it can be built
   */
  public static List<ChassisComplaint> all(Chassis chassis, DeviceLibrary library) {
    List<ChassisComplaint> all = new ArrayList<>();
    for (int i = 0; i < chassis.stages().size(); i++) {
      StageEntry entry = chassis.stages().get(i);
      int index = i;
      StageKinds.find(entry.kind())
          .ifPresent(kind -> all.addAll(KeyChecks.complaints(index, entry, kind)));
    }
    all.addAll(beyondKeys(chassis, library));
    return List.copyOf(all);
  }

  private void references() {
    Map<String, String> owners = new HashMap<>();
    for (int i = 0; i < chassis.stages().size(); i++) {
      StageEntry entry = chassis.stages().get(i);
      if (!ChassisNames.wellFormed(entry.ref())) {
        add(i, "ref", "\"" + entry.ref() + "\"", ChassisNames.FORM);
      }
      Set<String> names = new TreeSet<>(valves.getOrDefault(i, Set.of()));
      names.add(entry.ref());
      for (String name : names) {
        String owner = owners.putIfAbsent(name, entry.ref());
        if (owner != null) {
          add(i, "ref", "\"" + name + "\", which " + owner + " has", "a name of its own");
        }
      }
    }
  }

  /** Names of the valves that a stage brings, found by building it alone. */
  private static Set<String> valves(StageKind kind, StageValues values) {
    return kind.build(values, new Circuit.Builder()).devices().stream()
        .map(StageCircuit.StageDevice::ref)
        .collect(Collectors.toSet());
  }

  private void stage(int index, StageEntry entry) {
    Optional<StageKind> kind = StageKinds.find(entry.kind());
    if (kind.isEmpty()) {
      String known = String.join(", ", StageKinds.all().stream().map(StageKind::name).toList());
      Optional<String> near = StageKinds.nearest(entry.kind());
      add(index, "kind", "\"" + entry.kind() + "\"", "one of " + known, near);
      near.flatMap(StageKinds::find).ifPresent(meant -> names(index, entry, meant));
      return;
    }
    Map<String, Device> devices = names(index, entry, kind.get());
    if (devices.containsKey(StageKeys.DEVICE.key())
        && KeyChecks.complaints(index, entry, kind.get()).isEmpty()) {
      StageValues values = new StageValues(entry, devices, ChassisWiring.roughly(chassis, entry));
      List<StageKind.Complaint> contradictions = kind.get().check(values);
      contradictions.forEach(c -> add(index, c.key(), c.found(), c.expected()));
      // an ill-formed name is told below; no element can bear it
      if (contradictions.isEmpty() && ChassisNames.wellFormed(entry.ref())) {
        valves.put(index, valves(kind.get(), values));
      }
    }
  }

  /** Checks the names of devices and supplies. */
  private Map<String, Device> names(int index, StageEntry entry, StageKind kind) {
    Map<String, Device> devices = devices(index, entry, kind);
    supplies(index, entry, kind);
    return devices;
  }

  private Map<String, Device> devices(int index, StageEntry entry, StageKind kind) {
    Map<String, Device> found = new HashMap<>();
    for (KeySpec spec : keys(kind, KeySpec.Form.DEVICE)) {
      if (!(entry.settings().get(spec.key()) instanceof Setting.Word word)) {
        continue;
      }
      String key = spec.key();
      String name = word.text();
      Optional<Device> device = library.find(name);
      if (device.isEmpty()) {
        Optional<String> near = NearMiss.suggest(name, library.names());
        add(index, key, "\"" + name + "\", which no device file names", "a known valve", near);
      } else if (device.get().law().kind() == LawKind.DIODE) {
        add(index, key, name + ", a rectifier", "a triode, pentode or beam tetrode");
      } else {
        found.put(key, device.get());
      }
    }
    return found;
  }

  private void supplies(int index, StageEntry entry, StageKind kind) {
    List<String> known = chassis.supplies().stream().map(Supply::name).toList();
    for (KeySpec spec : keys(kind, KeySpec.Form.SUPPLY)) {
      if (entry.settings().get(spec.key()) instanceof Setting.Word word
          && !known.contains(word.text())) {
        String key = spec.key();
        String name = word.text();
        String expected =
            known.isEmpty()
                ? "a [supply." + name + "] table"
                : "one of " + String.join(", ", known);
        add(
            index,
            key,
            "\"" + name + "\", which is no supply",
            expected,
            NearMiss.suggest(name, known));
      }
    }
  }

  private static List<KeySpec> keys(StageKind kind, KeySpec.Form form) {
    return kind.keys().stream().filter(k -> k.form() == form).toList();
  }

  private void add(int index, String key, String found, String expected) {
    add(index, key, found, expected, Optional.empty());
  }

  private void add(int index, String key, String found, String expected, Optional<String> near) {
    String ref = chassis.stages().get(index).ref();
    complaints.add(new ChassisComplaint(Place.STAGE, index, ref, key, found, expected, near));
  }
}
