package perveance.engine.search;

/** What became of a search for a value. */
public sealed interface KeyOutcome {
  /**
   * A value meets the goal.
   *
   * @param value of the key, in its SI unit [1]
   * @param reached the figure there [1]
   * @param evaluations answers that were worked out
   */
  record Found(double value, double reached, int evaluations) implements KeyOutcome {}

  /**
   * No value meets the goal.
   *
   * @param nearest value that came nearest, in the key's SI unit [1]
   * @param reached the figure there [1]
   * @param reason why no further, in a sentence
   */
  record NotFound(double nearest, double reached, String reason) implements KeyOutcome {}
}
