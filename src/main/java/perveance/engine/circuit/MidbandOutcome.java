package perveance.engine.circuit;

/** What came of the search for a periodic state at mid-band. */
public sealed interface MidbandOutcome {
  /**
   * A cycle that repeats itself.
   *
   * @param solution the cycle
   * @param passes how often the cycle was solved
   */
  record Converged(MidbandSolution solution, int passes) implements MidbandOutcome {}

  /**
   * No cycle was found.
   *
   * @param reason why, in a sentence
   * @param peak drive that was asked for [V] or [A]
   * @param reached highest drive below it that was solved on the way [V] or [A]
   */
  record NotConverged(String reason, double peak, double reached) implements MidbandOutcome {}
}
