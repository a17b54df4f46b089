package perveance.desktop.view;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.binding.Bindings;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.Slider;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import perveance.app.Edit;
import perveance.app.wording.ChainFigures;
import perveance.app.wording.Figures;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.CleanSwing;
import perveance.engine.analysis.DrivenAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** Drive level, and what comes out at it. */
final class FootBar extends HBox {
  private static final String DRIVE = "drive";

  private final Desk desk;
  private final Workbench bench;
  private final Slider slider = new Slider(0, 1, 0);
  private final Label drive = Bits.label("");
  private final Label range = Bits.wrapped("");
  private final Label output = Bits.label("");
  private final Label power = Bits.wrapped("");
  private final Label distortion = Bits.label("");
  private final Label harmonics = Bits.wrapped("");
  private final Label headroom = Bits.label("");
  private final Label headroomNote = Bits.wrapped("");
  private final Label message = Bits.wrapped("", "message");
  private boolean setting;
  private boolean dragging;

  FootBar(Desk desk, SideWork work) {
    this.desk = desk;
    this.bench = desk.bench();
    getStyleClass().add("foot");
    slider.setId("drive");
    slider.setAccessibleText("Drive at the input, peak");
    slider.setPrefWidth(230);
    VBox sliderBox = new VBox(4, slider, range);
    range.getStyleClass().add("figure-note");
    sliderBox.setMinWidth(180);
    drive.setMinWidth(USE_PREF_SIZE);
    message.setId("message");
    message.setMinWidth(0);
    message.setMinHeight(0);
    getChildren()
        .addAll(
            Bits.figure("Drive at the input", drive, Bits.label("")),
            sliderBox,
            Bits.figure("Output", output, power),
            Bits.figure("Distortion", distortion, harmonics),
            Bits.figure("Headroom", headroom, headroomNote),
            message,
            busy(work));
    HBox.setHgrow(message, javafx.scene.layout.Priority.ALWAYS);
    message.textProperty().bind(bench.message());
    slider.valueProperty().addListener((o, was, is) -> driven(is.doubleValue()));
    slider.valueChangingProperty().addListener((o, was, is) -> dragging = dragging && is);
  }

  /** What is being made beside the window, with the press that stops it. */
  private static HBox busy(SideWork work) {
    ProgressBar bar = new ProgressBar();
    bar.setPrefWidth(90);
    bar.accessibleTextProperty().bind(work.making());
    Label what = Bits.wrapped("", "soft", "small");
    what.textProperty().bind(work.making().concat("\u2026"));
    Button stop = Bits.button("Stop", work::stop, "link");
    stop.setId("stop-making");
    stop.accessibleTextProperty().bind(Bindings.concat("Stop: ", work.making()));
    HBox busy = new HBox(8, new VBox(2, what, bar), stop);
    busy.setMinWidth(USE_PREF_SIZE);
    busy.visibleProperty().bind(work.making().isNotEmpty());
    busy.managedProperty().bind(busy.visibleProperty());
    return busy;
  }

  void refresh() {
    Optional<StageAnswer> answer = bench.stageAnswer();
    for (Node part : List.of(slider, output, distortion, headroom)) {
      part.setDisable(answer.isEmpty());
    }
    answer.ifPresent(this::show);
  }

  private void show(StageAnswer answer) {
    CleanSwing clean = answer.clean();
    Optional<DrivenAnswer> driven = answer.driven();
    double level = driven.map(DrivenAnswer::inputPeak).orElse(0.0);
    setting = true;
    if (!slider.isValueChanging()) {
      slider.setMax(round(Math.max(1.6 * clean.inputPeak(), 1.2 * level)));
      slider.setValue(level);
      slider.setBlockIncrement(slider.getMax() / 40);
    }
    setting = false;
    drive.setText(level > 0 ? Figures.reading(level, Unit.VOLT) + " peak" : "none stated");
    range.setText(
        desk.say(
            "clean to "
                + Figures.reading(clean.inputPeak(), Unit.VOLT)
                + ", then "
                + clean.limitedBy().told()));
    output.setText(
        driven.map(d -> Figures.reading(d.output(), Unit.VOLT) + " rms").orElse("\u2013"));
    power.setText(
        driven.stream()
            .flatMapToDouble(d -> d.power().stream())
            .mapToObj(w -> Figures.reading(w, Unit.WATT))
            .findFirst()
            .orElse(""));
    distortion.setText(driven.map(d -> Figures.percent(d.distortion())).orElse("\u2013"));
    harmonics.setText(Bits.kept(driven.map(FootBar::harmonics).orElse("")));
    headroom.setText(
        clean.headroom().isPresent()
            ? QuantityFormat.TYPESET.level(clean.headroom().getAsDouble(), 1)
            : "\u2013");
    headroomNote.setText(desk.say("to " + clean.limitedBy().told() + inItsRow(answer)));
  }

  private String inItsRow(StageAnswer answer) {
    ChassisAnswer chassis = bench.answer().get();
    String told = chassis == null ? "" : ChainFigures.beside(chassis.chains(), answer.ref());
    return told.isEmpty() ? "" : "; " + told;
  }

  private static String harmonics(DrivenAnswer driven) {
    StringBuilder text = new StringBuilder();
    String[] names = {"second ", "third "};
    for (int i = 0; i < Math.min(names.length, driven.harmonics().size()); i++) {
      text.append(text.isEmpty() ? "" : ", ")
          .append(names[i])
          .append(Figures.percent(Math.abs(driven.harmonics().get(i))));
    }
    return text.toString();
  }

  /** Steps of a thousandth of a round range keep the written value short. */
  private static double round(double value) {
    double decade = Math.pow(10, Math.floor(Math.log10(Math.max(1e-3, value))));
    return Math.ceil(value / decade * 2) / 2 * decade;
  }

  private void driven(double value) {
    if (setting) {
      return;
    }
    String ref = bench.chosenStage().get();
    if (value < slider.getMax() / 500) {
      return;
    }
    String text = String.format(Locale.ROOT, "%.3g V", value);
    if (KeyEditor.parse(bench.chassis(), ref, DRIVE, text)
        instanceof KeyEditor.Outcome.Accepted accepted) {
      Edit edit = accepted.edit();
      if (dragging) {
        bench.drag(edit);
      } else {
        bench.edit(edit);
        dragging = slider.isValueChanging();
      }
    }
  }
}
