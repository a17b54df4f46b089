package perveance.desktop.view;

import java.util.regex.Pattern;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Small parts of a window, made alike everywhere. */
final class Bits {
  private static final Pattern BEFORE_UNIT =
      Pattern.compile("(?<=\\d) (?=(%|dB|[GMkm\u00b5np]?(V|A|W|Hz|J|s|F|\u03a9)(?![A-Za-z])))");

  private Bits() {}

  static Label label(String text, String... styles) {
    Label label = new Label(text);
    label.getStyleClass().addAll(styles);
    return label;
  }

  static Label wrapped(String text, String... styles) {
    Label label = label(text, styles);
    label.setWrapText(true);
    label.setMinHeight(Region.USE_PREF_SIZE);
    return label;
  }

  /** A figure stays with its unit where a line is broken. */
  static String kept(String text) {
    return BEFORE_UNIT.matcher(text).replaceAll("\u00a0");
  }

  static Button button(String text, Runnable action, String... styles) {
    Button button = new Button(text);
    button.getStyleClass().setAll(styles);
    button.setOnAction(e -> action.run());
    button.setMnemonicParsing(false);
    return button;
  }

  static Region gap() {
    Region gap = new Region();
    HBox.setHgrow(gap, Priority.ALWAYS);
    return gap;
  }

  static <T extends Region> T growing(T region) {
    VBox.setVgrow(region, Priority.ALWAYS);
    HBox.setHgrow(region, Priority.ALWAYS);
    region.setMaxSize(Double.MAX_VALUE, Double.MAX_VALUE);
    return region;
  }

  static VBox figure(String heading, Label value, Label note) {
    value.getStyleClass().add("figure-value");
    value.setMinWidth(Region.USE_PREF_SIZE);
    note.getStyleClass().add("figure-note");
    Label name = label(heading, "figure-label");
    name.setMinWidth(Region.USE_PREF_SIZE);
    return new VBox(name, value, note);
  }
}
