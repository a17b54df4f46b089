package perveance.desktop.view;

import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.layout.StackPane;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
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
   * Where the operating point is drawn.
   *
   * @param window the window
   * @return in the coordinates of {@link #hand}
   */
  public static Point2D operatingPoint(MainWindow window) {
    LoadLineLayer.Grip grip =
        window.plots().characteristics().lines().grips().stream()
            .filter(g -> g.handle() == LoadLineLayer.Handle.POINT)
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
}
