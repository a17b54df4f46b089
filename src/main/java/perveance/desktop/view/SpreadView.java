package perveance.desktop.view;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import javafx.geometry.HPos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import perveance.app.wording.Figures;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.SpreadFigure;
import perveance.engine.analysis.Band;
import perveance.plot.ChartFactory;
import perveance.plot.PlotDescription;
import perveance.plot.PlotFonts;
import perveance.plot.SpreadPlot;

/** How a figure spreads over valves and parts; beneath it all figures with what widens them. */
final class SpreadView extends VBox {
  private static final int MOST_CAUSES = 4;
  private static final double PICTURE_SHARE = 0.55;
  private static final double[] COLUMNS = {40, 25, 35};

  private final Desk desk;
  private final PlotFonts fonts;
  private final ArtworkNode picture = new ArtworkNode();
  private final Label causes = Bits.wrapped("", "soft", "small");
  private final VBox rows = new VBox();
  private String chosen = "";

  SpreadView(Desk desk, PlotFonts fonts) {
    super(4);
    this.desk = desk;
    this.fonts = fonts;
    ScrollPane scroll = new ScrollPane(new VBox(4, causes, rows));
    scroll.setFitToWidth(true);
    picture.setId("spread-picture");
    causes.setId("spread-causes");
    picture.minHeightProperty().bind(heightProperty().multiply(PICTURE_SHARE));
    getChildren().addAll(picture, Bits.growing(scroll));
    scroll.setMinHeight(60);
    scroll.setPrefHeight(60);
  }

  void refresh() {
    rows.getChildren().clear();
    for (SpreadFigure figure : figures()) {
      rows.getChildren().add(row(figure));
    }
    draw();
  }

  private List<SpreadFigure> figures() {
    return desk.bench().stageAnswer().map(SpreadFigure::all).orElse(List.of());
  }

  /** The figure that is shown: the chosen one, or the first where this stage has no such. */
  private Optional<SpreadFigure> shown() {
    List<SpreadFigure> figures = figures();
    return figures.stream()
        .filter(f -> f.name().equals(chosen))
        .findFirst()
        .or(() -> figures.stream().findFirst());
  }

  Optional<PlotDescription> description() {
    return shown()
        .flatMap(f -> SpreadPlot.of(desk.say(f.name()), f.unit(), f.band(), f.value(), f.limit()));
  }

  private void draw() {
    double size = 11 * desk.settings().get().textSize();
    picture.show(
        description()
            .map(d -> new ChartFactory(Skin.look(desk.settings().get()), fonts, size).artwork(d))
            .orElse((g, area) -> List.of()));
    String name = shown().map(SpreadFigure::name).orElse("");
    for (Node row : rows.getChildren()) {
      row.getStyleClass().remove("chosen");
      if (("spread-" + name).equals(row.getId())) {
        row.getStyleClass().add("chosen");
      }
    }
    causes.setText(desk.say(shown().map(f -> causes(f.band())).orElse(absent())));
    picture.setAccessibleText(desk.say("How " + name + " spreads"));
  }

  private String absent() {
    return desk.bench().settled().get()
        ? "Nothing of this stage spreads."
        : "The bands are being worked out.";
  }

  private Button row(SpreadFigure figure) {
    GridPane numbers = numbers(figure);
    Button row = new RowButton(numbers);
    row.getStyleClass().add("spread-row");
    row.setId("spread-" + figure.name());
    row.setAccessibleText(
        desk.say(figure.name() + " " + value(figure) + ", band " + band(figure) + limit(figure)));
    row.setOnAction(
        e -> {
          chosen = figure.name();
          draw();
        });
    return row;
  }

  private GridPane numbers(SpreadFigure figure) {
    GridPane grid = new GridPane();
    grid.setHgap(8);
    for (double percent : COLUMNS) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(percent);
      grid.getColumnConstraints().add(column);
    }
    Label value = Bits.label(value(figure), "strong");
    grid.add(Bits.wrapped(desk.say(figure.name())), 0, 0);
    grid.add(value, 1, 0);
    grid.add(Bits.wrapped(Bits.kept(band(figure) + limit(figure)), "soft", "small"), 2, 0);
    GridPane.setHalignment(value, HPos.RIGHT);
    return grid;
  }

  private static String value(SpreadFigure f) {
    return Figures.value(f.value(), f.unit(), new TreeMap<>(Map.of("v", f.band())), "v");
  }

  private static String band(SpreadFigure f) {
    return Figures.band(Map.of("v", f.band()), "v", f.unit());
  }

  private static String limit(SpreadFigure f) {
    return f.limit().isPresent()
        ? " of " + Figures.reading(f.limit().getAsDouble(), f.unit(), 2)
        : "";
  }

  private static String causes(Band band) {
    StringBuilder text =
        new StringBuilder("95 of 100 lie between the dashed lines. It comes from ");
    boolean first = true;
    for (Band.Share share : band.shares().stream().limit(MOST_CAUSES).toList()) {
      text.append(first ? "" : ", ")
          .append(share.cause().replace('_', ' '))
          .append(' ')
          .append(Math.round(100 * share.fraction()))
          .append(" %");
      first = false;
    }
    return text + ".";
  }
}
