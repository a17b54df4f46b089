package perveance.desktop.view;

import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.shape.Polygon;
import perveance.app.wording.SafetyBox;
import perveance.desktop.viewmodel.Desk;
import perveance.engine.analysis.ChassisAnswer;

/** What can kill, and what to do first. It stands as long as the window does. */
final class CautionBand extends HBox {
  private final Desk desk;
  private final Label words = Bits.label("");

  CautionBand(Desk desk) {
    this.desk = desk;
    getStyleClass().add("caution-band");
    Polygon sign = new Polygon(9, 0, 18, 16, 0, 16);
    sign.getStyleClass().add("caution-sign");
    Label mark = Bits.label("!");
    mark.setStyle("-fx-padding: 4 0 0 0; -fx-font-size: 10px;");
    StackPane shape = new StackPane(sign, mark);
    shape.setMinWidth(20);
    words.setWrapText(true);
    words.setMinHeight(USE_PREF_SIZE);
    words.setMaxWidth(Double.MAX_VALUE);
    HBox.setHgrow(words, Priority.ALWAYS);
    Button more = Bits.button("All steps", this::steps, "link");
    more.setId("caution-steps");
    more.setMinWidth(USE_PREF_SIZE);
    getChildren().addAll(shape, words, more);
    words.setId("caution");
    words.setText("Treat every chassis as charged until measured.");
  }

  void refresh() {
    ChassisAnswer answer = desk.bench().answer().get();
    if (answer != null) {
      words.setText(desk.say(SafetyBox.of(answer).oneLine()));
    }
  }

  private void steps() {
    ChassisAnswer answer = desk.bench().answer().get();
    if (answer != null) {
      SafetyBox box = SafetyBox.of(answer);
      desk.asking()
          .tell(
              desk.say(box.signal() + ": " + box.headline() + " " + box.consequence()),
              desk.say(String.join("\n", box.steps())),
              desk.say(box.footer()));
    }
  }
}
