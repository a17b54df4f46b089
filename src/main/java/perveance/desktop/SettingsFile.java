package perveance.desktop;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Properties;
import perveance.app.wording.Vocabulary;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.base.BadInputException;
import perveance.files.WholeFile;

/** Keeps the settings between runs. */
final class SettingsFile {
  private final Path file;

  SettingsFile(Path home) {
    this.file = home.resolve("settings.properties");
  }

  Settings load() {
    Properties p = new Properties();
    try {
      if (Files.exists(file)) {
        try (Reader in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
          p.load(in);
        }
      }
    } catch (IOException | IllegalArgumentException e) {
      return Settings.USUAL;
    }
    Settings usual = Settings.USUAL;
    return new Settings(
        flag(p, "dark", usual.dark()),
        number(p, "text-size", usual.textSize()),
        "american".equals(p.getProperty("words")) ? Vocabulary.AMERICAN : Vocabulary.BRITISH,
        flag(p, "letter", usual.letter()),
        flag(p, "zigzag", usual.zigzag()),
        number(p, "mains-frequency", usual.mainsFrequency()),
        number(p, "meter", usual.meter()));
  }

  private static boolean flag(Properties p, String key, boolean usual) {
    return Boolean.parseBoolean(p.getProperty(key, Boolean.toString(usual)));
  }

  private static double number(Properties p, String key, double usual) {
    try {
      double value = Double.parseDouble(p.getProperty(key, Double.toString(usual)));
      return value > 0 && Double.isFinite(value) ? value : usual;
    } catch (NumberFormatException e) {
      return usual;
    }
  }

  /** Saves; settings that cannot be kept hold until the window closes. */
  boolean save(Settings s) {
    String text =
        String.format(
            Locale.ROOT,
            "dark = %s%ntext-size = %s%nwords = %s%nletter = %s%nzigzag = %s%n"
                + "mains-frequency = %s%nmeter = %s%n",
            s.dark(),
            s.textSize(),
            s.vocabulary() == Vocabulary.AMERICAN ? "american" : "british",
            s.letter(),
            s.zigzag(),
            s.mainsFrequency(),
            s.meter());
    try {
      Files.createDirectories(file.toAbsolutePath().getParent());
      WholeFile.save(file, text, false);
      return true;
    } catch (IOException | BadInputException e) {
      return false;
    }
  }
}
