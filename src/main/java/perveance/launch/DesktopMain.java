package perveance.launch;

import java.util.List;
import perveance.desktop.DesktopApplication;

/** Starts the window directly: what the installed program's menu entry runs. */
public final class DesktopMain {
  private DesktopMain() {}

  /**
   * Opens the window.
   *
   * @param args at most one chassis file
   */
  public static void main(String[] args) {
    DesktopApplication.open(List.of(args));
  }
}
