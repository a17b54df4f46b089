package perveance.desktop.view;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import perveance.app.wording.Figures;
import perveance.desktop.viewmodel.Desk;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Unit;

/** The 95 % bands and what they come from. */
final class SpreadView extends ScrollPane {
  private static final int MOST_CAUSES = 4;

  private final Desk desk;
  private final VBox content = new VBox(10);

  SpreadView(Desk desk) {
    this.desk = desk;
    setContent(content);
    setFitToWidth(true);
  }

  private record Row(String name, double value, Unit unit, Band band) {}

  void refresh() {
    content.getChildren().clear();
    Optional<StageAnswer> answer = desk.bench().stageAnswer();
    if (answer.isEmpty()) {
      return;
    }
    List<Row> rows = rows(answer.get());
    if (rows.isEmpty()) {
      content.getChildren().add(Bits.wrapped("The bands are being worked out.", "soft"));
      return;
    }
    content
        .getChildren()
        .add(
            Bits.wrapped(
                desk.say(
                    "95 of 100 such chassis lie in the band; beneath it, what the width comes"
                        + " from. Measuring the first cause and typing it in narrows the band"
                        + " most."),
                "soft",
                "small"));
    rows.forEach(row -> content.getChildren().add(row(row)));
  }

  private static List<Row> rows(StageAnswer answer) {
    List<Row> rows = new java.util.ArrayList<>();
    for (DevicePoint p : answer.points()) {
      add(
          rows,
          p.ref() + " anode to chassis",
          p.anodeChassis(),
          Unit.VOLT,
          p.bands(),
          "anodeChassis");
      add(
          rows,
          p.ref() + " anode current",
          p.anodeCurrent(),
          Unit.AMPERE,
          p.bands(),
          "anodeCurrent");
      add(
          rows,
          p.ref() + " cathode to chassis",
          p.cathodeChassis(),
          Unit.VOLT,
          p.bands(),
          "cathodeChassis");
    }
    Map<String, Band> small = answer.smallSignal().bands();
    add(rows, "gain", answer.smallSignal().gain(), Unit.RATIO, small, "gain");
    add(
        rows,
        "output resistance",
        answer.smallSignal().outputResistance(),
        Unit.OHM,
        small,
        "outputResistance");
    Map<String, Band> clean = answer.clean().bands();
    add(rows, "clean input, peak", answer.clean().inputPeak(), Unit.VOLT, clean, "inputPeak");
    add(rows, "clean output, peak", answer.clean().outputPeak(), Unit.VOLT, clean, "outputPeak");
    return rows;
  }

  private static void add(
      List<Row> rows, String name, double value, Unit unit, Map<String, Band> bands, String key) {
    Band band = bands.get(key);
    if (band != null && band.high() > band.low()) {
      rows.add(new Row(name, value, unit, band));
    }
  }

  private Region row(Row row) {
    GridPane grid = new GridPane();
    grid.setHgap(12);
    grid.setVgap(2);
    javafx.scene.layout.ColumnConstraints name = new javafx.scene.layout.ColumnConstraints();
    name.setPercentWidth(46);
    grid.getColumnConstraints().add(name);
    Label value =
        Bits.label(
            Figures.value(row.value(), row.unit(), new TreeMap<>(Map.of("v", row.band())), "v"),
            "strong");
    Label band = Bits.label(Figures.band(Map.of("v", row.band()), "v", row.unit()), "soft");
    grid.add(Bits.wrapped(desk.say(row.name())), 0, 0);
    grid.add(value, 1, 0);
    grid.add(band, 2, 0);
    GridPane.setHalignment(value, HPos.RIGHT);
    return new VBox(3, grid, bar(row), causes(row));
  }

  /** The band as a bar with the value in it. */
  private static Region bar(Row row) {
    StackPane bar = new StackPane();
    bar.setMinHeight(8);
    bar.setStyle("-fx-background-color: -wash; -fx-background-radius: 3;");
    Region mark = new Region();
    mark.setMaxSize(3, 12);
    mark.setMinSize(3, 12);
    mark.setStyle("-fx-background-color: -accent;");
    double share = (row.value() - row.band().low()) / (row.band().high() - row.band().low());
    bar.getChildren().add(mark);
    StackPane.setAlignment(mark, javafx.geometry.Pos.CENTER_LEFT);
    mark.translateXProperty().bind(bar.widthProperty().multiply(Math.max(0, Math.min(1, share))));
    return bar;
  }

  private Label causes(Row row) {
    StringBuilder text = new StringBuilder();
    for (Band.Share share : row.band().shares().stream().limit(MOST_CAUSES).toList()) {
      if (share.fraction() > 0.01) {
        text.append(text.isEmpty() ? "" : ", ")
            .append(share.cause().replace('_', ' '))
            .append(' ')
            .append(Math.round(100 * share.fraction()))
            .append(" %");
      }
    }
    return Bits.wrapped(desk.say(text.toString()), "soft", "small");
  }
}
