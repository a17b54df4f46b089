package perveance.desktop.view;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.geometry.Bounds;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.geometry.Rectangle2D;
import javafx.geometry.VPos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Pane;
import javafx.scene.layout.StackPane;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.PointDrag;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.plot.Artwork;
import perveance.plot.ChartFactory;
import perveance.plot.PlotDescription;
import perveance.plot.PlotFonts;
import perveance.plot.StagePlots;

/**
 * The anode characteristics in two layers: the family stands still and is drawn once; load lines,
 * operating point and swing are drawn anew with each answer.
 */
final class CharacteristicsView extends StackPane {
  private final Desk desk;
  private final Workbench bench;
  private final PlotFonts fonts;
  private final ArtworkNode family = new ArtworkNode();
  private final LoadLineLayer lines;
  private final Pane words = new Pane();
  private final Label loads = Bits.wrapped("", "small", "loads");
  private final Label readout = Bits.label("", "readout");
  private Optional<PlotDescription> frame = Optional.empty();
  private String drawnFor = "";
  private boolean held;
  private Runnable released = () -> {};
  private final PointDragging dragging;

  CharacteristicsView(Desk desk, PlotFonts fonts) {
    this.desk = desk;
    this.bench = desk.bench();
    this.fonts = fonts;
    this.lines = new LoadLineLayer(desk);
    words.setMouseTransparent(true);
    readout.setVisible(false);
    words.getChildren().add(readout);
    getChildren().addAll(family, lines, words);
    family.onDrawn(this::drawLines);
    lines.setOnMouseMoved(e -> read(e.getX(), e.getY()));
    lines.setOnMouseExited(e -> readout.setVisible(false));
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setId("characteristics");
    dragging = new PointDragging(desk, desk.drag(), this, lines);
    movers();
  }

  /** What moves when the operating point is dragged: the person chooses. */
  private void movers() {
    ToggleGroup group = new ToggleGroup();
    FlowPane choices = new FlowPane(8, 0, Bits.label("The point moves by", "soft", "small"));
    choices.setPrefWrapLength(0);
    choices.setRowValignment(VPos.BASELINE);
    for (PointDrag.Mover mover : PointDrag.Mover.values()) {
      ToggleButton choice = new ToggleButton(desk.say(mover.word()));
      choice.getStyleClass().setAll("tab-word", "small");
      choice.setToggleGroup(group);
      choice.setMinWidth(USE_PREF_SIZE);
      choice.setSelected(mover == PointDrag.Mover.BIAS);
      choice.setId("mover-" + mover.name().toLowerCase(Locale.ROOT));
      choice.setOnAction(
          e -> {
            choice.setSelected(true);
            dragging.mover(mover);
          });
      choices.getChildren().add(choice);
    }
    loads.setId("load-lines");
    HBox bar = new HBox(8, Bits.growing(choices), loads);
    bar.setMaxHeight(USE_PREF_SIZE);
    bar.heightProperty().addListener((o, was, is) -> leaveRoom(is.doubleValue()));
    StackPane.setAlignment(bar, Pos.BOTTOM_LEFT);
    getChildren().add(bar);
  }

  private void leaveRoom(double beneath) {
    for (Node layer : List.of(family, lines, words)) {
      StackPane.setMargin(layer, new Insets(0, 0, beneath, 0));
    }
  }

  /** Told when a hand lets go. */
  void onReleased(Runnable listener) {
    released = listener;
  }

  /** While a hand drags, the axes stand still. */
  void hold(boolean on) {
    held = on;
    if (!on) {
      refresh();
      released.run();
    }
  }

  Optional<PlotDescription> frame() {
    return frame;
  }

  LoadLineLayer lines() {
    return lines;
  }

  PlotScale scale() {
    PlotDescription d = frame.orElseThrow();
    Bounds data = family.data();
    return new PlotScale(
        data.getMinX(), data.getMinY(), data.getWidth(), data.getHeight(), d.x(), d.y());
  }

  private List<Rectangle2D> texts() {
    return family.spots().stream()
        .filter(s -> s.name().equals(Artwork.TEXT))
        .map(s -> new Rectangle2D(s.x(), s.y(), s.width(), s.height()))
        .toList();
  }

  /** What the full and the dashed line stand for. */
  private String loads(LoadLineView view) {
    String dc = QuantityFormat.TYPESET.part(view.dcResistance(), Unit.OHM, 3);
    String ac = QuantityFormat.TYPESET.part(view.acResistance(), Unit.OHM, 3);
    return "dc " + dc + ", ac " + ac;
  }

  /** Draws what has changed. */
  void refresh() {
    Optional<StageAnswer> answer = bench.stageAnswer();
    boolean still = held || desk.drag().isHeld();
    if (!still || frame.isEmpty()) {
      Optional<PlotDescription> next = answer.flatMap(StagePlots::frame);
      String key = next.map(CharacteristicsView::key).orElse("") + desk.settings().get();
      if (!key.equals(drawnFor)) {
        drawnFor = key;
        frame = next;
        showFamily();
        return;
      }
    }
    drawLines();
  }

  /** Two frames with the same key look the same. */
  private static String key(PlotDescription d) {
    return d.title() + d.x() + d.y() + d.series().size() + d.series().get(0).points().hashCode();
  }

  private void showFamily() {
    double size = 11 * desk.settings().get().textSize();
    family.show(
        frame
            .map(d -> new ChartFactory(Skin.look(desk.settings().get()), fonts, size).artwork(d))
            .orElse((g, area) -> List.of()));
  }

  private void drawLines() {
    Optional<StageAnswer> answer = bench.stageAnswer();
    Optional<LoadLineView> view = answer.flatMap(StageAnswer::loadLine);
    if (frame.isEmpty() || view.isEmpty() || family.data().getWidth() < 10) {
      lines.clear();
      loads.setText("");
      setAccessibleText(desk.say("No load line for this stage"));
      return;
    }
    lines.draw(answer.get(), view.get(), frame.get(), scale(), texts());
    loads.setText(loads(view.get()));
    setAccessibleText(
        desk.say(
            String.format(
                Locale.ROOT,
                "Anode characteristics, operating point %.0f V, %.2f mA",
                view.get().anode(),
                1e3 * view.get().current())));
  }

  private void read(double x, double y) {
    if (frame.isEmpty()) {
      return;
    }
    PlotScale s = scale();
    boolean inside = s.contains(x, y);
    readout.setVisible(inside);
    if (inside) {
      double volts = s.valueX(x);
      double milliamperes = s.valueY(y);
      readout.setText(
          String.format(
              Locale.ROOT,
              "%.0f V  %.2f mA  %.2f W",
              volts,
              milliamperes,
              volts * milliamperes / 1e3));
      readout.autosize();
      double w = readout.prefWidth(-1);
      readout.relocate(Math.min(x + 14, getWidth() - w - 4), Math.max(2, y - 26));
    }
  }
}
