package perveance.desktop.view;

import java.util.List;
import java.util.Locale;
import java.util.function.Supplier;
import javafx.geometry.Bounds;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Popup;
import perveance.app.wording.Vocabulary;
import perveance.desktop.viewmodel.Settings;

/** Finds a part, a valve or an action by its words. */
final class SearchField extends TextField {
  private static final int MOST = 12;

  private final Supplier<List<Action>> source;
  private final Supplier<Settings> settings;
  private final ListView<Action> hits = new ListView<>();
  private final Popup popup = new Popup();

  SearchField(Supplier<List<Action>> source, Supplier<Settings> settings) {
    this.source = source;
    this.settings = settings;
    getStyleClass().add("search");
    setId("search");
    setPromptText("Find a part, a valve or an action   Ctrl K");
    setAccessibleText("Find a part, a valve or an action");
    setPrefColumnCount(24);
    setMinWidth(140);
    hits.setCellFactory(list -> new Cell());
    hits.setPrefWidth(380);
    // the keys stay with the field in which they are typed
    hits.setFocusTraversable(false);
    hits.setOnMouseClicked(e -> take());
    popup.getContent().add(hits);
    popup.setAutoHide(true);
    textProperty().addListener((o, was, is) -> search(is));
    addEventFilter(KeyEvent.KEY_PRESSED, this::keyed);
    focusedProperty()
        .addListener(
            (o, was, is) -> {
              if (!is) {
                popup.hide();
              }
            });
  }

  private static final class Cell extends ListCell<Action> {
    @Override
    protected void updateItem(Action item, boolean empty) {
      super.updateItem(item, empty);
      setText(
          empty || item == null
              ? null
              : item.words() + (item.keysInWords().isEmpty() ? "" : "   " + item.keysInWords()));
    }
  }

  private void search(String text) {
    hits.getItems().setAll(find(text));
    if (hits.getItems().isEmpty() || text.isBlank() || getScene() == null) {
      popup.hide();
      return;
    }
    hits.setPrefHeight(Math.min(MOST, hits.getItems().size()) * 30 + 6);
    hits.getSelectionModel().select(0);
    Skin.dress(hits, settings.get());
    Bounds at = localToScreen(getBoundsInLocal());
    if (at != null && !popup.isShowing()) {
      popup.show(this, at.getMinX(), at.getMaxY() + 2);
    }
  }

  /** Actions whose words, in either vocabulary, hold every word of the text, best first. */
  List<Action> find(String text) {
    String[] words = text.toLowerCase(Locale.ROOT).strip().split("\\s+");
    return source.get().stream()
        .filter(Action::isPossible)
        .filter(a -> holds(a, List.of(words)))
        .sorted(
            java.util.Comparator.comparing(
                a -> !a.words().toLowerCase(Locale.ROOT).startsWith(words[0])))
        .limit(MOST)
        .toList();
  }

  private static boolean holds(Action action, List<String> words) {
    String said = action.words().toLowerCase(Locale.ROOT);
    String both = said + " " + Vocabulary.AMERICAN.say(said);
    return words.stream()
        .allMatch(w -> both.contains(w) || both.contains(Vocabulary.AMERICAN.say(w)));
  }

  private void keyed(KeyEvent event) {
    if (event.isShortcutDown() || event.isAltDown()) {
      return;
    }
    int at = hits.getSelectionModel().getSelectedIndex();
    if (event.getCode() == KeyCode.DOWN) {
      hits.getSelectionModel().select(Math.min(hits.getItems().size() - 1, at + 1));
    } else if (event.getCode() == KeyCode.UP) {
      hits.getSelectionModel().select(Math.max(0, at - 1));
    } else if (event.getCode() == KeyCode.ENTER) {
      take();
    } else if (event.getCode() == KeyCode.ESCAPE) {
      clear();
    } else {
      return;
    }
    event.consume();
  }

  private void take() {
    Action action = hits.getSelectionModel().getSelectedItem();
    popup.hide();
    if (action != null) {
      clear();
      action.run().run();
    }
  }
}
