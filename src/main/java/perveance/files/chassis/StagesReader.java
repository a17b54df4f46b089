package perveance.files.chassis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.base.NearMiss;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.Problems;
import perveance.files.toml.StrictTable;

/** Reads all stages and checks what they say of each other and of the supplies. */
final class StagesReader {
  private final DeviceFiles library;
  private final Problems problems;
  private final boolean incomplete;
  private final Map<String, StrictTable> tables = new LinkedHashMap<>();
  private final List<StageEntry> stages = new ArrayList<>();
  private final List<StageReader> readers = new ArrayList<>();

  /**
   * Starts to read.
   *
   * @param library the devices that may be named
   * @param problems receives the complaints
   * @param incomplete whether a header could not be read, so that a node or a stage may only seem
   *     to be missing
   */
  StagesReader(DeviceFiles library, Problems problems, boolean incomplete) {
    this.library = library;
    this.problems = problems;
    this.incomplete = incomplete;
  }

  List<StageEntry> read(List<StrictTable> all, Set<String> supplies) {
    all.forEach(this::readOne);
    Chassis chassis = new Chassis("", Conditions.USUAL, List.of(), stages);
    for (int i = 0; i < stages.size(); i++) {
      readers.get(i).checkTogether(chassis, stages.get(i));
    }
    SignalOrder order = new SignalOrder(tables);
    for (StageEntry stage : stages) {
      for (KeySpec spec : kind(stage).keys()) {
        checkReference(stage, spec, supplies, order);
      }
    }
    order.refuseRings();
    return stages;
  }

  /** Takes a complaint about the chassis as a whole to the stage that it names. */
  void complain(ChassisComplaint complaint) {
    StrictTable table = tables.get(complaint.name());
    if (table != null) {
      table.complain(
          complaint.key(), complaint.found(), complaint.expected(), complaint.suggestion());
    }
  }

  private void readOne(StrictTable unnamed) {
    String ref = unnamed.requiredText("ref", "V1a");
    StrictTable table = unnamed.named(ref.isBlank() ? "stage" : "stage " + ref);
    checkRef(ref, table);
    List<String> names = StageKinds.all().stream().map(StageKind::name).toList();
    table.require("kind", "one of " + String.join(", ", names));
    Optional<StageKind> kind = table.word("kind", names).flatMap(StageKinds::find);
    // the keys of a stage of unknown kind cannot be judged
    if (kind.isPresent()) {
      StageReader reader = new StageReader(kind.get(), table, library, problems);
      readers.add(reader);
      stages.add(reader.read(ref));
    }
  }

  private void checkRef(String ref, StrictTable table) {
    if (ref.isBlank()) {
      return;
    }
    if (!ChassisNames.wellFormed(ref)) {
      table.complain("ref", "\"" + ref + "\"", ChassisNames.FORM);
    }
    StrictTable earlier = tables.putIfAbsent(ref, table);
    if (earlier != null) {
      table.complain(
          "ref",
          "\"" + ref + "\" a second time",
          "a name of its own; the stage in line " + earlier.line() + " has it already");
    }
  }

  private static StageKind kind(StageEntry stage) {
    return StageKinds.find(stage.kind()).orElseThrow();
  }

  private void checkReference(
      StageEntry stage, KeySpec spec, Set<String> supplies, SignalOrder order) {
    Setting setting = stage.settings().get(spec.key());
    StrictTable table = tables.get(stage.ref());
    if (setting == null || table == null) {
      return;
    }
    String name = setting.text();
    if (spec.form() == KeySpec.Form.SUPPLY) {
      requireOne(table, spec.key(), name, supplies, "a supply node of this file");
    } else if (spec.form() == KeySpec.Form.STAGE) {
      requireOne(table, spec.key(), name, tables.keySet(), "the ref of a stage of this file");
      order.add(stage.ref(), spec.key(), name);
    }
  }

  private void requireOne(
      StrictTable table, String key, String name, Set<String> known, String expected) {
    if (!known.contains(name) && !incomplete) {
      String which = known.isEmpty() ? "; there is none" : ": " + String.join(", ", known);
      table.complain(key, "\"" + name + "\"", expected + which, NearMiss.suggest(name, known));
    }
  }
}
