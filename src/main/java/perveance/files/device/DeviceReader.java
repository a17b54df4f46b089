package perveance.files.device;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Heater;
import perveance.engine.device.Ratings;
import perveance.engine.device.RectifierRatings;
import perveance.engine.device.Validity;
import perveance.files.toml.FormVersion;
import perveance.files.toml.KeyWords;
import perveance.files.toml.Problems;
import perveance.files.toml.SourceText;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlParser;

/**
 * Reads device files. Written without lambdas: a device is the first thing that a short command
 * reads, and linking a lambda costs it a millisecond or two each.
 */
public final class DeviceReader {
  /** The version of the file's form that is read and written. */
  static final int VERSION = 1;

  private static final List<String> KINDS = List.of("triode", "pentode", "beam", "rectifier");

  private final Problems problems;
  private final StrictTable root;

  private DeviceReader(SourceText source) {
    this.problems = new Problems(source.file());
    this.root =
        new StrictTable(
            TomlParser.parse(source, problems, KeyWords.OF_THE_TRADE), "", source, problems);
  }

  /**
   * Reads a device with its law.
   *
   * @param source text of the file
   * @return the device
   * @throws BadInputException with everything that is wrong with the file
   */
  public static Device read(SourceText source) throws BadInputException {
    DeviceReader reader = new DeviceReader(source);
    DeviceSheet sheet = reader.sheet();
    Optional<StrictTable> lawTable = reader.part("law");
    Optional<DeviceLaw> law = lawTable.isEmpty() ? Optional.empty() : LawReader.law(lawTable.get());
    Optional<FitSummary> fit = reader.fit();
    Optional<Validity> validity = reader.validity(!sheet.kind().equals("rectifier"));
    reader.root.refuseOthers();
    reader.problems.refuse();
    return sheet.with(law.orElseThrow(), fit.orElseThrow(), validity.orElseThrow());
  }

  /**
   * Reads what is published, as a fit needs it; a law in the file is not looked at.
   *
   * @param source text of the file
   * @return the sheet
   * @throws BadInputException with everything that is wrong with the file
   */
  public static DeviceSheet readSheet(SourceText source) throws BadInputException {
    DeviceReader reader = new DeviceReader(source);
    DeviceSheet sheet = reader.sheet();
    for (String key : List.of("law", "fit", "validity")) {
      reader.root.table(key);
    }
    reader.root.refuseOthers();
    reader.problems.refuse();
    return sheet;
  }

  private DeviceSheet sheet() {
    FormVersion.check(root, "perveance_device", VERSION);
    String type = root.requiredText("type", "12AX7");
    List<String> aliases = root.texts("aliases");
    root.require("kind", "one of " + String.join(", ", KINDS));
    String kind = root.word("kind", KINDS).orElse("triode");
    int sections = root.whole("sections", 1, 4).orElse(1);
    String base = root.text("base").orElse("");
    root.text("basing");
    root.text("base_source");
    return new DeviceSheet(
        type,
        aliases,
        kind,
        sections,
        base,
        pins(),
        heaters(),
        ratings(type),
        capacitances(),
        evidence(usualConnection(kind)),
        root.texts("notes"),
        rectifier(type));
  }

  private Optional<StrictTable> part(String key) {
    root.require(key, "a table [" + key + "], written by a fit");
    return root.table(key);
  }

  private Optional<FitSummary> fit() {
    Optional<StrictTable> table = part("fit");
    return table.isEmpty() ? Optional.empty() : Optional.of(LawReader.fit(table.get()));
  }

  private Optional<Validity> validity(boolean hasGrid) {
    Optional<StrictTable> table = part("validity");
    return table.isEmpty()
        ? Optional.empty()
        : Optional.of(LawReader.validity(table.get(), hasGrid));
  }

  private Capacitances capacitances() {
    Optional<StrictTable> table = root.table("capacitance");
    return table.isEmpty() ? Capacitances.NONE : RatingsReader.capacitances(table.get());
  }

  private Optional<RectifierRatings> rectifier(String type) {
    Optional<StrictTable> table = root.table("rectifier");
    return table.isEmpty()
        ? Optional.empty()
        : Optional.of(RectifierReader.read(table.get(), type));
  }

  private static String usualConnection(String kind) {
    return switch (kind) {
      case "triode" -> "triode";
      case "rectifier" -> "diode";
      default -> "pentode";
    };
  }

  private Map<String, String> pins() {
    Map<String, String> pins = new LinkedHashMap<>();
    for (String text : root.texts("pins")) {
      int space = text.indexOf(' ');
      if (space < 1 || text.substring(space).isBlank()) {
        root.complain("pins", '"' + text + '"', "a pin and its electrode, such as \"1 a2\"");
      } else if (pins.put(text.substring(0, space), text.substring(space).strip()) != null) {
        root.complain("pins", "pin " + text.substring(0, space) + " a second time", "it once only");
      }
    }
    return pins;
  }

  private List<Heater> heaters() {
    List<Heater> heaters = new ArrayList<>();
    for (StrictTable table : root.tables("heater")) {
      heaters.add(RatingsReader.heater(table));
    }
    return heaters;
  }

  private List<Ratings> ratings(String type) {
    List<Ratings> ratings = new ArrayList<>();
    for (StrictTable table : root.tables("rating")) {
      ratings.add(RatingsReader.rating(table, type));
    }
    return ratings;
  }

  private List<Evidence> evidence(String usualConnection) {
    List<Evidence> evidence = new ArrayList<>();
    for (StrictTable table : root.tables("evidence")) {
      evidence.add(EvidenceReader.read(table, usualConnection));
    }
    return evidence;
  }
}
