package perveance.accuracy;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** A table of published rows kept beside the tests: comment lines, a line of names, rows. */
public final class ReferenceTable {
  private ReferenceTable() {}

  /** One row by column name. */
  public static final class Row {
    private final Map<String, String> cells;

    Row(Map<String, String> cells) {
      this.cells = cells;
    }

    /** Text of a cell. */
    public String text(String column) {
      String cell = cells.get(column);
      if (cell == null) {
        throw new IllegalArgumentException("no column " + column + " among " + cells.keySet());
      }
      return cell;
    }

    /** Number in a cell that must not be empty. */
    public double number(String column) {
      return Double.parseDouble(text(column));
    }

    /** Number in a cell that may be empty. */
    public OptionalDouble maybe(String column) {
      return text(column).isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(number(column));
    }

    @Override
    public String toString() {
      return cells.toString();
    }
  }

  /** Reads a table of this package's resources. */
  public static List<Row> read(String name) {
    InputStream stream = ReferenceTable.class.getResourceAsStream(name);
    if (stream == null) {
      throw new IllegalArgumentException("no such table: " + name);
    }
    try (BufferedReader reader =
        new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
      List<Row> rows = new ArrayList<>();
      String[] names = null;
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (line.startsWith("#")) {
          continue;
        }
        String[] cells = line.split("\t", -1);
        if (names == null) {
          names = cells;
        } else {
          rows.add(row(names, cells));
        }
      }
      return rows;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Row row(String[] names, String[] cells) {
    if (names.length != cells.length) {
      throw new IllegalArgumentException("row of " + cells.length + " cells: " + cells[0]);
    }
    Map<String, String> row = new LinkedHashMap<>();
    for (int i = 0; i < names.length; i++) {
      row.put(names[i], cells[i]);
    }
    return new Row(row);
  }
}
