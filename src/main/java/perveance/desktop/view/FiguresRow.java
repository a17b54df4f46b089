package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import perveance.app.wording.FigureRow;
import perveance.app.wording.StageFigures;
import perveance.desktop.viewmodel.Desk;
import perveance.engine.analysis.StageAnswer;

/** What the stage should do, in the same words as the sheet. */
final class FiguresRow extends VBox {
  private static final int COLUMNS = 4;

  /** Shown at the foot of the window. */
  private static final Set<String> ELSEWHERE = Set.of("output", "power", "distortion");

  private final Desk desk;
  private final GridPane grid = new GridPane();
  private final Label basis = Bits.wrapped("", "soft", "small");

  FiguresRow(Desk desk) {
    this.desk = desk;
    getStyleClass().add("card");
    setSpacing(6);
    grid.setHgap(14);
    grid.setVgap(8);
    for (int i = 0; i < COLUMNS; i++) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(100.0 / COLUMNS);
      grid.getColumnConstraints().add(column);
    }
    getChildren().addAll(grid, basis);
  }

  void refresh() {
    grid.getChildren().clear();
    Optional<StageAnswer> answer = desk.bench().stageAnswer();
    if (answer.isEmpty()) {
      basis.setText("");
      return;
    }
    List<FigureRow> rows =
        StageFigures.signal(answer.get()).stream()
            .filter(r -> !ELSEWHERE.contains(r.label()))
            .toList();
    for (int i = 0; i < rows.size(); i++) {
      grid.add(figure(rows.get(i)), i % COLUMNS, i / COLUMNS);
    }
    basis.setText(
        desk.say(
            desk.bench().settled().get()
                ? "Predicted from typical data. Bands hold 95 % of typical valves and parts."
                : "Bands follow."));
  }

  private VBox figure(FigureRow row) {
    Label value = Bits.label(desk.say(row.value()));
    String second = row.band().isEmpty() ? row.note() : row.band();
    Label note = Bits.label(desk.say(second));
    VBox box = Bits.figure(desk.say(capital(row.label())), value, note);
    if (!row.note().isEmpty() && !row.band().isEmpty()) {
      box.getChildren().add(Bits.label(desk.say(row.note()), "figure-note"));
    }
    String all = row.label() + " " + row.value() + " " + row.band() + " " + row.note();
    Tooltip.install(box, new Tooltip(desk.say(all)));
    box.setAccessibleText(desk.say(all));
    return box;
  }

  private static String capital(String text) {
    return text.isEmpty() ? text : Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}
