package perveance.files.readings;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Evidence;
import perveance.files.toml.FormVersion;
import perveance.files.toml.KeyWords;
import perveance.files.toml.Problems;
import perveance.files.toml.SourceText;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlParser;

/**
 * Reads readings of a valve: a table in text, one reading a line under a header with units, or a
 * TOML file with {@code perveance_readings = 1} and one {@code [[reading]]} each.
 */
public final class CurveReadingsReader {
  private static final String VERSION_KEY = "perveance_readings";
  private static final int VERSION = 1;

  private CurveReadingsReader() {}

  /**
   * Reads a file.
   *
   * @param path the file
   * @return its readings, at least one
   * @throws BadInputException with everything that is wrong with the file
   */
  public static CurveReadings read(Path path) throws BadInputException {
    return read(SourceText.read(path));
  }

  /**
   * Reads the text of a file.
   *
   * @param source the text
   * @return its readings, at least one
   * @throws BadInputException with everything that is wrong with the file
   */
  public static CurveReadings read(SourceText source) throws BadInputException {
    Problems problems = new Problems(source.file());
    CurveReadings readings =
        isToml(source)
            ? toml(source, problems)
            : new CurveReadings(Optional.empty(), new ReadingsTable(source, problems).read());
    problems.refuse();
    return readings;
  }

  private static boolean isToml(SourceText source) {
    return source.file().endsWith(".toml")
        || source.text().lines().anyMatch(line -> line.stripLeading().startsWith(VERSION_KEY));
  }

  private static CurveReadings toml(SourceText source, Problems problems) {
    StrictTable root =
        new StrictTable(
            TomlParser.parse(source, problems, KeyWords.OF_THE_TRADE), "", source, problems);
    FormVersion.check(root, VERSION_KEY, VERSION);
    Optional<String> device = root.text("device");
    root.text("note");
    root.require("reading", "at least one [[reading]]");
    List<Evidence> evidence = new ArrayList<>();
    for (StrictTable table : root.tables("reading")) {
      evidence.add(reading(table, source.file()));
    }
    root.refuseOthers();
    return new CurveReadings(device, evidence);
  }

  private static Evidence reading(StrictTable table, String file) {
    Map<Column, Double> values = new EnumMap<>(Column.class);
    for (Column column : Column.values()) {
      if (column == Column.ANODE_VOLTAGE || column == Column.ANODE_CURRENT) {
        table.require(column.key(), column.range().inWords());
      }
      OptionalDouble value = table.quantity(column.key(), column.range());
      value.ifPresent(v -> values.put(column, v));
    }
    String note = table.text("note").orElse("line " + table.line());
    table.refuseOthers();
    return ReadingsEvidence.of(values, file, note);
  }
}
