package perveance.engine.stage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.NearMiss;
import perveance.engine.stage.ChassisComplaint.Place;

/**
 * Checks which stage drives which: each named stage exists, has one driver, and none in a circle.
 */
final class DriveChecks {
  private final Chassis chassis;
  private final List<ChassisComplaint> complaints = new ArrayList<>();

  private DriveChecks(Chassis chassis) {
    this.chassis = chassis;
  }

  static List<ChassisComplaint> complaints(Chassis chassis) {
    DriveChecks checks = new DriveChecks(chassis);
    Map<String, String> drivers = new HashMap<>();
    for (int i = 0; i < chassis.stages().size(); i++) {
      Optional<String> driven = ChassisWiring.drives(chassis.stages().get(i));
      if (driven.isPresent()) {
        checks.check(i, driven.get(), drivers);
      }
    }
    return checks.complaints;
  }

  private void check(int index, String driven, Map<String, String> drivers) {
    StageEntry entry = chassis.stages().get(index);
    List<String> others =
        chassis.stages().stream().map(StageEntry::ref).filter(r -> !r.equals(entry.ref())).toList();
    if (driven.equals(entry.ref())) {
      add(index, "itself", "the ref of another stage", Optional.empty());
      return;
    }
    if (!others.contains(driven)) {
      String found = "\"" + driven + "\", which is no other stage";
      add(index, found, "the ref of another stage", NearMiss.suggest(driven, others));
      return;
    }
    String before = drivers.putIfAbsent(driven, entry.ref());
    if (before != null) {
      String found = driven + ", which " + before + " drives already";
      add(index, found, "one driver for a stage", Optional.empty());
    } else if (ChassisWiring.direct(entry) && loaded(entry)) {
      String ref = entry.ref();
      String key = StageKeys.LOAD.key();
      String found = "a load beside the wire to " + driven;
      String expected = "a coupling to " + driven + ", or no load";
      complaints.add(
          new ChassisComplaint(Place.STAGE, index, ref, key, found, expected, Optional.empty()));
    } else if (inCircle(entry)) {
      add(
          index,
          "stages that drive each other in a circle",
          "a chain with an end",
          Optional.empty());
    }
  }

  private static boolean loaded(StageEntry entry) {
    return entry.settings().containsKey(StageKeys.LOAD.key());
  }

  private boolean inCircle(StageEntry start) {
    Optional<StageEntry> at = Optional.of(start);
    for (int steps = 0; at.isPresent() && steps <= chassis.stages().size(); steps++) {
      at = at.flatMap(ChassisWiring::drives).flatMap(chassis::stage);
    }
    return at.isPresent();
  }

  private void add(int index, String found, String expected, Optional<String> near) {
    String ref = chassis.stages().get(index).ref();
    String key = StageKeys.DRIVES.key();
    complaints.add(new ChassisComplaint(Place.STAGE, index, ref, key, found, expected, near));
  }
}
