package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.device.Device;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageValues;

/**
 * Fills a new stage of any kind with usual values: what the kind requires, then whatever its own
 * checks still ask for. It knows keys, not kinds.
 */
public final class StageStarter {
  private static final int MOST_ROUNDS = 24;

  /** Usual values by key; a person changes them at once, so round ones serve. */
  private static final Map<String, String> USUAL =
      Map.ofEntries(
          Map.entry("anode_load", "100k"),
          Map.entry("anode_load2", "100k"),
          Map.entry("anode_choke", "50 H"),
          Map.entry("choke_resistance", "1k"),
          Map.entry("cathode_resistor", "1k5"),
          Map.entry("cathode_bypass", "22u"),
          Map.entry("cathode_load", "47k"),
          Map.entry("upper_resistor", "1k5"),
          Map.entry("upper_grid_voltage", "100 V"),
          Map.entry("upper_grid_leak", "1M"),
          Map.entry("upper_coupling", "100n"),
          Map.entry("lower_grid_leak", "1M"),
          Map.entry("lower_coupling", "100n"),
          Map.entry("second_grid_leak", "1M"),
          Map.entry("second_grid_bypass", "100n"),
          Map.entry("tail_resistor", "47k"),
          Map.entry("divider_top", "1M"),
          Map.entry("divider_bottom", "18k"),
          Map.entry("divider_second", "1M"),
          Map.entry("screen_resistor", "1M"),
          Map.entry("screen_bypass", "100n"),
          Map.entry("grid_leak", "1M"),
          Map.entry("coupling", "22n"),
          Map.entry("input_coupling", "22n"),
          Map.entry("source", "10k"),
          Map.entry("load", "470k"),
          Map.entry("load2", "470k"),
          Map.entry("drive", "0.2 V"),
          Map.entry("primary", "5k"),
          Map.entry("secondary_load", "8R"),
          Map.entry("connection", "triode"));

  /** Where they differ in a stage with an output transformer. */
  private static final Map<String, String> USUAL_OUTPUT =
      Map.of(
          "cathode_resistor",
          "270R",
          "cathode_bypass",
          "100u",
          "drive",
          "3 V",
          "grid_leak",
          "470k");

  /** Where anode and cathode both give an output, both see the same load. */
  private static final Map<String, String> USUAL_SPLIT = Map.of("anode_load", "47k");

  /** Where one valve stands on another, its cathode is far from the chassis. */
  private static final Map<String, String> USUAL_STACKED = Map.of("heater_elevation", "60 V");

  private static final List<String> USUAL_VALVES =
      List.of("12AX7", "12AU7", "EL84", "300B", "EL34");

  /** Bias first: what follows takes its foot from there. */
  private static final List<String> WELCOME =
      List.of(
          "cathode_resistor",
          "cathode_bypass",
          "grid_leak",
          "second_grid_leak",
          "second_grid_bypass",
          "coupling",
          "load",
          "load2",
          "heater_elevation",
          "drive");

  private final Engine engine;

  /**
   * A starter.
   *
   * @param engine knows the valves
   */
  public StageStarter(Engine engine) {
    this.engine = engine;
  }

  /**
   * A stage that can be built.
   *
   * @param chassis where it will stand
   * @param ref its name
   * @param kind its kind
   * @param device its valve, empty for a usual one
   * @return the stage, empty when the usual values do not make one
   */
  public Optional<StageEntry> start(
      Chassis chassis, String ref, StageKind kind, Optional<String> device) {
    List<String> valves = device.map(List::of).orElse(valves(kind));
    for (String valve : valves) {
      Optional<StageEntry> entry = settle(chassis, ref, kind, valve);
      if (entry.isPresent()) {
        return Optional.of(welcome(chassis, entry.get(), kind));
      }
    }
    return Optional.empty();
  }

  private static boolean takes(StageKind kind, String key) {
    return kind.keys().stream().anyMatch(k -> k.key().equals(key));
  }

  private static boolean isOutput(StageKind kind) {
    return takes(kind, "primary");
  }

  private List<String> valves(StageKind kind) {
    boolean output = isOutput(kind);
    List<String> known =
        USUAL_VALVES.stream().filter(v -> engine.devices().find(v).isPresent()).toList();
    if (!output) {
      return known;
    }
    List<String> turned = new ArrayList<>(known);
    turned.removeAll(List.of("12AX7", "12AU7"));
    turned.addAll(known);
    return turned;
  }

  private Optional<StageEntry> settle(Chassis chassis, String ref, StageKind kind, String valve) {
    StageEntry entry = new StageEntry(ref, kind.name(), Map.of());
    for (KeySpec spec : kind.keys()) {
      if (spec.required()) {
        entry = with(chassis, entry, kind, spec.key(), valve);
      }
    }
    Set<String> tried = new HashSet<>();
    for (int round = 0; round < MOST_ROUNDS; round++) {
      Optional<ChassisComplaint> complaint = complaint(chassis, entry);
      if (complaint.isEmpty()) {
        return Optional.of(entry);
      }
      StageEntry before = entry;
      for (String key : cures(complaint.get(), kind)) {
        if (entry.equals(before) && tried.add(key)) {
          entry = with(chassis, entry, kind, key, valve);
        }
      }
      if (entry.equals(before)) {
        return Optional.empty();
      }
    }
    return Optional.empty();
  }

  /** The key complained of, then every other key that the complaint says would do. */
  private static List<String> cures(ChassisComplaint complaint, StageKind kind) {
    List<String> cures = new ArrayList<>(List.of(complaint.key()));
    for (KeySpec spec : kind.keys()) {
      if (List.of(complaint.expected().split("[^a-z0-9_]+")).contains(spec.key())) {
        cures.add(spec.key());
      }
    }
    return cures;
  }

  /** Keys that hardly any stage is without, where the kind takes them. */
  private StageEntry welcome(Chassis chassis, StageEntry stage, StageKind kind) {
    StageEntry entry = stage;
    for (String key : WELCOME) {
      if (!entry.settings().containsKey(key)) {
        StageEntry more = with(chassis, entry, kind, key, "");
        entry = complaint(chassis, more).isEmpty() ? more : entry;
      }
    }
    return entry;
  }

  private Optional<ChassisComplaint> complaint(Chassis chassis, StageEntry entry) {
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    stages.add(entry);
    Chassis with = new Chassis(chassis.title(), chassis.conditions(), chassis.supplies(), stages);
    return ChassisChecks.all(with, engine.devices()).stream()
        .filter(c -> c.place() == ChassisComplaint.Place.STAGE && c.name().equals(entry.ref()))
        .findFirst();
  }

  private StageEntry with(
      Chassis chassis, StageEntry entry, StageKind kind, String key, String valve) {
    Optional<KeySpec> spec = kind.keys().stream().filter(k -> k.key().equals(key)).findFirst();
    if (spec.isEmpty()) {
      return entry;
    }
    String text =
        switch (spec.get().form()) {
          case DEVICE -> valve;
          case SUPPLY -> chassis.supplies().isEmpty() ? "" : chassis.supplies().get(0).name();
          case STAGE -> "";
          default -> key.equals("ref2") ? entry.ref() + "b" : usual(kind, key);
        };
    if (text.isEmpty()) {
      return entry;
    }
    List<StageEntry> alone = List.of(entry);
    Chassis scratch = new Chassis("", chassis.conditions(), chassis.supplies(), alone);
    return KeyEditor.parse(scratch, entry.ref(), key, text)
                instanceof KeyEditor.Outcome.Accepted accepted
            && accepted.edit() instanceof perveance.app.Edit.SetKey set
        ? entry.with(key, set.setting())
        : entry;
  }

  private static String usual(StageKind kind, String key) {
    Map<String, String> special = Map.of();
    if (isOutput(kind)) {
      special = USUAL_OUTPUT;
    } else if (takes(kind, "cathode_load") && takes(kind, "load2")) {
      special = USUAL_SPLIT;
    } else if (takes(kind, "upper_resistor")) {
      special = USUAL_STACKED;
    }
    return special.getOrDefault(key, USUAL.getOrDefault(key, ""));
  }

  /**
   * A stage's values with its valves found, for its picture.
   *
   * @param entry the stage
   * @param kind its kind
   * @return values
   */
  public StageValues values(StageEntry entry, StageKind kind) {
    Map<String, Device> devices = new java.util.HashMap<>();
    for (KeySpec spec : kind.keys()) {
      Setting setting = entry.settings().get(spec.key());
      if (spec.form() == KeySpec.Form.DEVICE && setting != null) {
        engine.devices().find(setting.text()).ifPresent(d -> devices.put(spec.key(), d));
      }
    }
    return new StageValues(entry, devices);
  }
}
