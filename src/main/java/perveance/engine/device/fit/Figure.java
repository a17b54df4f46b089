package perveance.engine.device.fit;

/** What a piece of evidence states a figure of. */
public enum Figure {
  /** Anode current; of a pentode tied as a triode, anode and screen together [A]. */
  CURRENT("anode current"),
  /** Screen current [A]. */
  SCREEN_CURRENT("screen current"),
  /** Amplification factor; of a pentode, of grid over screen [1]. */
  AMPLIFICATION("mu"),
  /** Anode resistance [ohm]. */
  ANODE_RESISTANCE("ra"),
  /** Mutual conductance [S]. */
  MUTUAL_CONDUCTANCE("gm"),
  /** Grid voltage at which the stated small current flows [V]. */
  CUT_OFF("cut-off");

  private final String word;

  Figure(String word) {
    this.word = word;
  }

  /**
   * Name used in reports.
   *
   * @return for example {@code anode current}
   */
  public String word() {
    return word;
  }
}
