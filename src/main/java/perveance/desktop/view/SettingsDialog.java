package perveance.desktop.view;

import javafx.scene.control.ButtonType;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Control;
import javafx.scene.control.Dialog;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import perveance.app.wording.Vocabulary;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;

/** What a person sets for all documents. */
final class SettingsDialog {
  private final Desk desk;

  SettingsDialog(Desk desk) {
    this.desk = desk;
  }

  void ask() {
    Settings before = desk.settings().get();
    ComboBox<String> look = choice(before.dark(), "Light", "Dark");
    ComboBox<String> words =
        choice(
            before.vocabulary() == Vocabulary.AMERICAN,
            "British: anode, valve, HT",
            "American: plate, tube, B+");
    ComboBox<String> paper = choice(before.letter(), "A4", "Letter");
    ComboBox<String> symbol = choice(before.zigzag(), "Boxes", "Zigzags");
    ComboBox<String> mains = choice(before.mainsFrequency() > 55, "50 Hz", "60 Hz");
    TextField meter = new TextField(QuantityFormat.PLAIN.part(before.meter(), Unit.OHM));
    Slider text = new Slider(Settings.SMALLEST, Settings.LARGEST, before.textSize());
    text.setShowTickMarks(true);
    GridPane grid = form(look, text, words, paper, symbol, mains, meter);
    Dialog<ButtonType> dialog = new Dialog<>();
    dialog.setTitle("Settings");
    dialog.getDialogPane().setContent(grid);
    dialog.getDialogPane().getButtonTypes().addAll(ButtonType.OK, ButtonType.CANCEL);
    Skin.dress(dialog.getDialogPane(), before);
    if (dialog.showAndWait().filter(b -> b == ButtonType.OK).isPresent()) {
      desk.settings()
          .set(
              new Settings(
                  second(look),
                  text.getValue(),
                  second(words) ? Vocabulary.AMERICAN : Vocabulary.BRITISH,
                  second(paper),
                  second(symbol),
                  second(mains) ? 60 : 50,
                  meter(meter.getText(), before.meter())));
    }
  }

  private static GridPane form(Control... controls) {
    String[] names = {
      "Look", "Text size", "Words", "Paper", "Resistors", "Mains, new chassis", "Meter, new chassis"
    };
    GridPane grid = new GridPane();
    grid.setHgap(12);
    grid.setVgap(9);
    for (int i = 0; i < controls.length; i++) {
      Label name = new Label(names[i]);
      name.setLabelFor(controls[i]);
      controls[i].setAccessibleText(names[i]);
      grid.addRow(i, name, controls[i]);
    }
    return grid;
  }

  private double meter(String text, double before) {
    try {
      double value = QuantityParser.parse(text, Unit.OHM).value();
      return value > 0 ? value : before;
    } catch (QuantityException e) {
      desk.bench().say("Meter: found " + e.found() + ", expected " + e.expected() + ".");
      return before;
    }
  }

  private static ComboBox<String> choice(boolean second, String... texts) {
    ComboBox<String> box = new ComboBox<>();
    box.getItems().addAll(texts);
    box.getSelectionModel().select(second ? 1 : 0);
    return box;
  }

  private static boolean second(ComboBox<String> box) {
    return box.getSelectionModel().getSelectedIndex() == 1;
  }
}
