package perveance.desktop.view;

import java.io.File;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Labeled;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.StackPane;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.plot.PlotDescription;
import perveance.plot.PlotFonts;

/** What a test needs to reach inside a window. */
public final class WindowProbe {
  private WindowProbe() {}

  /**
   * Does what a menu entry does.
   *
   * @param window the window
   * @param words words of the entry
   */
  public static void run(MainWindow window, String words) {
    window.commands().all().stream()
        .filter(a -> a.words().equals(words))
        .findFirst()
        .orElseThrow()
        .run()
        .run();
  }

  /**
   * Lets files fall on the window.
   *
   * @param window the window
   * @param files what is let fall
   */
  public static void drop(MainWindow window, List<File> files) {
    window.take(files);
  }

  /**
   * Where something that can be dragged is drawn.
   *
   * @param window the window
   * @param handle POINT, DC_END, AC_END, SWING_UP or SWING_DOWN
   * @return in the coordinates of {@link #hand}
   */
  public static Point2D grip(MainWindow window, String handle) {
    LoadLineLayer.Grip grip =
        window.plots().characteristics().lines().grips().stream()
            .filter(g -> g.handle() == LoadLineLayer.Handle.valueOf(handle))
            .findFirst()
            .orElseThrow();
    return new Point2D(grip.x(), grip.y());
  }

  /**
   * What a picker shows, without its dialog.
   *
   * @param desk what it works with
   * @param which kind or device
   * @return its content, dressed
   */
  public static Parent picker(Desk desk, String which) {
    PlotFonts fonts = new PlotFonts();
    Parent content =
        which.equals("kind")
            ? new KindPicker(desk, new StageList(desk.bench()), fonts).content()
            : new DevicePicker(desk, fonts, "el84").content();
    StackPane root = new StackPane(content);
    root.getStyleClass().add("dialog-pane");
    Skin.dress(root, desk.settings().get());
    return root;
  }

  /**
   * The layer that takes the mouse.
   *
   * @param window the window
   * @return node
   */
  public static Node hand(MainWindow window) {
    return window.plots().characteristics().lines();
  }

  /**
   * The chart that is shown.
   *
   * @param window the window
   * @return its description, empty when there is none
   */
  public static Optional<PlotDescription> chart(MainWindow window) {
    return window.plots().description();
  }

  /**
   * All words beneath a node.
   *
   * @param node the node
   * @return texts of its labels
   */
  public static String words(Node node) {
    StringBuilder words = new StringBuilder();
    if (node instanceof Labeled labeled && labeled.getText() != null) {
      words.append(labeled.getText()).append('\n');
    }
    if (node instanceof ScrollPane scroll) {
      words.append(words(scroll.getContent()));
    } else if (node instanceof Parent parent) {
      parent.getChildrenUnmodifiable().forEach(child -> words.append(words(child)));
    }
    return words.toString();
  }
}
