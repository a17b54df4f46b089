package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import javafx.event.ActionEvent;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.ConditionsForm;
import perveance.desktop.viewmodel.Desk;

/** Asks what the figures assume. */
final class ConditionsDialog {
  private final Desk desk;
  private final ConditionsForm form;
  private final Label complaint = Bits.wrapped("", "complaint");

  ConditionsDialog(Desk desk) {
    this.desk = desk;
    this.form = new ConditionsForm(desk.bench());
  }

  void ask() {
    GridPane grid = new GridPane();
    grid.setHgap(10);
    grid.setVgap(8);
    List<TextField> fields = new java.util.ArrayList<>();
    for (ConditionsForm.Row row : form.rows()) {
      TextField field = new TextField(row.text());
      fields.add(field);
      field.setAccessibleText(row.words());
      grid.addRow(grid.getRowCount(), new Label(row.words()), field);
    }
    complaint.setVisible(false);
    complaint.setMaxWidth(360);
    Dialog<ButtonType> dialog = new Dialog<>();
    dialog.setTitle("Conditions of this chassis");
    dialog.getDialogPane().setContent(new VBox(10, grid, complaint));
    dialog.getDialogPane().getButtonTypes().addAll(ButtonType.OK, ButtonType.CANCEL);
    Skin.dress(dialog.getDialogPane(), desk.settings().get());
    dialog
        .getDialogPane()
        .lookupButton(ButtonType.OK)
        .addEventFilter(
            ActionEvent.ACTION,
            e -> {
              Optional<String> why = form.take(fields.stream().map(TextField::getText).toList());
              complaint.setText(why.orElse(""));
              complaint.setVisible(why.isPresent());
              if (why.isPresent()) {
                e.consume();
              }
            });
    dialog.showAndWait();
  }
}
