package perveance.files.toml;

/**
 * A key and its value.
 *
 * @param key the key, quotes removed
 * @param keySpan where the key stands, all its dotted parts included
 * @param value the value
 */
public record TomlEntry(String key, Span keySpan, TomlValue value) {
  /**
   * The line on which the key stands.
   *
   * @return line, counted from 1
   */
  public int line() {
    return keySpan.line();
  }
}
