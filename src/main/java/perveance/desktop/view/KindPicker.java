package perveance.desktop.view;

import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.TilePane;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.desktop.viewmodel.StageStarter;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.plot.Artwork;
import perveance.plot.PlotFonts;
import perveance.plot.SchematicPainter;
import perveance.plot.SchematicText;

/** A new stage, its kind chosen by its picture. */
final class KindPicker {
  /** Smallest type that is aimed at on a card, in pixels. */
  private static final double READABLE = 8;

  private final Desk desk;
  private final StageList list;
  private final PlotFonts fonts;
  private final Dialog<ButtonType> dialog = new Dialog<>();

  KindPicker(Desk desk, StageList list, PlotFonts fonts) {
    this.desk = desk;
    this.list = list;
    this.fonts = fonts;
  }

  void ask() {
    dialog.setTitle("Add a stage");
    dialog.getDialogPane().setContent(content());
    dialog.getDialogPane().getButtonTypes().add(ButtonType.CANCEL);
    Skin.dress(dialog.getDialogPane(), desk.settings().get());
    dialog.setResizable(true);
    dialog.showAndWait();
  }

  ScrollPane content() {
    TilePane tiles = new TilePane(10, 10);
    tiles.setPrefColumns(4);
    StageStarter starter = new StageStarter(desk.bench().engine());
    for (StageKind kind : StageKinds.all()) {
      starter
          .start(desk.bench().chassis(), "V0", kind, Optional.empty())
          .ifPresent(entry -> tiles.getChildren().add(card(starter, kind, entry)));
    }
    ScrollPane scroll = new ScrollPane(tiles);
    scroll.setFitToWidth(true);
    scroll.setPrefViewportHeight(500);
    scroll.setPrefViewportWidth(910);
    return scroll;
  }

  private Button card(StageStarter starter, StageKind kind, StageEntry entry) {
    ArtworkNode picture = new ArtworkNode();
    picture.setMinSize(196, 170);
    picture.setPrefSize(196, 170);
    picture.setMouseTransparent(true);
    SchematicText bare =
        new SchematicText(Map.of(), Map.of(), Map.of(), Set.of(), desk.settings().get().zigzag());
    picture.show(
        Artwork.of(
            new SchematicPainter(Skin.look(desk.settings().get()), fonts),
            kind.draw(starter.values(entry, kind)),
            bare,
            12,
            READABLE));
    Button card = Bits.button(desk.say(kind.title()), () -> take(kind), "kind-card");
    card.setGraphic(new VBox(picture));
    card.setId("kind-" + kind.name());
    return card;
  }

  private void take(StageKind kind) {
    Optional<String> refused = list.add(kind, Optional.empty());
    dialog.setResult(ButtonType.OK);
    dialog.close();
    refused.ifPresent(
        why ->
            desk.asking()
                .tell(
                    "The stage was not added.",
                    why,
                    "Add a supply node first, or write the stage into the file."));
  }
}
