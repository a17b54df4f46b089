package perveance.desktop.view;

import javafx.geometry.Point2D;
import javafx.scene.Node;

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
   * The layer that takes the mouse.
   *
   * @param window the window
   * @return node
   */
  public static Node hand(MainWindow window) {
    return window.plots().characteristics().lines();
  }
}
