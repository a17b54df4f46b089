package perveance.desktop.view;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.Desk;
import perveance.engine.analysis.StageAnswer;
import perveance.plot.Artwork;
import perveance.plot.ChartFactory;
import perveance.plot.Look;
import perveance.plot.PlotDescription;
import perveance.plot.PlotFonts;
import perveance.plot.SignalPlots;
import perveance.plot.StagePlots;

/** The charts of the chosen stage, one at a time. */
final class PlotCard extends VBox {
  /** What can be looked at. */
  enum View {
    CHARACTERISTICS("Curves", StagePlots::characteristics),
    TRANSFER("Transfer", SignalPlots::transfer),
    WAVEFORM("Waveform", SignalPlots::waveform),
    DISTORTION("Distortion", SignalPlots::distortion),
    RESPONSE("Response", SignalPlots::response),
    SPREAD("Spread", a -> Optional.empty());

    private final String word;
    private final Function<StageAnswer, Optional<PlotDescription>> plot;

    View(String word, Function<StageAnswer, Optional<PlotDescription>> plot) {
      this.word = word;
      this.plot = plot;
    }

    String word() {
      return word;
    }
  }

  private final Desk desk;
  private final PlotFonts fonts;
  private final CharacteristicsView characteristics;
  private final ArtworkNode chart = new ArtworkNode();
  private final SpreadView spread;
  private final StackPane place = new StackPane();
  private final Map<View, ToggleButton> tabs = new EnumMap<>(View.class);
  private View view = View.CHARACTERISTICS;

  PlotCard(Desk desk, PlotFonts fonts) {
    this.desk = desk;
    this.fonts = fonts;
    characteristics = new CharacteristicsView(desk, fonts);
    spread = new SpreadView(desk, fonts);
    getStyleClass().add("card");
    FlowPane bar = new FlowPane(9, 0);
    ToggleGroup group = new ToggleGroup();
    for (View v : View.values()) {
      ToggleButton tab = new ToggleButton(v.word());
      tab.getStyleClass().setAll("tab-word");
      tab.setToggleGroup(group);
      tab.setId("tab-" + v.name().toLowerCase(java.util.Locale.ROOT));
      tab.setOnAction(e -> show(v));
      tab.setMinWidth(USE_PREF_SIZE);
      tabs.put(v, tab);
      bar.getChildren().add(tab);
    }
    getChildren().addAll(bar, Bits.growing(place));
    show(View.CHARACTERISTICS);
  }

  void show(View shown) {
    view = shown;
    ToggleButton tab = tabs.get(shown);
    if (tab != null) {
      tab.setSelected(true);
    }
    place
        .getChildren()
        .setAll(
            switch (shown) {
              case CHARACTERISTICS -> characteristics;
              case SPREAD -> spread;
              default -> chart;
            });
    refresh();
  }

  CharacteristicsView characteristics() {
    return characteristics;
  }

  void refresh() {
    switch (view) {
      case CHARACTERISTICS -> characteristics.refresh();
      case SPREAD -> spread.refresh();
      default ->
          chart.show(drawn(Skin.look(desk.settings().get())).orElse((g, a) -> java.util.List.of()));
    }
  }

  /** The view as an artwork in a look, for files and the clipboard. */
  Optional<Artwork> drawn(Look look) {
    return description()
        .map(
            d -> new ChartFactory(look, fonts, 11.5 * desk.settings().get().textSize()).artwork(d));
  }

  Optional<PlotDescription> description() {
    return view == View.SPREAD
        ? spread.description()
        : desk.bench().stageAnswer().flatMap(view.plot);
  }

  String title() {
    return view.word();
  }
}
