package perveance.desktop.view;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.control.ChoiceDialog;
import javafx.scene.control.Dialog;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextInputDialog;
import javafx.scene.layout.VBox;
import javafx.stage.FileChooser;
import javafx.stage.FileChooser.ExtensionFilter;
import javafx.stage.Window;
import org.jspecify.annotations.Nullable;
import perveance.desktop.viewmodel.Asking;
import perveance.desktop.viewmodel.Settings;

/** Asks with dialogs. */
public final class DialogAsking implements Asking {
  private final Supplier<Settings> settings;
  private @Nullable Window owner;
  private @Nullable File folder;

  /**
   * Dialogs in the looks of the window.
   *
   * @param settings present settings
   */
  public DialogAsking(Supplier<Settings> settings) {
    this.settings = settings;
  }

  /**
   * The window that dialogs stand above.
   *
   * @param window the window
   */
  public void ownedBy(Window window) {
    owner = window;
  }

  @Override
  public Optional<Path> fileToOpen() {
    FileChooser chooser = chooser("Open a chassis", "toml");
    return remember(chooser.showOpenDialog(owner));
  }

  @Override
  public Optional<Path> fileToWrite(String what, String proposed, String ending) {
    FileChooser chooser = chooser(what, ending);
    chooser.setInitialFileName(proposed + "." + ending);
    return remember(chooser.showSaveDialog(owner));
  }

  private FileChooser chooser(String title, String ending) {
    FileChooser chooser = new FileChooser();
    chooser.setTitle(title);
    chooser
        .getExtensionFilters()
        .addAll(
            new ExtensionFilter(ending.equals("toml") ? "Chassis files" : ending, "*." + ending),
            new ExtensionFilter("All files", "*.*"));
    if (folder != null && folder.isDirectory()) {
      chooser.setInitialDirectory(folder);
    }
    return chooser;
  }

  private Optional<Path> remember(@Nullable File file) {
    if (file == null) {
      return Optional.empty();
    }
    folder = file.getParentFile();
    return Optional.of(file.toPath());
  }

  @Override
  public Unsaved unsaved(String title) {
    ButtonType save = new ButtonType("Save", ButtonBar.ButtonData.YES);
    ButtonType discard = new ButtonType("Do not save", ButtonBar.ButtonData.NO);
    ButtonType stay = new ButtonType("Stay here", ButtonBar.ButtonData.CANCEL_CLOSE);
    Alert alert = new Alert(Alert.AlertType.NONE, "", save, discard, stay);
    alert.setHeaderText("\u201c" + title + "\u201d has changes that are not saved.");
    alert.setContentText("Without saving, they are lost.");
    dress(alert);
    ButtonType answer = alert.showAndWait().orElse(stay);
    return answer == save ? Unsaved.SAVE : answer == discard ? Unsaved.DISCARD : Unsaved.STAY;
  }

  @Override
  public Optional<Integer> choose(String question, List<String> choices) {
    ChoiceDialog<String> dialog = new ChoiceDialog<>(choices.get(0), choices);
    dialog.setHeaderText(question);
    dialog.setGraphic(null);
    dress(dialog);
    return dialog.showAndWait().map(choices::indexOf);
  }

  @Override
  public Optional<String> word(String question, String proposed) {
    TextInputDialog dialog = new TextInputDialog(proposed);
    dialog.setHeaderText(question);
    dialog.setGraphic(null);
    dress(dialog);
    return dialog.showAndWait().map(String::strip).filter(w -> !w.isEmpty());
  }

  @Override
  public void tell(String what, String why, String remedy) {
    Alert alert = new Alert(Alert.AlertType.NONE, "", ButtonType.OK);
    alert.setHeaderText(what);
    TextArea reasons = new TextArea(why);
    reasons.setEditable(false);
    reasons.setWrapText(true);
    reasons.setPrefRowCount((int) Math.min(12, 2 + why.length() / 70 + why.lines().count()));
    reasons.setPrefColumnCount(46);
    alert.getDialogPane().setContent(new VBox(10, reasons, Bits.wrapped(remedy, "strong")));
    dress(alert);
    alert.showAndWait();
  }

  private void dress(Dialog<?> dialog) {
    if (owner != null) {
      dialog.initOwner(owner);
    }
    dialog.setTitle("Perveance");
    Skin.dress(dialog.getDialogPane(), settings.get());
    dialog.getDialogPane().setMinHeight(VBox.USE_PREF_SIZE);
    dialog.setResizable(true);
  }
}
