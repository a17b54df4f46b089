package perveance.files.geometry;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Unit;
import perveance.engine.device.geometry.CylinderDiode;
import perveance.engine.device.geometry.CylinderGrid;
import perveance.engine.device.geometry.DiodeGeometry;
import perveance.engine.device.geometry.ElectrodeDesign;
import perveance.engine.device.geometry.Emitter;
import perveance.engine.device.geometry.PlaneDiode;
import perveance.engine.device.geometry.PlaneGrid;
import perveance.engine.device.geometry.TriodeGeometry;
import perveance.files.toml.FormVersion;
import perveance.files.toml.KeyWords;
import perveance.files.toml.Problems;
import perveance.files.toml.Range;
import perveance.files.toml.SourceText;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlParser;

/**
 * Reads a file of electrode dimensions. Keys as a ruler gives them: diameters of round things,
 * distances from the cathode's surface of plane ones.
 */
public final class GeometryReader {
  /** The version of the file's form. */
  private static final int VERSION = 1;

  private static final Range LENGTH = new Range(Unit.METRE, 1e-6, 1);
  private static final Range TEMPERATURE = new Range(Unit.KELVIN, 300, 3500);
  private static final double USUAL_TEMPERATURE = 1000;
  private static final double HIGHEST_VOLTAGE = 50e3;

  private final StrictTable table;
  private final Problems problems;

  private GeometryReader(StrictTable table, Problems problems) {
    this.table = table;
    this.problems = problems;
  }

  /**
   * Reads a file.
   *
   * @param path the file
   * @return electrodes, voltages and cathode
   * @throws BadInputException with everything that is wrong with the file
   */
  public static ElectrodeDesign read(Path path) throws BadInputException {
    return read(SourceText.read(path));
  }

  /**
   * Reads the text of a file.
   *
   * @param source the text
   * @return electrodes, voltages and cathode
   * @throws BadInputException with everything that is wrong with the file
   */
  public static ElectrodeDesign read(SourceText source) throws BadInputException {
    Problems problems = new Problems(source.file());
    StrictTable table =
        new StrictTable(
            TomlParser.parse(source, problems, KeyWords.OF_THE_TRADE), "", source, problems);
    FormVersion.check(table, "perveance_geometry", VERSION);
    return new GeometryReader(table, problems).design();
  }

  private ElectrodeDesign design() throws BadInputException {
    String title = table.text("title").orElse("");
    table.require("shape", "plane or cylinder");
    boolean plane =
        !table.word("shape", List.of("plane", "cylinder")).orElse("").equals("cylinder");
    double volts =
        table.requiredQuantity("anode_voltage", Range.above0(Unit.VOLT, HIGHEST_VOLTAGE));
    Emitter emitter = emitter();
    double temperature = table.quantity("temperature", TEMPERATURE).orElse(USUAL_TEMPERATURE);
    boolean grid = gridStated();
    double gridVolts =
        grid ? table.requiredQuantity("grid_voltage", Range.within(Unit.VOLT, HIGHEST_VOLTAGE)) : 0;
    Electrodes electrodes = plane ? plane(grid) : cylinder(grid);
    return new ElectrodeDesign(
        title, electrodes.diode(), electrodes.triode(), volts, gridVolts, emitter, temperature);
  }

  private Emitter emitter() {
    List<String> names = Emitter.known().stream().map(Emitter::name).toList();
    String name = table.word("emitter", names).orElse(Emitter.OXIDE.name());
    return Emitter.known().stream().filter(e -> e.name().equals(name)).findFirst().orElseThrow();
  }

  /** One key of a grid asks for all of them. */
  private boolean gridStated() {
    return List.of("grid_distance", "grid_diameter", "grid_pitch", "grid_wire", "grid_voltage")
        .stream()
        .anyMatch(table::has);
  }

  /** Made only of sound lengths; what stands in for a refused one is refused with the file. */
  private record Electrodes(DiodeGeometry diode, Optional<TriodeGeometry> triode) {}

  /** Ends here with everything that is wrong, once every key has been read. */
  private void refuse() throws BadInputException {
    table.refuseOthers();
    problems.refuse();
  }

  private double length(String key) {
    return table.requiredQuantity(key, LENGTH);
  }

  private Electrodes plane(boolean grid) throws BadInputException {
    double area = length("length") * length("width");
    double anode = length("anode_distance");
    if (!grid) {
      refuse();
      return new Electrodes(new PlaneDiode(area, anode), Optional.empty());
    }
    double distance = length("grid_distance");
    double pitch = length("grid_pitch");
    double wire = length("grid_wire");
    beyond("anode_distance", anode, "grid_distance", distance);
    thin(wire, pitch);
    refuse();
    return new Electrodes(
        new PlaneDiode(area, anode),
        Optional.of(
            TriodeGeometry.plane(
                area, distance, new PlaneGrid(pitch, wire / 2, anode - distance))));
  }

  private Electrodes cylinder(boolean grid) throws BadInputException {
    double length = length("length");
    double cathode = length("cathode_diameter") / 2;
    double anode = length("anode_diameter") / 2;
    if (!grid) {
      if (anode == cathode) {
        table.complain("anode_diameter", "the cathode's own", "another diameter");
      }
      refuse();
      return new Electrodes(new CylinderDiode(cathode, anode, length), Optional.empty());
    }
    double helix = length("grid_diameter") / 2;
    double pitch = length("grid_pitch");
    double wire = length("grid_wire");
    beyond("grid_diameter", helix, "cathode_diameter", cathode);
    beyond("anode_diameter", anode, "grid_diameter", helix);
    thin(wire, pitch);
    refuse();
    return new Electrodes(
        new CylinderDiode(cathode, anode, length),
        Optional.of(
            TriodeGeometry.cylinder(
                cathode, length, new CylinderGrid(pitch, wire / 2, helix, anode))));
  }

  private void beyond(String key, double value, String inner, double innerValue) {
    if (value <= innerValue && table.has(key) && table.has(inner)) {
      table.complain(key, table.written(key), "more than " + inner + ", " + table.written(inner));
    }
  }

  /** The formula for the amplification factor holds for wires up to two thirds of the pitch. */
  private void thin(double wire, double pitch) {
    if (wire / 2 > pitch / 3 && table.has("grid_wire") && table.has("grid_pitch")) {
      table.complain(
          "grid_wire", table.written("grid_wire"), "a diameter up to two thirds of grid_pitch");
    }
  }
}
