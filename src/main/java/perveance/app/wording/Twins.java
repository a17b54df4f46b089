package perveance.app.wording;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Rows of several valves; what is the same for two of them is one row that names both. */
final class Twins {
  private final Map<FigureRow, String> names = new LinkedHashMap<>();

  void add(String name, FigureRow row) {
    names.merge(row, name, (earlier, later) -> earlier + ", " + later);
  }

  List<FigureRow> rows() {
    return names.entrySet().stream()
        .map(
            e ->
                new FigureRow(
                    e.getValue() + " " + e.getKey().label(),
                    e.getKey().value(),
                    e.getKey().band(),
                    e.getKey().note()))
        .toList();
  }
}
