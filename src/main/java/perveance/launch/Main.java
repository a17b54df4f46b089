package perveance.launch;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import perveance.cli.CommandLines;
import perveance.desktop.DesktopApplication;
import perveance.engine.base.BadInputException;

/** Starts Perveance. */
public final class Main {
  private Main() {}

  static void desktop(Optional<Path> file) throws BadInputException {
    DesktopApplication.open(file.map(f -> List.of(f.toString())).orElse(List.of()));
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
