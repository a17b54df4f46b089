package perveance.desktop.view;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;
import perveance.plot.PlotFonts;

/** The chosen stage as a drawing, or as a list of all its values. */
final class SchematicCard extends VBox {
  private final Desk desk;
  private final Workbench bench;
  private final SchematicView drawing;
  private final ValuesPane values;
  private final Label name = Bits.label("", "strong");
  private final Label what = Bits.label("", "soft");
  private final Label failure = Bits.wrapped("", "soft");
  private final ToggleButton drawn = new ToggleButton("Drawing");
  private final ToggleButton listed = new ToggleButton("All values");
  private final StackPane place = new StackPane();
  private final Button device;

  SchematicCard(Desk desk, PlotFonts fonts, Runnable pickDevice) {
    this.desk = desk;
    this.bench = desk.bench();
    drawing = new SchematicView(desk, fonts);
    drawing.onPickDevice(pickDevice);
    values = new ValuesPane(desk);
    device = Bits.button("", pickDevice, "link");
    device.setId("pick-device");
    getStyleClass().add("card");
    setSpacing(6);
    ToggleGroup group = new ToggleGroup();
    for (ToggleButton tab : java.util.List.of(drawn, listed)) {
      tab.getStyleClass().setAll("tab-word");
      tab.setToggleGroup(group);
      tab.setMinWidth(USE_PREF_SIZE);
      tab.setOnAction(e -> show(tab == listed));
    }
    listed.setId("tab-values");
    drawn.setId("tab-drawing");
    name.setMinWidth(USE_PREF_SIZE);
    device.setMinWidth(USE_PREF_SIZE);
    FlowPane which = new FlowPane(9, 0, name, what, device);
    which.setPrefWrapLength(0);
    HBox head = new HBox(9, Bits.growing(which), drawn, listed);
    getChildren().addAll(head, Bits.growing(place));
    show(false);
    bench.chosenStage().addListener((o, was, is) -> refresh());
  }

  SchematicView drawing() {
    return drawing;
  }

  void show(boolean list) {
    listed.setSelected(list);
    drawn.setSelected(!list);
    refresh();
  }

  void turn() {
    show(!listed.isSelected());
  }

  /** Brings a value under the keyboard: on the drawing, or in the list when it is not drawn. */
  void focus(String element, String key) {
    show(false);
    drawing.focus(element);
    if (!drawing.holds(element)) {
      show(true);
      values.focus(key);
    }
  }

  /** The value of the chosen part as it is written. */
  String chosenValue() {
    String part = bench.chosenPart().get();
    int dot = part.lastIndexOf('.');
    return dot < 0
        ? ""
        : SchematicView.written(bench, bench.chosenStage().get(), part.substring(dot + 1));
  }

  void refresh() {
    String ref = bench.chosenStage().get();
    Optional<StageEntry> stage = bench.chassis().stage(ref);
    name.setText(ref);
    what.setText(stage.map(this::words).orElse(""));
    device.setText(
        stage.map(s -> s.settings().get("device")).map(d -> d.text() + "\u2026").orElse(""));
    device.setVisible(stage.isPresent());
    device.setAccessibleText(desk.say("Choose another valve"));
    if (listed.isSelected()) {
      put(values);
      values.refresh();
    } else if (stage.isEmpty()) {
      failure.setText(
          "No stage yet. \u201cAdd a stage\u201d on the left shows the kinds there are.");
      put(failure);
    } else {
      put(drawing);
      drawing.refresh();
      bench.stageAnswer().ifPresent(this::describe);
    }
  }

  /** What is taken out and put back would be styled anew with each answer. */
  private void put(Node content) {
    if (!place.getChildren().contains(content)) {
      place.getChildren().setAll(content);
    }
  }

  private String words(StageEntry stage) {
    return desk.say(StageKinds.find(stage.kind()).map(k -> k.title()).orElse(stage.kind()));
  }

  private void describe(StageAnswer answer) {
    Map<String, String> words = new HashMap<>();
    for (PartDuty duty : answer.parts()) {
      QuantityFormat format = QuantityFormat.TYPESET;
      words.put(
          duty.part().element(),
          desk.say(
              answer.ref()
                  + " "
                  + duty.part().role()
                  + " "
                  + format.part(duty.part().value(), duty.part().type().unit())
                  + ", "
                  + format.reading(duty.idleVoltage(), Unit.VOLT, 3)
                  + ". Enter changes it, arrows step it."));
    }
    for (StageCircuit.StageDevice valve : answer.circuit().devices()) {
      words.put(valve.ref(), desk.say("Valve " + valve.ref() + ", " + valve.device().type()));
    }
    Set<String> marked = new HashSet<>();
    for (Finding finding : answer.findings()) {
      if (finding.severity().compareTo(Severity.CAUTION) > 0) {
        finding.part().ifPresent(p -> marked.add(p.contains(".") ? p : answer.ref() + "." + p));
      }
    }
    drawing.describe(words, marked);
  }
}
