package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import perveance.app.wording.ChainFigures;
import perveance.app.wording.FigureRow;
import perveance.app.wording.StageFigures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.SignalChain;
import perveance.engine.analysis.StageAnswer;

/** All figures of a chassis as a table for a spreadsheet. */
public final class FiguresTable {
  private FiguresTable() {}

  /**
   * Comma-separated values, RFC 4180.
   *
   * @param answer the answer
   * @return table with a head
   */
  public static String csv(ChassisAnswer answer) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("stage", "valve", "figure", "value", "band", "note"));
    for (StageAnswer stage : answer.stages()) {
      for (DevicePoint point : stage.points()) {
        StageFigures.point(point).forEach(r -> rows.add(row(stage.ref(), point.ref(), r)));
      }
      StageFigures.signal(stage).forEach(r -> rows.add(row(stage.ref(), "", r)));
    }
    for (SignalChain chain : answer.chains()) {
      ChainFigures.rows(chain)
          .forEach(
              r -> rows.add(List.of(r.label(), "", "signal path", r.value(), r.band(), r.note())));
    }
    return rows.stream()
        .map(r -> r.stream().map(FiguresTable::quoted).collect(Collectors.joining(",")))
        .collect(Collectors.joining("\r\n", "", "\r\n"));
  }

  private static List<String> row(String stage, String valve, FigureRow row) {
    return List.of(stage, valve, row.label(), row.value(), row.band(), row.note());
  }

  private static String quoted(String text) {
    return text.contains(",") || text.contains("\"") || text.contains("\n")
        ? "\"" + text.replace("\"", "\"\"") + "\""
        : text;
  }
}
