package perveance.desktop.view;

import javafx.beans.value.ObservableValue;
import javafx.scene.input.KeyCombination;
import org.jspecify.annotations.Nullable;

/**
 * Something that a person can do from a menu, by keys or by searching for it.
 *
 * @param words what it is called
 * @param keys key combination, null for none
 * @param possible whether it can be done now, null for always
 * @param run does it
 */
record Action(
    String words,
    @Nullable KeyCombination keys,
    @Nullable ObservableValue<Boolean> possible,
    Runnable run) {
  static Action of(String words, String keys, Runnable run) {
    return new Action(words, keys.isEmpty() ? null : KeyCombination.valueOf(keys), null, run);
  }

  Action when(ObservableValue<Boolean> condition) {
    return new Action(words, keys, condition, run);
  }

  boolean isPossible() {
    return possible == null || Boolean.TRUE.equals(possible.getValue());
  }

  String keysInWords() {
    return keys == null ? "" : keys.getDisplayText();
  }
}
