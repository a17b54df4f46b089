package perveance.desktop;

import java.nio.file.Path;
import java.util.Optional;

/** Where settings, recovery files and the person's own devices are kept. */
final class Home {
  private Home() {}

  /** The folder that the desktop's convention names; a property moves it for tests. */
  static Path folder() {
    String moved = System.getProperty("perveance.home", "");
    if (!moved.isEmpty()) {
      return Path.of(moved);
    }
    return Optional.ofNullable(System.getenv("XDG_CONFIG_HOME"))
        .filter(s -> !s.isBlank())
        .map(Path::of)
        .orElse(Path.of(System.getProperty("user.home"), ".config"))
        .resolve("perveance");
  }
}
