package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import javafx.event.ActionEvent;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.DeviceSwap;
import perveance.engine.device.Device;
import perveance.plot.ChartFactory;
import perveance.plot.DevicePlots;
import perveance.plot.PlotFonts;

/** Another valve: searched by any of its names, looked at, and taken. */
final class DevicePicker {
  private static final ButtonType TAKE = new ButtonType("Take it", ButtonBar.ButtonData.OK_DONE);

  private final Desk desk;
  private final PlotFonts fonts;
  private final DeviceSwap swap;
  private final TextField search = new TextField();
  private final ListView<Device> hits = new ListView<>();
  private final ArtworkNode curves = new ArtworkNode();
  private final Label name = Bits.label("", "title");
  private final VBox facts = new VBox(3);
  private final VBox effect = new VBox(6);
  private final Dialog<ButtonType> dialog = new Dialog<>();

  DevicePicker(Desk desk, PlotFonts fonts, String searched) {
    this.desk = desk;
    this.fonts = fonts;
    swap = new DeviceSwap(desk.bench(), desk.bench().chosenStage().get(), "device", this::show);
    search.setText(searched);
    search.setPromptText(desk.say("Type or alias of a valve"));
    search.setId("device-search");
    search.setAccessibleText(desk.say("Find a valve by type or another name of it"));
    hits.setId("device-hits");
    hits.setAccessibleText(desk.say("Valves found"));
    hits.setCellFactory(list -> new Cell());
    hits.getSelectionModel().selectedItemProperty().addListener((o, was, is) -> look(is));
    search.textProperty().addListener((o, was, is) -> find(is));
    search.setOnKeyPressed(
        e -> {
          if (e.getCode() == KeyCode.DOWN || e.getCode() == KeyCode.UP) {
            hits.getSelectionModel()
                .select(
                    Math.max(
                        0,
                        hits.getSelectionModel().getSelectedIndex()
                            + (e.getCode() == KeyCode.DOWN ? 1 : -1)));
            e.consume();
          }
        });
    find(searched);
  }

  private static final class Cell extends ListCell<Device> {
    @Override
    protected void updateItem(@Nullable Device device, boolean empty) {
      super.updateItem(device, empty);
      setText(
          empty || device == null
              ? null
              : device.type()
                  + (device.aliases().isEmpty()
                      ? ""
                      : "   " + String.join(", ", device.aliases())));
    }
  }

  void ask() {
    dialog.setTitle(desk.say("Choose a valve for ") + desk.bench().chosenStage().get());
    dialog.getDialogPane().setContent(content());
    dialog.getDialogPane().getButtonTypes().addAll(TAKE, ButtonType.CANCEL);
    Skin.dress(dialog.getDialogPane(), desk.settings().get());
    dialog.getDialogPane().lookupButton(TAKE).addEventFilter(ActionEvent.ACTION, this::take);
    dialog.setResizable(true);
    dialog.setOnShown(e -> search.requestFocus());
    dialog.showAndWait();
  }

  HBox content() {
    VBox left = new VBox(8, search, Bits.growing(hits));
    left.setPrefWidth(260);
    left.setMinWidth(220);
    curves.setPrefSize(380, 300);
    curves.setMinSize(320, 220);
    VBox middle = new VBox(8, name, Bits.growing(curves), facts);
    middle.setPrefWidth(400);
    ScrollPane right = new ScrollPane(effect);
    right.setFitToWidth(true);
    right.setPrefWidth(310);
    HBox all = new HBox(16, left, Bits.growing(middle), right);
    all.setPrefSize(1010, 560);
    return all;
  }

  private void find(String text) {
    List<Device> found = swap.find(text);
    hits.getItems().setAll(found);
    hits.getSelectionModel().select(0);
  }

  private void look(@Nullable Device device) {
    if (device == null) {
      return;
    }
    name.setText(device.type());
    double size = 10.5 * desk.settings().get().textSize();
    curves.show(
        new ChartFactory(Skin.look(desk.settings().get()), fonts, size)
            .artwork(DevicePlots.characteristics(device)));
    facts
        .getChildren()
        .setAll(
            DeviceFacts.lines(device).stream()
                .map(l -> Bits.wrapped(desk.say(l), "small"))
                .toList());
    effect.getChildren().setAll(Bits.wrapped("Working out what it does\u2026", "soft"));
    swap.show(device.type());
  }

  private void show(DeviceSwap.Effect shown) {
    effect.getChildren().setAll(Bits.label(desk.say("In this stage"), "strong"));
    if (shown.refusal().isPresent()) {
      effect.getChildren().add(Bits.wrapped(desk.say(shown.refusal().get()), "complaint"));
      return;
    }
    for (String warning : shown.warnings()) {
      effect.getChildren().add(Bits.wrapped("\u25b2 " + desk.say(warning), "complaint"));
    }
    GridPane grid = new GridPane();
    grid.setHgap(8);
    grid.setVgap(4);
    for (double percent : new double[] {40, 30, 30}) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(percent);
      grid.getColumnConstraints().add(column);
    }
    grid.addRow(
        0,
        Bits.label(""),
        Bits.label("now", "soft", "small"),
        Bits.label(shown.type(), "soft", "small"));
    for (DeviceSwap.Compared row : shown.rows()) {
      grid.addRow(
          grid.getRowCount(),
          Bits.wrapped(desk.say(row.figure()), "small"),
          Bits.wrapped(row.now(), "small"),
          Bits.wrapped(row.then(), "small", "strong"));
    }
    effect.getChildren().add(grid);
  }

  private void take(ActionEvent event) {
    Device device = hits.getSelectionModel().getSelectedItem();
    Optional<String> refused =
        device == null ? Optional.of("No valve is chosen.") : swap.take(device.type());
    if (refused.isPresent()) {
      effect.getChildren().add(0, Bits.wrapped(desk.say(refused.get()), "complaint"));
      event.consume();
    }
  }
}
