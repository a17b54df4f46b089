package perveance.desktop.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import perveance.app.wording.FigureRow;
import perveance.app.wording.StageFigures;
import perveance.desktop.viewmodel.Desk;
import perveance.engine.analysis.StageAnswer;

/** What the stage should do, in the same words as the sheet. */
final class FiguresRow extends VBox {
  private static final int COLUMNS = 4;

  /** A column narrower than this, with text of the usual size, cuts the names of figures. */
  private static final double LEAST_WIDTH = 108;

  /** A band that is out of date until the new one comes. */
  private static final double FADED = 0.45;

  /** So many figures still fill two rows of the usual columns. */
  private static final int TWO_ROWS = 8;

  /** Shown at the foot of the window. */
  private static final Set<String> ELSEWHERE = Set.of("output", "power", "distortion");

  private final Desk desk;
  private final List<Cell> cells = new ArrayList<>();
  private final GridPane grid = new GridPane();
  private final Label basis = Bits.wrapped("", "soft", "small");

  FiguresRow(Desk desk) {
    this.desk = desk;
    getStyleClass().add("card");
    setSpacing(6);
    grid.setHgap(14);
    grid.setVgap(8);
    getChildren().addAll(grid, basis);
    grid.widthProperty().addListener((o, was, is) -> widen());
  }

  private int columns(int figures) {
    int usual = figures > TWO_ROWS ? COLUMNS + 1 : COLUMNS;
    double least = LEAST_WIDTH * desk.settings().get().textSize();
    int most = grid.getWidth() > 0 ? (int) (grid.getWidth() / least) : usual;
    return Math.max(1, Math.min(usual, most));
  }

  private void widen() {
    if (!cells.isEmpty() && columns(cells.size()) != grid.getColumnCount()) {
      place();
    }
  }

  /** The labels of one figure; their texts change, they stay. */
  private record Cell(VBox box, Label name, Label value, Label band, Label note) {
    static Cell empty() {
      Label name = Bits.wrapped("", "figure-label");
      Label value = Bits.label("", "figure-value");
      Label band = Bits.label("", "figure-note");
      Label note = Bits.wrapped("", "figure-note");
      // the band stands beside its figure, beneath it where that is too narrow
      FlowPane figure = new FlowPane(7, 0, value, band);
      figure.setRowValignment(VPos.BASELINE);
      figure.setPrefWrapLength(0);
      return new Cell(new VBox(name, figure, note), name, value, band, note);
    }
  }

  void refresh() {
    Optional<StageAnswer> answer = desk.bench().stageAnswer();
    List<FigureRow> rows =
        answer.stream()
            .flatMap(a -> StageFigures.signal(a).stream())
            .filter(r -> !ELSEWHERE.contains(r.label()))
            .toList();
    if (isPartOfWhatStands(rows)) {
      follow(rows);
    } else {
      showAll(rows);
    }
    basis.setText(answer.isEmpty() ? "" : desk.say(basis()));
  }

  private void showAll(List<FigureRow> rows) {
    if (cells.size() != rows.size()) {
      layOut(rows.size());
    } else {
      widen();
    }
    for (int i = 0; i < rows.size(); i++) {
      show(cells.get(i), rows.get(i));
    }
  }

  /** A first answer leaves out what takes long; that must not rebuild the row at each step. */
  private boolean isPartOfWhatStands(List<FigureRow> rows) {
    List<String> standing = cells.stream().map(c -> c.name().getText()).toList();
    return !rows.isEmpty()
        && rows.size() < cells.size()
        && !desk.bench().settled().get()
        && rows.stream().map(this::name).allMatch(standing::contains);
  }

  private void follow(List<FigureRow> rows) {
    for (Cell cell : cells) {
      cell.value().setOpacity(FADED);
      rows.stream()
          .filter(r -> name(r).equals(cell.name().getText()))
          .findFirst()
          .ifPresent(r -> show(cell, r));
    }
  }

  private String name(FigureRow row) {
    return desk.say(capital(row.label()));
  }

  private void layOut(int figures) {
    cells.clear();
    for (int i = 0; i < figures; i++) {
      cells.add(Cell.empty());
    }
    place();
  }

  private void place() {
    int columns = columns(cells.size());
    grid.getChildren().clear();
    grid.getColumnConstraints().clear();
    for (int i = 0; i < columns; i++) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(100.0 / columns);
      grid.getColumnConstraints().add(column);
    }
    for (int i = 0; i < cells.size(); i++) {
      grid.add(cells.get(i).box(), i % columns, i / columns);
    }
  }

  private String basis() {
    return desk.bench().settled().get()
        ? "Predicted from typical data. Bands hold 95 % of typical valves and parts."
        : "Predicted from typical data. Bands follow.";
  }

  private void show(Cell cell, FigureRow row) {
    String name = name(row);
    cell.value().setOpacity(1);
    cell.value().setText(desk.say(row.value()));
    boolean follows = row.band().isEmpty() && !desk.bench().settled().get();
    cell.band().setOpacity(follows ? FADED : 1);
    if (!follows || !cell.name().getText().equals(name)) {
      text(cell.band(), desk.say(row.band()));
    }
    cell.name().setText(name);
    text(cell.note(), Bits.kept(desk.say(row.note())));
    cell.box()
        .setAccessibleText(
            desk.say(row.label() + " " + row.value() + " " + row.band() + " " + row.note()));
  }

  private static void text(Label label, String text) {
    label.setText(text);
    label.setManaged(!text.isEmpty());
  }

  private static String capital(String text) {
    return text.isEmpty() ? text : Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}
