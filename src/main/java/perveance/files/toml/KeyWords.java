package perveance.files.toml;

import java.util.Map;

/**
 * Words that keys may be written with in either vocabulary of the trade: {@code plate_load} is read
 * as {@code anode_load}. Only keys that hold a value are meant; the names of supplies and other
 * tables are a person's own.
 */
public final class KeyWords {
  /** Every key is what it says. */
  public static final KeyWords AS_WRITTEN = new KeyWords(Map.of());

  /** The words of either vocabulary. */
  public static final KeyWords OF_THE_TRADE =
      new KeyWords(
          Map.of(
              "plate", "anode",
              "tube", "device",
              "tube2", "device2",
              "valve", "device",
              "valve2", "device2",
              "decoupling", "bypass"));

  private final Map<String, String> words;

  private KeyWords(Map<String, String> words) {
    this.words = words;
  }

  /** These words if a text has any of them, so that other texts are not slowed by looking. */
  KeyWords in(String text) {
    for (String word : words.keySet()) {
      if (text.contains(word)) {
        return this;
      }
    }
    return AS_WRITTEN;
  }

  /** The key under its one name. */
  String plain(String key) {
    if (words.isEmpty()) {
      return key;
    }
    String[] parts = key.split("_", -1);
    for (int i = 0; i < parts.length; i++) {
      parts[i] = words.getOrDefault(parts[i], parts[i]);
    }
    return String.join("_", parts);
  }
}
