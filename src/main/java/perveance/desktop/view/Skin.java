package perveance.desktop.view;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;
import javafx.scene.Parent;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import perveance.desktop.viewmodel.Settings;
import perveance.plot.Look;

/** Colours and faces of the window, by day and by night. */
final class Skin {
  private static final String SHEET = "/perveance/desktop/window.css";
  private static final double USUAL_TEXT = 13;

  private Skin() {}

  /** Loads the one family that sheet and window share. */
  static void loadFonts() {
    for (String face : List.of("Regular", "Bold", "Italic")) {
      String file = "/liberation/LiberationSans-" + face + ".ttf";
      try (InputStream in = Skin.class.getResourceAsStream(file)) {
        if (in != null) {
          Font.loadFont(in, USUAL_TEXT);
        }
      } catch (IOException e) {
        throw new UncheckedIOException("cannot read font " + face, e);
      }
    }
  }

  static void dress(Parent root, Settings settings) {
    if (!root.getStylesheets().contains(SHEET)) {
      root.getStylesheets().add(SHEET);
    }
    root.getStyleClass().removeAll("day", "night");
    root.getStyleClass().add(settings.dark() ? "night" : "day");
    root.setStyle(
        String.format(Locale.ROOT, "-fx-font-size: %.2fpx;", USUAL_TEXT * settings.textSize()));
  }

  static Look look(Settings settings) {
    return settings.dark() ? Look.DARK : Look.LIGHT;
  }

  static Color accent(Settings settings) {
    return settings.dark() ? Color.web("#4cc2cb") : Color.web("#0a6b73");
  }

  static Color ink(Settings settings) {
    return settings.dark() ? Color.web("#e8ecee") : Color.web("#1d2327");
  }

  static Color paper(Settings settings) {
    return settings.dark() ? Color.web("#171b1e") : Color.WHITE;
  }

  static Color shade(Settings settings) {
    return settings.dark() ? Color.web("#c9a24a", 0.14) : Color.web("#b08a2e", 0.13);
  }

  static Color amber(Settings settings) {
    return settings.dark() ? Color.web("#e0b25a") : Color.web("#8a5a00");
  }
}
