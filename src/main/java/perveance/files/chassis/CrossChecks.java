package perveance.files.chassis;

import java.util.List;
import java.util.Set;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.StageKinds;
import perveance.files.device.DeviceFiles;

/**
 * Finds the lines for what the engine says against a chassis as a whole, and holds back what
 * follows only from something that is told already.
 */
final class CrossChecks {
  private static final Set<KeySpec.Form> NAMES =
      Set.of(KeySpec.Form.DEVICE, KeySpec.Form.SUPPLY, KeySpec.Form.STAGE);

  private final Chassis chassis;
  private final List<ReadTable> supplies;
  private final List<ReadTable> stages;
  private final boolean incomplete;

  /**
   * Prepares the checks.
   *
   * @param chassis what could be read, a stand-in for each table that could not
   * @param supplies tables of its supplies
   * @param stages tables of its stages
   * @param incomplete whether a header could not be read, so that a name may only seem to be
   *     missing
   */
  CrossChecks(
      Chassis chassis, List<ReadTable> supplies, List<ReadTable> stages, boolean incomplete) {
    this.chassis = chassis;
    this.supplies = supplies;
    this.stages = stages;
    this.incomplete = incomplete;
  }

  void complain(DeviceFiles library) {
    for (ChassisComplaint complaint : ChassisChecks.beyondKeys(chassis, library)) {
      boolean ofStage = complaint.place() == ChassisComplaint.Place.STAGE;
      ReadTable read = (ofStage ? stages : supplies).get(complaint.index());
      if (ofStage ? standsForStage(complaint, read) : standsForSupply(complaint, read)) {
        read.table()
            .complain(
                complaint.key(), complaint.found(), complaint.expected(), complaint.suggestion());
      }
    }
  }

  private boolean standsForSupply(ChassisComplaint complaint, ReadTable read) {
    return read.sound() && !(incomplete && complaint.key().equals("from"));
  }

  private boolean standsForStage(ChassisComplaint complaint, ReadTable read) {
    String key = complaint.key();
    if (read.isTold(key)) {
      return false;
    }
    if (key.equals("ref") || key.equals("kind")) {
      return true;
    }
    boolean name =
        StageKinds.all().stream()
            .flatMap(kind -> kind.keys().stream())
            .anyMatch(spec -> spec.key().equals(key) && NAMES.contains(spec.form()));
    return name ? !incomplete : read.sound();
  }
}
