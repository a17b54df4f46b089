package perveance.desktop.view;

import java.util.Optional;
import javafx.event.ActionEvent;
import javafx.scene.Node;
import javafx.scene.control.ButtonType;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Dialog;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** Asks for the values of a supply node. */
final class SupplyDialog {
  private static final String STATED = "a stated voltage";

  private final Desk desk;
  private final StageList list;
  private final Optional<Supply> before;
  private final TextField name = new TextField();
  private final ComboBox<String> from = new ComboBox<>();
  private final TextField value = new TextField();
  private final TextField reservoir = new TextField();
  private final TextField bleeder = new TextField();
  private final Label unit = new Label();
  private final Label complaint = Bits.wrapped("", "complaint");

  SupplyDialog(Desk desk, StageList list, Optional<Supply> before) {
    this.desk = desk;
    this.list = list;
    this.before = before;
    from.getItems().add(STATED);
    desk.bench().chassis().supplies().stream()
        .map(Supply::name)
        .filter(n -> before.isEmpty() || !n.equals(before.get().name()))
        .forEach(from.getItems()::add);
    from.valueProperty()
        .addListener(
            (o, was, is) -> unit.setText(STATED.equals(is) ? "Voltage" : "Dropper resistor"));
    from.setValue(STATED);
    fill();
  }

  private void fill() {
    QuantityFormat format = QuantityFormat.PLAIN;
    if (before.isEmpty()) {
      name.setText(list.freeSupplyName());
      value.setText("300 V");
      reservoir.setText("47u");
      bleeder.setText("220k");
      return;
    }
    Supply supply = before.get();
    name.setText(supply.name());
    name.setDisable(true);
    if (supply.feed() instanceof SupplyFeed.Dropped dropped) {
      from.setValue(dropped.from());
      value.setText(format.part(dropped.dropper(), Unit.OHM));
    } else if (supply.feed() instanceof SupplyFeed.Stated stated) {
      value.setText(format.part(stated.voltage(), Unit.VOLT));
    }
    supply.reservoir().ifPresent(c -> reservoir.setText(format.part(c, Unit.FARAD)));
    supply.bleeder().ifPresent(r -> bleeder.setText(format.part(r, Unit.OHM)));
  }

  void ask() {
    GridPane grid = new GridPane();
    grid.setHgap(10);
    grid.setVgap(8);
    grid.addRow(0, new Label("Name"), name);
    grid.addRow(1, new Label("Fed from"), from);
    grid.addRow(2, unit, value);
    grid.addRow(3, new Label("Reservoir capacitor"), reservoir);
    grid.addRow(4, new Label("Bleeder resistor"), bleeder);
    complaint.setVisible(false);
    complaint.setMaxWidth(340);
    Dialog<ButtonType> dialog = new Dialog<>();
    dialog.setTitle(before.isPresent() ? "Supply " + before.get().name() : "New supply node");
    dialog.getDialogPane().setContent(new VBox(10, grid, complaint));
    dialog.getDialogPane().getButtonTypes().addAll(ButtonType.OK, ButtonType.CANCEL);
    Skin.dress(dialog.getDialogPane(), desk.settings().get());
    dialog.getDialogPane().setMinSize(400, 320);
    Node ok = dialog.getDialogPane().lookupButton(ButtonType.OK);
    ok.addEventFilter(ActionEvent.ACTION, this::check);
    dialog.setOnShown(e -> value.requestFocus());
    dialog.showAndWait();
  }

  private void check(ActionEvent event) {
    Optional<String> feed =
        STATED.equals(from.getValue()) ? Optional.empty() : Optional.of(from.getValue());
    Optional<String> why =
        list.setSupply(
            name.getText().strip(), feed, value.getText(), reservoir.getText(), bleeder.getText());
    if (why.isPresent()) {
      complaint.setText(why.get());
      complaint.setVisible(true);
      event.consume();
    }
  }
}
