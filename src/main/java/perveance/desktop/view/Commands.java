package perveance.desktop.view;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableValue;
import javafx.scene.Scene;
import perveance.app.wording.Vocabulary;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Settings;
import perveance.desktop.viewmodel.StageList;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.stage.StageEntry;
import perveance.plot.Look;

/** Everything that can be done, once: for menus, keys and the search. */
final class Commands {
  private final Desk desk;
  private final Workbench bench;
  private final FileActions files;
  private final StageList list;
  private final SchematicCard schematic;
  private final PlotCard plots;
  private final FindingsPane findings;
  private final Pickers pickers;
  private final Map<String, List<List<Action>>> menus = new LinkedHashMap<>();

  Commands(
      Desk desk,
      FileActions files,
      StageList list,
      SchematicCard schematic,
      PlotCard plots,
      FindingsPane findings,
      Pickers pickers) {
    this.desk = desk;
    this.bench = desk.bench();
    this.files = files;
    this.list = list;
    this.schematic = schematic;
    this.plots = plots;
    this.findings = findings;
    this.pickers = pickers;
    menus.put("File", fileMenu());
    menus.put("Edit", editMenu());
    menus.put("View", viewMenu());
  }

  Map<String, List<List<Action>>> menus() {
    return menus;
  }

  private List<List<Action>> fileMenu() {
    return List.of(
        List.of(
            Action.of("New chassis", "Shortcut+N", files::start),
            Action.of("New from the example", "", files::example),
            Action.of("Open\u2026", "Shortcut+O", files::open),
            Action.of("Open recent\u2026", "Shortcut+Shift+O", files::openRecent)),
        List.of(
            Action.of("Save", "Shortcut+S", files::save),
            Action.of("Save as\u2026", "Shortcut+Shift+S", files::saveAs)),
        List.of(
            Action.of("Print the sheet (PDF)\u2026", "Shortcut+P", files::sheet),
            Action.of("Print the sheet on paper\u2026", "Shortcut+Shift+P", files::paper),
            Action.of("Stop what is being made", "Shortcut+PERIOD", files.work()::stop),
            Action.of("Export the figures (CSV)\u2026", "", files::figures),
            Action.of(
                "Export this chart (SVG)\u2026",
                "",
                () -> files.vector("chart", plots.drawn(Look.LIGHT))),
            Action.of(
                "Export this chart (PNG)\u2026",
                "",
                () -> files.bitmap("chart", plots.drawn(Look.LIGHT))),
            Action.of(
                "Export the drawing (SVG)\u2026",
                "",
                () -> files.vector("drawing", schematic.drawing().artwork())),
            Action.of(
                "Export the drawing (PNG)\u2026",
                "",
                () -> files.bitmap("drawing", schematic.drawing().artwork()))));
  }

  private List<List<Action>> editMenu() {
    ObservableValue<Boolean> undoable =
        Bindings.createBooleanBinding(
            () -> !bench.history().get().past().isEmpty(), bench.history());
    ObservableValue<Boolean> redoable =
        Bindings.createBooleanBinding(
            () -> !bench.history().get().future().isEmpty(), bench.history());
    return List.of(
        List.of(
            Action.of("Undo", "Shortcut+Z", bench::undo).when(undoable),
            Action.of("Redo", "Shortcut+Shift+Z", bench::redo).when(redoable)),
        List.of(
            Action.of(
                "Copy the chosen value", "Shortcut+Shift+C", () -> Copying.value(desk, schematic)),
            Action.of("Copy this chart", "", () -> Copying.chart(desk, plots)),
            Action.of("Copy the report as text", "", () -> Copying.report(desk))),
        List.of(
            Action.of("Add a stage\u2026", "Shortcut+Shift+A", pickers::kind),
            Action.of("Duplicate the stage", "Shortcut+D", () -> list.duplicate(chosen())),
            Action.of("Choose another valve\u2026", "Shortcut+T", pickers::device),
            Action.of("Rename the chassis\u2026", "", pickers::title),
            Action.of("Conditions: mains, meter, tolerances\u2026", "", pickers::conditions)));
  }

  private List<List<Action>> viewMenu() {
    List<Action> charts = new ArrayList<>();
    int number = 1;
    for (PlotCard.View view : PlotCard.View.values()) {
      charts.add(Action.of(view.word(), "Shortcut+" + number++, () -> plots.show(view)));
    }
    return List.of(
        charts,
        List.of(
            Action.of("Drawing or all values", "Shortcut+L", schematic::turn),
            Action.of("Fit the drawing", "", () -> schematic.drawing().fit()),
            Action.of("Hand sums", "Shortcut+H", findings::toggleSums)),
        List.of(
            Action.of("Light or dark", "Shortcut+Shift+L", () -> set(s -> s.withDark(!s.dark()))),
            Action.of(
                "Larger text",
                "Shortcut+Shift+Up",
                () -> set(s -> s.withTextSize(s.textSize() + 0.1))),
            Action.of(
                "Smaller text",
                "Shortcut+Shift+Down",
                () -> set(s -> s.withTextSize(s.textSize() - 0.1))),
            Action.of("British or American words", "", () -> set(Commands::otherWords)),
            Action.of(
                "Resistors as boxes or zigzags", "", () -> set(s -> s.withZigzag(!s.zigzag()))),
            Action.of("Sheet on A4 or Letter", "", this::paper),
            Action.of("Settings\u2026", "Shortcut+COMMA", pickers::settings)));
  }

  private static Settings otherWords(Settings s) {
    return s.withVocabulary(
        s.vocabulary() == Vocabulary.BRITISH ? Vocabulary.AMERICAN : Vocabulary.BRITISH);
  }

  private void paper() {
    set(s -> s.withLetter(!s.letter()));
    bench.say("The sheet is printed on " + (desk.settings().get().letter() ? "Letter." : "A4."));
  }

  private void set(java.util.function.UnaryOperator<Settings> change) {
    desk.settings().set(change.apply(desk.settings().get()));
  }

  private String chosen() {
    return bench.chosenStage().get();
  }

  /** Actions, then parts of the chosen stage, stages and valves: what the search finds. */
  List<Action> all() {
    List<Action> all = new ArrayList<>();
    menus.values().forEach(groups -> groups.forEach(all::addAll));
    for (StageEntry stage : bench.chassis().stages()) {
      all.add(
          Action.of(
              "Stage " + stage.ref() + ", " + stage.kind().replace('-', ' '),
              "",
              () -> bench.chosenStage().set(stage.ref())));
      for (String key : stage.settings().keySet()) {
        all.add(
            Action.of(
                desk.say(stage.ref() + " " + KeyEditor.words(key))
                    + " "
                    + SchematicView.written(bench, stage.ref(), key),
                "",
                () -> part(stage.ref(), key)));
      }
    }
    for (String name : bench.engine().devices().names()) {
      all.add(
          Action.of(
              desk.say("Valve ") + name.toUpperCase(Locale.ROOT), "", () -> pickers.device(name)));
    }
    return all;
  }

  private void part(String ref, String key) {
    bench.chosenStage().set(ref);
    String element = ref + "." + key;
    bench.chosenPart().set(element);
    schematic.focus(element, key);
  }

  void accelerators(Scene scene) {
    menus
        .values()
        .forEach(
            groups ->
                groups.forEach(
                    group ->
                        group.forEach(
                            action -> {
                              if (action.keys() != null) {
                                scene
                                    .getAccelerators()
                                    .put(action.keys(), () -> ifPossible(action));
                              }
                            })));
    scene
        .getAccelerators()
        .put(javafx.scene.input.KeyCombination.valueOf("Shortcut+Y"), bench::redo);
  }

  private static void ifPossible(Action action) {
    if (action.isPossible()) {
      action.run().run();
    }
  }
}
