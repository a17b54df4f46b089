package perveance.desktop.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;

/**
 * Every key of a stage in one list, also those that no symbol of the drawing shows. What parts are
 * rated for, and strays, are folded away until they are stated or asked for.
 */
final class ValuesPane extends ScrollPane {
  private final Desk desk;
  private final Workbench bench;
  private final GridPane grid = new GridPane();
  private String shownFor = "";
  private boolean unfolded;

  ValuesPane(Desk desk) {
    this.desk = desk;
    this.bench = desk.bench();
    grid.setHgap(12);
    grid.setVgap(5);
    for (double percent : new double[] {29, 33, 38}) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(percent);
      grid.getColumnConstraints().add(column);
    }
    setContent(grid);
    setFitToWidth(true);
    setId("values");
  }

  /** Builds the list for the chosen stage, or brings its texts up to date. */
  void refresh() {
    String ref = bench.chosenStage().get();
    Optional<StageEntry> stage = bench.chassis().stage(ref);
    Optional<StageKind> kind = stage.flatMap(s -> StageKinds.find(s.kind()));
    if (stage.isEmpty() || kind.isEmpty()) {
      grid.getChildren().clear();
      shownFor = "";
      return;
    }
    List<KeySpec> shown = shown(stage.get(), kind.get());
    String key = ref + " " + shown + unfolded + desk.settings().get().vocabulary();
    if (!key.equals(shownFor)) {
      shownFor = key;
      build(ref, shown, kind.get());
    }
    for (javafx.scene.Node node : grid.getChildren()) {
      if (node instanceof TextField field && !field.isFocused()) {
        field.setText(text(stage.get(), field.getId().substring("value-".length())));
      }
    }
  }

  private List<KeySpec> shown(StageEntry stage, StageKind kind) {
    List<KeySpec> main = new ArrayList<>();
    List<KeySpec> more = new ArrayList<>();
    for (KeySpec spec : kind.keys()) {
      boolean folds = folds(spec, kind);
      if (!folds || unfolded || stage.settings().containsKey(spec.key())) {
        (folds ? more : main).add(spec);
      }
    }
    main.addAll(more);
    return main;
  }

  /** A rating belongs to a part that has a key of its own. */
  private static boolean folds(KeySpec spec, StageKind kind) {
    String part = spec.key().replaceFirst("_(power|voltage)$", "");
    return spec.key().startsWith("stray_")
        || (!part.equals(spec.key()) && kind.keys().stream().anyMatch(k -> k.key().equals(part)));
  }

  private void build(String ref, List<KeySpec> shown, StageKind kind) {
    grid.getChildren().clear();
    int row = 0;
    boolean folded = false;
    for (KeySpec spec : shown) {
      if (folds(spec, kind) && !folded) {
        folded = true;
        fold(row++, kind);
      }
      row(row++, ref, spec);
    }
    if (!folded) {
      fold(row, kind);
    }
  }

  private void fold(int row, StageKind kind) {
    long count = kind.keys().stream().filter(k -> folds(k, kind)).count();
    if (count > 0) {
      String words =
          unfolded
              ? "Fewer: without ratings and strays that are not stated"
              : "More: ratings of parts, strays (" + count + ")";
      Button fold = Bits.button(words, this::turn, "link");
      fold.setId("values-fold");
      grid.add(fold, 0, row, 3, 1);
    }
  }

  private void turn() {
    unfolded = !unfolded;
    refresh();
    grid.lookupAll("#values-fold").forEach(javafx.scene.Node::requestFocus);
  }

  private static String text(StageEntry stage, String key) {
    Setting setting = stage.settings().get(key);
    return setting == null ? "" : setting.text();
  }

  private void row(int row, String ref, KeySpec spec) {
    Label name = Bits.wrapped(desk.say(KeyEditor.words(spec.key())));
    TextField field =
        new TextField(bench.chassis().stage(ref).map(s -> text(s, spec.key())).orElse(""));
    field.setId("value-" + spec.key());
    field.setPrefColumnCount(8);
    field.setAccessibleText(
        desk.say(ref + " " + KeyEditor.words(spec.key()) + ", " + spec.meaning()));
    Label note = Bits.wrapped(desk.say(spec.meaning()), "soft", "small");
    field.setPromptText(spec.choices().isEmpty() ? "" : String.join(", ", spec.choices()));
    field.setOnAction(e -> commit(ref, spec, field, note));
    field
        .focusedProperty()
        .addListener(
            (o, was, is) -> {
              if (!is) {
                commit(ref, spec, field, note);
              }
            });
    field.setOnKeyPressed(
        e -> {
          if (e.getCode() == KeyCode.UP || e.getCode() == KeyCode.DOWN) {
            KeyEditor.step(bench.chassis(), ref, spec.key(), e.getCode() == KeyCode.UP)
                .ifPresent(bench::edit);
            bench.chassis().stage(ref).ifPresent(s -> field.setText(text(s, spec.key())));
            e.consume();
          }
        });
    grid.addRow(row, name, field, note);
  }

  private void commit(String ref, KeySpec spec, TextField field, Label note) {
    Optional<StageEntry> stage = bench.chassis().stage(ref);
    if (stage.isEmpty() || field.getText().strip().equals(text(stage.get(), spec.key()))) {
      plain(spec, note);
      return;
    }
    KeyEditor.Outcome outcome = KeyEditor.parse(bench.chassis(), ref, spec.key(), field.getText());
    Optional<String> why =
        outcome instanceof KeyEditor.Outcome.Accepted accepted
            ? bench.edit(accepted.edit())
            : Optional.of(((KeyEditor.Outcome.Refused) outcome).why());
    if (why.isPresent()) {
      note.setText(desk.say(why.get()));
      note.getStyleClass().setAll("label", "complaint");
    } else {
      plain(spec, note);
    }
  }

  private void plain(KeySpec spec, Label note) {
    note.setText(desk.say(spec.meaning()));
    note.getStyleClass().setAll("label", "soft", "small");
  }

  void focus(String key) {
    Optional<javafx.scene.Node> field = field(key);
    if (field.isEmpty() && !unfolded) {
      turn();
      field = field(key);
    }
    field.ifPresent(javafx.scene.Node::requestFocus);
  }

  private Optional<javafx.scene.Node> field(String key) {
    return grid.getChildren().stream().filter(n -> ("value-" + key).equals(n.getId())).findFirst();
  }
}
