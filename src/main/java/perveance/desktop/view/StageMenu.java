package perveance.desktop.view;

import javafx.scene.control.ContextMenu;
import javafx.scene.control.MenuItem;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;

/** What can be done with a stage of the list. */
final class StageMenu extends ContextMenu {
  StageMenu(Desk desk, StageList list, String ref) {
    add(
        "Rename\u2026",
        () -> desk.asking().word("New name of " + ref, ref).ifPresent(n -> list.rename(ref, n)));
    add("Duplicate", () -> list.duplicate(ref));
    add("Move up", () -> list.move(ref, -1));
    add("Move down", () -> list.move(ref, 1));
    add("Remove", () -> list.remove(ref));
  }

  private void add(String text, Runnable action) {
    MenuItem item = new MenuItem(text);
    item.setOnAction(e -> action.run());
    getItems().add(item);
  }
}
