package perveance.files.readings;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.engine.device.Evidence;
import perveance.files.toml.Problems;
import perveance.files.toml.SourceText;

/** Reads a table with one reading a line, columns by comma, semicolon or tab. */
final class ReadingsTable {
  private final SourceText source;
  private final Problems problems;
  private final List<Optional<ColumnHead>> heads = new ArrayList<>();
  private final List<Evidence> evidence = new ArrayList<>();
  private char separator = ',';

  ReadingsTable(SourceText source, Problems problems) {
    this.source = source;
    this.problems = problems;
  }

  List<Evidence> read() {
    int number = 0;
    for (String line : (Iterable<String>) source.text().lines()::iterator) {
      number++;
      if (line.isBlank() || line.stripLeading().startsWith("#")) {
        continue;
      }
      if (heads.isEmpty()) {
        readHead(line, number);
      } else {
        readRow(line, number);
      }
    }
    if (heads.isEmpty()) {
      problems.add(1, "", "no header", "a header such as Va (V); Vg (V); Ia (mA)");
    } else if (evidence.isEmpty() && problems.isEmpty()) {
      problems.add(number, "", "no readings", "at least one line of figures below the header");
    }
    return evidence;
  }

  private void readHead(String line, int number) {
    separator = line.indexOf('\t') >= 0 ? '\t' : line.indexOf(';') >= 0 ? ';' : ',';
    Set<Column> seen = EnumSet.noneOf(Column.class);
    boolean allKnown = true;
    for (String cell : cells(line)) {
      Optional<ColumnHead> head = ColumnHead.read(cell, number, problems);
      heads.add(head);
      allKnown &= head.isPresent();
      if (head.isPresent() && !seen.add(head.get().column())) {
        problems.add(number, "header", "\"" + cell + "\" a second time", "each column once only");
      }
    }
    for (Column needed : List.of(Column.ANODE_VOLTAGE, Column.ANODE_CURRENT)) {
      // a column that could not be read may be the one that seems to be missing
      if (allKnown && !seen.contains(needed)) {
        problems.add(number, "header", "no " + needed.key(), "columns Va and Ia at least");
      }
    }
  }

  private List<String> cells(String line) {
    List<String> cells = new ArrayList<>();
    for (String cell : line.split(String.valueOf(separator), -1)) {
      String bare = cell.strip();
      boolean quoted = bare.length() >= 2 && bare.startsWith("\"") && bare.endsWith("\"");
      cells.add(quoted ? bare.substring(1, bare.length() - 1).strip() : bare);
    }
    return cells;
  }

  private void readRow(String line, int number) {
    List<String> cells = cells(line);
    if (cells.size() != heads.size()) {
      String hint =
          separator == ',' && cells.size() > heads.size()
              ? "; with decimal commas separate the columns by semicolons"
              : "";
      problems.add(number, "", cells.size() + " values", heads.size() + " values" + hint);
      return;
    }
    Map<Column, Double> values = new EnumMap<>(Column.class);
    int before = problems.count();
    for (int i = 0; i < cells.size(); i++) {
      if (heads.get(i).isPresent()) {
        ColumnHead head = heads.get(i).get();
        OptionalDouble value = value(head, cells.get(i), number);
        value.ifPresent(v -> values.put(head.column(), v));
      }
    }
    if (problems.count() == before) {
      evidence.add(ReadingsEvidence.of(values, source.file(), "line " + number));
    }
  }

  private OptionalDouble value(ColumnHead head, String cell, int line) {
    Column column = head.column();
    if (cell.isEmpty()) {
      if (column == Column.ANODE_VOLTAGE || column == Column.ANODE_CURRENT) {
        problems.add(line, column.key(), "nothing", "a figure");
      }
      return OptionalDouble.empty();
    }
    // where the comma separates no columns it is the decimal sign
    String number = separator == ',' ? cell : cell.replace(',', '.');
    boolean bare = number.chars().noneMatch(c -> Character.isLetter(c) && c != 'e' && c != 'E');
    if (bare && head.unit().isEmpty() && column.range().unit() == Unit.AMPERE) {
      problems.add(
          line,
          column.key(),
          "\"" + cell + "\" without a unit",
          "a unit in the header, such as \"Ia (mA)\", or behind the figure");
      return OptionalDouble.empty();
    }
    return parse(bare ? number + " " + head.unit() : number, cell, column, line);
  }

  private OptionalDouble parse(String text, String cell, Column column, int line) {
    try {
      double value = QuantityParser.parse(text.strip(), column.range().unit()).value();
      if (column.range().holds(value)) {
        return OptionalDouble.of(value);
      }
      problems.add(line, column.key(), "\"" + cell + "\"", column.range().inWords());
    } catch (QuantityException e) {
      problems.add(line, column.key(), "\"" + cell + "\"", e.expected());
    }
    return OptionalDouble.empty();
  }
}
