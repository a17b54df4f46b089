package perveance.launch;

import java.nio.file.Path;
import java.util.Optional;
import perveance.cli.CommandLines;

/** Starts Perveance. */
public final class Main {
  private Main() {}

  private static void desktop(Optional<Path> file) {
    throw new UnsupportedOperationException("the desktop is not part of this build");
  }

  /**
   * Runs one command and ends with its exit code.
   *
   * @param args the command line
   */
  public static void main(String[] args) {
    System.exit(CommandLines.run(Main::desktop, args));
  }
}
