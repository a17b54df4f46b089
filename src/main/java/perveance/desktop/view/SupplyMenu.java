package perveance.desktop.view;

import javafx.scene.control.ContextMenu;
import javafx.scene.control.MenuItem;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;

/** What can be done with a supply node of the list. */
final class SupplyMenu extends ContextMenu {
  SupplyMenu(Desk desk, StageList list, String name, Runnable edit) {
    add("Change\u2026", edit);
    add(
        "Rename\u2026",
        () ->
            desk.asking()
                .word("New name of supply " + name, name)
                .ifPresent(n -> list.renameSupply(name, n)));
    add("Remove", () -> list.removeSupply(name));
  }

  private void add(String text, Runnable action) {
    MenuItem item = new MenuItem(text);
    item.setOnAction(e -> action.run());
    getItems().add(item);
  }
}
