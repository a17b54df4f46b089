package perveance.engine.device;

/** What follows a rectifier: its limits depend on it. */
public enum RectifierFilter {
  /** A reservoir capacitor: short, high current peaks. */
  CAPACITOR("capacitor"),
  /** A choke first: current flows all the time. */
  CHOKE("choke");

  private final String word;

  RectifierFilter(String word) {
    this.word = word;
  }

  /**
   * Name used in files and reports.
   *
   * @return {@code capacitor} or {@code choke}
   */
  public String word() {
    return word;
  }
}
