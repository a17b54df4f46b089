package perveance.files.chassis;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.Problems;
import perveance.files.toml.SourceText;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlParser;

/** Reads chassis files. */
public final class ChassisReader {
  /** The version of the file's form that is read and written. */
  static final int VERSION = 1;

  private final DeviceFiles library;

  /**
   * A reader that looks devices up.
   *
   * @param library the devices that a file may name
   */
  public ChassisReader(DeviceFiles library) {
    this.library = library;
  }

  /**
   * Reads a file.
   *
   * @param path the file
   * @return the chassis
   * @throws BadInputException with everything that is wrong with the file
   */
  public Chassis read(Path path) throws BadInputException {
    return read(SourceText.read(path));
  }

  /**
   * Reads the text of a file.
   *
   * @param source the text
   * @return the chassis
   * @throws BadInputException with everything that is wrong with the file
   */
  public Chassis read(SourceText source) throws BadInputException {
    Problems problems = new Problems(source.file());
    StrictTable root = new StrictTable(TomlParser.parse(source, problems), "", source, problems);
    boolean incomplete = root.table().damaged();
    root.require("perveance", "the version of the file's form, " + VERSION);
    root.whole("perveance", VERSION, VERSION);
    String title = root.text("title").orElse("");
    Optional<StrictTable> conditions = root.table("conditions");
    SuppliesReader supplies = new SuppliesReader(incomplete);
    Optional<StrictTable> supplyTables = root.table("supply");
    List<Supply> nodes = supplyTables.isPresent() ? supplies.read(supplyTables.get()) : List.of();
    StagesReader reader = new StagesReader(library, problems, incomplete);
    List<StageEntry> stages = reader.read(root.tables("stage"), supplies.names());
    Conditions assumed =
        conditions.isPresent() ? ConditionsReader.read(conditions.get()) : Conditions.USUAL;
    root.refuseOthers();
    problems.refuse();
    Chassis chassis = new Chassis(title, assumed, nodes, stages);
    // what only a sound chassis shows, such as two valves of one name
    for (ChassisComplaint complaint : ChassisChecks.beyondKeys(chassis, library)) {
      if (complaint.place() == ChassisComplaint.Place.SUPPLY) {
        supplies.complain(complaint);
      } else {
        reader.complain(complaint);
      }
    }
    problems.refuse();
    return chassis;
  }
}
