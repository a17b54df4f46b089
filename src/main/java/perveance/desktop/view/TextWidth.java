package perveance.desktop.view;

import javafx.scene.text.Font;
import javafx.scene.text.Text;

/** How wide a text is drawn on a canvas. */
final class TextWidth {
  private final Text measure = new Text();

  double width(String words, Font font) {
    measure.setFont(font);
    measure.setText(words);
    return measure.getLayoutBounds().getWidth();
  }
}
