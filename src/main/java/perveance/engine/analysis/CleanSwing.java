package perveance.engine.analysis;

import java.util.Map;
import java.util.OptionalDouble;

/**
 * Clean swing: how far the input may go each way and what ends it.
 *
 * @param inputPeak largest symmetrical peak input, source behind its resistance [V]
 * @param outputPeak peak output at that input, the smaller side [V]
 * @param limitedBy what ends it first
 * @param limitedAt valve section where that happens, which may be one of a stage wired straight to
 *     this one; empty where nothing ends it
 * @param positivePeak input peak to the end on the positive side [V]
 * @param positiveLimit what ends the positive side
 * @param negativePeak input peak to the end on the negative side [V]
 * @param negativeLimit what ends the negative side
 * @param outputDown output swing at the positive-side end, signed [V]
 * @param outputUp output swing at the negative-side end, signed [V]
 * @param toZeroBias input peak to zero volts grid to cathode, the textbook limit [V]
 * @param headroom against the stated drive, empty when no drive is stated [dB]
 * @param bands bands by component name
 */
public record CleanSwing(
    double inputPeak,
    double outputPeak,
    Limit limitedBy,
    String limitedAt,
    double positivePeak,
    Limit positiveLimit,
    double negativePeak,
    Limit negativeLimit,
    double outputDown,
    double outputUp,
    double toZeroBias,
    OptionalDouble headroom,
    Map<String, Band> bands) {
  /** Copies the map. */
  public CleanSwing {
    bands = Map.copyOf(bands);
  }

  /**
   * The same with other bands.
   *
   * @param newBands bands by component name
   * @return the changed answer
   */
  public CleanSwing withBands(Map<String, Band> newBands) {
    return new CleanSwing(
        inputPeak,
        outputPeak,
        limitedBy,
        limitedAt,
        positivePeak,
        positiveLimit,
        negativePeak,
        negativeLimit,
        outputDown,
        outputUp,
        toZeroBias,
        headroom,
        newBands);
  }

  /** What ends a swing. */
  public enum Limit {
    /** Grid current begins. */
    GRID_CURRENT("grid-current", "grid current"),
    /** The valve cuts off. */
    CUT_OFF("cut-off", "cut-off"),
    /** The anode of a pentode or beam tetrode reaches the knee. */
    KNEE("knee", "the knee"),
    /** The anode of a triode has no voltage left to fall. */
    BOTTOMING("bottoming", "bottoming"),
    /** The anode rises no further: what feeds it has no voltage left. */
    SUPPLY("supply", "the end of its supply"),
    /** Nothing within the range tried. */
    NONE("none", "nothing found");

    private final String word;
    private final String told;

    Limit(String word, String told) {
      this.word = word;
      this.told = told;
    }

    /**
     * What ends the swing, in a sentence behind "by".
     *
     * @return for example {@code the knee}
     */
    public String told() {
      return told;
    }

    /**
     * Word used in files.
     *
     * @return for example {@code grid-current}
     */
    public String word() {
      return word;
    }
  }
}
