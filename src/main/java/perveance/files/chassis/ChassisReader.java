package perveance.files.chassis;

import java.nio.file.Path;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.FormVersion;
import perveance.files.toml.KeyWords;
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
    StrictTable root =
        new StrictTable(
            TomlParser.parse(source, problems, KeyWords.OF_THE_TRADE), "", source, problems);
    FormVersion.check(root, "perveance", VERSION);
    String title = root.text("title").orElse("");
    Conditions conditions = conditions(root.table("conditions"));
    SuppliesReader supplies = new SuppliesReader();
    Optional<StrictTable> supplyTables = root.table("supply");
    if (supplyTables.isPresent()) {
      supplies.read(supplyTables.get(), problems);
    }
    StagesReader stages = new StagesReader(library, problems);
    for (StrictTable table : root.tables("stage")) {
      stages.read(table);
    }
    Chassis chassis = new Chassis(title, conditions, supplies.supplies(), stages.stages());
    new CrossChecks(chassis, supplies.tables(), stages.tables(), root.table().damaged())
        .complain(library);
    root.refuseOthers();
    problems.refuse();
    return chassis;
  }

  private static Conditions conditions(Optional<StrictTable> table) {
    return table.isPresent() ? ConditionsReader.read(table.get()) : Conditions.USUAL;
  }
}
