package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.shape.Circle;
import perveance.app.wording.Figures;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** The chassis as a list: stages in signal order, then supply nodes. */
final class ChassisList extends VBox {
  private final Desk desk;
  private final Workbench bench;
  private final StageList list;
  private final VBox rows = new VBox(2);
  private Runnable addStage = () -> {};

  ChassisList(Desk desk, StageList list) {
    this.desk = desk;
    this.bench = desk.bench();
    this.list = list;
    getStyleClass().add("side");
    ScrollPane scroll = new ScrollPane(rows);
    scroll.setFitToWidth(true);
    getChildren().add(Bits.growing(scroll));
    setId("chassis");
    bench.chosenStage().addListener((o, was, is) -> refresh());
  }

  void onAddStage(Runnable listener) {
    addStage = listener;
  }

  void refresh() {
    String focused =
        getScene() != null && getScene().getFocusOwner() instanceof Button b && b.getId() != null
            ? b.getId()
            : "";
    rows.getChildren().setAll(Bits.label("Chassis", "heading"));
    for (StageEntry stage : bench.chassis().stages()) {
      rows.getChildren().add(row(stage));
    }
    rows.getChildren().add(Bits.button("Add a stage", () -> addStage.run(), "link"));
    rows.getChildren().add(Bits.label("Supply", "heading"));
    for (Supply supply : bench.chassis().supplies()) {
      rows.getChildren().add(row(supply));
    }
    rows.getChildren().add(Bits.button("Add a supply node", this::addSupply, "link"));
    for (javafx.scene.Node node : rows.getChildren()) {
      if (node instanceof Button b && focused.equals(b.getId())) {
        b.requestFocus();
      }
    }
  }

  private Button row(StageEntry stage) {
    Optional<StageAnswer> answer = answer(stage.ref());
    String kind = StageKinds.find(stage.kind()).map(k -> k.title()).orElse(stage.kind());
    Setting device = stage.settings().get("device");
    String gain =
        answer
            .map(a -> "gain " + Figures.reading(a.smallSignal().gain(), Unit.RATIO, 3))
            .orElse(bench.answer().get() == null ? "" : "no answer");
    boolean chosen = stage.ref().equals(bench.chosenStage().get());
    Circle dot = new Circle(5.5);
    dot.getStyleClass().add("stage-dot");
    if (chosen) {
      dot.getStyleClass().add("full");
    }
    worst(stage.ref()).ifPresent(s -> dot.getStyleClass().add(s));
    Label second =
        Bits.wrapped(
            desk.say(kind) + (device == null ? "" : " \u00b7 " + device.text()), "soft", "small");
    HBox top =
        new HBox(
            6, Bits.label(stage.ref(), "strong"), Bits.gap(), Bits.label(gain, "soft", "small"));
    Button row = button(dot, top, second);
    row.setId("stage-" + stage.ref());
    row.setAccessibleText(desk.say("Stage " + stage.ref() + ", " + kind + ", " + gain));
    if (chosen) {
      row.getStyleClass().add("chosen");
    }
    row.setOnAction(e -> bench.chosenStage().set(stage.ref()));
    row.setOnKeyPressed(e -> stageKey(stage, e));
    row.setContextMenu(new StageMenu(desk, list, stage.ref()));
    return row;
  }

  private Button button(javafx.scene.Node dot, HBox top, Label second) {
    VBox words = new VBox(1, top, second);
    HBox.setHgrow(words, javafx.scene.layout.Priority.ALWAYS);
    StackPane place = new StackPane(dot);
    place.setMinWidth(14);
    place.setAlignment(javafx.geometry.Pos.TOP_CENTER);
    place.setPadding(new javafx.geometry.Insets(3, 0, 0, 0));
    HBox graphic = new HBox(8, place, words);
    return new RowButton(graphic);
  }

  /** Colour of the dot: what the worst finding of the stage is. */
  private Optional<String> worst(String ref) {
    return answer(ref).stream()
        .flatMap(a -> a.findings().stream())
        .map(f -> f.severity())
        .max(java.util.Comparator.naturalOrder())
        .flatMap(
            s ->
                s.breaksLimit()
                    ? Optional.of("over")
                    : s == Severity.CAUTION ? Optional.of("caution") : Optional.empty());
  }

  private Optional<StageAnswer> answer(String ref) {
    ChassisAnswer answer = bench.answer().get();
    return answer == null
        ? Optional.empty()
        : answer.stages().stream().filter(s -> s.ref().equals(ref)).findFirst();
  }

  private void stageKey(StageEntry stage, KeyEvent event) {
    String ref = stage.ref();
    switch (event.getCode()) {
      case DELETE -> list.remove(ref);
      case F2 -> desk.asking().word("New name of " + ref, ref).ifPresent(n -> list.rename(ref, n));
      case UP -> {
        if (!event.isAltDown()) {
          return;
        }
        list.move(ref, -1);
      }
      case DOWN -> {
        if (!event.isAltDown()) {
          return;
        }
        list.move(ref, 1);
      }
      default -> {
        return;
      }
    }
    event.consume();
  }

  private Button row(Supply supply) {
    ChassisAnswer answer = bench.answer().get();
    Optional<SupplyAnswer> solved =
        answer == null
            ? Optional.empty()
            : answer.supplies().stream().filter(s -> s.name().equals(supply.name())).findFirst();
    String volts = solved.map(s -> Figures.reading(s.voltage(), Unit.VOLT)).orElse("");
    String feed =
        supply.feed() instanceof SupplyFeed.Dropped d
            ? QuantityFormat.TYPESET.part(d.dropper(), Unit.OHM) + " from " + d.from()
            : "stated";
    String stored =
        supply.reservoir().isPresent()
            ? ", " + QuantityFormat.TYPESET.part(supply.reservoir().getAsDouble(), Unit.FARAD)
            : "";
    HBox top = new HBox(10, Bits.label(supply.name(), "strong"), Bits.label(volts));
    Button row =
        button(new javafx.scene.layout.Region(), top, Bits.label(feed + stored, "soft", "small"));
    row.setId("supply-" + supply.name());
    row.setAccessibleText("Supply " + supply.name() + ", " + volts + ", " + feed + stored);
    row.setOnAction(e -> editSupply(supply));
    row.setOnKeyPressed(
        e -> {
          if (e.getCode() == javafx.scene.input.KeyCode.DELETE) {
            list.removeSupply(supply.name());
          }
        });
    row.setContextMenu(new SupplyMenu(desk, list, supply.name(), () -> editSupply(supply)));
    return row;
  }

  void editSupply(Supply supply) {
    new SupplyDialog(desk, list, Optional.of(supply)).ask();
  }

  private void addSupply() {
    new SupplyDialog(desk, list, Optional.empty()).ask();
  }

  /** For tests and searches: what is listed. */
  List<javafx.scene.Node> listed() {
    return rows.getChildren();
  }
}
