package perveance.files.readings;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.NearMiss;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.files.toml.Problems;

/**
 * The head of one column.
 *
 * @param column what it holds
 * @param unit unit as written; empty when the head states none
 */
record ColumnHead(Column column, String unit) {
  /**
   * Reads "Va", "Va (V)", "Ia [mA]", "Ia/mA", "Ia mA", "Ia_mA", "plate mA"; empty after a
   * complaint.
   */
  static Optional<ColumnHead> read(String text, int line, Problems problems) {
    String head = text.strip();
    Optional<ColumnHead> read = split(head);
    if (read.isEmpty()) {
      problems.add(
          line,
          "header",
          head.isEmpty() ? "a column without a name" : "\"" + head + "\"",
          "Va, Vg, Ia, Vg2 or Ig2 with its unit, such as \"Ia (mA)\"",
          NearMiss.suggest(name(head), Column.allNames()));
      return Optional.empty();
    }
    String unit = read.get().unit();
    try {
      if (!unit.isEmpty()) {
        QuantityParser.parse("1 " + unit, read.get().column().range().unit());
      }
    } catch (QuantityException e) {
      Unit expected = read.get().column().range().unit();
      problems.add(
          line,
          "header",
          "\"" + head + "\"",
          "a unit of "
              + expected.quantityWord().replaceFirst("^an? ", "")
              + ", such as "
              + (expected == Unit.AMPERE ? "mA" : expected.symbol()));
      return Optional.empty();
    }
    return read;
  }

  private static String name(String head) {
    return head.replaceAll("[(\\[/].*", "");
  }

  private static Optional<Column> ofElectrode(String name, String unit) {
    for (Unit each : List.of(Unit.VOLT, Unit.AMPERE)) {
      try {
        QuantityParser.parse("1 " + unit, each);
        return Column.ofElectrode(name, each);
      } catch (QuantityException notThisOne) {
        continue;
      }
    }
    return Optional.empty();
  }

  private static Optional<ColumnHead> split(String head) {
    Optional<Column> whole = Column.named(head);
    if (whole.isPresent()) {
      return Optional.of(new ColumnHead(whole.get(), ""));
    }
    for (int i = head.length() - 1; i > 0; i--) {
      if ("([/ _".indexOf(head.charAt(i)) >= 0) {
        String name = head.substring(0, i);
        String unit = head.substring(i + 1).replaceAll("[)\\]]$", "").strip();
        Optional<Column> column = Column.named(name).or(() -> ofElectrode(name, unit));
        if (column.isPresent()) {
          return Optional.of(new ColumnHead(column.get(), unit));
        }
      }
    }
    return Optional.empty();
  }
}
