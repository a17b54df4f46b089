package perveance.launch;

import java.util.stream.Stream;
import perveance.cli.CommandLines;

/** Starts the window directly: what the installed program's menu entry runs. */
public final class DesktopMain {
  private DesktopMain() {}

  /**
   * Opens the window.
   *
   * @param args at most one chassis file
   */
  public static void main(String[] args) {
    String[] line = Stream.concat(Stream.of("desktop"), Stream.of(args)).toArray(String[]::new);
    System.exit(CommandLines.run(Main::desktop, line));
  }
}
