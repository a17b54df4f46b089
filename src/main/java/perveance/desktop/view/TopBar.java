package perveance.desktop.view;

import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import perveance.app.History;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Workbench;

/** Title, undo and redo, the search, and the sheet. */
final class TopBar extends HBox {
  private final Workbench bench;
  private final Label title = Bits.label("", "title");
  private final Label edited = Bits.label("", "soft");
  private final Button undo;
  private final Button redo;
  private final Tooltip hint = new Tooltip();
  private final Tooltip undoHint = new Tooltip();
  private final Tooltip redoHint = new Tooltip();
  private final SearchField search;

  TopBar(Desk desk, FileActions files, SearchField search) {
    this.bench = desk.bench();
    this.search = search;
    getStyleClass().add("top-bar");
    undo = Bits.button("Undo", bench::undo, "plain-button");
    redo = Bits.button("Redo", bench::redo, "plain-button");
    undo.setTooltip(undoHint);
    redo.setTooltip(redoHint);
    undo.setId("undo");
    redo.setId("redo");
    Button sheet = Bits.button("Print the sheet", files::sheet, "main-button");
    sheet.setId("print-sheet");
    sheet.setMinWidth(USE_PREF_SIZE);
    title.maxWidthProperty().bind(widthProperty().multiply(0.3));
    title.setTooltip(hint);
    edited.setId("edited");
    edited.setMinWidth(USE_PREF_SIZE);
    undo.setMinWidth(USE_PREF_SIZE);
    redo.setMinWidth(USE_PREF_SIZE);
    getChildren().addAll(title, edited, undo, redo, Bits.gap(), search, Bits.gap(), sheet);
    bench.history().addListener((o, was, is) -> refresh());
    bench.modified().addListener((o, was, is) -> refresh());
    refresh();
  }

  /** Puts a menu between the redo button and the search. */
  void menu(String name, List<List<Action>> groups) {
    MenuButton menu = new MenuButton(name);
    menu.getStyleClass().setAll("plain-button", "menu-button");
    menu.setMinWidth(USE_PREF_SIZE);
    menu.setId("menu-" + name.toLowerCase(java.util.Locale.ROOT));
    for (List<Action> group : groups) {
      if (!menu.getItems().isEmpty()) {
        menu.getItems().add(new SeparatorMenuItem());
      }
      for (Action action : group) {
        MenuItem item = new MenuItem(action.words());
        item.setMnemonicParsing(false);
        item.setAccelerator(action.keys());
        item.setOnAction(e -> action.run().run());
        menu.getItems().add(item);
      }
    }
    getChildren().add(getChildren().indexOf(redo) + 1 + menus(), menu);
  }

  private int menus() {
    return (int) getChildren().stream().filter(MenuButton.class::isInstance).count();
  }

  SearchField search() {
    return search;
  }

  final void refresh() {
    History history = bench.history().get();
    title.setText(history.now().title().isBlank() ? "Untitled" : history.now().title());
    hint.setText(title.getText());
    edited.setText(history.now().equals(bench.savedChassis()) ? "" : "edited");
    undo.setDisable(history.past().isEmpty());
    redo.setDisable(history.future().isEmpty());
    undoHint.setText(history.undoLabel().map(l -> "Undo: " + l).orElse("Nothing to undo"));
    redoHint.setText(history.redoLabel().map(l -> "Redo: " + l).orElse("Nothing to redo"));
    undo.setAccessibleText("Undo " + history.undoLabel().orElse(""));
    redo.setAccessibleText("Redo " + history.redoLabel().orElse(""));
  }
}
