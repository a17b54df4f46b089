package perveance.desktop.view;

import java.util.Map;
import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Pane;
import javafx.scene.layout.VBox;
import perveance.app.Edit;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Workbench;

/** A text field at the place of a value; what cannot be is said beneath it. */
final class ValueEditor {
  private final Desk desk;
  private final Workbench bench;
  private final Pane over;
  private final TextField field = new TextField();
  private final Label complaint = Bits.wrapped("", "complaint");
  private final Label meaning = Bits.wrapped("", "note-box", "small");
  private final VBox box = new VBox(2, field, complaint, meaning);
  private String ref = "";
  private String key = "";
  private String element = "";

  ValueEditor(Desk desk, Pane over) {
    this.desk = desk;
    this.bench = desk.bench();
    this.over = over;
    field.getStyleClass().add("value-editor");
    field.setId("value-editor");
    field.setPrefColumnCount(9);
    complaint.setId("value-complaint");
    box.setMaxWidth(260);
    box.setPrefWidth(210);
    box.managedProperty().set(false);
    field.setOnAction(e -> commit());
    field.addEventFilter(KeyEvent.KEY_PRESSED, this::keyed);
    field.focusedProperty().addListener((o, was, is) -> left(is));
  }

  void open(String stage, String edited, String part, PartHandle at) {
    ref = stage;
    key = edited;
    element = part;
    field.setText(SchematicView.written(bench, ref, key));
    field.setAccessibleText(ref + " " + KeyEditor.words(key));
    String words =
        KeyEditor.spec(bench.chassis(), ref, key)
            .map(s -> KeyEditor.words(key) + ": " + s.meaning())
            .orElse(key);
    meaning.setText(desk.say(words));
    complain("");
    if (!over.getChildren().contains(box)) {
      over.getChildren().add(box);
    }
    place(at);
    field.requestFocus();
    field.selectAll();
  }

  private void place(PartHandle at) {
    double width = 210;
    double x = Math.max(4, Math.min(at.getLayoutX(), over.getWidth() - width - 4));
    double y = at.getLayoutY() + Math.min(at.getPrefHeight() / 2, 40);
    double height = box.prefHeight(width);
    y = Math.max(4, Math.min(y, over.getHeight() - height - 4));
    box.resizeRelocate(x, y, width, height);
  }

  /** Stays with its part while the drawing changes. */
  void follow(Map<String, PartHandle> handles) {
    PartHandle at = handles.get(element);
    if (isOpen() && at != null) {
      place(at);
      box.toFront();
    } else if (isOpen()) {
      close();
    }
  }

  boolean isOpen() {
    return over.getChildren().contains(box);
  }

  void close() {
    over.getChildren().remove(box);
  }

  private void complain(String text) {
    complaint.setText(desk.say(text));
    complaint.setVisible(!text.isEmpty());
    complaint.setManaged(!text.isEmpty());
  }

  private void left(boolean focused) {
    if (!focused && isOpen() && complaint.getText().isEmpty() && changed()) {
      commit();
    } else if (!focused && isOpen() && !changed()) {
      close();
    }
  }

  private boolean changed() {
    return !field.getText().strip().equals(SchematicView.written(bench, ref, key));
  }

  private void commit() {
    KeyEditor.Outcome outcome = KeyEditor.parse(bench.chassis(), ref, key, field.getText());
    Optional<String> why =
        outcome instanceof KeyEditor.Outcome.Accepted accepted
            ? bench.edit(accepted.edit())
            : outcome instanceof KeyEditor.Outcome.Refused refused
                ? Optional.of(refused.why())
                : Optional.empty();
    if (why.isPresent()) {
      complain(why.get());
      over.requestLayout();
      box.resize(210, box.prefHeight(210));
      field.selectAll();
    } else {
      finish();
    }
  }

  private void finish() {
    String part = element;
    close();
    over.lookupAll(".part-handle").stream()
        .filter(n -> n.getId().equals("part-" + part))
        .findFirst()
        .ifPresent(javafx.scene.Node::requestFocus);
  }

  private void keyed(KeyEvent event) {
    if (event.getCode() == KeyCode.ESCAPE) {
      finish();
      event.consume();
    } else if (event.getCode() == KeyCode.UP || event.getCode() == KeyCode.DOWN) {
      Optional<Edit> step =
          KeyEditor.step(bench.chassis(), ref, key, event.getCode() == KeyCode.UP);
      step.ifPresent(bench::edit);
      field.setText(SchematicView.written(bench, ref, key));
      field.selectAll();
      event.consume();
    }
  }
}
